/** Fixes, taken from the light bulb and applied by the editor. */
import assert from 'node:assert/strict';
import {
  CodeActionKind,
  commands,
  workspace,
  type CodeAction,
  type Diagnostic,
  type TextDocument,
} from 'vscode';
import { finding, noFinding, openPage } from './support.ts';

async function fixesFor(document: TextDocument, found: Diagnostic): Promise<CodeAction[]> {
  return commands.executeCommand<CodeAction[]>(
    'vscode.executeCodeActionProvider',
    document.uri,
    found.range,
    CodeActionKind.QuickFix.value,
  );
}

async function apply({ edit, command }: CodeAction): Promise<void> {
  if (edit !== undefined) assert.ok(await workspace.applyEdit(edit));
  if (command !== undefined)
    await commands.executeCommand(command.command, ...((command.arguments ?? []) as unknown[]));
}

suite('fixes', () => {
  test('a wrong formula is replaced by that of the structure, and the finding goes', async () => {
    const page = ['```compound', 'label: X-1', 'SMILES: CC(C)(C)C', 'formula: C5H10', '```', ''].join('\n');
    const { document } = await openPage('fix.md', page);
    const found = await finding(document, 'formula-mismatch');
    const fix = (await fixesFor(document, found)).find((action) => action.title.includes('C5H12'));
    assert.ok(fix, 'no fix offers C5H12');
    await apply(fix);
    await noFinding(document, 'formula-mismatch');
    assert.equal(document.getText(), page.replace('C5H10', 'C5H12'));
  });

  test('a finding is accepted with a reason, and goes', async () => {
    const page = [
      '> ```compound',
      '> label: X-2',
      '> SMILES: CC(C)(C)C',
      '> formula: C5H10',
      '> ```',
      '',
    ].join('\n');
    const { document } = await openPage('accept.md', page);
    const found = await finding(document, 'formula-mismatch');
    const acceptance = (await fixesFor(document, found)).find((action) =>
      /formula-mismatch/.test(action.title),
    );
    assert.ok(acceptance, 'nothing accepts the finding');
    await apply(acceptance);
    await noFinding(document, 'formula-mismatch');
    assert.match(document.lineAt(4).text, /^> allow: formula-mismatch \(\w+\)$/);
    assert.equal(document.lineAt(5).text, '> ```');
  });
});

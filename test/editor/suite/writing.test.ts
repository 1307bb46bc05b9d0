/** Help while writing a block: keys, and the outline. */
import assert from 'node:assert/strict';
import { commands, type CompletionList, type DocumentSymbol } from 'vscode';
import { eventually, openPage } from './support.ts';

const labelOf = ({ label }: CompletionList['items'][number]) =>
  typeof label === 'string' ? label : label.label;

suite('writing', () => {
  test('keys that the block does not have yet are offered at the start of a line', async () => {
    const page = ['```compound', 'label: W-1', 'mo', '```', ''].join('\n');
    const { document } = await openPage('keys.md', page);
    const place = document.positionAt(page.indexOf('mo') + 2);
    const { items } = await commands.executeCommand<CompletionList>(
      'vscode.executeCompletionItemProvider',
      document.uri,
      place,
    );
    const labels = items.map(labelOf);
    assert.ok(labels.includes('molar mass'), labels.join(', '));
    assert.ok(!labels.includes('label'), 'a label is there already');
    assert.ok(!labels.includes('charged'), 'that is a key of reactions');
  });

  test('the outline lists blocks by their labels', async () => {
    const page = ['# Day', '', '```compound', 'label: W-2', 'SMILES: CCO', '```', ''].join('\n');
    const { document } = await openPage('outline.md', page);
    await eventually('the block in the outline', async () => {
      const symbols = await commands.executeCommand<DocumentSymbol[] | undefined>(
        'vscode.executeDocumentSymbolProvider',
        document.uri,
      );
      const all = (list: readonly DocumentSymbol[]): DocumentSymbol[] =>
        list.flatMap((one) => [one, ...all(one.children)]);
      return all(symbols ?? []).find(({ name, range }) => name === 'W-2' && range.start.line === 2);
    });
  });
});

/** `isonym.json` on the disk: the editor watches it, and the server follows. */
import assert from 'node:assert/strict';
import { DiagnosticSeverity, Uri, workspace } from 'vscode';
import {
  codeOf,
  eventually,
  finding,
  findingsIn,
  fiveBonds,
  noFinding,
  notebookFolder,
  openPage,
} from './support.ts';

suite('settings', () => {
  test('isonym.json may hold comments, as the server reads them', async () => {
    const document = await workspace.openTextDocument(Uri.joinPath(notebookFolder(), 'isonym.json'));
    assert.equal(document.languageId, 'jsonc');
  });

  test('a severity in isonym.json counts from the moment it is saved until it is gone', async () => {
    const { document } = await openPage('with-settings/page.md', fiveBonds('S-1'));
    await finding(document, 'valence');
    const file = Uri.joinPath(notebookFolder(), 'editor-suite', 'with-settings', 'isonym.json');
    const write = (settings: object) =>
      workspace.fs.writeFile(file, new TextEncoder().encode(JSON.stringify(settings)));

    await write({ severity: { valence: 'off' } });
    await noFinding(document, 'valence');
    await write({ severity: { valence: 'information' } });
    const weaker = await finding(document, 'valence');
    assert.equal(weaker.severity, DiagnosticSeverity.Information);
    await workspace.fs.delete(file);
    await eventually('the usual severity', () =>
      findingsIn(document).find(
        (one) => codeOf(one) === 'valence' && one.severity === DiagnosticSeverity.Error,
      ),
    );
  });
});

/** The editor and the command share one analysis: on the pages of the example they must say the same. */
import assert from 'node:assert/strict';
import { execFile } from 'node:child_process';
import { join } from 'node:path';
import { DiagnosticSeverity, Uri, workspace, type Diagnostic } from 'vscode';
import { codeOf, eventually, findingsIn, notebookFolder, ourExtension } from './support.ts';

interface Found {
  readonly file: string;
  readonly line: number;
  readonly column: number;
  readonly endLine: number;
  readonly endColumn: number;
  readonly check: string;
  readonly severity: string;
  readonly message: string;
}

/** Runs `isonym check` from the extension's own folder. Exit code 1 means that something was found. */
function check(folder: string): Promise<readonly Found[]> {
  const command = join(ourExtension().extensionPath, 'dist', 'isonym.js');
  const env = { ...process.env, ELECTRON_RUN_AS_NODE: '1' };
  return new Promise((resolve, reject) => {
    const args = [command, 'check', '.', '--format', 'json'];
    execFile(process.execPath, args, { cwd: folder, env, maxBuffer: 64_000_000 }, (error, stdout, stderr) => {
      if (error !== null && error.code !== 1) reject(new Error(stderr || error.message));
      else resolve((JSON.parse(stdout) as { findings: readonly Found[] }).findings);
    });
  });
}

const severityNames: Record<DiagnosticSeverity, string> = {
  [DiagnosticSeverity.Error]: 'error',
  [DiagnosticSeverity.Warning]: 'warning',
  [DiagnosticSeverity.Information]: 'information',
  [DiagnosticSeverity.Hint]: 'hint',
};

const asFound = (file: string, one: Diagnostic): Found => ({
  file,
  line: one.range.start.line + 1,
  column: one.range.start.character + 1,
  endLine: one.range.end.line + 1,
  endColumn: one.range.end.character + 1,
  check: codeOf(one),
  severity: severityNames[one.severity],
  message: one.message,
});

const inOneOrder = (found: readonly Found[]) =>
  found.map((one) => JSON.stringify(Object.entries(one).sort(([a], [b]) => (a < b ? -1 : 1)))).sort();

suite('editor and command', () => {
  test('find the same in every page of the example', async () => {
    const pages = await workspace.findFiles('2*/**/*.md');
    assert.ok(pages.length > 0, 'the example has no pages');
    const root = notebookFolder().fsPath;
    const expected = (await check(root)).filter(({ file }) => /^2/.test(file));
    assert.ok(expected.length > 0, 'nothing is found in the example');
    for (const uri of pages) {
      const document = await workspace.openTextDocument(uri);
      const file = workspace.asRelativePath(Uri.file(document.uri.path), false);
      const wanted = inOneOrder(expected.filter((one) => one.file === file));
      // What needs the toolkit comes a moment later.
      await eventually(`the findings of ${file}`, () => {
        const found = inOneOrder(findingsIn(document).map((one) => asFound(file, one)));
        return JSON.stringify(found) === JSON.stringify(wanted) ? true : undefined;
      }).catch(() => {
        assert.deepEqual(inOneOrder(findingsIn(document).map((one) => asFound(file, one))), wanted);
      });
    }
  });
});

/** What the tests in the editor share: pages written on the spot, and waiting for what the server says of them. */
import assert from 'node:assert/strict';
import {
  extensions,
  languages,
  Range,
  Uri,
  window,
  workspace,
  WorkspaceEdit,
  type Diagnostic,
  type TextDocument,
  type TextEditor,
} from 'vscode';

export const extensionId = 'isonym.isonym';

export function ourExtension() {
  const extension = extensions.getExtension(extensionId);
  assert.ok(extension, `${extensionId} is not installed`);
  return extension;
}

export function notebookFolder(): Uri {
  const folder = workspace.workspaceFolders?.[0];
  assert.ok(folder, 'no folder is open');
  return folder.uri;
}

/** Writes a page into the notebook and shows it. */
export async function openPage(name: string, text: string): Promise<TextEditor> {
  const uri = Uri.joinPath(notebookFolder(), 'editor-suite', name);
  await workspace.fs.writeFile(uri, new TextEncoder().encode(text));
  return window.showTextDocument(await workspace.openTextDocument(uri));
}

/** A page with one block, in which the second carbon atom has five bonds. */
export const fiveBonds = (label: string, lineEnd = '\n') =>
  ['# Page', '', '```compound', `label: ${label}`, 'SMILES: CC(C)(C)(C)C', '```', ''].join(lineEnd);

/** Edits as typing does: the file on the disk stays as it is. */
export async function replace(document: TextDocument, wrong: string, right: string): Promise<void> {
  const start = document.getText().indexOf(wrong);
  assert.notEqual(start, -1, `${wrong} is not in ${document.uri.path}`);
  const edit = new WorkspaceEdit();
  const range = new Range(document.positionAt(start), document.positionAt(start + wrong.length));
  edit.replace(document.uri, range, right);
  assert.ok(await workspace.applyEdit(edit));
}

/** Asks again and again until there is an answer. */
export async function eventually<T>(
  what: string,
  ask: () => T | undefined | Promise<T | undefined>,
  withinMs = 30_000,
): Promise<T> {
  const deadline = Date.now() + withinMs;
  for (;;) {
    const answer = await ask();
    if (answer !== undefined) return answer;
    if (Date.now() > deadline) throw new Error(`never came: ${what}`);
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}

export const codeOf = (finding: Diagnostic): string =>
  String(typeof finding.code === 'object' ? finding.code.value : finding.code);

/** What Isonym says of a page; other extensions' diagnostics are none of our business. */
export const findingsIn = (document: TextDocument): Diagnostic[] =>
  languages.getDiagnostics(document.uri).filter((finding) => finding.source === 'isonym');

export async function finding(document: TextDocument, code: string): Promise<Diagnostic> {
  return eventually(`${code} in ${document.uri.path}`, () =>
    findingsIn(document).find((one) => codeOf(one) === code),
  ).catch((error: unknown) => {
    const there = findingsIn(document).map((one) => `${codeOf(one)}: ${one.message}`);
    throw new Error(`${String(error)}; there are: ${there.join(' | ') || 'none'}`);
  });
}

export async function noFinding(document: TextDocument, code: string): Promise<void> {
  await eventually(`an end of ${code} in ${document.uri.path}`, () =>
    findingsIn(document).some((one) => codeOf(one) === code) ? undefined : true,
  );
}

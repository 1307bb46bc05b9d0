/** Starting, and staying alive. */
import assert from 'node:assert/strict';
import { execFileSync } from 'node:child_process';
import { readdirSync, readFileSync } from 'node:fs';
import { commands, Selection, workspace } from 'vscode';
import { eventually, finding, findingsIn, fiveBonds, openPage, ourExtension, replace } from './support.ts';

interface Process {
  readonly pid: number;
  readonly parent: number;
  readonly command: string;
}

function processes(): Process[] {
  if (process.platform !== 'linux') {
    const table = execFileSync('ps', ['-A', '-o', 'pid=,ppid=,args='], { encoding: 'utf8' });
    return [...table.matchAll(/^\s*(\d+)\s+(\d+)\s+(.*)$/gm)].map(([, pid, parent, command]) => ({
      pid: Number(pid),
      parent: Number(parent),
      command: command!,
    }));
  }
  // Not every Linux has `ps`.
  return readdirSync('/proc').flatMap((name) => {
    if (!/^\d+$/.test(name)) return [];
    try {
      const command = readFileSync(`/proc/${name}/cmdline`, 'utf8').replaceAll('\0', ' ');
      const parent = /^PPid:\s*(\d+)/m.exec(readFileSync(`/proc/${name}/status`, 'utf8'))?.[1];
      return [{ pid: Number(name), parent: Number(parent), command }];
    } catch {
      return [];
    }
  });
}

/** The language servers that this extension host has started for us. */
const servers = () =>
  processes().filter(
    ({ parent, command }) => parent === process.pid && /[\\/]dist[\\/]server\.js\b/.test(command),
  );

suite('activation', () => {
  test('a Markdown file wakes the extension, and the server starts once', async () => {
    await openPage('awake.md', fiveBonds('E-1'));
    await eventually('activation', () => (ourExtension().isActive ? true : undefined));
    assert.equal(servers().length, 1);
  });

  test('what package.json says can be done without trust and without a disk is what it declares', () => {
    const { capabilities } = ourExtension().packageJSON as {
      capabilities: Record<string, { supported: unknown }>;
    };
    assert.equal(capabilities['untrustedWorkspaces']?.supported, true);
    assert.equal(capabilities['virtualWorkspaces']?.supported, 'limited');
  });

  test('a page that lies on no disk is checked as well', async () => {
    const document = await workspace.openTextDocument({ language: 'markdown', content: fiveBonds('E-4') });
    assert.equal(document.uri.scheme, 'untitled');
    await finding(document, 'valence');
  });

  test('after a crash of the server findings come again', async () => {
    const { document } = await openPage('crash.md', fiveBonds('E-2'));
    await finding(document, 'valence');
    const [before] = servers();
    assert.ok(before);
    process.kill(before.pid, 'SIGKILL');
    await eventually('another server', () => servers().find(({ pid }) => pid !== before.pid));
    await replace(document, 'SMILES: ', 'SMILES: CC');
    // Where the fault is now: what the first server said of it cannot pass for it.
    const place = document.getText().indexOf('CCCC(C)') + 'CCC'.length;
    await eventually('the finding in its new place', () =>
      findingsIn(document).find((one) => document.offsetAt(one.range.start) === place),
    );
  });

  test('toggling a comment inside a block writes the mark of the block language', async () => {
    const editor = await openPage('comment.md', fiveBonds('E-3'));
    const line = editor.document.positionAt(editor.document.getText().indexOf('label:')).line;
    editor.selection = new Selection(line, 0, line, 0);
    // The mark depends on the tokens, which come when the editor gets to it.
    await eventually('the mark of a comment', async () => {
      await commands.executeCommand('editor.action.commentLine');
      const text = editor.document.lineAt(line).text;
      if (text === '// label: E-3') return true;
      await commands.executeCommand('undo');
      return undefined;
    });
  });
});

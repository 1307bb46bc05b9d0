/** The built server in a folder: pages that are not open count too, and so do changes behind the editor's back. */
import { mkdirSync, mkdtempSync, realpathSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { ensureBuilt } from './client.ts';
import { Session } from './session.ts';

const scratch = realpathSync(mkdtempSync(join(tmpdir(), 'isonym-folder-')));
let session: Session | undefined;
beforeAll(ensureBuilt);
afterEach(() => {
  session?.client.kill();
});
afterAll(() => {
  rmSync(scratch, { recursive: true, force: true });
});

const compound = (label: string, formula = 'C2H6O') =>
  `\`\`\`compound\nlabel: ${label}\nname: ethanol\nformula: ${formula}\nSMILES: CCO\n\`\`\`\n`;

/** A notebook of its own, and the addresses of its files. */
async function inFolder(files: Record<string, string>) {
  const root = mkdtempSync(join(scratch, 'lab-'));
  const write = (path: string, text: string) => {
    mkdirSync(dirname(join(root, path)), { recursive: true });
    writeFileSync(join(root, path), text);
  };
  for (const [path, text] of Object.entries(files)) write(path, text);
  session = await new Session({ rootUri: pathToFileURL(root).href }).start();
  const uri = (path: string) => pathToFileURL(join(root, path)).href;
  const changed = (path: string) => {
    session?.client.notify('workspace/didChangeWatchedFiles', { changes: [{ uri: uri(path), type: 2 }] });
  };
  return { session, uri, write, changed };
}

const checksOf = (findings: readonly { code?: unknown }[]) => findings.map((finding) => finding.code);

describe('a folder', () => {
  it('shares its labels: a page on disk, an open page, and a page that changes', async () => {
    const lab = await inFolder({ 'isonym.json': '{}', '2026/a.md': compound('1'), 'b.md': compound('1') });
    lab.session.open(lab.uri('b.md'), compound('1'));
    const repeated = await lab.session.findings(lab.uri('b.md'), 1, (findings) => findings.length === 1);
    expect(repeated[0]).toMatchObject({
      code: 'label-repeated',
      relatedInformation: [{ location: { uri: lab.uri('2026/a.md'), range: { start: { line: 1 } } } }],
    });
    lab.write('2026/a.md', compound('2'));
    lab.changed('2026/a.md');
    await lab.session.findings(lab.uri('b.md'), 1, (findings) => findings.length === 0);
    // Opened and edited, the other page counts as it is typed, not as it lies on disk.
    lab.session.open(lab.uri('2026/a.md'), compound('2'));
    lab.session.edit(lab.uri('2026/a.md'), 2, [1, 7], [1, 8], '1');
    await lab.session.findings(lab.uri('b.md'), 1, (findings) => findings.length === 1);
    lab.session.client.notify('textDocument/didClose', { textDocument: { uri: lab.uri('2026/a.md') } });
    await lab.session.findings(lab.uri('b.md'), 1, (findings) => findings.length === 0);
  });

  it('takes its settings from disk, places their mistakes, and follows their changes', async () => {
    const wrong = compound('1', 'C2H6O2');
    const lab = await inFolder({
      'isonym.json': '{\n  "severity": { "formula-mismatch": "loud" }\n}',
      'a.md': wrong,
    });
    lab.session.open(lab.uri('a.md'), wrong);
    expect(checksOf(await lab.session.findings(lab.uri('a.md')))).toEqual(['formula-mismatch']);
    const problem = await lab.session.client.until(
      () => lab.session.published(lab.uri('isonym.json')).at(-1)?.diagnostics[0],
      'a finding in the settings',
    );
    expect(problem.range.start).toEqual({ line: 1, character: 36 });
    lab.write('isonym.json', '{ "severity": { "formula-mismatch": "off" } }');
    lab.changed('isonym.json');
    await lab.session.findings(lab.uri('a.md'), 1, (findings) => findings.length === 0);
    expect(lab.session.published(lab.uri('isonym.json')).at(-1)?.diagnostics).toEqual([]);
  });
});

/** The built command as a shell sees it: what it prints where, and its exit code. */
import { spawn, spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { discoverNotebooks } from '../../server/workspace/discover.ts';
import { builtCommand, childEnvironment, ensureBuilt, repository } from './client.ts';
import { Session } from './session.ts';

const scratch = mkdtempSync(join(tmpdir(), 'isonym-command-'));
beforeAll(ensureBuilt);
afterAll(() => {
  rmSync(scratch, { recursive: true, force: true });
});

interface Run {
  readonly code: number | null;
  readonly out: string;
  readonly err: string;
}

function run(
  args: readonly string[],
  options: { input?: string; cwd?: string; env?: Record<string, string> } = {},
): Run {
  const { status, stdout, stderr } = spawnSync(process.execPath, [builtCommand, ...args], {
    encoding: 'utf8',
    input: options.input ?? '',
    cwd: options.cwd ?? scratch,
    env: childEnvironment(options.env),
  });
  return { code: status, out: stdout, err: stderr };
}

/** A folder of its own with these files. */
function folder(files: Record<string, string | Uint8Array>): string {
  const root = mkdtempSync(join(scratch, 'notebook-'));
  for (const [path, text] of Object.entries(files)) {
    mkdirSync(dirname(join(root, path)), { recursive: true });
    writeFileSync(join(root, path), text);
  }
  return root;
}

const sound = '```compound\nname: ethanol\nformula: C2H6O\nSMILES: CCO\n```\n';
const wrong = sound.replace('C2H6O', 'C2H6O2');

interface FindingJson {
  readonly file: string;
  readonly line: number;
  readonly column: number;
  readonly endLine: number;
  readonly endColumn: number;
  readonly check: string;
  readonly severity: string;
  readonly message: string;
}

function findingsOf(out: string): readonly FindingJson[] {
  return (JSON.parse(out) as { findings: readonly FindingJson[] }).findings;
}

describe('isonym check', () => {
  it('exits 0, 1 or 2 as it found nothing, something, or could not look', () => {
    const root = folder({
      'sound.md': sound,
      'wrong.md': wrong,
      'warned.md': `${sound}\n\`\`\`compound\nbogus: 1\n\`\`\`\n`,
    });
    expect(run(['check', 'sound.md'], { cwd: root }).code).toBe(0);
    expect(run(['check', 'wrong.md'], { cwd: root }).code).toBe(1);
    expect(run(['check', 'warned.md'], { cwd: root }).code).toBe(1);
    expect(run(['check', 'warned.md', '--fail-on', 'error'], { cwd: root }).code).toBe(0);
    expect(run(['check', 'wrong.md', '--fail-on', 'error'], { cwd: root }).code).toBe(1);
    expect(run(['check', '--format', 'xml'], { cwd: root }).code).toBe(2);
    expect(run(['chekc'], { cwd: root }).code).toBe(2);
  });

  it('names what could not be checked, and checks the rest', () => {
    const root = folder({
      'wrong.md': wrong,
      'latin.md': Buffer.from('bp: 95 °C', 'latin1'),
      'empty/readme.txt': '',
    });
    const { code, out, err } = run(['check', 'missing.md', 'latin.md', 'empty', 'wrong.md'], { cwd: root });
    expect(code).toBe(2);
    expect(err).toContain('missing.md does not exist');
    expect(err).toContain('latin.md is not UTF-8 text (byte 8, in line 1');
    expect(err).toContain('empty holds no notebook pages');
    expect(out).toContain('formula-mismatch');
  });

  it('prints JSON with places from 1, and files as the user would write them', () => {
    const root = folder({ 'a/wrong.md': `🧪\n\n- ${wrong.trimEnd().replaceAll('\n', '\n  ')}\n` });
    const { out, code } = run(['check', '.', '--format', 'json'], { cwd: root });
    expect(code).toBe(1);
    const [finding] = findingsOf(out);
    expect(finding).toMatchObject({
      file: 'a/wrong.md',
      line: 5,
      endLine: 5,
      check: 'formula-mismatch',
      severity: 'error',
    });
    expect(JSON.parse(out)).toMatchObject({
      summary: { files: 1, compounds: 1, reactions: 0, errors: 1, warnings: 0, informations: 0 },
    });
  });

  it('reads standard input', () => {
    const { out, code } = run(['check', '-', '--format', 'json'], { input: wrong });
    expect(code).toBe(1);
    expect(findingsOf(out)[0]?.file).toBe('-');
  });

  it('asks the toolkit for the identifiers that need it', () => {
    const ofMethanol = 'OKKJLVBELUTLKV-UHFFFAOYSA-N';
    const input = sound.replace('SMILES', `InChIKey: ${ofMethanol}\nSMILES`);
    const { out } = run(['check', '-', '--format', 'json'], { input });
    expect(findingsOf(out).map((finding) => finding.check)).toEqual(['inchikey-mismatch']);
    const without = run(['check', '-', '--format', 'json'], { input, env: { ISONYM_RDKIT: '/nowhere' } });
    expect(findingsOf(without.out)).toEqual([]);
    expect(without.err).toContain('RDKit');
  });

  it('takes the settings above the file, or those it is told', () => {
    const off = '{ "severity": { "formula-mismatch": "off" } }';
    const root = folder({
      'lab/isonym.json': off,
      'lab/2026/wrong.md': wrong,
      'warn.json': off.replace('off', 'warning'),
    });
    expect(run(['check', 'lab'], { cwd: root }).code).toBe(0);
    const told = run(['check', 'lab', '--config', 'warn.json', '--format', 'json'], { cwd: root });
    expect(findingsOf(told.out)[0]?.severity).toBe('warning');
  });

  it('places mistakes in the settings and goes on with what is sound', () => {
    const settings = '{\n  "severity": { "formula-mismatch": "loud" },\n  "colour": 1\n}';
    const root = folder({ 'isonym.json': settings, 'wrong.md': wrong });
    const { code, err, out } = run(['check', '.'], { cwd: root });
    expect(code).toBe(2);
    expect(err).toContain('isonym.json:2:37 “severity → formula-mismatch” must be one of');
    expect(err).toContain('isonym.json:3:3 isonym.json has no setting “colour”');
    expect(out).toContain('formula-mismatch');
  });

  it('colours a terminal only, and lets no escape sequence of a notebook through', () => {
    const hostile = sound.replace('formula', '\u001b[2Jformula');
    expect(run(['check', '-'], { input: hostile }).out).not.toContain('\u001b');
    expect(run(['check', '-'], { input: wrong, env: { FORCE_COLOR: '1' } }).out).toContain('\u001b[31m');
    const refused = { FORCE_COLOR: '1', NO_COLOR: '1' };
    expect(run(['check', '-'], { input: wrong, env: refused }).out).not.toContain('\u001b');
  });

  it('survives a reader that has had enough', async () => {
    const many = Array.from({ length: 3000 }, () => wrong).join('\n');
    const child = spawn(process.execPath, [builtCommand, 'check', '-'], { env: childEnvironment() });
    let err = '';
    child.stderr.on('data', (chunk: Buffer) => (err += chunk.toString()));
    child.stdout.once('data', () => child.stdout.destroy());
    child.stdin.on('error', () => undefined);
    child.stdin.end(many);
    await new Promise((resolve) => child.on('close', resolve));
    expect(err).toBe('');
  });
});

describe('isonym read', () => {
  it('answers one line of JSON for each name, in order', () => {
    const { out, code } = run(['read', '--json', '-'], { input: 'ethanol\nnonsensium\n\nbutan-2-ol' });
    expect(code).toBe(0);
    const lines = out
      .trimEnd()
      .split('\n')
      .map((line) => JSON.parse(line) as Record<string, unknown>);
    expect(lines.map((line) => [line['name'], line['status']])).toEqual([
      ['ethanol', 'definite'],
      ['nonsensium', 'unknown'],
      ['', 'unknown'],
      ['butan-2-ol', 'stereo-open'],
    ]);
    expect(lines[0]).toMatchObject({
      readings: [
        { smiles: 'CCO', formula: 'C2H6O', inchikey: 'LFQSCWFLJHTTHZ-UHFFFAOYSA-N', stereoisomers: [] },
      ],
    });
    expect((lines[3]!['readings'] as { stereoisomers: unknown[] }[])[0]!.stereoisomers).toHaveLength(2);
  });

  it('answers while the input is still open', async () => {
    const child = spawn(process.execPath, [builtCommand, 'read', '--json', '-'], { env: childEnvironment() });
    const answer = new Promise<string>((resolve) =>
      child.stdout.once('data', (chunk: Buffer) => resolve(chunk.toString())),
    );
    child.stdin.write('ethanol\n');
    expect(JSON.parse(await answer)).toMatchObject({ name: 'ethanol', status: 'definite' });
    child.stdin.end();
    expect(await new Promise((resolve) => child.on('close', resolve))).toBe(0);
  });
});

describe('isonym checks, report and --version', () => {
  it('lists every check and explains one', () => {
    expect(run(['checks']).out).toContain('formula-mismatch');
    expect(run(['checks', 'formula-mismatch']).out).toContain('Source: ');
    const unknown = run(['checks', 'formula-match']);
    expect(unknown.code).toBe(2);
    expect(unknown.err).toContain('isonym checks lists them all');
  });

  it('writes one page that needs no network', () => {
    const root = folder({ 'a.md': sound, 'b.md': wrong });
    const { code, err } = run(['report', '.', '-o', 'out.html'], {
      cwd: root,
      env: { SOURCE_DATE_EPOCH: '0' },
    });
    expect(code).toBe(0);
    expect(err).toContain('out.html written');
    const html = readFileSync(join(root, 'out.html'), 'utf8');
    expect(html).toContain('1970-01-01');
    expect(html.match(/<svg /g)).toHaveLength(2);
    expect(html).toContain('formula-mismatch');
    expect(html.replaceAll('http://www.w3.org/2000/svg', '')).not.toMatch(/https?:\/\//);
    expect(readdirSync(root).sort()).toEqual(['a.md', 'b.md', 'out.html']);
  });

  it('never writes over a notebook page', () => {
    const root = folder({ 'a.md': sound });
    expect(run(['report', '.', '-o', 'a.md'], { cwd: root }).code).toBe(2);
    expect(readFileSync(join(root, 'a.md'), 'utf8')).toBe(sound);
    expect(run(['report', '.', '-o', 'no/such/folder.html'], { cwd: root }).code).toBe(2);
  });

  it('knows its version without loading any chemistry', () => {
    const { version } = JSON.parse(readFileSync(join(repository, 'package.json'), 'utf8')) as {
      version: string;
    };
    expect(run(['--version'])).toEqual({ code: 0, out: `${version}\n`, err: '' });
  });
});

describe('editor and command', () => {
  it('find the same in every page of the examples', async () => {
    const examples = join(repository, 'examples');
    const { out } = run(['check', examples, '--format', 'json'], { cwd: repository });
    const session = await new Session({ rootUri: pathToFileURL(examples).href }).start();
    try {
      for (const file of discoverNotebooks(examples).files) {
        const expected = findingsOf(out)
          .filter((finding) => join(repository, finding.file) === file)
          .map(({ line, column, endLine, endColumn, check, message, severity }) => ({
            range: {
              start: { line: line - 1, character: column - 1 },
              end: { line: endLine - 1, character: endColumn - 1 },
            },
            severity: ['', 'error', 'warning', 'information'].indexOf(severity),
            code: check,
            message,
          }));
        const uri = pathToFileURL(file).href;
        session.open(uri, readFileSync(file, 'utf8'));
        // Findings across pages and those of the toolkit arrive after the first ones.
        const found = await session.findings(uri, 1, (findings) => findings.length === expected.length);
        expect(
          found.map(({ range, severity, code, message }) => ({ range, severity, code, message })),
        ).toEqual(expected);
      }
    } finally {
      session.client.kill();
    }
  });
});

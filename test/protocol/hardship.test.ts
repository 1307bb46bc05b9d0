/** The built server when things go wrong: nonsense on the line, requests out of turn, no toolkit. */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeAll, describe, expect, it } from 'vitest';
import { ensureBuilt } from './client.ts';
import { placeOf, Session } from './session.ts';

const uri = 'untitled:Page-1';
const ethanol =
  '```compound\nname: ethanol\nSMILES: CCO\nInChIKey: LFQSCWFLJHTTHZ-UHFFFAOYSA-N\nbogus: 1\n```\n';

let session: Session | undefined;
const scratch = mkdtempSync(join(tmpdir(), 'isonym-protocol-'));
beforeAll(() => {
  ensureBuilt();
  return () => {
    rmSync(scratch, { recursive: true, force: true });
  };
});
afterEach(() => {
  session?.client.kill();
});

const checksOf = (findings: readonly { code?: unknown }[]) => findings.map((finding) => finding.code);

describe('nonsense on the line', () => {
  it('is answered with an error, and the session goes on', async () => {
    session = await new Session().start();
    const { client } = session;
    expect((await client.request('isonym/noSuchThing', {})).error?.code).toBe(-32601);
    for (const params of [undefined, null, 7, [], {}, { textDocument: null }, { textDocument: { uri: 3 } }]) {
      const answer = await client.request('textDocument/hover', params);
      expect(answer.error !== undefined || answer.result === null).toBe(true);
      client.notify('textDocument/didOpen', params);
      client.notify('textDocument/didChange', params);
      client.notify('isonym/theme', params);
    }
    const position = { line: -5, character: 1e9 };
    session.open(uri, ethanol);
    for (const method of ['hover', 'completion', 'documentSymbol']) {
      const answer = await client.request(`textDocument/${method}`, { textDocument: { uri }, position });
      expect(answer.error).toBeUndefined();
    }
    expect(checksOf(await session.findings(uri))).toEqual(['unknown-field']);
    expect(client.exitCode).toBeUndefined();
  });

  it('does not end the server when it is no JSON at all', async () => {
    session = await new Session().start();
    session.client.write('Content-Length: 9\r\n\r\n{"nonsens');
    session.client.write('Content-Length: 4\r\n\r\nnull');
    session.client.write('Content-Length: 2\r\n\r\n[]');
    session.open(uri, ethanol);
    expect(checksOf(await session.findings(uri))).toEqual(['unknown-field']);
  });
});

describe('requests out of turn', () => {
  it('are survived: unknown documents, edits before opening, opening twice, old versions', async () => {
    session = await new Session().start();
    session.edit('untitled:never-opened', 3, [0, 0], [0, 0], 'x');
    session.client.notify('textDocument/didClose', { textDocument: { uri: 'untitled:never-opened' } });
    expect(await session.hover('untitled:never-opened', 0, 0)).toBeUndefined();
    session.open(uri, ethanol, 5);
    session.open(uri, ethanol.replace('bogus', 'label'), 6);
    expect(await session.findings(uri, 6)).toEqual([]);
    // An edit beyond the end of the text is taken to its end.
    session.edit(uri, 7, [99, 0], [120, 4], '```compound\nSMILES: C(\n```\n');
    expect(checksOf(await session.findings(uri, 7))).toEqual(['smiles-syntax']);
  });

  it('answers a hover with the text after the edits that came before it', async () => {
    session = await new Session().start();
    session.open(uri, ethanol);
    const [line, character] = placeOf(ethanol, 'CCO');
    session.edit(uri, 2, [line, character], [line, character + 3], 'CCCCO');
    expect((await session.hover(uri, line, character))?.value).toContain('C₄H₁₀O');
  });

  it('refuses to work before it was initialized', async () => {
    session = new Session();
    const answer = await session.client.request('textDocument/hover', { textDocument: { uri } });
    expect(answer.error?.code).toBe(-32002);
    await session.start();
    session.open(uri, ethanol);
    expect(checksOf(await session.findings(uri))).toEqual(['unknown-field']);
  });
});

describe('without the toolkit', () => {
  it('everything else works as before, and the user is told once', async () => {
    session = await new Session({ environment: { ISONYM_RDKIT: join(scratch, 'nowhere') } }).start();
    const { client } = session;
    session.open(uri, ethanol);
    expect(checksOf(await session.findings(uri))).toEqual(['unknown-field']);
    const hover = await session.hover(uri, ...placeOf(ethanol, 'CCO'));
    expect(hover?.value).toContain('46.07 g/mol');
    expect(hover?.value).not.toContain('data:image');
    session.edit(uri, 2, [4, 0], [4, 5], 'label');
    await session.findings(uri, 2, (findings) => findings.length === 0);
    await session.hover(uri, ...placeOf(ethanol, 'CCO'));
    const told = client.notifications.filter((message) => message.method === 'window/showMessage');
    expect(told).toHaveLength(1);
    expect((told[0]!.params as { message: string }).message).toContain('RDKit');
    expect(await session.stop()).toBe(0);
  });
});

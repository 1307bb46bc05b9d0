/** The built server over stdio: an ordinary session from start to end. */
import { afterEach, beforeAll, describe, expect, it } from 'vitest';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { ensureBuilt } from './client.ts';
import { placeOf, Session, type SessionOptions } from './session.ts';

const uri = 'untitled:Page-1';
const page = [
  '# 12 May 🧪',
  '',
  '```compound',
  'label: 4 🧪',
  'name: 1-(4-methoxyphenyl)ethan-1-ol',
  'isomers: racemate',
  'formula: C9H12O3',
  'SMILES: COc1ccc(cc1)C(C)O',
  'molar mass: 152.19 g/mol',
  '```',
  '',
  '> ```compound',
  '> SMILES: CC(C)(C)(C)C',
  '> ```',
].join('\n');

let session: Session | undefined;
beforeAll(ensureBuilt);
afterEach(() => {
  session?.client.kill();
});

async function opened(text = page, options: SessionOptions = {}): Promise<Session> {
  session = await new Session(options).start();
  session.open(uri, text);
  return session;
}

const checksOf = (findings: readonly { code?: unknown }[]) => findings.map((finding) => finding.code);

describe('a session', () => {
  it('says what it can do, and ends cleanly', async () => {
    session = await new Session().start();
    expect(session.initialized?.serverInfo?.name).toBe('isonym');
    expect(session.initialized?.capabilities).toMatchObject({ hoverProvider: true, textDocumentSync: 2 });
    expect(await session.stop()).toBe(0);
  });

  it('reports findings with severity, id and exact range', async () => {
    const server = await opened();
    const findings = await server.findings(uri);
    expect(checksOf(findings)).toEqual(['formula-mismatch', 'valence']);
    const [mismatch, valence] = findings;
    expect(mismatch).toMatchObject({ severity: 1, source: 'isonym' });
    expect(mismatch!.range.start.line).toBe(6);
    // The carbon with five bonds.
    expect(valence!.range).toEqual({ start: { line: 12, character: 11 }, end: { line: 12, character: 12 } });
  });

  it('follows incremental edits, counted in UTF-16 units behind an emoji', async () => {
    const server = await opened();
    await server.findings(uri);
    const [line, character] = placeOf(page, 'O3');
    server.edit(uri, 2, [line, character + 1], [line, character + 2], '2');
    expect(checksOf(await server.findings(uri, 2))).toEqual(['valence']);
    // In one line with the emoji: the label becomes a field that nobody knows.
    const [labelLine] = placeOf(page, 'label');
    const emojiEnd = 'label: 4 🧪'.length;
    server.edit(uri, 3, [labelLine, emojiEnd], [labelLine, emojiEnd], '\nbogus: 🧪🧪 x');
    const findings = await server.findings(uri, 3);
    expect(checksOf(findings)).toEqual(['unknown-field', 'valence']);
    expect(findings[0]!.range).toEqual({
      start: { line: 4, character: 0 },
      end: { line: 4, character: 5 },
    });
    expect(findings[1]!.range.start.line).toBe(13);
  });

  it('lets the newest of many quick edits win', async () => {
    const server = await opened();
    const [line, character] = placeOf(page, 'CC(C)(C)(C)C');
    let version = 1;
    for (let i = 0; i < 50; i++) {
      server.edit(uri, ++version, [line, character], [line, character], 'C');
      server.edit(uri, ++version, [line, character], [line, character + 1], '');
    }
    const findings = await server.findings(uri, version);
    expect(findings.at(-1)?.range.start).toEqual({ line, character: character + 1 });
  });

  it('clears the findings of a closed document', async () => {
    const server = await opened();
    await server.findings(uri);
    server.client.notify('textDocument/didClose', { textDocument: { uri } });
    await server.client.until(
      () => (server.published(uri).at(-1)?.diagnostics.length === 0 ? true : undefined),
      'no findings',
    );
  });

  it('corrects: the fix taken as it is offered removes the finding', async () => {
    const server = await opened();
    const findings = await server.findings(uri);
    const [mismatch] = findings;
    const actions = await server.actions(uri, mismatch!.range);
    const fix = actions.find((action) => action.edit?.changes?.[uri]?.[0]?.newText.includes('C9H12O2'));
    expect(fix?.kind).toBe('quickfix');
    expect(fix?.diagnostics?.[0]?.code).toBe('formula-mismatch');
    const document = TextDocument.create(uri, 'markdown', 1, page);
    server.open(uri, TextDocument.applyEdits(document, fix!.edit!.changes![uri]!), 2);
    expect(checksOf(await server.findings(uri, 2))).toEqual(['valence']);
  });

  it('accepts a finding below the last line of its block, inside a quote too', async () => {
    const server = await opened();
    const findings = await server.findings(uri);
    const valence = findings.find((finding) => finding.code === 'valence')!;
    const actions = await server.actions(uri, valence.range);
    const accept = actions.find((action) => action.title.startsWith('Accept'))!;
    const [edit] = accept.edit!.changes![uri]!;
    expect(edit!.newText).toBe('\n> allow: valence ()');
    const written = { ...edit!, newText: edit!.newText.replace('()', '(a test)') };
    const document = TextDocument.create(uri, 'markdown', 1, page);
    server.open(uri, TextDocument.applyEdits(document, [written]), 2);
    expect(checksOf(await server.findings(uri, 2))).toEqual(['formula-mismatch']);
  });

  it('lists the blocks, and offers the keys that are not there yet', async () => {
    const server = await opened();
    const symbols = await server.client.request('textDocument/documentSymbol', { textDocument: { uri } });
    expect(symbols.result).toMatchObject([
      { name: '4 🧪', detail: '1-(4-methoxyphenyl)ethan-1-ol' },
      { name: 'CC(C)(C)(C)C' },
    ]);
    server.edit(uri, 2, [8, 0], [8, 0], 'b\n');
    const completion = await server.client.request('textDocument/completion', {
      textDocument: { uri },
      position: { line: 8, character: 1 },
    });
    const labels = (completion.result as { label: string }[]).map((item) => item.label);
    expect(labels).toContain('bp');
    expect(labels).not.toContain('formula');
  });
});

describe('hovers', () => {
  it('draw the structure in the colour of the theme, with masses and InChIKey', async () => {
    const server = await opened();
    const place = placeOf(page, 'COc1ccc');
    const text = await server.hoverWith(['InChIKey', 'data:image'], uri, ...place);
    expect(text).toContain('**1-(4-methoxyphenyl)ethan-1-ol** · C₉H₁₂O₂');
    expect(text).toContain('152.19 g/mol');

    expect(text).toContain('IUUULXXWNYKJSL-UHFFFAOYSA-N');
    const picture = /data:image\/svg\+xml;base64,([A-Za-z0-9+/=]+)\|width=\d+\)/.exec(text);
    const svg = Buffer.from(picture![1]!, 'base64').toString();
    expect(svg).toContain('#abcdef');
    expect(svg.length).toBeLessThan(60_000);

    server.client.notify('isonym/theme', { foreground: '#123456' });
    const later = await server.hoverWith(['data:image'], uri, ...place);
    const laterSvg = /base64,([A-Za-z0-9+/=]+)/.exec(later)![1]!;
    expect(Buffer.from(laterSvg, 'base64').toString()).toContain('#123456');
  });

  it('come as plain text to a client that shows no Markdown', async () => {
    const server = await opened(page, { hoverFormats: ['plaintext'] });
    const hover = await server.hover(uri, ...placeOf(page, 'COc1ccc'));
    expect(hover?.kind).toBe('plaintext');
    expect(hover?.value).toContain('molar mass: 152.19 g/mol');
    expect(hover?.value).not.toMatch(/\*\*|data:|\|/);
  });

  it('explain keys and accepted checks, and say nothing outside of blocks', async () => {
    const text = '# no block\n\n```compound\nformula: CH4\nallow: formula-only (bought)\n```\n';
    const server = await opened(text);
    expect((await server.hover(uri, ...placeOf(text, 'formula')))?.value).toContain('Molecular formula');
    expect((await server.hover(uri, ...placeOf(text, 'formula-only')))?.value).toContain('formula-only');
    expect(await server.hover(uri, 0, 3)).toBeUndefined();
  });
});

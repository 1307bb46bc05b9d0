/** What resting the mouse on a structure shows. */
import assert from 'node:assert/strict';
import { commands, MarkdownString, type Hover } from 'vscode';
import { eventually, openPage } from './support.ts';

/** One MarkdownString is cut by the editor at this length, in the middle of a picture. */
const longestMarkdown = 100_000;

const subscripts = '₀₁₂₃₄₅₆₇₈₉';
const withoutSubscripts = (text: string) =>
  text.replace(/[₀-₉]/g, (digit) => String(subscripts.indexOf(digit)));

suite('hover', () => {
  test('a structure is drawn, with its formula and molar mass', async () => {
    const page = [
      '```compound',
      'label: H-1',
      'name: 1-(4-methoxyphenyl)ethan-1-ol',
      'isomers: racemate',
      'SMILES: COc1ccc(cc1)C(C)O',
      '```',
      '',
    ].join('\n');
    const { document } = await openPage('hover.md', page);
    const place = document.positionAt(page.indexOf('COc1') + 3);
    // The first drawing waits for the toolkit, and a hover does not.
    const text = await eventually('a hover with a drawing', async () => {
      const hovers = await commands.executeCommand<Hover[]>(
        'vscode.executeHoverProvider',
        document.uri,
        place,
      );
      const all = hovers
        .flatMap((one) => one.contents)
        .map((content) => (content instanceof MarkdownString ? content.value : ''))
        .join('\n');
      return all.includes('](data:image/svg+xml;base64,') ? all : undefined;
    });
    assert.ok(text.length < longestMarkdown, `${text.length} characters`);
    const words = withoutSubscripts(text.replace(/\(data:[^)]*\)/g, ''));
    assert.match(words, /C9H12O2/);
    // 9 × 12.011 + 12 × 1.008 + 2 × 15.999, standard atomic weights of IUPAC (abridged)
    assert.match(words, /152\.19/);
    const svg = Buffer.from(/base64,([^|)]*)/.exec(text)![1]!, 'base64').toString('utf8');
    assert.match(svg, /^<svg [^>]*>.*<\/svg>\s*$/s);
    assert.doesNotMatch(svg, /<script|<foreignObject|href/i);
  });

  test('outside of blocks there is none', async () => {
    const { document } = await openPage('no-hover.md', '# COc1ccc(cc1)C(C)O\n');
    const hovers = await commands.executeCommand<Hover[]>(
      'vscode.executeHoverProvider',
      document.uri,
      document.positionAt(6),
    );
    assert.deepEqual(hovers, []);
  });
});

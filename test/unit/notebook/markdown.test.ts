import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findFences } from '../../../server/notebook/fences.ts';
import { findBlocks, parseMarkdown, type MarkdownPage } from '../../../server/notebook/markdown.ts';
import { marked, withMarks } from './marked.ts';

/** Where the lines of all blocks lie. */
function lineMarks(text: string): string {
  return withMarks(
    text,
    findBlocks(text).flatMap(({ lines }) =>
      lines.map(({ text: line, offset }) => ({ start: offset, end: offset + line.length })),
    ),
  );
}

describe('which fences are blocks', () => {
  it.each([
    ['```compound\n```', 'compound'],
    ['~~~ reaction\n~~~', 'reaction'],
    ['``` \t compound of the day\n```', 'compound'],
    ['~~~compound `x`\n~~~', 'compound'],
    ['```&#99;ompound\n```', 'compound'],
    ['```&#x63;ompound&Tab;x\n```', 'compound'],
    ['   ```compound\n```', 'compound'],
    ['- ```compound\n  ```', 'compound'],
    ['> 1. ~~~reaction\n>    ~~~', 'reaction'],
    [`${'> '.repeat(50)}\`\`\`compound`, 'compound'],
  ])('%j', (text, kind) => {
    expect(findBlocks(text).map((block) => block.kind)).toEqual([kind]);
  });

  it.each([
    '```compounds\n```',
    '```Compound\n```',
    '```js compound\n```',
    '```\\compound\n```',
    '```\\&#99;ompound\n```',
    '``compound\n``',
    '    ```compound\n    ```',
    '<div>\n```compound\n```\n</div>',
    '<!--\n```compound\n```\n-->',
    '````\n```compound\n```\n````',
    '```compound`\n```',
    '~~~js\n```compound\nlabel: 1\n```\n~~~',
  ])('none in %j', (text) => {
    expect(findBlocks(text)).toEqual([]);
  });
});

describe('where a block lies', () => {
  it.each([
    'text\n\n⟦~~~ ⟦compound⟧ x\nlabel: 1\n~~~⟧  \n',
    '> ⟦```⟦compound⟧\n> label: 1\n> ```⟧\n',
    '⟦```⟦compound⟧\nlabel: 1\n`````⟧',
    '⟦```⟦compound⟧\nlabel: 1⟧\n',
    '⟦```⟦compound⟧⟧',
    '- ⟦```⟦reaction⟧\n  scheme: 1 -> 2\n⟧\ntext',
  ])('%j', (source) => {
    const inner = marked(source.replace(/^([^⟦]*)⟦([^]*)⟧([^⟧]*)$/, '$1$2$3'));
    const outer = marked(source.replace(/^([^⟦]*⟦[^⟦]*)⟦([^⟧]*)⟧/, '$1$2'));
    const [block] = findBlocks(outer.text);
    expect(block?.range).toEqual(outer.ranges[0]);
    expect(block?.kindRange).toEqual(inner.ranges[0]);
  });

  it.each([
    '```compound\n⟦label: 1⟧\n⟦⟧\n⟦  x⟧\n```\n',
    '```compound\r\n⟦label: 1⟧\r\n⟦name: anisole⟧\r\n```\r\n',
    '```compound\r⟦label: 1⟧\r⟦name: anisole⟧\r```\r',
    '\ufeff```compound\n⟦label: 1⟧\n```',
    '  ```compound\n  ⟦label: 1⟧\n ⟦name: x⟧\n  ⟦  y⟧\n  ```',
    '> ```compound\n>⟦label: 1⟧\n> ⟦name: x⟧\n>   ⟦  y⟧\n> ```'.replace('>   ⟦  y', '> ⟦    y'),
    '1. text\n\n   ```compound\n   ⟦label: 1⟧\n⟦⟧\n     ⟦name: x⟧\n   ```'.replace(
      '     ⟦name',
      '   ⟦  name',
    ),
    // The tab after the quote mark is a space and two columns of indentation.
    '> ```compound\n>⟦\tlabel: 1⟧\n> ```',
    '-\t```compound\n\t⟦label: 1⟧\n\t```',
    '- ```compound\n⟦\tlabel: 1⟧\n  ```',
    '```compound\n⟦a\u0000b: 😀⟧\n⟦e\u0301: x⟧\n```',
  ])('lines of %j', (source) => {
    expect(lineMarks(marked(source).text)).toBe(source);
  });
});

describe('how a block ends', () => {
  it.each([
    ['```compound\nlabel: 1', false],
    ['```compound\nlabel: 1\n~~~\n', false],
    ['````compound\nlabel: 1\n```\n', false],
    ['> ```compound\n> label: 1\n\n```', false],
    ['> ```compound\n>', false],
    ['```compound\n\n```', true],
    ['```compound\nlabel: 1\n``` x\n', false],
    ['```compound\nlabel: 1\n```', true],
    ['```compound\nlabel: 1\n   `````  \n', true],
  ])('%j', (text, closed) => {
    expect(findBlocks(text)[0]?.closed).toBe(closed);
  });
});

describe('how a line is added', () => {
  it.each([
    ['```compound\nlabel: 1\n```', '', '\n'],
    ['> > ```compound\r\n> > label: 1\r\n> > ```', '> > ', '\r\n'],
    ['1. ```compound\n   label: 1\n   ```', '   ', '\n'],
    ['> - ```compound\n>   ```', '>   ', '\n'],
    ['  ```compound\r  ```', '  ', '\r'],
    ['\ufeff```compound', '', '\n'],
    ['> ```compound\n>\n> label: 1\n> ```', '> ', '\n'],
  ])('%j', (text, linePrefix, lineBreak) => {
    expect(findBlocks(text)[0]?.layout).toMatchObject({ linePrefix, lineBreak });
  });
});

it('takes deep and long documents', () => {
  const depth = 20_000;
  for (const text of [
    '> '.repeat(depth),
    `${'- '.repeat(depth)}x\n${'\n'.repeat(depth)}`,
    `${'> '.repeat(depth)}\n${'> '.repeat(depth)}`,
    '[a]: /u\n'.repeat(depth),
    '['.repeat(depth) + '\n===\n',
    `<a${' b'.repeat(depth)}\n`,
    '1) '.repeat(depth),
  ]) {
    expect(findBlocks(`${text}\n\n\n\`\`\`compound\nlabel: 1\n`).length).toBeLessThan(2);
  }
});

describe('reading a document in pieces', () => {
  const line = fc.constantFrom(
    '# heading',
    '#hash',
    '   ## indented heading',
    '###### deep',
    '```compound',
    '```',
    '~~~ reaction',
    '~~~',
    '```js',
    'label: 4',
    '> ```compound',
    '- ```compound',
    '  # in the list',
    '<!-- remark',
    '-->',
    '<div>',
    '<pre>',
    '</pre>',
    '<?x',
    'text',
    '',
    '',
  );
  const documents = fc
    .tuple(
      fc.array(line, { maxLength: 14 }),
      fc.constantFrom('\n', '\r\n', '\r'),
      fc.constantFrom('', '\ufeff'),
    )
    .map(([lines, lineBreak, mark]) => mark + lines.join(lineBreak));

  const places = ({ blocks }: MarkdownPage) =>
    blocks.map(({ range, lines, closed }) => ({ start: range.start, end: range.end, lines, closed }));

  it('finds what reading it whole finds', () => {
    fc.assert(
      fc.property(documents, (text) => {
        const whole = findFences(text)
          .fences.filter(({ infoStart, infoEnd }) => /compound|reaction/.test(text.slice(infoStart, infoEnd)))
          .map(({ start, end, lines, closed }) => ({ start, end, lines, closed }));
        expect(places(parseMarkdown(text))).toEqual(whole);
      }),
      { seed: 12, numRuns: 3000 },
    );
  });

  it('does not depend on what was read before', () => {
    fc.assert(
      fc.property(fc.array(documents, { minLength: 2, maxLength: 4 }), (texts) => {
        let page: MarkdownPage | undefined;
        for (const text of texts) {
          page = parseMarkdown(text, page);
          expect(page).toEqual(parseMarkdown(text));
        }
      }),
      { seed: 13, numRuns: 500 },
    );
  });

  it('parses only the piece that an edit is in', () => {
    const pieces = [
      '# a\n```compound\nlabel: 1\n```\n',
      '# b\n```compound\nlabel: 2\n```\n',
      '# c\n~~~\n~~~\n',
    ];
    const before = parseMarkdown(pieces.join(''));
    const after = parseMarkdown(`${pieces[0]!}# b\n\n${pieces[1]!}${pieces[2]!}`, before);
    for (const piece of pieces) expect(after.pieces.get(piece)).toBe(before.pieces.get(piece));
  });
});

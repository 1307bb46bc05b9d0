/**
 * Fenced code blocks against the CommonMark specification and against another parser.
 *
 * The examples are those of the CommonMark Spec 0.31.2 (2024-01-28, https://spec.commonmark.org/0.31.2/) that have
 * a fence in them, with their numbers; the content is what the specification's HTML shows.
 */
import fc from 'fast-check';
import { createRequire } from 'node:module';
import { describe, expect, it } from 'vitest';
import { findFences } from '../../server/notebook/fences.ts';

const examples: readonly [number, string, readonly string[]][] = [
  [19, '~~~\n\\[\\]\n~~~\n', ['\\[\\]\n']],
  [24, '``` foo\\+bar\nfoo\n```\n', ['foo\n']],
  [34, '``` f&ouml;&ouml;\nfoo\n```\n', ['foo\n']],
  [119, '```\n<\n >\n```\n', ['<\n >\n']],
  [120, '~~~\n<\n >\n~~~\n', ['<\n >\n']],
  [122, '```\naaa\n~~~\n```\n', ['aaa\n~~~\n']],
  [123, '~~~\naaa\n```\n~~~\n', ['aaa\n```\n']],
  [124, '````\naaa\n```\n``````\n', ['aaa\n```\n']],
  [125, '~~~~\naaa\n~~~\n~~~~\n', ['aaa\n~~~\n']],
  [126, '```\n', ['']],
  [127, '`````\n\n```\naaa\n', ['\n```\naaa\n']],
  [128, '> ```\n> aaa\n\nbbb\n', ['aaa\n']],
  [129, '```\n\n  \n```\n', ['\n  \n']],
  [130, '```\n```\n', ['']],
  [131, ' ```\n aaa\naaa\n```\n', ['aaa\naaa\n']],
  [132, '  ```\naaa\n  aaa\naaa\n  ```\n', ['aaa\naaa\naaa\n']],
  [133, '   ```\n   aaa\n    aaa\n  aaa\n   ```\n', ['aaa\n aaa\naaa\n']],
  [134, '    ```\n    aaa\n    ```\n', []],
  [135, '```\naaa\n  ```\n', ['aaa\n']],
  [136, '   ```\naaa\n  ```\n', ['aaa\n']],
  [137, '```\naaa\n    ```\n', ['aaa\n    ```\n']],
  [138, '``` ```\naaa\n', []],
  [139, '~~~~~~\naaa\n~~~ ~~\n', ['aaa\n~~~ ~~\n']],
  [140, 'foo\n```\nbar\n```\nbaz\n', ['bar\n']],
  [141, 'foo\n---\n~~~\nbar\n~~~\n# baz\n', ['bar\n']],
  [142, '```ruby\ndef foo(x)\n  return 3\nend\n```\n', ['def foo(x)\n  return 3\nend\n']],
  [
    143,
    '~~~~    ruby startline=3 $%@#$\ndef foo(x)\n  return 3\nend\n~~~~~~~\n',
    ['def foo(x)\n  return 3\nend\n'],
  ],
  [144, '````;\n````\n', ['']],
  [145, '``` aa ```\nfoo\n', []],
  [146, '~~~ aa ``` ~~~\nfoo\n~~~\n', ['foo\n']],
  [147, '```\n``` aaa\n```\n', ['``` aaa\n']],
  [161, '<div></div>\n``` c\nint x = 33;\n```\n', []],
  [212, '```\n[foo]: /url\n```\n\n[foo]\n', ['[foo]: /url\n']],
  [237, '> ```\nfoo\n```\n', ['', '']],
  [263, '1.  foo\n\n    ```\n    bar\n    ```\n\n    baz\n\n    > bam\n', ['bar\n']],
  [278, '-\n  foo\n-\n  ```\n  bar\n  ```\n-\n      baz\n', ['bar\n']],
  [318, '- a\n- ```\n  b\n\n\n  ```\n- c\n', ['b\n\n\n']],
  [321, '- a\n  > b\n  ```\n  c\n  ```\n- d\n', ['c\n']],
  [324, '1. ```\n   foo\n   ```\n\n   bar\n', ['foo\n']],
  [347, '```foo``\n', []],
];

/** The content as the specification shows it: every line with its line break. */
function contents(text: string): string[] {
  return findFences(text).map(({ lines }) => lines.map((line) => `${line.text}\n`).join(''));
}

describe('examples of the CommonMark specification', () => {
  it.each(examples)('%i: %j', (_number, text, expected) => {
    // Example 237: the quote ends before any line of its block's content.
    expect(contents(text)).toEqual(expected);
  });

  it.each(examples)('%i with carriage returns', (_number, text, expected) => {
    expect(contents(text.replaceAll('\n', '\r\n'))).toEqual(expected);
    expect(contents(text.replaceAll('\n', '\r'))).toEqual(expected);
  });
});

interface MarkdownItToken {
  readonly type: string;
  readonly map: readonly [number, number];
  readonly info: string;
  readonly content: string;
}
interface MarkdownIt {
  parse(text: string, environment: object): MarkdownItToken[];
}
const createMarkdownIt = createRequire(import.meta.url)('markdown-it') as (
  preset: string,
  options: object,
) => MarkdownIt;

/**
 * Left out, because markdown-it 14 departs from the specification there (the reference implementation
 * commonmark.js 0.31.2 agrees with us, also in what is left out here): quote marks indented by four columns, tabs
 * between a marker and its content, link reference definitions right before a list, and paragraphs in list items
 * whose lazy lines are indented by four columns or more.
 */
const beginnings = ['', '', '', ' ', '  ', '   ', '> ', '>', '- ', '* ', '1. ', '2) ', '> > ', '10. '];
const rests = [
  '```compound',
  '```',
  '~~~',
  '~~~ reaction of an ester',
  '````compound',
  'label: 4',
  'text',
  '# heading',
  '---',
  '===',
  '<div>',
  '</div>',
  '<!-- remark',
  '-->',
  '<x>',
  '<a href="b">',
  '<!doctype x',
  '<pre>',
  '',
  '',
  '-',
  '1.',
  '* * *',
  '``',
  '``` a` b',
  '    indented',
];
const line = fc
  .tuple(fc.constantFrom(...beginnings), fc.constantFrom(...beginnings), fc.constantFrom(...rests))
  .map((parts) => parts.join(''))
  .filter((text) => !/^ {4}/.test(text) && !/[-*.)>] {4,}/.test(text));
const documents = fc
  .tuple(fc.array(line, { minLength: 1, maxLength: 9 }), fc.constantFrom('\n', '\r\n', '\r'))
  .map(([lines, lineBreak]) => lines.map((each) => each + lineBreak).join(''))
  .filter((text) => !/(^|[\r\n])[ >]*( {4})/.test(text));

/** White space at either end of a line means nothing in a block; markdown-it expands what is left of a tab. */
function bare(content: string): string {
  return content
    .split('\n')
    .map((each) => each.trim())
    .join('\n')
    .trimEnd();
}

it('finds the same blocks as markdown-it in arbitrary documents', () => {
  const markdownIt = createMarkdownIt('commonmark', { maxNesting: 1000 });
  fc.assert(
    fc.property(documents, (text) => {
      const theirs = markdownIt
        .parse(text, {})
        .filter(({ type }) => type === 'fence')
        .map(({ map, info, content }) => ({ line: map[0], info: info.trim(), content: bare(content) }));
      const ours = findFences(text).map(({ start, infoStart, infoEnd, lines }) => ({
        line: text.slice(0, start).split(/\r\n?|\n/).length - 1,
        info: text.slice(infoStart, infoEnd).trim(),
        content: bare(lines.map((each) => each.text).join('\n')),
      }));
      expect(ours).toEqual(theirs);
    }),
    { seed: 31, numRuns: 5000 },
  );
});

/**
 * Fenced code blocks against the CommonMark specification, and their places against the parser's own account.
 *
 * The examples are those of the CommonMark Spec 0.31.2 (2024-01-28, https://spec.commonmark.org/0.31.2/) that have
 * a fence in them, with their numbers; the content is what the specification's HTML shows.
 */
import fc from 'fast-check';
import MarkdownIt from 'markdown-it';
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
  return findFences(text).fences.map(({ lines }) => lines.map((line) => `${line.text}\n`).join(''));
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

/** Documents of fences, containers and what can hide a fence, with each kind of line break. */
const beginnings = [
  '',
  '',
  '',
  ' ',
  '  ',
  '   ',
  '> ',
  '>',
  '- ',
  '* ',
  '1. ',
  '2) ',
  '> > ',
  '10. ',
  '\t',
  '>\t',
];
const rests = [
  '```compound',
  '```',
  '~~~',
  '~~~ reaction of an ester',
  '````compound',
  'label: 4',
  '  more',
  '\tmore',
  '\u0000',
  '# heading',
  '---',
  '<div>',
  '<!-- remark',
  '-->',
  '',
  '',
  ' ',
  '-',
  '    indented',
];
const line = fc
  .tuple(fc.constantFrom(...beginnings), fc.constantFrom(...beginnings), fc.constantFrom(...rests))
  .map((parts) => parts.join(''));
const documents = fc
  .tuple(fc.array(line, { minLength: 1, maxLength: 9 }), fc.constantFrom('\n', '\r\n', '\r'))
  .map(([lines, lineBreak]) => lines.join(lineBreak));

it('traces every line of content back to its own characters', () => {
  const markdownIt = new MarkdownIt('commonmark', { maxNesting: 100 });
  /** White space at the ends means nothing in a block, and what is left of a tab comes back as spaces. */
  const bare = (content: string) => content.split('\n').map((each) => each.trim().replaceAll('\0', '\ufffd'));
  fc.assert(
    fc.property(documents, (text) => {
      const theirs = markdownIt.parse(text, {}).filter(({ type }) => type === 'fence');
      const ours = findFences(text).fences;
      expect(ours.map(({ lines }) => lines.map((each) => bare(each.text)[0]))).toEqual(
        theirs.map(({ content }) => (content === '' ? [] : bare(content.replace(/\n$/, '')))),
      );
      for (const { start, infoStart, end, lines, closed } of ours) {
        expect(text.slice(start, infoStart)).toMatch(/^(?:`{3,}|~{3,})$/);
        for (const { text: own, offset } of lines) {
          expect(text.slice(offset, offset + own.length)).toBe(own);
          expect(offset + own.length).toBeLessThanOrEqual(end);
        }
        if (closed) expect(text.slice(0, end).endsWith(text.slice(start, infoStart))).toBe(true);
      }
    }),
    { seed: 31, numRuns: 3000 },
  );
});

import { describe, expect, it } from 'vitest';
import { code, escaped, picture, table } from '../../../server/language/markdown.ts';

describe('notebook text in Markdown', () => {
  it('leaves names alone and disarms what would act', () => {
    expect(escaped('(2R,3S)-1-(4-methoxyphenyl)butan-2-ol')).toBe('(2R,3S)-1-(4-methoxyphenyl)butan-2-ol');
    expect(escaped("2,2'-bipyridine; 3.5 g")).toBe("2,2'-bipyridine; 3.5 g");
    expect(escaped('[x](command:evil) <img src=a>')).toBe('\\[x\\](command:evil) &lt;img src=a&gt;');
    expect(escaped('![](http://a.b/c)')).toBe('\\!\\[\\](http\\://a.b/c)');
    expect(escaped('a\n# b | `c` &amp; www.x.y a@b.c')).toBe(
      'a \\# b \\| \\`c\\` &amp;amp; www\\.x.y a\\@b.c',
    );
    expect(escaped('1. item')).toBe('1\\. item');
    expect(escaped('- item')).toBe('\\- item');
  });

  it('puts any text into code', () => {
    expect(code('C1CC1')).toBe('`C1CC1`');
    expect(code('a`b``c')).toBe('```a`b``c```');
    expect(code('`')).toBe('`` ` ``');
    expect(code('a|b\nc')).toBe('`a\\|b c`');
  });

  it('carries a picture with its size', () => {
    const markdown = picture('<svg width="120" height="4"/>', 'ethanol [x]');
    expect(markdown).toMatch(
      /^!\[ethanol \\\[x\\\]\]\(data:image\/svg\+xml;base64,[A-Za-z0-9+/=]+\|width=120\)$/,
    );
  });

  it('makes a table of rows', () => {
    expect(table([['a', 'b']])).toBe('| | |\n|:--|:--|\n| a | b |');
  });
});

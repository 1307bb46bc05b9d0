import { describe, expect, it } from 'vitest';
import { readFields } from '../../../server/notebook/fields.ts';
import { findBlocks } from '../../../server/notebook/markdown.ts';
import type { TextRange } from '../../../server/chemistry/text.ts';
import { marked, withMarks } from './marked.ts';

function fieldsOf(text: string) {
  return findBlocks(text).flatMap((block) => readFields(block).fields);
}

/** Where keys, values and items lie. */
function fieldMarks(text: string): string {
  const ranges = fieldsOf(text).flatMap(({ keyRange, value, items }): TextRange[] => [
    keyRange,
    ...(value.text === '' ? [] : [value.range]),
    ...items.map((item) => item.range),
  ]);
  return withMarks(text, ranges);
}

describe('places of keys, values and items', () => {
  it.each([
    '```compound\n⟦label⟧: ⟦4⟧\n⟦ Molar  mass ⟧:⟦152.19 g/mol⟧\n```'.replace(
      '⟦ Molar  mass ⟧',
      '⟦Molar  mass⟧ ',
    ),
    '```compound\n⟦name⟧:⟦a: b: c⟧  \n⟦SMILES⟧:\t⟦C#N⟧\n```',
    '```compound\n⟦1H NMR⟧: ⟦(CDCl3) δ 7.30,\n\t4.85,\n  3.80⟧\n\n// ⟦x⟧: no\n⟦mp⟧: ⟦36 °C⟧\n```'.replace(
      '⟦x⟧',
      'x',
    ),
    '```reaction\n⟦charged⟧:\n  - ⟦3: 1.50 g,\n    9.99 mmol⟧\n  - ⟦NaBH4: 378 mg⟧\n⟦obtained⟧:\n  -\t⟦4⟧\n```',
    '```reaction\n⟦charged⟧:\n- ⟦3: 1.50 g⟧\n- ⟦4: 2 g⟧\n```',
    '> - ```reaction\n>   ⟦charged⟧:\n>     - ⟦3: 1.50 g,\n>       9.99 mmol⟧\n>   ⟦label⟧: ⟦R-1⟧\n>   ```',
    '```compound\n  ⟦label⟧: ⟦4⟧\n  ⟦name⟧: ⟦anisole\n    again⟧\n```',
    '```compound\r\n⟦name⟧: ⟦a\r\n  b⟧\r\n```',
    '\ufeff```compound\n⟦name⟧: ⟦e\u0301 😀⟧\n```',
    '```compound\n⟦bp⟧:\u00a0⟦95\u202f°C⟧\u2009\n```',
  ])('%j', (source) => {
    expect(fieldMarks(marked(source).text)).toBe(source);
  });
});

describe('values', () => {
  it('joins continuation lines by one space and leads back to each', () => {
    const { text, ranges } = marked('> ```compound\n> name: ethyl⟦⟧\n>   ⟦acetate⟧ \n>\n>   pure\n> ```');
    const [field] = fieldsOf(text);
    expect(field?.value.text).toBe('ethyl acetate pure');
    expect(field?.value.toDocument({ start: 6, end: 13 })).toEqual(ranges[1]);
    // The joining space stands nowhere in the document: it is the end of the line before.
    expect(field?.value.toDocument({ start: 5, end: 6 })).toEqual(ranges[0]);
  });

  it('begins on a later line when nothing stands after the colon', () => {
    const { text, ranges } = marked('```compound\nname:\n  ⟦anisole⟧\n```');
    expect(fieldsOf(text)[0]?.value).toMatchObject({ text: 'anisole', range: ranges[0] });
  });

  it('is empty right after the colon when there is none', () => {
    const { text, ranges } = marked('```compound\nname:⟦⟧ \n```');
    expect(fieldsOf(text)[0]?.value).toMatchObject({ text: '', range: ranges[0] });
  });
});

describe('what is neither field nor comment', () => {
  it.each([
    '```compound\n⟦anisole, pure⟧\nlabel: 1\n```',
    '```compound\nlabel: 1\n⟦anisole⟧\n```',
    '```compound\n⟦- anisole⟧\nlabel: 1\n```',
    '```compound\n  ⟦anisole⟧\nlabel: 1\n```',
    '```compound\n⟦anisole\n  and more⟧\nlabel: 1\n```',
    '```compound\n⟦: 4⟧\n```',
  ])('is one problem: %j', (source) => {
    const { text, ranges } = marked(source);
    const problems = findBlocks(text).flatMap((block) => readFields(block).problems);
    expect(problems.map(({ check, range }) => ({ check, range }))).toEqual([
      { check: 'bad-value', range: ranges[0] },
    ]);
  });

  it('reads an item that is not indented, and says so', () => {
    const { text, ranges } = marked('```reaction\ncharged:\n⟦-⟧ 3: 1 g\n```');
    const [block] = findBlocks(text);
    expect(readFields(block!).problems).toMatchObject([{ check: 'bad-value', range: ranges[0] }]);
  });
});

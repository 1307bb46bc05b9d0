/** What holds for every document, sound or not. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { TextRange } from '../../../server/chemistry/text.ts';
import { findBlocks } from '../../../server/notebook/markdown.ts';
import type { Entry, MappedText } from '../../../server/notebook/model.ts';
import { entriesOf } from './readers.ts';

const line = fc.oneof(
  {
    weight: 3,
    arbitrary: fc.constantFrom('', '```', '~~~', '// x', '  more', '- item', '  - 3: 1,5 g', 'stray'),
  },
  {
    weight: 4,
    arbitrary: fc.constantFrom(
      'label: 4',
      'name: 1-(4-methoxyphenyl)ethan-1-ol',
      'synonyms: a; b;; c',
      'SMILES: COc1ccc',
      'formula: C9H1',
      'molar mass: 152,19',
      'exact mass: 1,234',
      'InChI: InChI=1S/C7H8O/c1-8',
      'InChIKey: RDOXTESZEPMUJZ-UHFFFAOYSA',
      'CAS RN: 100-66-3',
      'isomers: racemat',
      'allow: x y',
      'allow:',
      'charged:',
      'obtained: 4: 1.2 g',
      ': x',
      'formla\u00a0: C7',
    ),
  },
  { weight: 2, arbitrary: fc.string({ unit: 'binary', maxLength: 12 }) },
  {
    weight: 2,
    arbitrary: fc
      .tuple(
        fc.constantFrom(
          'label',
          'name',
          'SMILES',
          'formula',
          'molar mass',
          'InChI',
          'InChIKey',
          'CAS',
          'allow',
        ),
        fc.string({ unit: 'grapheme', maxLength: 15 }),
      )
      .map(([key, value]) => `${key}: ${value}`),
  },
);
const documents = fc
  .record({
    kind: fc.constantFrom('compound', 'reaction'),
    lines: fc.array(line, { maxLength: 10 }),
    prefix: fc.constantFrom('', '> ', '>', '  ', '\t', '- '),
    rest: fc.constantFrom('', '> ', '>', '  ', '\t'),
    lineBreak: fc.constantFrom('\n', '\r\n', '\r'),
    before: fc.constantFrom('', '\ufeff', 'text\n\n', '1. x\n'),
  })
  .map(({ kind, lines, prefix, rest, lineBreak, before }) =>
    [`${before}${prefix}\`\`\`${kind}`, ...lines.map((each) => rest + each), `${rest}\`\`\``].join(lineBreak),
  );

function mappedTexts(entry: Entry): MappedText[] {
  const fields = entry.fields.flatMap(({ value, items }) => [value, ...items]);
  if (entry.kind === 'reaction') {
    const items = [...entry.charged, ...entry.obtained];
    return [...fields, ...items.flatMap(({ what, rest }) => (rest === undefined ? [what] : [what, rest]))];
  }
  const { label, name, synonyms, formula, smiles, inchi, inchiKey, cas, isomers, molarMass, exactMass } =
    entry;
  const values = [
    label,
    name,
    ...synonyms,
    formula,
    smiles,
    inchi,
    inchiKey,
    cas,
    isomers,
    molarMass,
    exactMass,
  ];
  return [...fields, ...values.flatMap((value) => value?.text ?? [])];
}

function allRanges(entry: Entry): TextRange[] {
  return [
    entry.block.range,
    entry.block.kindRange,
    ...entry.block.lines.map(({ text, offset }) => ({ start: offset, end: offset + text.length })),
    ...entry.fields.flatMap(({ range, keyRange }) => [range, keyRange]),
    ...entry.allow.map(({ checkIdRange }) => checkIdRange),
    ...entry.problems.flatMap(({ range, fixes }) => [
      range,
      ...(fixes ?? []).flatMap(({ edits }) => edits.map((edit) => edit.range)),
    ]),
    ...mappedTexts(entry).map(({ range }) => range),
  ];
}

const settings = { seed: 4, numRuns: 700 };

describe('any document', () => {
  it('is read without an exception, all ranges inside it and inside their block', () => {
    fc.assert(
      fc.property(documents, (text) => {
        for (const entry of entriesOf(text)) {
          for (const { start, end } of allRanges(entry)) {
            expect(start).toBeGreaterThanOrEqual(entry.block.range.start);
            expect(end).toBeGreaterThanOrEqual(start);
            expect(end).toBeLessThanOrEqual(Math.max(entry.block.range.end, text.length));
          }
        }
      }),
      settings,
    );
  });

  it('has nothing but what stands in it: lines, keys and one-line values are its own characters', () => {
    fc.assert(
      fc.property(documents, (text) => {
        for (const { block, fields } of entriesOf(text)) {
          for (const { text: own, offset } of block.lines) {
            expect(text.slice(offset, offset + own.length)).toBe(own);
          }
          for (const { keyText, keyRange, value, items } of fields) {
            expect(text.slice(keyRange.start, keyRange.end)).toBe(keyText);
            for (const part of [value, ...items]) {
              const there = text.slice(part.range.start, part.range.end);
              if (!/[\r\n]/.test(there)) expect(there).toBe(part.text);
              for (let at = 0; at < part.text.length; at++) {
                const { start, end } = part.toDocument({ start: at, end: at + 1 });
                if (end > start) expect(text.slice(start, end)).toBe(part.text[at]);
              }
            }
          }
        }
      }),
      settings,
    );
  });

  it('has fields that do not overlap, in order', () => {
    fc.assert(
      fc.property(documents, (text) => {
        for (const { fields } of entriesOf(text)) {
          let at = -1;
          for (const { range, keyRange } of fields) {
            expect(range.start).toBe(keyRange.start);
            expect(range.start).toBeGreaterThan(at);
            at = range.end;
          }
        }
      }),
      settings,
    );
  });

  it('loses no line: each is blank, a comment, in a field, or in a problem', () => {
    fc.assert(
      fc.property(documents, (text) => {
        for (const { block, fields, problems } of entriesOf(text)) {
          const covered = [...fields, ...problems].map(({ range }) => range);
          for (const { text: own, offset } of block.lines) {
            const content = own.trim();
            if (content === '' || content.startsWith('//')) continue;
            // A list item may hold nothing but its mark.
            if (content === '-') continue;
            const start = offset + own.indexOf(content);
            const inside = covered.some((range) => range.start <= start + 2 && start < range.end);
            expect(inside, `${JSON.stringify(own)} in ${JSON.stringify(text)}`).toBe(true);
          }
        }
      }),
      settings,
    );
  });

  it('reads the same with other line breaks and behind a byte order mark', () => {
    const shape = (text: string) =>
      entriesOf(text).map((entry) => [
        entry.kind,
        entry.block.text,
        entry.fields.map(({ key, keyText, value, items }) => [
          key,
          keyText,
          value.text,
          items.map((item) => item.text),
        ]),
        entry.problems.map(({ check, message }) => [check, message]),
      ]);
    fc.assert(
      fc.property(documents, (document) => {
        const text = document.replace(/^\ufeff/, '').replace(/\r\n?/g, '\n');
        expect(shape(text.replaceAll('\n', '\r\n'))).toEqual(shape(text));
        expect(shape(text.replaceAll('\n', '\r'))).toEqual(shape(text));
        expect(shape(`\ufeff${text}`)).toEqual(shape(text));
      }),
      settings,
    );
  });

  it('takes arbitrary text', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 400 }), (text) => {
        findBlocks(text);
        entriesOf(`\`\`\`compound\n${text}`);
        entriesOf(`\`\`\`reaction\n${text}`);
      }),
      settings,
    );
  });

  it('takes very long lines', () => {
    const long = 100_000;
    for (const value of ['(', '9', '1,', ' ', '- ', ': ', 'a: ', 'C', '[', '±', '1 – ']) {
      const repeated = value.repeat(long / value.length);
      for (const key of [
        'name',
        'SMILES',
        'formula',
        'molar mass',
        'InChI',
        'InChIKey',
        'CAS',
        'isomers',
        'allow',
      ]) {
        entriesOf(`\`\`\`compound\n${key}: ${repeated}x\n`);
      }
      entriesOf(`\`\`\`reaction\ncharged:\n  - ${repeated}\n  - ${repeated}x: 1\nscheme: ${repeated}`);
      entriesOf(`\`\`\`compound\n${repeated}\n${repeated}: x`);
    }
  });
});

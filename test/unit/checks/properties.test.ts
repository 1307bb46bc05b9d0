/** Any text is survived; ranges stay inside; the same text gives the same findings. */
import fc from 'fast-check';
import { describe, expect, it, test } from 'vitest';
import type { StructureFacts, ToolkitFactsOf } from '../../../server/checks/facts.ts';
import type { Finding } from '../../../server/checks/finding.ts';
import { analyse } from '../../../server/checks/run.ts';
import { defaultSettings } from '../../../server/checks/settings.ts';
import { findingsWithToolkit } from '../../support/analyse-text.ts';
import { readDocument } from '../../support/read-document.ts';

const strange: StructureFacts = { smiles: '', inchi: 'InChI=1S//', inchiKey: 'X' };
const answers: readonly ToolkitFactsOf[] = [() => 'unavailable', () => 'pending', () => strange];

function expectSound(text: string): void {
  for (const toolkit of answers) {
    const { findings } = analyse(readDocument(text), defaultSettings, toolkit);
    for (const finding of findings) expectInside(finding, text.length);
    expect(findings.filter((finding) => finding.message.includes('broke down'))).toEqual([]);
    expect(analyse(readDocument(text), defaultSettings, toolkit).findings).toEqual(findings);
  }
}

function expectInside({ range, fixes, related }: Finding, length: number): void {
  const ranges = [range, ...fixes.flatMap((fix) => fix.edits.map((edit) => edit.range))];
  for (const { start, end } of [...ranges, ...related.map((place) => place.range)]) {
    expect(start).toBeGreaterThanOrEqual(0);
    expect(end).toBeGreaterThanOrEqual(start);
    expect(end).toBeLessThanOrEqual(length);
  }
}

const key = fc.constantFrom(
  ...['label', 'name', 'formula', 'SMILES', 'InChI', 'InChIKey', 'CAS RN', 'isomers', 'molar mass', 'MW'],
  ...['exact mass', 'allow', 'synonyms', 'formla', 'notes', ''],
);
const value = fc.oneof(
  fc.constantFrom(
    'C9H12O2',
    'C2H6O',
    'CCO',
    'C[C@@H](O)F',
    'C/C=C\\C',
    '[Na+].[Cl-]',
    'butan-2-ol',
    'racemate',
  ),
  fc.constantFrom(
    'chlorotoluene',
    '152.19 g/mol',
    '1,5',
    '58-08-2',
    'mixture 3:1',
    'C(C)(C)(C)(C)C',
    'CuSO4·5H2O',
  ),
  fc.constantFrom(
    'name-ambiguous (so it is)',
    'InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3',
    'LFQSCWFLJHTTHZ-UHFFFAOYSA-N',
  ),
  fc.string({ maxLength: 20 }),
  fc.stringMatching(/^[CNOcn()[\]@/\\=#%0-9+\-.H*]{0,20}$/),
  fc.stringMatching(/^[CHNOSKabcelr0-9()·.,+\-^]{0,12}$/),
);
const line = fc.oneof(
  { weight: 6, arbitrary: fc.tuple(key, value).map(([name, text]) => `${name}: ${text}`) },
  { weight: 1, arbitrary: value.map((text) => `  ${text}`) },
  { weight: 1, arbitrary: value.map((text) => `  - ${text}`) },
);
const page = fc
  .tuple(
    fc.constantFrom('', '> ', '   ', '1. '),
    fc.constantFrom('\n', '\r\n'),
    fc.array(fc.array(line, { maxLength: 8 }), { maxLength: 3 }),
  )
  .map(([prefix, end, blocks]) =>
    blocks
      .flatMap((lines) => ['```compound', ...lines, '```', '', 'text', ''])
      .map((each, index) => (prefix === '1. ' && index > 0 ? `   ${each}` : `${prefix}${each}`))
      .join(end),
  );

test('arbitrary text', () => {
  fc.assert(fc.property(fc.string({ maxLength: 200 }), expectSound), { seed: 20260101, numRuns: 200 });
});

test('arbitrary blocks', () => {
  fc.assert(fc.property(page, expectSound), { seed: 20260102, numRuns: 400 });
});

/** Every text that differs from `value` in one digit, with the position and the size of the change. */
function digitChanges(value: string): { text: string; at: number; change: number }[] {
  return [...value].flatMap((character, at) =>
    /\d/.test(character)
      ? [...'0123456789']
          .filter((digit) => digit !== character)
          .map((digit) => ({
            text: value.slice(0, at) + digit + value.slice(at + 1),
            at,
            change: Math.abs(Number(digit) - Number(character)),
          }))
      : [],
  );
}

describe('one changed character in a sound block', () => {
  const sound = (
    fields: Partial<Record<'formula' | 'molar mass' | 'exact mass' | 'InChIKey' | 'CAS RN', string>>,
  ) =>
    [
      '```compound',
      'SMILES: COc1ccc(cc1)C(C)O',
      'isomers: racemate',
      ...Object.entries({
        formula: 'C9H12O2',
        'molar mass': '152.19 g/mol',
        'exact mass': '152.0837',
        InChIKey: 'IUUULXXWNYKJSL-UHFFFAOYSA-N',
        'CAS RN': '3319-15-1',
        ...fields,
      }).map(([name, text]) => `${name}: ${text}`),
      '```',
    ].join('\n');
  const idsOf = async (text: string) => [
    ...new Set((await findingsWithToolkit(text)).map(({ check }) => check)),
  ];

  it('none: no finding', async () => {
    expect(await idsOf(sound({}))).toEqual([]);
  });

  it.each(digitChanges('C9H12O2').map(({ text }) => text))('formula %s', async (formula) => {
    const ids = await idsOf(sound({ formula }));
    // A count of nothing cannot be read as a formula at all.
    expect(ids.filter((id) => id !== 'formula-impossible')).toEqual([
      /[A-Z]0(?!\d)/.test(formula) ? 'formula-syntax' : 'formula-mismatch',
    ]);
  });

  it.each(digitChanges('152.19').filter(({ at, change }) => at < 5 || change > 3))(
    'molar mass $text',
    async ({ text }) => {
      expect(await idsOf(sound({ 'molar mass': `${text} g/mol` }))).toEqual(['molar-mass-mismatch']);
    },
  );

  it.each(digitChanges('152.0837').filter(({ at, change }) => at < 7 || change > 2))(
    'exact mass $text',
    async ({ text }) => {
      expect(await idsOf(sound({ 'exact mass': text }))).toEqual(['exact-mass-mismatch']);
    },
  );

  it.each([0, 5, 13, 15, 20, 22])('InChIKey, letter %i', async (at) => {
    const key = 'IUUULXXWNYKJSL-UHFFFAOYSA-N';
    const other = key[at] === 'Q' ? 'Z' : 'Q';
    const ids = await idsOf(sound({ InChIKey: key.slice(0, at) + other + key.slice(at + 1) }));
    expect(ids).toEqual(['inchikey-mismatch']);
  });

  // The digits are weighted 6 to 1 from the left: a change of five goes unseen where the weight is even, and
  // an even one where the weight is five. That is what a check digit can do.
  it.each(
    digitChanges('3319-15-1').filter(
      ({ at, change }) => !(change === 5 && [0, 2, 5].includes(at)) && !(change % 2 === 0 && at === 1),
    ),
  )('CAS RN $text', async ({ text }) => {
    expect(await idsOf(sound({ 'CAS RN': text }))).toEqual(['cas-check-digit']);
  });
});

import { describe, expect, it } from 'vitest';
import type { TextRange } from '../../../server/chemistry/text.ts';
import { compoundOf, entriesOf, problemsOf, reactionOf } from './readers.ts';
import { marked } from './marked.ts';

const block = (...lines: string[]) => ['```compound', ...lines, '```'].join('\n');
const reaction = (...lines: string[]) => ['```reaction', ...lines, '```'].join('\n');

describe('values of a compound', () => {
  it('reads every field that has a reader', () => {
    const entry = compoundOf(
      'label: 4a',
      'name: anisole',
      'synonyms: methoxybenzene; phenyl methyl ether',
      '  - PhOMe',
      'formula: C7H8O',
      'SMILES: COc1cc',
      '  ccc1',
      'InChI: InChI=1S/C7H8O/c1-8-7-5-3-2-4-6-7/h2-6H,1H3',
      'InChIKey: RDOXTESZEPMUJZ-UHFFFAOYSA-N',
      'CAS RN: 100–66–3',
      'isomers: mixture (3:1)',
      'M.W.: 108.14',
      'exact mass: 108.0575',
    );
    expect(entry.problems).toEqual([]);
    expect(entry.label?.read.value).toBe('4a');
    expect(entry.name?.read.value).toMatchObject({ message: 'anisole' });
    expect(entry.synonyms.map(({ text }) => text.text)).toEqual([
      'methoxybenzene',
      'phenyl methyl ether',
      'PhOMe',
    ]);
    expect(entry.formula?.read.value?.counts).toEqual(new Map(Object.entries({ C: 7, H: 8, O: 1 })));
    expect(entry.smiles?.text.text).toBe('COc1ccccc1');
    expect(entry.smiles?.read.value?.atoms).toHaveLength(8);
    expect(entry.inchi?.read.value).toBe('InChI=1S/C7H8O/c1-8-7-5-3-2-4-6-7/h2-6H,1H3');
    expect(entry.inchiKey?.read.value).toBe('RDOXTESZEPMUJZ-UHFFFAOYSA-N');
    expect(entry.cas?.read.value).toBe('100-66-3');
    expect(entry.isomers?.read.value).toEqual({ kind: 'mixture', ratio: '3:1' });
    expect(entry.molarMass?.read.value).toMatchObject({ value: 108.14, unit: 'g/mol', decimals: 2 });
    expect(entry.exactMass?.read.value).toMatchObject({ value: 108.0575, unit: 'u', decimals: 4 });
  });

  it('keeps the place of an atom that stands on a continuation line in a quote', () => {
    const { text, ranges } = marked('> ```compound\n> SMILES: COc1cc\n>   cc⟦c⟧1\n> ```');
    const [entry] = entriesOf(text);
    if (entry?.kind !== 'compound') throw new Error('no compound');
    const atom = entry.smiles!.read.value!.atoms.at(-1)!;
    expect(entry.smiles!.text.toDocument(atom.range)).toEqual(ranges[0]);
  });
});

describe('problems of the block language, on their characters', () => {
  it.each<[string, string[]]>([
    [block(), ['empty-block: compound']],
    [block('// later'), ['empty-block: compound']],
    [block('label: 1', 'formla: C7H8O'), ['unknown-field: formla']],
    [block('name: a', 'Name: b'), ['repeated-field: Name']],
    [block('notes: a', 'notes: b', 'allow: x (y)', 'allow: z (y)'), []],
    [block('name:'), ['bad-value: name']],
    [block('name: a', '  - b'), ['bad-value: b']],
    [block('isomers: both'), ['bad-value: both']],
    [block('isomers: racemat, from the ketone'), ['bad-value: racemat,']],
    [block('molar mass: about a hundred'), ['bad-value: a hundred']],
    [block('molar mass: 152.19 mg'), ['bad-value: mg']],
    [block('CAS RN: 100-66'), ['bad-value: 100-66']],
    [block('InChIKey: rdoxteszepmujz-uhfffaoysa-n'), ['bad-value: rdoxteszepmujz-uhfffaoysa-n']],
    [block('InChIKey: RDOXTESZEPMUJ-UHFFFAOYSA-N'), ['bad-value: RDOXTESZEPMUJ']],
    [block('InChIKey: RDOXTESZEPMUJZ-UHFFFAOYSA-N-X'), ['bad-value: -X']],
    [block('InChI: C7H8O/c1-8'), ['bad-value: C7H8O/c1-']],
    [block('InChI: InChI=1S/C7H8O//h2-6H'), ['bad-value: /']],
    [block('InChI: InChI=1S/C7H8O/c1-8 /h2'), ['bad-value:  ']],
    [block('InChI: InChI=1S/C7H8O/zz'), ['bad-value: zz']],
    [block('allow: name-ambiguous'), ['allow-without-reason: name-ambiguous']],
    [block('allow: name-ambiguous ()'), ['allow-without-reason: name-ambiguous ()']],
    [block('allow: name-ambiguous on purpose'), ['allow-without-reason: name-ambiguous on purpose']],
    [block('molar mass: 108,14 g/mol'), ['decimal-comma: 108,14']],
    [block('molar mass: 1,234 g/mol'), ['decimal-comma: 1,234']],
    [block('molar mass: 1,234.5 g/mol'), []],
    [block('bp: 95 °C (1,5 mmHg)'), ['decimal-comma: 1,5']],
    [block('mp: 64,5–66,0 °C'), ['decimal-comma: 64,5', 'decimal-comma: 66,0']],
    [block('name: 1,5-dimethylnaphthalene', '1H NMR: δ 7,30 (d)'), []],
    [block('scheme: 1 -> 2'), ['unknown-field: scheme']],
    [reaction('solvent: 2,2′-bipyridine in 1,3-(x)', 'conditions: 0 °C, 2,5 h'), ['decimal-comma: 2,5']],
    [block('combustion: C, 71.03; H, 7,95'), ['decimal-comma: 7,95']],
    [
      reaction('charged:', '  - 3: 1,50 g, 9.99 mmol', '  - 1,4-dioxane: 20 mL', '  - 5: 2 g in 1,2-DCE'),
      ['decimal-comma: 1,50'],
    ],
  ])('%j', (text, expected) => {
    expect(problemsOf(text)).toEqual(expected);
  });

  it.each([
    [block('CAS RN: 1'), 'bad-value'],
    [block('molar mass: 1,2 g/mol'), 'decimal-comma'],
  ])('in CRLF and behind a byte order mark: %j', (text, check) => {
    const changed = `\ufeff${text.replaceAll('\n', '\r\n')}`;
    expect(problemsOf(changed)).toEqual(problemsOf(text));
    expect(problemsOf(changed)[0]).toContain(check);
  });
});

describe('fixes', () => {
  const fixed = (text: string, take = 0): string => {
    const fix = entriesOf(text)[0]?.problems[0]?.fixes?.[take];
    if (fix === undefined) throw new Error('no fix');
    const edits = [...fix.edits].sort((a, b) => b.range.start - a.range.start);
    return edits.reduce(
      (result, { range, newText }) => result.slice(0, range.start) + newText + result.slice(range.end),
      text,
    );
  };
  it.each([
    [block('molar mass: 108,14 g/mol'), block('molar mass: 108.14 g/mol')],
    [block('formla: CH4'), block('formula: CH4')],
    [block('1H NMR (CDCl3) δ 7.30 (s, 6H)'), block('1H NMR: (CDCl3) δ 7.30 (s, 6H)')],
    [block('Anal. Calcd for C6H6: C, 92.26'), block('Anal.: Calcd for C6H6: C, 92.26')],
    [block('mp 36–38 °C'), block('mp: 36–38 °C')],
    [block('allow: x because'), block('allow: x (because)')],
    [block('anisole'), block('notes: anisole')],
    [block('isomers: racemate2'), block('isomers: racemate')],
    [reaction('charged:', '- 3: 1 g'), reaction('charged:', '  - 3: 1 g')],
  ])('%j', (text, expected) => {
    expect(fixed(text)).toBe(expected);
    expect(problemsOf(expected)).toEqual([]);
  });

  it('offers both readings of a comma before three digits, neither as certain', () => {
    const text = block('molar mass: 1,234 g/mol');
    expect([fixed(text, 0), fixed(text, 1)]).toEqual([
      block('molar mass: 1.234 g/mol'),
      block('molar mass: 1234 g/mol'),
    ]);
    const [problem] = entriesOf(text)[0]!.problems;
    expect(problem?.fixes?.some(({ safe }) => safe)).toBe(false);
  });
});

describe('a decimal comma', () => {
  it('is read as meant where it can mean nothing else', () => {
    expect(compoundOf('molar mass: 108,14 g/mol').molarMass?.read.value).toMatchObject({ value: 108.14 });
  });

  it('is not read where it can group thousands', () => {
    expect(compoundOf('molar mass: 1,234 g/mol').molarMass?.read.value).toBeUndefined();
  });
});

describe('allow', () => {
  it('keeps id and reason', () => {
    const entry = compoundOf(
      'allow: name-ambiguous (a mixture (technical), on purpose)',
      'allow:',
      '  - x (y)',
    );
    expect(entry.allow.map(({ checkId, reason }) => [checkId, reason])).toEqual([
      ['name-ambiguous', 'a mixture (technical), on purpose'],
      ['x', 'y'],
    ]);
  });
});

describe('items of a reaction', () => {
  it.each<[string, string, string | undefined]>([
    ['3: 1.50 g, 9.99 mmol', '3', '1.50 g, 9.99 mmol'],
    ['brine: wash', 'brine', 'wash'],
    ['H2: balloon, 1 atm', 'H2', 'balloon, 1 atm'],
    ['sat. aq. NaHCO3: 20 mL (work-up)', 'sat. aq. NaHCO3', '20 mL (work-up)'],
    ['brine', 'brine', undefined],
    ['brine:', 'brine', undefined],
    ['spiro[4.5: 1]x: 2 g', 'spiro[4.5: 1]x', '2 g'],
    ['hexane/EtOAc 4:1: 200 mL', 'hexane/EtOAc 4:1', '200 mL'],
    ['1,4-dioxane:\u00a020 mL: dry', '1,4-dioxane', '20 mL: dry'],
    ['(unfinished: 2 g', '(unfinished', '2 g'],
  ])('%j', (item, what, rest) => {
    const { charged } = reactionOf('charged:', `  - ${item}`);
    expect(charged.map((each) => [each.what.text, each.rest?.text])).toEqual([[what, rest]]);
  });

  it('keeps the place of each part across continuation lines', () => {
    const { text, ranges } = marked(
      '1. ```reaction\n   obtained:\n     - ⟦LR-2⟧: ⟦1.42 g,\n       93 %⟧\n   ```',
    );
    const [entry] = entriesOf(text);
    if (entry?.kind !== 'reaction') throw new Error('no reaction');
    const [item] = entry.obtained;
    expect([item?.what.range, item?.rest?.range]).toEqual(ranges satisfies readonly TextRange[]);
    expect(item?.rest?.text).toBe('1.42 g, 93 %');
  });

  it('takes one item on the line of its key', () => {
    expect(reactionOf('obtained: 4: 1.42 g').obtained).toMatchObject([{ what: { text: '4' } }]);
  });
});

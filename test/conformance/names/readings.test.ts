/**
 * What names mean. Names with a rule number are of the kind that the rule of the IUPAC Recommendations 2013 describes;
 * structures are drawn from the name by hand. Trade names are 'common practice, no source'.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import type { UnderstoodName } from '../../../server/chemistry/nomenclature/reading.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

const canonical = (smiles: string) => canonicalSmiles(readSmiles(smiles).value!);

function understood(name: string): UnderstoodName {
  const reading = readName(name);
  if (reading.kind !== 'understood') throw new Error(`${name}: ${reading.message}`);
  return reading;
}

describe('a name with one structure', () => {
  test.each<[rule: string, name: string, smiles: string, open?: boolean]>([
    ['P-21.2.1', 'dodecane', 'CCCCCCCCCCCC'],
    ['P-29.4.1', '4-ethyl-2-methylhexane', 'CC(C)CC(CC)CC'],
    ['P-29.6.1', '4-(propan-2-yl)heptane', 'CCCC(C(C)C)CCC'],
    ['P-29.6.2.2', '4-tert-butylheptane', 'CCCC(C(C)(C)C)CCC'],
    ['P-31.1.1.2.1', 'cyclohexane', 'C1CCCCC1'],
    ['P-31.1.4.2.4', 'pent-1-ene', 'C=CCCC'],
    ['P-31.1.4.2.4', 'hex-1-en-4-yne', 'C=CCC#CC'],
    ['P-31.1.4.2.4', 'buta-1,3-diene', 'C=CC=C'],
    ['P-61.3.1', '1-bromo-4-chlorobenzene', 'Clc1ccc(Br)cc1'],
    ['P-61.3.1', '1,1,1-trichloroethane', 'CC(Cl)(Cl)Cl'],
    ['P-61.5.1', '1-nitropropane', 'CCC[N+](=O)[O-]'],
    ['P-62.2.1.1.1', '4-chloroaniline', 'Nc1ccc(Cl)cc1'],
    ['P-62.2.4.1.2', 'N,N-dimethylaniline', 'CN(C)c1ccccc1'],
    ['P-62.2.1.2.1', 'butan-2-amine', 'CCC(C)N', true],
    ['P-63.1.2', '2-methylpropan-2-ol', 'CC(C)(C)O'],
    ['P-63.1.2', 'cyclohexanol', 'OC1CCCCC1'],
    ['P-63.1.1.1', '4-methoxyphenol', 'COc1ccc(O)cc1'],
    ['P-63.2.4.1', 'methoxyethane', 'CCOC'],
    ['P-64.2.2.1', 'pentan-3-one', 'CCC(=O)CC'],
    ['P-64.3.1', 'cyclohexanone', 'O=C1CCCCC1'],
    ['P-64.2.2.1', '1-phenylethan-1-one', 'CC(=O)c1ccccc1'],
    ['P-65.1.2.2.1', 'hexanoic acid', 'CCCCCC(=O)O'],
    ['P-65.1.2.2.3', 'cyclohexanecarboxylic acid', 'OC(=O)C1CCCCC1'],
    ['P-65.1.1.1', '4-hydroxybenzoic acid', 'OC(=O)c1ccc(O)cc1'],
    ['P-65.6.3.2.1', 'ethyl acetate', 'CCOC(C)=O'],
    ['P-65.6.3.2.1', 'methyl 2-hydroxybenzoate', 'COC(=O)c1ccccc1O'],
    ['P-65.6.3.2.1', 'pentyl butanoate', 'CCCCCOC(=O)CCC'],
    ['P-66.1.1.1.1', 'N,N-dimethylformamide', 'CN(C)C=O'],
    ['P-66.1.1.3.1', 'N-phenylacetamide', 'CC(=O)Nc1ccccc1'],
    ['P-66.5.1.1', 'butanenitrile', 'CCCC#N'],
    ['P-66.6.1.1', 'pentanal', 'CCCCC=O'],
    ['P-66.6.1.1.3', 'cyclohexanecarbaldehyde', 'O=CC1CCCCC1'],
    ['P-25.2.1', 'pyridine', 'c1ccncc1'],
    ['P-25.2.1', '1H-indole', 'c1ccc2[nH]ccc2c1'],
    ['P-25.2.1', 'quinoline', 'c1ccc2ncccc2c1'],
    ['P-25.1.1', 'naphthalene', 'c1ccc2ccccc2c1'],
    ['P-25.2.1', 'furan', 'c1ccoc1'],
    ['P-22.2.2.1.1', 'oxirane', 'C1CO1'],
    ['P-22.2.2.1.1', '1,4-dioxane', 'C1COCCO1'],
    ['P-22.2.1', 'morpholine', 'C1COCCN1'],
    ['P-46.1', '1-(4-methoxyphenyl)ethan-1-ol', 'COc1ccc(cc1)C(C)O', true],
    ['P-23.2.3', 'bicyclo[2.2.1]heptane', 'C1CC2CCC1C2'],
    ['common practice', 'acetone', 'CC(C)=O'],
    ['common practice', 'isopropyl alcohol', 'CC(C)O'],
    ['common practice', 'tert-butyl methyl ether', 'COC(C)(C)C'],
    ['common practice', 'o-xylene', 'Cc1ccccc1C'],
    ['common practice', 'p-nitrophenol', 'Oc1ccc(cc1)[N+](=O)[O-]'],
    ['common practice', 'THF', 'C1CCOC1'],
    ['common practice', 'DMSO', 'CS(C)=O'],
    ['common practice', 'DMF', 'CN(C)C=O'],
    ['1979 rules, C-201', '2-butanone', 'CCC(C)=O'],
    ['1979 rules, C-201', '2-propanol', 'CC(C)O'],
  ])('%s: %s', (_rule, name, smiles, open) => {
    const { readings } = understood(name);
    expect(readings.map((reading) => canonicalSmiles(reading.molecule))).toEqual([canonical(smiles)]);
    expect(readings[0]!.stereoisomers.length > 0).toBe(open === true);
  });
});

describe('a name with several structures', () => {
  test.each([
    ['chlorotoluene', 3],
    ['butanol', 2],
    ['dichlorobenzene', 3],
    ['methylpropane', 1],
    ['chlorobenzene', 1],
    ['propanol', 2],
    ['nitrophenol', 3],
    ['trichlorobenzene', 3],
  ])('%s has %d readings', (name, count) => {
    const { readings } = understood(name);
    expect(readings).toHaveLength(count);
    expect(new Set(readings.map((reading) => canonicalSmiles(reading.molecule))).size).toBe(count);
  });

  test.each([
    ['but-2-ene', 2],
    ['tartaric acid', 3],
    ['1,2-dimethylcyclohexane', 3],
    ['butan-2-ol', 2],
    ['penta-2,3-diene', 2],
    ['cyclohexene', 0],
  ])('%s leaves %d stereoisomers open', (name, count) => {
    expect(understood(name).readings[0]!.stereoisomers).toHaveLength(count);
  });
});

describe('descriptors', () => {
  test.each([
    ['(2R)-butan-2-ol', 'CC[C@@H](C)O'],
    // P-65.1.1.2.2 (from memory): cinnamic acid by itself is the E acid; a prefix says otherwise.
    ['cinnamic acid', 'OC(=O)/C=C/c1ccccc1'],
    ['trans-cinnamic acid', 'OC(=O)/C=C/c1ccccc1'],
    ['cis-cinnamic acid', 'OC(=O)/C=C\\c1ccccc1'],
    ['cis-but-2-ene', 'C/C=C\\C'],
    ['(S)-butan-2-ol', 'CC[C@H](C)O'],
    ['(E)-but-2-ene', 'C/C=C/C'],
    ['(2Z)-but-2-ene', 'C/C=C\\C'],
    ['(2S)-2-aminopropanoic acid', 'C[C@H](N)C(=O)O'],
    ['(2R,3R)-2,3-dihydroxybutanedioic acid', 'OC(=O)[C@H](O)[C@@H](O)C(=O)O'],
    ['(1R,2S,5R)-5-methyl-2-(propan-2-yl)cyclohexan-1-ol', 'CC(C)[C@@H]1CC[C@@H](C)C[C@H]1O'],
  ])('%s', (name, smiles) => {
    const { readings } = understood(name);
    expect(readings.map((reading) => canonicalSmiles(reading.molecule))).toEqual([canonical(smiles)]);
    expect(readings[0]!.stereoisomers).toEqual([]);
  });

  test.each(['(2R)-propan-2-ol', '(E)-ethene', '(1S)-cyclohexanol'])(
    '%s says nothing, and that is said',
    (name) => {
      expect(understood(name).remarks.map(({ kind }) => kind)).toContain('stereo-meaningless');
    },
  );
});

describe('what is not understood is unknown, never guessed', () => {
  test.each([
    'xyzane',
    '2-methylfoo',
    '7-methylhexane',
    '2,2,2-trimethylpropane',
    'chloro',
    '',
    '(R',
    'N-methylhexane',
  ])('%s', (name) => {
    expect(readName(name).kind).toBe('unknown');
  });

  test('a misspelt word gets its neighbour', () => {
    const reading = readName('2-metylpropan-1-ol');
    expect(reading.kind === 'unknown' && reading.suggestions.join(' ')).toMatch(/methyl/);
  });
});

describe('the completed name', () => {
  const families = [
    'chlorotoluene',
    'butanol',
    'dibromobenzene',
    'nitroaniline',
    'pentanone',
    'methylcyclohexanol',
    'hexene',
    'butan-2-ol',
    'but-2-ene',
    'tartaric acid',
    '1,2-dimethylcyclohexane',
    '3-methylpent-2-ene',
    'chlorophenol',
    'pentan-2-yl acetate',
  ];
  test.each(families)('of every reading of %s means that reading', (name) => {
    for (const reading of understood(name).readings) {
      for (const { name: completed, molecule } of [reading, ...reading.stereoisomers]) {
        const again = understood(completed).readings.map((one) => canonicalSmiles(one.molecule));
        expect([completed, again]).toEqual([completed, [canonicalSmiles(molecule)]]);
      }
    }
  });
});

test('any text is survived, and places stay inside it', () => {
  const pieces = [
    'meth',
    'yl',
    'eth',
    'an',
    'e',
    'ol',
    'di',
    'chloro',
    'benz',
    'ene',
    '2',
    ',',
    '-',
    '(',
    ')',
    '[',
    ']',
    'R',
    'cyclo',
    'hex',
    'oic acid',
    ' ',
    "'",
    'N',
    'oxo',
    'bis',
    'tri',
    'phenyl',
    'ate',
  ];
  const texts = fc.oneof(
    fc.array(fc.constantFrom(...pieces), { maxLength: 14 }).map((list) => list.join('')),
    fc.string({ unit: 'binary', maxLength: 30 }),
  );
  fc.assert(
    fc.property(texts, (text) => {
      const reading = readName(text);
      const ranges =
        reading.kind === 'unknown'
          ? [reading.range]
          : reading.kind === 'understood'
            ? reading.remarks.map(({ range }) => range)
            : [];
      for (const { start, end } of ranges) {
        expect(start).toBeGreaterThanOrEqual(0);
        expect(end).toBeGreaterThanOrEqual(start);
        expect(end).toBeLessThanOrEqual(text.length);
      }
    }),
    { seed: 20260104, numRuns: 1500 },
  );
});

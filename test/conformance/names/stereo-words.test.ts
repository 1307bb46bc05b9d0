/**
 * Stereodescriptors of every kind in use, and how many stereoisomers a name leaves open. Structures are drawn from the
 * definitions by hand; numbers follow from the derivation beside them, or are textbook values (no source) where marked.
 */
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

describe('one arrangement', () => {
  test.each<[rule: string, name: string, smiles: string]>([
    ['P-93.5.1.4.2', '(2E,4Z)-hexa-2,4-diene', 'C/C=C/C=C\\C'],
    ['1979, in the order of the double bonds', '(E,E)-hexa-2,4-diene', 'C/C=C/C=C/C'],
    ['1979, in the order of the double bonds', '(Z,E)-hepta-2,4-diene', 'C/C=C\\C=C\\CC'],
    ['common practice', '(Z,Z,Z)-octadeca-9,12,15-trienoic acid', 'CC/C=C\\C/C=C\\C/C=C\\CCCCCCCC(=O)O'],
    ['common practice', '(all-Z)-octadeca-9,12-dienoic acid', 'CCCCC/C=C\\C/C=C\\CCCCCCCC(=O)O'],
    ['common practice', 'all-trans-hexa-2,4-diene', 'C/C=C/C=C/C'],
    ['common practice', 'cis,cis-octadeca-9,12-dienoic acid', 'CCCCC/C=C\\C/C=C\\CCCCCCCC(=O)O'],
    ['common practice', 'trans,trans-2,4-hexadienal', 'C/C=C/C=C/C=O'],
    ['common practice', 'trans-2,cis-6-nonadienal', 'CC/C=C\\CC/C=C/C=O'],
    ['common practice', 'cis-9,cis-12-octadecadienoic acid', 'CCCCC/C=C\\C/C=C\\CCCCCCCC(=O)O'],
    ['by the parent chain', 'trans-2-methylbut-2-enal', 'C/C=C(\\C)C=O'],
    ['by the parent chain', 'trans-3-methylpent-2-ene', 'C/C=C(\\C)CC'],
    ['by the parent chain', 'cis-3-methylpent-2-enoic acid', 'OC(=O)/C=C(\\CC)C'],
    ['by the parent chain', 'cis-1-chlorobut-2-ene', 'C/C=C\\CCl'],
    ['P-93.3.1', 'meso-tartaric acid', 'OC(=O)[C@H](O)[C@H](O)C(=O)O'],
    ['P-93.3.1', 'meso-2,3-dichlorobutane', 'C[C@H](Cl)[C@@H](C)Cl'],
    ['two alike', '(R,R)-tartaric acid', 'OC(=O)[C@H](O)[C@@H](O)C(=O)O'],
    ['either order is the meso form', '(R,S)-2,3-dichlorobutane', 'C[C@H](Cl)[C@@H](C)Cl'],
    ['either order is the meso form', '(R*,S*)-2,3-dichlorobutane', 'C[C@H](Cl)[C@@H](C)Cl'],
    ['P-93.5.2.1', 'cis-cyclohexane-1,4-diol', 'O[C@H]1CC[C@@H](O)CC1'],
    ['P-93.5.2.1', 'cis-2,6-dimethylpiperidine', 'C[C@H]1CCC[C@@H](C)N1'],
    ['common practice', 'all-cis-1,2,3-trimethylcyclopropane', 'C[C@H]1[C@@H](C)[C@H]1C'],
    ['common practice, lower case', '(2s)-2-aminopropanoic acid', 'C[C@H](N)C(=O)O'],
    ['common practice, lower case', '(1s,2r)-1,2-dimethylcyclohexane', 'C[C@H]1CCCC[C@H]1C'],
    ['P-93.1.1: pseudoasymmetric', '(1r,4r)-cyclohexane-1,4-diol', 'O[C@H]1CC[C@H](O)CC1'],
  ])('%s: %s', (_rule, name, smiles) => {
    const { readings } = understood(name);
    const rows = readings.map(({ molecule, stereoisomers }) => [
      canonicalSmiles(molecule),
      stereoisomers.length,
    ]);
    expect(rows).toEqual([[canonical(smiles), 0]]);
  });

  test('(R,R)-tartaric acid is the one that (2R,3R) is, and not the meso form', () => {
    const [both, one, meso] = ['(R,R)-', '(2R,3R)-', 'meso-'].map((prefix) =>
      canonicalSmiles(understood(`${prefix}tartaric acid`).readings[0]!.molecule),
    );
    expect(both).toBe(one);
    expect(both).not.toBe(meso);
  });
});

describe('what stays open', () => {
  test.each<[name: string, open: number, why: string]>([
    ['but-2-ene', 2, 'E and Z'],
    ['but-1-ene', 0, 'two hydrogens at one end'],
    ['hexa-2,4-diene', 3, 'EE, EZ = ZE, ZZ'],
    ['hepta-2,4-diene', 4, 'two unlike double bonds'],
    ['octa-2,4,6-triene', 6, '(8 + 4) / 2: the middle bond, and the outer two up to the swap'],
    ['1,2-dichloroethene', 2, 'E and Z'],
    ['1,1-dichloroethene', 0, 'two alike at either end'],
    ['penta-2,3-diene', 2, 'an axis'],
    ['hexa-2,3,4-triene', 2, 'three cumulated bonds: E and Z'],
    ['buta-1,2-diene', 0, 'two hydrogens at one end'],
    ['cyclohexene', 0, 'a ring of six holds only cis'],
    ['cyclooctene', 2, 'a ring of eight holds trans as well'],
    ['butan-2-ol', 2, 'one centre'],
    ['propan-2-ol', 0, 'two alike groups'],
    ['2,3-dichlorobutane', 3, 'a pair and the meso form'],
    ['tartaric acid', 3, 'a pair and the meso form (Pasteur)'],
    ['2,3-dichloropentane', 4, 'two unlike centres'],
    ['pentane-2,3,4-triol', 4, 'two meso forms and a pair: textbook value'],
    [
      '2,3,4,5-tetrahydroxyhexanedioic acid',
      10,
      'the hexaric acids: 4 pairs and 2 meso forms, textbook value',
    ],
    ['2,3,4-trihydroxypentanedioic acid', 4, 'the pentaric acids: a pair and 2 meso forms, textbook value'],
    ['2,3,4,5,6-pentahydroxyhexanal', 16, 'the aldohexoses'],
    ['2,3,4,5-tetrahydroxypentanal', 8, 'the aldopentoses'],
    ['1,3,4,5,6-pentahydroxyhexan-2-one', 8, 'the ketohexoses'],
    ['hexane-1,2,3,4,5,6-hexol', 10, 'the hexitols'],
    ['inositol', 9, 'seven meso forms and a pair: textbook value'],
    ['1,2-dimethylcyclohexane', 3, 'cis, and a pair of trans'],
    ['1,3-dimethylcyclohexane', 3, 'cis, and a pair of trans'],
    ['1,4-dimethylcyclohexane', 2, 'cis and trans'],
    ['1,2-dimethylcyclopropane', 3, 'cis, and a pair of trans'],
    ['1,3-dimethylcyclobutane', 2, 'cis and trans'],
    ['1,2,3-trimethylcyclopropane', 2, 'all cis, or one on the other side'],
    ['4-methylcyclohexanol', 2, 'cis and trans'],
    ['2-methylcyclohexanol', 4, 'two unlike centres'],
    ['decalin', 2, 'cis and trans, both without hand: textbook value'],
    ['bicyclo[2.2.1]heptan-2-ol', 4, 'exo and endo, each a pair'],
    ['bicyclo[2.2.1]heptane', 0, 'the bridge forbids the others'],
    ['camphor', 2, 'the bridge forbids the others'],
    ['3-methylcyclohexanone', 2, 'one centre'],
    ['rac-butan-2-ol', 2, 'the two enantiomers'],
    ['(±)-butan-2-ol', 2, 'the two enantiomers'],
    ['(RS)-butan-2-ol', 2, 'the two enantiomers'],
    ['(R,S)-butan-2-ol', 2, 'the two enantiomers'],
    ['rac-(2R,3S)-3-aminobutan-2-ol', 2, 'the two enantiomers'],
    ['rel-(2R,3S)-3-aminobutan-2-ol', 2, 'one of two enantiomers'],
    ['(2R*,3S*)-3-aminobutan-2-ol', 2, 'one of two enantiomers'],
    ['(2RS,3SR)-3-chlorobutan-2-ol', 2, 'the two enantiomers'],
    ['(2RS,3S)-3-chlorobutan-2-ol', 2, 'both at 2, one at 3'],
    ['trans-cyclohexane-1,2-diol', 2, 'a pair'],
    ['exo-2-chlorobicyclo[2.2.1]heptane', 2, 'a pair'],
    ['endo-bicyclo[2.2.1]heptan-2-ol', 2, 'a pair'],
  ])('%s: %i', (name, open, why) => {
    expect(why).not.toBe('');
    const [reading, ...others] = understood(name).readings;
    expect(others).toEqual([]);
    expect(reading!.stereoisomers.length).toBe(open);
    const forms = reading!.stereoisomers.map(({ molecule }) => canonicalSmiles(molecule));
    expect(new Set(forms).size).toBe(open);
  });

  // Towards the bridge of one atom is exo: (1R,2R,4S) and its mirror image (drawn by hand, and from memory for norborneol).
  test('exo and endo are one and the other', () => {
    const forms = (name: string) =>
      understood(name).readings.flatMap(({ stereoisomers }) => stereoisomers.map(({ name: own }) => own));
    expect(forms('exo-bicyclo[2.2.1]heptan-2-ol').join(' ')).toContain('(1R,2R,4S)');
    expect(forms('endo-bicyclo[2.2.1]heptan-2-ol').join(' ')).toContain('(1R,2S,4S)');
  });
});

test.each([
  'rac-(2R,3S)-3-aminobutan-2-ol',
  '(R,S)-butan-2-ol',
  '(±)-3-methylhexane',
  '(2RS,3SR)-3-chlorobutan-2-ol',
])('each enantiomer of %s has a name that means it alone', (name) => {
  for (const isomer of understood(name).readings[0]!.stereoisomers) {
    const again = understood(isomer.name).readings;
    const rows = again.map(({ molecule, stereoisomers }) => [
      canonicalSmiles(molecule),
      stereoisomers.length,
    ]);
    expect([isomer.name, rows]).toEqual([isomer.name, [[canonicalSmiles(isomer.molecule), 0]]]);
  }
});

test.each([
  'cis-butane',
  'meso-butan-2-ol',
  'exo-hexan-2-ol',
  '(E,Z)-but-2-ene',
  '(R,S)-2-chloro-3-fluorobutane',
])('%s says what cannot be said, and is told so', (name) => {
  expect(understood(name).remarks.map(({ kind }) => kind)).toContain('stereo-meaningless');
});

/** Numbers of stereoisomers that textbooks give, and descriptors of compounds with published names. */
import { describe, expect, test } from 'vitest';
import { assignDescriptors } from '../../../server/chemistry/structure/assign-descriptors.ts';
import { canonicalForm } from '../../../server/chemistry/structure/canonical-form.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { cipDescriptors } from '../../../server/chemistry/structure/cip/descriptors.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';
import { enumerateStereoisomers } from '../../../server/chemistry/structure/stereoisomers.ts';

const molecule = (smiles: string) => readSmiles(smiles).value!;

describe('how many stereoisomers', () => {
  // Source: Eliel and Wilen, Stereochemistry of Organic Compounds, 1994, chapters 3, 5, 9, 11 and 14 (from memory).
  test.each([
    ['tartaric acid, one of them meso', 'OC(=O)C(O)C(O)C(=O)O', 3],
    ['but-2-ene', 'CC=CC', 2],
    ['butan-2-ol', 'CCC(C)O', 2],
    ['1,2-dimethylcyclohexane', 'CC1CCCCC1C', 3],
    ['1,3-dimethylcyclohexane', 'CC1CCCC(C)C1', 3],
    ['1,4-dimethylcyclohexane', 'CC1CCC(C)CC1', 2],
    ['inositol: seven meso forms and a pair', 'OC1C(O)C(O)C(O)C(O)C1O', 9],
    ['camphor: the bridge forbids the others', 'CC1(C)C2CCC1(C)C(=O)C2', 2],
    ['limonene', 'CC1=CCC(CC1)C(C)=C', 2],
    ['menthol', 'CC1CCC(C(C)C)C(O)C1', 8],
    ['penta-2,3-diene, an axis', 'CC=C=CC', 2],
    ['hexa-2,4-diene', 'CC=CC=CC', 3],
    ['trihydroxyglutaric acid', 'OC(=O)C(O)C(O)C(O)C(=O)O', 4],
    ['the aldohexoses', 'O=CC(O)C(O)C(O)C(O)CO', 16],
    ['cholesterol: eight centres', 'CC(C)CCCC(C)C1CCC2C1(CCC3C2CC=C4C3(CCC(C4)O)C)C', 256],
    ['the truxillic acids', 'OC(=O)C1C(c2ccccc2)C(C(=O)O)C1c1ccccc1', 5],
    ['1,2,3-trichlorocyclopropane', 'ClC1C(Cl)C1Cl', 2],
    ['α-pinene', 'CC1=CCC2CC1C2(C)C', 2],
    ['decalin', 'C1CCC2CCCCC2C1', 2],
    ['cyclohexene', 'C1CCC=CC1', 1],
    ['cyclooctene', 'C1CCCC=CCC1', 2],
    ['adamantane', 'C1C2CC3CC1CC(C2)C3', 1],
    ['norbornane', 'C1CC2CCC1C2', 1],
    ['ethyl methyl sulfoxide keeps its pyramid', 'CCS(C)=O', 2],
    ['an amine turns over', 'CCN(C)C(C)C', 1],
    ['butanone oxime', 'CCC(C)=NO', 2],
    ['acetone oxime', 'CC(C)=NO', 1],
    ['2-methylbut-2-ene', 'CC=C(C)C', 1],
    ['toluene', 'Cc1ccccc1', 1],
  ])('%s', (_name, smiles, count) => {
    const list = enumerateStereoisomers(molecule(smiles), 300);
    expect(list.count).toBe(count);
    expect(new Set(list.isomers.map((isomer) => canonicalForm(isomer).key)).size).toBe(count);
  });

  test('what is stated is kept', () => {
    const { isomers } = enumerateStereoisomers(molecule('C[C@H](O)C(C)Cl'));
    expect(isomers.map(canonicalSmiles).sort()).toEqual(
      ['C[C@H](O)[C@H](C)Cl', 'C[C@H](O)[C@@H](C)Cl']
        .map((smiles) => canonicalSmiles(molecule(smiles)))
        .sort(),
    );
  });

  test('a statement where nothing can be said is meaningless', () => {
    expect(enumerateStereoisomers(molecule('CC[C@](C)(C)O')).meaningless).toHaveLength(1);
    expect(enumerateStereoisomers(molecule('CC[C@H](C)O')).meaningless).toHaveLength(0);
  });
});

describe('descriptors of known compounds', () => {
  // The names are those of PubChem's IUPAC name field or of the 2013 recommendations; SMILES from memory.
  test.each([
    ['L-alanine is (2S)', 'C[C@H](N)C(=O)O', 'S'],
    ['L-cysteine is (2R)', 'SC[C@H](N)C(=O)O', 'R'],
    ['D-glyceraldehyde is (2R)', 'OC[C@@H](O)C=O', 'R'],
    ['(−)-menthol is (1R,2S,5R)', 'CC(C)[C@@H]1CC[C@@H](C)C[C@H]1O', 'SRR'],
    ['D-glucose is (2R,3S,4R,5R)', 'O=C[C@H](O)[C@@H](O)[C@H](O)[C@H](O)CO', 'RSRR'],
    ['L-tartaric acid is (2R,3R)', 'OC(=O)[C@H](O)[C@@H](O)C(=O)O', 'RR'],
    ['fumaric acid is E', 'OC(=O)/C=C/C(=O)O', 'E'],
    ['maleic acid is Z', 'OC(=O)/C=C\\C(=O)O', 'Z'],
    // Worked by hand after P-92.6: OH before the R branch before the S branch before H.
    ['a pseudoasymmetric centre', 'OC(=O)[C@H](O)[C@H](O)[C@H](O)C(=O)O', 'RrS'],
    ['and its diastereomer', 'OC(=O)[C@H](O)[C@@H](O)[C@H](O)C(=O)O', 'RsS'],
  ])('%s', (_name, smiles, letters) => {
    expect(
      cipDescriptors(molecule(smiles))
        .map(({ letter }) => letter ?? '-')
        .join(''),
    ).toBe(letters);
  });

  test('a descriptor is turned into the arrangement that has it', () => {
    const { molecule: assigned, refused } = assignDescriptors(molecule('CC(C)C1CCC(C)CC1O'), [
      { atom: 9, letter: 'R' },
      { atom: 3, letter: 'S' },
      { atom: 6, letter: 'R' },
    ]);
    expect(refused).toEqual([]);
    expect(canonicalSmiles(assigned)).toBe(canonicalSmiles(molecule('CC(C)[C@@H]1CC[C@@H](C)C[C@H]1O')));
  });

  test('a descriptor without a place is refused, with the reason', () => {
    expect(assignDescriptors(molecule('CC(C)O'), [{ atom: 1, letter: 'R' }]).refused[0]?.reason).toBe(
      'ligands alike',
    );
    expect(assignDescriptors(molecule('CCO'), [{ atom: 0, letter: 'R' }]).refused[0]?.reason).toBe(
      'no stereogenic unit',
    );
  });
});

/** Descriptors of compounds whose names are published, and a second opinion on many arrangements of difficult ones. */
import type { MainModule } from '@rdkit/rdkit';
import { beforeAll, describe, expect, test } from 'vitest';
import { cipDescriptors } from '../../../server/chemistry/structure/cip/descriptors.ts';
import { withStereo } from '../../../server/chemistry/structure/molecule.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';
import { stereoCandidates } from '../../../server/chemistry/structure/stereo-candidates.ts';
import { elementFor } from '../../../server/chemistry/structure/stereo-elements.ts';
import { writeSmiles } from '../../../server/chemistry/structure/write-smiles.ts';
import { seededChance } from '../../support/generated-notebook.ts';
import { loadRdkit, withMolecule } from '../../support/rdkit.ts';

const molecule = (smiles: string) => readSmiles(smiles).value!;
const letters = (smiles: string) =>
  cipDescriptors(molecule(smiles))
    .map(({ letter }) => letter ?? '-')
    .join('');

describe('natural products, letters in the order of the SMILES', () => {
  // Names and structures: PubChem, typed from memory.
  test.each([
    ['(+)-camphor, 1R,4R', 'CC1(C)[C@@H]2CC[C@@]1(C)C(=O)C2', 'RR'],
    ['benzylpenicillin, 2S,5R,6R', 'CC1([C@@H](N2[C@H](S1)[C@@H](C2=O)NC(=O)CC3=CC=CC=C3)C(=O)O)C', 'SRR'],
    ['quinine, R; 2S,4S,5R', 'COC1=CC2=C(C=CN=C2C=C1)[C@H]([C@@H]3C[C@@H]4CCN3C[C@@H]4C=C)O', 'RSSR'],
    [
      'cholesterol, 20R; 17R,14S,13R,9S,8S,10R,3S as written',
      'C[C@H](CCCC(C)C)[C@H]1CC[C@@H]2[C@@]1(CC[C@H]3[C@H]2CC=C4[C@@]3(CC[C@@H](C4)O)C)C',
      'RRSRSSRS',
    ],
    [
      'morphine, 12bS,4aR,4R,7aR,7S as written',
      'CN1CC[C@]23[C@@H]4[C@H]1CC5=C2C(=C(C=C5)O)O[C@H]3[C@H](C=C4)O',
      'SRRRS',
    ],
  ])('%s', (_name, smiles, expected) => {
    expect(letters(smiles)).toBe(expected);
  });
});

describe('one rule at a time', () => {
  // Worked by hand after the rule that is named.
  test.each([
    ['rule 1a, P-92.2.1.1: Br > Cl > F > H', 'Br[C@@H](F)Cl', 'S'],
    ['rule 2, P-92.3: 2H > 1H', 'C[C@H]([2H])O', 'S'],
    ['rule 2, P-92.3: 13C > 12C', '[13CH3][C@H](C)O', 'S'],
    ['a set of none is below a set of one: hemiacetal before ketone', 'F[C@H](C(C)=O)C(O)(OC)C', 'R'],
    ['rule 3, P-92.4.1: Z > E', 'C/C=C/[C@H](O)/C=C\\C', 'SEZ'],
    ['rule 5, P-92.6: R > S makes a pseudoasymmetric centre', 'C[C@@H](Cl)[C@H](O)[C@H](C)Cl', 'RrS'],
    ['d orbitals neglected: a sulfoxide', 'CC[S@](C)=O', 'S'],
    ['and the same with charges', 'CC[S@+](C)[O-]', 'S'],
    ['ring halves told apart by reference, P-93.5.3.1', 'O=C1CCC[C@]12CCCC2=O', 'S'],
    ['alike ligands have no letter', 'CC[C@](C)(C)O', '-'],
  ])('%s', (_name, smiles, expected) => {
    expect(letters(smiles)).toBe(expected);
  });

  test('an allene turned over has the other letter', () => {
    expect([letters('CC=[C@]=CC'), letters('CC=[C@@]=CC')].sort()).toEqual(['M', 'P']);
  });
});

describe('as RDKit describes them', () => {
  /** Alike branches that only rules 3 to 5 tell apart, isotopes, rings, hypervalent centres. */
  const difficult = [
    'OC1C(O)C(O)C(O)C(O)C1O',
    'OCC(O)C(O)C(O)C(O)C(O)CO',
    'CC(O)C(C(C)O)C(C(C)O)C(C)O',
    'CC=CC(O)C=CC',
    'CC=CC(C=CC)(C(C)F)C(C)F',
    'CC(F)C(O)(C(C)Cl)C(C)Cl',
    'CC(O)C=CC(C)O',
    'CC(O)C(=CC)C(C)O',
    'OC(C(O)C(O)C(C)Cl)(C(O)C(O)C(C)Cl)C',
    'CC(O)C(O)C(C(O)C(C)O)N(C)C(C(O)C(C)O)C(O)C(C)O',
    'CC1CCC(CC1)C1CCC(C)CC1',
    'CC12CC3(O)CC(F)(C1)CC(Cl)(C2)C3',
    'CC(F)CS(=O)CC(C)F',
    'CP(=O)(CC(C)F)CC(C)O',
    'CCO[P](=O)(C)SCC(C)O',
    'C[N+](CC)(CC(C)O)CC(C)O',
    '[2H]C(C)C(O)C([2H])C',
    'CC(O)C(N)C(C(N)C(C)O)C(N)C(C)O',
    'CC1OC1C(O)C1OC1C',
    'FC(Cl)C1CC(C(F)Cl)C1C(F)Cl',
    'c1ccccc1C(O)C1CCCCC1c1ccncc1',
  ];
  interface Tags {
    CIP_atoms: [number, string][];
    CIP_bonds: [number, number, string][];
  }
  let rdkit: MainModule;
  beforeAll(async () => {
    rdkit = await loadRdkit();
  });

  test.each(difficult)('%s', (smiles) => {
    const bare = molecule(smiles);
    const candidates = stereoCandidates(bare);
    const chance = seededChance(smiles.length);
    for (let round = 0; round < 25; round++) {
      const stereo = candidates.map((candidate) => elementFor(candidate, chance() < 0.5));
      const written = writeSmiles(withStereo(bare, stereo));
      const tags = withMolecule(rdkit, written, (each) => JSON.parse(each.get_stereo_tags()) as Tags)!;
      const theirs = new Map<string, string>();
      for (const [atom, letter] of tags.CIP_atoms) theirs.set(String(atom), letter);
      for (const [first, second, letter] of tags.CIP_bonds)
        theirs.set([first, second].sort((one, other) => one - other).join(), letter);
      for (const { element, letter } of cipDescriptors(molecule(written))) {
        const place =
          'centre' in element
            ? String(element.centre)
            : [...element.ends].sort((one, other) => one - other).join();
        const tag = theirs.get(place);
        expect(`${written} at ${place}: ${letter ?? '?'}`).toBe(
          `${written} at ${place}: ${(tag ?? '?').replace(/[()]/g, '')}`,
        );
      }
    }
  });
});

/**
 * SMILES put together from fragments by a seeded chance: substituents on chains and rings, salts, charged and hypervalent
 * groups, stereocentres. What the suites compare with other toolkits, thousands at a time.
 */
import { seededChance } from './generated-notebook.ts';

const chains = [
  'C',
  'CC',
  'CCC',
  'C(C)C',
  'C=C',
  'C#C',
  'CC=CC',
  'C/C=C/C',
  'C/C=C\\C',
  'C(=O)C',
  'C(=O)',
  'C(=O)O',
  'C(=O)N',
  'CO',
  'CN',
  'CS',
  'N',
  'O',
  'S',
  'S(=O)',
  'S(=O)(=O)',
  '[C@H](C)',
  '[C@@H](O)',
  '[C@](C)(F)',
  'C(F)(F)',
  'N=N',
  'C=N',
  '[Si](C)(C)',
  'P(=O)(OC)',
  '[N+](C)(C)',
  'OB(O)',
];
const rings = [
  'c1ccc(X)cc1',
  'c1cccc(X)c1',
  'c1ccc(X)nc1',
  'c1cc(X)[nH]c1',
  'c1cc(X)oc1',
  'c1csc(X)c1',
  'C1CCC(X)CC1',
  'C1CC(X)C1',
  'C1CN(X)CCO1',
  'c1ccc2c(X)cccc2c1',
  'c1ccc2[nH]cc(X)c2c1',
  'n1ccn(X)c1',
  'C1CC2CCC1(X)C2',
  'c1cc(X)c2ccccc2n1',
  'O=c1cc(X)[nH]cc1',
  'c1c(X)n[nH]c1',
  '[n+]1(X)ccccc1',
  'C1=CC(X)C=CC1',
  'c1nc(X)nc2[nH]cnc12',
];
const ends = [
  'C',
  'O',
  'N',
  'F',
  'Cl',
  'Br',
  'I',
  'S',
  'C#N',
  'C(=O)O',
  'C(=O)[O-]',
  '[N+](=O)[O-]',
  'N(=O)=O',
  'N=[N+]=[N-]',
  '[NH3+]',
  'OC',
  'C(C)(C)C',
  'C(F)(F)F',
  '[2H]',
  '[13CH3]',
  'S(=O)(=O)N',
  'P(O)(O)=O',
  'B(O)O',
  '[Si](C)(C)C',
  'c1ccccc1',
  'C1CC1',
];

/** `count` SMILES; the same seed gives the same list. */
export function fragmentSmiles(count: number, seed: number): string[] {
  const chance = seededChance(seed);
  const pick = <T>(list: readonly T[]): T => list[Math.floor(chance() * list.length)]!;
  return Array.from({ length: count }, () => {
    let text = 'C';
    for (let steps = Math.floor(chance() * 4); steps > 0; steps--)
      text += chance() < 0.35 ? `(${pick(ends)})C` : `${pick(chains)}C`;
    if (chance() < 0.7) {
      const ring = pick(rings);
      const substituent = `${chance() < 0.5 ? pick(chains) : ''}${pick(ends)}`;
      // Inside the ring template its digit 1 and 2 are in use; fragments that bring rings use 8 and 9.
      text += ring.replace('(X)', `(${shifted(substituent)})`).replace('X', shifted(substituent));
    } else text += pick(ends);
    return chance() < 0.06 ? `${text}.${pick(['Cl', '[Na+]', 'O', '[Cl-]'])}` : text;
  });
}

function shifted(fragment: string): string {
  return fragment.replace(/([A-Za-z])1/g, '$18');
}

/** The canonical form: what is the same compound, what is not, and structures made to be hard. */
import { describe, expect, test } from 'vitest';
import { canonicalForm } from '../../../../server/chemistry/structure/canonical-form.ts';
import { bondKinds, canonicalGraph } from '../../../../server/chemistry/structure/canonical-graph.ts';
import { canonicalLabelling } from '../../../../server/chemistry/structure/canonical-search.ts';
import { canonicalSmiles } from '../../../../server/chemistry/structure/canonical-smiles.ts';
import { readSmiles } from '../../../../server/chemistry/structure/read-smiles.ts';

const molecule = (smiles: string) => readSmiles(smiles).value!;
const canonical = (smiles: string) => canonicalSmiles(molecule(smiles));

describe('one compound in several spellings', () => {
  // Common practice, no source.
  test.each([
    ['nitro', 'CN(=O)=O', 'C[N+](=O)[O-]'],
    ['azide', 'CN=N#N', 'CN=[N+]=[N-]'],
    ['N-oxide', 'O=n1ccccc1', '[O-][n+]1ccccc1'],
    ['sulfoxide', 'CS(C)=O', 'C[S+](C)[O-]'],
    ['phosphine oxide', 'CP(C)(C)=O', 'C[P+](C)(C)[O-]'],
    ['ylide', 'CP(C)(C)=C', 'C[P+](C)(C)[CH2-]'],
    ['alkoxide', 'CO[Na]', 'C[O-].[Na+]'],
    ['hydrochloride', 'CN.Cl', 'C[NH3+].[Cl-]'],
    ['zwitterion', 'NCC(=O)O', '[NH3+]CC(=O)[O-]'],
    ['written hydrogens', '[H]C([H])([H])O[H]', 'CO'],
    ['bond shift in o-xylene', 'CC1=C(C)C=CC=C1', 'CC1=CC=CC=C1C'],
    ['azulene', 'c1ccc2cccc2cc1', 'C1=CC=C2C=CC=C2C=C1'],
    ['a double bond in a small ring', 'O=C1/C=C\\C(=O)O1', 'O=C1C=CC(=O)O1'],
    ['parts in another order', '[Na+].[Cl-]', '[Cl-].[Na+]'],
  ])('%s', (_title, first, second) => {
    expect(canonical(first)).toBe(canonical(second));
  });
});

test('tautomers and isotopologues stay apart', () => {
  expect(canonical('Oc1ccccn1')).not.toBe(canonical('O=c1cccc[nH]1'));
  expect(canonical('C[2H]')).not.toBe(canonical('C'));
  // Absurd numbers are read, so they must not spill into their neighbours: key and key, not name and name.
  expect(canonicalForm(molecule('[512C]')).key).not.toBe(canonicalForm(molecule('[N]')).key);
  expect(canonicalForm(molecule('[CH40]')).key).not.toBe(canonicalForm(molecule('[CH35]')).key);
});

describe('symmetric structures', () => {
  const groupOrder = (smiles: string) => {
    const input = molecule(smiles);
    const graph = canonicalGraph(
      input,
      input.atoms.map((_, index) => index),
      bondKinds(input),
    );
    const { generators, complete } = canonicalLabelling(graph);
    expect(complete).toBe(true);
    return orderOf(generators, input.atoms.length);
  };

  // Orders of the automorphism groups of the graphs; mathematics.
  test.each([
    ['benzene', 'c1ccccc1', 12],
    ['cubane', 'C12C3C4C1C5C4C3C25', 48],
    ['neopentane', 'CC(C)(C)C', 24],
    ['adamantane', 'C1C2CC3CC1CC(C2)C3', 24],
    ['dodecahedrane', 'C12C3C4C5C1C6C7C2C8C3C9C4C1C5C6C2C7C8C9C12', 120],
    ['naphthalene', 'c1ccc2ccccc2c1', 4],
    ['butane', 'CCCC', 2],
    ['2-methylbutane', 'CC(C)CC', 2],
  ])('%s', (_name, smiles, order) => {
    expect(groupOrder(smiles)).toBe(order);
  });

  test.each([
    ['a long chain of CF2', `FC(F)(F)${'C(F)(F)'.repeat(30)}C(F)(F)F`],
    [
      'a dendrimer',
      'C(C(C(C)(C)C)(C(C)(C)C)C(C)(C)C)(C(C(C)(C)C)(C(C)(C)C)C(C)(C)C)C(C(C)(C)C)(C(C)(C)C)C(C)(C)C',
    ],
    ['a thousand waters', Array(1000).fill('O').join('.')],
    ['a long chain', 'C'.repeat(2000)],
    [
      'buckminsterfullerene',
      'c12c3c4c5c1c1c6c7c2c2c8c3c3c9c4c4c%10c5c5c1c1c6c6c%11c7c2c2c7c8c3c3c8c9c4c4c9c%10c5c5c1c1c6c6c%11c2c2c7c3c3c8c4c4c9c5c1c1c6c2c3c41',
    ],
  ])('%s is settled within the bound', (_name, smiles) => {
    expect(canonicalForm(molecule(smiles)).complete).toBe(true);
  });
});

/** Order of a permutation group by orbits and stabilizers (Schreier), small groups only. */
function orderOf(generators: readonly Int32Array[], size: number): number {
  const identity = Int32Array.from({ length: size }, (_, index) => index);
  const seen = new Map([[identity.join(), identity]]);
  for (const element of seen.values()) {
    for (const generator of generators) {
      const product = element.map((image) => generator[image]!);
      if (!seen.has(product.join())) seen.set(product.join(), product);
    }
  }
  return seen.size;
}

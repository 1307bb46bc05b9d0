/**
 * Examples of the OpenSMILES specification (version 1.0, 2016): two spellings that the specification calls the same,
 * readings of hydrogens and charges, and texts that it calls wrong. The section stands beside each.
 */
import { describe, expect, test } from 'vitest';
import { hillFormula } from '../../../server/chemistry/composition/format-formula.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { compositionOf } from '../../../server/chemistry/structure/composition-of.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

const canonical = (smiles: string) => {
  const { value, problem } = readSmiles(smiles);
  if (value === undefined) throw new Error(`${smiles}: ${problem!.message}`);
  return canonicalSmiles(value);
};

describe('the same molecule', () => {
  test.each([
    ['3.2', 'CCO', 'OCC'],
    ['3.2 bonds written out', 'CC', 'C-C'],
    ['3.3 branches', 'CC(C)(C)O', 'OC(C)(C)C'],
    ['3.4 rings', 'C1CCCCC1', 'C0CCCCC0'],
    ['3.4 reuse of a number', 'C1CCCCC1C1CCCCC1', 'C1CCCCC1C2CCCCC2'],
    ['3.4 two digits', 'C%25CCCCC%25', 'C1CCCCC1'],
    ['3.4 bond symbol at either end', 'C=1CCCCC=1', 'C1CCCCC=1'],
    ['3.5 aromatic and Kekulé', 'c1ccccc1', 'C1=CC=CC=C1'],
    ['3.5 indane', 'c1ccc2CCCc2c1', 'C1=CC=CC(CCC2)=C12'],
    ['3.5 furan', 'c1occc1', 'C1OC=CC=1'],
    ['3.5 pyrrole', 'c1cc[nH]c1', 'N1C=CC=C1'],
    ['3.5 biphenyl', 'c1ccccc1-c2ccccc2', 'c1ccccc1c2ccccc2'],
    ['3.7 dot disconnected but joined by a ring bond', 'C1.C1', 'CC'],
    ['3.8.2 trans', 'F/C=C/F', 'F\\C=C\\F'],
    ['3.8.2 cis', 'F/C=C\\F', 'C(/F)=C/F'],
    ['3.8.2 cis, slash inside the branch', 'F\\C=C/F', 'C(\\F)=C\\F'],
    ['3.8.1 neighbours in another order', 'N[C@](Br)(O)C', 'Br[C@](O)(N)C'],
    ['3.8.1 neighbours in another order', 'N[C@](Br)(O)C', 'O[C@](Br)(C)N'],
    ['3.8.1 @@ is the mirror of @', 'N[C@](Br)(O)C', 'N[C@@](Br)(C)O'],
    ['3.8.1 ring closure counts where its digit stands', 'FC1C[C@](Br)(Cl)CCC1', '[C@]1(Br)(Cl)CCCC(F)C1'],
    ['3.8.3 allene', 'NC(Br)=[C@]=C(O)C', 'BrC(N)=[C@@]=C(O)C'],
  ])('%s: %s and %s', (_section, first, second) => {
    expect(canonical(first)).toBe(canonical(second));
  });
});

describe('not the same molecule', () => {
  test.each([
    ['3.8.1', 'N[C@](Br)(O)C', 'N[C@@](Br)(O)C'],
    ['3.8.2', 'F/C=C/F', 'F/C=C\\F'],
    ['3.1.4 isotopes', '[13CH4]', 'C'],
    ['3.1.3 charge', '[OH-]', 'O'],
  ])('%s: %s and %s', (_section, first, second) => {
    expect(canonical(first)).not.toBe(canonical(second));
  });
});

describe('what is read', () => {
  test.each([
    ['3.1.2 hydrogens', '[CH4]', 'CH4'],
    ['3.1.2 no hydrogen stated is none', '[C]', 'C'],
    ['3.1.3 charge', '[NH4+]', 'H4N+'],
    ['3.1.3 doubled sign', '[Cu++]', 'Cu^2+'],
    ['3.1.3 number', '[Fe+3]', 'Fe^3+'],
    ['3.1.5 organic subset', 'CS(=O)(=O)C', 'C2H6O2S'],
    ['3.1.5 five-valent phosphorus', 'CP(=O)(O)O', 'CH5O3P'],
    ['3.5 pyridine', 'n1ccccc1', 'C5H5N'],
    ['3.5 pyridine N-oxide', 'O=n1ccccc1', 'C5H5NO'],
    ['3.5 N-methylpyrrole', 'Cn1cccc1', 'C5H7N'],
    ['3.1.7 wildcard', '*c1ccccc1', 'C6H5'],
  ])('%s: %s is %s', (_section, smiles, formula) => {
    expect(hillFormula(compositionOf(readSmiles(smiles).value!))).toBe(formula);
  });
});

describe('what the specification calls wrong', () => {
  test.each([
    ['3.4', 'C1CCC'],
    ['3.4', 'C-1CCCCC=1'],
    ['3.4', 'C12C2CCC1'],
    ['3.4', 'C11'],
    ['3.3', 'C((C))O'],
    ['3.3', '(CC)O'],
    ['3.2', 'C(=)C'],
    ['3.5 no Kekulé form', 'c1cccc1'],
    ['3.5 no Kekulé form', 'c1ccncc1c1cccn1'],
    ['3.1', '[CH3'],
    ['3.1', '[Zz]'],
  ])('%s: %s', (_section, smiles) => {
    expect(readSmiles(smiles).problem).toBeDefined();
  });
});

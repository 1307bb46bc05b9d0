/** The chain that a name takes, and the longest one that there is. */
import { expect, it } from 'vitest';
import { readSmiles } from '../../../../server/chemistry/structure/read-smiles.ts';
import { alkaneParent, longestSaturatedChain } from '../../../../server/checks/shared/longest-chain.ts';

it.each([
  ['2-ethylpentane', 5],
  ['2-Methylundecane', 11],
  ['heptadecane', 17],
  ['tricosane', undefined],
  ['2-methyl-n-heptane', 7],
  ['dichloromethane', 1],
  ['cyclohexanol', undefined],
  ['trimethylsilane', undefined],
  ['oxirane', undefined],
  ['', undefined],
])('%s takes a chain of %s', (name, carbons) => {
  expect(alkaneParent(name)?.carbons).toBe(carbons);
});

it.each([
  ['CCCC(C)CC', 6],
  ['CC(C)(C)C', 3],
  ['C', 1],
  ['FC(F)(F)CCl', 2],
  ['C1CCCCC1', undefined],
  ['CCO', undefined],
  ['CC=C', undefined],
  ['CC.CC', undefined],
])('the longest chain of %s has %s carbons', (smiles, carbons) => {
  expect(longestSaturatedChain(readSmiles(smiles).value!)).toBe(carbons);
});

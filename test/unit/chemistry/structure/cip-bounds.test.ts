import { expect, test } from 'vitest';
import { cipDescriptors } from '../../../../server/chemistry/structure/cip/descriptors.ts';
import { readSmiles } from '../../../../server/chemistry/structure/read-smiles.ts';
import { enumerateStereoisomers } from '../../../../server/chemistry/structure/stereoisomers.ts';

const lettersOf = (smiles: string) => cipDescriptors(readSmiles(smiles).value!).map(({ letter }) => letter);

test('a ranking that would take too long gives no letter, and the ends are still described', () => {
  const letters = lettersOf('C[C@H](O)'.repeat(200) + 'C');
  expect(letters).toHaveLength(200);
  expect(letters[0]).toBeDefined();
  expect(letters).toContain(undefined);
});

test('the same question has the same answer, whatever was asked before', () => {
  const smiles = 'C[C@H](O)'.repeat(60) + 'C';
  expect(lettersOf(smiles)).toEqual(lettersOf(smiles));
});

test('a nitrogen held in a cage counts when it is stated, and only then', () => {
  const troger = (first: string, second: string) =>
    enumerateStereoisomers(readSmiles(`Cc1ccc2c(c1)C${first}1Cc3cc(C)ccc3${second}2C1`).value!);
  expect(troger('N', 'N').units).toHaveLength(0);
  expect(troger('[N@]', '[N@]').units.length + troger('[N@]', '[N@@]').units.length).toBeGreaterThan(0);
});

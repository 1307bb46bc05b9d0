import { describe, expect, test } from 'vitest';
import { readSmiles } from '../../../../server/chemistry/structure/read-smiles.ts';
import { isOwnMirrorImage } from '../../../../server/chemistry/structure/stereo-mirror.ts';
import { describeStereo } from '../../../../server/chemistry/structure/stereo-words.ts';

const molecule = (smiles: string) => readSmiles(smiles).value!;

describe('a stereoisomer in words', () => {
  test('descriptors stand by rising locants', () => {
    const locants: Record<number, string> = { 1: '10', 3: '3a', 5: '3' };
    const words = describeStereo(molecule('C[C@H](O)[C@H](F)C[C@H](C)Cl'), (atom) => locants[atom]);
    expect(words.descriptors.replaceAll(/[RS]/g, '')).toBe('3a,10,');
  });

  test('a double bond takes the lower locant', () => {
    const words = describeStereo(molecule('C/C=C/C'), (atom) => String(atom + 1));
    expect(words).toEqual({ descriptors: '2E', meso: false });
  });

  test.each([
    ['meso-tartaric acid', 'OC(=O)[C@H](O)[C@H](O)C(=O)O', true],
    ['L-tartaric acid', 'OC(=O)[C@H](O)[C@@H](O)C(=O)O', false],
    ['cis-1,2-dimethylcyclohexane', 'C[C@H]1CCCC[C@H]1C', true],
    ['cis-1,4-dimethylcyclohexane: achiral, but nothing is opposite', 'C[C@H]1CC[C@@H](C)CC1', false],
  ])('%s', (_name, smiles, meso) => {
    expect(describeStereo(molecule(smiles), () => undefined).meso).toBe(meso);
  });
});

test('achiral and chiral', () => {
  expect(isOwnMirrorImage(molecule('C/C=C/C'))).toBe(true);
  expect(isOwnMirrorImage(molecule('CC[C@H](C)O'))).toBe(false);
  expect(isOwnMirrorImage(molecule('CC=[C@]=CC'))).toBe(false);
});

/** Which bonds an atom may form: real compounds pass in every spelling, and a wrong atom is named. */
import { describe, expect, test } from 'vitest';
import { readSmiles } from '../../../../server/chemistry/structure/read-smiles.ts';
import { valenceProblems } from '../../../../server/chemistry/structure/valence.ts';

const problemsIn = (smiles: string) => valenceProblems(readSmiles(smiles).value!);

// Common practice, no source: these compounds are in every catalogue.
test.each([
  'C[N+](=O)[O-]',
  'CN(=O)=O',
  'CN=[N+]=[N-]',
  'CN=N#N',
  'C=[N+]=[N-]',
  'O=n1ccccc1',
  '[O-][n+]1ccccc1',
  'CS(C)=O',
  'CS(C)(=O)=O',
  'C[S+](C)[O-]',
  'FS(F)(F)(F)(F)F',
  'O=P(Cl)(Cl)Cl',
  'ClP(Cl)(Cl)(Cl)Cl',
  'F[P-](F)(F)(F)(F)F',
  'OCl(=O)(=O)=O',
  'FB(F)F',
  'F[B-](F)(F)F',
  'C[Si](C)(C)C',
  'C[N+](C)(C)C',
  '[C-]#[O+]',
  '[C-]#[N+]C',
  'CC(=O)OI1(OC(C)=O)(OC(C)=O)OC(=O)c2ccccc12',
  'c1ccc(cc1)P(c1ccccc1)(c1ccccc1)=C',
  'Cl[Pd](Cl)(Cl)Cl',
  'C[Mg]Br',
  '[CH3]',
  '[CH2]',
  'CC1(C)CCCC(C)(C)N1[O]',
  '[BH4-].[Na+]',
  '[H]1[BH2][H][BH2]1',
])('%s has no wrong valence', (smiles) => {
  expect(problemsIn(smiles)).toEqual([]);
});

describe('a wrong atom is named where it stands', () => {
  test.each([
    ['C«C»(C)(C)(C)C', 5, /carbon has five bonds; carbon forms four/],
    ['C«N»(C)(C)C', 5, /nitrogen has four bonds; nitrogen forms three.*\[N\+\]/],
    ['C«O»(C)C', 3, /oxygen has three bonds; oxygen forms two.*\[O\+\]/],
    ['C«F»C', 2, /fluorine has two bonds; fluorine forms one/],
    ['F«B»(F)(F)OC', 4, /boron has four bonds; boron forms three.*\[B-\]/],
    ['C«[CH4]»', 5, /carbon has five bonds, four of them to hydrogen/],
    ['C=«C»(C)(C)C', 5, /carbon has five bonds/],
    ['C«[N+]»(C)(C)(C)C', 5, /nitrogen with charge \+1 has five bonds/],
  ])('%s', (marked, bonds, message) => {
    const problems = problemsIn(marked.replace(/[«»]/g, ''));
    expect(problems).toHaveLength(1);
    expect(problems[0]!.range).toEqual({ start: marked.indexOf('«'), end: marked.indexOf('»') - 1 });
    expect(problems[0]!.bondsCounted).toBe(bonds);
    expect(problems[0]!.message).toMatch(message);
  });
});

/**
 * Spelling as notebooks have it: words run together or written apart, marks of italics. Common practice, no source;
 * structures from memory.
 */
import { expect, it } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { withStereo } from '../../../server/chemistry/structure/molecule.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

const names: readonly (readonly [source: string, name: string, smiles: string])[] = [
  ['common practice, no source', 'diethylether', 'CCOCC'],
  ['common practice, no source', 'dimethylsulfoxide', 'CS(C)=O'],
  ['common practice, no source', 'benzylchloride', 'ClCc1ccccc1'],
  ['common practice, no source', 'benzylalcohol', 'OCc1ccccc1'],
  ['common practice, no source', 'aceticacid', 'CC(=O)O'],
  ['common practice, no source', '2-methylpropanoicacid', 'CC(C)C(=O)O'],
  ['common practice, no source', 'isovalericacid', 'CC(C)CC(=O)O'],
  ['common practice, no source', 'ethylacetate', 'CCOC(C)=O'],
  ['common practice, no source', 'butylformate', 'CCCCOC=O'],
  ['common practice, no source', 'acetaldehydeoxime', 'CC=NO'],
  ['common practice, no source', '3-methyl octane', 'CCCCCC(C)CC'],
  ['common practice, no source', '2-chloro phenol', 'Oc1ccccc1Cl'],
  ['common practice, no source', '2-chloro benzoic acid', 'OC(=O)c1ccccc1Cl'],
  ['common practice, no source', 'ethyl 2-chloro benzoate', 'CCOC(=O)c1ccccc1Cl'],
  ['common practice, no source', 'diisobutyl carbinol', 'CC(C)CC(O)CC(C)C'],
  ['common practice, no source', 'dimethyl amine', 'CNC'],
  ['common practice, no source', 'phenyl hydrazine', 'NNc1ccccc1'],
  ['common practice, no source', '*N*,*N*-dimethylaniline', 'CN(C)c1ccccc1'],
  ['common practice, no source', '<i>N</i>,<i>N</i>-dimethylaniline', 'CN(C)c1ccccc1'],
  ['common practice, no source', '_tert_-butyl acetate', 'CC(=O)OC(C)(C)C'],
  ['common practice, no source', '4-nitro benzaldehyde', 'O=Cc1ccc(cc1)[N+](=O)[O-]'],
  ['common practice, no source', '1,2-dichloro ethane', 'ClCCCl'],
];

const constitution = (smiles: string) => canonicalSmiles(withStereo(readSmiles(smiles).value!, []));

it.each(names)('%s: %s', (_source, name, smiles) => {
  const reading = readName(name);
  expect(reading.kind).toBe('understood');
  if (reading.kind !== 'understood') return;
  expect(reading.readings).toHaveLength(1);
  expect(canonicalSmiles(withStereo(reading.readings[0]!.molecule, []))).toBe(constitution(smiles));
});

/** An ester, a substituted acid, or something else: not certain. */
const unread = ['ethyl alanine', 'butyl glycol', 'phenylacetate', 'methylpropionate', 'diethylacetate'];

it.each(unread)('%s is not read', (name) => {
  expect(readName(name).kind).toBe('unknown');
});

/**
 * Conjunctive names: 1979 recommendations C-51 to C-58 and the index names of Chemical Abstracts. Structures from memory.
 */
import { expect, it } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { withStereo } from '../../../server/chemistry/structure/molecule.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

const names: readonly (readonly [source: string, name: string, smiles: string])[] = [
  ['1979 rule C-52; CAS index names', '1-naphthaleneacetic acid', 'OC(=O)Cc1cccc2ccccc12'],
  ['1979 rule C-52; CAS index names', '9-anthracenemethanol', 'OCc1c2ccccc2cc2ccccc12'],
  ['1979 rule C-52; CAS index names', 'cyclohexanemethanol', 'OCC1CCCCC1'],
  ['1979 rule C-52; CAS index names', '4-methoxybenzeneacetic acid', 'COc1ccc(CC(=O)O)cc1'],
  ['1979 rule C-52; CAS index names', '1,3-cyclohexanedimethanamine', 'NCC1CCCC(CN)C1'],
  ['1979 rule C-52; CAS index names', 'benzeneethanol', 'OCCc1ccccc1'],
  ['1979 rule C-52; CAS index names', 'benzenemethanol', 'OCc1ccccc1'],
  ['1979 rule C-52; CAS index names', 'α-methylbenzenemethanol', 'CC(O)c1ccccc1'],
  ['1979 rule C-52; CAS index names', 'α,α-dimethylbenzeneethanol', 'CC(C)(O)Cc1ccccc1'],
  ['1979 rule C-52; CAS index names', 'β-methylbenzeneethanol', 'OCC(C)c1ccccc1'],
  ['1979 rule C-52; CAS index names', 'α-methylbenzeneethanamine', 'CC(N)Cc1ccccc1'],
  ['1979 rule C-52; CAS index names', 'N,α-dimethylbenzeneethanamine', 'CNC(C)Cc1ccccc1'],
  ['1979 rule C-52; CAS index names', '1H-indole-3-acetic acid', 'OC(=O)Cc1c[nH]c2ccccc12'],
  ['1979 rule C-52; CAS index names', '1H-indole-3-ethanamine', 'NCCc1c[nH]c2ccccc12'],
  ['1979 rule C-52; CAS index names', '1H-indole-3-butanoic acid', 'OC(=O)CCCc1c[nH]c2ccccc12'],
  ['1979 rule C-52; CAS index names', '2-pyridinemethanol', 'OCc1ccccn1'],
  ['1979 rule C-52; CAS index names', 'pyridine-2-methanol', 'OCc1ccccn1'],
  ['1979 rule C-52; CAS index names', '2-furanmethanol', 'OCc1ccco1'],
  ['1979 rule C-52; CAS index names', 'tetrahydropyran-2-methanol', 'OCC1CCCCO1'],
  ['1979 rule C-52; CAS index names', 'benzeneacetonitrile', 'N#CCc1ccccc1'],
  ['1979 rule C-52; CAS index names', 'benzeneacetaldehyde', 'O=CCc1ccccc1'],
  ['1979 rule C-52; CAS index names', 'benzenepropanoic acid', 'OC(=O)CCc1ccccc1'],
  [
    '1979 rule C-52; CAS index names',
    'α-methyl-4-(2-methylpropyl)benzeneacetic acid',
    'CC(C)Cc1ccc(cc1)C(C)C(=O)O',
  ],
  ['1979 rule C-52; CAS index names', 'α-hydroxybenzeneacetic acid', 'OC(C(=O)O)c1ccccc1'],
  ['1979 rule C-52; CAS index names', 'ethyl β-oxobenzenepropanoate', 'CCOC(=O)CC(=O)c1ccccc1'],
  ['1979 rule C-52; CAS index names', '1,4-benzenedimethanol', 'OCc1ccc(CO)cc1'],
  ['1979 rule C-52; CAS index names', 'methyl benzeneacetate', 'COC(=O)Cc1ccccc1'],
  ['1979 rule C-52; CAS index names', 'Benzeneacetic acid, ethyl ester', 'CCOC(=O)Cc1ccccc1'],
  ['1979 rule C-52; CAS index names', 'Benzenemethanol, 4-methoxy-', 'COc1ccc(CO)cc1'],
  ['1979 rule C-52; CAS index names', 'benzenemethanesulfonyl chloride', 'O=S(=O)(Cl)Cc1ccccc1'],
  ['1979 rule C-52; CAS index names', 'benzenebutanamine', 'NCCCCc1ccccc1'],
  ['1979 rule C-52; CAS index names', 'cyclopentaneethanol', 'OCCC1CCCC1'],
  ['1979 rule C-52; CAS index names', 'thiophene-2-acetic acid', 'OC(=O)Cc1cccs1'],
  ['1979 rule C-52; CAS index names', '2-thiopheneethanol', 'OCCc1cccs1'],
  ['1979 rule C-52; CAS index names', 'N,N-dimethylbenzenemethanamine', 'CN(C)Cc1ccccc1'],
  ['1979 rule C-52; CAS index names', '4-hydroxy-3-methoxybenzeneethanol', 'COc1cc(CCO)ccc1O'],
];

const constitution = (smiles: string) => canonicalSmiles(withStereo(readSmiles(smiles).value!, []));

it.each(names)('%s: %s', (_source, name, smiles) => {
  const reading = readName(name);
  expect(reading.kind).toBe('understood');
  if (reading.kind !== 'understood') return;
  expect(reading.readings).toHaveLength(1);
  expect(canonicalSmiles(withStereo(reading.readings[0]!.molecule, []))).toBe(constitution(smiles));
});

it('asks for the place on a ring whose places differ', () => {
  expect(readName('naphthaleneacetic acid').kind).toBe('unknown');
});

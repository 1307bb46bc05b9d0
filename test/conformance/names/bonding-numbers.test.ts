/**
 * Bonding numbers: IUPAC Recommendations 2013, P-14.1 (the λ convention), P-21.1.2 and P-22.2.2.1; structures from memory.
 * Spellings of λ, and names that leave it out: common practice, no source.
 */
import { expect, it } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { withStereo } from '../../../server/chemistry/structure/molecule.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

const names: readonly (readonly [source: string, name: string, smiles: string])[] = [
  ['P-21.1.2', 'λ5-phosphane', '[PH5]'],
  ['P-21.1.2', 'λ6-sulfane', '[SH6]'],
  ['P-21.1.2', 'triphenyl-λ5-phosphanone', 'O=P(c1ccccc1)(c1ccccc1)c1ccccc1'],
  ['P-14.1', 'tetramethoxy-λ4-sulfane', 'COS(OC)(OC)OC'],
  ['P-14.1', 'difluoro(dimethyl)-λ4-sulfane', 'CS(C)(F)F'],
  ['P-14.1', 'trifluoro(phenyl)-λ4-sulfane', 'FS(F)(F)c1ccccc1'],
  ['P-14.1', 'pentafluoro(phenyl)-λ6-sulfane', 'FS(F)(F)(F)(F)c1ccccc1'],
  ['P-14.1', 'pentaphenyl-λ5-stibane', 'c1ccccc1[Sb](c1ccccc1)(c1ccccc1)(c1ccccc1)c1ccccc1'],
  ['P-14.1', '5λ5-phosphaspiro[4.4]nonane', 'C1CC[PH]2(C1)CCCC2'],
  ['P-22.2.2.1', 'λ5-phosphinine', 'C1=CC=C[PH2]=C1'],
  ['P-22.2.2.1', '1H-1λ4-thiophene', 'C1=CC=C[SH2]1'],
  ['P-22.2.2.1', '1,1-dioxo-1λ6,2-thiazolidine', 'O=S1(=O)CCCN1'],
  ['P-22.2.2.1', '2,3-dihydro-1λ6,2-benzothiazole-1,1-dione', 'O=S1(=O)NCc2ccccc12'],
  ['P-22.2.2.1', '4H-1λ6,2,4-benzothiadiazine-1,1-dione', 'O=S1(=O)N=CNc2ccccc12'],
  ['P-22.2.2.1', '1-hydroxy-1λ3,2-benziodoxol-3(1H)-one', 'OI1OC(=O)c2ccccc12'],
  ['P-22.2.2.1', 'arsinine', 'C1=CC=[As]C=C1'],
  ['common practice, no source', 'tetramethoxy-lambda4-sulfane', 'COS(OC)(OC)OC'],
  ['common practice, no source', 'trimethoxy-sulfanylidene-lambda^5-phosphane', 'COP(=S)(OC)OC'],
  ['common practice, no source', 'triethoxy-sulfanylidene-Î»5-phosphane', 'CCOP(=S)(OCC)OCC'],
  ['common practice, no source', '1-lambda6-thiane-1,1-dione', 'O=S1(=O)CCCCC1'],
  [
    'common practice, no source',
    '1-(pentafluoro-lambda6-sulfanyl)-4-nitrobenzene',
    'FS(F)(F)(F)(F)c1ccc(cc1)[N+](=O)[O-]',
  ],
  ['common practice, no source', 'pentafluoro-λ6-sulfanylbenzene', 'FS(F)(F)(F)(F)c1ccccc1'],
  ['common practice, no source', '1,1-dioxothiolan-3-amine', 'NC1CCS(=O)(=O)C1'],
  ['common practice, no source', '2-hydroxy-2-oxo-1,3,2-dioxaphosphinane', 'OP1(=O)OCCCO1'],
  ['common practice, no source', '4-(1-oxothian-4-yl)phenol', 'O=S1CCC(CC1)c1ccc(O)cc1'],
  ['P-15.4', '1-mercuracyclopenta-2,4-diene', 'C1=C[Hg]C=C1'],
  ['P-73.4', '5-azoniaspiro[4.4]nonane', 'C1CC[N+]2(C1)CCCC2'],
  ['P-73.4', '9,9-dimethyl-9-azoniabicyclo[3.3.1]nonane', 'C[N+]1(C)C2CCCC1CCC2'],
  ['P-73.4', '1-oxoniabicyclo[2.2.1]heptane', 'C1CC2CC[O+]1C2'],
];

const constitution = (smiles: string) => canonicalSmiles(withStereo(readSmiles(smiles).value!, []));

it.each(names)('%s: %s', (_source, name, smiles) => {
  const reading = readName(name);
  expect(reading.kind).toBe('understood');
  if (reading.kind !== 'understood') return;
  const found = reading.readings.map((one) => canonicalSmiles(withStereo(one.molecule, [])));
  expect(found).toEqual([constitution(smiles)]);
});

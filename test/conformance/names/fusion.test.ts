/**
 * Fusion names (IUPAC Recommendations 2013, P-25.3). Numbering shows in where groups sit: each structure is the compound
 * known under the name, drawn by hand. Names of the rules carry their number; those of compounds and reagents in use are
 * 'from memory'.
 */
import { describe, expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { constitutionalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

const rows: readonly (readonly [source: string, name: string, smiles: string])[] = [
  ['P-25.3.4.1.1', 'furo[3,2-b]furan', 'c1cc2occc2o1'],
  ['P-25.3.1.3', 'thieno[2,3-b]furan', 'c1cc2ccsc2o1'],
  ['from memory', '6-methylimidazo[1,2-a]pyridine', 'Cc1ccc2nccn2c1'],
  ['from memory', '2-methylpyrazolo[1,5-a]pyrimidine', 'Cc1cc2ncccn2n1'],
  ['from memory', '7-chlorothieno[3,2-b]pyridine', 'Clc1ccnc2ccsc12'],
  ['from memory', '4-chlorothieno[2,3-d]pyrimidine', 'Clc1ncnc2sccc12'],
  ['from memory', '7H-pyrrolo[2,3-d]pyrimidin-4-amine', 'Nc1ncnc2[nH]ccc12'],
  ['from memory', '1H-pyrazolo[3,4-d]pyrimidin-4-amine', 'Nc1ncnc2[nH]ncc12'],
  ['from memory', '5-bromo-1H-pyrrolo[2,3-b]pyridine', 'Brc1cnc2[nH]ccc2c1'],
  ['from memory', '[1,2,4]triazolo[1,5-a]pyridin-2-amine', 'Nc1nc2ccccn2n1'],
  ['from memory', '[1,2,4]triazolo[4,3-a]pyridin-3(2H)-one', 'O=c1[nH]nc2ccccn12'],
  ['from memory', 'benzo[d][1,3]dioxole-5-carbaldehyde', 'O=Cc1ccc2OCOc2c1'],
  ['from memory', '10,11-dihydro-5H-dibenzo[b,f]azepine', 'C1Cc2ccccc2Nc2ccccc12'],
  ['from memory', '10,11-dihydro-5H-dibenz[b,f]azepine', 'C1Cc2ccccc2Nc2ccccc12'],
  [
    'from memory',
    '8-chloro-11-(4-methylpiperazin-1-yl)-5H-dibenzo[b,e][1,4]diazepine',
    'CN1CCN(CC1)C1=Nc2cc(Cl)ccc2Nc2ccccc12',
  ],
  [
    'from memory',
    '2-methyl-4-(4-methylpiperazin-1-yl)-10H-thieno[2,3-b][1,5]benzodiazepine',
    'Cc1cc2c(s1)Nc1ccccc1N=C2N1CCN(C)CC1',
  ],
  ['from memory', '11-(piperazin-1-yl)dibenzo[b,f][1,4]thiazepine', 'C1CN(CCN1)C1=Nc2ccccc2Sc2ccccc12'],
  [
    'from memory',
    '8-chloro-6-(2-fluorophenyl)-1-methyl-4H-imidazo[1,5-a][1,4]benzodiazepine',
    'Cc1ncc2CN=C(c3ccccc3F)c3cc(Cl)ccc3-n12',
  ],
  [
    'from memory',
    'N-[3-(3-cyanopyrazolo[1,5-a]pyrimidin-7-yl)phenyl]-N-ethylacetamide',
    'CCN(C(C)=O)c1cccc(c1)-c1ccnc2c(cnn12)C#N',
  ],
  ['from memory', '5-benzyl-4,5,6,7-tetrahydrothieno[3,2-c]pyridine', 'c1ccccc1CN1CCc2sccc2C1'],
  ['from memory', '1,5-dihydro-4H-pyrazolo[3,4-d]pyrimidin-4-one', 'O=c1[nH]cnc2[nH]ncc12'],
  ['from memory', '7,12-dimethylbenzo[a]anthracene', 'Cc1c2ccccc2c(C)c2c1ccc1ccccc12'],
  ['from memory', 'dibenzo[a,h]anthracene', 'c1ccc2c(c1)ccc1cc3c(ccc4ccccc34)cc12'],
  ['from memory', '11H-benzo[a]fluorene', 'C1c2ccccc2-c2ccc3ccccc3c12'],
  ['from memory', '7H-dibenzo[c,g]carbazole', 'N1c2ccc3ccccc3c2-c2c1ccc1ccccc21'],
  ['from memory', '4H-thieno[3,2-b]pyrrole', 'c1cc2sccc2[nH]1'],
  ['from memory', '7H-furo[3,2-g]chromen-7-one', 'O=c1ccc2cc3ccoc3cc2o1'],
  ['from memory', '1-(2-methylpropyl)-1H-imidazo[4,5-c]quinolin-4-amine', 'CC(C)Cn1cnc2c(N)nc3ccccc3c12'],
  ['from memory', '1-methyl-9H-pyrido[3,4-b]indole', 'Cc1nccc2c1[nH]c1ccccc12'],
  ['from memory', '5H-pyrido[4,3-b]indole', 'c1ccc2c(c1)[nH]c1ccncc12'],
  ['from memory', '2,3,4,9-tetrahydro-1H-pyrido[3,4-b]indole', 'C1CNCc2[nH]c3ccccc3c12'],
  ['from memory', '6,7-dihydro-5H-cyclopenta[b]pyridine', 'C1Cc2cccnc2C1'],
  ['from memory', '1,2,3,4-tetrahydrocyclopenta[b]indole', 'C1Cc2[nH]c3ccccc3c2C1'],
  ['from memory', '2,3-dihydro-1H-cyclopenta[a]naphthalene', 'C1Cc2ccc3ccccc3c2C1'],
  ['from memory', 'naphtho[2,3-b]furan-4,9-dione', 'O=C1c2ccccc2C(=O)c2occc12'],
  ['from memory', '1H-naphtho[2,3-d]imidazole', 'c1ccc2cc3[nH]cnc3cc2c1'],
  ['from memory', '5,7-dibromothieno[3,4-b]pyrazine', 'Brc1sc(Br)c2nccnc12'],
  ['from memory', '2,3-dihydrothieno[3,4-b][1,4]dioxine', 'C1COc2cscc2O1'],
  ['from memory', '4,7-dibromobenzo[c][1,2,5]thiadiazole', 'Brc1ccc(Br)c2nsnc12'],
  ['from memory', "4,8-dimethoxybenzo[1,2-b:4,5-b']dithiophene", 'COc1c2ccsc2c(OC)c2ccsc12'],
  ['from memory', "2,6-dibromodithieno[3,2-b:2',3'-d]thiophene", 'Brc1cc2sc3cc(Br)sc3c2s1'],
  ['from memory', 'pyrazino[2,3-d]pyrimidine-2,4-diamine', 'Nc1nc(N)c2nccnc2n1'],
  ['from memory', 'octahydropyrrolo[1,2-a]pyrazine', 'C1CCN2CCNCC12'],
  ['from memory', 'octahydropyrrolo[3,4-c]pyrrole', 'C1NCC2CNCC12'],
  ['from memory', '2,3,6,7-tetrahydro-1H,5H-pyrido[3,2,1-ij]quinoline', 'C1Cc2cccc3CCCN(C1)c23'],
  ['from memory', '2,3,4,6,7,8,9,10-octahydropyrimido[1,2-a]azepine', 'C1CCC2=NCCCN2CC1'],
  ['from memory', '2,3,4,6,7,8-hexahydropyrrolo[1,2-a]pyrimidine', 'C1CC2=NCCCN2C1'],
  ['from memory', '1,3,4,6,7,8-hexahydro-2H-pyrimido[1,2-a]pyrimidine', 'C1CNC2=NCCCN2C1'],
  ['from memory', '6-phenyl-2,3,5,6-tetrahydroimidazo[2,1-b][1,3]thiazole', 'C1CSC2=NC(CN12)c1ccccc1'],
  ['from memory', '3H-benzo[f]chromene', 'C1=Cc2c(OC1)ccc1ccccc21'],
  ['from memory', '2H-benzo[h]chromene', 'C1C=Cc2ccc3ccccc3c2O1'],
  ['from memory', 'benzo[h]quinolin-10-ol', 'Oc1cccc2ccc3cccnc3c12'],
  ['from memory', 'benzo[f]quinoline', 'c1ccc2c(c1)ccc1ncccc12'],
  ['from memory', "dipyrido[3,2-a:2',3'-c]phenazine", 'c1cnc2c(c1)c1nc3ccccc3nc1c1cccnc12'],
  ['from memory', 'imidazo[1,5-a]pyridine', 'c1ccn2cncc2c1'],
  ['from memory', '11H-indeno[1,2-b]quinoxalin-11-one', 'O=C1c2ccccc2-c2nc3ccccc3nc12'],
  ['from memory', '6H-indolo[2,3-b]quinoxaline', 'c1ccc2c(c1)[nH]c1nc3ccccc3nc21'],
  [
    'from memory',
    "4-ethyl-4-hydroxy-1H-pyrano[3',4':6,7]indolizino[1,2-b]quinoline-3,14(4H,12H)-dione",
    'CCC1(O)C(=O)OCC2=C1C=C1N(Cc3cc4ccccc4nc13)C2=O',
  ],
  ['from memory', '5,11-dimethyl-6H-pyrido[4,3-b]carbazole', 'Cc1c2ccncc2c(C)c2c1[nH]c1ccccc21'],
  ['from memory', 'benzo[b]naphtho[2,3-d]thiophene', 'c1ccc2cc3c(cc2c1)sc1ccccc13'],
  ['from memory', 'benzo[b]naphtho[1,2-d]furan', 'c1ccc2c(c1)ccc1oc3ccccc3c12'],
  ['from memory', '1H-cyclopropa[b]naphthalene', 'C1c2cc3ccccc3cc12'],
  ['from memory', '6,7,8,9-tetrahydro-5H-benzo[7]annulene', 'C1CCCc2ccccc2C1'],
  ['P-25.3.4.2.1', '5H-benzo[7]annulene', 'C1C=CC=Cc2ccccc12'],
  ['from memory', '5H-dibenzo[a,d][7]annulen-5-one', 'O=C1c2ccccc2C=Cc2ccccc12'],
  ['from memory', '5H-dibenzo[a,d]cyclohepten-5-one', 'O=C1c2ccccc2C=Cc2ccccc12'],
  ['from memory', '2-chlorothiazolo[5,4-b]pyridine', 'Clc1nc2cccnc2s1'],
  ['from memory', 'oxazolo[4,5-b]pyridin-2(3H)-one', 'O=c1[nH]c2ncccc2o1'],
  ['from memory', '3H-[1,2,3]triazolo[4,5-b]pyridin-3-ol', 'On1nnc2cccnc12'],
  ['from memory', '6,7-dihydrothieno[3,2-c]pyridine', 'C1CN=Cc2ccsc12'],
  ['P-25.3.4.2.4', '1H-cyclopropa[b]naphthalene', 'C1c2cc3ccccc3cc12'],
  ['from memory', '1H-pyrrolo[3,2-c]pyridine', 'c1cc2[nH]ccc2cn1'],
  ['from memory', '1H-pyrrolo[3,2-b]pyridine', 'c1cnc2cc[nH]c2c1'],
  ['from memory', '1H-pyrrolo[2,3-c]pyridine', 'c1cc2cc[nH]c2cn1'],
  ['from memory', 'furo[2,3-c]pyridine-5-carboxylic acid', 'OC(=O)c1cc2ccoc2cn1'],
  ['from memory', '6-chloro-3-methylimidazo[1,2-b]pyridazine', 'Cc1cnc2ccc(Cl)nn12'],
  ['from memory', '8-bromo-[1,2,4]triazolo[1,5-a]pyrazine', 'Brc1nccn2ncnc12'],
  ['from memory', '5,6,7,8-tetrahydro-[1,2,4]triazolo[4,3-a]pyrazine', 'C1NCCn2cnnc12'],
  ['from memory', '4H-cyclopenta[def]phenanthrene', 'C1c2cccc3ccc4cccc1c4c23'],
  ['from memory', 'acenaphtho[1,2-b]quinoxaline', 'c1ccc2nc3c(nc2c1)-c1cccc2cccc3c12'],
  ['from memory', '1H-benzo[de]isoquinoline-1,3(2H)-dione', 'O=C1NC(=O)c2cccc3cccc1c23'],
];

describe('fusion names', () => {
  test.each(rows.filter(([, , smiles]) => smiles !== ''))('%s: %s', (_, name, smiles) => {
    const reading = readName(name);
    if (reading.kind !== 'understood') throw new Error(`${name}: ${reading.message}`);
    const wanted = readSmiles(smiles).value!;
    const sameConstitution = reading.readings.map(({ molecule }) => constitutionalSmiles(molecule));
    expect(sameConstitution).toEqual([constitutionalSmiles(wanted)]);
    if (wanted.stereo.length > 0)
      expect(canonicalSmiles(reading.readings[0]!.molecule)).toBe(canonicalSmiles(wanted));
  });

  test.each([
    ['a side that the ring does not have', 'benzo[z]pyridine'],
    ['elements that do not match', 'imidazo[1,2-b]pyridine'],
    ['a path longer than the sides', 'naphtho[1,2,3-b]furan'],
    ['locants left out where they matter', 'pyrido[d]pyrimidine'],
    ['atoms in too many rings', 'dibenzo[b,b]furan'],
  ])('%s: %s is unknown', (_, name) => {
    expect(readName(name).kind).toBe('unknown');
  });
});

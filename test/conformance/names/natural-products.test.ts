/**
 * Retained names of natural acids, nucleobases and ring ketones, each held against the systematic name of the same
 * compound, read by rule. Names of fatty acids: IUPAC-IUB Nomenclature of Lipids (1976), appendix A; the others: common
 * practice, no source.
 */
import { expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';

function only(name: string): string {
  const reading = readName(name);
  if (reading.kind !== 'understood') throw new Error(`${name}: ${reading.message}`);
  expect(reading.readings, name).toHaveLength(1);
  return canonicalSmiles(reading.readings[0]!.molecule);
}

test.each([
  ['pelargonic acid', 'nonanoic acid'],
  ['undecylenic acid', 'undec-10-enoic acid'],
  ['margaric acid', 'heptadecanoic acid'],
  ['arachidic acid', 'icosanoic acid'],
  ['behenic acid', 'docosanoic acid'],
  ['lignoceric acid', 'tetracosanoic acid'],
  ['palmitoleic acid', '(9Z)-hexadec-9-enoic acid'],
  ['elaidic acid', '(9E)-octadec-9-enoic acid'],
  ['linoleic acid', '(9Z,12Z)-octadeca-9,12-dienoic acid'],
  ['methyl linoleate', 'methyl (9Z,12Z)-octadeca-9,12-dienoate'],
  ['α-linolenic acid', '(9Z,12Z,15Z)-octadeca-9,12,15-trienoic acid'],
  ['γ-linolenic acid', '(6Z,9Z,12Z)-octadeca-6,9,12-trienoic acid'],
  ['arachidonic acid', '(5Z,8Z,11Z,14Z)-icosa-5,8,11,14-tetraenoic acid'],
  ['erucic acid', '(13Z)-docos-13-enoic acid'],
  ['sorbic acid', '(2E,4E)-hexa-2,4-dienoic acid'],
  ['brassylic acid', 'tridecanedioic acid'],
  ['citraconic acid', '(2Z)-2-methylbut-2-enedioic acid'],
  ['mesaconic acid', '(2E)-2-methylbut-2-enedioic acid'],
  ['oxaloacetic acid', '2-oxobutanedioic acid'],
  ['hippuric acid', '2-benzamidoacetic acid'],
  ['benzilic acid', '2-hydroxy-2,2-diphenylacetic acid'],
  ['2-furoic acid', 'furan-2-carboxylic acid'],
  ['methyl 3-furoate', 'methyl furan-3-carboxylate'],
  ['5-bromo-2-furoic acid', '5-bromofuran-2-carboxylic acid'],
  ['1-naphthoic acid', 'naphthalene-1-carboxylic acid'],
  ['2-naphthoic acid', 'naphthalene-2-carboxylic acid'],
  ['3-hydroxy-2-naphthoic acid', '3-hydroxynaphthalene-2-carboxylic acid'],
  ['4-bromo-1-naphthoic acid', '4-bromonaphthalene-1-carboxylic acid'],
  ['gallic acid', '3,4,5-trihydroxybenzoic acid'],
  ['propyl gallate', 'propyl 3,4,5-trihydroxybenzoate'],
  ['syringic acid', '4-hydroxy-3,5-dimethoxybenzoic acid'],
  ['protocatechuic acid', '3,4-dihydroxybenzoic acid'],
  ['gentisic acid', '2,5-dihydroxybenzoic acid'],
  ['homovanillic acid', '2-(4-hydroxy-3-methoxyphenyl)acetic acid'],
  ['piperonylic acid', '1,3-benzodioxole-5-carboxylic acid'],
  ['p-coumaric acid', '(2E)-3-(4-hydroxyphenyl)prop-2-enoic acid'],
  ['caffeic acid', '(2E)-3-(3,4-dihydroxyphenyl)prop-2-enoic acid'],
  ['ferulic acid', '(2E)-3-(4-hydroxy-3-methoxyphenyl)prop-2-enoic acid'],
  ['sinapic acid', '(2E)-3-(4-hydroxy-3,5-dimethoxyphenyl)prop-2-enoic acid'],
  ['uracil', 'pyrimidine-2,4(1H,3H)-dione'],
  ['5-fluorouracil', '5-fluoropyrimidine-2,4(1H,3H)-dione'],
  ['6-methyluracil', '6-methylpyrimidine-2,4(1H,3H)-dione'],
  ['1-methyluracil', '1-methylpyrimidine-2,4(1H,3H)-dione'],
  ['thymine', '5-methylpyrimidine-2,4(1H,3H)-dione'],
  ['cytosine', '4-aminopyrimidin-2(1H)-one'],
  ['adenine', '9H-purin-6-amine'],
  ['9-ethyladenine', '9-ethyl-9H-purin-6-amine'],
  ['N6-benzyladenine', 'N-benzyl-9H-purin-6-amine'],
  ['9-methylguanine', '2-amino-9-methyl-1,9-dihydro-6H-purin-6-one'],
  ['guanine', '2-amino-1,9-dihydro-6H-purin-6-one'],
  ['8-bromoguanine', '2-amino-8-bromo-1,9-dihydro-6H-purin-6-one'],
  ['hypoxanthine', '1,9-dihydro-6H-purin-6-one'],
  ['xanthine', '3,7-dihydro-1H-purine-2,6-dione'],
  ['8-bromoxanthine', '8-bromo-3,7-dihydro-1H-purine-2,6-dione'],
  ['1-methylxanthine', '1-methyl-3,7-dihydro-1H-purine-2,6-dione'],
  ['8-chlorotheophylline', '8-chloro-1,3-dimethyl-3,7-dihydro-1H-purine-2,6-dione'],
  ['caffeine', '1,3,7-trimethyl-3,7-dihydro-1H-purine-2,6-dione'],
  ['5,5-diethylbarbituric acid', '5,5-diethylpyrimidine-2,4,6(1H,3H,5H)-trione'],
  ['5-bromoisatin', '5-bromo-1H-indole-2,3-dione'],
  ['N-methylisatin', '1-methyl-1H-indole-2,3-dione'],
  ['chromone', '4H-chromen-4-one'],
  ['7-hydroxyflavone', '7-hydroxy-2-phenyl-4H-chromen-4-one'],
  ["4'-methoxyflavone", '2-(4-methoxyphenyl)-4H-chromen-4-one'],
  ['isoflavone', '3-phenyl-4H-chromen-4-one'],
  ['xanthone', '9H-xanthen-9-one'],
  ['anthrone', 'anthracen-9(10H)-one'],
  ['2-bromofluorenone', '2-bromo-9H-fluoren-9-one'],
  ['4-methylumbelliferone', '7-hydroxy-4-methyl-2H-chromen-2-one'],
  ['1-tetralone', '3,4-dihydronaphthalen-1(2H)-one'],
  ['6-methoxy-1-tetralone', '6-methoxy-3,4-dihydronaphthalen-1(2H)-one'],
  ['2-tetralone', '3,4-dihydronaphthalen-2(1H)-one'],
  ['5-bromo-1-indanone', '5-bromo-2,3-dihydro-1H-inden-1-one'],
  ['2-indanone', '1,3-dihydro-2H-inden-2-one'],
  ['4-chromanone', '2,3-dihydro-4H-chromen-4-one'],
  ['5-chlorooxindole', '5-chloro-1,3-dihydro-2H-indol-2-one'],
])('%s is %s', (name, systematic) => {
  expect(only(name)).toBe(only(systematic));
});

test('a trade name with a prefix that is no substitution is not read as one', () => {
  expect(readName('hydroxycitronellal').kind).toBe('unknown');
});

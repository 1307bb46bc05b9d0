/**
 * Names as they are written in notebooks rather than in the recommendations. Rules are those of 1979 where a number with C
 * stands beside them; the rest is 'common practice, no source'. Structures are drawn by hand.
 */
import { expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';
import { writeSmiles } from '../../../server/chemistry/structure/write-smiles.ts';

const practice = 'common practice, no source';

test.each<[source: string, name: string, smiles: string]>([
  // The chain of a phenone has plain locants, its ring primed ones; plain ones for the ring where they fit only there.
  ['C-313.2', '2-bromoacetophenone', 'BrCC(=O)c1ccccc1'],
  ['C-313.2', "2'-bromoacetophenone", 'CC(=O)c1ccccc1Br'],
  ['C-313.2', "2-bromo-4'-methoxyacetophenone", 'COc1ccc(cc1)C(=O)CBr'],
  ['C-313.2', '2-bromopropiophenone', 'CC(Br)C(=O)c1ccccc1'],
  ['C-313.2', '3-chloropropiophenone', 'ClCCC(=O)c1ccccc1'],
  [practice, '4-methoxyacetophenone', 'COc1ccc(cc1)C(C)=O'],
  [practice, '2,4-dihydroxyacetophenone', 'CC(=O)c1ccc(O)cc1O'],
  [practice, '3,4-dichloropropiophenone', 'CCC(=O)c1ccc(Cl)c(Cl)c1'],
  // One locant before several groups: that of the compound group.
  [practice, '2-diethylaminoethyl 4-aminobenzoate', 'CCN(CC)CCOC(=O)c1ccc(N)cc1'],
  [practice, '4-dimethylaminopyridine', 'CN(C)c1ccncc1'],
  [practice, '3-dimethylaminopropan-1-ol', 'CN(C)CCCO'],
  [practice, '4-dimethylaminobenzaldehyde', 'CN(C)c1ccc(C=O)cc1'],
  // Families of imidic and peroxy acids, nitrosamines, and descriptors before a group that joins others.
  ['P-65.1.3.1.1', 'methyl ethanimidate', 'CC(=N)OC'],
  ['P-65.1.3.1.1', 'ethyl benzenecarboximidate', 'CCOC(=N)c1ccccc1'],
  ['P-65.5.3', 'N-phenylbenzenecarboximidoyl chloride', 'ClC(=Nc1ccccc1)c1ccccc1'],
  ['P-65.1.4.1', 'ethyl ethaneperoxoate', 'CCOOC(C)=O'],
  ['P-65.1.5.1', 'methyl ethanedithioate', 'CSC(C)=S'],
  ['P-61.6', 'N-methyl-N-phenylnitramide', 'CN(c1ccccc1)[N+](=O)[O-]'],
  ['P-68.3.1.3.2', '4-[(E)-phenyldiazenyl]phenol', 'Oc1ccc(cc1)/N=N/c1ccccc1'],
  ['P-66.3.1', '2-[(E)-N-ethoxy-C-ethylcarbonimidoyl]phenol', 'CC/C(=N\\OCC)c1ccccc1O'],
  ['P-66.1.6.1.1.3', '3-(ethylcarbamoylamino)propanoic acid', 'CCNC(=O)NCCC(=O)O'],
  // A metal with groups on it, then what else it is bound to.
  ['P-69.2.2', 'methylmagnesium bromide', 'C[Mg]Br'],
  ['P-69.2.2', '(4-methoxyphenyl)magnesium bromide', 'COc1ccc([Mg]Br)cc1'],
  ['P-69.2.2', 'tributyltin chloride', 'CCCC[Sn](Cl)(CCCC)CCCC'],
  ['P-69.2.2', 'tributyltin hydride', 'CCCC[SnH](CCCC)CCCC'],
  ['P-69.2.2', 'diisobutylaluminium hydride', 'CC(C)C[AlH]CC(C)C'],
  ['P-69.2.2', 'ethylaluminium dichloride', 'CC[Al](Cl)Cl'],
  ['P-69.2.2', 'dibutyltin diacetate', 'CCCC[Sn](CCCC)(OC(C)=O)OC(C)=O'],
  // Peroxy acids of acids with retained names, and reagents of the laboratory.
  ['P-65.1.4.2', '3-chloroperoxybenzoic acid', 'OOC(=O)c1cccc(Cl)c1'],
  ['P-65.1.4.2', 'tert-butyl perbenzoate', 'CC(C)(C)OOC(=O)c1ccccc1'],
  ['P-66.4.1.2.1', "N,N'-dicyclohexylcarbodiimide", 'C1CCCCC1N=C=NC1CCCCC1'],
  ['P-66.4.1.2.1', '1-ethyl-3-(3-dimethylaminopropyl)carbodiimide', 'CCN=C=NCCCN(C)C'],
  [practice, 'triethyl phosphonoacetate', 'CCOC(=O)CP(=O)(OCC)OCC'],
  [practice, 'diisopropyl azodicarboxylate', 'CC(C)OC(=O)N=NC(=O)OC(C)C'],
  [practice, 'diphenyl phosphorazidate', '[N-]=[N+]=NP(=O)(Oc1ccccc1)Oc1ccccc1'],
  [practice, 'potassium vinyltrifluoroborate', '[K+].C=C[B-](F)(F)F'],
  [practice, '4-bromophenacyl bromide', 'BrCC(=O)c1ccc(Br)cc1'],
  [practice, '4-bromobenzotrifluoride', 'FC(F)(F)c1ccc(Br)cc1'],
  [practice, 'S-methylisothiourea', 'CSC(N)=N'],
  [practice, '1,1-dimethylbiguanide', 'CN(C)C(=N)NC(N)=N'],
  [
    'P-65.6.3.2.2',
    '3-O-ethyl 5-O-methyl 2,6-dimethyl-1,4-dihydropyridine-3,5-dicarboxylate',
    'CCOC(=O)C1=C(C)NC(C)=C(C1)C(=O)OC',
  ],
  [practice, 'pyridinium dichromate', 'c1cc[nH+]cc1.c1cc[nH+]cc1.[O-][Cr](=O)(=O)O[Cr](=O)(=O)[O-]'],
  // Brackets in brackets, and groups on amino acids and diesters.
  [practice, '2-[(methylsulfonyl)amino]propanoic acid', 'CC(NS(C)(=O)=O)C(=O)O'],
  [practice, '4-((tert-butoxycarbonyl)amino)butanoic acid', 'CC(C)(C)OC(=O)NCCCC(=O)O'],
  [practice, '(tert-butoxycarbonyl)-L-phenylalanine', 'OC(=O)[C@H](Cc1ccccc1)NC(=O)OC(C)(C)C'],
  [practice, 'methyl (tert-butoxycarbonyl)-L-alaninate', 'COC(=O)[C@H](C)NC(=O)OC(C)(C)C'],
  [
    practice,
    '1-(tert-butyl) 2-methyl (S)-pyrrolidine-1,2-dicarboxylate',
    'COC(=O)[C@@H]1CCCN1C(=O)OC(C)(C)C',
  ],
  [practice, '(carbethoxymethylene)triphenylphosphorane', 'CCOC(=O)C=P(c1ccccc1)(c1ccccc1)c1ccccc1'],
  [practice, '(triphenylphosphoranylidene)acetaldehyde', 'O=CC=P(c1ccccc1)(c1ccccc1)c1ccccc1'],
  // Hydrogen goes where there is a double bond to take it up: not to N–H, not to C=O.
  [practice, 'dihydrouracil', 'O=C1CCNC(=O)N1'],
])('%s: %s', (_, name, smiles) => {
  const reading = readName(name);
  if (reading.kind !== 'understood') throw new Error(`${name}: ${reading.message}`);
  expect(reading.readings.map(({ molecule }) => canonicalSmiles(molecule))).toEqual([
    canonicalSmiles(readSmiles(smiles).value!),
  ]);
});

test('one locant is not enough for two groups on the parent itself', () => {
  expect(readName('2-dimethylpropane').kind).toBe('unknown');
  expect(readName('1-dichlorobenzene').kind).toBe('unknown');
  expect(readName('methylmagnesium dibromide').kind).toBe('unknown');
});

test('a salt keeps the charges that its name gives it', () => {
  const reading = readName('pyridinium chloride');
  if (reading.kind !== 'understood') throw new Error(reading.message);
  const smiles = writeSmiles(reading.readings[0]!.molecule);
  expect(smiles).toContain('[NH+]');
  expect(smiles).toContain('[Cl-]');
});

test.each([
  // Three acid groups cannot all end one chain (P-65.1.2.2.2); a cyano group is no end of it.
  '2-hydroxypropane-1,2,3-tricarboxylic acid',
  'ethyl 2-cyanoethanoate',
  // The axis of a biaryl has a descriptor of its own (P-92.1.2.2.1.1).
  "(R)-1,1'-binaphthalene-2,2'-diol",
])('nothing is said against %s', (name) => {
  const reading = readName(name);
  if (reading.kind !== 'understood') throw new Error(reading.message);
  expect(reading.remarks).toEqual([]);
});

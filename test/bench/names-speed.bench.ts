/**
 * Reading names to their readings, against the toolkit's parse and canonical SMILES of the same compounds, in one process.
 * The goal is a ratio of at most 1.
 */
import { createNameReader } from '../../server/chemistry/nomenclature/read-name.ts';
import { writeSmiles } from '../../server/chemistry/structure/write-smiles.ts';
import { loadRdkit, withMolecule } from '../support/rdkit.ts';
import { show, timed } from './figures.ts';

/** Names as notebooks have them, from reagents to targets. */
const names = [
  'ethyl acetate',
  'dichloromethane',
  '4-methoxybenzaldehyde',
  '2-bromo-1-(4-nitrophenyl)ethan-1-one',
  'N,N-diisopropylethylamine',
  'methyl 4-(bromomethyl)benzoate',
  'tert-butyl 4-hydroxypiperidine-1-carboxylate',
  '(S)-2-amino-3-phenylpropanoic acid',
  '4-(4,4,5,5-tetramethyl-1,3,2-dioxaborolan-2-yl)benzonitrile',
  '3-chloro-4-fluoroaniline',
  '1-(3,4-dimethoxyphenyl)propan-2-one',
  '(E)-3-(4-hydroxy-3-methoxyphenyl)prop-2-enoic acid',
  '5-bromo-1H-indole-3-carbaldehyde',
  '2-(pyridin-2-yl)-1H-benzimidazole',
  'ethyl 2-(triphenylphosphanylidene)acetate',
  'N-(4-hydroxyphenyl)acetamide',
  '(1R,2S,5R)-5-methyl-2-(propan-2-yl)cyclohexan-1-ol',
  'trimethyl(phenylethynyl)silane',
  'diethyl 2-ethyl-2-phenylpropanedioate',
  '6-chloro-9H-purin-2-amine',
  '(2E)-3,7-dimethylocta-2,6-dien-1-ol',
  '1,3-dicyclohexylurea',
  'potassium 4-nitrobenzoate',
  '4-methyl-N-(prop-2-yn-1-yl)benzenesulfonamide',
  'bicyclo[2.2.1]hept-5-ene-2-carboxylic acid',
  '2-[4-(2-methylpropyl)phenyl]propanoic acid',
  '7-chloro-1-methyl-5-phenyl-1,3-dihydro-2H-1,4-benzodiazepin-2-one',
  '4-(dimethylamino)pyridine',
  'benzyl (2S)-2-(hydroxymethyl)pyrrolidine-1-carboxylate',
  '3,5-bis(trifluoromethyl)benzyl alcohol',
  '2-(1H-1,2,4-triazol-1-yl)acetic acid',
  '1-(2-chloroethyl)piperazine dihydrochloride',
  '9-[2-(4-methoxyphenyl)ethyl]-9H-carbazole',
  'chlorotoluene',
  '2-octyldodecan-1-ol',
  '4-{[4-(hexyloxy)phenyl]ethynyl}-1-fluoro-2-methylbenzene',
  '2,2-dimethyl-1,3-dioxane-4,6-dione',
  'methyl (2R)-2-[(tert-butoxycarbonyl)amino]-3-hydroxypropanoate',
  '5-(4-chlorophenyl)-1,3,4-oxadiazole-2(3H)-thione',
  'quinolin-8-yl 4-methylbenzene-1-sulfonate',
];

const reader = createNameReader();
const structures: string[] = [];
for (const name of names) {
  const reading = reader.readName(name);
  if (reading.kind === 'understood') structures.push(writeSmiles(reading.readings[0]!.molecule));
  else console.log(`  not read: ${name}`);
}
const rdkit = await loadRdkit();
const perName = (milliseconds: { median: number; p95: number; count: number }, of: number) => ({
  ...milliseconds,
  median: (milliseconds.median * 1000) / of,
  p95: (milliseconds.p95 * 1000) / of,
});
const ours = timed(120, () => {
  for (const name of names) reader.readName(name);
});
const theirs = timed(40, () => {
  for (const smiles of structures) withMolecule(rdkit, smiles, (molecule) => molecule.get_smiles());
});
show('names to readings', perName(ours, names.length), 'µs a name');
show(
  'the toolkit’s parse and canonical SMILES',
  perName(theirs, structures.length),
  'µs a structure',
  `ratio ${(ours.median / names.length / (theirs.median / structures.length)).toFixed(2)}`,
);

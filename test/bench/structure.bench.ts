/** Reading SMILES, valence and composition against the toolkit's own parse, on the same structures in one process. */
import { compositionOf } from '../../server/chemistry/structure/composition-of.ts';
import { canonicalSmiles } from '../../server/chemistry/structure/canonical-smiles.ts';
import { cipDescriptors } from '../../server/chemistry/structure/cip/descriptors.ts';
import { readSmiles } from '../../server/chemistry/structure/read-smiles.ts';
import { valenceProblems } from '../../server/chemistry/structure/valence.ts';
import { fragmentSmiles } from '../support/fragments.ts';
import { loadRdkit, withMolecule } from '../support/rdkit.ts';
import { show, timed } from './figures.ts';

const texts = fragmentSmiles(2000, 3).filter((smiles) => readSmiles(smiles).value !== undefined);
const rdkit = await loadRdkit();
const perMolecule = (milliseconds: { median: number; p95: number; count: number }) => ({
  ...milliseconds,
  median: (milliseconds.median * 1000) / texts.length,
  p95: (milliseconds.p95 * 1000) / texts.length,
});

const ours = timed(20, () => {
  for (const smiles of texts) {
    const { value } = readSmiles(smiles);
    valenceProblems(value!);
    compositionOf(value!);
  }
});
const theirs = timed(5, () => {
  for (const smiles of texts) withMolecule(rdkit, smiles, () => undefined);
});
show('SMILES, valence and composition', perMolecule(ours), 'µs a structure');
show(
  'the toolkit’s parse',
  perMolecule(theirs),
  'µs a structure',
  `ratio ${(theirs.median / ours.median).toFixed(1)}`,
);

const molecules = texts.map((smiles) => readSmiles(smiles).value!);
const canonical = timed(5, () => {
  // A new object each time: the canonical form of a molecule is remembered.
  for (const molecule of molecules) canonicalSmiles({ ...molecule, bonds: [...molecule.bonds] });
});
show('our canonical SMILES', perMolecule(canonical), 'µs a structure');
const descriptors = timed(3, () => {
  for (const molecule of molecules) cipDescriptors(molecule);
});
show('descriptors', perMolecule(descriptors), 'µs a structure');

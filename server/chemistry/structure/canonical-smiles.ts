/** Structures as text, for comparing and looking up. */
import { canonicalForm } from './canonical-form.ts';
import { bondKinds, RESONANT } from './canonical-graph.ts';
import { type Molecule, withStereo } from './molecule.ts';
import { writeSmiles } from './write-smiles.ts';

// Molecules never change, so what was worked out for one holds as long as it lives; nobody can see this memory.
const known = new WeakMap<Molecule, string>();
const knownWithoutStereo = new WeakMap<Molecule, string>();

/**
 * Our canonical SMILES: equal strings if and only if the structures are the same. Delocalised rings are written in
 * lower case. Others have canonical SMILES of their own; this one is for comparing inside the product.
 */
export function canonicalSmiles(input: Molecule): string {
  return remembered(known, input, () => written(input));
}

/** The same of the constitution alone: every stated arrangement left out. */
export function constitutionalSmiles(input: Molecule): string {
  if (input.stereo.length === 0) return canonicalSmiles(input);
  return remembered(knownWithoutStereo, input, () => written(withStereo(input, [])));
}

function written(input: Molecule): string {
  const { molecule, rank } = canonicalForm(input);
  const aromaticBonds = bondKinds(molecule).map((kind) => kind === RESONANT);
  return writeSmiles(molecule, { ranks: rank, aromaticBonds });
}

function remembered(memory: WeakMap<Molecule, string>, molecule: Molecule, find: () => string): string {
  const before = memory.get(molecule);
  if (before !== undefined) return before;
  const found = find();
  memory.set(molecule, found);
  return found;
}

/** Structures as text, for comparing and looking up. */
import { canonicalForm } from './canonical-form.ts';
import { bondKinds, RESONANT } from './canonical-graph.ts';
import type { Molecule } from './molecule.ts';
import { writeSmiles } from './write-smiles.ts';

/**
 * Our canonical SMILES: equal strings if and only if the structures are the same. Delocalised rings are written in
 * lower case. Others have canonical SMILES of their own; this one is for comparing inside the product.
 */
export function canonicalSmiles(input: Molecule): string {
  const { molecule, rank } = canonicalForm(input);
  const aromaticBonds = bondKinds(molecule).map((kind) => kind === RESONANT);
  return writeSmiles(molecule, { ranks: rank, aromaticBonds });
}

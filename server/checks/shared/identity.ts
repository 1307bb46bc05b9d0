/** The one structure that an entry stands for, where it states one. */
import type { Molecule } from '../../chemistry/structure/molecule.ts';
import { writeSmiles } from '../../chemistry/structure/write-smiles.ts';
import type { ToolkitFactsOf } from '../facts.ts';
import type { CompoundModel } from '../model.ts';
import { canonicalSmiles } from '../../chemistry/structure/canonical-smiles.ts';

export interface DefiniteStructure {
  readonly molecule: Molecule;
  /** Canonical, the key of the toolkit's facts. */
  readonly smiles: string;
  /** As in “the structure from the …”. */
  readonly from: 'SMILES' | 'name';
}

/** From the SMILES, else from a name with one reading; undefined where neither says. */
export function definiteStructure({
  structure,
  structureSmiles,
  name,
}: CompoundModel): DefiniteStructure | undefined {
  if (structure !== undefined) {
    return structureSmiles !== undefined && structure.atoms.every((atom) => atom.atomicNumber !== 0)
      ? { molecule: structure, smiles: structureSmiles, from: 'SMILES' }
      : undefined;
  }
  const [reading, ...others] = name?.readings ?? [];
  if (reading === undefined || others.length > 0) return undefined;
  return { molecule: reading.molecule, smiles: canonicalSmiles(reading.molecule), from: 'name' };
}

/**
 * Facts of the structure spelt as it was drawn. Our canonical form leaves out arrangements that it holds for
 * meaningless; where the toolkit sees more in them, the drawing is what the user means.
 */
export function factsAsDrawn(
  structure: DefiniteStructure,
  toolkit: ToolkitFactsOf,
): ReturnType<ToolkitFactsOf> {
  return toolkit(writeSmiles(structure.molecule));
}

/** The entry says that it is more than one stereoisomer, or that it is not known which. */
export function leavesStereoOpenOnPurpose({ isomers }: CompoundModel): boolean {
  return isomers !== 'single';
}

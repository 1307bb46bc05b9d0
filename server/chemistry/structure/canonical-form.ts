/** The canonical form of a structure: equal for two structures if and only if they are the same compound. */
import { bondKinds, canonicalGraph, type SamenessOptions } from './canonical-graph.ts';
import { canonicalLabelling, type Labelling } from './canonical-search.ts';
import { effectiveStereo } from './effective-stereo.ts';
import { type Molecule, withStereo } from './molecule.ts';
import { normalise } from './normalise.ts';
import { connectedParts } from './rings.ts';

export interface CanonicalForm {
  /** The molecule in its normal spelling, which `rank` and `classes` are about. */
  readonly molecule: Molecule;
  /** Canonical number of each atom of `molecule`. */
  readonly rank: Int32Array;
  /**
   * Atoms in one class could not be told apart by refinement; atoms that an automorphism exchanges always share a class.
   */
  readonly classes: Int32Array;
  /** Equal if and only if the structures are the same, as far as `complete`. */
  readonly key: string;
  /** False when the search was cut at its bound of counted steps. */
  readonly complete: boolean;
}

export function canonicalForm(input: Molecule, options: SamenessOptions = {}): CanonicalForm {
  const normal = normalise(input);
  const molecule =
    options.stereo === false || normal.stereo.length === 0
      ? normal
      : withStereo(normal, effectiveStereo(normal));
  const kinds = bondKinds(molecule);
  const labelled = connectedParts(molecule).map((members) => {
    const labelling = canonicalLabelling(canonicalGraph(molecule, members, kinds, options));
    return { members, labelling, key: keyOf(labelling) };
  });
  labelled.sort(
    (first, second) =>
      first.members.length - second.members.length ||
      (first.key < second.key ? -1 : first.key > second.key ? 1 : 0),
  );

  const rank = new Int32Array(molecule.atoms.length);
  const classes = new Int32Array(molecule.atoms.length);
  let offset = 0;
  let sharedOffset = 0;
  let previous: string | undefined;
  for (const { members, labelling, key } of labelled) {
    // Equal parts share their classes.
    if (key !== previous) sharedOffset = offset;
    previous = key;
    members.forEach((atom, vertex) => {
      rank[atom] = offset + labelling.rank[vertex]!;
      classes[atom] = sharedOffset + labelling.classes[vertex]!;
    });
    offset += members.length;
  }
  return {
    molecule,
    rank,
    classes,
    key: labelled.map((part) => part.key).join('|'),
    complete: labelled.every((part) => part.labelling.complete),
  };
}

function keyOf(labelling: Labelling): string {
  return labelling.certificate.join(' ');
}

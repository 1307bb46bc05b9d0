/** The mirror image of a structure, and whether it is the same compound. */
import { canonicalForm } from './canonical-form.ts';
import { type Molecule, type StereoElement, withStereo } from './molecule.ts';

/** Centres and axes turned over, double bonds kept; polyhedral centres are kept as written and so not mirrored. */
export function mirrorImage(molecule: Molecule): Molecule {
  return withStereo(molecule, molecule.stereo.map(reflected));
}

function reflected(element: StereoElement): StereoElement {
  return element.kind === 'tetrahedral' || element.kind === 'axis'
    ? { ...element, clockwise: !element.clockwise }
    : element;
}

/** Whether what is stated is its own mirror image. True also of a structure that states nothing. */
export function isOwnMirrorImage(molecule: Molecule): boolean {
  return canonicalForm(molecule).key === canonicalForm(mirrorImage(molecule)).key;
}

/**
 * For each isomer of a list the place of its mirror image in the list: its own place for an achiral one, −1 where the
 * mirror image is not listed.
 */
export function enantiomerPlaces(isomers: readonly Molecule[]): number[] {
  const placeOf = new Map(isomers.map((isomer, index) => [canonicalForm(isomer).key, index]));
  return isomers.map((isomer) => placeOf.get(canonicalForm(mirrorImage(isomer)).key) ?? -1);
}

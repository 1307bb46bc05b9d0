/** The other enantiomer. */
import type { Molecule, StereoElement } from '../../chemistry/structure/molecule.ts';
import { withStereo } from '../../chemistry/structure/molecule.ts';
import { canonicalSmiles } from '../../chemistry/structure/canonical-smiles.ts';

/** Canonical SMILES of the mirror image: centres and axes turned over, double bonds kept. */
export function mirrorImageSmiles(molecule: Molecule): string {
  return canonicalSmiles(withStereo(molecule, molecule.stereo.map(reflected)));
}

function reflected(element: StereoElement): StereoElement {
  return element.kind === 'tetrahedral' || element.kind === 'axis'
    ? { ...element, clockwise: !element.clockwise }
    : element;
}

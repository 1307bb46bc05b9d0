/** Whether a name and a structure can be the same stereoisomer, and where they part. */
import { canonicalForm } from '../../chemistry/structure/canonical-form.ts';
import { canonicalSmiles } from '../../chemistry/structure/canonical-smiles.ts';
import { cipDescriptors } from '../../chemistry/structure/cip/descriptors.ts';
import { atomsOfPlace, type Molecule, type StereoElement } from '../../chemistry/structure/molecule.ts';
import { mirrorImage } from '../../chemistry/structure/stereo-mirror.ts';
import type { Reading } from '../../chemistry/nomenclature/reading.ts';
import { enumerateStereoisomers } from '../../chemistry/structure/stereoisomers.ts';

/** More stereoisomers than this are not compared one by one. */
const mostCompared = 64;

/** Canonical SMILES of every stereoisomer that the molecule leaves possible; undefined when they are too many. */
export function possibleKeys(molecule: Molecule): ReadonlySet<string> | undefined {
  const { isomers, count } = enumerateStereoisomers(molecule, mostCompared);
  return count === undefined || count > isomers.length ? undefined : new Set(isomers.map(canonicalSmiles));
}

/** The stereoisomers of a reading: what it leaves open, or itself. */
export function readingKeys(reading: Reading): ReadonlySet<string> | undefined {
  if (reading.stereoisomers.length === 0) return possibleKeys(reading.molecule);
  if ((reading.stereoisomerCount ?? 0) > reading.stereoisomers.length) return undefined;
  return new Set(reading.stereoisomers.map((isomer) => canonicalSmiles(isomer.molecule)));
}

/** Whether both hold one structure. */
export function meet(first: ReadonlySet<string>, second: ReadonlySet<string>): boolean {
  return [...first].some((key) => second.has(key));
}

/** Whether one stereoisomer of the structure is the mirror image of one that the reading allows. */
export function areMirrored(structure: Molecule, reading: Reading): boolean {
  const keys = readingKeys(reading);
  const { isomers } = enumerateStereoisomers(structure, mostCompared);
  return keys !== undefined && isomers.some((isomer) => keys.has(canonicalSmiles(mirrorImage(isomer))));
}

export interface Disagreement {
  /** In the structure, in its normal spelling. */
  readonly element: StereoElement;
  readonly inStructure: string;
  readonly inName: string;
}

/**
 * The places where both state an arrangement with different descriptors. Undefined when equal branches make it
 * impossible to say which place of the one is which of the other.
 */
export function disagreements(
  structure: Molecule,
  named: Molecule,
): { readonly molecule: Molecule; readonly places: readonly Disagreement[] } | undefined {
  const [one, other] = [canonicalForm(structure, { stereo: false }), canonicalForm(named, { stereo: false })];
  if (one.key !== other.key) return undefined;
  const nameAt = new Map(
    cipDescriptors(other.molecule).map(({ element, letter }) => [placeKey(element, other.rank), letter]),
  );
  const places = cipDescriptors(one.molecule).flatMap(({ element, letter }): Disagreement[] => {
    const inName = nameAt.get(placeKey(element, one.rank));
    return letter === undefined || inName === undefined || letter === inName
      ? []
      : [{ element, inStructure: letter, inName }];
  });
  // Where equal branches hold several places, twins may have been matched the wrong way round.
  const classKeys = one.molecule.stereo.map((element) => placeKey(element, one.classes));
  const ambiguous = places.some(({ element }) => {
    const own = placeKey(element, one.classes);
    return classKeys.filter((key) => key === own).length > 1;
  });
  return ambiguous || places.length === 0 ? undefined : { molecule: one.molecule, places };
}

function placeKey(element: StereoElement, rank: Int32Array): string {
  return String(
    atomsOfPlace(element)
      .map((atom) => rank[atom]!)
      .sort((first, second) => first - second),
  );
}

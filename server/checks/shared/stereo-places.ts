/** Stereogenic places in words and in the text of the SMILES. */
import { letterOf } from '../../chemistry/structure/cip/descriptors.ts';
import type { StereoCandidate } from '../../chemistry/structure/stereo-candidates.ts';
import { atomsOfPlace, type Molecule, type StereoElement } from '../../chemistry/structure/molecule.ts';
import type { TextRange } from '../../chemistry/text.ts';

export type Place = StereoCandidate | StereoElement;

/** Whether both stand at the same atoms. */
export function samePlace(first: Place, second: Place): boolean {
  return String([...atomsOfPlace(first)].sort()) === String([...atomsOfPlace(second)].sort());
}

/** From the first to the last of its atoms in the text. */
export function rangeOfPlace(molecule: Molecule, place: Place): TextRange {
  const ranges = atomsOfPlace(place).map((atom) => molecule.atoms[atom]!.range);
  return {
    start: Math.min(...ranges.map((range) => range.start)),
    end: Math.max(...ranges.map((range) => range.end)),
  };
}

/** `stereocentre`, `double bond`, `axis`. */
export function kindOfPlace(place: Place): string {
  return place.kind === 'double-bond' ? 'double bond' : place.kind === 'axis' ? 'axis' : 'stereocentre';
}

/** `one stereocentre and 2 double bonds`. */
export function placesInWords(places: readonly Place[]): string {
  const counts = new Map<string, number>();
  for (const place of places) counts.set(kindOfPlace(place), (counts.get(kindOfPlace(place)) ?? 0) + 1);
  const plural = (kind: string) => (kind === 'axis' ? 'axes' : `${kind}s`);
  return [...counts]
    .map(([kind, count]) => (count === 1 ? `one ${kind}` : `${count} ${plural(kind)}`))
    .join(' and ');
}

/** The descriptors of some places in the order of the text, `R,E`; `?` where the ranking gives none. */
export function lettersAt(molecule: Molecule, places: readonly Place[]): string {
  return [...places]
    .sort((first, second) => rangeOfPlace(molecule, first).start - rangeOfPlace(molecule, second).start)
    .map((place) => {
      const element = molecule.stereo.find((each) => samePlace(each, place));
      return (element && letterOf(molecule, element)) ?? '?';
    })
    .join(',');
}

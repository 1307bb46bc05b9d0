/**
 * From stereodescriptors to arrangements: the reverse of the sequence rules, by which a name's (2R,3S) becomes a structure.
 * Nothing is guessed: a descriptor that fits no place, or that no arrangement has, is handed back with the reason.
 */
import { canonicalForm } from './canonical-form.ts';
import { bondKinds } from './canonical-graph.ts';
import { isOddPermutation } from './canonical-stereo.ts';
import { type DescriptorLetter, letterOf } from './cip/descriptors.ts';
import { atomsOfPlace, type Molecule, type StereoElement, withStereo } from './molecule.ts';
import { type StereoCandidate, stereoCandidates } from './stereo-candidates.ts';
import { elementFor } from './stereo-elements.ts';

export interface WantedDescriptor {
  /** A centre, or either end of a double bond or axis. */
  readonly atom: number;
  readonly letter: DescriptorLetter;
}

export type Refusal =
  /** No arrangement is possible at this place, or of this kind. */
  | 'no stereogenic unit'
  /** The ligands rank alike, so that no arrangement has a descriptor. */
  | 'ligands alike'
  /** Arrangements exist, but none has this letter together with the others wanted. */
  | 'impossible'
  /** More than one compound answers to the letters, or the search met its bound. */
  | 'undetermined';

export interface Assignment {
  /** The molecule with all arrangements that could be found; what it stated before at other places is kept. */
  readonly molecule: Molecule;
  readonly refused: readonly { readonly index: number; readonly reason: Refusal }[];
}

/** Places whose letters depend on each other are tried in all combinations, up to this many places. */
const dependentLimit = 8;

export function assignDescriptors(molecule: Molecule, wanted: readonly WantedDescriptor[]): Assignment {
  const kinds = bondKinds(molecule);
  const candidates = stereoCandidates(molecule);
  const refused: { index: number; reason: Refusal }[] = [];
  const chosen: StereoElement[] = [];
  const dependent: { index: number; candidate: StereoCandidate; letter: DescriptorLetter }[] = [];
  const bare = withStereo(molecule, []);

  wanted.forEach(({ atom, letter: stated }, index) => {
    const axis = candidates.some((one) => one.kind === 'axis' && one.ends.includes(atom));
    // On an axis Ra is M and Sa is P (P-93.5.2.3).
    const letter = axis && stated === 'R' ? 'M' : axis && stated === 'S' ? 'P' : stated;
    const candidate = candidates.find((one) => holds(one, atom, letter));
    if (candidate === undefined) {
      refused.push({ index, reason: 'no stereogenic unit' });
      return;
    }
    const ofTrue = letterOf(bare, elementFor(candidate, true), kinds);
    // A letter that follows from the constitution alone settles the place by itself.
    if (ofTrue === undefined || ofTrue !== ofTrue.toUpperCase()) dependent.push({ index, candidate, letter });
    else if (letter !== letter.toUpperCase()) refused.push({ index, reason: 'impossible' });
    else chosen.push(elementFor(candidate, ofTrue === letter));
  });

  const places = new Set(
    [...chosen, ...dependent.map(({ candidate }) => elementFor(candidate, true))].map(placeOf),
  );
  const kept = molecule.stereo.filter((element) => !places.has(placeOf(element)));
  const base = [...kept, ...chosen];
  if (dependent.length === 0) return { molecule: withStereo(molecule, base), refused };
  if (dependent.length > dependentLimit) {
    return {
      molecule: withStereo(molecule, base),
      refused: [...refused, ...dependent.map(({ index }) => ({ index, reason: 'undetermined' as const }))],
    };
  }

  const elementsOf = (number: number) =>
    dependent.map(({ candidate }, bit) => elementFor(candidate, Math.floor(number / 2 ** bit) % 2 === 1));
  const solutions = new Map<string, Molecule>();
  for (let number = 0; number < 2 ** dependent.length; number++) {
    const trial = withStereo(molecule, [...base, ...elementsOf(number)]);
    const fits = elementsOf(number).every(
      (element, position) => letterOf(trial, element, kinds) === dependent[position]!.letter,
    );
    if (fits) solutions.set(canonicalForm(trial).key, trial);
  }
  const [only, ...others] = solutions.values();
  if (only !== undefined && others.length === 0) return { molecule: only, refused };
  const hasLetters = () =>
    Array.from({ length: 2 ** dependent.length }, (_, number) => elementsOf(number)).some((elements) => {
      const trial = withStereo(molecule, [...base, ...elements]);
      return elements.some((element) => letterOf(trial, element, kinds) !== undefined);
    });
  const reason: Refusal = only !== undefined ? 'undetermined' : hasLetters() ? 'impossible' : 'ligands alike';
  return {
    molecule: withStereo(molecule, base),
    refused: [...refused, ...dependent.map(({ index }) => ({ index, reason }))],
  };
}

function holds(candidate: StereoCandidate, atom: number, letter: DescriptorLetter): boolean {
  switch (candidate.kind) {
    case 'tetrahedral':
      return candidate.centre === atom && 'RSrs'.includes(letter);
    case 'double-bond':
      return candidate.ends.includes(atom) && 'EZez'.includes(letter);
    case 'axis':
      return candidate.ends.includes(atom) && 'MPmp'.includes(letter);
  }
}

function placeOf(element: StereoElement): string {
  return [...atomsOfPlace(element)].sort((first, second) => first - second).join('=');
}

/** A ligand of a ring atom, as in “the methyl group at C1”. */
export interface RingLigand {
  readonly centre: number;
  /** The atom outside the ring, or −1 for the hydrogen. */
  readonly ligand: number;
}

/**
 * Whether two ligands stand on the same side of a ring whose atoms are given in ring order; undefined where one of the
 * centres states nothing or is not tetrahedral.
 */
export function onSameSideOfRing(
  molecule: Molecule,
  ring: readonly number[],
  first: RingLigand,
  second: RingLigand,
): boolean | undefined {
  const [one, other] = [first, second].map(({ centre, ligand }) => {
    const element = molecule.stereo.find(
      (stated) => stated.kind === 'tetrahedral' && stated.centre === centre,
    );
    const place = ring.indexOf(centre);
    if (element?.kind !== 'tetrahedral' || place === -1 || !element.ligands.includes(ligand))
      return undefined;
    const before = ring[(place + ring.length - 1) % ring.length]!;
    const after = ring[(place + 1) % ring.length]!;
    const rest = element.ligands.find((atom) => atom !== ligand && atom !== before && atom !== after);
    if (rest === undefined) return undefined;
    const odd = isOddPermutation([ligand, before, after, rest].map((atom) => element.ligands.indexOf(atom)));
    return element.clockwise !== odd;
  });
  return one === undefined || other === undefined ? undefined : one === other;
}

/** Whether two ligands, one at either end, stand on the same side of a double bond; undefined where nothing is stated. */
export function onSameSideOfDoubleBond(
  molecule: Molecule,
  ends: readonly [number, number],
  ligands: readonly [number, number],
): boolean | undefined {
  for (const element of molecule.stereo) {
    if (element.kind !== 'double-bond') continue;
    const straight = element.ends[0] === ends[0] && element.ends[1] === ends[1];
    if (!straight && !(element.ends[0] === ends[1] && element.ends[1] === ends[0])) continue;
    const [one, other] = straight ? element.ligands : [element.ligands[1], element.ligands[0]];
    return element.sameSide === ((one === ligands[0]) === (other === ligands[1]));
  }
  return undefined;
}

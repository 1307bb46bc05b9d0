/**
 * All stereoisomers of a structure that agree with what it states, and which of its places are stereogenic. The
 * symmetries of the constitution sort the arrangements of the candidates into compounds, so meso forms, symmetric rings
 * and pseudoasymmetric centres come out exactly.
 */
import { canonicalForm } from './canonical-form.ts';
import { bondKinds, canonicalGraph } from './canonical-graph.ts';
import { initialColouring } from './canonical-refine.ts';
import { cageConstraints } from './stereo-cages.ts';
import { type StereoCandidate, stereoCandidates } from './stereo-candidates.ts';
import { type FreeChoices, freeChoices } from './stereo-choices.ts';
import { elementFor, valueAt } from './stereo-elements.ts';
import { leastEquivalents, symmetryMoves } from './stereo-symmetry.ts';
import { atomsOfPlace, type Molecule, type StereoElement, withStereo } from './molecule.ts';
import { normalise } from './normalise.ts';

export interface StereogenicUnit {
  readonly candidate: StereoCandidate;
  /** What the structure states for it, or undefined when it is open. */
  readonly stated: StereoElement | undefined;
}

export interface StereoisomerList {
  /** The structure in its normal spelling; the isomers number their atoms like it. */
  readonly molecule: Molecule;
  /** The places that can hold an arrangement and whose arrangement matters in at least one isomer. */
  readonly units: readonly StereogenicUnit[];
  /** All that agree with what is stated; a single one when nothing is open. Cut at the cap. */
  readonly isomers: readonly Molecule[];
  /** How many there are, or undefined when that was too much to find out. */
  readonly count: number | undefined;
  /** Statements of the structure at places that hold no arrangement. */
  readonly meaningless: readonly StereoElement[];
}

/** Candidates up to which all arrangements of a symmetric structure are sorted into compounds. */
const sortedLimit = 16;

/**
 * `cap` bounds the isomers listed. Isomers come in the order of their arrangements, which depends on the numbering of
 * the atoms but on nothing else.
 */
export function enumerateStereoisomers(input: Molecule, cap = 64): StereoisomerList {
  const molecule = normalise(input);
  const possible = stereoCandidates(molecule);
  const classes = possible.length > 0 ? constitutionalClasses(molecule) : noClasses;
  const candidates = distinctCandidates(molecule, possible, classes);
  const statedAt = candidates.map((candidate) => statedElement(molecule, candidate));
  const kept = molecule.stereo.filter(isPolyhedral);
  const meaningless = molecule.stereo.filter(
    (element) => !isPolyhedral(element) && !statedAt.some((stated) => stated?.element === element),
  );
  const choices = freeChoices(
    statedAt.map((stated) => stated?.value),
    cageConstraints(molecule, candidates),
  );
  const isomerWith = (values: readonly boolean[]) =>
    withStereo(molecule, [
      ...kept,
      ...candidates.map((candidate, index) => elementFor(candidate, values[index]!)),
    ]);
  const listed = (numbers: readonly number[]) =>
    numbers.map((number) => isomerWith(choices.valuesOf(number)));
  const unitsOf = (matters: (index: number) => boolean) =>
    candidates.flatMap((candidate, index) =>
      matters(index) ? [{ candidate, stated: statedAt[index]?.element }] : [],
    );
  const moves = areUnlike(candidates, classes) ? [] : symmetryMoves(molecule, candidates, kept);

  if (moves?.length === 0) {
    // No symmetry touches an arrangement: each is a compound of its own.
    const count = 2 ** choices.count;
    const numbers = Array.from({ length: Math.min(count, cap) }, (_, number) => number);
    return { molecule, units: unitsOf(() => true), isomers: listed(numbers), count, meaningless };
  }
  if (moves === undefined || candidates.length > sortedLimit) {
    const isomers = firstDistinct(choices, isomerWith, cap);
    return { molecule, units: unitsOf(() => true), isomers, count: undefined, meaningless };
  }

  const least = leastEquivalents(candidates.length, moves);
  const found = new Map<number, number>();
  for (let number = 0; number < 2 ** choices.count; number++) {
    const compound = least[bitsOf(choices.valuesOf(number))]!;
    if (!found.has(compound)) found.set(compound, number);
  }
  // A candidate matters when turning it alone makes another compound out of at least one isomer.
  const matters = (index: number) =>
    [...found.keys()].some((compound) => least[compound ^ (1 << index)] !== compound);
  return {
    molecule,
    units: unitsOf(matters),
    isomers: listed([...found.values()].slice(0, cap)),
    count: found.size,
    meaningless,
  };
}

/** Some isomers, told apart one by one; there may be more. */
function firstDistinct(
  choices: FreeChoices,
  isomerWith: (values: readonly boolean[]) => Molecule,
  cap: number,
): Molecule[] {
  const found = new Map<string, Molecule>();
  const tries = Math.min(2 ** choices.count, 2 * cap);
  for (let number = 0; number < tries && found.size < cap; number++) {
    const isomer = isomerWith(choices.valuesOf(number));
    const { key } = canonicalForm(isomer);
    if (!found.has(key)) found.set(key, isomer);
  }
  return [...found.values()];
}

function bitsOf(values: readonly boolean[]): number {
  return values.reduce((bits, value, index) => (value ? bits | (1 << index) : bits), 0);
}

function isPolyhedral({ kind }: StereoElement): boolean {
  return kind === 'SP' || kind === 'TB' || kind === 'OH';
}

/** Candidates whose ligands are not plainly alike: two ligands that carry no candidate and share a class are. */
function distinctCandidates(
  molecule: Molecule,
  possible: readonly StereoCandidate[],
  classes: Int32Array,
): StereoCandidate[] {
  let candidates = [...possible];
  for (let before = -1; before !== candidates.length;) {
    before = candidates.length;
    const places = candidates.flatMap(atomsOfPlace);
    candidates = candidates.filter((candidate) => !isIdle(molecule, candidate, classes, places));
  }
  return candidates;
}

const noClasses = new Int32Array(0);

/**
 * Whether no two candidates, and no two ligands of one, are of the same class, so that every symmetry leaves all of them
 * in their places.
 */
function areUnlike(candidates: readonly StereoCandidate[], classes: Int32Array): boolean {
  const unlike = (atoms: readonly number[]) =>
    new Set(atoms.map((atom) => classes[atom])).size === atoms.length;
  return (
    unlike([...new Set(candidates.flatMap(atomsOfPlace))]) &&
    candidates.every((candidate) => unlike(elementFor(candidate, true).ligands.filter((atom) => atom >= 0)))
  );
}

function isIdle(
  molecule: Molecule,
  candidate: StereoCandidate,
  classes: Int32Array,
  places: readonly number[],
): boolean {
  const own = atomsOfPlace(candidate);
  const groups =
    candidate.kind === 'tetrahedral'
      ? [{ hub: candidate.centre, ligands: candidate.ligands }]
      : candidate.ends.map((end) => ({
          hub: end,
          ligands: molecule.neighbours[end]!.filter(({ bond }) => molecule.bonds[bond]!.order === 1).map(
            ({ atom }) => atom,
          ),
        }));
  return groups.some(({ hub, ligands }) =>
    ligands.some((first, index) =>
      ligands
        .slice(index + 1)
        .some(
          (second) =>
            first >= 0 &&
            second >= 0 &&
            classes[first] === classes[second] &&
            !reachesPlace(molecule, hub, first, places, own) &&
            !reachesPlace(molecule, hub, second, places, own),
        ),
    ),
  );
}

/** Whether a branch, followed without passing the hub, holds another candidate. */
function reachesPlace(
  molecule: Molecule,
  hub: number,
  start: number,
  places: readonly number[],
  own: readonly number[],
): boolean {
  const seen = new Set([hub, start]);
  const queue = [start];
  for (const atom of queue) {
    if (places.includes(atom) && !own.includes(atom)) return true;
    for (const { atom: next } of molecule.neighbours[atom]!) {
      if (seen.has(next)) continue;
      seen.add(next);
      queue.push(next);
    }
  }
  return false;
}

function constitutionalClasses(molecule: Molecule): Int32Array {
  const members = molecule.atoms.map((_, index) => index);
  const graph = canonicalGraph(molecule, members, bondKinds(molecule), { stereo: false });
  return initialColouring(graph, { steps: 0 }).colours;
}

/** What the molecule states for a candidate, brought to the candidate's own order of ligands. */
function statedElement(
  molecule: Molecule,
  candidate: StereoCandidate,
): { element: StereoElement; value: boolean } | undefined {
  for (const element of molecule.stereo) {
    const value = valueAt(candidate, element);
    if (value !== undefined) return { element, value };
  }
  return undefined;
}

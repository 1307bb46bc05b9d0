/**
 * All stereoisomers of a structure that agree with what it states, and which of its places are stereogenic. Every
 * arrangement of the candidates is made and compared by canonical form, so meso forms, symmetric rings and
 * pseudoasymmetric centres come out exactly.
 */
import { canonicalForm } from './canonical-form.ts';
import { bondKinds, canonicalGraph } from './canonical-graph.ts';
import { initialColouring } from './canonical-refine.ts';
import { type CageConstraint, cageConstraints } from './stereo-cages.ts';
import { type StereoCandidate, stereoCandidates } from './stereo-candidates.ts';
import { isOddPermutation } from './canonical-stereo.ts';
import { type Molecule, type StereoElement, withStereo } from './molecule.ts';
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

/** Arrangements compared by canonical form before counting is given up. */
const assignmentLimit = 4096;

/**
 * `cap` bounds the isomers listed. Isomers come in the order of their arrangements, which depends on the numbering of
 * the atoms but on nothing else.
 */
export function enumerateStereoisomers(input: Molecule, cap = 64): StereoisomerList {
  const molecule = normalise(input);
  const candidates = distinctCandidates(molecule);
  const constraints = cageConstraints(molecule, candidates);
  const statedAt = candidates.map((candidate) => statedElement(molecule, candidate));
  const meaningless = molecule.stereo.filter(
    (element) =>
      element.kind !== 'SP' &&
      element.kind !== 'TB' &&
      element.kind !== 'OH' &&
      !statedAt.some((stated) => stated?.element === element),
  );
  const kept = molecule.stereo.filter(
    (element) => element.kind === 'SP' || element.kind === 'TB' || element.kind === 'OH',
  );
  const free = candidates.flatMap((_, index) => (statedAt[index] === undefined ? [index] : []));
  const unitsOf = (matters: readonly boolean[]) =>
    candidates.flatMap((candidate, index) =>
      matters[index] ? [{ candidate, stated: statedAt[index]?.element }] : [],
    );

  const asymmetric = !hasSymmetry(molecule);
  if (2 ** free.length > assignmentLimit && !asymmetric) {
    const all = candidates.map(() => true);
    return { molecule, units: unitsOf(all), isomers: [], count: undefined, meaningless };
  }

  const found = new Map<string, { readonly values: readonly boolean[]; readonly molecule: Molecule }>();
  // Without symmetry every arrangement is a compound of its own, and listing can stop at the cap.
  const listed = asymmetric ? Math.min(2 ** free.length, 4 * cap) : 2 ** free.length;
  for (let number = 0; number < listed && (!asymmetric || found.size < cap); number++) {
    const values = statedAt.map((stated) => stated?.value ?? false);
    free.forEach((index, bit) => (values[index] = Math.floor(number / 2 ** bit) % 2 === 1));
    if (!constraints.every((constraint) => allows(constraint, values, statedAt))) continue;
    const isomer = withStereo(molecule, [
      ...kept,
      ...candidates.map((candidate, index) => elementFor(candidate, values[index]!)),
    ]);
    const key = asymmetric ? String(number) : canonicalForm(isomer).key;
    if (!found.has(key)) found.set(key, { values, molecule: isomer });
  }
  const count = asymmetric ? 2 ** (free.length - independent(constraints, statedAt)) : found.size;
  const matters = asymmetric ? candidates.map(() => true) : whichMatter(found, candidates, kept, molecule);
  const isomers = [...found.values()].slice(0, cap).map((entry) => entry.molecule);
  return { molecule, units: unitsOf(matters), isomers, count, meaningless };
}

/** Candidates whose ligands are not plainly alike: two ligands that carry no candidate and share a class are. */
function distinctCandidates(molecule: Molecule): StereoCandidate[] {
  const classes = constitutionalClasses(molecule);
  let candidates = stereoCandidates(molecule);
  for (let before = -1; before !== candidates.length;) {
    before = candidates.length;
    const places = candidates.flatMap(placesOf);
    candidates = candidates.filter((candidate) => !isIdle(molecule, candidate, classes, places));
  }
  return candidates;
}

function placesOf(candidate: StereoCandidate): readonly number[] {
  return candidate.kind === 'tetrahedral' ? [candidate.centre] : candidate.ends;
}

function isIdle(
  molecule: Molecule,
  candidate: StereoCandidate,
  classes: Int32Array,
  places: readonly number[],
): boolean {
  const own = placesOf(candidate);
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

/** Whether two atoms may exchange places in some symmetry of the constitution, terminal twins such as CF3 aside. */
function hasSymmetry(molecule: Molecule): boolean {
  const classes = constitutionalClasses(molecule);
  const first = new Map<number, number>();
  for (let atom = 0; atom < classes.length; atom++) {
    const twin = first.get(classes[atom]!);
    if (twin === undefined) first.set(classes[atom]!, atom);
    else if (!areTerminalTwins(molecule, twin, atom)) return true;
  }
  return false;
}

function areTerminalTwins(molecule: Molecule, first: number, second: number): boolean {
  const [one, other] = [molecule.neighbours[first]!, molecule.neighbours[second]!];
  return one.length === 1 && other.length === 1 && one[0]!.atom === other[0]!.atom;
}

/** The arrangement with `value` true is the clockwise one, or the one with both ligands on the same side. */
export function elementFor(candidate: StereoCandidate, value: boolean): StereoElement {
  return candidate.kind === 'double-bond'
    ? { ...candidate, sameSide: value }
    : { ...candidate, clockwise: value };
}

/** What the molecule states for a candidate, brought to the candidate's own order of ligands. */
function statedElement(
  molecule: Molecule,
  candidate: StereoCandidate,
): { element: StereoElement; value: boolean } | undefined {
  for (const element of molecule.stereo) {
    if (
      element.kind === 'tetrahedral' &&
      candidate.kind === 'tetrahedral' &&
      element.centre === candidate.centre
    ) {
      const odd = isOddPermutation(candidate.ligands.map((ligand) => element.ligands.indexOf(ligand)));
      return { element, value: element.clockwise !== odd };
    }
    if (
      element.kind === 'double-bond' &&
      candidate.kind === 'double-bond' &&
      sameEnds(element.ends, candidate.ends)
    ) {
      const [first, second] =
        element.ends[0] === candidate.ends[0] ? element.ligands : [element.ligands[1], element.ligands[0]];
      const turned = (first !== candidate.ligands[0]) !== (second !== candidate.ligands[1]);
      return { element, value: element.sameSide !== turned };
    }
    if (element.kind === 'axis' && candidate.kind === 'axis' && sameEnds(element.ends, candidate.ends)) {
      const straight = element.ends[0] === candidate.ends[0];
      const [a, b, c, d] = element.ligands;
      const [first, , second] = straight ? [a, b, c, d] : [c, d, a, b];
      const turned = (first !== candidate.ligands[0]) !== (second !== candidate.ligands[2]);
      return { element, value: element.clockwise !== turned };
    }
  }
  return undefined;
}

function sameEnds(first: readonly [number, number], second: readonly [number, number]): boolean {
  return (
    (first[0] === second[0] && first[1] === second[1]) || (first[0] === second[1] && first[1] === second[0])
  );
}

type StatedAt = readonly ({ readonly element: StereoElement; readonly value: boolean } | undefined)[];

/** What the text states outright is believed, however strained it is. */
function allows(
  { first, second, equal }: CageConstraint,
  values: readonly boolean[],
  statedAt: StatedAt,
): boolean {
  if (statedAt[first] !== undefined && statedAt[second] !== undefined) return true;
  return (values[first] === values[second]) === equal;
}

/** How many free choices the cages take away: for each connected set of heads, one less than its free members. */
function independent(constraints: readonly CageConstraint[], statedAt: StatedAt): number {
  const parent = new Map<number, number>();
  const find = (index: number): number => {
    let root = index;
    while ((parent.get(root) ?? root) !== root) root = parent.get(root)!;
    return root;
  };
  let taken = 0;
  const stated = -1;
  for (const { first, second } of constraints) {
    const one = find(statedAt[first] === undefined ? first : stated);
    const other = find(statedAt[second] === undefined ? second : stated);
    if (one === other) continue;
    parent.set(one, other);
    taken++;
  }
  return taken;
}

/** A candidate matters when turning it alone makes another compound out of at least one isomer. */
function whichMatter(
  found: ReadonlyMap<string, { readonly values: readonly boolean[] }>,
  candidates: readonly StereoCandidate[],
  kept: readonly StereoElement[],
  molecule: Molecule,
): boolean[] {
  return candidates.map((_, turned) => {
    for (const [key, { values }] of found) {
      const stereo = candidates.map((candidate, index) =>
        elementFor(candidate, index === turned ? !values[index]! : values[index]!),
      );
      if (canonicalForm(withStereo(molecule, [...kept, ...stereo])).key !== key) return true;
    }
    return false;
  });
}

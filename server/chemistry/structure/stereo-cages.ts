/**
 * Ring systems that leave some arrangements no room. Where three chains join the same two ring atoms, the ligands that
 * stand outside must both point outwards (or, for fused rings, to the same side) when the rings are small: camphor has
 * two stereoisomers, not four. The limits are those of compounds that can be kept at room temperature (common practice,
 * no source): trans-fused rings need five atoms each, or four beside six; a bridged bicycle turned inside out needs more
 * than eight atoms in its bridges.
 */
import type { StereoCandidate } from './stereo-candidates.ts';
import { isOddPermutation } from './canonical-stereo.ts';
import type { Molecule } from './molecule.ts';
import { ringBonds } from './rings.ts';

export interface CageConstraint {
  /** Indices of two tetrahedral candidates. */
  readonly first: number;
  readonly second: number;
  /** Whether both `clockwise` must be equal (about the ligand orders of the candidates), or different. */
  readonly equal: boolean;
}

export function cageConstraints(
  molecule: Molecule,
  candidates: readonly StereoCandidate[],
): CageConstraint[] {
  const inRing = ringBonds(molecule);
  const ringLinks = molecule.neighbours.map((list) =>
    list.filter(({ bond }) => inRing[bond]).map(({ atom }) => atom),
  );
  const heads = candidates.flatMap((candidate, index) =>
    candidate.kind === 'tetrahedral' && ringLinks[candidate.centre]!.length >= 3
      ? [{ candidate, index }]
      : [],
  );
  const constraints: CageConstraint[] = [];
  for (let one = 0; one < heads.length; one++) {
    for (let other = one + 1; other < heads.length; other++) {
      const [first, second] = [heads[one]!, heads[other]!];
      const paths = threePaths(ringLinks, first.candidate.centre, second.candidate.centre);
      if (paths === undefined || !isTight(paths.map((path) => path.length - 2))) continue;
      // Seen from outside at either head, the three chains run round in opposite senses.
      const starts = paths.map((path) => path[1]!);
      const ends = paths.map((path) => path[path.length - 2]!);
      const from = [outside(first.candidate.ligands, starts), ...starts];
      const to = [outside(second.candidate.ligands, ends), ...ends];
      const firstOdd = isOddPermutation(from.map((ligand) => first.candidate.ligands.indexOf(ligand)));
      const secondOdd = isOddPermutation(to.map((ligand) => second.candidate.ligands.indexOf(ligand)));
      constraints.push({ first: first.index, second: second.index, equal: firstOdd !== secondOdd });
    }
  }
  return constraints;
}

/** The ligand that is on none of the three chains. */
function outside(ligands: readonly number[], onChains: readonly number[]): number {
  return ligands.find((ligand) => !onChains.includes(ligand))!;
}

/** `bridges` are the numbers of atoms between the heads on the three chains. */
function isTight(bridges: readonly number[]): boolean {
  const [shortest, middle, longest] = [...bridges].sort((first, second) => first - second) as [
    number,
    number,
    number,
  ];
  if (shortest > 0) return shortest + middle + longest <= 8;
  const [smaller, larger] = [middle + 2, longest + 2];
  return smaller === 3 ? larger <= 7 : smaller === 4 && larger <= 5;
}

/**
 * Three chains of atoms from one head to the other that share nothing in between, of least total length, or undefined.
 * Found as a flow of three units, each turn along a shortest path that may push earlier ones aside.
 */
function threePaths(
  links: readonly (readonly number[])[],
  start: number,
  goal: number,
): number[][] | undefined {
  /** Next atom on the chain through each inner atom, and first atoms of the chains. */
  const next = new Map<number, number>();
  const before = new Map<number, number>();
  const firsts = new Set<number>();
  for (let unit = 0; unit < 3; unit++) {
    // States: an atom entered freely (`in`), or an atom of a chain whose unit is being pushed back (`out`).
    const key = (atom: number, out: boolean) => atom * 2 + (out ? 1 : 0);
    const origin = new Map<number, number>();
    const queue: { atom: number; out: boolean }[] = [];
    const reach = (atom: number, out: boolean, by: number) => {
      if (origin.has(key(atom, out))) return;
      origin.set(key(atom, out), by);
      queue.push({ atom, out });
    };
    for (const atom of links[start]!) if (!firsts.has(atom)) reach(atom, false, -1);
    let end = -1;
    for (let head = 0; head < queue.length && end === -1; head++) {
      const { atom, out } = queue[head]!;
      const here = key(atom, out);
      if (atom === goal) {
        end = here;
        break;
      }
      const onChain = next.has(atom);
      if (onChain && !out) {
        // Entered a chain: its unit can only be sent back the way it came.
        const back = before.get(atom)!;
        if (back !== start) reach(back, true, here);
        continue;
      }
      for (const other of links[atom]!) {
        if (other === start || (onChain && next.get(atom) === other)) continue;
        reach(other, false, here);
      }
      if (onChain && out) {
        const back = before.get(atom)!;
        if (back !== start) reach(back, true, here);
      }
    }
    if (end === -1) return undefined;
    applyPath(end, origin, next, before, firsts, start);
  }
  return [...firsts].map((first) => {
    const path = [start, first];
    while (path[path.length - 1] !== goal) path.push(next.get(path[path.length - 1]!)!);
    return path;
  });
}

function applyPath(
  end: number,
  origin: ReadonlyMap<number, number>,
  next: Map<number, number>,
  before: Map<number, number>,
  firsts: Set<number>,
  start: number,
): void {
  const steps: { atom: number; out: boolean }[] = [];
  for (let state = end; state !== -1; state = origin.get(state)!)
    steps.unshift({ atom: state >> 1, out: state % 2 === 1 });
  const oldNext = new Map(next);
  const removed: number[] = [];
  // Links that are pushed back disappear, the others are new.
  let previous = start;
  const added: [number, number][] = [];
  for (const { atom, out } of steps) {
    if (out && oldNext.get(atom) === previous) removed.push(atom);
    else added.push([previous, atom]);
    previous = atom;
  }
  for (const atom of removed) {
    before.delete(next.get(atom)!);
    next.delete(atom);
  }
  for (const [from, to] of added) {
    if (from === start) firsts.add(to);
    else next.set(from, to);
    before.set(to, from);
  }
}

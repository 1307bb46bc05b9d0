/**
 * How the symmetries of a constitution act on the arrangements of its candidates. An arrangement of n candidates is a
 * number of n bits; a symmetry moves bits to other places and turns some of them round. Two arrangements are the same
 * compound exactly when a symmetry carries one into the other.
 */
import { bondKinds, canonicalGraph } from './canonical-graph.ts';
import { canonicalLabelling } from './canonical-search.ts';
import { type Molecule, withStereo } from './molecule.ts';
import { connectedParts } from './rings.ts';
import type { StereoCandidate } from './stereo-candidates.ts';
import { elementFor, mappedElement, valueAt } from './stereo-elements.ts';

/** Bit `index` goes to bit `to[index]`, turned round where `turns[index]`. */
export interface BitMove {
  readonly to: readonly number[];
  readonly turns: readonly boolean[];
}

/**
 * Moves that generate all symmetries, those that do nothing left out; undefined when they could not all be found.
 * `fixed` are statements that every symmetry must keep, such as those of polyhedral centres.
 */
export function symmetryMoves(
  molecule: Molecule,
  candidates: readonly StereoCandidate[],
  fixed: Molecule['stereo'],
): BitMove[] | undefined {
  const bare = withStereo(molecule, fixed);
  const kinds = bondKinds(molecule);
  const moves: BitMove[] = [];
  const seen = new Set<string>();
  const add = (map: ReadonlyMap<number, number>) => {
    const move = moveOf(candidates, (atom) => map.get(atom) ?? atom);
    if (move === undefined) return;
    const key = JSON.stringify(move);
    const idle = move.to.every((to, index) => to === index && !move.turns[index]);
    if (idle || seen.has(key)) return;
    seen.add(key);
    moves.push(move);
  };
  const firstAlike = new Map<string, { readonly members: readonly number[]; readonly rank: Int32Array }>();
  for (const members of connectedParts(bare)) {
    const { generators, certificate, rank, complete } = canonicalLabelling(
      canonicalGraph(bare, members, kinds),
    );
    if (!complete) return undefined;
    for (const generator of generators)
      add(new Map(members.map((atom, vertex) => [atom, members[generator[vertex]!]!])));
    // Equal parts, such as two equal counterions, exchange places as wholes.
    const key = certificate.join(' ');
    const twin = firstAlike.get(key);
    if (twin === undefined) firstAlike.set(key, { members, rank });
    else {
      const atRank = new Map(members.map((atom, vertex) => [rank[vertex]!, atom]));
      const there = twin.members.map((atom, vertex) => [atom, atRank.get(twin.rank[vertex]!)!] as const);
      add(new Map([...there, ...there.map(([one, other]) => [other, one] as const)]));
    }
  }
  return moves;
}

function moveOf(candidates: readonly StereoCandidate[], map: (atom: number) => number): BitMove | undefined {
  const to: number[] = [];
  const turns: boolean[] = [];
  for (const candidate of candidates) {
    const image = mappedElement(elementFor(candidate, true), map);
    const index = candidates.findIndex((other) => valueAt(other, image) !== undefined);
    if (index === -1) return undefined;
    to.push(index);
    turns.push(valueAt(candidates[index]!, image) === false);
  }
  return { to, turns };
}

/** For each arrangement of `size` bits the least arrangement that is the same compound. */
export function leastEquivalents(size: number, moves: readonly BitMove[]): Int32Array {
  const least = new Int32Array(2 ** size).fill(-1);
  for (let start = 0; start < least.length; start++) {
    if (least[start] !== -1) continue;
    least[start] = start;
    const queue = [start];
    for (const current of queue) {
      for (const move of moves) {
        const image = moved(current, move);
        if (least[image] !== -1) continue;
        least[image] = start;
        queue.push(image);
      }
    }
  }
  return least;
}

function moved(arrangement: number, { to, turns }: BitMove): number {
  let image = 0;
  for (let index = 0; index < to.length; index++) {
    const bit = ((arrangement >> index) & 1) === 1;
    if (bit !== turns[index]) image |= 1 << to[index]!;
  }
  return image;
}

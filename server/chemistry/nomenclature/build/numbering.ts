/**
 * The rule of lowest locants (P-31.1.4): a parent that can be numbered in several equivalent ways gives the lowest to its
 * principal groups, then to double and triple bonds, then to all other groups together.
 */
import type { SkeletonGraph } from './skeleton.ts';
import { renumberingsOf } from './renumberings.ts';

/** Something cited with a locant on a position of the skeleton, or on the bond between two. */
export interface Cited {
  /** 0 for principal groups and free valences, 1 for multiple bonds, 2 for other groups. */
  readonly rank: 0 | 1 | 2;
  readonly positions: readonly [number] | readonly [number, number];
}

/**
 * The numbering that the rule asks for, as the new position of every old one; undefined when the one in use is as low as
 * any. Among equals, what is cited first gets the lowest (P-31.1.4.3.4).
 */
export function properNumbering(
  skeleton: SkeletonGraph,
  cited: readonly Cited[],
): readonly number[] | undefined {
  const values = skeleton.atoms.map((atom) => valueOf(atom.locants[0]));
  const used = cited.filter(({ positions }) => positions.every((position) => values[position] !== undefined));
  if (used.length === 0) return undefined;
  let best: { numbering: readonly number[] | undefined; low: number[]; first: number[] } | undefined;
  const own = { numbering: undefined, ...scoreOf(used, values, (position) => position) };
  best = own;
  for (const numbering of renumberingsOf(skeleton)) {
    const score = { numbering, ...scoreOf(used, values, (position) => numbering[position]!) };
    const order = compare(score.low, best.low) || (best === own ? 0 : compare(score.first, best.first));
    if (order < 0) best = score;
  }
  return best.numbering;
}

function scoreOf(
  cited: readonly Cited[],
  values: readonly (number | undefined)[],
  to: (position: number) => number,
): { low: number[]; first: number[] } {
  const ranks: [number[], number[], number[]] = [[], [], []];
  for (const { rank, positions } of cited) ranks[rank].push(placeOf(positions.map(to), values));
  const first = [...ranks[2]];
  return { low: ranks.flatMap((list) => list.sort((one, other) => one - other)), first };
}

/** A bond has the lower of its two locants; the bond that closes a ring has the higher. */
function placeOf(positions: readonly number[], values: readonly (number | undefined)[]): number {
  const [low, high] = [Math.min(...positions), Math.max(...positions)];
  return values[high - low > 1 ? high : low] ?? Number.MAX_SAFE_INTEGER;
}

function compare(one: readonly number[], other: readonly number[]): number {
  const place = one.findIndex((value, index) => value !== other[index]);
  return place < 0 ? 0 : one[place]! - other[place]!;
}

/** Locants in their order: 1, 1', 2, 3, 3a, 4 (P-31.1.2.2); undefined for those that are no numbers. */
function valueOf(locant: string | undefined): number | undefined {
  const match = /^(\d{1,4})([a-z]?)('*)$/.exec(locant ?? '');
  if (!match) return undefined;
  const letter = match[2] === '' ? 0 : match[2]!.charCodeAt(0) - 96;
  return Number(match[1]) * 1000 + letter * 20 + match[3]!.length;
}

/** The ways in which a skeleton can be laid on itself, so that its numbering can begin elsewhere or run the other way. */
import type { SkeletonGraph } from './skeleton.ts';

/** Larger skeletons are taken as they are numbered. */
const largest = 40;
const stepLimit = 4000;
const most = 96;
const known = new WeakMap<SkeletonGraph, readonly (readonly number[])[]>();

/** For each way but the identity: the position to which every position goes. Bounded; none for large skeletons. */
export function renumberingsOf(skeleton: SkeletonGraph): readonly (readonly number[])[] {
  let found = known.get(skeleton);
  if (!found) known.set(skeleton, (found = search(skeleton)));
  return found;
}

function search(skeleton: SkeletonGraph): readonly (readonly number[])[] {
  const size = skeleton.atoms.length;
  if (skeleton.kind === 'chain' && skeleton.atoms.every((atom) => atom.atomicNumber === 6))
    return [Array.from({ length: size }, (_, position) => size - 1 - position)];
  if (size > largest) return [];
  const orders = Array.from({ length: size }, () => new Map<number, number>());
  for (const { from, to, order } of skeleton.bonds) {
    orders[from]!.set(to, order);
    orders[to]!.set(from, order);
  }
  const kinds = skeleton.atoms.map((atom, position) =>
    [
      atom.atomicNumber,
      atom.charge,
      atom.mancude,
      atom.locants.length > 0,
      skeleton.indicated.includes(position),
      orders[position]!.size,
    ].join(' '),
  );
  const sequence = walk(orders);
  const found: number[][] = [];
  const image = new Array<number>(size).fill(-1);
  const taken = new Set<number>();
  let steps = 0;
  extend(0);
  return steps > stepLimit ? [] : found;

  function extend(depth: number): void {
    if (steps > stepLimit || found.length >= most) return;
    if (depth === size) {
      if (image.some((to, position) => to !== position)) found.push([...image]);
      return;
    }
    const position = sequence[depth]!;
    const before = sequence.slice(0, depth).filter((one) => orders[position]!.has(one));
    const options = before.length > 0 ? [...orders[image[before[0]!]!]!.keys()] : kinds.map((_, one) => one);
    for (const to of options) {
      steps++;
      if (taken.has(to) || kinds[to] !== kinds[position]) continue;
      if (before.some((one) => orders[to]!.get(image[one]!) !== orders[position]!.get(one))) continue;
      image[position] = to;
      taken.add(to);
      extend(depth + 1);
      taken.delete(to);
      image[position] = -1;
    }
  }
}

/** Positions in an order in which each but the first of a part is bound to one before it. */
function walk(orders: readonly ReadonlyMap<number, number>[]): number[] {
  const found: number[] = [];
  const seen = new Set<number>();
  for (let start = 0; start < orders.length; start++) {
    if (seen.has(start)) continue;
    seen.add(start);
    const queue = [start];
    for (const position of queue) {
      found.push(position);
      for (const next of orders[position]!.keys()) {
        if (seen.has(next)) continue;
        seen.add(next);
        queue.push(next);
      }
    }
  }
  return found;
}

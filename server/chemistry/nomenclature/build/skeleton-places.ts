/** Places of a skeleton by locant. */
import type { Locant } from '../tree.ts';
import type { SkeletonGraph } from './skeleton.ts';

/** The atom with the locant; -1 when there is none. */
export function atomAt(skeleton: SkeletonGraph, locant: Locant): number {
  return skeleton.atoms.findIndex((atom) => atom.locants.includes(locant));
}

/**
 * The bond that a locant means: from its atom to the next in the numbering, from the last of a ring back to 1, or with
 * `4(9)` to the atom in brackets (P-31.1.4.2.4). Undefined when the two are not bound.
 */
export function bondAt(skeleton: SkeletonGraph, locant: Locant): number | undefined {
  const compound = /^([^(]+)\(([^)]+)\)$/.exec(locant);
  const from = atomAt(skeleton, compound?.[1] ?? locant);
  if (from < 0) return undefined;
  if (compound) return between(skeleton, from, atomAt(skeleton, compound[2]!));
  const primes = /'*$/.exec(locant)![0];
  const following = atomAt(skeleton, String(Number.parseInt(locant, 10) + 1) + primes);
  const last = skeleton.kind === 'ring' && from === skeleton.atoms.length - 1;
  return between(skeleton, from, following) ?? (last ? between(skeleton, from, 0) : undefined);
}

function between(skeleton: SkeletonGraph, one: number, other: number): number | undefined {
  const index = skeleton.bonds.findIndex(
    (bond) => (bond.from === one && bond.to === other) || (bond.to === one && bond.from === other),
  );
  return index < 0 ? undefined : index;
}

/** What rings with the most double bonds have in common (P-25, mancude). */
import type { SkeletonAtom } from '../build/skeleton.ts';

/** Elements with two bonds, and iodine with three, which bear no double bond in a ring. */
export const chalcogens: ReadonlySet<number> = new Set([8, 16, 34, 52, 53]);

/** An azole without indicated hydrogen in its name means the tautomer with the lowest numbered NH, as 1H. */
export function usualHydrogen(atoms: readonly SkeletonAtom[]): number[] {
  const mancude = atoms.filter((atom) => atom.mancude).length;
  if (mancude % 2 === 0) return [];
  const nitrogen = atoms.findIndex((atom) => atom.mancude && atom.atomicNumber === 7);
  return nitrogen < 0 ? [] : [nitrogen];
}

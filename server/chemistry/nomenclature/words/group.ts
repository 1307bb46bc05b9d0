/** What a word for a group or parent yields before it is put into a row. */
import type { SkeletonGraph } from '../build/skeleton.ts';
import type { Unit } from '../tree.ts';

export interface Group {
  readonly unit: Unit;
  readonly role: 'radical' | 'parent' | 'derivative';
  readonly end: number;
  /** A stem with which an unbranched alkyl group begins, so that `n-` before it means `normal`. */
  readonly normal?: boolean;
  /** A locant before it can be that of its free valence. */
  readonly locantBefore?: boolean;
}

/** A unit with nothing on it yet. */
export const bare = (skeletons: readonly SkeletonGraph[], start: number, end: number): Unit => ({
  skeletons,
  replacements: [],
  unsaturations: [],
  endings: [],
  hydro: [],
  indicated: [],
  stereo: [],
  groupings: [],
  range: { start, end },
  parentAt: start,
});

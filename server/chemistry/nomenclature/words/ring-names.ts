/** Ring names made by rule: Hantzsch–Widman (P-22.2.2), benzo heterocycles (P-25.2.2.4) and fusion names (P-25.3). */
import type { SkeletonGraph } from '../build/skeleton.ts';
import { fusionNamesAt } from '../rings/fusion-names.ts';
import { hantzschWidmanAt } from './hantzsch-widman.ts';

export interface RingName {
  readonly skeletons: readonly SkeletonGraph[];
  /** Before the final e, where there is one. */
  readonly end: number;
}

/** Ring names by rule that begin at the offset. */
export function ringNameAt(text: string, lower: string, offset: number): RingName[] {
  return [...hantzschWidmanAt(text, lower, offset), ...fusionNamesAt(lower, offset)];
}

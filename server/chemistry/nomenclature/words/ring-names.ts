/** Ring names made by rule, one reader for each kind; the only place where they are called from. */
import type { SkeletonGraph } from '../build/skeleton.ts';
import { fusionNamesAt } from '../rings/fusion-names.ts';
import { hantzschWidmanAt } from '../rings/hantzsch-widman.ts';

export interface RingName {
  readonly skeletons: readonly SkeletonGraph[];
  /** Before the final e, where there is one. */
  readonly end: number;
}

type RingNameReader = (text: string, lower: string, offset: number) => readonly RingName[];

const readers: readonly RingNameReader[] = [
  // P-22.2.2 and P-25.2.2.4
  hantzschWidmanAt,
  // P-25.3
  (_, lower, offset) => fusionNamesAt(lower, offset),
];

/** Ring names by rule that begin at the offset. */
export function ringNameAt(text: string, lower: string, offset: number): RingName[] {
  return readers.flatMap((read) => read(text, lower, offset));
}

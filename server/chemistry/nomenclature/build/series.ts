/** The D and L series of compounds whose retained names leave their configuration to these letters (P-103.1.3, P-65.1.2.1). */
import type { StereoElement } from '../../structure/molecule.ts';
import type { StereoWord } from '../tree.ts';
import type { SkeletonGraph } from './skeleton.ts';

/** Whether a word is `D-` or `L-` before the name itself. */
export const isSeriesWord = (word: StereoWord): boolean =>
  word.locant === undefined && (word.letter === 'D' || word.letter === 'L');

/**
 * The skeleton as the words before its name want it: the L form, its mirror image, or with centres left open. A racemate
 * is written as its L half.
 */
export function inSeries(skeleton: SkeletonGraph, words: readonly StereoWord[]): SkeletonGraph {
  if (skeleton.series !== true) return skeleton;
  const said = words.find(isSeriesWord)?.letter;
  if (said === 'L' || (said === undefined && words.some((word) => word.letter === 'rac'))) return skeleton;
  const turned = (element: StereoElement): StereoElement =>
    element.kind === 'tetrahedral' ? { ...element, clockwise: !element.clockwise } : element;
  const stereo =
    said === 'D'
      ? skeleton.stereo.map(turned)
      : skeleton.stereo.filter((element) => element.kind !== 'tetrahedral');
  return { ...skeleton, stereo };
}

/**
 * Compounds whose retained names leave their configuration to a word before them: the D and L series (P-103.1.3,
 * P-65.1.2.1), and terpenes with their sign of rotation.
 */
import type { StereoElement } from '../../structure/molecule.ts';
import type { StereoWord } from '../tree.ts';
import type { SkeletonGraph } from './skeleton.ts';

/** Whether a word is a sign of rotation before the name itself. */
export const isSign = (word: StereoWord): boolean => word.letter === '+' || word.letter === '-';

/** Whether a word is `D-` or `L-` before the name itself. */
export const isSeriesWord = (word: StereoWord): boolean =>
  word.locant === undefined && (word.letter === 'D' || word.letter === 'L');

/** Whether the name says nothing of its configuration, so that both enantiomers of the one drawn are meant. */
export function isBothEnantiomers(skeleton: SkeletonGraph, words: readonly StereoWord[]): boolean {
  return skeleton.rotation !== undefined && words.length === 0;
}

/**
 * The skeleton as the words before its name want it: the form drawn, its mirror image, or with centres left open. A
 * racemate is written as the half that is drawn.
 */
export function inSeries(skeleton: SkeletonGraph, words: readonly StereoWord[]): SkeletonGraph {
  if (skeleton.series !== true && skeleton.rotation === undefined) return skeleton;
  const spelt = words.some((word) => /^[RSrs]$/.test(word.letter));
  const drawn = skeleton.rotation ?? '-';
  const sign = spelt ? undefined : words.flatMap((word) => signOf(word, skeleton) ?? [])[0];
  const isWhole = sign === undefined && !spelt && skeleton.rotation !== undefined;
  if (sign === drawn || isWhole || (sign === undefined && words.some((word) => word.letter === 'rac')))
    return skeleton;
  const stereo =
    sign === undefined
      ? skeleton.stereo.filter((element) => element.kind !== 'tetrahedral')
      : skeleton.stereo.map(turned);
  return { ...skeleton, stereo };
}

/**
 * D stands for the other form than the one drawn of the L series, and for dextrorotatory before a terpene. Signs do not go
 * with the series: L-tartaric acid is (+).
 */
function signOf(word: StereoWord, skeleton: SkeletonGraph): '+' | '-' | undefined {
  if (isSign(word)) return skeleton.rotation === undefined ? undefined : (word.letter as '+' | '-');
  return isSeriesWord(word) ? (word.letter === 'D' ? '+' : '-') : undefined;
}

const turned = (element: StereoElement): StereoElement =>
  element.kind === 'tetrahedral' ? { ...element, clockwise: !element.clockwise } : element;

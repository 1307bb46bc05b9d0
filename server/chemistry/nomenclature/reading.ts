/**
 * What reading a name yields. One reading is one constitution, with the arrangement in space that the name
 * fixed; the stereoisomers which it leaves open are listed with it. The engine never guesses: a name that is
 * not understood to the last character is `unknown`.
 */
import type { Molecule } from '../structure/molecule.ts';
import type { Fix, TextRange } from '../text.ts';

export interface Stereoisomer {
  /** The name completed with its descriptors. */
  readonly name: string;
  readonly molecule: Molecule;
}

export interface Reading {
  /** The name completed with the locants of this reading. */
  readonly name: string;
  readonly molecule: Molecule;
  /** What the name leaves open: empty, or two and more. */
  readonly stereoisomers: readonly Stereoisomer[];
  /** True number of stereoisomers when listing was cut at the cap, or undefined. */
  readonly stereoisomerCount?: number;
}

/** A statement of the name that says nothing, cannot be true, or is not how the compound is named. */
export interface NameRemark {
  readonly kind: 'improper' | 'stereo-meaningless' | 'valence';
  /** In the name's text. */
  readonly range: TextRange;
  readonly message: string;
  readonly fixes?: readonly Fix[];
}

export interface UnderstoodName {
  readonly kind: 'understood';
  /** One or more; in order of how the locants complete. */
  readonly readings: readonly Reading[];
  /** True number of readings when listing was cut at the cap, or undefined. */
  readonly count?: number;
  /** Looking for readings was given up at a bound, so that there are at least as many as `count` says. */
  readonly atLeast?: true;
  readonly remarks: readonly NameRemark[];
}

/** How many readings a name has, in words: `3`, or `at least 210`. */
export function countInWords({ readings, count, atLeast }: UnderstoodName): string {
  return `${atLeast === true ? 'at least ' : ''}${String(count ?? readings.length)}`;
}

/** A name for something that is a mixture by nature (`hexanes`, `brine`, a solution). */
export interface MixtureName {
  readonly kind: 'mixture';
  /** What the mixture is, in words. */
  readonly message: string;
  /** Its components where they are known. */
  readonly components: readonly Reading[];
}

export interface UnknownName {
  readonly kind: 'unknown';
  /** Where reading stopped, an offset into the name. */
  readonly stoppedAt: number;
  /** The word at which it stopped. */
  readonly range: TextRange;
  readonly message: string;
  /** The nearest words that are known, best first, as whole replacements of `range`. */
  readonly suggestions: readonly string[];
}

export type NameReading = UnderstoodName | MixtureName | UnknownName;

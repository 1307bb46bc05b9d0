/**
 * A number as a laboratory writes it. A recorded number stands for the interval that its last digit implies:
 * 1.50 g is anything from 1.495 to 1.505 g.
 */
import type { TextRange } from '../text.ts';

export interface Quantity {
  /** The number as recorded, in the unit as recorded. For a range, its middle. */
  readonly value: number;
  /** The interval it stands for, in the unit as recorded. */
  readonly low: number;
  readonly high: number;
  /** Normalized unit such as `g/mol`, or the empty string. */
  readonly unit: string;
  /** The digits after the decimal point as written, for writing a corrected value in the same style. */
  readonly decimals: number;
  /** Written with `ca.`, `~`, `approx.`. */
  readonly approximate: boolean;
  /** The number alone, in the text it was read from. */
  readonly numberRange: TextRange;
}

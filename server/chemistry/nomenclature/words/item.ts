/** The pieces of a row: one substituent, or one prefix that changes the parent. */
import type { BondingNumber, Locant, StereoWord, Unit } from '../tree.ts';

export interface GroupItem {
  readonly kind: 'group';
  readonly locants?: readonly Locant[] | undefined;
  readonly count: number;
  /** `bis`, or a bracket follows: the multiplier belongs to a compound substituent. */
  readonly unit: Unit;
  readonly role: 'radical' | 'parent' | 'derivative';
  /** Nothing, not even a hyphen, stands between the item before and this one. */
  readonly joins: boolean;
  readonly bracketed: boolean;
  readonly start: number;
  /** Where the group itself begins, after its locants. */
  readonly bodyAt: number;
  readonly end: number;
}

export type Item =
  | GroupItem
  | { readonly kind: 'stereo'; readonly words: readonly StereoWord[]; readonly start: number }
  | { readonly kind: 'indicated'; readonly locants: readonly Locant[]; readonly start: number }
  | { readonly kind: 'bonding'; readonly numbers: readonly BondingNumber[]; readonly start: number }
  | {
      readonly kind: 'hydro';
      readonly locants?: readonly Locant[] | undefined;
      readonly count: number;
      readonly start: number;
      readonly end: number;
    }
  | {
      readonly kind: 'replacement';
      readonly locants?: readonly Locant[] | undefined;
      readonly count: number;
      readonly atomicNumber: number;
      readonly charge: number;
      readonly start: number;
      readonly end: number;
    };

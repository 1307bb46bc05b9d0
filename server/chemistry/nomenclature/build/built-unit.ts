/** What building a unit yields, for whatever is bound to it next. */
import type { Locant, Unit } from '../tree.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import type { Places } from './places.ts';

export interface BuiltUnit {
  readonly places: Places;
  /** Free valences: atom and order of the bond to come. */
  readonly free: { atom: number; order: number }[];
  /** Negative atoms of acid groups, in order, which take the alcohol parts of an ester. */
  readonly sites: number[];
}

/** Says that a locant names no place of its parent. */
export function noSuchPlace(locant: Locant): string {
  return `The parent has no position ${locant}. Check the locant, or the parent's name.`;
}

export type UnitBuilder = (unit: Unit, draft: Draft, choices: Choices) => BuiltUnit | undefined;

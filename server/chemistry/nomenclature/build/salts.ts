/** Cations with anions in the numbers that their charges ask for. */
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { addSmiles, buildWord, type Word } from './words.ts';

export interface Ion {
  readonly smiles: string;
  readonly charge: number;
  readonly count: number | undefined;
}

/** Metals or organic cations with anions; numbers that the name leaves out follow from the charges (Red Book IR-5.4.2). */
export function buildSalt(
  metals: readonly Ion[],
  bases: readonly Word[],
  negatives: readonly Ion[],
  draft: Draft,
  choices: Choices,
): boolean {
  if (metals.length + bases.length !== 1 || negatives.length !== 1) return false;
  const [metal] = metals;
  const [base] = bases;
  const [negative] = negatives as [Ion];
  const charge = metal ? metal.charge : makeCation(base!, draft, choices);
  if (charge === undefined) return false;
  const given = metal ? metal.count : base!.count > 1 ? base!.count : undefined;
  // A number before the anion goes with a number, or one, before the cation: there is no `sodium dichloride`.
  const cations = given ?? (negative.count === undefined ? undefined : 1);
  const counts = balanced(charge, cations, negative.charge, negative.count);
  if (!counts) return false;
  for (let copy = metal ? 0 : 1; copy < counts[0]; copy++) {
    if (metal) addSmiles(metal.smiles, draft);
    else if (makeCation(base!, draft, choices) !== charge) return false;
  }
  for (let copy = 0; copy < counts[1]; copy++) addSmiles(negative.smiles, draft);
  return true;
}

/** Builds an organic cation; its charge, or undefined when it has none. */
export function makeCation(base: Word, draft: Draft, choices: Choices): number | undefined {
  const from = draft.atoms.length;
  if (!buildWord(base.unit, draft, choices)) return undefined;
  const charge = draft.atoms.slice(from).reduce((sum, atom) => sum + atom.charge, 0);
  return charge > 0 ? charge : undefined;
}

export function balanced(
  up: number,
  given: number | undefined,
  down: number,
  other: number | undefined,
): [number, number] | undefined {
  for (let first = given ?? 1; first <= (given ?? 6); first++) {
    for (let second = other ?? 1; second <= (other ?? 6); second++)
      if (first * up === second * down) return [first, second];
  }
  return undefined;
}

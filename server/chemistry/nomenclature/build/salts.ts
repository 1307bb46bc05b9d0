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
  const positives: { charge: number; count: number | undefined; make: () => boolean }[] = metals.map(
    (metal) => ({
      charge: metal.charge,
      count: metal.count,
      make: () => addSmiles(metal.smiles, draft).length > 0,
    }),
  );
  for (const base of bases) {
    positives.push({
      charge: 1,
      count: base.count > 1 ? base.count : undefined,
      make: () => makeCation(base, draft, choices),
    });
  }
  if (positives.length !== 1 || negatives.length !== 1) return false;
  const [positive, negative] = [positives[0]!, negatives[0]!];
  // A number before the anion goes with a number, or one, before the cation: there is no `sodium dichloride`.
  const cations = positive.count ?? (negative.count === undefined ? undefined : 1);
  const counts = balanced(positive.charge, cations, negative.charge, negative.count);
  if (!counts) return false;
  for (let copy = 0; copy < counts[0]; copy++) if (!positive.make()) return false;
  for (let copy = 0; copy < counts[1]; copy++) addSmiles(negative.smiles, draft);
  return true;
}

export function makeCation(base: Word, draft: Draft, choices: Choices): boolean {
  const from = draft.atoms.length;
  if (!buildWord(base.unit, draft, choices)) return false;
  let charge = 0;
  for (let atom = from; atom < draft.atoms.length; atom++) charge += draft.atoms[atom]!.charge;
  return charge === 1;
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

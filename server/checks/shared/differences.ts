/** How two compositions differ, in words. */
import { compositionDifference } from '../../chemistry/composition/compare.ts';
import type { Composition } from '../../chemistry/composition/composition.ts';
import { counterparts, type Counterpart } from './counterparts.ts';
import { counted, listed } from './values.ts';

/** Two compositions that a notebook would call the same: a formula may leave the charge of an ion out. */
export function agreeing(formula: Composition, other: Composition): boolean {
  return (
    compositionDifference(formula, other).size === 0 &&
    (formula.charge === other.charge || formula.charge === 0)
  );
}

/** What `stated` has beyond or short of `other`: `one O too many`, `2 H too few and one N too many`. */
export function differenceInWords(stated: Composition, other: Composition): string {
  const difference = [...compositionDifference(stated, other)];
  const words = difference.map(
    ([kind, delta]) =>
      `${counted(Math.abs(delta), kind === '2H' ? 'D' : kind)} too ${delta > 0 ? 'many' : 'few'}`,
  );
  if (stated.charge !== other.charge) {
    words.push(`charge ${signed(stated.charge)} instead of ${signed(other.charge)}`);
  }
  return listed(words, 5);
}

/** A whole number of times (or half) one of the usual counterparts: salt, hydrate, label. */
export function usualDifference(first: Composition, second: Composition): string | undefined {
  const difference = compositionDifference(first, second);
  if (difference.size === 0) return undefined;
  for (const counterpart of counterparts) {
    const times = timesOf(difference, counterpart);
    if (times !== undefined) return sentence(counterpart, Math.abs(times));
  }
  return undefined;
}

/** What the difference suggests: `The difference is 2 × D for H: perhaps one of them is …`. */
export function sentence(counterpart: Counterpart, times: number): string {
  const amount =
    times === 1 ? counterpart.difference : `${Number(times.toFixed(3))} × ${counterpart.difference}`;
  return `The difference is ${amount}: perhaps one of them is ${counterpart.meaning}.`;
}

function timesOf(difference: ReadonlyMap<string, number>, { gain }: Counterpart): number | undefined {
  const kinds = Object.keys(gain);
  if (kinds.length !== difference.size) return undefined;
  const times = (difference.get(kinds[0]!) ?? 0) / gain[kinds[0]!]!;
  if (times === 0 || !Number.isInteger(Number((times * 2).toFixed(6)))) return undefined;
  const fits = kinds.every((kind) => Math.abs((difference.get(kind) ?? 0) - times * gain[kind]!) < 0.005);
  return fits ? times : undefined;
}

function signed(charge: number): string {
  return charge > 0 ? `+${charge}` : charge < 0 ? `−${-charge}` : '0';
}

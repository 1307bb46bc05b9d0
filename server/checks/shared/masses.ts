/**
 * Whether a recorded mass fits a composition: the interval of its last digit against the values that the usual
 * tables of atomic weights give. No false alarm from rounding, whatever table the value was worked out with.
 */
import type { Composition } from '../../chemistry/composition/composition.ts';
import { elementWithSymbol } from '../../chemistry/composition/elements.ts';
import { averageMass, monoisotopicMass, partsOfKind } from '../../chemistry/composition/mass.ts';
import type { Quantity } from '../../chemistry/stoichiometry/quantity.ts';
import { atomicWeightHistory } from './atomic-weight-history.ts';
import { counterparts } from './counterparts.ts';
import { sentence } from './differences.ts';

/** Grams per mole (or u) in one of the unit; units that are none of a mass per amount are missing. */
const factors: Readonly<Record<string, number>> = {
  '': 1,
  'g/mol': 1,
  'mg/mmol': 1,
  'kg/mol': 1000,
  u: 1,
  Da: 1,
  amu: 1,
  kDa: 1000,
};

export interface Interval {
  readonly low: number;
  readonly high: number;
}

/** The interval of a recorded mass in g/mol or u, or undefined for a unit that is no mass. */
export function recordedMass(quantity: Quantity): (Interval & { readonly factor: number }) | undefined {
  const factor = Object.hasOwn(factors, quantity.unit) ? factors[quantity.unit]! : undefined;
  return factor === undefined
    ? undefined
    : { low: quantity.low * factor, high: quantity.high * factor, factor };
}

/** The molar masses that published tables give, and the one from weights rounded to two decimals. */
function tabulatedMasses(composition: Composition): Interval[] {
  let low = 0;
  let high = 0;
  let rounded = 0;
  for (const [kind, count] of composition.counts) {
    const { symbol, massNumber } = partsOfKind(kind);
    const weight =
      massNumber === 0
        ? elementWithSymbol(symbol)?.standardAtomicWeight
        : averageMass({ counts: new Map([[kind, 1]]), charge: 0 });
    if (weight === undefined) return [];
    const [lowest, highest] = (massNumber === 0 && atomicWeightHistory[symbol]) || [weight, weight];
    low += count * Math.min(lowest, weight);
    high += count * Math.max(highest, weight);
    rounded += count * Number(weight.toFixed(2));
  }
  return [
    { low, high },
    { low: rounded, high: rounded },
  ];
}

/** Undefined when it cannot be said: an element without atomic weight, a unit that is no mass. */
export function fitsMolarMass(
  quantity: Quantity,
  composition: Composition,
  toleranceGramsPerMole: number,
): boolean | undefined {
  const recorded = recordedMass(quantity);
  const masses = tabulatedMasses(composition);
  if (recorded === undefined || masses.length === 0) return undefined;
  return masses.some((mass) => meet(recorded, mass, toleranceGramsPerMole));
}

/** Of an ion both conventions are taken: with and without the mass of the electrons. */
export function fitsExactMass(
  quantity: Quantity,
  composition: Composition,
  toleranceU: number,
): boolean | undefined {
  const recorded = recordedMass(quantity);
  const masses = [monoisotopicMass(composition), monoisotopicMass(composition, true)];
  if (recorded === undefined || masses[0] === undefined) return undefined;
  return masses.some((mass) => meet(recorded, { low: mass!, high: mass! }, toleranceU));
}

/** A rounding error of the sums themselves must never decide. */
const arithmeticSlack = 1e-9;

function meet(recorded: Interval, computed: Interval, tolerance: number): boolean {
  return (
    recorded.low - tolerance - arithmeticSlack <= computed.high &&
    computed.low <= recorded.high + tolerance + arithmeticSlack
  );
}

/** Whether the recorded mass is that of the salt, hydrate or free base instead; a sentence, or undefined. */
export function usualMassDifference(
  quantity: Quantity,
  composition: Composition,
  massOf: (composition: Composition) => number | undefined,
  tolerance: number,
): string | undefined {
  const recorded = recordedMass(quantity);
  const mass = massOf(composition);
  // An interval as wide as a proton's mass fits nearly everything.
  if (recorded === undefined || mass === undefined || recorded.high - recorded.low > 0.6) return undefined;
  const slack = Math.max(tolerance, 0.02);
  for (const counterpart of counterparts) {
    // Labels weigh so little that any slip of a digit would look like one.
    if (Object.keys(counterpart.gain).some((kind) => /^\d/.test(kind))) continue;
    const unit = massOf({ counts: new Map(Object.entries(counterpart.gain)), charge: 0 });
    if (unit === undefined) continue;
    for (const times of [1, -1, 2, -2, 3, -3, 0.5, -0.5]) {
      const shifted = mass + times * unit;
      if (meet(recorded, { low: shifted, high: shifted }, slack))
        return sentence(counterpart, Math.abs(times));
    }
  }
  return undefined;
}

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  difference,
  exactly,
  meet,
  product,
  quotient,
  sum,
  type Interval,
} from '../../../../server/chemistry/stoichiometry/interval.ts';

/** An interval and a value in it. */
const member = fc
  .tuple(
    fc.double({ min: -1e6, max: 1e6, noNaN: true }),
    fc.nat({ max: 1000 }),
    fc.double({ min: 0, max: 1, noNaN: true }),
  )
  .map(([low, width, share]): { interval: Interval; value: number } => ({
    interval: { low, high: low + width },
    value: low + width * share,
  }));

/** Rounding of the machine aside. */
function holds({ low, high }: Interval, value: number): boolean {
  const slack = 1e-9 * Math.max(1, Math.abs(low), Math.abs(high));
  return low - slack <= value && value <= high + slack;
}

it('holds every result of values within the operands', () => {
  fc.assert(
    fc.property(member, member, (first, second) => {
      const [a, b] = [first.interval, second.interval];
      expect(holds(sum(a, b), first.value + second.value)).toBe(true);
      expect(holds(difference(a, b), first.value - second.value)).toBe(true);
      expect(holds(product(a, b), first.value * second.value)).toBe(true);
      const ratio = quotient(a, b);
      expect(ratio === undefined).toBe(b.low <= 0 && b.high >= 0);
      // A divisor next to zero leaves no digits to compare.
      if (ratio !== undefined && Math.abs(second.value) > 1e-3) {
        expect(holds(ratio, first.value / second.value)).toBe(true);
      }
    }),
    { seed: 8, numRuns: 2000 },
  );
});

describe('worked examples', () => {
  it('1.50 g of 150.18 g/mol is 9.95 to 10.03 mmol', () => {
    const amount = quotient({ low: 1495, high: 1505 }, { low: 150.175, high: 150.185 })!;
    expect(amount.low).toBeCloseTo(9.9544, 4);
    expect(amount.high).toBeCloseTo(10.0216, 4);
  });

  it('signs and open ends', () => {
    expect(product({ low: -2, high: 3 }, { low: -5, high: 1 })).toEqual({ low: -15, high: 10 });
    expect(product(exactly(0), { low: 1, high: Number.POSITIVE_INFINITY })).toEqual({ low: 0, high: 0 });
    expect(quotient(exactly(1), { low: -1, high: 1 })).toBeUndefined();
  });

  it('meets at an edge and within a tolerance', () => {
    expect(meet({ low: 1, high: 2 }, { low: 2, high: 3 })).toBe(true);
    expect(meet({ low: 1, high: 2 }, { low: 2.1, high: 3 })).toBe(false);
    expect(meet({ low: 1, high: 2 }, { low: 2.1, high: 3 }, 0.2)).toBe(true);
    expect(meet({ low: 2.1, high: 3 }, { low: 1, high: 2 }, 0.05)).toBe(false);
  });
});

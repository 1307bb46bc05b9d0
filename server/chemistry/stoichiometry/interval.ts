/**
 * Arithmetic with numbers that are known to within an interval. A result holds every value that can come of
 * values in the operands (Moore, Kearfott and Cloud, Introduction to Interval Analysis, SIAM 2009, chapter 2);
 * it is never narrower than that. Rounding of the machine is not accounted for: it is 10 digits below anything
 * that a laboratory records.
 */
export interface Interval {
  readonly low: number;
  readonly high: number;
}

export function exactly(value: number): Interval {
  return { low: value, high: value };
}

export function sum(first: Interval, second: Interval): Interval {
  return { low: first.low + second.low, high: first.high + second.high };
}

export function difference(first: Interval, second: Interval): Interval {
  return { low: first.low - second.high, high: first.high - second.low };
}

export function product(first: Interval, second: Interval): Interval {
  const corners = [
    times(first.low, second.low),
    times(first.low, second.high),
    times(first.high, second.low),
    times(first.high, second.high),
  ];
  return { low: Math.min(...corners), high: Math.max(...corners) };
}

/** Undefined when the divisor may be zero. */
export function quotient(first: Interval, second: Interval): Interval | undefined {
  if (second.low <= 0 && second.high >= 0) return undefined;
  return product(first, { low: 1 / second.high, high: 1 / second.low });
}

/** Whether two statements can both be true when each may be off by `tolerance` more. */
export function meet(first: Interval, second: Interval, tolerance = 0): boolean {
  return first.low <= second.high + tolerance && second.low <= first.high + tolerance;
}

/** 0 times an open end is 0: the bound is approached, never reached. */
function times(first: number, second: number): number {
  return first === 0 || second === 0 ? 0 : first * second;
}

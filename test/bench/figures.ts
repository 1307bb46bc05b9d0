/** Medians and percentiles of timings, and how they are printed. */

export interface Figures {
  readonly median: number;
  readonly p95: number;
  readonly count: number;
}

/** `samples` in any unit; the figures are in the same one. */
export function figuresOf(samples: readonly number[]): Figures {
  const sorted = [...samples].sort((first, second) => first - second);
  const at = (share: number) => sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? NaN;
  return { median: at(0.5), p95: at(0.95), count: sorted.length };
}

/** Time of one call in milliseconds, `rounds` times after a few that do not count. */
export function timed(rounds: number, call: () => void, warmUp = Math.ceil(rounds / 4)): Figures {
  const samples: number[] = [];
  for (let round = -warmUp; round < rounds; round++) {
    const start = performance.now();
    call();
    if (round >= 0) samples.push(performance.now() - start);
  }
  return figuresOf(samples);
}

export function show(what: string, { median, p95 }: Figures, unit: string, note = ''): void {
  const number = (value: number) => value.toPrecision(3);
  console.log(
    `${what.padEnd(52)} median ${number(median)} ${unit}, 95th ${number(p95)} ${unit}${note === '' ? '' : `  ${note}`}`,
  );
}

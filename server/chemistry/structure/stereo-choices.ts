/** Which arrangements are left to choose from once cages tie some candidates together and others are stated. */
import type { CageConstraint } from './stereo-cages.ts';

export interface FreeChoices {
  /** Independent choices of two; there are 2 ** count arrangements. */
  readonly count: number;
  /** The arrangement with this number: a value for each candidate. */
  valuesOf(number: number): boolean[];
}

/**
 * What is stated outright is believed, however strained it is: a constraint that contradicts what is stated, or an
 * earlier constraint, is passed over.
 */
export function freeChoices(
  stated: readonly (boolean | undefined)[],
  constraints: readonly CageConstraint[],
): FreeChoices {
  // Each candidate follows a leader, or runs against it; leader −1 is the value true.
  const leader = stated.map((value, index) => (value === undefined ? index : -1));
  const against = stated.map((value) => value === false);
  for (const { first, second, equal } of constraints) {
    const [one, other] = [leader[first]!, leader[second]!];
    if (one === other) continue;
    const [kept, joined] = one === -1 || (other !== -1 && one < other) ? [one, other] : [other, one];
    const opposed = (against[first] !== against[second]) === equal;
    leader.forEach((of, index) => {
      if (of !== joined) return;
      leader[index] = kept;
      if (opposed) against[index] = !against[index];
    });
  }
  const leaders = [...new Set(leader)].filter((of) => of >= 0).sort((first, second) => first - second);
  const place = leader.map((of) => 2 ** leaders.indexOf(of));
  return {
    count: leaders.length,
    valuesOf: (number) =>
      leader.map((of, index) => {
        const value = of === -1 || Math.floor(number / place[index]!) % 2 === 1;
        return value !== against[index];
      }),
  };
}

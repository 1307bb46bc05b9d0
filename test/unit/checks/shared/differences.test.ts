/** Differences between compositions, in words. */
import { expect, it } from 'vitest';
import { readFormula } from '../../../../server/chemistry/composition/read-formula.ts';
import {
  agreeing,
  differenceInWords,
  usualDifference,
} from '../../../../server/checks/shared/differences.ts';

const formula = (text: string) => readFormula(text).value!;

it.each([
  ['C9H12O3', 'C9H12O2', 'one O too many'],
  ['C9H10O2', 'C9H12O2', '2 H too few'],
  ['C9H14O', 'C9H12O2', '2 H too many and one O too few'],
  ['CHCl3', 'CDCl3', 'one H too many and one D too few'],
  ['C4H12N+', 'C4H12N-', 'charge +1 instead of −1'],
])('%s against %s: %s', (stated, other, words) => {
  expect(differenceInWords(formula(stated), formula(other))).toBe(words);
});

it.each([
  ['C8H12ClN', 'C8H11N', 'HCl'],
  ['C8H11N', 'C8H13Cl2N', '2 × HCl'],
  ['C6H14O7', 'C6H12O6', 'H2O'],
  ['CuSO4·0.5H2O', 'CuSO4', '0.5 × H2O'],
  ['C2H3NaO2', 'C2H4O2', 'Na for H'],
  ['CHCl3', 'CDCl3', 'D for H'],
])('%s and %s differ by %s', (first, second, difference) => {
  expect(usualDifference(formula(first), formula(second))).toContain(
    `The difference is ${difference}: perhaps`,
  );
});

it('no usual difference is claimed where there is none', () => {
  expect(usualDifference(formula('C9H12O3'), formula('C9H12O2'))).toBeUndefined();
  expect(usualDifference(formula('C9H12O2'), formula('C9H12O2'))).toBeUndefined();
});

it('a formula may leave the charge of an ion out, but not state another', () => {
  expect(agreeing(formula('C4H12N'), formula('C4H12N+'))).toBe(true);
  expect(agreeing(formula('C4H12N-'), formula('C4H12N+'))).toBe(false);
  expect(agreeing(formula('C4H12N+'), formula('C4H12N'))).toBe(false);
});

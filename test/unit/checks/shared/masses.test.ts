/** When a recorded mass fits a composition. */
import { describe, expect, it } from 'vitest';
import type { Composition } from '../../../../server/chemistry/composition/composition.ts';
import { elementWithSymbol } from '../../../../server/chemistry/composition/elements.ts';
import { readFormula } from '../../../../server/chemistry/composition/read-formula.ts';
import type { Quantity } from '../../../../server/chemistry/stoichiometry/quantity.ts';
import { atomicWeightHistory } from '../../../../server/checks/shared/atomic-weight-history.ts';
import { fitsExactMass, fitsMolarMass } from '../../../../server/checks/shared/masses.ts';

const composition = (formula: string): Composition => readFormula(formula).value!;

/** As the reader of quantities gives it: half of the last digit to either side. */
function recorded(text: string, unit = 'g/mol'): Quantity {
  const decimals = text.split('.')[1]?.length ?? 0;
  const value = Number(text);
  const half = 0.5 / 10 ** decimals;
  return {
    value,
    low: value - half,
    high: value + half,
    unit,
    decimals,
    approximate: false,
    numberRange: { start: 0, end: text.length },
  };
}

describe('molar mass', () => {
  it.each([
    // Computed with the table of 1997: C 12.0107, H 1.00794, O 15.9994.
    ['C20H30O2', '302.451'],
    // 2021: C 12.011, H 1.008, O 15.999.
    ['C20H30O2', '302.458'],
    // Rounded weights: C 12.01, H 1.01, O 16.00.
    ['C20H30O2', '302.50'],
    ['C20H30O2', '302'],
    ['C20H30O2', '302.5'],
    // Selenium was 78.96 until 2013.
    ['C12H10Se', '233.17'],
    ['C12H10Se', '233.18'],
    // Zinc was 65.39 from 1983 to 1993, 65.409 until 2007, 65.38 since.
    ['ZnCl2', '136.29'],
    ['ZnCl2', '136.32'],
  ])('%s may be %s g/mol', (formula, mass) => {
    expect(fitsMolarMass(recorded(mass), composition(formula), 0.01)).toBe(true);
  });

  it.each([
    ['C20H30O2', '302.54'],
    ['C20H30O2', '302.40'],
    ['C20H30O2', '301'],
    ['C9H12O2', '152.91'],
  ])('%s cannot be %s g/mol', (formula, mass) => {
    expect(fitsMolarMass(recorded(mass), composition(formula), 0.01)).toBe(false);
  });

  it('takes the units of a mass per amount, and says nothing for others', () => {
    expect(fitsMolarMass(recorded('0.15219', 'kg/mol'), composition('C9H12O2'), 0.01)).toBe(true);
    expect(fitsMolarMass(recorded('152.19', 'mg/mmol'), composition('C9H12O2'), 0.01)).toBe(true);
    expect(fitsMolarMass(recorded('152.19', '°C'), composition('C9H12O2'), 0.01)).toBeUndefined();
  });

  it('cannot be said of an element without atomic weight', () => {
    expect(fitsMolarMass(recorded('98'), composition('Tc'), 0.01)).toBeUndefined();
  });
});

describe('exact mass', () => {
  it('of an ion may be counted with or without its electrons', () => {
    const sodiated = composition('C9H12O2Na+');
    expect(fitsExactMass(recorded('175.0730', 'u'), sodiated, 0.0001)).toBe(true);
    expect(fitsExactMass(recorded('175.0735', 'u'), sodiated, 0.0001)).toBe(true);
    expect(fitsExactMass(recorded('175.0741', 'u'), sodiated, 0.0001)).toBe(false);
  });

  it('may have been cut off instead of rounded', () => {
    // 152.083730 (C9H12O2)
    expect(fitsExactMass(recorded('152.083', 'u'), composition('C9H12O2'), 0.0001)).toBe(false);
    expect(fitsExactMass(recorded('152.0837', 'u'), composition('C9H12O2'), 0.0001)).toBe(true);
    expect(fitsExactMass(recorded('152.0838', 'u'), composition('C9H12O2'), 0.0001)).toBe(true);
  });
});

it("the history of atomic weights includes today's value of every element in it", () => {
  for (const [symbol, [low, high]] of Object.entries(atomicWeightHistory)) {
    const today = elementWithSymbol(symbol)!.standardAtomicWeight!;
    expect([symbol, today >= low && today <= high]).toEqual([symbol, true]);
    expect([symbol, (high - low) / low < 0.0005]).toEqual([symbol, true]);
  }
});

/** Atomic weights and masses against published values. */
import { describe, expect, test } from 'vitest';
import { standardAtomicWeights } from '../../../server/chemistry/composition/atomic-weights.ts';
import { elementWithSymbol } from '../../../server/chemistry/composition/elements.ts';
import { averageMass, monoisotopicMass } from '../../../server/chemistry/composition/mass.ts';
import { readFormula } from '../../../server/chemistry/composition/read-formula.ts';

const composition = (formula: string) => readFormula(formula).value!;

test('every weight agrees with the isotope data of the element package', () => {
  // The package holds the representative isotopic composition of NIST; weights of elements whose composition varies in
  // nature, or was measured anew since, differ from it in the fourth digit.
  const differing = Object.entries(standardAtomicWeights).filter(([symbol, weight]) => {
    const mean = elementWithSymbol(symbol)!.nuclides.reduce(
      (sum, { mass, abundance }) => sum + mass * abundance,
      0,
    );
    return Math.abs(mean - weight) / weight > 2.5e-4;
  });
  expect(differing).toEqual([]);
});

test('all elements with a standard atomic weight, and no others', () => {
  // 84 elements: all to bismuth but technetium and promethium, and thorium, protactinium, uranium (CIAAW).
  expect(Object.keys(standardAtomicWeights)).toHaveLength(84);
});

describe('molar masses of catalogue compounds', () => {
  // Source: molecular weights of PubChem compound records (from memory), g/mol.
  test.each([
    ['C2H6O', 46.07],
    ['C6H12O6', 180.16],
    ['C9H8O4', 180.16],
    ['CHCl3', 119.37],
    ['C4H8O', 72.11],
    ['C7H8', 92.14],
    ['NaCl', 58.44],
    ['CuSO4·5H2O', 249.68],
    ['K2CO3', 138.2],
    ['Pd(PPh3)4', 1155.6],
    ['CDCl3', 120.38],
    ['D2O', 20.03],
    ['C27H46O', 386.7],
  ])('%s', (formula, published) => {
    // PubChem prints four to five digits; older records rest on weights that differ in the last one.
    const lastDigit = 10 ** -(String(published).split('.')[1]?.length ?? 0);
    expect(Math.abs(averageMass(composition(formula))! - published)).toBeLessThanOrEqual(
      0.5 * lastDigit + 0.01,
    );
  });
});

describe('monoisotopic masses', () => {
  // Source: exact masses of PubChem compound records (from memory), u.
  test.each([
    ['C2H6O', 46.041865],
    ['C6H12O6', 180.063388],
    ['C8H10N4O2', 194.080376],
    ['CHCl3', 117.914383],
    ['C6H5Br', 155.957462],
    ['C27H46O', 386.354866],
    ['H2O', 18.010565],
  ])('%s', (formula, published) => {
    expect(monoisotopicMass(composition(formula))).toBeCloseTo(published, 5);
  });

  test('the electron counts when asked for: [M + Na]+ of C9H12O2', () => {
    // Worked by hand: 152.083730 + 22.989769 − 0.000549.
    expect(monoisotopicMass(composition('C9H12O2Na+'), true)).toBeCloseTo(175.07295, 5);
  });
});

/** Formulas as chemists write them: what they mean, and where they are wrong. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { hillFormula, prettyFormula } from '../../../../server/chemistry/composition/format-formula.ts';
import { readFormula, readFormulaDetailed } from '../../../../server/chemistry/composition/read-formula.ts';
import {
  degreeOfUnsaturation,
  impossibility,
} from '../../../../server/chemistry/composition/unsaturation.ts';

const read = (text: string) => readFormula(text).value!;

describe('what a formula means', () => {
  // Common practice, no source.
  test.each([
    ['CH3CH2OH', 'C2H6O'],
    ['(CH3)2CO', 'C3H6O'],
    ['C₉H₁₂O₂', 'C9H12O2'],
    ['C9 H12 O2', 'C9H12O2'],
    ['CuSO4·5H2O', 'CuH10O9S'],
    ['CuSO4*5H2O', 'CuH10O9S'],
    ['CuSO4.5H2O', 'CuH10O9S'],
    ['C8H11N · HCl', 'C8H12ClN'],
    ['C6H6·½H2O', 'C6H7O0.5'],
    ['2 NaCl', 'Cl2Na2'],
    ['SO4^2-', 'O4S^2-'],
    ['SO4²⁻', 'O4S^2-'],
    ['NH4+', 'H4N+'],
    ['Ca2+', 'Ca^2+'],
    ['[Cu(NH3)4]2+', 'CuH12N4^2+'],
    ['C6H5N2+', 'C6H5N2+'],
    ['CH3COO−', 'C2H3O2-'],
    ['[PF6]-', 'F6P-'],
    ['CDCl3', 'CDCl3'],
    ['C6D6', 'C6D6'],
    ['[13C]H3OH', '[13C]H4O'],
    ['¹³CH4', '[13C]H4'],
    ['PhMgBr', 'C6H5BrMg'],
    ['iPr2NEt', 'C8H19N'],
    ['n-BuLi', 'C4H9Li'],
    ['TBSOTf', 'C7H15F3O3SSi'],
    ['Boc2O', 'C10H18O5'],
    ['Ac2O', 'C4H6O3'],
    ['TsOH', 'C7H8O3S'],
    ['Pd2(dba)3', 'C51H42O3Pd2'],
    ['Pr(NO3)3', 'N3O9Pr'],
    ['iPrOH', 'C3H8O'],
    ['CO', 'CO'],
    ['Co', 'Co'],
    ['Fe4[Fe(CN)6]3', 'C18Fe7N18'],
  ])('%s is %s', (text, hill) => {
    expect(hillFormula(read(text))).toBe(hill);
  });

  test('subscripts and charges for people', () => {
    expect(prettyFormula(read('C9H12O2'))).toBe('C₉H₁₂O₂');
    expect(prettyFormula(read('SO4^2-'))).toBe('O₄S²⁻');
  });
});

describe('where a formula is wrong', () => {
  test.each([
    ['C9H12O2«)»', /never opened/],
    ['C9«(»H12', /never closed/],
    ['C6H«0»', /number of 0/],
    ['«Qq»', /neither an element/],
    ['C9H12«?»', /no meaning/],
    ['CuSO4«·»', /Nothing follows/],
    ['«c»9h12o2', /C9H12O2 meant/],
    ['N«A»OH', /NaOH meant/],
    ['C«()»2', /empty/],
  ])('%s', (marked, message) => {
    const { problem } = readFormula(marked.replace(/[«»]/g, ''));
    expect(problem?.message).toMatch(message);
    expect(problem?.range).toEqual({ start: marked.indexOf('«'), end: marked.indexOf('»') - 1 });
  });
});

test('every piece knows its place', () => {
  const text = ' C9H12O2';
  const pieces = readFormulaDetailed(text).value!.pieces.map(({ range }) =>
    text.slice(range.start, range.end),
  );
  expect(pieces).toEqual(['C9', 'H12', 'O2']);
});

describe('unsaturation', () => {
  test.each([
    ['C6H6', 4],
    ['C2H6O', 0],
    ['C10H16', 3],
    ['C5H5N', 4],
    ['NH4+', 0],
    ['C6H12O6', 1],
  ])('%s has %d', (formula, degree) => {
    expect(degreeOfUnsaturation(read(formula))).toBe(degree);
  });

  test.each([
    ['C2H5', 'odd electron count'],
    ['C9H13O2', 'odd electron count'],
    ['C2H8', 'too many hydrogens'],
    ['C3H10O', 'too many hydrogens'],
    ['C2H8ClN', undefined],
    ['SF6', undefined],
    ['NO2', undefined],
    ['C6H6', undefined],
    ['C2H6OS', undefined],
  ])('%s: %s', (formula, why) => {
    expect(impossibility(read(formula))).toBe(why);
  });
});

describe('any text', () => {
  const formulaLike = fc.string({
    unit: fc.constantFrom(...'CHNOSaelr0123456789()[]·+-−^₂²½ D'),
    maxLength: 30,
  });
  test.each([
    ['characters of formulas', formulaLike],
    ['any characters', fc.string({ unit: 'binary', maxLength: 30 })],
  ])('%s', (_title, texts) => {
    fc.assert(
      fc.property(texts, (text) => {
        const { value, problem } = readFormula(text);
        if (problem !== undefined) {
          expect(problem.range.start).toBeGreaterThanOrEqual(0);
          expect(problem.range.end).toBeLessThanOrEqual(text.length);
          expect(problem.range.end).toBeGreaterThanOrEqual(problem.range.start);
        } else {
          expect([...value!.counts.values()].every((count) => count > 0 && Number.isFinite(count))).toBe(
            true,
          );
        }
      }),
      { seed: 20260102, numRuns: 3000 },
    );
  });

  test('a Hill formula reads as what it was written from', () => {
    const symbols = ['C', 'H', 'N', 'O', 'S', 'P', 'Cl', 'Br', 'Na', 'Si', 'Pd'];
    const compositions = fc.dictionary(fc.constantFrom(...symbols), fc.integer({ min: 1, max: 200 }), {
      minKeys: 1,
    });
    fc.assert(
      fc.property(compositions, (counts) => {
        const composition = { counts: new Map(Object.entries(counts)), charge: 0 };
        expect(hillFormula(read(hillFormula(composition)))).toBe(hillFormula(composition));
      }),
      { seed: 20260103 },
    );
  });
});

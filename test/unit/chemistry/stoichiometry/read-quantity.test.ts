import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  readQuantity,
  type QuantityOptions,
} from '../../../../server/chemistry/stoichiometry/read-quantity.ts';

const mass: QuantityOptions = { kinds: ['mass'] };
const molarMass: QuantityOptions = { kinds: ['molar mass', 'particle mass'], defaultUnit: 'g/mol' };
const any: QuantityOptions = { kinds: ['mass', 'amount', 'volume', 'fraction', 'pressure'], defaultUnit: '' };

/** Low, high and unit, rounded where binary fractions would show. */
function read(text: string, options: QuantityOptions) {
  const { value, problem } = readQuantity(text, options);
  if (value === undefined) return problem.message;
  const round = (number: number) => Number(number.toPrecision(12));
  return [round(value.low), round(value.high), value.unit];
}

// The interval of the last digit is the product's own rule; units and spellings are common practice, no source.
it.each<[string, QuantityOptions, [number, number, string]]>([
  ['1.50 g', mass, [1.495, 1.505, 'g']],
  ['1.5 g', mass, [1.45, 1.55, 'g']],
  ['378 mg', mass, [377.5, 378.5, 'mg']],
  ['0.20 µg', mass, [0.195, 0.205, 'µg']],
  ['0.20 μg', mass, [0.195, 0.205, 'µg']],
  ['0.20 ug', mass, [0.195, 0.205, 'µg']],
  ['.5 g', mass, [0.45, 0.55, 'g']],
  ['2. g', mass, [1.5, 2.5, 'g']],
  ['152.19', molarMass, [152.185, 152.195, 'g/mol']],
  ['152.19 g·mol⁻¹', molarMass, [152.185, 152.195, 'g/mol']],
  ['152.19 g mol−1', molarMass, [152.185, 152.195, 'g/mol']],
  ['152.19 g mol^-1', molarMass, [152.185, 152.195, 'g/mol']],
  ['152.19 Da', molarMass, [152.185, 152.195, 'u']],
  ['152.19 g/mol (calcd)', molarMass, [152.185, 152.195, 'g/mol']],
  ['1,234.5 g/mol', molarMass, [1234.45, 1234.55, 'g/mol']],
  ['1\u2009234.5 g/mol', molarMass, [1234.45, 1234.55, 'g/mol']],
  ['1\u00a0234.5\u202fg/mol', molarMass, [1234.45, 1234.55, 'g/mol']],
  ['152.2 ± 0.3', molarMass, [151.9, 152.5, 'g/mol']],
  ['152.2 +/- 0.01', molarMass, [152.15, 152.25, 'g/mol']],
  ['164–166 mg', mass, [163.5, 166.5, 'mg']],
  ['164 - 166 mg', mass, [163.5, 166.5, 'mg']],
  ['164 to 166 mg', mass, [163.5, 166.5, 'mg']],
  ['1.2 × 10^-3 g', mass, [0.00115, 0.00125, 'g']],
  ['1.2 × 10⁻³ g', mass, [0.00115, 0.00125, 'g']],
  ['1.2e-3 g', mass, [0.00115, 0.00125, 'g']],
  ['ca. 20 mL', any, [18, 22, 'mL']],
  ['~20 mL', any, [18, 22, 'mL']],
  ['approx. 1 mL', any, [0.5, 1.5, 'mL']],
  ['> 98 %', any, [97.5, Number.POSITIVE_INFINITY, '%']],
  ['≤ 1 mbar', any, [Number.NEGATIVE_INFINITY, 1.5, 'mbar']],
  ['−3.0 g', mass, [-3.05, -2.95, 'g']],
  ['20 cm³', any, [19.5, 20.5, 'mL']],
])('reads %j', (text, options, expected) => {
  expect(read(text, options)).toEqual(expected);
});

describe('problems', () => {
  it.each<[string, QuantityOptions, string]>([
    ['', mass, ''],
    ['about a hundred', molarMass, 'a hundred'],
    ['1.5', mass, '1.5'],
    ['1.5 mol', mass, 'mol'],
    ['1.5 gg', mass, 'gg'],
    ['1,5 g', mass, '1,5'],
    ['166–164 mg', mass, '166–164'],
    ['1.2.3 g', mass, '.3 g'],
    ['1.5 g 3', mass, 'g 3'],
    ['9e999 g', mass, '9e999'],
  ])('in %j', (text, options, place) => {
    const { problem } = readQuantity(text, options);
    expect(problem && text.slice(problem.range.start, problem.range.end)).toBe(place);
  });
});

it('keeps the number’s place and its digits', () => {
  expect(readQuantity(' ca. 1.50 g ', mass).value).toMatchObject({
    value: 1.5,
    decimals: 2,
    approximate: true,
    numberRange: { start: 5, end: 9 },
  });
});

it('reads back every number that it could have written', () => {
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 10 ** 9 }), fc.nat({ max: 6 }), (digits, decimals) => {
      const text = (digits / 10 ** decimals).toFixed(decimals);
      const { value } = readQuantity(`${text} g`, mass);
      expect(value?.value).toBe(Number(text));
      expect(value?.decimals).toBe(decimals);
      expect(value!.high - value!.low).toBeCloseTo(10 ** -decimals, 7);
    }),
    { seed: 5 },
  );
});

it('answers for every text, with a place inside it', () => {
  const pieces = fc.constantFrom(
    '1',
    '.',
    ',',
    '5',
    ' ',
    '±',
    '–',
    'e',
    '×',
    '10',
    '^',
    '-',
    'g',
    '(',
    ')',
    '>',
    'ca.',
    '😀',
  );
  fc.assert(
    fc.property(fc.array(pieces, { maxLength: 12 }), (parts) => {
      const text = parts.join('');
      const { value, problem } = readQuantity(text, any);
      const { start, end } = value?.numberRange ?? problem!.range;
      expect(0 <= start && start <= end && end <= text.length).toBe(true);
      if (value !== undefined) expect(value.low <= value.value && value.value <= value.high).toBe(true);
    }),
    { seed: 6, numRuns: 3000 },
  );
});

/**
 * The units in which a laboratory records amounts, with the spellings it uses. One unit a line: the normalized
 * form, what one of it is in the first unit of its kind, and the spellings as `normalizedUnit` gives them.
 * SI prefixes and units accepted for use with the SI: BIPM, The International System of Units (SI), 9th ed.
 * (2019), tables 7 and 8. mmHg and Torr: 133.322 Pa, ISO 80000-4 as reprinted in NIST SP 811 (2008), table B.8.
 */
export type UnitKind =
  'mass' | 'amount' | 'volume' | 'molar mass' | 'particle mass' | 'fraction' | 'pressure';

export interface Unit {
  readonly unit: string;
  /** How many of the first unit of its kind one of this is. */
  readonly factor: number;
  readonly spellings: readonly string[];
}

export const units: Readonly<Record<UnitKind, readonly Unit[]>> = {
  mass: [
    { unit: 'g', factor: 1, spellings: ['g', 'gram', 'grams'] },
    { unit: 'kg', factor: 1e3, spellings: ['kg'] },
    { unit: 'mg', factor: 1e-3, spellings: ['mg'] },
    { unit: 'µg', factor: 1e-6, spellings: ['µg', 'ug', 'mcg'] },
    { unit: 'ng', factor: 1e-9, spellings: ['ng'] },
  ],
  amount: [
    { unit: 'mol', factor: 1, spellings: ['mol', 'mole', 'moles'] },
    { unit: 'kmol', factor: 1e3, spellings: ['kmol'] },
    { unit: 'mmol', factor: 1e-3, spellings: ['mmol'] },
    { unit: 'µmol', factor: 1e-6, spellings: ['µmol', 'umol'] },
    { unit: 'nmol', factor: 1e-9, spellings: ['nmol'] },
  ],
  volume: [
    { unit: 'L', factor: 1, spellings: ['l', 'L', 'dm3'] },
    { unit: 'mL', factor: 1e-3, spellings: ['ml', 'mL', 'cm3', 'cc'] },
    { unit: 'µL', factor: 1e-6, spellings: ['µl', 'µL', 'ul', 'uL'] },
    { unit: 'cL', factor: 1e-2, spellings: ['cl', 'cL'] },
    { unit: 'dL', factor: 1e-1, spellings: ['dl', 'dL'] },
    { unit: 'm³', factor: 1e3, spellings: ['m3'] },
  ],
  'molar mass': [
    { unit: 'g/mol', factor: 1, spellings: ['g/mol', 'gmol-1', 'g·mol-1', 'g/mole'] },
    { unit: 'kg/mol', factor: 1e3, spellings: ['kg/mol', 'kgmol-1', 'kg·mol-1'] },
  ],
  'particle mass': [
    { unit: 'u', factor: 1, spellings: ['u', 'amu', 'Da', 'da', 'dalton', 'daltons'] },
    { unit: 'kDa', factor: 1e3, spellings: ['kDa', 'kda'] },
  ],
  fraction: [{ unit: '%', factor: 1, spellings: ['%', 'percent'] }],
  pressure: [
    { unit: 'Pa', factor: 1, spellings: ['Pa', 'pa'] },
    { unit: 'hPa', factor: 1e2, spellings: ['hPa', 'hpa'] },
    { unit: 'kPa', factor: 1e3, spellings: ['kPa', 'kpa'] },
    { unit: 'mbar', factor: 1e2, spellings: ['mbar'] },
    { unit: 'bar', factor: 1e5, spellings: ['bar'] },
    { unit: 'mmHg', factor: 133.322, spellings: ['mmHg', 'mmhg', 'mm'] },
    { unit: 'Torr', factor: 133.322, spellings: ['Torr', 'torr'] },
    { unit: 'atm', factor: 101325, spellings: ['atm'] },
  ],
};

/** One micro sign, one minus, digits on the line, no white space, multiplication dots alike. */
export function normalizedUnit(text: string): string {
  return text
    .normalize('NFKC')
    .replace(/μ/g, 'µ')
    .replace(/[−–‒]/g, '-')
    .replace(/[∙⋅•*]/g, '·')
    .replace(/\^|\s/g, '');
}

/** The unit that a text spells, of one of the kinds; undefined when it spells none. */
export function unitOf(text: string, kinds: readonly UnitKind[]): Unit | undefined {
  return unitSpelt(text, kinds) ?? unitSpelt(normalizedUnit(text), kinds);
}

function unitSpelt(spelling: string, kinds: readonly UnitKind[]): Unit | undefined {
  for (const kind of kinds) {
    for (const unit of units[kind]) {
      if (unit.spellings.includes(spelling)) return unit;
    }
  }
  return undefined;
}

import { expect, it } from 'vitest';
import { unitOf, units, type UnitKind } from '../../../../server/chemistry/stoichiometry/units.ts';

const kinds = Object.keys(units) as UnitKind[];

it('spells no unit twice within what may stand side by side', () => {
  const spellings = kinds.flatMap((kind) => units[kind].flatMap((unit) => unit.spellings));
  expect(new Set(spellings).size).toBe(spellings.length);
});

it('reads back its own normalized forms', () => {
  for (const kind of kinds) {
    for (const unit of units[kind]) expect(unitOf(unit.unit, [kind])).toBe(unit);
    expect(units[kind][0]?.factor).toBe(1);
  }
});

// BIPM, SI Brochure, 9th ed. (2019), tables 7 and 8; NIST SP 811 (2008), table B.8 for mmHg and atm.
it.each<[string, UnitKind, number]>([
  ['mg', 'mass', 0.001],
  ['µmol', 'amount', 1e-6],
  ['mL', 'volume', 0.001],
  ['cm³', 'volume', 0.001],
  ['mbar', 'pressure', 100],
  ['atm', 'pressure', 101325],
  ['mmHg', 'pressure', 133.322],
])('one %s of %s', (spelling, kind, factor) => {
  expect(unitOf(spelling, [kind])?.factor).toBe(factor);
});

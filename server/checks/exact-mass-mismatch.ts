/** Recorded exact mass against the composition. */
import { hillFormula } from '../chemistry/composition/format-formula.ts';
import { monoisotopicMass } from '../chemistry/composition/mass.ts';
import type { Check } from './finding.ts';
import { fitsExactMass, fitsMolarMass, recordedMass, usualMassDifference } from './shared/masses.ts';
import { inDocument, quoted } from './shared/values.ts';
import { witnesses } from './shared/witnesses.ts';

export const check: Check = {
  id: 'exact-mass-mismatch',
  group: 'identity',
  severity: 'error',
  summary: 'An exact mass that is not that of the compound.',
  why: 'A mass spectrum is judged against it: with a wrong one a wrong product passes, or the right one fails.',
  action: 'Take the computed monoisotopic mass, or correct the structure or formula.',
  source:
    'Sum over the most abundant nuclides: atomic mass evaluation AME2020, Chinese Phys. C 2021, 45, 030003.',
  examples: {
    bad: [
      '```compound\nlabel: 4\nformula: C9H12O2\nname: 1-(4-methoxyphenyl)ethan-1-ol\nisomers: racemate\nexact mass: 152.0873\n```',
    ],
    good: [
      '```compound\nlabel: 4\nformula: C9H12O2\nname: 1-(4-methoxyphenyl)ethan-1-ol\nisomers: racemate\nexact mass: 152.0837\n```',
    ],
  },
  run(model, report) {
    if (model.kind !== 'compound') return;
    const value = model.entry.exactMass;
    const quantity = value?.read.value;
    if (value === undefined || quantity === undefined) return;
    const recorded = recordedMass(quantity);
    const known = witnesses(model);
    const { exactMass: tolerance, molarMass: averageTolerance } = model.settings.tolerance;
    const fits = known.map((witness) => fitsExactMass(quantity, witness.composition, tolerance));
    const first = known[0];
    if (recorded === undefined || first === undefined || fits.some((fit) => fit !== false)) return;
    const mass = monoisotopicMass(first.composition)!;
    const decimals = Math.max(quantity.decimals, 4);
    const off = quantity.value * recorded.factor - mass;
    const average = fitsMolarMass(quantity, first.composition, averageTolerance) === true;
    report({
      range: inDocument(value, quantity.numberRange),
      message: [
        `The exact mass is recorded as ${quoted(value.text.text)}, but ${hillFormula(first.composition)} (from the ` +
          `${first.what}) has ${mass.toFixed(decimals)} u: ${Math.abs(off).toFixed(decimals)} too ${off > 0 ? 'high' : 'low'}.`,
        average
          ? 'It is the molar mass, an average over the isotopes; a mass spectrum shows the single isotopes.'
          : (usualMassDifference(quantity, first.composition, monoisotopicMass, tolerance) ?? ''),
        'A spectrum would be judged against the wrong number: correct it, or the structure if that is wrong.',
      ]
        .filter((part) => part !== '')
        .join(' '),
      fixes: [
        {
          title: `Write ${(mass / recorded.factor).toFixed(decimals)}`,
          safe: false,
          edits: [
            {
              range: inDocument(value, quantity.numberRange),
              newText: (mass / recorded.factor).toFixed(decimals),
            },
          ],
        },
      ],
    });
  },
};

/** Recorded molar mass against the composition. */
import { hillFormula } from '../chemistry/composition/format-formula.ts';
import { averageMass, monoisotopicMass } from '../chemistry/composition/mass.ts';
import type { Check } from './finding.ts';
import { fitsExactMass, fitsMolarMass, recordedMass, usualMassDifference } from './shared/masses.ts';
import { inDocument, quoted } from './shared/values.ts';
import { witnesses } from './shared/witnesses.ts';

export const check: Check = {
  id: 'molar-mass-mismatch',
  group: 'identity',
  severity: 'error',
  summary: 'A molar mass that is not that of the compound.',
  why: 'Every amount in moles, every equivalent and every yield is worked out with it.',
  action: 'Take the computed value, or correct the structure or formula if these are wrong.',
  source:
    'IUPAC standard atomic weights (abridged, Pure Appl. Chem. 2022, 94, 573); values from older tables and from ' +
    'weights rounded to two decimals pass.',
  examples: {
    bad: [
      '```compound\nlabel: 4\nSMILES: COc1ccc(cc1)C(C)O\nisomers: racemate\nmolar mass: 152.91 g/mol\n```',
      '```compound\nlabel: 5\nformula: C2H8ClN\nSMILES: C[NH2+]C.[Cl-]\nmolar mass: 45.08 g/mol\n```',
    ],
    good: [
      '```compound\nlabel: 4\nSMILES: COc1ccc(cc1)C(C)O\nisomers: racemate\nmolar mass: 152.19 g/mol\n```',
      '```compound\nlabel: 5\nformula: C2H8ClN\nSMILES: C[NH2+]C.[Cl-]\nMW: 81.5\n```',
    ],
  },
  run(model, report) {
    if (model.kind !== 'compound') return;
    const value = model.entry.molarMass;
    const quantity = value?.read.value;
    if (value === undefined || quantity === undefined) return;
    const recorded = recordedMass(quantity);
    const known = witnesses(model);
    const tolerance = model.settings.tolerance.molarMass;
    // Where formula and structure disagree, that is the finding; a mass that fits either of them is not another.
    const fits = known.map((witness) => fitsMolarMass(quantity, witness.composition, tolerance));
    const first = known[0];
    if (recorded === undefined || first === undefined || fits.some((fit) => fit !== false)) return;
    const mass = averageMass(first.composition)!;
    const computed = (mass / recorded.factor).toFixed(
      Math.max(quantity.decimals, recorded.factor === 1 ? 0 : 5),
    );
    const shown = mass.toFixed(Math.max(2, Math.min(quantity.decimals, 4)));
    const off = quantity.value * recorded.factor - mass;
    const exact = fitsExactMass(quantity, first.composition, 0.01);
    report({
      range: inDocument(value, quantity.numberRange),
      message: [
        `The molar mass is recorded as ${quoted(value.text.text)}, but ${hillFormula(first.composition)} (from the ` +
          `${first.what}) has ${shown} g/mol: ${Math.abs(off).toFixed(2)} too ${off > 0 ? 'high' : 'low'}.`,
        exact === true && quantity.decimals > 0
          ? `${quantity.value} is the exact mass (${monoisotopicMass(first.composition)!.toFixed(4)}), which belongs under “exact mass”.`
          : (usualMassDifference(quantity, first.composition, averageMass, tolerance) ?? ''),
        'Amounts and yields are worked out with this number: correct it, or the structure if that is wrong.',
      ]
        .filter((part) => part !== '')
        .join(' '),
      fixes: [
        {
          title: `Write ${computed}`,
          safe: false,
          edits: [{ range: inDocument(value, quantity.numberRange), newText: computed }],
        },
      ],
    });
  },
};

/** A formula that no compound with paired electrons can have. */
import { hillFormula } from '../chemistry/composition/format-formula.ts';
import { degreeOfUnsaturation, impossibility } from '../chemistry/composition/unsaturation.ts';
import type { Check } from './finding.ts';
import { agreeing } from './shared/differences.ts';
import { witnesses } from './shared/witnesses.ts';

export const check: Check = {
  id: 'formula-impossible',
  group: 'identity',
  severity: 'error',
  summary: 'A formula that no closed-shell organic compound can have.',
  why: 'An odd number of electrons, or more hydrogens than the other atoms can bind, means a mistyped count.',
  action: 'Correct the count; write the charge if it is an ion.',
  source: 'Degree of unsaturation from usual valences: V. Pellegrin, J. Chem. Educ. 1983, 60, 626.',
  examples: {
    bad: ['```compound\nlabel: 1\nformula: C9H13O2\n```', '```compound\nlabel: 2\nformula: C3H10O\n```'],
    good: [
      '```compound\nlabel: 1\nname: anisole\nformula: C7H8O\n```',
      '```compound\nlabel: 2\nname: tetramethylammonium iodide\nformula: C4H12IN\n```',
    ],
  },
  run(model, report) {
    if (model.kind !== 'compound' || model.formula === undefined) return;
    // A radical drawn on purpose, such as TEMPO, has that formula, and so has an ion whose charge was left out.
    const { formula } = model;
    if (
      witnesses(model).some(({ what, composition }) => what !== 'formula' && agreeing(formula, composition))
    )
      return;
    const reason = impossibility(formula);
    if (reason === undefined) return;
    const written = hillFormula(formula);
    const unsaturation = degreeOfUnsaturation(formula);
    const degree =
      unsaturation === undefined ? '' : ` (degree of unsaturation ${String(unsaturation).replace('-', '−')})`;
    report({
      range: model.entry.formula!.text.range,
      message:
        reason === 'too many hydrogens'
          ? `${written} has more hydrogens than its other atoms can bind` +
            `${degree}. ` +
            'No such compound exists: correct the counts.'
          : `${written} has an odd number of electrons` +
            `${degree}: a radical, or a ` +
            'hydrogen or nitrogen too many or too few. Correct the counts, or write the charge of the ion.',
    });
  },
};

/** A formula that cannot be read. */
import type { Check } from './finding.ts';
import { reportUnread } from './shared/values.ts';

export const check: Check = {
  id: 'formula-syntax',
  group: 'identity',
  severity: 'error',
  summary: 'A formula that cannot be read.',
  why: 'The molar mass and every amount in moles follow from the formula.',
  action:
    'Correct the underlined characters: element symbols begin with a capital, counts follow the symbol.',
  source:
    'IUPAC, Nomenclature of Inorganic Chemistry (2005), IR-4; order of Hill, J. Am. Chem. Soc. 1900, 22, 478.',
  examples: {
    bad: ['```compound\nlabel: 1\nformula: C9H12Ox2\n```', '```compound\nlabel: 2\nformula: Ca(OH2\n```'],
    good: [
      '```compound\nlabel: 1\nname: copper(II) sulfate pentahydrate\nformula: CuSO4·5H2O\n```',
      '```compound\nlabel: 2\nname: chloroform-d\nformula: CDCl3\n```',
    ],
  },
  run(model, report) {
    if (model.kind !== 'compound') return;
    reportUnread(model.entry.formula, report, 'Molar mass and amounts hang on it.');
  },
};

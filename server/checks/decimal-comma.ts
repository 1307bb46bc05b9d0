/** A number with a comma where the point belongs. */
import type { Check } from './finding.ts';
import { reportProblems } from './shared/entry-problems.ts';

export const check: Check = {
  id: 'decimal-comma',
  group: 'block language',
  severity: 'error',
  summary: 'A number with a decimal comma.',
  why: '1,500 is one and a half to one reader and fifteen hundred to another: a factor of a thousand in the flask.',
  action: 'Write a decimal point.',
  source:
    'IUPAC, Quantities, Units and Symbols in Physical Chemistry, 3rd ed. (2007), section 1.3; journals in English print the point.',
  examples: {
    bad: ['```compound\nlabel: 1\nname: anisole\nmolar mass: 108,14 g/mol\n```'],
    good: ['```compound\nlabel: 1\nname: anisole\nmolar mass: 108.14 g/mol\n```'],
  },
  run: reportProblems('decimal-comma'),
};

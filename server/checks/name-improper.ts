/** A name that is understood but is not how the compound is named. */
import type { Check } from './finding.ts';
import { reportRemarks } from './shared/name-remarks.ts';

export const check: Check = {
  id: 'name-improper',
  group: 'identity',
  severity: 'information',
  summary: 'A name that is understood but not how the compound is named.',
  why: 'An index or a colleague looks under the proper name, and may take the improper one for a slip.',
  action: 'Take the proper name where one is offered.',
  source: 'IUPAC recommendations 2013, P-14 (locants, order) and P-44 (choice of the parent).',
  examples: {
    bad: ['```compound\nlabel: 1\nname: 2-ethylpentane\n```'],
    good: ['```compound\nlabel: 1\nname: 3-ethylpentane\n```'],
  },
  run: reportRemarks('improper'),
};

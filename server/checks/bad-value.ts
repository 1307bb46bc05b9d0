/** A value that cannot be read as what its key asks for. */
import type { Check } from './finding.ts';
import { reportProblems } from './shared/entry-problems.ts';

export const check: Check = {
  id: 'bad-value',
  group: 'block language',
  severity: 'error',
  summary: 'A value that cannot be read as what its key asks for.',
  why: 'What cannot be read cannot be checked, and the next person at the bench may read it differently.',
  action:
    'Write the value as an experimental section prints it: number and unit, or one of the words listed.',
  source: 'The block language itself.',
  examples: {
    bad: [
      '```compound\nlabel: 1\nname: anisole\nmolar mass: about a hundred\n```',
      '```compound\nlabel: 2\nname: anisole\nisomers: both\n```',
    ],
    good: ['```compound\nlabel: 1\nname: anisole\nmolar mass: 108.14 g/mol\n```'],
  },
  run: reportProblems('bad-value'),
};

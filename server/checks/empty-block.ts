/** A block without any field. */
import type { Check } from './finding.ts';
import { reportProblems } from './shared/entry-problems.ts';

export const check: Check = {
  id: 'empty-block',
  group: 'block language',
  severity: 'warning',
  summary: 'A block without any field.',
  why: 'A page that is signed with an empty block leaves open what was meant to stand there.',
  action: 'Fill it in or take it out.',
  source: 'The block language itself.',
  examples: {
    bad: ['```compound\n```', '```compound\n// to be written up\n```'],
    good: ['```compound\nlabel: 1\nname: anisole\n```'],
  },
  run: reportProblems('empty-block'),
};

/** The same key twice in one block. */
import type { Check } from './finding.ts';
import { reportProblems } from './shared/entry-problems.ts';

export const check: Check = {
  id: 'repeated-field',
  group: 'block language',
  severity: 'error',
  summary: 'The same key twice in one block.',
  why: 'Only one of the two values can be checked, and a reader cannot know which one counts.',
  action: 'Keep the right one; further names go into `synonyms`.',
  source: 'The block language itself.',
  examples: {
    bad: ['```compound\nlabel: 1\nformula: C7H8O\nname: anisole\nformula: C7H9O\n```'],
    good: ['```compound\nlabel: 1\nname: anisole\nsynonyms: methoxybenzene\nformula: C7H8O\n```'],
  },
  run: reportProblems('repeated-field'),
};

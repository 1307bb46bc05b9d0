/** `allow` without the reason in parentheses. */
import type { Check } from './finding.ts';
import { reportProblems } from './shared/entry-problems.ts';

export const check: Check = {
  id: 'allow-without-reason',
  group: 'block language',
  severity: 'error',
  summary: 'A finding accepted without a reason.',
  why: 'The reviewer who countersigns must be able to see why a contradiction was let stand.',
  action: 'Add the reason in parentheses. Until then the finding is reported as before.',
  source: 'The block language itself.',
  examples: {
    bad: ['```compound\nlabel: 1\nname: chlorotoluene\nallow: name-ambiguous\n```'],
    good: [
      '```compound\nlabel: 1\nname: chlorotoluene\nallow: name-ambiguous (bought as a mixture, ratio not known)\n```',
    ],
  },
  run: reportProblems('allow-without-reason'),
};

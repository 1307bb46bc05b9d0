/** `allow` that accepts nothing. Its findings come from `accept.ts`, which sees what was accepted. */
import type { Check } from './finding.ts';

export const check: Check = {
  id: 'allow-unused',
  group: 'block language',
  severity: 'warning',
  summary: 'An acceptance of a finding that is not there, or of a check that does not exist.',
  why: 'An acceptance left behind hides the next real mistake of that kind in this block.',
  action: 'Take the line out, or correct the id of the check.',
  source: 'The block language itself.',
  examples: {
    bad: [
      '```compound\nlabel: 1\nname: anisole\nformula: C7H8O\nallow: formula-mismatch (checked by combustion)\n```',
      '```compound\nlabel: 2\nname: chlorotoluene\nallow: name-ambigous (a mixture)\n```',
    ],
    good: ['```compound\nlabel: 1\nname: chlorotoluene\nallow: name-ambiguous (bought as a mixture)\n```'],
  },
};

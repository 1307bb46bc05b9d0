/** A key that the block language does not know. */
import type { Check } from './finding.ts';
import { reportProblems } from './shared/entry-problems.ts';

export const check: Check = {
  id: 'unknown-field',
  group: 'block language',
  severity: 'warning',
  summary: 'A key that the block language does not know.',
  why: 'A mistyped key is read by nobody: what stands behind it is kept, but nothing checks it.',
  action: 'Take the nearest known key, or move the remark to `notes`.',
  source: 'The block language itself.',
  examples: {
    bad: ['```compound\nlabel: 1\nname: anisole\nformla: C7H8O\n```'],
    good: ['```compound\nlabel: 1\nname: anisole\nformula: C7H8O\n```'],
  },
  run: reportProblems('unknown-field'),
};

/** A SMILES that cannot be read. */
import type { Check } from './finding.ts';
import { reportUnread } from './shared/values.ts';

export const check: Check = {
  id: 'smiles-syntax',
  group: 'identity',
  severity: 'error',
  summary: 'A SMILES that cannot be read.',
  why: 'Without a structure nothing else in the entry can be held against it.',
  action: 'Correct the characters that are underlined, or copy the SMILES again from the drawing.',
  source: 'OpenSMILES specification 1.0 (2016).',
  examples: {
    bad: ['```compound\nlabel: 1\nSMILES: CCOC(=O\n```', '```compound\nlabel: 2\nSMILES: C1CCCC\n```'],
    good: ['```compound\nlabel: 1\nSMILES: CCOC(C)=O\n```'],
  },
  run(entry, report) {
    if (entry.kind !== 'compound') return;
    reportUnread(entry.entry.smiles, report, 'Until it can be read, the structure checks nothing.');
  },
};

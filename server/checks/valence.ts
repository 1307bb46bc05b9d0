/** An atom with more bonds than its element can form, in the SMILES or in what the name would mean. */
import type { Check } from './finding.ts';
import { reportRemarks } from './shared/name-remarks.ts';
import { inDocument } from './shared/values.ts';

export const check: Check = {
  id: 'valence',
  group: 'identity',
  severity: 'error',
  summary: 'An atom with more bonds than its element can form.',
  why: 'Such a compound cannot exist, so something was mistyped, and formula and molar mass are wrong with it.',
  action: 'Look at the underlined atom: a substituent too many, a bond order too high, or a charge left out.',
  source:
    'OpenSMILES specification 1.0 (2016), usual valences; IUPAC 2013 recommendations, P-14.1 (bonding numbers).',
  examples: {
    bad: [
      '```compound\nlabel: 1\nSMILES: CC(C)(C)(C)O\n```',
      '```compound\nlabel: 2\nSMILES: CN(C)(C)C\n```',
    ],
    good: [
      '```compound\nlabel: 1\nSMILES: CC(C)(C)O\n```',
      '```compound\nlabel: 2\nSMILES: C[N+](C)(C)C.[I-]\n```',
      '```compound\nlabel: 3\nSMILES: CS(C)(=O)=O\n```',
    ],
  },
  run(model, report, toolkit) {
    if (model.kind !== 'compound') return;
    const { smiles } = model.entry;
    if (smiles !== undefined) {
      for (const problem of model.valenceProblems) {
        report({ range: inDocument(smiles, problem.range), message: problem.message });
      }
    }
    reportRemarks('valence')(model, report, toolkit);
  },
};

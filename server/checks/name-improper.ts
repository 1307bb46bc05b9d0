/** A name that is understood but is not how the compound is named. */
import type { Check } from './finding.ts';
import { alkaneParent, longestSaturatedChain } from './shared/longest-chain.ts';
import { reportRemarks } from './shared/name-remarks.ts';
import { inDocument } from './shared/values.ts';

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
  run(model, report, toolkit) {
    reportRemarks('improper')(model, report, toolkit);
    if (model.kind !== 'compound' || model.name === undefined || model.name.remarks.length > 0) return;
    const [reading, ...others] = model.name.readings;
    if (reading === undefined || others.length > 0) return;
    const value = model.entry.name!;
    const parent = alkaneParent(value.text.text);
    const longest = longestSaturatedChain(reading.molecule);
    if (parent === undefined || longest === undefined || longest <= parent.carbons) return;
    report({
      range: inDocument(value, parent.range),
      message:
        `The longest chain of this compound has ${longest} carbons, but the name takes one of ${parent.carbons}. It is ` +
        'understood, yet an index lists the compound under the longest chain: name it from that one.',
    });
  },
};

/** Reports what reading the name remarked on. */
import type { NameRemark } from '../../chemistry/nomenclature/reading.ts';
import type { Check } from '../finding.ts';
import { fixInDocument, inDocument } from './values.ts';

/** The `run` of a check that passes on what the naming engine remarks about a name. */
export function reportRemarks(kind: NameRemark['kind']): NonNullable<Check['run']> {
  return (model, report) => {
    if (model.kind !== 'compound' || model.entry.name === undefined) return;
    const value = model.entry.name;
    for (const remark of model.name?.remarks ?? []) {
      if (remark.kind !== kind) continue;
      report({
        range: inDocument(value, remark.range),
        message: remark.message,
        fixes: (remark.fixes ?? []).map((fix) => fixInDocument(value, fix)),
      });
    }
  };
}

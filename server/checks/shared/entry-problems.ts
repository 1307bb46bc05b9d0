/** Reports what the block language itself found wrong with an entry. */
import type { EntryProblem } from '../../notebook/model.ts';
import type { Check } from '../finding.ts';

export function reportProblems(id: EntryProblem['check']): NonNullable<Check['run']> {
  return ({ entry }, report) => {
    for (const problem of entry.problems) {
      if (problem.check === id)
        report({ range: problem.range, message: problem.message, fixes: problem.fixes ?? [] });
    }
  };
}

/** Reports what the block language itself found wrong with an entry. */
import type { EntryProblem } from '../../notebook/model.ts';
import type { Check } from '../finding.ts';

/** The `run` of a check whose finding the block language has made already, when it read the entry. */
export function reportProblems(id: EntryProblem['check']): NonNullable<Check['run']> {
  return ({ entry }, report) => {
    for (const problem of entry.problems) {
      if (problem.check === id)
        report({ range: problem.range, message: problem.message, fixes: problem.fixes ?? [] });
    }
  };
}

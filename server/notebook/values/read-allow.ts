/** `check-id (reason)`: what an entry accepts, and why. */
import type { AllowStatement, EntryProblem, Field, MappedText } from '../model.ts';

export interface AllowRead {
  readonly statement: AllowStatement;
  readonly problem: EntryProblem | undefined;
}

/** `text` is not empty. */
export function readAllow(field: Field, text: MappedText): AllowRead {
  const checkId = /^[^\s()]*/.exec(text.text)![0];
  const rest = text.text.slice(checkId.length).trim();
  const reason = /^\(([^]*)\)$/.exec(rest)?.[1]?.trim() ?? '';
  const statement: AllowStatement = {
    field,
    checkId,
    checkIdRange: text.toDocument({ start: 0, end: checkId.length }),
    reason: reason === '' || checkId === '' ? undefined : reason,
  };
  if (statement.reason !== undefined) return { statement, problem: undefined };
  const restStart = text.text.length - rest.length;
  const wordsWithoutParentheses = checkId !== '' && rest !== '' && !/[()]/.test(rest);
  return {
    statement,
    problem: {
      check: 'allow-without-reason',
      range: text.range,
      message:
        checkId === ''
          ? 'This says neither which check is accepted nor why. Write “allow: check-id (reason)”.'
          : `This accepts ${checkId} without saying why, so the reviewer cannot tell a decision from an oversight. ` +
            'Write the reason in parentheses after it; until then the finding stays.',
      ...(wordsWithoutParentheses
        ? {
            fixes: [
              {
                title: 'Put the reason in parentheses',
                edits: [
                  { range: text.toDocument({ start: restStart, end: restStart }), newText: '(' },
                  {
                    range: { start: text.range.end, end: text.range.end },
                    newText: ')',
                  },
                ],
                safe: true,
              },
            ],
          }
        : {}),
    },
  };
}

/** From a value's own text to the document: ranges, fixes and the problems of readers. */
import type { Fix, TextRange } from '../../chemistry/text.ts';
import type { EntryValue } from '../../notebook/model.ts';
import type { Report } from '../finding.ts';

/** Where a stretch of the value's text stands in the document. */
export function inDocument(value: EntryValue<unknown>, inText: TextRange): TextRange {
  return value.text.toDocument(inText);
}

/** A fix whose edits are offsets into the value's text, as one of the document. */
export function fixInDocument(value: EntryValue<unknown>, fix: Fix): Fix {
  return {
    ...fix,
    edits: fix.edits.map((edit) => ({ ...edit, range: inDocument(value, edit.range) })),
  };
}

/** Writes `newText` over the whole value. */
export function replacement(value: EntryValue<unknown>, newText: string, title: string, safe = false): Fix {
  return { title, safe, edits: [{ range: value.text.range, newText }] };
}

/** Reports why the value could not be read, if so; `why` says what hangs on it. */
export function reportUnread(
  value: EntryValue<unknown> | undefined,
  report: (found: Report) => void,
  why: string,
): void {
  const problem = value?.read.problem;
  if (value === undefined || problem === undefined) return;
  report({
    range: inDocument(value, problem.range),
    message: `${problem.message} ${why}`,
    fixes: (problem.fixes ?? []).map((fix) => fixInDocument(value, fix)),
  });
}

/** A quoted stretch of the user's text, cut where it would drown the message. */
export function quoted(text: string): string {
  return text.length <= 80 ? `“${text}”` : `“${text.slice(0, 77)}…”`;
}

/** `one`, `2`, `3`: small counts as a chemist would say them. */
export function counted(count: number, unit: string): string {
  return `${count === 1 ? 'one' : String(Number(count.toFixed(3)))} ${unit}`;
}

/** `a`, `a and b`, `a, b and c`; more than `most` are counted instead of listed. */
export function listed(items: readonly string[], most = 6, joint = 'and'): string {
  const shown = items.length > most ? [...items.slice(0, most), `${items.length - most} more`] : items;
  return shown.length <= 1 ? (shown[0] ?? '') : `${shown.slice(0, -1).join(', ')} ${joint} ${shown.at(-1)!}`;
}

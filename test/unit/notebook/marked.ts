/** Texts with the ranges that a test is about marked in them: `label: ⟦4⟧`. */
import type { TextRange } from '../../../server/chemistry/text.ts';

export interface Marked {
  /** Without the marks. */
  readonly text: string;
  /** What stood between marks, in order. */
  readonly ranges: readonly TextRange[];
}

export function marked(source: string): Marked {
  const ranges: TextRange[] = [];
  let text = '';
  let start = 0;
  for (const part of source.split(/([⟦⟧])/)) {
    if (part === '⟦') start = text.length;
    else if (part === '⟧') ranges.push({ start, end: text.length });
    else text += part;
  }
  return { text, ranges };
}

/** The text with marks put round ranges, for a failure message that can be read. Ranges must not overlap. */
export function withMarks(text: string, ranges: readonly TextRange[]): string {
  let result = '';
  let at = 0;
  for (const { start, end } of [...ranges].sort((a, b) => a.start - b.start)) {
    result += `${text.slice(at, start)}⟦${text.slice(start, end)}⟧`;
    at = end;
  }
  return result + text.slice(at);
}

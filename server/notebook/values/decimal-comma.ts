/** Finds commas that stand where a decimal point belongs, in texts that hold numbers. */
import type { Fix, TextRange } from '../../chemistry/text.ts';
import type { EntryProblem, MappedText } from '../model.ts';

export interface DecimalComma {
  /** The number, in the text searched. */
  readonly range: TextRange;
  readonly comma: number;
  /** Three digits follow it, so it may as well group thousands. */
  readonly ambiguous: boolean;
}

/**
 * A number with one comma between digits. Locants (`1,4-dioxane`, `N,2-`), lists (`91,105,119`) and grouped
 * thousands that a decimal point follows (`1,234.5`) are none.
 */
const candidate =
  /(?<![\p{L}\p{N}.,'′-])[-+−–]?(\d+),(\d+)(?![\p{L}\p{N}.'′’]*[-‐‑–−][\p{L}([{]|\d|[.,]\d|\p{L}+[-‐‑])/gu;

export function findDecimalCommas(text: string): DecimalComma[] {
  if (!text.includes(',')) return [];
  return [...text.matchAll(candidate)].map((found) => {
    const [whole, integer, fraction] = found;
    const comma = found.index + whole.length - fraction!.length - 1;
    return {
      range: { start: comma - integer!.length, end: found.index + whole.length },
      comma,
      ambiguous: fraction!.length === 3 && !integer!.startsWith('0') && integer!.length <= 3,
    };
  });
}

export function decimalCommaProblems(text: MappedText): EntryProblem[] {
  return findDecimalCommas(text.text).map(({ range, comma, ambiguous }) => {
    const written = text.text.slice(range.start, range.end);
    const withPoint = written.replace(',', '.');
    const replacement = (title: string, newText: string, safe: boolean): Fix => ({
      title,
      edits: [{ range: text.toDocument({ start: comma, end: comma + 1 }), newText }],
      safe,
    });
    const point = replacement(`Write ${withPoint}`, '.', !ambiguous);
    return {
      check: 'decimal-comma',
      range: text.toDocument(range),
      message: ambiguous
        ? `“${written}” is ${withPoint} to one reader and ${written.replace(',', '')} to another, a factor of a ` +
          'thousand apart. Write a decimal point, or the number without a comma.'
        : `“${written}” has a decimal comma; where commas separate quantities it can be taken for two numbers. ` +
          `Write ${withPoint}.`,
      fixes: ambiguous ? [point, replacement(`Write ${written.replace(',', '')}`, '', false)] : [point],
    };
  });
}

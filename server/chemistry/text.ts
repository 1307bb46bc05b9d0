/**
 * Places in a text, and what a reader answers.
 *
 * Every reader of this product takes a string and returns either a value or a problem with the exact
 * characters it is about. No reader throws: any string is valid input.
 */

/** A stretch of text as UTF-16 offsets, `end` exclusive. An empty range marks a position between characters. */
export interface TextRange {
  readonly start: number;
  readonly end: number;
}

/** One replacement. */
export interface TextEdit {
  readonly range: TextRange;
  readonly newText: string;
}

/** A correction that can be offered. `safe`: certain, and nothing chemical is lost by applying it unseen. */
export interface Fix {
  readonly title: string;
  readonly edits: readonly TextEdit[];
  readonly safe: boolean;
}

/** Why a text could not be read: where, and a message in a chemist's words. */
export interface Problem {
  readonly range: TextRange;
  readonly message: string;
  readonly fixes?: readonly Fix[];
}

/** What a reader answers: the value, or the problem. */
export type Read<T> =
  | { readonly value: T; readonly problem?: undefined }
  | { readonly value?: undefined; readonly problem: Problem };

export function range(start: number, end: number): TextRange {
  return { start, end };
}

/** The same range, `offset` characters further on. */
export function shifted(original: TextRange, offset: number): TextRange {
  return { start: original.start + offset, end: original.end + offset };
}

export function problemAt(
  start: number,
  end: number,
  message: string,
  fixes?: readonly Fix[],
): { problem: Problem } {
  return {
    problem:
      fixes === undefined ? { range: { start, end }, message } : { range: { start, end }, message, fixes },
  };
}

/**
 * What the beginning of a Markdown line can be, told from the line alone (CommonMark 0.31.2, sections 4.1 to 4.3
 * and 5.2). The cursor stands behind the marks of the containers; `nonSpace` is where the line is looked at.
 */
import { isSpaceOrTab, type LineCursor } from './line-cursor.ts';

const code = (character: string) => character.charCodeAt(0);
export const greaterThan = code('>');
export const lessThan = code('<');
export const hash = code('#');
export const backtick = code('`');
export const tilde = code('~');
export const lineFeed = 0x0a;
const hyphen = code('-');
const asterisk = code('*');
const plus = code('+');
const underscore = code('_');
const equals = code('=');
const zero = code('0');
const nine = code('9');

/** Where a run of the same character ends. */
export function endOfRun(text: string, start: number, end: number, runCode: number): number {
  let at = start;
  while (at < end && text.charCodeAt(at) === runCode) at++;
  return at;
}

export function isBlank(text: string, start: number, end: number): boolean {
  let at = start;
  while (at < end && isSpaceOrTab(text.charCodeAt(at))) at++;
  return at === end;
}

/** One to six `#`, then white space or nothing. */
export function isHeading(text: string, { nonSpace, end }: LineCursor): boolean {
  const after = endOfRun(text, nonSpace, end, hash);
  return after - nonSpace <= 6 && (after === end || isSpaceOrTab(text.charCodeAt(after)));
}

/** The form of a setext heading's underline. */
export function isUnderline(text: string, { nonSpace, end }: LineCursor): boolean {
  const first = text.charCodeAt(nonSpace);
  if (first !== equals && first !== hyphen) return false;
  return isBlank(text, endOfRun(text, nonSpace, end, first), end);
}

/** Where the first character stands that keeps the line from being a thematic break; undefined when it is one. */
export function thematicBreakObstacle(text: string, { nonSpace, end }: LineCursor): number | undefined {
  const first = text.charCodeAt(nonSpace);
  if (first !== hyphen && first !== asterisk && first !== underscore) return nonSpace;
  let count = 0;
  for (let at = nonSpace; at < end; at++) {
    const here = text.charCodeAt(at);
    if (here === first) count++;
    else if (!isSpaceOrTab(here)) return at;
  }
  return count >= 3 ? undefined : nonSpace;
}

/**
 * How many characters the list marker has that stands here, or 0. One that interrupts a paragraph must have text
 * after it and, when numbered, begin with 1.
 */
export function listMarkerLength(text: string, cursor: LineCursor, inParagraph: boolean): number {
  const { nonSpace: start, end: lineEnd } = cursor;
  const first = text.charCodeAt(start);
  let end = start;
  if (first === hyphen || first === asterisk || first === plus) {
    end = start + 1;
  } else if (first >= zero && first <= nine) {
    while (end - start < 10 && text.charCodeAt(end) >= zero && text.charCodeAt(end) <= nine) end++;
    if (end - start > 9 || (text[end] !== '.' && text[end] !== ')')) return 0;
    if (inParagraph && Number(text.slice(start, end)) !== 1) return 0;
    end++;
  } else {
    return 0;
  }
  if (end < lineEnd && !isSpaceOrTab(text.charCodeAt(end))) return 0;
  if (inParagraph && isBlank(text, end, lineEnd)) return 0;
  return end - start;
}

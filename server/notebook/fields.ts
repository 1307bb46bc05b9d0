/**
 * The lines of a block taken apart into fields, comments and what is neither. Nothing is lost: every line is
 * blank, a comment, part of a field, or the subject of a problem.
 */
import { strayLineProblem, unindentedItemProblem, type StrayLines } from './field-problems.ts';
import { JoinedText, trimmedPiece, type Piece } from './mapped-text.ts';
import type { Block, BlockKind, ContentLine, EntryProblem, Field, MappedText } from './model.ts';
import { readKey } from './read-key.ts';

export interface BlockFields {
  readonly fields: readonly Field[];
  readonly problems: readonly EntryProblem[];
}

/** A field while its lines come in. */
interface OpenField {
  readonly keyText: string;
  readonly keyStart: number;
  readonly value: Piece[];
  readonly items: Piece[][];
}

export function readFields(block: Block): BlockFields {
  const fields: Field[] = [];
  const problems: EntryProblem[] = [];
  const margin = marginOf(block.lines);
  let open: OpenField | undefined;
  /** The last line was no field; what is indented below it belongs to it. */
  let stray: StrayLines | undefined;
  const close = () => {
    if (open !== undefined) fields.push(finished(block.kind, open));
    if (stray !== undefined) problems.push(strayLineProblem(block, stray));
    open = undefined;
    stray = undefined;
  };
  for (const line of block.lines) {
    const content = trimmedPiece(line, 0);
    if (content.text === '' || content.text.startsWith('//')) continue;
    const item = /^-(?=\s|$)/.test(content.text) ? trimmedPiece(content, 1) : undefined;
    const indented = columnOf(line, content) > margin;
    if (item !== undefined && open !== undefined) {
      open.items.push([item]);
      if (!indented) problems.push(unindentedItemProblem(content));
    } else if (indented && open !== undefined) {
      (open.items.at(-1) ?? open.value).push(content);
    } else if (indented && stray !== undefined) {
      stray.end = content.offset + content.text.length;
    } else {
      close();
      open = indented || item !== undefined ? undefined : openedField(content);
      if (open === undefined) {
        stray = { firstLine: content, end: content.offset + content.text.length, indented };
      }
    }
  }
  close();
  return { fields, problems };
}

/** Columns of white space that the least indented line has: a block indented as a whole is not indented. */
function marginOf(lines: readonly ContentLine[]): number {
  let margin = Number.POSITIVE_INFINITY;
  for (const line of lines) {
    const content = trimmedPiece(line, 0);
    if (content.text !== '') margin = Math.min(margin, columnOf(line, content));
    if (margin === 0) break;
  }
  return margin;
}

/** The column at which the content of a line begins; a tab counts as four. */
function columnOf(line: ContentLine, content: Piece): number {
  let column = 0;
  for (let at = 0; at < content.offset - line.offset; at++) column += line.text[at] === '\t' ? 4 : 1;
  return column;
}

function openedField(content: Piece): OpenField | undefined {
  const colon = content.text.indexOf(':');
  const key = trimmedPiece(content, 0, Math.max(0, colon));
  if (key.text === '') return undefined;
  return {
    keyText: key.text,
    keyStart: key.offset,
    value: [trimmedPiece(content, colon + 1)],
    items: [],
  };
}

function finished(kind: BlockKind, open: OpenField): Field {
  const value = joined(open.value);
  const items = open.items.map(joined);
  const keyRange = { start: open.keyStart, end: open.keyStart + open.keyText.length };
  return {
    key: readKey(kind, open.keyText),
    keyText: open.keyText,
    keyRange,
    value,
    items,
    range: { start: keyRange.start, end: (items.at(-1) ?? value).range.end },
  };
}

/** An empty first line gives only its place. */
function joined(pieces: readonly Piece[]): MappedText {
  const filled = pieces.filter((piece) => piece.text !== '');
  return new JoinedText(filled.length === 0 ? pieces.slice(0, 1) : filled, ' ');
}

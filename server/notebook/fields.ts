/**
 * The lines of a block taken apart into fields, comments and what is neither. Nothing is lost: every line is
 * blank, a comment, part of a field, or the subject of a problem.
 */
import { JoinedText, trimmedPiece, type Piece } from './mapped-text.ts';
import type { Block, BlockKind, ContentLine, EntryProblem, Field, MappedText } from './model.ts';
import { nearestKey, readKey } from './read-key.ts';

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

/** Lines that are neither field nor comment, together. */
interface Stray {
  readonly start: number;
  end: number;
  readonly indented: boolean;
}

export function readFields(block: Block): BlockFields {
  const fields: Field[] = [];
  const problems: EntryProblem[] = [];
  const margin = marginOf(block.lines);
  let open: OpenField | undefined;
  /** The last line was no field; what is indented below it belongs to it. */
  let stray: Stray | undefined;
  const close = () => {
    if (open !== undefined) fields.push(finished(block.kind, open));
    if (stray !== undefined) problems.push(strayProblem(stray));
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
      if (!indented) problems.push(unindentedItem(content));
    } else if (indented && open !== undefined) {
      (open.items.at(-1) ?? open.value).push(content);
    } else if (indented && stray !== undefined) {
      stray.end = content.offset + content.text.length;
    } else {
      close();
      open = indented || item !== undefined ? undefined : openedField(content);
      if (open === undefined) {
        stray = { start: content.offset, end: content.offset + content.text.length, indented };
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

function strayProblem({ start, end, indented }: Stray): EntryProblem {
  const toNotes = { range: { start, end: start }, newText: 'notes: ' };
  return {
    check: 'bad-value',
    range: { start, end },
    message:
      'This line is no field: it has no key and colon, and it continues nothing above it. So nobody reads it. ' +
      'Write “key: value”, indent it to continue the line above, put it under “notes:”, or begin it with // to ' +
      'make it a comment.',
    fixes: indented ? [] : [{ title: 'Put it under notes', edits: [toNotes], safe: false }],
  };
}

function unindentedItem(content: Piece): EntryProblem {
  const range = { start: content.offset, end: content.offset + 1 };
  return {
    check: 'bad-value',
    range,
    message:
      'An item of a list stands indented below its key. This one is read as an item of the list above; indent it ' +
      'so that a reader sees the same.',
    fixes: [
      {
        title: 'Indent the item',
        edits: [{ range: { ...range, end: range.start }, newText: '  ' }],
        safe: true,
      },
    ],
  };
}

/** What is said of a key that nobody knows. */
export function unknownKeyProblem(kind: BlockKind, field: Field): EntryProblem {
  const nearest = nearestKey(kind, field.keyText);
  return {
    check: 'unknown-field',
    range: field.keyRange,
    message:
      `A ${kind} block has no field “${field.keyText}”, so its value is read by nobody. ` +
      (nearest === undefined
        ? 'Take a key of the block language, or put the text under “notes”.'
        : `The nearest known key is “${nearest}”.`),
    fixes:
      nearest === undefined
        ? []
        : [
            {
              title: `Change the key to “${nearest}”`,
              edits: [{ range: field.keyRange, newText: nearest }],
              safe: false,
            },
          ],
  };
}

/** What is said of lines and keys that the block language cannot place. */
import type { Fix } from '../chemistry/text.ts';
import type { Piece } from './mapped-text.ts';
import type { Block, BlockKind, EntryProblem, Field } from './model.ts';
import { leadingKey, nearestKey, readKey } from './read-key.ts';

/** Lines that are neither field nor comment, the later ones indented below the first. */
export interface StrayLines {
  readonly firstLine: Piece;
  /** Document offset. */
  end: number;
  readonly indented: boolean;
}

export function strayLineProblem(block: Block, { firstLine, end, indented }: StrayLines): EntryProblem {
  const start = firstLine.offset;
  const key = indented ? undefined : leadingKey(block.kind, firstLine.text);
  const toNotes: Fix = {
    title: 'Put it under notes',
    edits: [{ range: { start, end: start }, newText: 'notes: ' }],
    safe: false,
  };
  const fixes = indented ? [] : key === undefined ? [toNotes] : [colonFix(key, start), toNotes];
  const unclosed = block.closed
    ? ''
    : ' The fence of this block is never closed, so the rest of the page counts as part of it.';
  return {
    check: 'bad-value',
    range: { start, end },
    message:
      key === undefined
        ? 'This line is no field: it has no key and colon, and it continues nothing above it. So nobody reads it. ' +
          'Write “key: value”, indent it to continue the line above, put it under “notes:”, or begin it with // ' +
          `to make it a comment.${unclosed}`
        : `This line has no colon, so nobody reads it. Put a colon after “${key}”.${unclosed}`,
    fixes,
  };
}

export function unindentedItemProblem(content: Piece): EntryProblem {
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

export function unknownKeyProblem(kind: BlockKind, field: Field): EntryProblem {
  const { keyText, keyRange } = field;
  const base = { check: 'unknown-field', range: keyRange } as const;
  const unread = `A ${kind} block has no field “${keyText}”, so its value is read by nobody.`;
  const leading = leadingKey(kind, keyText);
  if (leading !== undefined) {
    return {
      ...base,
      message: `${unread} Put a colon after “${leading}”, which is a field.`,
      fixes: [colonFix(leading, keyRange.start)],
    };
  }
  const nearest = nearestKey(kind, keyText);
  if (nearest !== undefined) {
    const title = `Change the key to “${nearest}”`;
    return {
      ...base,
      message: `${unread} The nearest known key is “${nearest}”.`,
      fixes: [{ title, edits: [{ range: keyRange, newText: nearest }], safe: false }],
    };
  }
  const other = kind === 'compound' ? 'reaction' : 'compound';
  return {
    ...base,
    message:
      readKey(other, keyText) === undefined
        ? `${unread} Take a key of the block language, or put the text under “notes”.`
        : `${unread} It is a field of a ${other} block; move it there, or put the text under “notes”.`,
  };
}

/** As papers print it, a measurement follows its name without a colon: `1H NMR (400 MHz, CDCl3) δ 7.30 …`. */
function colonFix(key: string, start: number): Fix {
  const at = start + key.length;
  return {
    title: `Put a colon after “${key}”`,
    edits: [{ range: { start: at, end: at }, newText: ':' }],
    safe: false,
  };
}

/** Where a fix writes a new line of a block, and what the line must begin with to stay in the block. */
import { compoundKeys, reactionKeys, type FieldKey } from './keys.ts';
import type { BlockKind, Entry, Field } from './model.ts';

export interface Insertion {
  /** Counts as the block's ranges do. */
  readonly offset: number;
  /** Goes before the new field: the line break, quote marks and indentation. */
  readonly prefix: string;
}

const keysInOrder: Readonly<Record<BlockKind, readonly FieldKey[]>> = {
  compound: compoundKeys,
  reaction: reactionKeys,
};

/** Below the field of that key, or below the last field when there is none such or no key is given. */
export function insertionAfter(entry: Entry, key?: FieldKey): Insertion {
  const { fields } = entry;
  const anchor = (key && fields.findLast((field) => field.key === key)) ?? fields.at(-1);
  return insertionBelow(entry, anchor);
}

/** Where a new field of that key has its customary place among those that are there. */
export function insertionFor(entry: Entry, key: FieldKey): Insertion {
  const order = keysInOrder[entry.kind];
  const place = order.indexOf(key);
  const anchor = entry.fields.findLast(
    (field) => field.key !== undefined && order.indexOf(field.key) < place,
  );
  return insertionBelow(entry, anchor);
}

/** Without a field it goes right below the opening fence. */
function insertionBelow({ block, fields }: Entry, anchor: Field | undefined): Insertion {
  const { lineBreak = '\n', linePrefix = '', openingLength = 0 } = block.layout ?? {};
  const model = anchor ?? fields[0];
  const indent = model === undefined ? '' : indentationOf(block.lines, model.keyRange.start);
  const prefix = `${lineBreak}${linePrefix}${indent}`;
  if (anchor === undefined) return { offset: block.range.start + openingLength, prefix };
  const line = block.lines.findLast(({ offset }) => offset <= anchor.range.end);
  return { offset: line === undefined ? anchor.range.end : line.offset + line.text.length, prefix };
}

function indentationOf(lines: Entry['block']['lines'], keyStart: number): string {
  const line = lines.findLast(({ offset }) => offset <= keyStart);
  return line === undefined ? '' : line.text.slice(0, keyStart - line.offset);
}

/** The items of `charged` and `obtained`, each taken apart into the substance and all that is said of it. */
import { isSpace, trimmedSlice } from '../mapped-text.ts';
import type { Field, MappedText, ReactionItem } from '../model.ts';

/** A list field may hold one item on the line of its key. */
export function reactionItems(field: Field): ReactionItem[] {
  const texts = field.value.text === '' ? field.items : [field.value, ...field.items];
  return texts.filter((text) => text.text !== '').map((text) => reactionItem(field, text));
}

/** WHAT ends at the first colon that white space (or the end) follows, outside brackets. */
export function reactionItem(field: Field, text: MappedText): ReactionItem {
  const colon = separatorOf(text.text);
  if (colon === -1) return { field, what: text, rest: undefined };
  const rest = trimmedSlice(text, colon + 1, text.text.length);
  return {
    field,
    what: trimmedSlice(text, 0, colon),
    rest: rest.text === '' ? undefined : rest,
  };
}

/** Brackets that do not match would hide every colon, so then the first colon counts, brackets or not. */
function separatorOf(text: string): number {
  let depth = 0;
  let first = -1;
  for (let at = 0; at < text.length; at++) {
    const character = text[at]!;
    if ('([{'.includes(character)) depth++;
    else if (')]}'.includes(character)) depth = Math.max(0, depth - 1);
    else if (character === ':' && (at + 1 === text.length || isSpace(text.charCodeAt(at + 1)))) {
      if (depth === 0) return at;
      if (first === -1) first = at;
    }
  }
  return depth > 0 ? first : -1;
}

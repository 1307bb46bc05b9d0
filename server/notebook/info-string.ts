/**
 * The first word of a fence's info string, as CommonMark 0.31.2 reads it: backslash escapes (section 2.4) and
 * character references (section 2.5) count as what they stand for.
 */
import type { TextRange } from '../chemistry/text.ts';

export interface InfoWord {
  readonly word: string;
  /** As written, in the document. */
  readonly range: TextRange;
}

/** References that stand for white space. No name stands for a single letter, so others need no decoding. */
const namedSpaces = new Set([
  'Tab',
  'NewLine',
  'nbsp',
  'NonBreakingSpace',
  'ensp',
  'emsp',
  'emsp13',
  'emsp14',
]);
for (const name of ['numsp', 'puncsp', 'thinsp', 'ThinSpace', 'hairsp', 'VeryThinSpace', 'MediumSpace']) {
  namedSpaces.add(name);
}

const reference = /&(?:#(\d{1,7})|#[xX]([0-9A-Fa-f]{1,6})|([A-Za-z][A-Za-z0-9]*));/y;
const escape = /\\([!-/:-@[-`{-~])/y;

/** `start` is the first character after the fence, `end` the end of its line. */
export function firstInfoWord(text: string, start: number, end: number): InfoWord | undefined {
  let wordStart = start;
  while (wordStart < end && /[ \t]/.test(text[wordStart]!)) wordStart++;
  let word = '';
  let at = wordStart;
  while (at < end) {
    const { character, length } = characterAt(text, at);
    if (/\s/.test(character)) break;
    word += character;
    at += length;
  }
  return word === '' ? undefined : { word, range: { start: wordStart, end: at } };
}

function characterAt(text: string, at: number): { character: string; length: number } {
  if (text[at] === '\\') {
    escape.lastIndex = at;
    const escaped = escape.exec(text);
    if (escaped !== null) return { character: escaped[1]!, length: 2 };
  } else if (text[at] === '&') {
    reference.lastIndex = at;
    const [whole, decimal, hexadecimal, name] = reference.exec(text) ?? [];
    if (whole !== undefined) {
      if (name !== undefined) {
        return { character: namedSpaces.has(name) ? ' ' : whole, length: whole.length };
      }
      const code = decimal === undefined ? Number.parseInt(hexadecimal!, 16) : Number(decimal);
      const valid = code > 0 && code <= 0x10ffff && (code < 0xd800 || code > 0xdfff);
      return { character: valid ? String.fromCodePoint(code) : '\ufffd', length: whole.length };
    }
  }
  return { character: text[at]!, length: 1 };
}

/**
 * Text of a notebook on its way to a terminal. A control character in it could move the cursor, recolour the
 * screen or hide what follows, so each becomes a visible character that does nothing.
 */

/** Control characters, and the format characters that reorder or break lines. */
// eslint-disable-next-line no-control-regex -- they are what it is for
const unprintable = /[\u0000-\u001f\u007f-\u009f\u061c\u200e\u200f\u2028-\u202e\u2066-\u2069]/g;

/** One character for one: columns stay where they are. */
export function printable(text: string): string {
  return text.replace(unprintable, (character) => {
    const code = character.charCodeAt(0);
    if (code < 0x20) return String.fromCharCode(0x2400 + code);
    return code === 0x7f ? '\u2421' : '\ufffd';
  });
}

/** JSON that is safe to print: `JSON.stringify` leaves half of those characters as they are. */
export function printableJson(value: unknown, indent?: number): string {
  return JSON.stringify(value, undefined, indent).replace(unprintable, (character) =>
    character === '\n' ? character : `\\u${character.charCodeAt(0).toString(16).padStart(4, '0')}`,
  );
}

/** Take two columns: East Asian wide characters, and emoji shown as pictures. */
const wide =
  /\p{Emoji_Presentation}|[\u1100-\u115f\u2e80-\u303e\u3041-\ua4cf\uac00-\ud7a3\uf900-\ufaff\ufe30-\ufe6f\uff00-\uff60\uffe0-\uffe6]/u;

/** Take no column of their own: combining marks, joiners, variation selectors. */
const narrow = /\p{Mn}|\p{Me}|\u200b|\u200c|\u200d/u;

/** Columns that a terminal gives the text. */
export function terminalWidth(text: string): number {
  if (/^[\x20-\x7e]*$/.test(text)) return text.length;
  let width = 0;
  for (const character of text) {
    // Latin, Greek and the trade's signs are below both.
    if (character < '\u0300') width++;
    else if (!narrow.test(character)) width += wide.test(character) ? 2 : 1;
  }
  return width;
}

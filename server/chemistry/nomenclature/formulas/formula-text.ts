/** One spelling for the characters of formulas, and the parts between the dots of salts, hydrates and adducts. */

export interface FormulaPart {
  readonly times: number;
  readonly text: string;
}

/** Formulas longer than this are not read. */
const longestFormula = 120;

/** Seven small letters in a row before any dot are no symbols. */
const isWord = /^[^·•∙⋅*.]*[a-z]{7}/;

/** With ordinary digits, `≡` for a triple bond and `·` for a dot; undefined for what cannot be a formula. */
export function plainFormula(text: string): string | undefined {
  if (text.length > longestFormula || isWord.test(text)) return undefined;
  const plain = text
    .replace(/[₀-₉]/g, (digit) => String(digit.charCodeAt(0) - 0x2080))
    .replace(/[•∙⋅]|(?<!Cp)\*/g, '·')
    .replace(/#/g, '≡');
  return /^(?:[A-Z([]|[2-4]-[A-Z]|\d?[insctompIS]{1,4}-?[A-Z])/.test(plain) ? plain : undefined;
}

/**
 * `CuSO4·5H2O` as its parts; undefined where a number is missing or no whole one. A full stop counts as a dot between a
 * letter or digit and what begins a part.
 */
export function formulaParts(formula: string): readonly FormulaPart[] | undefined {
  const parts: FormulaPart[] = [];
  for (const piece of formula.split(/\s*·\s*|(?<=[A-Za-z\d)\]])\.(?=\d*[A-Z(])/)) {
    const match = /^(\d{1,2}(?!-))? ?(?=[^\s])/.exec(piece);
    if (!match || piece === '') return undefined;
    const times = match[1] === undefined ? 1 : Number(match[1]);
    if (times === 0 || (parts.length === 0 && times > 1)) return undefined;
    parts.push({ times, text: piece.slice(match[0].length) });
  }
  return parts;
}

/** The number at a place of a formula (1 where there is none), and where it ends; undefined for 0 and beyond 99. */
export function countAt(text: string, offset: number): { count: number; end: number } | undefined {
  let end = offset;
  while (end < text.length && text[end]! >= '0' && text[end]! <= '9') end++;
  if (end === offset) return { count: 1, end };
  const count = Number(text.slice(offset, end));
  return count === 0 || end - offset > 2 ? undefined : { count, end };
}

const closing: Readonly<Record<string, string>> = { '(': ')', '[': ']' };

/** What stands in the brackets that open at a place, their number, and where it ends. */
export function bracketAt(
  text: string,
  offset: number,
): { inner: string; count: number; end: number } | undefined {
  const close = closing[text[offset] ?? ''];
  if (close === undefined) return undefined;
  let depth = 0;
  for (let at = offset; at < text.length; at++) {
    if (text[at] === text[offset]) depth++;
    else if (text[at] === close && --depth === 0) {
      const number = countAt(text, at + 1);
      return number && { inner: text.slice(offset + 1, at), ...number };
    }
  }
  return undefined;
}

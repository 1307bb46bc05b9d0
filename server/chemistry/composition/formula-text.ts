/** A formula's text with the place that has been reached, and its smallest pieces: numbers, charges and symbols. */
import { problemAt, type Problem } from '../text.ts';
import { elementWithSymbol } from './elements.ts';
import { groupSymbols } from './group-symbols.ts';

const subscripts = '₀₁₂₃₄₅₆₇₈₉';
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const fractions: Readonly<Record<string, number>> = {
  '½': 0.5,
  '¼': 0.25,
  '¾': 0.75,
  '⅓': 1 / 3,
  '⅔': 2 / 3,
};
const countLimit = 100_000;

/** Whether a character is white space; false at the end of the text. */
export const isSpace = (character: string | undefined): boolean =>
  character !== undefined && /^\s$/u.test(character);

export class FormulaText {
  /** The offset that has been reached. */
  at = 0;

  constructor(readonly text: string) {}

  readMultiplier(): number {
    const fraction = fractions[this.text[this.at] ?? ''];
    if (fraction !== undefined) {
      this.at++;
      return fraction;
    }
    const match = /^(\d{1,4}(?:\.\d{1,3})?)\s*(?=[A-Za-z([{½])/u.exec(this.text.slice(this.at, this.at + 12));
    if (match === null) return 1;
    const number = Number(match[1]);
    if (number === 0) return 1;
    this.at += match[0].length;
    const more = fractions[this.text[this.at] ?? ''];
    if (more === undefined) return number;
    this.at++;
    return number + more;
  }

  readCount(): number | Problem {
    const start = this.at;
    let count = 0;
    for (;;) {
      const character = this.text[this.at] ?? '';
      const digit = character >= '0' && character <= '9' ? Number(character) : subscripts.indexOf(character);
      if (character === '' || digit === -1) break;
      count = count * 10 + digit;
      this.at++;
    }
    if (this.at === start) return 1;
    if (count === 0)
      return problemAt(start, this.at, 'A number of 0 says that the atom is not there; leave the symbol out.')
        .problem;
    if (count > countLimit)
      return problemAt(start, this.at, 'No molecule has that many atoms of one kind.').problem;
    return count;
  }

  /**
   * A charge: `+`, `2-`, `^2-`, `²⁺`, `−`. Digits before the sign belong to it only after a bracket, a caret, a space, or
   * as superscripts; `C6H5N2+` has two nitrogens.
   */
  readCharge(digitsAllowed: boolean): number | undefined {
    const rest = this.text.slice(this.at, this.at + 12);
    const match =
      /^(?:\s*\^\s*\(?\s*(\d*)\s*([+\-−–])\)?|\s+(\d*)([+\-−–])(?=\s*$|\s*[·*•⋅∙.\])}])|([⁰¹²³⁴-⁹]*)([⁺⁻]))/u.exec(
        rest,
      ) ??
      (digitsAllowed
        ? /^(\d{0,2})([+\-−–])(?!\d)/u.exec(rest)
        : /^()([+\-−–])(?=\s*$|\s*[·*•⋅∙.\])}]|[+\-−–])/u.exec(rest));
    if (match === null) return undefined;
    const digits = [match[1], match[3], match[5]].find((group) => group !== undefined && group !== '') ?? '';
    const sign = match[2] ?? match[4] ?? match[6] ?? '+';
    const plain = [...digits]
      .map((digit) => (superscripts.includes(digit) ? superscripts.indexOf(digit) : digit))
      .join('');
    this.at += match[0].length;
    return (plain === '' ? 1 : Number(plain)) * (sign === '+' || sign === '⁺' ? 1 : -1);
  }

  isotopeBracket(): boolean {
    return /^\[\d{1,3}[A-Z][a-z]?\]/.test(this.text.slice(this.at, this.at + 7));
  }

  /** The next element, nuclide or group symbol; moves past it. */
  readSymbol(): { name: string; start: number } | undefined {
    const start = this.at;
    const rest = this.text.slice(start, start + 9);
    const isotope =
      /^(?:\[(\d{1,3})([A-Z][a-z]?)\]|\^(\d{1,3})([A-Z][a-z]?)|([⁰¹²³⁴-⁹]{1,3})([A-Z][a-z]?))/u.exec(rest);
    if (isotope !== null) {
      const digits =
        isotope[1] ?? isotope[3] ?? [...isotope[5]!].map((digit) => superscripts.indexOf(digit)).join('');
      let symbol = (isotope[2] ?? isotope[4] ?? isotope[6])!;
      let length = isotope[0].length;
      if (symbol.length === 2 && elementWithSymbol(symbol) === undefined && isotope[1] === undefined) {
        symbol = symbol[0]!;
        length--;
      }
      const element = elementWithSymbol(symbol);
      if (element?.nuclides.some((nuclide) => nuclide.massNumber === Number(digits))) {
        this.at += length;
        return { name: `${Number(digits)}${symbol}`, start };
      }
      return undefined;
    }
    for (let length = Math.min(6, rest.length); length >= 1; length--) {
      const candidate = rest.slice(0, length);
      const name = candidate === 'D' ? '2H' : candidate === 'T' ? '3H' : candidate;
      const known =
        Object.hasOwn(groupSymbols, candidate) ||
        name !== candidate ||
        elementWithSymbol(candidate) !== undefined;
      if (!known) continue;
      this.at += length;
      return { name, start };
    }
    return undefined;
  }

  /** A space inside a part is passed over when a symbol or bracket follows: `C6 H12 O6`. */
  goesOnAfterSpace(): boolean {
    return /^\s+[A-Z([{]/u.test(this.text.slice(this.at));
  }

  skipSpace(): void {
    while (isSpace(this.text[this.at])) this.at++;
  }

  unexpected(): Problem {
    const at = Math.min(this.at, this.text.length);
    if (at >= this.text.length) return problemAt(at, at, 'The formula ends too early.').problem;
    const word = /^[A-Za-z][a-z]*/.exec(this.text.slice(at, at + 3))?.[0];
    const shown = word ?? String.fromCodePoint(this.text.codePointAt(at)!);
    const why =
      word !== undefined
        ? 'is neither an element nor a group symbol'
        : ')]}'.includes(shown)
          ? 'closes a bracket that was never opened'
          : 'has no meaning in a formula';
    return problemAt(at, at + shown.length, `“${shown}” ${why}.`).problem;
  }
}

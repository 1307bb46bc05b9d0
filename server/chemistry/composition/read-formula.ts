/**
 * Reads a formula as chemists write it: Hill order or not, brackets, hydrates and salts with a dot, multipliers,
 * charges, isotopes, subscript digits, and group symbols of line formulas. A problem names the exact characters.
 */
import { problemAt, range, type Problem, type Read, type TextRange } from '../text.ts';
import type { Composition } from './composition.ts';
import { elementWithSymbol } from './elements.ts';
import { correctedCapitals } from './formula-capitals.ts';
import { groupSymbols, groupUnlessAlone } from './group-symbols.ts';

/** One symbol with its number as it stands in the text. */
export interface FormulaPiece {
  /** Symbol and number. */
  readonly range: TextRange;
  /** The element symbol, nuclide (`13C`, `2H`) or group symbol. */
  readonly symbol: string;
  /** The number at the symbol itself; brackets and multipliers around it do not count here. */
  readonly count: number;
  /** Stands outside of all brackets, in a formula without multipliers. */
  readonly plain: boolean;
}

export interface FormulaReading {
  readonly composition: Composition;
  readonly pieces: readonly FormulaPiece[];
  /** The parts between dots with their multipliers: salts, hydrates, solvates. */
  readonly parts: readonly {
    readonly composition: Composition;
    readonly times: number;
    readonly range: TextRange;
  }[];
}

const subscripts = '₀₁₂₃₄₅₆₇₈₉';
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const fractions: Readonly<Record<string, number>> = {
  '½': 0.5,
  '¼': 0.25,
  '¾': 0.75,
  '⅓': 1 / 3,
  '⅔': 2 / 3,
};
const dots = '·*•⋅∙.';
const closing: Readonly<Record<string, string>> = { '(': ')', '[': ']', '{': '}' };
const nestingLimit = 40;
const countLimit = 100_000;

const isSpace = (character: string | undefined) => character !== undefined && /^\s$/u.test(character);

/** Reads the whole text, white space around it aside. */
export function readFormula(text: string): Read<Composition> {
  const read = readFormulaDetailed(text);
  return read.problem === undefined ? { value: read.value.composition } : { problem: read.problem };
}

/** The same with every piece and part in its place, for whoever has to point at one. */
export function readFormulaDetailed(text: string): Read<FormulaReading> {
  const reader = new FormulaReader(text);
  const problem = reader.read();
  if (problem === undefined) return { value: reader.result() };
  const corrected = correctedCapitals(text.trim());
  if (corrected === undefined || readFormula(corrected).problem !== undefined) return { problem };
  const start = text.length - text.trimStart().length;
  return {
    problem: {
      ...problem,
      message: `${problem.message} Was ${corrected} meant? Element symbols begin with a capital and go on in lower case.`,
      fixes: [
        {
          title: `Write ${corrected}`,
          edits: [{ range: range(start, start + text.trim().length), newText: corrected }],
          safe: false,
        },
      ],
    },
  };
}

interface Frame {
  readonly counts: Map<string, number>;
  readonly open: number;
  readonly close: string;
}

class FormulaReader {
  private at = 0;
  private readonly pieces: FormulaPiece[] = [];
  private readonly parts: { composition: Composition; times: number; range: TextRange }[] = [];

  constructor(private readonly text: string) {}

  result(): FormulaReading {
    const counts = new Map<string, number>();
    let charge = 0;
    for (const part of this.parts) {
      for (const [kind, count] of part.composition.counts) {
        counts.set(kind, (counts.get(kind) ?? 0) + count * part.times);
      }
      charge += part.composition.charge * part.times;
    }
    return { composition: { counts, charge }, pieces: this.pieces, parts: this.parts };
  }

  read(): Problem | undefined {
    this.skipSpace();
    if (this.at >= this.text.length)
      return problemAt(0, this.text.length, 'There is no formula here.').problem;
    for (;;) {
      const problem = this.readPart();
      if (problem !== undefined) return problem;
      this.skipSpace();
      const character = this.text[this.at];
      if (character === undefined) return undefined;
      if (!dots.includes(character)) return this.unexpected();
      const dot = this.at++;
      this.skipSpace();
      if (this.at >= this.text.length) {
        return problemAt(dot, dot + 1, 'Nothing follows this dot; it joins a salt, hydrate or solvate part.')
          .problem;
      }
    }
  }

  /** One part between dots: `2 HCl`, `0.5 H2O`, `[Cu(NH3)4]2+`. */
  private readPart(): Problem | undefined {
    const start = this.at;
    const times = this.readMultiplier();
    this.skipSpace();
    const frames: Frame[] = [{ counts: new Map(), open: this.at, close: '' }];
    let charge = 0;
    let read = false;
    for (;;) {
      const character = this.text[this.at];
      const frame = frames[frames.length - 1]!;
      if (character !== undefined && character === frame.close) {
        if (frame.counts.size === 0) {
          return problemAt(frame.open, this.at + 1, 'These brackets are empty.').problem;
        }
        this.at++;
        frames.pop();
        const chargeHere = frames.length === 1 ? this.readCharge(true) : undefined;
        const count = chargeHere === undefined ? this.readCount() : 1;
        if (typeof count !== 'number') return count;
        charge += chargeHere ?? 0;
        addAll(frames[frames.length - 1]!.counts, frame.counts, count);
        read = true;
        continue;
      }
      if (frames.length === 1 && read) {
        const found = this.readCharge(false);
        if (found !== undefined) {
          charge += found;
          continue;
        }
      }
      if (isSpace(character) && (frames.length > 1 || this.goesOnAfterSpace())) {
        this.skipSpace();
        continue;
      }
      if (character !== undefined && closing[character] !== undefined && !this.isotopeBracket()) {
        if (frames.length > nestingLimit) {
          return problemAt(this.at, this.at + 1, 'Brackets are nested too deeply here to be a formula.')
            .problem;
        }
        frames.push({ counts: new Map(), open: this.at, close: closing[character] });
        this.at++;
        continue;
      }
      const symbol = this.readSymbol();
      if (symbol === undefined) {
        if (frames.length > 1) {
          const open = frame.open;
          return this.at >= this.text.length
            ? problemAt(open, open + 1, 'This bracket is never closed.').problem
            : this.unexpected();
        }
        break;
      }
      if (this.isLoneIonCharge(symbol, frames, read)) {
        addOne(frame.counts, symbol.name, 1);
        this.note(symbol, 1, frames.length === 1 && times === 1);
        charge += this.readCharge(true) ?? 0;
      } else {
        const count = this.readCount();
        if (typeof count !== 'number') return count;
        addOne(frame.counts, symbol.name, count);
        this.note(symbol, count, frames.length === 1 && times === 1);
      }
      read = true;
    }
    if (!read) return this.unexpected();
    const counts = expandGroups(frames[0]!.counts);
    this.parts.push({ composition: { counts, charge }, times, range: range(start, this.at) });
    return undefined;
  }

  private note(symbol: { name: string; start: number }, count: number, plain: boolean): void {
    this.pieces.push({ range: range(symbol.start, this.at), symbol: symbol.name, count, plain });
  }

  /** `Ca2+`, `Fe3+`: on an element by itself the digit belongs to the charge. */
  private isLoneIonCharge(symbol: { name: string }, frames: readonly Frame[], read: boolean): boolean {
    if (read || frames.length > 1 || elementWithSymbol(symbol.name) === undefined) return false;
    return /^\d[+\-−–]\s*$/.test(this.text.slice(this.at));
  }

  private readMultiplier(): number {
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

  private readCount(): number | Problem {
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
  private readCharge(digitsAllowed: boolean): number | undefined {
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

  private isotopeBracket(): boolean {
    return /^\[\d{1,3}[A-Z][a-z]?\]/.test(this.text.slice(this.at, this.at + 7));
  }

  /** The next element, nuclide or group symbol; moves past it. */
  private readSymbol(): { name: string; start: number } | undefined {
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
  private goesOnAfterSpace(): boolean {
    return /^\s+[A-Z([{]/u.test(this.text.slice(this.at));
  }

  private skipSpace(): void {
    while (isSpace(this.text[this.at])) this.at++;
  }

  private unexpected(): Problem {
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

function addOne(counts: Map<string, number>, kind: string, count: number): void {
  counts.set(kind, (counts.get(kind) ?? 0) + count);
}

function addAll(counts: Map<string, number>, more: ReadonlyMap<string, number>, times: number): void {
  for (const [kind, count] of more) addOne(counts, kind, count * times);
}

/** Puts the atoms in the place of group symbols. */
function expandGroups(counts: ReadonlyMap<string, number>): Map<string, number> {
  const isGroup = (kind: string) => Object.hasOwn(groupSymbols, kind);
  const inCompany = [...counts.keys()].some(
    (kind) => kind === 'H' || kind === 'C' || kind === '2H' || (isGroup(kind) && !groupUnlessAlone.has(kind)),
  );
  const expanded = new Map<string, number>();
  for (const [kind, count] of counts) {
    if (!isGroup(kind) || (groupUnlessAlone.has(kind) && !inCompany)) addOne(expanded, kind, count);
    else
      for (const match of groupSymbols[kind]!.matchAll(/([A-Z][a-z]?)(\d*)/g))
        addOne(expanded, match[1]!, count * Number(match[2] || 1));
  }
  return expanded;
}

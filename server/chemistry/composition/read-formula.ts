/**
 * Reads a formula as chemists write it: Hill order or not, brackets, hydrates and salts with a dot, multipliers,
 * charges, isotopes, subscript digits, and group symbols of line formulas. A problem names the exact characters.
 */
import { problemAt, range, type Problem, type Read, type TextRange } from '../text.ts';
import type { Composition } from './composition.ts';
import { elementWithSymbol } from './elements.ts';
import { correctedCapitals } from './formula-capitals.ts';
import { FormulaText, isSpace } from './formula-text.ts';
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

const dots = '·*•⋅∙.';
const closing: Readonly<Record<string, string>> = { '(': ')', '[': ']', '{': '}' };
const nestingLimit = 40;

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
  private readonly pieces: FormulaPiece[] = [];
  private readonly parts: { composition: Composition; times: number; range: TextRange }[] = [];

  private readonly cursor: FormulaText;

  constructor(text: string) {
    this.cursor = new FormulaText(text);
  }

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
    this.cursor.skipSpace();
    if (this.cursor.at >= this.cursor.text.length)
      return problemAt(0, this.cursor.text.length, 'There is no formula here.').problem;
    for (;;) {
      const problem = this.readPart();
      if (problem !== undefined) return problem;
      this.cursor.skipSpace();
      const character = this.cursor.text[this.cursor.at];
      if (character === undefined) return undefined;
      if (!dots.includes(character)) return this.cursor.unexpected();
      const dot = this.cursor.at++;
      this.cursor.skipSpace();
      if (this.cursor.at >= this.cursor.text.length) {
        return problemAt(dot, dot + 1, 'Nothing follows this dot; it joins a salt, hydrate or solvate part.')
          .problem;
      }
    }
  }

  /** One part between dots: `2 HCl`, `0.5 H2O`, `[Cu(NH3)4]2+`. */
  private readPart(): Problem | undefined {
    const start = this.cursor.at;
    const times = this.cursor.readMultiplier();
    this.cursor.skipSpace();
    const frames: Frame[] = [{ counts: new Map(), open: this.cursor.at, close: '' }];
    let charge = 0;
    let read = false;
    for (;;) {
      const character = this.cursor.text[this.cursor.at];
      const frame = frames[frames.length - 1]!;
      if (character !== undefined && character === frame.close) {
        if (frame.counts.size === 0) {
          return problemAt(frame.open, this.cursor.at + 1, 'These brackets are empty.').problem;
        }
        this.cursor.at++;
        frames.pop();
        const chargeHere = frames.length === 1 ? this.cursor.readCharge(true) : undefined;
        const count = chargeHere === undefined ? this.cursor.readCount() : 1;
        if (typeof count !== 'number') return count;
        charge += chargeHere ?? 0;
        addAll(frames[frames.length - 1]!.counts, frame.counts, count);
        read = true;
        continue;
      }
      if (frames.length === 1 && read) {
        const found = this.cursor.readCharge(false);
        if (found !== undefined) {
          charge += found;
          continue;
        }
      }
      if (isSpace(character) && (frames.length > 1 || this.cursor.goesOnAfterSpace())) {
        this.cursor.skipSpace();
        continue;
      }
      if (character !== undefined && closing[character] !== undefined && !this.cursor.isotopeBracket()) {
        if (frames.length > nestingLimit) {
          return problemAt(
            this.cursor.at,
            this.cursor.at + 1,
            'Brackets are nested too deeply here to be a formula.',
          ).problem;
        }
        frames.push({ counts: new Map(), open: this.cursor.at, close: closing[character] });
        this.cursor.at++;
        continue;
      }
      const symbol = this.cursor.readSymbol();
      if (symbol === undefined) {
        if (frames.length > 1) {
          const open = frame.open;
          return this.cursor.at >= this.cursor.text.length
            ? problemAt(open, open + 1, 'This bracket is never closed.').problem
            : this.cursor.unexpected();
        }
        break;
      }
      if (this.isLoneIonCharge(symbol, frames, read)) {
        addOne(frame.counts, symbol.name, 1);
        this.note(symbol, 1, frames.length === 1 && times === 1);
        charge += this.cursor.readCharge(true) ?? 0;
      } else {
        const count = this.cursor.readCount();
        if (typeof count !== 'number') return count;
        addOne(frame.counts, symbol.name, count);
        this.note(symbol, count, frames.length === 1 && times === 1);
      }
      read = true;
    }
    if (!read) return this.cursor.unexpected();
    const counts = expandGroups(frames[0]!.counts);
    this.parts.push({ composition: { counts, charge }, times, range: range(start, this.cursor.at) });
    return undefined;
  }

  private note(symbol: { name: string; start: number }, count: number, plain: boolean): void {
    this.pieces.push({ range: range(symbol.start, this.cursor.at), symbol: symbol.name, count, plain });
  }

  /** `Ca2+`, `Fe3+`: on an element by itself the digit belongs to the charge. */
  private isLoneIonCharge(symbol: { name: string }, frames: readonly Frame[], read: boolean): boolean {
    if (read || frames.length > 1 || elementWithSymbol(symbol.name) === undefined) return false;
    return /^\d[+\-−–]\s*$/.test(this.cursor.text.slice(this.cursor.at));
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

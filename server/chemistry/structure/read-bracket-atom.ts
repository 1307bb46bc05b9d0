/**
 * One bracket atom of a SMILES: `[` isotope? symbol chirality? hydrogens? charge? class? `]`
 * (OpenSMILES specification, section 3.1).
 */
import { elementWithSymbol } from '../composition/elements.ts';
import { problemAt, type Problem } from '../text.ts';

export interface BracketAtom {
  readonly atomicNumber: number;
  readonly isotope: number;
  readonly aromatic: boolean;
  /** `@`, `@@`, `@TH1`, `@AL2`, `@SP1` …; the empty string when there is none. */
  readonly chirality: string;
  readonly hydrogens: number;
  readonly charge: number;
  readonly atomClass: number;
  /** Offset after the closing bracket. */
  readonly end: number;
}

const aromaticSymbols: Readonly<Record<string, number>> = {
  se: 34,
  as: 33,
  te: 52,
  si: 14,
  b: 5,
  c: 6,
  n: 7,
  o: 8,
  p: 15,
  s: 16,
};

const chiralClasses: Readonly<Record<string, number>> = { TH: 2, AL: 2, SP: 3, TB: 20, OH: 30 };

const isDigit = (code: number) => code >= 48 && code <= 57;

/** `open` is the offset of `[`. */
export function readBracketAtom(text: string, open: number): BracketAtom | { problem: Problem } {
  const close = text.indexOf(']', open);
  const nextOpen = text.indexOf('[', open + 1);
  if (close === -1 || (nextOpen !== -1 && nextOpen < close)) {
    return problemAt(open, open + 1, 'This bracket is never closed. A bracket atom ends with “]”.');
  }
  let at = open + 1;
  const number = (): number => {
    let value = 0;
    while (isDigit(text.charCodeAt(at))) value = Math.min(value * 10 + text.charCodeAt(at++) - 48, 99999);
    return value;
  };

  const isotope = number();
  let atomicNumber = -1;
  let aromatic = false;
  const two = text.slice(at, at + 2);
  const one = text.slice(at, at + 1);
  if (at < close && one === '*') {
    atomicNumber = 0;
    at += 1;
  } else if (/^[A-Z][a-z]$/.test(two) && elementWithSymbol(two)) {
    atomicNumber = elementWithSymbol(two)!.atomicNumber;
    at += 2;
  } else if (/^[A-Z]/.test(one) && elementWithSymbol(one)) {
    atomicNumber = elementWithSymbol(one)!.atomicNumber;
    at += 1;
  } else {
    const symbol = Object.keys(aromaticSymbols).find((known) => text.startsWith(known, at));
    if (symbol !== undefined && at + symbol.length <= close) {
      atomicNumber = aromaticSymbols[symbol]!;
      aromatic = true;
      at += symbol.length;
    }
  }
  if (atomicNumber === -1) {
    if (at >= close) return problemAt(open, close + 1, 'There is no element symbol between these brackets.');
    const end = Math.min(close, at + (/^[A-Za-z][a-z]/.test(two) ? 2 : codePointLength(text, at)));
    return problemAt(
      at,
      end,
      `“${text.slice(at, end)}” is no element symbol. Check the spelling and the capital letter.`,
    );
  }

  let chirality = '';
  if (text[at] === '@') {
    const start = at++;
    if (text[at] === '@') at++;
    else {
      const permutations = chiralClasses[text.slice(at, at + 2)];
      // `[C@OH]` does not occur: the class needs its number, so `@` followed by a hydrogen count stays plain.
      if (permutations !== undefined && isDigit(text.charCodeAt(at + 2))) {
        at += 2;
        const permutation = number();
        if (permutation < 1 || permutation > permutations) {
          return problemAt(
            start,
            at,
            `“${text.slice(start, at)}” is no chirality class: its number runs from 1 to ${permutations}.`,
          );
        }
      }
    }
    chirality = text.slice(start, at);
  }

  let hydrogens = 0;
  if (text[at] === 'H') {
    at++;
    hydrogens = isDigit(text.charCodeAt(at)) ? number() : 1;
  }

  let charge = 0;
  const sign = text[at];
  if (sign === '+' || sign === '-' || sign === '−') {
    const unit = sign === '+' ? 1 : -1;
    const start = at++;
    if (isDigit(text.charCodeAt(at))) charge = unit * number();
    else {
      charge = unit;
      while (text[at] === sign) {
        charge += unit;
        at++;
      }
    }
    if (Math.abs(charge) > 15) {
      return problemAt(start, at, `A charge of ${charge} does not occur; the limit of the notation is 15.`);
    }
  }

  let atomClass = 0;
  if (text[at] === ':' && isDigit(text.charCodeAt(at + 1))) {
    at++;
    atomClass = number();
  }
  if (at !== close) {
    return problemAt(
      at,
      close,
      `“${text.slice(at, close)}” is not understood in a bracket atom. The order is isotope, symbol, chirality, hydrogens, charge, class, as in [13C@H+:1].`,
    );
  }
  return { atomicNumber, isotope, aromatic, chirality, hydrogens, charge, atomClass, end: close + 1 };
}

function codePointLength(text: string, at: number): number {
  return (text.codePointAt(at) ?? 0) > 0xffff ? 2 : 1;
}

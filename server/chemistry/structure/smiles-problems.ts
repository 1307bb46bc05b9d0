/** What is said of characters that cannot stand where they do in a SMILES. */
import { elementWithSymbol } from '../composition/elements.ts';
import { problemAt, type Problem } from '../text.ts';
import type { BondSymbol } from './smiles-draft.ts';

/** A bond symbol without an atom on the side named. */
export function danglingBond(symbol: BondSymbol, side: string): Problem {
  return problemAt(symbol.at, symbol.at + 1, `This bond leads nowhere: there is no atom ${side}.`).problem;
}

/** The character at `at`, which means nothing there. */
export function unexpected(text: string, at: number, end: number): Problem {
  const length = (text.codePointAt(at) ?? 0) > 0xffff ? 2 : 1;
  const shown = text.slice(at, at + length);
  if (/^\s$/u.test(shown)) {
    return problemAt(at, end, 'A SMILES has no spaces; what follows the space is not read as part of it.')
      .problem;
  }
  if (shown === ']')
    return problemAt(at, at + 1, 'This bracket closes an atom that was never opened.').problem;
  if (/^[A-Za-z]$/.test(shown)) {
    // The capital before it may have been read as an atom of its own: Na, Si.
    const before =
      /^[A-Z][a-z]$/.test(text.slice(at - 1, at + 1)) && elementWithSymbol(text.slice(at - 1, at + 1));
    const start = before ? at - 1 : at;
    const two = /^[A-Z][a-z]/.exec(text.slice(start, start + 2))?.[0] ?? shown;
    return problemAt(
      start,
      start + two.length,
      `“${two}” cannot stand here without brackets; only B, C, N, O, P, S, F, Cl, Br, I and their aromatic lower-case forms can. Write it as a bracket atom, such as [${two}].`,
    ).problem;
  }
  return problemAt(at, at + length, `“${shown}” has no meaning in a SMILES.`).problem;
}

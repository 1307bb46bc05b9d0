/**
 * Reads a SMILES after the OpenSMILES specification (version 1.0) into a molecule in which every atom and bond knows
 * its place in the text. Only the notation is judged here; whether a carbon may have five bonds is the valence
 * check's business. One pass over the characters, then the delocalised rings, the implied hydrogens and the
 * arrangement in space; no recursion, so the length of a text is not limited by the stack.
 */
import { elementWithSymbol } from '../composition/elements.ts';
import { problemAt, range, type Problem, type Read } from '../text.ts';
import { type Atom, type Bond, type BondOrder, type Molecule, MoleculeBuilder } from './molecule.ts';
import { readBracketAtom } from './read-bracket-atom.ts';
import { settleAromatic } from './read-smiles-aromatic.ts';
import { settleStereo } from './read-smiles-stereo.ts';
import { impliedHydrogens } from './valence-model.ts';

export type Mutable<T> = { -readonly [Key in keyof T]: T[Key] };

/** What is known of the text beyond the graph while it is being read. */
export interface SmilesDraft {
  readonly builder: MoleculeBuilder;
  /** True for atoms whose hydrogens are implied: those written without brackets. */
  readonly implied: boolean[];
  /** Chirality as written, by atom. */
  readonly chirality: Map<number, string>;
  /** `/` is 1 and `\` is −1, as seen from `from` to `to`, by bond. */
  readonly direction: Map<number, 1 | -1>;
  /** For ring bonds: the offsets of the closure at `from` and at `to`. */
  readonly ringMarks: Map<number, readonly [number, number]>;
  /** Bonds without a symbol between two lower-case atoms: aromatic if in a ring of such atoms, else single. */
  readonly perhapsAromatic: Set<number>;
}

interface BondSymbol {
  readonly order: BondOrder;
  readonly aromatic: boolean;
  readonly direction: 0 | 1 | -1;
  readonly at: number;
}

interface OpenRing {
  readonly atom: number;
  readonly symbol: BondSymbol | undefined;
  readonly at: number;
  readonly end: number;
}

/** Atomic number of the one-letter atoms that stand without brackets, by character code; 0 elsewhere. */
const organicNumber = new Uint8Array(128);
const lowerCase = new Uint8Array(128);
for (const [letter, atomicNumber] of Object.entries({ B: 5, C: 6, N: 7, O: 8, P: 15, S: 16, F: 9, I: 53 })) {
  organicNumber[letter.charCodeAt(0)] = atomicNumber;
  if (letter === 'F' || letter === 'I') continue;
  organicNumber[letter.toLowerCase().charCodeAt(0)] = atomicNumber;
  lowerCase[letter.toLowerCase().charCodeAt(0)] = 1;
}
const asterisk = 42;
const openBracket = 91;

const bondSymbols: (Omit<BondSymbol, 'at'> | undefined)[] = [];
for (const [symbol, order, aromatic, direction] of [
  ['-', 1, false, 0],
  ['=', 2, false, 0],
  ['#', 3, false, 0],
  ['$', 4, false, 0],
  [':', 1, true, 0],
  ['/', 1, false, 1],
  ['\\', 1, false, -1],
  ['~', 0, false, 0],
] as const) {
  bondSymbols[symbol.charCodeAt(0)] = { order, aromatic, direction };
}

/** What papers and word processors print in place of the ASCII characters. */
const lookalikes: Readonly<Record<string, string>> = {
  '−': '-',
  '–': '-',
  '‐': '-',
  '‑': '-',
  '≡': '#',
  '＝': '=',
};

const isSpace = (character: string) => /^\s$/u.test(character);
function isSpaceAt(text: string, at: number): boolean {
  const code = text.charCodeAt(at);
  return code <= 32 || (code >= 128 && isSpace(text[at]!));
}
const isDigit = (code: number) => code >= 48 && code <= 57;

/** Any string is accepted; leading and trailing white space is passed over, and an empty text is a problem. */
export function readSmiles(text: string): Read<Molecule> {
  let start = 0;
  let end = text.length;
  while (start < end && isSpaceAt(text, start)) start++;
  while (end > start && isSpaceAt(text, end - 1)) end--;
  if (start === end) return problemAt(start, end, 'There is no SMILES here.');
  const draft: SmilesDraft = {
    builder: new MoleculeBuilder(),
    implied: [],
    chirality: new Map(),
    direction: new Map(),
    ringMarks: new Map(),
    perhapsAromatic: new Set(),
  };
  const problem =
    readGraph(text, start, end, draft) ?? settleAromatic(draft) ?? fillImplied(draft) ?? settleStereo(draft);
  return problem === undefined ? { value: draft.builder.build() } : { problem };
}

function fillImplied({ builder, implied }: SmilesDraft): undefined {
  const { atoms, bonds, neighbours } = builder;
  for (let index = 0; index < atoms.length; index++) {
    if (!implied[index]) continue;
    let sum = 0;
    for (const neighbour of neighbours[index]!) sum += bonds[neighbour.bond]!.order;
    (atoms[index] as Mutable<Atom>).hydrogens = impliedHydrogens(atoms[index]!.atomicNumber, sum);
  }
}

function readGraph(text: string, start: number, end: number, draft: SmilesDraft): Problem | undefined {
  const { builder, implied } = draft;
  const branches: { atom: number; at: number; atomsBefore: number }[] = [];
  const rings = new Map<number, OpenRing>();
  let previous = -1;
  let symbol: BondSymbol | undefined;
  let afterDot = -1;
  let at = start;

  const attach = (atom: number) => {
    if (previous !== -1) join(draft, previous, atom, symbol);
    previous = atom;
    symbol = undefined;
    afterDot = -1;
  };

  while (at < end) {
    const raw = text.charCodeAt(at);
    const code = raw < 128 ? raw : (lookalikes[text[at]!]?.charCodeAt(0) ?? 0);
    let atomicNumber = organicNumber[code]!;
    if (atomicNumber !== 0 || code === openBracket || code === asterisk) {
      if (previous === -1 && symbol !== undefined) return danglingBond(symbol, 'before it');
      let length = 1;
      if (code !== openBracket) {
        // Cl and Br are the two-letter members of the organic subset; B and C stand in the table by themselves.
        const next = text.charCodeAt(at + 1);
        if (code === 67 && next === 108) [atomicNumber, length] = [17, 2];
        else if (code === 66 && next === 114) [atomicNumber, length] = [35, 2];
        attach(builder.addPlainAtom(atomicNumber, lowerCase[code] === 1, at, at + length));
        implied.push(atomicNumber !== 0);
      } else {
        const atom = readBracketAtom(text.slice(0, end), at);
        if ('problem' in atom) return atom.problem;
        length = atom.end - at;
        const { chirality, end: after, ...rest } = atom;
        const index = builder.addAtom(rest.atomicNumber, { ...rest, range: range(at, after) });
        if (chirality !== '') draft.chirality.set(index, chirality);
        attach(index);
        implied.push(false);
      }
      at += length;
      continue;
    }
    const bond = bondSymbols[code];
    if (bond !== undefined) {
      if (symbol !== undefined) {
        return problemAt(symbol.at, at + 1, 'Two bond symbols follow each other; one bond has one symbol.')
          .problem;
      }
      if (previous === -1) return danglingBond({ ...bond, at }, 'before it');
      symbol = { ...bond, at };
      at++;
    } else if (isDigit(code) || code === 37) {
      const mark = readRingNumber(text, at, end);
      if ('problem' in mark) return mark.problem;
      if (previous === -1 || afterDot !== -1) {
        return problemAt(at, mark.end, 'A ring closure needs an atom before it.').problem;
      }
      const open = rings.get(mark.number);
      if (open === undefined)
        rings.set(mark.number, { atom: previous, symbol, at: symbol?.at ?? at, end: mark.end });
      else {
        rings.delete(mark.number);
        const problem = closeRing(draft, open, previous, symbol, at, mark.end);
        if (problem !== undefined) return problem;
      }
      symbol = undefined;
      at = mark.end;
    } else if (code === 40) {
      if (previous === -1 || afterDot !== -1) {
        return problemAt(at, at + 1, 'A branch needs an atom before it; move the parenthesis behind an atom.')
          .problem;
      }
      if (branches.at(-1)?.atomsBefore === builder.atoms.length) {
        return problemAt(at, at + 1, 'A branch begins with an atom; delete one pair of parentheses.').problem;
      }
      if (symbol !== undefined) {
        return problemAt(
          symbol.at,
          at + 1,
          'The bond symbol belongs inside the branch, after the parenthesis.',
        ).problem;
      }
      branches.push({ atom: previous, at, atomsBefore: builder.atoms.length });
      at++;
    } else if (code === 41) {
      const branch = branches.pop();
      if (branch === undefined) {
        return problemAt(at, at + 1, 'This parenthesis closes a branch that was never opened.').problem;
      }
      if (symbol !== undefined) return danglingBond(symbol, 'after it');
      if (builder.atoms.length === branch.atomsBefore) {
        return problemAt(
          branch.at,
          at + 1,
          'This branch is empty; delete the parentheses or fill in the group.',
        ).problem;
      }
      previous = branch.atom;
      afterDot = -1;
      at++;
    } else if (code === 46) {
      if (symbol !== undefined) return danglingBond(symbol, 'after it');
      if (previous === -1)
        return problemAt(at, at + 1, 'A dot separates two parts; there is none before it.').problem;
      previous = -1;
      afterDot = at;
      at++;
    } else {
      return unexpected(text, at, end);
    }
  }
  if (symbol !== undefined) return danglingBond(symbol, 'after it');
  const unclosed = branches.at(-1);
  if (unclosed !== undefined) {
    return problemAt(unclosed.at, unclosed.at + 1, 'This branch is never closed; a parenthesis is missing.')
      .problem;
  }
  for (const [number, ring] of rings) {
    return problemAt(
      ring.at,
      ring.end,
      `Ring closure ${number} is opened here and never closed; the same number must stand at a second atom.`,
    ).problem;
  }
  if (afterDot !== -1) {
    return problemAt(afterDot, afterDot + 1, 'A dot separates two parts; there is none after it.').problem;
  }
  return undefined;
}

function danglingBond(symbol: BondSymbol, side: string): Problem {
  return problemAt(symbol.at, symbol.at + 1, `This bond leads nowhere: there is no atom ${side}.`).problem;
}

function unexpected(text: string, at: number, end: number): Problem {
  const length = (text.codePointAt(at) ?? 0) > 0xffff ? 2 : 1;
  const shown = text.slice(at, at + length);
  if (isSpace(shown)) {
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

/** One digit, `%nn`, or `%(nnnnn)`. */
function readRingNumber(
  text: string,
  at: number,
  end: number,
): { number: number; end: number } | { problem: Problem } {
  if (text[at] !== '%') return { number: text.charCodeAt(at) - 48, end: at + 1 };
  const match = /^%(?:(\d\d)|\((\d{1,5})\))/.exec(text.slice(at, Math.min(end, at + 9)));
  if (match === null) {
    return problemAt(at, Math.min(end, at + 1), 'After % stand two digits, the number of the ring closure.');
  }
  return { number: Number(match[1] ?? match[2]), end: at + match[0].length };
}

function join(draft: SmilesDraft, from: number, to: number, symbol: BondSymbol | undefined): number {
  const { builder } = draft;
  const bothAromatic = builder.atoms[from]!.aromatic && builder.atoms[to]!.aromatic;
  const place =
    symbol === undefined
      ? range(builder.atoms[to]!.range.start, builder.atoms[to]!.range.start)
      : range(symbol.at, symbol.at + 1);
  const bond = builder.addBond(from, to, symbol?.order ?? 1, symbol?.aromatic ?? false, place);
  if (symbol === undefined && bothAromatic) draft.perhapsAromatic.add(bond);
  if (symbol !== undefined && symbol.direction !== 0) draft.direction.set(bond, symbol.direction);
  if (symbol?.aromatic) {
    (builder.atoms[from] as Mutable<Atom>).aromatic = true;
    (builder.atoms[to] as Mutable<Atom>).aromatic = true;
  }
  return bond;
}

function closeRing(
  draft: SmilesDraft,
  open: OpenRing,
  atom: number,
  symbol: BondSymbol | undefined,
  at: number,
  end: number,
): Problem | undefined {
  const here = symbol?.at ?? at;
  if (open.atom === atom) {
    return problemAt(here, end, 'This ring closure joins an atom with itself.').problem;
  }
  if (draft.builder.neighbours[atom]!.some((neighbour) => neighbour.atom === open.atom)) {
    return problemAt(
      here,
      end,
      'These two atoms are already bonded; a second bond between them is a double bond (=).',
    ).problem;
  }
  const first = open.symbol;
  if (
    first !== undefined &&
    symbol !== undefined &&
    (first.order !== symbol.order ||
      first.aromatic !== symbol.aromatic ||
      (first.direction !== 0 && symbol.direction !== 0 && first.direction === symbol.direction))
  ) {
    return problemAt(
      here,
      end,
      'The two ends of this ring closure give the bond different symbols; write it at one end only.',
    ).problem;
  }
  // The direction at the closing end is seen from there; the bond runs from the opening end.
  const turned = symbol === undefined ? undefined : { ...symbol, direction: -symbol.direction as 0 | 1 | -1 };
  const chosen =
    first === undefined || (first.direction === 0 && turned?.direction) ? (turned ?? first) : first;
  const bond = join(draft, open.atom, atom, chosen);
  draft.ringMarks.set(bond, [open.at, here]);
  const made = draft.builder.bonds[bond] as Mutable<Bond>;
  made.range = range(here, end);
  return undefined;
}

/**
 * Reads a SMILES after the OpenSMILES specification (version 1.0) into a molecule in which every atom and bond knows
 * its place in the text. Only the notation is judged here; whether a carbon may have five bonds is the valence
 * check's business. One pass over the characters, then the delocalised rings, the implied hydrogens and the
 * arrangement in space; no recursion, so the length of a text is not limited by the stack.
 */
import { problemAt, range, type Problem, type Read } from '../text.ts';
import { type Atom, type Molecule, MoleculeBuilder } from './molecule.ts';
import { readBracketAtom } from './read-bracket-atom.ts';
import { settleAromatic } from './read-smiles-aromatic.ts';
import { settleStereo } from './read-smiles-stereo.ts';
import {
  closeRing,
  join,
  readRingNumber,
  type BondSymbol,
  type Mutable,
  type OpenRing,
  type SmilesDraft,
} from './smiles-draft.ts';
import { danglingBond, unexpected } from './smiles-problems.ts';
import { impliedHydrogens } from './valence-model.ts';

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

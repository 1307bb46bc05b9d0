/** What a SMILES has said while it is being read: the graph, and what is known of the text beyond it. */
import { problemAt, range, type Problem } from '../text.ts';
import type { Atom, Bond, BondOrder, MoleculeBuilder } from './molecule.ts';

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

/** A bond symbol as written. */
export interface BondSymbol {
  readonly order: BondOrder;
  readonly aromatic: boolean;
  readonly direction: 0 | 1 | -1;
  readonly at: number;
}

/** A ring closure that waits for its second atom. */
export interface OpenRing {
  readonly atom: number;
  readonly symbol: BondSymbol | undefined;
  readonly at: number;
  readonly end: number;
}

/** One digit, `%nn`, or `%(nnnnn)`. */
export function readRingNumber(
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

/** Bonds two atoms as the symbol between them says; the answer is the bond's index. */
export function join(draft: SmilesDraft, from: number, to: number, symbol: BondSymbol | undefined): number {
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

/** Closes a ring, or says why it cannot be closed. */
export function closeRing(
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

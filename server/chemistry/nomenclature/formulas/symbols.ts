/** The symbols of line formulas by their first letters, so that all that begin at a place are found at once. */
import { formulaGroups, leadingGroups, trailingGroups } from '../vocabulary/formula-groups.ts';

type Lines = readonly (readonly [symbols: string, smiles: string])[];

/** Values by spelling, found at a place of a text. */
export class SymbolTable {
  readonly #values = new Map<string, string>();
  #longest = 0;

  constructor(lines: Lines) {
    for (const [symbols, smiles] of lines) {
      for (const symbol of symbols.split('|')) {
        this.#values.set(symbol, smiles);
        this.#longest = Math.max(this.#longest, symbol.length);
      }
    }
  }

  get(symbol: string): string | undefined {
    return this.#values.get(symbol);
  }

  /** Every symbol that begins at the offset, the longest first. */
  at(text: string, offset: number): { smiles: string; end: number }[] {
    const found: { smiles: string; end: number }[] = [];
    for (let end = Math.min(text.length, offset + this.#longest); end > offset; end--) {
      const smiles = this.#values.get(text.slice(offset, end));
      if (smiles !== undefined) found.push({ smiles, end });
    }
    return found;
  }
}

export const groups = new SymbolTable(formulaGroups);
export const firstGroups = new SymbolTable(leadingGroups);
export const lastGroups = new SymbolTable(trailingGroups);

/** Atoms that join others in line formulas, with the bonds that they form without oxo groups. */
export const joints: Readonly<Record<string, number>> = {
  C: 4,
  N: 3,
  O: 2,
  S: 2,
  Se: 2,
  Te: 2,
  P: 3,
  As: 3,
  B: 3,
  Si: 4,
  Ge: 4,
  Sn: 4,
  Pb: 4,
  Al: 3,
  Li: 1,
  Mg: 2,
  Zn: 2,
  Hg: 2,
  oC6H4: 2,
  mC6H4: 2,
  pC6H4: 2,
};

/** The rings among them: SMILES before and after what is bound to the second place. */
export const phenylenes: Readonly<Record<string, readonly [before: string, after: string]>> = {
  oC6H4: ['cccc', ''],
  mC6H4: ['ccc', 'c'],
  pC6H4: ['cc', 'cc'],
};

/** Oxo groups that an atom takes beyond its ordinary bonds. */
export const oxoLimit: Readonly<Record<string, number>> = { S: 2, Se: 2, P: 1, As: 1 };

/** Metals of the line: they are read there only when carbon or hydrogen is bound to them. */
export const lineMetals: ReadonlySet<string> = new Set(['Sn', 'Pb', 'Al', 'Li', 'Mg', 'Zn', 'Hg']);

/**
 * What a compound is made of: how many atoms of each kind, and the charge. This is the one form in which
 * formulas, structures and names are compared.
 */

/**
 * An element symbol (`C`), or a nuclide as mass number and symbol (`13C`; deuterium is `2H`, tritium `3H`).
 */
export type AtomKind = string;

export interface Composition {
  /** Atoms per formula unit. Whole numbers, but for solvates such as `· 0.5 H2O`. Never zero or negative. */
  readonly counts: ReadonlyMap<AtomKind, number>;
  /** In elementary charges. */
  readonly charge: number;
}

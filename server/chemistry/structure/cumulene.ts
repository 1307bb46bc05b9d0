/** Chains of double bonds: a single one, an allene, and longer. */
import type { Molecule } from './molecule.ts';

export interface CumuleneEnd {
  /** The last atom of the chain. */
  readonly end: number;
  /** Its neighbour inside the chain. */
  readonly inward: number;
  /** Bonds walked, the first one included. */
  readonly length: number;
}

/** The atoms at the other end of this atom's double bonds. */
export function doubleBondNeighbours(molecule: Molecule, atom: number): number[] {
  return molecule.neighbours[atom]!.filter(({ bond }) => molecule.bonds[bond]!.order === 2).map(
    (neighbour) => neighbour.atom,
  );
}

/** Follows double bonds from `from` through its neighbour `through` until the chain ends; a ring of them is walked once. */
export function walkCumulene(molecule: Molecule, from: number, through: number): CumuleneEnd {
  let [inward, end] = [from, through];
  for (let length = 1; ; length++) {
    const onward = doubleBondNeighbours(molecule, end).find((atom) => atom !== inward);
    const goesOn = onward !== undefined && molecule.neighbours[end]!.length === 2;
    if (!goesOn || length > molecule.atoms.length) return { end, inward, length };
    [inward, end] = [end, onward];
  }
}

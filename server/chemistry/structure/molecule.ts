/**
 * The molecule graph on which everything stands: atoms, bonds, and what is known of their arrangement in
 * space. It holds what was stated, nothing perceived: rings, aromaticity and stereocentres are worked out
 * from it elsewhere. It comes from the SMILES reader or from the naming engine and never changes once built.
 */
import type { TextRange } from '../text.ts';

/** Stands among ligands for the hydrogen (or the lone pair) that is not an atom of the graph. */
export const IMPLICIT_LIGAND = -1;

export interface Atom {
  /** Atomic number; 0 for the unknown atom `*`. */
  readonly atomicNumber: number;
  /** Mass number, or 0 for the natural mixture of isotopes. */
  readonly isotope: number;
  readonly charge: number;
  /** Hydrogens on this atom that are not atoms of the graph themselves. */
  readonly hydrogens: number;
  /** Written in aromatic lower case. Perceived aromaticity is another thing. */
  readonly aromatic: boolean;
  /** The number after `:` in a bracket atom; 0 when there is none. */
  readonly atomClass: number;
  /** Where it stands in the text it was read from (SMILES or name). */
  readonly range: TextRange;
}

/** Bond order of the Kekulé form; 0 is a bond of no definite order (`~`, dative to a metal). */
export type BondOrder = 0 | 1 | 2 | 3 | 4;

export interface Bond {
  readonly from: number;
  readonly to: number;
  /** An aromatic bond carries the order that it has in one valid Kekulé form. */
  readonly order: BondOrder;
  /** Written as aromatic (between lower-case atoms without a symbol, or `:`). */
  readonly aromatic: boolean;
  readonly range: TextRange;
}

export interface Neighbour {
  readonly atom: number;
  readonly bond: number;
}

/** Four ligands round a centre: seen from the first, the other three run clockwise or counter-clockwise. */
export interface TetrahedralStereo {
  readonly kind: 'tetrahedral';
  readonly centre: number;
  /** Atom indices; at most one is IMPLICIT_LIGAND. */
  readonly ligands: readonly [number, number, number, number];
  readonly clockwise: boolean;
}

/** A double bond (or a cumulene with an odd number of double bonds) with one reference ligand at either end. */
export interface DoubleBondStereo {
  readonly kind: 'double-bond';
  /** The two end atoms of the double bond or cumulene. */
  readonly ends: readonly [number, number];
  /** An atom on either end, in the order of `ends`. */
  readonly ligands: readonly [number, number];
  /** Both reference ligands lie on the same side. */
  readonly sameSide: boolean;
}

/**
 * A cumulene with an even number of double bonds (allene): the first two ligands are on the first end, the
 * last two on the second. Seen from the first ligand, the other three run clockwise or counter-clockwise, as
 * if the four sat round one centre.
 */
export interface AxialStereo {
  readonly kind: 'axis';
  readonly ends: readonly [number, number];
  readonly ligands: readonly [number, number, number, number];
  readonly clockwise: boolean;
}

/** Square-planar, trigonal-bipyramidal and octahedral classes are kept as written and compared as such. */
export interface PolyhedralStereo {
  readonly kind: 'SP' | 'TB' | 'OH';
  readonly centre: number;
  readonly ligands: readonly number[];
  /** The OpenSMILES permutation number: SP1–3, TB1–20, OH1–30. */
  readonly permutation: number;
}

export type StereoElement = TetrahedralStereo | DoubleBondStereo | AxialStereo | PolyhedralStereo;

/** A statement about space on an atom that cannot carry it, such as `@` on an atom with three neighbours. */
export interface StrayStereo {
  readonly atom: number;
  /** What was written: `@`, `@@`, `@SP1` … */
  readonly statement: string;
  readonly range: TextRange;
}

export interface Molecule {
  readonly atoms: readonly Atom[];
  readonly bonds: readonly Bond[];
  /** For each atom its neighbours, in the order in which the bonds were made. */
  readonly neighbours: readonly (readonly Neighbour[])[];
  /** The arrangements that were stated; whatever is not here is open. */
  readonly stereo: readonly StereoElement[];
  /** Statements that fit no arrangement at all; they change nothing, and a check says so. */
  readonly stray?: readonly StrayStereo[];
}

const nowhere: TextRange = { start: 0, end: 0 };

/** Builds a molecule atom by atom; `build` hands it over and the builder must not be used afterwards. */
export class MoleculeBuilder {
  readonly atoms: Atom[] = [];
  readonly bonds: Bond[] = [];
  readonly neighbours: Neighbour[][] = [];
  readonly stereo: StereoElement[] = [];
  readonly stray: StrayStereo[] = [];

  /** Adds an atom and returns its index. What is left out is 0, false, or an empty range. */
  addAtom(atomicNumber: number, more: Partial<Omit<Atom, 'atomicNumber'>> = {}): number {
    this.atoms.push({
      atomicNumber,
      isotope: more.isotope ?? 0,
      charge: more.charge ?? 0,
      hydrogens: more.hydrogens ?? 0,
      aromatic: more.aromatic ?? false,
      atomClass: more.atomClass ?? 0,
      range: more.range ?? nowhere,
    });
    this.neighbours.push([]);
    return this.atoms.length - 1;
  }

  /** The same for an atom of a SMILES without brackets; the shortest way, because nearly all atoms come by it. */
  addPlainAtom(atomicNumber: number, aromatic: boolean, start: number, end: number): number {
    this.atoms.push({
      atomicNumber,
      isotope: 0,
      charge: 0,
      hydrogens: 0,
      aromatic,
      atomClass: 0,
      range: { start, end },
    });
    this.neighbours.push([]);
    return this.atoms.length - 1;
  }

  /** Adds a bond between two atoms already added and returns its index. */
  addBond(
    from: number,
    to: number,
    order: BondOrder = 1,
    aromatic = false,
    range: TextRange = nowhere,
  ): number {
    const bond = this.bonds.push({ from, to, order, aromatic, range }) - 1;
    this.neighbours[from]!.push({ atom: to, bond });
    this.neighbours[to]!.push({ atom: from, bond });
    return bond;
  }

  build(): Molecule {
    return this;
  }
}

/** The bond between two atoms, or undefined. */
export function bondBetween(molecule: Molecule, first: number, second: number): Bond | undefined {
  const found = molecule.neighbours[first]?.find((neighbour) => neighbour.atom === second);
  return found && molecule.bonds[found.bond];
}

/** The atoms at which an arrangement stands: its centre, or its two ends. */
export function atomsOfPlace(
  place: { readonly centre: number } | { readonly ends: readonly [number, number] },
): readonly number[] {
  return 'centre' in place ? [place.centre] : place.ends;
}

/** The same atoms and bonds with other stereo statements. */
export function withStereo(molecule: Molecule, stereo: readonly StereoElement[]): Molecule {
  return { atoms: molecule.atoms, bonds: molecule.bonds, neighbours: molecule.neighbours, stereo };
}

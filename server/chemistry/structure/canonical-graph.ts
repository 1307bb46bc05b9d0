/**
 * A connected part of a structure reduced to what decides sameness: coloured atoms, coloured bonds, and the stated
 * arrangements. The canonical labelling works on this.
 */
import { resonantBonds } from './resonance.ts';
import { atomsOfPlace, type Bond, type Molecule, type StereoElement } from './molecule.ts';
import { mappedElement } from './stereo-elements.ts';

export interface CanonicalGraph {
  /** Atoms of the molecule, by vertex. */
  readonly atoms: readonly number[];
  /** Initial colour of each vertex; equal colours mean that nothing local tells the atoms apart. */
  readonly colours: readonly number[];
  /** Neighbouring vertices with the kind of the bond: its order, or 5 for a resonant one. */
  readonly links: readonly (readonly { readonly vertex: number; readonly kind: number }[])[];
  /** With atom indices replaced by vertices. */
  readonly stereo: readonly StereoElement[];
}

export const RESONANT = 5;

export interface SamenessOptions {
  /** Stated arrangements count. Default true. */
  readonly stereo?: boolean;
  /** Isotope labels count. Default true. */
  readonly isotopes?: boolean;
}

// A pure function's results, kept as long as the bonds they are about; nobody can see this memory.
const knownKinds = new WeakMap<readonly Bond[], readonly number[]>();

/** The kind of every bond: its order, or RESONANT. */
export function bondKinds(molecule: Molecule): readonly number[] {
  const known = knownKinds.get(molecule.bonds);
  if (known !== undefined) return known;
  const resonant = resonantBonds(molecule);
  const kinds = molecule.bonds.map((bond, index) => (resonant[index] ? RESONANT : bond.order));
  knownKinds.set(molecule.bonds, kinds);
  return kinds;
}

/** `members` are the atoms of one connected part; `kinds` as bondKinds gives them. */
export function canonicalGraph(
  molecule: Molecule,
  members: readonly number[],
  kinds: readonly number[],
  options: SamenessOptions = {},
): CanonicalGraph {
  const whole = members.length === molecule.atoms.length;
  const vertexOf = new Map<number, number>();
  if (!whole) members.forEach((atom, vertex) => vertexOf.set(atom, vertex));
  const vertex = (atom: number) => (whole || atom < 0 ? atom : vertexOf.get(atom)!);
  const colours = members.map((index) => {
    const atom = molecule.atoms[index]!;
    const isotope = options.isotopes === false ? 0 : atom.isotope;
    // Multiplied, not shifted: 118 elements, mass numbers and hydrogens below 2^17 as the reader bounds them, charges
    // within ±31 and the degree stay exact within 53 bits.
    const nuclide = atom.atomicNumber * 2 ** 17 + isotope;
    const charged = nuclide * 64 + (atom.charge + 32);
    return (charged * 2 ** 17 + atom.hydrogens) * 64 + Math.min(molecule.neighbours[index]!.length, 63);
  });
  const links = members.map((index) =>
    molecule.neighbours[index]!.map(({ atom, bond }) => ({ vertex: vertex(atom), kind: kinds[bond]! })),
  );
  const stereo =
    options.stereo === false
      ? []
      : molecule.stereo
          .filter((element) => whole || vertexOf.has(atomsOfPlace(element)[0]!))
          .map((element) => mappedElement(element, vertex));
  return { atoms: members, colours, links, stereo };
}

/**
 * A form of a structure in which it does not matter where acidic protons sit: an amine with hydrogen chloride and its
 * ammonium chloride, an amino acid and its zwitterion, are one compound written in two ways.
 */
import type { Atom, Molecule } from '../../chemistry/structure/molecule.ts';

/** Every protonated atom gives its proton up, every anion takes one. Compositions must be compared before. */
export function protonFree(molecule: Molecule): Molecule {
  return {
    ...molecule,
    atoms: molecule.atoms.map((atom, index) => settled(molecule, atom, index)),
    stereo: [],
  };
}

function settled(molecule: Molecule, atom: Atom, index: number): Atom {
  if (!heteroatoms.has(atom.atomicNumber)) return atom;
  // The halves of a nitro group or an N-oxide hold each other's charge.
  const balanced = molecule.neighbours[index]!.some(
    ({ atom: other }) => molecule.atoms[other]!.charge * atom.charge < 0,
  );
  if (atom.charge > 0 && atom.hydrogens > 0 && !balanced) {
    const protons = Math.min(atom.charge, atom.hydrogens);
    return { ...atom, charge: atom.charge - protons, hydrogens: atom.hydrogens - protons };
  }
  return atom.charge < 0 && !balanced
    ? { ...atom, charge: 0, hydrogens: atom.hydrogens - atom.charge }
    : atom;
}

/** N, O, F, P, S, Cl, Se, Br, I. */
const heteroatoms = new Set([7, 8, 9, 15, 16, 17, 34, 35, 53]);

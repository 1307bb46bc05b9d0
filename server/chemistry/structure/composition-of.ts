/** From a structure to what it is made of. */
import type { Composition } from '../composition/composition.ts';
import { symbolOf } from '../composition/elements.ts';
import type { Molecule } from './molecule.ts';

/** Atoms, implied hydrogens and charge of all parts together. Unknown atoms `*` are left out. */
export function compositionOf(molecule: Molecule): Composition {
  const natural = new Map<number, number>();
  const counts = new Map<string, number>();
  let hydrogens = 0;
  let charge = 0;
  for (const atom of molecule.atoms) {
    hydrogens += atom.hydrogens;
    charge += atom.charge;
    if (atom.atomicNumber === 0) continue;
    if (atom.isotope === 0) natural.set(atom.atomicNumber, (natural.get(atom.atomicNumber) ?? 0) + 1);
    else {
      const kind = `${atom.isotope}${symbolOf(atom.atomicNumber)}`;
      counts.set(kind, (counts.get(kind) ?? 0) + 1);
    }
  }
  if (hydrogens > 0) natural.set(1, (natural.get(1) ?? 0) + hydrogens);
  for (const [atomicNumber, count] of natural) counts.set(symbolOf(atomicNumber), count);
  return { counts, charge };
}

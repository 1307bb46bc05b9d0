/** Hydrogens for structures that come from names, where only the heavy atoms are given. */
import type { Atom, MoleculeBuilder } from './molecule.ts';
import { usualValences } from './valence-model.ts';

/** Sum of the bond orders at an atom, hydrogens of the graph counted as the bonds they are, implied ones not. */
export function bondOrderSum(builder: Pick<MoleculeBuilder, 'bonds' | 'neighbours'>, atom: number): number {
  let sum = 0;
  for (const neighbour of builder.neighbours[atom]!) sum += builder.bonds[neighbour.bond]!.order;
  return sum;
}

/**
 * Fills every atom, or those given, up to the lowest usual valence that holds its bonds; what it had is replaced.
 * Atoms without usual valences (metals) and those beyond their highest get none.
 */
export function fillHydrogens(builder: MoleculeBuilder, atoms?: Iterable<number>): void {
  for (const index of atoms ?? builder.atoms.keys()) {
    const atom = builder.atoms[index]! as { -readonly [Key in keyof Atom]: Atom[Key] };
    const bonds = bondOrderSum(builder, index);
    const valence = usualValences(atom.atomicNumber, atom.charge)?.find((usual) => usual >= bonds);
    atom.hydrogens = valence === undefined ? 0 : valence - bonds;
  }
}

/** Bonds between two rings that cannot turn: biaryls with groups beside the bond on both sides (P-92.1.2.2.1.1). */
import type { Molecule } from './molecule.ts';
import { ringBonds } from './rings.ts';

/**
 * Whether the molecule has a bond between two unsaturated rings with at least three of the four places beside it taken.
 * Such an axis can be a stereogenic unit; whether it is, and its arrangement, are not followed here.
 */
export function hasHinderedAxis(molecule: Molecule): boolean {
  const { atoms, bonds, neighbours } = molecule;
  const inRing = ringBonds(molecule);
  const isUnsaturated = (atom: number) =>
    atoms[atom]!.aromatic || neighbours[atom]!.some(({ bond }) => bonds[bond]!.order === 2);
  const beside = (atom: number) => neighbours[atom]!.filter(({ bond }) => inRing[bond]);
  const taken = (atom: number) => beside(atom).filter((one) => neighbours[one.atom]!.length > 2).length;
  return bonds.some(
    ({ from, to, order }, bond) =>
      order === 1 &&
      !inRing[bond] &&
      [from, to].every((end) => beside(end).length === 2 && isUnsaturated(end) && taken(end) > 0) &&
      taken(from) + taken(to) > 2,
  );
}

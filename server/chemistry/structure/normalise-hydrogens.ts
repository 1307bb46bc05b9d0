/** Hydrogens written as atoms, without label or charge, become part of the atom that they are on. */
import {
  type Atom,
  IMPLICIT_LIGAND,
  type Molecule,
  MoleculeBuilder,
  type StereoElement,
} from './molecule.ts';

/** Returns the molecule itself when there is nothing to fold. */
export function foldHydrogens(molecule: Molecule): Molecule {
  const folds = molecule.atoms.map((atom, index) => canFold(molecule, atom, index));
  if (!folds.includes(true)) return molecule;
  const builder = new MoleculeBuilder();
  const newIndex = molecule.atoms.map((atom, index) => {
    if (folds[index]) return IMPLICIT_LIGAND;
    const more = molecule.neighbours[index]!.filter((neighbour) => folds[neighbour.atom]).length;
    return builder.addAtom(atom.atomicNumber, { ...atom, hydrogens: atom.hydrogens + more });
  });
  for (const { from, to, order, aromatic, range } of molecule.bonds) {
    if (!folds[from] && !folds[to]) builder.addBond(newIndex[from]!, newIndex[to]!, order, aromatic, range);
  }
  for (const element of molecule.stereo) {
    const moved = movedElement(molecule, element, newIndex);
    if (moved !== undefined) builder.stereo.push(moved);
  }
  for (const stray of molecule.stray ?? []) {
    if (!folds[stray.atom]) builder.stray.push({ ...stray, atom: newIndex[stray.atom]! });
  }
  return builder.build();
}

function canFold(molecule: Molecule, atom: Atom, index: number): boolean {
  if (atom.atomicNumber !== 1 || atom.isotope !== 0 || atom.charge !== 0 || atom.hydrogens !== 0)
    return false;
  const [only, second] = molecule.neighbours[index]!;
  if (only === undefined || second !== undefined || molecule.bonds[only.bond]!.order !== 1) return false;
  const { atomicNumber, isotope } = molecule.atoms[only.atom]!;
  return atomicNumber !== 1 || isotope !== 0;
}

function movedElement(
  molecule: Molecule,
  element: StereoElement,
  newIndex: readonly number[],
): StereoElement | undefined {
  const moved = (atom: number) => (atom < 0 ? atom : newIndex[atom]!);
  switch (element.kind) {
    case 'tetrahedral':
    case 'axis': {
      const [a, b, c, d] = element.ligands.map(moved);
      // More hydrogens than the elements allow for: two on a centre, or two on one end of an axis.
      const hydrogens = [a, b, c, d].map((ligand) => ligand === IMPLICIT_LIGAND);
      const tooMany =
        element.kind === 'tetrahedral'
          ? hydrogens.filter(Boolean).length > 1
          : (hydrogens[0] && hydrogens[1]) || (hydrogens[2] && hydrogens[3]);
      if (tooMany) return undefined;
      const ligands = [a!, b!, c!, d!] as const;
      return element.kind === 'tetrahedral'
        ? { ...element, centre: moved(element.centre), ligands }
        : { ...element, ends: [moved(element.ends[0]), moved(element.ends[1])], ligands };
    }
    case 'double-bond': {
      let { sameSide } = element;
      const ligands = element.ligands.map((ligand, side) => {
        if (moved(ligand) !== IMPLICIT_LIGAND) return moved(ligand);
        // The other ligand of this end stands on the other side.
        sameSide = !sameSide;
        const end = element.ends[side]!;
        const other = molecule.neighbours[end]!.find(
          (neighbour) => neighbour.atom !== ligand && molecule.bonds[neighbour.bond]!.order === 1,
        );
        return other === undefined ? IMPLICIT_LIGAND : moved(other.atom);
      });
      if (ligands.includes(IMPLICIT_LIGAND)) return undefined;
      return {
        ...element,
        ends: [moved(element.ends[0]), moved(element.ends[1])],
        ligands: [ligands[0]!, ligands[1]!],
        sameSide,
      };
    }
    default:
      return { ...element, centre: moved(element.centre), ligands: element.ligands.map(moved) };
  }
}

/**
 * Which atoms, double bonds and cumulenes of a structure can hold an arrangement at all, by their bonding alone. Whether
 * their ligands differ is not asked here.
 *
 * Tetrahedral: carbon, silicon and germanium with four ligands; ammonium nitrogen and phosphorus with four; the pyramids
 * of phosphines, sulfoxides, sulfonium salts and their selenium analogues, which keep their shape at room temperature.
 * Amines turn over and are none, unless a bridgehead nitrogen is stated to have an arrangement (Tröger's base). Allene
 * axes end at carbon: carbodiimides and ketenimines turn over at nitrogen (common practice, no source). Double bonds: C=C, C=N with a substituent on nitrogen, N=N; not in rings of fewer than
 * eight atoms (P-31.1.4.3.4: cyclooctene is the smallest ring with a trans form that can be kept), and not where a
 * mobile hydrogen moves the double bond (amidines and guanidines; common practice, no source). Biaryl axes are not
 * covered.
 */
import { bondKinds, RESONANT } from './canonical-graph.ts';
import { walkCumulene } from './cumulene.ts';
import type { Molecule } from './molecule.ts';
import { ringBonds, smallestRingThrough } from './rings.ts';

export type StereoCandidate =
  | {
      readonly kind: 'tetrahedral';
      readonly centre: number;
      readonly ligands: readonly [number, number, number, number];
    }
  | {
      readonly kind: 'double-bond';
      readonly ends: readonly [number, number];
      readonly ligands: readonly [number, number];
    }
  | {
      readonly kind: 'axis';
      readonly ends: readonly [number, number];
      readonly ligands: readonly [number, number, number, number];
    };

/** Smallest ring in which a double bond can be trans. */
const smallestTransRing = 8;

/** Centres first, by atom; then double bonds and axes, by bond. The molecule must be in its normal spelling. */
export function stereoCandidates(molecule: Molecule): StereoCandidate[] {
  const kinds = bondKinds(molecule);
  const inRing = ringBonds(molecule);
  const isHeldNitrogen = (atom: number) =>
    molecule.stereo.some((element) => element.kind === 'tetrahedral' && element.centre === atom) &&
    molecule.neighbours[atom]!.every(({ bond }) => inRing[bond]);
  const candidates: StereoCandidate[] = [];
  for (let atom = 0; atom < molecule.atoms.length; atom++) {
    const ligands = tetrahedralLigands(molecule, atom, kinds, isHeldNitrogen);
    if (ligands !== undefined) candidates.push({ kind: 'tetrahedral', centre: atom, ligands });
  }
  for (let index = 0; index < molecule.bonds.length; index++) {
    const bond = molecule.bonds[index]!;
    if (bond.order !== 2 || kinds[index] === RESONANT) continue;
    const left = walkCumulene(molecule, bond.to, bond.from);
    const right = walkCumulene(molecule, bond.from, bond.to);
    // Each cumulene once, from its first double bond.
    if (left.length > 1) continue;
    const doubles = right.length;
    const ends = [left.end, right.end] as const;
    const first = endLigands(molecule, left.end, left.inward);
    const second = endLigands(molecule, right.end, right.inward);
    if (first === undefined || second === undefined) continue;
    if (doubles % 2 === 0) {
      if (ends.every((end) => molecule.atoms[end]!.atomicNumber !== 7))
        candidates.push({ kind: 'axis', ends, ligands: [...first, ...second] });
    } else if (
      !(inRing[index] && smallestRingThrough(molecule, index, smallestTransRing - 1)) &&
      !hasMobileHydrogen(molecule, ends)
    ) {
      const [one, other] = [first.find((ligand) => ligand >= 0), second.find((ligand) => ligand >= 0)];
      if (one !== undefined && other !== undefined)
        candidates.push({ kind: 'double-bond', ends, ligands: [one, other] });
    }
  }
  return candidates;
}

function tetrahedralLigands(
  molecule: Molecule,
  index: number,
  kinds: readonly number[],
  isHeldNitrogen: (atom: number) => boolean,
): [number, number, number, number] | undefined {
  const { atomicNumber, charge, hydrogens } = molecule.atoms[index]!;
  const neighbours = molecule.neighbours[index]!;
  if (hydrogens > 1 || neighbours.length < 3 || neighbours.length > 4) return undefined;
  let doubles = 0;
  for (const { bond } of neighbours) {
    if (kinds[bond] === RESONANT) return undefined;
    if (kinds[bond] === 2) doubles++;
    else if (kinds[bond] !== 1) return undefined;
  }
  const ligandCount = neighbours.length + hydrogens;
  const possible = (() => {
    switch (atomicNumber) {
      case 6:
      case 14:
      case 32:
      case 50:
        return charge === 0 && ligandCount === 4 && doubles === 0;
      case 7:
        return (
          (charge === 1 && neighbours.length === 4) ||
          (charge === 0 &&
            neighbours.length === 3 &&
            hydrogens === 0 &&
            doubles === 0 &&
            isHeldNitrogen(index))
        );
      case 15:
      case 33:
        return ligandCount === 4
          ? doubles <= 1
          : ligandCount === 3 && hydrogens === 0 && doubles === 0 && charge === 0;
      case 16:
      case 34:
      case 52:
        return ligandCount === 4
          ? doubles === 2
          : ligandCount === 3 && hydrogens === 0 && doubles + charge === 1;
      default:
        return false;
    }
  })();
  if (!possible || (doubles > 0 && hasTwinOfDoubleBond(molecule, index))) return undefined;
  const ligands = neighbours.map(({ atom }) => atom);
  if (ligands.length === 3) ligands.push(-1);
  return [ligands[0]!, ligands[1]!, ligands[2]!, ligands[3]!];
}

/**
 * P(=O)OH, P(=O)O⁻ and the like: the proton or charge is on either of two like atoms, so that they are one kind of ligand
 * (common practice, no source).
 */
function hasTwinOfDoubleBond(molecule: Molecule, centre: number): boolean {
  const ends = molecule.neighbours[centre]!.map(({ atom, bond }) => ({
    atom: molecule.atoms[atom]!,
    isTerminal: molecule.neighbours[atom]!.length === 1,
    order: molecule.bonds[bond]!.order,
  })).filter(({ isTerminal }) => isTerminal);
  return ends.some(
    (one) =>
      one.order === 2 &&
      ends.some(
        (other) =>
          other.order === 1 &&
          other.atom.atomicNumber === one.atom.atomicNumber &&
          other.atom.isotope === one.atom.isotope &&
          (other.atom.hydrogens > 0 || other.atom.charge < 0),
      ),
  );
}

/** The two ligands at an end, −1 for a hydrogen or lone pair; undefined where an end cannot tell its sides apart. */
function endLigands(molecule: Molecule, end: number, inward: number): [number, number] | undefined {
  const { atomicNumber, hydrogens, charge } = molecule.atoms[end]!;
  const others = molecule.neighbours[end]!.filter(({ atom }) => atom !== inward);
  if (others.some(({ bond }) => molecule.bonds[bond]!.order !== 1)) return undefined;
  const ligands = others.map(({ atom }) => atom);
  if (atomicNumber === 6 || atomicNumber === 14) {
    if (ligands.length === 2 && hydrogens === 0) return [ligands[0]!, ligands[1]!];
    return ligands.length === 1 && hydrogens === 1 ? [ligands[0]!, -1] : undefined;
  }
  if (atomicNumber !== 7) return undefined;
  if (charge === 0 && ligands.length === 1 && hydrogens === 0) return [ligands[0]!, -1];
  if (charge === 1 && ligands.length === 2 && hydrogens === 0) return [ligands[0]!, ligands[1]!];
  return undefined;
}

/** C=N whose carbon carries N–H, or whose nitrogen could hand its double bond on to one. */
function hasMobileHydrogen(molecule: Molecule, ends: readonly [number, number]): boolean {
  const [carbon, nitrogen] = molecule.atoms[ends[0]]!.atomicNumber === 6 ? ends : [ends[1], ends[0]];
  if (molecule.atoms[nitrogen]!.atomicNumber !== 7 || molecule.atoms[carbon]!.atomicNumber !== 6)
    return false;
  return molecule.neighbours[carbon]!.some(({ atom }) => {
    const { atomicNumber, hydrogens } = molecule.atoms[atom]!;
    return (
      atom !== nitrogen && (atomicNumber === 7 || atomicNumber === 8 || atomicNumber === 16) && hydrogens > 0
    );
  });
}

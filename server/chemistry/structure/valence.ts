/**
 * Whether every atom forms a number of bonds that its element can form. Only what cannot be is reported: an atom
 * with fewer bonds than usual is a radical or a carbene, and metals bond as they like.
 */
import { elementWithNumber, isMetal, symbolOf } from '../composition/elements.ts';
import type { TextRange } from '../text.ts';
import type { Molecule } from './molecule.ts';
import { usualValences } from './valence-model.ts';

export interface ValenceProblem {
  readonly atom: number;
  /** The atom in the text. */
  readonly range: TextRange;
  /** Bond orders and implied hydrogens together. */
  readonly bondsCounted: number;
  /** What is usual for this element and charge, ascending. */
  readonly usual: readonly number[];
  /** What is wrong, why, and what to do. */
  readonly message: string;
}

export function valenceProblems(molecule: Molecule): ValenceProblem[] {
  const problems: ValenceProblem[] = [];
  for (let index = 0; index < molecule.atoms.length; index++) {
    const atom = molecule.atoms[index]!;
    if (atom.atomicNumber === 0 || isMetal(atom.atomicNumber)) continue;
    const usual = usualValences(atom.atomicNumber, atom.charge);
    if (usual === undefined) continue;
    const bonds = countBonds(molecule, index);
    if (bonds === undefined || isPossible(molecule, index, bonds, usual)) continue;
    problems.push({
      atom: index,
      range: atom.range,
      bondsCounted: bonds,
      usual,
      message: messageFor(molecule, index, bonds, usual),
    });
  }
  return problems;
}

/** Undefined where counting two-electron bonds says nothing: next to metals, in boron clusters, bonds of no order. */
function countBonds(molecule: Molecule, index: number): number | undefined {
  const atom = molecule.atoms[index]!;
  let bonds = atom.hydrogens;
  let borons = 0;
  for (const neighbour of molecule.neighbours[index]!) {
    const { order } = molecule.bonds[neighbour.bond]!;
    const other = molecule.atoms[neighbour.atom]!.atomicNumber;
    // A ligand may give a metal its lone pair without a charge being written for it.
    if (order === 0 || isMetal(other)) return undefined;
    if (other === 1 && molecule.neighbours[neighbour.atom]!.length > 1) return undefined;
    if (other === 5) borons++;
    bonds += order;
  }
  // Bridging hydrogens and cages share two electrons among three atoms and more.
  const inCluster = borons >= 2 && (atom.atomicNumber === 1 || atom.atomicNumber === 5 || borons >= 3);
  return inCluster ? undefined : bonds;
}

function isPossible(molecule: Molecule, index: number, bonds: number, usual: readonly number[]): boolean {
  const { atomicNumber, charge } = molecule.atoms[index]!;
  if (atomicNumber === 7 && charge === 0 && bonds > 3) return isOldNitrogenSpelling(molecule, index, bonds);
  if (charge === 0 && isHalogen(atomicNumber) && bonds > 1)
    return isHypervalentHalogen(molecule, index, bonds);
  return bonds <= usual[usual.length - 1]!;
}

const isHalogen = (atomicNumber: number) =>
  atomicNumber === 9 || atomicNumber === 17 || atomicNumber === 35 || atomicNumber === 53;

/**
 * Five bonds on an uncharged nitrogen are the old way to write nitro, N-oxide, nitrone, azide and diazo groups: all
 * have a double bond to oxygen, or a double and a triple bond to nitrogen or carbon.
 */
function isOldNitrogenSpelling(molecule: Molecule, index: number, bonds: number): boolean {
  if (bonds !== 5 || molecule.atoms[index]!.hydrogens > 1) return false;
  let triple = false;
  for (const neighbour of molecule.neighbours[index]!) {
    const { order } = molecule.bonds[neighbour.bond]!;
    if (order === 2 && molecule.atoms[neighbour.atom]!.atomicNumber === 8) return true;
    triple ||= order === 3;
  }
  return triple;
}

/** Chlorine, bromine and iodine with more than one bond: oxo acids, interhalogens, iodanes. */
function isHypervalentHalogen(molecule: Molecule, index: number, bonds: number): boolean {
  const { atomicNumber } = molecule.atoms[index]!;
  if (atomicNumber === 9 || bonds > 7) return false;
  const partners = molecule.neighbours[index]!.map(
    (neighbour) => molecule.atoms[neighbour.atom]!.atomicNumber,
  );
  const electronegative = partners.some((partner) => partner === 8 || partner === 7 || isHalogen(partner));
  return electronegative || (atomicNumber === 53 && bonds !== 2);
}

const numberWords = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine'];

function counted(bonds: number): string {
  return `${numberWords[bonds] ?? bonds} ${bonds === 1 ? 'bond' : 'bonds'}`;
}

function messageFor(molecule: Molecule, index: number, total: number, usual: readonly number[]): string {
  const { atomicNumber, charge, hydrogens: all } = molecule.atoms[index]!;
  // The notation fills a nitrogen with four bonds up to five; that hydrogen is nobody's intention.
  const filled = atomicNumber === 7 && charge === 0 && total === 5 && all === 1;
  const bonds = filled ? 4 : total;
  const hydrogens = filled ? 0 : all;
  const name = elementWithNumber(atomicNumber)?.name ?? symbolOf(atomicNumber);
  const sign = charge === 0 ? '' : ` with charge ${charge > 0 ? '+' : '−'}${Math.abs(charge)}`;
  const limit =
    atomicNumber === 7 && charge === 0 ? [3] : isHalogen(atomicNumber) && charge === 0 ? [1] : usual;
  const hydrogenPart =
    hydrogens === 0
      ? ''
      : `, ${hydrogens === 1 ? 'one of them' : `${numberWords[hydrogens] ?? hydrogens} of them`} to hydrogen`;
  const allowed = limit.map((count) => numberWords[count] ?? count).join(' or ');
  return `This ${name}${sign} has ${counted(bonds)}${hydrogenPart}; ${name}${sign} forms ${allowed}. ${advice(atomicNumber, charge, bonds)}`;
}

function advice(atomicNumber: number, charge: number, bonds: number): string {
  if (atomicNumber === 7 && charge === 0) {
    return bonds <= 5
      ? 'If it is an ammonium, iminium or pyridinium nitrogen, write its charge: [N+], [NH+] or [n+].'
      : 'Take a substituent off, or check where a branch ends.';
  }
  if (atomicNumber === 8 && charge === 0 && bonds === 3)
    return 'If it is an oxonium oxygen, write its charge: [O+].';
  if (atomicNumber === 5 && charge === 0 && bonds === 4)
    return 'If it is a borate or an adduct, write its charge: [B-].';
  if (atomicNumber === 15 && charge === 0)
    return 'If it is a phosphonium or a phosphate anion, write its charge.';
  return 'Take a substituent off, lower a bond order, or check where a branch ends.';
}

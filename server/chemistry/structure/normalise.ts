/**
 * One spelling for structures that chemists draw in several ways: nitro, azide and the like with charges, sulfoxides and
 * phosphine oxides without, alkali and alkaline-earth salts and ammonium salts in one form, plain hydrogens folded into
 * their atoms. Tautomers stay apart. Atoms keep their places in the text.
 */
import { foldHydrogens } from './normalise-hydrogens.ts';
import type { Atom, Bond, Molecule } from './molecule.ts';

type Mutable<T> = { -readonly [Key in keyof T]: T[Key] };

interface Draft {
  readonly atoms: Mutable<Atom>[];
  readonly bonds: (Mutable<Bond> | undefined)[];
  readonly molecule: Molecule;
}

/** Returns the molecule itself when there is nothing to do. */
export function normalise(molecule: Molecule): Molecule {
  const folded = foldHydrogens(molecule);
  if (!needsCharges(folded)) return folded;
  const draft: Draft = {
    atoms: folded.atoms.map((atom) => ({ ...atom })),
    bonds: folded.bonds.map((bond) => ({ ...bond })),
    molecule: folded,
  };
  cutSalts(draft);
  for (let index = 0; index < draft.atoms.length; index++) {
    separateNitrogen(draft, index);
    joinHypervalent(draft, index);
  }
  moveProtons(draft);
  return rebuilt(draft);
}

/** A quick look, so that the many molecules without anything of the kind cost nothing. */
function needsCharges(molecule: Molecule): boolean {
  return molecule.atoms.some(
    (atom, index) =>
      atom.charge !== 0 ||
      isSaltMetal(atom.atomicNumber) ||
      (atom.atomicNumber === 7 && orderSum(molecule, index) + atom.hydrogens > 3),
  );
}

function orderSum(molecule: Molecule, index: number): number {
  return molecule.neighbours[index]!.reduce(
    (sum, neighbour) => sum + molecule.bonds[neighbour.bond]!.order,
    0,
  );
}

const isHalogen = (atomicNumber: number) => [9, 17, 35, 53].includes(atomicNumber);
/** Li, Na, K, Rb, Cs and Mg, Ca, Sr, Ba. */
const isSaltMetal = (atomicNumber: number) => [3, 11, 19, 37, 55, 12, 20, 38, 56].includes(atomicNumber);
const isSaltPartner = (atomicNumber: number) =>
  isHalogen(atomicNumber) || [7, 8, 16, 34].includes(atomicNumber);

function linksOf({ molecule, bonds }: Draft, index: number) {
  return molecule.neighbours[index]!.filter((neighbour) => bonds[neighbour.bond] !== undefined);
}

/** `[Na]OC` is `[Na+].[O-]C`; a metal that is bonded to carbon keeps all its bonds. */
function cutSalts(draft: Draft): void {
  draft.atoms.forEach((metal, index) => {
    if (!isSaltMetal(metal.atomicNumber)) return;
    const links = linksOf(draft, index);
    if (
      !links.every(
        (link) => isSaltPartner(draft.atoms[link.atom]!.atomicNumber) && draft.bonds[link.bond]!.order === 1,
      )
    )
      return;
    for (const link of links) {
      draft.bonds[link.bond] = undefined;
      metal.charge++;
      draft.atoms[link.atom]!.charge--;
    }
  });
}

/** Five bonds on nitrogen become four and a charge: `N(=O)=O`, `n(=O)`, `N=N#N`, `C=N#N`. */
function separateNitrogen(draft: Draft, index: number): void {
  const nitrogen = draft.atoms[index]!;
  if (nitrogen.atomicNumber !== 7 || nitrogen.charge !== 0) return;
  const links = linksOf(draft, index);
  const sum = links.reduce((total, link) => total + draft.bonds[link.bond]!.order, nitrogen.hydrogens);
  if (sum !== 5) return;
  // Oxygen takes the charge before nitrogen does, and a terminal atom before one inside a chain.
  const candidates = links.filter(
    (link) => draft.bonds[link.bond]!.order >= 2 && [7, 8].includes(draft.atoms[link.atom]!.atomicNumber),
  );
  const chosen =
    candidates.find((link) => draft.atoms[link.atom]!.atomicNumber === 8) ??
    candidates.find((link) => linksOf(draft, link.atom).length === 1) ??
    candidates[0];
  if (chosen === undefined || draft.atoms[chosen.atom]!.charge !== 0) return;
  const bond = draft.bonds[chosen.bond]!;
  bond.order = (bond.order - 1) as Bond['order'];
  nitrogen.charge = 1;
  draft.atoms[chosen.atom]!.charge = -1;
}

/** `[S+]([O-])`, `[P+][O-]`, `[P+][CH-]`, `[Cl+3]([O-])…`: the charges become a double bond. */
function joinHypervalent(draft: Draft, index: number): void {
  const centre = draft.atoms[index]!;
  if (![15, 16, 33, 34, 17, 35, 53].includes(centre.atomicNumber)) return;
  for (const link of linksOf(draft, index)) {
    const other = draft.atoms[link.atom]!;
    const bond = draft.bonds[link.bond]!;
    if (centre.charge <= 0) return;
    if (
      other.charge >= 0 ||
      ![6, 7, 8, 16, 34].includes(other.atomicNumber) ||
      bond.order >= 3 ||
      bond.order < 1
    )
      continue;
    bond.order = (bond.order + 1) as Bond['order'];
    centre.charge--;
    other.charge++;
  }
}

/**
 * Zwitterions and ammonium salts are written without charges where each protonated nitrogen finds its anion; where the
 * numbers do not match, nothing is moved.
 */
function moveProtons(draft: Draft): void {
  const isNextTo = (index: number, test: (atom: Atom) => boolean) =>
    linksOf(draft, index).some((link) => test(draft.atoms[link.atom]!));
  const acids: number[] = [];
  const bases: number[] = [];
  draft.atoms.forEach((atom, index) => {
    if (atom.atomicNumber === 7 && atom.charge === 1 && atom.hydrogens > 0) {
      if (!isNextTo(index, (other) => other.charge < 0)) acids.push(index);
    } else if (atom.charge === -1 && [8, 16, 9, 17, 35, 53].includes(atom.atomicNumber)) {
      if (!isNextTo(index, (other) => other.charge > 0)) bases.push(index);
    }
  });
  if (acids.length === 0 || acids.length !== bases.length) return;
  for (const acid of acids) {
    draft.atoms[acid]!.charge = 0;
    draft.atoms[acid]!.hydrogens--;
  }
  for (const base of bases) {
    draft.atoms[base]!.charge = 0;
    draft.atoms[base]!.hydrogens++;
  }
}

function rebuilt({ atoms, bonds, molecule }: Draft): Molecule {
  const kept: Bond[] = [];
  const newIndex = bonds.map((bond) => (bond === undefined ? -1 : kept.push(bond) - 1));
  const neighbours = molecule.neighbours.map((list) =>
    list
      .filter((neighbour) => newIndex[neighbour.bond] !== -1)
      .map((neighbour) => ({ atom: neighbour.atom, bond: newIndex[neighbour.bond]! })),
  );
  return { ...molecule, atoms, bonds: kept, neighbours };
}

/** `cis` and `trans` (P-31.1.4.2.4, P-93.5.1.3): which of the stereoisomers have two groups on one side. */
import { onSameSideOfDoubleBond, onSameSideOfRing } from '../structure/assign-descriptors.ts';
import { IMPLICIT_LIGAND, type Molecule } from '../structure/molecule.ts';
import { smallestRingThrough } from '../structure/rings.ts';
import type { StereoisomerList } from '../structure/stereoisomers.ts';
import type { StereoWord } from './tree.ts';

/** What `cis` or `trans` says of a structure. */
export interface RelativeStatement {
  /** The atoms whose arrangement it is about. */
  readonly atoms: readonly number[];
  readonly agrees: (isomer: Molecule) => boolean;
}

/** What the word says of the isomers, or undefined when there is no place that it can be about. */
export function relativeStatement(
  list: StereoisomerList,
  letter: StereoWord['letter'],
  atoms: readonly number[],
): RelativeStatement | undefined {
  if (letter !== 'cis' && letter !== 'trans') return undefined;
  const cis = letter === 'cis';
  const { molecule } = list;
  const bonds = list.units.flatMap(({ candidate }) => (candidate.kind === 'double-bond' ? [candidate] : []));
  const centres = list.units.flatMap(({ candidate }) =>
    candidate.kind === 'tetrahedral' ? [candidate.centre] : [],
  );
  const own = bonds.filter(({ ends }) => ends.some((atom) => atoms.includes(atom)));
  const bond = own.length === 1 ? own[0]! : bonds.length === 1 ? bonds[0]! : undefined;
  if (bond && centres.filter((one) => atoms.includes(one)).length < 2) {
    const ligands = bond.ends.map((end) => singleLigand(molecule, end, bond.ends));
    if (ligands.some((one) => one === undefined)) return undefined;
    return {
      atoms: bond.ends,
      agrees: (isomer) => onSameSideOfDoubleBond(isomer, bond.ends, ligands as [number, number]) === cis,
    };
  }
  const inUnit = centres.filter((one) => atoms.includes(one));
  const pair = inUnit.length === 2 ? inUnit : centres.length === 2 ? centres : undefined;
  if (!pair) return undefined;
  const ring = ringOf(molecule, pair[0]!, pair[1]!);
  if (!ring) return undefined;
  const ligands = pair.map((centre) => {
    const outside = molecule.neighbours[centre]!.map((one) => one.atom).filter(
      (atom) => !ring.includes(atom),
    );
    return outside.length === 1 ? outside[0]! : undefined;
  });
  if (ligands.some((one) => one === undefined)) return undefined;
  return {
    atoms: pair,
    agrees: (isomer) =>
      onSameSideOfRing(
        isomer,
        ring,
        { centre: pair[0]!, ligand: ligands[0]! },
        { centre: pair[1]!, ligand: ligands[1]! },
      ) === cis,
  };
}

/** The only group, beside hydrogen, on one end of a double bond. */
function singleLigand(molecule: Molecule, end: number, ends: readonly [number, number]): number | undefined {
  const others = molecule.neighbours[end]!.map((one) => one.atom).filter((atom) => !ends.includes(atom));
  return others.length === 1 && others[0] !== IMPLICIT_LIGAND ? others[0] : undefined;
}

/** A smallest ring that holds both atoms, its atoms in order. */
function ringOf(molecule: Molecule, first: number, second: number): number[] | undefined {
  for (const { bond } of molecule.neighbours[first]!) {
    const ring = smallestRingThrough(molecule, bond, 12);
    if (ring?.includes(second)) return [...ring];
  }
  return undefined;
}

/** Parent hydrides as graphs with numbered atoms, before anything is put on them. */
import { readSmiles } from '../../structure/read-smiles.ts';
import type { StereoElement } from '../../structure/molecule.ts';

export interface SkeletonAtom {
  readonly atomicNumber: number;
  readonly charge: number;
  readonly isotope: number;
  /** Every locant by which the atom can be called; none for atoms without a number. */
  readonly locants: readonly string[];
  /** Belongs to a ring with the most non-cumulative double bonds possible; those bonds are set at the end. */
  readonly mancude: boolean;
  /** Hydrogens that are fixed, for atoms written in brackets. */
  readonly hydrogens?: number;
  /** Bonding number where the name gives another than the usual (λ convention, P-14.1). */
  readonly bonds?: number;
  /** Numbers of bonds of a metal atom whose groups the name lists; none given where any is possible. */
  readonly metal?: readonly number[];
}

export interface SkeletonGraph {
  readonly kind: 'chain' | 'ring' | 'fixed';
  readonly atoms: readonly SkeletonAtom[];
  /** `delocalised` false: a single bond between mancude rings. */
  readonly bonds: readonly { from: number; to: number; order: number; delocalised?: boolean }[];
  /** Atoms saturated when the name says nothing else (the usual tautomer, as 1H in indole). */
  readonly indicated: readonly number[];
  readonly stereo: readonly StereoElement[];
  /** The stereocentres are those of the L form; without `L-` or `D-` before the name they are open. */
  readonly series?: boolean;
  /** A name that takes groups only at places which it gives: hydroxycitronellal is no citronellal with a hydroxy group. */
  readonly guarded?: boolean;
  /** The stereocentres are those of the enantiomer with this sign; without a sign both enantiomers are meant. */
  readonly rotation?: '+' | '-';
  /** Not what the rules give, but met: meant only where nothing cheaper can be built. */
  readonly cost?: number;
  /** Written in front of the parent's name to tell it from its siblings: `o-`, `m-`, `p-`. */
  readonly mark?: string;
}

const carbon = (locants: readonly string[]): SkeletonAtom => ({
  atomicNumber: 6,
  charge: 0,
  isotope: 0,
  locants,
  mancude: false,
});

/** An unbranched chain of carbon, numbered from one end (P-21.2.1). */
export function chain(length: number): SkeletonGraph {
  const bonds = Array.from({ length: length - 1 }, (_, index) => ({ from: index, to: index + 1, order: 1 }));
  return { ...carbonSkeleton(length, bonds), kind: 'chain' };
}

/** A saturated ring system of carbon atoms numbered in order from 1; undefined when two atoms are joined twice. */
export function carbonSystem(size: number, bonds: SkeletonGraph['bonds']): SkeletonGraph | undefined {
  const pairs = new Set(
    bonds.map(({ from, to }) => `${String(Math.min(from, to))} ${String(Math.max(from, to))}`),
  );
  return pairs.size === bonds.length ? carbonSkeleton(size, bonds) : undefined;
}

function carbonSkeleton(size: number, bonds: SkeletonGraph['bonds']): SkeletonGraph {
  const atoms = Array.from({ length: size }, (_, index) => carbon([String(index + 1)]));
  return { kind: 'ring', atoms, bonds, indicated: [], stereo: [] };
}

/** A saturated ring of carbon (P-22.1.1). */
export function ring(size: number): SkeletonGraph {
  const open = chain(size);
  return { ...open, kind: 'ring', bonds: [...open.bonds, { from: 0, to: size - 1, order: 1 }] };
}

/** A metal atom without hydrogens, which takes as many bonds as the name says, of the numbers given. */
export function metalSkeleton(symbol: string, bonds: readonly number[]): SkeletonGraph | undefined {
  const skeleton = skeletonFromSmiles(`[${symbol}]`, symbol);
  return skeleton && { ...skeleton, atoms: skeleton.atoms.map((atom) => ({ ...atom, metal: bonds })) };
}

/**
 * A skeleton from the vocabulary. `locants` lists, in SMILES order, the locants of each atom (several joined by `/`,
 * `-` for none). Lower-case atoms are mancude; with `mancude` true all ring atoms written that can bear a double bond
 * are. `indicated` are the locants of the usual indicated hydrogen.
 */
export function skeletonFromSmiles(
  smiles: string,
  locants = '',
  mancude = false,
  indicated = '',
): SkeletonGraph | undefined {
  const molecule = readSmiles(smiles).value;
  if (!molecule) return undefined;
  const labels = locants === '' ? [] : locants.split(' ');
  const saturated = indicated === '' ? [] : indicated.split(' ');
  const atoms = molecule.atoms.map((atom, index): SkeletonAtom => {
    const own = labels[index] === undefined || labels[index] === '-' ? [] : labels[index].split('/');
    const canBear =
      atom.atomicNumber !== 8 &&
      atom.atomicNumber !== 16 &&
      atom.atomicNumber !== 34 &&
      atom.atomicNumber !== 52;
    const inRing = molecule.neighbours[index]!.length > 1;
    const isMancude = (atom.aromatic || (mancude && inRing)) && (canBear || atom.charge > 0);
    return {
      atomicNumber: atom.atomicNumber,
      charge: atom.charge,
      isotope: atom.isotope,
      locants: own,
      mancude: isMancude,
      ...(smiles[atom.range.start] === '[' && !isMancude ? { hydrogens: atom.hydrogens } : {}),
    };
  });
  return {
    kind: 'fixed',
    atoms,
    bonds: molecule.bonds.map((bond) => ({
      from: bond.from,
      to: bond.to,
      order:
        atoms[bond.from]!.mancude && atoms[bond.to]!.mancude && (bond.aromatic || mancude) ? 1 : bond.order,
      delocalised: bond.aromatic || mancude,
    })),
    indicated: atoms.flatMap((atom, index) =>
      (molecule.atoms[index]!.aromatic &&
        atom.atomicNumber !== 6 &&
        molecule.atoms[index]!.hydrogens > 0 &&
        atom.mancude) ||
      atom.locants.some((own) => saturated.includes(own))
        ? [index]
        : [],
    ),
    stereo: molecule.stereo,
  };
}

/** A structure while it is put together from a tree: atoms with the valence that they fill, and open questions. */
import { usualValences } from '../../structure/valence-model.ts';
import type { TextRange } from '../../text.ts';
import type { Locant, StereoWord } from '../tree.ts';
import type { StereoElement } from '../../structure/molecule.ts';
import { OPEN_LIGAND } from './open-skeleton.ts';
import type { SkeletonGraph } from './skeleton.ts';

export interface DraftAtom {
  atomicNumber: number;
  charge: number;
  isotope: number;
  /** Bonds and hydrogens that the atom has in the end. */
  capacity: number;
  mancude: boolean;
  saturated: boolean;
  range: TextRange;
}

/** Text to be written into the name where it left something open. */
export interface Insertion {
  readonly at: number;
  readonly text: string;
  /** How deep in the name's brackets it belongs: what is said of a group stands inside the bracket round it. */
  readonly depth: number;
}

/** Where descriptors of a unit's atoms are written. */
export interface Owner {
  readonly at: number;
  /** With brackets round the group up to here, where it has none. */
  readonly wrapTo?: number;
  readonly depth: number;
  /** The group stands for several, so that a descriptor cannot be about one of them. */
  readonly repeated: boolean;
}

/** A chain whose name holds only while no longer chain can be found; see `proper-chain.ts`. */
export interface ChainClaim {
  readonly atoms: readonly number[];
  /** Atoms of the chain that carry the principal group or free valence. */
  readonly principal: readonly number[];
  /** The places on it were chosen here, not given by the name. */
  readonly open: boolean;
  /** Parent of a whole word, saturated, so that the rule of the longest chain is not in dispute. */
  readonly plain: boolean;
  readonly range: TextRange;
}

/** One number for a pair of atoms, in either order; drafts stay far below so many atoms. */
export function ringBondKey(first: number, second: number): number {
  return first < second ? first * 0x100000 + second : second * 0x100000 + first;
}

const mostBondsOfMetal = 8;

export class Draft {
  readonly atoms: DraftAtom[] = [];
  readonly bonds: { from: number; to: number; order: number }[] = [];
  readonly neighbours: { atom: number; bond: number }[][] = [];
  readonly stereo: StereoElement[] = [];
  readonly insertions: Insertion[] = [];
  /** Brackets to be written in round compound groups. */
  readonly brackets: { readonly at: number; readonly end: number; readonly depth: number }[] = [];
  /** Descriptors with a locant: the atom that it names, and the atoms of its parent. */
  readonly wanted: { atom: number; atoms: readonly number[]; word: StereoWord }[] = [];
  /** Descriptors without, with the atoms of the parent that they stand before. */
  readonly loose: { atoms: readonly number[]; word: StereoWord }[] = [];
  readonly chains: ChainClaim[] = [];
  /** Usual indicated hydrogen, used when nothing else settles the double bonds. */
  readonly usualHydrogen: number[] = [];
  /** For atoms of a parent: its locant, and where the parent's name begins. */
  readonly named = new Map<number, { locant: Locant | undefined; parentAt: number; owner: Owner }>();
  /** The unit now being built. */
  owner: Owner = { at: 0, depth: 0, repeated: false };
  /** Bonds that belong to the skeletons of mancude rings, by `ringBondKey`. */
  readonly ringBonds = new Set<number>();
  /** Atoms whose bonding number the name gives (P-14.1). */
  readonly bonded = new Set<number>();
  /** Metal atoms, which bear no hydrogen, and the numbers of bonds that they can have. */
  readonly metals = new Map<number, readonly number[]>();
  cost = 0;
  failure: { range: TextRange; message: string } | undefined;

  fail(range: TextRange, message: string): undefined {
    this.failure ??= { range, message };
    return undefined;
  }

  /** Writes what was chosen into the unit now being built; the answer can be taken back. */
  insert(at: number, text: string): Insertion {
    const insertion = { at, text, depth: this.owner.depth };
    this.insertions.push(insertion);
    return insertion;
  }

  bond(from: number, to: number, order: number): void {
    const bond = this.bonds.push({ from, to, order }) - 1;
    this.neighbours[from]!.push({ atom: to, bond });
    this.neighbours[to]!.push({ atom: from, bond });
    this.#fillLigand(from, to);
    this.#fillLigand(to, from);
  }

  /** A stereocentre that waited for what its group is bound to. */
  #fillLigand(centre: number, ligand: number): void {
    if (this.stereo.length === 0) return;
    const place = this.stereo.findIndex(
      (element) =>
        element.kind === 'tetrahedral' && element.centre === centre && element.ligands.includes(OPEN_LIGAND),
    );
    const element = this.stereo[place];
    if (element?.kind !== 'tetrahedral') return;
    const ligands = element.ligands.map((one) => (one === OPEN_LIGAND ? ligand : one));
    this.stereo[place] = { ...element, ligands: ligands as unknown as typeof element.ligands };
  }

  orderSum(atom: number): number {
    let sum = 0;
    for (const { bond } of this.neighbours[atom]!) sum += this.bonds[bond]!.order;
    return sum;
  }

  /** Valence not yet used; a double bond to come in a mancude ring is not counted as used. */
  free(atom: number): number {
    return this.atoms[atom]!.capacity - this.orderSum(atom);
  }

  /** As `free`, but an atom of a mancude ring keeps what its double bond needs, unless it must be saturated. */
  freeBesideRing(atom: number): number {
    const own = this.atoms[atom]!;
    const spare = this.free(atom);
    return own.mancude && !own.saturated ? spare - 1 : spare;
  }

  /** Adds a skeleton; the answer lists the new atoms in its order. */
  addSkeleton(skeleton: SkeletonGraph, range: TextRange): number[] {
    const added = skeleton.atoms.map((atom) => {
      this.neighbours.push([]);
      const { atomicNumber, charge, isotope, mancude } = atom;
      return (
        this.atoms.push({ atomicNumber, charge, isotope, mancude, capacity: 0, saturated: false, range }) - 1
      );
    });
    for (const bond of skeleton.bonds) {
      const [from, to] = [added[bond.from]!, added[bond.to]!];
      this.bond(from, to, bond.order);
      if (
        skeleton.atoms[bond.from]!.mancude &&
        skeleton.atoms[bond.to]!.mancude &&
        bond.delocalised !== false
      ) {
        this.ringBonds.add(ringBondKey(from, to));
      }
    }
    skeleton.atoms.forEach((atom, index) => {
      if (atom.metal) this.metals.set(added[index]!, atom.metal);
      if (atom.bonds !== undefined) this.setBonds(added[index]!, atom.bonds);
      else this.settleCapacity(added[index]!, atom.hydrogens);
    });
    for (const index of skeleton.indicated) this.usualHydrogen.push(added[index]!);
    for (const element of skeleton.stereo) this.stereo.push(moved(element, added));
    return added;
  }

  /** Gives an atom the bonding number that the name says. */
  setBonds(atom: number, bonds: number): void {
    this.atoms[atom]!.capacity = bonds;
    this.bonded.add(atom);
  }

  /** `more`: bonds that are still to come and must fit. */
  settleCapacity(atom: number, hydrogens?: number, more = 0): void {
    const own = this.atoms[atom]!;
    if (this.metals.has(atom)) {
      own.capacity = mostBondsOfMetal;
      return;
    }
    const used = this.orderSum(atom) + more;
    own.capacity =
      hydrogens === undefined
        ? (usualValences(own.atomicNumber, own.charge)?.find((usual) => usual >= used) ?? used)
        : used + hydrogens;
  }
}

function moved(element: StereoElement, atoms: readonly number[]): StereoElement {
  const to = (atom: number) => (atom < 0 ? atom : atoms[atom]!);
  const map = <T extends readonly number[]>(list: T) => list.map(to) as unknown as T;
  switch (element.kind) {
    case 'tetrahedral':
      return { ...element, centre: to(element.centre), ligands: map(element.ligands) };
    case 'double-bond':
    case 'axis':
      return { ...element, ends: map(element.ends), ligands: map(element.ligands as never) };
    default:
      return { ...element, centre: to(element.centre), ligands: map(element.ligands) };
  }
}

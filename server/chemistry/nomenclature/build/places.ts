/** The numbered places of one unit while it is built. */
import type { Locant, Unit } from '../tree.ts';
import type { Draft, Insertion } from './draft.ts';
import type { Cited } from './numbering.ts';
import type { SkeletonGraph } from './skeleton.ts';

export class Places {
  readonly #byLocant = new Map<Locant, number>();
  readonly #locants = new Map<number, Locant>();
  /** Atoms that carry principal groups. */
  readonly principal: number[] = [];
  /** Something was placed where the name gave no locant. */
  opened = false;
  /** Nothing has been put on the skeleton yet, and all its atoms are alike: the first place is 1. */
  fresh: boolean;
  /** Carbons that are part of an acid, amide, nitrile or aldehyde group, which take no substituent by themselves. */
  readonly spent = new Set<number>();
  /** What is cited with a locant, in the order of building; see `numbering.ts`. */
  readonly cited: Cited[] = [];
  /** The name gave a locant on this parent. */
  given = false;
  /** Atoms that were chosen for groups with a single bond. */
  readonly chosen: number[] = [];
  /** Locants written in for substituents. */
  readonly inserted: Insertion[] = [];
  /** Where `o`, `m`, `p` meets a ring without anything on it: the place that the next substituent takes. */
  awaiting: Locant | undefined;

  constructor(
    readonly skeleton: SkeletonGraph,
    readonly atoms: readonly number[],
    readonly unit: Unit,
    draft: Draft,
  ) {
    skeleton.atoms.forEach((atom, index) => {
      for (const locant of atom.locants) if (locant !== '@') this.name(locant, atoms[index]!);
      const place = { locant: atom.locants[0], parentAt: unit.parentAt, owner: draft.owner };
      draft.named.set(atoms[index]!, place);
    });
    this.fresh = this.alike && unit.attach === undefined;
  }

  /** A ring in which every atom is the same as any other: benzene, cyclohexane. */
  get alike(): boolean {
    const { atoms, bonds, kind } = this.skeleton;
    return (
      bonds.length === atoms.length &&
      atoms.every(
        (atom) => atom.atomicNumber === 6 && atom.mancude === atoms[0]!.mancude && atom.locants.length > 0,
      ) &&
      bonds.every((bond) => bond.order === 1) &&
      (kind === 'ring' || atoms.length === 6) &&
      this.unit.replacements.length === 0 &&
      this.unit.hydro.length === 0
    );
  }

  /** Notes that something is on an atom of the parent, or on the bond between two, for the rule of lowest locants. */
  cite(rank: Cited['rank'], given: boolean, ...atoms: readonly [number] | readonly [number, number]): void {
    const positions = atoms.map((atom) => this.atoms.indexOf(atom)) as [number] | [number, number];
    if (positions.includes(-1)) return;
    this.cited.push({ rank, positions });
    this.given ||= given;
  }

  name(locant: Locant, atom: number): void {
    if (!this.#byLocant.has(locant)) this.#byLocant.set(locant, atom);
    if (!this.#locants.has(atom)) this.#locants.set(atom, locant);
  }

  at(locant: Locant): number | undefined {
    return this.#byLocant.get(locant);
  }

  locantOf(atom: number): Locant | undefined {
    return this.#locants.get(atom);
  }

  /** Every atom with a locant. */
  named(): Iterable<number> {
    return this.#locants.keys();
  }
}

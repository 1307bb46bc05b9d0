/** Several rings as one skeleton, the locants of each with primes of its own. */
import type { SkeletonAtom, SkeletonGraph } from '../build/skeleton.ts';

export interface JoinedRings {
  readonly skeleton: SkeletonGraph;
  /** Where the atoms of each ring have gone. */
  readonly places: readonly (readonly number[])[];
}

/** An atom of one of the rings. */
export interface Joint {
  readonly ring: number;
  readonly atom: number;
}

/** Rings side by side; `same` are pairs of atoms that are one atom in the whole (spiro atoms). */
export function joinedRings(
  rings: readonly SkeletonGraph[],
  same: readonly (readonly [Joint, Joint])[] = [],
): JoinedRings | undefined {
  const atoms: SkeletonAtom[] = [];
  const places: number[][] = [];
  rings.forEach((ring, index) => {
    const own = ring.atoms.map((atom, position): number => {
      const primed = atom.locants.map((locant) => locant + "'".repeat(index));
      const pair = same.find(([, second]) => second.ring === index && second.atom === position);
      const known = pair && places[pair[0].ring]?.[pair[0].atom];
      if (known === undefined) return atoms.push({ ...atom, locants: primed }) - 1;
      const shared = atoms[known]!;
      atoms[known] = { ...shared, locants: [...shared.locants, ...primed], mancude: false };
      return known;
    });
    places.push(own);
  });
  const agree = same.every(
    ([one, other]) => elementOf(rings, one) === elementOf(rings, other) && one.ring < other.ring,
  );
  if (!agree) return undefined;
  const at = (ring: number, atom: number) => places[ring]![atom]!;
  const skeleton: SkeletonGraph = {
    kind: 'fixed',
    atoms,
    bonds: rings.flatMap((ring, index) =>
      ring.bonds.map((bond) => ({ ...bond, from: at(index, bond.from), to: at(index, bond.to) })),
    ),
    indicated: rings.flatMap((ring, index) => ring.indicated.map((atom) => at(index, atom))),
    stereo: [],
  };
  return { skeleton, places };
}

const elementOf = (rings: readonly SkeletonGraph[], { ring, atom }: Joint) =>
  rings[ring]?.atoms[atom]?.atomicNumber;

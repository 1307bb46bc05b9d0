/**
 * Which bonds have another order in another Kekulé form of the same structure. Two drawings that differ only in how
 * the double bonds of such rings are placed are the same compound, so the canonical form sees these bonds as one
 * kind. A bond is resonant when it lies on a cycle of alternating single and double bonds, which is asked exactly, by
 * matching (a single bond can become double if the atoms that lose their partners can be paired anew).
 */
import { augmentingPath } from './kekulize.ts';
import type { Molecule } from './molecule.ts';
import { ringBonds } from './rings.ts';

/** For each bond, in the order of the bonds. Linear for molecules without rings. */
export function resonantBonds(molecule: Molecule): boolean[] {
  const { bonds, neighbours } = molecule;
  const resonant = new Array<boolean>(bonds.length).fill(false);
  if (bonds.length < molecule.atoms.length - 1 && !bonds.some((bond) => bond.order === 2)) return resonant;
  const inRing = ringBonds(molecule);
  const partner = piPartners(molecule, inRing);
  const vertexOf = new Map<number, number>();
  const members: number[] = [];
  for (let atom = 0; atom < partner.length; atom++) {
    if (partner[atom] === -1) continue;
    vertexOf.set(atom, members.length);
    members.push(atom);
  }
  if (members.length < 4) return resonant;
  const adjacency = members.map((atom) =>
    neighbours[atom]!.filter(
      ({ atom: other, bond }) =>
        inRing[bond] && partner[other] !== -1 && bonds[bond]!.order <= 2 && bonds[bond]!.order > 0,
    ).map(({ atom: other }) => vertexOf.get(other)!),
  );
  const matching = members.map((atom) => vertexOf.get(partner[atom]!)!);

  for (let index = 0; index < bonds.length; index++) {
    const { from, to, order } = bonds[index]!;
    const [first, second] = [vertexOf.get(from), vertexOf.get(to)];
    if (order !== 1 || resonant[index] || !inRing[index] || first === undefined || second === undefined)
      continue;
    const cycle = alternatingCycle(adjacency, matching, first, second);
    if (cycle === undefined) continue;
    for (let step = 0; step < cycle.length; step++) {
      const [one, other] = [members[cycle[step]!]!, members[cycle[(step + 1) % cycle.length]!]!];
      resonant[neighbours[one]!.find((neighbour) => neighbour.atom === other)!.bond] = true;
    }
  }
  return resonant;
}

/** For atoms with exactly one double bond, in a ring, and no triple one: the other end of it; else −1. */
function piPartners(molecule: Molecule, inRing: readonly boolean[]): Int32Array {
  const partner = new Int32Array(molecule.atoms.length).fill(-1);
  const multiple = new Uint8Array(molecule.atoms.length);
  for (const { from, to, order } of molecule.bonds) {
    if (order <= 1) continue;
    multiple[from]!++;
    multiple[to]!++;
  }
  molecule.bonds.forEach(({ from, to, order }, index) => {
    if (order !== 2 || !inRing[index] || multiple[from] !== 1 || multiple[to] !== 1) return;
    partner[from] = to;
    partner[to] = from;
  });
  return partner;
}

/** The cycle that the single bond first–second closes with alternating bonds, as vertices, or undefined. */
function alternatingCycle(
  adjacency: readonly (readonly number[])[],
  matching: readonly number[],
  first: number,
  second: number,
): number[] | undefined {
  const start = matching[first]!;
  const goal = matching[second]!;
  if (start === second) return undefined;
  const trial = [...matching];
  trial[start] = -1;
  trial[goal] = -1;
  const without = new Set([first, second]);
  const path = augmentingPath(adjacency, trial, start, without);
  return path === undefined ? undefined : [first, ...path, second];
}

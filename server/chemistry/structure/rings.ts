/** Which bonds lie in rings, and how small those rings are. */
import type { Molecule } from './molecule.ts';

/** For each bond whether it is part of a cycle. */
export function ringBonds(molecule: Pick<Molecule, 'atoms' | 'bonds' | 'neighbours'>): boolean[] {
  return cyclicBonds(molecule, () => true);
}

/**
 * For each bond whether it is part of a cycle of usable bonds; false for the others. Iterative search for bridges
 * (Tarjan 1974), linear in the bonds.
 */
export function cyclicBonds(
  { atoms, bonds, neighbours }: Pick<Molecule, 'atoms' | 'bonds' | 'neighbours'>,
  isUsable: (bond: number) => boolean,
): boolean[] {
  const inCycle = bonds.map((_, bond) => isUsable(bond));
  const order = new Int32Array(atoms.length).fill(-1);
  const low = new Int32Array(atoms.length);
  const next = new Int32Array(atoms.length);
  const by = new Int32Array(atoms.length).fill(-1);
  const stack: number[] = [];
  let clock = 0;
  for (let root = 0; root < atoms.length; root++) {
    if (order[root] !== -1) continue;
    order[root] = low[root] = clock++;
    stack.push(root);
    while (stack.length > 0) {
      const atom = stack[stack.length - 1]!;
      const neighbour = neighbours[atom]![next[atom]!++];
      if (neighbour === undefined) {
        stack.pop();
        const below = stack[stack.length - 1];
        if (below === undefined) continue;
        if (low[atom]! < low[below]!) low[below] = low[atom]!;
        if (low[atom]! > order[below]!) inCycle[by[atom]!] = false;
      } else if (neighbour.bond !== by[atom] && isUsable(neighbour.bond)) {
        const seen = order[neighbour.atom]!;
        if (seen === -1) {
          order[neighbour.atom] = low[neighbour.atom] = clock++;
          by[neighbour.atom] = neighbour.bond;
          stack.push(neighbour.atom);
        } else if (seen < low[atom]!) low[atom] = seen;
      }
    }
  }
  return inCycle;
}

/**
 * The atoms of a smallest ring through a bond, in ring order, or undefined when there is none of at most `limit`
 * atoms.
 */
export function smallestRingThrough(
  molecule: Molecule,
  bondIndex: number,
  limit: number,
): number[] | undefined {
  const { from, to } = molecule.bonds[bondIndex]!;
  const before = new Map<number, number>([[from, -1]]);
  let front = [from];
  for (let size = 2; size <= limit && front.length > 0; size++) {
    const further: number[] = [];
    for (const atom of front) {
      for (const neighbour of molecule.neighbours[atom]!) {
        if (neighbour.bond === bondIndex || before.has(neighbour.atom)) continue;
        before.set(neighbour.atom, atom);
        if (neighbour.atom === to) return pathBack(before, to);
        further.push(neighbour.atom);
      }
    }
    front = further;
  }
  return undefined;
}

function pathBack(before: ReadonlyMap<number, number>, end: number): number[] {
  const path: number[] = [];
  for (let atom = end; atom !== -1; atom = before.get(atom)!) path.push(atom);
  return path.reverse();
}

/** The connected parts of a molecule, each as its atoms in ascending order; parts by their first atom. */
export function connectedParts(molecule: Molecule): number[][] {
  const part = new Int32Array(molecule.atoms.length).fill(-1);
  const parts: number[][] = [];
  for (let root = 0; root < part.length; root++) {
    if (part[root] !== -1) continue;
    const members = [root];
    part[root] = parts.length;
    for (let head = 0; head < members.length; head++) {
      for (const neighbour of molecule.neighbours[members[head]!]!) {
        if (part[neighbour.atom] !== -1) continue;
        part[neighbour.atom] = parts.length;
        members.push(neighbour.atom);
      }
    }
    parts.push(members.sort((first, second) => first - second));
  }
  return parts;
}

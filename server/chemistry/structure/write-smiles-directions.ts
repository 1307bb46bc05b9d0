/**
 * Chooses `/` and `\` for the stated double bonds of a molecule about to be written. Each end of a double bond marks one
 * of its single bonds; neighbouring double bonds may share a mark, so marks are settled together, with one free choice
 * for each set that hangs together.
 */
import type { DoubleBondStereo, Molecule } from './molecule.ts';
import type { WrittenTree } from './write-smiles.ts';

/** A mark as seen from an end of a double bond: its ligand lies above (1) or below (−1). */
interface Tie {
  readonly bond: number;
  /** Whether the two marks, both read in the direction of the text, are equal. */
  readonly equal: boolean;
}

/**
 * For each bond that carries a mark: 1 for `/` and −1 for `\`, as seen from the bond's `from` to its `to`. The first
 * mark of each set in the text is `/`.
 */
export function bondDirections(molecule: Molecule, tree: WrittenTree): ReadonlyMap<number, 1 | -1> {
  const elements = molecule.stereo.filter(
    (element): element is DoubleBondStereo => element.kind === 'double-bond',
  );
  if (elements.length === 0) return new Map();
  const ends = new Set(elements.flatMap((element) => element.ends));
  const marked = new Map<number, number[]>();
  const ties = new Map<number, Tie[]>();
  const tie = (one: number, other: number, equal: boolean) => {
    ties.set(one, [...(ties.get(one) ?? []), { bond: other, equal }]);
    ties.set(other, [...(ties.get(other) ?? []), { bond: one, equal }]);
  };
  /** Whether a mark read along the text lies above the end when it is `/`. */
  const upwards = (end: number, bond: number) => {
    const { from, to } = molecule.bonds[bond]!;
    const other = from === end ? to : from;
    return tree.position[end]! < tree.position[other]!;
  };

  for (const element of elements) {
    const chosen = ([0, 1] as const).map((side) => chosenLigand(molecule, tree, element, side, ends));
    const [first, second] = chosen;
    let together = element.sameSide;
    chosen.forEach((ligand, side) => {
      if (ligand.atom !== element.ligands[side]) together = !together;
      const list = marked.get(element.ends[side]!) ?? [];
      marked.set(element.ends[side]!, [...list, ligand.bond]);
    });
    const sameSense = upwards(element.ends[0], first!.bond) === upwards(element.ends[1], second!.bond);
    tie(first!.bond, second!.bond, together === sameSense);
  }
  // A bond marked by the end at its other side counts at this end too: two ligands of one end lie opposite each other.
  for (const [end, own] of marked) {
    for (const { bond } of molecule.neighbours[end]!) {
      if (own.includes(bond) || !ties.has(bond)) continue;
      tie(own[0]!, bond, upwards(end, own[0]!) !== upwards(end, bond));
    }
  }
  return settled(molecule, tree, ties);
}

/** The bond that an end marks: rather not towards a double bond that is left open, then the first in the text. */
function chosenLigand(
  molecule: Molecule,
  tree: WrittenTree,
  element: DoubleBondStereo,
  side: 0 | 1,
  ends: ReadonlySet<number>,
): { atom: number; bond: number } {
  const end = element.ends[side];
  const candidates = molecule.neighbours[end]!.filter(
    ({ atom, bond }) => atom !== element.ends[side === 0 ? 1 : 0] && molecule.bonds[bond]!.order === 1,
  );
  const isOpenEnd = (atom: number) =>
    !ends.has(atom) &&
    molecule.neighbours[atom]!.some((neighbour) => molecule.bonds[neighbour.bond]!.order === 2);
  return candidates.reduce((best, next) => {
    const order = Number(isOpenEnd(next.atom)) - Number(isOpenEnd(best.atom));
    return order < 0 || (order === 0 && tree.position[next.atom]! < tree.position[best.atom]!) ? next : best;
  });
}

function settled(
  molecule: Molecule,
  tree: WrittenTree,
  ties: ReadonlyMap<number, readonly Tie[]>,
): Map<number, 1 | -1> {
  const place = (bond: number) => {
    const { from, to } = molecule.bonds[bond]!;
    const [one, other] = [tree.position[from]!, tree.position[to]!];
    return Math.min(one, other) * molecule.atoms.length + Math.max(one, other);
  };
  const alongText = new Map<number, 1 | -1>();
  for (const start of [...ties.keys()].sort((first, second) => place(first) - place(second))) {
    if (alongText.has(start)) continue;
    alongText.set(start, 1);
    const queue = [start];
    for (let head = 0; head < queue.length; head++) {
      const sign = alongText.get(queue[head]!)!;
      for (const { bond, equal } of ties.get(queue[head]!)!) {
        if (alongText.has(bond)) continue;
        alongText.set(bond, equal ? sign : (-sign as 1 | -1));
        queue.push(bond);
      }
    }
  }
  const result = new Map<number, 1 | -1>();
  for (const [bond, sign] of alongText) {
    const { from, to } = molecule.bonds[bond]!;
    result.set(bond, tree.position[from]! < tree.position[to]! ? sign : (-sign as 1 | -1));
  }
  return result;
}

/**
 * A smallest set of smallest rings: a minimum cycle basis found among the cycles that two shortest paths and a bond close
 * (Horton 1987), taken shortest first and kept when independent of those before (sums of bonds modulo 2).
 */
export interface BondGraph {
  readonly size: number;
  readonly bonds: readonly { readonly from: number; readonly to: number }[];
}

/**
 * The rings of a graph, each as its atoms in ring order, the smallest first. As many as bonds − atoms + parts; of equally
 * small choices, the one with the lower atoms. Cubic in the atoms: meant for single ring systems.
 */
export function ringBasis(graph: BondGraph): number[][] {
  const neighbours: { atom: number; bond: number }[][] = Array.from({ length: graph.size }, () => []);
  graph.bonds.forEach(({ from, to }, bond) => {
    neighbours[from]!.push({ atom: to, bond });
    neighbours[to]!.push({ atom: from, bond });
  });
  const trees = neighbours.map((_, root) => shortestPaths(root, neighbours));
  const wanted = graph.bonds.length - graph.size + countParts(trees);
  if (wanted === 0) return [];
  const candidates: number[][] = [];
  trees.forEach((before, root) => {
    for (const { from, to } of graph.bonds) {
      if (before[from] === undefined || before[to] === undefined) continue;
      if (before[from] === to || before[to] === from) continue;
      const [one, other] = [pathTo(before, from), pathTo(before, to)];
      const ring = [...one, ...other.slice(1).reverse()];
      if (new Set(ring).size === ring.length && Math.min(...ring) === root) candidates.push(ring);
    }
  });
  candidates.sort((first, second) => first.length - second.length);
  const bondOf = new Map(graph.bonds.map(({ from, to }, bond) => [key(from, to), bond]));
  const chosen: number[][] = [];
  const reduced: { pivot: number; set: bigint }[] = [];
  for (const ring of candidates) {
    if (chosen.length === wanted) break;
    let set = 0n;
    ring.forEach((atom, index) => {
      set ^= 1n << BigInt(bondOf.get(key(atom, ring[(index + 1) % ring.length]!))!);
    });
    for (const row of reduced) if ((set >> BigInt(row.pivot)) & 1n) set ^= row.set;
    if (set === 0n) continue;
    let pivot = 0;
    while (!((set >> BigInt(pivot)) & 1n)) pivot++;
    reduced.push({ pivot, set });
    chosen.push(ring);
  }
  return chosen;
}

const key = (from: number, to: number) =>
  from < to ? `${String(from)} ${String(to)}` : `${String(to)} ${String(from)}`;

/** For each atom the one before it on a shortest path from the root; −1 for the root, undefined where there is none. */
function shortestPaths(
  root: number,
  neighbours: readonly (readonly { atom: number; bond: number }[])[],
): (number | undefined)[] {
  const before: (number | undefined)[] = Array.from({ length: neighbours.length }, () => undefined);
  before[root] = -1;
  const queue = [root];
  for (let head = 0; head < queue.length; head++) {
    for (const { atom } of neighbours[queue[head]!]!) {
      if (before[atom] !== undefined) continue;
      before[atom] = queue[head]!;
      queue.push(atom);
    }
  }
  return before;
}

/** From the root to the atom. */
function pathTo(before: readonly (number | undefined)[], atom: number): number[] {
  const path: number[] = [];
  for (let at = atom; at !== -1; at = before[at]!) path.push(at);
  return path.reverse();
}

function countParts(trees: readonly (readonly (number | undefined)[])[]): number {
  return trees.filter((before, root) => before.every((one, atom) => one === undefined || atom >= root))
    .length;
}

/**
 * Gives delocalised rings one valid form with single and double bonds: every aromatic atom that still has a valence
 * free must take part in exactly one double bond, which is a perfect matching in a general graph. Edmonds' blossom
 * algorithm finds it (Can. J. Math. 1965, 17, 449); leaves are matched first, which settles almost every molecule.
 */

/** Steps after which a matching is given up; far beyond any molecule, short of a text made to be slow. */
const stepLimit = 20_000_000;

export interface Matching {
  /** Partner of each vertex, or −1. */
  readonly partner: readonly number[];
  /** False when the step limit was hit. */
  readonly complete: boolean;
}

/**
 * A maximum matching of the vertices 0 … n−1 with the given adjacency lists. Vertices with `optional` true may stay
 * single; the others are tried first.
 */
export function maximumMatching(
  adjacency: readonly (readonly number[])[],
  optional?: readonly boolean[],
): Matching {
  const size = adjacency.length;
  const partner = new Array<number>(size).fill(-1);
  matchLeaves(adjacency, partner, optional);
  const counter = { steps: 0 };
  for (let root = 0; root < size; root++) {
    if (partner[root] !== -1 || optional?.[root]) continue;
    const path = augmentingPath(adjacency, partner, root, undefined, counter);
    if (path !== undefined) flip(partner, path);
    if (counter.steps > stepLimit) return { partner, complete: false };
  }
  return { partner, complete: true };
}

/** Vertices with a single free neighbour have no choice; what is left after them is paired as it comes. */
function matchLeaves(
  adjacency: readonly (readonly number[])[],
  partner: number[],
  optional: readonly boolean[] | undefined,
): void {
  const free = adjacency.map((list) => list.length);
  const leaves: number[] = [];
  for (let vertex = 0; vertex < free.length; vertex++) if (free[vertex] === 1) leaves.push(vertex);
  const pair = (first: number, second: number) => {
    partner[first] = second;
    partner[second] = first;
    for (const end of [first, second]) {
      for (const next of adjacency[end]!) {
        free[next]!--;
        if (free[next] === 1 && partner[next] === -1) leaves.push(next);
      }
    }
  };
  for (let start = 0; start <= adjacency.length;) {
    const vertex = leaves.pop() ?? start++;
    if (vertex >= adjacency.length || partner[vertex] !== -1 || optional?.[vertex]) continue;
    const next = adjacency[vertex]!.find((neighbour) => partner[neighbour] === -1);
    if (next !== undefined) pair(vertex, next);
  }
}

/**
 * Looks for an augmenting path from the free vertex `root` to another one, contracting blossoms. Returns its vertices,
 * `root` first, or undefined. Vertices in `without` are treated as if they were not there.
 */
export function augmentingPath(
  adjacency: readonly (readonly number[])[],
  partner: readonly number[],
  root: number,
  without?: ReadonlySet<number>,
  counter: { steps: number } = { steps: 0 },
): number[] | undefined {
  const size = adjacency.length;
  const base = Array.from({ length: size }, (_, vertex) => vertex);
  const parent = new Array<number>(size).fill(-1);
  const reached = new Uint8Array(size);
  const queue = [root];
  reached[root] = 1;
  counter.steps += size;

  const commonBase = (first: number, second: number): number => {
    const seen = new Set<number>();
    for (let vertex = base[first]!; ; vertex = base[parent[partner[vertex]!]!]!) {
      seen.add(vertex);
      counter.steps++;
      if (partner[vertex] === -1) break;
    }
    for (let vertex = base[second]!; ; vertex = base[parent[partner[vertex]!]!]!) {
      counter.steps++;
      if (seen.has(vertex)) return vertex;
    }
  };
  const markPath = (from: number, stem: number, child: number, blossom: Set<number>) => {
    let vertex = from;
    let below = child;
    while (base[vertex] !== stem) {
      blossom.add(base[vertex]!).add(base[partner[vertex]!]!);
      parent[vertex] = below;
      below = partner[vertex]!;
      vertex = parent[below]!;
      counter.steps++;
    }
  };

  for (let head = 0; head < queue.length; head++) {
    const vertex = queue[head]!;
    for (const next of adjacency[vertex]!) {
      counter.steps++;
      if (without?.has(next) || base[vertex] === base[next] || partner[vertex] === next) continue;
      if (next === root || (partner[next] !== -1 && parent[partner[next]!] !== -1)) {
        const stem = commonBase(vertex, next);
        const blossom = new Set<number>();
        markPath(vertex, stem, next, blossom);
        markPath(next, stem, vertex, blossom);
        for (let inner = 0; inner < size; inner++) {
          if (!blossom.has(base[inner]!)) continue;
          base[inner] = stem;
          if (reached[inner] === 0) {
            reached[inner] = 1;
            queue.push(inner);
          }
        }
        counter.steps += size;
      } else if (parent[next] === -1) {
        parent[next] = vertex;
        if (partner[next] === -1) return pathTo(next, parent, partner);
        reached[partner[next]!] = 1;
        queue.push(partner[next]!);
      }
    }
  }
  return undefined;
}

function pathTo(end: number, parent: readonly number[], partner: readonly number[]): number[] {
  const path: number[] = [];
  for (let vertex = end; vertex !== -1;) {
    const before = parent[vertex]!;
    path.push(vertex, before);
    vertex = partner[before]!;
  }
  return path.reverse();
}

/** Turns the bonds along a path round: those that were not matched are now. */
function flip(partner: number[], path: readonly number[]): void {
  for (let step = 0; step + 1 < path.length; step += 2) {
    partner[path[step]!] = path[step + 1]!;
    partner[path[step + 1]!] = path[step]!;
  }
}

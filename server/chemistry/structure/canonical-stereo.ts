/** What a stated arrangement looks like once the atoms have their canonical numbers. */
import type { CanonicalGraph } from './canonical-graph.ts';
import type { StereoElement } from './molecule.ts';

/** True when sorting the list takes an odd number of exchanges. */
export function isOddPermutation(list: readonly number[]): boolean {
  let odd = false;
  for (let first = 0; first < list.length; first++) {
    for (let second = first + 1; second < list.length; second++) {
      if (list[first]! > list[second]!) odd = !odd;
    }
  }
  return odd;
}

/**
 * The elements as numbers that depend on the structure and the ranks alone: place, kind, sense. Elements sorted by
 * place. Rank −1 is the hydrogen or lone pair that is no vertex.
 */
export function stereoCertificate(graph: CanonicalGraph, rank: ArrayLike<number>): number[] {
  const rankOf = (vertex: number) => (vertex < 0 ? -1 : rank[vertex]!);
  const rows = graph.stereo.map((element) => rowOf(graph, element, rankOf));
  return rows.sort((first, second) => first[0]! - second[0]! || first[1]! - second[1]!).flat();
}

function rowOf(graph: CanonicalGraph, element: StereoElement, rankOf: (vertex: number) => number): number[] {
  switch (element.kind) {
    case 'tetrahedral': {
      const odd = isOddPermutation(element.ligands.map(rankOf));
      return [rankOf(element.centre), 0, odd === element.clockwise ? 0 : 1];
    }
    case 'double-bond': {
      const [first, second] = element.ends;
      let together = element.sameSide;
      for (const side of [0, 1] as const) {
        if (
          lowestLigand(graph, element.ends[side], element.ends, element.ligands[side], rankOf) !==
          element.ligands[side]
        )
          together = !together;
      }
      const places = [rankOf(first), rankOf(second)].sort((one, other) => one - other);
      return [places[0]!, 1, places[1]!, together ? 1 : 0];
    }
    case 'axis': {
      const [a, b, c, d] = element.ligands.map(rankOf) as [number, number, number, number];
      const odd = a > b !== c > d;
      const places = element.ends.map(rankOf).sort((one, other) => one - other);
      return [places[0]!, 2, places[1]!, odd === element.clockwise ? 0 : 1];
    }
    case 'SP': {
      const [a, b, c, d] = element.ligands.map(rankOf) as [number, number, number, number];
      // Which ligands stand opposite each other: SP1 a–c, SP2 a–b, SP3 a–d (OpenSMILES 3.8.3).
      const pairs =
        element.permutation === 1
          ? [
              [a, c],
              [b, d],
            ]
          : element.permutation === 2
            ? [
                [a, b],
                [c, d],
              ]
            : [
                [a, d],
                [b, c],
              ];
      const sorted = pairs
        .map((pair) => pair.sort((one, other) => one - other))
        .sort((one, other) => one[0]! - other[0]!);
      return [rankOf(element.centre), 3, ...sorted.flat()];
    }
    default:
      // Compared as written, ligand by ligand.
      return [
        rankOf(element.centre),
        element.kind === 'TB' ? 4 : 5,
        element.permutation,
        ...element.ligands.map(rankOf),
      ];
  }
}

/** Of the neighbours at one end of a double bond or cumulene, those of the chain aside, the one with the lowest rank. */
function lowestLigand(
  graph: CanonicalGraph,
  end: number,
  ends: readonly [number, number],
  stated: number,
  rankOf: (vertex: number) => number,
): number {
  let lowest = stated;
  for (const link of graph.links[end]!) {
    // The chain's own bond is double; a ligand of such an end is bound by a single or a resonant bond.
    if (link.vertex === ends[0] || link.vertex === ends[1] || link.kind === 2) continue;
    if (rankOf(link.vertex) < rankOf(lowest)) lowest = link.vertex;
  }
  return lowest;
}

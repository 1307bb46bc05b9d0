/**
 * Colour refinement: atoms are told apart by their own colour and the colours around them, again and again, until
 * nothing changes. A colour is the number of vertices that come before its class, so refining only ever splits
 * classes. Neighbourhoods are compared by a hash: when two different ones collide, a split is missed, which the search
 * above makes good; the result never depends on how the atoms were numbered.
 */
import type { CanonicalGraph } from './canonical-graph.ts';

export interface Colouring {
  /** Class of each vertex: the number of vertices in classes before it. */
  readonly colours: Int32Array;
  /** Number of classes. */
  readonly classes: number;
}

function mixed(value: number): number {
  let hash = Math.imul(value ^ (value >>> 16), 0x85ebca6b);
  hash = Math.imul(hash ^ (hash >>> 13), 0xc2b2ae35);
  return hash ^ (hash >>> 16);
}

/** Classes from keys: equal keys, equal class; classes in the order of the keys. */
function colouringFrom(keys: Float64Array): Colouring {
  const sorted = Float64Array.from(keys).sort();
  const firstAt = new Map<number, number>();
  for (let index = sorted.length - 1; index >= 0; index--) firstAt.set(sorted[index]!, index);
  const colours = new Int32Array(keys.length);
  for (let vertex = 0; vertex < keys.length; vertex++) colours[vertex] = firstAt.get(keys[vertex]!)!;
  return { colours, classes: firstAt.size };
}

export function initialColouring(graph: CanonicalGraph, counter: { steps: number }): Colouring {
  return refined(graph, colouringFrom(Float64Array.from(graph.colours)), counter);
}

/** Refines until stable. `counter.steps` grows by the vertices visited. */
export function refined(graph: CanonicalGraph, start: Colouring, counter: { steps: number }): Colouring {
  let current = start;
  const size = graph.links.length;
  const keys = new Float64Array(size);
  while (current.classes < size) {
    counter.steps += size;
    for (let vertex = 0; vertex < size; vertex++) {
      let hash = 0;
      for (const link of graph.links[vertex]!) {
        hash = (hash + mixed(current.colours[link.vertex]! * 8 + link.kind + 1)) | 0;
      }
      keys[vertex] = current.colours[vertex]! * 4294967296 + (hash >>> 0);
    }
    const next = colouringFrom(keys);
    if (next.classes === current.classes) break;
    current = next;
  }
  return current;
}

/** Puts one vertex before the others of its class and refines. */
export function individualized(
  graph: CanonicalGraph,
  colouring: Colouring,
  vertex: number,
  counter: { steps: number },
): Colouring {
  const colours = Int32Array.from(colouring.colours);
  const old = colours[vertex]!;
  for (let other = 0; other < colours.length; other++) {
    if (other !== vertex && colours[other] === old) colours[other] = old + 1;
  }
  return refined(graph, { colours, classes: colouring.classes + 1 }, counter);
}

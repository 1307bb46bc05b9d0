/**
 * Canonical labelling: of all numberings that refinement leaves open, the one with the least certificate. Where atoms
 * stay in one class, each is put first in turn; equal certificates show an automorphism, and automorphisms save
 * trying what is bound to come out the same (McKay, Congr. Numer. 1981, 30, 45). Stereo takes part in the certificate,
 * so an automorphism found here carries every stated arrangement onto an equal one.
 */
import type { CanonicalGraph } from './canonical-graph.ts';
import { type Colouring, individualized, initialColouring } from './canonical-refine.ts';
import { stereoCertificate } from './canonical-stereo.ts';

/** Vertices visited before the search is given up; then the answer is deterministic but not canonical. */
const stepLimit = 4_000_000;

export interface Labelling {
  /** Canonical number of each vertex. */
  readonly rank: Int32Array;
  /** Equal for two graphs if and only if they are the same (when complete). */
  readonly certificate: readonly number[];
  /** Permutations of the vertices that leave everything as it is; they generate all of them (when complete). */
  readonly generators: readonly Int32Array[];
  /** Class of each vertex after refinement, before any choice. */
  readonly classes: Int32Array;
  readonly complete: boolean;
}

interface Leaf {
  readonly rank: Int32Array;
  readonly certificate: readonly number[];
  readonly trace: readonly number[];
  readonly path: readonly number[];
}

export function canonicalLabelling(graph: CanonicalGraph): Labelling {
  const counter = { steps: 0 };
  const start = initialColouring(graph, counter);
  const search = new Search(graph, counter);
  search.visit(start, [], []);
  const best = search.best!;
  return {
    rank: best.rank,
    certificate: best.certificate,
    generators: search.generators,
    classes: start.colours,
    complete: !search.exhausted,
  };
}

class Search {
  best: Leaf | undefined;
  readonly generators: Int32Array[] = [];
  exhausted = false;

  constructor(
    private readonly graph: CanonicalGraph,
    private readonly counter: { steps: number },
  ) {}

  /** Returns the depth to go back to after an automorphism was found, or a large number to go on. */
  visit(colouring: Colouring, path: readonly number[], trace: readonly number[]): number {
    const size = colouring.colours.length;
    const here = [...trace, colouring.classes];
    // A node whose trace is already worse than the best leaf's cannot lead to a better one.
    if (this.best !== undefined && comparePrefix(here, this.best.trace) > 0) return Infinity;
    if (colouring.classes === size) return this.reach(colouring.colours, path, here);
    const cell = targetCell(colouring);
    const tried: number[] = [];
    for (const vertex of cell) {
      if (tried.length > 0) {
        if (this.exhausted) return Infinity;
        if (this.counter.steps > stepLimit) {
          this.exhausted = true;
          return Infinity;
        }
        if (this.isEquivalentToTried(vertex, tried, path)) continue;
      }
      tried.push(vertex);
      const next = individualized(this.graph, colouring, vertex, this.counter);
      const back = this.visit(next, [...path, vertex], here);
      if (back < path.length) return back;
    }
    return Infinity;
  }

  private reach(rank: Int32Array, path: readonly number[], trace: readonly number[]): number {
    const certificate = certificateOf(this.graph, rank);
    const leaf: Leaf = { rank, certificate, trace, path };
    if (this.best === undefined) {
      this.best = leaf;
      return Infinity;
    }
    const order = compareLists(trace, this.best.trace) || compareLists(certificate, this.best.certificate);
    if (order < 0) this.best = leaf;
    if (order !== 0) return Infinity;
    this.generators.push(mapBetween(this.best.rank, rank));
    // Everything below the point where the two paths part is now known to be an image of what was seen.
    let common = 0;
    while (path[common] === this.best.path[common]) common++;
    return common;
  }

  /** Whether a known automorphism that fixes the path moves a vertex already tried onto this one. */
  private isEquivalentToTried(vertex: number, tried: readonly number[], path: readonly number[]): boolean {
    const fixing = this.generators.filter((generator) => path.every((fixed) => generator[fixed] === fixed));
    if (fixing.length === 0) return false;
    const seen = new Set([vertex]);
    for (const current of seen) {
      for (const generator of fixing) {
        this.counter.steps++;
        seen.add(generator[current]!);
      }
    }
    return tried.some((known) => seen.has(known));
  }
}

/** The vertices of the first smallest class with more than one member, in vertex order. */
function targetCell({ colours }: Colouring): number[] {
  const sizes = new Map<number, number>();
  for (const colour of colours) sizes.set(colour, (sizes.get(colour) ?? 0) + 1);
  let chosen = -1;
  let chosenSize = Infinity;
  for (const [colour, size] of sizes) {
    if (size > 1 && (size < chosenSize || (size === chosenSize && colour < chosen)))
      [chosen, chosenSize] = [colour, size];
  }
  const cell: number[] = [];
  for (let vertex = 0; vertex < colours.length; vertex++) if (colours[vertex] === chosen) cell.push(vertex);
  return cell;
}

/** Initial colours in canonical order, then the bonds, then the arrangements. */
function certificateOf(graph: CanonicalGraph, rank: Int32Array): number[] {
  const size = rank.length;
  const vertexAt = new Int32Array(size);
  for (let vertex = 0; vertex < size; vertex++) vertexAt[rank[vertex]!] = vertex;
  const certificate: number[] = [size];
  for (let number = 0; number < size; number++) {
    const vertex = vertexAt[number]!;
    certificate.push(graph.colours[vertex]!);
    const row: number[] = [];
    for (const link of graph.links[vertex]!) {
      if (rank[link.vertex]! < number) row.push(rank[link.vertex]! * 8 + link.kind);
    }
    row.sort((first, second) => first - second);
    certificate.push(-1 - row.length, ...row);
  }
  certificate.push(...stereoCertificate(graph, rank));
  return certificate;
}

function mapBetween(from: Int32Array, to: Int32Array): Int32Array {
  const vertexAt = new Int32Array(to.length);
  for (let vertex = 0; vertex < to.length; vertex++) vertexAt[to[vertex]!] = vertex;
  return from.map((rank) => vertexAt[rank]!);
}

function compareLists(first: readonly number[], second: readonly number[]): number {
  const length = Math.min(first.length, second.length);
  for (let index = 0; index < length; index++) {
    const difference = first[index]! - second[index]!;
    if (difference !== 0) return difference;
  }
  return first.length - second.length;
}

/** Like compareLists, but a list that is the beginning of the other counts as equal. */
function comparePrefix(first: readonly number[], second: readonly number[]): number {
  const length = Math.min(first.length, second.length);
  for (let index = 0; index < length; index++) {
    const difference = first[index]! - second[index]!;
    if (difference !== 0) return difference;
  }
  return 0;
}

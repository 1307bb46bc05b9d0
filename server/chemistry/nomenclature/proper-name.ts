/**
 * The proper name of a compound whose name chose too short a chain, for saturated acyclic hydrocarbons and their
 * halogen derivatives: longest chain, most substituents, lowest locants, alphabetical order (P-44.3, P-44.4, P-14.5).
 */
import type { Molecule } from '../structure/molecule.ts';
import type { TextRange } from '../text.ts';
import type { NameRemark } from './reading.ts';
import { alkaneStem, numericalTerm } from './vocabulary/numbers.ts';
import type { PreparedName } from './words/prepared.ts';

const halogens: Readonly<Record<number, string>> = { 9: 'fluoro', 17: 'chloro', 35: 'bromo', 53: 'iodo' };

/** What is said of a chain that is not the longest, with the proper name as a fix where it is known. */
export function improperRemark(
  range: TextRange,
  prepared: PreparedName,
  text: string,
  proper: string | undefined,
): NameRemark {
  const start = prepared.origin[range.start] ?? 0;
  const end = Math.max(start, prepared.origin[range.end] ?? text.length);
  const why =
    'The parent named here is not the longest chain, so others will not find the compound under this name.';
  if (proper === undefined)
    return { kind: 'improper', range: { start, end }, message: `${why} Name it after the longest chain.` };
  const whole = { start: 0, end: text.length };
  return {
    kind: 'improper',
    range: { start, end },
    message: `${why} Its name is ${proper}.`,
    fixes: [{ title: `Write ${proper}`, edits: [{ range: whole, newText: proper }], safe: false }],
  };
}

/**
 * The name of a saturated acyclic molecule of carbon and halogens whose branches are unbranched; undefined for any other,
 * and for one with arrangements in space, whose descriptors would have to be worked out anew.
 */
export function properAlkaneName(molecule: Molecule): string | undefined {
  const { atoms, bonds, neighbours } = molecule;
  if (atoms.length > 60 || bonds.length !== atoms.length - 1 || molecule.stereo.length > 0) return undefined;
  if (bonds.some((bond) => bond.order !== 1)) return undefined;
  if (
    atoms.some(
      (atom) =>
        (atom.atomicNumber !== 6 && halogens[atom.atomicNumber] === undefined) ||
        atom.charge !== 0 ||
        atom.isotope !== 0,
    )
  )
    return undefined;
  const carbons = atoms.flatMap((atom, index) => (atom.atomicNumber === 6 ? [index] : []));
  const isCarbon = (atom: number) => atoms[atom]!.atomicNumber === 6;
  let best: { chain: number[]; found: [number, string][] } | undefined;
  for (const start of carbons) {
    for (const chain of pathsFrom(start)) {
      if (best && chain.length < best.chain.length) continue;
      const found = substituents(chain);
      if (!found) continue;
      if (!best || chain.length > best.chain.length || isBetter(found, best.found)) best = { chain, found };
    }
  }
  // A longer chain with a branch that cannot be named here would be the right one.
  if (!best || carbons.some((start) => pathsFrom(start).some((chain) => chain.length > best.chain.length)))
    return undefined;
  return written(best.chain.length, best.found);

  function pathsFrom(start: number): number[][] {
    const done: number[][] = [];
    const stack = [[start]];
    while (stack.length > 0) {
      const path = stack.pop()!;
      const next = neighbours[path[path.length - 1]!]!.map((one) => one.atom).filter(
        (one) => isCarbon(one) && one !== path[path.length - 2],
      );
      if (next.length === 0) done.push(path);
      for (const one of next) stack.push([...path, one]);
    }
    return done;
  }
  function substituents(chain: readonly number[]): [number, string][] | undefined {
    const found: [number, string][] = [];
    for (const [position, atom] of chain.entries()) {
      for (const { atom: branch } of neighbours[atom]!) {
        if (chain.includes(branch)) continue;
        const name = branchName(branch, atom);
        if (name === undefined) return undefined;
        found.push([position + 1, name]);
      }
    }
    return found;
  }
  function branchName(first: number, from: number): string | undefined {
    const halogen = halogens[atoms[first]!.atomicNumber];
    if (halogen !== undefined) return halogen;
    let [length, atom, before] = [1, first, from];
    for (;;) {
      const next = neighbours[atom]!.map((one) => one.atom).filter((one) => one !== before);
      if (next.length === 0) return `${alkaneStem(length)}yl`;
      if (next.length > 1 || !isCarbon(next[0]!)) return undefined;
      [length, atom, before] = [length + 1, next[0]!, atom];
    }
  }
}

/** P-44.3.2 more substituents; P-31.1.4.2.4 lowest locants together; P-14.4 lowest to what is cited first. */
function isBetter(one: readonly [number, string][], other: readonly [number, string][]): boolean {
  if (one.length !== other.length) return one.length > other.length;
  const locants = (list: readonly [number, string][]) =>
    list.map(([position]) => position).sort((a, b) => a - b);
  const cited = (list: readonly [number, string][]) =>
    [...list]
      .sort((a, b) => (a[1] < b[1] ? -1 : a[1] > b[1] ? 1 : a[0] - b[0]))
      .map(([position]) => position);
  return lower(locants(one), locants(other)) ?? lower(cited(one), cited(other)) ?? false;
}

function lower(one: readonly number[], other: readonly number[]): boolean | undefined {
  const place = one.findIndex((value, index) => value !== other[index]);
  return place < 0 ? undefined : one[place]! < other[place]!;
}

function written(length: number, found: readonly [number, string][]): string {
  const places = new Map<string, number[]>();
  for (const [position, name] of found) places.set(name, [...(places.get(name) ?? []), position]);
  const prefixes = [...places].sort(([first], [second]) => (first < second ? -1 : 1));
  const words = prefixes.map(([name, positions]) => {
    const sorted = positions.sort((a, b) => a - b).join(',');
    return `${sorted}-${positions.length > 1 ? numericalTerm(positions.length) : ''}${name}`;
  });
  return `${words.join('-')}${alkaneStem(length)}ane`;
}

/**
 * Bridged fused systems (P-25.4): `1,4-methanonaphthalene`, `4,7-methano-1H-indene`, `1,4-epoxy-5,8-methanonaphthalene`.
 * Bridge atoms are numbered on from the highest locant of the fused system, the bridge at the highest bridgehead first,
 * each from the end at its higher bridgehead (P-25.4.3.1; 1979 rule ).
 */
import { atomAt } from '../build/skeleton-places.ts';
import { skeletonFromSmiles, type SkeletonGraph } from '../build/skeleton.ts';
import { bridges, type BridgeLine } from '../vocabulary/bridges.ts';
import type { ComponentReader } from '../words/ring-components.ts';
import { precedes } from './fused-system.ts';

interface BridgedName {
  readonly skeletons: readonly SkeletonGraph[];
  readonly end: number;
}

interface Bridge {
  readonly line: BridgeLine;
  /** Locants of the bridgeheads, the lower first. */
  readonly ends: readonly [string, string];
}

const places = /(\d+[a-z]?,\d+[a-z]?(?::\d+[a-z]?,\d+[a-z]?){0,3})-(di|tri|tetra|)/y;
const counts: Readonly<Record<string, number>> = { '': 1, di: 2, tri: 3, tetra: 4 };
const mostBridges = 4;

/** Names that begin with a bridge and its locants at the offset. */
export function bridgedFusedAt(lower: string, offset: number, components: ComponentReader): BridgedName[] {
  return after(offset, []);

  function after(at: number, before: readonly Bridge[]): BridgedName[] {
    places.lastIndex = at;
    const match = before.length < mostBridges ? places.exec(lower) : null;
    const found: BridgedName[] = [];
    const begin = places.lastIndex;
    const pairs = match ? match[1]!.split(':').map(endsOf) : [];
    for (const line of bridges) {
      if (!match || pairs.length !== counts[match[2]!]! || !lower.startsWith(line[0], begin)) continue;
      const all = [...before, ...pairs.map((ends): Bridge => ({ line, ends }))];
      const end = begin + line[0].length;
      const next = lower[end] === '-' ? end + 1 : end;
      found.push(...after(next, all), ...onRing(next, all));
    }
    return found;
  }

  function onRing(at: number, all: readonly Bridge[]): BridgedName[] {
    return components(at).flatMap((ring) => {
      if (ring.valence) return [];
      const skeletons = ring.skeletons.flatMap((one) => (isFused(one) ? (bridged(one, all) ?? []) : []));
      return skeletons.length > 0 ? [{ skeletons, end: ring.end }] : [];
    });
  }
}

function endsOf(text: string): readonly [string, string] {
  const [one, other] = text.split(',') as [string, string];
  return precedes(one, other) ? [one, other] : [other, one];
}

const isFused = (ring: SkeletonGraph) =>
  ring.kind === 'fixed' && ring.bonds.length > ring.atoms.length && ring.atoms.some((atom) => atom.mancude);

function bridged(ring: SkeletonGraph, all: readonly Bridge[]): SkeletonGraph | undefined {
  const atoms = [...ring.atoms];
  const bonds = [...ring.bonds];
  let locant = Math.max(...atoms.flatMap((atom) => atom.locants.map((one) => Number.parseInt(one, 10))));
  const ordered = [...all].sort((one, other) => (precedes(one.ends[1], other.ends[1]) ? 1 : -1));
  for (const { line, ends } of ordered) {
    const bridge = skeletonFromSmiles(line[1]);
    const [low, high] = [atomAt(ring, ends[0]), atomAt(ring, ends[1])];
    if (!bridge || low < 0 || high < 0 || low === high) return undefined;
    const first = atoms.length;
    for (const atom of bridge.atoms) atoms.push({ ...atom, locants: [String(++locant)] });
    for (const bond of bridge.bonds) bonds.push({ ...bond, from: bond.from + first, to: bond.to + first });
    bonds.push({ from: high, to: first, order: 1, delocalised: false });
    bonds.push({ from: low, to: first + line[2], order: 1, delocalised: false });
  }
  const highest = ordered.map(({ ends }) => ends[1]);
  return new Set(highest).size === highest.length ? { ...ring, atoms, bonds } : undefined;
}

/** Polycyclic skeletons from their descriptors: von Baeyer (P-23.2) and spiro (P-24.2) nomenclature. */
import { numericalTerm } from '../vocabulary/numbers.ts';
import { readBridges, type Bridge, type Bridges } from './bridge-descriptor.ts';
import { carbonSystem, type SkeletonGraph } from '../build/skeleton.ts';
import { spiroDescriptorAt } from './spiro-descriptor.ts';

const pattern =
  /([a-z]{2,20}?)cyclo(?:\[([^[\]]{5,300})\]|\(([^()]{5,300}(?:\([^()]{3,9}\)[^()]{0,300})*)\))/y;
const ringsByTerm = new Map(
  Array.from({ length: 59 }, (_, index): [string, number] => [
    index === 0 ? 'bi' : numericalTerm(index + 2),
    index + 2,
  ]),
);

export interface Descriptor {
  readonly end: number;
  /** The skeleton for a stem of so many carbons, or undefined when the numbers disagree. */
  skeleton(size: number): SkeletonGraph | undefined;
}

/** `bicyclo[2.2.1]`, `tricyclo[5.3.1.0^1,5]`, `spiro[4.5]` or `dispiro[4.2.4^8.2^5]` at the offset. */
export function descriptorAt(text: string, offset: number): Descriptor | undefined {
  const spiro = spiroDescriptorAt(text, offset);
  if (spiro) return spiro;
  pattern.lastIndex = offset;
  const match = pattern.exec(text);
  const rings = match ? ringsByTerm.get(match[1]!) : undefined;
  if (!match || rings === undefined) return undefined;
  const numbers = match[2] ?? match[3]!;
  return {
    end: pattern.lastIndex,
    skeleton: (size) => {
      const bridges = readBridges(numbers, size);
      return bridges?.secondary.length === rings - 2 ? vonBaeyerSkeleton(bridges, size) : undefined;
    },
  };
}

/** P-23.2.3: numbering runs from a main bridgehead round the longer branch, back by the shorter, then the bridge. */
function vonBaeyerSkeleton(bridges: Bridges, size: number): SkeletonGraph | undefined {
  const [first, second, third] = bridges.main;
  const bonds: { from: number; to: number; order: number }[] = [];
  const path = (from: number, start: number, length: number, to: number) => {
    let last = from;
    for (let index = 0; index < length; index++) {
      bonds.push({ from: last, to: start + index, order: 1 });
      last = start + index;
    }
    bonds.push({ from: last, to, order: 1 });
  };
  const other = first + 1;
  path(0, 1, first, other);
  path(other, other + 1, second, 0);
  // The main bridge is numbered on from the atom nearer to main bridgehead 1.
  path(0, other + second + 1, third, other);
  let next = first + second + third + 2;
  const order = numberedOrder(bridges.secondary, next);
  if (!order) return undefined;
  for (const { size: own, low, high } of order) {
    if (high > next) return undefined;
    // P-23.2.5.1.3: each secondary bridge is numbered from the end nearer to the highest numbered bridgehead.
    path(high - 1, next, own, low - 1);
    next += own;
  }
  return carbonSystem(size, bonds);
}

/**
 * Atoms of independent bridges are numbered first, from the highest numbered bridgehead down (P-23.2.5.1.3); rule
 * of 1979 takes the longest first. Where the two disagree the numbering is not certain, and there is none.
 */
function numberedOrder(bridges: readonly Bridge[], core: number): readonly Bridge[] | undefined {
  const rank = (bridge: Bridge) => (bridge.high > core ? 1 : 0);
  const byPlace = [...bridges].sort((one, other) => rank(one) - rank(other) || other.high - one.high);
  const long = byPlace.filter(({ size }) => size > 0);
  const certain = long.every((bridge, index) => {
    const before = long[index - 1];
    return (
      !before || rank(before) < rank(bridge) || (before.size >= bridge.size && before.high > bridge.high)
    );
  });
  return certain ? byPlace : undefined;
}

/**
 * The ways in which a fused system can be drawn for numbering (P-25.3.1.3; of 1979): rings of the permitted
 * shapes, two bonds of a shape upright where it has them, and each ring where the bond that it shares points.
 */
import { bondKey, type FusedSystem } from './fused-system.ts';

export interface PlacedRing {
  /** Atoms clockwise. */
  readonly atoms: readonly number[];
  /** Where the bond from each atom to the next looks, in degrees counter-clockwise from the right. */
  readonly angles: readonly number[];
  readonly x: number;
  readonly y: number;
}

export type Layout = readonly PlacedRing[];

const stepLimit = 20000;
/** Rings are drawn distorted where shapes do not meet: so far may the two sides of a shared bond be from opposite. */
const largestBend = 31;

/** Every drawing, mirrored and turned ones included; none when the rings do not fit into a plane. */
export function layoutsOf(system: FusedSystem): Layout[] {
  const found: Layout[] = [];
  for (const clockwise of [system.rings, system.rings.map((ring) => [...ring].reverse())]) {
    const oriented = turnedAlike(clockwise);
    if (oriented) place(oriented, found);
  }
  return found;
}

/** Rings all listed in the sense of the first: a shared bond runs one way in one ring and the other way in the other. */
function turnedAlike(rings: readonly (readonly number[])[]): (readonly number[])[] | undefined {
  const done: (readonly number[] | undefined)[] = rings.map(() => undefined);
  done[0] = rings[0]!;
  const queue = [0];
  for (let head = 0; head < queue.length; head++) {
    const here = done[queue[head]!]!;
    for (const [index, ring] of rings.entries()) {
      const sense = index === queue[head] ? undefined : senseBeside(here, ring);
      if (sense === undefined) continue;
      const turned = sense ? ring : [...ring].reverse();
      const known = done[index];
      if (known === undefined) {
        done[index] = turned;
        queue.push(index);
      } else if (senseBeside(here, known) !== true) return undefined;
    }
  }
  return done.every((ring) => ring !== undefined) ? (done as (readonly number[])[]) : undefined;
}

/** Whether two rings run through a bond of both in opposite ways; undefined when they share none. */
function senseBeside(one: readonly number[], other: readonly number[]): boolean | undefined {
  for (const [index, atom] of one.entries()) {
    const next = one[(index + 1) % one.length]!;
    const place = other.indexOf(atom);
    if (place < 0) continue;
    if (other[(place + 1) % other.length] === next) return false;
    if (other[(place + other.length - 1) % other.length] === next) return true;
  }
  return undefined;
}

interface Shared {
  readonly ring: number;
  readonly bond: number;
  readonly otherRing: number;
  readonly otherBond: number;
}

function place(rings: readonly (readonly number[])[], found: Layout[]): void {
  const shared = sharedBonds(rings);
  const order = breadthFirst(rings.length, shared);
  const placed: (PlacedRing | undefined)[] = rings.map(() => undefined);
  let steps = 0;
  const fill = (rank: number): void => {
    if (steps++ > stepLimit) return;
    if (rank === order.length) {
      found.push([...placed] as PlacedRing[]);
      return;
    }
    const index = order[rank]!;
    for (const shape of shapes(rings[index]!.length)) {
      for (let turn = 0; turn < shape.length; turn++) {
        const angles = shape.map((_, bond) => shape[(bond + turn) % shape.length]!);
        const centre = fittingCentre(index, angles, shared, placed);
        if (!centre || placed.some((one) => one && Math.hypot(one.x - centre.x, one.y - centre.y) < 0.6))
          continue;
        placed[index] = { atoms: rings[index]!, angles, ...centre };
        fill(rank + 1);
        placed[index] = undefined;
      }
    }
  };
  fill(0);
}

function sharedBonds(rings: readonly (readonly number[])[]): Shared[] {
  const first = new Map<string, { ring: number; bond: number }>();
  const shared: Shared[] = [];
  for (const [ring, atoms] of rings.entries()) {
    atoms.forEach((atom, bond) => {
      const key = bondKey(atom, atoms[(bond + 1) % atoms.length]!);
      const other = first.get(key);
      if (!other) first.set(key, { ring, bond });
      else {
        shared.push({ ring, bond, otherRing: other.ring, otherBond: other.bond });
        shared.push({ ring: other.ring, bond: other.bond, otherRing: ring, otherBond: bond });
      }
    });
  }
  return shared;
}

function breadthFirst(count: number, shared: readonly Shared[]): number[] {
  const order = [0];
  for (let head = 0; head < order.length && order.length < count; head++) {
    for (const { ring, otherRing } of shared)
      if (ring === order[head] && !order.includes(otherRing)) order.push(otherRing);
  }
  return order;
}

/** Where a ring lies, given those placed before: all its shared bonds must look at their neighbours. */
function fittingCentre(
  index: number,
  angles: readonly number[],
  shared: readonly Shared[],
  placed: readonly (PlacedRing | undefined)[],
): { x: number; y: number } | undefined {
  let centre: { x: number; y: number } | undefined;
  for (const { ring, bond, otherRing, otherBond } of shared) {
    const other = ring === index ? placed[otherRing] : undefined;
    if (!other) continue;
    const outwards = other.angles[otherBond]!;
    if (bend(outwards + 180, angles[bond]!) > largestBend) return undefined;
    const radians = (outwards * Math.PI) / 180;
    const here = { x: other.x + Math.cos(radians), y: other.y + Math.sin(radians) };
    if (centre && Math.hypot(centre.x - here.x, centre.y - here.y) > 0.45) return undefined;
    centre ??= here;
  }
  return centre ?? { x: 0, y: 0 };
}

/** The difference of two directions, 0 to 180 degrees. */
function bend(one: number, other: number): number {
  const apart = (((one - other) % 360) + 360) % 360;
  return Math.min(apart, 360 - apart);
}

const shapesBySize = new Map<number, readonly (readonly number[])[]>();

/** The permitted shapes of a ring: where its bonds look, clockwise. */
function shapes(size: number): readonly (readonly number[])[] {
  let known = shapesBySize.get(size);
  if (!known) shapesBySize.set(size, (known = newShapes(size)));
  return known;
}

function newShapes(size: number): (readonly number[])[] {
  if (size % 2 === 0) return [Array.from({ length: size }, (_, bond) => (360 - (360 / size) * bond) % 360)];
  const pointed = [0, 180].map((upright) =>
    Array.from({ length: size }, (_, bond) => (upright + 360 - (360 / size) * bond) % 360),
  );
  if (size === 3) return pointed;
  // With two upright bonds, one side has a bond more than the other.
  const [few, many] = [(size - 3) / 2, (size - 1) / 2];
  const between = (count: number, from: number) =>
    Array.from({ length: count }, (_, bond) => from - (180 / (count + 1)) * (bond + 1));
  const upright = [
    [180, ...between(many, 180), 0, ...between(few, 360)],
    [180, ...between(few, 180), 0, ...between(many, 360)],
  ];
  return [...upright, ...pointed];
}

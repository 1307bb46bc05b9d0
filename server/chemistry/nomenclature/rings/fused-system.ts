/** Rings sharing bonds, as fusion nomenclature sees them: a component, or the whole put together from components. */
import type { SkeletonAtom, SkeletonGraph } from '../build/skeleton.ts';
import { ringBasis } from '../../structure/ring-basis.ts';
import { chalcogens } from './mancude.ts';

export interface FusedSystem {
  readonly elements: readonly number[];
  readonly bonds: readonly { readonly from: number; readonly to: number }[];
  /** The single rings, each as its atoms in ring order. */
  readonly rings: readonly (readonly number[])[];
}

/** A ring system with its own numbering, before it is fused to others. */
export interface Component extends FusedSystem {
  /** The locant of each atom. */
  readonly locants: readonly string[];
  /** The atoms round the system, from 1 on in the direction of 2; sides a, b, c … lie between them (P-25.3.2.4). */
  readonly periphery: readonly number[];
}

const known = new WeakMap<SkeletonGraph, Component | undefined>();

/** The component that a ring's skeleton makes, or undefined for one that cannot be fused (a spiro or bridged one). */
export function componentOf(skeleton: SkeletonGraph): Component | undefined {
  if (known.has(skeleton)) return known.get(skeleton);
  const made = newComponent(skeleton);
  known.set(skeleton, made);
  return made;
}

function newComponent(skeleton: SkeletonGraph): Component | undefined {
  const { bonds } = skeleton;
  const elements = skeleton.atoms.map((atom) => atom.atomicNumber);
  const locants = skeleton.atoms.map((atom) => atom.locants[0] ?? '');
  const rings = ringBasis({ size: elements.length, bonds });
  const start = locants.indexOf('1');
  if (start < 0 || rings.length === 0 || new Set(rings.flat()).size !== elements.length) return undefined;
  const outer = outerNeighbours({ elements, bonds, rings });
  if (!outer) return undefined;
  const [one, other] = outer[start] ?? [];
  if (one === undefined || other === undefined) return undefined;
  const second = precedes(locants[one]!, locants[other]!) ? one : other;
  const periphery = [start];
  for (let before = start, at = second; at !== start;) {
    periphery.push(at);
    const next = outer[at]!.find((atom) => atom !== before)!;
    [before, at] = [at, next];
    if (periphery.length > elements.length) return undefined;
  }
  return { elements, bonds, rings, locants, periphery };
}

/**
 * For every atom on the outside its two neighbours there, undefined for atoms inside. Undefined as a whole when the
 * outside is no single line, so that the rings do not lie side by side in a plane.
 */
export function outerNeighbours(system: FusedSystem): (readonly [number, number] | undefined)[] | undefined {
  const ringsOfBond = new Map<string, number>();
  for (const ring of system.rings) {
    ring.forEach((atom, index) => {
      const key = bondKey(atom, ring[(index + 1) % ring.length]!);
      ringsOfBond.set(key, (ringsOfBond.get(key) ?? 0) + 1);
    });
  }
  const outer: number[][] = system.elements.map(() => []);
  for (const { from, to } of system.bonds) {
    const count = ringsOfBond.get(bondKey(from, to));
    if (count === undefined || count > 2) return undefined;
    if (count === 1) {
      outer[from]!.push(to);
      outer[to]!.push(from);
    }
  }
  if (outer.some((list) => list.length !== 0 && list.length !== 2)) return undefined;
  return outer.map((list) => (list.length === 2 ? ([list[0]!, list[1]!] as const) : undefined));
}

export const bondKey = (from: number, to: number): string =>
  from < to ? `${String(from)} ${String(to)}` : `${String(to)} ${String(from)}`;

/** Locants in their order: 3, 3a, 4, 10. */
export function precedes(one: string, other: string): boolean {
  const [first, second] = [Number.parseInt(one, 10), Number.parseInt(other, 10)];
  return first === second ? one < other : first < second;
}

/** The system as a parent with the most double bonds possible, its atoms in the order of their locants (`` for none). */
export function numberedSkeleton(system: FusedSystem, locants: readonly string[]): SkeletonGraph {
  const last = '9999';
  const order = system.elements
    .map((_, atom) => atom)
    .sort((one, other) => (precedes(locants[one]! || last, locants[other]! || last) ? -1 : 1));
  const place = new Map(order.map((atom, index) => [atom, index]));
  return {
    kind: 'fixed',
    atoms: order.map((atom): SkeletonAtom => ({
      atomicNumber: system.elements[atom]!,
      charge: 0,
      isotope: 0,
      locants: locants[atom] === '' ? [] : [locants[atom]!],
      mancude: !chalcogens.has(system.elements[atom]!),
    })),
    bonds: system.bonds.map(({ from, to }) => ({ from: place.get(from)!, to: place.get(to)!, order: 1 })),
    indicated: [],
    stereo: [],
  };
}

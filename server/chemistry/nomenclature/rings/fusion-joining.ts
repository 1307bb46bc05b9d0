/** Puts components together where a fusion name says that they share bonds. */
import type { Attachment } from './fusion-descriptor.ts';
import { bondKey, type Component, type FusedSystem } from './fused-system.ts';

export class FusionJoining {
  readonly #components: Component[] = [];
  readonly #offsets: number[] = [];
  readonly #same: number[] = [];

  /** Takes a component in; the answer is its number. */
  add(component: Component): number {
    this.#offsets.push(this.#same.length);
    for (let atom = 0; atom < component.elements.length; atom++) this.#same.push(this.#same.length);
    return this.#components.push(component) - 1;
  }

  /** Lays a path of one component on the sides of another; false when the two do not match. */
  fuse(attached: number, base: number, attachment: Attachment): boolean {
    const goal =
      attachment.sides.length > 0
        ? sidePath(this.#components[base]!, attachment.sides)
        : locantPath(this.#components[base]!, attachment.other);
    if (!goal) return false;
    const own = this.#components[attached]!;
    const path =
      attachment.own.length > 0 ? locantPath(own, attachment.own, goal.length) : anyPath(own, goal.length);
    if (path?.length !== goal.length) return false;
    path.forEach((atom, index) => {
      this.#join(this.#offsets[attached]! + atom, this.#offsets[base]! + goal[index]!);
    });
    return true;
  }

  /** The whole system; undefined when shared atoms are of different elements, or an atom lies in too many rings. */
  finished(): FusedSystem | undefined {
    const elements: number[] = [];
    const places = new Map<number, number>();
    const all = this.#components.flatMap((component, index) =>
      component.elements.map((element, atom) => ({
        element,
        root: this.#root(this.#offsets[index]! + atom),
      })),
    );
    for (const { element, root } of all) {
      const place = places.get(root);
      if (place === undefined) places.set(root, elements.push(element) - 1);
      else if (elements[place] !== element) return undefined;
    }
    const at = (index: number, atom: number) => places.get(this.#root(this.#offsets[index]! + atom))!;
    const bonds = new Map<string, { from: number; to: number }>();
    const rings = new Map<string, number[]>();
    for (const [index, component] of this.#components.entries()) {
      for (const bond of component.bonds) {
        const [from, to] = [at(index, bond.from), at(index, bond.to)];
        bonds.set(bondKey(from, to), { from, to });
      }
      for (const ring of component.rings) {
        const atoms = ring.map((atom) => at(index, atom));
        if (new Set(atoms).size !== atoms.length) return undefined;
        rings.set([...atoms].sort((one, other) => one - other).join(' '), atoms);
      }
    }
    const degree = elements.map(() => 0);
    for (const { from, to } of bonds.values()) {
      degree[from]!++;
      degree[to]!++;
    }
    if (degree.some((count) => count > 3) || rings.size !== bonds.size - elements.length + 1)
      return undefined;
    return { elements, bonds: [...bonds.values()], rings: [...rings.values()] };
  }

  #root(atom: number): number {
    let root = atom;
    while (this.#same[root] !== root) root = this.#same[root]!;
    return root;
  }

  #join(one: number, other: number): void {
    this.#same[this.#root(one)] = this.#root(other);
  }
}

/** The atoms along the sides with these letters. */
function sidePath(component: Component, sides: readonly number[]): number[] | undefined {
  const { periphery } = component;
  const last = sides[sides.length - 1]!;
  if (last >= periphery.length) return undefined;
  return [...sides, last + 1].map((side) => periphery[side % periphery.length]!);
}

/**
 * The way round the outside from the first locant to the last, through those between; fusion atoms on it need not be cited
 * (P-25.3.4.2.2). `length`: the number of atoms that it must have, where that is known.
 */
function locantPath(component: Component, locants: readonly string[], length?: number): number[] | undefined {
  const { periphery } = component;
  const size = periphery.length;
  const places = locants.map((locant) => periphery.findIndex((atom) => component.locants[atom] === locant));
  if (places.length < 2 || places.some((place) => place < 0)) return undefined;
  const [first, last] = [places[0]!, places[places.length - 1]!];
  const ways = [1, -1].flatMap((step) => {
    const way: number[] = [];
    for (let place = first; ; place = (place + step + size) % size) {
      way.push(place);
      if (place === last) break;
    }
    const cited = way.filter((place) => places.includes(place));
    const fits = cited.length === places.length && cited.every((place, index) => place === places[index]);
    return fits && (length === undefined || way.length === length) ? [way] : [];
  });
  // A ring has a short way and a long one.
  const [way] = ways.sort((one, other) => one.length - other.length);
  return way?.map((place) => periphery[place]!);
}

/** Locants are left out where every place is like every other: in a ring of carbon. */
function anyPath(component: Component, length: number): number[] | undefined {
  const simple = component.rings.length === 1 && component.elements.every((element) => element === 6);
  return simple && length < component.periphery.length ? component.periphery.slice(0, length) : undefined;
}

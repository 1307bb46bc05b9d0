/**
 * A line formula half read: atoms in a tree, the place at which the line goes on, and groups that wait for their atom. A
 * sketch never changes; each step makes a new one, so that several ways of going on can be tried.
 */
import { joints, oxoLimit, phenylenes } from './symbols.ts';

export interface SketchAtom {
  /** An element's symbol, or the SMILES of a group with its bonding atom first. */
  readonly symbol: string;
  readonly group: boolean;
  readonly hydrogens: number;
  /** Bonds that it can form beside its oxo groups, and those that it forms. */
  readonly valence: number;
  readonly used: number;
  readonly oxo: number;
  /** The atom from which the line came to it, −1 for the first. */
  readonly from: number;
  readonly links: readonly { readonly to: number; readonly order: number }[];
}

export interface Sketch {
  readonly atoms: readonly SketchAtom[];
  /** The atom after which the line goes on; −1 before the first. */
  readonly current: number;
  /** Groups before their atom: `Ph3` of `Ph3P`. */
  readonly waiting: readonly string[];
}

export const emptySketch: Sketch = { atoms: [], current: -1, waiting: [] };

export const freeAt = (atom: SketchAtom): number => atom.valence - atom.used;

/** The atom to which the next one is bound: the current one, or the nearest before it that has a bond free. */
export function openPlace(sketch: Sketch): number {
  let at = sketch.current;
  while (at >= 0 && freeAt(sketch.atoms[at]!) === 0) at = sketch.atoms[at]!.from;
  return at;
}

function changed(sketch: Sketch, index: number, change: Partial<SketchAtom>): Sketch {
  const atoms = sketch.atoms.map((atom, at) => (at === index ? { ...atom, ...change } : atom));
  return { ...sketch, atoms };
}

/** Binds an atom to another by `order`, or undefined when a valence is passed. */
function added(sketch: Sketch, atom: SketchAtom, place: number, order: number): Sketch | undefined {
  const index = sketch.atoms.length;
  if (place < 0) return { ...sketch, atoms: [...sketch.atoms, atom] };
  const before = sketch.atoms[place]!;
  if (freeAt(before) < order || freeAt(atom) < order) return undefined;
  const links = [...before.links, { to: index, order }];
  const linked = changed(sketch, place, { used: before.used + order, links });
  const made = { ...atom, used: atom.used + order, from: place, links: [{ to: place, order }] };
  return { ...linked, atoms: [...linked.atoms, made] };
}

const groupAtom = (smiles: string): SketchAtom => ({
  symbol: smiles,
  group: true,
  hydrogens: 0,
  valence: 1,
  used: 0,
  oxo: 0,
  from: -1,
  links: [],
});

/** The line goes on with an atom; what waited is bound to it. */
export function withAtom(sketch: Sketch, symbol: string, order: number): Sketch | undefined {
  const atom: SketchAtom = { ...groupAtom(symbol), group: false, valence: joints[symbol]! };
  // A double bond on phosphorus or sulfur is one of its oxo kind: `Ph3P=CH2`.
  const place = openPlaceFor(sketch, order);
  if (place < 0 && sketch.atoms.length > 0) return undefined;
  const full = order === 2 && place >= 0 && freeAt(sketch.atoms[place]!) < order;
  const opened = full ? withRoom(sketch, place) : sketch;
  const made = added(opened, atom, place, order);
  if (!made) return undefined;
  const index = made.atoms.length - 1;
  let result: Sketch | undefined = { ...made, current: index, waiting: [] };
  for (const group of sketch.waiting) {
    result = group === 'H' ? withHydrogens(result, index, 1) : added(result, groupAtom(group), index, 1);
    if (!result) return undefined;
  }
  return result;
}

function openPlaceFor(sketch: Sketch, order: number): number {
  const { current } = sketch;
  if (order === 2 && current >= 0 && oxoLimit[sketch.atoms[current]!.symbol] !== undefined) return current;
  return openPlace(sketch);
}

/** Two bonds more on an atom that takes oxo groups beyond its ordinary bonds, where those are full. */
function withRoom(sketch: Sketch, place: number): Sketch {
  const atom = sketch.atoms[place]!;
  const limit = oxoLimit[atom.symbol];
  if (limit === undefined || atom.oxo >= limit) return sketch;
  return changed(sketch, place, { oxo: atom.oxo + 1, valence: atom.valence + 2 });
}

/** Hydrogens on an atom. */
export function withHydrogens(sketch: Sketch, index: number, count: number): Sketch | undefined {
  const atom = sketch.atoms[index]!;
  if (freeAt(atom) < count) return undefined;
  return changed(sketch, index, { hydrogens: atom.hydrogens + count, used: atom.used + count });
}

/** Groups with one bond on the place where the line stands. */
export function withGroups(sketch: Sketch, smiles: string, count: number): Sketch | undefined {
  const place = openPlace(sketch);
  // Peroxides are written `OO`, never `O(OEt)`.
  if (place < 0 || (sketch.atoms[place]!.symbol === 'O' && smiles.startsWith('[O'))) return undefined;
  let result: Sketch | undefined = sketch;
  for (let copy = 0; copy < count && result; copy++) result = added(result, groupAtom(smiles), place, 1);
  return result;
}

/** Ends on the current atom that take two or three bonds: `=O`, `=S`, `≡N`, `=[N+]=[N-]`. */
export function withEnd(sketch: Sketch, smiles: string, order: 2 | 3, count = 1): Sketch | undefined {
  const place = sketch.current;
  if (place < 0) return undefined;
  let result: Sketch = sketch;
  for (let copy = 0; copy < count; copy++) {
    const room: Sketch = order === 2 ? withRoom(result, place) : result;
    const next = added(room, { ...groupAtom(smiles), valence: order }, place, order);
    if (!next) return undefined;
    result = next;
  }
  return result;
}

const bondSigns = ['', '', '=', '#'];

/** The SMILES of the sketch written from one of its atoms, `mark` put on that atom: a charge, a ring-bond number. */
export function sketchSmiles(
  { atoms }: Sketch,
  root: number,
  mark: { charge?: string; bond?: string } = {},
): string {
  return write(root, -1);

  function write(index: number, from: number): string {
    const atom = atoms[index]!;
    const links = atom.links.filter(({ to }) => to !== from);
    const branches = links.map(({ to, order }, at) => {
      const text = bondSigns[order]! + write(to, index);
      return at === links.length - 1 && !atom.group ? text : `(${text})`;
    });
    const marked = index === root ? mark : {};
    if (phenylenes[atom.symbol]) return phenylene(atom.symbol, branches);
    return headOf(atom, marked.charge ?? '', (marked.bond ?? '') + branches.join(''));
  }
}

/** A benzene ring with one or two branches; of one, its first place is that of the atom before or of the free bond. */
function phenylene(symbol: string, branches: readonly string[]): string {
  const bare = branches.map((branch) => (branch.startsWith('(') ? branch.slice(1, -1) : branch));
  const second = bare[bare.length - 1] ?? '';
  const first = bare.length === 2 ? `(${bare[0]!})` : '';
  let ring = 98;
  while (bare.some((branch) => branch.includes(`%${String(ring)}`))) ring--;
  const [before, after] = phenylenes[symbol]!;
  // Two branches on neighbours: the second place closes the ring.
  const middle = after === '' ? `${before}c%${String(ring)}` : `${before}c`;
  const end = after === '' ? '' : `${after.slice(0, -1)}c%${String(ring)}`;
  return `c%${String(ring)}${first}${middle}${second === '' ? '' : `(${second})`}${end}`;
}

/** The atom's own text with what hangs on it; a group's first atom takes what is bound to the group. */
function headOf(atom: SketchAtom, charge: string, hangs: string): string {
  if (!atom.group) {
    const hydrogens = atom.hydrogens === 0 ? '' : `H${String(atom.hydrogens)}`;
    return `[${atom.symbol}${hydrogens}${charge}]${hangs}`;
  }
  const first = /^(?:\[[^\]]*\]|Cl|Br|[A-Za-z])(?:%\d\d|\d)*/.exec(atom.symbol)![0];
  return first + hangs + atom.symbol.slice(first.length);
}

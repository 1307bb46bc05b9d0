/**
 * Numbers a fused system (P-25.3.1.3): of the permitted drawings those with most rings in a row, most in the upper right
 * quadrant, fewest in the lower left and most above the row; then round the outside, clockwise from the upper right
 * ring, with low locants for heteroatoms together, for the senior ones, for fusion carbon atoms and fusion heteroatoms.
 */
import { layoutsOf, type Layout, type PlacedRing } from './fusion-layout.ts';
import { bondKey, outerNeighbours, type FusedSystem } from './fused-system.ts';

interface Numbering {
  /** The locant of each atom; `` for atoms inside, of which there is more than one. */
  readonly locants: readonly string[];
  readonly criteria: readonly (readonly number[])[];
}

/** Order of heteroatoms in fusion nomenclature (P-25.2.1, table 2.4): the earlier the more senior. */
const senior = [9, 17, 35, 53, 8, 16, 34, 52, 7, 15, 33, 51, 83, 14, 32, 50, 82, 5, 13];
/** Where among the criteria the locants of fusion carbon atoms stand: after heteroatoms together and one by one. */
const fusionCarbonPlace = senior.length + 1;

/**
 * The locants of all atoms by the rules, and then by the usage that puts low locants of fusion carbon atoms before those
 * of heteroatoms, where that differs (met in computed names of larger systems; common practice, no source). Nothing when
 * the rings cannot be drawn; a numbering is left out when the rules leave several whose atoms are not alike.
 */
export function fusionLocants(system: FusedSystem): (readonly string[])[] {
  if (!outerNeighbours(system)) return [];
  const numberings = bestDrawings(layoutsOf(system)).flatMap((layout) => numbered(system, layout) ?? []);
  const ruled = lowest(system, numberings);
  if (!ruled) return [];
  const other = lowest(
    system,
    numberings.map((one) => ({ ...one, criteria: [one.criteria[fusionCarbonPlace]!, ...one.criteria] })),
  );
  const differs = other && compareLists(other.criteria[0]!, ruled.criteria[fusionCarbonPlace]!) < 0;
  return differs ? [ruled.locants, other.locants] : [ruled.locants];
}

/** The numbering with the lowest criteria, or undefined when several that are not alike share them. */
function lowest(system: FusedSystem, numberings: readonly Numbering[]): Numbering | undefined {
  let best: Numbering[] = [];
  for (const one of numberings) {
    const order = best.length === 0 ? -1 : compare(one.criteria, best[0]!.criteria);
    if (order < 0) best = [one];
    else if (order === 0) best.push(one);
  }
  const [first, ...others] = best;
  return first && others.every((other) => alike(system, first.locants, other.locants)) ? first : undefined;
}

interface Judged {
  readonly layout: Layout;
  readonly score: readonly number[];
}

/** The drawings which the rules of orientation prefer. */
function bestDrawings(layouts: readonly Layout[]): Layout[] {
  let best: Judged[] = [];
  for (const layout of layouts) {
    for (const row of rowsOf(layout)) {
      const judged = { layout, score: scoreOf(layout, row) };
      const order = best.length === 0 ? -1 : compareLists(judged.score, best[0]!.score);
      if (order < 0) best = [judged];
      else if (order === 0) best.push(judged);
    }
  }
  return best.map(({ layout }) => layout);
}

/** Rings joined by upright bonds, from left to right. */
function rowsOf(layout: Layout): PlacedRing[][] {
  const rightOf = new Map<PlacedRing, PlacedRing>();
  for (const ring of layout) {
    const bond = ring.angles.findIndex((angle) => angle % 360 === 0);
    if (bond < 0) continue;
    const [from, to] = [ring.atoms[bond]!, ring.atoms[(bond + 1) % ring.atoms.length]!];
    const beside = layout.find((other) => {
      const place = other.atoms.indexOf(to);
      return (
        other !== ring &&
        place >= 0 &&
        other.atoms[(place + 1) % other.atoms.length] === from &&
        other.angles[place] === 180
      );
    });
    if (beside) rightOf.set(ring, beside);
  }
  const followers = new Set(rightOf.values());
  return layout
    .filter((ring) => !followers.has(ring))
    .map((ring) => {
      const row = [ring];
      for (let next = rightOf.get(ring); next; next = rightOf.get(next)) row.push(next);
      return row;
    });
}

const near = 0.2;

/** Lower is better: rings in the row, upper right, lower left, above. A ring on an axis counts half on either side. */
function scoreOf(layout: Layout, row: readonly PlacedRing[]): number[] {
  const [x, y] = [(row[0]!.x + row[row.length - 1]!.x) / 2, row[0]!.y];
  const share = (distance: number) => (distance > near ? 1 : distance < -near ? 0 : 0.5);
  let [upperRight, lowerLeft, above] = [0, 0, 0];
  for (const ring of layout) {
    const [right, up] = [share(ring.x - x), share(ring.y - y)];
    upperRight += right * up;
    lowerLeft += (1 - right) * (1 - up);
    above += up;
  }
  return [-row.length, -upperRight, lowerLeft, -above];
}

/** Numbers the atoms of one drawing. */
function numbered(system: FusedSystem, layout: Layout): Numbering | undefined {
  const next = clockwise(layout);
  const start = firstAtom(layout, next);
  if (start === undefined) return undefined;
  const ringCount = countRings(system);
  const locants = system.elements.map(() => '');
  let [number, letter] = [0, 0];
  const seen = new Set<number>();
  for (let atom = start; !seen.has(atom); atom = next.get(atom)!) {
    seen.add(atom);
    if (ringCount[atom] === 1 || system.elements[atom] !== 6) {
      number++;
      letter = 0;
      locants[atom] = String(number);
    } else locants[atom] = `${String(number)}${String.fromCharCode(97 + letter++)}`;
    if (!next.has(atom)) return undefined;
  }
  const inside = system.elements.flatMap((_, atom) => (seen.has(atom) ? [] : [atom]));
  if (inside.length === 1) {
    const carbon = system.elements[inside[0]!] === 6;
    locants[inside[0]!] = carbon
      ? `${String(number)}${String.fromCharCode(97 + letter)}`
      : String(number + 1);
  }
  return { locants, criteria: criteriaOf(system, locants, ringCount) };
}

/** The way round the outside: for each atom there the next one, clockwise. */
function clockwise(layout: Layout): Map<number, number> {
  const rings = new Map<string, number>();
  const bonds = layout.flatMap(({ atoms }) =>
    atoms.map((atom, index) => [atom, atoms[(index + 1) % atoms.length]!] as const),
  );
  for (const [from, to] of bonds) rings.set(bondKey(from, to), (rings.get(bondKey(from, to)) ?? 0) + 1);
  return new Map(bonds.filter(([from, to]) => rings.get(bondKey(from, to)) === 1));
}

/** The most counter-clockwise atom, not of a fusion, of the ring highest up and there farthest right. */
function firstAtom(layout: Layout, next: ReadonlyMap<number, number>): number | undefined {
  const top = Math.max(...layout.map((ring) => ring.y));
  const [ring] = layout.filter((one) => one.y > top - near).sort((one, other) => other.x - one.x);
  const count = new Map<number, number>();
  for (const { atoms } of layout) for (const atom of atoms) count.set(atom, (count.get(atom) ?? 0) + 1);
  const { atoms, angles } = ring!;
  // Clockwise round the ring from where its left bond looks.
  const from = (index: number) => (angles[index]! + 360 - 180.5) % 360;
  const order = atoms.map((_, index) => index).sort((one, other) => from(other) - from(one));
  const isStart = (index: number) =>
    count.get(atoms[index]!) === 1 && count.get(atoms[(index + atoms.length - 1) % atoms.length]!)! > 1;
  const found = order.find(isStart);
  if (found !== undefined) return atoms[found];
  let atom: number | undefined = atoms.find((one) => next.has(one));
  for (let steps = 0; atom !== undefined && steps < next.size; steps++) {
    if (count.get(atom) === 1) return atom;
    atom = next.get(atom);
  }
  return undefined;
}

function countRings(system: FusedSystem): number[] {
  const count = system.elements.map(() => 0);
  for (const ring of system.rings) for (const atom of ring) count[atom]!++;
  return count;
}

/** What is compared, in this order, the lower the better. */
function criteriaOf(
  system: FusedSystem,
  locants: readonly string[],
  ringCount: readonly number[],
): number[][] {
  const value = (atom: number) => {
    const locant = locants[atom]!;
    const letter = /[a-z]$/.test(locant) ? locant.charCodeAt(locant.length - 1) - 96 : 0;
    return (locant === '' ? 1000 : Number.parseInt(locant, 10)) + letter / 100;
  };
  const sorted = (wanted: (atom: number) => boolean) =>
    system.elements
      .flatMap((_, atom) => (wanted(atom) ? [value(atom)] : []))
      .sort((first, second) => first - second);
  const isHetero = (atom: number) => system.elements[atom] !== 6;
  const isFusion = (atom: number) => ringCount[atom]! > 1;
  return [
    sorted(isHetero),
    ...senior.map((element) => sorted((atom) => system.elements[atom] === element)),
    sorted((atom) => isFusion(atom) && !isHetero(atom)),
    sorted((atom) => isFusion(atom) && isHetero(atom)),
  ];
}

function compare(one: readonly (readonly number[])[], other: readonly (readonly number[])[]): number {
  for (const [index, list] of one.entries()) {
    const order = compareLists(list, other[index]!);
    if (order !== 0) return order;
  }
  return 0;
}

function compareLists(one: readonly number[], other: readonly number[]): number {
  const place = one.findIndex((value, index) => Math.abs(value - (other[index] ?? value)) > 1e-9);
  return place < 0 ? 0 : one[place]! - other[place]!;
}

/** Whether two numberings put the same locants on atoms and bonds of the same kind. */
function alike(system: FusedSystem, one: readonly string[], other: readonly string[]): boolean {
  const map = new Map(other.flatMap((locant, atom) => (locant === '' ? [] : [[locant, atom] as const])));
  const image = one.map((locant) => map.get(locant));
  const bonds = new Set(system.bonds.map(({ from, to }) => bondKey(from, to)));
  return (
    system.elements.every(
      (element, atom) => one[atom] === '' || element === system.elements[image[atom] ?? -1],
    ) &&
    system.bonds.every(({ from, to }) => {
      const [first, second] = [image[from], image[to]];
      return first === undefined || second === undefined || bonds.has(bondKey(first, second));
    })
  );
}

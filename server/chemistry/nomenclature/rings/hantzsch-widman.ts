/**
 * Hantzsch–Widman names of heteromonocycles of three to ten members: locants, `a` prefixes, and a stem for size and
 * saturation. Source: IUPAC Recommendations 2013, P-22.2.2.1 (tables 2.4 and 2.5).
 */
import type { SkeletonAtom, SkeletonGraph } from '../build/skeleton.ts';
import { benzoHeterocyclesAt, type HeterocycleName } from './benzo-heterocycles.ts';
import { eachHeteroatom, inOrder, stemsAt } from './heterocycle-words.ts';
import { chalcogens, usualHydrogen } from './mancude.ts';
import { namedRing } from './named-rings.ts';

const locantList = /(?:(\d+(?:,\d+)*)-|\[(\d+(?:,\d+)*)\])/y;
/** Names of table 2.2 and groups (`thiol`) stand in the place of these; `dioxin` without locants is a family. */
const notMeant = /^(?:(?:az|ox|thi|selen|tellur)ol|azin|(?:di|tri)(?:ox|thi|selen)ol|dioxin)$/;

/** Names like `oxirane`, `1,3-dioxolane`, `1,2,4-triazole` at the offset; their locants belong to the name. */
export function hantzschWidmanAt(text: string, lower: string, offset: number): HeterocycleName[] {
  locantList.lastIndex = offset;
  const match = locantList.exec(text);
  const locants = match ? (match[1] ?? match[2]!).split(',').map(Number) : undefined;
  const begin = match ? locantList.lastIndex : offset;
  const found: HeterocycleName[] = [];
  eachHeteroatom(lower, begin, (atoms, at) => {
    for (const { end, size, mancude } of stemsAt(lower, at, atoms[atoms.length - 1]!)) {
      if (!isMeant(lower.slice(begin, end), atoms, locants !== undefined)) continue;
      const skeletons =
        locants || atoms.length === 1
          ? [heteroRing(atoms, locants ?? [1], size, mancude)].filter((one) => one !== undefined)
          : arrangements(atoms, size, mancude);
      if (skeletons.length > 0) found.push({ skeletons, end });
    }
  });
  return locants ? [...found, ...benzoHeterocyclesAt(lower, begin, locants)] : found;
}

/** Without locants a name is not one that is written otherwise, and cites its atoms in order. */
function isMeant(name: string, atoms: readonly number[], located: boolean): boolean {
  if (located) return atoms.length > 1 || !notMeant.test(name);
  return !notMeant.test(name) && inOrder(atoms) && !namedRing(name);
}

/** With more than one heteroatom every one needs its locant. */
function heteroRing(
  hetero: readonly number[],
  places: readonly number[],
  size: number,
  mancude: boolean,
): SkeletonGraph | undefined {
  if (
    places.length !== hetero.length ||
    new Set(places).size !== places.length ||
    places.some((one) => one > size || one < 1)
  ) {
    return undefined;
  }
  const atoms = Array.from({ length: size }, (_, index): SkeletonAtom => {
    const which = places.indexOf(index + 1);
    const atomicNumber = which < 0 ? 6 : hetero[which]!;
    return {
      atomicNumber,
      charge: 0,
      isotope: 0,
      locants: [String(index + 1)],
      mancude: mancude && !chalcogens.has(atomicNumber),
    };
  });
  const bonds = atoms.map((_, index) => ({ from: index, to: (index + 1) % size, order: 1 }));
  return { kind: 'ring', atoms, bonds, indicated: mancude ? usualHydrogen(atoms) : [], stereo: [] };
}

/** A name without locants means every ring that its atoms can make, each numbered by P-22.2.2.1.3. */
function arrangements(hetero: readonly number[], size: number, mancude: boolean): SkeletonGraph[] {
  const found = new Map<string, readonly number[]>();
  place([]);
  const made = [...found.values()].flatMap((places) => {
    const skeleton = heteroRing(hetero, places, size, mancude);
    return skeleton ? [{ ...skeleton, mark: `${places.join(',')}-` }] : [];
  });
  return made.length > 1
    ? made
    : made.map(({ atoms, bonds, indicated, kind, stereo }) => ({ atoms, bonds, indicated, kind, stereo }));

  /** The first atom is number 1; those of one element follow in order. */
  function place(places: readonly number[]): void {
    const next = places.length;
    if (next === hetero.length) {
      const key = ringKey(hetero, places, size);
      const known = found.get(key);
      if (!known || isLowerSet(places, known)) found.set(key, places);
      return;
    }
    const from = next > 0 && hetero[next] === hetero[next - 1] ? places[next - 1]! + 1 : 1;
    for (let at = from; at <= (next === 0 ? 1 : size); at++) if (!places.includes(at)) place([...places, at]);
  }
}

/** Equal for the same ring turned or mirrored. */
function ringKey(hetero: readonly number[], places: readonly number[], size: number): string {
  const ring = Array.from({ length: size }, (_, index) => hetero[places.indexOf(index + 1)] ?? 6);
  const turned = ring.flatMap((_, start) => {
    const once = [...ring.slice(start), ...ring.slice(0, start)];
    return [once.join(' '), once.reverse().join(' ')];
  });
  return turned.sort()[0]!;
}

/** Lower locants all together, then in order of citation. */
function isLowerSet(one: readonly number[], other: readonly number[]): boolean {
  const sorted = (list: readonly number[]) => [...list].sort((a, b) => a - b);
  const [all, known] = [
    [...sorted(one), ...one],
    [...sorted(other), ...other],
  ];
  const place = all.findIndex((value, index) => value !== known[index]);
  return place >= 0 && all[place]! < known[place]!;
}

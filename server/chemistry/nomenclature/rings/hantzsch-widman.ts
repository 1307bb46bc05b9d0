/**
 * Hantzsch–Widman names of heteromonocycles of three to ten members: locants, `a` prefixes, and a stem for size and
 * saturation. Source: IUPAC Recommendations 2013, P-22.2.2.1 (tables 2.4 and 2.5).
 */
import type { SkeletonAtom, SkeletonGraph } from '../build/skeleton.ts';

const prefixes: readonly (readonly [name: string, atomicNumber: number])[] = [
  ['oxa', 8],
  ['ox', 8],
  ['thia', 16],
  ['thi', 16],
  ['selena', 34],
  ['selen', 34],
  ['aza', 7],
  ['az', 7],
  ['phospha', 15],
  ['phosph', 15],
  ['sila', 14],
  ['sil', 14],
  ['bora', 5],
  ['bor', 5],
  ['dithia', 16],
];
const stems: readonly (readonly [name: string, size: number, mancude: boolean])[] = [
  ['iridin', 3, false],
  ['iran', 3, false],
  ['iren', 3, true],
  ['irin', 3, true],
  ['etidin', 4, false],
  ['etan', 4, false],
  ['et', 4, true],
  ['ete', 4, true],
  ['olidin', 5, false],
  ['olan', 5, false],
  ['ol', 5, true],
  ['inan', 6, false],
  ['an', 6, false],
  ['in', 6, true],
  ['inin', 6, true],
  ['epan', 7, false],
  ['epin', 7, true],
  ['ocan', 8, false],
  ['ocin', 8, true],
  ['onan', 9, false],
  ['onin', 9, true],
  ['ecan', 10, false],
  ['ecin', 10, true],
];
const multipliers: readonly (readonly [string, number])[] = [
  ['di', 2],
  ['tri', 3],
  ['tetra', 4],
  ['tetr', 4],
  ['penta', 5],
];
/** Retained heterocycles that `benzo` is put before with locants (P-25.2.2.4). */
const benzoRetained: readonly (readonly [name: string, heteros: readonly number[], size: number])[] = [
  ['furan', [8], 5],
  ['thiophen', [16], 5],
  ['selenophen', [34], 5],
  ['pyran', [8], 6],
  ['thiopyran', [16], 6],
  ['oxazol', [8, 7], 5],
  ['thiazol', [16, 7], 5],
  ['imidazol', [7, 7], 5],
  ['isoxazol', [8, 7], 5],
];
const locantList = /(\d(?:,\d)*)-/y;

interface Made {
  readonly skeletons: SkeletonGraph[];
  readonly end: number;
}

/** Names like `oxirane`, `1,3-dioxolane`, `1,2,4-triazole` at the offset; their locants belong to the name. */
export function hantzschWidmanAt(text: string, lower: string, offset: number): Made[] {
  locantList.lastIndex = offset;
  const match = locantList.exec(text);
  const locants = match ? match[1]!.split(',').map(Number) : undefined;
  const found: Made[] = [];
  const begin = match ? locantList.lastIndex : offset;
  const benzo = lower.startsWith('benzo', begin) ? 5 : lower.startsWith('benz', begin) ? 4 : 0;
  heteroatoms(begin, []);
  if (locants && benzo > 0) {
    for (const [name, heteros, size] of benzoRetained) {
      const at = begin + benzo;
      if (!lower.startsWith(name, at) && !(benzo === 5 && lower.startsWith(name, at - 1))) continue;
      const skeleton = benzoRing(heteros, locants, size);
      const end = (lower.startsWith(name, at) ? at : at - 1) + name.length;
      if (skeleton) found.push({ skeletons: [skeleton], end });
    }
    for (const at of benzo === 5 ? [begin + 5, begin + 4] : [begin + 4]) fused(at, []);
  }
  return found;

  /** P-25.2.2.4: a benzene ring fused to a heteromonocycle; the locants are those of the whole. */
  function fused(at: number, atoms: readonly number[]): void {
    if (atoms.length > 0) {
      for (const [stem, size, mancude] of stems) {
        if (!mancude || !lower.startsWith(stem, at) || !fitsStem(stem, atoms[atoms.length - 1]!)) continue;
        const skeleton = benzoRing(atoms, locants, size);
        if (skeleton) found.push({ skeletons: [skeleton], end: at + stem.length });
      }
    }
    if (atoms.length > 4) return;
    eachPrefix(at, (next, added) => {
      fused(next, [...atoms, ...added]);
    });
  }

  function heteroatoms(at: number, atoms: readonly number[]): void {
    if (atoms.length > 0) {
      const last = atoms[atoms.length - 1]!;
      for (const [stem, size, mancude] of stems) {
        if (!lower.startsWith(stem, at) || !fitsStem(stem, last)) continue;
        const skeleton = heteroRing(atoms, locants, size, mancude);
        if (skeleton) found.push({ skeletons: [skeleton], end: at + stem.length });
      }
    }
    if (atoms.length > 4) return;
    eachPrefix(at, (next, added) => {
      heteroatoms(next, [...atoms, ...added]);
    });
  }
  function eachPrefix(at: number, then: (next: number, added: number[]) => void): void {
    for (const [multiplier, count] of [['', 1] as const, ...multipliers]) {
      if (!lower.startsWith(multiplier, at)) continue;
      for (const [name, atomicNumber] of prefixes) {
        if (!lower.startsWith(name, at + multiplier.length)) continue;
        then(
          at + multiplier.length + name.length,
          Array.from({ length: count }, () => atomicNumber),
        );
      }
    }
  }
}

/** Numbered from the hetero ring on: its own atoms, a fusion atom, the four of the benzene ring, a fusion atom. */
function benzoRing(
  hetero: readonly number[],
  locants: readonly number[] | undefined,
  size: number,
): SkeletonGraph | undefined {
  const own = size - 2;
  if (
    locants?.length !== hetero.length ||
    new Set(locants).size !== locants.length ||
    locants.some((one) => one > own || one < 1)
  ) {
    return undefined;
  }
  const names = [
    ...Array.from({ length: own }, (_, index) => String(index + 1)),
    `${String(own)}a`,
    ...Array.from({ length: 4 }, (_, index) => String(own + index + 1)),
    `${String(own + 4)}a`,
  ];
  const atoms = names.map((name): SkeletonAtom => {
    const which = locants.findIndex((one) => String(one) === name);
    const atomicNumber = which < 0 ? 6 : hetero[which]!;
    const mancude = atomicNumber !== 8 && atomicNumber !== 16 && atomicNumber !== 34;
    return { atomicNumber, charge: 0, isotope: 0, locants: [name], mancude };
  });
  const bonds = atoms.map((_, index) => ({ from: index, to: (index + 1) % atoms.length, order: 1 }));
  bonds.push({ from: own, to: atoms.length - 1, order: 1 });
  return { kind: 'fixed', atoms, bonds, indicated: usualHydrogen(atoms), stereo: [] };
}

/** Table 2.5: the stem of a six-membered ring depends on the heteroatom named last. */
function fitsStem(stem: string, last: number): boolean {
  const chalcogen = last === 8 || last === 16 || last === 34;
  if (stem === 'an') return chalcogen;
  if (stem === 'inan') return !chalcogen;
  if (stem === 'in') return chalcogen || last === 7 || last === 14;
  if (stem === 'inin') return last === 15 || last === 5;
  return true;
}

/** One heteroatom is number 1; with more, every one needs its locant. `oxazole` and `thiazole` are 1,3 by retention. */
function heteroRing(
  hetero: readonly number[],
  locants: readonly number[] | undefined,
  size: number,
  mancude: boolean,
): SkeletonGraph | undefined {
  const places = locants ?? (hetero.length === 1 ? [1] : undefined);
  if (
    places?.length !== hetero.length ||
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
      mancude: mancude && atomicNumber !== 8 && atomicNumber !== 16 && atomicNumber !== 34,
    };
  });
  const bonds = atoms.map((_, index) => ({ from: index, to: (index + 1) % size, order: 1 }));
  return { kind: 'ring', atoms, bonds, indicated: mancude ? usualHydrogen(atoms) : [], stereo: [] };
}

/** An azole without indicated hydrogen in its name means the tautomer with the lowest numbered NH, as 1H. */
function usualHydrogen(atoms: readonly SkeletonAtom[]): number[] {
  const mancude = atoms.filter((atom) => atom.mancude).length;
  if (mancude % 2 === 0) return [];
  const nitrogen = atoms.findIndex((atom) => atom.mancude && atom.atomicNumber === 7);
  return nitrogen < 0 ? [] : [nitrogen];
}

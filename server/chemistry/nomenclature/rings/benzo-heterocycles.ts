/** Benzo heterocycles (P-25.2.2.4): locants of the heteroatoms, `benzo`, and the name of the heteromonocycle. */
import type { SkeletonAtom, SkeletonGraph } from '../build/skeleton.ts';
import { eachHeteroatom, stemsAt } from './heterocycle-words.ts';
import { chalcogens, usualHydrogen } from './mancude.ts';

export interface HeterocycleName {
  readonly skeletons: SkeletonGraph[];
  /** Before the final e. */
  readonly end: number;
}

/** Retained heterocycles that `benzo` is put before with locants. */
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

/** `1,3-benzodioxole`, `2H-1,4-benzoxazine` at the offset, after the locants. */
export function benzoHeterocyclesAt(
  lower: string,
  begin: number,
  locants: readonly number[],
): HeterocycleName[] {
  const length = lower.startsWith('benzo', begin) ? 5 : lower.startsWith('benz', begin) ? 4 : 0;
  if (length === 0) return [];
  const found: HeterocycleName[] = [];
  const starts = length === 5 ? [begin + 5, begin + 4] : [begin + 4];
  for (const [name, heteros, size] of benzoRetained) {
    const at = starts.find((start) => lower.startsWith(name, start));
    const skeleton = at === undefined ? undefined : benzoRing(heteros, locants, size);
    if (skeleton) found.push({ skeletons: [skeleton], end: at! + name.length });
  }
  for (const start of starts) {
    eachHeteroatom(lower, start, (atoms, at) => {
      for (const { end, size, mancude } of stemsAt(lower, at, atoms[atoms.length - 1]!)) {
        const skeleton = mancude ? benzoRing(atoms, locants, size) : undefined;
        if (skeleton) found.push({ skeletons: [skeleton], end });
      }
    });
  }
  return found;
}

/** Numbered from the hetero ring on: its own atoms, a fusion atom, the four of the benzene ring, a fusion atom. */
function benzoRing(
  hetero: readonly number[],
  locants: readonly number[],
  size: number,
): SkeletonGraph | undefined {
  const own = size - 2;
  if (
    locants.length !== hetero.length ||
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
    const mancude = !chalcogens.has(atomicNumber);
    return { atomicNumber, charge: 0, isotope: 0, locants: [name], mancude };
  });
  const bonds = atoms.map((_, index) => ({ from: index, to: (index + 1) % atoms.length, order: 1 }));
  bonds.push({ from: own, to: atoms.length - 1, order: 1 });
  return { kind: 'fixed', atoms, bonds, indicated: usualHydrogen(atoms), stereo: [] };
}

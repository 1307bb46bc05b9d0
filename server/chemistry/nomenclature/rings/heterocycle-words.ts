/** The parts of Hantzsch–Widman names (P-22.2.2.1, tables 2.4 and 2.5). */
/** In order of citation. */
const prefixes: readonly (readonly [name: string, atomicNumber: number])[] = [
  ['iod', 53],
  ['ox', 8],
  ['thi', 16],
  ['selen', 34],
  ['tellur', 52],
  ['az', 7],
  ['phosph', 15],
  ['ars', 33],
  ['stib', 51],
  ['sil', 14],
  ['germ', 32],
  ['bor', 5],
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
  ['', 1],
  ['di', 2],
  ['tri', 3],
  ['tetra', 4],
  ['tetr', 4],
  ['penta', 5],
  ['pent', 5],
];
const mostHeteroatoms = 6;
const oneOf = (words: readonly (readonly [string, number])[]) => words.map(([word]) => word).join('|');
const anyPrefix = new RegExp(`(?:${oneOf(multipliers)})(?:${oneOf(prefixes)})`, 'y');

export interface Stem {
  readonly size: number;
  readonly mancude: boolean;
  readonly end: number;
}

/** Stems that stand at the offset and go with the heteroatom named last. */
export function stemsAt(lower: string, at: number, last: number): Stem[] {
  return stems
    .filter(([stem]) => lower.startsWith(stem, at) && fitsStem(stem, last))
    .map(([stem, size, mancude]) => ({ size, mancude, end: at + stem.length }));
}

/** Whether heteroatoms are cited in the order of table 2.4: `oxathi`, not `siloxa`. */
export function inOrder(atoms: readonly number[]): boolean {
  const ranks = atoms.map((atom) => prefixes.findIndex(([, atomicNumber]) => atomicNumber === atom));
  return ranks.every((rank, index) => index === 0 || rank >= ranks[index - 1]!);
}

/** Calls `then` after each heteroatom prefix with the atoms so far: `oxa` + `thi`, `tri` + `az`. */
export function eachHeteroatom(
  lower: string,
  from: number,
  then: (atoms: readonly number[], at: number) => void,
  atoms: readonly number[] = [],
): void {
  // Asked at every place of a name, and mostly in vain.
  anyPrefix.lastIndex = from;
  if (!anyPrefix.test(lower)) return;
  for (const [multiplier, count] of multipliers) {
    if (atoms.length + count > mostHeteroatoms || !lower.startsWith(multiplier, from)) continue;
    for (const [name, atomicNumber] of prefixes) {
      if (!lower.startsWith(name, from + multiplier.length)) continue;
      const more = [...atoms, ...Array.from({ length: count }, () => atomicNumber)];
      const end = from + multiplier.length + name.length;
      then(more, end);
      // The a of the prefix is lost before a vowel.
      eachHeteroatom(lower, end, then, more);
      if (lower[end] === 'a') eachHeteroatom(lower, end + 1, then, more);
    }
  }
}

/** Elements whose six-membered rings end in `ane` and `ine`, and those whose unsaturated ones end in `inine`. */
const withAne: ReadonlySet<number> = new Set([8, 16, 34, 52]);
const withInine: ReadonlySet<number> = new Set([5, 15, 33, 51]);

/** Table 2.5: the stem of a six-membered ring depends on the heteroatom named last. */
function fitsStem(stem: string, last: number): boolean {
  if (stem === 'an') return withAne.has(last);
  if (stem === 'inan') return !withAne.has(last);
  if (stem === 'in') return !withInine.has(last);
  if (stem === 'inin') return withInine.has(last);
  return true;
}

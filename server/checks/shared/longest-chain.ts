/** The longest chain of a saturated compound without rings, and the chain that its name takes (P-44.3, P-61.2.1). */
import type { Molecule } from '../../chemistry/structure/molecule.ts';
import type { TextRange } from '../../chemistry/text.ts';

/** Stems of the unbranched alkanes by their number of carbons, from one (P-21.2.1). */
const stems = [
  ...['meth', 'eth', 'prop', 'but', 'pent', 'hex', 'hept', 'oct', 'non', 'dec'],
  ...[
    'undec',
    'dodec',
    'tridec',
    'tetradec',
    'pentadec',
    'hexadec',
    'heptadec',
    'octadec',
    'nonadec',
    'icos',
  ],
];

/** The parent at the end of a name such as `2-ethylpentane`, or undefined when it does not end in an alkane. */
export function alkaneParent(
  name: string,
): { readonly carbons: number; readonly range: TextRange } | undefined {
  const lower = name.toLowerCase();
  const found = stems
    .map((stem, index) => ({ word: `${stem}ane`, carbons: index + 1 }))
    // `tricosane` is no icosane: what stands before the parent must be a substituent prefix or a locant.
    .filter(({ word }) => lower.endsWith(word) && /(?:^|yl|o|[-\d)\]}])$/.test(lower.slice(0, -word.length)))
    .sort((first, second) => second.word.length - first.word.length)[0];
  return (
    found && { carbons: found.carbons, range: { start: name.length - found.word.length, end: name.length } }
  );
}

/** Undefined for anything but chains of carbon with halogens on them, where other rules choose the parent. */
export function longestSaturatedChain(molecule: Molecule): number | undefined {
  const { atoms, bonds } = molecule;
  const isPlain =
    bonds.length === atoms.length - 1 &&
    bonds.every((bond) => bond.order === 1) &&
    atoms.every(({ atomicNumber, charge }) => charge === 0 && [6, 9, 17, 35, 53].includes(atomicNumber));
  const start = atoms.findIndex((atom) => atom.atomicNumber === 6);
  if (!isPlain || start === -1) return undefined;
  // In a tree the farthest atom from anywhere is one end of the longest path.
  return farthestCarbon(molecule, farthestCarbon(molecule, start).atom).carbons;
}

function farthestCarbon(molecule: Molecule, start: number): { atom: number; carbons: number } {
  const queue = [{ atom: start, from: -1, carbons: 1 }];
  for (const { atom, from, carbons } of queue) {
    for (const { atom: next } of molecule.neighbours[atom]!) {
      if (next !== from && molecule.atoms[next]!.atomicNumber === 6) {
        queue.push({ atom: next, from: atom, carbons: carbons + 1 });
      }
    }
  }
  return queue.at(-1)!;
}

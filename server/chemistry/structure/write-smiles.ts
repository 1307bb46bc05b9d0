/**
 * Writes a molecule as SMILES (OpenSMILES specification). The order of the atoms follows given ranks, so that the
 * canonical form can be written; every stated arrangement is kept.
 */
import { symbolOf } from '../composition/elements.ts';
import { isOddPermutation } from './canonical-stereo.ts';
import { IMPLICIT_LIGAND, type Molecule, type StereoElement } from './molecule.ts';
import { organicValences } from './valence-model.ts';
import { bondDirections } from './write-smiles-directions.ts';

export interface WriteOptions {
  /** Lower ranks are written first; the order of the atoms when left out. */
  readonly ranks?: ArrayLike<number>;
  /** Bonds to write as aromatic, by bond; none when left out, so the Kekulé form is written. */
  readonly aromaticBonds?: readonly boolean[];
}

/** A bond of the spanning tree or a ring closure, in the order in which the text shows them. */
export interface WrittenTree {
  /** Atom before each atom in the text, or −1 at the start of a part. */
  readonly before: Int32Array;
  /** Position of each atom in the text's order. */
  readonly position: Int32Array;
  /** Ring closures at each atom, in the order of their digits. */
  readonly closures: readonly (readonly { readonly atom: number; readonly bond: number }[])[];
  /** Atoms that follow each atom, in order; the last one is not a branch. */
  readonly children: readonly (readonly { readonly atom: number; readonly bond: number }[])[];
  readonly roots: readonly number[];
}

export function writeSmiles(molecule: Molecule, options: WriteOptions = {}): string {
  const ranks = options.ranks ?? molecule.atoms.map((_, index) => index);
  const aromatic = options.aromaticBonds ?? [];
  const tree = writtenTree(molecule, ranks);
  const directions = bondDirections(molecule, tree);
  const chirality = new Map<number, string>();
  for (const element of molecule.stereo) noteChirality(molecule, tree, element, chirality);
  const lowerCase = molecule.atoms.map((_, index) =>
    molecule.neighbours[index]!.some((neighbour) => aromatic[neighbour.bond]),
  );

  const ringNumbers = new Map<number, number>();
  const freeNumbers: number[] = [];
  let highest = 0;
  const ringDigits = (number: number) =>
    number < 10 ? String(number) : number < 100 ? `%${number}` : `%(${number})`;

  const bondText = (bond: number, from: number): string => {
    const direction = directions.get(bond);
    if (direction !== undefined)
      return (molecule.bonds[bond]!.from === from) === (direction === 1) ? '/' : '\\';
    if (aromatic[bond]) return '';
    const { order, to, from: start } = molecule.bonds[bond]!;
    if (order === 1) return lowerCase[start] && lowerCase[to] ? '-' : '';
    return order === 2 ? '=' : order === 3 ? '#' : order === 4 ? '$' : '~';
  };

  const atomText = (atom: number): string => {
    let text = atomSymbol(molecule, atom, lowerCase[atom]!, chirality.get(atom));
    const numbers = tree.closures[atom]!.map((closure) => {
      const open = ringNumbers.get(closure.bond);
      if (open !== undefined) return { number: open, closes: true, bond: closure.bond };
      const number = freeNumbers.pop() ?? ++highest;
      ringNumbers.set(closure.bond, number);
      return { number, closes: false, bond: closure.bond };
    });
    // The symbol stands where the ring is opened.
    for (const { number, closes, bond } of numbers)
      text += (closes ? '' : bondText(bond, atom)) + ringDigits(number);
    for (const { number, closes } of numbers) if (closes) freeNumbers.push(number);
    freeNumbers.sort((first, second) => second - first);
    return text;
  };

  const parts: string[] = [];
  for (const root of tree.roots) {
    let text = '';
    const stack: (number | string)[] = [root];
    while (stack.length > 0) {
      const top = stack.pop()!;
      if (typeof top === 'string') {
        text += top;
        continue;
      }
      text += atomText(top);
      const children = tree.children[top]!;
      for (let index = children.length - 1; index >= 0; index--) {
        const { atom, bond } = children[index]!;
        const last = index === children.length - 1;
        if (!last) stack.push(')');
        stack.push(atom, last ? bondText(bond, top) : `(${bondText(bond, top)}`);
        // The stack gives back the bond first, then the atom with all that hangs on it.
      }
    }
    parts.push(text);
  }
  return parts.join('.');
}

function writtenTree(molecule: Molecule, ranks: ArrayLike<number>): WrittenTree {
  const size = molecule.atoms.length;
  const before = new Int32Array(size).fill(-2);
  const position = new Int32Array(size);
  const closures: { atom: number; bond: number }[][] = Array.from({ length: size }, () => []);
  const children: { atom: number; bond: number }[][] = Array.from({ length: size }, () => []);
  const roots: number[] = [];
  const byRank = Array.from({ length: size }, (_, index) => index).sort(
    (first, second) => ranks[first]! - ranks[second]!,
  );
  const ordered = molecule.neighbours.map((list) =>
    [...list].sort((first, second) => ranks[first.atom]! - ranks[second.atom]!),
  );
  const usedBond = new Uint8Array(molecule.bonds.length);
  const next = new Int32Array(size);
  let clock = 0;
  for (const root of byRank) {
    if (before[root] !== -2) continue;
    roots.push(root);
    before[root] = -1;
    position[root] = clock++;
    const stack = [root];
    while (stack.length > 0) {
      const atom = stack[stack.length - 1]!;
      const neighbour = ordered[atom]![next[atom]!++];
      if (neighbour === undefined) {
        stack.pop();
        continue;
      }
      if (usedBond[neighbour.bond]) continue;
      usedBond[neighbour.bond] = 1;
      if (before[neighbour.atom] === -2) {
        before[neighbour.atom] = atom;
        position[neighbour.atom] = clock++;
        children[atom]!.push(neighbour);
        stack.push(neighbour.atom);
      } else {
        // Met again: a ring, opened at the earlier atom.
        closures[neighbour.atom]!.push({ atom, bond: neighbour.bond });
        closures[atom]!.push({ atom: neighbour.atom, bond: neighbour.bond });
      }
    }
  }
  return { before, position, closures, children, roots };
}

function atomSymbol(
  molecule: Molecule,
  index: number,
  lowerCase: boolean,
  chirality: string | undefined,
): string {
  const atom = molecule.atoms[index]!;
  const symbol = symbolOf(atom.atomicNumber);
  const shown = lowerCase ? symbol.toLowerCase() : symbol;
  const plain =
    chirality === undefined &&
    atom.isotope === 0 &&
    atom.charge === 0 &&
    atom.atomClass === 0 &&
    (atom.atomicNumber === 0 ? atom.hydrogens === 0 : impliesHydrogens(molecule, index, lowerCase));
  if (plain) return shown;
  const hydrogens = atom.hydrogens === 0 ? '' : atom.hydrogens === 1 ? 'H' : `H${atom.hydrogens}`;
  const size = Math.abs(atom.charge);
  const charge = atom.charge === 0 ? '' : `${atom.charge > 0 ? '+' : '-'}${size === 1 ? '' : size}`;
  const isotope = atom.isotope === 0 ? '' : String(atom.isotope);
  const label = atom.atomClass === 0 ? '' : `:${atom.atomClass}`;
  return `[${isotope}${shown}${chirality ?? ''}${hydrogens}${charge}${label}]`;
}

/** Whether a reader gives the atom just the hydrogens that it has. */
function impliesHydrogens(molecule: Molecule, index: number, lowerCase: boolean): boolean {
  const atom = molecule.atoms[index]!;
  const valences = organicValences[atom.atomicNumber];
  if (valences === undefined) return false;
  let bonds = 0;
  for (const neighbour of molecule.neighbours[index]!) bonds += molecule.bonds[neighbour.bond]!.order;
  const filled = valences.find((valence) => valence >= bonds);
  const implied = filled === undefined ? 0 : filled - bonds;
  if (implied !== atom.hydrogens) return false;
  // Pyrrole-type nitrogen and the like: an aromatic hetero atom with a hydrogen says so.
  return !(lowerCase && atom.atomicNumber !== 6 && atom.hydrogens > 0);
}

/** Ligands in the order in which the text shows them; the implied hydrogen or lone pair comes after the atom before. */
export function ligandsAsWritten(tree: WrittenTree, atom: number, ligands: readonly number[]): number[] {
  const written: number[] = [];
  if (tree.before[atom]! >= 0) written.push(tree.before[atom]!);
  if (ligands.includes(IMPLICIT_LIGAND)) written.push(IMPLICIT_LIGAND);
  for (const closure of tree.closures[atom]!) written.push(closure.atom);
  for (const child of tree.children[atom]!) written.push(child.atom);
  return written.filter((ligand) => ligands.includes(ligand));
}

function noteChirality(
  molecule: Molecule,
  tree: WrittenTree,
  element: StereoElement,
  chirality: Map<number, string>,
): void {
  if (element.kind === 'double-bond') return;
  if (element.kind === 'tetrahedral') {
    const written = ligandsAsWritten(tree, element.centre, element.ligands);
    const odd = isOddPermutation(written.map((ligand) => element.ligands.indexOf(ligand)));
    chirality.set(element.centre, odd === element.clockwise ? '@' : '@@');
    return;
  }
  if (element.kind === 'axis') {
    const [first, second] = element.ends;
    const ends = tree.position[first]! < tree.position[second]! ? [0, 1] : [1, 0];
    const written = ends.flatMap((side) => {
      const ligands = element.ligands.slice(side * 2, side * 2 + 2);
      return ligandsAsWritten(tree, element.ends[side]!, ligands);
    });
    // Hydrogens of both ends carry the same mark, so each end is compared on its own; exchanging the ends is even.
    const odd =
      (written[0] !== element.ligands[ends[0]! * 2]) !== (written[2] !== element.ligands[ends[1]! * 2]);
    const middle = middleOfCumulene(molecule, first, second);
    if (middle !== undefined) chirality.set(middle, odd === element.clockwise ? '@' : '@@');
    return;
  }
  const written = ligandsAsWritten(tree, element.centre, element.ligands);
  const same = written.every((ligand, index) => ligand === element.ligands[index]);
  if (element.kind === 'SP') {
    chirality.set(element.centre, `@SP${squarePermutation(element.ligands, element.permutation, written)}`);
  } else if (same) chirality.set(element.centre, `@${element.kind}${element.permutation}`);
}

/** Which of the three square-planar orders describes the same square for ligands in another order. */
function squarePermutation(
  ligands: readonly number[],
  permutation: number,
  written: readonly number[],
): number {
  const opposite = [2, 1, 3][permutation - 1]!;
  const pairOf = (ligand: number) => {
    const index = ligands.indexOf(ligand);
    return index === 0 || index === opposite ? 0 : 1;
  };
  const partner = [1, 2, 3].find((index) => pairOf(written[index]!) === pairOf(written[0]!))!;
  return [0, 2, 1, 3][partner]!;
}

function middleOfCumulene(molecule: Molecule, first: number, second: number): number | undefined {
  const path = [first];
  let before = -1;
  for (let atom = first; atom !== second;) {
    const onward = molecule.neighbours[atom]!.find(
      (neighbour) => neighbour.atom !== before && molecule.bonds[neighbour.bond]!.order === 2,
    );
    if (onward === undefined || path.length > molecule.atoms.length) return undefined;
    before = atom;
    atom = onward.atom;
    path.push(atom);
  }
  return path[(path.length - 1) / 2];
}

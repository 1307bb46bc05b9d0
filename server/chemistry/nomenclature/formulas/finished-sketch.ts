/** What a sketch of a line formula makes when the text has ended: a molecule, or a group with one free bond. */
import { freeAt, sketchSmiles, type Sketch, type SketchAtom } from './sketch.ts';
import { lineMetals, phenylenes } from './symbols.ts';

/** A part of a formula with one bond left to others. */
export interface Fragment {
  /** The bonding atom first. */
  readonly smiles: string;
  /** The same as an anion, where the bonding atom is O, S, Se or N. */
  readonly anion: string | undefined;
}

/** The SMILES of a sketch in which nothing is left open, or undefined. */
export function wholeSmiles(sketch: Sketch): string | undefined {
  const { atoms, waiting } = sketch;
  if (atoms.length > 0) {
    const whole = waiting.length === 0 && atoms.every((atom) => freeAt(atom) === 0 && !isOddAcid(atom));
    return whole && carriesMetalsRightly(sketch)
      ? sketchSmiles(
          sketch,
          atoms.findIndex((atom) => !atom.group),
        )
      : undefined;
  }
  // `PhBr`, `HCl`, `(COCl)2`: two groups that have no atom between them.
  const [first, second] = waiting;
  if (waiting.length !== 2 || first === undefined || second === undefined) return undefined;
  // `IPr` and `IMes` are carbenes, `HAc` is acetic acid to some: only hydrogen halides begin with their smaller half.
  // `PhD` is a degree.
  if (first === 'H' ? !halogens.has(second) : halogens.has(first) || second === '[2H]') return undefined;
  return first === 'H' ? second : `${bonded(first)}.${bonded(second)}`;
}

/** Hydrogen of sulfinic and sulfurous acids is written on oxygen. */
const isOddAcid = ({ symbol, hydrogens, oxo }: SketchAtom) => symbol === 'S' && hydrogens > 0 && oxo > 0;

/** Groups of one atom that end a line. */
export const halogens: ReadonlySet<string> = new Set(['F', 'Cl', 'Br', 'I', '[2H]']);

/** The group with an open ring bond on its first atom; two of them are one molecule. */
function bonded(smiles: string): string {
  const first = /^(?:\[[^\]]*\]|Cl|Br|[A-Za-z])/.exec(smiles)![0];
  return `${first}%99${smiles.slice(first.length)}`;
}

/** The sketch as a group with one free bond, or undefined. */
export function fragmentOf(sketch: Sketch): Fragment | undefined {
  const { atoms, waiting } = sketch;
  if (atoms.length === 0) return waiting.length === 1 ? { smiles: waiting[0]!, anion: undefined } : undefined;
  const open = atoms.flatMap((atom, index) => Array.from({ length: freeAt(atom) }, () => index));
  const [root] = open;
  if (waiting.length > 0 || open.length !== 1 || root === undefined || atoms.some(isOddAcid))
    return undefined;
  const { symbol } = atoms[root]!;
  const bearsCharge = symbol === 'O' || symbol === 'S' || symbol === 'Se' || symbol === 'N';
  return {
    smiles: sketchSmiles(sketch, root),
    anion: bearsCharge ? sketchSmiles(sketch, root, { charge: '-' }) : undefined,
  };
}

/**
 * A metal stands in a line formula where carbon or hydrogen is bound to it; its salts, cyanides among them, are read
 * elsewhere.
 */
function carriesMetalsRightly({ atoms }: Sketch): boolean {
  return atoms.every((atom) => {
    if (atom.group || !lineMetals.has(atom.symbol)) return true;
    const partners = atom.links.map(({ to }) => atoms[to]!);
    return partners.some((one) => isCarbon(one, atoms)) || (atom.hydrogens > 0 && partners.length > 0);
  });
}

function isCarbon(atom: SketchAtom, atoms: readonly SketchAtom[]): boolean {
  if (atom.group) return /^(?:\[C|[Cc](?!l))/.test(atom.symbol) && !atom.symbol.startsWith('[C]#N');
  if (phenylenes[atom.symbol]) return true;
  return atom.symbol === 'C' && !atom.links.some(({ to, order }) => order === 3 && atoms[to]!.symbol === 'N');
}

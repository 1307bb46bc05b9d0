/**
 * Stereodescriptors of a structure: R, S (P-91.2, P-92), r, s for pseudoasymmetric centres (P-93.5), E, Z (P-93.4.2), and
 * M, P for axes (P-93.5.2). A unit whose ranking meets the bound of the search, or whose ligands rank alike, gets none.
 */
import { bondKinds, canonicalGraph } from '../canonical-graph.ts';
import { individualized, initialColouring } from '../canonical-refine.ts';
import { isOddPermutation } from '../canonical-stereo.ts';
import { IMPLICIT_LIGAND, type Molecule, type StereoElement } from '../molecule.ts';
import { auxiliaryKeys, likeRule } from './auxiliary.ts';
import { type NodeKey, Ranker } from './rank.ts';
import { CipTree, type TreeNode, TreeTooLarge } from './tree.ts';

export type DescriptorLetter = 'R' | 'S' | 'r' | 's' | 'E' | 'Z' | 'M' | 'P';

export interface Descriptor {
  readonly element: StereoElement;
  /** Undefined when the ligands rank alike or the search met its bound. */
  readonly letter: DescriptorLetter | undefined;
}

/** Rule 1a: atomic number. Rule 1b: a duplicate of an atom nearer to the root is higher. Rule 2: mass number. */
export const constitutionalKeys: readonly NodeKey[] = [
  (node) => node.atomicNumber,
  (node) => (node.duplicate ? 1000 - node.originSphere : 0),
  (node) => node.mass,
];

/** A descriptor for each stated element, in the order of `molecule.stereo`. Polyhedral classes get none. */
export function cipDescriptors(molecule: Molecule): Descriptor[] {
  const kinds = bondKinds(molecule);
  return molecule.stereo.map((element) => ({ element, letter: letterOf(molecule, element, kinds) }));
}

/** The letter of one arrangement as if it stood in the molecule, whose own statements count for the ligands. */
export function letterOf(
  molecule: Molecule,
  element: StereoElement,
  kinds: readonly number[] = bondKinds(molecule),
): DescriptorLetter | undefined {
  try {
    switch (element.kind) {
      case 'tetrahedral': {
        const ranked = rankedLigands(molecule, element.centre, element.ligands, undefined, kinds);
        if (ranked === undefined) return undefined;
        const clockwise =
          element.clockwise !==
          isOddPermutation(ranked.order.map((ligand) => element.ligands.indexOf(ligand)));
        // Seen from the highest, the others clockwise: seen with the lowest behind, 1 → 2 → 3 runs the same way.
        const letter = clockwise ? 'R' : 'S';
        return ranked.reflectionInvariant ? (letter.toLowerCase() as 'r' | 's') : letter;
      }
      case 'double-bond': {
        const higher = ([0, 1] as const).map((side) => higherLigand(molecule, element.ends, side, kinds));
        if (higher[0] === undefined || higher[1] === undefined) return undefined;
        const turns = ([0, 1] as const).filter((side) => higher[side] !== element.ligands[side]).length;
        return element.sameSide === (turns % 2 === 0) ? 'Z' : 'E';
      }
      case 'axis': {
        const ordered: number[] = [];
        for (const side of [0, 1] as const) {
          const ligands = element.ligands.slice(side * 2, side * 2 + 2);
          const higher = higherLigand(molecule, element.ends, side, kinds);
          if (higher === undefined) return undefined;
          ordered.push(...(ligands[0] === higher ? ligands : [ligands[1]!, ligands[0]!]));
        }
        const turned = (ordered[0] !== element.ligands[0]) !== (ordered[2] !== element.ligands[2]);
        // Near pair first (P-92.1.2.2.1): a, b, c, d clockwise from a is Ra, and Ra is M (P-93.5.2.3).
        return element.clockwise !== turned ? 'M' : 'P';
      }
      default:
        return undefined;
    }
  } catch (error) {
    if (error instanceof TreeTooLarge) return undefined;
    throw error;
  }
}

/** Ligands from the highest to the lowest, or undefined when two of them rank alike. */
function rankedLigands(
  molecule: Molecule,
  centre: number,
  ligands: readonly number[],
  inward: number | undefined,
  kinds: readonly number[],
): { order: number[]; reflectionInvariant: boolean } | undefined {
  const tree = new CipTree(molecule, centre, kinds);
  const branches = tree
    .childrenOf(tree.root)
    .filter(
      (node) => !node.duplicate && node.atom !== inward && (node.atom < 0 || ligands.includes(node.atom)),
    );
  const alike = constitutionallyAlike(molecule, centre, kinds);
  const firstRule = (first: TreeNode, second: TreeNode) =>
    first.atom >= 0 && second.atom >= 0 && alike(first.atom, second.atom) ? constitutionalKeys.length : 0;
  let ranking = new Ranker(tree, constitutionalKeys, firstRule).rankBranches(branches, tree.root);
  let reflectionInvariant = false;
  if (ranking.tied) {
    const keys = auxiliaryKeys(molecule, tree);
    if (keys.length === 0) return undefined;
    const all = [...constitutionalKeys, ...keys];
    ranking = new Ranker(tree, all, firstRule).rankBranches(branches, tree.root);
    // Rule 4b is applied in a simplified form here, good enough to see that it decides, not how.
    if (ranking.tied || ranking.decidedBy === constitutionalKeys.length + likeRule) return undefined;
    // Rule 5 alone changes under reflection, so what it decides does not.
    reflectionInvariant = ranking.decidedBy === all.length - 1;
  }
  const order = ranking.order.map((node: TreeNode) => (node.atom < 0 ? IMPLICIT_LIGAND : node.atom));
  // A lone pair is the lowest of all (P-92.1.4.1).
  if (order.length < ligands.length) order.push(IMPLICIT_LIGAND);
  return { order, reflectionInvariant };
}

/**
 * Whether two ligands of a centre cannot be told apart by rules 1 and 2, because refinement with the centre set apart
 * leaves them in one class. Spares exploring the whole digraph only to learn that nothing differs.
 */
function constitutionallyAlike(
  molecule: Molecule,
  centre: number,
  kinds: readonly number[],
): (first: number, second: number) => boolean {
  let classes: Int32Array | undefined;
  return (first, second) => {
    if (classes === undefined) {
      const members = molecule.atoms.map((_, index) => index);
      const graph = canonicalGraph(molecule, members, kinds, { stereo: false });
      const counter = { steps: 0 };
      classes = individualized(graph, initialColouring(graph, counter), centre, counter).colours;
    }
    return classes[first] === classes[second];
  };
}

/** The higher ligand at one end of a double bond, cumulene or axis; −1 for a hydrogen. */
function higherLigand(
  molecule: Molecule,
  ends: readonly [number, number],
  side: 0 | 1,
  kinds: readonly number[],
): number | undefined {
  const end = ends[side];
  const inward = molecule.neighbours[end]!.find(({ bond }) => molecule.bonds[bond]!.order === 2)?.atom;
  const ligands = molecule.neighbours[end]!.filter(({ atom }) => atom !== inward).map(({ atom }) => atom);
  if (ligands.length === 1) return molecule.atoms[end]!.hydrogens > 1 ? undefined : ligands[0];
  return rankedLigands(molecule, end, ligands, inward, kinds)?.order[0];
}

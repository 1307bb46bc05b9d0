/**
 * Keys for rules 3, 4 and 5 (P-92.4 to P-92.6), which compare the stereodescriptors inside the branches. A centre far
 * from the root is described as it stands in the digraph, with its ligands ranked there (auxiliary descriptors,
 * P-92.1.4.4), outermost first.
 */
import { isOddPermutation } from '../canonical-stereo.ts';
import {
  IMPLICIT_LIGAND,
  type DoubleBondStereo,
  type Molecule,
  type TetrahedralStereo,
} from '../molecule.ts';
import { type NodeKey, Ranker } from './rank.ts';
import { type CipTree, type TreeNode } from './tree.ts';

type Letter = 'R' | 'S' | 'r' | 's' | 'Z' | 'E';

const baseKeys: readonly NodeKey[] = [
  (node) => node.atomicNumber,
  (node) => (node.duplicate ? 1000 - node.originSphere : 0),
  (node) => node.mass,
];

/** Place of rule 4b among the keys that `auxiliaryKeys` returns. */
export const likeRule = 2;

/** Empty when nothing is stated that could tell branches apart. */
export function auxiliaryKeys(molecule: Molecule, tree: CipTree): NodeKey[] {
  if (molecule.stereo.length === 0) return [];
  const centres = new Map<number, TetrahedralStereo>();
  const bonds = new Map<number, DoubleBondStereo>();
  for (const element of molecule.stereo) {
    if (element.kind === 'tetrahedral') centres.set(element.centre, element);
    else if (element.kind === 'double-bond') {
      bonds.set(element.ends[0], element);
      bonds.set(element.ends[1], element);
    }
  }
  centres.delete(tree.root.atom);
  const letters = new Map<TreeNode, Letter | undefined>();
  const letterAt = (node: TreeNode): Letter | undefined => {
    if (node.duplicate || node.atom < 0 || node === tree.root) return undefined;
    if (letters.has(node)) return letters.get(node);
    // A centre is described from outside in: while it is being worked out it counts as undescribed.
    letters.set(node, undefined);
    const keys = [...baseKeys, ...stereoKeys(letterAt)];
    const centre = centres.get(node.atom);
    const bond = bonds.get(node.atom);
    const letter =
      centre !== undefined
        ? centreLetter(tree, keys, node, centre)
        : bond !== undefined
          ? bondLetter(tree, keys, node, bond)
          : undefined;
    letters.set(node, letter);
    return letter;
  };
  return stereoKeys(letterAt);
}

function stereoKeys(letterAt: (node: TreeNode) => Letter | undefined): NodeKey[] {
  const keyed =
    (values: Partial<Record<Letter, number>>): NodeKey =>
    (node) =>
      values[letterAt(node) as Letter] ?? 0;
  return [
    // Rule 3: Z before E.
    keyed({ Z: 2, E: 1 }),
    // Rule 4a: chiral before pseudoasymmetric before nothing.
    keyed({ R: 2, S: 2, r: 1, s: 1 }),
    // Rule 4b: like pairs before unlike ones, each centre against the first chiral one above it or at its rank.
    likeKey(letterAt),
    // Rule 4c: r before s.
    keyed({ r: 2, s: 1 }),
    // Rule 5: R before S.
    keyed({ R: 2, S: 1 }),
  ];
}

/** 2 for a centre with the same letter as the nearest chiral centre above it, 1 for one with the other letter. */
function likeKey(letterAt: (node: TreeNode) => Letter | undefined): NodeKey {
  return (node) => {
    const letter = letterAt(node);
    if (letter !== 'R' && letter !== 'S') return 0;
    for (let above = node.parent; above !== undefined; above = above.parent) {
      const other = letterAt(above);
      if (other === 'R' || other === 'S') return other === letter ? 2 : 1;
    }
    return 0;
  };
}

function centreLetter(
  tree: CipTree,
  keys: readonly NodeKey[],
  node: TreeNode,
  element: TetrahedralStereo,
): Letter | undefined {
  const around = tree.around(node, undefined).filter((other) => !isMultipleBondDuplicate(other, node));
  const { order, decidedBy, tied } = new Ranker(tree, keys).rankBranches(around, node);
  if (tied || decidedBy === baseKeys.length + likeRule) return undefined;
  const ligands = order.map((other) => (other.atom < 0 ? IMPLICIT_LIGAND : other.atom));
  if (ligands.length < 4) ligands.push(IMPLICIT_LIGAND);
  const clockwise =
    element.clockwise !== isOddPermutation(ligands.map((ligand) => element.ligands.indexOf(ligand)));
  const letter = clockwise ? 'R' : 'S';
  return decidedBy === keys.length - 1 ? (letter.toLowerCase() as 'r' | 's') : letter;
}

/** Only at the end nearer to the root, so that each double bond counts once. */
function bondLetter(
  tree: CipTree,
  keys: readonly NodeKey[],
  node: TreeNode,
  element: DoubleBondStereo,
): Letter | undefined {
  const far = element.ends[0] === node.atom ? element.ends[1] : element.ends[0];
  const farNode = tree.childrenOf(node).find((child) => child.atom === far && !child.duplicate);
  if (farNode === undefined) return undefined;
  const ranker = new Ranker(tree, keys);
  let together = element.sameSide;
  for (const [end, inward] of [
    [node, farNode],
    [farNode, node],
  ] as const) {
    const ligands = tree.around(end, inward).filter((other) => !isMultipleBondDuplicate(other, end));
    const { order, tied } = ranker.rankBranches(ligands, end);
    const stated = element.ligands[element.ends[0] === end.atom ? 0 : 1];
    if (tied || order.length === 0) return undefined;
    if (order[0]!.atom !== stated) together = !together;
  }
  return together ? 'Z' : 'E';
}

/** A duplicate that stands for the second bond to a neighbour, not for a ring closure to another atom. */
function isMultipleBondDuplicate(other: TreeNode, hub: TreeNode): boolean {
  return (
    other.duplicate &&
    (hub.parent?.atom === other.atom ||
      (hub.children ?? []).some((child) => !child.duplicate && child.atom === other.atom))
  );
}

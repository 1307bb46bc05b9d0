/**
 * Auxiliary descriptors (P-92.1.4.4): the letters of units inside the branches, each described as it stands in the
 * digraph, with its ligands ranked there. Units in farther spheres are described first, and only they count.
 */
import {
  bondBetween,
  type AxialStereo,
  type DoubleBondStereo,
  type Molecule,
  type TetrahedralStereo,
} from '../molecule.ts';
import type { Ranker, Ranking } from './rank.ts';
import { type DescriptorLetter, fullRanker, type LetterAt } from './rules.ts';
import type { Branch, CipTree, TreeNode } from './tree.ts';
import { centreLetter, endsLetter } from './unit-letter.ts';

export class AuxiliaryLetters {
  private readonly centres = new Map<number, TetrahedralStereo>();
  private readonly bonds = new Map<number, (DoubleBondStereo | AxialStereo)[]>();
  private readonly letters = new Map<TreeNode, DescriptorLetter | undefined>();
  /** By the sphere of the unit that is being described. */
  private readonly rankers = new Map<number, Ranker>();

  constructor(
    private readonly molecule: Molecule,
    private readonly tree: CipTree,
    private readonly constitutional: Ranker,
  ) {
    for (const element of molecule.stereo) {
      if (element.kind === 'tetrahedral') this.centres.set(element.centre, element);
      else if (element.kind === 'double-bond' || element.kind === 'axis') {
        for (const end of element.ends) {
          const list = this.bonds.get(end);
          if (list === undefined) this.bonds.set(end, [element]);
          else list.push(element);
        }
      }
    }
  }

  /** By the constitution, and where that leaves ties, by what is known of the spheres beyond `sphere`. */
  rank(branches: readonly Branch[], sphere: number): Ranking {
    const ranking = this.constitutional.rank(branches);
    if (!ranking.tied || !branches.some((branch) => this.holdsUnit(branch, sphere))) return ranking;
    return this.rankerBeyond(sphere).rank(branches);
  }

  /** Whether a stated unit in a branch lies beyond a sphere; without any, rules 3 to 5 need not be tried. */
  private holdsUnit(branch: Branch, sphere: number): boolean {
    if (this.molecule.stereo.length === 0) return false;
    const stack = [branch];
    for (let at = stack.pop(); at !== undefined; at = stack.pop()) {
      const { node } = at;
      const states = node.duplicate === false && (this.centres.has(node.atom) || this.bonds.has(node.atom));
      if (states && node.sphere > sphere) return true;
      stack.push(...this.tree.onward(at));
    }
    return false;
  }

  rankerBeyond(sphere: number): Ranker {
    let ranker = this.rankers.get(sphere);
    if (ranker === undefined) {
      const letterAt: LetterAt = (node) => (node.sphere > sphere ? this.letterAt(node) : undefined);
      this.rankers.set(sphere, (ranker = fullRanker(this.constitutional, letterAt, this.bonds.size > 0)));
    }
    return ranker;
  }

  private letterAt(node: TreeNode): DescriptorLetter | undefined {
    if (node.duplicate !== false || node.atom < 0 || node === this.tree.root) return undefined;
    if (this.letters.has(node)) return this.letters.get(node);
    const letter = this.describe(node);
    this.letters.set(node, letter);
    return letter;
  }

  private describe(node: TreeNode): DescriptorLetter | undefined {
    const centre = this.centres.get(node.atom);
    if (centre !== undefined) {
      const ranking = this.rank(ligandBranches(this.tree, node), node.sphere);
      return ranking.tied ? undefined : centreLetter(centre, ranking);
    }
    for (const element of this.bonds.get(node.atom) ?? []) {
      const far = this.farEnd(node, element);
      if (far === undefined) continue;
      const near = ligandBranches(this.tree, node).filter((branch) => branch.node !== far.first);
      const beyond = ligandBranches(this.tree, far.node).filter((branch) => branch.node !== far.node.parent);
      const [one, other] = [this.rank(near, node.sphere), this.rank(beyond, node.sphere)];
      if (one.tied || other.tied) return undefined;
      return endsLetter(element, element.ends[0] === node.atom ? [one, other] : [other, one]);
    }
    return undefined;
  }

  /** The other end, down the double bonds: a unit is described at the end that is nearer to the root, once. */
  private farEnd(
    node: TreeNode,
    { ends }: DoubleBondStereo | AxialStereo,
  ): { readonly first: TreeNode; readonly node: TreeNode } | undefined {
    const goal = ends[0] === node.atom ? ends[1] : ends[0];
    let first: TreeNode | undefined;
    for (let at = node; ;) {
      const next = this.tree
        .childrenOf(at)
        .find(
          (child) =>
            child.duplicate === false &&
            child.atom >= 0 &&
            bondBetween(this.molecule, at.atom, child.atom)!.order === 2,
        );
      if (next === undefined) return undefined;
      first ??= next;
      if (next.atom === goal) return { first, node: next };
      at = next;
    }
  }
}

/** The branches that are ligands: duplicates for the second bond of a double bond are none. */
export function ligandBranches(tree: CipTree, node: TreeNode): Branch[] {
  return tree.branchesAt(node).filter((branch) => branch.node.duplicate !== 'bond');
}

/**
 * Ranks the branches at a node by the sequence rules (P-92.1.4 to P-92.6). Each rule is tried on whole branches, sphere
 * by sphere, before the next one; sets of atoms in a sphere are compared in the order of the branches they hang on.
 */
import type { CipTree, TreeNode } from './tree.ts';

/** The rules that compare one number at each node, in their order. */
export type NodeKey = (node: TreeNode) => number;

export interface Ranking {
  /** Branches, highest first. */
  readonly order: readonly TreeNode[];
  /** The last rule that was needed, as an index into the keys; −1 when fewer than two branches. */
  readonly decidedBy: number;
  /** Two branches stayed equal under all rules. */
  readonly tied: boolean;
}

/** Closes each set of atoms, so that a smaller set ranks below a larger one that begins alike. */
const endOfSet = -1;

export class Ranker {
  constructor(
    private readonly tree: CipTree,
    private readonly keys: readonly NodeKey[],
    /** The first rule that can tell two branches at the root apart; 0 when nothing is known of them. */
    private readonly firstRule: (first: TreeNode, second: TreeNode) => number = () => 0,
  ) {}

  /** The branches around `node`, `from` aside. */
  rank(node: TreeNode, from: TreeNode | undefined): Ranking {
    return this.rankBranches(this.tree.around(node, from), node);
  }

  /** `hub` is the node that the branches hang on. */
  rankBranches(branches: readonly TreeNode[], hub: TreeNode): Ranking {
    let decidedBy = -1;
    let tied = false;
    const order = [...branches].sort((first, second) => {
      const result = this.compare(first, second, hub);
      decidedBy = Math.max(decidedBy, result.rule);
      if (result.sign === 0) tied = true;
      return -result.sign;
    });
    return { order, decidedBy, tied };
  }

  /** Positive when the first branch ranks higher. */
  compare(first: TreeNode, second: TreeNode, hub: TreeNode): { sign: number; rule: number } {
    for (let rule = this.firstRule(first, second); rule < this.keys.length; rule++) {
      for (let depth = 0; ; depth++) {
        const one = this.sphere(first, hub, rule, depth);
        const other = this.sphere(second, hub, rule, depth);
        const sign = compareLists(one, other);
        if (sign !== 0) return { sign, rule };
        if (one.length === 0) break;
      }
    }
    return { sign: 0, rule: this.keys.length - 1 };
  }

  /** Values of one rule in one sphere of a branch, sets in the order of the branches they hang on. */
  private sphere(branch: TreeNode, from: TreeNode, rule: number, depth: number): number[] {
    this.tree.step();
    if (depth === 0) return [this.keys[rule]!(branch)];
    const onward = this.sorted(this.tree.around(branch, from), branch, rule, depth - 1);
    if (depth === 1) return onward.length === 0 ? [] : [...onward.map(this.keys[rule]!), endOfSet];
    return onward.flatMap((node) => this.sphere(node, branch, rule, depth - 1));
  }

  /** Sorted by the rules so far, looking no deeper than the spheres that are being compared. */
  private sorted(branches: readonly TreeNode[], hub: TreeNode, rule: number, depth: number): TreeNode[] {
    if (branches.length < 2) return [...branches];
    const lists = new Map<TreeNode, number[][][]>();
    const listOf = (node: TreeNode, ofRule: number, at: number): number[] => {
      let byRule = lists.get(node);
      if (byRule === undefined) lists.set(node, (byRule = []));
      return ((byRule[ofRule] ??= [])[at] ??= this.sphere(node, hub, ofRule, at));
    };
    return [...branches].sort((first, second) => {
      for (let ofRule = 0; ofRule <= rule; ofRule++) {
        // Earlier rules have been exhausted on these branches; the current one is known down to this sphere.
        for (let at = 0; at <= depth; at++) {
          const sign = compareLists(listOf(first, ofRule, at), listOf(second, ofRule, at));
          if (sign !== 0) return -sign;
        }
      }
      return 0;
    });
  }
}

export function compareLists(first: readonly number[], second: readonly number[]): number {
  const length = Math.min(first.length, second.length);
  for (let index = 0; index < length; index++) {
    const difference = first[index]! - second[index]!;
    if (difference !== 0) return difference;
  }
  return first.length - second.length;
}

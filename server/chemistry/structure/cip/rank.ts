/**
 * Ranks branches by the sequence rules (P-92.1.4 to P-92.6). Each rule is tried on whole branches, sphere by sphere,
 * before the next one; sets of atoms in a sphere are compared in the order of the branches they hang on.
 */
import type { Branch, CipTree, TreeNode } from './tree.ts';

/** A rule that compares one number at each node; at least 0, the higher the earlier. */
export type NodeKey = (node: TreeNode) => number;

/** A rule that compares two branches as wholes; positive when the first one ranks higher. */
export interface BranchRule {
  compare(first: Branch, second: Branch): number;
}

export interface Ranking {
  /** Branches, highest first. */
  readonly order: readonly Branch[];
  /** For each neighbouring pair of `order` the index of the rule that decided, or −1 where none did. */
  readonly decidedBy: readonly number[];
  readonly tied: boolean;
}

/** Closes each set of atoms, so that a smaller set ranks below a larger one that begins alike. */
const endOfSet = -1;

const isKey = (rule: NodeKey | BranchRule): rule is NodeKey => typeof rule === 'function';

export class Ranker {
  /** Rules of `below` come first. */
  readonly ruleCount: number;
  private readonly firstOwn: number;
  private readonly profiles = new Map<Branch, number[][][]>();
  private readonly groups = new Map<Branch, (readonly (readonly Branch[])[])[]>();

  constructor(
    readonly tree: CipTree,
    /** Undefined for a rule that cannot tell anything apart in this structure. */
    private readonly rules: readonly (NodeKey | BranchRule | undefined)[],
    private readonly below?: Ranker,
  ) {
    this.firstOwn = below?.ruleCount ?? 0;
    this.ruleCount = this.firstOwn + rules.length;
  }

  rank(branches: readonly Branch[]): Ranking {
    const order = [...branches].sort((first, second) => -this.compare(first, second).sign);
    const decidedBy = order.slice(1).map((branch, index) => {
      const { sign, rule } = this.compare(order[index]!, branch);
      return sign === 0 ? -1 : rule;
    });
    return { order, decidedBy, tied: decidedBy.includes(-1) };
  }

  /** Positive when the first branch ranks higher. */
  compare(first: Branch, second: Branch): { sign: number; rule: number } {
    for (let rule = 0; rule < this.ruleCount; rule++) {
      const sign = this.compareBy(rule, first, second);
      if (sign !== 0) return { sign, rule };
    }
    return { sign: 0, rule: -1 };
  }

  /** One rule on all spheres of both branches. */
  private compareBy(rule: number, first: Branch, second: Branch): number {
    if (first === second) return 0;
    const own = this.ownRule(rule);
    if (own !== undefined && !isKey(own)) return own.compare(first, second);
    if (own === undefined && this.below !== undefined) return this.below.compareBy(rule, first, second);
    for (let depth = 0; ; depth++) {
      this.tree.step();
      const one = this.profile(first, rule, depth);
      const sign = compareLists(one, this.profile(second, rule, depth));
      if (sign !== 0 || one.length === 0) return sign;
    }
  }

  private ownRule(rule: number): NodeKey | BranchRule | undefined {
    return this.rules[rule - this.firstOwn];
  }

  /**
   * The values of one key in one sphere of a branch, sets in the order of the branches that they hang on, each closed by
   * −1; empty when the branch ends before.
   */
  profile(branch: Branch, rule: number, depth: number): readonly number[] {
    if (rule < this.firstOwn) return this.below!.profile(branch, rule, depth);
    let ofBranch = this.profiles.get(branch);
    if (ofBranch === undefined) this.profiles.set(branch, (ofBranch = []));
    const ofRule = (ofBranch[rule] ??= []);
    return (ofRule[depth] ??= this.profileOf(branch, rule, depth));
  }

  private profileOf(branch: Branch, rule: number, depth: number): number[] {
    const key = this.ownRule(rule) as NodeKey;
    this.tree.step();
    if (depth === 0) return [key(branch.node)];
    const onward = this.sorted(branch, rule, depth - 1);
    if (depth === 1) return [...onward.map(({ node }) => key(node)), endOfSet];
    const values: number[] = [];
    for (const next of onward) for (const value of this.profile(next, rule, depth - 1)) values.push(value);
    this.tree.step(values.length >> 3);
    return values;
  }

  /** The onward branches by all rules before this one, then by this one as far as the spheres that are being compared. */
  private sorted(branch: Branch, rule: number, depth: number): readonly Branch[] {
    return this.groupsBefore(branch, rule).flatMap((group) => {
      if (group.length < 2) return group;
      return [...group].sort((first, second) => {
        for (let at = 0; at <= depth; at++) {
          this.tree.step();
          const sign = compareLists(this.profile(first, rule, at), this.profile(second, rule, at));
          if (sign !== 0) return -sign;
        }
        return 0;
      });
    });
  }

  /** The onward branches in sets that the rules before this one leave tied, highest first. */
  private groupsBefore(branch: Branch, rule: number): readonly (readonly Branch[])[] {
    if (this.below !== undefined && rule <= this.firstOwn) return this.below.groupsBefore(branch, rule);
    if (rule === 0) return [this.tree.onward(branch)];
    let ofBranch = this.groups.get(branch);
    if (ofBranch === undefined) this.groups.set(branch, (ofBranch = []));
    return (ofBranch[rule] ??= this.refined(this.groupsBefore(branch, rule - 1), rule - 1));
  }

  private refined(groups: readonly (readonly Branch[])[], rule: number): readonly (readonly Branch[])[] {
    const own = this.ownRule(rule)!;
    // Rules about whole branches count at the root only.
    if (!isKey(own) || groups.every((group) => group.length < 2)) return groups;
    return groups.flatMap((group) => {
      const order = [...group].sort((first, second) => -this.compareBy(rule, first, second));
      const parts: Branch[][] = [];
      order.forEach((each, index) => {
        if (index > 0 && this.compareBy(rule, order[index - 1]!, each) === 0)
          parts[parts.length - 1]!.push(each);
        else parts.push([each]);
      });
      return parts;
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

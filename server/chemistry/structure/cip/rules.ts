/**
 * The sequence rules as keys of the ranking, in their order: 1a, 1b and 2 from the constitution (P-92.2, P-92.3), then
 * 3, 4a, 4b, 4c and 5 from the letters inside the branches (P-92.4 to P-92.6).
 */
import { compareLists, type BranchRule, type NodeKey, Ranker } from './rank.ts';
import type { Branch, CipTree, TreeNode } from './tree.ts';

export type DescriptorLetter = 'R' | 'S' | 'r' | 's' | 'E' | 'Z' | 'e' | 'z' | 'M' | 'P' | 'm' | 'p';

/** The letter of the unit that a node stands for in its digraph; undefined where there is none. */
export type LetterAt = (node: TreeNode) => DescriptorLetter | undefined;

/** Index of rule 5, the last one: what it decides turns round in the mirror. */
export const enantiomorphRule = 7;

/** Rule 1a: atomic number. Rule 1b: a duplicate of an atom nearer to the root is higher. Rule 2: mass number. */
export function constitutionalRanker(tree: CipTree): Ranker {
  return new Ranker(tree, [
    (node) => node.atomicNumber,
    (node) => (node.duplicate === false ? 0 : 1_000_000 - node.originSphere),
    (node) => node.mass,
  ]);
}

/** Letters of units that change in the mirror: R, M and seqCis (here z) on one side, S, P and seqTrans on the other. */
type Sense = 'R' | 'S';
const senses: Partial<Record<DescriptorLetter, Sense>> = { R: 'R', M: 'R', z: 'R', S: 'S', P: 'S', e: 'S' };

const keyed =
  (letterAt: LetterAt, values: Partial<Record<DescriptorLetter, number>>): NodeKey =>
  (node) => {
    const letter = letterAt(node);
    return letter === undefined ? 0 : (values[letter] ?? 0);
  };

/** Stands for a rule that cannot tell anything apart in the structure at hand. */
const idle: BranchRule = { compare: () => 0 };

/** All rules; `constitutional` must be about the same tree. Without stated double bonds rule 3 is spared. */
export function fullRanker(constitutional: Ranker, letterAt: LetterAt, hasDoubleBonds: boolean): Ranker {
  const { tree } = constitutional;
  const upTo4a = new Ranker(
    tree,
    [
      // Rule 3: Z before E before none.
      hasDoubleBonds ? keyed(letterAt, { Z: 2, E: 1 }) : idle,
      // Rule 4a: chiral before pseudoasymmetric before none.
      keyed(letterAt, { R: 2, S: 2, M: 2, P: 2, z: 2, e: 2, r: 1, s: 1, m: 1, p: 1 }),
    ],
    constitutional,
  );
  return new Ranker(
    tree,
    [
      likeBeforeUnlike(upTo4a, letterAt),
      // Rule 4c: r before s.
      keyed(letterAt, { r: 2, m: 2, s: 1, p: 1 }),
      // Rule 5: R before S.
      keyed(letterAt, { R: 2, M: 2, z: 2, S: 1, P: 1, e: 1 }),
    ],
    upTo4a,
  );
}

/**
 * Rule 4b (P-92.5.2.2): the senses in a branch are paired with that of its highest-ranked unit; the first pair that is
 * like in one branch and unlike in the other decides. Where several units share the highest rank, the sense that occurs
 * more often is the reference; where both occur equally often, both are tried and the better lists are compared first.
 */
function likeBeforeUnlike(ranker: Ranker, letterAt: LetterAt): BranchRule {
  const { tree } = ranker;
  const senseAt = (node: TreeNode): Sense | undefined => {
    const letter = letterAt(node);
    return letter === undefined ? undefined : senses[letter];
  };
  const paired = {
    R: new Ranker(tree, [likeKey(senseAt, 'R')], ranker),
    S: new Ranker(tree, [likeKey(senseAt, 'S')], ranker),
  };
  const pairsOf = (branch: Branch): number[][] =>
    references(ranker, branch, senseAt)
      .map((reference) => {
        const values: number[] = [];
        for (let depth = 0; ; depth++) {
          const sphere = paired[reference].profile(branch, ranker.ruleCount, depth);
          if (sphere.length === 0) return values;
          for (const value of sphere) values.push(value);
        }
      })
      .sort((first, second) => compareLists(second, first));
  return {
    compare(first, second) {
      const [ones, others] = [pairsOf(first), pairsOf(second)];
      for (let index = 0; index < Math.min(ones.length, others.length); index++) {
        const sign = compareLists(ones[index]!, others[index]!);
        if (sign !== 0) return sign;
      }
      return 0;
    },
  };
}

function likeKey(senseAt: (node: TreeNode) => Sense | undefined, reference: Sense): NodeKey {
  return (node) => {
    const sense = senseAt(node);
    return sense === undefined ? 0 : sense === reference ? 2 : 1;
  };
}

/** The sense, or both, with which those in the branch are paired. */
function references(ranker: Ranker, branch: Branch, senseAt: (node: TreeNode) => Sense | undefined): Sense[] {
  // Sets of equal rank, the highest first, sphere by sphere.
  let groups: (readonly Branch[])[] = [[branch]];
  while (groups.length > 0) {
    for (const group of groups) {
      let balance = 0;
      let found = false;
      for (const { node } of group) {
        const sense = senseAt(node);
        if (sense === undefined) continue;
        found = true;
        balance += sense === 'R' ? 1 : -1;
      }
      if (found) return balance > 0 ? ['R'] : balance < 0 ? ['S'] : ['R', 'S'];
    }
    groups = groups.flatMap((group) =>
      ranked(
        ranker,
        group.flatMap((each) => ranker.tree.onward(each)),
      ),
    );
  }
  return [];
}

function ranked(ranker: Ranker, branches: readonly Branch[]): Branch[][] {
  const { order, decidedBy } = ranker.rank(branches);
  const groups: Branch[][] = [];
  order.forEach((branch, index) => {
    if (index > 0 && decidedBy[index - 1] === -1) groups[groups.length - 1]!.push(branch);
    else groups.push([branch]);
  });
  return groups;
}

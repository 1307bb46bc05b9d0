/**
 * Whether a chain is the one that the compound would be named after: the longest that carries the principal groups
 * (P-44.3, P-61.2.1). A group without locant is never meant where another name would be due: `methylpropane` is not butane.
 */
import type { ChainClaim, Draft } from './draft.ts';

/** True when no longer chain of carbon through the same principal atoms can be found from this one. */
export function isLongestChain(claim: ChainClaim, draft: Draft): boolean {
  const carbons = new Set<number>(claim.atoms);
  const queue = [...claim.atoms];
  for (let head = 0; head < queue.length; head++) {
    for (const { atom, bond } of draft.neighbours[queue[head]!]!) {
      if (draft.atoms[atom]!.atomicNumber !== 6 || carbons.has(atom) || draft.bonds[bond]!.order > 3)
        continue;
      if (inRing(draft, atom) || isOfGroup(draft, atom)) continue;
      carbons.add(atom);
      queue.push(atom);
      if (queue.length > 300) return true;
    }
  }
  const starts = [...carbons].filter((atom) => carbonNeighbours(draft, atom, carbons).length <= 1);
  return starts.every((start) => longestFrom(start, claim, draft, carbons) <= claim.atoms.length);
}

/**
 * The carbon of a carboxy, cyano or like group, which a chain that has such groups already does not take in: propane-1,2,3-
 * tricarboxylic acid (P-65.1.2.2.2).
 */
function isOfGroup(draft: Draft, atom: number): boolean {
  const hetero = draft.neighbours[atom]!.filter((one) => draft.atoms[one.atom]!.atomicNumber !== 6);
  const orders = hetero.map(({ bond }) => draft.bonds[bond]!.order);
  return orders.some((order) => order > 1) && orders.reduce((sum, order) => sum + order, 0) > 2;
}

function carbonNeighbours(draft: Draft, atom: number, carbons: ReadonlySet<number>): number[] {
  return draft.neighbours[atom]!.map((one) => one.atom).filter((one) => carbons.has(one));
}

/** Length of the longest path from a chain end that passes every principal atom. */
function longestFrom(start: number, claim: ChainClaim, draft: Draft, carbons: ReadonlySet<number>): number {
  let best = 0;
  const stack: { atom: number; from: number; length: number; passed: number }[] = [
    { atom: start, from: -1, length: 1, passed: claim.principal.includes(start) ? 1 : 0 },
  ];
  const wanted = new Set(claim.principal).size;
  let steps = 0;
  while (stack.length > 0 && steps++ < 3000) {
    const { atom, from, length, passed } = stack.pop()!;
    if (passed === wanted) best = Math.max(best, length);
    for (const next of carbonNeighbours(draft, atom, carbons)) {
      if (next === from) continue;
      stack.push({
        atom: next,
        from: atom,
        length: length + 1,
        passed: passed + (claim.principal.includes(next) ? 1 : 0),
      });
    }
  }
  return best;
}

function inRing(draft: Draft, atom: number): boolean {
  const seen = new Set([atom]);
  const neighbours = draft.neighbours[atom]!;
  if (neighbours.length < 2) return false;
  for (const { atom: first } of neighbours) {
    const queue = [first];
    const reached = new Set([first]);
    for (let head = 0; head < queue.length && queue.length < 300; head++) {
      for (const next of draft.neighbours[queue[head]!]!) {
        if (next.atom === atom) {
          if (queue[head] !== first) return true;
          continue;
        }
        if (reached.has(next.atom) || seen.has(next.atom)) continue;
        reached.add(next.atom);
        queue.push(next.atom);
      }
    }
  }
  return false;
}

/**
 * Conjunctive names: a ring followed by the acyclic compound that is bound to it with loss of hydrogen, as in
 * `cyclohexanemethanol` and `1H-indole-3-acetic acid` (1979 rules C-51 to C-53; CAS index names).
 */
import type { SideChain, Unit } from '../tree.ts';
import type { Group } from './group.ts';
import type { Lexicon } from './lexicon.ts';
import { wordsAt } from './trie.ts';
import { locantsAt } from './locants.ts';

const chainStart = /(?:meth|eth|prop|but|pent|hex|acet|propion|butyr)/y;

/** The compounds that the ring groups become when an acyclic compound follows; `read` finds what begins at a place. */
export function conjunctiveForms(
  rings: readonly Group[],
  text: string,
  lower: string,
  lexicon: Lexicon,
  read: (offset: number) => readonly Group[],
): Group[] {
  const found: Group[] = [];
  for (const ring of rings) {
    if (ring.role !== 'parent' || !isBareRing(ring.unit)) continue;
    const hyphen = text[ring.end] === '-' ? ring.end + 1 : ring.end;
    const locants = hyphen > ring.end ? locantsAt(text, hyphen) : undefined;
    const from = locants?.end ?? ring.end;
    const starts = [{ at: from, count: 1 }];
    for (const { value, end } of wordsAt(lexicon.words, lower, from))
      if (value.kind === 'multiplier' && value.count > 1 && value.count < 4)
        starts.push({ at: end, count: value.count });
    for (const { at, count } of starts) {
      chainStart.lastIndex = at;
      if (!chainStart.test(lower) || (locants && locants.value.length !== count)) continue;
      for (const group of read(at)) {
        const unit = group.role === 'parent' ? sideChain(group.unit) : undefined;
        if (!unit) continue;
        const side: SideChain = {
          unit,
          count,
          range: { start: at, end: group.end },
          ...(locants ? { locants: locants.value } : {}),
        };
        const range = { start: ring.unit.range.start, end: group.end };
        found.push({ unit: { ...ring.unit, sideChain: side, range }, role: 'parent', end: group.end });
      }
    }
  }
  return found;
}

function isBareRing({ skeletons, endings, sideChain: side, joint }: Unit): boolean {
  if (endings.length > 0 || side || joint) return false;
  return skeletons.every(
    ({ atoms, bonds, kind }) =>
      kind !== 'chain' && bonds.length >= atoms.length && atoms.every((atom) => atom.locants.length > 0),
  );
}

/** A saturated chain with a single group at its end; its atoms are lettered from the group on. */
function sideChain(unit: Unit): Unit | undefined {
  const [ending, ...others] = unit.endings;
  if (!ending || others.length > 0 || ending.count > 1 || unit.unsaturations.length > 0) return undefined;
  const [skeleton] = unit.skeletons;
  if (!skeleton || unit.skeletons.length > 1 || skeleton.bonds.length !== skeleton.atoms.length - 1)
    return undefined;
  if (skeleton.atoms.some(({ atomicNumber, locants }) => atomicNumber !== 6 || locants.length === 0))
    return undefined;
  if (ending.locants && ending.locants[0] !== '1') return undefined;
  return { ...unit, endings: [{ ...ending, locants: ['1'] }] };
}

/** Groups with a function word: `ethyl methyl ether`, `benzyl chloride`, `ethylene dichloride` (P-51.3.3). */
import { doublingWords, functionWords } from '../vocabulary/functions.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { addSmiles, buildGroups, buildWord, join, type Valence, type Word } from './words.ts';

/** A function word by its place in the vocabulary, and the multiplier written before it. */
export interface FunctionWord {
  readonly index: number;
  readonly count: number | undefined;
}

/** Binds the groups to the function; false when they do not fill it. */
export function buildFunctionalClass(
  radicals: readonly Word[],
  functional: FunctionWord,
  draft: Draft,
  choices: Choices,
): boolean {
  const [word, group, sites] = functionWords[functional.index]!;
  const built = buildGroups(radicals, draft, choices);
  if (!built || group === '') return false;
  const valences = built.flatMap((one) => one.free);
  // `ethylene dichloride`, `methylene chloride`: one group with several valences, as many halides.
  const copies =
    sites.length === 1 && built.length === 1 ? valences.reduce((sum, one) => sum + one.order, 0) : 1;
  if (functional.count !== undefined && functional.count !== copies) return false;
  // `carbonyl dichloride`, but not `sulfonyl chloride`, whose organic group was forgotten.
  if (
    radicals.some(({ unit }) => unit.needsLink === true && unit.groupings.length === 0) &&
    functional.count !== copies
  )
    return false;
  if (word === 'glycol' && copies !== 2) return false;
  if (copies > 1) return repeated(group, valences, draft);
  if (valences.length === 1 && radicals[0]!.count === 1 && standsTwice(word, radicals[0]!))
    valences.push(...again(radicals[0]!, draft, choices));
  if (valences.length !== sites.length) return false;
  if (built.length === 1 && valences.length === 2 && valences[0]!.atom === valences[1]!.atom) return false;
  const atoms = addFunction(group, sites, draft);
  return sites.every((site, index) => join(draft, atoms[site]!, valences[index]!));
}

/** The function once on every valence; a double one takes two. */
function repeated(group: string, valences: readonly Valence[], draft: Draft): boolean {
  const single = valences.flatMap(({ atom, order }) =>
    Array.from({ length: order }, () => ({ atom, order: 1 })),
  );
  return single.every((valence) => join(draft, addFunction(group, [0], draft)[0]!, valence));
}

function addFunction(group: string, sites: readonly number[], draft: Draft): number[] {
  const atoms = addSmiles(group, draft);
  for (const place of new Set(sites))
    draft.settleCapacity(atoms[place]!, undefined, sites.filter((site) => site === place).length);
  return atoms;
}

/** `phenyl sulfone`; `benzoyl peroxide`. Not where the group could be two that were written together. */
function standsTwice(word: string, { unit, mono }: Word): boolean {
  const acyl = unit.endings.some((ending) => ending.suffix.radical === true);
  if (mono === true || !(doublingWords.has(word) || (word === 'peroxide' && acyl))) return false;
  return unit.groupings.every((ways) =>
    ways.every((way) => way.substitutions.every((one) => one.locants !== undefined)),
  );
}

/** `ethyl ether` is diethyl ether in older usage. */
function again(radical: Word, draft: Draft, choices: Choices): readonly Valence[] {
  return buildWord(radical.unit, draft, choices, radical.count)?.free ?? [];
}

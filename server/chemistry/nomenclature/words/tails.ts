/**
 * What follows a stem: saturation (`an`), double and triple bonds (`-2-en`, `a-1,3-dien`; P-31.1.4.2.4), and one kind of
 * characteristic group or free valence (P-33, P-29.2), each with locants and multiplying affix.
 */
import type { Ending, Locant, SuffixEntry, Unsaturation } from '../tree.ts';
import type { Lexicon } from './lexicon.ts';
import { wordsAt } from './trie.ts';
import { addedHydrogenAt, locantsAt } from './locants.ts';

export interface Tail {
  readonly unsaturations: readonly Unsaturation[];
  readonly endings: readonly Ending[];
  readonly end: number;
}

const elided = /(tetr|pent|hex)(?=ol|on|amin|oic|yl)/y;

interface Counted {
  readonly locants?: readonly Locant[];
  readonly added?: readonly Locant[];
  readonly count: number;
  readonly end: number;
  /** Where locants would be written when there are none. */
  readonly at: number;
}

/** Locants and multiplier in the middle of a word: `-1,3-di`, `di`, `-2-`, or nothing. */
function* countedAt(text: string, lower: string, offset: number, lexicon: Lexicon): Generator<Counted> {
  const starts: { locants?: Locant[]; added?: Locant[]; end: number }[] = [];
  const hydrogen = addedHydrogenAt(text, offset);
  if (hydrogen) starts.push({ locants: hydrogen.value, added: hydrogen.added, end: hydrogen.end });
  const hyphen = text[offset] === '-' ? offset + 1 : offset;
  const written = locantsAt(text, hyphen);
  if (written) starts.push({ locants: written.value, end: written.end });
  else if (!hydrogen) starts.push({ end: hyphen });
  for (const start of starts) {
    const base = { ...start, at: offset };
    if (!start.locants || start.locants.length === 1) yield { ...base, count: 1 };
    for (const word of wordsAt(lexicon.words, lower, start.end)) {
      if (word.value.kind !== 'multiplier' || word.value.count < 2) continue;
      if (start.locants && start.locants.length !== word.value.count) continue;
      yield { ...base, count: word.value.count, end: word.end };
    }
    elided.lastIndex = start.end;
    const short = elided.exec(lower);
    if (short) {
      const count = { tetr: 4, pent: 5, hex: 6 }[short[1]!]!;
      if (!start.locants || start.locants.length === count) yield { ...base, count, end: elided.lastIndex };
    }
  }
}

/** Endings at the offset; an `e` or `a` before them is elided or not. */
export function endingsAt(text: string, lower: string, offset: number, lexicon: Lexicon): Tail[] {
  const found: Tail[] = [];
  for (const tail of singleEndingsAt(text, lower, offset, lexicon)) {
    const { suffix } = tail.endings[0]!;
    if (suffix.name !== 'id' && suffix.name !== 'uid') found.push(tail);
    if (suffix.kind === 'charge') found.push(...afterCharge(tail, text, lower, lexicon));
  }
  return found;
}

/** `-1-ium-3-carboxamide`, `-3-ium-1-id-2-yl`: a charge is cited before the other endings (P-73.1.2.2, P-74). */
function afterCharge(tail: Tail, text: string, lower: string, lexicon: Lexicon): Tail[] {
  const found: Tail[] = [];
  for (const next of singleEndingsAt(text, lower, tail.end, lexicon)) {
    const both = { ...next, endings: [...tail.endings, ...next.endings] };
    const { name, kind } = next.endings[0]!.suffix;
    if (name !== 'id' && name !== 'uid') found.push(both);
    if (kind === 'charge' && both.endings.length < 3) found.push(...afterCharge(both, text, lower, lexicon));
  }
  return found;
}

function singleEndingsAt(text: string, lower: string, offset: number, lexicon: Lexicon): Tail[] {
  const found: Tail[] = [];
  const seen = new Set<string>();
  const begin = lower[offset] === 'e' ? [offset + 1, offset] : [offset];
  for (const from of begin) {
    for (const counted of countedAt(text, lower, from, lexicon)) {
      for (const word of wordsAt(lexicon.suffixes, lower, counted.end)) {
        const ending = endingOf(word.value, counted, word.end);
        const key = `${word.value.name} ${word.value.group} ${String(counted.count)} ${String(word.end)}`;
        if (seen.has(key)) continue;
        seen.add(key);
        found.push({ unsaturations: [], endings: [ending], end: word.end });
      }
    }
  }
  return found;
}

function endingOf(suffix: SuffixEntry, counted: Counted, end: number): Ending {
  return {
    suffix,
    count: counted.count,
    at: counted.at,
    range: { start: counted.at, end },
    ...(counted.locants ? { locants: counted.locants } : {}),
    ...(counted.added ? { addedHydrogen: counted.added } : {}),
  };
}

/** Everything that can follow the stem of a chain or carbon ring: `an`, `-2-en-1-`, and the ending. */
export function chainTailsAt(text: string, lower: string, offset: number, lexicon: Lexicon): Tail[] {
  const found: Tail[] = [];
  for (const word of wordsAt(lexicon.suffixes, lower, offset)) {
    if (word.value.kind !== 'free' && word.value.name !== 'ylium') continue;
    found.push({
      unsaturations: [],
      endings: [endingOf(word.value, { count: 1, end: offset, at: offset }, word.end)],
      end: word.end,
    });
  }
  if (lower.startsWith('an', offset)) closed([], offset + 2);
  unsaturated([], offset);
  return found;

  /** After `an`, `en`, `yn`: nothing, `e`, or an ending. */
  function closed(unsaturations: readonly Unsaturation[], at: number): void {
    if (lower[at] === 'e') found.push({ unsaturations, endings: [], end: at + 1 });
    for (const tail of endingsAt(text, lower, at, lexicon)) found.push({ ...tail, unsaturations });
  }
  function unsaturated(before: readonly Unsaturation[], from: number): void {
    if (before.length > 2) return;
    const start = lower[from] === 'a' ? from + 1 : from;
    for (const counted of countedAt(text, lower, start, lexicon)) {
      const order = lower.startsWith('en', counted.end) ? 2 : lower.startsWith('yn', counted.end) ? 3 : 0;
      if (order === 0) continue;
      const one: Unsaturation = {
        order,
        count: counted.count,
        at: counted.at,
        range: { start: counted.at, end: counted.end + 2 },
        ...(counted.locants ? { locants: counted.locants } : {}),
      };
      const after = [...before, one];
      closed(after, counted.end + 2);
      unsaturated(after, counted.end + 2);
    }
  }
}

/**
 * A stretch of name without spaces as a row of items: substituents with locants and multiplying affixes, and at its end
 * a parent or a radical. Every way of cutting it is found once per place (a chart), and steps are counted.
 */
import type { Locant, Unit } from '../tree.ts';
import type { Item } from './item.ts';
import type { Group } from './group.ts';
import { groupsAt } from './groups.ts';
import { chainOfLinks } from './joints.ts';
import type { Lexicon, Word } from './lexicon.ts';
import { wordsAt } from './trie.ts';
import { addedHydrogenAt, bondingAt, indicatedAt, locantsAt } from './locants.ts';
import type { PreparedName } from './prepared.ts';
import { stereoAt } from './stereo-words.ts';
import { structured } from './structure.ts';

export interface Row {
  readonly items: readonly Item[];
  readonly end: number;
}

/** What a stretch means: a unit, and how many of it (`diethyl` is two radicals). */
export interface Stretch {
  readonly unit: Unit;
  readonly count: number;
  readonly role: 'radical' | 'parent' | 'derivative';
  readonly end: number;
}

type FoundWord = ReturnType<typeof wordsAt<Word>>[number];

const rowCap = 24;
/** P-15.4.1.1: the multiplier loses its a before `aza`, `oxa`; common practice, no source. */
const elidedMultiplier = /(tetr|pent|hex|hept|oct|non|dec)(?=az|ox)/y;
const elidedCounts: Readonly<Record<string, number>> = {
  tetr: 4,
  pent: 5,
  hex: 6,
  hept: 7,
  oct: 8,
  non: 9,
  dec: 10,
};
const boundary = /[\s()[\];:,·*.+/]|$/y;

export class ItemReader {
  readonly #rows = new Map<number, readonly Row[]>();
  readonly #open = new Set<number>();
  readonly #groupWords = new Map<number, readonly Group[]>();
  readonly #words = new Map<number, readonly FoundWord[]>();
  readonly #stretches = new Map<number, readonly Stretch[]>();
  /** The furthest place to which every letter was understood. */
  furthest = 0;
  steps = 0;

  readonly name: PreparedName;
  readonly lexicon: Lexicon;
  readonly stepLimit: number;

  constructor(name: PreparedName, lexicon: Lexicon, stepLimit: number) {
    this.name = name;
    this.lexicon = lexicon;
    this.stepLimit = stepLimit;
  }

  get exhausted(): boolean {
    return this.steps > this.stepLimit;
  }

  /** All stretches that begin at the offset. */
  stretchesAt(offset: number): readonly Stretch[] {
    let found = this.#stretches.get(offset);
    if (!found) this.#stretches.set(offset, (found = this.#findStretches(offset)));
    return found;
  }

  #findStretches(offset: number): Stretch[] {
    const found: Stretch[] = [];
    for (const row of this.rowsAt(offset)) {
      const made = structured(row.items, this.name, this);
      if (made) found.push({ ...made, end: row.end });
      const link = /[([]/.test(this.name.text[offset - 1] ?? '') ? chainOfLinks(row.items) : undefined;
      if (link) found.push({ unit: link, count: 1, role: 'radical', end: row.end });
      if (found.length >= rowCap) break;
    }
    return found;
  }

  rowsAt(offset: number): readonly Row[] {
    const known = this.#rows.get(offset);
    if (known) return known;
    if (this.#open.has(offset) || this.exhausted || this.#open.size > 120) return [];
    this.#open.add(offset);
    const rows: Row[] = [];
    for (const head of this.#itemsAt(offset)) {
      this.steps++;
      if (rows.length >= rowCap || this.exhausted) break;
      if (head.item.kind === 'group') {
        this.furthest = Math.max(this.furthest, head.end);
        boundary.lastIndex = head.end;
        if (boundary.test(this.name.text)) rows.push({ items: [head.item], end: head.end });
        if (head.item.role !== 'radical') continue;
      }
      const next = this.name.text[head.end] === '-' ? head.end + 1 : head.end;
      if (next >= this.name.text.length) continue;
      for (const rest of this.rowsAt(next)) {
        if (rows.length >= rowCap) break;
        const first = rest.items[0]!;
        if (head.item.kind === 'replacement' && first.kind === 'stereo') continue;
        if (head.item.kind === 'bonding') {
          const bonded = withBondingNumbers(first, head.item);
          if (bonded) rows.push({ items: [bonded, ...rest.items.slice(1)], end: rest.end });
          continue;
        }
        const items =
          first.kind === 'group' && next !== head.end && first.unit.bonding === undefined
            ? [{ ...first, joins: false }, ...rest.items.slice(1)]
            : rest.items;
        rows.push({ items: [head.item, ...items], end: rest.end });
      }
    }
    this.#open.delete(offset);
    this.#rows.set(offset, rows);
    return rows;
  }

  /** Indicated and added hydrogen, and bonding numbers. */
  *#numberedAt(offset: number): Generator<{ item: Item; end: number }> {
    const { text } = this.name;
    const hydrogen = indicatedAt(text, offset);
    if (hydrogen)
      yield { item: { kind: 'indicated', locants: hydrogen.value, start: offset }, end: hydrogen.end };
    const added = addedHydrogenAt(text, offset);
    if (added) yield* this.#withAddedHydrogen(offset, added);
    const bonding = bondingAt(text, offset);
    if (bonding) yield { item: { kind: 'bonding', numbers: bonding.value, start: offset }, end: bonding.end };
  }

  *#itemsAt(offset: number): Generator<{ item: Item; end: number }> {
    const { text } = this.name;
    const stereo = stereoAt(text, offset);
    if (stereo) yield { item: { kind: 'stereo', words: stereo.value, start: offset }, end: stereo.end };
    if (/[\d(λ]/.test(text[offset]!)) yield* this.#numberedAt(offset);
    const locants = locantsAt(text, offset);
    if (locants) yield* this.#countedAt(offset, locants.end, locants.value);
    yield* this.#countedAt(offset, offset, undefined);
  }

  /** `2(1H)-quinolinone`, `1,3(2H,4H)-isoquinolinedione`: older names put them before the parent (1979 rules). */
  *#withAddedHydrogen(
    start: number,
    { value, added, end }: { value: readonly Locant[]; added: readonly Locant[]; end: number },
  ): Generator<{ item: Item; end: number }> {
    for (const group of this.#groupWordsAt(end)) {
      const [ending, second] = group.unit.endings;
      if (!ending || second || ending.locants !== undefined || ending.count !== value.length) continue;
      const endings = [{ ...ending, locants: value, addedHydrogen: added }];
      const place = { count: 1, start, bodyAt: end, end: group.end, joins: false, bracketed: false };
      const item: Item = { kind: 'group', ...place, unit: { ...group.unit, endings }, role: group.role };
      yield { item, end: group.end };
    }
  }

  *#countedAt(
    start: number,
    from: number,
    locants: readonly Locant[] | undefined,
  ): Generator<{ item: Item; end: number }> {
    const { lower } = this.name;
    yield* this.#groupsAt(start, from, locants, 1, from);
    for (const word of this.#wordsAt(from)) {
      if (word.value.kind === 'multiplier') {
        const count = word.value.count;
        // `2-dimethylaminoethyl`: the locant is that of the whole group which begins here.
        const outer = locants?.length === 1 && count > 1 && !/^[omp]$/.test(locants[0]!);
        if (locants && locants.length !== count && !outer && !(locants.length === 1 && count === 2)) continue;
        yield* this.#groupsAt(start, word.end, locants, count, from);
        // `di-tert-butyl`, `di-n-propyl`
        if (lower[word.end] === '-') yield* this.#groupsAt(start, word.end + 1, locants, count, from);
      }
    }
    elidedMultiplier.lastIndex = from;
    const elided = elidedMultiplier.exec(lower);
    const count = elidedCounts[elided?.[1] ?? ''];
    if (elided && locants?.length === count)
      yield* this.#replacementsAt(start, elidedMultiplier.lastIndex, locants);
  }

  *#replacementsAt(
    start: number,
    from: number,
    locants: readonly Locant[] | undefined,
    count = locants?.length ?? 1,
  ): Generator<{ item: Item; end: number }> {
    for (const { value, end } of this.#wordsAt(from)) {
      if (value.kind !== 'replacement') continue;
      const { atomicNumber, charge } = value;
      yield { item: { kind: 'replacement', locants, count, start, atomicNumber, charge, end }, end };
    }
  }

  /** Words for groups and parents that begin at the offset, the longest first; each place is looked at once. */
  #groupWordsAt(offset: number): readonly Group[] {
    let found = this.#groupWords.get(offset);
    if (!found) {
      const all = groupsAt(this.name.text, this.name.lower, offset, this.lexicon);
      // `phenylalanine` is no alanine with a phenyl group.
      const residue = Math.max(-1, ...all.filter(({ unit }) => unit.residue).map(({ end }) => end));
      found = all
        .filter(({ unit, end }) => unit.residue === true || end > residue)
        .sort((first, second) => second.end - first.end);
      this.#groupWords.set(offset, found);
    }
    return found;
  }

  /** Words of the vocabulary at the offset; each place is looked at once. */
  #wordsAt(offset: number): readonly FoundWord[] {
    let found = this.#words.get(offset);
    if (!found) this.#words.set(offset, (found = wordsAt(this.lexicon.words, this.name.lower, offset)));
    return found;
  }

  /** Ends of words like `disulfanyl` that begin where a multiplier could be read as well. */
  #radicalEnds(from: number): ReadonlySet<number> {
    const { lower } = this.name;
    // `methylenedioxy`: two of `oxy`.
    const words = this.#wordsAt(from).filter(
      (word) => word.value.kind === 'radical' && word.value.needsLink !== true,
    );
    // `tridecyl` is one group of thirteen carbons, not three of ten.
    const alkyls = lower.startsWith('tri', from) ? this.#groupWordsAt(from) : [];
    // `dichromate` is one ion, not two of chromate.
    const parents = lower.startsWith('di', from)
      ? this.#groupWordsAt(from).filter(({ role, unit }) => role === 'parent' && unit.endings.length === 0)
      : [];
    return new Set([...words, ...alkyls, ...parents].map((one) => one.end));
  }

  *#groupsAt(
    start: number,
    from: number,
    locants: readonly Locant[] | undefined,
    count: number,
    bodyAt: number,
  ): Generator<{ item: Item; end: number }> {
    const { text, lower } = this.name;
    const bracket = text[from];
    if (bracket === '(' || bracket === '[') {
      for (const inner of this.stretchesAt(from + 1)) {
        if (
          (inner.role !== 'radical' && count === 1) ||
          text[inner.end] !== (bracket === '(' ? ')' : ']') ||
          (inner.count !== 1 && count !== 1)
        )
          continue;
        const end = inner.end + 1;
        this.furthest = Math.max(this.furthest, end);
        yield {
          item: {
            kind: 'group',
            locants,
            count: Math.max(count, inner.count),
            start,
            unit: inner.unit,
            bodyAt,
            role: inner.role,
            joins: !locants,
            bracketed: true,
            end,
          },
          end,
        };
      }
    }
    for (const { value, end } of this.#wordsAt(from)) {
      if (value.kind === 'hydro') yield { item: { kind: 'hydro', locants, count, start, end }, end };
    }
    yield* this.#replacementsAt(start, from, locants, count);
    const direct = count > 1 ? this.#radicalEnds(bodyAt) : undefined;
    const plain = count > 1 && lower.startsWith('n-', from) ? from + 2 : from;
    const groups = this.#groupWordsAt(plain).filter(
      (group) => direct?.has(group.end) !== true && (plain === from || group.normal === true),
    );
    const normal = locants?.length === 1 && count === 1 && locants[0] === 'N' && text[start] === 'n';
    const itemOf = (
      group: Group,
      unit: Unit,
      own: readonly Locant[] | undefined,
      joins: boolean,
    ): { item: Item; end: number } => {
      const { role, end } = group;
      const bracketed = false;
      return {
        item: { kind: 'group', locants: own, count, unit, role, joins, bracketed, start, bodyAt, end },
        end,
      };
    };
    for (const group of groups) {
      if (locants?.length === 1 && count === 1 && group.locantBefore === true)
        yield itemOf(group, attachedAt(group.unit, locants), undefined, false);
      if (normal && group.normal === true) yield itemOf(group, normalChain(group.unit), undefined, true);
      else yield itemOf(group, group.unit, locants, !locants);
    }
  }
}

/** `λ4-sulfanyl`: the number belongs to the very next word, and the hyphen does not part it from what is before. */
function withBondingNumbers(item: Item, bonding: Extract<Item, { kind: 'bonding' }>): Item | undefined {
  if (item.kind !== 'group' || item.locants || item.count > 1 || item.bracketed) return undefined;
  const { numbers, start } = bonding;
  const unit = { ...item.unit, bonding: numbers, parentAt: start };
  return { ...item, unit, joins: true, start, bodyAt: start };
}

/** `n-hexanol`: the group is at the end of the chain, as the older use of `normal` has it (common practice, no source). */
function normalChain(unit: Unit): Unit {
  const [ending] = unit.endings;
  if (!ending || !/^(?:ol|thiol|amine)$/.test(ending.suffix.name)) return unit;
  if (ending.locants !== undefined || ending.count > 1 || unit.unsaturations.length > 0) return unit;
  return { ...unit, endings: [{ ...ending, locants: ['1'] }] };
}

/** `1-naphthyl`, `8-tricyclo[…]undecanyl`: the locant in front is that of the free valence. */
function attachedAt(unit: Unit, locants: readonly Locant[]): Unit {
  return { ...unit, endings: unit.endings.map((ending) => ({ ...ending, locants })) };
}

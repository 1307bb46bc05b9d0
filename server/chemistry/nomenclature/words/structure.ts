/**
 * Makes a tree of a row of items: the last is the parent, those before it are its substituents or, where a name leaves
 * brackets out (`4-phenylmethoxybenzaldehyde`), substituents of one another. Each such stretch keeps all its
 * understandings with a cost; the cheapest that can be built are meant.
 */
import type { Grouping, Locant, Replacement, StereoWord, Unit } from '../tree.ts';
import { groupingsOf, isOuter, linkedGroupings, runsOf } from './groupings.ts';
import type { GroupItem, Item } from './item.ts';
import { asLink, multiplied, valencesOf, withLinksJoined } from './joints.ts';
import { withBonding } from './locants.ts';
import type { PreparedName } from './prepared.ts';
import { residuesJoined } from './residues.ts';

export interface Structured {
  readonly unit: Unit;
  readonly count: number;
  readonly role: 'radical' | 'parent' | 'derivative';
}

/** Steps counted over a whole name; a row without brackets can be nested in more ways than anyone can try. */
export interface Effort {
  steps: number;
  readonly exhausted: boolean;
}

/** The unit that a row means, or undefined when the pieces do not go together. */
export function structured(
  row: readonly Item[],
  name: PreparedName,
  effort: Effort,
  depth = 0,
): Structured | undefined {
  effort.steps++;
  if (effort.exhausted || depth > 60) return undefined;
  const nestedAs = (inner: readonly Item[]): Unit | undefined => {
    const made = structured(inner, name, effort, depth + 1);
    return made?.count === 1 && made.role === 'radical' ? made.unit : undefined;
  };
  const items = residuesJoined(withLinksJoined(row), nestedAs);
  const last = items?.[items.length - 1];
  if (!items || last?.kind !== 'group') return undefined;
  if (last.count > 1) {
    const around = roundLink(items, last, name, nestedAs);
    if (around) return { unit: withRange(around, items), count: 1, role: last.role };
  }
  const prefixes = prefixesOf(items.slice(0, -1));
  if (!prefixes) return undefined;
  const { stereo, indicated, hydro, replacements, groups } = prefixes;
  let base: Unit | undefined = last.unit;
  if (last.locants) {
    if (last.count > 1) return undefined;
    base = withLeadingLocants(base, last.locants);
    if (!base) return undefined;
  }
  const groupings: (readonly Grouping[])[] = [...base.groupings];
  // `(methoxycarbonyl)` in its brackets has what it joins already.
  const filled = last.bracketed && base.groupings.length > 0;
  if (base.linkAt !== undefined && !filled) {
    // Hydro prefixes and located descriptors are about a group before the link; a bare `(E)` is about the whole.
    const belongs = (item: Item) =>
      item.kind !== 'group' &&
      (item.kind !== 'stereo' || item.words.some((word) => word.locant !== undefined));
    const oneGroup = items.some(belongs);
    const before = items.slice(0, -1).filter((item) => oneGroup || item.kind !== 'stereo');
    const linked = linkedGroupings(before, groups, base, last, nestedAs, oneGroup);
    if (!linked && base.derivativeOf === undefined) {
      // `(oxy)` by itself can still join others.
      if (items.length > 1 || !base.links) return undefined;
      return { unit: { ...asLink(base), needsLink: true }, count: last.count, role: last.role };
    }
    if (linked && linked.length > 0) {
      if (last.count > 1 && groups.length > 0) return undefined;
      const unit = { ...base, groupings: [linked], stereo: [...(oneGroup ? [] : stereo), ...base.stereo] };
      return { unit: withRange(unit, items), count: groups.length === 0 ? last.count : 1, role: last.role };
    }
  }
  for (const run of runsOf(groups)) {
    const ways = groupingsOf(run, base, name, nestedAs);
    if (ways.length === 0) return undefined;
    groupings.push(ways);
  }
  const unit: Unit = {
    ...base,
    groupings,
    stereo: [...stereo, ...base.stereo],
    indicated: [...indicated, ...base.indicated],
    hydro: [...hydro, ...base.hydro],
    replacements: [...replacements, ...base.replacements],
  };
  // `diethyl` before a space: two radicals; `dimethylpropyl` is one.
  if (last.count > 1 && groups.length > 0) return undefined;
  return { unit: withRange(unit, items), count: last.count, role: last.role };
}

/** What stands before a parent, by what it does. */
interface Prefixes {
  readonly stereo: StereoWord[];
  readonly indicated: Locant[];
  readonly hydro: Unit['hydro'][number][];
  readonly replacements: Replacement[];
  readonly groups: GroupItem[];
}

function prefixesOf(items: readonly Item[]): Prefixes | undefined {
  const found: Prefixes = { stereo: [], indicated: [], hydro: [], replacements: [], groups: [] };
  for (const item of items) {
    switch (item.kind) {
      case 'stereo':
        found.stereo.push(...item.words);
        break;
      case 'indicated':
        found.indicated.push(...item.locants);
        break;
      case 'hydro': {
        const { start: at, end, count, locants } = item;
        found.hydro.push({ count, at, range: { start: at, end }, ...(locants ? { locants } : {}) });
        break;
      }
      case 'replacement': {
        const replacement = replacementOf(item);
        if (!replacement) return undefined;
        found.replacements.push(replacement);
        break;
      }
      case 'bonding':
        return undefined;
      case 'group':
        if (item.role !== 'radical' || !locantsFit(item)) return undefined;
        found.groups.push(item);
    }
  }
  return found;
}

function replacementOf(item: Extract<Item, { kind: 'replacement' }>): Replacement | undefined {
  const { start, end, atomicNumber, charge, count } = item;
  const written = item.locants ?? (count === 1 ? ['1'] : undefined);
  if (written?.length !== count) return undefined;
  const places = written.map(withBonding);
  const bonding = places.map((place) => place.bonds);
  return {
    atomicNumber,
    charge,
    locants: places.map((place) => place.locant),
    ...(bonding.some((bonds) => bonds !== undefined) ? { bonding } : {}),
    range: { start, end },
  };
}

/** A locant for each, `o-` for one or two, or one for each free valence of a bridge. */
function locantsFit(item: GroupItem): boolean {
  const { locants, count, unit } = item;
  if (!locants || locants.length === count || isOuter(item)) return true;
  if (locants.length === 1) return /^[omp]$/.test(locants[0]!);
  return count === 1 && locants.length === valencesOf(unit);
}

/** Like units on a link, with the substituents that their primed locants tell apart. */
function roundLink(
  items: readonly Item[],
  units: GroupItem,
  name: PreparedName,
  nest: (inner: readonly Item[]) => Unit | undefined,
): Unit | undefined {
  if (units.locants) return undefined;
  const prefixes = prefixesOf(items.slice(0, -2));
  if (!prefixes || prefixes.indicated.length + prefixes.hydro.length + prefixes.replacements.length > 0)
    return undefined;
  const groupings: (readonly Grouping[])[] = [];
  for (const run of runsOf(prefixes.groups)) {
    const ways = groupingsOf(run, units.unit, name, nest).filter((way) =>
      way.substitutions.every((one) => one.locants !== undefined),
    );
    if (ways.length === 0) return undefined;
    groupings.push(ways);
  }
  return multiplied(items[items.length - 2], units, groupings, prefixes.stereo);
}

function withRange(unit: Unit, items: readonly Item[]): Unit {
  const [only] = items;
  // What a bracket holds begins inside it.
  if (items.length === 1 && only?.kind === 'group' && only.bracketed) return unit;
  const start = Math.min(items[0]?.start ?? unit.range.start, unit.range.start);
  return { ...unit, range: { start, end: unit.range.end } };
}

/**
 * 1979 rules put the locants of the parent before it: `2-butanol`, `2-propenoic acid`, `1,3-butadiene`, `2-furyl`. They
 * belong to the first ending or double bond that has none and takes so many.
 */
function withLeadingLocants(unit: Unit, locants: readonly Locant[]): Unit | undefined {
  const side = unit.sideChain;
  if (side && !side.locants && side.count === locants.length)
    return { ...unit, sideChain: { ...side, locants } };
  const place = unit.unsaturations.findIndex(
    (one) => one.locants === undefined && one.count === locants.length,
  );
  if (place >= 0) {
    const unsaturations = unit.unsaturations.map((one, index) =>
      index === place ? { ...one, locants } : one,
    );
    return { ...unit, unsaturations };
  }
  const ending = unit.endings.findIndex((one) => one.locants === undefined && one.count === locants.length);
  if (ending < 0) return undefined;
  return {
    ...unit,
    endings: unit.endings.map((one, index) => (index === ending ? { ...one, locants } : one)),
  };
}

/**
 * Makes a tree of a row of items: the last is the parent, those before it are its substituents or, where a name leaves
 * brackets out (`4-phenylmethoxybenzaldehyde`), substituents of one another. Each such stretch keeps all its
 * understandings with a cost; the cheapest that can be built are meant.
 */
import type { Grouping, Locant, StereoWord, Unit } from '../tree.ts';
import { groupingsOf, isOuter, linkedGroupings, runsOf } from './groupings.ts';
import type { GroupItem, Item } from './item.ts';
import type { PreparedName } from './prepared.ts';

export interface Structured {
  readonly unit: Unit;
  readonly count: number;
  readonly role: 'radical' | 'parent';
}

/** The unit that a row means, or undefined when the pieces do not go together. */
export function structured(items: readonly Item[], name: PreparedName, depth = 0): Structured | undefined {
  const last = items[items.length - 1];
  if (last?.kind !== 'group' || depth > 60) return undefined;
  const nestedAs = (inner: readonly Item[]): Unit | undefined => {
    const made = structured(inner, name, depth + 1);
    return made?.count === 1 && made.role === 'radical' ? made.unit : undefined;
  };
  const stereo: StereoWord[] = [];
  const indicated: Locant[] = [];
  const hydro: {
    locants?: readonly Locant[];
    count: number;
    at: number;
    range: { start: number; end: number };
  }[] = [];
  const replacements: {
    atomicNumber: number;
    locants: readonly Locant[];
    range: { start: number; end: number };
  }[] = [];
  const groups: GroupItem[] = [];
  for (const item of items.slice(0, -1)) {
    if (item.kind === 'stereo') stereo.push(...item.words);
    else if (item.kind === 'indicated') indicated.push(...item.locants);
    else if (item.kind === 'hydro') {
      const range = { start: item.start, end: item.end };
      hydro.push({
        count: item.count,
        at: item.start,
        range,
        ...(item.locants ? { locants: item.locants } : {}),
      });
    } else if (item.kind === 'replacement') {
      const places = item.locants ?? (item.count === 1 ? ['1'] : undefined);
      if (places?.length !== item.count) return undefined;
      replacements.push({
        atomicNumber: item.atomicNumber,
        locants: places,
        range: { start: item.start, end: item.end },
      });
    } else {
      if (item.role !== 'radical') return undefined;
      const single = item.locants?.length === 1 && /^[omp]$/.test(item.locants[0]!);
      if (item.locants && item.locants.length !== item.count && !single && !isOuter(item)) return undefined;
      groups.push(item);
    }
  }
  let base: Unit | undefined = last.unit;
  if (last.locants) {
    if (last.count > 1) return undefined;
    base = withLeadingLocants(base, last.locants);
    if (!base) return undefined;
  }
  const groupings: (readonly Grouping[])[] = [...base.groupings];
  if (base.linkAt !== undefined) {
    const linked = linkedGroupings(items.slice(0, -1), groups, base, last, nestedAs);
    if (!linked) return undefined;
    if (linked.length > 0) {
      const unit = { ...base, groupings: [linked] };
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

/**
 * Makes a tree of a row of items: the last is the parent, those before it are its substituents or, where a name leaves
 * brackets out (`4-phenylmethoxybenzaldehyde`), substituents of one another. Each such stretch keeps all its
 * understandings with a cost; the cheapest that can be built are meant.
 */
import type { Grouping, Locant, StereoWord, Substitution, Unit } from '../tree.ts';
import type { GroupItem, Item } from './item.ts';
import type { PreparedName } from './prepared.ts';

export interface Structured {
  readonly unit: Unit;
  readonly count: number;
  readonly role: 'radical' | 'parent';
}

const halogens = /^(?:fluoro|chloro|bromo|iodo)/;

/** The unit that a row means, or undefined when the pieces do not go together. */
export function structured(items: readonly Item[], name: PreparedName, depth = 0): Structured | undefined {
  const last = items[items.length - 1];
  if (last?.kind !== 'group' || depth > 60) return undefined;
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
    const linked = linkedGroupings(items.slice(0, -1), groups, base, last, name, depth);
    if (!linked) return undefined;
    if (linked.length > 0) {
      const unit = { ...base, groupings: [linked] };
      return { unit: withRange(unit, items), count: groups.length === 0 ? last.count : 1, role: last.role };
    }
  }
  for (const run of runsOf(groups)) {
    const ways = groupingsOf(run, base, name, depth);
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

/** Items that follow each other without hyphen or locants, cut where a new substituent certainly begins. */
function runsOf(groups: readonly GroupItem[]): GroupItem[][] {
  const runs: GroupItem[][] = [];
  for (const group of groups) {
    const run = runs[runs.length - 1];
    if (run && group.joins) run.push(group);
    else runs.push([group]);
  }
  return runs;
}

function substitution(item: GroupItem, locants = item.locants): Substitution {
  return {
    count: item.count,
    unit: item.unit,
    at: item.start,
    range: { start: item.start, end: item.end },
    ...(locants ? { locants } : {}),
  };
}

const canStand = (item: GroupItem) =>
  item.unit.needsLink !== true || item.bracketed || item.unit.groupings.length > 0;

function groupingsOf(run: readonly GroupItem[], parent: Unit, name: PreparedName, depth: number): Grouping[] {
  const first = run[0]!;
  if (run.length === 1) return canStand(first) ? [{ substitutions: [substitution(first)], cost: 0 }] : [];
  const found: Grouping[] = [];
  const text = name.lower.slice(first.start, run[run.length - 1]!.end);
  const { locants: _, ...unlocated } = first;
  const range = { start: first.start, end: run[run.length - 1]!.end };
  const nestable = !run[run.length - 1]!.bracketed;
  const single = parent.skeletons.every((one) => one.atoms.length === 1) && !first.locants && first.count > 1;
  const outside =
    !first.locants || first.locants.length === 1 ? nested([unlocated, ...run.slice(1)]) : undefined;
  if (outside && nestable) {
    found.push({
      substitutions: [
        {
          count: 1,
          unit: outside,
          at: first.start,
          range,
          ...(first.locants ? { locants: first.locants } : {}),
        },
      ],
      cost: single ? 2 : 0,
    });
  }
  const inside = first.locants && nestable ? nested(run) : undefined;
  if (inside) found.push({ substitutions: [{ count: 1, unit: inside, at: first.start, range }], cost: 0 });
  const perhalo =
    halogens.test(text.replace(/^(?:[\d,]+-)?(?:di|tri)/, '')) &&
    /^(?:[\d,]+-)?(?:di|tri)\w+methyl$/.test(text) &&
    run.length === 2;
  if (run.every(canStand) && !(perhalo && !single)) {
    const linksAtEnd = run.slice(1).some((item) => item.unit.linkAt !== undefined && !item.bracketed);
    const cost = first.locants ? 2 : linksAtEnd ? 1 : 0;
    found.push({ substitutions: run.map((item) => substitution(item)), cost });
  }
  if (run.length > 2) found.push(...partlyNested(run));
  return found;

  function nested(items: readonly GroupItem[]): Unit | undefined {
    const made = structured(
      items.map((item, index) => (index === 0 ? item : { ...item, joins: true })),
      name,
      depth + 1,
    );
    return made?.count === 1 && made.role === 'radical' ? made.unit : undefined;
  }
  /** `chloro` + `phenylmethoxy`: the first stands alone, the rest belongs together. */
  function partlyNested(items: readonly GroupItem[]): Grouping[] {
    const rest = nested(items.slice(1));
    if (!rest || !canStand(items[0]!) || !nestable) return [];
    const at = items[1]!.start;
    const others = { count: 1, unit: rest, at, range: { start: at, end: range.end } };
    return [{ substitutions: [substitution(items[0]!), others], cost: first.locants ? 2 : 1 }];
  }
}

/**
 * Substituents of a linking group. Everything before it is one group (`2-methylpropyl` + `amino`), or each sits on it
 * (`dimethylamino`, `ethyl(methyl)amino`). An empty list: nothing belongs to it; undefined: it cannot stand so.
 */
function linkedGroupings(
  before: readonly Item[],
  groups: readonly GroupItem[],
  base: Unit,
  last: GroupItem,
  name: PreparedName,
  depth: number,
): Grouping[] | undefined {
  if (groups.length === 0) return base.needsLink === true ? undefined : [];
  if (!last.joins && base.needsLink !== true) return [];
  const found: Grouping[] = [];
  const whole = structured(before, name, depth + 1);
  const range = { start: groups[0]!.start, end: last.end };
  const mixed = groups.slice(1).some((group) => group.bracketed && group.joins);
  if (whole?.role === 'radical' && whole.count === 1 && !(mixed && base.needsLink !== true)) {
    found.push({
      substitutions: [{ count: 1, unit: whole.unit, locants: ['→'], at: range.start, range }],
      cost: 0,
    });
  }
  if (base.needsLink === true) return found.length > 0 ? found : undefined;
  const located = groups.some((group) => group.locants?.some((locant) => /^\d/.test(locant)));
  if (!located && groups.every(canStand)) {
    const substitutions = groups.map((group) =>
      substitution(group, group.locants ?? Array.from({ length: group.count }, () => '→')),
    );
    if (!(groups.length === 1 && groups[0]!.count === 1)) found.push({ substitutions, cost: 0 });
  }
  return found.length > 0 ? found : undefined;
}

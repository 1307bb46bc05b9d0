/**
 * Substituents side by side or one on another, where a name does without brackets. Printed names put a single locant
 * before a compound group (`4-phenylmethoxy…`), and hyphens between groups that belong apart (`ethyl-methylamino`).
 */
import type { Grouping, Locant, Substitution, Unit } from '../tree.ts';
import type { GroupItem, Item } from './item.ts';
import type { PreparedName } from './prepared.ts';

/** The single radical that a row of items means, or undefined. */
export type Nest = (items: readonly Item[]) => Unit | undefined;

const perhalogenated = /^(?:[\d,]+-)?(?:di|tri)(?:fluoro|chloro|bromo|iodo)methyl$/;

/** Items that follow each other without hyphen or locants, cut where a new substituent certainly begins. */
export function runsOf(groups: readonly GroupItem[]): GroupItem[][] {
  const runs: GroupItem[][] = [];
  for (const group of groups) {
    const run = runs[runs.length - 1];
    if (run && group.joins && !group.bracketed) run.push(group);
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
    bodyAt: item.bodyAt,
    bracketed: item.bracketed,
    ...(locants ? { locants } : {}),
  };
}

/** Several items as one group, as if they stood in brackets. */
function compound(
  unit: Unit,
  items: readonly GroupItem[],
  locants: readonly Locant[] | undefined,
  inner: boolean,
): Substitution {
  const first = items[0]!;
  const end = items[items.length - 1]!.end;
  return {
    count: 1,
    unit,
    at: first.start,
    range: { start: first.start, end },
    bracketAt: inner ? first.start : first.bodyAt,
    bodyAt: inner ? first.start : first.bodyAt,
    ...(locants ? { locants } : {}),
  };
}

const canStand = (item: GroupItem) =>
  item.unit.needsLink !== true || item.bracketed || item.unit.groupings.length > 0;
/** `2-dimethylamino…`: one locant before several groups is that of the compound group which they begin. */
export const isOuter = (item: GroupItem): boolean =>
  item.locants?.length === 1 && item.count > 1 && !/^[omp]$/.test(item.locants[0]!);
const links = (item: GroupItem) => item.unit.linkAt !== undefined && !item.bracketed;
const joined = (items: readonly GroupItem[]) =>
  items.map((item, index) => (index === 0 ? item : { ...item, joins: true }));

/** The ways of understanding one run of items before `parent`; none when it cannot be understood. */
export function groupingsOf(
  run: readonly GroupItem[],
  parent: Unit,
  name: PreparedName,
  nest: Nest,
): Grouping[] {
  const first = run[0]!;
  const outerLocant = isOuter(first);
  if (run.slice(1).some(isOuter)) return [];
  if (run.length === 1)
    return canStand(first) && !outerLocant ? [{ substitutions: [substitution(first)], cost: 0 }] : [];
  const found: Grouping[] = [];
  const last = run[run.length - 1]!;
  const text = name.lower.slice(first.start, last.end);
  const perhalo = run.length === 2 && perhalogenated.test(text);
  // `trimethylphenylsilane`: a parent of one atom takes the groups side by side.
  const single = parent.skeletons.every((one) => one.atoms.length === 1);
  const small = single && !first.locants && first.count > 1;
  // `N-methylbenzylamine` (P-62.2.2.1): a single group on the nitrogen would need no locant, so there are two.
  const secondary = single && first.locants?.every((locant) => /^N'*$/.test(locant)) === true;
  if (!last.bracketed) {
    const outer = !first.locants || first.locants.length === 1;
    const outside = outer ? nest(joined([withoutLocants(first), ...run.slice(1)])) : undefined;
    if (outside) {
      const cost = secondary ? 3 : small && !links(last) && !perhalo && !run.slice(1).some(links) ? 2 : 0;
      found.push({ substitutions: [compound(outside, run, first.locants, false)], cost });
    }
    const next = run.slice(1).find((item) => !links(item));
    const inside = first.locants && !outerLocant && next && hasPlaces(next) ? nest(joined(run)) : undefined;
    if (inside) found.push({ substitutions: [compound(inside, run, undefined, true)], cost: 0 });
  }
  if (outerLocant) return found;
  if (run.every(canStand) && !perhalo) {
    const cost = secondary
      ? 0
      : first.locants
        ? 2
        : run.slice(1).some(links) || outOfOrder(run, name)
          ? 1
          : 0;
    found.push({ substitutions: run.map((item) => substitution(item)), cost });
  }
  const rest = run.length > 2 && !last.bracketed && canStand(first) ? nest(joined(run.slice(1))) : undefined;
  if (rest) {
    // `chloro` + `phenylmethoxy`: the first stands alone, the rest belongs together.
    const substitutions = [substitution(first), compound(rest, run.slice(1), undefined, false)];
    found.push({ substitutions, cost: first.locants ? 2 : 1 });
  }
  return found;
}

/**
 * Groups side by side are cited in alphabetical order (P-14.5); those that are not rather belong one on another. Alkyl
 * groups are left in any order often enough for it to say nothing.
 */
function outOfOrder(run: readonly GroupItem[], name: PreparedName): boolean {
  const alkyl = (item: GroupItem) =>
    item.unit.skeletons.every((one) => one.kind === 'chain' && one.atoms[0]!.atomicNumber === 6);
  if (run.every(alkyl)) return false;
  const initials = run.map(
    (item) => /[a-z]/.exec(name.lower.slice(item.unit.range.start, item.end))?.[0] ?? '',
  );
  return initials.some((initial, index) => index > 0 && initial < initials[index - 1]!);
}

function withoutLocants(item: GroupItem): GroupItem {
  const { kind, count, unit, role, joins, bracketed, bodyAt, end } = item;
  return { kind, count, unit, role, joins, bracketed, start: bodyAt, bodyAt, end };
}

/** A locant written before a group can be about the next one only if that has several places: not `methoxy`, `amino`. */
function hasPlaces(item: GroupItem): boolean {
  if (item.unit.linkAt !== undefined) return false;
  return item.unit.skeletons.some((one) => one.atoms.filter((atom) => atom.locants.length > 0).length > 1);
}

/**
 * Substituents of a linking group. Everything before it is one group (`2-methylpropyl` + `amino`), or each sits on it
 * (`dimethylamino`, `ethyl(methyl)amino`, `ethyl-methylamino`). An empty list: nothing belongs to it; undefined: it
 * cannot stand so.
 */
export function linkedGroupings(
  before: readonly Item[],
  groups: readonly GroupItem[],
  base: Unit,
  last: GroupItem,
  nest: Nest,
  oneGroup: boolean,
): Grouping[] | undefined {
  if (groups.length === 0) return base.needsLink === true ? undefined : [];
  if (groups.some(isOuter)) return undefined;
  if (!last.joins && base.needsLink !== true) return [];
  const apart = groups
    .slice(1)
    .some((group) => (!group.joins && !group.locants) || (group.bracketed && group.joins));
  if (apart && base.needsLink !== true && !oneGroup) return eachRun(groups, nest);
  const found: Grouping[] = [];
  const range = { start: groups[0]!.start, end: groups[groups.length - 1]!.end };
  // `ethylmethylamino`: two alkyl groups on the nitrogen; `carboxymethylamino`: one group.
  const alkyls =
    groups.length > 1 &&
    base.needsLink !== true &&
    groups.every((group) => group.unit.skeletons.every((one) => one.kind === 'chain'));
  const whole = nest(before);
  if (whole) {
    const bodyAt = groups[0]!.locants ? range.start : groups[0]!.bodyAt;
    const bracketed = groups.length === 1 && groups[0]!.bracketed;
    const one = { count: 1, unit: whole, locants: ['→'], at: range.start, range, bodyAt, bracketed };
    found.push({ substitutions: [one], cost: alkyls ? 1 : 0 });
  }
  if (base.needsLink === true) return found.length > 0 ? found : undefined;
  const located = groups.some((group) => group.locants?.some((locant) => /^\d/.test(locant)));
  const several = groups.length > 1 || groups[0]!.count > 1 || groups[0]!.locants !== undefined;
  if (!oneGroup && !located && several && groups.every(canStand)) {
    found.push({ substitutions: groups.map(onLink), cost: alkyls || !whole ? 0 : 1 });
  }
  return found.length > 0 ? found : undefined;
}

function onLink(group: GroupItem): Substitution {
  return substitution(group, group.locants ?? Array.from({ length: group.count }, () => '→'));
}

function eachRun(groups: readonly GroupItem[], nest: Nest): Grouping[] | undefined {
  const substitutions: Substitution[] = [];
  for (const run of runsOf(groups)) {
    if (run.length === 1 && canStand(run[0]!)) substitutions.push(onLink(run[0]!));
    else {
      const unit = nest(joined(run));
      if (!unit) return undefined;
      substitutions.push(compound(unit, run, ['→'], false));
    }
  }
  return [{ substitutions, cost: 0 }];
}

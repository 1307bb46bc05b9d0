/**
 * Multiplicative names (P-15.3): like units round a group with as many free valences (`4,4'-oxydianiline`), and links
 * that continue one another (`methylenebis(oxy)`, `4,1-phenyleneoxy`).
 */
import type { Ending, Joint, Locant, SuffixEntry, Unit } from '../tree.ts';
import type { GroupItem, Item } from './item.ts';

const carbon = 6;

/** Free valences of a group when it stands as a link; 0 when it has only one. */
export function valencesOf(unit: Unit): number {
  if (unit.joint) {
    const { link, count } = unit.joint;
    return valencesOf(link) + count * Math.max(valencesOf(unit.joint.unit), 1) - 2 * count;
  }
  if (unit.needsLink === true && unit.groupings.length > 0) return 0;
  if (unit.links) return unit.links.length;
  if (unit.attach) {
    const { atom, order } = unit.attach;
    const onCarbon = unit.skeletons.every((one) => one.atoms[atom]?.atomicNumber === carbon);
    return order > 1 && onCarbon ? order : 0;
  }
  const free = unit.endings.reduce((sum, { suffix, count }) => sum + count * valencesOfSuffix(suffix), 0);
  return free > 1 ? free : 0;
}

function valencesOfSuffix(suffix: SuffixEntry): number {
  return suffix.kind === 'free' ? Number(suffix.group) : suffix.radical === true ? 1 : 0;
}

/** The group with a single bond from each of its free valences: `ylidene` becomes two of `yl` at one place. */
export function asLink(unit: Unit): Unit {
  const { attach, needsLink, ...rest } = unit;
  if (unit.joint) return unit;
  if (unit.links) return needsLink === true ? withoutLinkAt(rest) : rest;
  if (attach) return { ...rest, links: Array.from({ length: attach.order }, () => attach.atom) };
  return { ...unit, endings: unit.endings.map(singleBonds) };
}

function withoutLinkAt(unit: Unit): Unit {
  const { linkAt, ...rest } = unit;
  return linkAt === undefined ? unit : rest;
}

const yl: SuffixEntry = { name: 'yl', kind: 'free', group: '1' };

function singleBonds(ending: Ending): Ending {
  const order = valencesOfSuffix(ending.suffix);
  if (ending.suffix.kind !== 'free' || order === 1) return ending;
  const locants = (ending.locants ?? ['1']).flatMap((locant) => Array.from({ length: order }, () => locant));
  return { ...ending, suffix: yl, count: ending.count * order, locants };
}

const isLink = (item: Item | undefined): item is GroupItem =>
  item?.kind === 'group' && item.role === 'radical' && valencesOf(item.unit) > 1;

/** Two links in a row made one: `ethylene` + `dioxy`. */
export function withLinksJoined(items: readonly Item[]): readonly Item[] {
  const at = items.findIndex((item, index) => {
    const next = items[index + 1];
    if (!isLink(item) || !isLink(next) || item.count > 1 || next.locants) return false;
    return next.count > 1 && next.count === valencesOf(item.unit);
  });
  if (at < 0) return items;
  const [first, second] = [items[at] as GroupItem, items[at + 1] as GroupItem];
  const made = jointOf(first, second);
  if (!made) return items;
  const { kind, role, joins, start, bodyAt } = first;
  const place = made.locants ? { locants: made.locants } : {};
  const whole: GroupItem = {
    ...{ kind, role, joins, start, bodyAt, ...place },
    unit: made.unit,
    count: 1,
    bracketed: true,
    end: second.end,
  };
  return withLinksJoined([...items.slice(0, at), whole, ...items.slice(at + 2)]);
}

/** A row of nothing but links, each bound to the one before: `ethane-1,2-diyl` + `oxy`. */
export function chainOfLinks(items: readonly Item[]): Unit | undefined {
  const row = withLinksJoined(items);
  const [first, ...rest] = row;
  if (rest.length === 0 || !isLink(first)) return undefined;
  let made = withOwnLocants(first);
  for (const item of rest) {
    if (!made.unit || made.locants || !isLink(item) || item.count > 1 || item.locants) return undefined;
    if (valencesOf(made.unit) !== 2 || valencesOf(item.unit) !== 2) return undefined;
    const joint: Joint = {
      link: asLink(made.unit),
      unit: asLink(item.unit),
      count: 1,
      groupings: [],
      stereo: [],
      at: first.start,
      range: { start: first.start, end: item.end },
    };
    made = { unit: { ...joint.unit, joint }, locants: undefined };
  }
  return made.unit;
}

/** Like units on a link; `groupings` and `stereo` are what stands before it. Undefined when the two do not fit. */
export function multiplied(
  link: Item | undefined,
  units: GroupItem,
  groupings: Joint['groupings'],
  stereo: Joint['stereo'],
): Unit | undefined {
  if (!isLink(link) || link.count > 1 || valencesOf(link.unit) !== units.count) return undefined;
  return jointOf(link, units, groupings, stereo)?.unit;
}

function jointOf(
  link: GroupItem,
  units: GroupItem,
  groupings: Joint['groupings'] = [],
  stereo: Joint['stereo'] = [],
): { unit: Unit; locants?: readonly Locant[] } | undefined {
  const own = withOwnLocants(link);
  const continues = valencesOf(units.unit) > 1;
  // Before a link that continues, locants belong to the whole: `3,4-methylenedioxy`.
  const locants = continues ? undefined : own.locants;
  if (locants && locants.length !== units.count) return undefined;
  const oneAtom = units.unit.skeletons.every((one) => one.atoms.length === 1);
  if (!locants && groupings.length > 0 && !oneAtom) return undefined;
  if (!locants && units.role === 'radical' && !continues) return undefined;
  const joint: Joint = {
    link: asLink(own.unit),
    unit: continues ? asLink(units.unit) : units.unit,
    count: units.count,
    groupings,
    stereo,
    at: link.start,
    range: { start: link.start, end: link.end },
    ...(locants ? { locants } : {}),
  };
  return {
    unit: { ...joint.unit, joint },
    ...(continues && own.locants ? { locants: own.locants } : {}),
  };
}

/** `1,4-phenylene`, `1,2-ethanediyl`: unprimed locants before a link are those of its own free valences. */
function withOwnLocants({ unit, locants }: GroupItem): {
  unit: Unit;
  locants: readonly Locant[] | undefined;
} {
  const place = unit.endings.findIndex((ending) => ending.locants === undefined && ending.count === 2);
  if (place < 0 || !locants || unit.skeletons.every((one) => one.atoms.length === 1))
    return { unit, locants };
  const meta = { o: ['1', '2'], m: ['1', '3'], p: ['1', '4'] }[locants.join()];
  const meant = meta ?? locants;
  if (meant.length !== 2 || meant.some((locant) => !/^\d+[a-z]?$/.test(locant))) return { unit, locants };
  const endings = unit.endings.map((ending, index) =>
    index === place ? { ...ending, locants: meant } : ending,
  );
  return { unit: { ...unit, endings }, locants: undefined };
}

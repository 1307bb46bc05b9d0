/**
 * Rings inside the names of larger ring systems (spiro, assemblies, bridged): `1,3-dihydroquinazoline`, `3H-indole`,
 * `4-azabicyclo[2.2.1]hept-2-ene`. What is said of hydrogen, heteroatoms and double bonds goes into the skeleton.
 */
import { ring, type SkeletonGraph } from '../build/skeleton.ts';
import { altered, type Alteration } from '../rings/altered-ring.ts';
import type { Group } from './group.ts';
import type { Lexicon } from './lexicon.ts';
import { wordsAt } from './trie.ts';
import { indicatedAt, locantsAt } from './locants.ts';

export interface RingComponent {
  readonly skeletons: readonly SkeletonGraph[];
  readonly end: number;
  /** Read from a radical: `cyclohexyl` with a free valence of 1, `fluorenylidene` of 2. */
  readonly valence?: 1 | 2;
}

/** Rings that begin at an offset. */
export type ComponentReader = (offset: number) => readonly RingComponent[];

const mostAlterations = 6;
const bracketedHydrogen = /\[(\d+[a-z]?[Hh])\]/y;

/** A reader over one text; `groups` reads what follows the prefixes. */
export function componentReader(
  text: string,
  lower: string,
  lexicon: Lexicon,
  groups: (offset: number) => readonly Group[],
): ComponentReader {
  return (offset) => read(offset, []);

  function read(offset: number, before: readonly Alteration[]): RingComponent[] {
    const found = before.length < mostAlterations ? prefixed(offset, before) : [];
    for (const group of groups(offset)) {
      const made = ringOf(group);
      const skeletons = made?.skeletons.flatMap((one) => altered(one, [...before, ...made.changes]) ?? []);
      if (made && skeletons && skeletons.length > 0)
        found.push({ skeletons, end: group.end, ...(made.valence ? { valence: made.valence } : {}) });
    }
    if (lower.startsWith('phenyl', offset) && before.length === 0)
      found.push({ skeletons: [benzene], end: offset + 6, valence: 1 });
    return found;
  }

  function prefixed(offset: number, before: readonly Alteration[]): RingComponent[] {
    const found: RingComponent[] = [];
    const then = (end: number, change: Alteration) =>
      found.push(...read(text[end] === '-' ? end + 1 : end, [...before, change]));
    bracketedHydrogen.lastIndex = offset;
    const bracketed = bracketedHydrogen.exec(text);
    if (bracketed)
      then(bracketedHydrogen.lastIndex, { kind: 'hydrogen', locants: [bracketed[1]!.slice(0, -1)] });
    const hydrogen = indicatedAt(text, offset);
    if (hydrogen) then(hydrogen.end, { kind: 'hydrogen', locants: hydrogen.value });
    const locants = locantsAt(text, offset);
    if (!locants) return found;
    const counted = wordsAt(lexicon.words, lower, locants.end).flatMap(({ value, end }) =>
      value.kind === 'multiplier' && value.count === locants.value.length ? [end] : [],
    );
    for (const at of locants.value.length === 1 ? [locants.end, ...counted] : counted) {
      for (const { value, end } of wordsAt(lexicon.words, lower, at)) {
        if (value.kind === 'hydro') then(end, { kind: 'hydrogen', locants: locants.value });
        if (value.kind === 'replacement')
          then(end, { kind: 'element', locants: locants.value, atomicNumber: value.atomicNumber });
      }
    }
    return found;
  }
}

const six = ring(6);
const benzene: SkeletonGraph = {
  ...six,
  kind: 'fixed',
  atoms: six.atoms.map((atom) => ({ ...atom, mancude: true })),
};

interface BareRing {
  readonly skeletons: readonly SkeletonGraph[];
  readonly changes: readonly Alteration[];
  readonly valence?: 1 | 2;
}

/** The rings that a group is, when it is nothing else: no side chains, no groups but one free valence. */
function ringOf({ unit, role }: Group): BareRing | undefined {
  const skeletons = unit.skeletons.filter(isRing);
  const [ending, second] = unit.endings;
  if (skeletons.length === 0 || second || unit.attach || unit.groupings.length > 0) return undefined;
  if (unit.unsaturations.some((one) => one.locants === undefined)) return undefined;
  const changes = unit.unsaturations.map((one): Alteration => ({
    kind: 'bond',
    locants: one.locants!,
    order: one.order,
  }));
  if (!ending) return role === 'parent' ? { skeletons, changes } : undefined;
  const { suffix, locants, count } = ending;
  if (suffix.kind !== 'free' || locants || count > 1 || suffix.group === '3') return undefined;
  return { skeletons, changes, valence: suffix.group === '2' ? 2 : 1 };
}

/** Every atom has two neighbours and more, so that nothing hangs on the rings. */
function isRing(skeleton: SkeletonGraph): boolean {
  const degree = skeleton.atoms.map(() => 0);
  for (const { from, to } of skeleton.bonds) {
    degree[from]!++;
    degree[to]!++;
  }
  return skeleton.stereo.length === 0 && degree.every((count) => count > 1);
}

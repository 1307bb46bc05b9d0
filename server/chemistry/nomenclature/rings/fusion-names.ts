/**
 * Fusion names (P-25.3): attached components as prefixes with the places of fusion, then the base component:
 * `pyrido[2,3-d]pyrimidine`, `dibenzo[b,e]oxepine`, `pyrido[1',2':1,2]imidazo[4,5-b]quinoxaline`,
 * `benzo[1,2-b:4,5-b']dithiophene`.
 */
import type { SkeletonGraph } from '../build/skeleton.ts';
import { fusionDescriptorAt, type Attachment } from './fusion-descriptor.ts';
import { basesAt, prefixesAt } from './fusion-components.ts';
import { FusionJoining } from './fusion-joining.ts';
import { fusionLocants } from './fusion-numbering.ts';
import { numberedSkeleton, type Component, type FusedSystem } from './fused-system.ts';
import { canonicalForm } from '../../structure/canonical-form.ts';
import { MoleculeBuilder } from '../../structure/molecule.ts';

interface Prefix {
  readonly components: readonly Component[];
  readonly count: number;
  readonly attachments: readonly Attachment[];
}

export interface FusionName {
  readonly skeletons: readonly SkeletonGraph[];
  /** Before the final e. */
  readonly end: number;
}

const multipliers: readonly (readonly [word: string, count: number])[] = [
  ['', 1],
  ['di', 2],
  ['bis', 2],
  ['tri', 3],
  ['tris', 3],
  ['tetra', 4],
];
/** Prefixes of one name, and combinations of meanings tried, at most. */
const mostPrefixes = 6;
const mostTrials = 64;
/** A numbering beside the rules is meant only where the ruled one has no place for what is written. */
const unruledNumbering = 5;

const known = new Map<string, readonly FusionName[]>();

/** Fusion names that begin at the offset. */
export function fusionNamesAt(lower: string, offset: number): readonly FusionName[] {
  if (!lower.includes('[', offset) && !lower.includes('(', offset)) return [];
  if (prefixStarts(lower, offset).length === 0) return [];
  const rest = lower.slice(offset);
  let found = known.get(rest);
  if (!found) {
    const made: FusionName[] = [];
    walk(rest, 0, [], made);
    if (known.size > 2000) known.clear();
    known.set(rest, (found = made));
  }
  return found.map(({ skeletons, end }) => ({ skeletons, end: end + offset }));
}

/** In `benzo[7]annulene` the bracket is the size of the ring, and all its sides are alike (P-25.3.4.2.1). */
const annulene = /^\[\d{1,2}\]annulen/;
const firstSide = (end: number) => ({ attachments: [{ own: [], sides: [0], other: [], copy: 0 }], end });

/** Multiplied or not, the prefixes with a descriptor after them. */
function prefixStarts(lower: string, offset: number): { prefix: Prefix; end: number }[] {
  return multipliers.flatMap(([word, count]) => {
    if (!lower.startsWith(word, offset)) return [];
    return prefixesAt(lower, offset + word.length).flatMap(({ components, end }) => {
      const descriptor = annulene.test(lower.slice(end)) ? firstSide(end) : fusionDescriptorAt(lower, end);
      if (!descriptor) return [];
      const { attachments } = descriptor;
      const places = attachments.some((one) => one.copy > 0) ? count : attachments.length;
      return places === count ? [{ prefix: { components, count, attachments }, end: descriptor.end }] : [];
    });
  });
}

function walk(lower: string, offset: number, before: readonly Prefix[], found: FusionName[]): void {
  for (const { prefix, end } of prefixStarts(lower, offset)) {
    const prefixes = [...before, prefix];
    const copies = 1 + Math.max(...prefixes.flatMap((one) => one.attachments.map(({ copy }) => copy)));
    const multiplier = multipliers.filter(([, count]) => count === copies);
    for (const [word] of multiplier) {
      if (!lower.startsWith(word, end)) continue;
      for (const base of basesAt(lower, end + word.length)) {
        const skeletons = meaning(prefixes, base.components, copies);
        if (skeletons.length > 0) found.push({ skeletons, end: base.end });
      }
    }
    if (prefixes.length < mostPrefixes) walk(lower, end, prefixes, found);
  }
}

/** The one system that the components can make, in each numbering; nothing when they can make several, or none. */
function meaning(
  prefixes: readonly Prefix[],
  bases: readonly Component[],
  copies: number,
): readonly SkeletonGraph[] {
  const distinct = new Map<string, SkeletonGraph[]>();
  let combinations: Component[][] = bases.map((base) => [base]);
  for (const { components } of prefixes)
    combinations = combinations
      .flatMap((made) => components.map((one) => [...made, one]))
      .slice(0, mostTrials);
  for (const [base, ...attached] of combinations) {
    const system = joined(prefixes, attached, base!, copies);
    if (!system) continue;
    const numberings = fusionLocants(system).map((locants, index) => ({
      ...numberedSkeleton(system, locants),
      ...(index > 0 ? { cost: unruledNumbering } : {}),
    }));
    if (numberings.length > 0) distinct.set(systemKey(system), numberings);
  }
  const [only, ...others] = distinct.values();
  return only && others.length === 0 ? only : [];
}

function joined(
  prefixes: readonly Prefix[],
  components: readonly Component[],
  base: Component,
  copies: number,
): FusedSystem | undefined {
  const joining = new FusionJoining();
  const bases = Array.from({ length: copies }, () => joining.add(base));
  // From the base outwards: a prefix of higher order is fused to the prefix after it.
  let after: number | undefined;
  for (let index = prefixes.length - 1; index >= 0; index--) {
    const { count, attachments } = prefixes[index]!;
    const parts = Array.from({ length: count }, () => joining.add(components[index]!));
    for (const [place, attachment] of attachments.entries()) {
      const goal = attachment.sides.length > 0 ? bases[attachment.copy] : after;
      if (goal === undefined || !joining.fuse(parts[Math.min(place, count - 1)]!, goal, attachment))
        return undefined;
    }
    after = count === 1 ? parts[0] : undefined;
  }
  return joining.finished();
}

function systemKey(system: FusedSystem): string {
  const builder = new MoleculeBuilder();
  for (const element of system.elements) builder.addAtom(element, { hydrogens: 0 });
  for (const { from, to } of system.bonds) builder.addBond(from, to, 1);
  return canonicalForm(builder.build(), { stereo: false }).key;
}

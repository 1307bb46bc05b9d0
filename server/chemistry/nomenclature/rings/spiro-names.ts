/**
 * Spiro systems of named rings: `spiro[1-benzofuran-2,4'-cyclohex-2-ene]`, `dispiro[…]` (P-24.4 to P-24.6), and of two
 * alike, `1,1'-spirobi[indene]` (P-24.3).
 */
import { atomAt } from '../build/skeleton-places.ts';
import type { SkeletonGraph } from '../build/skeleton.ts';
import type { ComponentReader, RingComponent } from '../words/ring-components.ts';
import { joinedRings, type Joint } from './joined-rings.ts';

interface SpiroName {
  readonly skeletons: readonly SkeletonGraph[];
  readonly end: number;
}

const opening = /(|di|tri|tetra)spiro([[(])/y;
const counts: Readonly<Record<string, number>> = { '': 1, di: 2, tri: 3, tetra: 4 };
const junction = /-(\d+[a-z]?)('*),(\d+[a-z]?)('+)-/y;
const alikeOpening = /(\d+[a-z]?),(\d+[a-z]?)'-spirobi([[(]?)/y;
/** Meanings of one name at most. */
const mostMeanings = 8;

/** Spiro names that begin at the offset. */
export function spiroNamesAt(text: string, offset: number, components: ComponentReader): SpiroName[] {
  opening.lastIndex = offset;
  const match = opening.exec(text);
  if (!match) return spirobiAt(text, offset, components);
  const close = match[2] === '[' ? ']' : ')';
  const count = counts[match[1]!]!;
  const found: SpiroName[] = [];
  walk(opening.lastIndex, [], []);
  return found;

  /** A ring, the places that it shares with the next, the next ring … */
  function walk(
    at: number,
    rings: readonly RingComponent[],
    joints: readonly (readonly [Place, Place])[],
  ): void {
    for (const ring of components(at)) {
      if (ring.valence || found.length >= mostMeanings) continue;
      const all = [...rings, ring];
      if (joints.length === count) {
        if (text[ring.end] !== close) continue;
        const skeletons = combinations(all).flatMap((one) => spiroSkeleton(one, joints) ?? []);
        if (skeletons.length > 0) found.push({ skeletons, end: ring.end + 1 });
        continue;
      }
      junction.lastIndex = ring.end;
      const join = junction.exec(text);
      if (join?.[2]!.length !== joints.length || join[4]!.length !== joints.length + 1) continue;
      const next = junction.lastIndex;
      walk(next, all, [
        ...joints,
        [
          { ring: rings.length, locant: join[1]! },
          { ring: rings.length + 1, locant: join[3]! },
        ],
      ]);
    }
  }
}

interface Place {
  readonly ring: number;
  readonly locant: string;
}

/** `1,1'-spirobi[indene]`, `9,9'-spirobifluorene`. */
function spirobiAt(text: string, offset: number, components: ComponentReader): SpiroName[] {
  alikeOpening.lastIndex = offset;
  const match = alikeOpening.exec(text);
  if (!match) return [];
  const close = match[3] === '[' ? ']' : match[3] === '(' ? ')' : '';
  const joint: readonly [Place, Place] = [
    { ring: 0, locant: match[1]! },
    { ring: 1, locant: match[2]! },
  ];
  return components(alikeOpening.lastIndex).flatMap((ring) => {
    if (ring.valence || !text.startsWith(close, ring.end)) return [];
    const skeletons = ring.skeletons.flatMap((one) => spiroSkeleton([one, one], [joint]) ?? []);
    return skeletons.length > 0 ? [{ skeletons, end: ring.end + close.length }] : [];
  });
}

function combinations(rings: readonly RingComponent[]): SkeletonGraph[][] {
  let made: SkeletonGraph[][] = [[]];
  for (const { skeletons } of rings)
    made = made.flatMap((before) => skeletons.map((one) => [...before, one])).slice(0, mostMeanings);
  return made;
}

function spiroSkeleton(
  rings: readonly SkeletonGraph[],
  joints: readonly (readonly [Place, Place])[],
): SkeletonGraph | undefined {
  const found = ({ ring, locant }: Place): Joint => ({ ring, atom: atomAt(rings[ring]!, locant) });
  const same = joints.map(([one, other]): [Joint, Joint] => [found(one), found(other)]);
  if (same.flat().some(({ atom }) => atom < 0)) return undefined;
  return joinedRings(rings, same)?.skeleton;
}

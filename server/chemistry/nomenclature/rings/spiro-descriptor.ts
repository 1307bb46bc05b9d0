/**
 * Spiro systems of single rings (P-24.2): `spiro[4.5]`, `dispiro[4.2.4^8.2^5]`. The walk starts beside a spiro atom of a
 * ring at an end; each number is the atoms on the way to the next spiro atom, which a superscript names when it is
 * reached again.
 */
import { carbonSystem, type SkeletonGraph } from '../build/skeleton.ts';
import { numericalTerm } from '../vocabulary/numbers.ts';
import type { Descriptor } from './von-baeyer.ts';

const pattern =
  /([a-z]{0,20}?)spiro(?:\[([^[\]]{3,200})\]|\(([^()]{3,200}(?:\([^()]{1,3}\)[^()]{0,200})*)\))/y;
const countsByTerm = new Map(
  Array.from({ length: 30 }, (_, index): [string, number] => [
    index === 0 ? '' : numericalTerm(index + 1),
    index + 1,
  ]),
);

interface Leg {
  readonly length: number;
  /** Number of the spiro atom at its end, when that was reached before. */
  readonly back?: number;
}

/** The descriptor at the offset, or undefined. */
export function spiroDescriptorAt(text: string, offset: number): Descriptor | undefined {
  pattern.lastIndex = offset;
  const match = pattern.exec(text);
  const count = match ? countsByTerm.get(match[1]!) : undefined;
  if (!match || count === undefined) return undefined;
  const legs = (match[2] ?? match[3]!).split(/[.,]/).map(legsOf);
  if (legs.length !== 2 * count || legs.some((options) => options.length === 0)) return undefined;
  return { end: pattern.lastIndex, skeleton: (size) => walked(legs, count, size) };
}

/** `4^8`, and in flat print `48`, which can be 48 atoms or 4 atoms to spiro atom 8. */
function legsOf(part: string): Leg[] {
  const exact = /^(\d{1,2})(?:\^|<sup>|\()+(\d{1,3})(?:<\/sup>|\))*$/.exec(part);
  if (exact) return [{ length: Number(exact[1]), back: Number(exact[2]) }];
  if (!/^\d{1,4}$/.test(part)) return [];
  const options: Leg[] = part.length < 3 ? [{ length: Number(part) }] : [];
  for (const cut of [1, 2]) {
    if (cut < part.length && part[cut] !== '0' && (cut === 1 || !part.startsWith('0')))
      options.push({ length: Number(part.slice(0, cut)), back: Number(part.slice(cut)) });
  }
  return options;
}

/** Every way of taking the legs that uses up the atoms; the skeleton when there is one way. */
function walked(
  options: readonly (readonly Leg[])[],
  count: number,
  size: number,
): SkeletonGraph | undefined {
  const found: Leg[][] = [];
  choose([], 0, []);
  const [only, other] = found;
  // P-24.2.1: the smaller of two rings comes first.
  if (!only || other || (count === 1 && only[0]!.length > only[1]!.length)) return undefined;
  return skeletonOf(only, size);

  /** `open`: spiro atoms that have been reached once, in that order. */
  function choose(legs: Leg[], used: number, open: readonly number[]): void {
    if (used > size || found.length > 1) return;
    const next = options[legs.length];
    if (!next) {
      if (open.length === 0 && used === size) found.push(legs);
      return;
    }
    for (const leg of next) {
      const end = used + leg.length;
      const last = legs.length === options.length - 1;
      const again = leg.back ?? returnsTo(legs, last);
      if (again === undefined) choose([...legs, leg], end + 1, [...open, end + 1]);
      else if (open.includes(again))
        choose(
          [...legs, { ...leg, back: again }],
          end,
          open.filter((atom) => atom !== again),
        );
    }
  }

  /** Without superscripts a way back is certain for one and two spiro atoms, and for the last leg, to the first. */
  function returnsTo(legs: readonly Leg[], last: boolean): number | undefined {
    const reached = spiroAtoms(legs);
    if (last) return reached[0];
    return count === 2 && legs.length === 2 ? reached[1] : undefined;
  }
}

function spiroAtoms(legs: readonly Leg[]): number[] {
  const atoms: number[] = [];
  let used = 0;
  for (const { length, back } of legs) {
    used += length;
    if (back === undefined) atoms.push(++used);
  }
  return atoms;
}

function skeletonOf(legs: readonly Leg[], size: number): SkeletonGraph | undefined {
  const bonds: { from: number; to: number; order: number }[] = [];
  const join = (from: number, to: number) => bonds.push({ from: from - 1, to: to - 1, order: 1 });
  let [last, used] = [spiroAtoms(legs)[0]!, 0];
  for (const { length, back } of legs) {
    for (let index = 0; index < length; index++) {
      join(last, ++used);
      last = used;
    }
    const end = back ?? ++used;
    join(last, end);
    last = end;
  }
  return carbonSystem(size, bonds);
}

/**
 * Ring assemblies (P-28): `1,1'-biphenyl`, `[2,2'-bipyridine]`, `1,1':4',1''-terphenyl`, `1,1'-bi(cyclohexane)`,
 * `9,9'-bifluorenylidene`.
 */
import { usualValences } from '../../structure/valence-model.ts';
import { atomAt } from '../build/skeleton-places.ts';
import type { SkeletonGraph } from '../build/skeleton.ts';
import type { ComponentReader, RingComponent } from '../words/ring-components.ts';
import { joinedRings } from './joined-rings.ts';

interface Assembly {
  readonly skeletons: readonly SkeletonGraph[];
  readonly end: number;
}

interface Link {
  readonly rings: readonly [number, number];
  readonly locants: readonly [string, string];
}

const counts: Readonly<Record<string, number>> = {
  bi: 2,
  ter: 3,
  quater: 4,
  quinque: 5,
  sexi: 6,
  septi: 7,
  octi: 8,
};
const pair = "\\d+[a-z]?'*,\\d+[a-z]?'+";
const located = new RegExp(
  `([[(]?)(${pair}(?:[:;]${pair})*)-?([\\])]?)-?(bi|ter|quater|quinque|sexi|septi|octi)`,
  'y',
);
const marked = /(ortho|meta|para|[omp])-(ter|quater|quinque|sexi)(?=phenyl)/y;
const places: Readonly<Record<string, string>> = { o: '2', m: '3', p: '4' };

/** Assemblies that begin at the offset, with their locants or without. */
export function ringAssembliesAt(text: string, offset: number, components: ComponentReader): Assembly[] {
  located.lastIndex = offset;
  const match = located.exec(text);
  if (match) {
    const links = match[2]!.split(/[:;]/).map(linkOf);
    const count = counts[match[4]!]!;
    if (links.length !== count - 1 || links.some((link) => Math.max(...link.rings) >= count)) return [];
    // `[1,1']biphenyl`: only the locants are in brackets; `[1,1'-biphenyl]`: all of it.
    if (match[3] !== '' && match[1] === '') return [];
    const close = match[3] !== '' || match[1] === '' ? '' : match[1] === '[' ? ']' : ')';
    return ofRings(located.lastIndex, close, (ring) => linked(ring, count, links));
  }
  marked.lastIndex = offset;
  const named = marked.exec(text);
  if (named) {
    const count = counts[named[2]!]!;
    const links = Array.from({ length: count - 1 }, (_, index): Link => ({
      rings: [index, index + 1],
      locants: [index === 0 ? '1' : places[named[1]![0]!]!, '1'],
    }));
    return ofRings(marked.lastIndex, '', (ring) => linked(ring, count, links));
  }
  return text.startsWith('bi', offset) ? ofRings(offset + 2, '', anywhere) : [];

  function ofRings(
    at: number,
    close: string,
    make: (ring: RingComponent) => readonly SkeletonGraph[],
  ): Assembly[] {
    const open = text[at];
    const inner = open === '(' ? ')' : open === '[' ? ']' : '';
    const from = inner !== '' || open === '-' ? at + 1 : at;
    return components(from).flatMap((ring) => {
      if (!text.startsWith(inner + close, ring.end)) return [];
      const skeletons = make(ring);
      return skeletons.length > 0 ? [{ skeletons, end: ring.end + inner.length + close.length }] : [];
    });
  }
}

function linkOf(text: string): Link {
  const [one, other] = text.split(',') as [string, string];
  const primes = (locant: string) => locant.length - locant.replace(/'/g, '').length;
  return {
    rings: [primes(one), primes(other)],
    locants: [one.replace(/'/g, ''), other.replace(/'/g, '')],
  };
}

/** The rings joined by the links; a double bond for `ylidene`. */
function linked(ring: RingComponent, count: number, links: readonly Link[]): SkeletonGraph[] {
  return ring.skeletons.flatMap((one) => {
    const joined = joinedRings(Array.from({ length: count }, () => one));
    if (!joined) return [];
    const bonds = [...joined.skeleton.bonds];
    for (const { rings, locants } of links) {
      const ends = locants.map((locant) => atomAt(one, locant));
      if (ends.some((atom) => atom < 0) || rings[0] === rings[1]) return [];
      const from = joined.places[rings[0]]![ends[0]!]!;
      const to = joined.places[rings[1]]![ends[1]!]!;
      bonds.push({ from, to, order: ring.valence ?? 1, delocalised: false });
    }
    return [{ ...joined.skeleton, bonds }];
  });
}

/** Without locants two rings may be joined at any two places; where all are alike there is one way. */
function anywhere(ring: RingComponent): SkeletonGraph[] {
  const [one, other] = ring.skeletons;
  if (!one || other) return [];
  const open = one.atoms.flatMap((atom, index) =>
    atom.locants.length > 0 && isOpen(one, index, ring.valence ?? 1) ? [atom.locants[0]!] : [],
  );
  const alike = one.bonds.length === one.atoms.length && one.atoms.every((atom) => atom.atomicNumber === 6);
  const pairs = alike
    ? [[open[0]!, open[0]!] as const]
    : open.flatMap((first, index) => open.slice(index).map((second) => [first, second] as const));
  return pairs.flatMap(([first, second]) => {
    const skeletons = linked(ring, 2, [{ rings: [0, 1], locants: [first, second] }]);
    return pairs.length === 1
      ? skeletons
      : skeletons.map((made) => ({ ...made, mark: `${first},${second}'-` }));
  });
}

function isOpen(ring: SkeletonGraph, atom: number, order: number): boolean {
  const { atomicNumber, charge, mancude } = ring.atoms[atom]!;
  const used = ring.bonds.reduce(
    (sum, bond) => sum + (bond.from === atom || bond.to === atom ? bond.order : 0),
    0,
  );
  const double = mancude && !ring.indicated.includes(atom) ? 1 : 0;
  return (usualValences(atomicNumber, charge)?.[0] ?? 0) - used - double >= order;
}

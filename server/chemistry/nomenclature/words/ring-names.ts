/** Ring names made by rule, one reader for each kind; the only place where they are called from. */
import type { SkeletonAtom, SkeletonGraph } from '../build/skeleton.ts';
import { bridgedFusedAt } from '../rings/bridged-fused.ts';
import { fusionNamesAt } from '../rings/fusion-names.ts';
import { hantzschWidmanAt } from '../rings/hantzsch-widman.ts';
import { ringAssembliesAt } from '../rings/ring-assemblies.ts';
import { spiroNamesAt } from '../rings/spiro-names.ts';
import { locantsAt, withBonding } from './locants.ts';
import type { ComponentReader } from './ring-components.ts';

export interface RingName {
  readonly skeletons: readonly SkeletonGraph[];
  /** Before the final e, where there is one. */
  readonly end: number;
}

type RingNameReader = (
  text: string,
  lower: string,
  offset: number,
  components: ComponentReader,
) => readonly RingName[];

const readers: readonly RingNameReader[] = [
  // P-22.2.2 and P-25.2.2.4
  hantzschWidmanAt,
  // P-25.3
  (_, lower, offset) => fusionNamesAt(lower, offset),
  // P-24.3 to P-24.6
  (_, lower, offset, components) => spiroNamesAt(lower, offset, components),
  // P-25.4
  (_, lower, offset, components) => bridgedFusedAt(lower, offset, components),
  // P-28
  (_, lower, offset, components) => ringAssembliesAt(lower, offset, components),
];

/** Ring names by rule that begin at the offset; `components` reads rings inside them. */
export function ringNameAt(
  text: string,
  lower: string,
  offset: number,
  components: ComponentReader,
): RingName[] {
  const locants = text.includes('λ') ? locantsAt(text, offset) : undefined;
  const bonding = locants?.value.map(withBonding).filter((one) => one.bonds !== undefined) ?? [];
  if (!locants || bonding.length === 0)
    return readers.flatMap((read) => read(text, lower, offset, components));
  const plain = `${locants.value.map((one) => withBonding(one).locant).join(',')}-`;
  const [bare, bareLower] = [text, lower].map((one) => plain + one.slice(locants.end));
  const moved = locants.end - plain.length;
  const inside: ComponentReader = (at) =>
    components(at + moved).map((ring) => ({ ...ring, end: ring.end - moved }));
  return readers.flatMap((read) =>
    read(bare!, bareLower!, 0, inside)
      .filter(({ end }) => end > plain.length)
      .map(({ skeletons, end }) => ({
        skeletons: skeletons.map((one) => bonded(one, bonding)),
        end: end + moved,
      })),
  );
}

/** The ring with the bonding numbers of its locants: `1λ6,2,4-benzothiadiazine` (P-22.2.2.1.1). */
function bonded(
  skeleton: SkeletonGraph,
  bonding: readonly { readonly locant: string; readonly bonds?: number }[],
): SkeletonGraph {
  const isMancude = skeleton.atoms.some((atom) => atom.mancude);
  const atoms = skeleton.atoms.map((atom): SkeletonAtom => {
    const bonds = bonding.find(({ locant }) => atom.locants.includes(locant))?.bonds;
    return bonds === undefined || atom.atomicNumber === 6 ? atom : { ...atom, bonds, mancude: isMancude };
  });
  return { ...skeleton, atoms };
}

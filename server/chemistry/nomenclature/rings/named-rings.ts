/** Rings of the vocabulary by name, each read and numbered when first asked for. */
import { ringBasis } from '../../structure/ring-basis.ts';
import { skeletonFromSmiles, type SkeletonGraph } from '../build/skeleton.ts';
import { benzenoids } from '../vocabulary/benzenoids.ts';
import { bridgedRings, cages } from '../vocabulary/cages.ts';
import { phenanthrolines, rings, type RingLine } from '../vocabulary/rings.ts';
import { numberedSkeleton, type FusedSystem } from './fused-system.ts';
import { fusionLocants } from './fusion-numbering.ts';
import { honeycomb } from './honeycomb.ts';
import { descriptorAt } from './von-baeyer.ts';

const makers = new Map<string, () => SkeletonGraph | undefined>();
for (const line of [...rings, ...phenanthrolines, ...bridgedRings]) makers.set(line[0], () => fromLine(line));
for (const [name, cells] of benzenoids) makers.set(name, () => numbered(honeycomb(cells)));
for (const [name, descriptor, size] of cages)
  makers.set(name, () => descriptorAt(descriptor, 0)?.skeleton(size));

/** Every name, without its final e. */
export const ringNames: readonly string[] = [...makers.keys()];

const made = new Map<string, SkeletonGraph | undefined>();

/** The ring with this name, its final e left out; undefined for a name that is not in the vocabulary. */
export function namedRing(name: string): SkeletonGraph | undefined {
  const maker = made.has(name) ? undefined : makers.get(name);
  if (maker) made.set(name, maker());
  return made.get(name);
}

function fromLine([, smiles, locants, mancude, indicated]: RingLine): SkeletonGraph | undefined {
  if (locants !== 'rule') return skeletonFromSmiles(smiles, locants, mancude === 'm', indicated);
  const drawn = skeletonFromSmiles(smiles);
  if (!drawn) return undefined;
  const elements = drawn.atoms.map((atom) => atom.atomicNumber);
  const skeleton = numbered({
    elements,
    bonds: drawn.bonds,
    rings: ringBasis({ size: elements.length, bonds: drawn.bonds }),
  });
  const saturated = (indicated ?? '').split(' ');
  return skeleton && { ...skeleton, indicated: indicatedIn(skeleton, saturated) };
}

function indicatedIn(skeleton: SkeletonGraph, locants: readonly string[]): number[] {
  return skeleton.atoms.flatMap((atom, index) => (locants.includes(atom.locants[0] ?? '-') ? [index] : []));
}

/** Numbered by P-25.3.1.3, with all its double bonds. */
function numbered(system: FusedSystem): SkeletonGraph | undefined {
  const [locants] = fusionLocants(system);
  return locants && numberedSkeleton(system, locants);
}

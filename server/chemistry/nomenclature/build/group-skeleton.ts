/** Skeletons of characteristic groups; the few there are, each read once. */
import { suffixes } from '../vocabulary/suffixes.ts';
import { skeletonFromSmiles, type SkeletonGraph } from './skeleton.ts';

const single: SkeletonGraph = { kind: 'fixed', atoms: [], bonds: [], indicated: [], stereo: [] };

const known: ReadonlyMap<string, SkeletonGraph> = new Map(
  [...suffixes.filter((one) => one.kind !== 'free').map((one) => one.group), '=O NO', '#N', '=O OO'].flatMap(
    (group) =>
      group.split(' ').map((piece) => {
        const smiles = piece.replace(/^[=#]/, '');
        return [smiles, skeletonFromSmiles(smiles) ?? single] as const;
      }),
  ),
);

export function groupSkeleton(smiles: string): SkeletonGraph {
  return known.get(smiles) ?? skeletonFromSmiles(smiles) ?? single;
}

/** Skeletons of groups whose place of attachment has an arrangement of its own. */
import { skeletonFromSmiles, type SkeletonGraph } from './skeleton.ts';

/** Stands among the ligands of a stereocentre for what the group will be bound to. */
export const OPEN_LIGAND = -2;

/** A group from a SMILES that begins with `*`, what the first atom after it is bound to. */
export function openSkeleton(smiles: string, locants: string): SkeletonGraph | undefined {
  const closed = skeletonFromSmiles(smiles, locants === '' ? '' : `- ${locants}`);
  if (!closed) return undefined;
  const moved = (atom: number) => (atom > 0 ? atom - 1 : atom === 0 ? OPEN_LIGAND : atom);
  return {
    ...closed,
    atoms: closed.atoms.slice(1),
    bonds: closed.bonds
      .filter(({ from, to }) => from !== 0 && to !== 0)
      .map((bond) => ({ ...bond, from: bond.from - 1, to: bond.to - 1 })),
    stereo: closed.stereo.map((element) => {
      const ligands = element.ligands.map(moved) as unknown as never;
      return element.kind === 'double-bond' || element.kind === 'axis'
        ? { ...element, ends: [moved(element.ends[0]), moved(element.ends[1])] as const, ligands }
        : { ...element, centre: moved(element.centre), ligands };
    }),
  };
}

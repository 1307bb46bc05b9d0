/** `exo` and `endo` (P-31.1.4.2.4 note, rule of 1979): towards the bridge of a bicycle, or away from it. */
import { onSameSideOfRing } from '../structure/assign-descriptors.ts';
import type { Molecule } from '../structure/molecule.ts';

/**
 * Whether the group at a centre of bicyclo[2.2.1]heptane, or one with hetero atoms in its place, points to the bridge of
 * one atom; undefined when the centre is not of that kind.
 */
export function pointsToBridge(
  molecule: Molecule,
  centre: number,
): ((isomer: Molecule) => boolean | undefined) | undefined {
  const next = (atom: number) => molecule.neighbours[atom]!.map((one) => one.atom);
  for (const head of next(centre)) {
    for (const bridge of next(head)) {
      if (bridge === centre) continue;
      for (const other of next(bridge)) {
        if (other === head) continue;
        const near = next(centre).find((atom) => atom !== head && next(atom).includes(other));
        const far = pathOfTwo(head, other, [centre, bridge, near ?? -1]);
        if (near === undefined || !far) continue;
        const ring = [head, centre, near, other, far[1], far[0]];
        const [ligand, ...more] = next(centre).filter((atom) => !ring.includes(atom));
        if (ligand === undefined || more.length > 0) return undefined;
        return (isomer) =>
          onSameSideOfRing(isomer, ring, { centre, ligand }, { centre: head, ligand: bridge });
      }
    }
  }
  return undefined;

  /** Two atoms that lead from one bridgehead to the other beside those given. */
  function pathOfTwo(from: number, to: number, beside: readonly number[]): [number, number] | undefined {
    for (const first of next(from)) {
      if (beside.includes(first)) continue;
      const second = next(first).find((atom) => atom !== from && next(atom).includes(to));
      if (second !== undefined && second !== to && !beside.includes(second)) return [first, second];
    }
    return undefined;
  }
}

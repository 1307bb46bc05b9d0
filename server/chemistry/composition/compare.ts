/** Comparing compositions atom by atom. */
import type { Composition } from './composition.ts';

/** Half of the smallest fraction of an atom that a solvate formula states. */
const negligible = 0.005;

/** Where they differ: kind of atom with `first − second`, charge left aside. Empty when they agree. */
export function compositionDifference(first: Composition, second: Composition): Map<string, number> {
  const difference = new Map<string, number>();
  for (const kind of new Set([...first.counts.keys(), ...second.counts.keys()])) {
    const delta = (first.counts.get(kind) ?? 0) - (second.counts.get(kind) ?? 0);
    if (Math.abs(delta) > negligible) difference.set(kind, delta);
  }
  return difference;
}

/** Same atoms and same charge. */
export function equalCompositions(first: Composition, second: Composition): boolean {
  return first.charge === second.charge && compositionDifference(first, second).size === 0;
}

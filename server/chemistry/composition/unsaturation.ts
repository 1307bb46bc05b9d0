/** Rings and multiple bonds that a formula implies, and formulas that no closed-shell compound can have. */
import type { Composition } from './composition.ts';
import { partsOfKind } from './mass.ts';

/** Usual valence by element, and the highest at which the element still counts electrons in pairs. */
const valences: Readonly<Record<string, readonly [usual: number, highest: number]>> = {
  H: [1, 1],
  B: [3, 3],
  C: [4, 4],
  N: [3, 5],
  O: [2, 2],
  F: [1, 1],
  Si: [4, 4],
  P: [3, 5],
  S: [2, 6],
  Cl: [1, 7],
  Br: [1, 7],
  I: [1, 7],
  Ge: [4, 4],
  As: [3, 5],
  Se: [2, 6],
  Te: [2, 6],
};

function unsaturationWith(composition: Composition, column: 0 | 1): number | undefined {
  // A positive charge stands for a proton taken up, a negative one for a proton lost.
  let doubled = 2 + composition.charge;
  for (const [kind, count] of composition.counts) {
    const valence = valences[partsOfKind(kind).symbol];
    if (valence === undefined) return undefined;
    doubled += count * (valence[column] - 2);
  }
  return doubled / 2;
}

/**
 * Degree of unsaturation (rings plus double bonds) with usual valences: benzene 4. Undefined when the formula holds an
 * element without a usual valence, such as a metal.
 */
export function degreeOfUnsaturation(composition: Composition): number | undefined {
  return unsaturationWith(composition, 0);
}

export type Impossibility = 'odd electron count' | 'too many hydrogens';

/**
 * Why no stable organic compound has this composition, or undefined. Judged only for compounds of carbon made of main
 * group elements with whole numbers of atoms, so that metals, NO2, ClO2 and solvates are never called impossible;
 * nitrogen is given five bonds here, so that ammonium salts written in one formula pass.
 */
export function impossibility(composition: Composition): Impossibility | undefined {
  const { counts } = composition;
  if (![...counts.keys()].some((kind) => partsOfKind(kind).symbol === 'C')) return undefined;
  if ([...counts.values()].some((count) => !Number.isInteger(count))) return undefined;
  const usual = unsaturationWith(composition, 0);
  const most = unsaturationWith(composition, 1);
  if (usual === undefined || most === undefined) return undefined;
  if (most < 0) return 'too many hydrogens';
  return Number.isInteger(usual) ? undefined : 'odd electron count';
}

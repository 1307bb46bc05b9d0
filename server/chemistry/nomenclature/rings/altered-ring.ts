/** A ring's skeleton with hydrogen, heteroatoms and double bonds put in where a name says so. */
import type { SkeletonGraph } from '../build/skeleton.ts';
import { atomAt, bondAt } from '../build/skeleton-places.ts';
import type { Locant } from '../tree.ts';
import { chalcogens } from './mancude.ts';

export type Alteration =
  | { readonly kind: 'hydrogen'; readonly locants: readonly Locant[] }
  | { readonly kind: 'element'; readonly locants: readonly Locant[]; readonly atomicNumber: number }
  | { readonly kind: 'bond'; readonly locants: readonly Locant[]; readonly order: 2 | 3 };

/** The altered skeleton; undefined when a place is missing or cannot take what is asked of it. */
export function altered(skeleton: SkeletonGraph, changes: readonly Alteration[]): SkeletonGraph | undefined {
  let made: SkeletonGraph | undefined = skeleton;
  for (const change of changes) made = made && one(made, change);
  return made;
}

function one(skeleton: SkeletonGraph, change: Alteration): SkeletonGraph | undefined {
  const atoms = [...skeleton.atoms];
  const bonds = [...skeleton.bonds];
  for (const locant of change.locants) {
    if (change.kind === 'bond') {
      const index = bondAt(skeleton, locant.replace(/'/g, ''));
      if (index === undefined || bonds[index]!.order > 1) return undefined;
      bonds[index] = { ...bonds[index]!, order: change.order };
      continue;
    }
    const index = atomAt(skeleton, locant.replace(/'+$/, ''));
    const atom = atoms[index];
    if (!atom) return undefined;
    if (change.kind === 'hydrogen') {
      if (!atom.mancude) return undefined;
      atoms[index] = { ...atom, mancude: false };
    } else {
      if (atom.atomicNumber !== 6) return undefined;
      const { atomicNumber } = change;
      atoms[index] = { ...atom, atomicNumber, mancude: atom.mancude && !chalcogens.has(atomicNumber) };
    }
  }
  return { ...skeleton, atoms, bonds };
}

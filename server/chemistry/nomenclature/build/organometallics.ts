/** Metals with groups on them and then halides, hydrides or acids: `ethylmagnesium bromide`, `dibutyltin diacetate` (P-69.2). */
import { functionWords } from '../vocabulary/functions.ts';
import type { Unit } from '../tree.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import type { FunctionWord } from './functional-class.ts';
import { addSmiles, buildWord, join, type Word } from './words.ts';

/** Whether a word is a metal of known number of bonds with groups on it. */
export function isOrganometallic(unit: Unit): boolean {
  const [atom, ...others] = unit.skeletons[0]?.atoms ?? [];
  return others.length === 0 && (atom?.metal?.length ?? 0) > 0 && unit.groupings.length > 0;
}

/** Binds what follows to the metal; false when the metal's bonds are not filled by it. */
export function buildOrganometallic(
  metal: Word,
  rest: { readonly functional?: FunctionWord | undefined; readonly acid?: Word | undefined },
  draft: Draft,
  choices: Choices,
): boolean {
  const built = buildWord(metal.unit, draft, choices);
  const atom = built?.places.atoms[0];
  if (atom === undefined || metal.count > 1) return false;
  const { functional, acid } = rest;
  if (functional) {
    const [, group, sites, anion] = functionWords[functional.index]!;
    if (anion === '' || sites.length > 1) return false;
    for (let copy = 0; copy < (functional.count ?? 1); copy++) {
      const ligand = addSmiles(group === '' ? '[H]' : group, draft)[0]!;
      draft.settleCapacity(ligand, undefined, 1);
      if (!join(draft, ligand, { atom, order: 1 })) return false;
    }
    return true;
  }
  for (let copy = 0; copy < (acid?.count ?? 0); copy++) {
    const [site, ...more] = buildWord(acid!.unit, draft, choices, acid!.count)?.sites ?? [];
    if (site === undefined || more.length > 0 || !join(draft, site, { atom, order: 1 })) return false;
  }
  return true;
}

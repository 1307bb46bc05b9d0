/** Oxides of amines (P-62.5). */
import type { BuiltUnit } from './built-unit.ts';
import type { Draft } from './draft.ts';
import { addSmiles } from './words.ts';

/** P-62.5: the oxide of a tertiary amine or pyridine; the nitrogen must be the only one that can bear it. */
export function oxidise(parent: BuiltUnit, count: number, draft: Draft): boolean {
  const nitrogens = draft.atoms.flatMap((atom, index) =>
    atom.atomicNumber === 7 &&
    atom.charge === 0 &&
    (draft.free(index) === 0 ||
      (atom.mancude && !atom.saturated && draft.free(index) === 1 && !draft.usualHydrogen.includes(index)))
      ? [index]
      : [],
  );
  if (nitrogens.length !== count || parent.places.atoms.length === 0) return false;
  for (const nitrogen of nitrogens) {
    draft.atoms[nitrogen]!.charge = 1;
    draft.atoms[nitrogen]!.capacity++;
    const [oxygen] = addSmiles('[O-]', draft);
    draft.atoms[oxygen!]!.capacity = 1;
    draft.bond(nitrogen, oxygen!, 1);
  }
  return true;
}

/** Charges named by endings: `ium`, `ylium`, `ide`, `uide` (P-72.2.2.1, P-73.1, P-73.2). */
import type { Ending } from '../tree.ts';
import { noSuchPlace, type BuiltUnit } from './built-unit.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';

/** Charges the atoms of the ending; false when the name does not say which, or an atom cannot bear it. */
export function placeCharge(ending: Ending, built: BuiltUnit, draft: Draft, choices: Choices): boolean {
  const [charge, bonds] = ending.suffix.group.split(' ').map(Number) as [number, number];
  const atoms = ending.locants
    ? ending.locants.map((locant) => built.places.at(locant))
    : unsaid(ending, built, draft, choices);
  for (const [index, atom] of atoms.entries()) {
    const own = atom === undefined ? undefined : draft.atoms[atom];
    if (atom === undefined || !own) {
      draft.fail(ending.range, noSuchPlace(ending.locants?.[index] ?? ending.suffix.name));
      return false;
    }
    if (draft.free(atom) + bonds < 0 || (bonds > 0 && charge > 0 && own.atomicNumber === 6)) {
      draft.fail(ending.range, 'The atom cannot bear this charge. Check the locants.');
      return false;
    }
    own.charge += charge;
    own.capacity += bonds;
  }
  built.places.fresh = false;
  return atoms.length === ending.count;
}

/** `azanide`, `pyridinium`, `imidazolium`: the only atom, or a heteroatom that takes up a hydron (1979 rules C-82). */
function unsaid(ending: Ending, built: BuiltUnit, draft: Draft, choices: Choices): readonly number[] {
  const { places } = built;
  if (ending.count > 1) return [];
  if (places.atoms.length === 1) return places.atoms;
  if (ending.suffix.name !== 'ium') return [];
  const heteroatoms = places.atoms.filter((atom) => draft.atoms[atom]!.atomicNumber !== 6);
  const nitrogens = heteroatoms.filter((atom) => bearsHydron(atom, draft));
  const options = nitrogens.length > 0 ? nitrogens : heteroatoms;
  if (options.length === 0) return [];
  const atom = options[choices.pick(options.length)]!;
  if (options.length > 1) draft.insert(ending.at, `-${places.locantOf(atom) ?? '?'}-`);
  // `N-methylpyridinium`
  else if (draft.atoms[atom]!.atomicNumber === 7) places.name('N', atom);
  return [atom];
}

/** Nitrogen with its lone pair free: not the NH of imidazole. */
function bearsHydron(atom: number, draft: Draft): boolean {
  const own = draft.atoms[atom]!;
  return own.atomicNumber === 7 && !(own.mancude && (own.saturated || draft.usualHydrogen.includes(atom)));
}

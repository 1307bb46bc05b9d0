/** Double and triple bonds named by `ene` and `yne` (P-31.1.4.2.4). */
import type { Locant, Unit } from '../tree.ts';
import { noSuchPlace } from './built-unit.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import type { Places } from './places.ts';
import { atomAt, bondAt } from './skeleton-places.ts';

export function placeUnsaturations(unit: Unit, places: Places, draft: Draft, choices: Choices): boolean {
  for (const { order, count, locants, at, range } of unit.unsaturations) {
    if (locants) {
      for (const locant of locants) {
        const { from, to } = endsOf(places, locant);
        if (from === undefined || to === undefined) {
          draft.fail(range, noSuchPlace(locant));
          return false;
        }
        if (!raise(draft, from, to, order)) {
          draft.fail(
            range,
            `A multiple bond at position ${locant} leaves an atom with too many bonds. Check the locants.`,
          );
          return false;
        }
        places.cite(1, true, from, to);
      }
      places.fresh = false;
      continue;
    }
    if (places.atoms.length === 2 && count === 1) {
      if (!raise(draft, places.atoms[0]!, places.atoms[1]!, order)) return false;
      continue;
    }
    const chosen: Locant[] = [];
    let from = 0;
    for (let index = 0; index < count; index++) {
      // On a bare ring the first double bond is at position 1.
      const options = bondsOf(places, draft, order).filter(
        (bond) => bond.position >= from && mayFollow(draft, bond, places, count),
      );
      const first =
        index === 0 && places.alike && unit.endings.every((ending) => ending.locants !== undefined);
      const only = first ? options.slice(0, 1) : options;
      if (only.length === 0) return false;
      const bond = only[choices.pick(only.length)]!;
      raise(draft, bond.from, bond.to, order);
      places.cite(1, false, bond.from, bond.to);
      places.fresh = false;
      from = bond.position + 1;
      chosen.push(places.locantOf(bond.from)!);
    }
    draft.insert(at, `-${chosen.join(',')}-`);
    places.opened ||= count > 1 || !places.alike;
  }
  return true;
}

/** The atoms of the bond that a locant means, its own first. */
function endsOf(places: Places, locant: Locant): { from?: number; to?: number } {
  const index = bondAt(places.skeleton, locant);
  if (index === undefined) return {};
  const { from, to } = places.skeleton.bonds[index]!;
  const own = atomAt(places.skeleton, locant.replace(/\(.*/, ''));
  return { from: places.atoms[own]!, to: places.atoms[own === from ? to : from]! };
}

function raise(draft: Draft, from: number, to: number, order: number): boolean {
  const bond = draft.neighbours[from]!.find((one) => one.atom === to)?.bond;
  if (bond === undefined || draft.bonds[bond]!.order !== 1) return false;
  if (draft.free(from) < order - 1 || draft.free(to) < order - 1) return false;
  draft.bonds[bond]!.order = order;
  return true;
}

function bondsOf(
  places: Places,
  draft: Draft,
  order: number,
): { from: number; to: number; position: number }[] {
  const found: { from: number; to: number; position: number }[] = [];
  places.atoms.forEach((from, position) => {
    const locant = places.locantOf(from);
    const to = locant === undefined ? undefined : endsOf(places, locant).to;
    if (to === undefined || draft.free(from) < order - 1 || draft.free(to) < order - 1) return;
    const bond = draft.neighbours[from]!.find((one) => one.atom === to)!.bond;
    if (draft.bonds[bond]!.order === 1) found.push({ from, to, position });
  });
  return found;
}

/**
 * Multiple bonds side by side are meant only along a chain: small rings hold none, and beside C=O it would be a ketene.
 * `butadiene` by itself is the 1,3 compound (common practice, no source); `pentadiene` is any of four. Three and more that
 * touch each other are never left without locants.
 */
function mayFollow(draft: Draft, bond: { from: number; to: number }, places: Places, count: number): boolean {
  const beside = [bond.from, bond.to].flatMap((atom) =>
    draft.neighbours[atom]!.filter((one) => draft.bonds[one.bond]!.order > 1),
  );
  if (places.skeleton.kind !== 'chain' || places.atoms.length < 5 || count > 2) return beside.length === 0;
  return beside.every(({ atom }) => places.atoms.includes(atom));
}

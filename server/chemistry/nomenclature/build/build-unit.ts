/** Builds one unit of the tree, and everything that hangs on it, into the draft. */
import type { Ending, Locant, Substitution, Unit } from '../tree.ts';
import { noSuchPlace, type BuiltUnit } from './built-unit.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { placeEnding } from './endings.ts';
import { Places } from './places.ts';
import { placeSubstitution } from './substitutions.ts';
import { placeUnsaturations } from './unsaturations.ts';

/** The unit's atoms are added; undefined when the name asks for something that cannot be, which `draft.failure` says. */
export function buildUnit(unit: Unit, draft: Draft, choices: Choices): BuiltUnit | undefined {
  const skeleton = unit.skeletons[choices.pick(unit.skeletons.length)]!;
  if (unit.skeletons.length > 1 && skeleton.mark !== undefined) {
    draft.insert(unit.parentAt, skeleton.mark);
  }
  draft.cost += skeleton.cost ?? 0;
  const atoms = draft.addSkeleton(skeleton, unit.range);
  const places = new Places(skeleton, atoms, unit, draft);
  const built: BuiltUnit = { places, free: [], sites: [] };
  if (unit.attach) {
    const atom = atoms[unit.attach.atom]!;
    built.free.push({ atom, order: unit.attach.order });
    const link = unit.linkAt === undefined ? -1 : atoms[unit.linkAt]!;
    const joined = unit.needsLink === true && link === atom ? 1 : 0;
    // An atom written in brackets says what it has; its free valence comes on top.
    if (skeleton.atoms[unit.attach.atom]!.hydrogens !== undefined)
      draft.atoms[atom]!.capacity += unit.attach.order + joined;
    else if (!draft.atoms[atom]!.mancude) draft.settleCapacity(atom, undefined, unit.attach.order + joined);
    if (unit.needsLink === true && link >= 0 && link !== atom) draft.settleCapacity(link, undefined, 1);
  }
  skeleton.atoms.forEach((atom, index) => {
    if (atom.locants.includes('@')) built.sites.push(atoms[index]!);
  });
  for (const { atomicNumber, locants, range } of unit.replacements) {
    for (const locant of locants) {
      const atom = places.at(locant);
      if (atom === undefined) return draft.fail(range, noSuchPlace(locant));
      draft.atoms[atom]!.atomicNumber = atomicNumber;
      if (atomicNumber !== 7 && atomicNumber !== 5 && atomicNumber !== 15 && atomicNumber !== 14)
        draft.atoms[atom]!.mancude = false;
      draft.settleCapacity(atom);
    }
  }
  if (!saturate(unit, places, draft, choices)) return undefined;
  const endings = [...unit.endings].sort((first, second) => rank(first) - rank(second));
  for (const ending of endings) if (!placeEnding(ending, built, draft, choices)) return undefined;
  if (!placeUnsaturations(unit, places, draft, choices)) return undefined;
  let substitutions = 0;
  let used: Substitution | undefined;
  for (const ways of unit.groupings) {
    const way = ways[choices.pick(ways.length)]!;
    draft.cost += way.cost;
    for (const substitution of way.substitutions) {
      substitutions += substitution.count;
      used = substitution;
      if (substitution.bracketAt !== undefined) {
        draft.brackets.push({
          at: substitution.bracketAt,
          end: substitution.range.end,
          depth: draft.owner.depth + 1,
        });
      }
      if (!placeSubstitution(substitution, unit, built, draft, choices, buildUnit)) return undefined;
    }
  }
  // A single group on a ring whose places are all alike needs no locant, and one other than 1 is not about the ring.
  if (
    substitutions === 1 &&
    places.alike &&
    unit.attach === undefined &&
    unit.endings.length + unit.unsaturations.length === 0
  ) {
    for (const inserted of places.inserted) draft.insertions.splice(draft.insertions.indexOf(inserted), 1);
    if (used?.locants !== undefined && used.locants[0] !== '1') draft.cost += 3;
  }
  for (const word of unit.stereo) {
    if (word.locant === undefined) draft.loose.push({ atoms, word });
    else {
      const atom = places.at(word.locant);
      if (atom === undefined) return draft.fail(word.range, noSuchPlace(word.locant));
      draft.wanted.push({ atom, word });
    }
  }
  if (skeleton.kind === 'chain') {
    const principal = [...places.principal, ...built.free.map(({ atom }) => atom)].filter((atom) =>
      atoms.includes(atom),
    );
    draft.chains.push({
      atoms: atoms.filter((atom) => draft.atoms[atom]!.atomicNumber === 6),
      principal,
      open: places.opened,
      plain:
        draft.owner.depth === 0 &&
        built.free.length === 0 &&
        unit.unsaturations.length === 0 &&
        unit.replacements.length === 0,
      range: unit.range,
    });
  }
  return built;
}

const rank = (ending: Ending) => (ending.suffix.kind === 'at' ? 0 : ending.locants ? 1 : 2);

/** Hydro prefixes (P-31.1.4.2.4) and indicated hydrogen (P-31.1.4.2.1) take atoms out of the ring's double bonds. */
function saturate(unit: Unit, places: Places, draft: Draft, choices: Choices): boolean {
  for (const locant of [...unit.indicated, ...unit.endings.flatMap((ending) => ending.addedHydrogen ?? [])]) {
    const atom = places.at(locant);
    if (atom === undefined) {
      draft.fail(unit.range, noSuchPlace(locant));
      return false;
    }
    draft.atoms[atom]!.saturated = true;
  }
  for (const { locants, count, at, range } of unit.hydro) {
    const ring = places.atoms.filter((atom) => draft.atoms[atom]!.mancude && !draft.atoms[atom]!.saturated);
    if (locants) {
      for (const locant of locants) {
        const atom = places.at(locant);
        if (atom === undefined || !draft.atoms[atom]!.mancude) {
          draft.fail(range, noSuchPlace(locant));
          return false;
        }
        draft.atoms[atom]!.saturated = true;
      }
      continue;
    }
    if (count > ring.length || count % 2 === 1) {
      draft.fail(range, 'The ring has not so many double bonds that could take up this hydrogen.');
      return false;
    }
    const chosen: Locant[] = [];
    if (count >= ring.length - 1)
      for (const atom of ring.filter((one) => places.locantOf(one) !== undefined || count === ring.length))
        draft.atoms[atom]!.saturated = true;
    else {
      let from = 0;
      for (let index = 0; index < count; index++) {
        const options = ring.slice(from, ring.length - (count - index - 1));
        const which = choices.pick(options.length);
        from += which + 1;
        draft.atoms[options[which]!]!.saturated = true;
        chosen.push(places.locantOf(options[which]!) ?? '?');
      }
      draft.insert(at, `${chosen.join(',')}-`);
      places.opened = true;
    }
  }
  return true;
}

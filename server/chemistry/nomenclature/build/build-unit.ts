/** Builds one unit of the tree, and everything that hangs on it, into the draft. */
import type { Ending, Locant, Substitution, Unit } from '../tree.ts';
import { noSuchPlace, type BuiltUnit } from './built-unit.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { placeEnding } from './endings.ts';
import { buildJoint } from './joints.ts';
import { properNumbering } from './numbering.ts';
import { Places } from './places.ts';
import { placeBonding, placeReplacement } from './replacements.ts';
import { placeSideChains } from './side-chains.ts';
import { inSeries, isBothEnantiomers, isSeriesWord, isSign } from './series.ts';
import type { SkeletonGraph } from './skeleton.ts';
import { placeSubstitution } from './substitutions.ts';
import { precedes } from '../rings/fused-system.ts';
import { placeUnsaturations } from './unsaturations.ts';

/** The unit's atoms are added; undefined when the name asks for something that cannot be, which `draft.failure` says. */
export function buildUnit(unit: Unit, draft: Draft, choices: Choices): BuiltUnit | undefined {
  if (unit.joint) return buildJoint(unit.joint, draft, choices, buildUnit);
  const skeleton = inSeries(unit.skeletons[choices.pick(unit.skeletons.length)]!, unit.stereo);
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
  if (!unit.attach && unit.links) freeLinks(unit.links, skeleton, built, draft);
  skeleton.atoms.forEach((atom, index) => {
    if (atom.locants.includes('@')) built.sites.push(atoms[index]!);
  });
  for (const replacement of unit.replacements)
    if (!placeReplacement(replacement, places, draft)) return undefined;
  if (!placeBonding(unit, places, draft)) return undefined;
  if (!saturate(unit, places, draft, choices)) return undefined;
  const endings = [...unit.endings].sort((first, second) => rank(first) - rank(second));
  for (const ending of endings) if (!placeEnding(ending, built, draft, choices)) return undefined;
  if (unit.sideChain && !placeSideChains(unit.sideChain, built, draft, choices, buildUnit)) return undefined;
  if (!placeUnsaturations(unit, places, draft, choices)) return undefined;
  let substitutions = 0;
  let used: Substitution | undefined;
  const chosen = substitutionsOf(unit, draft, choices);
  places.fresh &&= !chosen.some(hasNumbers);
  for (const substitution of chosen) {
    substitutions += substitution.count;
    used = substitution;
    if (!placeSubstitution(substitution, unit, built, draft, choices, buildUnit)) return undefined;
  }
  // A single group on a ring whose places are all alike needs no locant; one that is written is hardly about the ring.
  if (
    substitutions === 1 &&
    places.alike &&
    unit.attach === undefined &&
    unit.sideChain === undefined &&
    unit.endings.length + unit.unsaturations.length === 0
  ) {
    for (const inserted of places.inserted) draft.insertions.splice(draft.insertions.indexOf(inserted), 1);
    if (used?.locants !== undefined) draft.cost += used.locants[0] === '1' ? 1 : 3;
  }
  // Nobody leaves out the locant of a group that takes its atom out of an aromatic ring.
  const sibling = skeleton.mark !== undefined && unit.skeletons.length > 1;
  const unsaid = sibling ? places.atoms : places.chosen;
  if (unsaid.some((atom) => isOverfull(atom, draft))) return undefined;
  if (places.opened && places.given && isMisnumbered(unit, places)) draft.cost += misnumbered;
  if (isBothEnantiomers(skeleton, unit.stereo)) {
    const range = { start: unit.parentAt, end: unit.parentAt };
    draft.loose.push({ atoms, word: { letter: 'rac', range, whole: range } });
  }
  for (const word of unit.stereo) {
    if (isSign(word)) continue;
    if (isSeriesWord(word)) {
      if (skeleton.series === true || skeleton.rotation !== undefined) continue;
      return draft.fail(
        word.range,
        `“${word.letter}” does not say the arrangement of this parent. Give R or S.`,
      );
    }
    if (word.locant === undefined) draft.loose.push({ atoms, word });
    else {
      const atom = places.at(word.locant);
      if (atom === undefined) return draft.fail(word.range, noSuchPlace(word.locant));
      draft.wanted.push({ atom, atoms, word });
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

/** The substituents in the understanding that is tried now; those with numbers first, which leave the others the rest. */
function substitutionsOf(unit: Unit, draft: Draft, choices: Choices): Substitution[] {
  const found: Substitution[] = [];
  for (const ways of unit.groupings) {
    const way = ways[choices.pick(ways.length)]!;
    draft.cost += way.cost;
    found.push(...way.substitutions);
    for (const { bracketAt, range } of way.substitutions)
      if (bracketAt !== undefined)
        draft.brackets.push({ at: bracketAt, end: range.end, depth: draft.owner.depth + 1 });
  }
  return [...found.filter(hasNumbers), ...found.filter((one) => !hasNumbers(one))];
}

/** More than any doubt about brackets: nobody leaves a locant out of a name whose other locants are wrong. */
const misnumbered = 4;

const hasNumbers = ({ locants }: Substitution) => locants?.some((locant) => /^\d/.test(locant)) === true;

function isOverfull(atom: number, draft: Draft): boolean {
  return !draft.usualHydrogen.includes(atom) && draft.freeBesideRing(atom) < 0;
}

/** Lower locants would be possible. Indicated hydrogen and replaced atoms come before all else, and are left alone. */
function isMisnumbered(unit: Unit, places: Places): boolean {
  if (unit.indicated.length + unit.hydro.length + unit.replacements.length > 0) return false;
  if (unit.endings.some((ending) => ending.addedHydrogen !== undefined)) return false;
  const { skeleton } = places;
  if (unit.unsaturations.length > 0 && skeleton.kind === 'fixed') return false;
  const attached = unit.attach ? [{ rank: 0, positions: [unit.attach.atom] } as const] : [];
  return properNumbering(skeleton, [...attached, ...places.cited]) !== undefined;
}

/** Gives the atoms of a link their free valences. */
function freeLinks(links: readonly number[], skeleton: SkeletonGraph, built: BuiltUnit, draft: Draft): void {
  const { atoms } = built.places;
  for (const index of new Set(links)) {
    const more = links.filter((one) => one === index).length;
    if (skeleton.atoms[index]!.hydrogens !== undefined) draft.atoms[atoms[index]!]!.capacity += more;
    else draft.settleCapacity(atoms[index]!, undefined, more);
  }
  built.free.push(...links.map((index) => ({ atom: atoms[index]!, order: 1 })));
}

const rank = (ending: Ending) =>
  ending.suffix.kind === 'charge' ? -1 : ending.suffix.kind === 'at' ? 0 : ending.locants ? 1 : 2;

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
    // The usual N–H has its hydrogen already, unless the name puts indicated hydrogen elsewhere.
    const taken = (atom: number) => unit.indicated.length === 0 && draft.usualHydrogen.includes(atom);
    const ring = places.atoms.filter(
      (atom) =>
        draft.atoms[atom]!.mancude && !draft.atoms[atom]!.saturated && draft.free(atom) > 0 && !taken(atom),
    );
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
      draft.insert(at, `${inOrder(chosen).join(',')}-`);
      places.opened = true;
    }
  }
  return true;
}

function inOrder(locants: readonly Locant[]): Locant[] {
  return [...locants].sort((one, other) => (precedes(one, other) ? -1 : 1));
}

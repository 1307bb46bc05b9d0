/** Hangs substituents on the places of a unit; where a name gives no locant, every place that could be meant. */
import type { Locant, Substitution, Unit } from '../tree.ts';
import { noSuchPlace, type BuiltUnit, type UnitBuilder } from './built-unit.ts';
import type { Choices } from './choices.ts';
import type { Draft, Owner } from './draft.ts';
import { fifthBond } from './endings.ts';
import { admitDouble } from './replacements.ts';

const halogens: ReadonlySet<number> = new Set([9, 17, 35, 53]);

export function placeSubstitution(
  substitution: Substitution,
  unit: Unit,
  built: BuiltUnit,
  draft: Draft,
  choices: Choices,
  build: UnitBuilder,
): boolean {
  const { places } = built;
  const hosts: number[] = [];
  const given = meantLocants(substitution, built, draft);
  for (const locant of given ?? []) {
    const atom = locant === '→' ? places.atoms[unit.linkAt ?? 0] : places.at(locant);
    if (atom === undefined) {
      draft.fail(substitution.range, noSuchPlace(locant));
      return false;
    }
    hosts.push(atom);
  }
  if (given) places.fresh = false;
  const chosen: Locant[] = [];
  let offered = 0;
  let sides = false;
  let from = 0;
  for (let index = 0; index < substitution.count; index++) {
    const before = draft.atoms.length;
    const { owner } = draft;
    draft.owner = ownerOf(substitution, owner);
    const child = build(substitution.unit, draft, choices);
    draft.owner = owner;
    const [free, ...others] = child?.free ?? [];
    const bridge = given !== undefined && substitution.count === 1 && hosts.length === others.length + 1;
    if (!child || !free || (others.length > 0 && !bridge)) {
      draft.fail(substitution.range, 'This group has no single free valence with which it could be bound.');
      return false;
    }
    if (unit.needsLink === true && halogens.has(draft.atoms[free.atom]!.atomicNumber)) {
      draft.fail(substitution.range, 'A halogen does not form a name together with this group.');
      return false;
    }
    let host = hosts[index];
    if (!given && places.skeleton.guarded === true) {
      draft.fail(substitution.range, 'This name takes groups only where their locants are given.');
      return false;
    }
    if (!given) {
      // Like groups are not told apart: each goes to the same place as the one before it, or further on.
      const order = [...places.named()];
      const left = substitution.count - index;
      const room = () => {
        const open = openPlaces(built, draft, before, free, sides);
        const further = open.filter((atom) => order.indexOf(atom) >= from);
        return withRoom(further, draft, free.order, left);
      };
      let options = room();
      if (options.length === 0 && index === 0) {
        // Octafluorotoluene has more groups than the ring takes.
        sides = true;
        options = room();
      }
      if (options.length === 0) {
        draft.fail(substitution.range, 'There is no place left on the parent for this group.');
        return false;
      }
      offered = Math.max(offered, options.length);
      host = options[places.fresh ? 0 : choices.pick(options.length)]!;
      from = order.indexOf(host);
      chosen.push(places.locantOf(host)!);
      if (free.order === 1) places.chosen.push(host);
      places.fresh = false;
    }
    if (given && host !== undefined) admitDouble(host, free, draft);
    if (host === undefined || draft.free(host) < free.order) {
      draft.fail(substitution.range, fifthBond(built, host ?? 0));
      return false;
    }
    draft.bond(host, free.atom, free.order);
    places.cite(2, given !== undefined, host);
    // `2,3-epoxy`, `3,4-methylenedioxy`: further valences are bound to further places (P-63.5).
    for (const [place, { atom, order }] of others.entries()) {
      const next = hosts[place + 1]!;
      if (next === host || draft.free(next) < order) {
        draft.fail(substitution.range, fifthBond(built, next));
        return false;
      }
      draft.bond(next, atom, order);
      places.cite(2, true, next);
    }
  }
  if (!given && (offered > 1 || substitution.count > 1) && places.atoms.length > 1) {
    places.inserted.push(draft.insert(substitution.at, `${chosen.join(',')}-`));
    places.opened = true;
  }
  return true;
}

/** `o`, `m`, `p` mean 2, 3, 4 beside what is at 1 (P-14.3.1, older usage); on a bare ring the first group takes 1. */
function meantLocants(
  substitution: Substitution,
  built: BuiltUnit,
  draft: Draft,
): readonly Locant[] | undefined {
  const { places } = built;
  const locants = substitution.locants;
  if (!locants) {
    if (places.awaiting === undefined || substitution.count !== 1) return undefined;
    const locant = places.awaiting;
    places.awaiting = undefined;
    return [locant];
  }
  const letter = locants[0]!;
  if (!/^[omp]$/.test(letter) || locants.length > 1) return locants;
  const meant = { o: '2', m: '3', p: '4' }[letter]!;
  const first = places.at('1');
  if (first === undefined || places.at('6') === undefined || places.at('7') !== undefined) return locants;
  const inside = places.atoms.includes(first) && draft.neighbours[first]!.length === 2;
  const bare = inside && !built.free.some(({ atom }) => atom === first);
  if (!bare) return substitution.count === 1 ? [meant] : [letter];
  if (substitution.count === 2) return ['1', meant];
  places.awaiting = meant;
  return ['1'];
}

/** Places that a group without locant can mean. Nitrogen takes only carbon groups unasked. */
export function openPlaces(
  built: BuiltUnit,
  draft: Draft,
  before: number,
  free: { atom: number; order: number },
  sides = false,
): number[] {
  const { places } = built;
  const carbon = draft.atoms[free.atom]!.atomicNumber === 6;
  // P-103.3.1: an acyl group before an amino acid is on its nitrogen: Boc-L-alanine written out.
  const acylates = places.unit.residue === true && isAcyl(draft, free.atom);
  return [...places.named()].filter((atom) => {
    if (acylates && places.at('N') !== atom) return false;
    if (atom >= before || (places.spent.has(atom) && places.atoms.length > 1)) return false;
    // Greek locants mark side chains (toluene, acetophenone), which a bare prefix does not mean.
    if (!sides && /^[α-ω]/.test(places.locantOf(atom)!)) return false;
    const element = draft.atoms[atom]!.atomicNumber;
    const alone = places.atoms.length === 1 && places.atoms[0] === atom;
    if ((element === 8 || element === 16 || element === 34) && !alone) return false;
    if (element === 7 && !alone && (!carbon || !takesCarbon(built, atom))) return false;
    const usual =
      draft.usualHydrogen.includes(atom) && draft.atoms[atom]!.mancude && !draft.atoms[atom]!.saturated;
    const valence = built.free.filter((one) => one.atom === atom).reduce((sum, one) => sum + one.order, 0);
    const spare = (usual ? draft.free(atom) : draft.freeBesideRing(atom)) - valence;
    return spare >= free.order;
  });
}

/** Places from which on there is room for so many groups: `octadecafluorooctane` is not tried in every way that fails. */
function withRoom(places: readonly number[], draft: Draft, order: number, count: number): number[] {
  let room = 0;
  let first = places.length;
  while (first > 0 && room < count) {
    const atom = places[--first]!;
    room += Math.max(1, Math.floor(draft.freeBesideRing(atom) / order));
  }
  return room < count ? [] : places.slice(0, first + 1);
}

/** Nitrogen of the parent itself (aniline, urea), or of an amide; that of an ending `amine` is always cited as N. */
function takesCarbon(built: BuiltUnit, atom: number): boolean {
  const { places } = built;
  return (
    places.atoms.includes(atom) || places.unit.endings.some((ending) => ending.suffix.name.endsWith('amide'))
  );
}

/** Descriptors of a bracketed group stand inside its bracket; round another group, brackets are written first. */
function ownerOf(substitution: Substitution, outer: Owner): Owner {
  const shared = { depth: outer.depth + 1, repeated: outer.repeated || substitution.count > 1 };
  if (substitution.bracketed === true) return { ...shared, at: substitution.unit.range.start };
  return { ...shared, at: substitution.bodyAt, wrapTo: substitution.range.end };
}

function isAcyl(draft: Draft, atom: number): boolean {
  return (
    draft.atoms[atom]!.atomicNumber === 6 &&
    draft.neighbours[atom]!.some(
      (one) => draft.bonds[one.bond]!.order === 2 && draft.atoms[one.atom]!.atomicNumber === 8,
    )
  );
}

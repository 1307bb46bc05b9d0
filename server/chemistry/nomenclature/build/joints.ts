/** Builds like units round a link (P-15.3), each a copy of the same. */
import type { Joint, Unit } from '../tree.ts';
import { noSuchPlace, type BuiltUnit, type UnitBuilder } from './built-unit.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { fifthBond } from './endings.ts';
import { openPlaces, placeSubstitution } from './substitutions.ts';
import type { Valence } from './words.ts';

/** The link, the units on it, and what is cited before them; undefined when they do not fit. */
export function buildJoint(
  joint: Joint,
  draft: Draft,
  choices: Choices,
  build: UnitBuilder,
): BuiltUnit | undefined {
  const { owner } = draft;
  draft.owner = { ...owner, at: joint.link.range.start, depth: owner.depth + 1 };
  const link = build(joint.link, draft, choices);
  const used = link?.free.splice(link.free.length - joint.count, joint.count);
  if (!used || used.length !== joint.count) {
    draft.owner = owner;
    return undefined;
  }
  draft.owner = {
    at: joint.unit.range.start,
    depth: owner.depth + 1,
    repeated: owner.repeated || joint.count > 1,
  };
  const parts = copies(joint.unit, joint.count, draft, choices, build);
  draft.owner = owner;
  if (!parts || !bindAll(used, parts, joint, draft, choices)) return undefined;
  const whole: BuiltUnit = {
    places: parts[0]!.places,
    free: [...link!.free, ...parts.flatMap((part) => part.free)],
    sites: parts.flatMap((part) => part.sites),
  };
  // P-15.3.2.1: the second unit is numbered with primes, the third with two.
  for (const [index, part] of parts.entries()) {
    if (index === 0) continue;
    for (const atom of part.places.named())
      whole.places.name(part.places.locantOf(atom)! + "'".repeat(index), atom);
  }
  for (const ways of joint.groupings) {
    const way = ways[choices.pick(ways.length)]!;
    draft.cost += way.cost;
    for (const substitution of way.substitutions)
      if (!placeSubstitution(substitution, joint.unit, whole, draft, choices, build)) return undefined;
  }
  for (const word of joint.stereo) {
    const atom = word.locant === undefined ? undefined : whole.places.at(word.locant);
    if (atom === undefined) return draft.fail(word.range, noSuchPlace(word.locant ?? '?'));
    draft.wanted.push({ atom, atoms: whole.places.atoms, word });
  }
  return whole;
}

/** The copies are alike: what one leaves open is the same in the others. */
function copies(
  unit: Unit,
  count: number,
  draft: Draft,
  choices: Choices,
  build: UnitBuilder,
): BuiltUnit[] | undefined {
  const parts: BuiltUnit[] = [];
  const { insertions, brackets } = draft;
  let written: string | undefined;
  for (let copy = 0; copy < count; copy++) {
    const from = [insertions.length, brackets.length] as const;
    const part = build(unit, draft, choices);
    if (!part) return undefined;
    parts.push(part);
    const here = JSON.stringify([insertions.slice(from[0]), brackets.slice(from[1])]);
    if (written === undefined) written = here;
    else if (here !== written) return undefined;
    else {
      insertions.length = from[0];
      brackets.length = from[1];
    }
  }
  return parts;
}

/** Binds each unit to a free valence of the link: at a locant, or where it has a valence of its own for it. */
function bindAll(
  valences: readonly Valence[],
  parts: readonly BuiltUnit[],
  joint: Joint,
  draft: Draft,
  choices: Choices,
): boolean {
  const chosen: string[] = [];
  let offered = 0;
  for (const [index, part] of parts.entries()) {
    const valence = valences[index]!;
    let host: number | undefined;
    if (joint.locants) {
      host = part.places.at(unprimed(joint.locants[index]!, index));
      if (host === undefined) draft.fail(joint.range, noSuchPlace(joint.locants[index]!));
    } else if (part.free.length > 1) host = part.free.shift()!.atom;
    else {
      const options = openPlaces(part, draft, draft.atoms.length, valence).filter(
        (atom) => !onHeteroatom(draft, atom),
      );
      offered = Math.max(offered, part.places.fresh ? 1 : options.length);
      host = options[part.places.fresh ? 0 : choices.pick(options.length)];
      if (host !== undefined) chosen.push(part.places.locantOf(host)! + "'".repeat(index));
    }
    if (host === undefined) return false;
    if (draft.free(host) < valence.order) {
      draft.fail(joint.range, fifthBond(part, host));
      return false;
    }
    draft.bond(host, valence.atom, valence.order);
    part.places.fresh = false;
  }
  if (offered > 1) draft.insert(joint.at, `${chosen.join(',')}-`);
  return true;
}

/** A carbon with a group on it already, as in ethanol; a further one there would have been said. */
function onHeteroatom(draft: Draft, atom: number): boolean {
  const carbon = (one: number) => draft.atoms[one]!.atomicNumber === 6;
  return (
    carbon(atom) &&
    draft.neighbours[atom]!.some(
      ({ atom: other, bond }) =>
        !carbon(other) && draft.bonds[bond]!.order === 1 && !draft.atoms[other]!.mancude,
    )
  );
}

/** `4'` on the second unit is its position 4. */
function unprimed(locant: string, primes: number): string {
  const end = locant.length - primes;
  return locant.slice(end) === "'".repeat(primes) ? locant.slice(0, end) : `${locant}?`;
}

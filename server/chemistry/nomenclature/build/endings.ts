/** Puts characteristic groups and free valences on the parent (P-31.1.4.3.1). */
import type { Ending } from '../tree.ts';
import { noSuchPlace, type BuiltUnit } from './built-unit.ts';
import { placeCharge } from './charges.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { groupSkeleton } from './group-skeleton.ts';

/** Puts a suffix on its places, chosen where the name leaves them open; false when that cannot be. */
export function placeEnding(ending: Ending, built: BuiltUnit, draft: Draft, choices: Choices): boolean {
  if (ending.suffix.kind === 'charge') return placeCharge(ending, built, draft, choices);
  const atoms = endingAtoms(ending, built, draft, choices);
  if (!atoms) return false;
  atoms.forEach((atom, index) => {
    if (draft.failure) return;
    built.places.cite(0, ending.locants !== undefined, atom);
    if (ending.suffix.kind === 'free') {
      const order = Number(ending.suffix.group);
      if (draft.free(atom) < order) draft.fail(ending.range, fifthBond(built, atom));
      built.free.push({ atom, order });
      return;
    }
    built.places.principal.push(atom);
    attach(ending, atom, index, built, draft);
  });
  built.places.fresh = false;
  return draft.failure === undefined;
}

/** Says that an atom cannot take one more group. */
export function fifthBond(built: BuiltUnit, atom: number): string {
  const locant = built.places.locantOf(atom);
  return `The atom${locant === undefined ? '' : ` at position ${locant}`} has no valence left for this group. Check the locants.`;
}

function attach(ending: Ending, host: number, index: number, built: BuiltUnit, draft: Draft): void {
  const { suffix } = ending;
  const labels = suffix.locants?.split(' ') ?? [];
  let label = 0;
  for (const piece of suffix.kind === 'at' ? suffix.group.split(' ') : [suffix.group]) {
    const order = piece.startsWith('=') ? 2 : piece.startsWith('#') ? 3 : 1;
    const group = groupSkeleton(piece.replace(/^[=#]/, ''));
    if (draft.free(host) < order) {
      draft.fail(ending.range, fifthBond(built, host));
      return;
    }
    const added = draft.addSkeleton(group, ending.range);
    for (const atom of added) {
      const own = labels[label++];
      if (own === undefined || own === '-') continue;
      // Locants of further groups of the same kind are primed (P-62.2.4.1.2), or cite the position: N, N', 2-N.
      built.places.name(own + "'".repeat(index), atom);
      built.places.name(`${built.places.locantOf(host) ?? ''}-${own}`, atom);
    }
    draft.bond(host, added[0]!, order);
    for (const atom of added) {
      draft.settleCapacity(atom, undefined);
      if (suffix.anion === true && draft.atoms[atom]!.charge < 0) built.sites.push(atom);
    }
    if (suffix.radical === true && suffix.kind === 'on') {
      draft.settleCapacity(added[0]!, undefined, 1);
      built.free.push({ atom: added[0]!, order: 1 });
    }
  }
  if (suffix.kind === 'at') {
    built.places.spent.add(host);
    if (suffix.radical === true) built.free.push({ atom: host, order: 1 });
  }
}

function endingAtoms(ending: Ending, built: BuiltUnit, draft: Draft, choices: Choices): number[] | undefined {
  const { places } = built;
  if (ending.locants) {
    const found: number[] = [];
    for (const locant of ending.locants) {
      const meant =
        /^[omp]$/.test(locant) && places.skeleton.atoms.length > 6
          ? { o: '2', m: '3', p: '4' }[locant]
          : locant;
      const atom = places.at(meant ?? locant);
      if (atom === undefined) return draft.fail(ending.range, noSuchPlace(locant));
      found.push(atom);
    }
    return found;
  }
  const { kind } = places.skeleton;
  const { atoms } = places;
  const { suffix, count } = ending;
  if (suffix.kind === 'at') {
    // P-31.1.4.3.1: such a group is at the end of the chain, two of them at both ends.
    if (kind !== 'chain' || count > 2 || (count === 2 && atoms.length < 2)) {
      return draft.fail(ending.range, 'This ending needs a chain with a free end.');
    }
    return count === 1 ? [atoms[0]!] : [atoms[0]!, atoms[atoms.length - 1]!];
  }
  if (suffix.kind === 'free' && kind === 'chain') {
    if (count === 1) return [atoms[0]!];
    return atoms.length === 1
      ? Array.from({ length: count }, () => atoms[0]!)
      : count === 2 && atoms.length === 2
        ? [atoms[0]!, atoms[1]!]
        : draft.fail(ending.range, 'Locants are missing for these free valences.');
  }
  if (kind === 'chain' && count === 1 && (atoms.length <= 2 || suffix.name === 'oxy')) return [atoms[0]!];
  if (places.alike && count === 1) return [atoms[0]!];
  const order = suffix.kind === 'free' ? Number(suffix.group) : suffix.group.startsWith('=') ? 2 : 1;
  const chosen: number[] = [];
  let from = 0;
  for (let index = 0; index < count; index++) {
    const options = atoms.filter((atom, position) => {
      if (position < from || places.locantOf(atom) === undefined) return false;
      const taken = chosen.filter((one) => one === atom).length;
      const element = draft.atoms[atom]!.atomicNumber;
      const named = element === 6 || element === 14 || suffix.kind === 'free';
      if (!named && atoms.length > 1) return false;
      if (atoms.length === 1) return draft.free(atom) >= order * (taken + 1);
      if (suffix.name === 'one' || suffix.name === 'thione') {
        // On a chain end the group would be an aldehyde.
        if (kind === 'chain' && draft.neighbours[atom]!.length < 2) return false;
        return draft.free(atom) >= order * (taken + 1);
      }
      return draft.freeBesideRing(atom) >= order * (taken + 1) && (taken === 0 || suffix.name !== 'ol');
    });
    if (options.length === 0)
      return draft.fail(ending.range, 'There is no place for this group on the parent.');
    const first = places.alike && index === 0 ? 0 : choices.pick(options.length);
    const atom = options[first]!;
    from = atoms.indexOf(atom);
    chosen.push(atom);
    if (order === 1) places.chosen.push(atom);
  }
  if (atoms.length > 1) {
    draft.insert(ending.at, `-${chosen.map((atom) => places.locantOf(atom)!).join(',')}-`);
    places.opened = true;
  }
  return chosen;
}

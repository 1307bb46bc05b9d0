/** Binds the acyclic half of a conjunctive name to its ring. */
import type { SideChain } from '../tree.ts';
import { noSuchPlace, type BuiltUnit, type UnitBuilder } from './built-unit.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { fifthBond } from './endings.ts';

const letters = ['α', 'β', 'γ', 'δ', 'ε', 'ζ'];

/** Every copy of the chain on its place of the ring; false where the name does not say which. */
export function placeSideChains(
  side: SideChain,
  ring: BuiltUnit,
  draft: Draft,
  choices: Choices,
  build: UnitBuilder,
): boolean {
  const locants = side.locants ?? (ring.places.alike && side.count === 1 ? ['1'] : []);
  if (locants.length !== side.count) {
    draft.fail(side.range, 'The place of this group on the ring is missing.');
    return false;
  }
  for (const [copy, locant] of locants.entries()) {
    const host = ring.places.at(locant);
    if (host === undefined) draft.fail(side.range, noSuchPlace(locant));
    const chain = host === undefined ? undefined : build(side.unit, draft, choices);
    if (!chain || host === undefined) return false;
    const { atoms } = chain.places;
    // An acid's carbon has no letter, the carbon of an alcohol or amine is α.
    const numbered = atoms
      .map((atom) => ({ atom, number: Number(numberOf(chain, atom)) }))
      .sort((first, second) => first.number - second.number);
    const lettered = numbered.slice(side.unit.endings[0]!.suffix.kind === 'at' ? 1 : 0);
    const last = lettered[lettered.length - 1]?.atom;
    if (last === undefined || draft.free(host) < 1 || draft.free(last) < 1) {
      draft.fail(side.range, fifthBond(ring, host));
      return false;
    }
    draft.bond(host, last, 1);
    ring.places.cite(0, true, host);
    const primes = "'".repeat(copy);
    lettered.forEach(({ atom }, index) => {
      ring.places.name(letters[index]! + primes, atom);
    });
    for (const own of ['N', "N'", 'O'] as const) {
      const atom = chain.places.at(own);
      if (atom !== undefined) ring.places.name(own + primes, atom);
    }
    ring.sites.push(...chain.sites);
  }
  ring.places.fresh = false;
  return true;
}

function numberOf(chain: BuiltUnit, atom: number): number {
  for (let number = 1; number <= letters.length + 1; number++)
    if (chain.places.at(String(number)) === atom) return number;
  return Number.POSITIVE_INFINITY;
}

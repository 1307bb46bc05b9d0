/** Skeletal replacement (P-15.4) and bonding numbers (P-14.1) on the atoms of a parent. */
import type { Replacement, Unit } from '../tree.ts';
import { noSuchPlace } from './built-unit.ts';
import { ringBondKey, type Draft } from './draft.ts';
import type { Places } from './places.ts';

const tetravalentInRings: ReadonlySet<number> = new Set([5, 7, 14, 15, 32, 33]);

/** Puts other elements in the places of carbons; false when one is not there. */
export function placeReplacement(replacement: Replacement, places: Places, draft: Draft): boolean {
  const { atomicNumber, charge = 0, locants, bonding, range } = replacement;
  for (const [index, locant] of locants.entries()) {
    const atom = places.at(locant);
    const own = atom === undefined ? undefined : draft.atoms[atom];
    if (atom === undefined || !own) {
      draft.fail(range, noSuchPlace(locant));
      return false;
    }
    if (own.atomicNumber !== 6) {
      draft.fail(range, `Only a carbon is replaced so (P-15.4.1); position ${locant} is none.`);
      return false;
    }
    own.atomicNumber = atomicNumber;
    own.charge = charge;
    own.mancude &&= charge > 0 || tetravalentInRings.has(atomicNumber);
    if (bonding?.[index] === undefined) draft.settleCapacity(atom);
    else draft.setBonds(atom, bonding[index]);
  }
  return true;
}

/** `λ5-phosphane`: gives atoms of the parent the number of bonds that the name says; false when one is not there. */
export function placeBonding(unit: Unit, places: Places, draft: Draft): boolean {
  for (const { locant, bonds } of unit.bonding ?? []) {
    const atom = locant === undefined ? onlyAtom(places, draft) : places.at(locant);
    if (atom === undefined || draft.atoms[atom]!.atomicNumber === 6) {
      draft.fail(unit.range, noSuchPlace(locant ?? `λ${String(bonds)}`));
      return false;
    }
    draft.setBonds(atom, bonds);
    // P-22.2.2.1.1: with more bonds than usual the atom takes part in the double bonds of its ring.
    if (bonds > draft.orderSum(atom)) joinRing(atom, places, draft);
  }
  return true;
}

/** The heteroatom that a bonding number without locant is about. */
function onlyAtom(places: Places, draft: Draft): number | undefined {
  const atoms = places.atoms.filter((atom) => draft.atoms[atom]!.atomicNumber !== 6);
  return atoms.length === 1 ? atoms[0] : undefined;
}

/** An atom between two mancude ones becomes mancude. */
function joinRing(atom: number, places: Places, draft: Draft): void {
  const bound = draft.neighbours[atom]!.map((one) => one.atom).filter((one) => places.atoms.includes(one));
  if (bound.length < 2 || !bound.every((one) => draft.atoms[one]!.mancude)) return;
  draft.atoms[atom]!.mancude = true;
  for (const other of bound) draft.ringBonds.add(ringBondKey(atom, other));
}

/** Most bonds of sulfur and its kin, and of phosphorus and its. */
const most: Readonly<Record<number, number>> = { 15: 5, 16: 6, 33: 5, 34: 6, 51: 5, 52: 6 };
const doubleOnly: ReadonlySet<number> = new Set([7, 8, 16, 34]);

/**
 * `1,1-dioxothiolane`: printed names leave out the bonding number that a double bond to oxygen, sulfur or nitrogen on
 * sulfur or phosphorus implies (common practice, no source).
 */
export function admitDouble(host: number, free: { atom: number; order: number }, draft: Draft): void {
  const own = draft.atoms[host]!;
  if (free.order !== 2 || draft.free(host) >= 2 || own.charge !== 0) return;
  if (!doubleOnly.has(draft.atoms[free.atom]!.atomicNumber)) return;
  if (own.capacity + 2 <= (most[own.atomicNumber] ?? 0)) own.capacity += 2;
}

/** Characteristic groups found in what is built so far, whatever word brought them in. */
import type { Draft } from './draft.ts';

const [carbon, nitrogen, oxygen, phosphorus, sulfur] = [6, 7, 8, 15, 16];

/** O–H or S–H of acids: beside a double bond to O, S or N, or on boron. */
export function acidHydroxyls(draft: Draft): number[] {
  return ends(draft, [oxygen, sulfur]).filter((atom) => isAcidic(draft, hostOf(draft, atom)));
}

/** O–H of alcohols and phenols. */
export function hydroxyls(draft: Draft): number[] {
  return ends(draft, [oxygen]).filter((atom) => {
    const host = hostOf(draft, atom);
    return draft.atoms[host]!.atomicNumber === carbon && !isAcidic(draft, host);
  });
}

function ends(draft: Draft, elements: readonly number[]): number[] {
  return draft.atoms.flatMap((atom, index) =>
    elements.includes(atom.atomicNumber) &&
    atom.charge === 0 &&
    draft.neighbours[index]!.length === 1 &&
    draft.orderSum(index) === 1 &&
    draft.free(index) === 1
      ? [index]
      : [],
  );
}

const hostOf = (draft: Draft, atom: number) => draft.neighbours[atom]![0]!.atom;

function isAcidic(draft: Draft, host: number): boolean {
  if (draft.atoms[host]!.atomicNumber === 5) return true;
  return draft.neighbours[host]!.some(
    ({ atom, bond }) =>
      draft.bonds[bond]!.order === 2 && [oxygen, sulfur, nitrogen].includes(draft.atoms[atom]!.atomicNumber),
  );
}

/** The carbon and oxygen of aldehydes and ketones; of amides as well where asked. */
export function carbonyls(
  draft: Draft,
  ofAmides = false,
): { readonly carbon: number; readonly oxygen: number }[] {
  return draft.bonds.flatMap(({ from, to, order }) => {
    const [first, second] = draft.atoms[from]!.atomicNumber === carbon ? [from, to] : [to, from];
    if (order !== 2 || draft.atoms[first]!.atomicNumber !== carbon) return [];
    if (draft.atoms[second]!.atomicNumber !== oxygen || draft.neighbours[second]!.length !== 1) return [];
    const plain = draft.neighbours[first]!.every(({ atom }) => {
      const element = draft.atoms[atom]!.atomicNumber;
      return atom === second || element === carbon || (ofAmides && element === nitrogen);
    });
    return plain ? [{ carbon: first, oxygen: second }] : [];
  });
}

/** Bonds C=C outside rings with delocalised double bonds. */
export function alkenes(draft: Draft): number[] {
  return draft.bonds.flatMap(({ from, to, order }, bond) =>
    order === 2 && [from, to].every((atom) => draft.atoms[atom]!.atomicNumber === carbon) ? [bond] : [],
  );
}

/** Trivalent phosphorus. */
export function phosphines(draft: Draft): number[] {
  return draft.atoms.flatMap((atom, index) =>
    atom.atomicNumber === phosphorus && atom.charge === 0 && draft.orderSum(index) > 0 && atom.capacity === 3
      ? [index]
      : [],
  );
}

/** Nitrogen of tertiary amines and of pyridine rings. */
export function tertiaryNitrogens(draft: Draft): number[] {
  return draft.atoms.flatMap((atom, index) => {
    if (atom.atomicNumber !== nitrogen || atom.charge !== 0) return [];
    const pyridine =
      atom.mancude && !atom.saturated && draft.free(index) === 1 && !draft.usualHydrogen.includes(index);
    return draft.free(index) === 0 || pyridine ? [index] : [];
  });
}

/** Turns a finished draft into a molecule: double bonds of mancude rings, hydrogens, valences. */
import { maximumMatching } from '../../structure/kekulize.ts';
import { MoleculeBuilder, type BondOrder, type Molecule } from '../../structure/molecule.ts';
import type { TextRange } from '../../text.ts';
import type { Choices } from './choices.ts';
import { ringBondKey, type Draft } from './draft.ts';

/** The molecule, or undefined when the double bonds cannot be placed or an atom has too many bonds. */
export function finished(draft: Draft, choices: Choices, whole: TextRange): Molecule | undefined {
  if (!placeDoubleBonds(draft, choices, whole)) return undefined;
  const builder = new MoleculeBuilder();
  for (const [index, atom] of draft.atoms.entries()) {
    const metal = draft.metals.get(index);
    // `oxido` on a metal is the ligand of additive names, drawn without charge (Red Book IR-7.1).
    const charged = draft.neighbours[index]!.some((one) => draft.atoms[one.atom]!.charge !== 0);
    if (metal && (charged || !isFilled(metal, draft.orderSum(index))))
      return draft.fail(atom.range, 'This metal does not have that number of bonds. Check the groups on it.');
    const hydrogens = metal ? 0 : atom.capacity - draft.orderSum(index);
    if (hydrogens < 0)
      return draft.fail(atom.range, 'An atom here has more bonds than it can have. Check the locants.');
    builder.addAtom(atom.atomicNumber, {
      charge: atom.charge,
      isotope: atom.isotope,
      hydrogens,
      range: atom.range,
    });
  }
  for (const bond of draft.bonds) builder.addBond(bond.from, bond.to, bond.order as BondOrder);
  builder.stereo.push(...draft.stereo);
  return builder.build();
}

function isFilled(bonds: readonly number[], used: number): boolean {
  return bonds.length > 0 ? bonds.includes(used) : used > 0;
}

function placeDoubleBonds(draft: Draft, choices: Choices, whole: TextRange): boolean {
  const ring = withoutLonely(
    draft,
    draft.atoms.flatMap((atom, index) =>
      atom.mancude && !atom.saturated && draft.free(index) > 0 ? [index] : [],
    ),
  );
  if (ring.length === 0) return true;
  let match = matching(draft, ring);
  if (match.single.length > 0) {
    for (const atom of draft.usualHydrogen) {
      if (match.single.length === 0 || draft.atoms[atom]!.saturated || draft.free(atom) === 0) continue;
      const trial = matching(
        draft,
        ring.filter((one) => one !== atom && !draft.atoms[one]!.saturated),
      );
      if (trial.single.length < match.single.length) {
        draft.atoms[atom]!.saturated = true;
        match = trial;
      }
    }
  }
  // Nitrogen beside a carbonyl is the tautomer that a name without indicated hydrogen means.
  for (const atom of ring) {
    if (match.single.length === 0) break;
    if (
      draft.atoms[atom]!.atomicNumber !== 7 ||
      draft.atoms[atom]!.saturated ||
      draft.atoms[atom]!.charge !== 0
    )
      continue;
    const trial = matching(
      draft,
      ring.filter((one) => one !== atom && !draft.atoms[one]!.saturated),
    );
    if (trial.single.length < match.single.length) {
      draft.atoms[atom]!.saturated = true;
      match = trial;
    }
  }
  if (match.single.length === 1) {
    const left = ring.filter((one) => !draft.atoms[one]!.saturated);
    const options = left.filter(
      (atom) =>
        draft.free(atom) >= 1 &&
        matching(
          draft,
          left.filter((one) => one !== atom),
        ).single.length === 0,
    );
    if (options.length > 0) {
      const atom = options[choices.pick(options.length)]!;
      const name = draft.named.get(atom);
      if (name?.locant !== undefined && options.length > 1)
        draft.insertions.push({ at: name.parentAt, text: `${name.locant}H-`, depth: name.owner.depth });
      draft.atoms[atom]!.saturated = true;
      match = matching(
        draft,
        left.filter((one) => one !== atom),
      );
    }
  }
  if (match.single.length > 0) {
    draft.fail(
      whole,
      'The double bonds of a ring in this name cannot be placed. Check the hydro prefixes and the indicated hydrogen.',
    );
    return false;
  }
  for (const [from, to] of match.pairs) {
    const bond = draft.neighbours[from]!.find((one) => one.atom === to)!.bond;
    draft.bonds[bond]!.order = 2;
  }
  return true;
}

/**
 * An atom whose neighbours can never share a double bond with it has none: C-2 and C-4 between O and a 3-one. Where a
 * neighbour was saturated by hydro prefixes or indicated hydrogen, the name is at odds with itself instead.
 */
function withoutLonely(draft: Draft, ring: readonly number[]): number[] {
  const open = new Set(ring);
  return ring.filter((atom) => {
    const beside = draft.neighbours[atom]!.filter((one) => sameRing(draft, atom, one.atom));
    const isLonely = beside.every((one) => !open.has(one.atom) && !draft.atoms[one.atom]!.saturated);
    if (isLonely) draft.atoms[atom]!.saturated = true;
    return !isLonely;
  });
}

function matching(draft: Draft, ring: readonly number[]): { single: number[]; pairs: [number, number][] } {
  const position = new Map(ring.map((atom, index) => [atom, index]));
  const adjacency = ring.map((atom) =>
    draft.neighbours[atom]!.flatMap(({ atom: other, bond }) => {
      const index = position.get(other);
      return index === undefined || draft.bonds[bond]!.order !== 1 || !sameRing(draft, atom, other)
        ? []
        : [index];
    }),
  );
  const { partner } = maximumMatching(adjacency);
  const single: number[] = [];
  const pairs: [number, number][] = [];
  partner.forEach((other, index) => {
    if (other < 0) single.push(ring[index]!);
    else if (other > index) pairs.push([ring[index]!, ring[other]!]);
  });
  return { single, pairs };
}

/** Bonds between two rings (as in biphenyl) join mancude atoms but are no bonds of a ring. */
function sameRing(draft: Draft, first: number, second: number): boolean {
  return draft.ringBonds.has(ringBondKey(first, second));
}

/**
 * Words that set one group against another: `cis` and `trans` (P-31.1.4.2.4, P-93.5.1.3), `exo` and `endo`, `meso`; which of
 * the stereoisomers agree with them.
 */
import { onSameSideOfDoubleBond, onSameSideOfRing } from '../structure/assign-descriptors.ts';
import { type Molecule } from '../structure/molecule.ts';
import { smallestRingThrough } from '../structure/rings.ts';
import { isOwnMirrorImage } from '../structure/stereo-mirror.ts';
import type { StereoisomerList } from '../structure/stereoisomers.ts';
import { pointsToBridge } from './exo-endo.ts';
import type { Said } from './said.ts';

/** What a word says of a structure. */
export interface RelativeStatement {
  /** The atoms whose arrangement it is about. */
  readonly atoms: readonly number[];
  readonly agrees: (isomer: Molecule) => boolean;
}

/** What the word says of the isomers, or undefined when there is no place that it can be about. */
export function relativeStatement(
  list: StereoisomerList,
  { word, atoms, place }: Said['relations'][number],
): RelativeStatement | undefined {
  const near = place ?? atoms;
  const { molecule } = list;
  const bonds = list.units.flatMap(({ candidate }) => (candidate.kind === 'double-bond' ? [candidate] : []));
  const centres = list.units.flatMap(({ candidate }) =>
    candidate.kind === 'tetrahedral' ? [candidate.centre] : [],
  );
  const own = centres.filter((one) => near.includes(one));
  if (word.letter === 'meso')
    return centres.length < 2 ? undefined : { atoms: centres, agrees: (isomer) => isOwnMirrorImage(isomer) };
  if (word.letter === 'exo' || word.letter === 'endo') return bridgeStatement(molecule, own, word.letter);
  if (word.letter !== 'cis' && word.letter !== 'trans') return undefined;
  const cis = word.letter === 'cis';
  if (word.all === true && place === undefined) return cis ? allOnOneSide(molecule, own) : undefined;
  const ownBonds = bonds.filter(({ ends }) => ends.some((atom) => near.includes(atom)));
  const bond = ownBonds.length === 1 ? ownBonds[0]! : bonds.length === 1 ? bonds[0]! : bondBetween();
  if (bond && own.length < 2) {
    const ligands = bond.ends.map((end) => chainLigand(molecule, end, bond.ends, atoms));
    if (ligands.some((one) => one === undefined)) return undefined;
    return {
      atoms: bond.ends,
      agrees: (isomer) => onSameSideOfDoubleBond(isomer, bond.ends, ligands as [number, number]) === cis,
    };
  }
  const pair = own.length === 2 ? own : centres.length === 2 ? centres : undefined;
  return pair && ringStatement(molecule, pair[0]!, pair[1]!, cis);

  function bondBetween() {
    return bonds.find(({ ends }) => place?.length === 2 && ends.every((atom) => place.includes(atom)));
  }
}

function bridgeStatement(
  molecule: Molecule,
  centres: readonly number[],
  word: 'exo' | 'endo',
): RelativeStatement | undefined {
  const found = centres.flatMap((centre) => {
    const points = pointsToBridge(molecule, centre);
    return points ? [{ centre, points }] : [];
  });
  const [only] = found;
  if (!only || found.length > 1) return undefined;
  return { atoms: [only.centre], agrees: (isomer) => only.points(isomer) === (word === 'exo') };
}

function allOnOneSide(molecule: Molecule, centres: readonly number[]): RelativeStatement | undefined {
  const pairs = centres.slice(1).map((centre) => ringStatement(molecule, centres[0]!, centre, true));
  if (pairs.length === 0 || pairs.includes(undefined)) return undefined;
  return { atoms: centres, agrees: (isomer) => pairs.every((pair) => pair!.agrees(isomer)) };
}

function ringStatement(
  molecule: Molecule,
  first: number,
  second: number,
  cis: boolean,
): RelativeStatement | undefined {
  const ring = ringOf(molecule, first, second);
  if (!ring) return undefined;
  const [one, other] = [first, second].map((centre) => {
    const outside = molecule.neighbours[centre]!.map(({ atom }) => atom).filter(
      (atom) => !ring.includes(atom),
    );
    return outside.length === 1 ? { centre, ligand: outside[0]! } : undefined;
  });
  if (!one || !other) return undefined;
  return {
    atoms: [first, second],
    agrees: (isomer) => onSameSideOfRing(isomer, ring, one, other) === cis,
  };
}

/** The only group, beside hydrogen, on one end of a double bond; of two the one that continues the parent chain. */
function chainLigand(
  molecule: Molecule,
  end: number,
  ends: readonly [number, number],
  chain: readonly number[],
): number | undefined {
  const others = molecule.neighbours[end]!.map((one) => one.atom).filter((atom) => !ends.includes(atom));
  if (others.length === 1) return others[0];
  const inChain = others.filter((atom) => chain.includes(atom));
  return inChain.length === 1 ? inChain[0] : undefined;
}

/** A smallest ring that holds both atoms, its atoms in order. */
function ringOf(molecule: Molecule, first: number, second: number): number[] | undefined {
  for (const { bond } of molecule.neighbours[first]!) {
    const ring = smallestRingThrough(molecule, bond, 12);
    if (ring?.includes(second)) return [...ring];
  }
  return undefined;
}

/**
 * Turns `@`, `@@`, `/` and `\` of a SMILES into arrangements (OpenSMILES specification, section 3.8). Neighbours count
 * in the order in which the text shows them: the atom before, the implied hydrogen, ring closures, branches.
 */
import { range, type Problem } from '../text.ts';
import { doubleBondNeighbours, walkCumulene, type CumuleneEnd } from './cumulene.ts';
import { IMPLICIT_LIGAND, type MoleculeBuilder, type PolyhedralStereo } from './molecule.ts';
import type { SmilesDraft } from './smiles-draft.ts';

export function settleStereo(draft: SmilesDraft): Problem | undefined {
  for (const [atom, statement] of draft.chirality) settleChirality(draft, atom, statement);
  return draft.direction.size > 0 ? settleDirections(draft) : undefined;
}

/** The neighbours of an atom in the order of the text, without those in `except`; a hydrogen counts where it stands. */
function ligandsInTextOrder(
  { builder, ringMarks }: SmilesDraft,
  atom: number,
  except: readonly number[] = [],
): number[] {
  const placed: { at: number; ligand: number }[] = [];
  for (const { atom: other, bond } of builder.neighbours[atom]!) {
    if (except.includes(other)) continue;
    const marks = ringMarks.get(bond);
    const at =
      marks === undefined
        ? builder.atoms[other]!.range.start
        : builder.bonds[bond]!.from === atom
          ? marks[0]
          : marks[1];
    placed.push({ at, ligand: other });
  }
  if (builder.atoms[atom]!.hydrogens === 1) {
    placed.push({ at: builder.atoms[atom]!.range.start, ligand: IMPLICIT_LIGAND });
  }
  return placed.sort((first, second) => first.at - second.at).map((entry) => entry.ligand);
}

/** Elements whose pyramidal three-coordinate form can keep its shape, the lone pair taking the fourth place. */
const withLonePair: ReadonlySet<number> = new Set([7, 15, 16, 33, 34, 51, 52]);

function settleChirality(draft: SmilesDraft, atom: number, statement: string): void {
  const { builder } = draft;
  const stray = () => builder.stray.push({ atom, statement, range: builder.atoms[atom]!.range });
  const clockwise = statement === '@@' || statement === '@TH2' || statement === '@AL2';
  const kind = statement.startsWith('@SP')
    ? 'SP'
    : statement.startsWith('@TB')
      ? 'TB'
      : statement.startsWith('@OH')
        ? 'OH'
        : undefined;
  if (kind !== undefined) {
    settlePolyhedron(draft, atom, kind, statement, stray);
    return;
  }
  const ends = cumuleneEnds(builder, atom);
  if (ends !== undefined) {
    const [first, second] = ends.map(({ end, inward }) => ligandsInTextOrder(draft, end, [inward]));
    if (first?.length === 2 && second?.length === 2 && builder.atoms[ends[0].end]!.hydrogens < 2) {
      builder.stereo.push({
        kind: 'axis',
        ends: [ends[0].end, ends[1].end],
        ligands: [first[0]!, first[1]!, second[0]!, second[1]!],
        clockwise,
      });
    } else stray();
    return;
  }
  const ligands = ligandsInTextOrder(draft, atom);
  const { atomicNumber, hydrogens } = builder.atoms[atom]!;
  if (ligands.length === 3 && hydrogens === 0 && withLonePair.has(atomicNumber)) {
    // The lone pair counts where an implied hydrogen would.
    const before = builder.neighbours[atom]!.filter(
      (neighbour) =>
        builder.atoms[neighbour.atom]!.range.start < builder.atoms[atom]!.range.start &&
        !draft.ringMarks.has(neighbour.bond),
    ).length;
    ligands.splice(before, 0, IMPLICIT_LIGAND);
  }
  const [a, b, c, d] = ligands;
  if (ligands.length !== 4 || hydrogens > 1) stray();
  else builder.stereo.push({ kind: 'tetrahedral', centre: atom, ligands: [a!, b!, c!, d!], clockwise });
}

function settlePolyhedron(
  draft: SmilesDraft,
  centre: number,
  kind: PolyhedralStereo['kind'],
  statement: string,
  stray: () => void,
): void {
  const ligands = ligandsInTextOrder(draft, centre);
  const expected = { SP: 4, TB: 5, OH: 6 }[kind];
  if (ligands.length !== expected) stray();
  else draft.builder.stereo.push({ kind, centre, ligands, permutation: Number(statement.slice(3)) });
}

/** The two ends of the cumulene whose middle atom this is, if it is one. */
function cumuleneEnds(
  builder: MoleculeBuilder,
  middle: number,
): readonly [CumuleneEnd, CumuleneEnd] | undefined {
  const doubles = doubleBondNeighbours(builder, middle);
  if (doubles.length !== 2 || builder.neighbours[middle]!.length !== 2) return undefined;
  const [first, second] = doubles.sort(
    (one, other) => builder.atoms[one]!.range.start - builder.atoms[other]!.range.start,
  );
  const left = walkCumulene(builder, middle, first!);
  const right = walkCumulene(builder, middle, second!);
  return left.length === right.length ? [left, right] : undefined;
}

/** 1 when the ligand at the other side of the bond lies above the atom, −1 below, undefined when nothing is said. */
function sideOf({ builder, direction }: SmilesDraft, atom: number, bond: number): 1 | -1 | undefined {
  const stated = direction.get(bond);
  if (stated === undefined) return undefined;
  return builder.bonds[bond]!.from === atom ? stated : stated === 1 ? -1 : 1;
}

function settleDirections(draft: SmilesDraft): Problem | undefined {
  const { builder } = draft;
  for (let index = 0; index < builder.bonds.length; index++) {
    const bond = builder.bonds[index]!;
    if (bond.order !== 2 || bond.aromatic) continue;
    const left = walkCumulene(builder, bond.to, bond.from);
    const right = walkCumulene(builder, bond.from, bond.to);
    const doubles = left.length + right.length - 1;
    // Each cumulene once, from its first bond; an even number of double bonds has an axis, not sides.
    if (doubles % 2 === 0 || left.length > 1) continue;
    const first = referenceLigand(draft, left);
    const second = referenceLigand(draft, right);
    // With nothing said at one end, slashes at the other belong to the double bonds beyond it.
    if (first === undefined || second === undefined) continue;
    if ('message' in first) return first;
    if ('message' in second) return second;
    builder.stereo.push({
      kind: 'double-bond',
      ends: [left.end, right.end],
      ligands: [first.ligand, second.ligand],
      sameSide: first.side === second.side,
    });
  }
  return undefined;
}

function referenceLigand(
  draft: SmilesDraft,
  { end, inward }: CumuleneEnd,
): { ligand: number; side: 1 | -1 } | Problem | undefined {
  let found: { ligand: number; side: 1 | -1; bond: number } | undefined;
  for (const { atom, bond } of draft.builder.neighbours[end]!) {
    if (atom === inward) continue;
    const side = sideOf(draft, end, bond);
    if (side === undefined) continue;
    if (found !== undefined && found.side === side) {
      const place = draft.builder.bonds[bond]!.range;
      return {
        range: range(place.start, place.end),
        message:
          'The slashes contradict each other: both substituents of this double-bond carbon are put on the same side. Turn one slash round, or write only one of them.',
      };
    }
    found ??= { ligand: atom, side, bond };
  }
  return found;
}

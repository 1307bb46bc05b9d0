/** From ranked ligands to the letter of one unit. */
import { isOddPermutation } from '../canonical-stereo.ts';
import {
  type AxialStereo,
  type DoubleBondStereo,
  IMPLICIT_LIGAND,
  type TetrahedralStereo,
} from '../molecule.ts';
import type { Ranking } from './rank.ts';
import { type DescriptorLetter, enantiomorphRule } from './rules.ts';
import type { Branch } from './tree.ts';

/** R, S (P-91.2.1.1), or r, s where reflection changes nothing (P-93.5.1.1). `ranking` must be without ties. */
export function centreLetter(element: TetrahedralStereo, ranking: Ranking): DescriptorLetter | undefined {
  const ligands = ranking.order.map(ligandOf);
  // A lone pair is the lowest of all (P-92.1.4.1).
  if (ligands.length === 3) ligands.push(IMPLICIT_LIGAND);
  const places = ligands.map((ligand) => element.ligands.indexOf(ligand));
  if (places.length !== 4 || new Set(places).size !== 4 || places.includes(-1)) return undefined;
  // Seen from the highest, the others clockwise: seen with the lowest behind, 1 → 2 → 3 runs the same way.
  const letter = element.clockwise !== isOddPermutation(places) ? 'R' : 'S';
  return turnsInMirror(ranking) ? (letter.toLowerCase() as 'r' | 's') : letter;
}

/**
 * E, Z (P-93.4.2.1.1), or M, P (P-93.5.2.3); e, z stand for seqTrans, seqCis, which the mirror exchanges. One ranking for
 * each end, in the order of `element.ends`, without ties.
 */
export function endsLetter(
  element: DoubleBondStereo | AxialStereo,
  rankings: readonly [Ranking, Ranking],
): DescriptorLetter | undefined {
  const higher = rankings.map(({ order }) => (order[0] === undefined ? undefined : ligandOf(order[0])));
  if (higher.includes(undefined)) return undefined;
  const stated =
    element.kind === 'axis'
      ? [element.ligands[0], element.ligands[2]]
      : [element.ligands[0], element.ligands[1]];
  const turned = (higher[0] !== stated[0]) !== (higher[1] !== stated[1]);
  // For an axis the near pair comes first (P-92.1.2.2.1): a, b, c, d clockwise from a is Ra, and Ra is M.
  const letter =
    element.kind === 'double-bond'
      ? element.sameSide !== turned
        ? 'Z'
        : 'E'
      : element.clockwise !== turned
        ? 'M'
        : 'P';
  const mirrored = turnsInMirror(rankings[0]) !== turnsInMirror(rankings[1]);
  return mirrored ? (letter.toLowerCase() as 'e' | 'z' | 'm' | 'p') : letter;
}

/** Whether the mirror image has its ligands in an order of other parity: what rule 5 decided is then reversed. */
function turnsInMirror({ decidedBy }: Ranking): boolean {
  let odd = false;
  let run = 1;
  for (const rule of [...decidedBy, -1]) {
    if (rule === enantiomorphRule) run++;
    else {
      if (Math.floor(run / 2) % 2 === 1) odd = !odd;
      run = 1;
    }
  }
  return odd;
}

function ligandOf({ node }: Branch): number {
  return node.atom < 0 ? IMPLICIT_LIGAND : node.atom;
}

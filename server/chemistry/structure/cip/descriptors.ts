/**
 * Stereodescriptors of a structure: R, S (P-91.2, P-92), r, s for pseudoasymmetric centres (P-93.5), E, Z (P-93.4.2), and
 * M, P for axes (P-93.5.2). A unit whose ranking meets the bound of the search, or whose ligands rank alike, gets none.
 *
 * Not covered: the spreading of charge over Kekulé forms in ionic rings (P-92.1.4.3), and polyhedral centres.
 */
import { bondKinds } from '../canonical-graph.ts';
import type { Molecule, StereoElement, TetrahedralStereo } from '../molecule.ts';
import { AuxiliaryLetters, ligandBranches } from './auxiliary.ts';
import { Ranker, type Ranking } from './rank.ts';
import { constitutionalRanker, type DescriptorLetter } from './rules.ts';
import { type Branch, CipTree, type StepBudget, stepBudget, TreeTooLarge } from './tree.ts';
import { centreLetter, endsLetter } from './unit-letter.ts';

export type { DescriptorLetter } from './rules.ts';

export interface Descriptor {
  readonly element: StereoElement;
  /** Undefined when the ligands rank alike or the search met its bound. */
  readonly letter: DescriptorLetter | undefined;
}

/** A descriptor for each stated element, in the order of `molecule.stereo`. Polyhedral classes get none. */
export function cipDescriptors(molecule: Molecule): Descriptor[] {
  if (molecule.stereo.length === 0) return [];
  const kinds = bondKinds(molecule);
  const budget = stepBudget();
  return molecule.stereo.map((element) => ({ element, letter: letterOf(molecule, element, kinds, budget) }));
}

/** The letter of one arrangement as if it stood in the molecule, whose own statements count for the ligands. */
export function letterOf(
  molecule: Molecule,
  element: StereoElement,
  kinds: readonly number[] = bondKinds(molecule),
  budget: StepBudget = stepBudget(),
): DescriptorLetter | undefined {
  try {
    switch (element.kind) {
      case 'tetrahedral':
        return letterOfCentre(molecule, element, kinds, budget);
      case 'double-bond':
      case 'axis': {
        const first = rankingAtEnd(molecule, element.ends[0], kinds, budget);
        const second = first && rankingAtEnd(molecule, element.ends[1], kinds, budget);
        return first && second && endsLetter(element, [first, second]);
      }
      default:
        return undefined;
    }
  } catch (error) {
    if (error instanceof TreeTooLarge) return undefined;
    throw error;
  }
}

function letterOfCentre(
  molecule: Molecule,
  element: TetrahedralStereo,
  kinds: readonly number[],
  budget: StepBudget,
): DescriptorLetter | undefined {
  const tree = new CipTree(molecule, element.centre, kinds, true, budget);
  const letters = new AuxiliaryLetters(molecule, tree, constitutionalRanker(tree));
  const branches = ligandBranches(tree, tree.root).filter(
    ({ node }) => node.atom < 0 || element.ligands.includes(node.atom),
  );
  const ranking = letters.rank(branches, 0);
  return ranking.tied
    ? letterByReference(letters.rankerBeyond(0), element, ranking)
    : centreLetter(element, ranking);
}

/**
 * Centres whose alike ligands are told apart by what they are linked to, as in chiral spiro compounds (P-93.5.3.1): one
 * of the alike ligands is taken as higher, and any choice must lead to the same letter.
 */
function letterByReference(
  ranker: Ranker,
  element: TetrahedralStereo,
  { order, decidedBy }: Ranking,
  chosen = 0,
): DescriptorLetter | undefined {
  // Two alike hydrogens, or a third choice, can tell nothing.
  if (chosen === 2 || order.some(({ node }, index) => index > 0 && node.atom < 0)) return undefined;
  const start = decidedBy.indexOf(-1);
  let end = start + 1;
  while (decidedBy[end] === -1) end++;
  const letters = new Set<DescriptorLetter | undefined>();
  for (const { node } of order.slice(start, end + 1)) {
    const referred = new Ranker(ranker.tree, [(other) => (other.atom === node.atom ? 1 : 0)], ranker);
    const ranking = referred.rank(order);
    letters.add(
      ranking.tied
        ? letterByReference(referred, element, ranking, chosen + 1)
        : centreLetter(element, ranking),
    );
  }
  return letters.size === 1 ? [...letters][0] : undefined;
}

/** The ligands at one end of a double bond, cumulene or axis, or undefined when they rank alike. */
function rankingAtEnd(
  molecule: Molecule,
  end: number,
  kinds: readonly number[],
  budget: StepBudget,
): Ranking | undefined {
  const tree = new CipTree(molecule, end, kinds, false, budget);
  const branches = ligandBranches(tree, tree.root).filter(
    ({ node }) => !isDoublyBound(molecule, end, node.atom),
  );
  const letters = new AuxiliaryLetters(molecule, tree, constitutionalRanker(tree));
  const ranking = letters.rank(branches satisfies Branch[], 0);
  return ranking.tied || branches.length === 0 ? undefined : ranking;
}

function isDoublyBound(molecule: Molecule, end: number, ligand: number): boolean {
  return molecule.neighbours[end]!.some(
    ({ atom, bond }) => atom === ligand && molecule.bonds[bond]!.order === 2,
  );
}

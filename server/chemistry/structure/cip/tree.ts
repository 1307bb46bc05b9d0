/**
 * The hierarchical digraph of the sequence rules (P-92.1.4): all paths from a root atom, with duplicate atoms for
 * multiple bonds and ring closures. Nodes are made when somebody looks at them, and counted; a search that makes too
 * many gives up instead of guessing.
 */
import { elementWithNumber } from '../../composition/elements.ts';
import { bondKinds, RESONANT } from '../canonical-graph.ts';
import type { Molecule } from '../molecule.ts';

/** Steps of one ranking after which it is given up. */
const stepLimit = 100_000;

/** Steps that the rankings of one structure may take together. */
export interface StepBudget {
  left: number;
}

export function stepBudget(): StepBudget {
  return { left: 400_000 };
}

export interface TreeNode {
  /** The atom of the molecule, also for a duplicate of it; −1 for an implied hydrogen. */
  readonly atom: number;
  readonly parent: TreeNode | undefined;
  /** Why there is a duplicate here: a multiple bond, or a ring that closes. */
  readonly duplicate: false | 'bond' | 'ring';
  /** Bonds from the root. */
  readonly sphere: number;
  /** For a duplicate: the sphere of the atom it stands for. */
  readonly originSphere: number;
  /** Atomic number; the mean over its Kekulé forms for a duplicate in a delocalised ring (P-92.1.4.3.2). */
  readonly atomicNumber: number;
  /** Mass number, or the standard atomic weight where no isotope is stated. */
  readonly mass: number;
  children: readonly TreeNode[] | undefined;
  down: Branch | undefined;
  up: Branch | undefined;
}

/** What hangs on `from` in the direction of `node`; upwards when `node` is the parent of `from`. */
export interface Branch {
  readonly node: TreeNode;
  readonly from: TreeNode;
  onward: readonly Branch[] | undefined;
}

/** Thrown inside the ranking only, and caught there: the tree has grown beyond its bound. */
export class TreeTooLarge extends Error {}

export class CipTree {
  private steps = 0;
  readonly root: TreeNode;

  constructor(
    private readonly molecule: Molecule,
    root: number,
    private readonly kinds: readonly number[] = bondKinds(molecule),
    /**
     * The root is a tetrahedral centre: a double bond of such an atom (P=O, S=O) lends it no duplicates, because the
     * share of d orbitals in the bonds of a quadriligant centre is neglected (Prelog and Helmchen 1982, 3.1; from
     * memory). So sulfoxides and phosphine oxides keep their letters when they are drawn with charges.
     */
    private readonly rootIsCentre = false,
    private readonly budget = stepBudget(),
  ) {
    this.root = this.node(root, undefined, false, 0);
  }

  /** All branches at a node: to its children, and back towards the root. */
  branchesAt(node: TreeNode): Branch[] {
    const below = this.childrenOf(node).map((child) => downTo(child, node));
    return node.parent === undefined ? below : [upFrom(node, node.parent), ...below];
  }

  /** The branches that a branch divides into. */
  onward(branch: Branch): readonly Branch[] {
    branch.onward ??= this.branchesAt(branch.node).filter((other) => other.node !== branch.from);
    return branch.onward;
  }

  /** Counts the work of a search over this tree. */
  step(count = 1): void {
    this.steps += count;
    this.budget.left -= count;
    if (this.steps > stepLimit || this.budget.left < 0) throw new TreeTooLarge();
  }

  childrenOf(node: TreeNode): readonly TreeNode[] {
    node.children ??= this.expand(node);
    return node.children;
  }

  private expand(node: TreeNode): TreeNode[] {
    if (node.duplicate !== false || node.atom < 0) return [];
    const children: TreeNode[] = [];
    const resonant: number[] = [];
    for (const { atom, bond } of this.molecule.neighbours[node.atom]!) {
      const order = this.molecule.bonds[bond]!.order;
      const isParent = node.parent?.atom === atom;
      if (!isParent) {
        const above = ancestorWithAtom(node, atom);
        children.push(
          above === undefined
            ? this.node(atom, node, false, node.sphere + 1)
            : this.node(atom, node, 'ring', above.sphere),
        );
      }
      if (this.kinds[bond] === RESONANT) resonant.push(atom);
      else if (!(this.rootIsCentre && (node.parent === undefined || (isParent && node.sphere === 1))))
        for (let extra = 1; extra < order; extra++)
          children.push(this.node(atom, node, 'bond', isParent ? node.parent.sphere : node.sphere + 1));
    }
    if (resonant.length > 0) {
      const mean =
        resonant.reduce((sum, atom) => sum + this.molecule.atoms[atom]!.atomicNumber, 0) / resonant.length;
      children.push(this.node(resonant[0]!, node, 'bond', node.sphere + 1, mean));
    }
    for (let count = this.molecule.atoms[node.atom]!.hydrogens; count > 0; count--)
      children.push(this.node(-1, node, false, 0));
    return children;
  }

  private node(
    atom: number,
    parent: TreeNode | undefined,
    duplicate: TreeNode['duplicate'],
    originSphere: number,
    mean?: number,
  ): TreeNode {
    this.step();
    const of = atom < 0 ? undefined : this.molecule.atoms[atom]!;
    const atomicNumber = mean ?? of?.atomicNumber ?? 1;
    const weight = elementWithNumber(of?.atomicNumber ?? 1)?.standardAtomicWeight ?? 0;
    return {
      atom,
      parent,
      duplicate,
      sphere: parent === undefined ? 0 : parent.sphere + 1,
      originSphere,
      atomicNumber,
      mass: duplicate !== false || of === undefined || of.isotope === 0 ? weight : of.isotope,
      children: undefined,
      down: undefined,
      up: undefined,
    };
  }
}

function downTo(child: TreeNode, parent: TreeNode): Branch {
  child.down ??= { node: child, from: parent, onward: undefined };
  return child.down;
}

function upFrom(child: TreeNode, parent: TreeNode): Branch {
  child.up ??= { node: parent, from: child, onward: undefined };
  return child.up;
}

function ancestorWithAtom(node: TreeNode, atom: number): TreeNode | undefined {
  for (let above = node.parent; above !== undefined; above = above.parent)
    if (above.atom === atom) return above;
  return undefined;
}

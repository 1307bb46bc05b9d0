/**
 * The hierarchical digraph of the sequence rules (P-92.1.4): all paths from a root atom, with duplicate atoms for
 * multiple bonds and ring closures. Nodes are made when somebody looks at them, and counted; a search that makes too
 * many gives up instead of guessing.
 */
import { elementWithNumber } from '../../composition/elements.ts';
import { bondKinds, RESONANT } from '../canonical-graph.ts';
import type { Molecule } from '../molecule.ts';

/** Nodes made and looked at after which a ranking is given up. */
const stepLimit = 60_000;

export interface TreeNode {
  /** The atom of the molecule, also for a duplicate of it; −1 for an implied hydrogen. */
  readonly atom: number;
  readonly parent: TreeNode | undefined;
  readonly duplicate: boolean;
  /** Bonds from the root. */
  readonly sphere: number;
  /** For a duplicate: the sphere of the atom it stands for; the sphere above for one of a multiple bond. */
  readonly originSphere: number;
  /** Atomic number; the mean over its Kekulé forms for a duplicate in a delocalised ring (P-92.1.4.3.2). */
  readonly atomicNumber: number;
  /** Mass number, or the standard atomic weight where no isotope is stated. */
  readonly mass: number;
  children: readonly TreeNode[] | undefined;
}

/** Thrown inside the ranking only, and caught there: the tree has grown beyond its bound. */
export class TreeTooLarge extends Error {}

export class CipTree {
  private readonly kinds: readonly number[];
  private steps = 0;
  readonly root: TreeNode;

  constructor(
    private readonly molecule: Molecule,
    root: number,
    kinds?: readonly number[],
  ) {
    this.kinds = kinds ?? bondKinds(molecule);
    this.root = this.node(root, undefined, false, 0);
  }

  /** The nodes one bond away, `from` aside; upwards from a node as well as downwards. */
  around(node: TreeNode, from: TreeNode | undefined): readonly TreeNode[] {
    const below = this.childrenOf(node);
    if (node.parent === undefined)
      return from === undefined ? below : below.filter((child) => child !== from);
    return from === node.parent ? below : [node.parent, ...below.filter((child) => child !== from)];
  }

  /** Counts one step of a search over this tree. */
  step(): void {
    if (++this.steps > stepLimit) throw new TreeTooLarge();
  }

  childrenOf(node: TreeNode): readonly TreeNode[] {
    node.children ??= this.expand(node);
    return node.children;
  }

  private expand(node: TreeNode): TreeNode[] {
    if (node.duplicate || node.atom < 0) return [];
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
            : this.node(atom, node, true, above.sphere),
        );
      }
      if (this.kinds[bond] === RESONANT) resonant.push(atom);
      else
        for (let extra = 1; extra < order; extra++)
          children.push(this.node(atom, node, true, isParent ? node.parent!.sphere : node.sphere + 1));
    }
    if (resonant.length > 0) {
      const mean =
        resonant.reduce((sum, atom) => sum + this.molecule.atoms[atom]!.atomicNumber, 0) / resonant.length;
      children.push(this.node(resonant[0]!, node, true, node.sphere + 1, mean));
    }
    for (let count = this.molecule.atoms[node.atom]!.hydrogens; count > 0; count--)
      children.push(this.node(-1, node, false, 0));
    return children;
  }

  private node(
    atom: number,
    parent: TreeNode | undefined,
    duplicate: boolean,
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
      mass: duplicate || of === undefined || of.isotope === 0 ? weight : of.isotope,
      children: undefined,
    };
  }
}

function ancestorWithAtom(node: TreeNode, atom: number): TreeNode | undefined {
  for (let above = node.parent; above !== undefined; above = above.parent)
    if (above.atom === atom) return above;
  return undefined;
}

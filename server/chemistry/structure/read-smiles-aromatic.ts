/**
 * Settles the lower-case part of a SMILES: which unmarked bonds are aromatic, and one valid Kekulé form
 * (OpenSMILES specification, section 3.5).
 */
import { symbolOf } from '../composition/elements.ts';
import { range, type Problem } from '../text.ts';
import { maximumMatching } from './kekulize.ts';
import type { Atom, Bond, MoleculeBuilder } from './molecule.ts';
import type { Mutable, SmilesDraft } from './read-smiles.ts';
import { usualValences } from './valence-model.ts';

export function settleAromatic(draft: SmilesDraft): Problem | undefined {
  const { builder, perhapsAromatic } = draft;
  const { atoms, bonds } = builder;
  if (!atoms.some((atom) => atom.aromatic)) return undefined;

  const bridges = bridgesAmong(builder, perhapsAromatic);
  for (const index of perhapsAromatic) {
    if (!bridges.has(index)) (bonds[index] as Mutable<Bond>).aromatic = true;
  }

  const vertexOf = new Map<number, number>();
  const members: number[] = [];
  const optional: boolean[] = [];
  for (let index = 0; index < atoms.length; index++) {
    const need = atoms[index]!.aromatic ? doubleBondNeed(draft, index) : 'none';
    if (need === 'none') continue;
    vertexOf.set(index, members.length);
    members.push(index);
    optional.push(need === 'possible');
  }
  const adjacency = members.map((atom) =>
    builder.neighbours[atom]!.filter(
      (neighbour) => bonds[neighbour.bond]!.aromatic && vertexOf.has(neighbour.atom),
    ).map((neighbour) => vertexOf.get(neighbour.atom)!),
  );
  const { partner } = maximumMatching(adjacency, optional);
  for (let vertex = 0; vertex < members.length; vertex++) {
    const other = partner[vertex]!;
    if (other === -1) {
      if (!optional[vertex]) return cannotKekulize(builder, members[vertex]!);
    } else if (vertex < other) {
      const link = builder.neighbours[members[vertex]!]!.find(
        (neighbour) => neighbour.atom === members[other],
      )!;
      (bonds[link.bond] as Mutable<Bond>).order = 2;
    }
  }
  return undefined;
}

/** Whether an aromatic atom must take a double bond of the ring, may, or has no valence left for one. */
function doubleBondNeed({ builder, implied }: SmilesDraft, index: number): 'needed' | 'possible' | 'none' {
  const atom = builder.atoms[index]!;
  const valences = atom.atomicNumber === 0 ? undefined : usualValences(atom.atomicNumber, atom.charge);
  if (valences === undefined) return 'possible';
  let bonds = implied[index] ? 0 : atom.hydrogens;
  for (const neighbour of builder.neighbours[index]!) {
    const { order } = builder.bonds[neighbour.bond]!;
    // A carbon with a double bond written out has its one double bond.
    if (order > 1 && atom.atomicNumber === 6) return 'none';
    bonds += order;
  }
  const valence = valences.find((usual) => usual >= bonds);
  // A valence that is full leaves a lone pair (pyrrole, furan) or an empty orbital (borole) for the ring.
  return valence === undefined || valence === bonds ? 'none' : 'needed';
}

/** The bonds of `among` that lie on no ring made of such bonds and of those written aromatic. */
function bridgesAmong(builder: MoleculeBuilder, among: ReadonlySet<number>): Set<number> {
  const usable = (bond: number) => among.has(bond) || builder.bonds[bond]!.aromatic;
  const { atoms, neighbours } = builder;
  const order = new Int32Array(atoms.length).fill(-1);
  const low = new Int32Array(atoms.length);
  const by = new Int32Array(atoms.length);
  const next = new Int32Array(atoms.length);
  const bridges = new Set<number>();
  const stack: number[] = [];
  let clock = 0;
  for (let root = 0; root < atoms.length; root++) {
    if (order[root] !== -1 || !atoms[root]!.aromatic) continue;
    order[root] = low[root] = clock++;
    by[root] = -1;
    stack.push(root);
    while (stack.length > 0) {
      const atom = stack[stack.length - 1]!;
      const neighbour = neighbours[atom]![next[atom]!++];
      if (neighbour === undefined) {
        stack.pop();
        const below = stack[stack.length - 1];
        if (below === undefined) continue;
        if (low[atom]! < low[below]!) low[below] = low[atom]!;
        if (low[atom]! > order[below]!) bridges.add(by[atom]!);
      } else if (neighbour.bond !== by[atom] && usable(neighbour.bond)) {
        const seen = order[neighbour.atom]!;
        if (seen === -1) {
          order[neighbour.atom] = low[neighbour.atom] = clock++;
          by[neighbour.atom] = neighbour.bond;
          stack.push(neighbour.atom);
        } else if (seen < low[atom]!) low[atom] = seen;
      }
    }
  }
  return bridges;
}

function cannotKekulize(builder: MoleculeBuilder, atom: number): Problem {
  const system = aromaticSystemOf(builder, atom);
  const bareNitrogen = system.find((member) => {
    const { atomicNumber, hydrogens, charge } = builder.atoms[member]! as Mutable<Atom>;
    return atomicNumber === 7 && hydrogens === 0 && charge === 0 && builder.neighbours[member]!.length === 2;
  });
  const advice =
    bareNitrogen === undefined
      ? 'Check the number of ring atoms, and whether an atom needs a hydrogen or a charge in brackets.'
      : 'If a nitrogen of this ring carries a hydrogen, as in pyrrole or indole, write it [nH].';
  const at = bareNitrogen ?? atom;
  return {
    range: range(builder.atoms[at]!.range.start, builder.atoms[at]!.range.end),
    message: `Single and double bonds cannot be placed in this aromatic ring system: ${symbolOf(builder.atoms[atom]!.atomicNumber)} is left with a free valence. ${advice}`,
  };
}

function aromaticSystemOf(builder: MoleculeBuilder, start: number): number[] {
  const seen = new Set([start]);
  for (const atom of seen) {
    for (const neighbour of builder.neighbours[atom]!) {
      if (builder.bonds[neighbour.bond]!.aromatic) seen.add(neighbour.atom);
    }
  }
  return [...seen];
}

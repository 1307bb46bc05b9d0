/**
 * Settles the lower-case part of a SMILES: which unmarked bonds are aromatic, and one valid Kekulé form
 * (OpenSMILES specification, section 3.5).
 */
import { symbolOf } from '../composition/elements.ts';
import { range, type Problem } from '../text.ts';
import { maximumMatching } from './kekulize.ts';
import type { Atom, Bond, MoleculeBuilder } from './molecule.ts';
import { cyclicBonds } from './rings.ts';
import type { Mutable, SmilesDraft } from './smiles-draft.ts';
import { usualValences } from './valence-model.ts';

export function settleAromatic(draft: SmilesDraft): Problem | undefined {
  const { builder, perhapsAromatic } = draft;
  const { atoms, bonds } = builder;
  if (!atoms.some((atom) => atom.aromatic)) return undefined;

  // An unmarked bond is aromatic on a ring of such bonds, and single between two rings (biphenyl).
  if (perhapsAromatic.size > 0) {
    const inCycle = cyclicBonds(builder, (bond) => perhapsAromatic.has(bond) || bonds[bond]!.aromatic);
    for (const index of perhapsAromatic) (bonds[index] as Mutable<Bond>).aromatic = inCycle[index]!;
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

/** Whether two structures are one compound, leaving space aside. */
import { equalCompositions } from '../../chemistry/composition/compare.ts';
import { isMetal } from '../../chemistry/composition/elements.ts';
import { compositionOf } from '../../chemistry/structure/composition-of.ts';
import type { Molecule } from '../../chemistry/structure/molecule.ts';
import type { ToolkitFactsOf } from '../facts.ts';
import { protonFree } from './proton-free.ts';
import { canonicalSmiles, constitutionalSmiles } from '../../chemistry/structure/canonical-smiles.ts';

/** The same atoms connected alike; salts written as ions or as acid and base are the same. */
export function sameConstitution(first: Molecule, second: Molecule): boolean {
  if (!equalCompositions(compositionOf(first), compositionOf(second))) return false;
  return (
    constitutionalSmiles(first) === constitutionalSmiles(second) ||
    canonicalSmiles(protonFree(first)) === canonicalSmiles(protonFree(second))
  );
}

export type Constitutions = 'same' | 'different' | 'undecided';

/**
 * As `sameConstitution`, with second thoughts before two structures of one formula are called different: mobile
 * hydrogens (imidazoles, amidines, purines) are one compound, which the standard InChI knows, and bonds to metals are
 * drawn in too many ways to be compared. `undecided` while the toolkit has not answered.
 */
export function compareConstitutions(
  first: Molecule,
  second: Molecule,
  toolkit: ToolkitFactsOf,
): Constitutions {
  if (!equalCompositions(compositionOf(first), compositionOf(second))) return 'different';
  if (sameConstitution(first, second)) return 'same';
  if ([...first.atoms, ...second.atoms].some((atom) => isMetal(atom.atomicNumber))) return 'undecided';
  const [one, other] = [toolkit(constitutionalSmiles(first)), toolkit(constitutionalSmiles(second))];
  if (one === 'pending' || other === 'pending') return 'undecided';
  if (one === 'unavailable' || other === 'unavailable') return 'different';
  return one.inchi === other.inchi ? 'same' : 'different';
}

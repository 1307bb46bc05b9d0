/** The statements of one entry that each say by themselves what the compound is made of. */
import type { Composition } from '../../chemistry/composition/composition.ts';
import { compositionOf } from '../../chemistry/structure/composition-of.ts';
import type { CompoundModel } from '../model.ts';
import { agreeing } from './differences.ts';
import { fitsMolarMass } from './masses.ts';

export interface Witness {
  /** As in “the SMILES says …”. */
  readonly what: 'SMILES' | 'name' | 'formula';
  readonly composition: Composition;
}

/** From the most telling to the least. A name whose readings differ in composition says nothing here. */
export function witnesses(model: CompoundModel): Witness[] {
  const found: Witness[] = [];
  const { structure, structureComposition, formula, valenceProblems } = model;
  // An atom `*` stands for anything, and an impossible structure for nothing.
  if (
    structure !== undefined &&
    valenceProblems.length === 0 &&
    structure.atoms.every((atom) => atom.atomicNumber !== 0)
  ) {
    found.push({ what: 'SMILES', composition: structureComposition! });
  }
  const named = nameComposition(model);
  if (named !== undefined) found.push({ what: 'name', composition: named });
  if (formula !== undefined) found.push({ what: 'formula', composition: formula });
  return found;
}

/** What all readings of the name are made of, or undefined when they differ or there are none. */
export function nameComposition({ name }: CompoundModel): Composition | undefined {
  const [first, ...others] = (name?.readings ?? []).map((reading) => compositionOf(reading.molecule));
  if (first === undefined) return undefined;
  return others.every((other) => agreeing(first, other) && agreeing(other, first)) ? first : undefined;
}

/** Which of the other statements agree with a composition: `name`, `molar mass`. */
export function agreeingStatements(
  model: CompoundModel,
  composition: Composition,
  except: readonly string[],
): string[] {
  const agreed: string[] = witnesses(model)
    .filter((witness) => !except.includes(witness.what) && agreeing(composition, witness.composition))
    .map((witness) => witness.what);
  const mass = model.entry.molarMass?.read.value;
  if (mass !== undefined && !except.includes('molar mass')) {
    if (fitsMolarMass(mass, composition, model.settings.tolerance.molarMass) === true)
      agreed.push('molar mass');
  }
  return agreed;
}

/** Names whose last words say what became of the compound named first: `acetone oxime`, `styrene oxide`. */
import type { Unit } from '../tree.ts';
import { functionWords } from '../vocabulary/functions.ts';
import { buildAcidAmide, buildAcidHalide, buildEsterOf, buildSaltOf } from './acid-derivatives.ts';
import { buildAlcoholDerivative, buildGlycolOf } from './alcohol-derivatives.ts';
import type { Sorted } from './build-sentence.ts';
import { buildUnit } from './build-unit.ts';
import { buildCarbonylClass, buildCarbonylDerivative } from './carbonyl-derivatives.ts';
import { Choices } from './choices.ts';
import { Draft } from './draft.ts';
import { oxideOf } from './oxides.ts';
import { buildWord } from './words.ts';

/** True when what the unit names bears no charge, so that it is no ion of a salt. */
export function isNeutral(unit: Unit): boolean {
  const draft = new Draft();
  buildUnit(unit, draft, new Choices());
  return draft.atoms.length > 0 && draft.atoms.reduce((sum, atom) => sum + atom.charge, 0) === 0;
}

/** Puts the parent with what follows it into the draft; false when they do not go together. */
export function buildAfterParent(words: Sorted, draft: Draft, choices: Choices): boolean {
  const { parents, afters, metals, functional, classWord, derivative } = words;
  const [parent, acid] = parents;
  if (!parent || words.radicals.length + words.hydrogens + words.oxides.length > 0) return false;
  if (metals.length > 0)
    return (
      classWord === 'salt' &&
      afters.length + parents.length === 1 &&
      buildSaltOf(parent, metals, draft, choices)
    );
  if (derivative) {
    if (parents.length > 1 || functional) return false;
    return derivative.unit.derivativeOf === 'carbonyl'
      ? buildCarbonylDerivative(parent, derivative, afters, draft, choices)
      : afters.length === 0 && buildAcidAmide(parent, derivative, draft, choices);
  }
  if (classWord !== undefined) {
    if (parents.length > 1 || functional || classWord === 'salt') return false;
    return classWord === 'ester'
      ? buildEsterOf(parent, afters, draft, choices)
      : buildCarbonylClass(classWord, parent, afters, draft, choices);
  }
  if (!functional) {
    const alone = afters.length === 0 && parents.length === 2;
    return alone && buildAlcoholDerivative(parent, [], acid, draft, choices);
  }
  const [word, , sites] = functionWords[functional.index]!;
  if (word === 'ether')
    return functional.count === undefined && afters.length > 0 && parents.length < 3
      ? buildAlcoholDerivative(parent, afters, acid, draft, choices)
      : false;
  if (afters.length > 0 || parents.length > 1 || parent.count > 1) return false;
  if (word === 'glycol') return buildGlycolOf(parent, draft, choices);
  if (sites.length === 1) return buildAcidHalide(parent, functional, draft, choices);
  return buildWord(parent.unit, draft, choices) !== undefined && oxideOf(word, functional.count ?? 1, draft);
}

/** A compound of which only the formula is known. */
import type { Composition } from '../chemistry/composition/composition.ts';
import { hillFormula } from '../chemistry/composition/format-formula.ts';
import { degreeOfUnsaturation } from '../chemistry/composition/unsaturation.ts';
import type { Check } from './finding.ts';

export const check: Check = {
  id: 'formula-only',
  group: 'identity',
  severity: 'warning',
  summary: 'A compound of which only the formula is known.',
  why: 'A formula says what a compound is made of, not how: isomers share it and differ in everything else.',
  action: 'Add a name or a SMILES. If the structure is not known yet, accept this with that reason.',
  source: 'Common practice, no source.',
  examples: {
    bad: ['```compound\nlabel: 1\nformula: C4H10O\nbp: 117 °C\n```'],
    good: [
      '```compound\nlabel: 1\nname: butan-1-ol\nformula: C4H10O\n```',
      '```compound\nlabel: 2\nformula: CH2Cl2\n```',
      '```compound\nlabel: 3\nformula: K2CO3\n```',
    ],
  },
  run(model, report) {
    if (model.kind !== 'compound' || model.formula === undefined) return;
    const { name, smiles, inchi, inchiKey, cas, synonyms } = model.entry;
    if ([name, smiles, inchi, inchiKey, cas].some((value) => value !== undefined)) return;
    if (synonyms.length > 0 || model.isomers === 'unknown' || !hasIsomers(model.formula)) return;
    report({
      range: model.entry.formula!.text.range,
      message:
        `Only the formula ${hillFormula(model.formula)} says which compound this is, and isomers share it: they differ ` +
        'in boiling point, reactivity and hazards. Add a name or a SMILES.',
    });
  },
};

/**
 * Salts and other inorganic formulas stand for one substance by custom, and the smallest organic molecules have no
 * isomer: one carbon with monovalent partners, or up to three saturated carbons with at most what keeps them alike.
 */
function hasIsomers(composition: Composition): boolean {
  const carbons = composition.counts.get('C') ?? 0;
  const hydrogens = (composition.counts.get('H') ?? 0) + (composition.counts.get('2H') ?? 0);
  if (carbons === 0 || hydrogens === 0) return carbons > 3;
  if (degreeOfUnsaturation(composition) !== 0) return carbons > 1 || composition.counts.size > 2;
  const others = [...composition.counts].filter(([kind]) => kind !== 'C' && kind !== 'H' && kind !== '2H');
  const otherAtoms = others.reduce((sum, [, count]) => sum + count, 0);
  const monovalent = others.every(([kind]) => ['F', 'Cl', 'Br', 'I'].includes(kind));
  if (monovalent)
    return !(carbons === 1 || (carbons === 2 && otherAtoms <= 1) || (carbons === 3 && otherAtoms === 0));
  return !(carbons === 1 && otherAtoms === 1);
}

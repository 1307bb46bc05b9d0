/** Formula against structure, or against the name where there is no structure. */
import { compositionDifference } from '../chemistry/composition/compare.ts';
import { hillFormula } from '../chemistry/composition/format-formula.ts';
import { readFormulaDetailed } from '../chemistry/composition/read-formula.ts';
import type { Composition } from '../chemistry/composition/composition.ts';
import type { TextRange } from '../chemistry/text.ts';
import type { EntryValue } from '../notebook/model.ts';
import type { Check } from './finding.ts';
import { agreeing, differenceInWords, usualDifference } from './shared/differences.ts';
import { inDocument, listed, replacement } from './shared/values.ts';
import { agreeingStatements, witnesses } from './shared/witnesses.ts';

export const check: Check = {
  id: 'formula-mismatch',
  group: 'identity',
  severity: 'error',
  summary: 'A formula that is not that of the structure or name.',
  why: 'Molar mass, amounts and yields follow from the formula; one wrong atom goes through the whole page.',
  action: 'Correct whichever is wrong; where the formula is, the fix writes the computed one.',
  source: 'Counting atoms; order of Hill, J. Am. Chem. Soc. 1900, 22, 478.',
  examples: {
    bad: [
      '```compound\nlabel: 4\nformula: C9H12O3\nSMILES: COc1ccc(cc1)C(C)O\nisomers: racemate\n```',
      '```compound\nlabel: 5\nname: ethyl acetate\nformula: C4H8O\n```',
    ],
    good: [
      '```compound\nlabel: 4\nformula: C9H12O2\nSMILES: COc1ccc(cc1)C(C)O\nisomers: racemate\n```',
      '```compound\nlabel: 5\nformula: CH3CO2Et\nSMILES: CCOC(C)=O\n```',
      '```compound\nlabel: 6\nformula: C2H8ClN\nSMILES: C[NH2+]C.[Cl-]\n```',
    ],
  },
  run(model, report) {
    if (model.kind !== 'compound' || model.formula === undefined) return;
    const value = model.entry.formula!;
    const stated = model.formula;
    const other = witnesses(model).find((witness) => witness.what !== 'formula');
    if (other === undefined || agreeing(stated, other.composition)) return;
    const computed = hillFormula(other.composition);
    const withFormula = agreeingStatements(model, stated, ['formula', other.what]);
    const withOther = agreeingStatements(model, other.composition, ['formula', other.what]);
    const parts = [
      `The formula says ${hillFormula(stated)}, but the ${other.what} ${other.what === 'name' ? 'means' : 'is'} ${computed}: ` +
        `${differenceInWords(stated, other.composition)}.`,
      usualDifference(stated, other.composition) ?? '',
      sideTaken(withFormula, 'formula', other.what),
      sideTaken(withOther, other.what, 'formula'),
      withFormula.length + withOther.length === 0
        ? 'Molar mass and yields follow from the formula: correct whichever is wrong.'
        : '',
    ];
    report({
      range: differingPiece(value, stated, other.composition) ?? value.text.range,
      message: parts.filter((part) => part !== '').join(' '),
      fixes: [replacement(value, computed, `Write ${computed}, the formula of the ${other.what}`)],
      related: [
        {
          range: (other.what === 'SMILES' ? model.entry.smiles! : model.entry.name!).text.range,
          message: `This ${other.what} is ${computed}.`,
        },
      ],
    });
  },
};

function sideTaken(statements: readonly string[], side: string, suspect: string): string {
  if (statements.length === 0) return '';
  const who = listed(statements);
  return `The ${who} ${statements.length === 1 ? 'agrees' : 'agree'} with the ${side}: look at the ${suspect} first.`;
}

/** The one symbol with its count that differs, when it is one and stands in the text once. */
function differingPiece(
  value: EntryValue<Composition>,
  stated: Composition,
  other: Composition,
): TextRange | undefined {
  const kinds = [...compositionDifference(stated, other).keys()];
  if (kinds.length !== 1 || stated.charge !== other.charge) return undefined;
  const pieces = readFormulaDetailed(value.text.text).value?.pieces ?? [];
  const same = pieces.filter((piece) => piece.symbol === kinds[0]);
  return same.length === 1 && same[0]!.plain ? inDocument(value, same[0]!.range) : undefined;
}

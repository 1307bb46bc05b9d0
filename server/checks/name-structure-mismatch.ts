/** Name against SMILES: constitution. */
import { equalCompositions } from '../chemistry/composition/compare.ts';
import { hillFormula } from '../chemistry/composition/format-formula.ts';
import { compositionOf } from '../chemistry/structure/composition-of.ts';
import type { Check } from './finding.ts';
import { compareConstitutions } from './shared/constitution.ts';
import { differenceInWords, usualDifference } from './shared/differences.ts';
import { listed, quoted } from './shared/values.ts';
import { agreeingStatements, nameComposition } from './shared/witnesses.ts';

export const check: Check = {
  id: 'name-structure-mismatch',
  group: 'identity',
  severity: 'error',
  summary: 'A name that is not that of the structure.',
  why: 'Name and structure are the two things a reader goes by; here they are two compounds.',
  action: 'Find out which of the two was made, and correct the other.',
  source: 'IUPAC recommendations 2013 (the structure that the name stands for).',
  needsToolkit: true,
  examples: {
    bad: [
      '```compound\nlabel: 1\nname: 1-bromobutane\nSMILES: CCC(C)Br\nisomers: racemate\n```',
      '```compound\nlabel: 2\nname: ethyl acetate\nSMILES: CCOC=O\n```',
    ],
    good: [
      '```compound\nlabel: 1\nname: 1-bromobutane\nSMILES: CCCCBr\n```',
      '```compound\nlabel: 2\nname: nitrobenzene\nSMILES: c1ccccc1N(=O)=O\n```',
      '```compound\nlabel: 3\nname: diethylamine hydrochloride\nSMILES: CC[NH2+]CC.[Cl-]\n```',
    ],
  },
  run(model, report, toolkit) {
    if (model.kind !== 'compound' || model.structure === undefined || model.name === undefined) return;
    const { structure } = model;
    if (model.structureSmiles === undefined || structure.atoms.some((atom) => atom.atomicNumber === 0))
      return;
    const verdicts = model.name.readings.map((reading) =>
      compareConstitutions(structure, reading.molecule, toolkit),
    );
    if (verdicts.length === 0 || verdicts.some((verdict) => verdict !== 'different')) return;
    const value = model.entry.name!;
    const drawn = model.structureComposition!;
    const named = nameComposition(model) ?? compositionOf(model.name.readings[0]!.molecule);
    const isomers = equalCompositions(drawn, named);
    const forName = isomers ? [] : agreeingStatements(model, named, ['name', 'SMILES']);
    const forSmiles = isomers ? [] : agreeingStatements(model, drawn, ['name', 'SMILES']);
    report({
      range: value.text.range,
      message: [
        isomers
          ? `${quoted(value.text.text)} and the SMILES are both ${hillFormula(drawn)}, but their atoms are connected ` +
            'differently: they are isomers, two compounds.'
          : `${quoted(value.text.text)} is ${hillFormula(named)}, but the SMILES is ${hillFormula(drawn)}: the name has ` +
            `${differenceInWords(named, drawn)}.`,
        (isomers ? undefined : usualDifference(named, drawn)) ?? '',
        side(forName, 'name'),
        side(forSmiles, 'SMILES'),
        'Find out which of the two was made, and correct the other.',
      ]
        .filter((part) => part !== '')
        .join(' '),
      related: [
        { range: model.entry.smiles!.text.range, message: `This structure is ${hillFormula(drawn)}.` },
      ],
    });
  },
};

function side(statements: readonly string[], what: string): string {
  if (statements.length === 0) return '';
  return `The ${listed(statements)} ${statements.length === 1 ? 'agrees' : 'agree'} with the ${what}.`;
}

/** A name that could not be read to its last character. */
import type { Fix } from '../chemistry/text.ts';
import type { Check } from './finding.ts';
import type { CompoundModel } from './model.ts';
import { inDocument, quoted } from './shared/values.ts';

export const check: Check = {
  id: 'name-unknown',
  group: 'identity',
  severity: 'warning',
  summary: 'A name that cannot be read; information only where something else identifies the compound.',
  why: 'A name that was not understood was not checked: a slip in it goes on into labels and papers.',
  action: 'Correct the underlined word, or give the structure as SMILES; put the house name into `synonyms`.',
  source: 'IUPAC recommendations 2013 and the general nomenclature that the vocabulary holds.',
  examples: {
    bad: ['```compound\nlabel: 1\nname: qwortyl acetate\n```'],
    good: [
      '```compound\nlabel: 1\nname: ethyl acetate\n```',
      '```compound\nlabel: 2\nname: hexanes\nnotes: solvent for the column\n```',
    ],
  },
  run(model, report) {
    if (model.kind !== 'compound' || model.nameReading?.kind !== 'unknown') return;
    const value = model.entry.name!;
    const { range, message, suggestions } = model.nameReading;
    const identified = identifiedBy(model);
    const place = inDocument(value, range.end > range.start ? range : wholeOf(value.text.text));
    const fixes: Fix[] = suggestions.slice(0, 5).map((suggestion) => ({
      title: `Write ${quoted(suggestion)}`,
      safe: false,
      edits: [{ range: place, newText: suggestion }],
    }));
    report({
      range: place,
      severity: identified === undefined ? 'warning' : 'information',
      message:
        `${message} ` +
        (identified === undefined
          ? 'Nothing else in this block says which compound it is: correct the name, or add a SMILES.'
          : `The ${identified} says which compound it is; the name itself is not checked.`),
      fixes,
    });
  },
};

function wholeOf(text: string) {
  return { start: 0, end: text.length };
}

function identifiedBy({ entry, structure }: CompoundModel): string | undefined {
  if (structure !== undefined) return 'SMILES';
  if (entry.inchi?.read.value !== undefined) return 'InChI';
  if (entry.inchiKey?.read.value !== undefined) return 'InChIKey';
  return entry.cas?.read.value !== undefined ? 'CAS RN' : undefined;
}

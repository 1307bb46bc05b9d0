/** What the report says of one entry, before drawings and findings join it. */
import { prettyFormula } from '../chemistry/composition/format-formula.ts';
import type { Composition } from '../chemistry/composition/composition.ts';
import { averageMass, monoisotopicMass } from '../chemistry/composition/mass.ts';
import { degreeOfUnsaturation } from '../chemistry/composition/unsaturation.ts';
import { countInWords, type NameReading } from '../chemistry/nomenclature/reading.ts';
import { canonicalSmiles } from '../chemistry/structure/canonical-smiles.ts';
import { compositionOf } from '../chemistry/structure/composition-of.ts';
import type { Molecule } from '../chemistry/structure/molecule.ts';
import { valenceProblems } from '../chemistry/structure/valence.ts';
import type { CompoundModel, EntryModel } from '../checks/model.ts';
import type { Field } from '../notebook/model.ts';
import { mostAtoms } from '../toolkit/toolkit.ts';

export interface EntryDescription {
  readonly label: string | undefined;
  readonly heading: string;
  readonly formula: string | undefined;
  readonly drawings: readonly { readonly smiles: string; readonly caption: string }[];
  /** Canonical SMILES, when the entry is exactly one structure. */
  readonly identity: string | undefined;
  readonly facts: readonly (readonly [string, string])[];
  readonly remarks: readonly string[];
  readonly fields: readonly (readonly [string, readonly string[]])[];
  readonly accepted: readonly { readonly check: string; readonly reason: string }[];
}

/** Drawn side by side; of more only the names are listed. */
const mostDrawn = 6;

/** Shown elsewhere on the card, or told by the drawing. */
const notRepeated = new Set(['label', 'name', 'scheme', 'allow', 'SMILES', 'InChI']);

export function describeEntry(model: EntryModel): EntryDescription {
  const { entry } = model;
  const common = {
    label: textOrNone(entry.label?.text.text),
    fields: entry.fields.filter((field) => !notRepeated.has(field.key ?? '')).map(fieldRow),
    accepted: entry.allow.flatMap(({ checkId, reason }) =>
      reason === undefined ? [] : [{ check: checkId, reason }],
    ),
  };
  if (model.kind === 'reaction') {
    return {
      ...common,
      heading: textOrNone(model.entry.scheme?.value.text) ?? 'Reaction without a scheme',
      formula: undefined,
      drawings: [],
      identity: undefined,
      facts: [],
      remarks: [],
    };
  }
  return { ...common, ...describeCompound(model) };
}

type CompoundPart = Omit<EntryDescription, 'label' | 'fields' | 'accepted'>;

function describeCompound(model: CompoundModel): CompoundPart {
  const name = textOrNone(model.entry.name?.text.text);
  // Nobody draws a structure beyond that, and its canonical form would take minutes; one that cannot exist is not drawn.
  const structures = structuresOf(model).filter(
    ({ molecule }) => molecule.atoms.length <= mostAtoms && valenceProblems(molecule).length === 0,
  );
  const [only] = structures;
  const composition =
    only !== undefined && structures.every((each) => sameFormula(each.molecule, only.molecule))
      ? compositionOf(only.molecule)
      : model.formula;
  return {
    heading: name ?? textOrNone(model.entry.formula?.text.text) ?? 'Compound without a name',
    formula: composition && prettyFormula(composition),
    drawings: structures
      .slice(0, mostDrawn)
      .map(({ molecule, caption }) => ({ smiles: canonicalSmiles(molecule), caption })),
    identity: structures.length === 1 ? canonicalSmiles(only!.molecule) : undefined,
    facts: composition === undefined ? [] : massFacts(composition),
    remarks: name === undefined || model.nameReading === undefined ? [] : readingRemarks(model.nameReading),
  };
}

/** From the SMILES, or else everything that the name can mean. */
function structuresOf(model: CompoundModel): { molecule: Molecule; caption: string }[] {
  const name = model.entry.name?.text.text ?? '';
  if (model.structure !== undefined) return [{ molecule: model.structure, caption: name }];
  const reading = model.nameReading;
  if (reading?.kind === 'mixture') {
    return reading.components.map((each) => ({ molecule: each.molecule, caption: each.name }));
  }
  return (model.name?.readings ?? []).map((each) => ({ molecule: each.molecule, caption: each.name }));
}

function sameFormula(first: Molecule, second: Molecule): boolean {
  return prettyFormula(compositionOf(first)) === prettyFormula(compositionOf(second));
}

function massFacts(composition: Composition): [string, string][] {
  const average = averageMass(composition);
  const exact = monoisotopicMass(composition);
  const unsaturation = degreeOfUnsaturation(composition);
  return [
    ...(average === undefined ? [] : [['molar mass', `${average.toFixed(2)} g/mol`] as [string, string]]),
    ...(exact === undefined ? [] : [['monoisotopic mass', `${exact.toFixed(4)} u`] as [string, string]]),
    ...(unsaturation === undefined ? [] : [['unsaturation', String(unsaturation)] as [string, string]]),
  ];
}

function readingRemarks(reading: NameReading): string[] {
  switch (reading.kind) {
    case 'unknown':
      return [`The name is not understood: ${reading.message}`];
    case 'mixture':
      return [`A mixture: ${reading.message}`];
    case 'understood': {
      const count = reading.count ?? reading.readings.length;
      if (count > 1) {
        const names = reading.readings.map((each) => each.name).join('; ');
        return [
          `The name can mean ${countInWords(reading)} structures: ${names}${count > reading.readings.length ? '; …' : '.'}`,
        ];
      }
      return reading.readings.flatMap(({ stereoisomers, stereoisomerCount }) => {
        const open = stereoisomerCount ?? stereoisomers.length;
        if (open === 0) return [];
        const names = stereoisomers.map((each) => each.name).join('; ');
        return [
          `The name leaves ${open} stereoisomers open: ${names}${open > stereoisomers.length ? '; …' : '.'}`,
        ];
      });
    }
  }
}

function fieldRow(field: Field): readonly [string, readonly string[]] {
  const values = [
    ...(field.value.text === '' ? [] : [field.value.text]),
    ...field.items.map((item) => item.text),
  ];
  return [field.keyText, values];
}

function textOrNone(text: string | undefined): string | undefined {
  return text === undefined || text.trim() === '' ? undefined : text;
}

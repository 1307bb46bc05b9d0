/** Recorded InChI against the structure, layer by layer. */
import { compositionDifference } from '../chemistry/composition/compare.ts';
import type { Composition } from '../chemistry/composition/composition.ts';
import { hillFormula } from '../chemistry/composition/format-formula.ts';
import { partsOfKind } from '../chemistry/composition/mass.ts';
import { readFormula } from '../chemistry/composition/read-formula.ts';
import type { TextRange } from '../chemistry/text.ts';
import type { EntryValue } from '../notebook/model.ts';
import type { Check, Report } from './finding.ts';
import type { CompoundModel } from './model.ts';
import { definiteStructure, factsAsDrawn, leavesStereoOpenOnPurpose } from './shared/identity.ts';
import {
  areMirrorImages,
  firstDifference,
  rangeOf,
  readInchi,
  textOf,
  type Inchi,
  type LayerKind,
} from './shared/inchi-layers.ts';
import { inDocument, replacement } from './shared/values.ts';

export const check: Check = {
  id: 'inchi-mismatch',
  group: 'identity',
  severity: 'error',
  summary: 'An InChI that is not that of the structure or name.',
  why: 'Data bases and colleagues look the compound up by its identifier and would find another one.',
  action: 'Take the computed InChI, or correct the structure if that is wrong.',
  source: 'IUPAC International Chemical Identifier, technical manual 1.06 (2020).',
  needsToolkit: true,
  examples: {
    bad: [
      '```compound\nlabel: 1\nSMILES: CCO\nInChI: InChI=1S/C3H8O/c1-2-3-4/h4H,2-3H2,1H3\n```',
      '```compound\nlabel: 2\nSMILES: C[C@@H](O)CC\nInChI: InChI=1S/C4H10O/c1-3-4(2)5/h4-5H,3H2,1-2H3/t4-/m0/s1\n```',
    ],
    good: [
      '```compound\nlabel: 1\nSMILES: CCO\nInChI: InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3\n```',
      '```compound\nlabel: 2\nSMILES: C[C@@H](O)CC\nisomers: racemate\nInChI: InChI=1S/C4H10O/c1-3-4(2)5/h4-5H,3H2,1-2H3\n```',
    ],
  },
  run(model, report, toolkit) {
    if (model.kind !== 'compound') return;
    const value = model.entry.inchi;
    const recorded = value?.read.value === undefined ? undefined : readInchi(value.read.value);
    if (value === undefined || recorded === undefined) return;
    const structure = definiteStructure(model);
    if (structure === undefined) {
      compareFormulas(model, value, recorded, report);
      return;
    }
    const facts = toolkit(structure.smiles);
    const computed = typeof facts === 'string' ? undefined : readInchi(facts.inchi);
    if (computed === undefined || typeof facts === 'string') return;
    const kind = firstDifference(recorded, computed);
    if (kind === undefined || (kind === 'stereo' && isByConvention(model, recorded, computed))) return;
    if (kind === 'stereo') {
      const asDrawn = factsAsDrawn(structure, toolkit);
      if (asDrawn === 'pending') return;
      const drawn = asDrawn === 'unavailable' ? undefined : readInchi(asDrawn.inchi);
      if (drawn !== undefined && firstDifference(recorded, drawn) === undefined) return;
    }
    const place = rangeOf(recorded, kind);
    const onlyOpen = kind === 'stereo' && (isOpen(recorded) || isOpen(computed));
    report({
      range: place === undefined ? value.text.range : placed(value, place),
      ...(onlyOpen ? { severity: 'warning' as const } : {}),
      message:
        `${differing(kind, recorded, computed, structure.from)} ` +
        'Whoever looks the compound up by its InChI finds another one: take the computed InChI, or correct the structure.',
      fixes:
        isOpen(computed) && onlyOpen ? [] : [replacement(value, facts.inchi, 'Write the computed InChI')],
    });
  },
};

/** Without a structure the formula layer can still be held against the formula field. */
function compareFormulas(
  { formula, entry }: CompoundModel,
  value: EntryValue<string>,
  recorded: Inchi,
  report: (found: Report) => void,
): void {
  const layer = recorded.layers.find(({ key }) => key === 'formula');
  // The layer leaves out the protons and charges that follow it.
  if (formula === undefined || layer === undefined || textOf(recorded, 'charge') !== '') return;
  const stated = readFormula(layer.text).value;
  if (stated === undefined || compositionDifference(unlabelled(stated), unlabelled(formula)).size === 0)
    return;
  report({
    range: placed(value, layer.range),
    message:
      `This InChI is that of ${layer.text}, but the formula says ${hillFormula(formula)}. ` +
      'Nobody can tell which compound is meant: correct whichever is wrong.',
    related: [{ range: entry.formula!.text.range, message: 'The formula stands here.' }],
  });
}

/** The layer counts labelled atoms with their elements. */
function unlabelled({ counts, charge }: Composition): Composition {
  const merged = new Map<string, number>();
  for (const [kind, count] of counts) {
    const { symbol } = partsOfKind(kind);
    merged.set(symbol, (merged.get(symbol) ?? 0) + count);
  }
  return { counts: merged, charge };
}

/** Whitespace in the recorded InChI moves its letters; then the whole of it is underlined. */
function placed(value: EntryValue<string>, place: TextRange): TextRange {
  return value.text.text === value.read.value ? inDocument(value, place) : value.text.range;
}

function isOpen(inchi: Inchi): boolean {
  return textOf(inchi, 'stereo') === '';
}

/** A racemate or mixture may be drawn as one enantiomer and registered without, or the other way round. */
function isByConvention(model: CompoundModel, recorded: Inchi, computed: Inchi): boolean {
  if (!leavesStereoOpenOnPurpose(model)) return false;
  return isOpen(recorded) || isOpen(computed) || areMirrorImages(recorded, computed);
}

function differing(kind: LayerKind, recorded: Inchi, computed: Inchi, from: string): string {
  const of = (inchi: Inchi) => inchi.layers.find((layer) => layer.key === 'formula')?.text ?? 'nothing';
  switch (kind) {
    case 'formula':
      return `This InChI is that of ${of(recorded)}; the ${from} is ${of(computed)}.`;
    case 'connections':
      return `This InChI has the formula of the ${from}, but its atoms are connected otherwise: it is of an isomer.`;
    case 'hydrogens':
      return `This InChI has the skeleton of the ${from}, but its hydrogens sit on other atoms.`;
    case 'charge':
      return `This InChI has another charge or protonation than the ${from}.`;
    case 'isotopes':
      return `This InChI has other isotopes than the ${from}: labels differ or are missing.`;
    case 'stereo':
      return stereoDifference(recorded, computed, from);
  }
}

function stereoDifference(recorded: Inchi, computed: Inchi, from: string): string {
  if (isOpen(recorded)) {
    return `This InChI has no stereo layer, so it stands for every stereoisomer; the ${from} states one.`;
  }
  if (isOpen(computed)) return `This InChI states a stereoisomer, which the ${from} leaves open.`;
  return areMirrorImages(recorded, computed)
    ? `This InChI is of the mirror image of the ${from}.`
    : `This InChI has the skeleton of the ${from}, but is of another stereoisomer.`;
}

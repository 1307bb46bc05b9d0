/** An entry that should be one stereoisomer, and whose structure or name leaves open which. */
import type { Reading, Stereoisomer } from '../chemistry/nomenclature/reading.ts';
import { canonicalSmiles } from '../chemistry/structure/canonical-smiles.ts';
import { mirrorImage } from '../chemistry/structure/stereo-mirror.ts';
import type { StereoisomerList } from '../chemistry/structure/stereoisomers.ts';
import type { Fix } from '../chemistry/text.ts';
import { insertionFor } from '../notebook/insertion.ts';
import type { ToolkitFactsOf } from './facts.ts';
import type { Check, Report } from './finding.ts';
import type { CompoundModel } from './model.ts';
import { sameConstitution } from './shared/constitution.ts';
import { lettersAt, placesInWords, rangeOfPlace } from './shared/stereo-places.ts';
import { stereoFixes } from './shared/stereo-fixes.ts';
import { inDocument, listed, quoted, replacement } from './shared/values.ts';

export const check: Check = {
  id: 'stereo-unspecified',
  group: 'identity',
  severity: 'warning',
  summary:
    'A structure or name that leaves the stereoisomer open; information only where another statement decides.',
  why: 'An entry is one compound unless it says otherwise, and stereoisomers are different compounds.',
  action: 'State the arrangement, or say `isomers: racemate`, `mixture` or `unknown`.',
  source: 'IUPAC recommendations 2013, P-91 to P-93; counting of stereoisomers by symmetry.',
  needsToolkit: true,
  examples: {
    bad: [
      '```compound\nlabel: 1\nname: butan-2-ol\n```',
      '```compound\nlabel: 2\nSMILES: COc1ccc(cc1)C(C)O\n```',
      '```compound\nlabel: 3\nSMILES: CC=CC\n```',
    ],
    good: [
      '```compound\nlabel: 1\nname: (R)-butan-2-ol\n```',
      '```compound\nlabel: 2\nSMILES: COc1ccc(cc1)C(C)O\nisomers: racemate\n```',
      '```compound\nlabel: 3\nSMILES: C/C=C/C\n```',
      '```compound\nlabel: 4\nname: cyclohexene\n```',
    ],
  },
  run(model, report, toolkit) {
    if (model.kind !== 'compound' || model.isomers !== 'single') return;
    const [reading, ...others] = model.name?.readings ?? [];
    const named = reading !== undefined && others.length === 0 ? reading : undefined;
    const { structure, stereo } = model;
    const drawnOpen = stereo !== undefined && stereo.count !== 1;
    const namedOpen = named !== undefined && named.stereoisomers.length > 1;
    // Where name and structure are different compounds, that is the finding.
    if (structure !== undefined && named !== undefined && !sameConstitution(structure, named.molecule))
      return;
    if (drawnOpen && (named === undefined || !namedOpen)) openDrawing(model, stereo, named, report);
    else if (namedOpen) openName(model, named, drawnOpen, report, toolkit);
  },
};

/** The SMILES leaves stereoisomers open; the name, if there is one, does not. */
function openDrawing(
  model: CompoundModel,
  stereo: StereoisomerList,
  named: Reading | undefined,
  report: (found: Report) => void,
): void {
  const smiles = model.entry.smiles!;
  const open = stereo.units.filter((unit) => unit.stated === undefined).map((unit) => unit.candidate);
  const range =
    open.length === 1 ? inDocument(smiles, rangeOfPlace(stereo.molecule, open[0]!)) : smiles.text.range;
  const places = open.length === 0 ? 'the arrangement' : placesInWords(open);
  const leaves = `The SMILES leaves ${places} open, so it stands for ${countOf(stereo.count)} stereoisomers`;
  if (named !== undefined) {
    const meant = canonicalSmiles(named.molecule);
    const isomers = stereo.isomers.filter((isomer) => canonicalSmiles(isomer) === meant);
    report({
      range,
      severity: 'information',
      message:
        `${leaves}. The name says which one it is; a drawing or a search made from the SMILES does not. ` +
        'Add the arrangement to the SMILES.',
      fixes: stereoFixes(smiles, { ...stereo, isomers }, open),
    });
    return;
  }
  const letters = stereo.isomers.slice(0, 4).map((isomer) => `(${lettersAt(isomer, open)})`);
  const shown = new Set(letters).size === letters.length && !letters.some((each) => each.includes('?'));
  const rest = (stereo.count ?? 0) - letters.length;
  const list = !shown
    ? ''
    : `: ${rest > 0 ? `${letters.join(', ')} and ${rest} more` : listed([...letters].sort(), 6, 'or')}`;
  report({
    range,
    message: `${leaves}${list}. ${whatToDo(isPair(stereo.isomers, stereo.count))}`,
    fixes: [
      ...stereoFixes(smiles, stereo, open),
      ...(isPair(stereo.isomers, stereo.count) ? [declare(model, 'racemate')] : [declare(model, 'mixture')]),
    ],
  });
}

/** The name leaves stereoisomers open; the structure may decide. */
function openName(
  model: CompoundModel,
  named: Reading,
  drawnOpen: boolean,
  report: (found: Report) => void,
  toolkit: ToolkitFactsOf,
): void {
  const name = model.entry.name!;
  const count = named.stereoisomerCount ?? named.stereoisomers.length;
  const decided = deciding(model, named, drawnOpen, toolkit);
  const isomers =
    decided === undefined
      ? named.stereoisomers
      : [decided.isomer, ...named.stereoisomers.filter((isomer) => isomer !== decided.isomer)];
  const shown = isomers.slice(0, 4).map((isomer) => isomer.name);
  const list =
    count > shown.length ? `${shown.join(', ')} and ${count - shown.length} more` : listed(shown, 6, 'or');
  const pair = isPair(
    named.stereoisomers.map((isomer) => isomer.molecule),
    count,
  );
  const completions: Fix[] = isomers
    .slice(0, 6)
    .map((isomer) => replacement(name, isomer.name, `Write ${isomer.name}`));
  report({
    range: name.text.range,
    ...(decided === undefined ? {} : { severity: 'information' as const }),
    message:
      `${quoted(name.text.text)} leaves open which of ${count} stereoisomers it is: ${list}. ` +
      (decided === undefined
        ? whatToDo(pair)
        : `The ${decided.by} says ${decided.isomer.name}: complete the name, because a label shows the name alone.`),
    fixes:
      decided === undefined
        ? [...completions, pair ? declare(model, 'racemate') : declare(model, 'mixture')]
        : completions,
  });
}

/** The stereoisomer that SMILES, InChIKey or InChI pick. */
function deciding(
  model: CompoundModel,
  named: Reading,
  drawnOpen: boolean,
  toolkit: ToolkitFactsOf,
): { readonly by: string; readonly isomer: Stereoisomer } | undefined {
  const keyed = named.stereoisomers.map((isomer) => ({ isomer, key: canonicalSmiles(isomer.molecule) }));
  if (model.structureSmiles !== undefined) {
    if (drawnOpen) return undefined;
    const drawn = model.stereo?.isomers[0];
    const found = drawn && keyed.find(({ key }) => key === canonicalSmiles(drawn));
    return found && { by: 'SMILES', isomer: found.isomer };
  }
  const inchiKey = model.entry.inchiKey?.read.value;
  const inchi = model.entry.inchi?.read.value;
  if (inchiKey === undefined && inchi === undefined) return undefined;
  for (const { isomer, key } of keyed) {
    const facts = toolkit(key);
    if (typeof facts === 'string') continue;
    if (facts.inchiKey === inchiKey) return { by: 'InChIKey', isomer };
    if (facts.inchi === inchi) return { by: 'InChI', isomer };
  }
  return undefined;
}

function countOf(count: number | undefined): string {
  return count === undefined ? 'very many' : String(count);
}

function isPair(isomers: StereoisomerList['isomers'], count: number | undefined): boolean {
  const [first, second] = isomers;
  return (
    count === 2 &&
    first !== undefined &&
    second !== undefined &&
    canonicalSmiles(mirrorImage(first)) === canonicalSmiles(second)
  );
}

function whatToDo(isMirrorPair: boolean): string {
  return isMirrorPair
    ? 'They are mirror images: say which one it is, or write “isomers: racemate” if it is both.'
    : 'They are different compounds: say which one it is, or write “isomers: mixture” or “isomers: unknown”.';
}

/** Writes the `isomers` field, over the old value where there is one. */
function declare(model: CompoundModel, word: 'racemate' | 'mixture'): Fix {
  const title = `Write “isomers: ${word}”`;
  const { isomers } = model.entry;
  if (isomers !== undefined) return replacement(isomers, word, title);
  const { offset, prefix } = insertionFor(model.entry, 'isomers');
  return {
    title,
    safe: false,
    edits: [{ range: { start: offset, end: offset }, newText: `${prefix}isomers: ${word}` }],
  };
}

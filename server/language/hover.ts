/** What stands under the cursor: a key, a name, a structure, a formula, an identifier, or the block itself. */
import { MarkupKind, type Hover } from 'vscode-languageserver';
import { readSmiles } from '../chemistry/structure/read-smiles.ts';
import type { TextRange } from '../chemistry/text.ts';
import { checkWithId, explainCheck } from '../checks/explain.ts';
import type { Finding } from '../checks/finding.ts';
import type { CompoundModel, EntryModel, ReactionModel } from '../checks/model.ts';
import type { Settings } from '../checks/settings.ts';
import type { CompoundKey, ReactionKey } from '../notebook/keys.ts';
import type { Field, MappedText } from '../notebook/model.ts';
import type { Toolkit } from '../toolkit/toolkit.ts';
import { readName } from '../workspace/name-reader.ts';
import type { Notebook } from '../workspace/notebook.ts';
import { blockAt, toText } from '../workspace/page.ts';
import { toProtocolRange } from './convert.ts';
import type { OpenPage } from './documents.ts';
import { drawingBox, renderMarkdown, renderPlain, type HoverCard } from './hover-card.ts';
import { compoundCard, formulaCard, nameCard, structureCard } from './hover-cards.ts';
import { compoundKeyWords, reactionKeyWords } from './key-words.ts';

export interface HoverTraits {
  readonly markdown: boolean;
  /** CSS colour of drawings. */
  readonly foreground: string;
  readonly toolkit: Toolkit;
}

/** A card, and the stretch of the block (as addresses) that it is about. */
interface Found {
  readonly card: HoverCard;
  readonly range: TextRange;
}

/** Longest wait for a toolkit that is still loading, in ms; the next hover has the drawing. */
const patienceMs = 1500;

/** `findings` are those of the page; the checks behind the ones under the cursor are explained. */
export async function hover(
  open: OpenPage,
  offset: number,
  findings: readonly Finding[],
  traits: HoverTraits,
): Promise<Hover | null> {
  const place = blockAt(open.page, offset);
  const found = place && underCursor(open.notebook, place.block.read.model, place.address);
  const range = found && toText(open.page, found.range);
  if (found === undefined || range === undefined) return null;
  const [inchiKey, svgs] = await Promise.all([
    inchiKeyOf(found.card, traits.toolkit),
    traits.markdown ? drawings(found.card, traits) : [],
  ]);
  const reasons = reasonsOf(findings.filter((finding) => holds(finding.range, offset)));
  const card: HoverCard = {
    ...found.card,
    rows: [...(found.card.rows ?? []), ...inchiKey],
    lines: [...(found.card.lines ?? []), ...reasons],
  };
  return {
    contents: traits.markdown
      ? { kind: MarkupKind.Markdown, value: renderMarkdown(card, svgs) }
      : { kind: MarkupKind.PlainText, value: renderPlain(card) },
    range: toProtocolRange(open.document, range),
  };
}

function underCursor(notebook: Notebook, model: EntryModel, at: number): Found | undefined {
  const { entry } = model;
  if (holds(entry.block.kindRange, at)) {
    const card = model.kind === 'compound' ? compoundCard(model) : undefined;
    return card && { card, range: entry.block.kindRange };
  }
  const field = entry.fields.find(({ range }) => holds(range, at));
  if (field === undefined) return undefined;
  if (holds(field.keyRange, at)) return keyFound(field, entry.kind);
  const accepted = entry.allow.find(({ checkIdRange }) => holds(checkIdRange, at));
  if (accepted !== undefined) {
    const words = explainCheck(accepted.checkId);
    return words === undefined ? undefined : { card: { words }, range: accepted.checkIdRange };
  }
  return model.kind === 'compound' ? valueFound(model, at) : substanceFound(notebook, model, at);
}

function keyFound(field: Field, kind: EntryModel['kind']): Found | undefined {
  if (field.key === undefined) return undefined;
  const words =
    kind === 'compound'
      ? compoundKeyWords[field.key as CompoundKey]
      : reactionKeyWords[field.key as ReactionKey];
  return { card: { title: field.key, words }, range: field.keyRange };
}

/** A substance of a reaction: a label of the notebook wins over a name. */
function substanceFound(notebook: Notebook, { entry }: ReactionModel, at: number): Found | undefined {
  const item = [...entry.charged, ...entry.obtained].find(({ what }) => holds(what.range, at));
  if (item === undefined) return undefined;
  const { text, range } = item.what;
  const labelled = notebook.compoundLabelled(text);
  const card = labelled === undefined ? wordCard(text, notebook.settings) : compoundCard(labelled);
  return card && { card, range };
}

/** A name, or one of the laboratory's own words. */
function wordCard(word: string, { vocabulary }: Settings): HoverCard {
  const reading = readName(word);
  const smiles = Object.hasOwn(vocabulary, word) ? vocabulary[word] : undefined;
  const molecule = reading.kind === 'unknown' && smiles !== undefined ? readSmiles(smiles).value : undefined;
  return molecule === undefined ? nameCard(word, reading) : structureCard(molecule, word);
}

function valueFound(model: CompoundModel, at: number): Found | undefined {
  const { entry } = model;
  for (const value of [entry.name, ...entry.synonyms]) {
    if (value === undefined || !holds(value.text.range, at)) continue;
    // The model knows the laboratory's own words besides.
    const reading = value === entry.name ? model.nameReading : value.read.value;
    if (reading !== undefined) return { card: nameCard(value.text.text, reading), range: value.text.range };
  }
  const { smiles, formula } = entry;
  if (smiles?.read.value !== undefined && holds(smiles.text.range, at)) {
    return smilesFound(model, smiles.text, at);
  }
  if (formula?.read.value !== undefined && holds(formula.text.range, at)) {
    return { card: formulaCard(formula.read.value), range: formula.text.range };
  }
  for (const value of [
    entry.label,
    entry.inchi,
    entry.inchiKey,
    entry.cas,
    entry.molarMass,
    entry.exactMass,
  ]) {
    if (value === undefined || !holds(value.text.range, at)) continue;
    const card = compoundCard(model);
    return card && { card, range: value.text.range };
  }
  return undefined;
}

/** The structure as written, with the atom under the cursor emphasized. */
function smilesFound(model: CompoundModel, text: MappedText, at: number): Found | undefined {
  const molecule = model.structure;
  if (molecule === undefined) return undefined;
  const atom = molecule.atoms.findIndex(({ range }) => {
    const { start, end } = text.toDocument(range);
    return start <= at && at < end;
  });
  // The toolkit folds hydrogens that are written as atoms into their neighbours, which shifts its counting.
  const countsAlike = molecule.atoms.every(({ atomicNumber }) => atomicNumber !== 1);
  const highlight = atom !== -1 && countsAlike ? [atom] : undefined;
  return {
    card: structureCard(molecule, model.entry.name?.text.text, text.text, highlight),
    range: text.range,
  };
}

function holds(range: TextRange, at: number): boolean {
  return range.start <= at && at <= range.end;
}

/** Why the checks that found something here exist; what they found, the editor shows by itself. */
function reasonsOf(findings: readonly Finding[]): string[] {
  return [...new Set(findings.map((finding) => finding.check))].flatMap((id) => {
    const check = checkWithId(id);
    return check === undefined ? [] : [`${id}: ${check.why}`];
  });
}

/** A row for the card, or none. */
async function inchiKeyOf({ identity }: HoverCard, toolkit: Toolkit): Promise<[string, string][]> {
  if (identity === undefined) return [];
  const facts =
    toolkit.knownFacts(identity) ??
    (await atMost(
      patienceMs,
      toolkit.facts([identity]).then((table) => table.get(identity)),
    ));
  return facts === null || facts === undefined || facts.inchiKey === '' ? [] : [['InChIKey', facts.inchiKey]];
}

async function drawings(card: HoverCard, { toolkit, foreground }: HoverTraits): Promise<(string | null)[]> {
  const wanted = card.drawings ?? [];
  const box = drawingBox(wanted.length);
  const drawn = wanted.map(({ smiles, highlight }) =>
    toolkit.draw(smiles, { ...box, colour: foreground, ...(highlight === undefined ? {} : { highlight }) }),
  );
  return (await atMost(patienceMs, Promise.all(drawn))) ?? wanted.map(() => null);
}

/** What the promise gives, or undefined when it takes longer. */
function atMost<T>(milliseconds: number, promise: Promise<T>): Promise<T | undefined> {
  let timer: ReturnType<typeof setTimeout>;
  const timeout = new Promise<undefined>((resolve) => {
    timer = setTimeout(resolve, milliseconds, undefined);
  });
  return Promise.race([promise, timeout]).finally(() => {
    clearTimeout(timer);
  });
}

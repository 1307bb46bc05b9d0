/** What stands under the cursor: a key, a name, a structure, a formula, an identifier, or the block itself. */
import { MarkupKind, type Hover } from 'vscode-languageserver';
import type { TextRange } from '../chemistry/text.ts';
import { explainCheck } from '../checks/explain.ts';
import type { CompoundModel, EntryModel } from '../checks/model.ts';
import type { CompoundKey, ReactionKey } from '../notebook/keys.ts';
import type { Field, MappedText } from '../notebook/model.ts';
import type { Toolkit } from '../toolkit/toolkit.ts';
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

export async function hover(open: OpenPage, offset: number, traits: HoverTraits): Promise<Hover | null> {
  const place = blockAt(open.page, offset);
  const found = place && underCursor(place.block.read.model, place.address);
  const range = found && toText(open.page, found.range);
  if (found === undefined || range === undefined) return null;
  const card = await withInchiKey(found.card, traits.toolkit);
  return {
    contents: traits.markdown
      ? { kind: MarkupKind.Markdown, value: renderMarkdown(card, await drawings(card, traits)) }
      : { kind: MarkupKind.PlainText, value: renderPlain(card) },
    range: toProtocolRange(open.document, range),
  };
}

function underCursor(model: EntryModel, at: number): Found | undefined {
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
  return model.kind === 'compound' ? valueFound(model, at) : undefined;
}

function keyFound(field: Field, kind: EntryModel['kind']): Found | undefined {
  if (field.key === undefined) return undefined;
  const words =
    kind === 'compound'
      ? compoundKeyWords[field.key as CompoundKey]
      : reactionKeyWords[field.key as ReactionKey];
  return { card: { title: field.key, words }, range: field.keyRange };
}

function valueFound(model: CompoundModel, at: number): Found | undefined {
  const { entry } = model;
  for (const value of [entry.name, ...entry.synonyms]) {
    if (value !== undefined && holds(value.text.range, at) && value.read.value !== undefined) {
      return { card: nameCard(value.text.text, value.read.value), range: value.text.range };
    }
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

async function withInchiKey(card: HoverCard, toolkit: Toolkit): Promise<HoverCard> {
  const { identity } = card;
  if (identity === undefined) return card;
  const facts =
    toolkit.knownFacts(identity) ??
    (await atMost(
      patienceMs,
      toolkit.facts([identity]).then((table) => table.get(identity)),
    ));
  if (facts === null || facts === undefined || facts.inchiKey === '') return card;
  return { ...card, rows: [...(card.rows ?? []), ['InChIKey', facts.inchiKey]] };
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

/**
 * From a text to its findings, step by step, for one notebook's settings: what `notebook.ts` caches and what it
 * runs again are the results of these steps.
 */
import { LRUCache } from 'lru-cache';

import type { NameReading } from '../chemistry/nomenclature/reading.ts';
import type { Molecule } from '../chemistry/structure/molecule.ts';
import { readSmiles } from '../chemistry/structure/read-smiles.ts';
import type { Read } from '../chemistry/text.ts';
import type { ToolkitFactsOf } from '../checks/facts.ts';
import type { Finding } from '../checks/finding.ts';
import { modelOf, type EntryModel } from '../checks/model.ts';
import { analyseEntry, analyseNotebook } from '../checks/run.ts';
import type { Settings } from '../checks/settings.ts';
import { readEntry } from '../notebook/entries.ts';
import { parseMarkdown, type MarkdownPage } from '../notebook/markdown.ts';
import type { Block, ValueReaders } from '../notebook/model.ts';
import { readName } from './name-reader.ts';

export interface Analysis {
  /** What `previous` has of the same text is not parsed again; the result is the same without it. */
  readonly parse: (text: string, previous: MarkdownPage | undefined) => MarkdownPage;
  readonly read: (block: Block) => EntryModel;
  readonly check: (model: EntryModel, facts: ToolkitFactsOf) => readonly Finding[];
  readonly checkAcross: (
    files: ReadonlyMap<string, readonly EntryModel[]>,
  ) => ReadonlyMap<string, readonly Finding[]>;
}

export function createAnalysis(settings: Settings): Analysis {
  return {
    parse: parseMarkdown,
    read: (block) => sharedByStructure(modelOf(readEntry(block, rememberingReaders), settings)),
    check: analyseEntry,
    checkAcross: (files) => analyseNotebook({ files, settings }),
  };
}

/** Names and structures recur: the same solvents and reagents in every entry, the same text at every keystroke. */
const mostRemembered = 5000;

/** Longer texts are rare, dear to keep and never the same twice. */
const longestRemembered = 2000;

/** What was read depends on the text alone, so all notebooks share it. */
const rememberingReaders: ValueReaders = {
  readSmiles: remembering<Read<Molecule>>(readSmiles, (text, message) => ({
    problem: { range: { start: 0, end: text.length }, message },
  })),
  readName: remembering<NameReading>(readName, (text, message) => ({
    kind: 'unknown',
    stoppedAt: 0,
    range: { start: 0, end: text.length },
    message,
    suggestions: [],
  })),
};

/** Readers do not throw; should one do so all the same, it must not take the other entries with it. */
function breakdown(error: unknown): string {
  const reason = error instanceof Error ? error.message : String(error);
  return `The program broke down on this text (${reason}) and says nothing of it; please report it.`;
}

/** What follows from a structure alone, however many entries have it. Gone with the structure itself. */
const ofStructure = new WeakMap<Molecule, Map<string, unknown>>();

const derivedFromStructure = ['structureSmiles', 'stereo'] as const;

/**
 * Equal SMILES texts are one molecule here (see `rememberingReaders`), so the dear things that a model works out
 * from its structure when they are asked for are worked out once for all its entries.
 */
function sharedByStructure(model: EntryModel): EntryModel {
  if (model.kind !== 'compound' || model.structure === undefined) return model;
  let known = ofStructure.get(model.structure);
  if (known === undefined) {
    known = new Map();
    ofStructure.set(model.structure, known);
  }
  for (const property of derivedFromStructure) {
    const derive = Object.getOwnPropertyDescriptor(model, property)?.get;
    if (derive === undefined) continue;
    const get = () => {
      if (!known.has(property)) known.set(property, derive.call(model));
      return known.get(property);
    };
    Object.defineProperty(model, property, { get, enumerable: true });
  }
  return model;
}

function remembering<T extends object>(
  read: (text: string) => T,
  broken: (text: string, message: string) => T,
): (text: string) => T {
  const known = new LRUCache<string, T>({ max: mostRemembered });
  const safely = (text: string) => {
    try {
      return read(text);
    } catch (error) {
      return broken(text, breakdown(error));
    }
  };
  return (text) => {
    if (text.length > longestRemembered) return safely(text);
    let value = known.get(text);
    if (value === undefined) {
      value = safely(text);
      known.set(text, value);
    }
    return value;
  };
}

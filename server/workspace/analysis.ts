/**
 * From a text to its findings, step by step, for one notebook's settings: what `notebook.ts` caches and what it
 * runs again are the results of these steps.
 */

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
import { remembering } from './remembering.ts';

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
    read: (block) => sharedByStructure(modelOf(readEntry(block, readers), settings)),
    check: analyseEntry,
    checkAcross: (files) => analyseNotebook({ files, settings }),
  };
}

/** What was read depends on the text alone, so all notebooks share it. */
const readers: ValueReaders = {
  readSmiles: remembering<Read<Molecule>>(readSmiles, (text, message) => ({
    problem: { range: { start: 0, end: text.length }, message },
  })),
  readName,
};

/** What follows from a structure alone, however many entries have it. Gone with the structure itself. */
const ofStructure = new WeakMap<Molecule, Map<string, unknown>>();

const derivedFromStructure = ['structureSmiles', 'stereo'] as const;

/**
 * Equal SMILES texts are one molecule here (see `readers`), so the dear things that a model works out
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

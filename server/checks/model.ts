/** Entries joined with their chemistry, built once for each block and read by every check. */
import type { Composition } from '../chemistry/composition/composition.ts';
import type { UnderstoodName } from '../chemistry/nomenclature/reading.ts';
import type { Molecule } from '../chemistry/structure/molecule.ts';
import type { CompoundEntry, Entry, ReactionEntry } from '../notebook/model.ts';
import type { Settings } from './settings.ts';

/** What the compound block says of its identity, each statement read on its own. */
export interface CompoundModel {
  readonly kind: 'compound';
  readonly entry: CompoundEntry;
  readonly settings: Settings;
  /** From SMILES, when it could be read. */
  readonly structure: Molecule | undefined;
  /** Canonical SMILES of `structure`. */
  readonly structureSmiles: string | undefined;
  readonly structureComposition: Composition | undefined;
  /** From `name`, when it was understood. */
  readonly name: UnderstoodName | undefined;
  /** From `formula`, when it could be read. */
  readonly formula: Composition | undefined;
}

export interface ReactionModel {
  readonly kind: 'reaction';
  readonly entry: ReactionEntry;
  readonly settings: Settings;
}

export type EntryModel = CompoundModel | ReactionModel;

/** All entries under one notebook root; files by their path relative to it, `/` between folders. */
export interface NotebookModel {
  readonly files: ReadonlyMap<string, readonly Entry[]>;
}

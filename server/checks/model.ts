/** Entries joined with their chemistry, built once for each block and read by every check. */
import type { Composition } from '../chemistry/composition/composition.ts';
import type { NameReading, UnderstoodName } from '../chemistry/nomenclature/reading.ts';
import { compositionOf } from '../chemistry/structure/composition-of.ts';
import type { Molecule } from '../chemistry/structure/molecule.ts';
import { readSmiles } from '../chemistry/structure/read-smiles.ts';
import { enumerateStereoisomers, type StereoisomerList } from '../chemistry/structure/stereoisomers.ts';
import { valenceProblems, type ValenceProblem } from '../chemistry/structure/valence.ts';
import type { CompoundEntry, Entry, EntryValue, IsomerStatement, ReactionEntry } from '../notebook/model.ts';
import type { Settings } from './settings.ts';
import { isomersOfName } from './shared/isomers-of-name.ts';
import { canonicalSmiles } from '../chemistry/structure/canonical-smiles.ts';

/** What the compound block says of its identity, each statement read on its own. */
export interface CompoundModel {
  readonly kind: 'compound';
  readonly entry: CompoundEntry;
  readonly settings: Settings;
  /** From SMILES, when it could be read. */
  readonly structure: Molecule | undefined;
  /** Atoms of `structure` with impossible valences. Such a structure is a slip, and nothing is held against it. */
  readonly valenceProblems: readonly ValenceProblem[];
  /** Canonical SMILES of `structure`; undefined also where it is impossible or too large to be compared. */
  readonly structureSmiles: string | undefined;
  readonly structureComposition: Composition | undefined;
  /** The stereoisomers that `structure` leaves possible; ranges and numbering are those of its normal spelling. */
  readonly stereo: StereoisomerList | undefined;
  /** What reading the name gave, or undefined when there is no name. */
  readonly nameReading: NameReading | undefined;
  /** From `name`, when it was understood. */
  readonly name: UnderstoodName | undefined;
  /** From `formula`, when it could be read. */
  readonly formula: Composition | undefined;
  /** How many isomers the entry says it holds; what its name says, or `single`, when it does not say. */
  readonly isomers: IsomerStatement['kind'];
}

export interface ReactionModel {
  readonly kind: 'reaction';
  readonly entry: ReactionEntry;
  readonly settings: Settings;
}

export type EntryModel = CompoundModel | ReactionModel;

/**
 * All entries under one notebook root; files by their path relative to it, `/` between folders. The entries of a file
 * stand in its order.
 */
export interface NotebookModel {
  readonly files: ReadonlyMap<string, readonly EntryModel[]>;
  readonly settings: Settings;
}

/** Larger structures are weighed and counted, but not compared: the time for that grows with the square. */
const mostAtoms = 500;

/** Stereoisomers listed for one structure; their number is known beyond that. */
const mostStereoisomers = 32;

/** Joins an entry with its chemistry. Never throws. */
export function modelOf(entry: Entry, settings: Settings): EntryModel {
  return entry.kind === 'reaction' ? { kind: 'reaction', entry, settings } : compoundModel(entry, settings);
}

function compoundModel(entry: CompoundEntry, settings: Settings): CompoundModel {
  const structure = entry.smiles?.read.value;
  const nameReading = entry.name && understoodWith(settings, entry.name);
  const problems = structure === undefined ? [] : valenceProblems(structure);
  const isComparable = problems.length === 0 && (structure?.atoms.length ?? 0) <= mostAtoms;
  const comparable = isComparable ? structure : undefined;
  let key: string | undefined;
  let stereo: StereoisomerList | undefined;
  return {
    kind: 'compound',
    entry,
    settings,
    structure,
    valenceProblems: problems,
    // The canonical form and the stereoisomers are dear, and most entries never ask for them.
    get structureSmiles() {
      return comparable && (key ??= canonicalSmiles(comparable));
    },
    structureComposition: structure && compositionOf(structure),
    get stereo() {
      return comparable && (stereo ??= enumerateStereoisomers(comparable, mostStereoisomers));
    },
    nameReading,
    name: nameReading?.kind === 'understood' ? nameReading : undefined,
    formula: entry.formula?.read.value,
    isomers: entry.isomers?.read.value?.kind ?? isomersOfName(entry.name?.text.text ?? '') ?? 'single',
  };
}

/** What the name engine read; a name that it does not know may be one of the laboratory's own words. */
function understoodWith(settings: Settings, name: EntryValue<NameReading>): NameReading | undefined {
  const reading = name.read.value;
  const word = name.text.text;
  if (reading?.kind !== 'unknown' || !Object.hasOwn(settings.vocabulary, word)) return reading;
  const molecule = readSmiles(settings.vocabulary[word]!).value;
  if (molecule === undefined) return reading;
  return {
    kind: 'understood',
    readings: [{ name: word, molecule, stereoisomers: [] }],
    remarks: [],
  };
}

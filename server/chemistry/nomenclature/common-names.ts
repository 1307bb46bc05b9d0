/** Names of the vocabulary that are known whole; each structure is read when first asked for. */
import { readSmiles } from '../structure/read-smiles.ts';
import type { Molecule } from '../structure/molecule.ts';
import { abbreviations, casedAbbreviations } from './vocabulary/abbreviations.ts';
import { mixtures } from './vocabulary/mixtures.ts';
import { inorganicNames } from './vocabulary/whole-inorganic.ts';
import { wholeNames } from './vocabulary/whole.ts';

export type CommonName =
  | { readonly kind: 'compound'; readonly molecule: Molecule }
  /** Several compounds of that name, each with its full one. */
  | {
      readonly kind: 'compounds';
      readonly readings: readonly { readonly name: string; readonly molecule: Molecule }[];
    }
  /** What it is, and the names of its components where they are known. */
  | { readonly kind: 'mixture'; readonly message: string; readonly components: readonly string[] };

export interface CommonNames {
  /** All names, as they are written. */
  readonly names: readonly string[];
  /** What a name stands for, written as typed; capitals count in few. */
  lookUp(text: string, lower: string): CommonName | undefined;
  /** The SMILES of a compound's name in lower case. */
  smilesOf(lower: string): string | undefined;
}

export function createCommonNames(): CommonNames {
  const smiles = new Map<string, string>();
  const cased = new Map<string, string>();
  const names: string[] = [];
  const put = (spellings: string, structure: string) => {
    for (const spelling of spellings.split('|')) {
      names.push(spelling);
      smiles.set(plain(spelling).toLowerCase(), structure);
    }
  };
  for (const [spellings, structure] of [...wholeNames, ...inorganicNames]) put(spellings, structure);
  for (const [spellings, , structure] of abbreviations) put(spellings, structure);
  for (const [spellings, , structure] of casedAbbreviations)
    for (const spelling of spellings.split('|')) cased.set(spelling, structure);
  const mixed = new Map<string, Extract<CommonName, { kind: 'mixture' }>>();
  for (const [spellings, message, components] of mixtures) {
    for (const spelling of spellings.split('|'))
      mixed.set(spelling, { kind: 'mixture', message, components: components?.split('|') ?? [] });
  }
  const read = new Map<string, CommonName>();
  return {
    names: [...names, ...cased.keys(), ...mixed.keys()],
    smilesOf: (lower) => smiles.get(lower),
    lookUp(text, lower) {
      const mixture = mixed.get(lower);
      if (mixture) return mixture;
      const structure = cased.get(text) ?? smiles.get(lower);
      if (structure === undefined) return undefined;
      const known = read.get(structure);
      if (known) return known;
      const molecule = readSmiles(structure).value;
      if (!molecule) return undefined;
      const entry: CommonName = { kind: 'compound', molecule };
      read.set(structure, entry);
      return entry;
    },
  };
}

/** The spelling that names are looked up in. */
const plain = (spelling: string) => spelling.replace(/[–−]/g, '-').replace(/′′/g, "''").replace(/′/g, "'");

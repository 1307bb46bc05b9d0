/** Names of the vocabulary that are known whole; each structure is read when first asked for. */
import { readSmiles } from '../structure/read-smiles.ts';
import type { Molecule } from '../structure/molecule.ts';
import { aminoAcids } from './vocabulary/amino-acids.ts';
import { mixtures, wholeNames } from './vocabulary/whole.ts';

export type CommonName =
  | { readonly kind: 'compound'; readonly molecule: Molecule }
  | { readonly kind: 'mixture'; readonly message: string };

export interface CommonNames {
  readonly names: readonly string[];
  /** What the name, in lower case, stands for. */
  lookUp(lower: string): CommonName | undefined;
}

export function createCommonNames(): CommonNames {
  const smiles = new Map<string, string>();
  for (const [names, structure] of wholeNames)
    for (const name of names.split('|')) smiles.set(name, structure);
  // `L-` and `D-` name one enantiomer; without them, and with `DL-`, the name leaves it open.
  for (const [name, structure] of aminoAcids) {
    smiles.set(`l-${name}`, structure);
    smiles.set(
      `d-${name}`,
      structure.replace(/@+/g, (sign) => (sign === '@' ? '@@' : '@')),
    );
    for (const prefix of ['', 'dl-', '(±)-'])
      smiles.set(prefix + name, structure.replace(/\[C@+H\](\d?)/g, 'C$1'));
  }
  const mixed = new Map<string, string>();
  for (const [names, what] of mixtures) for (const name of names.split('|')) mixed.set(name, what);
  const read = new Map<string, CommonName>();
  return {
    names: [...smiles.keys(), ...mixed.keys()],
    lookUp(lower) {
      const known = read.get(lower);
      if (known) return known;
      const message = mixed.get(lower);
      if (message !== undefined) return { kind: 'mixture', message };
      const text = smiles.get(lower);
      const molecule = text === undefined ? undefined : readSmiles(text).value;
      if (!molecule) return undefined;
      const entry: CommonName = { kind: 'compound', molecule };
      read.set(lower, entry);
      return entry;
    },
  };
}

/** What the builders of functional class names, esters and salts share: words of a sentence, and how they are bound. */
import type { Unit } from '../tree.ts';
import type { Site } from '../words/sentence.ts';
import { buildUnit } from './build-unit.ts';
import type { BuiltUnit } from './built-unit.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { skeletonFromSmiles } from './skeleton.ts';

/** A substitutive name among the words, and how many times it counts. */
export interface Word {
  readonly unit: Unit;
  readonly count: number;
  readonly site?: Site | undefined;
  /** Written with `mono`: other places of the same kind stay free. */
  readonly mono?: boolean | undefined;
}

/** A free valence: the atom and the order of the bond to come. */
export type Valence = BuiltUnit['free'][number];

/** Builds a word of the sentence, whose descriptors are written at its beginning. */
export function buildWord(unit: Unit, draft: Draft, choices: Choices, copies = 1): BuiltUnit | undefined {
  draft.owner = { at: unit.range.start, depth: 0, repeated: copies > 1 };
  return buildUnit(unit, draft, choices);
}

/** Every group that the words name, each with its free valences; undefined when one has none. */
export function buildGroups(
  radicals: readonly Word[],
  draft: Draft,
  choices: Choices,
): { readonly free: readonly Valence[]; readonly site: Site | undefined }[] | undefined {
  const groups: { free: Valence[]; site: Site | undefined }[] = [];
  for (const radical of radicals) {
    for (let copy = 0; copy < radical.count; copy++) {
      const built = buildWord(radical.unit, draft, choices, radical.count);
      if (!built || built.free.length === 0) return undefined;
      const other = radical.site?.others?.[copy - 1];
      groups.push({ free: built.free, site: other ? { element: other } : radical.site });
    }
  }
  return groups;
}

/** Adds a group of the vocabulary; the answer lists its atoms. */
export function addSmiles(smiles: string, draft: Draft): number[] {
  return draft.addSkeleton(skeletonFromSmiles(smiles)!, { start: 0, end: 0 });
}

/** Binds a group to the place of an acid (its negative charge goes) or of a function word. */
export function join(draft: Draft, site: number, free: Valence): boolean {
  const atom = draft.atoms[site]!;
  if (free.order !== 1 && atom.charge < 0) return false;
  if (atom.charge < 0) {
    atom.charge++;
    atom.capacity++;
  }
  if (draft.free(site) < free.order || draft.free(free.atom) < free.order) return false;
  draft.bond(site, free.atom, free.order);
  return true;
}

/** Sorts the stereodescriptors of a name: letters with the place that each is about, words like `cis`, and `rac`. */
import { canonicalForm } from '../structure/canonical-form.ts';
import { assignDescriptors, type WantedDescriptor } from '../structure/assign-descriptors.ts';
import type { Molecule } from '../structure/molecule.ts';
import { enumerateStereoisomers } from '../structure/stereoisomers.ts';
import type { Draft } from './build/draft.ts';
import type { StereoWord } from './tree.ts';

type Letter = WantedDescriptor['letter'];
const letters = new Set<string>(['R', 'S', 'r', 's', 'E', 'Z', 'M', 'P']);

export interface Said {
  readonly letters: readonly { readonly atom: number; readonly letter: Letter; readonly word: StereoWord }[];
  /** Words about the arrangement of two groups: `cis`, `trans`, `exo`, `endo`, `meso`. */
  readonly relations: readonly {
    readonly word: StereoWord;
    /** Atoms of the parent that the word stands before. */
    readonly atoms: readonly number[];
    /** The place that it is about, where that is known. */
    readonly place?: readonly number[];
  }[];
  /** Both enantiomers are meant, or it is not said which. */
  readonly racemic: boolean;
  /** The words that say so. */
  readonly racemicWords: readonly StereoWord[];
  /** Words for which there is no place, or more than one. */
  readonly placeless: readonly StereoWord[];
}

/** What the name says of the structure's arrangement in space. */
export function saidOf(draft: Draft, molecule: Molecule): Said {
  const said: { -readonly [K in keyof Said]: Said[K] extends readonly (infer T)[] ? T[] : Said[K] } = {
    letters: [],
    relations: [],
    racemic: false,
    racemicWords: [],
    placeless: [],
  };
  for (const { atom, atoms, word } of draft.wanted) {
    if (letters.has(word.letter)) said.letters.push({ atom, letter: word.letter as Letter, word });
    else said.relations.push({ word, atoms, place: [atom] });
  }
  const together = new Map<number, { atoms: readonly number[]; words: StereoWord[] }>();
  for (const { atoms, word } of draft.loose) {
    if (word.letter === 'rac' || word.letter === 'rel') {
      said.racemic = true;
      said.racemicWords.push(word);
      continue;
    }
    const group = together.get(word.whole.start) ?? { atoms, words: [] };
    group.words.push(word);
    together.set(word.whole.start, group);
  }
  for (const { atoms, words } of together.values()) settle(words, atoms);
  return said;

  function settle(words: readonly StereoWord[], atoms: readonly number[]): void {
    const [first] = words;
    const isLetter = letters.has(first!.letter);
    if (!isLetter && words.length === 1 && first!.all !== true) {
      said.relations.push({ word: first!, atoms });
      return;
    }
    const centres = !/^(?:[EZ]|cis|trans)$/.test(first!.letter);
    const places = placesOf(molecule, atoms, centres ? 'centre' : 'bond', draft);
    if (first!.all === true && !isLetter && places.length === 0) {
      said.relations.push({ word: first!, atoms });
      return;
    }
    const each = first!.all === true ? places.map(() => first!) : words;
    if (centres && places.length === 1 && words.length === 2 && first!.letter !== words[1]!.letter) {
      // `(R,S)-` before a single centre is the racemate (common practice, no source).
      said.racemic = true;
      said.racemicWords.push(...words);
      return;
    }
    const inOrder = each.map((word, index) => ({ word, place: places[index] }));
    if (
      places.length !== each.length ||
      (centres &&
        !orderIsIdle(
          inOrder.map(({ word }) => word),
          places,
        ))
    ) {
      said.placeless.push(...words);
      return;
    }
    for (const { word, place } of inOrder) {
      if (isLetter) said.letters.push({ atom: place![0]!, letter: word.letter as Letter, word });
      else said.relations.push({ word, atoms, place: place! });
    }
  }

  /** Centres have no order of their own: letters without locants count only where every order means one compound. */
  function orderIsIdle(words: readonly StereoWord[], places: readonly (readonly number[])[]): boolean {
    if (words.every((word) => word.letter === words[0]!.letter)) return true;
    if (words.length !== 2) return false;
    if (said.racemic) return true;
    const keys = [words, [...words].reverse()].map((order) => {
      const wanted = order.map((word, index) => ({
        atom: places[index]![0]!,
        letter: word.letter as Letter,
      }));
      return canonicalForm(assignDescriptors(molecule, wanted).molecule).key;
    });
    return keys[0] === keys[1];
  }
}

/** Places of one kind on a parent, by their locants; of its neighbours, or of the whole, where the parent has none. */
function placesOf(
  molecule: Molecule,
  atoms: readonly number[],
  kind: 'centre' | 'bond',
  draft: Draft,
): readonly (readonly number[])[] {
  const places = enumerateStereoisomers(molecule, 64).units.flatMap(({ candidate }) => {
    if ((kind === 'bond') !== (candidate.kind === 'double-bond')) return [];
    return [candidate.kind === 'tetrahedral' ? [candidate.centre] : [...candidate.ends]];
  });
  const within = places.filter((ends) => ends.every((atom) => atoms.includes(atom)));
  const touching = places.filter((ends) => ends.some((atom) => atoms.includes(atom)));
  const chosen = within.length > 0 ? within : touching.length > 0 ? touching : places;
  const locant = (ends: readonly number[]) =>
    Math.min(...ends.map((atom) => Number.parseInt(draft.named.get(atom)?.locant ?? '999', 10) || 999));
  return chosen.map((ends) => ends).sort((one, other) => locant(one) - locant(other));
}

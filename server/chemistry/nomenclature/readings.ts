/** From trees to readings: every structure that the words can mean, each once, with the name completed. */
import { canonicalForm } from '../structure/canonical-form.ts';
import type { Molecule } from '../structure/molecule.ts';
import type { TextRange } from '../text.ts';
import { buildSentence } from './build/build-sentence.ts';
import { Choices } from './build/choices.ts';
import { Draft, type Insertion, type Owner } from './build/draft.ts';
import { finished } from './build/finish.ts';
import { isLongestChain } from './build/proper-chain.ts';
import type { Part } from './words/sentence.ts';

/** One structure that the words can mean, before its arrangement in space is looked at. */
export interface Meaning {
  readonly molecule: Molecule;
  readonly draft: Draft;
  readonly insertions: readonly Insertion[];
}

export interface Meanings {
  readonly meanings: readonly Meaning[];
  /** False when the bound on building was met before everything was tried. */
  readonly complete: boolean;
  /** Why nothing could be built: the failure that came last in the text. */
  readonly failure: { range: TextRange; message: string } | undefined;
}

const wrongParent =
  'Wherever these groups stand, the compound is named after a longer chain. Give locants, or name it after that chain.';

/** Builds every sentence in every way, up to `buildLimit` structures; the cheapest understandings are kept. */
export function meaningsOf(sentences: readonly (readonly Part[])[], buildLimit: number): Meanings {
  let best = Number.POSITIVE_INFINITY;
  let found: Meaning[] = [];
  const keys = new Set<string>();
  let failure: Meanings['failure'];
  let built = 0;
  for (const sentence of sentences) {
    const choices = new Choices();
    do {
      if (++built > buildLimit) return { meanings: found, complete: false, failure };
      const draft = new Draft();
      const last = sentence[sentence.length - 1]!;
      const whole = { start: sentence[0]!.start, end: last.kind === 'stretch' ? last.stretch.end : last.end };
      const molecule =
        buildSentence(sentence, draft, choices) && !draft.failure
          ? finished(draft, choices, whole)
          : undefined;
      if (!molecule) {
        if (draft.failure && (failure === undefined || draft.failure.range.end >= failure.range.end))
          failure = draft.failure;
        continue;
      }
      if (draft.cost > best) continue;
      const short = draft.chains.find((chain) => chain.open && !isLongestChain(chain, draft));
      if (short) {
        failure ??= { range: short.range, message: wrongParent };
        continue;
      }
      if (draft.cost < best) {
        best = draft.cost;
        found = [];
      }
      const meaning: Meaning = { molecule, draft, insertions: draft.insertions };
      // Keys are worked out only when there are two to compare; most names have one meaning.
      if (found.length === 1 && keys.size === 0) keys.add(constitution(found[0]!.molecule));
      if (found.length > 0) {
        const key = constitution(molecule);
        if (keys.has(key)) continue;
        keys.add(key);
      } else keys.clear();
      found.push(meaning);
    } while (choices.advance());
  }
  return { meanings: found, complete: true, failure };
}

/** Equal for equal constitutions. */
function constitution(molecule: Molecule): string {
  return canonicalForm(molecule, { stereo: false }).key;
}

/** Descriptors to be written in front of one unit of the name. */
export interface Described {
  readonly owner: Owner;
  /** `(2R,3S)-` */
  readonly text: string;
}

/** The name with missing locants, brackets and descriptors written in. */
export function completedName(
  text: string,
  insertions: readonly Insertion[],
  brackets: readonly { readonly at: number; readonly end: number; readonly depth: number }[] = [],
  described: readonly Described[] = [],
  dropped: readonly { readonly at: number; readonly end: number }[] = [],
): string {
  // At one place: closing brackets, the deepest first; then from the outside in the bracket, descriptors, locants.
  const all: { at: number; text: string; order: number; end?: number }[] = [
    // What is written at the same place comes before what is left out there.
    ...dropped.map(({ at, end }) => ({ at, text: '', order: 1e6, end })),
    ...insertions.map(({ at, text: added, depth }, order) => ({
      at,
      text: added,
      order: depth + 0.5 + order / 1000,
    })),
    ...brackets.map(({ at, depth }) => ({ at, text: '(', order: depth })),
    ...brackets.map(({ end, depth }) => ({ at: end, text: ')', order: -depth })),
    ...described.flatMap(({ owner, text: letters }) =>
      owner.wrapTo === undefined
        ? [{ at: owner.at, text: letters, order: owner.depth + 0.2 }]
        : [
            { at: owner.at, text: `[${letters}`, order: owner.depth + 0.1 },
            { at: owner.wrapTo, text: ']', order: -owner.depth + 0.1 },
          ],
    ),
  ];
  all.sort((first, second) => first.at - second.at || first.order - second.order);
  let name = '';
  let last = 0;
  for (const one of all) {
    if (one.at > last) {
      name += text.slice(last, one.at);
      last = one.at;
    }
    name += fitted(one.text, name, text[last]);
    last = Math.max(last, one.end ?? last);
  }
  return name + text.slice(last);
}

/** An insertion with just the hyphens that its surroundings need. */
function fitted(inserted: string, before: string, next: string | undefined): string {
  if (/^[()[\]]/.test(inserted)) return inserted;
  let added = inserted;
  if (added.startsWith('-') && /[-\s([]$|^$/.test(before)) added = added.slice(1);
  else if (!added.startsWith('-') && /[\p{L}\d')\]]$/u.test(before)) added = `-${added}`;
  return added.endsWith('-') && next === '-' ? added.slice(0, -1) : added;
}

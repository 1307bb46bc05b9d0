/** From trees to readings: every structure that the words can mean, each once, with the name completed. */
import { canonicalSmiles } from '../structure/canonical-smiles.ts';
import { type Molecule, withStereo } from '../structure/molecule.ts';
import type { TextRange } from '../text.ts';
import { buildSentence } from './build/build-sentence.ts';
import { Choices } from './build/choices.ts';
import { Draft, type Insertion } from './build/draft.ts';
import { finished } from './build/finish.ts';
import { isLongestChain } from './build/proper-chain.ts';
import type { Part } from './words/sentence.ts';

/** One structure that the words can mean, before its arrangement in space is looked at. */
export interface Meaning {
  readonly molecule: Molecule;
  readonly draft: Draft;
  readonly insertions: readonly Insertion[];
  /** Constitution as a string. */
  readonly key: string;
}

export interface Meanings {
  readonly meanings: readonly Meaning[];
  /** False when the bound on building was met before everything was tried. */
  readonly complete: boolean;
  /** Why nothing could be built: the failure that came last in the text. */
  readonly failure: { range: TextRange; message: string } | undefined;
}

/** Builds every sentence in every way, up to `buildLimit` structures; the cheapest understandings are kept. */
export function meaningsOf(sentences: readonly (readonly Part[])[], buildLimit: number): Meanings {
  let best = Number.POSITIVE_INFINITY;
  let found = new Map<string, Meaning>();
  let failure: Meanings['failure'];
  let built = 0;
  for (const sentence of sentences) {
    const choices = new Choices();
    do {
      if (++built > buildLimit) return { meanings: [...found.values()], complete: false, failure };
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
      if (draft.cost > best || draft.chains.some((chain) => chain.open && !isLongestChain(chain, draft)))
        continue;
      const key = canonicalSmiles(withStereo(molecule, []));
      if (draft.cost < best) {
        best = draft.cost;
        found = new Map();
      }
      if (!found.has(key)) found.set(key, { molecule, draft, insertions: draft.insertions, key });
    } while (choices.advance());
  }
  return { meanings: [...found.values()], complete: true, failure };
}

/** The name with the missing locants written in. */
export function completedName(text: string, insertions: readonly Insertion[]): string {
  const sorted = insertions
    .map((one, order) => ({ ...one, order }))
    .sort((a, b) => b.at - a.at || b.order - a.order);
  let name = text;
  for (const { at, text: inserted } of sorted) {
    const before = name.slice(0, at);
    const after = name.slice(at);
    let middle = inserted;
    if (middle.startsWith('-') && /[-\s([]$|^$/.test(before)) middle = middle.slice(1);
    else if (!middle.startsWith('-') && /[\p{L}\d')\]]$/u.test(before)) middle = `-${middle}`;
    if (middle.endsWith('-') && after.startsWith('-')) middle = middle.slice(0, -1);
    name = before + middle + after;
  }
  return name;
}

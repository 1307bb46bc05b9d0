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

/** The name with the missing locants and brackets written in. */
export function completedName(
  text: string,
  insertions: readonly Insertion[],
  brackets: readonly { readonly at: number; readonly end: number }[] = [],
): string {
  // At one place: a closing bracket, then locants, then an opening bracket.
  const all = [
    ...insertions.map(({ at, text: added }, order) => ({ at, text: added, order: order + 1000 })),
    ...brackets.map(({ at }) => ({ at, text: '(', order: 1e6 })),
    ...brackets.map(({ end }) => ({ at: end, text: ')', order: 0 })),
  ];
  all.sort((first, second) => first.at - second.at || first.order - second.order);
  let name = '';
  let last = 0;
  for (const one of all) {
    name += text.slice(last, one.at);
    last = one.at;
    let added = one.text;
    if (added === '(' || added === ')') {
      name += added;
      continue;
    }
    if (added.startsWith('-') && /[-\s([]$|^$/.test(name)) added = added.slice(1);
    else if (!added.startsWith('-') && /[\p{L}\d')\]]$/u.test(name)) added = `-${added}`;
    if (added.endsWith('-') && text[one.at] === '-') added = added.slice(0, -1);
    name += added;
  }
  return name + text.slice(last);
}

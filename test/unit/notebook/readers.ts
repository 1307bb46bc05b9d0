/** Value readers for tests of the block language: names are not what these tests are about. */
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';
import { readDocument } from '../../../server/notebook/entries.ts';
import type { CompoundEntry, Entry, ReactionEntry, ValueReaders } from '../../../server/notebook/model.ts';

export const readers: ValueReaders = {
  readSmiles,
  readName: (text) => ({ kind: 'mixture', message: text, components: [] }),
};

export function entriesOf(text: string): readonly Entry[] {
  return readDocument(text, readers).entries;
}

/** The only compound of a document that holds these lines and nothing else. */
export function compoundOf(...lines: readonly string[]): CompoundEntry {
  const [entry] = entriesOf(['```compound', ...lines, '```'].join('\n'));
  if (entry?.kind !== 'compound') throw new Error('no compound block');
  return entry;
}

export function reactionOf(...lines: readonly string[]): ReactionEntry {
  const [entry] = entriesOf(['```reaction', ...lines, '```'].join('\n'));
  if (entry?.kind !== 'reaction') throw new Error('no reaction block');
  return entry;
}

/** Check id and characters of each problem. */
export function problemsOf(text: string): string[] {
  return entriesOf(text).flatMap(({ problems }) =>
    problems.map(({ check, range }) => `${check}: ${text.slice(range.start, range.end)}`),
  );
}

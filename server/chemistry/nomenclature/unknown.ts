/** What is said of a name that was not understood: where reading stopped, and which known words are near. */
import leven from 'leven';
import type { TextRange } from '../text.ts';
import type { UnknownName } from './reading.ts';
import type { ItemReader } from './words/items.ts';
import type { PreparedName } from './words/prepared.ts';

const wordCharacter = /[\p{L}]/u;

export function unknownName(
  original: string,
  prepared: PreparedName,
  reader: ItemReader,
  failure: { range: TextRange; message: string } | undefined,
  vocabulary: readonly string[],
): UnknownName {
  const place = (offset: number) =>
    Math.min(prepared.origin[Math.min(offset, prepared.text.length)] ?? original.length, original.length);
  if (failure && !reader.exhausted) {
    const range = ordered(place(failure.range.start), place(failure.range.end));
    return { kind: 'unknown', stoppedAt: range.start, range, message: failure.message, suggestions: [] };
  }
  const stopped = Math.min(reader.furthest, prepared.text.length);
  let start = stopped;
  while (start < prepared.text.length && !wordCharacter.test(prepared.text[start]!)) start++;
  if (start === prepared.text.length) start = stopped;
  let end = start;
  while (end < prepared.text.length && wordCharacter.test(prepared.text[end]!)) end++;
  const word = prepared.lower.slice(start, end);
  const range = ordered(place(start), place(end));
  const message = reader.exhausted
    ? `This name can be cut in so many ways that reading it was given up after ${String(reader.stepLimit)} steps.`
    : word === ''
      ? 'The name ends before it names a compound. Something is missing at its end.'
      : `“${original.slice(range.start, range.end)}” is not understood here. Check the spelling, or give the structure as SMILES.`;
  return {
    kind: 'unknown',
    stoppedAt: place(stopped),
    range,
    message,
    suggestions: nearest(word, vocabulary),
  };
}

function ordered(start: number, end: number): TextRange {
  return { start: Math.min(start, end), end: Math.max(start, end) };
}

/** The three nearest words, at most two letters in five apart. */
function nearest(word: string, vocabulary: readonly string[]): string[] {
  if (word.length < 4 || word.length > 40) return [];
  const limit = Math.max(1, Math.floor(word.length * 0.34));
  const scored: { known: string; distance: number }[] = [];
  for (const known of vocabulary) {
    if (Math.abs(known.length - word.length) > limit) continue;
    const distance = leven(word, known);
    if (distance <= limit && distance > 0) scored.push({ known, distance });
  }
  // Whoever misspells a word mostly gets its first letter right.
  const begins = (known: string) => (known[0] === word[0] ? 0 : 1);
  scored.sort(
    (a, b) => a.distance - b.distance || begins(a.known) - begins(b.known) || (a.known < b.known ? -1 : 1),
  );
  const whole = [...new Set(scored.map((one) => one.known))].slice(0, 3);
  return whole.length > 0 ? whole : withBeginningMended(word, vocabulary);
}

/** Words run together in names: the beginning alone may be misspelt by a letter, as in metylpropan. */
function withBeginningMended(word: string, vocabulary: readonly string[]): string[] {
  const mended: { text: string; length: number }[] = [];
  for (const known of vocabulary) {
    if (known.length < 4 || known.length >= word.length) continue;
    for (const length of [known.length - 1, known.length, known.length + 1]) {
      if (length >= word.length || leven(word.slice(0, length), known) !== 1) continue;
      mended.push({ text: known + word.slice(length), length: known.length });
    }
  }
  const begins = (text: string) => (text[0] === word[0] ? 0 : 1);
  mended.sort((a, b) => begins(a.text) - begins(b.text) || b.length - a.length || (a.text < b.text ? -1 : 1));
  return [...new Set(mended.map((one) => one.text))].slice(0, 3);
}

/** A whole name as words: substitutive names alone, or joined by function words, ions and adducts (P-51.3). */
import type { Locant } from '../tree.ts';
import { classWords, type ClassWord } from '../vocabulary/class-words.ts';
import { adducts, cations, functionWords } from '../vocabulary/functions.ts';
import type { ItemReader, Stretch } from './items.ts';
import { locantsAt } from './locants.ts';
import { numericalTerm } from '../vocabulary/numbers.ts';

/** Which place of an acid a group is said to be on: `S-ethyl`, `1-O-butyl` (P-65.6.3.2.2). */
export interface Site {
  /** Not said in `1-tert-butyl 2-methyl …-1,2-dicarboxylate`. */
  readonly element?: 'O' | 'S';
  readonly position?: number;
  /** `O,S-dimethyl`: the elements of the further groups. */
  readonly others?: readonly ('O' | 'S')[];
}

export type Part =
  | {
      readonly kind: 'stretch';
      readonly stretch: Stretch;
      readonly start: number;
      readonly site?: Site;
      readonly mono?: boolean;
    }
  | {
      readonly kind: 'function';
      readonly index: number;
      readonly count: number | undefined;
      readonly start: number;
      readonly end: number;
    }
  | {
      readonly kind: 'cation';
      readonly index: number;
      readonly count: number | undefined;
      readonly start: number;
      readonly end: number;
    }
  | { readonly kind: 'hydrogen'; readonly count: number; readonly start: number; readonly end: number }
  | {
      readonly kind: 'adduct';
      readonly index: number;
      readonly count: number;
      readonly start: number;
      readonly end: number;
    }
  | { readonly kind: 'class'; readonly word: ClassWord; readonly start: number; readonly end: number }
  | {
      readonly kind: 'oxide';
      readonly locants: readonly Locant[];
      readonly start: number;
      readonly end: number;
    };

const sentenceCap = 16;
const siteWord = /(?:(\d+)-)?([OS])((?:,[OS])*)(\d*)-/y;
const placeWord = /(\d+)-(?=[(a-z])/y;
/** `1-tert-butyl 2-methyl …-1,2-dicarboxylate`: two groups, each with its place on the acid. */
const twoPlaced = /^\d+-\S+ \d+-\S+ \S*di(?:carboxyl|o)ate$/;
const multiples: readonly (readonly [string, number])[] = [
  ...[2, 3, 4, 5, 6].map((count) => [numericalTerm(count), count] as const),
  ['mono', 1],
  ['bis', 2],
  ['tris', 3],
  ['hemi', 0.5],
  ['sesqui', 1.5],
];
const wordEnd = /[\s,;.·]|$/y;

/** All ways in which the text to its end is a row of words. */
export function sentences(reader: ItemReader): Part[][] {
  const text = reader.name.text;
  const found: Part[][] = [];
  const memo = new Map<number, readonly (Part & { end: number })[]>();
  walk(0, []);
  return found;

  function walk(offset: number, before: readonly Part[]): void {
    if (found.length >= sentenceCap || before.length > 7 || reader.exhausted) return;
    let parts = memo.get(offset);
    if (!parts) memo.set(offset, (parts = [...partsAt(reader, offset)]));
    for (const part of parts) {
      const end = part.end;
      if (end === text.length) {
        if (found.length < sentenceCap) found.push([...before, part]);
      } else if (text[end] === ' ') {
        const next = text.startsWith(' · ', end) ? end + 3 : end + 1;
        walk(next, [...before, part]);
      }
    }
  }
}

function* partsAt(reader: ItemReader, offset: number): Generator<Part & { end: number }> {
  const { lower } = reader.name;
  for (const part of plainWords(lower, offset)) {
    reader.furthest = Math.max(reader.furthest, part.end);
    yield part;
  }
  yield* oxideAt(reader, offset);
  siteWord.lastIndex = offset;
  const word = siteWord.exec(reader.name.text);
  if (word) {
    const position = word[1] ?? (word[4] === '' ? undefined : word[4]);
    const others = word[3]!.split(',').slice(1) as ('O' | 'S')[];
    const site: Site = {
      element: word[2] as 'O' | 'S',
      ...(others.length > 0 ? { others } : {}),
      ...(position === undefined ? {} : { position: Number(position) }),
    };
    for (const stretch of reader.stretchesAt(siteWord.lastIndex)) {
      if (stretch.role === 'radical' && (others.length === 0 || stretch.count === others.length + 1))
        yield { kind: 'stretch', stretch, start: offset, site, end: stretch.end };
    }
  }
  placeWord.lastIndex = offset;
  const place = twoPlaced.test(lower) ? placeWord.exec(reader.name.text) : undefined;
  if (place) {
    for (const stretch of reader.stretchesAt(placeWord.lastIndex)) {
      if (stretch.role === 'radical' && reader.name.text[stretch.end] === ' ')
        yield {
          kind: 'stretch',
          stretch,
          start: offset,
          site: { position: Number(place[1]) },
          end: stretch.end,
        };
    }
  }
  for (const stretch of reader.stretchesAt(offset)) {
    const mono = lower.startsWith('mono', offset) ? { mono: true } : {};
    yield { kind: 'stretch', stretch, start: offset, ...mono, end: stretch.end };
  }
}

/** `1,1-dioxide`, `N-oxide`. */
function* oxideAt(reader: ItemReader, offset: number): Generator<Part & { end: number }> {
  const { text, lower } = reader.name;
  const locants = locantsAt(text, offset);
  if (!locants) return;
  const multiple = locants.value.length === 1 ? '' : numericalTerm(locants.value.length);
  const end = locants.end + multiple.length + 'oxide'.length;
  wordEnd.lastIndex = end;
  if (!lower.startsWith(`${multiple}oxide`, locants.end) || !wordEnd.test(lower)) return;
  reader.furthest = Math.max(reader.furthest, end);
  yield { kind: 'oxide', locants: locants.value, start: offset, end };
}

/** Words that stand by themselves begin so; most words of names do not. */
const plainStart = new RegExp(
  `(?:${[...functionWords, ...cations, ...adducts, ...classWords.map((word) => [word] as const)].map(([word]) => word.replace(/[()]/g, '\\$&')).join('|')}|hydrogen)`,
  'y',
);

function* plainWords(lower: string, offset: number): Generator<Part & { end: number }> {
  for (const [multiple, count] of [['', undefined] as const, ...multiples]) {
    if (!lower.startsWith(multiple, offset)) continue;
    const start = offset + multiple.length;
    plainStart.lastIndex = start;
    if (!plainStart.test(lower)) continue;
    const ends = (word: string): number | undefined => {
      if (!lower.startsWith(word, start)) return undefined;
      wordEnd.lastIndex = start + word.length;
      return wordEnd.test(lower) ? start + word.length : undefined;
    };
    for (const [index, [word]] of functionWords.entries()) {
      const end = ends(word);
      if (end !== undefined) yield { kind: 'function', index, count, start: offset, end };
    }
    for (const [index, [word]] of cations.entries()) {
      const end = ends(word);
      if (end !== undefined) yield { kind: 'cation', index, count, start: offset, end };
    }
    for (const [index, [word]] of adducts.entries()) {
      const end = ends(word);
      if (end !== undefined) yield { kind: 'adduct', index, count: count ?? 1, start: offset, end };
    }
    const hydrogen = ends('hydrogen');
    if (hydrogen !== undefined) yield { kind: 'hydrogen', count: count ?? 1, start: offset, end: hydrogen };
    if (multiple !== '') continue;
    for (const word of classWords) {
      const end = ends(word);
      if (end !== undefined) yield { kind: 'class', word, start: offset, end };
    }
  }
}

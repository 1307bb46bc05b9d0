/**
 * Reads chemical names: what a name can mean, or where it stops being understood. Follows the IUPAC Recommendations
 * 2013 (Favre, Powell: Nomenclature of Organic Chemistry) and the usage of 1979 and 1993 still met in notebooks.
 */
import type { TextRange } from '../text.ts';
import type { NameReading, NameRemark, Reading } from './reading.ts';
import { completedName, meaningsOf, type Described, type Meaning, type Meanings } from './readings.ts';
import { createCommonNames, type CommonNames } from './common-names.ts';
import { arrangedReading } from './arrange.ts';
import { knownReading } from './known-readings.ts';
import { isLongestChain } from './build/proper-chain.ts';
import { improperRemark, properAlkaneName } from './proper-name.ts';
import { aminoAcids } from './vocabulary/amino-acids.ts';
import { unknownName } from './unknown.ts';
import { ItemReader } from './words/items.ts';
import { createLexicon, type Lexicon } from './words/lexicon.ts';
import { prepareName, rejoined, type PreparedName } from './words/prepared.ts';
import { sentences } from './words/sentence.ts';

export interface NameLimits {
  /** Readings listed at most; 32 unless told. */
  readonly readings?: number;
  /** Stereoisomers listed for each reading at most; 32 unless told. */
  readonly stereoisomers?: number;
  /** Steps of reading and structures built; 4000 unless told. */
  readonly steps?: number;
}

export interface NameReader {
  /** Every structure that the name can mean. Any string is valid input; effort is bounded by counted steps. */
  readName(text: string, limits?: NameLimits): NameReading;
  /** Words that the reader knows, for completion. */
  vocabularyWords(): readonly string[];
}

const shared: { reader?: NameReader } = {};

/** Reads a name with a reader made at the first call and kept. */
export function readName(text: string, limits: NameLimits = {}): NameReading {
  return (shared.reader ??= createNameReader()).readName(text, limits);
}

/** Words of the vocabulary, sorted, for completion. */
export function vocabularyWords(): readonly string[] {
  return (shared.reader ??= createNameReader()).vocabularyWords();
}

/** Structures built for one name at most. */
const buildLimit = 1000;

/** A group before such a word is mostly that of an ester. */
const aminoAcidNames: ReadonlySet<string> = new Set(aminoAcids.map(([name]) => name));

/** Names longer than this are not read. */
const longestName = 1500;

/** A reader with its vocabulary indexed (a few milliseconds); keep it, and use it again. */
export function createNameReader(): NameReader {
  const lexicon = createLexicon();
  const common = createCommonNames();
  return {
    readName: (text, limits = {}) => read(text, limits, lexicon, common),
    vocabularyWords: () => [...new Set([...common.names, ...lexicon.list])].sort(),
  };
}

function read(
  text: string,
  limits: NameLimits,
  lexicon: Lexicon,
  common: CommonNames,
  depth = 0,
): NameReading {
  const tooLong = text.length > longestName;
  const written = prepareName(tooLong ? '' : text);
  if (written.text === '') {
    const message = tooLong
      ? `This name is too long to be read: names of up to ${String(longestName)} characters are.`
      : 'There is no name here.';
    return { kind: 'unknown', stoppedAt: 0, range: { start: 0, end: text.length }, message, suggestions: [] };
  }
  const readOther = (other: string) => read(other, limits, lexicon, common, depth + 1);
  const known = knownReading(text, written, common, limits, readOther, depth);
  if (known) return known;
  const attempt = (name: PreparedName) => {
    const reader = new ItemReader(name, lexicon, limits.steps ?? 4000);
    return { name, reader, ...meaningsOf(sentences(reader), Math.min(limits.steps ?? 4000, buildLimit)) };
  };
  const first = attempt(written);
  const other =
    first.meanings.length === 0 && !first.reader.exhausted ? rejoined(written, aminoAcidNames) : undefined;
  const joined = other && attempt(other);
  // Putting words together is an assumption already: it holds only when a single compound comes of it.
  const second =
    joined?.meanings.length === 1 && joined.complete && !joined.reader.exhausted ? joined : undefined;
  const { name: prepared, reader, meanings, complete, failure } = second ?? first;
  // What was found before a bound was met is not all that the name can mean: one reading would be a guess.
  const given = reader.exhausted || (!complete && meanings.length < 2);
  if (given || meanings.length === 0) {
    const vocabulary = [...lexicon.list, ...common.names];
    return unknownName(text, prepared, reader, complete ? failure : tooOpen(failure, text), vocabulary);
  }
  const cap = limits.readings ?? 32;
  const remarks = new Map<string, NameRemark>();
  const readings = meanings.slice(0, cap).map((meaning): Reading => {
    const complete = (described: readonly Described[], dropped: readonly TextRange[] = []) =>
      completed(text, prepared, meaning, meanings.length > 1, described, dropped);
    const arranged = arrangedReading(complete, meaning.molecule, meaning.draft, prepared, limits);
    for (const chain of meaning.draft.chains) {
      if (!chain.plain || isLongestChain(chain, meaning.draft)) continue;
      const proper = properAlkaneName(meaning.molecule);
      const remark = improperRemark(chain.range, prepared, text, proper);
      remarks.set('improper', remark);
    }
    for (const remark of arranged.remarks)
      remarks.set(`${String(remark.range.start)} ${remark.message}`, remark);
    return arranged.reading;
  });
  return {
    kind: 'understood',
    readings,
    remarks: [...remarks.values()],
    ...(meanings.length > cap || !complete ? { count: meanings.length } : {}),
    ...(complete ? {} : { atLeast: true as const }),
  };
}

function tooOpen(failure: Meanings['failure'], text: string): Meanings['failure'] {
  const message = `This name leaves so much open that reading it was given up after ${String(buildLimit)} structures.`;
  return { range: failure?.range ?? { start: 0, end: text.length }, message };
}

/** What is missing is written into the text as typed, or into the prepared one where that has another order. */
function completed(
  text: string,
  prepared: PreparedName,
  meaning: Meaning,
  locants: boolean,
  described: readonly Described[],
  dropped: readonly TextRange[],
): string {
  if (!locants && described.length === 0) return text;
  const { insertions, draft } = meaning;
  const inOrder = prepared.origin.every((from, index) => index === 0 || from >= prepared.origin[index - 1]!);
  const base = inOrder ? text : prepared.text;
  const place = (offset: number) => (inOrder ? (prepared.origin[offset] ?? text.length) : offset);
  return completedName(
    base,
    locants ? insertions.map((one) => ({ ...one, at: place(one.at) })) : [],
    locants ? draft.brackets.map((one) => ({ ...one, at: place(one.at), end: place(one.end) })) : [],
    described.map(({ owner, text: letters }) => ({
      text: letters,
      owner: {
        ...owner,
        at: place(owner.at),
        ...(owner.wrapTo === undefined ? {} : { wrapTo: place(owner.wrapTo) }),
      },
    })),
    dropped.map(({ start, end }) => ({ at: place(start), end: place(end) })),
  );
}

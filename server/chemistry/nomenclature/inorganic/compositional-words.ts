/** Words of compositional names taken apart: multiplying prefixes, charge numbers, cations, anions. */
import { elementWithNumber, isMetal } from '../../composition/elements.ts';
import { anionWords, cationWords, chargedWords, metalWords } from '../vocabulary/inorganic-words.ts';
import { groupTerm, numericalTerm } from '../vocabulary/numbers.ts';

/** A cation as a name has it: an element with the charge that the name states, or an ion. */
export interface CationWord {
  readonly symbol?: string;
  readonly smiles?: string;
  readonly charge?: number;
  /** How many the name states; undefined where it leaves that to the charges. */
  readonly count: number | undefined;
}

export interface AnionWord {
  readonly smiles: string;
  readonly count: number | undefined;
}

export const metalSymbols: ReadonlyMap<string, string> = new Map([
  ...Array.from({ length: 103 }, (_, index) => index + 1).flatMap((atomicNumber) => {
    const element = isMetal(atomicNumber) ? elementWithNumber(atomicNumber) : undefined;
    return element ? [[element.name, element.symbol] as const] : [];
  }),
  ...metalWords,
]);
const charged = new Map(chargedWords.map(([word, symbol, charge]) => [word, { symbol, charge }]));
const cations = new Map(cationWords);
const anions = new Map(
  anionWords.flatMap(([words, smiles]) => words.split('|').map((word) => [word, smiles] as const)),
);
const romans = ['0', 'i', 'ii', 'iii', 'iv', 'v', 'vi', 'vii', 'viii'];

/** Multiplying prefixes by length, the longest first; before a vowel their last one is dropped (`tetroxide`). */
const prefixes: readonly (readonly [prefix: string, count: number])[] = Array.from(
  { length: 18 },
  (_, index) => index + 1,
)
  .flatMap((count): (readonly [string, number])[] => {
    const term = numericalTerm(count);
    const short = term.replace(/[ao]$/, '');
    return [
      [term, count],
      ...(count > 1 ? [[groupTerm(count), count] as const] : []),
      ...(short === term ? [] : [[short, count] as const]),
    ];
  })
  .sort((first, second) => second[0].length - first[0].length);

/** Every way to take a multiplying prefix off a word, none first. */
export function* unmultiplied(word: string): Generator<{ rest: string; count: number | undefined }> {
  yield { rest: word, count: undefined };
  for (const [prefix, count] of prefixes) {
    if (!word.startsWith(prefix) || word.length === prefix.length) continue;
    const rest = word.slice(prefix.length);
    if (/[aeiou]$/.test(prefix) || /^[aeiou(]/.test(rest)) yield { rest: unbracketed(rest), count };
    else if (/s$/.test(prefix)) yield { rest: unbracketed(rest), count };
  }
}

const unbracketed = (word: string) => /^\(([^()]*(?:\([^()]*\)[^()]*)*)\)$/.exec(word)?.[1] ?? word;

export function cationWord(word: string): CationWord | undefined {
  for (const { rest, count } of unmultiplied(word)) {
    const smiles = cations.get(rest);
    if (smiles !== undefined) return { smiles, count };
    const old = charged.get(rest);
    if (old) return { ...old, count };
    const [, name, number] = /^([a-z]+)(?:\((0|[iv]+|\d\+)\))?$/.exec(rest) ?? [];
    const symbol = name === undefined ? undefined : metalSymbols.get(name);
    if (symbol === undefined) continue;
    const charge = number === undefined ? undefined : chargeNumber(number);
    return charge === undefined ? { symbol, count } : { symbol, charge, count };
  }
  return undefined;
}

function chargeNumber(number: string): number | undefined {
  if (number.endsWith('+')) return Number(number.slice(0, -1));
  const index = romans.indexOf(number);
  return index < 0 ? undefined : index;
}

export function anionWord(word: string): AnionWord | undefined {
  for (const { rest, count } of unmultiplied(word)) {
    const smiles = anions.get(rest);
    if (smiles !== undefined) return { smiles, count };
  }
  return undefined;
}

/** `hydrogen`, `dihydrogen`: how many; undefined for another word. */
export function hydrogenWord(word: string): number | undefined {
  for (const { rest, count } of unmultiplied(word)) if (rest === 'hydrogen') return count ?? 1;
  return undefined;
}

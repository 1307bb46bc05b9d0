/**
 * A name made ready for reading: one spelling for dashes, primes and spaces, inverted index names turned round, and for
 * every character the place it came from, so that ranges still point into what was typed.
 */
import { respellings, wrongSpaces } from './spelling.ts';
import type { TextRange } from '../../text.ts';

export interface PreparedName {
  readonly text: string;
  readonly lower: string;
  /** For each character of `text`, and its end, the offset in the original. */
  readonly origin: readonly number[];
}

const oneForOne: Readonly<Record<string, string>> = {
  '‐': '-',
  '‑': '-',
  '‒': '-',
  '–': '-',
  '—': '-',
  '−': '-',
  '’': "'",
  '‘': "'",
  '′': "'",
  ʹ: "'",
  '`': "'",
  '´': "'",
  '\u00a0': ' ',
  '\u2009': ' ',
  '\u202f': ' ',
  '\t': ' ',
  '{': '(',
  '}': ')',
  '[': '[',
  ']': ']',
  '⁰': '0',
  '¹': '1',
  '²': '2',
  '³': '3',
  '⁴': '4',
  '⁵': '5',
  '⁶': '6',
  '⁷': '7',
  '⁸': '8',
  '⁹': '9',
};
const greek: Readonly<Record<string, string>> = {
  alpha: 'α',
  beta: 'β',
  gamma: 'γ',
  delta: 'δ',
  epsilon: 'ε',
  omega: 'ω',
  lambda: 'λ',
};

/** Nothing in such a name has another spelling; most names are so. */
const plain = /^[\w()[\],.;:'+*-](?:[\w()[\],.;:'+* -]*[\w()[\],.;:'+*-])?$/;

/** Prepares a name; its length may change, `origin` says how. Linear in the length of the text. */
export function prepareName(original: string): PreparedName {
  if (plain.test(original) && !original.includes('  ')) {
    const origin = Array.from({ length: original.length + 1 }, (_, index) => index);
    return settle({ text: original, lower: original.toLowerCase(), origin });
  }
  let text = '';
  const origin: number[] = [];
  const put = (characters: string, from: number) => {
    for (const character of characters) {
      text += character;
      origin.push(from);
    }
  };
  for (let index = 0; index < original.length; index++) {
    const character = original[index]!;
    if (character === '″' || character === '"') put("''", index);
    else if (character === '‴') put("'''", index);
    else if ((character === ' ' || character === '\n') && (text === '' || text.endsWith(' '))) continue;
    else put(oneForOne[character] ?? character, index);
  }
  while (text.endsWith(' ')) {
    text = text.slice(0, -1);
    origin.pop();
  }
  origin.push(original.length);
  return settle({ text, lower: text.toLowerCase(), origin });
}

const paired = /\b(?:cis|trans|[EZ])-\d{1,2}(?:,(?:cis|trans|[EZ])-\d{1,2})+-/g;

/** Applies the spellings that change the length: `sulph`, `.alpha.`, `alpha-`, and inverted names. */
function settle(name: PreparedName): PreparedName {
  let result = name;
  for (const [pattern, replacement] of respellings) result = replaceAll(result, pattern, replacement);
  if (name.lower.includes('sulph')) result = replaceAll(result, /sulph/gi, () => 'sulf');
  result = replaceAll(
    result,
    /\.?\b(alpha|beta|gamma|delta|epsilon|omega|lambda)\b\.?(?=[-,')])/gi,
    (word) => greek[word.replace(/\./g, '').toLowerCase()]!,
  );
  if (/lambda|λ|î»/.test(result.lower)) result = withBondingNumbers(result);
  // `trans-2,cis-6-nonadienal`: the locants are those of the double bonds as well.
  result = replaceAll(result, paired, (match) => {
    const pairs = match
      .slice(0, -1)
      .split(',')
      .map((pair) => pair.split('-'));
    const words = pairs.map(([word, locant]) => `${locant!}-${word!}`).join(',');
    return `(${words})-${pairs.map(([, locant]) => locant!).join(',')}-`;
  });
  result = uninverted(result);
  // `acetic formic anhydride` (P-65.7.2): the word belongs to both.
  return replaceAll(result, /^[^ ]{1,60}ic (?=[^ ]{1,60}ic anhydride$)/gi, (word) => `${word}anhydride `);
}

/** `lambda5`, `λ^5`, `1-lambda4`, and the λ of one encoding read in another, as `1λ5`. */
function withBondingNumbers(name: PreparedName): PreparedName {
  const spelt = replaceAll(
    name,
    /\.?(?:lambda|λ|Î»)\.?(?:\^\(([1-9])\)|\^?([1-9]))/gi,
    (match) => `λ${/[1-9]/.exec(match)![0]}`,
  );
  return replaceAll(
    spelt,
    /\d-λ[1-9](?!-(?:phosph|sulf|sel|tell|ars|stib|bism|iod|brom|chlor)an)/g,
    (match) => match.replace('-', ''),
  );
}

function replaceAll(
  name: PreparedName,
  pattern: RegExp,
  replacement: (match: string, at: number) => string,
): PreparedName {
  let text = '';
  const origin: number[] = [];
  let last = 0;
  let found = false;
  for (const match of name.text.matchAll(pattern)) {
    found = true;
    text += name.text.slice(last, match.index);
    origin.push(...name.origin.slice(last, match.index));
    for (const character of replacement(match[0], match.index)) {
      text += character;
      origin.push(name.origin[match.index]!);
    }
    last = match.index + match[0].length;
  }
  if (!found) return name;
  text += name.text.slice(last);
  for (const place of name.origin.slice(last)) origin.push(place);
  return { text, lower: text.toLowerCase(), origin };
}

/**
 * Index names are printed with the parent first: `benzene, 1-bromo-4-chloro-` becomes `1-bromo-4-chlorobenzene`, and
 * `propanoic acid, 2-methyl-, ethyl ester` becomes `2-methylpropanoic acid ethyl ester`.
 */
function uninverted(name: PreparedName): PreparedName {
  const [head, ...rest] = segmentsOf(name.text);
  if (!head || rest.length === 0 || rest.length > 6) return name;
  if (!/[a-z]{3}[)\]]?$/i.test(name.text.slice(head.start, head.end))) return name;
  if (rest.some(({ start, end }) => !/[a-z]{3}|[EZRS]\)-$/i.test(name.text.slice(start, end)))) return name;
  const isPrefix = ({ end }: TextRange) => name.text[end - 1] === '-';
  const pieces: TextRange[] = [];
  for (const { start, end } of rest.filter(isPrefix)) pieces.push({ start, end });
  const last = pieces.pop();
  // The hyphen stays before a locant: `2-methyl-2-propenoic acid`.
  if (last)
    pieces.push({ start: last.start, end: /[\d(]/.test(name.text[head.start]!) ? last.end : last.end - 1 });
  pieces.push(head);
  // A space, as it stands after the comma.
  for (const one of rest) if (!isPrefix(one)) pieces.push({ start: one.start - 1, end: one.end });
  const pick = (list: string) => pieces.map(({ start, end }) => list.slice(start, end)).join('');
  const origin = pieces.flatMap(({ start, end }) => name.origin.slice(start, end));
  return {
    text: pick(name.text),
    lower: pick(name.lower),
    origin: [
      ...origin,
      pieces[pieces.length - 1] === head ? name.origin[head.end]! : name.origin[name.text.length]!,
    ],
  };
}

/** The parts between commas that a space follows, outside brackets. */
function segmentsOf(text: string): TextRange[] {
  const found: TextRange[] = [];
  let depth = 0;
  let start = 0;
  for (let at = 0; at <= text.length; at++) {
    if (text[at] === '(' || text[at] === '[') depth++;
    else if (text[at] === ')' || text[at] === ']') depth--;
    else if (at === text.length || (depth === 0 && text.startsWith(', ', at))) {
      found.push({ start, end: at });
      start = at + 2;
    }
  }
  return found;
}

/** The name with words put together that were written apart; undefined when there are none. */
export function rejoined(name: PreparedName, aminoAcids: ReadonlySet<string>): PreparedName | undefined {
  const spaces = wrongSpaces(name.lower, aminoAcids);
  if (!spaces) return undefined;
  return replaceAll(name, / /g, (space, at) => spaces.get(at) ?? space);
}

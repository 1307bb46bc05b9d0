/** Locants and stereodescriptors as they are written in front of words. */
import type { Locant, StereoWord } from '../tree.ts';

/** `2(10)`: a bond between two places that do not follow each other (P-31.1.4.2.4). */
const compound = "(?:\\(\\d+[a-z]?'*\\))?";
const one = `(?:\\d+(?:[a-z](?![a-z]))?'*${compound}(?:-N'*(?![a-z]))?|[NnOSP]\\d*'*|[αβγδεω]'*|[omp])`;
const list = new RegExp(`(${one}(?:, ?${one})*)-`, 'y');
const indicated = /\(?((?:\d+[a-z]?'*[Hh](?![a-z]))(?:,\d+[a-z]?'*[Hh](?![a-z]))*)\)?-?/y;
const descriptor =
  /\(((?:(?:\d+[a-z]?'*|[NSP])?(?:[RSEZMPrsez]|ξ)\*?)(?:[,;] ?(?:\d+[a-z]?'*|[NSP])?(?:[RSEZMPrsez])\*?)*)\)-?/y;
const wordDescriptor =
  /(cis|trans|rac|rel|meso|Z|E|dl|DL|D|L)-|\(((?:\+|-|±|\+\/-|\+-|cis|trans|dl|DL|d|l|rac))\)-/y;

export interface Written<T> {
  readonly value: T;
  readonly end: number;
}

/** `1,3-`, `N,N-`, `2'-`, `o-` at the offset; the hyphen is consumed. */
export function locantsAt(text: string, offset: number): Written<Locant[]> | undefined {
  list.lastIndex = offset;
  const match = list.exec(text);
  if (!match) return undefined;
  const value = match[1]!.split(/, ?/).map((locant) => {
    const normal = locant.replace(/^n(?=\d|'|$)/, 'N');
    const numbered = /^N(\d+)$/.exec(normal);
    return numbered ? `${numbered[1]!}-N` : normal;
  });
  return { value, end: list.lastIndex };
}

/** `1H-`, `2H,4H-` at the offset, parentheses allowed. */
export function indicatedAt(text: string, offset: number): Written<Locant[]> | undefined {
  indicated.lastIndex = offset;
  const match = indicated.exec(text);
  if (!match) return undefined;
  return { value: match[1]!.split(',').map((one) => one.slice(0, -1)), end: indicated.lastIndex };
}

/** `(2R,3S)-`, `(E)-`, `cis-`, `rac-`, `(±)-` at the offset. The sign of rotation says nothing of structure. */
export function stereoAt(text: string, offset: number): Written<StereoWord[]> | undefined {
  descriptor.lastIndex = offset;
  const match = descriptor.exec(text);
  if (match) {
    const words: StereoWord[] = [];
    let at = offset + 1;
    for (const part of match[1]!.split(/[,;]/)) {
      const lead = part.length - part.trimStart().length;
      const own = /^(\d+[a-z]?'*|[NSP](?=[RSEZ]))?(.)(\*?)$/.exec(part.trim());
      if (!own) return undefined;
      const range = { start: at + lead, end: at + part.length };
      words.push({
        ...(own[1] === undefined ? {} : { locant: own[1] }),
        letter: (/[ez]/.test(own[2]!) ? own[2]!.toUpperCase() : own[2]!) as StereoWord['letter'],
        range,
      });
      if (own[3] === '*') words.push({ letter: 'rel', range });
      at += part.length + 1;
    }
    return { value: words, end: descriptor.lastIndex };
  }
  wordDescriptor.lastIndex = offset;
  const word = wordDescriptor.exec(text);
  if (!word) return undefined;
  const letter = word[1] ?? word[2]!;
  const range = { start: offset, end: wordDescriptor.lastIndex - 1 };
  const end = wordDescriptor.lastIndex;
  if (letter === '+' || letter === '-' || letter === 'd' || letter === 'l') return { value: [], end };
  if (letter === '±' || letter === '+/-' || letter === '+-' || letter.toLowerCase() === 'dl') {
    return { value: [{ letter: 'rac', range }], end };
  }
  return { value: [{ letter: letter as StereoWord['letter'], range }], end };
}

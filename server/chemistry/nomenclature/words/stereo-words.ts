/**
 * Stereodescriptors as they are written in front of words: `(2R,3S)-`, `(E)-`, `cis-`, `rac-`, `all-trans-`, `(2RS,3SR)-`,
 * `(R*,S*)-` (P-91.2, P-93.1.3; `cis,cis-` and `all-` are common practice, no source).
 */
import type { StereoWord } from '../tree.ts';
import type { Written } from './locants.ts';

type Letter = StereoWord['letter'];

const letters = '(?:[RSEZMPrsez]\\*?|RS|SR|cis|trans|exo|endo|ξ)';
const part = `(?:(?:\\d+[a-z]?'*-?|[NSP](?=[RSEZ]))?${letters})`;
const bracketed = new RegExp(`\\((?:(all)-)?(${part}(?:[,;] ?${part})*)\\)-?`, 'y');
const single = new RegExp(`^(\\d+[a-z]?'*|[NSP](?=[RSEZ]))?-?(${letters})$`);
const word =
  /(?:(all)-)?(cis|trans|exo|endo|rac|rel|meso|[EZ]|dl|DL|[DLdl])((?:,(?:cis|trans|E|Z))*)-|\(((?:\+|-|±|\+\/-|\+-|cis|trans|exo|endo|meso|dl|DL|d|l|rac|rel))\)-/y;

/** Descriptors at the offset; the sign of rotation too, which says something only before names that it belongs to. */
export function stereoAt(text: string, offset: number): Written<StereoWord[]> | undefined {
  return inBrackets(text, offset) ?? asWord(text, offset);
}

function inBrackets(text: string, offset: number): Written<StereoWord[]> | undefined {
  bracketed.lastIndex = offset;
  const match = bracketed.exec(text);
  if (!match) return undefined;
  const end = bracketed.lastIndex;
  const whole = { start: offset, end };
  const words: StereoWord[] = [];
  let racemic = true;
  let at = offset + 1 + (match[1] === undefined ? 0 : 4);
  for (const piece of match[2]!.split(/[,;]/)) {
    const lead = piece.length - piece.trimStart().length;
    const own = single.exec(piece.trim());
    if (!own) return undefined;
    const range = { start: at + lead, end: at + piece.length };
    at += piece.length + 1;
    const star = own[2]!.endsWith('*');
    const both = own[2] === 'RS' || own[2] === 'SR';
    racemic &&= both;
    const written = star ? own[2]!.slice(0, -1) : both ? own[2]![0]! : own[2]!;
    words.push({
      ...(own[1] === undefined ? {} : { locant: own[1] }),
      letter: (/^[ez]$/.test(written) ? written.toUpperCase() : written) as Letter,
      range,
      whole,
      ...(match[1] === undefined ? {} : { all: true }),
      ...(both ? { either: true } : {}),
    });
    if (star) words.push({ letter: 'rel', range, whole });
  }
  // `(2RS,3SR)` is the racemate (P-93.1.3); beside a plain descriptor, or alone, `RS` leaves its centre open.
  if (racemic && words.length > 1) words.push({ letter: 'rac', range: words[0]!.range, whole });
  const said = racemic && words.length > 1 ? words : words.filter((one) => one.either !== true);
  return { value: said, end };
}

function asWord(text: string, offset: number): Written<StereoWord[]> | undefined {
  word.lastIndex = offset;
  const match = word.exec(text);
  if (!match) return undefined;
  const end = word.lastIndex;
  const whole = { start: offset, end };
  const range = { start: offset, end: end - 1 };
  const letter = match[2] ?? match[4]!;
  if (match[4] !== undefined && /^[+\-dl]$/.test(letter)) {
    const sign = letter === '+' || letter === 'd' ? '+' : '-';
    return { value: [{ letter: sign, range, whole }], end };
  }
  if (/^(?:±|\+\/-|\+-|dl)$/i.test(letter)) return { value: [{ letter: 'rac', range, whole }], end };
  const all = match[1] === undefined ? {} : { all: true };
  const more = match[3] === undefined || match[3] === '' ? [] : match[3].slice(1).split(',');
  // `l-alanine` in a name without capitals is L-alanine.
  const first = /^[dl]$/.test(letter) ? letter.toUpperCase() : letter;
  return { value: [first, ...more].map((one) => ({ letter: one as Letter, range, whole, ...all })), end };
}

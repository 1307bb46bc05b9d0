/** Locants as they are written in front of words. */
import type { Locant } from '../tree.ts';

/** `2(10)`: a bond between two places that do not follow each other (P-31.1.4.2.4). */
const compound = "(?:\\(\\d+[a-z]?'*\\))?";
const one = `(?:\\d+(?:[a-z](?![a-z]))?'*${compound}(?:-N'*(?![a-z]))?|[NnOSPC]\\d*'*|[αβγδεω]'*|[omp])`;
const list = new RegExp(`(${one}(?:, ?${one})*)-`, 'y');
const indicated = /\(?((?:\d+[a-z]?'*[Hh](?![a-z]))(?:,\d+[a-z]?'*[Hh](?![a-z]))*)\)?-?/y;

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

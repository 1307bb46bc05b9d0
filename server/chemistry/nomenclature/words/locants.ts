/** Locants as they are written in front of words. */
import type { BondingNumber, Locant } from '../tree.ts';

/** `2(10)`: a bond between two places that do not follow each other (P-31.1.4.2.4). */
const compound = "(?:\\(\\d+[a-gi-z]?'*\\))?";
const one = `(?:\\d+(?:[a-z](?![a-z]))?'*${compound}(?:-N'*(?![a-z])|λ[1-9])?|[NnOSPC](?:\\d+|[α-ω])?'*|[αβγδεω]'*|[omp])`;
const list = new RegExp(`(${one}(?:, ?${one})*)-`, 'y');
const indicated = /\(?((?:\d+[a-z]?'*[Hh](?![a-z]))(?:,\d+[a-z]?'*[Hh](?![a-z]))*)\)?-?/y;

const bonding = /((?:\d+[a-z]?'*)?λ[1-9](?:,\d+[a-z]?'*λ[1-9])*)(?=-)/y;

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

const withAdded = /-?(\d+[a-z]?'*(?:,\d+[a-z]?'*)*)\((\d+[a-z]?'*[Hh](?:,\d+[a-z]?'*[Hh])*)\)-/y;

/** `2(1H)-`, `-1,3(2H,4H)-`: locants of a group with the hydrogen that it brings along (P-31.1.4.3.4). */
export function addedHydrogenAt(
  text: string,
  offset: number,
): (Written<Locant[]> & { readonly added: Locant[] }) | undefined {
  withAdded.lastIndex = offset;
  const match = withAdded.exec(text);
  if (!match) return undefined;
  const added = match[2]!.split(',').map((one) => one.slice(0, -1));
  return { value: match[1]!.split(','), added, end: withAdded.lastIndex };
}

/** `5λ4`: a locant with its bonding number (P-14.1), or the locant alone. */
export function withBonding(locant: Locant): { locant: Locant; bonds?: number } {
  const at = locant.indexOf('λ');
  return at < 0 ? { locant } : { locant: locant.slice(0, at), bonds: Number(locant.slice(at + 1)) };
}

/** `λ5-`, `1λ4-`, `1λ4,3λ4-` before a parent; the hyphen is left. */
export function bondingAt(text: string, offset: number): Written<BondingNumber[]> | undefined {
  bonding.lastIndex = offset;
  const match = bonding.exec(text);
  if (!match) return undefined;
  const value = match[1]!.split(',').map((one): BondingNumber => {
    const { locant, bonds = 0 } = withBonding(one);
    return locant === '' ? { bonds } : { locant, bonds };
  });
  return { value, end: bonding.lastIndex };
}

/** `1H-`, `2H,4H-` at the offset, parentheses allowed. */
export function indicatedAt(text: string, offset: number): Written<Locant[]> | undefined {
  indicated.lastIndex = offset;
  const match = indicated.exec(text);
  if (!match) return undefined;
  return { value: match[1]!.split(',').map((one) => one.slice(0, -1)), end: indicated.lastIndex };
}

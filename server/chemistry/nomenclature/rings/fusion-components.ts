/** Names of components in fusion names: attached ones as prefixes, and the base component at the end (P-25.2, P-25.3.1). */
import { ring, type SkeletonGraph } from '../build/skeleton.ts';
import { contractedFusionPrefixes } from '../vocabulary/fusion-prefixes.ts';
import { alkaneStem } from '../vocabulary/numbers.ts';
import { componentOf, type Component } from './fused-system.ts';
import { hantzschWidmanAt } from './hantzsch-widman.ts';
import { chalcogens } from './mancude.ts';
import { namedRing } from './named-rings.ts';

export interface NamedComponents {
  /** What the name can mean; more than one where locants of heteroatoms are left out. */
  readonly components: readonly Component[];
  readonly end: number;
}

const longestWord = 30;
const made = new Map<string, Component | undefined>();
const contracted = new Map(contractedFusionPrefixes);
/** `cyclopenta`, and elided before a vowel `cyclopent` (1979 rules). */
const cycloalka = new Map<string, number>(
  Array.from({ length: 28 }, (_, index) => index + 3).flatMap((size) =>
    ['a', ''].map((ending): [string, number] => [`cyclo${alkaneStem(size)}${ending}`, size]),
  ),
);
/** Locants that a heteromonocycle can have when its name leaves them out. */
const possibleLocants = ['1,2', '1,3', '1,4', '1,2,3', '1,2,4', '1,2,5', '1,3,5', '1,2,3,4'];
const bracketedLocants = /\[(\d+(?:,\d+)*)\]/y;
const locantsBefore = /(?:\[(\d+(?:,\d+)*)\]|(\d+(?:,\d+)*)-)/y;

/** A prefix reaches up to the bracket of its fusion descriptor. */
const prefixWord = /[a-z]{4,30}(?=[[(])/y;

/** Attached components whose prefix begins at the offset. */
export function prefixesAt(lower: string, offset: number): NamedComponents[] {
  bracketedLocants.lastIndex = offset;
  const locants = bracketedLocants.exec(lower);
  prefixWord.lastIndex = locants ? bracketedLocants.lastIndex : offset;
  const word = prefixWord.exec(lower)?.[0];
  if (word === undefined) return [];
  const end = prefixWord.lastIndex;
  const size = locants ? undefined : cycloalka.get(word);
  if (size !== undefined) {
    const component = componentOf(mancudeRing(size));
    return component ? [{ components: [component], end }] : [];
  }
  const name = contracted.get(word) ?? (word.endsWith('o') ? word.slice(0, -1) : undefined);
  if (name === undefined) return [];
  const components = named(locants ? `${locants[1]!}-${name}` : name);
  return components.length > 0 ? [{ components, end }] : [];
}

/** The base component at the offset; `end` lies before its final e. */
export function basesAt(lower: string, offset: number): NamedComponents[] {
  locantsBefore.lastIndex = offset;
  const locants = locantsBefore.exec(lower);
  const from = locants ? locantsBefore.lastIndex : offset;
  const prefix = locants ? `${locants[1] ?? locants[2]!}-` : '';
  const found: NamedComponents[] = [];
  for (let length = Math.min(longestWord, lower.length - from); length > 2; length--) {
    const components = named(prefix + lower.slice(from, from + length));
    if (components.length > 0) found.push({ components, end: from + length });
  }
  return found;
}

/** `[7]annulene`, and `cycloheptene` where fusion names mean the ring with all its double bonds (index names). */
const carbocycle = /^(?:(\d{1,2})-annulen|(cyclo[a-z]+)en)$/;

/** Components with the whole of this name, its final e left out. */
function named(name: string): Component[] {
  const carbons = carbocycle.exec(name);
  const size = carbons && (carbons[1] === undefined ? cycloalka.get(carbons[2]!) : Number(carbons[1]));
  if (size !== null && size !== undefined) {
    const component = size > 2 && size <= 30 ? componentOf(mancudeRing(size)) : undefined;
    return component ? [component] : [];
  }
  const retained = retainedComponent(name);
  if (retained) return [retained];
  const ruled = heterocycles(name);
  if (ruled.length > 0 || /^\d/.test(name)) return ruled;
  return possibleLocants.flatMap((locants) => heterocycles(`${locants}-${name}`));
}

function retainedComponent(name: string): Component | undefined {
  if (made.has(name)) return made.get(name);
  const skeleton = namedRing(name);
  if (!skeleton) return undefined;
  const component = isMancude(skeleton) ? componentOf(skeleton) : undefined;
  made.set(name, component);
  return component;
}

const heterocyclesByName = new Map<string, Component[]>();

function heterocycles(name: string): Component[] {
  const known = heterocyclesByName.get(name);
  if (known) return known;
  const components = hantzschWidmanAt(name, name, 0)
    .filter(({ end }) => end === name.length)
    .flatMap(({ skeletons }) => skeletons.filter(isMancude).flatMap((one) => componentOf(one) ?? []));
  if (heterocyclesByName.size > 5000) heterocyclesByName.clear();
  heterocyclesByName.set(name, components);
  return components;
}

/** Components of fusion names have the most double bonds that they can have. */
function isMancude(skeleton: SkeletonGraph): boolean {
  return skeleton.atoms.every((atom) => atom.mancude || chalcogens.has(atom.atomicNumber));
}

const ringsBySize = new Map<number, SkeletonGraph>();

function mancudeRing(size: number): SkeletonGraph {
  let known = ringsBySize.get(size);
  if (!known) {
    const plain = ring(size);
    known = { ...plain, kind: 'fixed', atoms: plain.atoms.map((atom) => ({ ...atom, mancude: true })) };
    ringsBySize.set(size, known);
  }
  return known;
}

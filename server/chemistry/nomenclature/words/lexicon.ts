/** All words of the vocabulary in one trie, so that every word that begins at a place is found in a single walk. */
import { chain, metalSkeleton, skeletonFromSmiles, type SkeletonGraph } from '../build/skeleton.ts';
import { openSkeleton } from '../build/open-skeleton.ts';
import type { SuffixEntry } from '../tree.ts';
import { add, emptyTrie, type Trie } from './trie.ts';
import { derivativeWords } from '../vocabulary/class-words.ts';
import { anions } from '../vocabulary/functions.ts';
import { acids, type AcidLine } from '../vocabulary/acids.ts';
import { aminoAcids, type AminoAcidLine } from '../vocabulary/amino-acids.ts';
import { alkaneStem, groupTerm, numericalTerm, numericalTermVariants } from '../vocabulary/numbers.ts';
import { naturalAcids } from '../vocabulary/natural-acids.ts';
import { naturalParents } from '../vocabulary/natural-parents.ts';
import { extensibleParents, otherNumberings, parents } from '../vocabulary/parents.ts';
import { partlySaturatedRings, ringsWithGroups } from '../vocabulary/partly-saturated-rings.ts';
import {
  branchedStems,
  contractedRings,
  joiningPrefixes,
  linkingPrefixes,
  simplePrefixes,
} from '../vocabulary/prefixes.ts';
import { replacementPrefixes } from '../vocabulary/replacements.ts';
import { hydrides } from '../vocabulary/hydrides.ts';
import { metals } from '../vocabulary/metals.ts';
import { mineralAcids, mineralAnions } from '../vocabulary/mineral-acids.ts';
import { links, linkingToo, ringLinks } from '../vocabulary/links.ts';
import { namedRing, ringNames } from '../rings/named-rings.ts';
import { suffixes } from '../vocabulary/suffixes.ts';
import { terpeneGroups, terpenes } from '../vocabulary/terpenes.ts';

export type Word =
  | { kind: 'multiplier'; count: number; grouped: boolean }
  | { kind: 'alkane'; size: number }
  | {
      kind: 'radical';
      skeletons: Lazy;
      order: 1 | 2 | 3;
      linkAt?: number;
      needsLink?: boolean;
      links?: readonly number[];
    }
  | { kind: 'contracted'; skeletons: Lazy; valences: 1 | 2 }
  | { kind: 'derivative'; skeletons: Lazy; linkAt: number; of: 'carbonyl' | 'acid' }
  | { kind: 'link'; skeletons: Lazy; links: readonly number[]; linkAt?: number }
  | { kind: 'branched'; skeletons: Lazy; oxy: Lazy }
  | { kind: 'ring'; skeletons: Lazy }
  | { kind: 'parent'; skeletons: Lazy; extensible: boolean }
  | { kind: 'acid'; line: AcidLine; form: 'acid' | 'other' | 'peroxy'; skeletons: Lazy }
  | { kind: 'amino acid'; line: AminoAcidLine; suffix: AminoAcidSuffix; skeletons: Lazy }
  | { kind: 'hydro' }
  | { kind: 'replacement'; atomicNumber: number; charge: number };

export type AminoAcidSuffix = 'acid' | 'anion' | 'amide' | 'alcohol' | 'aldehyde' | 'acyl';
const aminoAcidEndings: readonly (readonly [string, AminoAcidSuffix])[] = [
  ['ate', 'anion'],
  ['amide', 'amide'],
  ['ol', 'alcohol'],
  ['al', 'aldehyde'],
];

/** Skeletons are read from their SMILES when first met. */
export type Lazy = () => readonly SkeletonGraph[];

function lazily(make: () => readonly (SkeletonGraph | undefined)[]): Lazy {
  let made: readonly SkeletonGraph[] | undefined;
  return () => (made ??= make().filter((one): one is SkeletonGraph => one !== undefined));
}

export interface Lexicon {
  readonly words: Trie<Word>;
  readonly suffixes: Trie<SuffixEntry>;
  readonly list: readonly string[];
}

/** Builds the index; about two thousand words. */
export function createLexicon(): Lexicon {
  const words = emptyTrie<Word>();
  const list: string[] = [];
  const put = (word: string, value: Word) => {
    add(words, word, value);
    if (word.length > 2) list.push(...shownForms(word, value));
  };
  for (let count = 2; count <= 30; count++) {
    put(numericalTerm(count), { kind: 'multiplier', count, grouped: false });
    put(groupTerm(count), { kind: 'multiplier', count, grouped: true });
  }
  put('mono', { kind: 'multiplier', count: 1, grouped: false });
  for (let size = 1; size <= 200; size++) {
    const stems =
      size < 5 ? [alkaneStem(size)] : numericalTermVariants(size).map((term) => term.replace(/a$/, ''));
    for (const stem of stems) put(stem, { kind: 'alkane', size });
  }
  const group = (smiles: string) => smiles.replace(/^[=#]/, '');
  const order = (smiles: string): 1 | 2 | 3 => (smiles.startsWith('=') ? 2 : smiles.startsWith('#') ? 3 : 1);
  for (const [name, smiles, locants] of simplePrefixes) {
    put(name, {
      kind: 'radical',
      order: order(smiles),
      skeletons: lazily(() => [skeletonFromSmiles(group(smiles), locants)]),
    });
  }
  for (const [lines, needsLink] of [
    [linkingPrefixes, false],
    [joiningPrefixes, true],
  ] as const) {
    for (const [name, smiles, locants, linkAt] of lines) {
      const skeletons = lazily(() => [skeletonFromSmiles(group(smiles), locants)]);
      const both = linkingToo[name];
      put(name, {
        kind: 'radical',
        order: order(smiles),
        skeletons,
        linkAt,
        needsLink,
        ...(both ? { links: both } : {}),
      });
    }
  }
  for (const name of ringNames) put(name, { kind: 'ring', skeletons: lazily(() => [namedRing(name)]) });
  for (const [name, ring] of contractedRings)
    put(name, { kind: 'contracted', skeletons: lazily(() => [namedRing(ring)]), valences: 1 });
  for (const [name, ring] of ringLinks)
    put(name, { kind: 'contracted', skeletons: lazily(() => [namedRing(ring)]), valences: 2 });
  putLinks(put);
  for (const [name, smiles, locants] of branchedStems) {
    put(name, {
      kind: 'branched',
      skeletons: lazily(() => [skeletonFromSmiles(smiles, locants)]),
      oxy: lazily(() => [skeletonFromSmiles(`O${smiles}`)]),
    });
  }
  putAminoAcids(put);
  putTerpenes(put);
  putParents(put);
  for (const line of [...acids, ...naturalAcids]) {
    const skeletons = lazily(() => [withSeries(skeletonFromSmiles(line[2], line[3]))]);
    put(line[0], { kind: 'acid', line, form: 'acid', skeletons });
    if (line[1] !== '') put(line[1], { kind: 'acid', line, form: 'other', skeletons });
    // P-65.1.4.2: `peroxybenzoic acid`, formerly `perbenzoic acid`.
    if (line[4].length === 1)
      for (const prefix of ['peroxy', 'per'])
        put(prefix + line[0], { kind: 'acid', line, form: 'peroxy', skeletons });
  }
  for (const [names, symbol, bonds] of metals) {
    const skeletons = lazily(() => [metalSkeleton(symbol, bonds)]);
    for (const name of names.split('|')) put(name, { kind: 'parent', skeletons, extensible: false });
  }
  for (const [name, smiles, locants] of [...anions, ...mineralAnions]) {
    put(name, {
      kind: 'parent',
      skeletons: lazily(() => [skeletonFromSmiles(smiles, locants)]),
      extensible: false,
    });
  }
  put('hydro', { kind: 'hydro' });
  for (const [name, atomicNumber, charge = 0] of replacementPrefixes)
    add(words, name, { kind: 'replacement', atomicNumber, charge });
  const endings = emptyTrie<SuffixEntry>();
  for (const suffix of suffixes) {
    add(endings, suffix.name, suffix);
    if (suffix.name.length > 2) list.push(suffix.name);
  }
  return { words, suffixes: endings, list };
}

/** Divalent groups by name, and the chains of `methylene` (`hexamethylene`). */
function putLinks(put: (word: string, value: Word) => void): void {
  for (const [name, smiles, locants, atoms, linkAt] of links) {
    const skeletons = lazily(() => [skeletonFromSmiles(smiles, locants)]);
    put(name, { kind: 'link', skeletons, links: atoms, ...(linkAt === undefined ? {} : { linkAt }) });
  }
  for (const [name, smiles, locants, linkAt, of] of derivativeWords) {
    const skeletons = lazily(() => [skeletonFromSmiles(smiles, locants)]);
    put(name, { kind: 'derivative', skeletons, linkAt, of });
  }
  for (let size = 3; size <= 12; size++)
    put(`${numericalTerm(size)}methylene`, {
      kind: 'link',
      skeletons: lazily(() => [chain(size)]),
      links: [0, size - 1],
    });
}

function putTerpenes(put: (word: string, value: Word) => void): void {
  const signed = (skeleton: SkeletonGraph | undefined, sign: '+' | '-' | '') =>
    skeleton && { ...skeleton, guarded: true, ...(sign === '' ? {} : { rotation: sign }) };
  for (const [name, smiles, locants, sign] of terpenes) {
    const skeletons = lazily(() => [signed(skeletonFromSmiles(smiles, locants), sign)]);
    put(name, { kind: 'parent', skeletons, extensible: false });
  }
  for (const [name, smiles, locants, sign] of terpeneGroups) {
    const skeletons = lazily(() => [signed(openSkeleton(smiles, locants), sign)]);
    put(name, { kind: 'radical', order: 1, skeletons });
  }
}

/** Acids with stereocentres have D and L forms. */
function withSeries(skeleton: SkeletonGraph | undefined): SkeletonGraph | undefined {
  const centred = skeleton?.stereo.some((element) => element.kind === 'tetrahedral');
  return skeleton && centred ? { ...skeleton, series: true } : skeleton;
}

/** `alanine`, `alaninate`, `alaninamide`, `alaninol`, `alaninal`, `alanyl`; `aspartic acid`, `aspartate` (P-103.2). */
function putAminoAcids(put: (word: string, value: Word) => void): void {
  for (const line of aminoAcids) {
    const [name, acyl, smiles, locants] = line;
    const skeletons = lazily(() => [withSeries(skeletonFromSmiles(smiles, locants))]);
    const stem = name.replace(/(?:ic acid|e)$/, '');
    put(name, { kind: 'amino acid', line, suffix: 'acid', skeletons });
    for (const [ending, suffix] of aminoAcidEndings)
      if (!name.endsWith('acid') || suffix === 'anion')
        put(stem + ending, { kind: 'amino acid', line, suffix, skeletons });
    if (acyl !== '') put(acyl, { kind: 'amino acid', line, suffix: 'acyl', skeletons });
  }
}

/** A word as people write it: `methyl` and `methane` for the stem, `toluene` with its final e. */
function shownForms(word: string, value: Word): string[] {
  if (value.kind === 'alkane') return value.size > 30 ? [] : [`${word}yl`, `${word}ane`, `${word}oxy`];
  if (value.kind === 'branched') return [`${word}yl`];
  if (value.kind === 'acid')
    return value.form === 'acid' ? [`${word}ic acid`, `${word}ate`] : [`${word}amide`];
  if (value.kind !== 'ring' && value.kind !== 'parent') return [word];
  const silent =
    /(?:furan|pyran|phenol|cresol|thymol|catechol|resorcinol|glycerol|glycol|naphthol|[^nl])$/.test(word);
  return [
    silent || /(?:guaiacol|pinacol|gallol|glucinol|carvacrol|acetal|glyoxal)$/.test(word) ? word : `${word}e`,
  ];
}

/** More than any grouping of substituents costs, so that the first numbering wins where it can be built. */
const otherNumberingCost = 5;

/** Names with siblings (`xylene`) stand for all of them, and with `o-`, `m-`, `p-` or `ortho-` … for one. */
function putParents(put: (word: string, value: Word) => void): void {
  const byName = new Map<string, (readonly [string, string, string, string?])[]>();
  const partly = new Set(partlySaturatedRings.map(([name]) => name));
  const known = new Set(parents.map(([name]) => name));
  const more = hydrides.filter(([name]) => !known.has(name));
  const grown = new Set(more.map(([name]) => name));
  const lists = [parents, naturalParents, partlySaturatedRings, ringsWithGroups, more, mineralAcids];
  for (const line of lists.flat()) byName.set(line[0], [...(byName.get(line[0]) ?? []), line]);
  const long: Readonly<Record<string, string>> = { 'o-': 'ortho-', 'm-': 'meta-', 'p-': 'para-' };
  for (const [name, lines] of byName) {
    const made = lines.map((line) =>
      lazily(() => {
        const skeleton = skeletonFromSmiles(line[1], line[2]);
        return [skeleton && line[3] !== undefined ? { ...skeleton, mark: line[3] } : skeleton];
      }),
    );
    const extensible = extensibleParents.has(name) || partly.has(name) || grown.has(name);
    const others = lazily(() =>
      otherNumberings
        .filter((line) => line[0] === name)
        .map((line) => {
          const skeleton = skeletonFromSmiles(line[1], line[2]);
          return skeleton && { ...skeleton, cost: otherNumberingCost };
        }),
    );
    put(name, {
      kind: 'parent',
      skeletons: () => [...made.flatMap((one) => one()), ...others()],
      extensible,
    });
    lines.forEach((line, index) => {
      if (line[3] === undefined) return;
      const skeletons = lazily(() => made[index]!().map((one) => withoutMark(one)));
      put(line[3] + name, { kind: 'parent', skeletons, extensible });
      if (long[line[3]] !== undefined) put(long[line[3]]! + name, { kind: 'parent', skeletons, extensible });
    });
  }
}

function withoutMark(skeleton: SkeletonGraph): SkeletonGraph {
  const { atoms, bonds, indicated, kind, stereo } = skeleton;
  return { atoms, bonds, indicated, kind, stereo };
}

/** Skeleton of an alkoxy group: the oxygen first, then the chain. */
export function alkoxySkeleton(size: number): SkeletonGraph {
  const alkyl = chain(size);
  const oxygen = { atomicNumber: 8, charge: 0, isotope: 0, locants: [], mancude: false };
  return {
    kind: 'chain',
    atoms: [oxygen, ...alkyl.atoms],
    bonds: [
      { from: 0, to: 1, order: 1 },
      ...alkyl.bonds.map((bond) => ({ from: bond.from + 1, to: bond.to + 1, order: 1 })),
    ],
    indicated: [],
    stereo: [],
  };
}

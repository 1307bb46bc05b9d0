/**
 * What is read before the grammar of organic names: words known whole, formulas, names of inorganic compounds, solutions and
 * mixtures. A word of the vocabulary comes before a formula (`NBS` is no chain of nitrogen, boron and sulfur).
 */
import type { CommonName, CommonNames } from './common-names.ts';
import { formulaSmiles } from './formulas/read-formula-name.ts';
import { unmultiplied } from './inorganic/compositional-words.ts';
import { adducts } from './vocabulary/functions.ts';
import { readInorganicName } from './inorganic/read-inorganic-name.ts';
import { readSmiles } from '../structure/read-smiles.ts';
import { complexNames } from './vocabulary/inorganic-words.ts';
import type { PreparedName } from './words/prepared.ts';

export function knownName(name: PreparedName, common: CommonNames): CommonName | undefined {
  return common.lookUp(name.text, name.lower) ?? knownBySmiles(name, common) ?? inorganicNamed(name);
}

function knownBySmiles({ text, lower }: PreparedName, common: CommonNames): CommonName | undefined {
  const smiles = smilesNamed(text, lower, common) ?? withAdduct(text, lower, common);
  const molecule = smiles === undefined ? undefined : readSmiles(smiles).value;
  return molecule && { kind: 'compound', molecule };
}

const complexes = new Map(
  complexNames.flatMap(([names, formula]) => names.split('|').map((name) => [name, formula] as const)),
);

/** The SMILES of a vocabulary word, a formula, or a name that stands for one. */
function smilesNamed(text: string, lower: string, common: CommonNames): string | undefined {
  const wordOf = (word: string) => common.smilesOf(word);
  return common.smilesOf(lower) ?? formulaSmiles(complexes.get(lower) ?? text, wordOf);
}

const adductSmiles = new Map(adducts);

/** `TBAF trihydrate`, `DMAP hydrochloride`: what stands beside such a word or formula. Water needs its number. */
function withAdduct(text: string, lower: string, common: CommonNames): string | undefined {
  const at = lower.lastIndexOf(' ');
  if (at <= 0 || !/(?:hydrate|hydro[a-z]{4,7}ide)$/.test(lower)) return undefined;
  for (const { rest, count } of unmultiplied(lower.slice(at + 1))) {
    const beside = adductSmiles.get(rest);
    if (beside === undefined || (rest === 'hydrate' && count === undefined)) continue;
    const base = smilesNamed(text.slice(0, at), lower.slice(0, at), common);
    if (base !== undefined) return [base, ...Array.from({ length: count ?? 1 }, () => beside)].join('.');
  }
  return undefined;
}

function inorganicNamed(name: PreparedName): CommonName | undefined {
  const readings = readInorganicName(name.lower).flatMap(({ smiles, charge }) => {
    const molecule = readSmiles(smiles).value;
    return molecule ? [{ name: withCharge(name.text, charge), molecule }] : [];
  });
  const [first] = readings;
  if (!first) return undefined;
  return readings.length === 1
    ? { kind: 'compound', molecule: first.molecule }
    : { kind: 'compounds', readings };
}

const romans = ['0', 'I', 'II', 'III', 'IV', 'V', 'VI', 'VII', 'VIII'];

/** `copper chloride` as `copper(II) chloride`. */
function withCharge(text: string, charge: number | undefined): string {
  return charge === undefined ? text : text.replace(/^\S+/, (metal) => `${metal}(${romans[charge]!})`);
}

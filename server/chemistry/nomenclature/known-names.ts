/**
 * What is read before the grammar of organic names: words known whole, formulas, names of inorganic compounds, solutions and
 * mixtures. A word of the vocabulary comes before a formula (`NBS` is no chain of nitrogen, boron and sulfur).
 */
import type { CommonName, CommonNames } from './common-names.ts';
import { readFormulaName } from './formulas/read-formula-name.ts';
import { readInorganicName } from './inorganic/read-inorganic-name.ts';
import { readSmiles } from '../structure/read-smiles.ts';
import { complexNames } from './vocabulary/inorganic-words.ts';
import type { PreparedName } from './words/prepared.ts';

export function knownName(name: PreparedName, common: CommonNames): CommonName | undefined {
  return (
    common.lookUp(name.text, name.lower) ?? formulaNamed(name.text, common) ?? inorganicNamed(name, common)
  );
}

function formulaNamed(text: string, common: CommonNames): CommonName | undefined {
  const molecule = readFormulaName(text, (lower) => common.smilesOf(lower));
  return molecule && { kind: 'compound', molecule };
}

const complexes = new Map(
  complexNames.flatMap(([names, formula]) => names.split('|').map((name) => [name, formula] as const)),
);

function inorganicNamed(name: PreparedName, common: CommonNames): CommonName | undefined {
  const formula = complexes.get(name.lower);
  if (formula !== undefined) return formulaNamed(formula, common);
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

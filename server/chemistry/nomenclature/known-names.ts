/**
 * What is read before the grammar of organic names: words known whole, formulas, names of inorganic compounds, solutions and
 * mixtures. A word of the vocabulary comes before a formula (`NBS` is no chain of nitrogen, boron and sulfur).
 */
import type { CommonName, CommonNames } from './common-names.ts';
import { readFormulaName } from './formulas/read-formula-name.ts';
import type { PreparedName } from './words/prepared.ts';

export function knownName(name: PreparedName, common: CommonNames): CommonName | undefined {
  return common.lookUp(name.text, name.lower) ?? formulaNamed(name, common);
}

function formulaNamed(name: PreparedName, common: CommonNames): CommonName | undefined {
  const molecule = readFormulaName(name.text, (lower) => common.smilesOf(lower));
  return molecule && { kind: 'compound', molecule };
}

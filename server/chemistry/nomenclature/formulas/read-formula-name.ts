/**
 * A formula as a name: what a chemist writes into a reaction table instead of one (`K2CO3`, `iPr2NEt`, `Pd(PPh3)4`,
 * `MgSO4·7H2O`). Case counts. A formula that leaves the structure open (`C4H10O`) or can be read in two ways is not read.
 */
import { canonicalForm } from '../../structure/canonical-form.ts';
import { elementWithSymbol } from '../../composition/elements.ts';
import { readSmiles } from '../../structure/read-smiles.ts';
import { elementReagents, wholeFormulas } from '../vocabulary/formula-whole.ts';
import { formulaParts, plainFormula } from './formula-text.ts';
import { wholeFormulas as lineFormulas, type Steps } from './line-formula.ts';
import { ligandSmiles, saltFormula } from './salt-formula.ts';

/** Steps of reading one formula. */
const stepLimit = 4000;

const known = new Map<string, string>([
  ...wholeFormulas,
  ...elementReagents.map((symbol) => [symbol, `[${symbol}]`] as const),
]);

/**
 * The SMILES of a formula, or undefined where the text is none or is not certain. `wordOf` gives the SMILES of a vocabulary
 * word, for parts like the THF of `BH3·THF`.
 */
export function formulaSmiles(
  text: string,
  wordOf: (lower: string) => string | undefined,
): string | undefined {
  const plain = plainFormula(text);
  const parts = plain === undefined ? undefined : formulaParts(plain);
  if (!parts) return undefined;
  const steps: Steps = { left: stepLimit };
  const written: string[] = [];
  for (const part of parts) {
    const smiles =
      partSmiles(part.text, steps) ??
      (parts.length > 1 ? (wordOf(part.text.toLowerCase()) ?? ligandSmiles(part.text)) : undefined);
    if (smiles === undefined) return undefined;
    for (let copy = 0; copy < part.times; copy++) written.push(smiles);
  }
  return written.join('.');
}

function partSmiles(text: string, steps: Steps): string | undefined {
  const whole = known.get(text);
  if (whole !== undefined) return whole;
  // Letters without a number are words or abbreviations (`VIS`, `SEMI`) more often than formulas; `KOH` is in the table.
  if (/^[A-Z]*$/.test(text) || isMolecularFormula(text)) return undefined;
  const lines = distinct(lineFormulas(text, steps));
  if (lines.length > 1 || steps.left <= 0) return undefined;
  return lines[0] ?? saltFormula(text, steps);
}

/**
 * `C2H5NO2` in the order of Hill says what is in it, not how it is connected, though it could be cut into `C2H5` and `NO2`. Of
 * one carbon atom and of ethyl halides there is only one compound.
 */
function isMolecularFormula(text: string): boolean {
  const [, carbons, rest] = /^C(\d+)H\d*((?:[A-Z][a-z]?\d*)*)$/.exec(text) ?? [];
  if (carbons === undefined || rest === undefined || /^C2H5(?:F|Cl|Br|I)$/.test(text)) return false;
  const symbols = rest.match(/[A-Z][a-z]?/g) ?? [];
  return symbols.every(
    (symbol, index) =>
      symbol !== 'C' &&
      symbol !== 'H' &&
      elementWithSymbol(symbol) !== undefined &&
      (index === 0 || symbols[index - 1]! < symbol),
  );
}

/** One SMILES for each constitution. */
function distinct(found: ReadonlySet<string>): string[] {
  const byKey = new Map<string, string>();
  for (const smiles of found) {
    const molecule = readSmiles(smiles).value;
    if (molecule) byKey.set(canonicalForm(molecule, { stereo: false }).key, smiles);
  }
  return [...byKey.values()];
}

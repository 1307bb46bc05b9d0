/** Masses of a composition. */
import type { Composition } from './composition.ts';
import { electronMass, elementWithSymbol } from './elements.ts';

/** Splits an atom kind into its element and mass number (0: the natural mixture): `13C` → 13 and carbon. */
export function partsOfKind(kind: string): { massNumber: number; symbol: string } {
  const digits = /^\d+/.exec(kind)?.[0] ?? '';
  return { massNumber: digits === '' ? 0 : Number(digits), symbol: kind.slice(digits.length) };
}

function sumOver(
  composition: Composition,
  massOf: (symbol: string, massNumber: number) => number | undefined,
) {
  let sum = 0;
  for (const [kind, count] of composition.counts) {
    const { symbol, massNumber } = partsOfKind(kind);
    const mass = massOf(symbol, massNumber);
    if (mass === undefined) return undefined;
    sum += mass * count;
  }
  return sum;
}

function nuclideMass(symbol: string, massNumber: number): number | undefined {
  return elementWithSymbol(symbol)?.nuclides.find((nuclide) => nuclide.massNumber === massNumber)?.mass;
}

/**
 * Molar mass in g/mol from the abridged standard atomic weights; labelled atoms count with the mass of their
 * nuclide. Undefined when an element has no standard atomic weight. CH3CH2OH: 46.069.
 */
export function averageMass(composition: Composition): number | undefined {
  return sumOver(composition, (symbol, massNumber) =>
    massNumber === 0 ? elementWithSymbol(symbol)?.standardAtomicWeight : nuclideMass(symbol, massNumber),
  );
}

/**
 * Mass in u with every element as its most abundant nuclide, labelled atoms as theirs; the electrons of a charge
 * are left out unless asked for. Undefined when a nuclide is not known. CH3CH2OH: 46.04186.
 */
export function monoisotopicMass(composition: Composition, countElectrons = false): number | undefined {
  const sum = sumOver(composition, (symbol, massNumber) =>
    massNumber === 0 ? elementWithSymbol(symbol)?.mostAbundant?.mass : nuclideMass(symbol, massNumber),
  );
  return sum === undefined || !countElectrons ? sum : sum - composition.charge * electronMass;
}

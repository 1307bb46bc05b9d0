/** The elements and their nuclides: symbols and isotope masses from the element package, weights after CIAAW. */
import { ELECTRON_MASS, elementsAndIsotopes } from 'chemical-elements';
import { standardAtomicWeights } from './atomic-weights.ts';

/** Rest mass of the electron in u (CODATA). */
export const electronMass: number = ELECTRON_MASS;

export interface Nuclide {
  readonly massNumber: number;
  /** In u. */
  readonly mass: number;
  /** Fraction in the natural mixture, 0 to 1. */
  readonly abundance: number;
}

export interface Element {
  readonly symbol: string;
  readonly atomicNumber: number;
  readonly name: string;
  /** Abridged standard atomic weight, or undefined where there is none (technetium, promethium, most actinides). */
  readonly standardAtomicWeight: number | undefined;
  readonly nuclides: readonly Nuclide[];
  /** The most abundant nuclide, or undefined where nothing is stable. */
  readonly mostAbundant: Nuclide | undefined;
}

function elementOf(row: (typeof elementsAndIsotopes)[number]): Element {
  const nuclides = row.isotopes.map((isotope) => ({
    massNumber: isotope.nominal,
    mass: isotope.mass,
    abundance: isotope.abundance ?? 0,
  }));
  let mostAbundant: Nuclide | undefined;
  for (const nuclide of nuclides) {
    if (nuclide.abundance > (mostAbundant?.abundance ?? 0)) mostAbundant = nuclide;
  }
  return {
    symbol: row.symbol,
    atomicNumber: row.number,
    name: row.name.toLowerCase(),
    standardAtomicWeight: standardAtomicWeights[row.symbol],
    nuclides,
    mostAbundant,
  };
}

const byNumber: readonly (Element | undefined)[] = (() => {
  const table: (Element | undefined)[] = [];
  for (const row of elementsAndIsotopes) table[row.number] = elementOf(row);
  return table;
})();

const bySymbol: ReadonlyMap<string, Element> = new Map(
  byNumber.flatMap((element) => (element === undefined ? [] : [[element.symbol, element] as const])),
);

/** By its symbol in proper capitals, `Na`; undefined for anything else. */
export function elementWithSymbol(symbol: string): Element | undefined {
  return bySymbol.get(symbol);
}

/** By atomic number, 1 to 118. */
export function elementWithNumber(atomicNumber: number): Element | undefined {
  return byNumber[atomicNumber];
}

/** `C` for 6; `*` for 0 and whatever is no element. */
export function symbolOf(atomicNumber: number): string {
  return byNumber[atomicNumber]?.symbol ?? '*';
}

/** Metals in the sense of the valence check: elements whose number of bonds nobody limits. */
export function isMetal(atomicNumber: number): boolean {
  return !nonmetals.has(atomicNumber) && atomicNumber > 0;
}

// H, He, B–Ne, Si–Ar, Ge, As, Se, Br, Kr, Sb, Te, I, Xe, At, Rn.
const nonmetals: ReadonlySet<number> = new Set([
  1, 2, 5, 6, 7, 8, 9, 10, 14, 15, 16, 17, 18, 32, 33, 34, 35, 36, 51, 52, 53, 54, 85, 86,
]);

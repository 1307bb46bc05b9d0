/** The JSON shape of a name's readings, which other programs rely on. */
import { hillFormula } from '../chemistry/composition/format-formula.ts';
import { canonicalSmiles } from '../chemistry/structure/canonical-smiles.ts';
import { compositionOf } from '../chemistry/structure/composition-of.ts';
import type { Molecule } from '../chemistry/structure/molecule.ts';
import type { NameReading, Reading, Stereoisomer } from '../chemistry/nomenclature/reading.ts';

export type ReadingStatus = 'definite' | 'stereo-open' | 'ambiguous' | 'mixture' | 'unknown';

export interface Identifiers {
  readonly smiles: string;
  /** Null when the toolkit cannot say. */
  readonly inchikey: string | null;
}

interface StereoisomerJson extends Identifiers {
  readonly name: string;
}

interface StructureJson extends StereoisomerJson {
  readonly formula: string;
  readonly stereoisomers: readonly StereoisomerJson[];
  readonly truncated?: true;
  readonly count?: number;
}

export interface ReadingJson {
  readonly name: string;
  readonly status: ReadingStatus;
  readonly readings: readonly StructureJson[];
  /** For an unknown name, the offset at which reading stopped. */
  readonly stoppedAt?: number;
  readonly message?: string;
  readonly suggestions?: readonly string[];
  readonly remarks?: readonly { readonly kind: string; readonly message: string }[];
  /** More readings than are listed; `count` is the true number. */
  readonly truncated?: true;
  readonly count?: number;
  /** Counting was given up: `count` is a lower bound. */
  readonly atLeast?: true;
}

export function smilesOf(molecule: Molecule): string {
  return canonicalSmiles(molecule);
}

/** Every structure for which identifiers will be asked. */
export function structuresIn(reading: NameReading): Molecule[] {
  const readings =
    reading.kind === 'understood' ? reading.readings : reading.kind === 'mixture' ? reading.components : [];
  return readings.flatMap(({ molecule, stereoisomers }) => [
    molecule,
    ...stereoisomers.map((each) => each.molecule),
  ]);
}

export function readingJson(
  name: string,
  reading: NameReading,
  identifiersOf: (molecule: Molecule) => Identifiers,
): ReadingJson {
  const structure = (each: Reading) => structureJson(each, identifiersOf);
  switch (reading.kind) {
    case 'unknown': {
      const { stoppedAt, message, suggestions } = reading;
      return {
        name,
        status: 'unknown',
        readings: [],
        stoppedAt,
        message,
        ...(suggestions.length > 0 ? { suggestions } : {}),
      };
    }
    case 'mixture':
      return {
        name,
        status: 'mixture',
        readings: reading.components.map(structure),
        message: reading.message,
      };
    case 'understood': {
      const { readings, remarks } = reading;
      const count = reading.count ?? readings.length;
      return {
        name,
        status: statusOf(readings, count),
        readings: readings.map(structure),
        ...(remarks.length > 0 ? { remarks: remarks.map(({ kind, message }) => ({ kind, message })) } : {}),
        ...truncation(readings, count),
        ...(reading.atLeast === true ? { truncated: true as const, count, atLeast: true as const } : {}),
      };
    }
  }
}

/** The whole number behind a list that was cut: of readings, or of the stereoisomers of the only reading. */
function truncation(readings: readonly Reading[], count: number): { truncated?: true; count?: number } {
  if (count > readings.length) return { truncated: true, count };
  const [only, another] = readings;
  const open = another === undefined ? only?.stereoisomerCount : undefined;
  return open !== undefined && open > only!.stereoisomers.length ? { truncated: true, count: open } : {};
}

function statusOf(readings: readonly Reading[], count: number): ReadingStatus {
  if (count > 1) return 'ambiguous';
  return (readings[0]?.stereoisomers.length ?? 0) > 0 ? 'stereo-open' : 'definite';
}

function structureJson(reading: Reading, identifiersOf: (molecule: Molecule) => Identifiers): StructureJson {
  const { name, molecule, stereoisomers } = reading;
  const count = reading.stereoisomerCount ?? stereoisomers.length;
  return {
    name,
    ...identifiersOf(molecule),
    formula: hillFormula(compositionOf(molecule)),
    stereoisomers: stereoisomers.map((each) => stereoisomerJson(each, identifiersOf)),
    ...(count > stereoisomers.length ? { truncated: true as const, count } : {}),
  };
}

function stereoisomerJson(
  { name, molecule }: Stereoisomer,
  identifiersOf: (molecule: Molecule) => Identifiers,
): StereoisomerJson {
  return { name, ...identifiersOf(molecule) };
}

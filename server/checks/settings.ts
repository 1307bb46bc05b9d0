/** The settings that change findings, as `isonym.json` and the editor give them. */
import type { Severity } from './severity.ts';

export interface Settings {
  /** Per check id; `off` silences it. */
  readonly severity: Readonly<Record<string, Severity | 'off'>>;
  readonly tolerance: {
    /** Allowed beyond the interval of the last digit, g/mol. */
    readonly molarMass: number;
    /** Allowed beyond the interval of the last digit, u. */
    readonly exactMass: number;
  };
  /** The lab's own words: abbreviation to SMILES. */
  readonly vocabulary: Readonly<Record<string, string>>;
}

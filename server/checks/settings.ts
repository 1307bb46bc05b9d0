/** The settings that change findings, as `isonym.json` and the editor give them. */
import type { Severity } from './severity.ts';

export interface Settings {
  /** Per check id; `off` silences it. What is not here keeps the severity of the check. */
  readonly severity: Readonly<Record<string, Severity | 'off'>>;
  readonly tolerance: {
    /** Allowed beyond the interval of the last digit, g/mol. */
    readonly molarMass: number;
    /** Allowed beyond the interval of the last digit, u. */
    readonly exactMass: number;
  };
  /** The lab's own words: abbreviation to SMILES. */
  readonly vocabulary: Readonly<Record<string, string>>;
  /** Where a label must be unique: under the notebook's root, or within its file. The default is the notebook. */
  readonly labelScope?: 'notebook' | 'file';
}

/**
 * The tolerances take up what the interval of the last digit does not: a value that was cut off instead of
 * rounded, and the third decimal of atomic weights.
 */
export const defaultSettings: Settings = {
  severity: {},
  tolerance: { molarMass: 0.01, exactMass: 0.0001 },
  vocabulary: {},
  labelScope: 'notebook',
};

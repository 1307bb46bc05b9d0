/**
 * The toolkit's facts as the checks see them: a plain look-up. What is not there yet is asked for by looking
 * it up, and the check runs again when it has come.
 */
export interface StructureFacts {
  readonly smiles: string;
  readonly inchi: string;
  readonly inchiKey: string;
}

/** `pending`: asked for, not there yet. `unavailable`: the toolkit cannot say. Keyed by our canonical SMILES. */
export type ToolkitFactsOf = (canonicalSmiles: string) => StructureFacts | 'pending' | 'unavailable';

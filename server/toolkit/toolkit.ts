/**
 * The one adapter to the RDKit WebAssembly build: what the rest of the server may ask of it. Whatever cannot
 * be answered is a value, never an exception, so that the server survives a toolkit that is missing or broken.
 */

/** What the toolkit says of one structure. */
export interface ToolkitFacts {
  /** RDKit's own canonical SMILES, for the outside world. */
  readonly smiles: string;
  readonly inchi: string;
  readonly inchiKey: string;
  /** log P (octanol/water) after Wildman and Crippen 1999. */
  readonly crippenLogP: number;
  /** Molar refraction in cm³/mol after Wildman and Crippen 1999. */
  readonly crippenMolarRefraction: number;
}

/** Facts keyed by the SMILES that was asked; `null`: the toolkit cannot read that structure, or is not there. */
export type FactTable = ReadonlyMap<string, ToolkitFacts | null>;

export interface DrawingOptions {
  readonly widthPx: number;
  readonly heightPx: number;
  /** CSS colour of lines and letters; the background is transparent. */
  readonly colour: string;
  /** Atoms to emphasize, indices in the order of the SMILES text. */
  readonly highlight?: readonly number[];
}

export type ToolkitState = 'not-loaded' | 'loading' | 'ready' | 'unavailable';

export interface Toolkit {
  readonly state: ToolkitState;
  /** Why it is unavailable, in one sentence, or undefined. */
  readonly failure: string | undefined;
  /** Answers for every SMILES asked; loads the toolkit first when it is not there yet. Never rejects. */
  facts(smiles: readonly string[]): Promise<FactTable>;
  /** A self-contained SVG, or null. Never rejects. */
  draw(smiles: string, options: DrawingOptions): Promise<string | null>;
  dispose(): Promise<void>;
}

/**
 * The one adapter to the RDKit WebAssembly build: what the rest of the server may ask of it. Whatever cannot
 * be answered is a value, never an exception, so that the server survives a toolkit that is missing or broken.
 */

/**
 * Heavy atoms beyond which the toolkit is not asked and the answer is `null`: its WebAssembly stack is small. Found
 * by trial: chains, ladders and dendrimers of 350 atoms still pass, some of 400 do not.
 */
export const mostAtoms = 300;

/** What the toolkit says of one structure. */
export interface ToolkitFacts {
  /** RDKit's own canonical SMILES, for the outside world. */
  readonly smiles: string;
  /** Standard InChI; empty when there is none (attachment points, unusual metals). */
  readonly inchi: string;
  readonly inchiKey: string;
}

/** Atom contributions after Wildman and Crippen, J. Chem. Inf. Comput. Sci. 1999, 39, 868–873. */
export interface CrippenValues {
  /** log P, octanol/water. */
  readonly logP: number;
  /** Molar refraction, cm³/mol. */
  readonly molarRefraction: number;
}

/** Keyed by the SMILES that was asked; `null`: the toolkit cannot read that structure, or is not there. */
export type AnswerTable<T> = ReadonlyMap<string, T | null>;

export type FactTable = AnswerTable<ToolkitFacts>;

export interface DrawingOptions {
  /** The box that the drawing must fit; a small molecule takes less, so that bonds are of one length. */
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
  /** What is already known of a structure; undefined when it was never asked (or was forgotten since). */
  knownFacts(smiles: string): ToolkitFacts | null | undefined;
  /** Dearer than facts, so asked for separately. Never rejects. */
  crippen(smiles: readonly string[]): Promise<AnswerTable<CrippenValues>>;
  /** A self-contained SVG, or null. Never rejects. */
  draw(smiles: string, options: DrawingOptions): Promise<string | null>;
  /** Loads the toolkit ahead of the first question. Never rejects. */
  load(): Promise<void>;
  dispose(): Promise<void>;
}

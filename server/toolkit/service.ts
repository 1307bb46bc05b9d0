/**
 * Asks RDKit, in the thread in which it runs, and keeps what is wrong with one structure from harming the
 * next: RDKit's WebAssembly build has a small stack, and once it has run over it, the whole instance answers
 * nonsense or never comes back.
 */
import { compactDrawing } from './drawing.ts';
import type { LoadRdkit, RdkitModule, RdkitMolecule } from './rdkit-module.ts';
import { mostAtoms, type CrippenValues, type ToolkitFacts } from './toolkit.ts';

const longestSmiles = 3000;

/** Drawings of more atoms than this are unreadable at the size of a hover. */
export const mostAtomsDrawn = 160;

/** After so many crashes in one life, something is wrong with the build itself. */
const mostInstances = 8;

/** The atoms that a SMILES text writes, without reading it: hydrogens inside brackets are not counted. */
export function countSmilesAtoms(smiles: string): number {
  return smiles.match(/\[[^\]]*\]|Br|Cl|[BCNOPSFIbcnops*]/g)?.length ?? 0;
}

export interface DrawingRequest {
  readonly widthPx: number;
  readonly heightPx: number;
  readonly highlight?: readonly number[] | undefined;
}

export class RdkitService {
  private rdkit: RdkitModule | undefined;
  private instances = 0;
  private readonly load: LoadRdkit;

  constructor(load: LoadRdkit) {
    this.load = load;
  }

  /** Rejects when RDKit cannot be loaded. */
  async start(): Promise<void> {
    if (this.rdkit !== undefined) return;
    if (++this.instances > mostInstances) throw new Error('it broke down too often');
    this.rdkit = await this.load();
  }

  async facts(smiles: string): Promise<ToolkitFacts | null> {
    return this.ask(smiles, mostAtoms, (molecule, rdkit) => {
      const inchi = molecule.get_inchi();
      return {
        smiles: molecule.get_smiles(),
        inchi,
        inchiKey: inchi === '' ? '' : rdkit.get_inchikey_for_inchi(inchi),
      };
    });
  }

  async crippen(smiles: string): Promise<CrippenValues | null> {
    return this.ask(smiles, mostAtoms, (molecule) => {
      const values = JSON.parse(molecule.get_descriptors()) as Record<string, number>;
      const logP = values['CrippenClogP'];
      const molarRefraction = values['CrippenMR'];
      return logP === undefined || molarRefraction === undefined ? null : { logP, molarRefraction };
    });
  }

  /** An SVG in `currentColor`. */
  async draw(smiles: string, request: DrawingRequest): Promise<string | null> {
    return this.ask(smiles, mostAtomsDrawn, (molecule) =>
      compactDrawing(molecule.get_svg_with_highlights(drawingDetails(request)), request),
    );
  }

  private async ask<T>(
    smiles: string,
    atomLimit: number,
    question: (molecule: RdkitMolecule, rdkit: RdkitModule) => T | null,
  ): Promise<T | null> {
    if (smiles === '' || smiles.length > longestSmiles || countSmilesAtoms(smiles) > atomLimit) return null;
    await this.start();
    const rdkit = this.rdkit!;
    let molecule: RdkitMolecule | null = null;
    try {
      molecule = rdkit.get_mol(smiles);
      return molecule === null ? null : question(molecule, rdkit);
    } catch {
      // A trap or a C++ exception leaves the instance in an unknown state: the next question gets a new one.
      this.rdkit = undefined;
      molecule = null;
      return null;
    } finally {
      molecule?.delete();
    }
  }
}

/** How RDKit shall draw: black on nothing, bonds of one length, the proportions of a journal's line drawings. */
function drawingDetails(request: DrawingRequest): string {
  return JSON.stringify({
    width: request.widthPx,
    height: request.heightPx,
    atoms: request.highlight ?? [],
    atomColourPalette: 'bw',
    symbolColour: [0, 0, 0],
    annotationColour: [0, 0, 0],
    highlightColour: [1, 0, 0],
    fillHighlights: true,
    clearBackground: false,
    fixedBondLength: 22,
    bondLineWidth: 1.3,
    multipleBondOffset: 0.17,
    baseFontSize: 0.55,
    minFontSize: 7,
    additionalAtomLabelPadding: 0.06,
    padding: 0.02,
  });
}

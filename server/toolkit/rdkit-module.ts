/** The part of RDKit's JavaScript interface that we use, and where its two files are looked for. */
import { existsSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** Lives in WebAssembly memory: `delete` it, or it stays there for good. */
export interface RdkitMolecule {
  get_smiles(): string;
  get_inchi(): string;
  get_descriptors(): string;
  get_svg_with_highlights(details: string): string;
  delete(): void;
}

export interface RdkitModule {
  get_mol(smiles: string): RdkitMolecule | null;
  get_inchikey_for_inchi(inchi: string): string;
}

export type LoadRdkit = () => Promise<RdkitModule>;

type Factory = (options: Record<string, unknown>) => Promise<RdkitModule>;

const scriptName = 'RDKit_minimal.js';

/** Names a folder to take RDKit from instead of the usual places. */
export const folderVariable = 'ISONYM_RDKIT';

/**
 * The folder with RDKit's script and WebAssembly file: beside the bundle, or the installed package when the
 * sources run as they are. Undefined when there is none.
 */
export function rdkitFolder(moduleUrl: string): string | undefined {
  const stated = process.env[folderVariable];
  if (stated !== undefined && stated !== '') return existsSync(join(stated, scriptName)) ? stated : undefined;
  for (const beside of ['./rdkit/', '../rdkit/']) {
    const folder = fileURLToPath(new URL(beside, moduleUrl));
    if (existsSync(join(folder, scriptName))) return folder;
  }
  try {
    return dirname(createRequire(moduleUrl).resolve('@rdkit/rdkit'));
  } catch {
    return undefined;
  }
}

/**
 * Loads RDKit (0.2–0.7 s, about 40 MB). Rejects when its files are missing or damaged. Each call makes a fresh
 * instance with memory of its own.
 */
export async function loadRdkit(moduleUrl: string): Promise<RdkitModule> {
  const folder = rdkitFolder(moduleUrl);
  if (folder === undefined) {
    throw new Error(`the file ${scriptName} is not there; reinstall Isonym to get drawings and InChI back`);
  }
  const factory = createRequire(moduleUrl)(join(folder, scriptName)) as Factory;
  return factory({
    locateFile: (file: string) => join(folder, file),
    // RDKit reports what it cannot parse on the console; we report it as findings.
    print: () => undefined,
    printErr: () => undefined,
  });
}

/** The toolkit itself, for tests that hold our own code against it. Every object is deleted after use. */
import initRDKitModule, { type MainModule, type Mol } from '@rdkit/rdkit';

export async function loadRdkit(): Promise<MainModule> {
  return await initRDKitModule();
}

/** Runs `ask` on the molecule, or returns null when the toolkit rejects the SMILES. */
export function withMolecule<T>(rdkit: MainModule, smiles: string, ask: (molecule: Mol) => T): T | null {
  const molecule = rdkit.get_mol(smiles);
  if (molecule === null) return null;
  try {
    return ask(molecule);
  } finally {
    molecule.delete();
  }
}

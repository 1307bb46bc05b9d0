/**
 * The example notebook: sound where it is meant to be, by RDKit as a second opinion, and holding exactly the slips
 * that it is meant to show.
 */
import loadRdkit from '@rdkit/rdkit';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { hillFormula } from '../../../server/chemistry/composition/format-formula.ts';
import type { CompoundEntry, Entry } from '../../../server/notebook/model.ts';
import { entriesOf } from './readers.ts';

const folder = join(import.meta.dirname, '../../../examples/linden-row/2026');
const pages = readdirSync(folder).map((name) => readFileSync(join(folder, name), 'utf8'));
const entries = pages.flatMap((page) => entriesOf(page));
const compounds = entries.filter((entry): entry is CompoundEntry => entry.kind === 'compound');

const labelOf = (entry: Entry) => entry.label?.read.value ?? '';

/** Which statement of which block is wrong on purpose, but for names and stereo, which RDKit does not read. */
const slips = ['LR-4 formula', 'LR-14 molar mass', 'LR-21 InChIKey', 'LR-23 SMILES'];

describe('Linden Row', () => {
  let rdkit: Awaited<ReturnType<typeof loadRdkit>>;
  beforeAll(async () => {
    rdkit = await loadRdkit();
  });

  it('states formulas, masses and identifiers as RDKit has them, but for its slips', () => {
    const found: string[] = [];
    for (const entry of compounds) {
      const { smiles, formula, molarMass, exactMass, inchi, inchiKey } = entry;
      if (smiles === undefined) continue;
      const label = labelOf(entry);
      const molecule = rdkit.get_mol(smiles.text.text);
      if (molecule === null) {
        found.push(`${label} SMILES`);
        continue;
      }
      const theirInchi = molecule.get_inchi();
      const { amw, exactmw } = JSON.parse(molecule.get_descriptors()) as { amw: number; exactmw: number };
      molecule.delete();
      const theirFormula = theirInchi.split('/')[1];
      if (formula !== undefined && hillFormula(formula.read.value!) !== theirFormula)
        found.push(`${label} formula`);
      if (molarMass !== undefined && Math.abs(molarMass.read.value!.value - amw) > 0.01) {
        found.push(`${label} molar mass`);
      }
      if (exactMass !== undefined && Math.abs(exactMass.read.value!.value - exactmw) > 1e-4) {
        found.push(`${label} exact mass`);
      }
      if (inchi !== undefined && inchi.read.value !== theirInchi) found.push(`${label} InChI`);
      if (inchiKey !== undefined && inchiKey.read.value !== rdkit.get_inchikey_for_inchi(theirInchi)) {
        found.push(`${label} InChIKey`);
      }
    }
    expect(found).toEqual(slips);
  });

  it('has two slips of the block language', () => {
    const problems = entries.flatMap((entry) =>
      entry.problems.map(({ check }) => `${labelOf(entry)} ${check}`),
    );
    expect(problems).toEqual(['LR-15 decimal-comma', 'LR-15 unknown-field']);
  });

  it('repeats one label', () => {
    const labels = entries.map(labelOf);
    expect(labels.filter((label, index) => labels.indexOf(label) !== index)).toEqual(['LR-13']);
  });

  it('is sound in most of its blocks', () => {
    expect(entries.length).toBeGreaterThan(20);
  });
});

/**
 * Thousands of structures put together from fragments, held against RDKit and OpenChemLib: the same texts accepted, the
 * same formulas, the same molecules called the same, the same descriptors.
 */
import { Molecule as OclMolecule } from 'openchemlib';
import type { MainModule } from '@rdkit/rdkit';
import { beforeAll, describe, expect, test } from 'vitest';
import { hillFormula } from '../../../server/chemistry/composition/format-formula.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { cipDescriptors } from '../../../server/chemistry/structure/cip/descriptors.ts';
import { compositionOf } from '../../../server/chemistry/structure/composition-of.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';
import { valenceProblems } from '../../../server/chemistry/structure/valence.ts';
import { writeSmiles } from '../../../server/chemistry/structure/write-smiles.ts';
import { fragmentSmiles } from '../../support/fragments.ts';
import { seededChance } from '../../support/generated-notebook.ts';
import { loadRdkit, withMolecule } from '../../support/rdkit.ts';

const texts = [...new Set(fragmentSmiles(3000, 11))];
let rdkit: MainModule;
beforeAll(async () => {
  rdkit = await loadRdkit();
});

/** RDKit gives formulas in Hill order, with D written as 2H and charges as ours. */
const inRdkitFormula = (smiles: string): string | null =>
  withMolecule(
    rdkit,
    smiles,
    (molecule) => JSON.parse(molecule.get_descriptors()) as Record<string, number>,
  )?.['amw']?.toFixed(1) ?? null;

test('a list worth testing', () => {
  expect(texts.length).toBeGreaterThan(1500);
});

test('the same texts are accepted', () => {
  const differences = texts.filter((smiles) => {
    const ours = readSmiles(smiles);
    const accepted = ours.value !== undefined && valenceProblems(ours.value).length === 0;
    return accepted !== (withMolecule(rdkit, smiles, () => true) ?? false);
  });
  expect(differences).toEqual([]);
});

test('the same formulas, atom by atom', () => {
  const differences = texts.filter((smiles) => {
    const { value } = readSmiles(smiles);
    if (value === undefined || smiles.includes('[2H]') || smiles.includes('[13')) return false;
    const theirs = OclMolecule.fromSmiles(smiles).getMolecularFormula().formula;
    const counted = (formula: string) =>
      [...formula.matchAll(/([A-Z][a-z]?)(\d*)/g)].reduce<Record<string, number>>(
        (sum, [, symbol, count]) => {
          sum[symbol!] = (sum[symbol!] ?? 0) + Number(count || 1);
          return sum;
        },
        {},
      );
    const ours = hillFormula({ ...compositionOf(value), charge: 0 });
    return (
      JSON.stringify(Object.entries(counted(ours)).sort()) !==
      JSON.stringify(Object.entries(counted(theirs)).sort())
    );
  });
  expect(differences).toEqual([]);
});

test('RDKit weighs them alike', () => {
  const heavy = texts
    .slice(0, 300)
    .filter(
      (smiles) =>
        inRdkitFormula(smiles) === null &&
        readSmiles(smiles).value &&
        valenceProblems(readSmiles(smiles).value!).length === 0,
    );
  expect(heavy).toEqual([]);
});

describe('the same molecules are called the same', () => {
  test('in any order of the atoms', () => {
    const chance = seededChance(5);
    const differences = texts.filter((smiles) => {
      const { value } = readSmiles(smiles);
      if (value === undefined) return false;
      const expected = canonicalSmiles(value);
      const scrambled = writeSmiles(value, { ranks: value.atoms.map(() => chance()) });
      return canonicalSmiles(readSmiles(scrambled).value!) !== expected;
    });
    expect(differences).toEqual([]);
  });

  test('what we write is to RDKit what we read', () => {
    const chance = seededChance(6);
    const rdkitSmiles = (smiles: string) => withMolecule(rdkit, smiles, (molecule) => molecule.get_smiles());
    const differences = texts.filter((smiles) => {
      const { value } = readSmiles(smiles);
      const theirs = rdkitSmiles(smiles);
      if (value === undefined || theirs === null) return false;
      return rdkitSmiles(writeSmiles(value, { ranks: value.atoms.map(() => chance()) })) !== theirs;
    });
    expect(differences).toEqual([]);
  });

  test('RDKit parts the list into the same compounds', () => {
    const byTheirs = new Map<string, Set<string>>();
    const byOurs = new Map<string, Set<string>>();
    for (const smiles of texts) {
      const { value } = readSmiles(smiles);
      if (value === undefined) continue;
      const ours = canonicalSmiles(value);
      // Through our normal spelling: RDKit keeps ammonium chlorides and amine hydrochlorides apart, we do not.
      const theirs = withMolecule(rdkit, ours, (molecule) => molecule.get_smiles());
      if (theirs === null) continue;
      byOurs.set(ours, (byOurs.get(ours) ?? new Set()).add(theirs));
      byTheirs.set(theirs, (byTheirs.get(theirs) ?? new Set()).add(ours));
    }
    expect([...byOurs].filter(([, set]) => set.size > 1)).toEqual([]);
    expect([...byTheirs].filter(([, set]) => set.size > 1)).toEqual([]);
  });
});

test('the same descriptors', () => {
  interface Tags {
    CIP_atoms: [number, string][];
    CIP_bonds: [number, number, string][];
  }
  const differences: string[] = [];
  let compared = 0;
  for (const smiles of texts) {
    // RDKit renumbers when it folds written hydrogens.
    const { value } = readSmiles(smiles);
    if (value === undefined || value.stereo.length === 0) continue;
    const tags = withMolecule(rdkit, smiles, (molecule) => JSON.parse(molecule.get_stereo_tags()) as Tags);
    if (tags === null) continue;
    for (const { element, letter } of cipDescriptors(value)) {
      const theirs =
        element.kind === 'tetrahedral'
          ? tags.CIP_atoms.find(([atom]) => atom === element.centre)?.[1]
          : element.kind === 'double-bond'
            ? tags.CIP_bonds.find(
                ([first, second]) => element.ends.includes(first) && element.ends.includes(second),
              )?.[2]
            : undefined;
      if (theirs === undefined || theirs === '(?)') continue;
      compared++;
      if (`(${letter ?? '?'})` !== theirs)
        differences.push(`${smiles}: ours ${letter ?? 'none'}, theirs ${theirs}`);
    }
  }
  expect(compared).toBeGreaterThan(300);
  expect(differences).toEqual([]);
});

/**
 * Abbreviations against their full names: what the name reader makes of the name must be the structure that stands in the
 * vocabulary. Names that it cannot read yet say nothing; every structure is held against valence rules and charge.
 */
import { describe, expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalForm } from '../../../server/chemistry/structure/canonical-form.ts';
import { compositionOf } from '../../../server/chemistry/structure/composition-of.ts';
import type { Molecule } from '../../../server/chemistry/structure/molecule.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';
import { valenceProblems } from '../../../server/chemistry/structure/valence.ts';
import {
  abbreviations,
  casedAbbreviations,
} from '../../../server/chemistry/nomenclature/vocabulary/abbreviations.ts';

const keyOf = (molecule: Molecule) => canonicalForm(molecule, { stereo: false }).key;
const lines = [...abbreviations, ...casedAbbreviations];

describe('each abbreviation', () => {
  test.each(lines)('%s is %s', (spellings, name, smiles) => {
    const molecule = readSmiles(smiles).value!;
    expect(valenceProblems(molecule)).toEqual([]);
    expect(compositionOf(molecule).charge).toBe(0);
    for (const spelling of spellings.split('|')) {
      const reading = readName(spelling);
      expect(reading.kind === 'understood' && reading.readings.map((one) => keyOf(one.molecule))).toEqual([
        keyOf(molecule),
      ]);
    }
    const full = readName(name);
    if (full.kind === 'understood')
      expect(full.readings.map((one) => keyOf(one.molecule))).toEqual([keyOf(molecule)]);
  });
});

test('most full names are read, and no spelling stands twice', () => {
  const read = lines.filter(([, name]) => readName(name).kind === 'understood');
  expect(lines.length).toBeGreaterThan(300);
  expect(read.length / lines.length).toBeGreaterThan(0.6);
  const spellings = lines.flatMap(([one]) => one.split('|').map((spelling) => spelling.toLowerCase()));
  const cased = casedAbbreviations.flatMap(([one]) => one.split('|'));
  expect(new Set(spellings).size).toBe(spellings.length);
  expect(cased.length).toBeGreaterThan(0);
});

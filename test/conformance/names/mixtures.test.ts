/**
 * Solutions, supported reagents, mixtures and words of grade as laboratories write them. Common practice, no source.
 */
import { describe, expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalForm } from '../../../server/chemistry/structure/canonical-form.ts';
import type { Molecule } from '../../../server/chemistry/structure/molecule.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';
import { mixtures } from '../../../server/chemistry/nomenclature/vocabulary/mixtures.ts';

const form = (molecule: Molecule) => canonicalForm(molecule, { stereo: false }).key;
const keyOf = (smiles: string) => form(readSmiles(smiles).value!);

function componentsOf(name: string): string[] {
  const reading = readName(name);
  if (reading.kind !== 'mixture') throw new Error(`${name}: ${reading.kind}`);
  expect(reading.message.length).toBeGreaterThan(10);
  return reading.components.map(({ molecule }) => form(molecule));
}

const hexanes = ['CCCCCC', 'CC(C)CCC', 'CCC(C)CC', 'CC(C)(C)CC', 'CC(C)C(C)C'];

describe('mixtures and their components', () => {
  test.each([
    ['10% Pd/C', ['[Pd]']],
    ['Pd/C', ['[Pd]']],
    ['Pd/C (10 wt%)', ['[Pd]']],
    ['palladium on carbon', ['[Pd]']],
    ['10 wt% palladium on activated charcoal', ['[Pd]']],
    ['Rh/Al2O3', ['[Rh]']],
    ['Pd(OH)2/C', ['[Pd+2].[OH-].[OH-]']],
    ['sat. aq. NH4Cl', ['[NH4+].[Cl-]', 'O']],
    ['saturated aqueous sodium bicarbonate', ['[Na+].OC([O-])=O', 'O']],
    ['saturated aqueous sodium bicarbonate solution', ['[Na+].OC([O-])=O', 'O']],
    ['1 M HCl', ['Cl', 'O']],
    ['6N HCl', ['Cl', 'O']],
    ['2 M HCl in dioxane', ['Cl', 'C1COCCO1']],
    ['HCl in dioxane', ['Cl', 'C1COCCO1']],
    ['NaOH (aq.)', ['[Na+].[OH-]', 'O']],
    ['50% aq. NaOH', ['[Na+].[OH-]', 'O']],
    ['1.6 M n-BuLi in hexanes', ['[Li]CCCC', ...hexanes]],
    ['n-BuLi (2.5 M in hexane)', ['[Li]CCCC', 'CCCCCC']],
    ['tBuOOH (5.5 M in decane)', ['CC(C)(C)OO', 'CCCCCCCCCC']],
    ['37% formaldehyde in water', ['C=O', 'O']],
    ['60% NaH in mineral oil', ['[Na+].[H-]']],
    ['NaH (60% dispersion in mineral oil)', ['[Na+].[H-]']],
    ['30% H2O2', ['OO']],
    ['95% ethanol', ['CCO']],
    ['brine', ['[Na+].[Cl-]', 'O']],
    ['hexanes', hexanes],
    ['xylenes', ['Cc1ccccc1C', 'Cc1cccc(C)c1', 'Cc1ccc(C)cc1']],
    ['petroleum ether (40–60)', []],
    ['silica gel', []],
    ['Celite', []],
    ['MeOH/H2O (9:1)', ['CO', 'O']],
    ['EtOAc/hexanes', ['CCOC(C)=O', ...hexanes]],
    ['CH2Cl2–MeOH 95:5', ['ClCCl', 'CO']],
    ['n-hexane-EtOAc 3:1', ['CCCCCC', 'CCOC(C)=O']],
    ['toluene:water 4:1', ['Cc1ccccc1', 'O']],
    ['aqueous ammonia', ['N', 'O']],
    ['HCl (aq., 1 M)', ['Cl', 'O']],
    ['H2O2 (30% aq.)', ['OO', 'O']],
    ['sat. NaHCO3 (aq.)', ['[Na+].OC([O-])=O', 'O']],
    ['phosphate buffer (pH 7)', []],
    ['molecular sieves (4 Å)', []],
    ['Celite®', []],
    ['silica gel (230–400 mesh)', []],
    ['conc. H2SO4', ['OS(O)(=O)=O', 'O']],
    ['methanolic HCl', ['Cl', 'CO']],
    ['5% MeOH in CH2Cl2', ['CO', 'ClCCl']],
    ['HF·pyridine', ['F', 'c1ccncc1']],
    ['oxone', ['[K+].OOS([O-])(=O)=O', '[K+].OS([O-])(=O)=O', '[K+].[K+].[O-]S([O-])(=O)=O']],
  ])('%s', (name, components) => {
    expect(componentsOf(name)).toEqual(components.map((smiles) => keyOf(smiles)));
  });

  test('every component in the vocabulary is understood', () => {
    for (const [names, , components] of mixtures) {
      expect(readName(names.split('|')[0]!).kind).toBe('mixture');
      for (const component of components?.split('|') ?? [])
        expect(readName(component).kind, component).toBe('understood');
    }
  });
});

describe('words of grade', () => {
  test.each([
    ['anhydrous THF', 'C1CCOC1'],
    ['dry DMF', 'CN(C)C=O'],
    ['dry, degassed toluene', 'Cc1ccccc1'],
    ['absolute ethanol', 'CCO'],
    ['abs. EtOH', 'CCO'],
    ['glacial acetic acid', 'CC(=O)O'],
    ['freshly distilled THF', 'C1CCOC1'],
    ['distilled water', 'O'],
    ['ice water', 'O'],
    ['zinc dust', '[Zn]'],
    ['cat. DMAP', 'CN(C)c1ccncc1'],
    ['DMAP (10 mol%)', 'CN(C)c1ccncc1'],
    ['EtOH (abs.)', 'CCO'],
    ['magnesium turnings', '[Mg]'],
    ['NaOH pellets', '[Na+].[OH-]'],
    ['H2 (balloon)', '[H][H]'],
    ['HCl (g)', 'Cl'],
    ['Na2SO4 (anhydrous)', '[Na+].[Na+].[O-]S([O-])(=O)=O'],
  ])('%s', (name, smiles) => {
    const reading = readName(name);
    expect(reading.kind === 'understood' && reading.readings.map((one) => form(one.molecule))).toEqual([
      keyOf(smiles),
    ]);
    expect(reading.kind === 'understood' && reading.readings[0]!.name).toBe(name);
  });

  test('an ambiguous name stays so', () => {
    const reading = readName('dry chlorotoluene');
    expect(reading.kind === 'understood' && reading.readings.length).toBe(3);
  });
});

test.each([
  'degassed',
  '10% foo/C',
  '1 M foobar',
  'foo/bar',
  'MeOH/foo 1:1',
  'cis/trans-decalin',
  'D/L-alanine',
  'Pd/c',
  'in water',
  '1 M',
  'sat. aq.',
  `${'dry '.repeat(30)}THF`,
  `${'THF/'.repeat(30)}THF`,
])('%s is not read', (name) => {
  expect(readName(name).kind).toBe('unknown');
});

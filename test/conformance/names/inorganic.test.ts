/**
 * Names of inorganic compounds: IUPAC Red Book 2005, IR-5 (compositional names, rule numbers from memory), traditional names
 * common practice, no source. Structures are drawn by hand after the convention of `inorganic/draw-salt.ts`.
 */
import { describe, expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalForm } from '../../../server/chemistry/structure/canonical-form.ts';
import type { Molecule } from '../../../server/chemistry/structure/molecule.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';
import { complexNames } from '../../../server/chemistry/nomenclature/vocabulary/inorganic-words.ts';

const form = (molecule: Molecule) => canonicalForm(molecule, { stereo: false }).key;
const keyOf = (smiles: string) => form(readSmiles(smiles).value!);

function keysOf(name: string): string[] {
  const reading = readName(name);
  if (reading.kind !== 'understood') throw new Error(`${name}: ${reading.message}`);
  return reading.readings.map(({ molecule }) => form(molecule));
}
const copies = (count: number, smiles: string) => Array.from({ length: count }, () => smiles).join('.');
const [isopropoxide, acetate, triflate] = ['CC(C)[O-]', 'CC(=O)[O-]', '[O-]S(=O)(=O)C(F)(F)F'];

describe('compositional names', () => {
  test.each([
    ['IR-5.4.2.2', 'copper(I) iodide', '[Cu+].[I-]'],
    ['IR-5.4.2.2', 'iron(III) chloride hexahydrate', `[Fe+3].${copies(3, '[Cl-]')}.${copies(6, 'O')}`],
    ['IR-5.4.2.2', 'cerium(III) chloride heptahydrate', `[Ce+3].${copies(3, '[Cl-]')}.${copies(7, 'O')}`],
    ['IR-5.4.2.2', 'copper(II) sulfate pentahydrate', `[Cu+2].[O-]S([O-])(=O)=O.${copies(5, 'O')}`],
    ['IR-5.4.2.2', 'titanium(IV) isopropoxide', `[Ti+4].${copies(4, isopropoxide)}`],
    ['IR-5.4.2.2', 'palladium(II) acetate', `[Pd+2].${copies(2, acetate)}`],
    ['IR-5.4.2.2', 'lead(IV) acetate', `[Pb+4].${copies(4, acetate)}`],
    ['IR-5.4.2.2', 'scandium(III) triflate', `[Sc+3].${copies(3, triflate)}`],
    ['IR-5.4.2.2', 'chromium(VI) oxide', 'O=[Cr](=O)=O'],
    ['IR-5.4.2.2', 'vanadium(V) oxide', 'O=[V](=O)O[V](=O)=O'],
    ['IR-5.4.2.2', 'iron(III) oxide', `${copies(2, '[Fe+3]')}.${copies(3, '[O-2]')}`],
    ['IR-5.4.2.3', 'copper(2+) chloride', '[Cu+2].[Cl-].[Cl-]'],
    ['IR-5.4.2.1', 'manganese dioxide', 'O=[Mn]=O'],
    ['IR-5.4.2.1', 'titanium tetrachloride', 'Cl[Ti](Cl)(Cl)Cl'],
    ['IR-5.4.2.1', 'osmium tetroxide', 'O=[Os](=O)(=O)=O'],
    ['IR-5.4.2.1', 'osmium tetraoxide', 'O=[Os](=O)(=O)=O'],
    ['IR-5.4.2.1', 'diiron trioxide', `${copies(2, '[Fe+3]')}.${copies(3, '[O-2]')}`],
    ['IR-5.4.2.1', 'samarium diiodide', '[Sm+2].[I-].[I-]'],
    ['IR-5.4.2.1', 'antimony trichloride', 'Cl[Sb](Cl)Cl'],
    ['IR-5.4.2.1', 'germanium tetrachloride', 'Cl[Ge](Cl)(Cl)Cl'],
    ['IR-5.4.2.1', 'phosphorus trichloride', 'ClP(Cl)Cl'],
    ['IR-5.4.2.2', 'phosphorus(V) chloride', 'ClP(Cl)(Cl)(Cl)Cl'],
    ['IR-5.4.2.1', 'sulfur hexafluoride', 'FS(F)(F)(F)(F)F'],
    ['IR-5.4.2.1', 'selenium dioxide', 'O=[Se]=O'],
    ['IR-5.4.2.1', 'silicon tetrachloride', 'Cl[Si](Cl)(Cl)Cl'],
    ['IR-5.4.2.1', 'boron tribromide', 'BrB(Br)Br'],
    ['IR-5.4.2.1', 'disodium hydrogen phosphate', '[Na+].[Na+].OP([O-])([O-])=O'],
    ['IR-5.4.2.1', 'potassium dihydrogen phosphate', '[K+].OP(O)([O-])=O'],
    ['IR-5.4.2.1', 'sodium hydrogen carbonate', '[Na+].OC([O-])=O'],
    ['IR-5.4.2.1', 'sodium hydrogencarbonate', '[Na+].OC([O-])=O'],
    ['IR-5.4.2.1', 'potassium aluminium sulfate', '[K+].[Al+3].[O-]S([O-])(=O)=O.[O-]S([O-])(=O)=O'],
    ['IR-5.4.2.1', 'ammonium magnesium phosphate', '[NH4+].[Mg+2].[O-]P([O-])([O-])=O'],
    ['IR-5.3.2.2', 'dihydrogen', '[H][H]'],
    ['IR-3.1', 'zinc', '[Zn]'],
  ])('%s: %s', (_rule, name, smiles) => {
    expect(keysOf(name)).toEqual([keyOf(smiles)]);
  });
});

describe('traditional names', () => {
  test.each([
    ['ferric chloride', '[Fe+3].[Cl-].[Cl-].[Cl-]'],
    ['stannous chloride dihydrate', '[Sn+2].[Cl-].[Cl-].O.O'],
    ['mercurous chloride', '[Hg+][Hg+].[Cl-].[Cl-]'],
    ['sodium bicarbonate', '[Na+].OC([O-])=O'],
    ['sodium metabisulfite', '[Na+].[Na+].[O-]S(=O)S([O-])(=O)=O'],
    ['sodium dithionite', '[Na+].[Na+].[O-]S(=O)S([O-])=O'],
    ['potassium ferricyanide', `${copies(3, '[K+]')}.[Fe+3].${copies(6, '[C-]#N')}`],
    ['potassium dichromate', '[K+].[K+].[O-][Cr](=O)(=O)O[Cr]([O-])(=O)=O'],
    ['ammonium cerium(IV) nitrate', `[NH4+].[NH4+].[Ce+4].${copies(6, '[O-][N+](=O)[O-]')}`],
    ['ceric ammonium nitrate', `[NH4+].[NH4+].[Ce+4].${copies(6, '[O-][N+](=O)[O-]')}`],
    ['phosphorus pentoxide', 'O=P(=O)OP(=O)=O'],
    ['vanadium pentoxide', 'O=[V](=O)O[V](=O)=O'],
    ['carbonyl sulfide', 'O=C=S'],
    ['chlorine dioxide', '[O][Cl+][O-]'],
    ['copper sulfate', '[Cu+2].[O-]S([O-])(=O)=O'],
    ['nickel chloride', '[Ni+2].[Cl-].[Cl-]'],
    ['boron trifluoride diethyl etherate', 'FB(F)F.CCOCC'],
    ['copper(I) bromide dimethyl sulfide complex', '[Cu+].[Br-].CSC'],
    ['sodium triacetoxyborohydride', '[Na+].CC(=O)O[BH-](OC(C)=O)OC(C)=O'],
    ['lithium aluminium hydride', '[Li+].[AlH4-]'],
    ['sodium bisulfite', '[Na+].OS([O-])=O'],
    ['borane tetrahydrofuran complex', 'B.C1CCOC1'],
    ['sulfur trioxide pyridine complex', 'O=S(=O)=O.c1ccncc1'],
    ['disodium phosphate', '[Na+].[Na+].OP([O-])([O-])=O'],
    ['iron pentacarbonyl', `[Fe].${copies(5, '[C-]#[O+]')}`],
    ['ferrocene', `[Fe+2].${copies(2, '[CH-]1C=CC=C1')}`],
  ])('%s', (name, smiles) => {
    expect(keysOf(name)).toEqual([keyOf(smiles)]);
  });

  test.each([
    ['copper(I) iodide', 'CuI'],
    ['iron(III) chloride', 'FeCl3'],
    ['titanium(IV) isopropoxide', 'Ti(OiPr)4'],
    ['sodium hydrogen carbonate', 'NaHCO3'],
    ['manganese dioxide', 'MnO2'],
    ['vanadium pentoxide', 'V2O5'],
    ['palladium(II) acetate', 'Pd(OAc)2'],
    ['iron(III) acetylacetonate', 'Fe(acac)3'],
    ['tetrakis(triphenylphosphine)palladium(0)', 'Pd(PPh3)4'],
    ['potassium ferrocyanide', 'K4[Fe(CN)6]'],
    ['sodium tetrachloropalladate(II)', 'Na2PdCl4'],
    ['potassium tert-butoxide', 'KOtBu'],
    ['calcium hydride', 'CaH2'],
    ['magnesium oxide', 'MgO'],
    ['molybdenum disulfide', 'MoS2'],
    ['phosphoryl chloride', 'POCl3'],
  ])('%s is %s', (name, formula) => {
    expect(keysOf(name)).toEqual(keysOf(formula));
  });

  test('every name of a complex has a formula that is read, and no charge', () => {
    for (const [names, formula] of complexNames) {
      for (const name of names.split('|')) expect(keysOf(name), name).toEqual(keysOf(formula));
    }
  });
});

describe('a metal with a choice of charges', () => {
  test.each([
    ['copper chloride', ['copper(I) chloride', 'copper(II) chloride']],
    ['iron chloride', ['iron(II) chloride', 'iron(III) chloride']],
    ['tin chloride', ['tin(II) chloride', 'tin(IV) chloride']],
  ])('%s', (name, completed) => {
    const reading = readName(name);
    expect(reading.kind === 'understood' && reading.readings.map((one) => one.name)).toEqual(completed);
    expect(completed.flatMap((one) => keysOf(one))).toEqual(keysOf(name));
  });
});

test.each([
  'iron tetrachloride',
  'sodium dichloride',
  'copper(V) chloride',
  'sodium(II) chloride',
  'calcium sulfate hemihydrate',
  'ruthenium(III) chloride hydrate',
  'phosphorus tetrachloride',
  'sulfur trichloride',
  'chromium nitride',
  'sodium potassium',
  'ammonium cerium nitrate',
  'iron sulfate iron',
])('%s is not read', (name) => {
  expect(readName(name).kind).toBe('unknown');
});

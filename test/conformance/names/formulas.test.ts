/**
 * Formulas as reaction tables write them instead of names. Common practice, no source: every chemist draws these structures
 * from these lines. Salts and complexes are held against the drawing of `inorganic/draw-salt.ts`.
 */
import { describe, expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalForm } from '../../../server/chemistry/structure/canonical-form.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

const keyOf = (smiles: string) => canonicalForm(readSmiles(smiles).value!, { stereo: false }).key;

function keysOf(name: string): string[] {
  const reading = readName(name);
  if (reading.kind !== 'understood') throw new Error(`${name}: ${reading.message}`);
  return reading.readings.map(({ molecule }) => canonicalForm(molecule, { stereo: false }).key);
}

describe('line formulas', () => {
  test.each([
    ['CH3CH2OH', 'CCO'],
    ['CH3(CH2)4CO2H', 'CCCCCC(=O)O'],
    ['(CH3)2CHOH', 'CC(C)O'],
    ['CH3CHOHCH3', 'CC(C)O'],
    ['CH3CH(OH)CH3', 'CC(C)O'],
    ['CH3COCH3', 'CC(C)=O'],
    ['CH3OCH3', 'COC'],
    ['CH3CHO', 'CC=O'],
    ['HCHO', 'C=O'],
    ['HCOOH', 'OC=O'],
    ['CH3COOH', 'CC(=O)O'],
    ['CH3COOC2H5', 'CCOC(C)=O'],
    ['EtO2CCH2CO2Et', 'CCOC(=O)CC(=O)OCC'],
    ['HOOCCH2COOH', 'OC(=O)CC(=O)O'],
    ['CH3CH(NH2)COOH', 'CC(N)C(=O)O'],
    ['NCCH2CO2Et', 'CCOC(=O)CC#N'],
    ['CH2(CN)2', 'N#CCC#N'],
    ['OHCCH2CHO', 'O=CCC=O'],
    ['CH2=CHCN', 'C=CC#N'],
    ['HC≡CH', 'C#C'],
    ['PhC#CH', 'C#Cc1ccccc1'],
    ['CH2=CHCH2MgBr', 'C=CC[Mg]Br'],
    ['CF3CO2H', 'OC(=O)C(F)(F)F'],
    ['CCl3CHO', 'O=CC(Cl)(Cl)Cl'],
    ['ClCH2CH2Cl', 'ClCCCl'],
    ['H2NCH2CH2NH2', 'NCCN'],
    ['HO(CH2CH2O)3H', 'OCCOCCOCCO'],
    ['HOCH2(CHOH)4CH2OH', 'OCC(O)C(O)C(O)C(O)CO'],
    ['(COCl)2', 'ClC(=O)C(=O)Cl'],
    ['(PhCO)2O', 'O=C(OC(=O)c1ccccc1)c1ccccc1'],
    ['(PhS)2', 'c1ccccc1SSc1ccccc1'],
    ['PhCH2Br', 'BrCc1ccccc1'],
    ['PhN=NPh', 'c1ccccc1N=Nc1ccccc1'],
    ['PhNCO', 'O=C=Nc1ccccc1'],
    ['CH3SCN', 'CSC#N'],
    ['tBuNC', '[C-]#[N+]C(C)(C)C'],
    ['TMSN3', 'C[Si](C)(C)N=[N+]=[N-]'],
    ['O2NCH2CH3', 'CC[N+](=O)[O-]'],
    ['iPr2NEt', 'CCN(C(C)C)C(C)C'],
    ['HCONMe2', 'CN(C)C=O'],
    ['nBuLi', '[Li]CCCC'],
    ['n-BuLi', '[Li]CCCC'],
    ['PhMgBr', 'Br[Mg]c1ccccc1'],
    ['Et2Zn', 'CC[Zn]CC'],
    ['AlMe3', 'C[Al](C)C'],
    ['Ph3P', 'c1ccccc1P(c1ccccc1)c1ccccc1'],
    ['PPh3', 'c1ccccc1P(c1ccccc1)c1ccccc1'],
    ['Ph3P=CHCO2Et', 'CCOC(=O)C=P(c1ccccc1)(c1ccccc1)c1ccccc1'],
    ['Ph3PO', 'O=P(c1ccccc1)(c1ccccc1)c1ccccc1'],
    ['P(OEt)3', 'CCOP(OCC)OCC'],
    ['(EtO)2P(O)CH2CO2Et', 'CCOC(=O)CP(=O)(OCC)OCC'],
    ['P(o-tol)3', 'Cc1ccccc1P(c1ccccc1C)c1ccccc1C'],
    ['MeOH', 'CO'],
    ['EtOAc', 'CCOC(C)=O'],
    ['Et2O', 'CCOCC'],
    ['Me3SiCl', 'C[Si](C)(C)Cl'],
    ['TBSOTf', 'CC(C)(C)[Si](C)(C)OS(=O)(=O)C(F)(F)F'],
    ['HN(SiMe3)2', 'C[Si](C)(C)N[Si](C)(C)C'],
    ['Bu3SnH', 'CCCC[SnH](CCCC)CCCC'],
    ['Ac2O', 'CC(=O)OC(C)=O'],
    ['Tf2O', 'O=S(=O)(OS(=O)(=O)C(F)(F)F)C(F)(F)F'],
    ['Boc2O', 'CC(C)(C)OC(=O)OC(=O)OC(C)(C)C'],
    ['CbzCl', 'O=C(Cl)OCc1ccccc1'],
    ['TsNHNH2', 'Cc1ccc(cc1)S(=O)(=O)NN'],
    ['PhSO2H', 'OS(=O)c1ccccc1'],
    ['MeSO2Me', 'CS(C)(=O)=O'],
    ['Me2SO', 'CS(C)=O'],
    ['CH3SO3H', 'CS(=O)(=O)O'],
    ['PhB(OH)2', 'OB(O)c1ccccc1'],
    ['B(OiPr)3', 'CC(C)OB(OC(C)C)OC(C)C'],
    ['SOCl2', 'O=S(Cl)Cl'],
    ['SO2Cl2', 'O=S(=O)(Cl)Cl'],
    ['POCl3', 'O=P(Cl)(Cl)Cl'],
    ['COCl2', 'O=C(Cl)Cl'],
    ['CS2', 'S=C=S'],
    ['HCl', 'Cl'],
    ['CH₂Cl₂', 'ClCCl'],
    ['CDCl3', '[2H]C(Cl)(Cl)Cl'],
    ['CD3OD', '[2H]OC([2H])([2H])[2H]'],
    ['MeNHOMe·HCl', 'CNOC.Cl'],
    ['BF3·OEt2', 'FB(F)F.CCOCC'],
    ['BH3·THF', 'B.C1CCOC1'],
    ['4-MeOC6H4B(OH)2', 'COc1ccc(B(O)O)cc1'],
    ['p-MeOC6H4Br', 'COc1ccc(Br)cc1'],
    ['4-O2NC6H4CHO', 'O=Cc1ccc([N+](=O)[O-])cc1'],
    ['m-ClC6H4CO2H', 'OC(=O)c1cccc(Cl)c1'],
    ['o-BrC6H4CHO', 'O=Cc1ccccc1Br'],
    ['p-MeC6H4SO2Cl', 'Cc1ccc(S(=O)(=O)Cl)cc1'],
    ['P(4-MeOC6H4)3', 'COc1ccc(cc1)P(c1ccc(OC)cc1)c1ccc(OC)cc1'],
    ['(4-ClC6H4)2CO', 'O=C(c1ccc(Cl)cc1)c1ccc(Cl)cc1'],
    ['4-FC6H4MgBr', 'Fc1ccc([Mg]Br)cc1'],
    ['4-HOC6H4CH2CH2NH2', 'NCCc1ccc(O)cc1'],
    ['SO3·pyridine', 'O=S(=O)=O.c1ccncc1'],
    ['PCl5', 'ClP(Cl)(Cl)(Cl)Cl'],
    ['tBuONO', 'CC(C)(C)ON=O'],
    ['Et3N·3HF', 'CCN(CC)CC.F.F.F'],
  ])('%s', (name, smiles) => {
    expect(keysOf(name)).toEqual([keyOf(smiles)]);
  });
});

const copies = (count: number, smiles: string) => Array.from({ length: count }, () => smiles).join('.');
const phosphine = 'c1ccccc1P(c1ccccc1)c1ccccc1';
const acetate = 'CC(=O)[O-]';

describe('salts, oxides and complexes', () => {
  test.each([
    ['K2CO3', '[K+].[K+].[O-]C([O-])=O'],
    ['Cs2CO3', '[Cs+].[Cs+].[O-]C([O-])=O'],
    ['NaHCO3', '[Na+].OC([O-])=O'],
    ['MgSO4·7H2O', `[Mg+2].[O-]S([O-])(=O)=O.${copies(7, 'O')}`],
    ['CuSO4.5H2O', `[Cu+2].[O-]S([O-])(=O)=O.${copies(5, 'O')}`],
    ['NH4Cl', '[NH4+].[Cl-]'],
    ['(NH4)2SO4', '[NH4+].[NH4+].[O-]S([O-])(=O)=O'],
    ['K3PO4', '[K+].[K+].[K+].[O-]P([O-])([O-])=O'],
    ['KH2PO4', '[K+].OP(O)([O-])=O'],
    ['Na2HPO4', '[Na+].[Na+].OP([O-])([O-])=O'],
    ['LiOH·H2O', '[Li+].[OH-].O'],
    ['Na2S2O3', '[Na+].[Na+].[O-]S([O-])(=O)=S'],
    ['NaN3', '[Na+].[N-]=[N+]=[N-]'],
    ['KCN', '[K+].[C-]#N'],
    ['NaHSO3', '[Na+].OS([O-])=O'],
    ['Zn(CN)2', '[Zn+2].[C-]#N.[C-]#N'],
    ['Ph3PMeBr', 'C[P+](c1ccccc1)(c1ccccc1)c1ccccc1.[Br-]'],
    ['Me3OBF4', 'C[O+](C)C.F[B-](F)(F)F'],
    ['[Ir(cod)OMe]2', '[Ir+].[Ir+].C[O-].C[O-].C1=CCCC=CCC1.C1=CCCC=CCC1'],
    ['TBAF trihydrate', 'CCCC[N+](CCCC)(CCCC)CCCC.[F-].O.O.O'],
    ['LiOH monohydrate', '[Li+].[OH-].O'],
    ['DMAP hydrochloride', 'CN(C)c1ccncc1.Cl'],
    ['KMnO4', '[K+].[O-][Mn](=O)(=O)=O'],
    ['Na2WO4·2H2O', '[Na+].[Na+].[O-][W]([O-])(=O)=O.O.O'],
    ['MgO', 'O=[Mg]'],
    ['CuO', 'O=[Cu]'],
    ['Cu2O', '[Cu+].[Cu+].[O-2]'],
    ['MoS2', 'S=[Mo]=S'],
    ['OsO4', 'O=[Os](=O)(=O)=O'],
    ['CrO3', 'O=[Cr](=O)=O'],
    ['MnO2', 'O=[Mn]=O'],
    ['Al2O3', '[Al+3].[Al+3].[O-2].[O-2].[O-2]'],
    ['TiCl4', 'Cl[Ti](Cl)(Cl)Cl'],
    ['FeCl3', '[Fe+3].[Cl-].[Cl-].[Cl-]'],
    ['CuI', '[Cu+].[I-]'],
    ['CeCl3·7H2O', `[Ce+3].[Cl-].[Cl-].[Cl-].${copies(7, 'O')}`],
    ['Ti(OiPr)4', `[Ti+4].${copies(4, 'CC(C)[O-]')}`],
    ['Pd(OAc)2', `[Pd+2].${copies(2, acetate)}`],
    ['AgOTf', '[Ag+].[O-]S(=O)(=O)C(F)(F)F'],
    ['NaOMe', '[Na+].C[O-]'],
    ['KOtBu', '[K+].CC(C)(C)[O-]'],
    ['tBuOK', '[K+].CC(C)(C)[O-]'],
    ['CH3CO2Na', `[Na+].${acetate}`],
    ['HCO2NH4', '[NH4+].[O-]C=O'],
    ['PhSO2Na', '[Na+].[O-]S(=O)c1ccccc1'],
    ['PhBF3K', '[K+].F[B-](F)(F)c1ccccc1'],
    ['NaH', '[Na+].[H-]'],
    ['LiAlH4', '[Li+].[AlH4-]'],
    ['NaBH3CN', '[Na+].[BH3-]C#N'],
    ['NaBH(OAc)3', '[Na+].CC(=O)O[BH-](OC(C)=O)OC(C)=O'],
    ['LiN(iPr)2', '[Li+].CC(C)[N-]C(C)C'],
    ['H2SO4', 'OS(O)(=O)=O'],
    ['H3BO3', 'OB(O)O'],
    ['K3Fe(CN)6', `[K+].[K+].[K+].[Fe+3].${copies(6, '[C-]#N')}`],
    ['(NH4)2Ce(NO3)6', `[NH4+].[NH4+].[Ce+4].${copies(6, '[O-][N+](=O)[O-]')}`],
    ['KAl(SO4)2·12H2O', `[K+].[Al+3].${copies(2, '[O-]S([O-])(=O)=O')}.${copies(12, 'O')}`],
    ['Pd(PPh3)4', `[Pd].${copies(4, phosphine)}`],
    ['PdCl2(PPh3)2', `[Pd+2].[Cl-].[Cl-].${copies(2, phosphine)}`],
    ['(PPh3)2PdCl2', `[Pd+2].[Cl-].[Cl-].${copies(2, phosphine)}`],
    ['RhCl(PPh3)3', `[Rh+].[Cl-].${copies(3, phosphine)}`],
    ['[Rh(cod)Cl]2', `${copies(2, '[Rh+]')}.${copies(2, '[Cl-]')}.${copies(2, 'C1=CCCC=CCC1')}`],
    ['Fe(CO)5', `[Fe].${copies(5, '[C-]#[O+]')}`],
    ['Fe(acac)3', `[Fe+3].${copies(3, 'CC([O-])=CC(C)=O')}`],
    ['Cp2Fe', `[Fe+2].${copies(2, '[CH-]1C=CC=C1')}`],
    ['[Cu(MeCN)4]PF6', `[Cu+].${copies(4, 'CC#N')}.F[P-](F)(F)(F)(F)F`],
    ['iPrMgCl·LiCl', 'CC(C)[Mg]Cl.[Li+].[Cl-]'],
    ['Bu4NHSO4', 'CCCC[N+](CCCC)(CCCC)CCCC.OS(=O)(=O)[O-]'],
    ['Zn', '[Zn]'],
    ['Br2', 'BrBr'],
    ['CO', '[C-]#[O+]'],
  ])('%s', (name, smiles) => {
    expect(keysOf(name)).toEqual([keyOf(smiles)]);
  });

  test('Pd2(dba)3 and Pd(dppf)Cl2 have all their atoms', () => {
    const formulas = ['Pd2(dba)3', 'Pd(dppf)Cl2'].map((name) => keysOf(name));
    expect(formulas).toEqual([
      [keyOf(`[Pd].[Pd].${copies(3, 'O=C(C=Cc1ccccc1)C=Cc1ccccc1')}`)],
      [keyOf(`[Pd+2].[Cl-].[Cl-].[Fe+2].${copies(2, 'c1ccccc1P(c1ccccc1)[C-]1C=CC=C1')}`)],
    ]);
  });
});

describe('what is no formula of one structure', () => {
  test.each([
    // Letters that are no atoms.
    ...['ArNH2', 'RCO2H', 'ROH', 'MX2', 'NuH'],
    // Molecular formulas.
    ...[
      'MeOC6H4Br',
      'BrC6H4Br',
      'p-C6H4',
      'C4H10O',
      'C2H6O',
      'C6H12O6',
      'C6H6',
      'C3H6O',
      'C2H5NO2',
      'C6H5NO2',
      'C6H5N3',
      'C2H5ClO',
      'HNaO',
    ],
    // Two structures.
    ...['(EtO)2POCH2CO2Et'],
    // Charges or valences that do not come out.
    ...['NaCl2', 'FeCl4', 'CH5', 'CH3CH3CH3', 'ClNa', 'K2', 'CH3COH', 'COC'],
    // Words and single symbols.
    ...[
      'In',
      'As',
      'I',
      'Bi',
      'Co',
      'No',
      'Os',
      'Cs',
      'Pb',
      'Nb',
      'IN',
      'AS',
      'HIS',
      'PIN',
      'COIN',
      'SON',
      'OH',
    ],
    ...[
      'NO',
      'PhD',
      'VIS',
      'SEMI',
      'WOODS',
      'SNIFF',
      'VII',
      'SPDIF',
      'WOOF',
      'COCOS',
      'Wen',
      'PyW',
      'Phone',
      'Bench',
    ],
    // The case counts.
    ...['k2co3', 'NACL', 'ch2cl2'],
    // Numbers that are no whole ones.
    ...['CaSO4·0.5H2O', 'CuSO4·xH2O', 'Na2SO4·'],
  ])('%s', (name) => {
    expect(readName(name).kind).toBe('unknown');
  });

  test('Co is not carbon monoxide, and IPr no iodopropane', () => {
    expect(readName('Co').kind).toBe('unknown');
    expect(keysOf('IPr')).not.toEqual(keysOf('PrI'));
  });

  test('long brackets are bounded', () => {
    for (const text of [
      `${'('.repeat(60)}CH2${')2'.repeat(60)}`,
      `C${'(CH2)99'.repeat(15)}`,
      `${'NCO'.repeat(39)}`,
      `Na${'HCO3'.repeat(25)}`,
    ])
      expect(readName(text).kind).toBe('unknown');
  });
});

/**
 * Names of like units round a linking group, bridges between two places, and divalent groups before function words.
 * Source: IUPAC Recommendations 2013, P-15.3 (multiplicative nomenclature), P-51.3 (its use), P-63.5 (epoxy) and P-67.1.4;
 * names with `methylenedioxy`, `ethylene`, `hexamethylene` and without locants: common practice, no source. Structures
 * from memory.
 */
import { expect, it } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { withStereo } from '../../../server/chemistry/structure/molecule.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

const names: readonly (readonly [source: string, name: string, smiles: string])[] = [
  ['P-15.3', "4,4'-methylenedianiline", 'Nc1ccc(cc1)Cc1ccc(N)cc1'],
  ['P-15.3', "2,2'-oxydiethanol", 'OCCOCCO'],
  ['P-15.3', "3,3'-sulfonyldianiline", 'Nc1cccc(c1)S(=O)(=O)c1cccc(N)c1'],
  ['P-15.3', "4,4'-methylenebis(2-chloroaniline)", 'Nc1ccc(cc1Cl)Cc1ccc(N)c(Cl)c1'],
  ['P-15.3', "1,1'-oxybis(2-chloroethane)", 'ClCCOCCCl'],
  ['P-15.3', "2,2'-[ethane-1,2-diylbis(oxy)]diethanol", 'OCCOCCOCCO'],
  ['P-15.3', "1,1',1''-nitrilotris(propan-2-ol)", 'CC(O)CN(CC(C)O)CC(C)O'],
  ['P-15.3', "2,2',2''-nitrilotriacetic acid", 'OC(=O)CN(CC(=O)O)CC(=O)O'],
  ['P-15.3', 'nitrilotriacetic acid', 'OC(=O)CN(CC(=O)O)CC(=O)O'],
  ['P-15.3', 'iminodiacetic acid', 'OC(=O)CNCC(=O)O'],
  ['P-15.3', "2,2'-iminodiacetic acid", 'OC(=O)CNCC(=O)O'],
  ['P-15.3', "4,4'-(propane-2,2-diyl)diphenol", 'CC(C)(c1ccc(O)cc1)c1ccc(O)cc1'],
  ['P-15.3', "4,4'-(9H-fluorene-9,9-diyl)diphenol", 'Oc1ccc(cc1)C1(c2ccccc2-c2ccccc12)c1ccc(O)cc1'],
  ['P-15.3', "4,4'-isopropylidenediphenol", 'CC(C)(c1ccc(O)cc1)c1ccc(O)cc1'],
  ['P-15.3', "4,4'-(1-methylethylidene)bisphenol", 'CC(C)(c1ccc(O)cc1)c1ccc(O)cc1'],
  ['P-15.3', "2,2'-azobis(2-methylpropanenitrile)", 'CC(C)(C#N)N=NC(C)(C)C#N'],
  ['P-15.3', "2,2'-dithiodibenzoic acid", 'OC(=O)c1ccccc1SSc1ccccc1C(=O)O'],
  ['P-15.3', "2,2'-disulfanediyldibenzoic acid", 'OC(=O)c1ccccc1SSc1ccccc1C(=O)O'],
  ['P-15.3', "3,3'-thiodipropionic acid", 'OC(=O)CCSCCC(=O)O'],
  ['P-15.3', "2,2'-(methylazanediyl)diethanol", 'CN(CCO)CCO'],
  ['P-15.3', "2,2'-(methylimino)diethanol", 'CN(CCO)CCO'],
  ['P-15.3', "N,N'-methylenebisacrylamide", 'C=CC(=O)NCNC(=O)C=C'],
  ['P-15.3', "N,N'-methylenedi(prop-2-enamide)", 'C=CC(=O)NCNC(=O)C=C'],
  ['P-15.3', "1,1'-(1,4-phenylene)bis(ethan-1-one)", 'CC(=O)c1ccc(cc1)C(C)=O'],
  ['P-15.3', "2,2'-(1,4-phenylene)diacetic acid", 'OC(=O)Cc1ccc(CC(=O)O)cc1'],
  ['P-15.3', '1,4-phenylenediacetic acid', 'OC(=O)Cc1ccc(CC(=O)O)cc1'],
  ['from memory', '1,3-benzodioxole', 'c1ccc2OCOc2c1'],
  ['common practice, no source', '3,4-methylenedioxyphenylacetone', 'CC(=O)Cc1ccc2OCOc2c1'],
  ['common practice, no source', '3,4-methylenedioxybenzaldehyde', 'O=Cc1ccc2OCOc2c1'],
  ['common practice, no source', '3,4-(methylenedioxy)aniline', 'Nc1ccc2OCOc2c1'],
  ['common practice, no source', '3,4-ethylenedioxythiophene', 'c1scc2OCCOc12'],
  ['common practice, no source', '1-(3,4-methylenedioxyphenyl)propan-2-amine', 'CC(N)Cc1ccc2OCOc2c1'],
  ['P-63.5', '1,2-epoxycyclohexane', 'C1CCCC2OC12'],
  ['P-63.5', '1,2-epoxybutane', 'CCC1CO1'],
  ['P-63.5', '2,3-epoxypropan-1-ol', 'OCC1CO1'],
  [
    'P-15.3',
    "4,4'-(isopropylidenebis(4,1-phenyleneoxy))dianiline",
    'CC(C)(c1ccc(cc1)Oc1ccc(N)cc1)c1ccc(cc1)Oc1ccc(N)cc1',
  ],
  ['common practice, no source', 'hexamethylenediamine', 'NCCCCCCN'],
  ['common practice, no source', 'trimethylenediamine', 'NCCCN'],
  ['P-15.3', "N,N'-dimethyltrimethylenediamine", 'CNCCCNC'],
  ['common practice, no source', 'hexamethylene diisocyanate', 'O=C=NCCCCCCN=C=O'],
  ['P-15.3', '1,4-phenylene diisocyanate', 'O=C=Nc1ccc(cc1)N=C=O'],
  ['P-15.3', "4,4'-methylenediphenyl diisocyanate", 'O=C=Nc1ccc(cc1)Cc1ccc(cc1)N=C=O'],
  ['P-15.3', "3,3'-dichloro-4,4'-methylenedianiline", 'Nc1ccc(c(Cl)c1)Cc1ccc(N)cc1Cl'],
  ['P-15.3', "3,3'-dimethyl-4,4'-oxydianiline", 'Nc1ccc(c(C)c1)Oc1ccc(N)cc1C'],
  ['P-15.3', 'oxydibenzene', 'c1ccccc1Oc1ccccc1'],
  ['P-15.3', "1,1'-[oxybis(methylene)]dibenzene", 'c1ccccc1COCc1ccccc1'],
  ['P-15.3', "1,1'-methylenedibenzene", 'c1ccccc1Cc1ccccc1'],
  ['P-15.3', "1,1'-sulfonylbis(4-chlorobenzene)", 'Clc1ccc(cc1)S(=O)(=O)c1ccc(Cl)cc1'],
  ['P-15.3', "2,2'-(ethylenedioxy)diethanol", 'OCCOCCOCCO'],
  ['P-15.3', "2,2'-[oxybis(ethane-2,1-diyloxy)]diethanol", 'OCCOCCOCCOCCO'],
  ['P-15.3', "4,4',4''-methanetriyltriphenol", 'Oc1ccc(cc1)C(c1ccc(O)cc1)c1ccc(O)cc1'],
  ['P-15.3', "diethyl 2,2'-oxydiacetate", 'CCOC(=O)COCC(=O)OCC'],
  ['P-15.3', "N,N'-(ethane-1,2-diyl)bis[N-(carboxymethyl)glycine]", 'OC(=O)CN(CC(=O)O)CCN(CC(=O)O)CC(=O)O'],
  ['P-15.3', '1,2-ethanediylbis(diphenylphosphine)', 'c1ccc(cc1)P(CCP(c1ccccc1)c1ccccc1)c1ccccc1'],
  ['P-15.3', '(ethane-1,2-diyl)bis(diphenylphosphane)', 'c1ccc(cc1)P(CCP(c1ccccc1)c1ccccc1)c1ccccc1'],
  ['P-15.3', "4,4'-carbonyldibenzoic acid", 'OC(=O)c1ccc(cc1)C(=O)c1ccc(cc1)C(=O)O'],
  ['P-15.3', "4,4'-(ethane-1,2-diyl)dibenzoic acid", 'OC(=O)c1ccc(cc1)CCc1ccc(cc1)C(=O)O'],
  ['P-15.3', "3,3'-[methylenebis(oxy)]dipropanenitrile", 'N#CCCOCOCCC#N'],
  ['P-15.3', "1,1'-(ethane-1,2-diyl)dipyrrolidine", 'C1CCN(C1)CCN1CCCC1'],
  ['P-15.3', "1,1'-carbonylbis(1H-imidazole)", 'O=C(n1ccnc1)n1ccnc1'],
  ['P-15.3', "1,1'-carbonyldiimidazole", 'O=C(n1ccnc1)n1ccnc1'],
  ['P-15.3', "4,4'-oxybis(benzenesulfonyl chloride)", 'O=S(=O)(Cl)c1ccc(cc1)Oc1ccc(cc1)S(=O)(=O)Cl'],
  ['P-15.3', "1,1'-methylenebis(4-isocyanatobenzene)", 'O=C=Nc1ccc(cc1)Cc1ccc(cc1)N=C=O'],
  ['P-15.3', "4,4'-methylenebis(N,N-dimethylaniline)", 'CN(C)c1ccc(cc1)Cc1ccc(cc1)N(C)C'],
  ['P-15.3', "6,6'-(ethane-1,2-diylbis(azanediyl))dihexanoic acid", 'OC(=O)CCCCCNCCNCCCCCC(=O)O'],
  ['P-15.3', 'sulfonyldimethane', 'CS(C)(=O)=O'],
  ['P-15.3', "2,2'-thiodiethanol", 'OCCSCCO'],
  ['P-15.3', 'thiodiglycolic acid', 'OC(=O)CSCC(=O)O'],
  ['P-67.1.4', 'carbonyl dichloride', 'ClC(=O)Cl'],
  ['P-67.1.4', 'sulfuryl dichloride', 'ClS(=O)(=O)Cl'],
  ['P-67.1.4', 'sulfuryl chloride', 'ClS(=O)(=O)Cl'],
  ['P-67.1.4', 'thionyl chloride', 'ClS(=O)Cl'],
  ['P-67.1.4', 'phosphoryl trichloride', 'ClP(=O)(Cl)Cl'],
  ['P-67.1.4', 'phosphoryl chloride', 'ClP(=O)(Cl)Cl'],
  ['P-67.1.4', 'thiophosphoryl chloride', 'ClP(=S)(Cl)Cl'],
  ['P-67.1.4', 'nitrosyl chloride', 'ClN=O'],
  ['P-67.1.4', 'cyanogen bromide', 'BrC#N'],
  ['common practice, no source', 'ethylene dibromide', 'BrCCBr'],
  ['common practice, no source', 'trimethylene dibromide', 'BrCCCBr'],
  ['common practice, no source', 'ethylene sulfide', 'C1CS1'],
  ['common practice, no source', 'tetramethylene sulfone', 'O=S1(=O)CCCC1'],
  ['P-63.5', '1,4-epoxycyclohexane', 'C1CC2CCC1O2'],
  ['P-63.5', '2,3-epithiopropyl acetate', 'CC(=O)OCC1CS1'],
  ['P-15.3', 'thiodiglycolic acid', 'OC(=O)CSCC(=O)O'],
  ['P-15.3', 'oxydiethanol', 'OCCOCCO'],
  ['from memory', '1,4-bis(4-aminophenoxy)benzene', 'Nc1ccc(cc1)Oc1ccc(cc1)Oc1ccc(N)cc1'],
  ['P-15.3', "2,2'-[1,4-phenylenebis(oxy)]diacetic acid", 'OC(=O)COc1ccc(cc1)OCC(=O)O'],
  ['P-15.3', "1,1'-(1,3-phenylene)bis(1H-pyrrole-2,5-dione)", 'O=C1C=CC(=O)N1c1cccc(c1)N1C(=O)C=CC1=O'],
  [
    'P-15.3',
    "4,4'-[(1-methylethylidene)bis(4,1-phenyleneoxy)]bisbenzenamine",
    'CC(C)(c1ccc(cc1)Oc1ccc(N)cc1)c1ccc(cc1)Oc1ccc(N)cc1',
  ],
  ['P-15.3', "(2R,2'R)-2,2'-dithiodipropanoic acid", 'C[C@@H](SS[C@H](C)C(=O)O)C(=O)O'],
  ['P-15.3', "N,N'-carbonyldiglycine", 'OC(=O)CNC(=O)NCC(=O)O'],
  ['from memory', '2-methylimino-1-phenylpropane', 'CC(=NC)Cc1ccccc1'],
];

const constitution = (smiles: string) => canonicalSmiles(withStereo(readSmiles(smiles).value!, []));

it.each(names)('%s: %s', (_source, name, smiles) => {
  const reading = readName(name);
  expect(reading.kind).toBe('understood');
  if (reading.kind !== 'understood') return;
  expect(reading.readings).toHaveLength(1);
  expect(canonicalSmiles(withStereo(reading.readings[0]!.molecule, []))).toBe(constitution(smiles));
});

/** Numbers of stereoisomers where rings, cages, symmetry or mobile atoms decide. */
import { describe, expect, test } from 'vitest';
import { canonicalForm } from '../../../server/chemistry/structure/canonical-form.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';
import { enantiomerPlaces } from '../../../server/chemistry/structure/stereo-mirror.ts';
import { enumerateStereoisomers } from '../../../server/chemistry/structure/stereoisomers.ts';

const list = (smiles: string) => enumerateStereoisomers(readSmiles(smiles).value!, 200);

describe('cages and fused rings', () => {
  // Counts from the compounds that are known, from memory, unless another reason is given.
  test.each([
    ['norbornan-2-ol: exo and endo, each a pair', 'OC1CC2CCC1C2', 4],
    ['borneol and isoborneol, each a pair', 'CC1(C)C2CCC1(C)C(O)C2', 4],
    ['norbornadiene', 'C1=CC2CC1C=C2', 1],
    ['tropinone', 'CN1C2CCC1CC(=O)C2', 1],
    ['tropine and pseudotropine', 'CN1C2CCC1CC(O)C2', 2],
    ['cocaine: four pairs', 'COC(=O)C1C(OC(=O)c2ccccc2)CC2CCC1N2C', 8],
    ['quinine: four independent centres', 'COc1ccc2nccc(C(O)C3CC4CCN3CC4C=C)c2c1', 16],
    ['morphine: the imine bridge can only be cis', 'CN1CCC23c4c5ccc(O)c4OC2C(O)C=CC3C1C5', 16],
    ['benzylpenicillin', 'CC1(C)SC2C(NC(=O)Cc3ccccc3)C(=O)N2C1C(=O)O', 8],
    ['cyclohexene oxide: cis only', 'C1CCC2OC2C1', 1],
    ['car-3-ene', 'CC1(C)C2CC=C(C)CC12', 2],
    ['an adamantane with four different bridgeheads', 'CC12CC3(O)CC(F)(C1)CC(Cl)(C2)C3', 2],
    ['adamantan-2-ol', 'OC1C2CC3CC(C2)CC1C3', 1],
    ['cubane', 'C12C3C4C1C5C2C3C45', 1],
    ['hydrindane: cis, and trans as a pair', 'C1CCC2CCCC2C1', 3],
    ['bicyclo[4.2.0]octane: cis, and trans as a pair', 'C1CCC2CCC2C1', 3],
    ['bicyclo[3.2.0]heptane: cis only', 'C1CC2CCC2C1', 1],
    ['bicyclo[2.1.0]pentane', 'C1CC2CC12', 1],
  ])('%s', (_name, smiles, count) => {
    expect(list(smiles).count).toBe(count);
  });
});

describe('symmetry', () => {
  // Source: Eliel and Wilen, Stereochemistry of Organic Compounds, 1994, chapters 3, 11 and 14 (from memory), or by hand.
  test.each([
    ['pentane-2,3,4-triol: a pair and two meso forms', 'CC(O)C(O)C(O)C', 4],
    ['the hexitols', 'OCC(O)C(O)C(O)C(O)CO', 10],
    ['1,3-dimethylcyclobutane', 'CC1CC(C)C1', 2],
    ['1,3,5-trimethylcyclohexane', 'CC1CC(C)CC(C)C1', 2],
    ['the truxinic acids: two meso forms and four pairs', 'OC(=O)C1C(c2ccccc2)C(c2ccccc2)C1C(=O)O', 10],
    ['1-ethylidene-4-methylcyclohexane, chiral like an allene', 'CC=C1CCC(C)CC1', 2],
    ['1,4-diethylidenecyclohexane', 'CC=C1CCC(=CC)CC1', 2],
    ['octa-2,3,5,6-tetraene: a pair and a meso form', 'CC=C=CC=C=CC', 3],
    ['hexa-2,3,4-triene', 'CC=C=C=CC', 2],
    ['cycloocta-1,5-diene', 'C1CC=CCCC=C1', 3],
    ['cyclododeca-1,5,9-triene', 'C1CC=CCCC=CCCC=C1', 4],
    ['2,5-dichlorohex-3-ene', 'CC(Cl)C=CC(C)Cl', 6],
    ['acetaldehyde azine', 'CC=NN=CC', 3],
    ['two molecules of butan-2-ol', 'CC(O)CC.CC(O)CC', 3],
    ['a salt of two chiral partners', 'OC(=O)C(O)C(O)C(=O)O.NC(C)c1ccccc1', 6],
    ['sucrose by formula: nine centres', 'OCC1OC(OC2(CO)OC(CO)C(O)C2O)C(O)C(O)C1O', 512],
  ])('%s', (_name, smiles, count) => {
    expect(list(smiles).count).toBe(count);
  });
});

describe('what moves at room temperature is no stereocentre', () => {
  // Common practice, no source.
  test.each([
    ['a carbodiimide', 'CC(C)N=C=NC(C)C', 1],
    ['a phosphate diester with its proton', 'CCOP(=O)(O)OC', 1],
    ['and without', 'CCOP(=O)([O-])OC', 1],
    ['a phosphonate diester', 'CCOP(C)(=O)OC', 2],
    ['a phosphorothioate', 'CCOP(O)(=S)OC', 2],
    ['a sulfoximine', 'CCS(C)(=N)=O', 2],
    ['a sulfone', 'CCS(C)(=O)=O', 1],
    ['a phosphine', 'CCP(C)c1ccccc1', 2],
    ['an aziridine, whose nitrogen turns over', 'CC1CN1', 2],
    ['an amidine with N–H', 'CNC(C)=NC', 1],
    ['a quaternary ammonium ion', 'CC[N+](C)(CC=C)Cc1ccccc1', 2],
  ])('%s', (_name, smiles, count) => {
    expect(list(smiles).count).toBe(count);
  });
});

describe('lists are sound', () => {
  test.each([
    'CC(O)C(O)C(O)C',
    'OC1C(O)C(O)C(O)C(O)C1O',
    'CC1(C)C2CCC1(C)C(O)C2',
    'CC=C=CC=C=CC',
    'CC(Cl)C=CC(C)Cl',
    'C1CCC2CCCC2C1',
    'CC(O)CC.CC(O)CC',
    'CC(F)CS(=O)CC(C)F',
  ])('%s: no isomer twice, every mirror image in it', (smiles) => {
    const { isomers, count } = list(smiles);
    expect(new Set(isomers.map((isomer) => canonicalForm(isomer).key)).size).toBe(count);
    const places = enantiomerPlaces(isomers);
    expect(places).not.toContain(-1);
    places.forEach((place, index) => expect(places[place]).toBe(index));
  });

  test('a structure with very many arrangements answers at once and says what it does not know', () => {
    const polyol = `OC${'C(O)'.repeat(40)}CO`;
    const { count, isomers } = list(polyol);
    expect(count).toBeUndefined();
    expect(isomers.length).toBeGreaterThan(50);
  });
});

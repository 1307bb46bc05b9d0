/**
 * Bridged and spiro ring systems and ring assemblies. Rule numbers are those of the IUPAC Recommendations 2013; names are
 * of the kind that the rule describes, structures drawn from them by hand.
 */
import { describe, expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

function readings(name: string): string[] {
  const reading = readName(name);
  if (reading.kind !== 'understood') throw new Error(`${name}: ${reading.message}`);
  return reading.readings.map(({ molecule }) => canonicalSmiles(molecule)).sort();
}
const canonical = (smiles: string) => canonicalSmiles(readSmiles(smiles).value!);

type Row = readonly [rule: string, name: string, ...smiles: string[]];

function meansExactly(rows: readonly Row[]): void {
  test.each(rows.map(([rule, name, ...smiles]) => ({ rule, name, smiles })))(
    '$rule: $name',
    ({ name, smiles }) => {
      expect(readings(name)).toEqual(smiles.map(canonical).sort());
    },
  );
}

describe('von Baeyer names', () => {
  meansExactly([
    ['P-23.2.3', 'bicyclo[2.2.1]heptane', 'C1CC2CCC1C2'],
    ['A-31.1', 'bicyclo[2,2,1]heptane', 'C1CC2CCC1C2'],
    ['P-23.2.5.1', 'tricyclo[2.2.1.0^2,6]heptane', 'C12C3CC(CC13)C2'],
    ['P-23.2.5.1', 'tricyclo[2.2.1.0^{2,6}]heptane', 'C12C3CC(CC13)C2'],
    ['P-23.2.5.1', 'tricyclo[2.2.1.0(2,6)]heptane', 'C12C3CC(CC13)C2'],
    ['P-23.2.5.1', 'tricyclo[2.2.1.0<sup>2,6</sup>]heptane', 'C12C3CC(CC13)C2'],
    ['P-23.2.5.1', 'tricyclo[2.2.1.02,6]heptane', 'C12C3CC(CC13)C2'],
    ['P-23.2.5.1', 'tricyclo[2.2.1.0²,⁶]heptane', 'C12C3CC(CC13)C2'],
    ['P-23.2.5.1', 'tricyclo[3.3.1.13,7]decane', 'C1C2CC3CC1CC(C2)C3'],
    ['P-23.2.5.1', 'tetracyclo[4.4.2.2^2,5.2^7,10]hexadecane', 'C1CC2CCC1C1CCC2C2CCC1CC2'],
    ['P-23.2.5.1', 'pentacyclo[4.2.0.02,5.03,8.04,7]octane', 'C12C3C4C1C5C2C3C45'],
    ['P-23.3.1', '1,4-diazabicyclo[2.2.2]octane', 'C1CN2CCN1CC2'],
    ['P-23.3.1', '3,6,8-trioxabicyclo[3.2.2]nonane', 'C1OCC2COC1CO2'],
    ['P-31.1.4.2.4', 'bicyclo[4.4.0]dec-1(6)-ene', 'C1CCC2=C(C1)CCCC2'],
    ['P-31.1.4.2.4', 'bicyclo[4.2.0]octa-1(6),2,4-triene', 'C1Cc2ccccc12'],
    [
      'P-31.1.4.2.4',
      '13-chloro-4-azatricyclo[9.4.0.03,8]pentadeca-1(11),3(8),4,6,12,14-hexaene',
      'Clc1ccc2Cc3ncccc3CCc2c1',
    ],
    ['common practice, no source', '1,8,11,12-tetrazatricyclo[8.3.0.02,6]tridecane', 'C1CCC2C1CNCC1NNCN12'],
  ]);
  test.each([
    ['sizes that do not add up', 'bicyclo[2.2.1]octane'],
    ['rings that do not agree', 'tricyclo[2.2.1]heptane'],
    ['two bonds between the same atoms', 'tricyclo[2.2.1.0^1,2]heptane'],
    ['a place that is not there', 'tricyclo[2.2.1.0^2,9]heptane'],
  ])('%s: %s', (_, name) => {
    expect(readName(name).kind).toBe('unknown');
  });
});

describe('spiro systems of single rings', () => {
  meansExactly([
    ['P-24.2.1', 'spiro[4.5]decane', 'C1CCCC12CCCCC2'],
    ['P-24.2.1', 'spiro[2.2]pentane', 'C1CC12CC2'],
    ['P-24.2.4.1.1', '1,4-dioxaspiro[4.5]decane', 'O1CCOC12CCCCC2'],
    ['P-24.2.2', 'dispiro[4.2.4^8.2^5]tetradecane', 'C1CCCC12CCC3(CC2)CCCC3'],
    ['P-24.2.2', 'dispiro[5.1.7^8.2^6]heptadecane', 'C1CCCCC12CC3(CC2)CCCCCCC3'],
    ['P-24.2.2', 'dispiro[5.1.7.2]heptadecane', 'C1CCCCC12CC3(CC2)CCCCCCC3'],
    ['P-24.2.3', 'trispiro[2.2.2^6.2.2^11.2^3]pentadecane', 'C1CC12CCC3(CC3)CCC4(CC4)CC2'],
    ['P-24.2.3', 'trispiro[2.2.26.2.211.23]pentadecane', 'C1CC12CCC3(CC3)CCC4(CC4)CC2'],
    [
      'P-24.2.3',
      'pentaspiro[2.0.2^4.0.2^7.0.2^10.0.2^13.0^3]pentadecane',
      'C1CC12C3(CC3)C4(CC4)C5(CC5)C26CC6',
    ],
  ]);
});

describe('spiro systems of named rings', () => {
  meansExactly([
    ['P-24.5.2', "spiro[cyclohexane-1,2'-[1,3]dioxolane]", 'C1CCC2(CC1)OCCO2'],
    ['P-24.5.2', "spiro[bicyclo[2.2.1]heptane-2,2'-oxirane]", 'C1CC2CC1CC23CO3'],
    ['P-24.5.2', "3H-spiro[2-benzofuran-1,4'-piperidin]-3-one", 'O=C1OC2(CCNCC2)c2ccccc12'],
    ['P-24.5.2', "spiro[indole-3,4'-piperidin]-2(1H)-one", 'O=C1Nc2ccccc2C13CCNCC3'],
    ['P-24.5.2', "spiro[3H-indole-3,4'-piperidine]", 'C1=Nc2ccccc2C13CCNCC3'],
    ['P-24.5.2', "spiro[cyclopropane-1,3'-[3H]indole]", 'C1=Nc2ccccc2C13CC3'],
    ['P-24.5.2', "1'H-spiro[cyclopentane-1,2'-quinazolin]-4'(3'H)-one", 'O=C1NC2(CCCC2)Nc2ccccc12'],
    [
      'P-24.5.2',
      "2'-methylspiro[1-benzofuran-2,4'-cyclohex-2-ene]-1',3-dione",
      'CC1=CC2(CCC1=O)Oc1ccccc1C2=O',
    ],
    [
      'P-24.5.2',
      "8-methylspiro[1,3-dihydroquinazoline-2,4'-piperidine]-4-one",
      'Cc1cccc2C(=O)NC3(CCNCC3)Nc12',
    ],
    ['P-24.5.2', "spiro[8-oxatricyclo[7.2.1.02,7]dodec-5-ene-12,2'-oxirane]", 'C12C3CCC=CC3OC(CC1)C24CO4'],
    ['P-24.5.2', "spiro[fluorene-9,9'-xanthene]", 'c1ccc2c(c1)Oc1ccccc1C21c2ccccc2-c2ccccc12'],
    ['P-24.5.2', "spiro[4-azabicyclo[2.2.2]octane-2,5'-oxazolidin]-2'-one", 'O=C1NCC2(CN3CCC2CC3)O1'],
    [
      'P-24.6',
      "dispiro[fluorene-9,1'-cyclohexane-4',1''-indene]",
      'C1=CC2(CCC3(CC2)c2ccccc2-c2ccccc23)c2ccccc12',
    ],
    ['P-24.3', "1,1'-spirobi[indene]", 'C1=CC2(C=Cc3ccccc23)c2ccccc12'],
    ['P-24.3', "2,2',3,3'-tetrahydro-1,1'-spirobi[indene]", 'C1CC2(CCc3ccccc23)c2ccccc12'],
    ['P-24.3', "1,1'-spirobiindane-7,7'-diol", 'Oc1cccc2CCC3(CCc4cccc(O)c34)c12'],
    ['P-24.3', "9,9'-spirobi[9H-fluorene]", 'c1ccc2c(c1)-c1ccccc1C21c2ccccc2-c2ccccc12'],
  ]);
  test.each([
    ['a place that the ring lacks', "spiro[cyclohexane-1,9'-indene]"],
    ['different atoms in one place', "spiro[cyclohexane-1,1'-piperidine]"],
    ['a bracket left open', "spiro[cyclohexane-1,1'-indene"],
  ])('%s: %s', (_, name) => {
    expect(readName(name).kind).toBe('unknown');
  });
});

describe('ring assemblies', () => {
  meansExactly([
    ['P-28.2.1', "1,1'-biphenyl", 'c1ccc(cc1)-c1ccccc1'],
    ['P-28.2.1', "[1,1'-biphenyl]-4-ol", 'Oc1ccc(cc1)-c1ccccc1'],
    ['P-28.2.1', "(1,1'-biphenyl)-4-ol", 'Oc1ccc(cc1)-c1ccccc1'],
    ['P-28.2.1', "4'-methyl-[1,1'-biphenyl]-4-carboxylic acid", 'Cc1ccc(cc1)-c1ccc(cc1)C(=O)O'],
    ['P-28.2.1', "N-([1,1'-biphenyl]-4-yl)acetamide", 'CC(=O)Nc1ccc(cc1)-c1ccccc1'],
    ['P-28.2.1', 'biphenyl-4-yl acetate', 'CC(=O)Oc1ccc(cc1)-c1ccccc1'],
    ['P-28.2.1', "2,2'-bipyridine", 'c1ccnc(c1)-c1ccccn1'],
    ['P-28.2.1', "4,4'-dimethyl-2,2'-bipyridine", 'Cc1ccnc(c1)-c1cc(C)ccn1'],
    ['P-28.2.1', "4,4'-bipiperidine", 'C1CNCCC1C1CCNCC1'],
    ['P-28.2.1', "1,4'-bipiperidine", 'C1CCN(CC1)C1CCNCC1'],
    ['P-28.2.1', "1,1'-bi(cyclohexane)", 'C1CCC(CC1)C1CCCCC1'],
    ['P-28.2.1', "1,1'-bi(cyclohexyl)", 'C1CCC(CC1)C1CCCCC1'],
    ['P-28.2.1', "[1,1'-bicyclohexyl]-2-one", 'O=C1CCCCC1C1CCCCC1'],
    ['P-28.2.1', "1,1'-binaphthalene-2,2'-diol", 'Oc1ccc2ccccc2c1-c1c(O)ccc2ccccc12'],
    ['P-28.2.1', "2,2'-bi-1H-imidazole", 'c1c[nH]c(n1)-c1ncc[nH]1'],
    ['P-28.2.1', "9,9'-bifluorenylidene", 'c1ccc2c(c1)-c1ccccc1C2=C1c2ccccc2-c2ccccc21'],
    ['1979 rules A-52', "2,2'-bipyridyl", 'c1ccnc(c1)-c1ccccn1'],
    ['1979 rules A-52', "2,2'-binaphthyl", 'c1ccc2cc(ccc2c1)-c1ccc2ccccc2c1'],
    ['common practice, no source', "[1,1']biphenyl-4-ol", 'Oc1ccc(cc1)-c1ccccc1'],
    ['common practice, no source', 'bicyclohexyl', 'C1CCC(CC1)C1CCCCC1'],
    ['P-28.3.1', "1,1':4',1''-terphenyl", 'c1ccc(cc1)-c1ccc(cc1)-c1ccccc1'],
    ['P-28.3.1', "[1,1':3',1''-terphenyl]-5'-carboxylic acid", 'OC(=O)c1cc(cc(c1)-c1ccccc1)-c1ccccc1'],
    ['P-28.3.1', "2,2':6',2''-terpyridine", 'c1ccnc(c1)-c1cccc(n1)-c1ccccn1'],
    ['P-28.3.1', "4'-chloro-2,2':6',2''-terpyridine", 'Clc1cc(nc(c1)-c1ccccn1)-c1ccccn1'],
    ['P-28.3.1', "1,1':4',1'':4'',1'''-quaterphenyl", 'c1ccc(cc1)-c1ccc(cc1)-c1ccc(cc1)-c1ccccc1'],
    ['1979 rules A-54', 'o-terphenyl', 'c1ccc(cc1)-c1ccccc1-c1ccccc1'],
    ['1979 rules A-54', 'm-terphenyl', 'c1ccc(cc1)-c1cccc(c1)-c1ccccc1'],
    ['1979 rules A-54', 'p-quaterphenyl', 'c1ccc(cc1)-c1ccc(cc1)-c1ccc(cc1)-c1ccccc1'],
    // Two rings with three kinds of places each: 3 + 2 + 1 pairs; thiophene has two kinds: 2 + 1.
    [
      'P-28.2.1',
      'bipyridine',
      'c1ccnc(c1)-c1ccccn1',
      'c1ccnc(c1)-c1cccnc1',
      'c1ccnc(c1)-c1ccncc1',
      'c1cncc(c1)-c1cccnc1',
      'c1cncc(c1)-c1ccncc1',
      'c1cc(ccn1)-c1ccncc1',
    ],
    ['P-28.2.1', 'bithiophene', 'c1csc(c1)-c1cccs1', 'c1csc(c1)-c1ccsc1', 'c1cscc1-c1ccsc1'],
  ]);
  test.each(["1,1'-terphenyl", "1,1':4',1''-biphenyl", "2,7'-bipyridine", 'biphenol'])(
    '%s is not read',
    (name) => {
      expect(readName(name).kind).toBe('unknown');
    },
  );
});

describe('bridged fused systems', () => {
  meansExactly([
    ['P-25.4.2.1', '1,4-dihydro-1,4-methanonaphthalene', 'C1C2C=CC1c1ccccc12'],
    ['P-25.4.2.1', '1,2,3,4-tetrahydro-1,4-methanonaphthalene', 'C1CC2CC1c1ccccc12'],
    ['P-25.4.2.1', '1,4-dihydro-1,4-epoxynaphthalene', 'C1=CC2OC1c1ccccc12'],
    ['P-25.4.2.1', '9,10-dihydro-9,10-ethanoanthracene', 'C1CC2c3ccccc3C1c1ccccc12'],
    ['P-25.4.2.1', '9,10-dihydro-9,10-[1,2]benzenoanthracene', 'c1ccc2c(c1)C1c3ccccc3C2c2ccccc12'],
    ['P-25.4.2.1', '4a,8a-propanoquinoline', 'C1CC23C=CC=CC2(C1)N=CC=C3'],
    ['P-25.4.2.1', '1,2,3,4-tetrahydro-1,4-epiminonaphthalene', 'C1CC2NC1c1ccccc12'],
    ['1979 rules A-34', '3a,4,7,7a-tetrahydro-1H-4,7-methanoindene', 'C1C=CC2C1C1CC2C=C1'],
    ['1979 rules A-34', '3a,4,7,7a-tetrahydro-4,7-methano-1H-indene', 'C1C=CC2C1C1CC2C=C1'],
    ['1979 rules A-34', 'octahydro-4,7-methano-1H-indene', 'C1CC2C(C1)C1CC2CC1'],
    ['from memory', '2,3,4,5-tetrahydro-1H-1,5-methano-3-benzazepine', 'C1NCC2CC1c1ccccc12'],
    ['from memory', '3a,4,7,7a-tetrahydro-4,7-epoxyisobenzofuran-1,3-dione', 'O=C1OC(=O)C2C1C1OC2C=C1'],
    // The bridge with chlorine is 10, because numbering begins at bridgehead 8.
    [
      'from memory',
      '1,2,3,4,10,10-hexachloro-1,4,4a,5,8,8a-hexahydro-1,4:5,8-dimethanonaphthalene',
      'ClC1=C(Cl)C2(Cl)C3C4CC(C=C4)C3C1(Cl)C2(Cl)Cl',
    ],
    [
      'from memory',
      '1,4,5,6,7,8,8-heptachloro-3a,4,7,7a-tetrahydro-4,7-methano-1H-indene',
      'ClC1C=CC2C1C1(Cl)C(Cl)=C(Cl)C2(Cl)C1(Cl)Cl',
    ],
  ]);
  test.each([
    ['a bridgehead that is not there', '1,9-methanonaphthalene'],
    ['a single ring', '1,4-methanobenzene'],
  ])('%s: %s', (_, name) => {
    expect(readName(name).kind).toBe('unknown');
  });
});

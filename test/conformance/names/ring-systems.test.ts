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

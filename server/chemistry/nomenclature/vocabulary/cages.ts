/**
 * Polycyclic hydrocarbons with names of their own whose numbering is that of the von Baeyer name. Source: IUPAC
 * Recommendations 2013, P-23.7 (adamantane, cubane, prismane); the others are common practice, no source.
 * Each line: name without final e, von Baeyer descriptor, number of atoms.
 */
import type { RingLine } from './rings.ts';

export type CageLine = readonly [name: string, descriptor: string, size: number];

export const cages: readonly CageLine[] = [
  ['prisman', 'tetracyclo[2.2.0.0^2,6.0^3,5]', 6],
  ['tetrahedran', 'tricyclo[1.1.0.0^2,4]', 4],
  ['quadricyclan', 'tetracyclo[3.2.0.0^2,7.0^4,6]', 7],
  ['nortricyclan', 'tricyclo[2.2.1.0^2,6]', 7],
  ['twistan', 'tricyclo[4.4.0.0^3,8]', 10],
  ['noradamantan', 'tricyclo[3.3.1.0^3,7]', 9],
  ['protoadamantan', 'tricyclo[4.3.1.0^3,8]', 10],
  ['homoadamantan', 'tricyclo[4.3.1.1^3,8]', 11],
  ['basketan', 'pentacyclo[4.4.0.0^2,5.0^3,8.0^4,7]', 10],
  ['diamantan', 'pentacyclo[7.3.1.1^4,12.0^2,7.0^6,11]', 14],
];

/** Bridged rings with heteroatoms or double bonds; common practice, no source. */
export const bridgedRings: readonly RingLine[] = [
  ['quinuclidin', 'N12CCC(CC1)CC2', '1 2 3 4 5 6 8 7'],
  ['isoquinuclidin', 'C12NCC(CC1)CC2', '1 2 3 4 5 6 8 7'],
  ['norborn-2-en', 'C1=CC2CCC1C2', '2 3 4 5 6 1 7'],
  ['norborn-5-en', 'C1CC2C=CC1C2', '2 3 4 5 6 1 7'],
  ['norbornadien', 'C1=CC2C=CC1C2', '2 3 4 5 6 1 7'],
  ['2,5-norbornadien', 'C1=CC2C=CC1C2', '2 3 4 5 6 1 7'],
];

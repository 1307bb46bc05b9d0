/**
 * Rings with some of their double bonds, named by `-ine` before 1979 and so to this day (1979 rules B-1.2; index names).
 * The locant before the name is that of the double bond; without it the name stands for all of them. Other rings with a
 * group of their own stand at the end: common practice, no source.
 * Each line: name without final e, SMILES, locants in SMILES order, and the mark that tells siblings apart.
 */
import type { ParentLine } from './parents.ts';

export const partlySaturatedRings: readonly ParentLine[] = [
  ['pyrrolin', 'N1=CCCC1', '1 2 3 4 5', '1-'],
  ['pyrrolin', 'N1C=CCC1', '1 2 3 4 5', '2-'],
  ['pyrrolin', 'N1CC=CC1', '1 2 3 4 5', '3-'],
  ['imidazolin', 'N1C=NCC1', '1 2 3 4 5', '2-'],
  ['imidazolin', 'N1CN=CC1', '1 2 3 4 5', '3-'],
  ['imidazolin', 'N1CNC=C1', '1 2 3 4 5', '4-'],
  ['pyrazolin', 'N1=NCCC1', '1 2 3 4 5', '1-'],
  ['pyrazolin', 'N1N=CCC1', '1 2 3 4 5', '2-'],
  ['pyrazolin', 'N1NC=CC1', '1 2 3 4 5', '3-'],
  ['oxazolin', 'O1C=NCC1', '1 2 3 4 5', '2-'],
  ['oxazolin', 'O1CN=CC1', '1 2 3 4 5', '3-'],
  ['oxazolin', 'O1CNC=C1', '1 2 3 4 5', '4-'],
  ['isoxazolin', 'O1N=CCC1', '1 2 3 4 5', '2-'],
  ['isoxazolin', 'O1NC=CC1', '1 2 3 4 5', '3-'],
  ['isoxazolin', 'O1NCC=C1', '1 2 3 4 5', '4-'],
  ['thiazolin', 'S1C=NCC1', '1 2 3 4 5', '2-'],
  ['thiazolin', 'S1CN=CC1', '1 2 3 4 5', '3-'],
  ['thiazolin', 'S1CNC=C1', '1 2 3 4 5', '4-'],
  ['norbornen', 'C1=CC2CCC1C2', '2 3 4 5 6 1 7', '2-'],
  ['norbornen', 'C1CC2C=CC1C2', '2 3 4 5 6 1 7', '5-'],
];

/** Rings whose name carries a group, so that nothing is added to its end. */
export const ringsWithGroups: readonly ParentLine[] = [
  ['phthalid', 'O=C1OCc2ccccc12', '- 1 2 3 3a 4 5 6 7 7a'],
  ['tropon', 'O=C1C=CC=CC=C1', '- 1 2 3 4 5 6 7'],
  ['tropolon', 'O=C1C(O)=CC=CC=C1', '- 1 2 - 3 4 5 6 7'],
];

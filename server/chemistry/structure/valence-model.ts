/**
 * How many bonds an atom of an element and charge usually forms. The values for neutral atoms of the organic subset
 * are those of the OpenSMILES specification, section 3.1.5; a charge moves an atom to the row of the element with as
 * many electrons (N+ bonds like C, O+ like N, B− like C), as every textbook of general chemistry has it.
 */

/** Usual total bond orders, ascending, for neutral main-group atoms by atomic number. */
const neutral: Readonly<Record<number, readonly number[]>> = {
  1: [1],
  2: [0],
  5: [3],
  6: [4],
  7: [3, 5],
  8: [2],
  9: [1],
  10: [0],
  14: [4],
  15: [3, 5],
  16: [2, 4, 6],
  17: [1, 3, 5, 7],
  18: [0],
  32: [4],
  33: [3, 5],
  34: [2, 4, 6],
  35: [1, 3, 5, 7],
  51: [3, 5],
  52: [2, 4, 6],
  53: [1, 3, 5, 7],
  54: [0, 2, 4, 6, 8],
};

/** Charged atoms, `atomic number:charge`. What is not here is not judged, but for charges beyond ±1 on B–F. */
const charged: Readonly<Record<string, readonly number[]>> = {
  '1:1': [0],
  '1:-1': [0],
  '5:-1': [4],
  '5:1': [2],
  '6:1': [3],
  '6:-1': [3],
  '6:-2': [2],
  '6:2': [2],
  '7:1': [4],
  '7:-1': [2],
  '7:-2': [1],
  '7:-3': [0],
  '8:1': [3],
  '8:-1': [1],
  '8:-2': [0],
  '9:1': [2],
  '9:-1': [0],
  // Pentacoordinate silicates and hexafluorosilicate exist beside silyl anions and cations.
  '14:1': [3],
  '14:-1': [3, 5],
  '14:-2': [6],
  '15:1': [4],
  '15:-1': [2, 4, 6],
  '16:1': [3, 5],
  '16:-1': [1, 3, 5],
  '16:-2': [0],
  '16:2': [4],
  '17:-1': [0, 2, 4],
  '17:1': [2, 4],
  '17:2': [3],
  '17:3': [4],
  '33:1': [4],
  '33:-1': [2, 4, 6],
  '34:1': [3, 5],
  '34:-1': [1, 3, 5],
  '34:-2': [0],
  '35:-1': [0, 2, 4],
  '35:1': [2, 4],
  '51:1': [4],
  '51:-1': [2, 4, 6],
  '52:1': [3, 5],
  '52:-1': [1, 3, 5],
  '52:-2': [0],
  '53:-1': [0, 2, 4],
  '53:1': [2, 4],
};

/** Total bond orders that are usual, ascending; undefined where nobody limits them (metals, unusual charges). */
export function usualValences(atomicNumber: number, charge: number): readonly number[] | undefined {
  return charge === 0 ? neutral[atomicNumber] : charged[`${atomicNumber}:${charge}`];
}

/** Valences of the organic subset, which alone receive hydrogens that are not written (OpenSMILES 3.1.5). */
export const organicValences: Readonly<Record<number, readonly number[]>> = {
  5: [3],
  6: [4],
  7: [3, 5],
  8: [2],
  9: [1],
  15: [3, 5],
  16: [2, 4, 6],
  17: [1],
  35: [1],
  53: [1],
};

/** The hydrogens that fill an atom of the organic subset up to its lowest valence not below `bonds`. */
export function impliedHydrogens(atomicNumber: number, bonds: number): number {
  const valences = organicValences[atomicNumber];
  if (valences === undefined) return 0;
  for (const valence of valences) if (valence >= bonds) return valence - bonds;
  return 0;
}

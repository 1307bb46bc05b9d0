/**
 * Skeletal replacement prefixes ("a" terms): IUPAC Recommendations 2013, P-15.4.1.1 and appendix 1; the cationic ones
 * P-73.4 and, as `azonia`, `oxonia`, `thionia`, the 1979 recommendations B-6.
 * Each line: prefix with its a, atomic number, charge where there is one. A cationic prefix means the atom with the
 * bonding number raised by one.
 */
export const replacementPrefixes: readonly (readonly [
  name: string,
  atomicNumber: number,
  charge?: number,
])[] = [
  ['oxa', 8],
  ['thia', 16],
  ['selena', 34],
  ['tellura', 52],
  ['aza', 7],
  ['phospha', 15],
  ['arsa', 33],
  ['stiba', 51],
  ['bisma', 83],
  ['sila', 14],
  ['germa', 32],
  ['stanna', 50],
  ['plumba', 82],
  ['bora', 5],
  ['mercura', 80],
  ['oxonia', 8, 1],
  ['thionia', 16, 1],
  ['azonia', 7, 1],
  ['azania', 7, 1],
  ['phosphonia', 15, 1],
  ['phosphania', 15, 1],
];

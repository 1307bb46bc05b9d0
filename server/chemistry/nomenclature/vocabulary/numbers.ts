/**
 * Numerical terms, IUPAC 2013 recommendations P-14.2: basic terms for 1 to 9, tens, hundreds, joined from the smallest
 * part upwards (`do` + `triaconta` = 32). From 1 to 4 carbon atoms alkanes have their own stems (P-21.2.1).
 */
const units = ['', 'hen', 'do', 'tri', 'tetra', 'penta', 'hexa', 'hepta', 'octa', 'nona'];
const tens = [
  '',
  'deca',
  'icosa',
  'triaconta',
  'tetraconta',
  'pentaconta',
  'hexaconta',
  'heptaconta',
  'octaconta',
  'nonaconta',
];
const hundreds = ['', 'hecta', 'dicta', 'tricta', 'tetracta'];
const alone = ['', 'mono', 'di', 'tri', 'tetra', 'penta', 'hexa', 'hepta', 'octa', 'nona', 'deca', 'undeca'];

/** The numerical term for 1 … 499, with its final `a`: 5 → `penta`, 21 → `henicosa`, 32 → `dotriaconta`. */
export function numericalTerm(value: number): string {
  if (value < alone.length) return alone[value]!;
  const one = value % 10;
  const ten = Math.floor(value / 10) % 10;
  const hundred = Math.floor(value / 100);
  // P-14.2.1.2: `icosa` loses its i after a vowel (`docosa`), not after `hen`.
  const tenTerm = ten === 2 && one > 1 ? 'cosa' : tens[ten]!;
  return (one === 1 && ten === 0 ? 'hen' : units[one]!) + tenTerm + hundreds[hundred]!;
}

/** Stem of the alkane with so many carbon atoms, without `ane`: `meth`, `hex`, `undec`. */
export function alkaneStem(carbons: number): string {
  return ['', 'meth', 'eth', 'prop', 'but'][carbons] ?? numericalTerm(carbons).replace(/a$/, '');
}

/** Further spellings of the terms still met: `eicosa` for 20 (1979 rules). */
export function numericalTermVariants(value: number): string[] {
  const term = numericalTerm(value);
  if (value === 20) return [term, 'eicosa'];
  if (value === 21) return [term, 'heneicosa'];
  if (value === 11) return [term, 'hendeca'];
  return [term];
}

/** `bis`, `tris`, `tetrakis` … (P-14.2.2), used before compound or bracketed substituents. */
export function groupTerm(value: number): string {
  return value === 2 ? 'bis' : value === 3 ? 'tris' : numericalTerm(value) + 'kis';
}

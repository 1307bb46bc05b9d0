/** Finds what was meant where the capitals of a formula are wrong: `c9h12o2`, `NAOH`. */

/** Elements of everyday formulas; only these are put in place of wrongly spelt ones. */
const everyday = [
  'Cl',
  'Br',
  'Na',
  'Li',
  'Mg',
  'Si',
  'Ca',
  'Al',
  'Cu',
  'Fe',
  'Zn',
  'Mn',
  'Ag',
  'C',
  'H',
  'N',
  'O',
  'S',
  'P',
  'F',
  'I',
  'K',
  'B',
];

/** The text with proper capitals, or undefined when its letters are not all everyday elements. */
export function correctedCapitals(text: string): string | undefined {
  if (text.length > 60 || !/^[A-Za-z0-9()[\]·.]+$/.test(text)) return undefined;
  let written = '';
  for (let at = 0; at < text.length;) {
    if (!/[A-Za-z]/.test(text[at]!)) {
      written += text[at++]!;
      continue;
    }
    const symbol = everyday.find(
      (known) => text.slice(at, at + known.length).toLowerCase() === known.toLowerCase(),
    );
    if (symbol === undefined) return undefined;
    written += symbol;
    at += symbol.length;
  }
  return written === text ? undefined : written;
}

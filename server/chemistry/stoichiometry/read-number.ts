/** Reads one number as a laboratory prints it, with the interval that its last digit stands for. */
import { problemAt, type Read, type TextRange } from '../text.ts';

export interface LabNumber {
  readonly value: number;
  /** Half a unit of the last digit as written. */
  readonly halfUnit: number;
  /** Digits after the point, of the part before any power of ten. */
  readonly decimals: number;
  readonly range: TextRange;
}

const sign = '[-+−–‒]?';
/** Thin and non-breaking spaces group digits; a full space does not, because it separates numbers. */
const digits = String.raw`\d+(?:[\u00a0\u2009\u202f]\d{3})*`;
const thousands = String.raw`\d{1,3}(?:,\d{3})+(?=\.\d)`;
const mantissa = String.raw`(?:(?:${thousands}|${digits})(?:\.\d*)?|\.\d+)`;
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const power = String.raw`(?:[eE]([-+−]?\d{1,3})|[ \u00a0\u2009\u202f]*[×x·*][ \u00a0\u2009\u202f]*10(?:\^\(?([-+−–]?\d{1,3})\)?|([⁻⁺]?[${superscripts}]{1,3})))`;
const pattern = new RegExp(`(${sign})[ \\u00a0\\u2009\\u202f]?(${mantissa})(?:${power})?`, 'y');

/** Reads the number that begins at `start`; what follows it is left alone. */
export function readNumberAt(text: string, start: number): Read<LabNumber> {
  pattern.lastIndex = start;
  const found = pattern.exec(text);
  if (found === null) return problemAt(start, text.length, 'A number is expected here.');
  const [whole, signText, mantissaText, plain, caret, raised] = found;
  const end = start + whole.length;
  const comma = /^,\d/.exec(text.slice(end, end + 2));
  if (comma !== null) {
    return problemAt(
      start,
      end + /^[,\d]*/.exec(text.slice(end))![0].length,
      'A comma stands where a decimal point belongs.',
    );
  }
  const plainDigits = mantissaText!.replace(/[^\d.]/g, '');
  const point = plainDigits.indexOf('.');
  const decimals = point === -1 ? 0 : plainDigits.length - point - 1;
  const exponent = exponentOf(plain ?? caret ?? raised ?? '0');
  const negative = signText !== '' && signText !== '+';
  // Through the text, so that 1.2 × 10^-3 is the number nearest to 0.0012.
  const value = Number(`${negative ? '-' : ''}${plainDigits}e${exponent}`);
  if (!Number.isFinite(value))
    return problemAt(start, end, 'This number is too large to be of a laboratory.');
  const halfUnit = Number(`5e${exponent - decimals - 1}`);
  return { value: { value, halfUnit, decimals, range: { start, end } } };
}

function exponentOf(text: string): number {
  let plain = '';
  for (const character of text) {
    const raised = superscripts.indexOf(character);
    if (raised !== -1) plain += String(raised);
    else if ('−–⁻-'.includes(character)) plain += '-';
    else if (character !== '⁺' && character !== '+') plain += character;
  }
  return Number(plain);
}

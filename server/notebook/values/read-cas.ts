/** CAS Registry Number: up to seven digits, two digits, one check digit. Whether that digit fits is a check. */
import { problemAt, type Read } from '../../chemistry/text.ts';

const pattern = /^\[?\s*(\d{2,7})\s*[-‐‑–−]\s*(\d{2})\s*[-‐‑–−]\s*(\d)\s*\]?$/;

/** The number with plain hyphens, `100-52-7`. Brackets round it are left aside. */
export function readCas(text: string): Read<string> {
  const found = pattern.exec(text);
  if (found === null) {
    return problemAt(
      0,
      text.length,
      `“${shortened(text)}” has not the form of a CAS Registry Number: two to seven digits, two digits and one check ` +
        'digit, with hyphens between them, such as 100-52-7.',
    );
  }
  const [, first, second, check] = found;
  return { value: `${first!}-${second!}-${check!}` };
}

/** A text short enough to stand in a message. */
export function shortened(text: string): string {
  return text.length <= 40 ? text : `${text.slice(0, 39)}…`;
}

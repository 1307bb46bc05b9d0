/**
 * The form of an InChIKey: 14 letters, 8 letters with a flag and a version letter, one letter (Heller et al.,
 * J. Cheminform. 2015, 7, 23). Whether it is the key of the compound is a check.
 */
import { problemAt, type Read } from '../../chemistry/text.ts';

const form = /^[A-Z]{14}-[A-Z]{8}[SN][A-Z]-[A-Z]$/;
const blockLengths = [14, 10, 1];

/** The key alone; `InChIKey=` before it is left aside. */
export function readInchiKey(text: string): Read<string> {
  const start = /^InChIKey=/i.exec(text)?.[0].length ?? 0;
  const key = text.slice(start);
  if (form.test(key)) return { value: key };
  const strange = key.search(/[^A-Z-]/);
  if (strange !== -1) {
    const lower = /^[A-Za-z-]+$/.test(key) && form.test(key.toUpperCase());
    return problemAt(
      start + strange,
      lower ? text.length : start + strange + (key.codePointAt(strange)! > 0xffff ? 2 : 1),
      'An InChIKey holds only capital letters and two hyphens, such as UHOVQNZJYSORNB-UHFFFAOYSA-N.',
      lower
        ? [
            {
              title: 'Write it in capitals',
              edits: [{ range: { start, end: text.length }, newText: key.toUpperCase() }],
              safe: true,
            },
          ]
        : undefined,
    );
  }
  let at = start;
  const blocks = key.split('-');
  for (const [index, length] of blockLengths.entries()) {
    const found = blocks[index]?.length ?? 0;
    if (found !== length) {
      return problemAt(
        Math.min(at, text.length),
        Math.min(at + found, text.length),
        `The ${['first', 'second', 'third'][index]!} part of an InChIKey has ${length} letters, this one ${found}. ` +
          'Letters were lost or added in copying; copy it again.',
      );
    }
    at += length + 1;
  }
  if (blocks.length > blockLengths.length) {
    return problemAt(at - 1, text.length, 'An InChIKey ends after its third part. Take out what follows.');
  }
  return problemAt(
    start + 23,
    start + 24,
    `The ninth letter of the second part is S (standard) or N, not ${key[23]!}. Copy the InChIKey again.`,
  );
}

/**
 * Hydrides of elements other than carbon: one atom (P-21.1.1), chains of like atoms (P-21.2.2), and alternating chains and
 * rings (`trisiloxane`, P-21.2.3.1; `cyclotrisilazane`, P-22.2.5). Source: IUPAC Recommendations 2013.
 */
import { numericalTerm } from './numbers.ts';
import type { ParentLine } from './parents.ts';

const single: readonly ParentLine[] = [
  ['aluman', '[AlH3]', 'Al'],
  ['gallan', '[GaH3]', 'Ga'],
  ['indigan', '[InH3]', 'In'],
  ['thallan', '[TlH3]', 'Tl'],
  ['bismuthan', '[BiH3]', 'Bi'],
  ['tellan', '[TeH2]', 'Te'],
  ['iodan', 'I', 'I'],
  ['broman', 'Br', 'Br'],
  ['chloran', 'Cl', 'Cl'],
  ['fluoran', 'F', 'F'],
];

/** Stem, atom in a chain, atom at its ends. */
const chained: readonly (readonly [stem: string, inside: string, end: string])[] = [
  ['silan', '[SiH2]', '[SiH3]'],
  ['german', '[GeH2]', '[GeH3]'],
  ['stannan', '[SnH2]', '[SnH3]'],
  ['phosphan', 'P', 'P'],
  ['arsan', '[AsH]', '[AsH2]'],
  ['sulfan', 'S', 'S'],
  ['selan', '[Se]', '[SeH]'],
];
const longest = 10;

/** Stem with both elements, atom between, atom in a chain, atom at its ends. */
const alternating: readonly (readonly [stem: string, between: string, inside: string, end: string])[] = [
  ['siloxan', 'O', '[SiH2]', '[SiH3]'],
  ['silazan', 'N', '[SiH2]', '[SiH3]'],
  ['silathian', 'S', '[SiH2]', '[SiH3]'],
  ['germoxan', 'O', '[GeH2]', '[GeH3]'],
  ['stannoxan', 'O', '[SnH2]', '[SnH3]'],
];

const numbered = (count: number) => Array.from({ length: count }, (_, index) => String(index + 1)).join(' ');

function* chains(): Generator<ParentLine> {
  for (let count = 2; count <= longest; count++) {
    const term = numericalTerm(count);
    for (const [stem, inside, end] of chained)
      yield [`${term}${stem}`, `${end}${inside.repeat(count - 2)}${end}`, numbered(count)];
    for (const [stem, between, inside, end] of alternating) {
      const middle = `${between}${inside}`.repeat(count - 2);
      yield [`${term}${stem}`, `${end}${middle}${between}${end}`, numbered(2 * count - 1)];
      if (count < 3) continue;
      const rest = `${between}${inside}`.repeat(count - 1);
      yield [`cyclo${term}${stem}`, `${between}1${inside}${rest}1`, numbered(2 * count)];
    }
  }
  yield ['triazan', 'NNN', '1 2 3'];
  yield ['tetraazan', 'NNNN', '1 2 3 4'];
}

/** Every hydride as a parent that takes endings. */
export const hydrides: readonly ParentLine[] = [...single, ...chains()];

/** What is made from acids with retained names (P-65.1.1, P-66) and from amino acids (P-103.2). */
import type { Ending, SuffixEntry } from '../tree.ts';
import { acylWithYl } from '../vocabulary/acids.ts';
import { bare, type Group } from './group.ts';
import type { AminoAcidSuffix, Word } from './lexicon.ts';

const atCarbon = (name: string, group: string, more: Partial<SuffixEntry> = {}): SuffixEntry => ({
  name,
  kind: 'at',
  group,
  ...more,
});
const acidEndings: readonly (readonly [text: string, suffix: SuffixEntry])[] = [
  ['ic acid', atCarbon('oic acid', '=O O', { locants: '- O' })],
  ['oic acid', atCarbon('oic acid', '=O O', { locants: '- O' })],
  ['ate', atCarbon('oate', '=O [O-]', { anion: true })],
  ['oate', atCarbon('oate', '=O [O-]', { anion: true })],
  ['ic anhydride', atCarbon('anhydride', '=O [O-]', { anion: true })],
  ['oic anhydride', atCarbon('anhydride', '=O [O-]', { anion: true })],
  ['oyl', atCarbon('oyl', '=O', { radical: true })],
  ['yl', atCarbon('oyl', '=O', { radical: true })],
];
const otherEndings: readonly (readonly [text: string, suffix: SuffixEntry])[] = [
  ['amide', atCarbon('amide', '=O N', { locants: '- N' })],
  ['hydroxamic acid', atCarbon('hydroxamic acid', '=O NO', { locants: '- N O' })],
  ['ohydroxamic acid', atCarbon('hydroxamic acid', '=O NO', { locants: '- N O' })],
  ['onitrile', atCarbon('nitrile', '#N')],
  ['aldehyde', atCarbon('al', '=O')],
  ['ohydrazide', atCarbon('hydrazide', '=O NN', { locants: "- N N'" })],
  ['imidate', atCarbon('imidate', '=N [O-]', { anion: true, locants: 'N -' })],
  ['aldoxime', atCarbon('oxime', '=NO')],
  ['amidine', atCarbon('imidamide', '=N N', { locants: "N' N" })],
];

const peroxyEndings: readonly (readonly [text: string, suffix: SuffixEntry])[] = [
  ['ic acid', atCarbon('peroxoic acid', '=O OO')],
  ['ate', atCarbon('peroxoate', '=O O[O-]', { anion: true })],
];
const endingsByForm = { acid: acidEndings, other: otherEndings, peroxy: peroxyEndings };

/** Everything made from an acid with a retained name. */
export function acidForms(
  word: Extract<Word, { kind: 'acid' }>,
  lower: string,
  start: number,
  end: number,
): Group[] {
  const found: Group[] = [];
  const places = word.line[4].split(' ');
  for (const [ending, suffix] of endingsByForm[word.form]) {
    if (!lower.startsWith(ending, end)) continue;
    if (ending === 'yl' && !acylWithYl.has(word.line[0])) continue;
    const last = end + ending.length;
    const one: Ending = {
      suffix,
      count: places.length,
      locants: places,
      at: end,
      range: { start: end, end: last },
    };
    const role = suffix.radical === true ? 'radical' : 'parent';
    found.push({ unit: { ...bare(word.skeletons(), start, last), endings: [one] }, role, end: last });
  }
  return found;
}

const aminoAcidSuffixes: Readonly<Record<AminoAcidSuffix, SuffixEntry>> = {
  acid: atCarbon('oic acid', '=O O', { locants: '- -' }),
  anion: atCarbon('oate', '=O [O-]', { anion: true }),
  amide: atCarbon('amide', '=O N'),
  alcohol: atCarbon('ol', 'O'),
  aldehyde: atCarbon('al', '=O'),
  acyl: atCarbon('oyl', '=O', { radical: true }),
};

/** An amino acid, or its group, as its word stands. */
export function aminoAcidForm(
  word: Extract<Word, { kind: 'amino acid' }>,
  start: number,
  end: number,
): Group {
  const locants = word.line[4].split(' ');
  const suffix = aminoAcidSuffixes[word.suffix];
  const ending: Ending = { suffix, count: locants.length, locants, at: end, range: { start, end } };
  const unit = { ...bare(word.skeletons(), start, end), endings: [ending], residue: true };
  return { unit, role: word.suffix === 'acyl' ? 'radical' : 'parent', end };
}

/** Corrections that write the arrangement of one open place into a SMILES, changing nothing else in its text. */
import { canonicalSmiles } from '../../chemistry/structure/canonical-smiles.ts';
import { readSmiles } from '../../chemistry/structure/read-smiles.ts';
import type { StereoCandidate } from '../../chemistry/structure/stereo-candidates.ts';
import type { StereoisomerList } from '../../chemistry/structure/stereoisomers.ts';
import { writeSmiles } from '../../chemistry/structure/write-smiles.ts';
import type { Fix } from '../../chemistry/text.ts';
import type { EntryValue } from '../../notebook/model.ts';
import { lettersAt } from './stereo-places.ts';
import { inDocument, replacement } from './values.ts';

/** More stereoisomers than this are not offered one by one. */
const mostOffered = 4;

/** One for each isomer: a mark at the one open centre where that is enough, else the SMILES written anew. */
export function stereoFixes(
  smiles: EntryValue<unknown>,
  list: StereoisomerList,
  open: readonly StereoCandidate[],
): Fix[] {
  const marks = marksAtCentre(smiles, list, open);
  if (marks.length > 0) return marks;
  if (list.isomers.length > mostOffered) return [];
  return list.isomers.map((isomer) => {
    const written = writeSmiles(isomer);
    return replacement(smiles, written, `Write ${written}: the ${lettersAt(isomer, open)} isomer`);
  });
}

/** For one open centre written as a bare carbon: `[C@H]` and `[C@@H]`, each with the descriptor that it gives. */
function marksAtCentre(
  smiles: EntryValue<unknown>,
  { molecule, isomers }: StereoisomerList,
  open: readonly StereoCandidate[],
): Fix[] {
  const [place, ...others] = open;
  if (place?.kind !== 'tetrahedral' || others.length > 0) return [];
  const { range, hydrogens } = molecule.atoms[place.centre]!;
  const text = smiles.text.text;
  if (text.slice(range.start, range.end) !== 'C') return [];
  return ['@', '@@'].flatMap((mark): Fix[] => {
    const atom = `[C${mark}${hydrogens === 1 ? 'H' : ''}]`;
    const written = readSmiles(`${text.slice(0, range.start)}${atom}${text.slice(range.end)}`).value;
    if (written === undefined) return [];
    const key = canonicalSmiles(written);
    const isomer = isomers.find((each) => canonicalSmiles(each) === key);
    if (isomer === undefined) return [];
    return [
      {
        title: `Write ${atom}: the ${lettersAt(isomer, open)} isomer`,
        safe: false,
        edits: [{ range: inDocument(smiles, range), newText: atom }],
      },
    ];
  });
}

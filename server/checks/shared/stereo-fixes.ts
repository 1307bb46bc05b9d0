/** Corrections that write the arrangement of one open place into a SMILES, changing nothing else in its text. */
import { canonicalSmiles } from '../../chemistry/structure/canonical-smiles.ts';
import { readSmiles } from '../../chemistry/structure/read-smiles.ts';
import type { StereoCandidate } from '../../chemistry/structure/stereo-candidates.ts';
import type { StereoisomerList } from '../../chemistry/structure/stereoisomers.ts';
import type { Fix } from '../../chemistry/text.ts';
import type { EntryValue } from '../../notebook/model.ts';
import { lettersAt } from './stereo-places.ts';
import { inDocument } from './values.ts';

/** For one open centre written as a bare carbon: `[C@H]` and `[C@@H]`, each with the descriptor that it gives. */
export function stereoFixes(
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

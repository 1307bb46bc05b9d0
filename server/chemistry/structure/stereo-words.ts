/** A stereoisomer in the words of a name: `2R,3S`, and whether it is meso. */
import { cipDescriptors, type DescriptorLetter } from './cip/descriptors.ts';
import { atomsOfPlace, type Molecule } from './molecule.ts';
import { isOwnMirrorImage } from './stereo-mirror.ts';

export interface StereoWords {
  /** As inside the parentheses in front of a name (P-91.3), by rising locants; empty when nothing has a letter. */
  readonly descriptors: string;
  /** Chirality centres are stated, and the whole is its own mirror image (P-93.5.1.2). */
  readonly meso: boolean;
}

const words: Partial<Record<DescriptorLetter, string>> = { e: 'seqTrans', z: 'seqCis' };

/**
 * `locantOf` gives the locant of an atom; undefined for an atom without one, whose descriptor then stands alone. A double
 * bond or an axis takes the lower locant of its ends.
 */
export function describeStereo(
  molecule: Molecule,
  locantOf: (atom: number) => string | undefined,
): StereoWords {
  const descriptors = cipDescriptors(molecule);
  const letters = new Set(descriptors.map(({ letter }) => letter));
  const described = descriptors.flatMap(({ element, letter }) => {
    if (letter === undefined) return [];
    const [locant = ''] = atomsOfPlace(element)
      .map((atom) => locantOf(atom) ?? '')
      .sort(byLocant);
    return [{ locant, text: `${locant}${words[letter] ?? letter}` }];
  });
  described.sort((first, second) => byLocant(first.locant, second.locant));
  return {
    descriptors: described.map(({ text }) => text).join(','),
    // Without opposite centres it is achiral, not meso: cis-1,4-dimethylcyclohexane.
    meso: letters.has('R') && letters.has('S') && isOwnMirrorImage(molecule),
  };
}

/** Numbers before letters, 3 before 3a before 10, plain before primed. */
function byLocant(first: string, second: string): number {
  const [one, other] = [parts(first), parts(second)];
  return (
    one.primes - other.primes ||
    (one.number === other.number ? 0 : one.number - other.number) ||
    (one.letter < other.letter ? -1 : one.letter > other.letter ? 1 : 0)
  );
}

function parts(locant: string): { number: number; letter: string; primes: number } {
  const [, digits = '', letter = '', primes = ''] = /^(\d*)([^'′]*)(['′]*)/.exec(locant) ?? [];
  return { number: digits === '' ? Infinity : Number(digits), letter, primes: primes.length };
}

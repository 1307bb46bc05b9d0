/** How many isomers an entry says it holds: one of five words, a mixture with its ratio where it is known. */
import { closestMatch } from 'leven';
import { problemAt, type Read } from '../../chemistry/text.ts';
import type { IsomerStatement } from '../model.ts';
import { shortened } from './read-cas.ts';

const words: Readonly<Record<string, IsomerStatement['kind']>> = {
  single: 'single',
  pure: 'single',
  racemate: 'racemate',
  racemic: 'racemate',
  rac: 'racemate',
  'rac.': 'racemate',
  '(±)': 'racemate',
  '±': 'racemate',
  relative: 'relative',
  rel: 'relative',
  mixture: 'mixture',
  unknown: 'unknown',
  undetermined: 'unknown',
};
const shown = ['single', 'racemate', 'relative', 'mixture', 'unknown'] as const;
const ratio = /\d+(?:\.\d+)?(?:\s*[:/]\s*\d+(?:\.\d+)?)+/;

export function readIsomers(text: string): Read<IsomerStatement> {
  const word = /^\S+/.exec(text)?.[0] ?? '';
  const bare = word.replace(/[,;:]$/, '').toLowerCase();
  const kind = Object.hasOwn(words, bare) ? words[bare] : undefined;
  if (kind === undefined) {
    const nearest = bare.length <= 20 ? closestMatch(bare, shown, { maxDistance: 3 }) : undefined;
    return problemAt(
      0,
      word.length,
      `“${shortened(word)}” does not say which isomers this entry holds. Write single, racemate, relative (known ` +
        'relative configuration), mixture (with a ratio such as 3:1 where it is known) or unknown.',
      nearest === undefined
        ? undefined
        : [
            {
              title: `Change to ${nearest}`,
              edits: [{ range: { start: 0, end: word.length }, newText: nearest }],
              safe: false,
            },
          ],
    );
  }
  const rest = text.slice(word.length);
  const found = kind === 'mixture' ? ratio.exec(rest)?.[0] : undefined;
  return { value: found === undefined ? { kind } : { kind, ratio: found } };
}

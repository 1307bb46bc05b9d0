/** Words of grade round a name (`dry DMF`, `absolute ethanol`, `Zn dust`): they do not change the compound. */
import { gradeEndings, gradeWords } from '../vocabulary/mixture-words.ts';

const longestFirst = (words: readonly string[]) => [...words].sort((a, b) => b.length - a.length);
const beginnings = longestFirst(gradeWords);
const endings = longestFirst([...gradeEndings, ...gradeWords]);

/** The name without one word of grade, or undefined where it has none. */
export function withoutGrade(text: string, lower: string): string | undefined {
  for (const word of beginnings) {
    if (!lower.startsWith(`${word} `) && !lower.startsWith(`${word}, `)) continue;
    return text.slice(word.length).replace(/^,? /, '');
  }
  // `(10 mol%)`, `(230–400 mesh)`, a trade mark: how much, how fine, whose.
  const aside = /(?: \(\d{1,3}(?:\.\d{1,2})? ?mol ?%\)| \(\d{2,3} ?- ?\d{2,3} mesh\)|[®™])$/.exec(text);
  if (aside) return text.slice(0, aside.index);
  for (const word of gradeWords) if (lower.endsWith(` (${word})`)) return text.slice(0, -word.length - 3);
  for (const word of endings)
    if (lower.endsWith(` ${word}`)) return text.slice(0, -word.length - 1).replace(/,$/, '');
  return undefined;
}

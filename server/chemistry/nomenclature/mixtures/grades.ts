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
  for (const word of endings)
    if (lower.endsWith(` ${word}`)) return text.slice(0, -word.length - 1).replace(/,$/, '');
  return undefined;
}

/** Readers that remember what they have read, and that never throw. */
import { LRUCache } from 'lru-cache';

/** Names and structures recur: the same solvents and reagents in every entry, the same text at every keystroke. */
const mostRemembered = 5000;

/** Longer texts are rare, dear to keep and never the same twice. */
const longestRemembered = 2000;

/**
 * `broken` makes an answer of a message: readers are not meant to throw, but should one do so all the same, it must
 * not take the other entries with it.
 */
export function remembering<T extends object>(
  read: (text: string) => T,
  broken: (text: string, message: string) => T,
): (text: string) => T {
  const known = new LRUCache<string, T>({ max: mostRemembered });
  const safely = (text: string) => {
    try {
      return read(text);
    } catch (error) {
      const reason = error instanceof Error ? error.message : String(error);
      return broken(
        text,
        `The program broke down on this text (${reason}) and says nothing of it; please report it.`,
      );
    }
  };
  return (text) => {
    if (text.length > longestRemembered) return safely(text);
    let value = known.get(text);
    if (value === undefined) {
      value = safely(text);
      known.set(text, value);
    }
    return value;
  };
}

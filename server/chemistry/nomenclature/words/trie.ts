/** Words in a tree of their letters, so that every word that begins at a place is found in a single walk. */
export interface Trie<T> {
  readonly next: Map<string, Trie<T>>;
  values: T[];
}
export const emptyTrie = <T>(): Trie<T> => ({ next: new Map(), values: [] });

/** Puts a word into the tree; a word can have several values. */
export function add<T>(trie: Trie<T>, word: string, value: T): void {
  let node = trie;
  for (const character of word) {
    let next = node.next.get(character);
    if (!next) node.next.set(character, (next = emptyTrie()));
    node = next;
  }
  node.values.push(value);
}

/** Every value whose word begins at the offset, the longest word last. */
export function wordsAt<T>(trie: Trie<T>, text: string, offset: number): { value: T; end: number }[] {
  const found: { value: T; end: number }[] = [];
  let node: Trie<T> | undefined = trie;
  for (let at = offset; node; at++) {
    for (const value of node.values) found.push({ value, end: at });
    node = at < text.length ? node.next.get(text[at]!) : undefined;
  }
  return found;
}

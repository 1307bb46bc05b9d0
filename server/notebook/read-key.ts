/** Which key of the block language a chemist's key stands for. */
import leven from 'leven';
import { compoundKeyAliases, keysWithConditions, reactionKeyAliases } from './key-aliases.ts';
import { compoundKeys, reactionKeys, type FieldKey } from './keys.ts';
import type { BlockKind } from './model.ts';

/** Case, white space, full stops, hyphens and the position of small digits make no difference. */
export function normalizedKey(keyText: string): string {
  return compatible(keyText)
    .toLowerCase()
    .replace(/[\s.\-‐‑–_]/g, '');
}

/** Compatibility forms are costly to look for, and plain text has none. */
function compatible(text: string): string {
  return /^[ -~]*$/.test(text) ? text : text.normalize('NFKC');
}

function spellings(
  keys: readonly FieldKey[],
  aliases: Readonly<Partial<Record<FieldKey, readonly string[]>>>,
): ReadonlyMap<string, FieldKey> {
  const known = new Map<string, FieldKey>();
  for (const key of keys) {
    for (const alias of aliases[key] ?? []) known.set(alias, key);
  }
  // As written in the list of keys it is found without normalizing.
  for (const key of keys) known.set(normalizedKey(key), key).set(key, key);
  return known;
}

const spellingsOf: Readonly<Record<BlockKind, ReadonlyMap<string, FieldKey>>> = {
  compound: spellings(compoundKeys, compoundKeyAliases),
  reaction: spellings(reactionKeys, reactionKeyAliases),
};

/** `[α]D20`, `[α]20D`, `n20D` with or without `°C`: the temperature stands in the key. */
const rotationKey = /^\[[αa]\](?:\d{2}(?:°?c)?)?d?(?:\d{2}(?:°?c)?)?$/;
const refractionKey = /^n(?:\d{2}d|d\d{2})(?:°?c)?$/;

/** The key, or undefined when nobody knows it. */
export function readKey(kind: BlockKind, keyText: string): FieldKey | undefined {
  // A key is a word or two; only long prose gets here otherwise.
  if (keyText.length > 80) return undefined;
  const asListed = spellingsOf[kind].get(keyText);
  if (asListed !== undefined) return asListed;
  const normalized = normalizedKey(keyText);
  const known = spellingsOf[kind].get(normalized);
  if (known !== undefined) return known;
  if (kind === 'compound' && rotationKey.test(normalized.replace(/[_^]/g, ''))) return 'rotation';
  if (kind === 'compound' && refractionKey.test(normalized.replace(/[_^]/g, ''))) return 'nD';
  const open = normalized.indexOf('(');
  if (open <= 0 || !normalized.endsWith(')')) return undefined;
  const before = spellingsOf[kind].get(normalized.slice(0, open));
  return before !== undefined && keysWithConditions.has(before) ? before : undefined;
}

/** Statements that papers print without a colon after their name. */
const printedWithoutColon: ReadonlySet<FieldKey> = new Set([
  ...keysWithConditions,
  'formula',
  'SMILES',
  'InChI',
  'InChIKey',
  'CAS RN',
  'molar mass',
  'exact mass',
]);
const mostWords = 3;

/** The words at the beginning of a text that name such a statement, as written: `1H NMR`, `Anal.`. */
export function leadingKey(kind: BlockKind, text: string): string | undefined {
  const words =
    /^(?:\S{1,20}\s+){1,3}/
      .exec(text.slice(0, 80))?.[0]
      .trimEnd()
      .split(/(?<=\S)(?=\s)/) ?? [];
  for (let count = Math.min(words.length, mostWords); count > 0; count--) {
    const written = words.slice(0, count).join('');
    // The conditions of the measurement belong to the value.
    const key = written.includes('(') ? undefined : readKey(kind, written);
    // One letter can begin any sentence.
    if (key !== undefined && printedWithoutColon.has(key) && normalizedKey(written).length > 1)
      return written;
  }
  return undefined;
}

/** The known key that is spelt most like the text, when one is near enough to be meant. */
export function nearestKey(kind: BlockKind, keyText: string): FieldKey | undefined {
  const normalized = normalizedKey(keyText).slice(0, 40);
  let best: FieldKey | undefined;
  let bestDistance = Math.max(1, Math.min(3, Math.floor(normalized.length / 3))) + 1;
  for (const [spelling, key] of spellingsOf[kind]) {
    // Short aliases are near to anything.
    if (spelling.length < 3 && normalizedKey(key) !== spelling) continue;
    const distance = leven(normalized, spelling, { maxDistance: bestDistance });
    if (distance < bestDistance) {
      best = key;
      bestDistance = distance;
    }
  }
  return best;
}

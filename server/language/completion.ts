/** Keys at the start of a line of a block. */
import { CompletionItemKind, MarkupKind, type CompletionItem } from 'vscode-languageserver';
import { compoundKeys, reactionKeys, type FieldKey } from '../notebook/keys.ts';
import { blockAt, toText } from '../workspace/page.ts';
import { toProtocolRange } from './convert.ts';
import type { OpenPage } from './documents.ts';
import { compoundKeyWords, reactionKeyWords } from './key-words.ts';

/** May stand in a block any number of times. */
const repeatable: readonly FieldKey[] = ['allow', 'notes'];

export function completions(open: OpenPage, offset: number): CompletionItem[] {
  const { document, page } = open;
  const found = blockAt(page, offset);
  if (found === undefined) return [];
  const { block } = found.block.read.model.entry;
  const line = block.lines.find(
    ({ offset: start, text }) => start <= found.address && found.address <= start + text.length,
  );
  if (line === undefined) return [];
  const typed = line.text.slice(0, found.address - line.offset);
  // An indented line belongs to the value above it; after the colon stands a value.
  if (!/^[^\s:]?[^:]*$/.test(typed) || /^\s/.test(line.text)) return [];

  const rest = /^[^:]*:?/.exec(line.text)?.[0] ?? '';
  const replaced = toText(page, { start: line.offset, end: line.offset + rest.length });
  if (replaced === undefined) return [];
  const range = toProtocolRange(document, replaced);
  const used = new Set(
    found.block.read.model.entry.fields
      .filter((field) => field.range.start > line.offset + line.text.length || field.range.end < line.offset)
      .map((field) => field.key),
  );
  const keys: readonly FieldKey[] = block.kind === 'compound' ? compoundKeys : reactionKeys;
  const words: Partial<Record<FieldKey, string>> =
    block.kind === 'compound' ? compoundKeyWords : reactionKeyWords;
  return keys
    .filter((key) => !used.has(key) || repeatable.includes(key))
    .map((key, index) => ({
      label: key,
      kind: CompletionItemKind.Field,
      // In the order in which an entry is usually written.
      sortText: String(index).padStart(3, '0'),
      filterText: key,
      documentation: { kind: MarkupKind.Markdown, value: words[key] ?? '' },
      textEdit: { range, newText: `${key}: ` },
    }));
}

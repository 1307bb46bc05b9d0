/** The blocks of a document as an outline: label and name, or label and scheme. */
import { SymbolKind, type DocumentSymbol } from 'vscode-languageserver';
import type { EntryModel } from '../checks/model.ts';
import { toText } from '../workspace/page.ts';
import { toProtocolRange } from './convert.ts';
import type { OpenPage } from './documents.ts';

export function documentSymbols({ document, page }: OpenPage): DocumentSymbol[] {
  return page.blocks.map(({ read, range }) => {
    const { label, title } = namesOf(read.model);
    const kindRange = toText(page, read.model.entry.block.kindRange) ?? range;
    return {
      name: label ?? title ?? read.model.kind,
      ...(label !== undefined && title !== undefined ? { detail: title } : {}),
      kind: read.model.kind === 'compound' ? SymbolKind.Object : SymbolKind.Function,
      range: toProtocolRange(document, range),
      selectionRange: toProtocolRange(document, kindRange),
    };
  });
}

/** What people call the entry: its label, and its name, structure or scheme. Empty texts count as none. */
function namesOf({ entry }: EntryModel): { label: string | undefined; title: string | undefined } {
  const some = (text: string | undefined) => (text === undefined || text === '' ? undefined : text);
  const title =
    entry.kind === 'compound'
      ? (some(entry.name?.text.text) ?? some(entry.formula?.text.text) ?? some(entry.smiles?.text.text))
      : some(entry.scheme?.value.text);
  return { label: some(entry.label?.text.text), title };
}

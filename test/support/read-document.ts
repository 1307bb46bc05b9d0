/** A page read with the real readers, nothing remembered between two calls. */
import { readSmiles } from '../../server/chemistry/structure/read-smiles.ts';
import { readDocument as readWith } from '../../server/notebook/entries.ts';
import type { NotebookDocument } from '../../server/notebook/model.ts';

const readName = (text: string) => ({ kind: 'mixture' as const, message: text, components: [] });
export function readDocument(text: string): NotebookDocument {
  return readWith(text, { readSmiles, readName });
}

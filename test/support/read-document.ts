/** A page read with the real readers, nothing remembered between two calls. */
import { readName } from '../../server/chemistry/nomenclature/read-name.ts';
import { readSmiles } from '../../server/chemistry/structure/read-smiles.ts';
import { readDocument as readWith } from '../../server/notebook/entries.ts';
import type { NotebookDocument } from '../../server/notebook/model.ts';

export function readDocument(text: string): NotebookDocument {
  return readWith(text, { readSmiles, readName });
}

/** The one name reader of the process: its vocabulary is indexed when the first name comes. */
import { createNameReader, type NameReader } from '../chemistry/nomenclature/read-name.ts';
import type { NameReading } from '../chemistry/nomenclature/reading.ts';

let reader: NameReader | undefined;

export function readName(text: string): NameReading {
  reader ??= createNameReader();
  return reader.readName(text);
}

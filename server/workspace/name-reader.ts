/** The one name reader of the process: its vocabulary is indexed when the first name comes. */
import { createNameReader, type NameReader } from '../chemistry/nomenclature/read-name.ts';
import type { NameReading } from '../chemistry/nomenclature/reading.ts';
import { remembering } from './remembering.ts';

let reader: NameReader | undefined;

/** Everything that a name can mean; any string is valid input. */
export const readName = remembering<NameReading>(
  (text) => (reader ??= createNameReader()).readName(text),
  (text, message) => ({
    kind: 'unknown',
    stoppedAt: 0,
    range: { start: 0, end: text.length },
    message,
    suggestions: [],
  }),
);

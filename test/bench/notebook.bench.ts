/** Markdown to blocks to fields, and names, in bulk. */
import { readName } from '../../server/chemistry/nomenclature/read-name.ts';
import { defaultReaders } from '../../server/notebook/default-readers.ts';
import { readDocument } from '../../server/notebook/entries.ts';
import { readFields } from '../../server/notebook/fields.ts';
import { findBlocks } from '../../server/notebook/markdown.ts';
import { generatedNotebook } from '../support/generated-notebook.ts';
import { show, timed } from './figures.ts';

const text = generatedNotebook(300);
const megabytes = Buffer.byteLength(text) / 1e6;
console.log(`${text.split('\n').length} lines, 300 blocks, ${megabytes.toFixed(2)} MB`);
const rate = (median: number) => `${((megabytes * 1000) / median).toFixed(0)} MB/s`;

const blocks = timed(40, () => findBlocks(text));
show('Markdown and blocks', blocks, 'ms', rate(blocks.median));
const fields = timed(40, () => findBlocks(text).forEach(readFields));
show('Markdown, blocks and fields', fields, 'ms', rate(fields.median));
const entries = timed(5, () => readDocument(text, defaultReaders));
show('everything read, nothing remembered', entries, 'ms', rate(entries.median));

const names = [
  'ethyl acetate',
  '1-(4-methoxyphenyl)ethan-1-ol',
  '2-methylpropan-2-ol',
  '4-chloro-2-methylaniline',
  'N,N-dimethylformamide',
  'propan-2-yl 3-phenylprop-2-enoate',
  'cyclohexanone',
  '3-(4-hydroxy-3-methoxyphenyl)propanoic acid',
];
const reading = timed(200, () => names.forEach((name) => readName(name)));
show('a name', { ...reading, median: reading.median / names.length, p95: reading.p95 / names.length }, 'ms');

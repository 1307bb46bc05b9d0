/** From blocks to entries: each field given to the reader of its key, each value with its exact place. */
import type { Composition } from '../chemistry/composition/composition.ts';
import { readFormula } from '../chemistry/composition/read-formula.ts';
import type { NameReading } from '../chemistry/nomenclature/reading.ts';
import type { Quantity } from '../chemistry/stoichiometry/quantity.ts';
import { readQuantity, type QuantityOptions } from '../chemistry/stoichiometry/read-quantity.ts';
import type { Read } from '../chemistry/text.ts';
import { unknownKeyProblem } from './field-problems.ts';
import { readFields } from './fields.ts';
import { repeatableKeys, type FieldKey } from './keys.ts';
import { JoinedText, trimmedSlice } from './mapped-text.ts';
import { findBlocks } from './markdown.ts';
import type {
  AllowStatement,
  Block,
  CompoundEntry,
  Entry,
  EntryProblem,
  EntryValue,
  Field,
  MappedText,
  NotebookDocument,
  ReactionEntry,
  ValueReaders,
} from './model.ts';
import { decimalCommaProblems, findDecimalCommas } from './values/decimal-comma.ts';
import { reactionItems } from './values/reaction-items.ts';
import { readAllow } from './values/read-allow.ts';
import { readCas } from './values/read-cas.ts';
import { readInchi } from './values/read-inchi.ts';
import { readInchiKey } from './values/read-inchikey.ts';
import { readIsomers } from './values/read-isomers.ts';

const molarMassOptions: QuantityOptions = { kinds: ['molar mass', 'particle mass'], defaultUnit: 'g/mol' };
const exactMassOptions: QuantityOptions = { kinds: ['particle mass', 'molar mass'], defaultUnit: 'u' };

/** Fields whose values are numbers, in which a comma between digits can only be meant as a point. */
const numericKeys: ReadonlySet<FieldKey> = new Set([
  'molar mass',
  'exact mass',
  'purity',
  'concentration',
  'density',
  'mp',
  'bp',
  'nD',
  'rotation',
  'HRMS',
  'combustion',
  'scale',
  'solvent',
  'conditions',
]);

/** Fields that hold a list; text keeps its items too. Of the others only one value is read. */
const listKeys: ReadonlySet<FieldKey> = new Set([
  ...repeatableKeys,
  'charged',
  'obtained',
  'solvent',
  'conditions',
  'appearance',
  'source',
  'reference',
]);

/** A whole document. Any text is a document. */
export function readDocument(text: string, readers: ValueReaders): NotebookDocument {
  return { text, entries: findBlocks(text).map((block) => readEntry(block, readers)) };
}

/** One block. Its ranges count as the block's do; nothing but the block is looked at. */
export function readEntry(block: Block, readers: ValueReaders): Entry {
  const reading = new EntryReading(block);
  return block.kind === 'compound' ? compoundEntry(reading, readers) : reactionEntry(reading);
}

function compoundEntry(reading: EntryReading, { readName, readSmiles }: ValueReaders): CompoundEntry {
  const asName = (text: string): Read<NameReading> => ({ value: readName(text) });
  const name = reading.value('name', asName);
  return {
    kind: 'compound',
    ...reading.common(),
    name,
    synonyms: reading
      .all('synonyms')
      .flatMap((field) => partsOf(field).map((text) => ({ field, text, read: asName(text.text) }))),
    formula: reading.value('formula', (text): Read<Composition> => readFormula(text)),
    smiles: reading.value('SMILES', readSmiles, ''),
    inchi: reading.reported('InChI', readInchi, ''),
    inchiKey: reading.reported('InChIKey', readInchiKey, ''),
    cas: reading.reported('CAS RN', readCas),
    isomers: reading.reported('isomers', readIsomers),
    molarMass: reading.quantity('molar mass', molarMassOptions),
    exactMass: reading.quantity('exact mass', exactMassOptions),
    problems: reading.sortedProblems(),
  };
}

function reactionEntry(reading: EntryReading): ReactionEntry {
  const items = (key: 'charged' | 'obtained') => {
    const found = reading.all(key).flatMap(reactionItems);
    for (const { rest } of found) {
      if (rest !== undefined) reading.problems.push(...decimalCommaProblems(rest));
    }
    return found;
  };
  return {
    kind: 'reaction',
    ...reading.common(),
    scheme: reading.first('scheme'),
    charged: items('charged'),
    obtained: items('obtained'),
    problems: reading.sortedProblems(),
  };
}

/** The names of `synonyms`: one an item, or separated by semicolons. */
function partsOf(field: Field): MappedText[] {
  return [field.value, ...field.items].flatMap((text) => {
    const parts: MappedText[] = [];
    let start = 0;
    for (let end = text.text.indexOf(';'); end !== -1; end = text.text.indexOf(';', start)) {
      parts.push(trimmedSlice(text, start, end));
      start = end + 1;
    }
    parts.push(start === 0 ? text : trimmedSlice(text, start, text.text.length));
    return parts.filter((part) => part.text !== '');
  });
}

/** The fields of one block while their values are read, with the problems found on the way. */
class EntryReading {
  readonly problems: EntryProblem[];
  private readonly block: Block;
  private readonly fields: readonly Field[];

  constructor(block: Block) {
    const { fields, problems } = readFields(block);
    this.block = block;
    this.fields = fields;
    this.problems = [...problems];
    if (fields.length === 0 && problems.length === 0) this.problems.push(emptyProblem(block));
    const seen = new Map<FieldKey, Field>();
    for (const field of fields) {
      const { key } = field;
      if (key === undefined) {
        this.problems.push(unknownKeyProblem(block.kind, field));
        continue;
      }
      if (field.value.text === '' && field.items.every((item) => item.text === '')) {
        this.problems.push(emptyValueProblem(field));
      }
      const before = seen.get(key);
      if (before === undefined) seen.set(key, field);
      else if (!repeatableKeys.has(key)) this.problems.push(repeatedProblem(field, before));
      if (!listKeys.has(key)) this.problems.push(...extraItemProblems(field));
      if (numericKeys.has(key)) {
        for (const text of [field.value, ...field.items]) this.problems.push(...decimalCommaProblems(text));
      }
    }
  }

  all(key: FieldKey): Field[] {
    return this.fields.filter((field) => field.key === key);
  }

  /** Of a repeated field the first one counts. */
  first(key: FieldKey): Field | undefined {
    return this.fields.find((field) => field.key === key);
  }

  /** The value of a field, or undefined when there is no field or nothing in it. */
  value<T>(key: FieldKey, read: (text: string) => Read<T>, separator?: string): EntryValue<T> | undefined {
    const field = this.first(key);
    const text = field && wholeValue(field, separator);
    return text && { field: field!, text, read: read(text.text) };
  }

  /** The same for values whose problems no check of their own reports. */
  reported<T>(key: FieldKey, read: (text: string) => Read<T>, separator?: string): EntryValue<T> | undefined {
    const value = this.value(key, read, separator);
    if (value?.read.problem !== undefined) {
      const { range, message, fixes } = value.read.problem;
      const { toDocument } = value.text;
      this.problems.push({
        check: 'bad-value',
        range: toDocument(range),
        message,
        fixes: (fixes ?? []).map((fix) => ({
          ...fix,
          edits: fix.edits.map((edit) => ({ ...edit, range: toDocument(edit.range) })),
        })),
      });
    }
    return value;
  }

  /** A decimal comma has its own finding; where it can only be meant as one, the number is read as meant. */
  quantity(key: FieldKey, options: QuantityOptions): EntryValue<Quantity> | undefined {
    const field = this.first(key);
    const commas = field === undefined ? [] : findDecimalCommas(wholeValue(field)?.text ?? '');
    if (commas.length === 0) return this.reported(key, (text) => readQuantity(text, options));
    if (commas.some(({ ambiguous }) => ambiguous)) {
      return this.value(key, (): Read<Quantity> => ({
        problem: { range: commas[0]!.range, message: 'This number can be read in two ways.' },
      }));
    }
    return this.reported(key, (text) => {
      let withPoints = text;
      for (const { comma } of commas) {
        withPoints = `${withPoints.slice(0, comma)}.${withPoints.slice(comma + 1)}`;
      }
      return readQuantity(withPoints, options);
    });
  }

  common(): {
    block: Block;
    fields: readonly Field[];
    label: EntryValue<string> | undefined;
    allow: readonly AllowStatement[];
  } {
    const allow: AllowStatement[] = [];
    for (const field of this.all('allow')) {
      for (const text of [field.value, ...field.items]) {
        if (text.text === '') continue;
        const { statement, problem } = readAllow(field, text);
        allow.push(statement);
        if (problem !== undefined) this.problems.push(problem);
      }
    }
    const label = this.value('label', (text): Read<string> => ({ value: text }));
    return { block: this.block, fields: this.fields, label, allow };
  }

  /** In the order of the text. */
  sortedProblems(): EntryProblem[] {
    return this.problems.sort((a, b) => a.range.start - b.range.start || a.range.end - b.range.end);
  }
}

/** A single value may stand as the only item below its key. */
function wholeValue(field: Field, separator?: string): MappedText | undefined {
  const text = field.value.text === '' ? field.items.find((item) => item.text !== '') : field.value;
  if (text === undefined || text.text === '') return undefined;
  return separator !== undefined && text instanceof JoinedText ? text.joinedBy(separator) : text;
}

function emptyProblem(block: Block): EntryProblem {
  return {
    check: 'empty-block',
    range: block.kindRange,
    message: `This ${block.kind} block has no field, so it records nothing. Fill it in or take it out.`,
  };
}

function emptyValueProblem(field: Field): EntryProblem {
  return {
    check: 'bad-value',
    range: field.keyRange,
    message: `Nothing stands after “${field.keyText}”. Write its value, or take the line out.`,
  };
}

/** A single value may stand on the line of its key or as its only item; what comes after is not read. */
function extraItemProblems(field: Field): EntryProblem[] {
  const filled = [field.value, ...field.items].filter((text) => text.text !== '');
  return filled.slice(1).map((item) => ({
    check: 'bad-value',
    range: item.range,
    message:
      `“${field.keyText}” holds one value, and this is a second one, which nobody reads. Make it part of the value ` +
      'above, or put it under “notes”.',
  }));
}

function repeatedProblem(field: Field, before: Field): EntryProblem {
  return {
    check: 'repeated-field',
    range: field.keyRange,
    message:
      `“${field.keyText}” repeats “${before.keyText}” above. Only the first counts, so this value is not checked. ` +
      'Keep the right one.',
  };
}

/**
 * The shapes that a notebook is read into: block, field, entry. Every value keeps its exact place in the file;
 * ranges are UTF-16 offsets into the whole document unless a comment says otherwise.
 */
import type { Composition } from '../chemistry/composition/composition.ts';
import type { NameReading } from '../chemistry/nomenclature/reading.ts';
import type { Quantity } from '../chemistry/stoichiometry/quantity.ts';
import type { Molecule } from '../chemistry/structure/molecule.ts';
import type { Fix, Read, TextRange } from '../chemistry/text.ts';
import type { FieldKey } from './keys.ts';

/** A text put together from pieces of the document (continuation lines, quoted lines), with the way back. */
export interface MappedText {
  readonly text: string;
  /** From a range in `text` to the range of the document that it came from. */
  readonly toDocument: (inText: TextRange) => TextRange;
  /** The whole of it in the document. */
  readonly range: TextRange;
}

export type BlockKind = 'compound' | 'reaction';

/** One line of a block's content as CommonMark sees it: without list indentation and quote marks. */
export interface ContentLine {
  readonly text: string;
  /** Document offset of the first character of `text`. */
  readonly offset: number;
}

/** How a line is added to a block so that it stays in its list, quote and file. */
export interface BlockLayout {
  /** What begins each line of the block: quote marks and the indentation of lists and of the fence. */
  readonly linePrefix: string;
  /** `\n`, `\r\n` or `\r`. */
  readonly lineBreak: string;
  /** Characters from the opening fence to the end of its line. */
  readonly openingLength: number;
}

/** A fenced code block whose info string begins with `compound` or `reaction`. */
export interface Block {
  readonly kind: BlockKind;
  /** From the opening fence to the end of the closing fence (or of the document, or of its container). */
  readonly range: TextRange;
  /** The word `compound` or `reaction` after the opening fence. */
  readonly kindRange: TextRange;
  readonly lines: readonly ContentLine[];
  /** The content, lines joined by `\n`: equal texts of equal kind read equally. */
  readonly text: string;
  /** False when the document ended before the fence was closed. */
  readonly closed: boolean;
  /** Of a block that stands in a document. */
  readonly layout?: BlockLayout;
}

/** One `key: value` of a block. */
export interface Field {
  /** The key it stands for, or undefined when nobody knows it. */
  readonly key: FieldKey | undefined;
  readonly keyText: string;
  readonly keyRange: TextRange;
  /** The value, continuation lines joined by one space each; trimmed. */
  readonly value: MappedText;
  /** The `- ` items below the key, each trimmed and with its own continuation lines joined. */
  readonly items: readonly MappedText[];
  /** Key, value and items. */
  readonly range: TextRange;
}

/** The value of a field as its reader took it. */
export interface EntryValue<T> {
  readonly field: Field;
  /** The text that was read. */
  readonly text: MappedText;
  /** The ranges of a problem in here are offsets into `text.text`. */
  readonly read: Read<T>;
}

/** How many isomers the entry says it holds. */
export interface IsomerStatement {
  readonly kind: 'single' | 'racemate' | 'relative' | 'mixture' | 'unknown';
  /** The ratio of a mixture as written, such as `3:1`. */
  readonly ratio?: string;
}

/** `allow: check-id (reason)`. */
export interface AllowStatement {
  readonly field: Field;
  readonly checkId: string;
  readonly checkIdRange: TextRange;
  /** Undefined when no reason was given. */
  readonly reason: string | undefined;
}

/** Something that the block language itself finds wrong; the check of that id reports it. */
export interface EntryProblem {
  readonly check:
    | 'unknown-field'
    | 'repeated-field'
    | 'bad-value'
    | 'decimal-comma'
    | 'empty-block'
    | 'allow-without-reason';
  readonly range: TextRange;
  readonly message: string;
  readonly fixes?: readonly Fix[];
}

interface EntryBase {
  readonly block: Block;
  readonly fields: readonly Field[];
  readonly label: EntryValue<string> | undefined;
  readonly allow: readonly AllowStatement[];
  readonly problems: readonly EntryProblem[];
}

export interface CompoundEntry extends EntryBase {
  readonly kind: 'compound';
  readonly name: EntryValue<NameReading> | undefined;
  readonly synonyms: readonly EntryValue<NameReading>[];
  readonly formula: EntryValue<Composition> | undefined;
  readonly smiles: EntryValue<Molecule> | undefined;
  /** As written, whitespace removed; its syntax is checked by the reader. */
  readonly inchi: EntryValue<string> | undefined;
  readonly inchiKey: EntryValue<string> | undefined;
  readonly cas: EntryValue<string> | undefined;
  readonly isomers: EntryValue<IsomerStatement> | undefined;
  /** g/mol. */
  readonly molarMass: EntryValue<Quantity> | undefined;
  /** Of the neutral compound as written, in u (Da). */
  readonly exactMass: EntryValue<Quantity> | undefined;
}

/** A substance in `charged` or `obtained`, taken apart into WHAT and the rest. */
export interface ReactionItem {
  readonly field: Field;
  readonly what: MappedText;
  /** All that stands after the colon; quantities and roles. */
  readonly rest: MappedText | undefined;
}

export interface ReactionEntry extends EntryBase {
  readonly kind: 'reaction';
  readonly scheme: Field | undefined;
  readonly charged: readonly ReactionItem[];
  readonly obtained: readonly ReactionItem[];
}

export type Entry = CompoundEntry | ReactionEntry;

/** A whole document, read. */
export interface NotebookDocument {
  readonly text: string;
  readonly entries: readonly Entry[];
}

/** The value readers that cost something; the workspace passes ones that remember what they have read. */
export interface ValueReaders {
  readonly readSmiles: (text: string) => Read<Molecule>;
  readonly readName: (text: string) => NameReading;
}

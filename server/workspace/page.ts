/**
 * One file of a notebook as it stands now. An edit moves most blocks and changes one, so a block is read once,
 * at an address of its own, and the page knows where each address lies in the text of the moment.
 */
import type { TextRange } from '../chemistry/text.ts';
import type { Finding } from '../checks/finding.ts';
import type { EntryModel } from '../checks/model.ts';
import type { Block } from '../notebook/model.ts';

/** Addresses of one block; no file is longer (see `largestFileBytes`). */
const span = 2 ** 26;

/** A block read: every range in `model` and `findings` counts from its address instead of the file's start. */
export interface ReadBlock {
  /** Where the block begins, a multiple of `span`; no two blocks share one. */
  readonly address: number;
  /** The stretch of the file that it was read from. */
  readonly source: string;
  /** Where its content lines begin in `source`, which depends on the list or quote it stands in. */
  readonly lineOffsets: readonly number[];
  readonly model: EntryModel;
  findings: readonly Finding[];
  /** Looked up a fact that was not there yet. */
  waits: boolean;
}

export interface PlacedBlock {
  readonly read: ReadBlock;
  /** In the file. */
  readonly range: TextRange;
}

export interface Page {
  readonly text: string;
  readonly blocks: readonly PlacedBlock[];
  readonly byAddress: ReadonlyMap<number, PlacedBlock>;
}

/** The same block with its ranges counted from `address`. */
export function rebased(block: Block, address: number): Block {
  const shift = address - block.range.start;
  return {
    ...block,
    range: { start: address, end: block.range.end + shift },
    kindRange: { start: block.kindRange.start + shift, end: block.kindRange.end + shift },
    lines: block.lines.map((line) => ({ text: line.text, offset: line.offset + shift })),
  };
}

/**
 * Puts a page together from its blocks. Blocks of `previous` with the same source are taken over as they are;
 * `read` reads the others.
 */
export function buildPage(
  text: string,
  blocks: readonly Block[],
  previous: Page | undefined,
  read: (block: Block, source: string, lineOffsets: readonly number[]) => ReadBlock,
): Page {
  const reusable = new Map<string, ReadBlock[]>();
  for (const { read: old } of previous?.blocks ?? []) {
    const same = reusable.get(old.source);
    if (same === undefined) reusable.set(old.source, [old]);
    else same.push(old);
  }
  const placed = blocks.map((block): PlacedBlock => {
    const source = text.slice(block.range.start, block.range.end);
    const lineOffsets = block.lines.map((line) => line.offset - block.range.start);
    const candidates = reusable.get(source);
    const index =
      candidates?.findIndex(
        (old) => old.model.kind === block.kind && sameNumbers(old.lineOffsets, lineOffsets),
      ) ?? -1;
    const kept = index === -1 ? undefined : candidates!.splice(index, 1)[0];
    return { read: kept ?? read(block, source, lineOffsets), range: block.range };
  });
  return { text, blocks: placed, byAddress: new Map(placed.map((block) => [block.read.address, block])) };
}

/** Hands out addresses, one block each. */
export class Addresses {
  private next = 0;

  take(): number {
    return span * this.next++;
  }
}

/** Where an address range lies in the page's text; undefined when its block is not of this page. */
export function toText(page: Page, range: TextRange): TextRange | undefined {
  const address = Math.floor(range.start / span) * span;
  const block = page.byAddress.get(address);
  if (block === undefined) return undefined;
  const shift = block.range.start - address;
  const within = (offset: number) => Math.max(block.range.start, Math.min(offset + shift, block.range.end));
  return { start: within(range.start), end: within(range.end) };
}

/** The block at an offset of the text, with the address of that offset. The end of a block belongs to it. */
export function blockAt(page: Page, offset: number): { block: PlacedBlock; address: number } | undefined {
  const block = page.blocks.find(({ range }) => range.start <= offset && offset <= range.end);
  return block && { block, address: offset - block.range.start + block.read.address };
}

/** A finding, its fixes and its related places moved from addresses to the texts of their pages. */
export function findingInText(
  page: Page,
  finding: Finding,
  pageOf: (file: string) => Page | undefined,
): Finding | undefined {
  const range = toText(page, finding.range);
  if (range === undefined) return undefined;
  return {
    ...finding,
    range,
    fixes: finding.fixes.flatMap((fix) => {
      const edits = fix.edits.flatMap((edit) => placed(page, edit) ?? []);
      return edits.length === fix.edits.length ? [{ ...fix, edits }] : [];
    }),
    related: finding.related.flatMap((place) => {
      const home = place.file === undefined ? page : pageOf(place.file);
      return (home && placed(home, place)) ?? [];
    }),
  };
}

function placed<T extends { readonly range: TextRange }>(page: Page, value: T): T | undefined {
  const range = toText(page, value.range);
  return range && { ...value, range };
}

function sameNumbers(first: readonly number[], second: readonly number[]): boolean {
  return first.length === second.length && first.every((value, index) => value === second[index]);
}

/**
 * From a Markdown document to its `compound` and `reaction` blocks. All else in the document is left alone.
 *
 * A document is parsed in pieces that begin with an unindented `#` heading. Such a heading ends every list, quote
 * and paragraph (CommonMark 0.31.2, sections 4.2 and 5), and no block depends on what stands before it, so a piece
 * can be parsed by itself, unless a fence or raw HTML before it is still open; then the two are one piece. An edit
 * changes one piece, and the others are known from the time before.
 */
import { findFences, type Fence } from './fences.ts';
import { firstInfoWord } from './info-string.ts';
import type { Block, BlockKind, BlockLayout } from './model.ts';

/** A document with its blocks, and what makes the next reading of it quick. */
export interface MarkdownPage {
  /** In the order of the text. */
  readonly blocks: readonly Block[];
  readonly pieces: ReadonlyMap<string, MarkdownPiece>;
}

/** The blocks of a piece; ranges count from its beginning. */
export interface MarkdownPiece {
  readonly blocks: readonly Block[];
  readonly open: boolean;
}

/** Where a block can begin at all; `&` begins a character reference, which may stand for a letter. */
const opening = /(?:`{3}|~{3})[ \t]*(?:compound|reaction|&)/;

/** What could still be open at the end of a piece. */
const mayStayOpen = /`{3}|~{3}|</;

const heading = /(?<=[\r\n])#{1,6}[ \t]/g;

const noBlocks: MarkdownPiece = { blocks: [], open: false };

/** The blocks of a CommonMark document, in the order of the text. Any text is a document. */
export function findBlocks(text: string): readonly Block[] {
  return parseMarkdown(text).blocks;
}

/** Reads a document; pieces that `previous` had are not parsed again. The result does not depend on it. */
export function parseMarkdown(text: string, previous?: MarkdownPage): MarkdownPage {
  if (!opening.test(text)) return { blocks: [], pieces: new Map() };
  const starts = [0, ...Array.from(text.matchAll(heading), (match) => match.index), text.length];
  const pieces = new Map<string, MarkdownPiece>();
  const blocks: Block[] = [];
  for (let from = 0; from < starts.length - 1;) {
    const start = starts[from]!;
    // One more piece, then two, four …: a fence that nobody closed must not be parsed once for each heading.
    for (let count = 1; ; count *= 2) {
      const to = Math.min(from + count, starts.length - 1);
      const source = text.slice(start, starts[to]);
      const piece = pieces.get(source) ?? previous?.pieces.get(source) ?? parsePiece(source);
      pieces.set(source, piece);
      if (piece.open && to < starts.length - 1) continue;
      for (const block of piece.blocks) blocks.push(start === 0 ? block : movedBlock(block, start));
      from = to;
      break;
    }
  }
  return { blocks, pieces };
}

function parsePiece(text: string): MarkdownPiece {
  if (!mayStayOpen.test(text)) return noBlocks;
  const { fences, open } = findFences(text);
  return { blocks: fences.flatMap((fence) => blockOf(text, fence) ?? []), open };
}

function blockOf(text: string, fence: Fence): Block | undefined {
  const info = firstInfoWord(text, fence.infoStart, fence.infoEnd);
  if (info === undefined || !isBlockKind(info.word)) return undefined;
  return {
    kind: info.word,
    range: { start: fence.start, end: fence.end },
    kindRange: info.range,
    lines: fence.lines,
    text: fence.lines.map((line) => line.text).join('\n'),
    closed: fence.closed,
    layout: layoutOf(text, fence),
  };
}

function movedBlock(block: Block, by: number): Block {
  return {
    ...block,
    range: { start: block.range.start + by, end: block.range.end + by },
    kindRange: { start: block.kindRange.start + by, end: block.kindRange.end + by },
    lines: block.lines.map(({ text, offset }) => ({ text, offset: offset + by })),
  };
}

function isBlockKind(word: string): word is BlockKind {
  return word === 'compound' || word === 'reaction';
}

function layoutOf(text: string, fence: Fence): BlockLayout {
  // A blank line may stand there without the marks of its containers.
  const line = fence.lines.find((each) => each.text.trim() !== '');
  const linePrefix =
    line === undefined
      ? text.slice(lineStartOf(text, fence.start), fence.start).replace(/[^\s>]/g, ' ')
      : text.slice(lineStartOf(text, line.offset), line.offset);
  const { infoEnd } = fence;
  const lineBreak = /^(?:\r\n?|\n)/.exec(text.slice(infoEnd, infoEnd + 2))?.[0] ?? '\n';
  return { linePrefix, lineBreak, openingLength: infoEnd - fence.start };
}

function lineStartOf(text: string, offset: number): number {
  let at = offset;
  while (at > 0 && !'\n\r'.includes(text[at - 1]!)) at--;
  return at === 0 && text.charCodeAt(0) === 0xfeff ? 1 : at;
}

/** From a Markdown document to its `compound` and `reaction` blocks. All else in the document is left alone. */
import { findFences, type Fence } from './fences.ts';
import { firstInfoWord } from './info-string.ts';
import type { Block, BlockKind, BlockLayout } from './model.ts';

/** Where a block can begin at all; `&` begins a character reference, which may stand for a letter. */
const opening = /(?:`{3}|~{3})[ \t]*(?:compound|reaction|&)/;

/** The blocks of a CommonMark document, in the order of the text. Any text is a document. */
export function findBlocks(text: string): Block[] {
  if (!opening.test(text)) return [];
  const blocks: Block[] = [];
  for (const fence of findFences(text)) {
    const info = firstInfoWord(text, fence.infoStart, fence.infoEnd);
    if (info === undefined || !isBlockKind(info.word)) continue;
    blocks.push({
      kind: info.word,
      range: { start: fence.start, end: fence.end },
      kindRange: info.range,
      lines: fence.lines,
      text: fence.lines.map((line) => line.text).join('\n'),
      closed: fence.closed,
      layout: layoutOf(text, fence),
    });
  }
  return blocks;
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

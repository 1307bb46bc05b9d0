/** From a Markdown document to its `compound` and `reaction` blocks. All else in the document is left alone. */
import { findFences } from './fences.ts';
import { firstInfoWord } from './info-string.ts';
import type { Block, BlockKind } from './model.ts';

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
    });
  }
  return blocks;
}

function isBlockKind(word: string): word is BlockKind {
  return word === 'compound' || word === 'reaction';
}

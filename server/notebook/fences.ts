/**
 * Finds the fenced code blocks of a Markdown document, in lists and quotes too. Where a fence begins and ends is
 * decided by a CommonMark parser; it reports lines, and here these are traced back to offsets. Inline structure
 * plays no part in that, so it is not parsed.
 */
import MarkdownIt from 'markdown-it';
import type { ContentLine } from './model.ts';

/** A fenced code block of any kind. */
export interface Fence {
  /** The first character of the opening fence. */
  readonly start: number;
  /** The first character after the opening fence, where the info string begins. */
  readonly infoStart: number;
  /** End of the opening line. */
  readonly infoEnd: number;
  readonly lines: readonly ContentLine[];
  /** End of the closing fence, or of the last line when there is none. */
  readonly end: number;
  readonly closed: boolean;
}

/** Deeper quotes and lists are not looked into: the parser descends with them. */
const deepestNesting = 100;
const parser = new MarkdownIt('commonmark', { maxNesting: deepestNesting });
parser.core.ruler.enableOnly(['normalize', 'block']);

interface SourceLine {
  readonly text: string;
  readonly offset: number;
}

export interface FenceScan {
  /** In the order of the text. */
  readonly fences: readonly Fence[];
  /** A fence or raw HTML, in no list or quote, was still open at the end: text added there would belong to it. */
  readonly open: boolean;
}

/** All fenced code blocks. Any text is a document. */
export function findFences(text: string): FenceScan {
  // A byte order mark is no part of the first line.
  const start = text.charCodeAt(0) === 0xfeff ? 1 : 0;
  const source = sourceLines(text, start);
  const fences: Fence[] = [];
  const tokens = parser.parse(start === 0 ? text : text.slice(1), {});
  for (const token of tokens) {
    if (token.type === 'fence' && token.map !== null) {
      fences.push(fenceAt(source, token.map[0], token.map[1], token.markup, token.content));
    }
  }
  const last = tokens.at(-1);
  const lineCount = source.length - (source.at(-1)!.text === '' ? 1 : 0);
  const open =
    last?.level === 0 &&
    (last.type === 'fence'
      ? fences.at(-1)?.closed === false
      : // Also when it ended with the last line: then nothing is known of the next.
        last.type === 'html_block' && last.map !== null && last.map[1] >= lineCount);
  return { fences, open };
}

function fenceAt(
  source: readonly SourceLine[],
  first: number,
  after: number,
  markup: string,
  content: string,
): Fence {
  const opening = source[first]!;
  const start = opening.offset + opening.text.indexOf(markup);
  const contents = content === '' ? [] : content.replace(/\n$/, '').split('\n');
  const lines = contents.map((line, index) => contentLine(source[first + 1 + index]!, line));
  const last = source[Math.max(first, after - 1)]!;
  // An empty content may also be one blank line at the end of the document.
  const closed = after - first === contents.length + 2 && last.text.trimEnd().endsWith(markup);
  return {
    start,
    infoStart: start + markup.length,
    infoEnd: opening.offset + opening.text.length,
    lines,
    end: last.offset + (closed ? last.text.trimEnd().length : last.text.length),
    closed,
  };
}

/** A content line is the end of its source line: what stands before it are the marks and indentation of containers. */
function contentLine({ text, offset }: SourceLine, content: string): ContentLine {
  const length = Math.min(content.length, text.length);
  const tail = text.slice(text.length - length);
  if (tail === content || tail.replaceAll('\0', '\uFFFD') === content) {
    return { text: tail, offset: offset + text.length - length };
  }
  // A tab that is partly indentation comes back as spaces; the line is taken from that tab on.
  let from = text.length - content.replace(/^ +/, '').length;
  while (text[from - 1] === ' ') from--;
  if (text[from - 1] === '\t') from--;
  return { text: text.slice(from), offset: offset + from };
}

/** Line endings as CommonMark knows them: line feed, carriage return, or both. */
function sourceLines(text: string, start: number): SourceLine[] {
  const lines: SourceLine[] = [];
  const ending = /\r\n?|\n/g;
  ending.lastIndex = start;
  let offset = start;
  for (let match = ending.exec(text); match !== null; match = ending.exec(text)) {
    lines.push({ text: text.slice(offset, match.index), offset });
    offset = ending.lastIndex;
  }
  lines.push({ text: text.slice(offset), offset });
  return lines;
}

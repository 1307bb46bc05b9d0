/**
 * Finds the fenced code blocks of a Markdown document, in lists and quotes too, following the block structure
 * of CommonMark 0.31.2 (sections 4 and 5, and the method of its appendix). Inline structure plays no part in
 * that, so it is not looked at.
 */
import { endsAtBlankLine, htmlBlockEnds, htmlBlockStart, type HtmlBlockKind } from './html-block.ts';
import { LineCursor } from './line-cursor.ts';
import {
  backtick,
  endOfRun,
  greaterThan,
  hash,
  isBlank,
  isHeading,
  isUnderline,
  lessThan,
  lineFeed,
  listMarkerLength,
  thematicBreakObstacle,
  tilde,
} from './line-starts.ts';
import type { ContentLine } from './model.ts';
import { isReferenceDefinitions } from './reference-definitions.ts';

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

interface OpenFence {
  readonly start: number;
  readonly infoStart: number;
  readonly infoEnd: number;
  readonly lines: ContentLine[];
  readonly indent: number;
}

/** A quote, or a list item whose content is indented by `width` columns. Lists themselves decide nothing. */
interface Container {
  readonly width: number;
  /** An item that began with a blank line and has no content yet: a second blank line ends it. */
  childless: boolean;
}
const quote: Container = { width: -1, childless: false };

type Leaf =
  | { readonly kind: 'none' | 'indented' }
  | { readonly kind: 'paragraph'; readonly start: number }
  | { readonly kind: 'html'; readonly html: HtmlBlockKind }
  | { readonly kind: 'fence'; readonly fence: OpenFence };

const noLeaf: Leaf = { kind: 'none' };
const indentedCode: Leaf = { kind: 'indented' };

/** All fenced code blocks, in the order of the text. */
export function findFences(text: string): readonly Fence[] {
  return new FenceScanner(text).scan();
}

class FenceScanner {
  private readonly text: string;
  private readonly cursor: LineCursor;
  private readonly fences: Fence[] = [];
  private readonly containers: Container[] = [];
  /** Indices of the quotes among `containers`. */
  private readonly quotes: number[] = [];
  private leaf: Leaf = noLeaf;
  /** The character that last stood in the way of a thematic break: a line of list markers is scanned once. */
  private obstacle = { for: 0, at: -1 };

  constructor(text: string) {
    this.text = text;
    this.cursor = new LineCursor(text);
  }

  scan(): readonly Fence[] {
    const { text } = this;
    // A byte order mark is not part of the first line.
    let start = text.charCodeAt(0) === 0xfeff ? 1 : 0;
    let nextReturn = text.indexOf('\r');
    while (start < text.length) {
      let end = text.indexOf('\n', start);
      if (end === -1) end = text.length;
      let next = end + 1;
      if (nextReturn !== -1 && nextReturn < start) nextReturn = text.indexOf('\r', start);
      if (nextReturn !== -1 && nextReturn < end) {
        end = nextReturn;
        next = text.charCodeAt(end + 1) === lineFeed ? end + 2 : end + 1;
      }
      this.readLine(start, end);
      start = next;
    }
    this.setLeaf(noLeaf);
    return this.fences;
  }

  private readLine(start: number, end: number): void {
    const { cursor } = this;
    cursor.startLine(start, end);
    const matched = this.matchContainers();
    const allMatched = matched === this.containers.length;
    if (allMatched && this.continueLeaf()) return;
    const lazy = !allMatched && this.leaf.kind === 'paragraph' && !cursor.isBlank;
    if (this.startBlocks(matched, lazy)) return;
    if (cursor.isBlank) {
      if (this.leaf.kind === 'paragraph') this.setLeaf(noLeaf);
    } else if (this.leaf.kind !== 'paragraph') {
      this.setLeaf({ kind: 'paragraph', start: cursor.nonSpace });
    }
  }

  /** Moves the cursor over what continues the open containers and returns how many go on. */
  private matchContainers(): number {
    const { cursor, containers } = this;
    let quotesMatched = 0;
    for (let index = 0; index < containers.length; index++) {
      const container = containers[index]!;
      if (container === quote) {
        if (cursor.indent > 3 || cursor.isBlank || cursor.nonSpaceCode !== greaterThan) return index;
        this.skipQuoteMark();
        quotesMatched++;
      } else if (cursor.isBlank) {
        // Items go on over blank lines, however deep they are nested; quotes do not.
        const last = containers.at(-1)!;
        const stop = this.quotes[quotesMatched] ?? containers.length - (last.childless ? 1 : 0);
        for (; index < stop && cursor.position < cursor.end; index++) {
          cursor.skipColumns(containers[index]!.width);
        }
        return stop;
      } else if (cursor.indent >= container.width) {
        cursor.skipColumns(container.width);
        container.childless = false;
      } else {
        return index;
      }
    }
    return containers.length;
  }

  /** Gives the line to the open leaf when it can only belong there. */
  private continueLeaf(): boolean {
    const { cursor, leaf } = this;
    switch (leaf.kind) {
      case 'fence':
        this.continueFence(leaf.fence);
        return true;
      case 'html':
        if (cursor.isBlank && endsAtBlankLine(leaf.html)) this.setLeaf(noLeaf);
        else if (htmlBlockEnds(leaf.html, this.text.slice(cursor.position, cursor.end))) this.setLeaf(noLeaf);
        return true;
      case 'indented':
        if (cursor.isBlank || cursor.indent >= 4) return true;
        this.setLeaf(noLeaf);
        return false;
      default:
        return false;
    }
  }

  private continueFence(fence: OpenFence): void {
    const { cursor, text } = this;
    const fenceCode = text.charCodeAt(fence.start);
    if (cursor.indent <= 3 && text.charCodeAt(cursor.nonSpace) === fenceCode) {
      const runEnd = endOfRun(text, cursor.nonSpace, cursor.end, fenceCode);
      if (runEnd - cursor.nonSpace >= fence.infoStart - fence.start && isBlank(text, runEnd, cursor.end)) {
        this.finishFence(fence, runEnd, true);
        this.leaf = noLeaf;
        return;
      }
    }
    if (fence.indent > 0) cursor.skipColumns(fence.indent);
    fence.lines.push({ text: text.slice(cursor.position, cursor.end), offset: cursor.position });
  }

  /**
   * Opens what begins on this line, containers first. True when the line is used up; otherwise the rest of it
   * is blank or belongs to a paragraph. `matched` containers go on; `lazy`: the line may continue a paragraph
   * that lies deeper.
   */
  private startBlocks(matched: number, lazy: boolean): boolean {
    const { cursor, text } = this;
    let keep = matched;
    // A block that begins here ends whatever was not continued.
    const begin = (leaf: Leaf) => {
      this.closeContainers(keep);
      this.setLeaf(leaf);
    };
    const open = (container: Container) => {
      begin(noLeaf);
      if (container === quote) this.quotes.push(this.containers.length);
      keep = this.containers.push(container);
    };
    // Text: it continues a paragraph, however deep, or stands in the containers that go on.
    const leaveText = (mayBeLazy: boolean) => {
      if (!mayBeLazy) this.closeContainers(keep);
      return false;
    };
    let inParagraph = this.leaf.kind === 'paragraph' && matched === this.containers.length;
    for (let mayBeLazy = lazy; ; mayBeLazy = false, inParagraph = false) {
      if (cursor.isBlank) return leaveText(mayBeLazy);
      if (cursor.indent >= 4) {
        if (inParagraph || mayBeLazy) return leaveText(mayBeLazy);
        begin(indentedCode);
        return true;
      }
      const first = cursor.nonSpaceCode;
      if (first === greaterThan) {
        open(quote);
        this.skipQuoteMark();
        continue;
      }
      if (first === hash && isHeading(text, cursor)) {
        begin(noLeaf);
        return true;
      }
      if (first === backtick || first === tilde) {
        const fence = this.openFence(first);
        if (fence === undefined) return leaveText(mayBeLazy);
        begin({ kind: 'fence', fence });
        return true;
      }
      if (first === lessThan) {
        const rest = text.slice(cursor.nonSpace, cursor.end);
        const html = htmlBlockStart(rest);
        // Kind 7 cannot interrupt a paragraph.
        if (html === undefined || (html === 7 && (inParagraph || mayBeLazy))) return leaveText(mayBeLazy);
        begin(htmlBlockEnds(html, rest) ? noLeaf : { kind: 'html', html });
        return true;
      }
      if (inParagraph && this.isSetextUnderline()) {
        begin(noLeaf);
        return true;
      }
      if (this.isThematicBreak(first)) {
        begin(noLeaf);
        return true;
      }
      const marker = listMarkerLength(text, cursor, inParagraph);
      if (marker === 0) return leaveText(mayBeLazy);
      const indent = cursor.indent;
      cursor.skipMarker(marker);
      const childless = cursor.isBlank;
      const padding = childless || cursor.indent > 4 ? 1 : cursor.indent;
      cursor.skipColumns(padding);
      open({ width: indent + marker + padding, childless });
    }
  }

  private skipQuoteMark(): void {
    this.cursor.skipMarker(1);
    this.cursor.skipColumns(1);
  }

  private openFence(fenceCode: number): OpenFence | undefined {
    const { cursor, text } = this;
    const start = cursor.nonSpace;
    const infoStart = endOfRun(text, start, cursor.end, fenceCode);
    if (infoStart - start < 3) return undefined;
    if (fenceCode === backtick && text.slice(infoStart, cursor.end).includes('`')) return undefined;
    return { start, infoStart, infoEnd: cursor.end, lines: [], indent: cursor.indent };
  }

  private isSetextUnderline(): boolean {
    const { cursor, text, leaf } = this;
    if (!isUnderline(text, cursor)) return false;
    if (leaf.kind !== 'paragraph' || text[leaf.start] !== '[') return true;
    // Link reference definitions are no paragraph, so there is nothing to make a heading of.
    return !isReferenceDefinitions(this.paragraphText(leaf.start));
  }

  private isThematicBreak(first: number): boolean {
    const { obstacle, cursor } = this;
    if (obstacle.for === first && obstacle.at >= cursor.nonSpace && obstacle.at < cursor.end) return false;
    const at = thematicBreakObstacle(this.text, cursor);
    if (at === undefined) return true;
    this.obstacle = { for: first, at };
    return false;
  }

  /** The open paragraph without the marks of its containers, up to the line before this one. */
  private paragraphText(start: number): string {
    const lines = this.text.slice(start, this.cursor.position).split(/\r\n?|\n/);
    lines.pop();
    return lines.map((line, index) => (index === 0 ? line : line.replace(/^[ \t>]*/, ''))).join('\n');
  }

  private closeContainers(keep: number): void {
    if (keep === this.containers.length) return;
    this.setLeaf(noLeaf);
    this.containers.length = keep;
    while (this.quotes.length > 0 && this.quotes.at(-1)! >= keep) this.quotes.pop();
  }

  private setLeaf(leaf: Leaf): void {
    if (this.leaf.kind === 'fence') {
      const { fence } = this.leaf;
      const last = fence.lines.at(-1);
      this.finishFence(fence, last === undefined ? fence.infoEnd : last.offset + last.text.length, false);
    }
    this.leaf = leaf;
  }

  private finishFence(fence: OpenFence, end: number, closed: boolean): void {
    const { start, infoStart, infoEnd, lines } = fence;
    this.fences.push({ start, infoStart, infoEnd, lines, end, closed });
  }
}

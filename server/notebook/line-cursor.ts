/**
 * Walks the beginning of a Markdown line by columns, as CommonMark counts them: a tab reaches to the next
 * multiple of four, and part of a tab can belong to a list item or a quote while the rest is indentation.
 */

const tab = 0x09;
const space = 0x20;

export function isSpaceOrTab(code: number): boolean {
  return code === space || code === tab;
}

export class LineCursor {
  private readonly text: string;
  /** End of the line, before its line break. */
  end = 0;
  /** The next character. While a tab is used up in part, it is that tab. */
  position = 0;
  column = 0;
  /** The first character that is neither space nor tab, or the end of the line. */
  nonSpace = 0;
  /** Columns of white space between here and `nonSpace`. */
  indent = 0;

  constructor(text: string) {
    this.text = text;
  }

  startLine(start: number, end: number): void {
    this.position = start;
    this.end = end;
    this.column = 0;
    this.findNonSpace();
  }

  get isBlank(): boolean {
    return this.nonSpace === this.end;
  }

  /** The character after the white space; NaN at the end of the text. */
  get nonSpaceCode(): number {
    return this.text.charCodeAt(this.nonSpace);
  }

  findNonSpace(): void {
    let at = this.position;
    let column = this.column;
    for (; at < this.end; at++) {
      const code = this.text.charCodeAt(at);
      if (code === tab) column += 4 - (column % 4);
      else if (code === space) column++;
      else break;
    }
    this.nonSpace = at;
    this.indent = column - this.column;
  }

  /** Moves over up to `columns` columns of white space. */
  skipColumns(columns: number): void {
    let left = columns;
    while (left > 0 && this.position < this.end) {
      const code = this.text.charCodeAt(this.position);
      if (code === space) {
        this.position++;
        this.column++;
        left--;
      } else if (code === tab) {
        const width = 4 - (this.column % 4);
        const used = Math.min(left, width);
        this.column += used;
        if (used === width) this.position++;
        left -= used;
      } else {
        break;
      }
    }
    this.findNonSpace();
  }

  /** Moves to `nonSpace` and over `characters` more, none of which is a tab. */
  skipMarker(characters: number): void {
    this.column += this.indent + characters;
    this.position = this.nonSpace + characters;
    this.findNonSpace();
  }
}

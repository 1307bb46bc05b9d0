/**
 * Offsets to lines and back. Everything inside works on UTF-16 offsets; this is used where a text meets the
 * outside: the protocol, the command's output.
 */

/** Zero-based line and UTF-16 column. */
export interface Place {
  readonly line: number;
  readonly character: number;
}

export class LineTable {
  private readonly text: string;
  /** Offset of the first character of each line. */
  private readonly starts: number[] = [0];

  constructor(text: string) {
    this.text = text;
    for (let i = 0; i < text.length; i++) {
      const code = text.charCodeAt(i);
      if (code === 0x0a || (code === 0x0d && text.charCodeAt(i + 1) !== 0x0a)) this.starts.push(i + 1);
    }
  }

  get lineCount(): number {
    return this.starts.length;
  }

  /** Offsets outside the text are taken to its nearer end. */
  placeAt(offset: number): Place {
    const within = Math.max(0, Math.min(offset, this.text.length));
    let low = 0;
    let high = this.starts.length - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if (this.starts[middle]! <= within) low = middle;
      else high = middle - 1;
    }
    return { line: low, character: within - this.starts[low]! };
  }

  /** Lines and columns past the end are taken to the end, as the protocol wants it. */
  offsetAt(place: Place): number {
    if (place.line < 0) return 0;
    if (place.line >= this.starts.length) return this.text.length;
    const start = this.starts[place.line]!;
    return Math.max(start, Math.min(start + place.character, start + this.lineText(place.line).length));
  }

  /** The line without its line break. */
  lineText(line: number): string {
    const start = this.starts[line] ?? this.text.length;
    const end = this.starts[line + 1] ?? this.text.length;
    return this.text.slice(start, end).replace(/[\r\n]+$/, '');
  }
}

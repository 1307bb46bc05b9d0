/** Texts put together from pieces of a document, each character with the way back to its place. */
import type { TextRange } from '../chemistry/text.ts';
import type { MappedText } from './model.ts';

/** A stretch of the document, as it stands there. */
export interface Piece {
  readonly text: string;
  /** Document offset of its first character. */
  readonly offset: number;
}

/** Pieces in the order of the document, joined by a separator that stands in no document. */
export class JoinedText implements MappedText {
  readonly text: string;
  readonly range: TextRange;
  readonly pieces: readonly Piece[];
  /** Where each piece begins in `text`. */
  private readonly starts: readonly number[];

  /** `pieces` holds one at least; an empty one gives an empty text its place. */
  constructor(pieces: readonly Piece[], separator: string) {
    this.pieces = pieces;
    this.text = pieces.map((piece) => piece.text).join(separator);
    const starts: number[] = [];
    let at = 0;
    for (const piece of pieces) {
      starts.push(at);
      at += piece.text.length + separator.length;
    }
    this.starts = starts;
    const last = pieces.at(-1)!;
    this.range = { start: pieces[0]!.offset, end: last.offset + last.text.length };
  }

  /** A start between two pieces goes to the later one, an end to the earlier one. */
  readonly toDocument = ({ start, end }: TextRange): TextRange => {
    const documentStart = this.place(start, (pieceStart) => pieceStart <= start);
    if (end <= start) return { start: documentStart, end: documentStart };
    const documentEnd = this.place(end, (pieceStart) => pieceStart < end);
    return { start: documentStart, end: Math.max(documentStart, documentEnd) };
  };

  /** The same pieces joined otherwise. */
  joinedBy(separator: string): JoinedText {
    return this.pieces.length === 1 ? this : new JoinedText(this.pieces, separator);
  }

  private place(at: number, precedes: (pieceStart: number) => boolean): number {
    let low = 0;
    let high = this.starts.length - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if (precedes(this.starts[middle]!)) low = middle;
      else high = middle - 1;
    }
    const piece = this.pieces[low]!;
    return piece.offset + Math.max(0, Math.min(at - this.starts[low]!, piece.text.length));
  }
}

/** A stretch of a mapped text, without the white space around it. */
export function trimmedSlice(whole: MappedText, start: number, end: number): MappedText {
  let from = start;
  let to = end;
  while (from < to && isSpace(whole.text.charCodeAt(from))) from++;
  while (to > from && isSpace(whole.text.charCodeAt(to - 1))) to--;
  return {
    text: whole.text.slice(from, to),
    range: whole.toDocument({ start: from, end: to }),
    toDocument: (inText) => whole.toDocument({ start: inText.start + from, end: inText.end + from }),
  };
}

/** A piece of a line without the white space around it. */
export function trimmedPiece(line: Piece, start: number, end = line.text.length): Piece {
  let from = start;
  let to = end;
  while (from < to && isSpace(line.text.charCodeAt(from))) from++;
  while (to > from && isSpace(line.text.charCodeAt(to - 1))) to--;
  return { text: line.text.slice(from, to), offset: line.offset + from };
}

/** What a line is trimmed of: ASCII white space and the spaces of Unicode, which a paste from a PDF brings. */
export function isSpace(code: number): boolean {
  return (
    code === 0x20 ||
    (code >= 0x09 && code <= 0x0d) ||
    code === 0xa0 ||
    (code >= 0x2000 && code <= 0x200a) ||
    code === 0x202f ||
    code === 0x205f ||
    code === 0x3000 ||
    code === 0xfeff
  );
}

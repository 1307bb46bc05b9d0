/**
 * What a hover shows, before it is known how the client can show it: plain texts and the structures to draw.
 * `hover.ts` fills it, `renderMarkdown` and `renderPlain` put it into words.
 */
import { escaped, picture, table } from './markdown.ts';

export interface Drawing {
  readonly smiles: string;
  /** For those who cannot see it, and as caption where several stand side by side. */
  readonly caption: string;
  /** Atoms to emphasize, in the order of the SMILES. */
  readonly highlight?: readonly number[];
}

export interface HoverCard {
  readonly title?: string;
  /** Beside the title: a formula with its subscripts. */
  readonly subtitle?: string;
  /** One is drawn large, up to four side by side. */
  readonly drawings?: readonly Drawing[];
  /** Name and value, such as `molar mass` and `152.19 g/mol`. */
  readonly rows?: readonly (readonly [string, string])[];
  /** Canonical SMILES of the one structure that the card is about; its InChIKey joins the rows. */
  readonly identity?: string;
  /** Sentences below. */
  readonly lines?: readonly string[];
  /** Markdown of our own making, such as the words for a key. */
  readonly words?: string;
}

export const mostDrawings = 4;

/** Pixels that a drawing may take when it stands with `others`. */
export function drawingBox(count: number): { widthPx: number; heightPx: number } {
  return count <= 1 ? { widthPx: 300, heightPx: 200 } : { widthPx: 180, heightPx: 130 };
}

/** A hover longer than this is cut by the editor in the middle of a picture. */
const longestMarkdown = 90_000;

/** `svgs` in the order of the card's drawings; null where there is none. */
export function renderMarkdown(card: HoverCard, svgs: readonly (string | null)[]): string {
  const parts = headOf(card, bold, escaped);
  const pictures = picturesOf(card, svgs);
  const tail: string[] = [];
  if (card.rows !== undefined && card.rows.length > 0) {
    tail.push(table(card.rows.map(([name, value]) => [escaped(name), escaped(value)])));
  }
  if (card.words !== undefined) tail.push(card.words);
  for (const line of card.lines ?? []) tail.push(escaped(line));
  const length = [...parts, ...tail, pictures ?? ''].reduce((sum, part) => sum + part.length + 2, 0);
  if (pictures !== undefined && length < longestMarkdown) parts.push(pictures);
  return [...parts, ...tail].join('\n\n');
}

export function renderPlain(card: HoverCard): string {
  const same = (text: string) => text;
  const lines = headOf(card, same, same);
  for (const [name, value] of card.rows ?? []) lines.push(`${name}: ${value}`);
  if (card.words !== undefined) lines.push(card.words.replaceAll('`', ''));
  lines.push(...(card.lines ?? []));
  return lines.join('\n');
}

/** The first line, or none. */
function headOf(
  { title, subtitle }: HoverCard,
  strong: (text: string) => string,
  plain: (text: string) => string,
): string[] {
  if (title === undefined) return [];
  return [subtitle === undefined ? strong(title) : `${strong(title)} · ${plain(subtitle)}`];
}

function bold(text: string): string {
  return `**${escaped(text)}**`;
}

function picturesOf(card: HoverCard, svgs: readonly (string | null)[]): string | undefined {
  const drawn = (card.drawings ?? []).flatMap((drawing, index) => {
    const svg = svgs[index];
    return svg === null || svg === undefined ? [] : [{ drawing, svg }];
  });
  if (drawn.length === 0) return undefined;
  const only = drawn[0]!;
  if ((card.drawings?.length ?? 0) === 1) return picture(only.svg, only.drawing.caption);
  const cells = (cell: (one: (typeof drawn)[number]) => string) => `| ${drawn.map(cell).join(' | ')} |`;
  return [
    cells(({ drawing, svg }) => picture(svg, drawing.caption).replaceAll('|', '\\|')),
    `|${':-:|'.repeat(drawn.length)}`,
    cells(({ drawing }) => escaped(drawing.caption)),
  ].join('\n');
}

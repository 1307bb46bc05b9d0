/**
 * Turns the SVG that RDKit writes into the one we show: one colour, cropped to what is drawn, a fraction of
 * the length, and nothing in it but paths.
 */
interface Shape {
  readonly d: string;
  readonly look: string;
}

const margin = 4;

const looks = {
  line: (width: string) =>
    `fill="none" stroke="currentColor" stroke-width="${width}" stroke-linecap="round" stroke-linejoin="round"`,
  solid: 'fill="currentColor"',
  // Even-odd, so that the counter of a letter stays open.
  glyph: 'fill="currentColor" fill-rule="evenodd"',
  highlight: 'fill="currentColor" fill-opacity="0.22"',
};

/**
 * Null when the drawing holds something that we do not know: a picture of half a molecule is worse than none.
 * `box` is the size asked for, in pixels; the result is no larger, and smaller where the molecule is.
 */
export function compactDrawing(
  rdkitSvg: string,
  box: { readonly widthPx: number; readonly heightPx: number },
): string | null {
  const shapes: Shape[] = [];
  for (const [, element, attributes] of rdkitSvg.matchAll(/<([a-z]+)\s([^>]*)>/g)) {
    if (element === 'svg') continue;
    const shape =
      element === 'path' ? readPath(attributes!) : element === 'ellipse' ? readEllipse(attributes!) : null;
    if (shape === null) return null;
    shapes.push(shape);
  }
  if (shapes.length === 0) return null;

  const bounds = boundsOf(shapes);
  const left = Math.max(0, Math.floor(bounds.left - margin));
  const top = Math.max(0, Math.floor(bounds.top - margin));
  const width = Math.min(box.widthPx, Math.ceil(bounds.right + margin)) - left;
  const height = Math.min(box.heightPx, Math.ceil(bounds.bottom + margin)) - top;

  const merged = new Map<string, string>();
  for (const { look, d } of shapes) merged.set(look, (merged.get(look) ?? '') + d);
  const paths = [...merged].map(([look, d]) => `<path ${look} d="${d}"/>`).join('');
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" ` +
    `viewBox="${left} ${top} ${width} ${height}">${paths}</svg>`
  );
}

/** The drawing in a colour of the reader's. Anything that is no plain CSS colour becomes `currentColor`. */
export function coloured(svg: string, colour: string): string {
  return /^#[0-9a-f]{3,8}$|^[a-z]+$|^(?:rgb|hsl)a?\([0-9.,%/ ]+\)$/i.test(colour)
    ? svg.replaceAll('currentColor', colour)
    : svg;
}

function attribute(attributes: string, name: string): string | undefined {
  return new RegExp(`(?:^|\\s)${name}='([^']*)'`).exec(attributes)?.[1];
}

function declaration(style: string, name: string): string | undefined {
  return new RegExp(`(?:^|;)${name}:([^;]*)`).exec(style)?.[1];
}

function readPath(attributes: string): Shape | null {
  const d = attribute(attributes, 'd');
  if (d === undefined) return null;
  const short = shortPath(d);
  const style = attribute(attributes, 'style');
  if (style === undefined) return { d: short, look: looks.glyph };
  const fill = declaration(style, 'fill');
  if (fill === '#FF0000' || declaration(style, 'stroke') === '#FF0000')
    return { d: short, look: looks.highlight };
  if (fill !== undefined && fill !== 'none') return { d: short, look: looks.solid };
  const width = Number.parseFloat(declaration(style, 'stroke-width') ?? '1');
  return { d: short, look: looks.line(String(width)) };
}

/** RDKit draws emphasized atoms so; a dot is a line of no length with round ends. */
function readEllipse(attributes: string): Shape | null {
  const [x, y, radius] = ['cx', 'cy', 'rx'].map((name) =>
    Number.parseFloat(attribute(attributes, name) ?? ''),
  );
  if (![x, y, radius].every((value) => Number.isFinite(value))) return null;
  const look =
    'fill="none" stroke="currentColor" stroke-opacity="0.22" stroke-linecap="round" ' +
    `stroke-width="${(2 * radius!).toFixed(1)}"`;
  return { d: `M${x!.toFixed(1)} ${y!.toFixed(1)}h0`, look };
}

/** RDKit writes one decimal, commas and line breaks; numbers separated by single blanks say the same. */
function shortPath(d: string): string {
  return d
    .replace(/[\s,]+/g, ' ')
    .replace(/ ?([MLQCZ]) ?/gi, '$1')
    .replace(/\.0(?=\D|$)/g, '')
    .trim();
}

/** RDKit writes absolute coordinates only. */
function boundsOf(shapes: readonly Shape[]) {
  let left = Infinity;
  let top = Infinity;
  let right = -Infinity;
  let bottom = -Infinity;
  for (const { d } of shapes) {
    for (const [, x, y] of d.matchAll(/[MLQC ](-?[\d.]+) (-?[\d.]+)/g)) {
      left = Math.min(left, Number(x));
      right = Math.max(right, Number(x));
      top = Math.min(top, Number(y));
      bottom = Math.max(bottom, Number(y));
    }
  }
  return { left, top, right, bottom };
}

/** The layers of an InChI (IUPAC International Chemical Identifier, technical manual 1.06, 2020). */
import type { TextRange } from '../../chemistry/text.ts';

export interface InchiLayer {
  /** `formula`, or the layer's letter; within the isotopic layer `i/` stands before it. */
  readonly key: string;
  readonly text: string;
  /** In the InChI, without the slash before it. */
  readonly range: TextRange;
}

export interface Inchi {
  readonly standard: boolean;
  readonly layers: readonly InchiLayer[];
}

/** Undefined when it does not begin as an InChI does. */
export function readInchi(text: string): Inchi | undefined {
  const head = /^InChI=1(S?)\//.exec(text);
  if (head === null) return undefined;
  const layers: InchiLayer[] = [];
  let part = '';
  let at = head[0].length;
  for (const piece of text.slice(at).split('/')) {
    const range = { start: at, end: at + piece.length };
    at = range.end + 1;
    if (layers.length === 0 && /^[A-Z0-9]/.test(piece)) {
      layers.push({ key: 'formula', text: piece, range });
      continue;
    }
    const letter = piece[0] ?? '';
    // What follows an isotopic, fixed-hydrogen or reconnected layer belongs to it.
    if (letter === 'i' || letter === 'f' || letter === 'r') {
      part = `${letter}/`;
      layers.push({ key: letter, text: piece, range });
    } else layers.push({ key: `${part}${letter}`, text: piece, range });
  }
  return { standard: head[1] === 'S', layers };
}

export type LayerKind = 'formula' | 'connections' | 'hydrogens' | 'charge' | 'isotopes' | 'stereo';

/** Undefined for layers that a standard InChI does not have. */
export function kindOfLayer(key: string): LayerKind | undefined {
  const last = key.at(-1)!;
  if (key === 'formula') return 'formula';
  if (key.startsWith('f') || key.startsWith('r')) return undefined;
  if ('btms'.includes(last)) return 'stereo';
  if (key.startsWith('i')) return 'isotopes';
  if (last === 'c') return 'connections';
  if (last === 'h') return 'hydrogens';
  return last === 'q' || last === 'p' ? 'charge' : undefined;
}

const order: readonly LayerKind[] = ['formula', 'connections', 'hydrogens', 'charge', 'isotopes', 'stereo'];

/** The first kind of layer in which the two differ, or undefined. */
export function firstDifference(first: Inchi, second: Inchi): LayerKind | undefined {
  return order.find((kind) => textOf(first, kind) !== textOf(second, kind));
}

/** All layers of one kind, joined; empty when there are none. */
export function textOf(inchi: Inchi, kind: LayerKind): string {
  return inchi.layers
    .filter((layer) => kindOfLayer(layer.key) === kind)
    .map((layer) => `${layer.key}=${layer.text}`)
    .join('/');
}

/** Where the layers of one kind stand; undefined when there are none. */
export function rangeOf(inchi: Inchi, kind: LayerKind): TextRange | undefined {
  const layers = inchi.layers.filter((layer) => kindOfLayer(layer.key) === kind);
  const [first] = layers;
  return first && { start: first.range.start, end: layers.at(-1)!.range.end };
}

/** Whether the two differ only in the layer that tells mirror images apart (`/m`). */
export function areMirrorImages(first: Inchi, second: Inchi): boolean {
  const without = ({ layers }: Inchi) =>
    layers
      .filter((layer) => !layer.key.endsWith('m'))
      .map((layer) => layer.text)
      .join('/');
  const mirror = ({ layers }: Inchi) => layers.find((layer) => layer.key.endsWith('m'))?.text;
  const [one, other] = [mirror(first), mirror(second)];
  return one !== undefined && other !== undefined && one !== other && without(first) === without(second);
}

/**
 * Which of the stated arrangements can say something. A statement is idle when the structure has a symmetry that leaves
 * every stated centre where it is, respects the other statements, and turns this one into its opposite: two equal
 * ligands, or ring halves that nothing tells apart. What depends on how other centres are arranged (the middle of a
 * pentane-2,3,4-triol) is never idle here; the enumeration of stereoisomers finds that out.
 */
import { bondKinds, type CanonicalGraph, canonicalGraph, RESONANT } from './canonical-graph.ts';
import { initialColouring } from './canonical-refine.ts';
import { canonicalLabelling } from './canonical-search.ts';
import { atomsOfPlace, IMPLICIT_LIGAND, type Molecule, type StereoElement, withStereo } from './molecule.ts';
import { connectedParts, smallestRingThrough } from './rings.ts';

/** The elements of `molecule.stereo` that matter, in their order. The molecule must be in its normal spelling. */
export function effectiveStereo(molecule: Molecule): StereoElement[] {
  if (molecule.stereo.length === 0) return [];
  const kinds = bondKinds(molecule);
  const graphs = connectedParts(molecule).map((members) =>
    canonicalGraph(molecule, members, kinds, { stereo: false }),
  );
  const classes = new Int32Array(molecule.atoms.length);
  for (const graph of graphs) {
    const { colours } = initialColouring(graph, { steps: 0 });
    graph.atoms.forEach((atom, vertex) => (classes[atom] = colours[vertex]!));
  }
  let kept = molecule.stereo.filter(
    (element) => element.kind !== 'double-bond' || hasSides(molecule, element.ends, kinds),
  );
  // Dropping one statement can make another meaningless, so this goes on until nothing changes.
  for (let before = -1; before !== kept.length;) {
    before = kept.length;
    for (const element of [...kept]) {
      const swaps = suspectSwaps(molecule, element, classes);
      if (swaps.length === 0) continue;
      const others = kept.filter((other) => other !== element);
      if (swaps.some((swap) => hasSymmetry(withStereo(molecule, others), kinds, element, swap)))
        kept = others;
    }
  }
  return kept;
}

/**
 * A double bond that another Kekulé form moves away has no sides of its own, and in a ring of fewer than eight atoms
 * there is only one way for it to be.
 */
function hasSides(molecule: Molecule, ends: readonly [number, number], kinds: readonly number[]): boolean {
  const link = molecule.neighbours[ends[0]]!.find(({ atom }) => atom === ends[1]);
  if (link === undefined) return true;
  return kinds[link.bond] !== RESONANT && smallestRingThrough(molecule, link.bond, 7) === undefined;
}

/** Exchanges of ligands that would turn the statement round, as pairs of lists: these ligands onto those. */
type Swap = readonly [from: readonly number[], to: readonly number[]];

function suspectSwaps(molecule: Molecule, element: StereoElement, classes: Int32Array): Swap[] {
  const alike = (first: number, second: number) =>
    first !== IMPLICIT_LIGAND && second !== IMPLICIT_LIGAND && classes[first] === classes[second];
  if (element.kind === 'tetrahedral') {
    const swaps: Swap[] = [];
    const { ligands } = element;
    for (const image of oddImages(ligands)) {
      if (image.every((ligand, index) => ligand === ligands[index] || alike(ligand, ligands[index]!)))
        swaps.push([ligands, image]);
    }
    return swaps;
  }
  if (element.kind === 'double-bond') {
    const swaps: Swap[] = [];
    for (const side of [0, 1] as const) {
      const pair = endLigands(molecule, element.ends[side], element.ends);
      const [first, second] = pair;
      if (first === undefined || second === undefined || !alike(first, second)) continue;
      swaps.push([
        [element.ends[0], element.ends[1], first, second],
        [element.ends[0], element.ends[1], second, first],
      ]);
    }
    return swaps;
  }
  if (element.kind === 'axis') {
    const [a, b, c, d] = element.ligands;
    const swaps: Swap[] = [];
    if (alike(a, b))
      swaps.push([
        [a, b, c, d],
        [b, a, c, d],
      ]);
    if (alike(c, d))
      swaps.push([
        [a, b, c, d],
        [a, b, d, c],
      ]);
    return swaps;
  }
  return [];
}

function endLigands(molecule: Molecule, end: number, ends: readonly number[]): number[] {
  return molecule.neighbours[end]!.filter(
    (neighbour) => !ends.includes(neighbour.atom) && molecule.bonds[neighbour.bond]!.order === 1,
  ).map((neighbour) => neighbour.atom);
}

/** The six exchanges of two and the six cycles of all four. */
function oddImages([a, b, c, d]: readonly [number, number, number, number]): (readonly number[])[] {
  return [
    [b, a, c, d],
    [c, b, a, d],
    [d, b, c, a],
    [a, c, b, d],
    [a, d, c, b],
    [a, b, d, c],
    [b, c, d, a],
    [b, d, a, c],
    [c, a, d, b],
    [c, d, b, a],
    [d, a, b, c],
    [d, c, a, b],
  ];
}

/**
 * Whether some symmetry maps the first list of atoms onto the second, one by one, and leaves every other atom that
 * carries a statement where it is.
 */
function hasSymmetry(
  molecule: Molecule,
  kinds: readonly number[],
  element: StereoElement,
  [from, to]: Swap,
): boolean {
  const [place] = atomsOfPlace(element);
  const members = connectedParts(molecule).find((part) => part.includes(place!))!;
  const graph = canonicalGraph(molecule, members, kinds);
  const vertexOf = new Map(members.map((atom, vertex) => [atom, vertex]));
  const ownColours = [...new Set(graph.colours)].sort((first, second) => first - second);
  const colourOf = new Map(ownColours.map((colour, index) => [colour, index]));
  const fixed = [place!, ...molecule.stereo.flatMap(atomsOfPlace)];
  if (from.some((ligand, index) => ligand !== to[index] && fixed.includes(ligand))) return false;
  const marked = (atoms: readonly number[]) => {
    const colours = graph.colours.map((colour) => colourOf.get(colour)!);
    [...fixed, ...atoms].forEach((atom, index) => {
      const vertex = vertexOf.get(atom);
      // The first mark counts: a ligand that must stay where it is cannot be exchanged.
      if (vertex !== undefined && colours[vertex]! < ownColours.length)
        colours[vertex]! += (index + 1) * ownColours.length;
    });
    return canonicalLabelling({ ...graph, colours } satisfies CanonicalGraph).certificate.join(' ');
  };
  return marked(from) === marked(to);
}

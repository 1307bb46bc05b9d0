/** A candidate and a statement about it: from the one to the other and back. */
import { isOddPermutation } from './canonical-stereo.ts';
import type { StereoElement } from './molecule.ts';
import type { StereoCandidate } from './stereo-candidates.ts';

/** The arrangement with `value` true is the clockwise one, or the one with both ligands on the same side. */
export function elementFor(candidate: StereoCandidate, value: boolean): StereoElement {
  return candidate.kind === 'double-bond'
    ? { ...candidate, sameSide: value }
    : { ...candidate, clockwise: value };
}

/** The value that a statement gives a candidate, in the candidate's own order of ligands; undefined if it is about another place. */
export function valueAt(candidate: StereoCandidate, element: StereoElement): boolean | undefined {
  if (element.kind === 'tetrahedral') {
    if (candidate.kind !== 'tetrahedral' || element.centre !== candidate.centre) return undefined;
    const odd = isOddPermutation(candidate.ligands.map((ligand) => element.ligands.indexOf(ligand)));
    return element.clockwise !== odd;
  }
  if (element.kind === 'double-bond') {
    if (candidate.kind !== 'double-bond' || !sameEnds(element.ends, candidate.ends)) return undefined;
    const [first, second] =
      element.ends[0] === candidate.ends[0] ? element.ligands : [element.ligands[1], element.ligands[0]];
    const turned = (first !== candidate.ligands[0]) !== (second !== candidate.ligands[1]);
    return element.sameSide !== turned;
  }
  if (element.kind === 'axis') {
    if (candidate.kind !== 'axis' || !sameEnds(element.ends, candidate.ends)) return undefined;
    const straight = element.ends[0] === candidate.ends[0];
    const [a, b, c, d] = element.ligands;
    const [first, , second] = straight ? [a, b, c, d] : [c, d, a, b];
    const turned = (first !== candidate.ligands[0]) !== (second !== candidate.ligands[2]);
    return element.clockwise !== turned;
  }
  return undefined;
}

/** The same statement about the atoms that `map` sends its atoms to. */
export function mappedElement(element: StereoElement, map: (atom: number) => number): StereoElement {
  const at = (atom: number) => (atom < 0 ? atom : map(atom));
  switch (element.kind) {
    case 'tetrahedral': {
      const [a, b, c, d] = element.ligands;
      return { ...element, centre: at(element.centre), ligands: [at(a), at(b), at(c), at(d)] };
    }
    case 'double-bond':
      return {
        ...element,
        ends: [at(element.ends[0]), at(element.ends[1])],
        ligands: [at(element.ligands[0]), at(element.ligands[1])],
      };
    case 'axis': {
      const [a, b, c, d] = element.ligands;
      return {
        ...element,
        ends: [at(element.ends[0]), at(element.ends[1])],
        ligands: [at(a), at(b), at(c), at(d)],
      };
    }
    default:
      return { ...element, centre: at(element.centre), ligands: element.ligands.map(at) };
  }
}

function sameEnds(first: readonly [number, number], second: readonly [number, number]): boolean {
  return (
    (first[0] === second[0] && first[1] === second[1]) || (first[0] === second[1] && first[1] === second[0])
  );
}

/** Polycyclic skeletons from their descriptors: von Baeyer (P-23.2) and spiro (P-24.2) nomenclature. */
import type { SkeletonAtom, SkeletonGraph } from '../build/skeleton.ts';

const pattern =
  /((?:bi|tri|tetra|penta|hexa)?)cyclo[[(](\d+\.\d+(?:\.\d+)*(?:[\^.]?[({]?[\d.,^(){} ]*)?)[\])]/y;
const spiroPattern = /spiro[[(](\d+)\.(\d+)[\])]/y;

export interface Descriptor {
  readonly end: number;
  /** The skeleton for a stem of so many carbons, or undefined when the numbers disagree. */
  skeleton(size: number): SkeletonGraph | undefined;
}

/** `bicyclo[2.2.1]`, `tricyclo[5.3.1.0^1,5]` or `spiro[4.5]` at the offset. */
export function descriptorAt(text: string, offset: number): Descriptor | undefined {
  spiroPattern.lastIndex = offset;
  const spiro = spiroPattern.exec(text);
  if (spiro) {
    const [small, large] = [Number(spiro[1]), Number(spiro[2])];
    return { end: spiroPattern.lastIndex, skeleton: (size) => spiroSkeleton(small, large, size) };
  }
  pattern.lastIndex = offset;
  const match = pattern.exec(text);
  if (!match) return undefined;
  const bridges = readBridges(match[2]!);
  const rings = { bi: 2, tri: 3, tetra: 4, penta: 5, hexa: 6 }[match[1]!];
  if (!bridges || rings === undefined) return undefined;
  return { end: pattern.lastIndex, skeleton: (size) => vonBaeyerSkeleton(bridges, rings, size) };
}

interface Bridges {
  readonly main: readonly [number, number, number];
  readonly secondary: readonly (readonly [size: number, from: number, to: number])[];
}

/** `5.3.1.0^{1,5}` and the flat print `5.3.1.01,5`, where the first digit of a secondary bridge is its size. */
function readBridges(text: string): Bridges | undefined {
  const parts = text.replace(/[{}()^ ]/g, '').split('.');
  if (parts.length < 3) return undefined;
  const main = parts.slice(0, 3).map(Number) as [number, number, number];
  const secondary: [number, number, number][] = [];
  for (const part of parts.slice(3)) {
    const match = /^(\d)(\d+),(\d+)$/.exec(part);
    if (!match) return undefined;
    secondary.push([Number(match[1]), Number(match[2]), Number(match[3])]);
  }
  return main.some((one) => !Number.isFinite(one)) ? undefined : { main, secondary };
}

/** P-23.2.3: numbering runs from a main bridgehead round the longer branch, back by the shorter, then the bridge. */
function vonBaeyerSkeleton(bridges: Bridges, rings: number, size: number): SkeletonGraph | undefined {
  const [first, second, third] = bridges.main;
  const total = first + second + third + 2 + bridges.secondary.reduce((sum, [own]) => sum + own, 0);
  if (total !== size || rings !== 2 + bridges.secondary.length || size > 200) return undefined;
  const bonds: { from: number; to: number; order: number }[] = [];
  const path = (from: number, start: number, length: number, to: number) => {
    let last = from;
    for (let index = 0; index < length; index++) {
      bonds.push({ from: last, to: start + index, order: 1 });
      last = start + index;
    }
    bonds.push({ from: last, to, order: 1 });
  };
  const other = first + 1;
  path(0, 1, first, other);
  path(other, other + 1, second, 0);
  // The main bridge is numbered on from the atom nearer to main bridgehead 1.
  path(0, other + second + 1, third, other);
  let next = first + second + third + 2;
  for (const [own, low, high] of bridges.secondary) {
    if (low < 1 || high < 1 || low > next || high > next || low === high) return undefined;
    // P-23.2.5.1.3: each secondary bridge is numbered from the end nearer to the highest numbered bridgehead.
    path(Math.max(low, high) - 1, next, own, Math.min(low, high) - 1);
    next += own;
  }
  return graph(size, bonds);
}

/** P-24.2.1: the smaller ring is numbered first, then through the spiro atom round the larger one. */
function spiroSkeleton(small: number, large: number, size: number): SkeletonGraph | undefined {
  if (small + large + 1 !== size || size > 200 || small > large) return undefined;
  const bonds: { from: number; to: number; order: number }[] = [];
  for (let atom = 0; atom < size - 1; atom++) bonds.push({ from: atom, to: atom + 1, order: 1 });
  bonds.push({ from: 0, to: small, order: 1 }, { from: small, to: size - 1, order: 1 });
  return graph(size, bonds);
}

function graph(size: number, bonds: SkeletonGraph['bonds']): SkeletonGraph {
  const atoms = Array.from({ length: size }, (_, index): SkeletonAtom => ({
    atomicNumber: 6,
    charge: 0,
    isotope: 0,
    locants: [String(index + 1)],
    mancude: false,
  }));
  return { kind: 'ring', atoms, bonds, indicated: [], stereo: [] };
}

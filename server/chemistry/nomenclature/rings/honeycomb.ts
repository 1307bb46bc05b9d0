/** Six-membered carbon rings laid out as cells of a honeycomb. */
import type { Cell } from '../vocabulary/benzenoids.ts';
import { bondKey, type FusedSystem } from './fused-system.ts';

/** The corners of a cell in order, in units in which all corners of all cells are whole numbers. */
const corners: readonly Cell[] = [
  [1, 1],
  [-1, 2],
  [-2, 1],
  [-1, -1],
  [1, -2],
  [2, -1],
];

/** The ring system whose rings are the cells; each cell once. */
export function honeycomb(cells: readonly Cell[]): FusedSystem {
  const atoms = new Map<string, number>();
  const bonds = new Map<string, { from: number; to: number }>();
  const rings = cells.map(([q, r]) =>
    corners.map(([dq, dr]) => {
      const key = `${String(3 * q + dq)} ${String(3 * r + dr)}`;
      const known = atoms.get(key) ?? atoms.size;
      atoms.set(key, known);
      return known;
    }),
  );
  for (const ring of rings) {
    ring.forEach((from, index) => {
      const to = ring[(index + 1) % ring.length]!;
      bonds.set(bondKey(from, to), { from, to });
    });
  }
  return { elements: Array.from(atoms, () => 6), bonds: [...bonds.values()], rings };
}

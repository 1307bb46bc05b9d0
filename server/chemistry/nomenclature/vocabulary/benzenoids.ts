/**
 * Hydrocarbons of six-membered rings, IUPAC Recommendations 2013: retained names P-25.1.1 (table 2.7), and the series of
 * P-25.1.2.1 (polyacenes, a straight row) and P-25.1.2.2 (polyaphenes, two straight rows with a ring in common).
 */
import { numericalTerm } from './numbers.ts';

/** A cell by its coordinates along two axes at 60°; its neighbours differ by ±(1,0), ±(0,1) and ±(1,-1). */
export type Cell = readonly [q: number, r: number];

/** Name without final e, and its rings as cells of a honeycomb; numbered by the rules. */
export type BenzenoidLine = readonly [name: string, cells: readonly Cell[]];

const row = (length: number, from: Cell, [q, r]: Cell): Cell[] =>
  Array.from({ length }, (_, index): Cell => [from[0] + index * q, from[1] + index * r]);

const cellsOf = (text: string): Cell[] =>
  text.split(' ').map((cell) => cell.split(',').map(Number) as [number, number]);

const polyacenes = Array.from({ length: 9 }, (_, index): BenzenoidLine => {
  const size = index + 4;
  return [`${numericalTerm(size).replace(/a$/, '')}acen`, row(size, [0, 0], [1, 0])];
});

const polyaphenes = Array.from({ length: 7 }, (_, index): BenzenoidLine => {
  const size = index + 4;
  const along = Math.ceil((size + 1) / 2);
  const cells = [...row(along, [0, 0], [1, 0]), ...row(size - along, [along - 1, 1], [0, 1])];
  return [`${numericalTerm(size).replace(/a$/, '')}aphen`, cells];
});

const named: readonly BenzenoidLine[] = [
  ['naphthacen', row(4, [0, 0], [1, 0])],
  ['phenalen', cellsOf('0,0 1,0 0,1')],
  ['chrysen', cellsOf('0,0 1,0 1,1 2,1')],
  ['triphenylen', cellsOf('0,0 1,0 -1,1 0,-1')],
  ['perylen', cellsOf('0,0 1,0 0,1 -1,0 0,-1')],
  ['picen', cellsOf('0,0 1,0 1,1 2,1 2,2')],
  ['coronen', cellsOf('0,0 1,0 0,1 -1,1 -1,0 0,-1 1,-1')],
  ['ovalen', cellsOf('0,0 1,0 0,1 -1,1 -1,0 0,-1 1,-1 2,0 1,1 2,-1')],
];

export const benzenoids: readonly BenzenoidLine[] = [...named, ...polyacenes, ...polyaphenes];

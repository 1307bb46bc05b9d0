/**
 * Bridges of fused systems: IUPAC Recommendations 2013, P-25.4.2.1 (tables 2.9 and 2.10); `imino` and `o-benzeno` of the
 * 1979 rules A-34 and B-15.
 * Each line: prefix, SMILES numbered from the end at the higher bridgehead, index of the atom at the other bridgehead.
 */
export type BridgeLine = readonly [prefix: string, smiles: string, last: number];

export const bridges: readonly BridgeLine[] = [
  ['methano', 'C', 0],
  ['ethano', 'CC', 1],
  ['etheno', 'C=C', 1],
  ['propano', 'CCC', 2],
  ['butano', 'CCCC', 3],
  ['epoxy', 'O', 0],
  ['epithio', 'S', 0],
  ['episeleno', '[Se]', 0],
  ['epimino', 'N', 0],
  ['imino', 'N', 0],
  ['epidioxy', 'OO', 1],
  ['epidithio', 'SS', 1],
  ['[1,2]benzeno', 'c1ccccc1', 1],
  ['o-benzeno', 'c1ccccc1', 1],
];

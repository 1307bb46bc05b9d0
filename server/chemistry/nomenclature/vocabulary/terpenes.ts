/**
 * Terpenes with retained names, and their groups. The structure drawn is the enantiomer whose sign of rotation stands
 * beside it; the sign before a name chooses, and without one both enantiomers are meant, as the trade sells them. Names
 * and signs: common practice, no source; a test derives each configuration from the systematic name.
 * Each line: name without final e, SMILES (a group's begins with `*`, what it is bound to), locants in that order, sign.
 */
export type TerpeneLine = readonly [name: string, smiles: string, locants: string, sign: '+' | '-' | ''];

export const terpenes: readonly TerpeneLine[] = [
  ['menthol', 'O[C@@H]1C[C@H](C)CC[C@H]1C(C)C', '- 1 6 5 - 4 3 2 - - -', '-'],
  ['isopulegol', 'O[C@@H]1C[C@H](C)CC[C@H]1C(C)=C', '- 1 6 5 - 4 3 2 - - -', '-'],
  ['menthon', 'O=C1C[C@H](C)CC[C@H]1C(C)C', '- 1 6 5 - 4 3 2 - - -', '-'],
  ['pulegon', 'O=C1C[C@H](C)CCC1=C(C)C', '- 1 6 5 - 4 3 2 - - -', '+'],
  ['camphor', 'O=C1C[C@H]2CC[C@]1(C)C2(C)C', '- 2 3 4 5 6 1 10 7 8 9', '+'],
  ['borneol', 'O[C@H]1C[C@H]2CC[C@]1(C)C2(C)C', '- 2 3 4 5 6 1 10 7 8 9', '+'],
  ['isoborneol', 'O[C@@H]1C[C@H]2CC[C@]1(C)C2(C)C', '- 2 3 4 5 6 1 10 7 8 9', '-'],
  ['fenchon', 'O=C1[C@@]2(C)CC[C@H](C2)C1(C)C', '- 2 1 10 6 5 4 7 3 8 9', '+'],
  ['limonen', 'CC1=CC[C@@H](CC1)C(C)=C', '7 1 2 3 4 5 6 8 9 10', '+'],
  ['carvon', 'CC1=CC[C@H](CC1=O)C(C)=C', '- 2 3 4 5 6 1 - - - -', '-'],
  ['α-pinen', 'CC1=CC[C@@H]2C[C@H]1C2(C)C', '- 2 3 4 5 7 1 6 8 9', '+'],
  ['β-pinen', 'C=C1CC[C@@H]2C[C@H]1C2(C)C', '- 2 3 4 5 7 1 6 8 9', '+'],
  ['α-terpineol', 'CC1=CC[C@@H](CC1)C(C)(C)O', '7 1 2 3 4 5 6 8 9 10 -', '+'],
  ['linalool', 'CC(C)=CCC[C@@](C)(O)C=C', '8 7 - 6 5 4 3 - - 2 1', '-'],
  ['citronellol', 'OCC[C@H](C)CCC=C(C)C', '- 1 2 3 - 4 5 6 7 8 -', '+'],
  ['citronellal', 'O=CC[C@H](C)CCC=C(C)C', '- 1 2 3 - 4 5 6 7 8 -', '+'],
  ['perillyl alcohol', 'OCC1=CC[C@H](CC1)C(C)=C', '', '-'],
  ['perillaldehyd', 'O=CC1=CC[C@H](CC1)C(C)=C', '', '-'],
  ['geraniol', 'OC/C=C(\\C)CCC=C(C)C', '- 1 2 3 - 4 5 6 7 8 -', ''],
  ['nerol', 'OC/C=C(/C)CCC=C(C)C', '- 1 2 3 - 4 5 6 7 8 -', ''],
  ['farnesol', 'OCC=C(C)CCC=C(C)CCC=C(C)C', '- 1 2 3 - 4 5 6 7 - 8 9 10 11 12 -', ''],
  ['prenol', 'OCC=C(C)C', '- 1 2 3 4 -', ''],
];

export const terpeneGroups: readonly TerpeneLine[] = [
  ['menthyl', '*[C@@H]1C[C@H](C)CC[C@H]1C(C)C', '1 6 5 - 4 3 2 - - -', '-'],
  ['isopulegyl', '*[C@@H]1C[C@H](C)CC[C@H]1C(C)=C', '1 6 5 - 4 3 2 - - -', '-'],
  ['bornyl', '*[C@H]1C[C@H]2CC[C@]1(C)C2(C)C', '2 3 4 5 6 1 10 7 8 9', '+'],
  ['isobornyl', '*[C@@H]1C[C@H]2CC[C@]1(C)C2(C)C', '2 3 4 5 6 1 10 7 8 9', '-'],
  ['linalyl', '*[C@@](C)(C=C)CCC=C(C)C', '3 - 2 1 4 5 6 7 8 -', '-'],
  ['terpinyl', '*C(C)(C)[C@H]1CCC(C)=CC1', '', '+'],
  ['citronellyl', '*CC[C@H](C)CCC=C(C)C', '1 2 3 - 4 5 6 7 8 -', '+'],
  ['geranyl', '*C/C=C(\\C)CCC=C(C)C', '1 2 3 - 4 5 6 7 8 -', ''],
  ['neryl', '*C/C=C(/C)CCC=C(C)C', '1 2 3 - 4 5 6 7 8 -', ''],
  ['farnesyl', '*CC=C(C)CCC=C(C)CCC=C(C)C', '1 2 3 - 4 5 6 7 - 8 9 10 11 12 -', ''],
  ['prenyl', '*CC=C(C)C', '1 2 3 4 -', ''],
];

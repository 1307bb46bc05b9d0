/**
 * Fatty acids, phenolic acids and others named after where they were found. Names of fatty acids: IUPAC-IUB Nomenclature
 * of Lipids (1976), appendix A; the rest common practice, no source. Columns as in `acids.ts`.
 */
import type { AcidLine } from './acids.ts';

const fatty = (carbons: number) =>
  Array.from({ length: carbons }, (_, index) => String(carbons - index)).join(' ');

export const naturalAcids: readonly AcidLine[] = [
  ['pelargon', 'pelargon', 'CCCCCCCCC', fatty(9), '1'],
  ['undecylen', 'undecylen', 'C=CCCCCCCCCC', fatty(11), '1'],
  ['margar', 'margar', 'CCCCCCCCCCCCCCCCC', fatty(17), '1'],
  ['arachid', 'arachid', 'CCCCCCCCCCCCCCCCCCCC', fatty(20), '1'],
  ['behen', 'behen', 'CCCCCCCCCCCCCCCCCCCCCC', fatty(22), '1'],
  ['lignocer', 'lignocer', 'CCCCCCCCCCCCCCCCCCCCCCCC', fatty(24), '1'],
  ['palmitole', 'palmitole', 'CCCCCC/C=C\\CCCCCCCC', fatty(16), '1'],
  ['elaid', 'elaid', 'CCCCCCCC/C=C/CCCCCCCC', fatty(18), '1'],
  ['linole', 'linole', 'CCCCC/C=C\\C/C=C\\CCCCCCCC', fatty(18), '1'],
  ['α-linolen', 'α-linolen', 'CC/C=C\\C/C=C\\C/C=C\\CCCCCCCC', fatty(18), '1'],
  ['γ-linolen', 'γ-linolen', 'CCCCC/C=C\\C/C=C\\C/C=C\\CCCCC', fatty(18), '1'],
  ['arachidon', 'arachidon', 'CCCCC/C=C\\C/C=C\\C/C=C\\C/C=C\\CCCC', fatty(20), '1'],
  ['eruc', 'eruc', 'CCCCCCCC/C=C\\CCCCCCCCCCCC', fatty(22), '1'],
  ['sorb', 'sorb', 'C/C=C/C=C/C', fatty(6), '1'],
  ['brassyl', '', 'CCCCCCCCCCCCC', '1 2 3 4 5 6 7 8 9 10 11 12 13', '1 13'],
  ['citracon', 'citracon', 'C/C(C)=C\\C', '1 2 - 3 4', '1 4'],
  ['mesacon', 'mesacon', 'C/C(C)=C/C', '1 2 - 3 4', '1 4'],
  ['oxaloacet', 'oxaloacet', 'CC(=O)CC', '1 2 - 3 4', '1 4'],
  ['hippur', 'hippur', 'O=C(c1ccccc1)NCC', '- - 1 2 3 4 5 6 N α C', 'C'],
  ['benzil', 'benzil', 'c1ccccc1C(O)(c1ccccc1)C', "2 3 4 5 6 1 α O 1' 2' 3' 4' 5' 6' C", 'C'],
  ['2-furo', '2-fur', 'c1ccoc1C', '3 4 5 1 2 C', 'C'],
  ['3-furo', '3-fur', 'c1cocc1C', '4 5 1 2 3 C', 'C'],
  ['1-naphtho', '1-naphth', 'c1ccc2c(c1)cccc2C', '6 7 8 8a 4a 5 4 3 2 1 C', 'C'],
  ['2-naphtho', '2-naphth', 'c1ccc2c(c1)ccc(c2)C', '6 7 8 8a 4a 5 4 3 2 1 C', 'C'],
  ['gall', 'gall', 'Oc1cc(C)cc(O)c1O', '- 3 2 1 C 6 5 - 4 -', 'C'],
  ['syring', 'syring', 'COc1cc(C)cc(OC)c1O', '- - 3 2 1 C 6 5 - - 4 O', 'C'],
  ['protocatechu', 'protocatechu', 'Oc1ccc(C)cc1O', '- 4 5 6 1 C 2 3 -', 'C'],
  ['gentis', 'gentis', 'Oc1ccc(O)c(C)c1', '- 5 4 3 2 - 1 C 6', 'C'],
  ['homovanill', 'homovanill', 'COc1cc(CC)ccc1O', '- - 3 2 1 α C 6 5 4 O', 'C'],
  ['piperonyl', '', 'c1cc2OCOc2cc1C', '6 5 - - - - - 2 1 C', 'C'],
  ['p-coumar', 'p-coumar', 'Oc1ccc(/C=C/C)cc1', 'O 4 3 2 1 β α C 6 5', 'C'],
  ['caffe', 'caffe', 'Oc1ccc(/C=C/C)cc1O', '- 4 5 6 1 β α C 2 3 -', 'C'],
  ['ferul', 'ferul', 'COc1cc(/C=C/C)ccc1O', '- - 3 2 1 β α C 6 5 4 O', 'C'],
  ['sinap', 'sinap', 'COc1cc(/C=C/C)cc(OC)c1O', '- - 3 2 1 β α C 6 5 - - 4 O', 'C'],
];

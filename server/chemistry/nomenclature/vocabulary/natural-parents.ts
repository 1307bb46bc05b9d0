/**
 * Parents with retained names from natural products and dyes: nucleobases and purines (P-25.2.1, table 2.8, and P-106.1),
 * chromones, flavonoids and quinone-like ketones with the numbering of their ring. Names: P-64.5 and P-65.6.3.5 where
 * they are there, else common practice, no source.
 * Each line: name without final e, SMILES, locants in SMILES order, and the mark that tells siblings apart.
 */
import type { ParentLine } from './parents.ts';

export const naturalParents: readonly ParentLine[] = [
  ['uracil', 'O=c1cc[nH]c(=O)[nH]1', '- 4 5 6 1 2 - 3'],
  ['thymin', 'Cc1c[nH]c(=O)[nH]c1=O', '- 5 6 1 2 - 3 4 -'],
  ['cytosin', 'Nc1cc[nH]c(=O)n1', '4-N 4 5 6 1 2 - 3'],
  ['adenin', 'Nc1ncnc2[nH]cnc12', '6-N 6 1 2 3 4 9 8 7 5'],
  ['guanin', 'NC1=Nc2[nH]cnc2C(=O)N1', '2-N 2 3 4 9 8 7 5 6 - 1'],
  ['hypoxanthin', 'O=C1NC=Nc2[nH]cnc12', '- 6 1 2 3 4 9 8 7 5'],
  ['xanthin', 'O=C1NC(=O)c2[nH]cnc2N1', '- 2 1 6 - 5 7 8 9 4 3'],
  ['theophyllin', 'Cn1c(=O)c2[nH]cnc2n(C)c1=O', '- 1 6 - 5 7 8 9 4 3 - 2 -'],
  ['caffein', 'Cn1c(=O)c2n(C)cnc2n(C)c1=O', '- 1 6 - 5 7 - 8 9 4 3 - 2 -'],
  ['barbituric acid', 'O=C1CC(=O)NC(=O)N1', '- 4 5 6 - 1 2 - 3'],
  ['isatin', 'O=C1Nc2ccccc2C1=O', '- 2 1/N 7a 7 6 5 4 3a 3 -'],
  ['rhodanin', 'O=C1CSC(=S)N1', '- 4 5 1 2 - 3/N'],
  ['chromon', 'O=c1ccoc2ccccc12', '- 4 3 2 1 8a 8 7 6 5 4a'],
  ['flavon', 'O=c1cc(-c2ccccc2)oc2ccccc12', "- 4 3 2 1' 2' 3' 4' 5' 6' 1 8a 8 7 6 5 4a"],
  ['isoflavon', 'O=c1c(-c2ccccc2)coc2ccccc12', "- 4 3 1' 2' 3' 4' 5' 6' 2 1 8a 8 7 6 5 4a"],
  ['xanthon', 'O=c1c2ccccc2oc2ccccc12', '- 9 9a 1 2 3 4 4a 10 10a 5 6 7 8 8a'],
  ['anthron', 'O=C1c2ccccc2Cc2ccccc12', '- 9 9a 1 2 3 4 4a 10 10a 5 6 7 8 8a'],
  ['fluorenon', 'O=C1c2ccccc2-c2ccccc12', '- 9 9a 1 2 3 4 4a 4b 5 6 7 8 8a'],
  ['umbelliferon', 'O=c1ccc2ccc(O)cc2o1', '- 2 3 4 4a 5 6 7 O 8 8a 1'],
  ['tetralon', 'O=C1CCCc2ccccc12', '- 1 2 3 4 4a 5 6 7 8 8a', '1-'],
  ['tetralon', 'O=C1CCc2ccccc2C1', '- 2 3 4 4a 5 6 7 8 8a 1', '2-'],
  ['α-tetralon', 'O=C1CCCc2ccccc12', '- 1 2 3 4 4a 5 6 7 8 8a'],
  ['β-tetralon', 'O=C1CCc2ccccc2C1', '- 2 3 4 4a 5 6 7 8 8a 1'],
  ['indanon', 'O=C1CCc2ccccc12', '- 1 2 3 3a 4 5 6 7 7a', '1-'],
  ['indanon', 'O=C1Cc2ccccc2C1', '- 2 3 3a 4 5 6 7 7a 1', '2-'],
  ['chromanon', 'O=C1CCOc2ccccc12', '- 4 3 2 1 8a 8 7 6 5 4a', '4-'],
  ['oxindol', 'O=C1Cc2ccccc2N1', '- 2 3 3a 4 5 6 7 7a 1/N'],
];

/**
 * Amino acids with retained names, as the L enantiomer, with the locants of the recommendations. Source: IUPAC-IUB
 * Nomenclature and Symbolism for Amino Acids and Peptides (1983), 3AA-1 and 3AA-2; IUPAC Recommendations 2013, P-103.1.1.
 * Each line: name; acyl group (P-103.3); skeleton with the acid carbon but without its oxygen atoms; locants in that
 * order, several parted by `/`; locants of the acid carbons.
 */
export type AminoAcidLine = readonly [
  name: string,
  acyl: string,
  skeleton: string,
  locants: string,
  acids: string,
];

export const aminoAcids: readonly AminoAcidLine[] = [
  ['alanine', 'alanyl', 'C[C@H](N)C', '3/β 2/α N 1', '1'],
  ['β-alanine', 'β-alanyl', 'NCCC', 'N 3/β 2/α 1', '1'],
  ['arginine', 'arginyl', 'N[C@@H](CCCNC(=N)N)C', 'N/2-N/Nα 2/α 3/β 4/γ 5/δ 5-N/Nδ - - - 1', '1'],
  ['asparagine', 'asparaginyl', 'N[C@@H](CC(N)=O)C', 'N/2-N/Nα 2/α 3/β 4/γ 4-N/Nγ - 1', '1'],
  ['aspartic acid', '', 'N[C@@H](CC)C', 'N 2/α 3/β 4/γ 1', '1 4'],
  ['cysteine', 'cysteinyl', 'N[C@@H](CS)C', 'N 2/α 3/β S 1', '1'],
  ['glutamine', 'glutaminyl', 'N[C@@H](CCC(N)=O)C', 'N/2-N/Nα 2/α 3/β 4/γ 5/δ 5-N/Nδ - 1', '1'],
  ['glutamic acid', '', 'N[C@@H](CCC)C', 'N 2/α 3/β 4/γ 5/δ 1', '1 5'],
  ['glycine', 'glycyl', 'NCC', 'N 2/α 1', '1'],
  ['histidine', 'histidyl', 'N[C@@H](Cc1c[nH]cn1)C', 'N/Nα α β - - - - - C', 'C'],
  ['homocysteine', 'homocysteinyl', 'N[C@@H](CCS)C', 'N 2/α 3/β 4/γ S 1', '1'],
  ['homoserine', 'homoseryl', 'N[C@@H](CCO)C', 'N 2/α 3/β 4/γ O 1', '1'],
  ['isoleucine', 'isoleucyl', 'CC[C@H](C)[C@H](N)C', '5/δ 4/γ 3/β - 2/α N 1', '1'],
  ['leucine', 'leucyl', 'CC(C)C[C@H](N)C', '5/δ 4/γ - 3/β 2/α N 1', '1'],
  ['lysine', 'lysyl', 'NCCCC[C@H](N)C', '6-N/Nε 6/ε 5/δ 4/γ 3/β 2/α N/2-N/Nα 1', '1'],
  ['methionine', 'methionyl', 'CSCC[C@H](N)C', '- - 4/γ 3/β 2/α N 1', '1'],
  ['norleucine', 'norleucyl', 'CCCC[C@H](N)C', '6/ε 5/δ 4/γ 3/β 2/α N 1', '1'],
  ['norvaline', 'norvalyl', 'CCC[C@H](N)C', '5/δ 4/γ 3/β 2/α N 1', '1'],
  ['ornithine', 'ornithyl', 'NCCC[C@H](N)C', '5-N/Nδ 5/δ 4/γ 3/β 2/α N/2-N/Nα 1', '1'],
  ['phenylalanine', 'phenylalanyl', 'N[C@@H](Cc1ccccc1)C', 'N α β 1 2 3 4 5 6 C', 'C'],
  ['proline', 'prolyl', 'C[C@@H]1CCCN1', 'C 2/α 3/β 4/γ 5/δ 1/N', 'C'],
  ['sarcosine', 'sarcosyl', 'CNCC', '- N 2/α 1', '1'],
  ['serine', 'seryl', 'N[C@@H](CO)C', 'N 2/α 3/β O 1', '1'],
  ['threonine', 'threonyl', 'C[C@@H](O)[C@H](N)C', '4/γ 3/β O 2/α N 1', '1'],
  ['tryptophan', 'tryptophyl', 'N[C@@H](Cc1c[nH]c2ccccc12)C', 'N/Nα α β 3 2 1 7a 7 6 5 4 3a C', 'C'],
  ['tyrosine', 'tyrosyl', 'N[C@@H](Cc1ccc(O)cc1)C', 'N α β 1 2 3 4 O/4-O 5 6 C', 'C'],
  ['valine', 'valyl', 'CC(C)[C@H](N)C', '4/γ 3/β - 2/α N 1', '1'],
  ['pyroglutamic acid', 'pyroglutamyl', 'C[C@@H]1CCC(=O)N1', 'C 2/α 3/β 4/γ 5 - 1/N', 'C'],
];

/**
 * Proteinogenic amino acids and a few others, as the L enantiomer. Source: IUPAC-IUB Nomenclature and Symbolism for Amino
 * Acids and Peptides (1983), 3AA-1, table 1; IUPAC Recommendations 2013, P-103.1.1.
 */
export const aminoAcids: readonly (readonly [name: string, smiles: string])[] = [
  ['alanine', 'C[C@H](N)C(=O)O'],
  ['arginine', 'N[C@@H](CCCNC(=N)N)C(=O)O'],
  ['asparagine', 'N[C@@H](CC(N)=O)C(=O)O'],
  ['aspartic acid', 'N[C@@H](CC(=O)O)C(=O)O'],
  ['cysteine', 'N[C@@H](CS)C(=O)O'],
  ['glutamine', 'N[C@@H](CCC(N)=O)C(=O)O'],
  ['glutamic acid', 'N[C@@H](CCC(=O)O)C(=O)O'],
  ['histidine', 'N[C@@H](Cc1c[nH]cn1)C(=O)O'],
  ['isoleucine', 'CC[C@H](C)[C@H](N)C(=O)O'],
  ['leucine', 'CC(C)C[C@H](N)C(=O)O'],
  ['lysine', 'NCCCC[C@H](N)C(=O)O'],
  ['methionine', 'CSCC[C@H](N)C(=O)O'],
  ['phenylalanine', 'N[C@@H](Cc1ccccc1)C(=O)O'],
  ['proline', 'OC(=O)[C@@H]1CCCN1'],
  ['serine', 'N[C@@H](CO)C(=O)O'],
  ['threonine', 'C[C@@H](O)[C@H](N)C(=O)O'],
  ['tryptophan', 'N[C@@H](Cc1c[nH]c2ccccc12)C(=O)O'],
  ['tyrosine', 'N[C@@H](Cc1ccc(O)cc1)C(=O)O'],
  ['valine', 'CC(C)[C@H](N)C(=O)O'],
  ['ornithine', 'NCCC[C@H](N)C(=O)O'],
  ['norleucine', 'CCCC[C@H](N)C(=O)O'],
  ['norvaline', 'CCC[C@H](N)C(=O)O'],
  ['homocysteine', 'N[C@@H](CCS)C(=O)O'],
];

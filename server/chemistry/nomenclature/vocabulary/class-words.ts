/**
 * Words that say what became of the compound named before them: `acetone oxime`, `benzoic acid methyl ester`. Source: IUPAC
 * Recommendations 2013, P-66.6.5 (acetals), P-68.3.1 (oximes, hydrazones, semicarbazones, azines) and P-66.5.3
 * (cyanohydrins); 1979 recommendations C-33, C-331, C-842, C-922 for those no longer preferred.
 */

/** Words without substituents of their own. */
export const classWords = [
  'ester',
  'salt',
  'acetal',
  'ketal',
  'hemiacetal',
  'hemiketal',
  'dithioacetal',
  'dithioketal',
  'cyanohydrin',
  'azine',
  'imine',
] as const;
export type ClassWord = (typeof classWords)[number];

/**
 * Nouns that take substituents: `2,4-dinitrophenylhydrazone`, `diethylamide`. Name, SMILES of what is put on (the first atom
 * is bound), locants in SMILES order, the atom that takes a group written directly before, what it is put on: the
 * nitrogen that replaces a carbonyl oxygen, or an acyl group in place of the acid's OH.
 */
export const derivativeWords: readonly (readonly [
  name: string,
  smiles: string,
  locants: string,
  linkAt: number,
  of: 'carbonyl' | 'acid',
])[] = [
  ['oxime', 'O', 'O', 0, 'carbonyl'],
  ['hydrazone', 'N', "N/N'/2", 0, 'carbonyl'],
  ['semicarbazone', 'NC(=O)N', '2 3 - 4', 3, 'carbonyl'],
  ['thiosemicarbazone', 'NC(=S)N', '2 3 - 4', 3, 'carbonyl'],
  ['amide', 'N', 'N', 0, 'acid'],
  ['anilide', 'Nc1ccccc1', 'N 1 2 3 4 5 6', 0, 'acid'],
  ['hydrazide', 'NN', "1/N 2/N'", 1, 'acid'],
  ['piperidide', 'N1CCCCC1', '1 2 3 4 5 6', 0, 'acid'],
  ['morpholide', 'N1CCOCC1', '4 3 2 1 6 5', 0, 'acid'],
];

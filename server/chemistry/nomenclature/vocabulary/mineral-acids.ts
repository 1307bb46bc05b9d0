/**
 * Acids of phosphorus, arsenic, antimony and boron that take substituents, their halides and amides, and esters with the
 * infixes of functional replacement. Source: IUPAC Recommendations 2013, P-67.1.1, P-67.1.2 and P-67.1.4; structures
 * from memory.
 */
import type { ParentLine } from './parents.ts';

const acids: readonly ParentLine[] = [
  ['phosphonic acid', 'OP(=O)O', '- P - -'],
  ['phosphinic acid', 'O[PH2]=O', '- P -'],
  ['phosphonous acid', 'OPO', '- P -'],
  ['phosphinous acid', 'OP', '- P'],
  ['arsonic acid', 'O[AsH](=O)O', '- As - -'],
  ['arsinic acid', 'O[AsH2]=O', '- As -'],
  ['stibonic acid', 'O[SbH](=O)O', '- Sb - -'],
  ['boronic acid', 'OBO', '- B -'],
  ['borinic acid', 'OB', '- B'],
  ['nitramid', 'N[N+](=O)[O-]', 'N - - -'],
  ['nitrous amid', 'NN=O', 'N - -'],
  ['phosphoric triamid', 'NP(=O)(N)N', "N - - N' N''"],
  ['phosphorous triamid', 'NP(N)N', "N - N' N''"],
  ['phosphorothioic triamid', 'NP(=S)(N)N', "N - - N' N''"],
  ['phosphonic diamid', 'NP(=O)N', "N P - N'"],
  ['phosphinic amid', 'N[PH2]=O', 'N P -'],
  ['sulfuric diamid', 'NS(=O)(=O)N', "N - - - N'"],
];

const halogens = [
  ['fluorid', 'F'],
  ['chlorid', 'Cl'],
  ['bromid', 'Br'],
  ['iodid', 'I'],
] as const;

/** `phenylphosphonic dichloride`, `diphenylphosphinous chloride`. */
const halides = halogens.flatMap(([name, symbol]): ParentLine[] => [
  [`phosphoric tri${name}`, `${symbol}P(=O)(${symbol})${symbol}`, ''],
  [`phosphorous tri${name}`, `${symbol}P(${symbol})${symbol}`, ''],
  [`phosphorothioic tri${name}`, `${symbol}P(=S)(${symbol})${symbol}`, ''],
  [`phosphonic di${name}`, `${symbol}P(=O)${symbol}`, '- P - -'],
  [`phosphonothioic di${name}`, `${symbol}P(=S)${symbol}`, '- P - -'],
  [`phosphonous di${name}`, `${symbol}P${symbol}`, '- P -'],
  [`phosphinic ${name}`, `${symbol}[PH2]=O`, '- P -'],
  [`phosphinothioic ${name}`, `${symbol}[PH2]=S`, '- P -'],
  [`phosphinous ${name}`, `${symbol}P`, '- P'],
]);

/** Acids as they stand, and with halogen in the place of hydroxy groups. */
export const mineralAcids: readonly ParentLine[] = [...acids, ...halides];

/** Anions as in `functions.ts`; a word with two lines leaves open which places are sulfur. */
export const mineralAnions: readonly (readonly [word: string, smiles: string, locants: string])[] = [
  ['boronat', '[O-]B[O-]', '@ B @'],
  ['borinat', '[O-]B', '@ B'],
  ['arsonat', '[O-][AsH](=O)[O-]', '@ As - @'],
  ['phosphonit', '[O-]P[O-]', '@ P @'],
  ['phosphinit', '[O-]P', '@ P'],
  ['phosphorothioat', '[O-]P(=S)([O-])[O-]', '@ - - @ @'],
  ['phosphorothioat', '[S-]P(=O)([O-])[O-]', '@ - - @ @'],
  ['phosphorodithioat', '[S-]P(=S)([O-])[O-]', '@ - - @ @'],
  ['phosphorodithioat', '[S-]P(=O)([S-])[O-]', '@ - - @ @'],
  ['phosphorotrithioat', '[S-]P(=O)([S-])[S-]', '@ - - @ @'],
  ['phosphorotrithioat', '[S-]P(=S)([S-])[O-]', '@ - - @ @'],
  ['phosphorothioit', '[S-]P([O-])[O-]', '@ - @ @'],
  ['phosphorotrithioit', '[S-]P([S-])[S-]', '@ - @ @'],
  ['phosphonothioat', '[O-]P(=S)[O-]', '@ P - @'],
  ['phosphonothioat', '[S-]P(=O)[O-]', '@ P - @'],
  ['phosphonodithioat', '[S-]P(=S)[O-]', '@ P - @'],
  ['phosphonodithioat', '[S-]P(=O)[S-]', '@ P - @'],
  ['phosphinothioat', '[O-][PH2]=S', '@ P -'],
  ['phosphinothioat', '[S-][PH2]=O', '@ P -'],
  ['phosphoramidat', 'NP(=O)([O-])[O-]', 'N - - @ @'],
  ['phosphorodiamidat', 'NP(=O)(N)[O-]', "N - - N' @"],
  ['phosphoramidothioat', 'NP(=S)([O-])[O-]', 'N - - @ @'],
  ['phosphoramidothioat', 'NP(=O)([S-])[O-]', 'N - - @ @'],
  ['phosphoramidit', 'NP([O-])[O-]', 'N - @ @'],
  ['phosphorofluoridat', 'FP(=O)([O-])[O-]', '- - - @ @'],
  ['phosphorodichloridat', 'ClP(=O)(Cl)[O-]', '- - - - @'],
  ['phosphonofluoridat', 'FP(=O)[O-]', '- P - @'],
  ['phosphonochloridat', 'ClP(=O)[O-]', '- P - @'],
];

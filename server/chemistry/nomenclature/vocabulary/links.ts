/**
 * Groups that join several others, or two places of one: in multiplicative names (`4,4'-oxydianiline`, P-15.3), as bridges
 * (`2,3-epoxypropyl`, P-63.5) and before function words (`ethylene dichloride`). Source: IUPAC Recommendations 2013,
 * P-15.3.1.2, P-29.3, P-63.2.2.1.2, P-67.1.4.1.1; `ethylene`, `phenylene`, `dithio` and their kin: 1979 rules A-4.2, A-11.6,
 * A-24.4, C-72.
 */

/** Name, SMILES, locants in SMILES order, the atoms (from 0) with a free valence, one entry for each, the atom that takes a substituent written before. */
export type LinkLine = readonly [
  name: string,
  smiles: string,
  locants: string,
  links: readonly number[],
  linkAt?: number,
];

export const links: readonly LinkLine[] = [
  ['ethylene', 'CC', '1/α 2/β', [0, 1]],
  ['propylene', 'CCC', '1 2 3', [0, 1]],
  ['vinylene', 'C=C', '1 2', [0, 1]],
  ['ethynylene', 'C#C', '1 2', [0, 1]],
  ['o-xylylene', 'Cc1c(C)cccc1', "α 1 2 α' 3 4 5 6", [0, 3]],
  ['m-xylylene', 'Cc1cc(C)ccc1', "α 1 2 3 α' 4 5 6", [0, 4]],
  ['p-xylylene', 'Cc1ccc(C)cc1', "α 1 2 3 4 α' 5 6", [0, 5]],
  ['sulfanediyl', 'S', '-', [0, 0]],
  ['selanediyl', '[Se]', '-', [0, 0]],
  ['disulfanediyl', 'SS', '-', [0, 1]],
  ['dithio', 'SS', '-', [0, 1]],
  ['diselanediyl', '[Se][Se]', '-', [0, 1]],
  ['peroxydiyl', 'OO', '-', [0, 1]],
  ['azanediyl', 'N', 'N', [0, 0], 0],
  ['nitrilo', 'N', 'N', [0, 0, 0]],
  ['azanetriyl', 'N', 'N', [0, 0, 0]],
  ['diazenediyl', 'N=N', '1 2', [0, 1]],
  ['hydrazo', 'NN', "N N'", [0, 1]],
  ['hydrazinediyl', 'NN', '1 2', [0, 1]],
  ['hydrazine-1,2-diyl', 'NN', '1 2', [0, 1]],
  ['diazane-1,2-diyl', 'NN', '1 2', [0, 1]],
  ['phosphanediyl', 'P', 'P', [0, 0], 0],
  ['phosphanetriyl', 'P', 'P', [0, 0, 0]],
  ['phosphinetriyl', 'P', 'P', [0, 0, 0]],
  ['silanediyl', '[SiH2]', 'Si', [0, 0], 0],
  ['silylene', '[SiH2]', 'Si', [0, 0], 0],
  ['ureylene', 'NC(=O)N', "N - - N'", [0, 3]],
  ['epoxy', 'O', '-', [0, 0]],
  ['epithio', 'S', '-', [0, 0]],
  ['epimino', 'N', 'N', [0, 0], 0],
  ['epiimino', 'N', 'N', [0, 0], 0],
  ['epidioxy', 'OO', '-', [0, 1]],
  ['sulfuryl', 'S(=O)=O', '-', [0, 0]],
  ['thionyl', 'S=O', '-', [0, 0]],
  ['thiocarbonyl', 'C=S', '-', [0, 0]],
  ['phosphoryl', 'P=O', '-', [0, 0, 0]],
  ['thiophosphoryl', 'P=S', '-', [0, 0, 0]],
  ['nitrosyl', 'N=O', '-', [0]],
  ['cyanogen', 'C#N', '-', [0]],
];

/** Substituent prefixes that join several groups as well, with the atoms of their free valences then. */
export const linkingToo: Readonly<Record<string, readonly number[]>> = {
  oxy: [0, 0],
  thio: [0, 0],
  seleno: [0, 0],
  carbonyl: [0, 0],
  carbonothioyl: [0, 0],
  sulfonyl: [0, 0],
  sulfinyl: [0, 0],
  imino: [0, 0],
  azo: [0, 1],
  peroxy: [0, 1],
};

/** Rings whose divalent group is numbered by the locants in front of it: `1,4-phenylene` (P-29.6.2.3; 1979 rule ). */
export const ringLinks: readonly (readonly [name: string, ring: string])[] = [
  ['phenylene', 'benzen'],
  ['naphthylene', 'naphthalen'],
];

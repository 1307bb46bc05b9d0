/**
 * Hydrides of elements other than carbon, mineral acids with groups on them, and metals with covalent bonds: IUPAC
 * Recommendations 2013, P-21.1.1, P-21.2, P-22.2.5, P-67.1 and P-69; hydrogen isotopes as prefixes: CAS usage. Structures
 * from memory.
 */
import { expect, it } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { withStereo } from '../../../server/chemistry/structure/molecule.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

const names: readonly (readonly [source: string, name: string, smiles: string])[] = [
  ['P-21.1.1', 'trioctylalumane', 'CCCCCCCC[Al](CCCCCCCC)CCCCCCCC'],
  ['P-21.1.1', 'trichlorogallane', 'Cl[Ga](Cl)Cl'],
  ['P-21.1.1', 'triphenylbismuthane', 'c1ccccc1[Bi](c1ccccc1)c1ccccc1'],
  ['P-21.1.1', 'diphenyltellane', 'c1ccccc1[Te]c1ccccc1'],
  ['P-21.1.1', 'phenyl-λ3-iodanediyl diacetate', 'CC(=O)OI(OC(C)=O)c1ccccc1'],
  ['P-21.1.1', '4-(dichloroalumanyl)butan-1-ol', 'OCCCC[Al](Cl)Cl'],
  ['P-21.2.2', 'trisilane', '[SiH3][SiH2][SiH3]'],
  ['P-21.2.2', 'tetrasulfane', 'SSSS'],
  ['P-21.2.2', 'triazane', 'NNN'],
  ['P-21.2.2', 'hexamethyldistannane', 'C[Sn](C)(C)[Sn](C)(C)C'],
  ['P-21.2.2', 'tetraphenyldiphosphane', 'c1ccccc1P(c1ccccc1)P(c1ccccc1)c1ccccc1'],
  ['P-21.2.3.1', '1,1,1,3,5,5,5-heptamethyltrisiloxane', 'C[Si](C)(C)O[SiH](C)O[Si](C)(C)C'],
  ['P-21.2.3.1', '1,1,1,3,3,3-hexamethyldisilazane', 'C[Si](C)(C)N[Si](C)(C)C'],
  ['P-21.2.3.1', 'hexabutyldistannoxane', 'CCCC[Sn](CCCC)(CCCC)O[Sn](CCCC)(CCCC)CCCC'],
  ['P-21.2.3.1', 'hexamethyldisilathiane', 'C[Si](C)(C)S[Si](C)(C)C'],
  [
    'P-21.2.3.1',
    'tetradecamethylhexasiloxane',
    'C[Si](C)(C)O[Si](C)(C)O[Si](C)(C)O[Si](C)(C)O[Si](C)(C)O[Si](C)(C)C',
  ],
  ['P-22.2.5', '2,2,4,4,6,6-hexamethylcyclotrisiloxane', 'C[Si]1(C)O[Si](C)(C)O[Si](C)(C)O1'],
  ['P-22.2.5', 'octamethylcyclotetrasiloxane', 'C[Si]1(C)O[Si](C)(C)O[Si](C)(C)O[Si](C)(C)O1'],
  ['P-68.2.5', '1,1,1-trimethylsilanamine', 'C[Si](C)(C)N'],
  ['P-14.1', '1,1,1-trifluoro-λ4-sulfanamine', 'NS(F)(F)F'],
  ['P-67.1.1', 'methylphosphonic acid', 'CP(=O)(O)O'],
  ['P-67.1.1', 'diphenylphosphinic acid', 'OP(=O)(c1ccccc1)c1ccccc1'],
  ['P-67.1.1', 'phenylboronic acid', 'OB(O)c1ccccc1'],
  ['P-67.1.1', 'diphenylborinic acid', 'OB(c1ccccc1)c1ccccc1'],
  ['P-67.1.1', '(4-hydroxyphenyl)arsonic acid', 'Oc1ccc(cc1)[As](=O)(O)O'],
  ['P-67.1.1', 'dimethylarsinic acid', 'C[As](C)(=O)O'],
  ['P-67.1.4', 'phenylphosphonic dichloride', 'ClP(Cl)(=O)c1ccccc1'],
  ['P-67.1.4', 'diphenylphosphinic chloride', 'ClP(=O)(c1ccccc1)c1ccccc1'],
  ['P-67.1.4', 'phenylphosphonous dichloride', 'ClP(Cl)c1ccccc1'],
  ['P-67.1.4', 'phosphoric trichloride', 'ClP(Cl)(Cl)=O'],
  ['P-67.1.2', "N,N,N',N',N'',N''-hexamethylphosphoric triamide", 'CN(C)P(=O)(N(C)C)N(C)C'],
  ['P-67.1.3', 'methyl diphenylphosphinate', 'COP(=O)(c1ccccc1)c1ccccc1'],
  ['P-67.1.3', 'dimethyl phenylboronate', 'COB(OC)c1ccccc1'],
  ['P-67.1.3', 'O,O-diethyl O-(4-nitrophenyl) phosphorothioate', 'CCOP(=S)(OCC)Oc1ccc(cc1)[N+](=O)[O-]'],
  ['P-67.1.3', 'O,O-dimethyl S-phenyl phosphorodithioate', 'COP(=S)(OC)Sc1ccccc1'],
  ['P-67.1.3', 'O,S-dimethyl phosphoramidothioate', 'COP(=O)(N)SC'],
  ['P-67.1.3', 'diethyl phosphoramidate', 'CCOP(=O)(N)OCC'],
  ['P-69.2', 'dimethylmercury', 'C[Hg]C'],
  ['P-69.2', 'diethylzinc', 'CC[Zn]CC'],
  ['P-69.2', 'tetraethyllead', 'CC[Pb](CC)(CC)CC'],
  ['P-69.2', 'trimethylaluminium', 'C[Al](C)C'],
  ['P-69.2', 'triethylaluminum', 'CC[Al](CC)CC'],
  ['P-69.2', 'phenyllithium', '[Li]c1ccccc1'],
  ['P-69.2', '(trimethylsilyl)lithium', '[Li][Si](C)(C)C'],
  ['P-69.3', 'bromo(phenyl)magnesium', 'Br[Mg]c1ccccc1'],
  ['P-69.3', 'dichloro(ethyl)aluminium', 'CC[Al](Cl)Cl'],
  ['P-69.3', 'tributyl(chloro)tin', 'CCCC[Sn](Cl)(CCCC)CCCC'],
  ['P-69.3', 'dichloronickel', 'Cl[Ni]Cl'],
  ['P-69.3', 'oxocopper', 'O=[Cu]'],
  ['P-69.3', 'trichlorouranium', 'Cl[U](Cl)Cl'],
  [
    'common practice, no source',
    '1,2-bis(diphenylphosphino)ethane',
    'C(CP(c1ccccc1)c1ccccc1)P(c1ccccc1)c1ccccc1',
  ],
  ['common practice, no source', '2,2,2-trideuterioacetamide', '[2H]C([2H])([2H])C(N)=O'],
  [
    'common practice, no source',
    '1-nitro-4-(trideuteriomethyl)benzene',
    '[2H]C([2H])([2H])c1ccc(cc1)[N+](=O)[O-]',
  ],
];

const constitution = (smiles: string) => canonicalSmiles(withStereo(readSmiles(smiles).value!, []));

it.each(names)('%s: %s', (_source, name, smiles) => {
  const reading = readName(name);
  expect(reading.kind).toBe('understood');
  if (reading.kind !== 'understood') return;
  const found = reading.readings.map((one) => canonicalSmiles(withStereo(one.molecule, [])));
  expect(found).toEqual([constitution(smiles)]);
});

it.each(['trimethyltin', 'methylmagnesium', 'tetrachlorozinc', 'diethyllithium'])(
  '%s has not the bonds that its metal is known with',
  (name) => {
    expect(readName(name).kind).toBe('unknown');
  },
);

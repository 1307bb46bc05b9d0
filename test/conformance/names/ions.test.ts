/**
 * Ions: IUPAC Recommendations 2013, P-72 (anions), P-73 (cations), P-74 (zwitterions), the `onium` names of the 1979 rules
 * C-82, and salts of organic ions; structures from memory.
 */
import { expect, it } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { withStereo } from '../../../server/chemistry/structure/molecule.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

const names: readonly (readonly [source: string, name: string, smiles: string])[] = [
  ['P-73.1.1', 'azanium', '[NH4+]'],
  ['P-73.1.1', 'oxidanium', '[OH3+]'],
  ['P-73.1.1', 'tetramethylphosphanium', 'C[P+](C)(C)C'],
  ['P-73.1.2', 'piperidin-1-ium', 'C1CC[NH2+]CC1'],
  ['P-73.1.2', '1-methylpyridin-1-ium-3-carboxamide', 'C[n+]1cccc(c1)C(N)=O'],
  ['P-73.1.2', '1H-imidazol-3-ium', 'c1c[nH+]c[nH]1'],
  ['P-73.1.2', 'N,N,N-trimethylanilinium', 'C[N+](C)(C)c1ccccc1'],
  ['P-73.1.2', 'pyrazine-1,4-diium', '[nH+]1cc[nH+]cc1'],
  ['P-73.1.2', 'hydrazinium', '[NH3+]N'],
  ['P-73.1.2', 'propan-2-iminium', 'CC(C)=[NH2+]'],
  ['P-73.2', 'propan-2-ylium', 'C[CH+]C'],
  ['P-73.2', 'triphenylsilylium', 'c1ccccc1[Si+](c1ccccc1)c1ccccc1'],
  ['P-73.2', 'triphenylmethylium', 'c1ccccc1[C+](c1ccccc1)c1ccccc1'],
  ['P-73.2', '1λ4-thiopyran-1-ylium', '[s+]1ccccc1'],
  ['P-73.3', 'pyrylium', '[o+]1ccccc1'],
  [
    'P-73.3',
    '2,4,6-triphenylpyrylium tetrafluoroborate',
    'F[B-](F)(F)F.c1ccccc1-c1cc(-c2ccccc2)[o+]c(c1)-c1ccccc1',
  ],
  ['P-73.6', '2-(trimethylazaniumyl)acetate', 'C[N+](C)(C)CC(=O)[O-]'],
  ['P-73.6', '3-(dimethylsulfaniumyl)propanoate', 'C[S+](C)CCC(=O)[O-]'],
  ['P-73.6', 'pyridin-1-ium-1-ylacetate', '[O-]C(=O)C[n+]1ccccc1'],
  ['P-72.2.2.1', 'butylazanide', 'CCCC[NH-]'],
  ['P-72.2.2.1', 'methanide', '[CH3-]'],
  ['P-72.2.2.1', 'cyclopenta-2,4-dien-1-ide', 'C1=CC=C[CH-]1'],
  ['P-72.2.2.1', 'diphenylphosphanide', 'c1ccccc1[P-]c1ccccc1'],
  ['P-72.3', 'tetramethylboranuide', 'C[B-](C)(C)C'],
  ['P-72.2.2.2', 'naphthalene-1-carboxylate', '[O-]C(=O)c1cccc2ccccc12'],
  ['P-72.2.2.2', 'benzene-1,2-diolate', '[O-]c1ccccc1[O-]'],
  ['P-72.2.2.2', 'propane-1-thiolate', 'CCC[S-]'],
  ['P-72.2.2.2', '2-(carboxylatomethyl)benzoate', '[O-]C(=O)Cc1ccccc1C(=O)[O-]'],
  ['P-72.2.2.2', '3-sulfonatopropanoate', '[O-]C(=O)CCS(=O)(=O)[O-]'],
  ['P-72.2.2.2', 'thiocyanate', '[S-]C#N'],
  ['P-74.1', '1-methylpyridin-1-ium-3-olate', 'C[n+]1cccc([O-])c1'],
  ['P-74.1', '(1-methylpyridin-1-ium-4-yl)acetate', 'C[n+]1ccc(CC(=O)[O-])cc1'],
  ['P-74.1', '2-hydroxyethyl 2-(trimethylazaniumyl)ethyl phosphate', 'C[N+](C)(C)CCOP(=O)([O-])OCCO'],
  ['1979 C-82', '1-butyl-3-methylimidazolium tetrafluoroborate', 'F[B-](F)(F)F.CCCCn1cc[n+](C)c1'],
  ['1979 C-82', 'N-butylpyridinium bromide', '[Br-].CCCC[n+]1ccccc1'],
  ['1979 C-82', '1-ethylquinolinium iodide', '[I-].CC[n+]1cccc2ccccc12'],
  ['1979 C-82', 'N,N-dimethylmorpholinium iodide', '[I-].C[N+]1(C)CCOCC1'],
  ['1979 C-82', '3-benzyl-5-(2-hydroxyethyl)-4-methylthiazolium chloride', '[Cl-].Cc1c(CCO)sc[n+]1Cc1ccccc1'],
  ['1979 C-82', 'trimethylsulfonium iodide', '[I-].C[S+](C)C'],
  ['1979 C-82', 'diphenyliodonium hexafluorophosphate', 'F[P-](F)(F)(F)(F)F.c1ccccc1[I+]c1ccccc1'],
  ['1979 C-82', 'trimethyloxonium tetrafluoroborate', 'F[B-](F)(F)F.C[O+](C)C'],
  ['1979 C-82', '2-(trimethylammonio)acetate', 'C[N+](C)(C)CC(=O)[O-]'],
  ['P-73.2.2', '4-nitrobenzenediazonium tetrafluoroborate', 'F[B-](F)(F)F.N#[N+]c1ccc(cc1)[N+](=O)[O-]'],
  [
    'common practice, no source',
    "N,N,N,N',N',N'-hexamethylhexane-1,6-diaminium dibromide",
    '[Br-].[Br-].C[N+](C)(C)CCCCCC[N+](C)(C)C',
  ],
  ['common practice, no source', 'potassium trifluoro(phenyl)boranuide', '[K+].F[B-](F)(F)c1ccccc1'],
  ['common practice, no source', 'lithium di(propan-2-yl)azanide', '[Li+].CC(C)[N-]C(C)C'],
  ['common practice, no source', 'sodium cyclopenta-2,4-dien-1-ide', '[Na+].C1=CC=C[CH-]1'],
  ['P-62.5', '1,4-dioxidoquinoxaline-1,4-diium', '[O-][n+]1cc[n+]([O-])c2ccccc12'],
  ['P-68', '1λ4-thiane 1-oxide', 'O=S1CCCCC1'],
];

const constitution = (smiles: string) => canonicalSmiles(withStereo(readSmiles(smiles).value!, []));

it.each(names)('%s: %s', (_source, name, smiles) => {
  const reading = readName(name);
  expect(reading.kind).toBe('understood');
  if (reading.kind !== 'understood') return;
  const found = reading.readings.map((one) => canonicalSmiles(withStereo(one.molecule, [])));
  expect(found).toEqual([constitution(smiles)]);
});

/**
 * What the trade writes for each key, in the form that `normalizedKey` gives: lower case, without white space,
 * full stops and hyphens, superscript digits as digits. Common practice in experimental sections, no source.
 */
import type { CompoundKey, ReactionKey } from './keys.ts';

export const compoundKeyAliases: Readonly<Partial<Record<CompoundKey, readonly string[]>>> = {
  label: ['no', 'number', 'compound', 'id'],
  name: ['iupacname', 'systematicname', 'compoundname'],
  synonyms: ['synonym', 'othernames', 'othername', 'aka', 'alias', 'aliases', 'trivialname', 'commonname'],
  formula: ['molecularformula', 'molformula', 'mf', 'sumformula', 'empiricalformula'],
  SMILES: ['smi'],
  InChI: ['stdinchi', 'standardinchi'],
  InChIKey: ['stdinchikey', 'standardinchikey'],
  'CAS RN': ['cas', 'casno', 'casnr', 'casnumber', 'casregistrynumber', 'casregno', 'casreg#', 'cas#'],
  isomers: ['isomer', 'stereo', 'stereochemistry', 'configuration'],
  'molar mass': [
    'mw',
    'mr',
    'fw',
    'mm',
    'molecularweight',
    'molwt',
    'molecularmass',
    'formulaweight',
    'molweight',
  ],
  'exact mass': ['monoisotopicmass', 'em', 'accuratemass'],
  purity: ['assay'],
  concentration: ['conc', 'titre', 'titer', 'molarity'],
  density: ['ρ', 'd', 'dens'],
  mp: ['meltingpoint', 'meltingrange', 'meltingpt', 'fp', 'tm'],
  bp: ['boilingpoint', 'boilingrange', 'boilingpt', 'tb'],
  nD: ['refractiveindex', 'ri', 'n'],
  rotation: ['specificrotation', 'opticalrotation', '[α]', '[a]', 'α'],
  appearance: ['aspect', 'description'],
  Rf: ['tlc'],
  '1H NMR': ['hnmr', 'δh', 'protonnmr', 'nmr1h', '1h', 'nmr(1h)'],
  '13C NMR': ['cnmr', 'δc', 'carbonnmr', 'nmr13c', '13c', '13c{1h}nmr', '13c{1h}', 'nmr(13c)'],
  '19F NMR': ['fnmr', 'δf', 'nmr19f', '19f', '19f{1h}nmr', '19f{1h}', 'nmr(19f)'],
  '31P NMR': ['pnmr', 'δp', 'nmr31p', '31p', '31p{1h}nmr', '31p{1h}', 'nmr(31p)'],
  IR: ['ftir', 'νmax', 'infrared', 'atrir', 'atrftir', 'iratr', 'ftiratr', 'ν'],
  HRMS: ['hrmsesi', 'hrmsei', 'esihrms', 'highresolutionms', 'accuratems', 'hresims', 'hreims'],
  MS: ['m/z', 'esims', 'eims', 'gcms', 'lcms', 'lrms', 'massspectrum'],
  combustion: ['anal', 'analysis', 'elementalanalysis', 'ea', 'combustionanalysis', 'chn', 'microanalysis'],
  source: ['supplier', 'origin', 'lot'],
  notes: ['note', 'remark', 'remarks', 'comment', 'comments'],
};

export const reactionKeyAliases: Readonly<Partial<Record<ReactionKey, readonly string[]>>> = {
  label: ['no', 'number', 'reaction', 'id'],
  scheme: ['equation', 'eq', 'eqn'],
  charged: ['charge', 'charges', 'reagents', 'reactants'],
  solvent: ['solvents'],
  conditions: ['condition'],
  obtained: ['product', 'products', 'yield', 'isolated'],
  reference: ['ref', 'references', 'lit', 'literature', 'procedure'],
  notes: ['note', 'remark', 'remarks', 'comment', 'comments', 'observations'],
};

/** Keys that the trade follows with the conditions of the measurement: `1H NMR (400 MHz, CDCl3): δ 7.30 …`. */
export const keysWithConditions: ReadonlySet<CompoundKey | ReactionKey> = new Set([
  'purity',
  'concentration',
  'density',
  'mp',
  'bp',
  'nD',
  'rotation',
  'Rf',
  '1H NMR',
  '13C NMR',
  '19F NMR',
  '31P NMR',
  'IR',
  'HRMS',
  'MS',
  'combustion',
]);

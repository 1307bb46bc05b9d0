/** What each key of a block is for, as hovers and completion tell it. Markdown; examples in code. */
import type { CompoundKey, ReactionKey } from '../notebook/keys.ts';

export const compoundKeyWords: Readonly<Record<CompoundKey, string>> = {
  label: 'How the notebook refers to this compound: `4`, `4a`, `LR-17`. Unique within the notebook.',
  name: 'A name that means exactly one structure; every structure it can mean is looked at.',
  synonyms: 'Other names of the same compound, one a line after `- ` or separated by semicolons.',
  formula: 'Molecular formula: `C9H12O2`, `C6H8ClN`, `CuSO4·5H2O`. Held against structure, name and masses.',
  SMILES: 'The structure as a SMILES line: `COc1ccc(cc1)C(C)O`. Every valence in it is checked.',
  InChI: 'The standard InChI, computed again from the structure and compared.',
  InChIKey: 'The standard InChIKey, computed again from the structure and compared.',
  'CAS RN': 'CAS Registry Number, `100-52-7`; its check digit is verified.',
  isomers:
    'Whether this is one stereoisomer (`single`, also when nothing is said), a `racemate`, one of known `relative` ' +
    'configuration, a `mixture` (`mixture 3:1`), or `unknown`.',
  'molar mass': 'In g/mol, from standard atomic weights: `152.19 g/mol`.',
  'exact mass': 'Monoisotopic mass of the neutral compound, in u: `152.0837`.',
  purity: 'Assay and method: `98 % (GC)`.',
  concentration: 'Of a solution: `1.6 M in hexanes`.',
  density: 'With the temperature where it is known: `0.867 g/mL (20 °C)`.',
  mp: 'Melting point or range: `64–66 °C (EtOH)`, `180 °C (dec.)`.',
  bp: 'Boiling point with its pressure, 760 mmHg when none is given: `95 °C (1 mmHg)`.',
  nD: 'Refractive index at the sodium D line, with the temperature: `1.5012 (20 °C)`.',
  rotation:
    'Specific rotation: `[α]D20 = +24.5 (c = 1.0, CHCl3)`. Only a chiral, non-racemic sample has one.',
  appearance: 'What it looks like: `colourless oil`.',
  Rf: 'Retention factor and eluent: `0.35 (hexanes/EtOAc 4:1)`.',
  '1H NMR':
    'Frequency, solvent, then δ with multiplicity, J and integral. The integrals must add up to the formula.',
  '13C NMR': 'Frequency, solvent, then δ. No more signals than carbon atoms.',
  '19F NMR': 'Frequency, solvent, then δ.',
  '31P NMR': 'Frequency, solvent, then δ.',
  IR: 'Bands in cm⁻¹, with the technique: `(ATR) 2958, 1735 cm-1`.',
  HRMS: 'Method, ion, calculated and found m/z: `(ESI) m/z calcd for C9H12O2Na [M + Na]+ 175.0730, found 175.0728`.',
  MS: 'Method, then m/z with intensities: `(EI) m/z 152 (M+, 24), 137 (100)`.',
  combustion: 'Elemental analysis: `Calcd for C9H12O2: C, 71.03; H, 7.95. Found: C, 70.88; H, 8.02`.',
  source: 'Where it came from: supplier and lot, or the reaction that made it.',
  notes: 'Anything else. Not checked.',
  allow: 'Accepts a finding in this block: `allow: check-id (reason)`. The reason is for your reviewer.',
};

export const reactionKeyWords: Readonly<Record<ReactionKey, string>> = {
  label: 'How the notebook refers to this reaction: `R-7`. Unique within the notebook.',
  scheme: 'The reaction as an equation of labels, names or formulas: `3 + NaBH4 -> 4`.',
  charged: 'What went into the flask, one item a line: `- NaBH4: 378 mg, 10.0 mmol, 1.0 equiv`.',
  solvent: 'The solvent and how much of it: `methanol, 20 mL`.',
  conditions: 'Temperature, time, pressure, atmosphere: `0 °C to rt, 2 h`.',
  obtained: 'What came out, one item a line: `- 4: 1.42 g, 93 %`.',
  scale: 'The amount that 1 equiv stands for: `10 mmol`.',
  reference: 'The procedure that was followed.',
  notes: 'Anything else. Not checked.',
  allow: 'Accepts a finding in this block: `allow: check-id (reason)`. The reason is for your reviewer.',
};

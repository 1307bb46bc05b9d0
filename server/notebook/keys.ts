/** The keys of the block language and the aliases that the trade writes for them. */
export const compoundKeys = [
  'label',
  'name',
  'synonyms',
  'formula',
  'SMILES',
  'InChI',
  'InChIKey',
  'CAS RN',
  'isomers',
  'molar mass',
  'exact mass',
  'purity',
  'concentration',
  'density',
  'mp',
  'bp',
  'nD',
  'rotation',
  'appearance',
  'Rf',
  '1H NMR',
  '13C NMR',
  '19F NMR',
  '31P NMR',
  'IR',
  'HRMS',
  'MS',
  'combustion',
  'source',
  'notes',
  'allow',
] as const;

export const reactionKeys = [
  'label',
  'scheme',
  'charged',
  'solvent',
  'conditions',
  'obtained',
  'scale',
  'reference',
  'notes',
  'allow',
] as const;

export type CompoundKey = (typeof compoundKeys)[number];
export type ReactionKey = (typeof reactionKeys)[number];
export type FieldKey = CompoundKey | ReactionKey;

/** Keys that may stand in a block any number of times. */
export const repeatableKeys: ReadonlySet<FieldKey> = new Set<FieldKey>(['allow', 'notes', 'synonyms']);

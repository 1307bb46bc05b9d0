/**
 * What two statements of one compound typically differ by when one of them is the salt, hydrate or labelled
 * compound and the other is not. Common practice, no source.
 */
export interface Counterpart {
  /** Atoms gained, `symbol: count`. */
  readonly gain: Readonly<Record<string, number>>;
  /** Completes “The difference is …”. */
  readonly difference: string;
  /** Completes “one of them is …”. */
  readonly meaning: string;
}

export const counterparts: readonly Counterpart[] = [
  { gain: { H: 1, Cl: 1 }, difference: 'HCl', meaning: 'the hydrochloride, the other the free base' },
  { gain: { H: 1, Br: 1 }, difference: 'HBr', meaning: 'the hydrobromide, the other the free base' },
  { gain: { H: 1, I: 1 }, difference: 'HI', meaning: 'the hydroiodide, the other the free base' },
  { gain: { H: 2, S: 1, O: 4 }, difference: 'H2SO4', meaning: 'the sulfate, the other the free base' },
  { gain: { H: 1, N: 1, O: 3 }, difference: 'HNO3', meaning: 'the nitrate, the other the free base' },
  { gain: { H: 3, P: 1, O: 4 }, difference: 'H3PO4', meaning: 'the phosphate, the other the free base' },
  {
    gain: { C: 2, H: 1, F: 3, O: 2 },
    difference: 'CF3CO2H',
    meaning: 'the trifluoroacetate, the other the free base',
  },
  {
    gain: { C: 1, H: 4, S: 1, O: 3 },
    difference: 'CH3SO3H',
    meaning: 'the mesylate, the other the free base',
  },
  { gain: { C: 7, H: 8, S: 1, O: 3 }, difference: 'TsOH', meaning: 'the tosylate, the other the free base' },
  {
    gain: { H: 1, B: 1, F: 4 },
    difference: 'HBF4',
    meaning: 'the tetrafluoroborate, the other the free base',
  },
  {
    gain: { H: 1, P: 1, F: 6 },
    difference: 'HPF6',
    meaning: 'the hexafluorophosphate, the other the free base',
  },
  { gain: { H: 2, O: 1 }, difference: 'H2O', meaning: 'a hydrate, the other anhydrous' },
  { gain: { Li: 1, H: -1 }, difference: 'Li for H', meaning: 'the lithium salt, the other the free acid' },
  { gain: { Na: 1, H: -1 }, difference: 'Na for H', meaning: 'the sodium salt, the other the free acid' },
  { gain: { K: 1, H: -1 }, difference: 'K for H', meaning: 'the potassium salt, the other the free acid' },
  { gain: { Cs: 1, H: -1 }, difference: 'Cs for H', meaning: 'the caesium salt, the other the free acid' },
  { gain: { '2H': 1, H: -1 }, difference: 'D for H', meaning: 'labelled with deuterium, the other not' },
  { gain: { '13C': 1, C: -1 }, difference: '13C for C', meaning: 'labelled with carbon-13, the other not' },
];

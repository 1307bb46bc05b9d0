/**
 * Words with which laboratories describe solutions, supported reagents and grades. Common practice, no source. All in lower
 * case.
 */

/** Words before or after a name that say how pure or in what shape the compound is; it stays the same compound. */
export const gradeWords: readonly string[] = [
  ...['dry', 'anhydrous', 'anhyd.', 'anhyd', 'absolute', 'abs.', 'abs', 'glacial', 'neat', 'pure'],
  ...[
    'distilled',
    'freshly distilled',
    'dist.',
    'redistilled',
    'double-distilled',
    'recrystallised',
    'recrystallized',
  ],
  ...[
    'degassed',
    'deoxygenated',
    'de-aerated',
    'sparged',
    'dry degassed',
    'anhydrous degassed',
    'dry and degassed',
  ],
  ...[
    'deionised',
    'deionized',
    'de-ionised',
    'de-ionized',
    'milli-q',
    'ice-cold',
    'cold',
    'hot',
    'boiling',
    'warm',
    'ice',
  ],
  ...[
    'powdered',
    'cat.',
    'catalytic',
    'ground',
    'finely ground',
    'freshly ground',
    'flame-dried',
    'oven-dried',
    'activated',
    'granular',
  ],
  ...[
    'reagent grade',
    'hplc grade',
    'hplc-grade',
    'technical',
    'technical grade',
    'analytical grade',
    'acs grade',
  ],
  ...[
    'inhibitor-free',
    'gaseous',
    'solid',
    'liquid',
    'commercial',
    'freshly prepared',
    'crystalline',
    'amorphous',
  ],
];

/** The same where they only stand after the name. */
export const gradeEndings: readonly string[] = [
  ...[
    '(anhydrous)',
    '(dry)',
    '(distilled)',
    '(degassed)',
    '(g)',
    '(l)',
    '(s)',
    '(gas)',
    '(solid)',
    '(liquid)',
    '(neat)',
  ],
  ...[
    'gas',
    'dust',
    'powder',
    'turnings',
    'granules',
    'granule',
    'shot',
    'wire',
    'filings',
    'metal',
    'flakes',
    'pellets',
  ],
  ...['chips', 'ribbon', 'foil', 'sponge', 'black', 'balloon', '(balloon)', '(1 atm)', 'anhydrous', 'dry'],
];

/** Words that say a compound is dissolved in water, and how much. */
export const aqueousWords: readonly string[] = [
  ...['aqueous', 'aq.', 'aq', 'saturated', 'saturated aqueous', 'satd.', 'satd', "sat'd", 'sat.', 'sat'],
  ...[
    'sat. aq.',
    'sat. aq',
    'sat aq.',
    'sat aq',
    'sat.aq.',
    'satd. aq.',
    'satd aq',
    "sat'd aq.",
    'aq. sat.',
    'aq sat',
  ],
  ...[
    'half-saturated',
    'half-saturated aqueous',
    'half-sat. aq.',
    'half-saturated aq.',
    'concentrated',
    'conc.',
    'conc',
  ],
  ...['concentrated aqueous', 'conc. aq.', 'conc aq', 'dilute', 'dil.', 'dil', 'dilute aqueous', 'dil. aq.'],
  ...['cold aqueous', 'cold saturated aqueous', 'cold sat. aq.'],
];

/** Words for solutions in other solvents: the word and the solvent. */
export const solventWords: readonly (readonly [word: string, solvent: string])[] = [
  ['methanolic', 'methanol'],
  ['ethanolic', 'ethanol'],
  ['alcoholic', 'ethanol'],
  ['ethereal', 'diethyl ether'],
];

/** What carries a supported catalyst or reagent. */
export const supports: readonly string[] = [
  ...[
    'c',
    'carbon',
    'charcoal',
    'activated carbon',
    'activated charcoal',
    'al2o3',
    'alumina',
    'baso4',
    'barium sulfate',
  ],
  ...[
    'caco3',
    'calcium carbonate',
    'srco3',
    'sio2',
    'silica',
    'silica gel',
    'celite',
    'tio2',
    'mgo',
    'polystyrene',
  ],
];

/** Solutes of which a molarity without a solvent means a solution in water. */
export const aqueousSolutes: readonly string[] = [
  ...[
    'hcl',
    'hbr',
    'hi',
    'hf',
    'h2so4',
    'hno3',
    'h3po4',
    'hclo4',
    'naoh',
    'koh',
    'lioh',
    'csoh',
    'ba(oh)2',
    'nh4oh',
  ],
  ...[
    'na2co3',
    'k2co3',
    'cs2co3',
    'nahco3',
    'khco3',
    'nacl',
    'nh4cl',
    'nh4oac',
    'na2s2o3',
    'na2so3',
    'nahso3',
    'k3po4',
  ],
  ...[
    'hydrochloric acid',
    'sulfuric acid',
    'nitric acid',
    'phosphoric acid',
    'hydrobromic acid',
    'citric acid',
  ],
  ...[
    'sodium hydroxide',
    'potassium hydroxide',
    'lithium hydroxide',
    'sodium carbonate',
    'potassium carbonate',
  ],
  ...[
    'sodium bicarbonate',
    'sodium hydrogen carbonate',
    'sodium chloride',
    'ammonium chloride',
    'sodium thiosulfate',
  ],
];

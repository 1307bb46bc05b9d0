/**
 * Names of things that are mixtures, or have no single molecular structure. Each line: the names parted by `|`, in lower
 * case; what it is; the names of its components parted by `|`, where they are known. Common practice, no source.
 */
export const mixtures: readonly (readonly [names: string, what: string, components?: string])[] = [
  [
    'hexanes',
    'Hexanes are a mixture of the isomers of hexane.',
    'hexane|2-methylpentane|3-methylpentane|2,2-dimethylbutane|2,3-dimethylbutane',
  ],
  [
    'pentanes',
    'Pentanes are a mixture of the isomers of pentane.',
    'pentane|2-methylbutane|2,2-dimethylpropane',
  ],
  ['heptanes', 'Heptanes are a mixture of the isomers of heptane.'],
  ['octanes', 'Octanes are a mixture of the isomers of octane.'],
  [
    'xylenes',
    'Xylenes are a mixture of o-, m- and p-xylene, usually with ethylbenzene.',
    'o-xylene|m-xylene|p-xylene',
  ],
  ['cresols', 'Cresols are a mixture of o-, m- and p-cresol.', 'o-cresol|m-cresol|p-cresol'],
  [
    'butenes|butylenes',
    'Butenes are a mixture of the isomers of butene.',
    'but-1-ene|but-2-ene|2-methylprop-1-ene',
  ],
  [
    'petroleum ether|pet ether|pet. ether|petrol ether|ligroin|light petroleum|petrol',
    'Petroleum ether is a mixture of alkanes; its boiling range says which.',
  ],
  [
    'brine|saturated brine|sat. brine|sat brine',
    'Brine is a saturated solution of sodium chloride in water.',
    'sodium chloride|water',
  ],
  ['mineral oil|paraffin oil|paraffin', 'This is a mixture of long-chain alkanes.'],
  [
    'naphtha|white spirit|mineral spirits|stoddard solvent|gasoline|kerosene|kerosine',
    'This is a petroleum distillate, a mixture of hydrocarbons.',
  ],
  ['air|compressed air', 'Air is a mixture of nitrogen, oxygen and argon.', 'nitrogen|oxygen|argon'],
  ['forming gas', 'Forming gas is hydrogen in nitrogen.', 'hydrogen|nitrogen'],
  [
    'syngas|synthesis gas|water gas',
    'Synthesis gas is carbon monoxide and hydrogen.',
    'carbon monoxide|hydrogen',
  ],
  [
    "celite|silica|silica gel|sio2 gel|molecular sieves|4 å ms|3 å ms|5 å ms|4å ms|3å ms|5å ms|ms 4 å|ms 3 å|ms 5 å|4å molecular sieves|3å molecular sieves|5å molecular sieves|molecular sieves (4 å)|molecular sieves (3 å)|molecular sieves (5 å)|molecular sieves, 4 å|molecular sieves, 3 å|molecular sieves 4 å|molecular sieves 3 å|3 å molecular sieves|4 å molecular sieves|5 å molecular sieves|3a molecular sieves|4a molecular sieves|5a molecular sieves|ms 3å|ms 4å|ms 5å|alumina|neutral alumina|basic alumina|florisil|kieselguhr|diatomaceous earth|montmorillonite k10|montmorillonite|kaolin|sand|sea sand|glass wool|cotton wool|zeolite|fuller's earth",
    'This is a solid of no single molecular structure.',
  ],
  [
    'activated carbon|activated charcoal|charcoal|norit|carbon black|graphite',
    'This is carbon, a solid of no single molecular structure.',
  ],
  ['amberlyst 15|amberlyst-15|amberlite|dowex|ion exchange resin|nafion', 'This is a resin, a polymer.'],
  [
    'raney nickel|raney-ni|raney ni|ra-ni|raney-nickel',
    'Raney nickel is porous nickel with some aluminium.',
    'nickel',
  ],
  [
    "lindlar's catalyst|lindlar catalyst",
    'Lindlar’s catalyst is palladium on calcium carbonate, poisoned with lead.',
  ],
  ["pearlman's catalyst|pearlman catalyst", 'Pearlman’s catalyst is palladium hydroxide on carbon.'],
  [
    "adams' catalyst|adams catalyst",
    'Adams’ catalyst is platinum(IV) oxide, a hydrate of varying composition.',
    'PtO2',
  ],
  [
    'oxone|potassium peroxymonosulfate triple salt',
    'Oxone is a triple salt, 2 KHSO5·KHSO4·K2SO4.',
    'KHSO5|KHSO4|K2SO4',
  ],
  [
    'oleum|fuming sulfuric acid',
    'Oleum is sulfur trioxide in sulfuric acid.',
    'sulfur trioxide|sulfuric acid',
  ],
  [
    'fuming nitric acid|fuming hno3',
    'Fuming nitric acid is nitric acid with nitrogen dioxide.',
    'nitric acid',
  ],
  [
    'piranha|piranha solution',
    'Piranha is hydrogen peroxide in sulfuric acid.',
    'hydrogen peroxide|sulfuric acid',
  ],
  ['aqua regia', 'Aqua regia is a mixture of hydrochloric and nitric acid.', 'hydrochloric acid|nitric acid'],
  ['formalin', 'Formalin is a solution of formaldehyde in water.', 'formaldehyde|water'],
  [
    "hf·pyridine|hf-pyridine|hf.pyridine|hf·py|pyridinium poly(hydrogen fluoride)|olah's reagent",
    'This is hydrogen fluoride in pyridine, about 70 % by mass.',
    'hydrogen fluoride|pyridine',
  ],
  [
    'bleach|household bleach',
    'Bleach is a solution of sodium hypochlorite in water.',
    'sodium hypochlorite|water',
  ],
  ['ammonia water|ammonia solution|aqua ammonia', 'This is a solution of ammonia in water.', 'ammonia|water'],
  [
    'lime water|limewater',
    'Lime water is a saturated solution of calcium hydroxide in water.',
    'calcium hydroxide|water',
  ],
  ['paraformaldehyde|(ch2o)n', 'Paraformaldehyde is a polymer of formaldehyde.', 'formaldehyde'],
  ['tap water', 'Tap water is water with dissolved salts.', 'water'],
  [
    'pbs|phosphate buffer|phosphate-buffered saline|acetate buffer|tris buffer|buffer',
    'This is a buffer, a solution of salts in water.',
  ],
  [
    "jones reagent|jones' reagent",
    'Jones reagent is chromium trioxide in aqueous sulfuric acid.',
    'chromium trioxide|sulfuric acid|water',
  ],
  ['oil of turpentine|turpentine', 'Turpentine is a mixture of terpenes.'],
  [
    'methylated spirits|denatured alcohol|industrial methylated spirits|ims',
    'This is ethanol with additives that make it unfit to drink.',
    'ethanol',
  ],
  ['rochelle salt solution', 'This is a solution of potassium sodium tartrate in water.'],
  [
    'peg|polyethylene glycol|pmhs|polymethylhydrosiloxane|polystyrene|pvp|pvc',
    'This is a polymer, of no single molecular structure.',
  ],
];

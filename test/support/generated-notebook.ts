/**
 * Writes notebooks of any length for benches and protocol tests: pages with prose and sound blocks of esters and
 * aromatic ketones, the compounds put together from chains so that name, SMILES, formula and molar mass agree by
 * construction. The same seed gives the same text.
 */

/** A small deterministic generator of chance (mulberry32): numbers in [0, 1). */
export function seededChance(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}

const alkyl = ['methyl', 'ethyl', 'propyl', 'butyl', 'pentyl', 'hexyl', 'heptyl', 'octyl', 'nonyl', 'decyl'];
const alkane = ['meth', 'eth', 'prop', 'but', 'pent', 'hex', 'hept', 'oct', 'non', 'dec'];

interface GeneratedCompound {
  readonly name: string;
  readonly smiles: string;
  readonly carbons: number;
  readonly hydrogens: number;
  readonly oxygens: number;
}

/** Straight-chain esters: 100 of them. */
function ester(chain: number, acid: number): GeneratedCompound {
  return {
    name: `${alkyl[chain - 1]!} ${alkane[acid - 1]!}anoate`,
    smiles: `${'C'.repeat(acid - 1)}C(=O)O${'C'.repeat(chain)}`,
    carbons: chain + acid,
    hydrogens: 2 * (chain + acid),
    oxygens: 2,
  };
}

/** 1-(4-alkoxyphenyl)ethan-1-ones. */
function ketone(chain: number): GeneratedCompound {
  const alkoxy = chain <= 4 ? `${alkane[chain - 1]!}oxy` : `(${alkyl[chain - 1]!}oxy)`;
  return {
    name: `1-(4-${alkoxy}phenyl)ethan-1-one`,
    smiles: `${'C'.repeat(chain)}Oc1ccc(cc1)C(C)=O`,
    carbons: chain + 8,
    hydrogens: 2 * chain + 8,
    oxygens: 2,
  };
}

const sentences = [
  'The flask was dried in the oven overnight and cooled under argon.',
  'A thin-layer chromatogram after two hours showed no starting material.',
  'The organic layer was washed twice with water and once with brine, dried over magnesium sulfate and filtered.',
  'The smell is *fruity*, with a note of pear that fades within the hour.',
  'Column: silica, hexanes with 5 to 20 % ethyl acetate; fractions 11–18 were combined.',
];

/** One compound block of about nine lines. */
export function compoundBlock(label: string, chance: () => number): string {
  const pick = (below: number) => Math.floor(chance() * below);
  const compound = chance() < 0.8 ? ester(1 + pick(10), 1 + pick(10)) : ketone(1 + pick(10));
  const { carbons, hydrogens, oxygens } = compound;
  // IUPAC abridged standard atomic weights.
  const mass = 12.011 * carbons + 1.008 * hydrogens + 15.999 * oxygens;
  return [
    '```compound',
    `label: ${label}`,
    `name: ${compound.name}`,
    `formula: C${carbons}H${hydrogens}O${oxygens}`,
    `SMILES: ${compound.smiles}`,
    `molar mass: ${mass.toFixed(2)} g/mol`,
    'appearance: colourless oil',
    `notes: from the second fraction,`,
    `  ${1 + pick(40)}0 mg`,
    '```',
  ].join('\n');
}

/** A Markdown notebook with `blocks` compound blocks, each with five or so lines of prose before it. */
export function generatedNotebook(blocks: number, seed = 1): string {
  const chance = seededChance(seed);
  const parts: string[] = ['# Notebook', ''];
  for (let number = 1; number <= blocks; number++) {
    parts.push(`## Entry ${number}`, '');
    for (let line = 0; line < 3; line++) parts.push(sentences[Math.floor(chance() * sentences.length)]!);
    parts.push('', compoundBlock(`G${number}`, chance), '');
  }
  return parts.join('\n');
}

/**
 * Amino acids, peptides and hydroxy acids of the D and L series. Each is held against the systematic name of the same
 * compound, read by rule, so that a wrong configuration in the vocabulary shows. Sources: IUPAC-IUB Nomenclature and
 * Symbolism for Amino Acids and Peptides (1983), 3AA; IUPAC Recommendations 2013, P-103 and P-65.1.2.1.
 */
import { expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';

function only(name: string) {
  const reading = readName(name);
  if (reading.kind !== 'understood') throw new Error(`${name}: ${reading.message}`);
  expect(reading.readings, name).toHaveLength(1);
  return reading.readings[0]!;
}

test.each<[source: string, name: string, systematic: string]>([
  ['P-103.1.1', 'L-alanine', '(2S)-2-aminopropanoic acid'],
  ['P-103.1.1', 'D-alanine', '(2R)-2-aminopropanoic acid'],
  ['P-103.1.1', 'L-arginine', '(2S)-2-amino-5-guanidinopentanoic acid'],
  ['P-103.1.1', 'L-asparagine', '(2S)-2,4-diamino-4-oxobutanoic acid'],
  ['P-103.1.1', 'L-aspartic acid', '(2S)-2-aminobutanedioic acid'],
  ['P-103.1.1', 'L-cysteine', '(2R)-2-amino-3-sulfanylpropanoic acid'],
  ['P-103.1.1', 'L-glutamine', '(2S)-2,5-diamino-5-oxopentanoic acid'],
  ['P-103.1.1', 'L-glutamic acid', '(2S)-2-aminopentanedioic acid'],
  ['P-103.1.1', 'glycine', 'aminoacetic acid'],
  ['P-103.1.1', 'L-histidine', '(2S)-2-amino-3-(1H-imidazol-4-yl)propanoic acid'],
  ['P-103.1.1', 'L-isoleucine', '(2S,3S)-2-amino-3-methylpentanoic acid'],
  ['P-103.1.1', 'L-leucine', '(2S)-2-amino-4-methylpentanoic acid'],
  ['P-103.1.1', 'L-lysine', '(2S)-2,6-diaminohexanoic acid'],
  ['P-103.1.1', 'L-methionine', '(2S)-2-amino-4-(methylsulfanyl)butanoic acid'],
  ['P-103.1.1', 'L-phenylalanine', '(2S)-2-amino-3-phenylpropanoic acid'],
  ['P-103.1.1', 'L-proline', '(2S)-pyrrolidine-2-carboxylic acid'],
  ['P-103.1.1', 'L-serine', '(2S)-2-amino-3-hydroxypropanoic acid'],
  ['P-103.1.1', 'L-threonine', '(2S,3R)-2-amino-3-hydroxybutanoic acid'],
  ['P-103.1.1', 'L-tryptophan', '(2S)-2-amino-3-(1H-indol-3-yl)propanoic acid'],
  ['P-103.1.1', 'L-tyrosine', '(2S)-2-amino-3-(4-hydroxyphenyl)propanoic acid'],
  ['P-103.1.1', 'L-valine', '(2S)-2-amino-3-methylbutanoic acid'],
  ['P-103.1.1', 'L-ornithine', '(2S)-2,5-diaminopentanoic acid'],
  ['P-103.1.1', 'L-homoserine', '(2S)-2-amino-4-hydroxybutanoic acid'],
  ['P-103.1.1', 'L-homocysteine', '(2S)-2-amino-4-sulfanylbutanoic acid'],
  ['P-103.1.1', 'L-norleucine', '(2S)-2-aminohexanoic acid'],
  ['P-103.1.1', 'L-norvaline', '(2S)-2-aminopentanoic acid'],
  ['P-103.1.1', 'β-alanine', '3-aminopropanoic acid'],
  ['P-103.1.1', 'sarcosine', '2-(methylamino)ethanoic acid'],
  ['3AA-2', 'L-pyroglutamic acid', '(2S)-5-oxopyrrolidine-2-carboxylic acid'],
  ['P-103.2.1', 'N-acetyl-L-cysteine', '(2R)-2-acetamido-3-sulfanylpropanoic acid'],
  ['P-103.2.1', 'S-methyl-L-cysteine', '(2R)-2-amino-3-(methylsulfanyl)propanoic acid'],
  ['P-103.2.1', 'N6-acetyl-L-lysine', '(2S)-6-acetamido-2-aminohexanoic acid'],
  ['P-103.2.1', 'Nε-acetyl-L-lysine', '(2S)-6-acetamido-2-aminohexanoic acid'],
  ['P-103.2.1', 'O-benzyl-L-serine', '(2S)-2-amino-3-(benzyloxy)propanoic acid'],
  ['P-103.2.1', '4-fluoro-L-phenylalanine', '(2S)-2-amino-3-(4-fluorophenyl)propanoic acid'],
  ['P-103.2.1', '5-hydroxy-L-tryptophan', '(2S)-2-amino-3-(5-hydroxy-1H-indol-3-yl)propanoic acid'],
  ['P-103.2.2', 'methyl L-alaninate', 'methyl (2S)-2-aminopropanoate'],
  ['P-103.2.2', 'diethyl L-glutamate', 'diethyl (2S)-2-aminopentanedioate'],
  ['P-103.2.4', 'L-prolinamide', '(2S)-pyrrolidine-2-carboxamide'],
  ['P-103.2.6', 'L-phenylalaninol', '(2S)-2-amino-3-phenylpropan-1-ol'],
  ['P-103.3.2', 'glycylglycine', '2-(2-aminoacetamido)acetic acid'],
  ['P-103.3.2', 'glycyl-L-leucine', '(2S)-2-(2-aminoacetamido)-4-methylpentanoic acid'],
  ['P-103.3.2', 'L-alanyl-L-phenylalanine', '(2S)-2-[[(2S)-2-aminopropanoyl]amino]-3-phenylpropanoic acid'],
  [
    'P-103.3.2',
    'L-alanylglycyl-L-serine',
    '(2S)-2-[[2-[[(2S)-2-aminopropanoyl]amino]acetyl]amino]-3-hydroxypropanoic acid',
  ],
  ['P-65.1.1.1', 'L-lactic acid', '(2S)-2-hydroxypropanoic acid'],
  ['P-65.1.1.1', 'D-glyceric acid', '(2R)-2,3-dihydroxypropanoic acid'],
  ['P-65.1.1.1', 'L-malic acid', '(2S)-2-hydroxybutanedioic acid'],
  ['P-65.1.1.1', 'L-tartaric acid', '(2R,3R)-2,3-dihydroxybutanedioic acid'],
  ['P-65.1.1.1', 'diethyl L-tartrate', 'diethyl (2R,3R)-2,3-dihydroxybutanedioate'],
  ['P-65.1.1.1', 'D-mandelic acid', '(2R)-2-hydroxy-2-phenylacetic acid'],
])('%s: %s is %s', (_, name, systematic) => {
  expect(canonicalSmiles(only(name).molecule)).toBe(canonicalSmiles(only(systematic).molecule));
});

test.each([
  ['alanine', 2],
  ['DL-alanine', 2],
  ['DL-threonine', 2],
  ['threonine', 4],
  ['tartaric acid', 3],
  ['lactic acid', 2],
])('%s leaves %i stereoisomers open', (name, count) => {
  expect(only(name).stereoisomers).toHaveLength(count);
});

test('D and L before anything else say nothing that can be relied on', () => {
  expect(readName('L-2-phenylglycine').kind).toBe('unknown');
  expect(readName('D-butan-2-ol').kind).toBe('unknown');
});

test('a salt of glutamic acid says how many metal ions it has', () => {
  expect(readName('sodium L-glutamate').kind).toBe('unknown');
  expect(readName('disodium L-glutamate').kind).toBe('understood');
});

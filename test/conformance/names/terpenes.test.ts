/**
 * Terpenes and their groups. The configuration that belongs to a sign of rotation is that of the systematic name beside it
 * (common practice, no source: it is how these compounds are sold); the systematic name is read by rule.
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

test.each([
  ['(−)-menthol', '(1R,2S,5R)-5-methyl-2-(propan-2-yl)cyclohexan-1-ol'],
  ['(+)-menthol', '(1S,2R,5S)-5-methyl-2-(propan-2-yl)cyclohexan-1-ol'],
  ['(1R,2S,5R)-menthol', '(1R,2S,5R)-5-methyl-2-(propan-2-yl)cyclohexan-1-ol'],
  ['L-menthol', '(1R,2S,5R)-5-methyl-2-(propan-2-yl)cyclohexan-1-ol'],
  ['(−)-isopulegol', '(1R,2S,5R)-5-methyl-2-(prop-1-en-2-yl)cyclohexan-1-ol'],
  ['(−)-menthone', '(2S,5R)-5-methyl-2-(propan-2-yl)cyclohexan-1-one'],
  ['(+)-pulegone', '(5R)-5-methyl-2-(propan-2-ylidene)cyclohexan-1-one'],
  ['(+)-camphor', '(1R,4R)-1,7,7-trimethylbicyclo[2.2.1]heptan-2-one'],
  ['(+)-borneol', '(1R,2S,4R)-1,7,7-trimethylbicyclo[2.2.1]heptan-2-ol'],
  ['(−)-isoborneol', '(1R,2R,4R)-1,7,7-trimethylbicyclo[2.2.1]heptan-2-ol'],
  ['(+)-fenchone', '(1S,4R)-1,3,3-trimethylbicyclo[2.2.1]heptan-2-one'],
  ['(+)-limonene', '(4R)-1-methyl-4-(prop-1-en-2-yl)cyclohex-1-ene'],
  ['(R)-limonene', '(4R)-1-methyl-4-(prop-1-en-2-yl)cyclohex-1-ene'],
  ['(R)-(+)-limonene', '(4R)-1-methyl-4-(prop-1-en-2-yl)cyclohex-1-ene'],
  ['(−)-carvone', '(5R)-2-methyl-5-(prop-1-en-2-yl)cyclohex-2-en-1-one'],
  ['(S)-(+)-carvone', '(5S)-2-methyl-5-(prop-1-en-2-yl)cyclohex-2-en-1-one'],
  ['(+)-α-pinene', '(1R,5R)-2,6,6-trimethylbicyclo[3.1.1]hept-2-ene'],
  ['(−)-α-pinene', '(1S,5S)-2,6,6-trimethylbicyclo[3.1.1]hept-2-ene'],
  ['(−)-β-pinene', '(1S,5S)-6,6-dimethyl-2-methylidenebicyclo[3.1.1]heptane'],
  ['(+)-α-terpineol', '2-[(1R)-4-methylcyclohex-3-en-1-yl]propan-2-ol'],
  ['(−)-linalool', '(3R)-3,7-dimethylocta-1,6-dien-3-ol'],
  ['(+)-citronellol', '(3R)-3,7-dimethyloct-6-en-1-ol'],
  ['(+)-citronellal', '(3R)-3,7-dimethyloct-6-enal'],
  ['(−)-perillyl alcohol', '[(4S)-4-(prop-1-en-2-yl)cyclohex-1-en-1-yl]methanol'],
  ['geraniol', '(2E)-3,7-dimethylocta-2,6-dien-1-ol'],
  ['nerol', '(2Z)-3,7-dimethylocta-2,6-dien-1-ol'],
  ['(2E,6E)-farnesol', '(2E,6E)-3,7,11-trimethyldodeca-2,6,10-trien-1-ol'],
  ['geranyl acetate', '(2E)-3,7-dimethylocta-2,6-dien-1-yl acetate'],
  ['neryl acetate', '(2Z)-3,7-dimethylocta-2,6-dien-1-yl acetate'],
  ['(−)-menthyl acetate', '(1R,2S,5R)-5-methyl-2-(propan-2-yl)cyclohexyl acetate'],
  ['(+)-bornyl acetate', '(1R,2S,4R)-1,7,7-trimethylbicyclo[2.2.1]heptan-2-yl acetate'],
  ['(−)-isobornyl acetate', '(1R,2R,4R)-1,7,7-trimethylbicyclo[2.2.1]heptan-2-yl acetate'],
  ['(−)-linalyl acetate', '(3R)-3,7-dimethylocta-1,6-dien-3-yl acetate'],
  ['(+)-citronellyl acetate', '(3R)-3,7-dimethyloct-6-en-1-yl acetate'],
  ['prenyl acetate', '3-methylbut-2-en-1-yl acetate'],
])('%s is %s', (name, systematic) => {
  expect(canonicalSmiles(only(name).molecule)).toBe(canonicalSmiles(only(systematic).molecule));
});

test.each([
  ['menthol', 2],
  ['camphor', 2],
  ['borneol', 2],
  ['isoborneol', 2],
  ['limonene', 2],
  ['(±)-menthol', 2],
  ['bornyl acetate', 2],
  ['linalool', 2],
  ['farnesol', 4],
])('%s leaves %i enantiomers open', (name, count) => {
  expect(only(name).stereoisomers).toHaveLength(count);
});

test('a sign does not decide between the D and L series', () => {
  const [plain, signed] = ['L-tartaric acid', 'L-(+)-tartaric acid'].map((name) =>
    canonicalSmiles(only(name).molecule),
  );
  expect(signed).toBe(plain);
});

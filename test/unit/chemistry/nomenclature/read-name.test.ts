import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { createNameReader } from '../../../../server/chemistry/nomenclature/read-name.ts';
import type { NameReading, Reading } from '../../../../server/chemistry/nomenclature/reading.ts';
import { canonicalSmiles } from '../../../../server/chemistry/structure/canonical-smiles.ts';

const { readName, vocabularyWords } = createNameReader();

function readingsOf(name: string): readonly Reading[] {
  const read = readName(name);
  if (read.kind !== 'understood') throw new Error(`${name}: ${read.kind}`);
  return read.readings;
}
const completed = (name: string) => readingsOf(name).map((reading) => reading.name);
const isomers = (name: string) => readingsOf(name).map((reading) => reading.stereoisomers.length);

describe('missing locants', () => {
  it.each([
    ['chlorotoluene', ['2-chlorotoluene', '3-chlorotoluene', '4-chlorotoluene']],
    ['butanol', ['butan-1-ol', 'butan-2-ol']],
    ['dichlorobenzene', ['1,2-dichlorobenzene', '1,3-dichlorobenzene', '1,4-dichlorobenzene']],
    ['methylpropane', ['methylpropane']],
    ['chlorobenzene', ['chlorobenzene']],
    ['methylpropanol', ['2-methylpropan-1-ol', '2-methylpropan-2-ol']],
    ['nitrophenol', ['2-nitrophenol', '3-nitrophenol', '4-nitrophenol']],
    ['pentene', ['pent-1-ene', 'pent-2-ene']],
    ['propanol', ['propan-1-ol', 'propan-2-ol']],
    ['heptanone', ['heptan-2-one', 'heptan-3-one', 'heptan-4-one']],
    ['trichlorobenzene', ['1,2,3-trichlorobenzene', '1,2,4-trichlorobenzene', '1,3,5-trichlorobenzene']],
    ['xylene', ['o-xylene', 'm-xylene', 'p-xylene']],
    ['ethanol', ['ethanol']],
    ['cyclohexanol', ['cyclohexanol']],
    ['2-methoxyethanol', ['2-methoxyethanol']],
  ])('%s', (name, expected) => {
    expect(completed(name)).toEqual(expected);
  });

  it('places two methyl groups on cyclohexane in four ways', () => {
    expect(readingsOf('dimethylcyclohexane')).toHaveLength(4);
  });

  it('offers side chain and ring, with the bracket that tells them apart', () => {
    expect(completed('chloromethylbenzene')[0]).toBe('(chloromethyl)benzene');
  });
});

describe('arrangement in space', () => {
  it.each([
    ['but-2-ene', 2],
    ['butan-2-ol', 2],
    ['tartaric acid', 3],
    ['1,2-dimethylcyclohexane', 3],
    ['penta-2,3-diene', 2],
    ['camphor', 2],
    ['cyclohexene', 0],
    ['(2R)-butan-2-ol', 0],
    ['(2E,4E)-hexa-2,4-diene', 0],
    ['cis-but-2-ene', 0],
  ])('%s leaves open %i', (name, count) => {
    expect(isomers(name)).toEqual([count]);
  });

  it('writes descriptors where they belong', () => {
    expect(
      readingsOf('butan-2-ol')[0]!
        .stereoisomers.map((one) => one.name)
        .sort(),
    ).toEqual(['(2R)-butan-2-ol', '(2S)-butan-2-ol']);
    expect(
      readingsOf('butyl 2-hydroxypropanoate')[0]!
        .stereoisomers.map((one) => one.name)
        .sort(),
    ).toEqual(['butyl (2R)-2-hydroxypropanoate', 'butyl (2S)-2-hydroxypropanoate']);
    expect(
      readingsOf('4-butan-2-ylphenol')[0]!
        .stereoisomers.map((one) => one.name)
        .sort(),
    ).toEqual(['4-[(2R)-butan-2-yl]phenol', '4-[(2S)-butan-2-yl]phenol']);
  });

  it('says when a descriptor is about nothing, with its place', () => {
    const read = readName('(2R)-propan-2-ol');
    expect(read.kind === 'understood' && read.remarks).toMatchObject([
      { kind: 'stereo-meaningless', range: { start: 1, end: 3 } },
    ]);
  });
});

describe('what is not understood', () => {
  it('stops at the word and offers the nearest known one', () => {
    const read = readName('4-bromotolueen');
    expect(read).toMatchObject({ kind: 'unknown' });
    expect(read.kind === 'unknown' && read.suggestions.length).toBeGreaterThan(0);
  });

  it.each([
    ['7-methylpentane', 'position 7'],
    ['1,1,1,1-tetrachloroethane', 'valence'],
    ['2-methylbenzofurane-99-ol', ''],
  ])('%s', (name, part) => {
    const read = readName(name);
    expect(read.kind).toBe('unknown');
    expect(read.kind === 'unknown' && read.message).toContain(part);
  });
});

it.each([
  ['benzene, 1-bromo-4-chloro-', '1-bromo-4-chlorobenzene'],
  ['N,N′‑dimethylurea', "N,N'-dimethylurea"],
  ['Methanesulphonic acid', 'methanesulfonic acid'],
  ['p-nitrobenzyl alcohol', '(4-nitrophenyl)methanol'],
  ['2-butanol', 'butan-2-ol'],
  ['tert-butyl methyl ether', '2-methoxy-2-methylpropane'],
  ['acetic anhydride', 'Ac2O'],
  ['THF', 'oxolane'],
  ['DMF', 'N,N-dimethylformamide'],
  ['sodium hydroxide', 'NaOH'],
])('%s is %s', (one, other) => {
  expect(canonicalSmiles(readingsOf(one)[0]!.molecule)).toBe(canonicalSmiles(readingsOf(other)[0]!.molecule));
});

it.each(['hexanes', 'petroleum ether', 'brine', 'xylenes'])('%s is a mixture', (name) => {
  expect(readName(name).kind).toBe('mixture');
});

it('reads its own completed names back as the same single structure', () => {
  const names = [
    'butanol',
    'chlorotoluene',
    'dichlorobenzene',
    'methylpentanone',
    'bromochlorobenzene',
    'hexenal',
    'dimethylpyridine',
    'methylcyclohexanol',
    'heptan-3-ol',
    'but-2-enoic acid',
    'butyl 2-hydroxypropanoate',
    '4-butan-2-yloxyphenol',
    '1-(2-hydroxypropoxy)butan-2-ol',
    'cyclohexenol',
    'methylindole',
    'chloroquinoline',
    'tartaric acid',
    'dimethylcyclobutane',
  ];
  for (const name of names) {
    for (const reading of readingsOf(name)) {
      const said = reading.stereoisomers.length > 0 ? reading.stereoisomers : [reading];
      for (const one of said) {
        const again = readingsOf(one.name);
        expect(
          again.map((back) => canonicalSmiles(back.molecule)),
          one.name,
        ).toEqual([canonicalSmiles(one.molecule)]);
        expect(again[0]!.stereoisomers, one.name).toHaveLength(0);
      }
    }
  }
});

function inside(read: NameReading, text: string): void {
  const ranges =
    read.kind === 'unknown'
      ? [read.range]
      : read.kind === 'understood'
        ? read.remarks.map((one) => one.range)
        : [];
  for (const { start, end } of ranges) {
    expect(start).toBeGreaterThanOrEqual(0);
    expect(end).toBeGreaterThanOrEqual(start);
    expect(end).toBeLessThanOrEqual(text.length);
  }
}

it('survives any text, with ranges inside it', () => {
  fc.assert(
    fc.property(fc.string({ maxLength: 60 }), (text) => {
      inside(readName(text), text);
    }),
    { seed: 7, numRuns: 300 },
  );
});

it('survives names put together at random from its own words', () => {
  const words = vocabularyWords().slice(0, 4000);
  const piece = fc.oneof(
    fc.constantFrom(...words),
    fc.constantFrom('-', '1,2-', '(', ')', '[', ']', 'di', 'N-', '(2R)-', ' ', '2H-'),
  );
  fc.assert(
    fc.property(fc.array(piece, { maxLength: 9 }), (pieces) => {
      const text = pieces.join('');
      inside(readName(text, { steps: 400 }), text);
    }),
    { seed: 11, numRuns: 300 },
  );
});

it.each([
  '('.repeat(1400),
  'methyl'.repeat(240),
  '1,'.repeat(700),
  'x'.repeat(100_000),
  'di'.repeat(700),
  '(2R)-'.repeat(290),
])('is bounded on long nonsense %#', (text) => {
  expect(readName(text).kind).toBe('unknown');
});

it.each([
  ['2-ethylpentane', '3-methylhexane'],
  ['2-ethyl-4-methylpentane', '2,4-dimethylhexane'],
  ['1-chloro-1-methylpropane', '2-chlorobutane'],
  ['3-propylbutane', '3-methylhexane'],
])('%s is improper for %s', (name, proper) => {
  const read = readName(name);
  if (read.kind !== 'understood') throw new Error(read.kind);
  expect(read.remarks).toMatchObject([{ kind: 'improper', fixes: [{ edits: [{ newText: proper }] }] }]);
  expect(canonicalSmiles(readingsOf(proper)[0]!.molecule)).toBe(canonicalSmiles(read.readings[0]!.molecule));
});

it.each([
  '3-methylhexane',
  '2-propylpentanoic acid',
  '2-ethylbut-1-ene',
  'methylpropane',
  '4-(1-methylethyl)heptane',
])('%s is not called improper', (name) => {
  const read = readName(name);
  expect(read.kind === 'understood' && read.remarks).toEqual([]);
});

/**
 * No name takes more than a bounded number of steps, whatever it is made of; where the bound is met, that is said. A name
 * without bound would not come back at all, so no time is asserted here; `adversarial.bench.ts` prints it.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { createNameReader, readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import type { NameReading } from '../../../server/chemistry/nomenclature/reading.ts';
import { adversarialNames } from '../../support/adversarial-names.ts';

const reader = createNameReader();

/** What holds of every answer. */
function isHonest(text: string, reading: NameReading): void {
  if (reading.kind === 'unknown') {
    expect(reading.message).not.toBe('');
    expect(reading.range.start).toBeGreaterThanOrEqual(0);
    expect(reading.range.end).toBeLessThanOrEqual(text.length);
    return;
  }
  if (reading.kind === 'mixture') return;
  expect(reading.readings.length).toBeGreaterThan(0);
  expect(reading.readings.length).toBeLessThanOrEqual(32);
  if (reading.count !== undefined) expect(reading.count).toBeGreaterThanOrEqual(reading.readings.length);
  // One reading is never claimed where looking for more was given up.
  if (reading.atLeast === true) expect(reading.count).toBeGreaterThan(1);
  for (const { stereoisomers, stereoisomerCount } of reading.readings) {
    expect(stereoisomers.length).not.toBe(1);
    expect(stereoisomers.length).toBeLessThanOrEqual(32);
    if (stereoisomerCount !== undefined) expect(stereoisomerCount).toBeGreaterThan(stereoisomers.length);
  }
}

describe('names made to be hard', () => {
  test.each(adversarialNames)('%s', { timeout: 60_000 }, (_family, name) => {
    for (const size of [1, 3, 10, 60]) {
      const text = name(size);
      isHonest(text, reader.readName(text));
    }
  });

  test('a name longer than the longest is turned away with the number', () => {
    const reading = readName('methyl'.repeat(400));
    expect(reading.kind === 'unknown' && reading.message).toMatch(/1500/);
  });
});

test.each(['icosahexaenoic acid', 'bromochlorofluoroiodomethylicosane'])(
  '%s: the number of readings is a lower bound, and said to be one',
  (name) => {
    const reading = readName(name);
    expect(reading).toMatchObject({ kind: 'understood', atLeast: true });
    expect(reading.kind === 'understood' && reading.count).toBeGreaterThan(100);
  },
);

test('with fewer steps less is looked at, and never more is claimed', () => {
  for (const steps of [1, 5, 20, 100]) {
    for (const name of ['bromochlorofluorobenzene', 'dichloronaphthalene', '2-(4-chlorophenyl)ethan-1-ol']) {
      const reading = readName(name, { steps });
      isHonest(name, reading);
      const whole = readName(name);
      if (reading.kind !== 'understood' || whole.kind !== 'understood') continue;
      const [some, all] = [reading, whole].map(({ count, readings }) => count ?? readings.length);
      expect(some).toBeLessThanOrEqual(all!);
      if (some! < all!) expect(reading.atLeast).toBe(true);
    }
  }
});

test('any row of words, brackets and numbers is survived', () => {
  const words = [
    'methyl',
    'di',
    'bis',
    'tetra',
    'chloro',
    'oxy',
    'phenyl',
    'benzene',
    'an',
    'e',
    'ol',
    'oic acid',
  ];
  const signs = [
    '(',
    ')',
    '[',
    ']',
    '-',
    ',',
    "'",
    ' ',
    '1',
    '2,3',
    'N',
    '(R)',
    'cis',
    'rac-',
    '4a',
    '1H-',
    'spiro[',
  ];
  const text = fc.array(fc.constantFrom(...words, ...signs), { minLength: 5, maxLength: 120 });
  fc.assert(
    fc.property(text, (pieces) => {
      const name = pieces.join('').slice(0, 1500);
      isHonest(name, reader.readName(name));
    }),
    { seed: 20260117, numRuns: 300 },
  );
});

/** What a name says of the isomers it stands for. */
import { expect, it } from 'vitest';
import { isomersOfName } from '../../../../server/checks/shared/isomers-of-name.ts';

it.each([
  // P-93.1.3 of the 2013 recommendations: rac and rel, RS and R* in their place.
  ['rac-(2R)-butan-2-ol', 'racemate'],
  ['(±)-butan-2-ol', 'racemate'],
  ['(+/-)-menthol', 'racemate'],
  ['(2RS)-butan-2-ol', 'racemate'],
  ['DL-alanine', 'racemate'],
  ['rel-(2R,3S)-3-bromobutan-2-ol', 'relative'],
  ['(2R*,3S*)-3-bromobutan-2-ol', 'relative'],
  ['(2R)-butan-2-ol', undefined],
  ['L-alanine', undefined],
  ['(+)-menthol', undefined],
  ['racemic acid', 'racemate'],
  ['S-methyl ethanethioate', undefined],
  ['', undefined],
])('%s: %s', (name, kind) => {
  expect(isomersOfName(name)).toBe(kind);
});

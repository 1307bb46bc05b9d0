/** The SMILES reader: what is refused, and on which characters; nothing breaks it. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { readSmiles } from '../../../../server/chemistry/structure/read-smiles.ts';

/** `CC«(»C`: the characters between the marks are those that the problem must name. */
function expectProblem(marked: string, message: RegExp) {
  const start = marked.indexOf('«');
  const end = marked.indexOf('»') - 1;
  const { problem } = readSmiles(marked.replace(/[«»]/g, ''));
  expect(problem?.message).toMatch(message);
  expect(problem?.range).toEqual({ start, end });
}

describe('a problem names the exact characters', () => {
  test.each([
    ['CC«(»C', /never closed/],
    ['CC«)»C', /never opened/],
    ['C«1»CC', /Ring closure 1 is opened/],
    ['C«%12»CC', /Ring closure 12/],
    ['«[»CC', /never closed/],
    ['C«]»C', /never opened/],
    ['C[«Xx»]C', /no element symbol/],
    ['C«Z»C', /without brackets/],
    ['C«Na»C', /\[Na\]/],
    ['C«==»C', /Two bond symbols/],
    ['CC«=»', /no atom after it/],
    ['«=»CC', /no atom before it/],
    ['C«()»C', /empty/],
    ['C«1»1', /closed|itself/],
    ['C12CC1«2»', /already bonded/],
    ['C=1CCCC«-1»', /different symbols/],
    ['C«.»', /none after it/],
    ['«.»C', /none before it/],
    ['C« CC»', /no spaces/],
    ['C«☃»C', /no meaning/],
    ['C«😀»C', /no meaning/],
    ['c1cc«n»c1', /\[nH\]/],
    ['F/C(«\\»Cl)=C/F', /contradict/],
    ['[C«@TH3»H](F)(Cl)Br', /no chirality class/],
    ['[C«H+x»]', /not understood/],
  ])('%s', (marked, message) => {
    if (marked === 'C«1»1') return expect(readSmiles('C11').problem?.message).toMatch(/itself/);
    if (marked === '[C«H+x»]') return expectProblem('[CH+«x»]', message);
    return expectProblem(marked, message);
  });
});

describe('places', () => {
  test('every atom and bond knows where it stands', () => {
    const { value } = readSmiles(' CC(=O)[13CH3]Cl ');
    expect(value?.atoms.map(({ range }) => ' CC(=O)[13CH3]Cl '.slice(range.start, range.end))).toEqual([
      'C',
      'C',
      'O',
      '[13CH3]',
      'Cl',
    ]);
    expect(value?.bonds[1]?.range).toEqual({ start: 4, end: 5 });
  });
});

describe('any text is survived', () => {
  const smilesLike = fc.string({
    unit: fc.constantFrom(...'CNOScnos[]()=#/\\@+-123%.Hl*:$~ F'),
    maxLength: 60,
  });
  test.each([
    ['characters of SMILES', smilesLike],
    ['any characters', fc.string({ unit: 'binary', maxLength: 40 })],
  ])('%s', (_title, texts) => {
    fc.assert(
      fc.property(texts, (text) => {
        const read = readSmiles(text);
        if (read.problem === undefined) return;
        expect(read.problem.range.start).toBeGreaterThanOrEqual(0);
        expect(read.problem.range.end).toBeGreaterThanOrEqual(read.problem.range.start);
        expect(read.problem.range.end).toBeLessThanOrEqual(text.length);
      }),
      { seed: 20260101, numRuns: 3000 },
    );
  });

  test('a hundred thousand atoms, parentheses and rings', () => {
    expect(readSmiles('C'.repeat(100_000)).value?.atoms.length).toBe(100_000);
    expect(readSmiles('C('.repeat(100_000) + 'C' + ')'.repeat(100_000)).value?.atoms.length).toBe(100_001);
    expect(readSmiles('('.repeat(100_000)).problem).toBeDefined();
    expect(readSmiles('c1ccccc1'.repeat(5_000)).value?.atoms.length).toBe(30_000);
  });
});

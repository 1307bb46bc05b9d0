import { describe, expect, it } from 'vitest';
import { compoundKeys, reactionKeys } from '../../../server/notebook/keys.ts';
import { nearestKey, readKey } from '../../../server/notebook/read-key.ts';

it('knows every key as it is written, in capitals and without its spaces', () => {
  for (const key of compoundKeys) {
    expect(readKey('compound', key)).toBe(key);
    expect(readKey('compound', ` ${key.toUpperCase()} `)).toBe(key);
    expect(readKey('compound', key.replace(/ /g, ''))).toBe(key);
  }
  for (const key of reactionKeys) expect(readKey('reaction', key)).toBe(key);
});

// Common practice in experimental sections, no source.
it.each([
  ['MW', 'molar mass'],
  ['M.W.', 'molar mass'],
  ['Mr', 'molar mass'],
  ['M.p.', 'mp'],
  ['m. p.', 'mp'],
  ['b.p.', 'bp'],
  ['Boiling point', 'bp'],
  ['Anal.', 'combustion'],
  ['[α]D', 'rotation'],
  ['[α]_D^20', 'rotation'],
  ['[a]20D', 'rotation'],
  ['n20D', 'nD'],
  ['nD20', 'nD'],
  ['δH', '1H NMR'],
  ['¹H NMR', '1H NMR'],
  ['1H-NMR', '1H NMR'],
  ['13C{1H} NMR', '13C NMR'],
  ['1H NMR (400 MHz, CDCl3)', '1H NMR'],
  ['HRMS (ESI)', 'HRMS'],
  ['CAS', 'CAS RN'],
  ['CAS No.', 'CAS RN'],
])('reads %s', (written, key) => {
  expect(readKey('compound', written)).toBe(key);
});

it('reads the keys of a reaction', () => {
  expect(readKey('reaction', 'Equation')).toBe('scheme');
  expect(readKey('reaction', 'SMILES')).toBeUndefined();
  expect(readKey('compound', 'scheme')).toBeUndefined();
  expect(readKey('compound', 'label (old)')).toBeUndefined();
});

describe('the nearest key', () => {
  it.each([
    ['formla', 'formula'],
    ['SMILE', 'SMILES'],
    ['boling point', 'bp'],
    ['InChi Key', 'InChIKey'],
    ['molarmas', 'molar mass'],
    ['aperance', 'appearance'],
  ])('of %s', (written, key) => {
    expect(readKey('compound', written) ?? nearestKey('compound', written)).toBe(key);
  });

  it('is none when nothing is near', () => {
    expect(nearestKey('compound', 'weather of the day')).toBeUndefined();
    expect(nearestKey('compound', 'x'.repeat(100_000))).toBeUndefined();
  });
});

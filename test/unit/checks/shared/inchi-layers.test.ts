/** Taking an InChI apart and naming the first layer in which two differ. */
import { describe, expect, it } from 'vitest';
import {
  areMirrorImages,
  firstDifference,
  rangeOf,
  readInchi,
  textOf,
} from '../../../../server/checks/shared/inchi-layers.ts';

const butanol = 'InChI=1S/C4H10O/c1-3-4(2)5/h4-5H,3H2,1-2H3';

describe('an InChI', () => {
  it('is taken apart into layers with their places', () => {
    const text = `${butanol}/t4-/m1/s1`;
    const inchi = readInchi(text)!;
    expect(inchi.standard).toBe(true);
    expect(inchi.layers.map((layer) => layer.key)).toEqual(['formula', 'c', 'h', 't', 'm', 's']);
    const stereo = rangeOf(inchi, 'stereo')!;
    expect(text.slice(stereo.start, stereo.end)).toBe('t4-/m1/s1');
    expect(textOf(readInchi(butanol)!, 'stereo')).toBe('');
  });

  it('keeps the stereo of the isotopic layer apart from the isotopes', () => {
    const inchi = readInchi('InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3/i2D/t2-/m0/s1')!;
    expect(inchi.layers.map((layer) => layer.key)).toEqual(['formula', 'c', 'h', 'i', 'i/t', 'i/m', 'i/s']);
    expect(textOf(inchi, 'isotopes')).toBe('i=i2D');
  });

  it('is not one when it does not begin as one', () => {
    for (const text of ['', 'InChI=', 'InChI=2/C', 'CCO', 'inchi=1S/CH4'])
      expect(readInchi(text)).toBeUndefined();
  });

  it.each([
    ['InChI=1S/C4H8O/c1-3-4(2)5/h4-5H', 'formula'],
    ['InChI=1S/C4H10O/c1-2-3-4-5/h5H,2-4H2,1H3', 'connections'],
    ['InChI=1S/C4H10O/c1-3-4(2)5/h3-5H,1-2H3', 'hydrogens'],
    [`${butanol}/p+1`, 'charge'],
    [`${butanol}/i4D`, 'isotopes'],
    [`${butanol}/t4-/m1/s1`, 'stereo'],
    [butanol, undefined],
  ])('%s differs first in %s', (other, kind) => {
    expect(firstDifference(readInchi(butanol)!, readInchi(other)!)).toBe(kind);
  });

  it('of the mirror image differs in one layer', () => {
    const one = readInchi(`${butanol}/t4-/m1/s1`)!;
    expect(areMirrorImages(one, readInchi(`${butanol}/t4-/m0/s1`)!)).toBe(true);
    expect(areMirrorImages(one, one)).toBe(false);
    expect(areMirrorImages(one, readInchi(butanol)!)).toBe(false);
  });
});

import { describe, expect, it } from 'vitest';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';
import type { NameReading, Reading } from '../../../server/chemistry/nomenclature/reading.ts';
import { readingJson, structuresIn } from '../../../server/cli/reading-json.ts';

const molecule = readSmiles('CC(O)CC').value!;
const isomers = ['R', 'S'].map((name) => ({ name, molecule }));
const closed: Reading = { name: 'a', molecule, stereoisomers: [] };
const open: Reading = { name: 'b', molecule, stereoisomers: isomers };
const identifiers = () => ({ smiles: 'CCC(C)O', inchikey: null });

function understood(readings: readonly Reading[], more: { count?: number } = {}): NameReading {
  return { kind: 'understood', readings, remarks: [], ...more };
}

describe('the JSON of a reading', () => {
  it('says how definite the name is', () => {
    const status = (reading: NameReading) => readingJson('x', reading, identifiers).status;
    expect(status(understood([closed]))).toBe('definite');
    expect(status(understood([open]))).toBe('stereo-open');
    expect(status(understood([closed, open]))).toBe('ambiguous');
    expect(status({ kind: 'mixture', message: '', components: [] })).toBe('mixture');
    expect(
      status({ kind: 'unknown', stoppedAt: 1, range: { start: 1, end: 2 }, message: '', suggestions: [] }),
    ).toBe('unknown');
  });

  it('has the members that others rely on', () => {
    expect(readingJson('x', understood([open]), identifiers)).toEqual({
      name: 'x',
      status: 'stereo-open',
      readings: [
        {
          name: 'b',
          smiles: 'CCC(C)O',
          inchikey: null,
          formula: 'C4H10O',
          stereoisomers: [
            { name: 'R', smiles: 'CCC(C)O', inchikey: null },
            { name: 'S', smiles: 'CCC(C)O', inchikey: null },
          ],
        },
      ],
    });
  });

  it('tells the whole number when a list was cut', () => {
    expect(readingJson('x', understood([closed, open], { count: 90 }), identifiers)).toMatchObject({
      truncated: true,
      count: 90,
    });
    const cut = { ...open, stereoisomerCount: 64 };
    const json = readingJson('x', understood([cut]), identifiers);
    expect(json).toMatchObject({ truncated: true, count: 64, readings: [{ truncated: true, count: 64 }] });
    expect(readingJson('x', understood([open]), identifiers)).not.toHaveProperty('truncated');
  });

  it('asks identifiers for every structure in it', () => {
    expect(structuresIn(understood([closed, open]))).toHaveLength(4);
    expect(structuresIn({ kind: 'mixture', message: '', components: [closed] })).toHaveLength(1);
  });
});

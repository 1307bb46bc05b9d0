/**
 * How many structures a name without locants has, counted apart from the engine: the positions of the bare parent, what
 * each can take, and the parent's symmetry are typed by hand; the number of ways to set groups on them is the number of
 * orbits (Cauchy and Frobenius). Totals that are published stand beside, as a check on the hand-typed symmetries.
 */
import { describe, expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { withStereo } from '../../../server/chemistry/structure/molecule.ts';

interface Parent {
  readonly name: string;
  /** How many groups each position takes. */
  readonly room: readonly number[];
  /** Permutations that generate the symmetry of the parent: position → position. */
  readonly turns: readonly (readonly number[])[];
}

const ones = (size: number) => Array.from({ length: size }, () => 1);
const flat = (name: string, size: number, ...turns: number[][]): Parent => ({
  name,
  room: ones(size),
  turns,
});
/** A chain of carbon, which can be read from either end. */
const chain = (name: string, size: number): Parent => ({
  name,
  room: Array.from({ length: size }, (_, at) => (size === 1 ? 4 : at === 0 || at === size - 1 ? 3 : 2)),
  turns: [Array.from({ length: size }, (_, at) => size - 1 - at)],
});
/** A saturated ring, two hydrogens at every carbon; the two sides are told apart by stereodescriptors only. */
const ring = (name: string, size: number): Parent => ({
  name,
  room: Array.from({ length: size }, () => 2),
  turns: [
    Array.from({ length: size }, (_, at) => (at + 1) % size),
    Array.from({ length: size }, (_, at) => (size - at) % size),
  ],
});

const benzene = flat('benzene', 6, [1, 2, 3, 4, 5, 0], [0, 5, 4, 3, 2, 1]);
// Positions 2 to 6 beside the group at 1: the plane through 1 and 4 is all the symmetry.
const five = (name: string) => flat(name, 5, [4, 3, 2, 1, 0]);
const toluene = five('toluene');
const phenol = five('phenol');
const pyridine = five('pyridine');
// 1 2 3 4 5 6 7 8: across the long axis and across the short one.
const naphthalene = flat('naphthalene', 8, [7, 6, 5, 4, 3, 2, 1, 0], [3, 2, 1, 0, 7, 6, 5, 4]);
// 1 2 3 4 5 6 7 8 9 10.
const anthracene = flat('anthracene', 10, [7, 6, 5, 4, 3, 2, 1, 0, 8, 9], [3, 2, 1, 0, 7, 6, 5, 4, 9, 8]);
const phenanthrene = flat('phenanthrene', 10, [7, 6, 5, 4, 3, 2, 1, 0, 9, 8]);
// 2 3 4 5 6 2' 3' 4' 5' 6': each ring turns by itself, and the two change places.
const biphenyl = flat('biphenyl', 10, [4, 3, 2, 1, 0, 5, 6, 7, 8, 9], [5, 6, 7, 8, 9, 0, 1, 2, 3, 4]);
// 1 2 3 4 6 7 8 9 between two oxygens: the same symmetry as naphthalene.
const dioxin = { ...naphthalene, name: 'dibenzo-p-dioxin' };
// 2 3 4 5 about one hetero atom.
const furan = flat('furan', 4, [3, 2, 1, 0]);
const thiophene = flat('thiophene', 4, [3, 2, 1, 0]);
const quinoline = flat('quinoline', 7);
const isoquinoline = flat('isoquinoline', 7);
// 2 4 5 6 of pyrimidine, 3 4 5 6 of pyridazine, 2 3 5 6 of pyrazine.
const pyrimidine = flat('pyrimidine', 4, [0, 3, 2, 1]);
const pyridazine = flat('pyridazine', 4, [3, 2, 1, 0]);
const pyrazine = flat('pyrazine', 4, [1, 0, 3, 2], [3, 2, 1, 0]);

/** The group that the turns generate. */
function symmetryOf({ turns, room }: Parent): number[][] {
  const start = room.map((_, at) => at);
  const found = new Map([[start.join(), start]]);
  for (const one of found.values())
    for (const turn of turns) {
      const next = one.map((at) => turn[at]!);
      if (!found.has(next.join())) found.set(next.join(), next);
    }
  return [...found.values()];
}

/** Ways to set the groups on the parent, each group with its number, that no symmetry carries into one another. */
function placements(parent: Parent, groups: readonly number[]): number {
  const kinds = groups.flatMap((count, kind) => Array.from({ length: count }, () => kind));
  let ways: string[][] = [parent.room.map(() => '')];
  for (const kind of kinds) {
    const next = new Map<string, string[]>();
    for (const way of ways)
      for (const [at, held] of way.entries()) {
        if (held.length === parent.room[at]) continue;
        const placed = way.with(at, [...held, String(kind)].sort().join(''));
        next.set(placed.join(), placed);
      }
    ways = [...next.values()];
  }
  const symmetry = symmetryOf(parent);
  return new Set(ways.map((way) => symmetry.map((turn) => turn.map((at) => way[at]!).join()).sort()[0]!))
    .size;
}

const multiple = ['', '', 'di', 'tri', 'tetra', 'penta', 'hexa', 'hepta', 'octa', 'nona', 'deca'];

function readingsOf(name: string): number {
  const reading = readName(name, { readings: 100 });
  if (reading.kind !== 'understood') throw new Error(`${name}: ${reading.message}`);
  const constitutions = reading.readings.map(({ molecule }) => canonicalSmiles(withStereo(molecule, [])));
  expect(new Set(constitutions).size).toBe(constitutions.length);
  return reading.count ?? reading.readings.length;
}

describe('one kind of group, any number', () => {
  test.each<[parent: Parent, group: string, published: readonly number[]]>([
    // Benzenes: 1 3 3 3 1 1 (Kekulé's proof; Pólya 1937).
    [benzene, 'chloro', [1, 3, 3, 3, 1, 1]],
    // Polychlorinated naphthalenes: 75 congeners, 2 10 14 22 14 10 2 1 (from memory).
    [naphthalene, 'chloro', [2, 10, 14, 22, 14, 10, 2, 1]],
    // Polychlorinated biphenyls: 209 congeners, 3 12 24 42 46 42 24 12 3 1 (IUPAC numbering of PCBs, from memory).
    [biphenyl, 'chloro', [3, 12, 24, 42, 46, 42, 24, 12, 3, 1]],
    // Polychlorinated dibenzo-p-dioxins: 75 congeners (from memory).
    [dioxin, 'chloro', [2, 10, 14, 22, 14, 10, 2, 1]],
    [anthracene, 'chloro', [3, 15]],
    [phenanthrene, 'bromo', [5, 25]],
    [pyridine, 'chloro', [3, 6, 6, 3, 1]],
    [toluene, 'nitro', [3, 6]],
    [toluene, 'bromo', [3, 6, 6, 3, 1]],
    [phenol, 'fluoro', [3, 6, 6, 3, 1]],
    [furan, 'bromo', [2, 4, 2, 1]],
    [thiophene, 'chloro', [2, 4, 2, 1]],
    [quinoline, 'methyl', [7, 21]],
    [isoquinoline, 'chloro', [7, 21]],
    [pyrimidine, 'chloro', [3, 4, 3, 1]],
    [pyridazine, 'methyl', [2, 4, 2, 1]],
    [pyrazine, 'chloro', [1, 3, 1, 1]],
    // Chloropropanes: 2 4 5; chlorobutanes with the straight chain: 2 6 (textbook exercise, no source).
    [chain('ethane', 2), 'chloro', [1, 2, 2, 2, 1, 1]],
    [chain('propane', 3), 'chloro', [2, 4, 5, 6, 5, 4, 2, 1]],
    [chain('butane', 4), 'bromo', [2, 6, 9]],
    [chain('pentane', 5), 'fluoro', [3, 9]],
    [chain('hexane', 6), 'iodo', [3, 12]],
    [ring('cyclopropane', 3), 'chloro', [1, 2]],
    [ring('cyclobutane', 4), 'fluoro', [1, 3]],
    [ring('cyclopentane', 5), 'chloro', [1, 3]],
    [ring('cyclohexane', 6), 'chloro', [1, 4]],
  ])('%j', (parent, group, published) => {
    for (const [index, total] of published.entries()) {
      const count = index + 1;
      expect(placements(parent, [count])).toBe(total);
      const name = `${multiple[count]!}${group}${parent.name}`;
      expect([name, readingsOf(name)]).toEqual([name, total]);
    }
  });
});

describe('groups of several kinds', () => {
  const kinds: readonly (readonly [prefix: string, groups: readonly number[]])[] = [
    ['bromochloro', [1, 1]],
    ['bromochlorofluoro', [1, 1, 1]],
    ['bromodichloro', [1, 2]],
    ['dibromodichloro', [2, 2]],
    ['chlorofluoroiodo', [1, 1, 1]],
  ];
  const parents = [benzene, toluene, phenol, pyridine, furan, naphthalene, pyrimidine];
  const chains = [chain('ethane', 2), chain('propane', 3), chain('butane', 4), ring('cyclohexane', 6)];
  test.each([...parents, ...chains])('$name', (parent) => {
    for (const [prefix, groups] of kinds) {
      const name = `${prefix}${parent.name}`;
      expect([name, readingsOf(name)]).toEqual([name, placements(parent, groups)]);
    }
  });

  test('bromochlorofluorobenzene has ten (textbook exercise, no source)', () => {
    expect(placements(benzene, [1, 1, 1])).toBe(10);
  });
});

/** Settles a reading's arrangement in space from the descriptors of its name, and lists what they leave open. */
import { assignDescriptors, type Refusal } from '../structure/assign-descriptors.ts';
import { hasHinderedAxis } from '../structure/hindered-axis.ts';
import { cipDescriptors } from '../structure/cip/descriptors.ts';
import { atomsOfPlace, type Molecule, withStereo } from '../structure/molecule.ts';
import { isOwnMirrorImage, mirrorImage } from '../structure/stereo-mirror.ts';
import { enumerateStereoisomers } from '../structure/stereoisomers.ts';
import type { TextRange } from '../text.ts';
import type { Draft, Owner } from './build/draft.ts';
import type { Described } from './readings.ts';
import { relativeStatement, type RelativeStatement } from './relative.ts';
import type { NameRemark, Reading } from './reading.ts';
import { saidOf, type Said } from './said.ts';
import type { StereoWord } from './tree.ts';
import type { PreparedName } from './words/prepared.ts';

export interface Arranged {
  readonly reading: Reading;
  readonly remarks: readonly NameRemark[];
}

/**
 * The reading of one structure that a name means: `complete` writes the name with descriptors, `draft` says where in the
 * name its atoms are named (undefined for a name taken whole). Descriptors that say nothing become remarks.
 */
export function arrangedReading(
  complete: Complete,
  molecule: Molecule,
  draft: Draft | undefined,
  prepared: PreparedName,
  limits: { readonly stereoisomers?: number },
): Arranged {
  const remarks: NameRemark[] = [];
  const cap = limits.stereoisomers ?? 32;
  const remark = (word: StereoWord, message: string) => {
    const start = prepared.origin[word.range.start] ?? 0;
    const end = prepared.origin[word.range.end] ?? start;
    remarks.push({
      kind: 'stereo-meaningless',
      range: { start: Math.min(start, end), end: Math.max(start, end) },
      message,
    });
  };
  const said = draft && draft.wanted.length + draft.loose.length > 0 ? saidOf(draft, molecule) : undefined;
  // The descriptor of a biaryl axis is right where it stands, though the axis is not followed here.
  const isOfAxis = (word: StereoWord) => /^[RSMP]$/.test(word.letter) && hasHinderedAxis(molecule);
  for (const word of (said?.placeless ?? []).filter((one) => !isOfAxis(one)))
    remark(word, `${word.letter} has no locant, and there is not exactly one place that it can be about.`);
  const { settled, refused } = assigned(molecule, said?.letters ?? []);
  for (const { word, reason } of refused) remark(word, refusal(word, reason));
  const relations = said?.relations ?? [];
  const list = enumerateStereoisomers(settled, relations.length > 0 ? 512 : Math.max(cap, 64));
  let { isomers, count } = list;
  const statements = relations.flatMap((relation) => {
    const statement = relativeStatement(list, relation);
    if (statement) return [statement];
    const { word } = relation;
    remark(word, `“${word.letter}” says nothing about this structure, which has no two such arrangements.`);
    return [];
  });
  if (statements.length > 0) {
    const agree = (isomer: Molecule) => statements.every(({ agrees }) => agrees(isomer));
    const spelt = new Set(said?.letters.map(({ atom }) => atom));
    isomers = isomers.filter(agree);
    if (isomers.length === 0) isomers = isomersWithoutImplied(settled, statements, spelt, cap).filter(agree);
    if (isomers.length === 0)
      for (const { word } of relations)
        remark(
          word,
          `“${word.letter}” contradicts the descriptors that the name gives; one of them is wrong.`,
        );
    count = isomers.length;
  }
  isomers = isomers.map((isomer) => asNamed(isomer, settled));
  const bare = isomers.length === 1 && relations.length > 0 ? isomers[0]! : asNamed(list.molecule, settled);
  const [single] = isomers;
  if (said?.racemic === true && single && isomers.length === 1 && !isOwnMirrorImage(single)) {
    // Each enantiomer has its own descriptors in place of those of the racemate.
    const replaced = [...draft!.wanted, ...draft!.loose].map(({ word }) => word.whole);
    const one: Complete = (described) => complete(described, described.length > 0 ? replaced : []);
    const open = withStereo(
      molecule,
      molecule.stereo.filter(({ kind }) => kind !== 'tetrahedral'),
    );
    return { reading: openReading(one, open, [single, mirrorImage(single)], 2, cap, draft), remarks };
  }
  const racemic = said?.racemicWords.map(({ whole }) => whole) ?? [];
  const told: Complete = (described) => complete(described, described.length > 0 ? racemic : []);
  const open = isomers.length > 1 || (count ?? 2) > 1 ? isomers : [];
  return { reading: openReading(told, bare, open, count, cap, draft), remarks };
}

/**
 * The structure with the letters that the name gives. Where a name is in lower case throughout, `r` and `s` at true
 * chirality centres are R and S, since there they can be nothing else (common practice, no source).
 */
function assigned(
  molecule: Molecule,
  wanted: Said['letters'],
): { settled: Molecule; refused: readonly { word: StereoWord; reason: Refusal }[] } {
  if (wanted.length === 0) return { settled: molecule, refused: [] };
  let { molecule: settled, refused } = assignDescriptors(molecule, wanted);
  if (refused.length > 0 && wanted.every(({ letter }) => !/[RSMP]/.test(letter))) {
    const raised = wanted.map(({ atom, letter }, index) => {
      const isRefused = refused.some((one) => one.index === index);
      return { atom, letter: isRefused ? (letter.toUpperCase() as typeof letter) : letter };
    });
    const again = assignDescriptors(molecule, raised);
    if (again.refused.length === 0) ({ molecule: settled, refused } = again);
  }
  return {
    settled,
    refused: refused.map(({ index, reason }) => ({ word: wanted[index]!.word, reason })),
  };
}

/**
 * What a retained name implies gives way to what the whole name says: cinnamic acid is the trans acid, cis-cinnamic acid
 * is not.
 */
function isomersWithoutImplied(
  molecule: Molecule,
  statements: readonly RelativeStatement[],
  spelt: ReadonlySet<number>,
  cap: number,
): readonly Molecule[] {
  const said = new Set(statements.flatMap(({ atoms }) => atoms));
  const kept = molecule.stereo.filter((element) => {
    const atoms = atomsOfPlace(element);
    return atoms.some((atom) => spelt.has(atom)) || !atoms.some((atom) => said.has(atom));
  });
  return enumerateStereoisomers(withStereo(molecule, kept), Math.max(cap, 64)).isomers;
}

/**
 * The arrangement of an isomer on the structure as the name draws it: stereoisomers are listed in one spelling of charges,
 * in which an ammonium salt is an amine and an acid.
 */
function asNamed(isomer: Molecule, named: Molecule): Molecule {
  return isomer.atoms.length === named.atoms.length ? withStereo(named, isomer.stereo) : isomer;
}

function openReading(
  complete: Complete,
  molecule: Molecule,
  open: readonly Molecule[],
  count: number | undefined,
  cap: number,
  draft: Draft | undefined,
): Reading {
  const stereoisomers = open.slice(0, cap).map((isomer) => {
    let isomerName: string | undefined;
    return {
      // Worked out when asked for: a check that counts isomers does not need it.
      get name() {
        return (isomerName ??= describedName(complete, isomer, molecule, draft));
      },
      molecule: isomer,
    };
  });
  const name = complete([]);
  const total = count ?? open.length;
  return {
    name,
    molecule,
    stereoisomers,
    ...(total > stereoisomers.length && open.length > 0 ? { stereoisomerCount: total } : {}),
  };
}

/** Writes the name with what it left open, with descriptors where they belong, and without what they replace. */
type Complete = (described: readonly Described[], dropped?: readonly TextRange[]) => string;

/** The name with the descriptors of what it left open, in front of their units (P-91.3): `(2R)-butan-2-ol`. */
function describedName(
  complete: Complete,
  isomer: Molecule,
  before: Molecule,
  draft: Draft | undefined,
): string {
  const stated = new Set(before.stereo.map((element) => atomsOfPlace(element).join(' ')));
  const units = new Map<Owner, { text: string; number: number }[]>();
  const all: string[] = [];
  let told = true;
  for (const { element, letter } of cipDescriptors(isomer)) {
    const atoms = atomsOfPlace(element);
    if (stated.has(atoms.join(' '))) continue;
    all.push(letter ?? '?');
    const places = atoms.flatMap((atom) => draft?.named.get(atom) ?? []);
    places.sort(
      (first, second) =>
        first.owner.depth - second.owner.depth || numberOf(first.locant) - numberOf(second.locant),
    );
    const place = places[0];
    if (letter === undefined || !place || place.owner.repeated) {
      told = false;
      continue;
    }
    const word = { text: `${place.locant ?? ''}${letter}`, number: numberOf(place.locant) };
    units.set(place.owner, [...(units.get(place.owner) ?? []), word]);
  }
  // Descriptors without a place in the name are given after it.
  if (!told) return `${complete([])}, ${all.join(',')} form`;
  return complete(
    [...units].map(([owner, words]) => {
      words.sort((first, second) => first.number - second.number);
      return { owner, text: `(${words.map((word) => word.text).join(',')})-` };
    }),
  );
}

function numberOf(locant: string | undefined): number {
  const number = Number.parseInt(locant ?? '', 10);
  return Number.isNaN(number) ? 1000 : number;
}

function refusal(word: StereoWord, reason: Refusal): string {
  const place = word.locant === undefined ? 'there' : `at position ${word.locant}`;
  switch (reason) {
    case 'no stereogenic unit':
      return `${word.letter} ${place} says nothing: that atom is no stereocentre and no end of a stereogenic double bond.`;
    case 'ligands alike':
      return `${word.letter} ${place} says nothing: two of the groups there are the same.`;
    case 'impossible':
      return `No arrangement ${place} has the descriptor ${word.letter} together with the others given.`;
    default:
      return `${word.letter} ${place} does not settle the arrangement.`;
  }
}

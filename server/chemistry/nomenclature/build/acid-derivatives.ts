/** Words after an acid's name: `acetic acid methyl ester`, `benzoic acid sodium salt`, `acetic acid diethylamide`. */
import type { Ending, SuffixEntry, Unit } from '../tree.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { acidHydroxyls, hydroxyls } from './found-groups.ts';
import { buildFunctionalClass, type FunctionWord } from './functional-class.ts';
import type { Ion } from './salts.ts';
import { addSmiles, buildGroups, buildWord, join, type Word } from './words.ts';

/** Groups in place of the acid's hydrogens: all of them, unless the name says `mono`. */
export function buildEsterOf(acid: Word, groups: readonly Word[], draft: Draft, choices: Choices): boolean {
  if (acid.count > 1 || !buildWord(acid.unit, draft, choices)) return false;
  return bindToPlaces(acidHydroxyls(draft), groups, draft, choices);
}

/** Binds the groups to O–H places: to all, or to fewer where `mono` says so. */
export function bindToPlaces(
  places: readonly number[],
  groups: readonly Word[],
  draft: Draft,
  choices: Choices,
): boolean {
  const made = buildGroups(groups, draft, choices);
  const valences = made?.flatMap((one) => one.free) ?? [];
  const partial = groups.length === 1 && groups[0]!.mono === true && valences.length === 1;
  if (valences.length === 0 || valences.length > places.length) return false;
  if (valences.length < places.length && !partial) return false;
  let left = [...places];
  return valences.every((valence) => {
    const alike = groups.length === 1 && !partial;
    const place = left[alike ? 0 : choices.pick(left.length)]!;
    left = left.filter((one) => one !== place);
    return join(draft, place, valence);
  });
}

/** A metal for each acid hydrogen, or for the only phenol; numbers as the name gives them. */
export function buildSaltOf(acid: Word, metals: readonly Ion[], draft: Draft, choices: Choices): boolean {
  const [metal] = metals;
  if (!metal || metals.length > 1 || acid.count > 1) return false;
  const copies = metal.count === undefined ? metal.charge : 1;
  for (let copy = 0; copy < copies; copy++) if (!buildWord(acid.unit, draft, choices)) return false;
  const acids = acidHydroxyls(draft);
  const places = acids.length > 0 ? acids : hydroxyls(draft);
  const wanted = metal.charge * (metal.count ?? 1);
  if (places.length < wanted || (places.length > wanted && metal.count !== 1)) return false;
  let left = places;
  for (let index = 0; index < wanted; index++) {
    const place = left[places.length === wanted ? 0 : choices.pick(left.length)]!;
    left = left.filter((one) => one !== place);
    draft.atoms[place]!.charge = -1;
    draft.atoms[place]!.capacity--;
  }
  for (let copy = 0; copy < (metal.count ?? 1); copy++) addSmiles(metal.smiles, draft);
  return true;
}

const acyls: Readonly<Record<string, string>> = {
  'oic acid': '=O',
  'carboxylic acid': 'C=O',
  'sulfonic acid': 'S(=O)=O',
  'sulfinic acid': 'S=O',
  oate: '=O',
  carboxylate: 'C=O',
  sulfonate: 'S(=O)=O',
};

/** The acyl group of an acid with a single kind of ending; undefined for any other parent. */
export function acylOf({ endings, ...unit }: Unit): Unit | undefined {
  const [ending] = endings;
  const group = ending && acyls[ending.suffix.name];
  if (endings.length !== 1 || group === undefined) return undefined;
  const suffix: SuffixEntry = { name: 'oyl', kind: ending!.suffix.kind, group, radical: true };
  const acyl: Ending = { ...ending!, suffix };
  return { ...unit, endings: [acyl] };
}

/** `benzoic acid chloride`. */
export function buildAcidHalide(acid: Word, word: FunctionWord, draft: Draft, choices: Choices): boolean {
  const acyl = acylOf(acid.unit);
  return acyl !== undefined && buildFunctionalClass([{ unit: acyl, count: 1 }], word, draft, choices);
}

/** `acetic acid diethylamide`, `succinic acid diamide`. */
export function buildAcidAmide(acid: Word, amide: Word, draft: Draft, choices: Choices): boolean {
  const unit = acylOf(acid.unit);
  const acyl = unit && buildWord(unit, draft, choices);
  if (acyl?.free.length !== amide.count) return false;
  return acyl.free.every((valence) => {
    const [free] = buildWord(amide.unit, draft, choices, amide.count)?.free ?? [];
    return free !== undefined && join(draft, valence.atom, free);
  });
}

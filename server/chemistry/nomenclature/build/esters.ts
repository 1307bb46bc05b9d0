/** Esters and salts of acids, and plain parents (P-65.6). */
import type { Unit } from '../tree.ts';
import type { Site } from '../words/sentence.ts';
import type { BuiltUnit } from './built-unit.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { oxidise, type LocatedOxide } from './oxides.ts';
import { addSmiles, buildGroups, buildWord, join, type Valence, type Word } from './words.ts';
import { balanced, makeCation, type Ion } from './salts.ts';

/** The words round an acid, or round a parent that is none. */
export interface AcidWords {
  readonly radicals: readonly Word[];
  /** The acid, and before it an organic cation where there is one. */
  readonly parents: readonly Word[];
  readonly metals: readonly Ion[];
  readonly hydrogens: number;
  readonly oxides: readonly LocatedOxide[];
}

/** Puts an ester, a salt or a plain parent into the draft; false when the words do not make one. */
export function buildAcidOrParent(words: AcidWords, draft: Draft, choices: Choices): boolean {
  const { radicals, parents, metals, oxides } = words;
  const groups = buildGroups(radicals, draft, choices);
  if (!groups || parents.length > 2) return false;
  const acid = parents[parents.length - 1]!;
  if (radicals.length === 0 && acid.unit.endings.some((ending) => ending.suffix.estersOnly === true))
    return false;
  const acids: BuiltUnit[] = [];
  for (let copy = 0; copy < acid.count; copy++) {
    const built = buildWord(acid.unit, draft, choices, acid.count);
    if (!built) return false;
    acids.push(built);
  }
  const sites = acids.flatMap((one) => one.sites);
  const valences = groups.flatMap((group) => group.free.map((free) => ({ free, site: group.site })));
  if (!oxides.every((oxide) => oxidise(acids[0]!, oxide, draft))) return false;
  // `monomethyl succinate`: the other places keep their hydrogen.
  const mono = radicals.some((radical) => radical.mono === true) && metals.length === 0;
  const hydrogens = mono ? sites.length - valences.length : words.hydrogens;
  if (sites.length === 0) {
    if (valences.length + hydrogens > 0 || acid.count > 1) return false;
    const charge = netCharge(draft);
    const alone = metals.length === 0 && parents.length === 1;
    return alone || (charge < 0 && addCounterions(words, -charge, 0, draft, choices));
  }
  if (valences.length + hydrogens > sites.length) return false;
  const alone = metals.length === 0 && parents.length === 1;
  if (acid.count > 1 && alone && (groups.length !== 1 || valences.length !== acid.count)) return false;
  const alike = radicals.length === 1 && hydrogens + metals.length === 0;
  let left = esterified(acid.unit, sites, valences, alike, draft, choices);
  if (!left) return false;
  left = protonated(left, hydrogens, draft, choices);
  // An acid's anion by itself is an ion; half an ester is nothing definite.
  if (alone && left.length > 0 && !isZwitterion(draft))
    return valences.length === 0 && hydrogens === 0 && namesAnion(acid.unit);
  if (alone) return true;
  return left.length > 0 && addCounterions(words, left.length, valences.length, draft, choices);
}

const placedGroup = 3;

/** Binds the groups to places of the acid; the answer lists the places left. */
function esterified(
  acid: Unit,
  sites: readonly number[],
  valences: readonly { readonly free: Valence; readonly site: Site | undefined }[],
  alike: boolean,
  draft: Draft,
  choices: Choices,
): number[] | undefined {
  const locants = acid.endings.find((ending) => ending.suffix.anion === true)?.locants ?? [];
  let left = [...sites];
  for (const { free, site: said } of valences) {
    const options = left.filter((site) => fits(site, said, sites, locants, draft));
    if (options.length === 0) return undefined;
    const site = alike ? options[0]! : options[choices.pick(options.length)]!;
    if (!join(draft, site, free)) return undefined;
    // A locant before a group is that of its own substituent where that can be.
    if (said && said.element === undefined) draft.cost += placedGroup;
    left = left.filter((one) => one !== site);
  }
  return left;
}

/** `hydrogen`: acid places that keep their hydrogen. */
function protonated(sites: readonly number[], hydrogens: number, draft: Draft, choices: Choices): number[] {
  let left = [...sites];
  for (let count = 0; count < hydrogens; count++) {
    const site = left[choices.pick(left.length)]!;
    draft.atoms[site]!.charge++;
    draft.atoms[site]!.capacity++;
    left = left.filter((one) => one !== site);
  }
  return left;
}

/** Cations for the places of the acid that stay negative. */
function addCounterions(
  { parents, metals, hydrogens }: AcidWords,
  places: number,
  groups: number,
  draft: Draft,
  choices: Choices,
): boolean {
  const acid = parents[parents.length - 1]!;
  const bases = parents.slice(0, -1);
  if (metals.length + bases.length > 1) {
    const total = metals.reduce((sum, metal) => sum + metal.charge * (metal.count ?? 1), 0) + bases.length;
    if (total !== places) return false;
    for (const metal of metals)
      for (let copy = 0; copy < (metal.count ?? 1); copy++) addSmiles(metal.smiles, draft);
    return bases.every((base) => makeCation(base, draft, choices) === 1);
  }
  const [metal] = metals;
  const [base] = bases;
  // The salts of glutamic acid are sold with one metal or two; the name has to say which.
  if (acid.unit.residue === true && places > 1 && metal?.count === undefined) return false;
  const given = metal ? metal.count : base && base.count > 1 ? base.count : undefined;
  const charge = metal ? metal.charge : base && makeCation(base, draft, choices);
  if (charge === undefined) return false;
  const counts = balanced(charge, given, places, acid.count > 1 ? 1 : undefined);
  if (!counts) return false;
  for (let copy = metal ? 0 : 1; copy < counts[0]; copy++) {
    if (metal) addSmiles(metal.smiles, draft);
    else if (!base || makeCation(base, draft, choices) !== charge) return false;
  }
  for (let copy = 1; copy < counts[1]; copy++) {
    if (groups + hydrogens > 0 || !buildWord(acid.unit, draft, choices, acid.count)) return false;
  }
  return true;
}

/** Whether a group said to be on O or S, and at a position, can be on this place; places stand in their order. */
function fits(
  place: number,
  site: Site | undefined,
  all: readonly number[],
  locants: readonly string[],
  draft: Draft,
): boolean {
  if (site === undefined) return true;
  const atomicNumber = site.element === 'S' ? 16 : 8;
  if (site.element !== undefined && draft.atoms[place]!.atomicNumber !== atomicNumber) return false;
  const located = locants.indexOf(String(site.position));
  if (site.element === undefined) return located >= 0 && all.indexOf(place) === located;
  if (site.position === undefined || all.length < 2) return true;
  // `3-O-ethyl … pyridine-3,5-dicarboxylate`; without locants in the acid's name, 1 is its first group.
  return all.indexOf(place) === (located >= 0 ? located : site.position === 1 ? 0 : 1);
}

/** P-74.1: the negative places have their positive counterparts in the same molecule. */
function isZwitterion(draft: Draft): boolean {
  return netCharge(draft) === 0;
}

function netCharge(draft: Draft): number {
  return draft.atoms.reduce((sum, atom) => sum + atom.charge, 0);
}

/**
 * `2-phenylacetate` and `naphthalene-1-carboxylate` are the ion (P-72.2.2.2.2); `citrate` alone may be an ester or the
 * acid written badly, and `ethylhexanoate` an ester without its space.
 */
function namesAnion(unit: Unit): boolean {
  const retained = unit.endings.length === 0 || unit.endings.some(({ suffix }) => suffix.name === 'oate');
  const chain = unit.skeletons.every((one) => one.kind === 'chain');
  const single = unit.skeletons.every((one) => one.atoms.length === 1);
  const located = unit.groupings.every((ways) =>
    ways.every((way) => way.substitutions.every((one) => one.locants !== undefined)),
  );
  if (!retained) return located || single;
  return located && (chain || unit.groupings.length > 0);
}

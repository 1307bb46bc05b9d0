/** Builds the structure of a whole name from its words. */
import { adducts, cations, functionWords } from '../vocabulary/functions.ts';
import type { Unit } from '../tree.ts';
import type { Part, Site } from '../words/sentence.ts';
import { buildUnit } from './build-unit.ts';
import type { BuiltUnit } from './built-unit.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { skeletonFromSmiles } from './skeleton.ts';

/** Builds a word of the sentence, whose descriptors are written at its beginning. */
function buildWord(unit: Unit, draft: Draft, choices: Choices, copies = 1): BuiltUnit | undefined {
  draft.owner = { at: unit.range.start, depth: 0, repeated: copies > 1 };
  return buildUnit(unit, draft, choices);
}

interface Word {
  readonly unit: Unit;
  readonly count: number;
  readonly site?: Site | undefined;
}
const oops = 'These words do not make one compound together. Check the number of groups named.';

/** Puts the whole sentence into the draft; false when it makes no compound. */
export function buildSentence(parts: readonly Part[], draft: Draft, choices: Choices): boolean {
  const first = parts[0]!;
  const last = parts[parts.length - 1]!;
  const whole = { start: first.start, end: last.kind === 'stretch' ? last.stretch.end : last.end };
  const reject = () => {
    draft.fail(whole, oops);
    return false;
  };
  const radicals: Word[] = [];
  const parents: Word[] = [];
  const metals: { smiles: string; charge: number; count: number | undefined }[] = [];
  let hydrogens = 0;
  let functional: { index: number; count: number | undefined } | undefined;
  let oxides = 0;
  for (const part of parts) {
    if (functional && part.kind !== 'adduct') return reject();
    switch (part.kind) {
      case 'stretch':
        (part.stretch.role === 'radical' ? radicals : parents).push({
          unit: part.stretch.unit,
          count: part.stretch.count,
          site: part.site,
        });
        // Groups of an ester come before the acid, nothing but adducts after it.
        if (part.stretch.role === 'radical' && parents.length > 0) return reject();
        break;
      case 'function':
        functional = part;
        break;
      case 'cation':
        metals.push({ smiles: cations[part.index]![1], charge: cations[part.index]![2], count: part.count });
        break;
      case 'hydrogen':
        hydrogens += part.count;
        break;
      case 'adduct':
        if (parts.length === 1 || !Number.isInteger(part.count)) return reject();
        for (let copy = 0; copy < part.count; copy++) add(adducts[part.index]![1], draft);
        break;
      case 'oxide':
        oxides++;
        break;
      case 'oxime': {
        const parent = parents.pop();
        const changed = parent && oximeOf(parent.unit);
        if (!changed) return reject();
        parents.push({ unit: changed, count: 1 });
        break;
      }
    }
  }
  if (parents.length === 1 && isAnhydride(parents[0]!.unit)) {
    return radicals.length + metals.length + hydrogens === 0 && anhydride(parents[0]!, draft, choices)
      ? true
      : reject();
  }
  if (functional) {
    const [word, group, sites, anion] = functionWords[functional.index]!;
    if (parents.length === 0 && metals.length === 0 && radicals.length > 0) {
      if (group === '' || hydrogens > 0) return reject();
      return functionalClass(radicals, group, sites, functional.count, word, draft, choices) || reject();
    }
    if (radicals.length > 0 || anion === '') return reject();
    return (
      salt(
        metals,
        parents,
        [{ smiles: anion, charge: sites.length === 0 ? 1 : sites.length, count: functional.count }],
        draft,
        choices,
      ) || reject()
    );
  }
  if (parents.length === 0) return reject();
  return acidsAndBases(radicals, parents, metals, hydrogens, oxides, draft, choices) || reject();
}

function add(smiles: string, draft: Draft): number[] {
  const skeleton = skeletonFromSmiles(smiles)!;
  const atoms = draft.addSkeleton(skeleton, { start: 0, end: 0 });
  return atoms;
}

function isAnhydride(unit: Unit): boolean {
  return unit.endings.some((ending) => ending.suffix.name === 'anhydride');
}

/** `acetic anhydride`: two acyl groups on one oxygen; of a diacid, a ring (P-65.7.1). */
function anhydride(word: Word, draft: Draft, choices: Choices): boolean {
  const ending = word.unit.endings[0]!;
  const acyl = {
    ...ending,
    suffix: { ...ending.suffix, name: 'oyl', group: '=O', radical: true, anion: false },
  };
  if (ending.count === 1) {
    const acid = buildWord(word.unit, draft, choices);
    const other = acid && buildWord({ ...word.unit, endings: [acyl] }, draft, choices);
    return other !== undefined && join(draft, acid!.sites[0]!, other.free[0]!);
  }
  if (ending.count !== 2 || !ending.locants) return false;
  const halves = [
    { ...ending, count: 1, locants: [ending.locants[0]!] },
    { ...acyl, count: 1, locants: [ending.locants[1]!] },
  ];
  const built = buildWord({ ...word.unit, endings: halves }, draft, choices);
  return built?.free.length === 1 && join(draft, built.sites[0]!, built.free[0]!);
}

/** Binds a group to the place of an acid (its negative charge goes) or of a function word. */
function join(draft: Draft, site: number, free: { atom: number; order: number }): boolean {
  const atom = draft.atoms[site]!;
  if (free.order !== 1 && atom.charge < 0) return false;
  if (atom.charge < 0) {
    atom.charge++;
    atom.capacity++;
  }
  if (draft.free(site) < free.order || draft.free(free.atom) < free.order) return false;
  draft.bond(site, free.atom, free.order);
  return true;
}

function functionalClass(
  radicals: readonly Word[],
  group: string,
  sites: readonly number[],
  count: number | undefined,
  word: string,
  draft: Draft,
  choices: Choices,
): boolean {
  const built: { free: BuiltUnit['free'] }[] = [];
  for (const radical of radicals) {
    for (let copy = 0; copy < radical.count; copy++) {
      const one = buildWord(radical.unit, draft, choices, radical.count);
      if (!one || one.free.length === 0) return false;
      built.push(one);
    }
  }
  const valences = built.flatMap((one) => one.free);
  // `ethylene dichloride`, `methylene chloride`: one group with several valences, as many halides.
  const copies =
    sites.length === 1 && built.length === 1 ? valences.reduce((sum, one) => sum + one.order, 0) : 1;
  if (count !== undefined && count !== copies) return false;
  if (word === 'ether' && valences.length === 1 && radicals[0]!.count === 1)
    valences.push(...again(radicals[0]!, draft, choices));
  if (copies === 1 && valences.length !== sites.length) return false;
  for (let copy = 0; copy < copies; copy++) {
    const atoms = add(group, draft);
    const places = [...new Set(sites)].map((site) => atoms[site]!);
    for (const place of places) {
      draft.settleCapacity(place, undefined, sites.filter((site) => atoms[site] === place).length);
    }
    if (copies > 1) {
      const all = valences.flatMap((one) =>
        Array.from({ length: one.order }, () => ({ atom: one.atom, order: 1 })),
      );
      if (!join(draft, places[0]!, all[copy]!)) return false;
    } else {
      for (const [index, site] of sites.entries())
        if (!join(draft, atoms[site]!, valences[index]!)) return false;
    }
  }
  return true;
}

/** `ethyl ether` is diethyl ether in older usage. */
function again(radical: Word, draft: Draft, choices: Choices): BuiltUnit['free'] {
  return buildWord(radical.unit, draft, choices, radical.count)?.free ?? [];
}

interface Ion {
  readonly smiles: string;
  readonly charge: number;
  readonly count: number | undefined;
}

/** Metals or organic cations with anions; numbers that the name leaves out follow from the charges (Red Book IR-5.4.2). */
function salt(
  metals: readonly Ion[],
  bases: readonly Word[],
  negatives: readonly Ion[],
  draft: Draft,
  choices: Choices,
): boolean {
  const positives: { charge: number; count: number | undefined; make: () => boolean }[] = metals.map(
    (metal) => ({
      charge: metal.charge,
      count: metal.count,
      make: () => add(metal.smiles, draft).length > 0,
    }),
  );
  for (const base of bases) {
    positives.push({
      charge: 1,
      count: base.count > 1 ? base.count : undefined,
      make: () => makeCation(base, draft, choices),
    });
  }
  if (positives.length !== 1 || negatives.length !== 1) return false;
  const [positive, negative] = [positives[0]!, negatives[0]!];
  const counts = balanced(positive.charge, positive.count, negative.charge, negative.count);
  if (!counts) return false;
  for (let copy = 0; copy < counts[0]; copy++) if (!positive.make()) return false;
  for (let copy = 0; copy < counts[1]; copy++) add(negative.smiles, draft);
  return true;
}

function makeCation(base: Word, draft: Draft, choices: Choices): boolean {
  const from = draft.atoms.length;
  if (!buildWord(base.unit, draft, choices)) return false;
  let charge = 0;
  for (let atom = from; atom < draft.atoms.length; atom++) charge += draft.atoms[atom]!.charge;
  return charge === 1;
}

function balanced(
  up: number,
  given: number | undefined,
  down: number,
  other: number | undefined,
): [number, number] | undefined {
  for (let first = given ?? 1; first <= (given ?? 6); first++) {
    for (let second = other ?? 1; second <= (other ?? 6); second++)
      if (first * up === second * down) return [first, second];
  }
  return undefined;
}

/** Esters, salts of acids, and plain parents. */
function acidsAndBases(
  radicals: readonly Word[],
  parents: readonly Word[],
  metals: readonly Ion[],
  hydrogens: number,
  oxides: number,
  draft: Draft,
  choices: Choices,
): boolean {
  const acid = parents[parents.length - 1]!;
  const groups: BuiltUnit['free'][] = [];
  const said: (Site | undefined)[] = [];
  for (const radical of radicals) {
    for (let copy = 0; copy < radical.count; copy++) {
      const built = buildWord(radical.unit, draft, choices, radical.count);
      if (!built || built.free.length === 0) return false;
      groups.push(built.free);
      said.push(...built.free.map(() => radical.site));
    }
  }
  if (parents.length > 2) return false;
  const copies = acid.count;
  const acids: BuiltUnit[] = [];
  for (let copy = 0; copy < copies; copy++) {
    const built = buildWord(acid.unit, draft, choices, acid.count);
    if (!built) return false;
    acids.push(built);
  }
  const sites = acids.flatMap((one) => one.sites);
  const valences = groups.flat();
  if (oxides > 0 && !nOxide(acids[0]!, oxides, draft)) return false;
  if (sites.length === 0)
    return valences.length + hydrogens + metals.length === 0 && parents.length === 1 && copies === 1;
  if (valences.length + hydrogens > sites.length) return false;
  let left = [...sites];
  if (
    copies > 1 &&
    metals.length === 0 &&
    parents.length === 1 &&
    (groups.length !== 1 || valences.length !== copies)
  )
    return false;
  for (const [index, valence] of valences.entries()) {
    const options = left.filter((site) => fits(site, said[index], sites, draft));
    if (options.length === 0) return false;
    const same = radicals.length === 1 && hydrogens + metals.length === 0;
    const site = same ? options[0]! : options[choices.pick(options.length)]!;
    if (!join(draft, site, valence)) return false;
    left = left.filter((one) => one !== site);
  }
  for (let count = 0; count < hydrogens; count++) {
    const site = left[choices.pick(left.length)]!;
    draft.atoms[site]!.charge++;
    draft.atoms[site]!.capacity++;
    left = left.filter((one) => one !== site);
  }
  // An acid's anion by itself is an ion; half an ester is nothing definite.
  if (metals.length === 0 && parents.length === 1)
    return left.length === 0 || (valences.length === 0 && hydrogens === 0 && namesAnion(acid.unit));
  const bases = parents.length === 2 ? parents.slice(0, 1) : [];
  const positives = [
    ...metals.map((metal) => ({ metal, base: undefined })),
    ...bases.map((base) => ({ metal: undefined, base })),
  ];
  if (positives.length === 0 || left.length === 0) return false;
  const mixed = positives.length > 1;
  const [only] = positives;
  if (mixed) {
    const total = metals.reduce((sum, metal) => sum + metal.charge * (metal.count ?? 1), 0) + bases.length;
    if (total !== left.length) return false;
    for (const metal of metals)
      for (let copy = 0; copy < (metal.count ?? 1); copy++) add(metal.smiles, draft);
    return bases.every((base) => makeCation(base, draft, choices));
  }
  const charge = only!.metal?.charge ?? 1;
  const count = only!.metal?.count ?? (only!.base && only!.base.count > 1 ? only!.base.count : undefined);
  const counts = balanced(charge, count, left.length, copies > 1 ? 1 : undefined);
  if (!counts) return false;
  for (let copy = 0; copy < counts[0]; copy++) {
    if (only!.metal) add(only!.metal.smiles, draft);
    else if (!makeCation(only!.base!, draft, choices)) return false;
  }
  for (let copy = 1; copy < counts[1]; copy++) {
    if (valences.length + hydrogens > 0 || !buildWord(acid.unit, draft, choices, acid.count)) return false;
  }
  return true;
}

/** Whether a group said to be on O or S, and at a position, can be on this place; places stand in their order. */
function fits(place: number, site: Site | undefined, all: readonly number[], draft: Draft): boolean {
  if (site === undefined) return true;
  if (draft.atoms[place]!.atomicNumber !== (site.element === 'O' ? 8 : 16)) return false;
  return (
    site.position === undefined || all.length < 2 || all.indexOf(place) === (site.position === 1 ? 0 : 1)
  );
}

/** P-62.5: the oxide of a tertiary amine or pyridine; the nitrogen must be the only one that can bear it. */
function nOxide(parent: BuiltUnit, count: number, draft: Draft): boolean {
  const nitrogens = draft.atoms.flatMap((atom, index) =>
    atom.atomicNumber === 7 &&
    atom.charge === 0 &&
    (draft.free(index) === 0 ||
      (atom.mancude && !atom.saturated && draft.free(index) === 1 && !draft.usualHydrogen.includes(index)))
      ? [index]
      : [],
  );
  if (nitrogens.length !== count || parent.places.atoms.length === 0) return false;
  for (const nitrogen of nitrogens) {
    draft.atoms[nitrogen]!.charge = 1;
    draft.atoms[nitrogen]!.capacity++;
    const [oxygen] = add('[O-]', draft);
    draft.atoms[oxygen!]!.capacity = 1;
    draft.bond(nitrogen, oxygen!, 1);
  }
  return true;
}

function oximeOf(unit: Unit): Unit | undefined {
  let changed = false;
  const endings = unit.endings.map((ending) => {
    if (ending.suffix.name !== 'one' && ending.suffix.name !== 'al' && ending.suffix.name !== 'carbaldehyde')
      return ending;
    if (ending.count > 1) return ending;
    changed = true;
    const group = ending.suffix.name === 'carbaldehyde' ? 'C=NO' : '=NO';
    return {
      ...ending,
      suffix: {
        ...ending.suffix,
        name: 'oxime',
        group,
        ...(ending.suffix.kind === 'on' && group === '=NO' ? {} : {}),
      },
    };
  });
  return changed ? { ...unit, endings } : undefined;
}

/** `2-phenylacetate` is the ion; `citrate` or `ethylhexanoate` alone may be an ester or the acid written badly. */
function namesAnion(unit: Unit): boolean {
  const chain = unit.skeletons.every((one) => one.kind === 'chain');
  const located = unit.groupings.every((ways) =>
    ways.every((way) => way.substitutions.every((one) => one.locants !== undefined)),
  );
  return located && (chain || unit.groupings.length > 0);
}

/** Builds the structure of a whole name from its words. */
import type { ClassWord } from '../vocabulary/class-words.ts';
import { adducts, cations, functionWords } from '../vocabulary/functions.ts';
import type { Part } from '../words/sentence.ts';
import { buildAnhydride, buildMixedAnhydride, isAnhydride } from './anhydrides.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { buildAcidOrParent } from './esters.ts';
import { buildAfterParent, isNeutral } from './after-parent.ts';
import type { LocatedOxide } from './oxides.ts';
import { buildFunctionalClass, type FunctionWord } from './functional-class.ts';
import { buildOrganometallic, isOrganometallic } from './organometallics.ts';
import { buildSalt, type Ion } from './salts.ts';
import { addSmiles, type Word } from './words.ts';

const oops = 'These words do not make one compound together. Check the number of groups named.';

/** The words of a sentence by what they do. */
export interface Sorted {
  readonly radicals: Word[];
  readonly parents: Word[];
  /** Groups named after the parent. */
  readonly afters: Word[];
  readonly metals: Ion[];
  hydrogens: number;
  readonly oxides: LocatedOxide[];
  functional: FunctionWord | undefined;
  classWord: ClassWord | undefined;
  derivative: Word | undefined;
}

/** Puts the whole sentence into the draft; false when it makes no compound. */
export function buildSentence(parts: readonly Part[], draft: Draft, choices: Choices): boolean {
  const words: Sorted = {
    radicals: [],
    parents: [],
    metals: [],
    afters: [],
    hydrogens: 0,
    oxides: [],
    functional: undefined,
    classWord: undefined,
    derivative: undefined,
  };
  if (parts.every((part) => sort(part, words, parts, draft)) && buildWords(words, draft, choices))
    return true;
  const last = parts[parts.length - 1]!;
  const end = last.kind === 'stretch' ? last.stretch.end : last.end;
  draft.fail({ start: parts[0]!.start, end }, oops);
  return false;
}

/** Puts a word where it belongs; false when it cannot stand there. */
function sort(part: Part, words: Sorted, parts: readonly Part[], draft: Draft): boolean {
  if (words.functional && part.kind !== 'adduct' && !endsEther(words, part)) return false;
  if ((words.classWord ?? words.derivative) !== undefined && part.kind !== 'adduct') return false;
  switch (part.kind) {
    case 'stretch': {
      const { unit, count, role } = part.stretch;
      const word: Word = { unit, count, site: part.site, mono: part.mono };
      if (role === 'derivative') words.derivative = word;
      else if (role === 'parent') words.parents.push(word);
      else (words.parents.length > 0 ? words.afters : words.radicals).push(word);
      return true;
    }
    case 'class':
      words.classWord = part.word;
      return words.parents.length > 0;
    case 'function':
      words.functional = part;
      return true;
    case 'cation': {
      const [, smiles, charge] = cations[part.index]!;
      words.metals.push({ smiles, charge, count: part.count });
      return true;
    }
    case 'hydrogen':
      words.hydrogens += part.count;
      return true;
    case 'adduct':
      if (parts.length === 1 || !Number.isInteger(part.count)) return false;
      for (let copy = 0; copy < part.count; copy++) addSmiles(adducts[part.index]![1], draft);
      return true;
    case 'oxide':
      words.oxides.push(part);
      return words.parents.length > 0;
  }
}

/** `ethylene glycol monomethyl ether acetate`: an acid may follow. */
function endsEther({ functional }: Sorted, part: Part): boolean {
  if (!functional || part.kind !== 'stretch' || part.stretch.role !== 'parent') return false;
  return functionWords[functional.index]![0] === 'ether';
}

function buildWords(words: Sorted, draft: Draft, choices: Choices): boolean {
  const { radicals, parents, metals, hydrogens, functional } = words;
  const ions = metals.length + hydrogens;
  if (parents.length === 1 && isAnhydride(parents[0]!.unit))
    return radicals.length + ions === 0 && buildAnhydride(parents[0]!, draft, choices);
  if (parents.length === 2 && parents.every((parent) => isAnhydride(parent.unit)))
    return radicals.length + ions === 0 && buildMixedAnhydride(parents[0]!, parents[1]!, draft, choices);
  if (words.classWord !== undefined || words.derivative || words.afters.length > 0)
    return buildAfterParent(words, draft, choices);
  if (parents.length > 0 && isOrganometallic(parents[0]!.unit) && (functional ?? parents[1])) {
    const [metal, acid] = parents;
    if (radicals.length + ions > 0 || parents.length > 2 || (functional && acid)) return false;
    return buildOrganometallic(metal!, { functional, acid }, draft, choices);
  }
  if (parents.length > 0 && (functional ?? parents[1]) && ions === 0 && isNeutral(parents[0]!.unit))
    return radicals.length === 0 && buildAfterParent(words, draft, choices);
  if (!functional) return parents.length > 0 && buildAcidOrParent(words, draft, choices);
  if (parents.length === 0 && metals.length === 0 && radicals.length > 0)
    return hydrogens === 0 && buildFunctionalClass(radicals, functional, draft, choices);
  const [, , sites, anion] = functionWords[functional.index]!;
  if (radicals.length > 0 || anion === '') return false;
  const charge = sites.length === 0 ? 1 : sites.length;
  // An anion by itself is an ion (P-72.2.2.2), where it is not the class of a compound half named.
  if (parents.length + ions === 0)
    return charge === 1 && functional.count === undefined && addSmiles(anion, draft).length > 0;
  return buildSalt(metals, parents, [{ smiles: anion, charge, count: functional.count }], draft, choices);
}

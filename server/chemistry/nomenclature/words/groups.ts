/** Words that stand for one group or one parent: every way in which one can begin at a place of the name. */
import { chain, ring, type SkeletonGraph } from '../build/skeleton.ts';
import type { Ending, SuffixEntry, Unit } from '../tree.ts';
import { acidForms, aminoAcidForm } from './acid-forms.ts';
import { bare, type Group } from './group.ts';
import { alkoxySkeleton, type Lexicon, type Word } from './lexicon.ts';
import { wordsAt } from './trie.ts';
import { componentReader } from './ring-components.ts';
import { conjunctiveForms } from './conjunctive.ts';
import { ringNameAt } from './ring-names.ts';
import { chainTailsAt, endingsAt, type Tail } from './tails.ts';
import { descriptorAt } from '../rings/von-baeyer.ts';

/** Ring names stand inside ring names so many deep at most. */
const deepestRing = 3;

/** Groups and parents that begin at the offset, brackets excepted. */
export function groupsAt(text: string, lower: string, offset: number, lexicon: Lexicon, depth = 0): Group[] {
  const found: Group[] = [];
  const words = wordsAt(lexicon.words, lower, offset);
  const radicalEnds = new Set(words.filter((word) => word.value.kind === 'radical').map((word) => word.end));
  const retained = Math.max(0, ...words.filter((word) => isRetained(word.value)).map((word) => word.end));
  const parentEnds = new Set(
    words.filter(({ value, end }) => value.kind === 'parent' && lower[end] === 'e').map(({ end }) => end + 1),
  );
  // The longest word first: `caproic acid` is of `capro`, not of `capr`.
  const acidEnds = new Set<number>();
  for (const word of words.reverse()) {
    // `thioxanthene` is a ring, not xanthene with `thio`.
    if (word.value.kind === 'radical' && word.value.linkAt !== undefined && word.end < retained) continue;
    let groups = groupsOf(word.value, text, lower, offset, word.end, lexicon);
    // `fluorenone` is a name of its own, not fluorene with a ketone somewhere.
    if (word.value.kind === 'ring' || word.value.kind === 'alkane')
      groups = groups.filter(({ end, unit }) => !parentEnds.has(end) || unit.endings.every(isLocated));
    if (word.value.kind === 'acid') {
      groups = groups.filter((group) => !acidEnds.has(group.end));
      for (const group of groups) acidEnds.add(group.end);
    }
    // `sulfanyl` is a word of its own, not `sulfane` with an ending.
    const made =
      word.value.kind === 'radical' || word.value.kind === 'link'
        ? groups
        : groups.filter((group) => group.role === 'parent' || !radicalEnds.has(group.end));
    found.push(...made);
  }
  if (lower.startsWith('cyclo', offset)) {
    for (const word of wordsAt(lexicon.words, lower, offset + 5)) {
      if (word.value.kind !== 'alkane' || word.value.size < 3) continue;
      const skeletons = [ring(word.value.size)];
      found.push(...withTails(skeletons, offset, chainTailsAt(text, lower, word.end, lexicon)));
      if (lower.startsWith('oxy', word.end)) found.push(cycloalkoxy(skeletons, offset, word.end + 3));
    }
  }
  const descriptor = descriptorAt(lower, offset);
  if (descriptor) {
    for (const word of wordsAt(lexicon.words, lower, descriptor.end)) {
      const skeleton = word.value.kind === 'alkane' ? descriptor.skeleton(word.value.size) : undefined;
      if (skeleton) {
        for (const group of withTails([skeleton], offset, chainTailsAt(text, lower, word.end, lexicon))) {
          const open =
            group.role === 'radical' && group.unit.endings.every((ending) => ending.locants === undefined);
          found.push(open ? { ...group, locantBefore: true } : group);
        }
      }
    }
  }
  const components = componentReader(text, lower, lexicon, (at) =>
    depth < deepestRing ? groupsAt(text, lower, at, lexicon, depth + 1) : [],
  );
  for (const name of ringNameAt(text, lower, offset, components)) {
    found.push(...ringForms(() => name.skeletons, text, lower, offset, name.end, lexicon));
  }
  const acyclic = (from: number) => groupsAt(text, lower, from, lexicon);
  found.push(...conjunctiveForms(found, text, lower, lexicon, acyclic));
  return found;
}

const isLocated = (ending: Ending): boolean => ending.locants !== undefined;

function isRetained(word: Word): boolean {
  return word.kind === 'ring' || word.kind === 'parent';
}

function groupsOf(
  word: Word,
  text: string,
  lower: string,
  start: number,
  end: number,
  lexicon: Lexicon,
): Group[] {
  switch (word.kind) {
    case 'alkane': {
      const groups = withTails([chain(word.size)], start, chainTailsAt(text, lower, end, lexicon)).map(
        (group) => ({
          ...group,
          // Methyl and ethyl have no isomers: `n-` before them is a nitrogen.
          normal: word.size > 2,
        }),
      );
      if (lower.startsWith('oxy', end)) {
        const unit = {
          ...bare([alkoxySkeleton(word.size)], start, end + 3),
          attach: { atom: 0, order: 1 as const },
        };
        groups.push({ unit, role: 'radical', end: end + 3, normal: word.size > 2 });
      }
      return groups;
    }
    case 'radical': {
      const unit: Unit = {
        ...bare(word.skeletons(), start, end),
        attach: { atom: 0, order: word.order },
        ...(word.linkAt === undefined ? {} : { linkAt: word.linkAt }),
        ...(word.needsLink === true ? { needsLink: true } : {}),
        ...(word.links ? { links: word.links } : {}),
      };
      return [{ unit, role: 'radical', end }];
    }
    case 'contracted': {
      const yl: Ending = { suffix: freeValence, count: word.valences, at: start, range: { start, end } };
      return [
        {
          unit: { ...bare(word.skeletons(), start, end), endings: [yl] },
          role: 'radical',
          end,
          locantBefore: word.valences === 1,
        },
      ];
    }
    case 'derivative': {
      const unit: Unit = {
        ...bare(word.skeletons(), start, end),
        attach: { atom: 0, order: 1 },
        linkAt: word.linkAt,
        derivativeOf: word.of,
      };
      return [{ unit, role: 'derivative', end }];
    }
    case 'link': {
      const unit: Unit = {
        ...bare(word.skeletons(), start, end),
        links: word.links,
        ...(word.linkAt === undefined ? {} : { linkAt: word.linkAt }),
      };
      return [{ unit, role: 'radical', end }];
    }
    case 'branched':
      return branchedForms(word.skeletons, word.oxy, text, lower, start, end, lexicon);
    case 'parent':
      if (!word.extensible) return plainForms(word.skeletons, lower, start, end);
      return ringForms(word.skeletons, text, lower, start, end, lexicon);
    case 'ring':
      // `tetraphenyl` is four phenyl groups.
      if (/aphen$/.test(lower.slice(start, end)) && lower.startsWith('yl', end)) return [];
      return ringForms(word.skeletons, text, lower, start, end, lexicon);
    case 'acid':
      return acidForms(word, lower, start, end);
    case 'amino acid':
      return [aminoAcidForm(word, start, end)];
    default:
      return [];
  }
}

const freeValence: SuffixEntry = { name: 'yl', kind: 'free', group: '1' };

function withTails(skeletons: readonly SkeletonGraph[], start: number, tails: readonly Tail[]): Group[] {
  return tails.map((tail) => ({
    unit: { ...bare(skeletons, start, tail.end), unsaturations: tail.unsaturations, endings: tail.endings },
    role: isRadical(tail.endings) ? 'radical' : 'parent',
    end: tail.end,
  }));
}

function isRadical(endings: readonly Ending[]): boolean {
  return endings.some((ending) => ending.suffix.kind === 'free' || ending.suffix.radical === true);
}

function cycloalkoxy(skeletons: readonly SkeletonGraph[], start: number, end: number): Group {
  const made = skeletons.map((skeleton): SkeletonGraph => ({
    ...skeleton,
    atoms: [...skeleton.atoms, { atomicNumber: 8, charge: 0, isotope: 0, locants: [], mancude: false }],
    bonds: [...skeleton.bonds, { from: 0, to: skeleton.atoms.length, order: 1 }],
  }));
  const atom = made[0]!.atoms.length - 1;
  return { unit: { ...bare(made, start, end), attach: { atom, order: 1 } }, role: 'radical', end };
}

/** The name as it stands, with its final e or without. */
function plainForms(
  skeletons: () => readonly SkeletonGraph[],
  lower: string,
  start: number,
  end: number,
): Group[] {
  const made = skeletons();
  if (made.length === 0) return [];
  const last = lower[end] === 'e' ? end + 1 : end;
  return [{ unit: bare(made, start, last), role: 'parent', end: last }];
}

/** `pyridine`, `pyridin-2-yl`, `pyridine-3-carboxylic acid`; the final e is elided before a vowel. */
function ringForms(
  skeletons: () => readonly SkeletonGraph[],
  text: string,
  lower: string,
  start: number,
  end: number,
  lexicon: Lexicon,
): Group[] {
  const plainEnd = lower[end] === 'e' ? end + 1 : end;
  const made = skeletons();
  if (made.length === 0) return [];
  const groups: Group[] = [{ unit: bare(made, start, plainEnd), role: 'parent', end: plainEnd }];
  if (plainEnd !== end) groups.push({ unit: bare(made, start, end), role: 'parent', end });
  groups.push(...withTails(made, start, endingsAt(text, lower, end, lexicon)));
  return groups;
}

/** `isopropyl`, `tert-butoxy`, `isobutanol`, `isobutane`: whatever follows sits on the place of the free valence. */
function branchedForms(
  skeletons: () => readonly SkeletonGraph[],
  oxy: () => readonly SkeletonGraph[],
  text: string,
  lower: string,
  start: number,
  end: number,
  lexicon: Lexicon,
): Group[] {
  const found: Group[] = [];
  const made = skeletons();
  if (lower.startsWith('yl', end) && !lower.startsWith('ylid', end)) {
    found.push({
      unit: { ...bare(made, start, end + 2), attach: { atom: 0, order: 1 } },
      role: 'radical',
      end: end + 2,
    });
  }
  if (lower.startsWith('oxy', end)) {
    found.push({
      unit: { ...bare(oxy(), start, end + 3), attach: { atom: 0, order: 1 } },
      role: 'radical',
      end: end + 3,
    });
  }
  const stem = lower.slice(start, end);
  const saturated = lower.startsWith('an', end) ? end + 2 : end;
  if (lower.startsWith('ane', end) && /^(?:iso|neo)/.test(stem)) {
    found.push({ unit: bare(made, start, end + 3), role: 'parent', end: end + 3 });
  }
  for (const tail of endingsAt(text, lower, saturated, lexicon)) {
    const ending = tail.endings[0]!;
    if (ending.suffix.kind !== 'on' || ending.locants || ending.count > 1) continue;
    if (saturated === end && ending.suffix.name !== 'amine') continue;
    if (!['ol', 'thiol', 'amine'].includes(ending.suffix.name)) continue;
    // The group goes to the first atom of the skeleton: written as a locant that only that atom has.
    const marked = made.map((skeleton) => ({
      ...skeleton,
      atoms: skeleton.atoms.map((atom, index) =>
        index === 0 ? { ...atom, locants: [...atom.locants, '*'] } : atom,
      ),
    }));
    const fixed: Ending = { ...ending, locants: ['*'] };
    found.push({
      unit: { ...bare(marked, start, tail.end), endings: [fixed] },
      role: 'parent',
      end: tail.end,
    });
  }
  return found;
}

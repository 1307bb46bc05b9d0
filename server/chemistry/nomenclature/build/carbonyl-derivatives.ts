/** What is named after an aldehyde or ketone: oximes, hydrazones, azines, acetals, cyanohydrins (P-66.5.3, P-66.6.5, P-68.3.1). */
import type { ClassWord } from '../vocabulary/class-words.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { carbonyls } from './found-groups.ts';
import { addSmiles, buildGroups, buildWord, join, type Word } from './words.ts';

type Carbonyl = ReturnType<typeof carbonyls>[number];

/** `acetone oxime`, `butane-2,3-dione dioxime`: every carbonyl group, as many as the word says. */
export function buildCarbonylDerivative(
  parent: Word,
  derivative: Word,
  groups: readonly Word[],
  draft: Draft,
  choices: Choices,
): boolean {
  if (parent.count > 1 || !buildWord(parent.unit, draft, choices)) return false;
  const found = carbonyls(draft);
  if (found.length !== derivative.count || (groups.length > 0 && found.length > 1)) return false;
  return found.every((carbonyl) => {
    const built = buildWord(derivative.unit, draft, choices, derivative.count);
    const [free] = built?.free ?? [];
    if (!built || !free) return false;
    draft.bond(imine(carbonyl, draft), free.atom, 1);
    // `O-benzyl oxime`
    const place = built.places.atoms[derivative.unit.linkAt ?? 0]!;
    const made = buildGroups(groups, draft, choices);
    return made?.every((one) => one.free.length === 1 && join(draft, place, one.free[0]!)) === true;
  });
}

/** Nitrogen in place of the oxygen. */
function imine({ oxygen }: Carbonyl, draft: Draft): number {
  draft.atoms[oxygen]!.atomicNumber = 7;
  draft.settleCapacity(oxygen);
  return oxygen;
}

/** `acetone azine`, `acetone cyanohydrin`, `acetaldehyde diethyl acetal`. */
export function buildCarbonylClass(
  word: ClassWord,
  parent: Word,
  groups: readonly Word[],
  draft: Draft,
  choices: Choices,
): boolean {
  if (parent.count > 1 || !buildWord(parent.unit, draft, choices)) return false;
  const plain = carbonyls(draft);
  const found = plain.length === 0 && word.endsWith('acetal') ? carbonyls(draft, true) : plain;
  const [carbonyl] = found;
  if (found.length !== 1 || !carbonyl) return false;
  if (/acetal|ketal/.test(word)) return acetal(word, carbonyl, groups, draft, choices);
  if (groups.length > 0) return false;
  switch (word) {
    case 'imine':
      imine(carbonyl, draft);
      return true;
    case 'cyanohydrin':
      opened(carbonyl, draft);
      draft.bond(carbonyl.carbon, addSmiles('C#N', draft)[0]!, 1);
      return true;
    case 'azine': {
      const first = imine(carbonyl, draft);
      if (!buildWord(parent.unit, draft, choices)) return false;
      const [second] = carbonyls(draft);
      if (!second) return false;
      draft.bond(first, imine(second, draft), 1);
      return true;
    }
    default:
      return false;
  }
}

/** The double bond made single, so that carbon and oxygen have a valence each. */
function opened({ carbon, oxygen }: Carbonyl, draft: Draft): void {
  draft.bonds[draft.neighbours[oxygen]!.find((one) => one.atom === carbon)!.bond]!.order = 1;
}

function acetal(
  word: ClassWord,
  carbonyl: Carbonyl,
  groups: readonly Word[],
  draft: Draft,
  choices: Choices,
): boolean {
  const valences = buildGroups(groups, draft, choices)?.flatMap((one) => one.free) ?? [];
  if (valences.length !== (word.startsWith('hemi') ? 1 : 2)) return false;
  opened(carbonyl, draft);
  const [second] = addSmiles('O', draft);
  draft.bond(carbonyl.carbon, second!, 1);
  const places = [carbonyl.oxygen, second!];
  if (word.startsWith('dithio')) for (const place of places) draft.atoms[place]!.atomicNumber = 16;
  return valences.every((valence, index) => join(draft, places[index]!, valence));
}

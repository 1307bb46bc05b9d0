/** Ethers and esters named after their alcohol: `ethylene glycol monomethyl ether acetate`, `glycerol triacetate`. */
import { acylOf, bindToPlaces } from './acid-derivatives.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { alkenes, hydroxyls } from './found-groups.ts';
import { addSmiles, buildWord, type Word } from './words.ts';

/** Ether groups first, then acids on what is left of the hydroxy groups. */
export function buildAlcoholDerivative(
  alcohol: Word,
  ethers: readonly Word[],
  acid: Word | undefined,
  draft: Draft,
  choices: Choices,
): boolean {
  if (alcohol.count > 1 || !buildWord(alcohol.unit, draft, choices)) return false;
  const places = hydroxyls(draft);
  if (ethers.length > 0 && !bindToPlaces(places, ethers, draft, choices)) return false;
  if (!acid) return true;
  const left = places.filter((place) => draft.free(place) === 1);
  const unit = acylOf(acid.unit);
  if (!unit || (acid.mono !== true && left.length !== acid.count)) return false;
  return bindToPlaces(left, [{ ...acid, unit }], draft, choices);
}

/** `styrene glycol`: a hydroxy group on either carbon of the only double bond (older usage). */
export function buildGlycolOf(alkene: Word, draft: Draft, choices: Choices): boolean {
  if (alkene.count > 1 || !buildWord(alkene.unit, draft, choices)) return false;
  const [bond, ...others] = alkenes(draft);
  if (bond === undefined || others.length > 0) return false;
  const { from, to } = draft.bonds[bond]!;
  draft.bonds[bond]!.order = 1;
  for (const atom of [from, to]) draft.bond(atom, addSmiles('O', draft)[0]!, 1);
  return true;
}

/** Anhydrides of organic acids (P-65.7). */
import type { Unit } from '../tree.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { buildWord, join, type Word } from './words.ts';

export function isAnhydride(unit: Unit): boolean {
  return unit.endings.some((ending) => ending.suffix.name === 'anhydride');
}

/** `acetic anhydride`: two acyl groups on one oxygen; of a diacid, a ring (P-65.7.1). */
export function buildAnhydride(word: Word, draft: Draft, choices: Choices): boolean {
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

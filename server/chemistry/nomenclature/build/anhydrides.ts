/** Anhydrides of organic acids (P-65.7). */
import type { Ending, Unit } from '../tree.ts';
import type { Choices } from './choices.ts';
import type { Draft } from './draft.ts';
import { buildWord, join, type Word } from './words.ts';

export function isAnhydride(unit: Unit): boolean {
  return unit.endings.some((ending) => ending.suffix.name.endsWith('anhydride'));
}

/** `acetic anhydride`: two acyl groups on one oxygen; of a diacid, a ring (P-65.7.1). */
export function buildAnhydride(word: Word, draft: Draft, choices: Choices): boolean {
  const ending = word.unit.endings[0]!;
  const acyl = acylFrom(ending);
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

/** `acetic formic anhydride` (P-65.7.2): each acid has given one half. */
export function buildMixedAnhydride(first: Word, second: Word, draft: Draft, choices: Choices): boolean {
  const ending = second.unit.endings[0]!;
  if (first.unit.endings[0]!.count + ending.count !== 2) return false;
  const acid = buildWord(first.unit, draft, choices);
  const other = acid && buildWord({ ...second.unit, endings: [acylFrom(ending)] }, draft, choices);
  return other !== undefined && join(draft, acid!.sites[0]!, other.free[0]!);
}

function acylFrom(ending: Ending): Ending {
  const group = ending.suffix.group.replace(/\(=O\)\[O-\]$| \[O-\]$/, (end) =>
    end.startsWith('(') ? '=O' : '',
  );
  return { ...ending, suffix: { ...ending.suffix, name: 'oyl', group, radical: true, anion: false } };
}

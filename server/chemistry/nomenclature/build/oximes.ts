/** Derivatives of aldehydes and ketones named by a word after them (P-68.3.1.1.2). */
import type { Unit } from '../tree.ts';

/** The parent with its aldehyde or keto group turned into an oxime; undefined when it has no single one. */
export function oximeOf(unit: Unit): Unit | undefined {
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

/**
 * Two ways to one numbering: the locants typed for retained rings against those worked out by the rules of fusion
 * nomenclature (P-25.3.1.3). The rings that the recommendations number otherwise are the only ones that may differ.
 */
import { expect, test } from 'vitest';
import { skeletonFromSmiles } from '../../../../server/chemistry/nomenclature/build/skeleton.ts';
import { componentOf } from '../../../../server/chemistry/nomenclature/rings/fused-system.ts';
import { fusionLocants } from '../../../../server/chemistry/nomenclature/rings/fusion-numbering.ts';
import { rings } from '../../../../server/chemistry/nomenclature/vocabulary/rings.ts';

/** P-25.3.1.3, exceptions to systematic numbering. */
const exceptional = new Set([
  'acridan',
  'acridin',
  'anthracen',
  'carbazol',
  'cyclopenta[a]phenanthren',
  'phenanthren',
  'purin',
  // Not fused, but bridged.
  'norbornan',
  'selenoxanthen',
  'thioxanthen',
  'xanthen',
]);

test('the numbering of retained rings is the systematic one, except where the recommendations say otherwise', () => {
  const wrong: string[] = [];
  let held = 0;
  for (const [name, smiles, locants, mancude, indicated] of rings) {
    const skeleton = skeletonFromSmiles(smiles, locants, mancude === 'm', indicated)!;
    const component = componentOf(skeleton);
    // Atoms inside are left out: several ways of numbering them are in use.
    if (!component || component.rings.length < 2 || exceptional.has(name)) continue;
    const [ruled] = fusionLocants(component);
    held++;
    if (!ruled) {
      wrong.push(`${name}: cannot be numbered`);
      continue;
    }
    const inside = new Set(ruled.flatMap((locant, atom) => (locant === '' ? [atom] : [])));
    const outer = component.bonds.filter(({ from, to }) => !inside.has(from) && !inside.has(to));
    const byRule = edges(outer, ruled, component.elements);
    const typed = edges(outer, component.locants, component.elements);
    if (byRule.join() !== typed.join())
      wrong.push(`${name}: ${component.locants.join(' ')} but by rule ${ruled.join(' ')}`);
  }
  expect(wrong).toEqual([]);
  expect(held).toBeGreaterThan(30);
});

/** Bonds and heteroatoms by locant. */
function edges(
  bonds: readonly { from: number; to: number }[],
  locants: readonly string[],
  elements: readonly number[],
): string[] {
  const named = (atom: number) => `${locants[atom]!}:${String(elements[atom])}`;
  return bonds.map(({ from, to }) => [named(from), named(to)].sort().join('-')).sort();
}

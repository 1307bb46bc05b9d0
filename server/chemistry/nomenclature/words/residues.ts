/** Peptides: the acyl group of one amino acid on the nitrogen of the next (P-103.3). */
import type { GroupItem, Item } from './item.ts';
import type { Nest } from './groupings.ts';

/**
 * A row that ends in an amino acid, with the residues before it made one group on its nitrogen; the row itself when there
 * are none, undefined when they do not go together.
 */
export function residuesJoined(items: readonly Item[], nest: Nest): readonly Item[] | undefined {
  const last = items[items.length - 1];
  if (last?.kind !== 'group' || last.unit.residue !== true) return items;
  const before = items.findLastIndex((item, index) => index < items.length - 1 && isResidue(item));
  if (before < 0) return items;
  const unit = nest(items.slice(0, before + 1));
  if (!unit) return undefined;
  const residue = items[before] as GroupItem;
  const start = items[0]!.start;
  return [
    { ...residue, unit, locants: ['N'], joins: false, bracketed: true, start, bodyAt: start },
    ...items.slice(before + 1),
  ];
}

function isResidue(item: Item): boolean {
  return (
    item.kind === 'group' &&
    item.unit.residue === true &&
    item.role === 'radical' &&
    item.count === 1 &&
    item.locants === undefined
  );
}

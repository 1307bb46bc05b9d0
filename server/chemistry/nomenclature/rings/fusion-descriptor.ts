/** Fusion descriptors: which atoms of one component are which sides of another (P-25.3.2.4, P-25.3.4). */

/** One place at which a component is fused on. */
export interface Attachment {
  /** Locants of the component itself, in the direction of the sides; empty where they are left out. */
  readonly own: readonly string[];
  /** Consecutive sides of the base component, from 0 for a; empty for a component fused to another prefix. */
  readonly sides: readonly number[];
  /** Locants of the prefix to which the component is fused. */
  readonly other: readonly string[];
  /** Which of several base components is meant, from 0: the number of primes. */
  readonly copy: number;
}

const bracketed = /[[(]([0-9a-z',:-]+)[\])]/y;
const locant = "\\d+[a-z]?'*";
const locantList = new RegExp(`^${locant}(?:,${locant})*$`);
const withSides = new RegExp(`^(?:(${locant}(?:,${locant})*)-)?([a-z]+'*(?:,[a-z]+'*)*)$`);

/** `[2,3-d]`, `[b,e]`, `[1,2-b:4,5-b']`, `[1',2':1,2]` at the offset. */
export function fusionDescriptorAt(
  lower: string,
  offset: number,
): { readonly attachments: readonly Attachment[]; readonly end: number } | undefined {
  bracketed.lastIndex = offset;
  const match = bracketed.exec(lower);
  if (!match) return undefined;
  const parts = match[1]!.split(':');
  const end = bracketed.lastIndex;
  if (parts.every((part) => locantList.test(part))) {
    if (parts.length > 2) return undefined;
    const other = unprimed(parts[parts.length - 1]!);
    const own = parts.length === 2 ? unprimed(parts[0]!) : [];
    return { attachments: [{ own, sides: [], other, copy: 0 }], end };
  }
  const attachments: Attachment[] = [];
  for (const part of parts) {
    const read = withSides.exec(part);
    if (!read) return undefined;
    const own = read[1] === undefined ? [] : unprimed(read[1]);
    const places = read[2]!.split(',');
    if (places.length > 1 && own.length > 0) return undefined;
    for (const place of places) {
      const letters = place.replace(/'/g, '');
      const sides = [...letters].map((letter) => letter.charCodeAt(0) - 97);
      if (sides.some((side, index) => index > 0 && side !== sides[index - 1]! + 1)) return undefined;
      attachments.push({ own, sides, other: [], copy: place.length - letters.length });
    }
  }
  return { attachments, end };
}

function unprimed(list: string): string[] {
  return list.replace(/'/g, '').split(',');
}

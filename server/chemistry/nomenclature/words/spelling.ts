/**
 * Spelling as it is found in notebooks: marks of italics, words run together, words written apart. Only where no other
 * name could be meant; common practice, no source.
 */

/** What is written differently, each with what stands for the match. */
export const respellings: readonly (readonly [pattern: RegExp, replacement: (match: string) => string])[] = [
  // `<i>N</i>`, `*N*,*N*-dimethyl…`, `_tert_-butyl`
  [/<\/?(?:i|em|sub|sup)>/gi, () => ''],
  [/(?<![\w*])([*_]{1,2})[a-z]{1,5}\1(?![\w*])/gi, (match) => match.replace(/[*_]/g, '')],
  // `aceticacid`
  [/(?:ic|ous)(?=acid(?:$|[ ,]))/gi, (match) => `${match} `],
  // `diethylether`, `benzylchloride`: no parent compound has such a name.
  [
    /yl(?=(?:ether|(?:hydro)?peroxide|ketone|alcohol|mercaptan|(?:di)?sulfide|sulfoxide|sulfone|azide|fluoride|chloride|bromide|iodide|(?:iso)?cyanide|(?:iso)?(?:thio)?cyanate)$)/gi,
    (match) => `${match} `,
  ],
  // `acetoneoxime`, `acetaldehydeoxime`
  [/(?:one|aldehyde)(?=(?:oxime|hydrazone|semicarbazone)$)/gi, (match) => `${match} `],
  // `ethylacetate`: the acid with the chain would be called after the longer chain (P-44.3).
  [
    /^(?:n-)?(?:meth|eth|prop|but|pent|hex|hept|oct|non|dec)yl(?=(?:form|acet)ate$)/gi,
    (match) => `${match} `,
  ],
];

const prefixEnd = /(?:o|oxy)$/;
const radicalEnd = /yl$/;
/** Words with which groups before them make a compound of several words. */
const classEnd =
  /(?:ate|ite|acid|ide|ether|ester|ketone|sulfone|alcohol|acetal|ketal|salt|glycol|glycerol|oxime|zone|\bazine)$/;

/**
 * Where words were written apart that are one (`2-chloro phenol`, `3-methyl octane`): each space with what belongs there,
 * or undefined when there is none. A hydrocarbyl group stays apart where an ester or its like could be meant.
 */
export function wrongSpaces(
  lower: string,
  aminoAcids: ReadonlySet<string>,
): ReadonlyMap<number, '' | '-'> | undefined {
  const words = lower.split(' ');
  const last = words[words.length - 1]!;
  if (words.length < 2 || words.length > 5) return undefined;
  const joinable = !classEnd.test(last) && !aminoAcids.has(last.replace(/^[dl]-/, ''));
  const found = new Map<number, '' | '-'>();
  let at = 0;
  for (const [index, word] of words.slice(0, -1).entries()) {
    at += word.length + (index === 0 ? 0 : 1);
    const next = words[index + 1]!;
    if (prefixEnd.test(word)) found.set(at, /^\d/.test(next) ? '-' : '');
    else if (joinable && radicalEnd.test(word))
      found.set(at, radicalEnd.test(next) || /^[\d(]/.test(next) ? '-' : '');
    else if (joinable) return undefined;
  }
  return found.size > 0 ? found : undefined;
}

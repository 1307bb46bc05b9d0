/**
 * Where raw HTML begins and ends in a Markdown document (CommonMark 0.31.2, section 4.6): whatever looks like a
 * fence in there is none.
 */

/** The seven start conditions of the specification, by number. */
export type HtmlBlockKind = 1 | 2 | 3 | 4 | 5 | 6 | 7;

const blockTags =
  'address|article|aside|base|basefont|blockquote|body|caption|center|col|colgroup|dd|details|dialog|dir|div|dl|' +
  'dt|fieldset|figcaption|figure|footer|form|frame|frameset|h1|h2|h3|h4|h5|h6|head|header|hr|html|iframe|legend|' +
  'li|link|main|menu|menuitem|nav|noframes|ol|optgroup|option|p|param|search|section|summary|table|tbody|td|' +
  'tfoot|th|thead|title|tr|track|ul';
const tagName = '[A-Za-z][A-Za-z0-9-]*';
const attribute =
  '[ \\t]+[A-Za-z_:][A-Za-z0-9_.:-]*(?:[ \\t]*=[ \\t]*(?:[^ \\t"\'=<>`]+|\'[^\']*\'|"[^"]*"))?';

const starts: readonly [HtmlBlockKind, RegExp][] = [
  [1, /^<(?:script|pre|style|textarea)(?:[ \t>]|$)/i],
  [2, /^<!--/],
  [3, /^<\?/],
  [4, /^<![A-Za-z]/],
  [5, /^<!\[CDATA\[/],
  [6, new RegExp(`^</?(?:${blockTags})(?:[ \\t]|/?>|$)`, 'i')],
  [7, new RegExp(`^(?:<${tagName}(?:${attribute})*[ \\t]*/?>|</${tagName}[ \\t]*>)[ \\t]*$`)],
];

/** Only kinds 1 to 5: 6 and 7 end at a blank line. */
const ends: Readonly<Record<1 | 2 | 3 | 4 | 5, RegExp>> = {
  1: /<\/(?:script|pre|style|textarea)>/i,
  2: /-->/,
  3: /\?>/,
  4: />/,
  5: /\]\]>/,
};

/** `rest` is a line from its first character that is not white space. */
export function htmlBlockStart(rest: string): HtmlBlockKind | undefined {
  return starts.find(([, pattern]) => pattern.test(rest))?.[0];
}

export function endsAtBlankLine(kind: HtmlBlockKind): kind is 6 | 7 {
  return kind >= 6;
}

/** Whether the block ends with this line. */
export function htmlBlockEnds(kind: HtmlBlockKind, line: string): boolean {
  return !endsAtBlankLine(kind) && ends[kind].test(line);
}

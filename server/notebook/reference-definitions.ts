/**
 * Whether a paragraph consists of link reference definitions and nothing else (CommonMark 0.31.2, section 4.7).
 * It matters in one place: an underline below them makes no heading.
 */
const label = String.raw`\[(?=[^\]]*[^\s\]])(?:[^\\[\]]|\\[^])*\]`;
const destination = String.raw`(?:<(?:[^<>\\\n]|\\.)*>|(?!<)[^\s\u0000-\u001f\u007f]+)`;
const title = String.raw`(?:"(?:[^"\\]|\\[^])*"|'(?:[^'\\]|\\[^])*'|\((?:[^()\\]|\\[^])*\))`;
const gap = String.raw`[ \t]*(?:\n[ \t]*)?`;
const definition = new RegExp(
  `${label}:${gap}${destination}(?:(?:[ \\t]+|[ \\t]*\\n[ \\t]*)${title}(?=[ \\t]*(?:\\n|$)))?[ \\t]*(?:\\n|$)`,
  'y',
);

/** `paragraph` has no indentation and no marks of quotes or lists on any of its lines. */
export function isReferenceDefinitions(paragraph: string): boolean {
  let at = 0;
  while (at < paragraph.length) {
    definition.lastIndex = at;
    const found = definition.exec(paragraph);
    if (found === null) return false;
    at += found[0].length;
  }
  return paragraph.length > 0;
}

/** Markdown for hovers. Whatever comes from a notebook is escaped: it must show as it was written and do nothing. */

/**
 * Shows as the plain text that it is. Only what can mean something where it stands gets a backslash, since names
 * are full of brackets and hyphens, and some clients show Markdown as it is written. Line breaks become blanks.
 */
export function escaped(text: string): string {
  return text
    .replace(/\s+/g, ' ')
    .replace(/[\\`*_[\]{}#|~$!@]/g, '\\$&')
    .replace(/&/g, '&amp;')
    .replace(/</g, '&lt;')
    .replace(/>/g, '&gt;')
    .replace(/:(?=\/\/)|(?<=www)\./gi, '\\$&')
    .replace(
      /^( *)([-+=]|\d+[.)])(?= |$)/,
      (_, blanks: string, mark: string) => `${blanks}${mark.slice(0, -1)}\\${mark.slice(-1)}`,
    );
}

/** A text in fixed width; long enough fences for any backticks in it. */
export function code(text: string): string {
  const flat = text.replace(/[\r\n\t]+/g, ' ').replaceAll('|', '\\|');
  const longest = Math.max(0, ...[...flat.matchAll(/`+/g)].map((run) => run[0].length));
  const fence = '`'.repeat(longest + 1);
  const pad = flat.startsWith('`') || flat.endsWith('`') ? ' ' : '';
  return `${fence}${pad}${flat}${pad}${fence}`;
}

/** A picture that travels in the text; `alt` is for those who cannot see it. */
export function picture(svg: string, alt: string): string {
  const width = /width="(\d+)"/.exec(svg)?.[1];
  // Drawings are ASCII.
  const data = btoa(svg);
  const size = width === undefined ? '' : `|width=${width}`;
  return `![${escaped(alt)}](data:image/svg+xml;base64,${data}${size})`;
}

/** A table without a heading that says anything; cells are Markdown already. */
export function table(rows: readonly (readonly [string, string])[]): string {
  return ['| | |', '|:--|:--|', ...rows.map(([name, value]) => `| ${name} | ${value} |`)].join('\n');
}

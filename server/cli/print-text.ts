/** `isonym check` for people: findings grouped by file, each with the line it is about. */
import { styleText } from 'node:util';
import type { Severity } from '../checks/severity.ts';
import type { CheckResult, FoundIn, Summary } from './found.ts';
import { printable, terminalWidth } from './printable.ts';

export interface TextStyle {
  readonly colour: boolean;
  /** Columns of the terminal; longer source lines are cut round the finding. */
  readonly width: number;
}

type Format = Parameters<typeof styleText>[0];

const severityFormat: Record<Severity, Format> = { error: 'red', warning: 'yellow', information: 'blue' };

export function formatText(result: CheckResult, style: TextStyle): string {
  const paint = (format: Format, text: string) =>
    style.colour ? styleText(format, text, { validateStream: false }) : text;
  const lines: string[] = [];
  let file: string | undefined;
  for (const found of result.findings) {
    if (found.file !== file) {
      file = found.file;
      if (lines.length > 0) lines.push('');
      lines.push(paint('bold', printable(file)));
    }
    const place = `${found.line}:${found.column}`;
    const severity = paint(severityFormat[found.severity], found.severity);
    lines.push(`  ${place} ${severity} ${paint('dim', found.check)}`);
    lines.push(...wrapped(printable(found.message), style.width - 4).map((line) => `    ${line}`));
    const { source, mark } = excerpt(found, style.width - 4);
    lines.push(paint('dim', `    ${source}`), `    ${paint(severityFormat[found.severity], mark)}`);
  }
  if (lines.length > 0) lines.push('');
  lines.push(summaryLine(result.summary));
  return `${lines.join('\n')}\n`;
}

export function summaryLine(summary: Summary): string {
  const { files, compounds, reactions, errors, warnings, informations } = summary;
  const looked = `${count(files, 'file')}, ${count(compounds, 'compound')}, ${count(reactions, 'reaction')}`;
  if (errors + warnings + informations === 0) return `Nothing found in ${looked}.`;
  return (
    `${count(errors, 'error')}, ${count(warnings, 'warning')}, ${count(informations, 'piece', 'pieces')} of information ` +
    `in ${looked}.`
  );
}

function count(number: number, one: string, many = `${one}s`): string {
  return `${number} ${number === 1 ? one : many}`;
}

/** Breaks at blanks; a word longer than the line, such as a SMILES, stays whole. */
function wrapped(text: string, width: number): string[] {
  const lines: string[] = [];
  let line = '';
  let used = 0;
  for (const word of text.split(' ')) {
    const needed = terminalWidth(word);
    if (used > 0 && used + 1 + needed > width) {
      lines.push(line);
      line = word;
      used = needed;
    } else {
      line = line === '' ? word : `${line} ${word}`;
      used += used === 0 ? needed : needed + 1;
    }
  }
  return [...lines, line];
}

/** The source line, cut to `width` round the finding, and below it a mark of the same place. */
function excerpt(found: FoundIn, width: number): { source: string; mark: string } {
  const text = printable(found.lineText);
  const start = Math.min(found.column - 1, text.length);
  const end = found.endLine === found.line ? Math.min(found.endColumn - 1, text.length) : text.length;
  let from = 0;
  let to = text.length;
  if (terminalWidth(text) > width) {
    // Some context before the finding, the rest after it.
    from = Math.max(0, Math.min(start - Math.floor(width / 4), text.length - width + 2));
    to = Math.min(text.length, from + width - 2);
  }
  const before = from > 0 ? '…' : '';
  const after = to < text.length ? '…' : '';
  const lead = before + text.slice(from, start);
  const marked = text.slice(start, Math.min(end, to));
  return {
    source: before + text.slice(from, to) + after,
    mark: ' '.repeat(terminalWidth(lead)) + '^'.repeat(Math.max(1, terminalWidth(marked))),
  };
}

/**
 * The reviewer's page as HTML: one file that needs nothing else, runs no script and asks no network. Everything
 * that comes from a notebook goes through `text`.
 */
import { createHash } from 'node:crypto';
import { severities, type Severity } from '../checks/severity.ts';
import { printable } from './printable.ts';
import type { Report, ReportEntry, ReportFile, ReportFinding, ReportStructure } from './report-model.ts';
import { reportStyle } from './report-style.ts';

const severityWords: Record<Severity, readonly [one: string, many: string]> = {
  error: ['error', 'errors'],
  warning: ['warning', 'warnings'],
  information: ['piece of information', 'pieces of information'],
};

export function reportPage(report: Report): string {
  const styleHash = createHash('sha256').update(reportStyle).digest('base64');
  const { summary } = report;
  const shown = report.files.filter((file) => file.entries.length + file.findings.length > 0);
  const counts: readonly (readonly [number, readonly [string, string], string])[] = [
    [summary.compounds, ['compound', 'compounds'], ''],
    [summary.reactions, ['reaction', 'reactions'], ''],
    [summary.errors, severityWords.error, 'error'],
    [summary.warnings, severityWords.warning, 'warning'],
    [summary.informations, severityWords.information, 'information'],
  ];
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'sha256-${styleHash}'">
<meta name="referrer" content="no-referrer">
<title>${text(report.title)} – notebook report</title>
<style>${reportStyle}</style>
</head>
<body>
<header>
<h1>${text(report.title)}</h1>
<p class="soft">Notebook report of ${text(report.date)}</p>
<ul class="counts">
${counts
  .map(([number, words, look]) => {
    const shown = number > 0 ? look : '';
    return `<li class="${shown}"><b>${number}</b>${number === 1 ? words[0] : words[1]}</li>`;
  })
  .join('\n')}
</ul>
${report.problems.map((problem) => `<p class="error">${text(problem)}</p>`).join('\n')}
</header>
${fileTable(shown)}
${emptyPages(report.files.length - shown.length)}
<main>
${shown.map(fileSection).join('\n')}
</main>
<section class="signature">
<div>Recorded by, date</div>
<div>Reviewed by, date</div>
</section>
<footer>
<p>Made by Isonym ${text(report.version)}. The page reports what the entries say and where they contradict each
other; it replaces neither the reviewer nor the safety data sheet and the local rules.</p>
</footer>
</body>
</html>
`;
}

/** Any text, as text. */
export function text(value: string): string {
  return printable(value).replace(
    /[&<>"']/g,
    (character) => ({ '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' })[character]!,
  );
}

function allFindings(file: ReportFile): readonly ReportFinding[] {
  return [...file.findings, ...file.entries.flatMap((entry) => entry.findings)];
}

function emptyPages(count: number): string {
  if (count === 0) return '';
  return `<p class="soft">${count === 1 ? '1 more page holds' : `${count} more pages hold`} no entries.</p>`;
}

function fileTable(files: readonly ReportFile[]): string {
  const rows = files.map((file, index) => {
    const findings = allFindings(file);
    const cells = severities.map((severity) => {
      const number = findings.filter((finding) => finding.severity === severity).length;
      return `<td class="number ${number > 0 ? severity : 'soft'}">${number}</td>`;
    });
    return `<tr><td><a href="#file-${index + 1}">${text(file.path)}</a></td><td class="number">${file.entries.length}</td>${cells.join('')}</tr>`;
  });
  return `<table class="files">
<thead><tr><th>Page</th><th class="number">entries</th><th class="number">errors</th><th class="number">warnings</th><th class="number">information</th></tr></thead>
<tbody>
${rows.join('\n')}
</tbody>
</table>`;
}

function fileSection(file: ReportFile, index: number): string {
  return `<section>
<h2 id="file-${index + 1}">${text(file.path)}</h2>
${findingList(file.findings)}
${file.entries.map(entryCard).join('\n')}
</section>`;
}

function entryCard(entry: ReportEntry): string {
  const label = entry.label === undefined ? '' : `<span class="label">${text(entry.label)}</span>`;
  const formula = entry.formula === undefined ? '' : `<span class="formula">${text(entry.formula)}</span>`;
  const sound = entry.findings.length === 0 ? '<p class="remark fine">Nothing found.</p>' : '';
  return `<article id="${entry.id}">
<div class="head">${label}<h3>${text(entry.heading)}</h3>${formula}<span class="line">${entry.kind}, line ${entry.line}</span></div>
<div class="body">
${structureFigures(entry.structures)}
${factTables(entry)}
</div>
${entry.remarks.map((remark) => `<p class="remark">${text(remark)}</p>`).join('\n')}
${findingList(entry.findings)}${sound}
${entry.accepted.map(({ check, reason }) => `<p class="accepted">Accepted: ${text(check)} – ${text(reason)}</p>`).join('\n')}
</article>`;
}

function structureFigures(structures: readonly ReportStructure[]): string {
  if (structures.length === 0) return '';
  const figures = structures.map(({ caption, svg }) => {
    const shown = svg ?? '<p class="soft">no drawing</p>';
    const below = structures.length === 1 && svg !== null ? '' : `<figcaption>${text(caption)}</figcaption>`;
    return `<figure role="img" aria-label="${text(caption)}">${shown}${below}</figure>`;
  });
  return `<div class="structures">${figures.join('')}</div>`;
}

/** What follows from the structure, and beside it what the notebook says. */
function factTables({ facts, fields }: ReportEntry): string {
  const computed = facts.map(([name, value]) => [name, text(value)] as const);
  const recorded = fields.map(([key, values]) => {
    const items = values.map((value) => `<li>${text(value)}</li>`).join('');
    return [key, values.length === 1 ? text(values[0]!) : `<ul>${items}</ul>`] as const;
  });
  return `<div class="facts">${factTable('Computed', computed)}${factTable('Recorded', recorded)}</div>`;
}

/** Values are HTML already. */
function factTable(caption: string, rows: readonly (readonly [string, string])[]): string {
  if (rows.length === 0) return '';
  const lines = rows.map(([name, value]) => `<tr><th scope="row">${text(name)}</th><td>${value}</td></tr>`);
  return `<table><caption>${caption}</caption>${lines.join('\n')}</table>`;
}

function findingList(findings: readonly ReportFinding[]): string {
  if (findings.length === 0) return '';
  const items = findings.map(({ severity, check, message, line, source }) => {
    const marked = `${text(source.before)}<mark>${text(source.marked)}</mark>${text(source.after)}`;
    return `<li class="${severity}"><span class="what">${severity} · ${text(check)} · line ${line}</span><p>${text(message)}</p><code>${marked}</code></li>`;
  });
  return `<ul class="findings">${items.join('\n')}</ul>`;
}

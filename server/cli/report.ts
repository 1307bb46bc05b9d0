/** `isonym report`: one page for the reviewer. */
import { createHash } from 'node:crypto';
import { renameSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { version } from '../../package.json';
import type { Finding } from '../checks/finding.ts';
import type { Toolkit } from '../toolkit/toolkit.ts';
import { LineTable } from '../workspace/lines.ts';
import type { PlacedBlock } from '../workspace/page.ts';
import { resultOf } from './check.ts';
import { collect, shownPath, type CollectedFile } from './collect.ts';
import { exitCode, RunProblem } from './exit.ts';
import { printable } from './printable.ts';
import { describeEntry } from './report-entry.ts';
import type { ReportEntry, ReportFile, ReportFinding, ReportStructure } from './report-model.ts';
import { reportPage } from './report-page.ts';
import { summaryLine } from './print-text.ts';
import { reason } from '../workspace/source-file.ts';

export interface ReportArguments {
  readonly paths: readonly string[];
  readonly output: string;
  readonly config: string | undefined;
}

const box = { widthPx: 320, heightPx: 220, colour: 'currentColor' };
const smallBox = { widthPx: 190, heightPx: 140, colour: 'currentColor' };

export async function report(request: ReportArguments): Promise<number> {
  const output = resolve(request.output);
  refuseToOverwrite(output, request.output);
  const { files, problems: unread, toolkit } = await collect(request.paths, request.config);
  const problems = [...unread];
  for (const notebook of new Set(files.map((file) => file.notebook))) await notebook.settle();
  const { summary } = resultOf(files);
  const described: ReportFile[] = [];
  for (const file of files) described.push(await describeFile(file, toolkit));
  if (toolkit.failure !== undefined) problems.push(toolkit.failure);
  await toolkit.dispose();
  const page = reportPage({
    title: request.paths.map((path) => shownPath(resolve(path))).join(', '),
    date: today(),
    version,
    summary,
    files: described,
    problems,
  });
  writeAtomically(output, page);
  for (const problem of problems) console.error(`isonym: ${printable(problem)}`);
  console.error(`${shownPath(output)} written. ${summaryLine(summary)}`);
  return problems.length > 0 ? exitCode.couldNotRun : exitCode.nothingFound;
}

async function describeFile({ shown, notebook, name }: CollectedFile, toolkit: Toolkit): Promise<ReportFile> {
  const page = notebook.page(name);
  if (page === undefined) return { path: shown, entries: [], findings: [] };
  const lines = new LineTable(page.text);
  const findings = notebook.findings(name);
  const inBlock = (block: PlacedBlock, finding: Finding) =>
    finding.range.start >= block.range.start && finding.range.end <= block.range.end;
  const entries: ReportEntry[] = [];
  for (const block of page.blocks) {
    const description = describeEntry(block.read.model);
    const size = description.drawings.length === 1 ? box : smallBox;
    const structures = await Promise.all(
      description.drawings.map(async ({ smiles, caption }): Promise<ReportStructure> => ({
        caption,
        svg: await toolkit.draw(smiles, size),
      })),
    );
    const facts = await toolkit.facts(description.identity === undefined ? [] : [description.identity]);
    const inchiKey = facts.get(description.identity ?? '')?.inchiKey;
    const line = lines.placeAt(block.range.start).line + 1;
    entries.push({
      kind: block.read.model.kind,
      id: anchor(shown, line),
      line,
      label: description.label,
      heading: description.heading,
      formula: description.formula,
      structures,
      facts: [
        ...description.facts,
        ...(inchiKey === undefined || inchiKey === '' ? [] : [['InChIKey', inchiKey] as const]),
      ],
      remarks: description.remarks,
      fields: description.fields,
      findings: findings
        .filter((finding) => inBlock(block, finding))
        .map((finding) => describeFinding(finding, lines)),
      accepted: description.accepted,
    });
  }
  const outside = findings.filter((finding) => !page.blocks.some((block) => inBlock(block, finding)));
  return { path: shown, entries, findings: outside.map((finding) => describeFinding(finding, lines)) };
}

function describeFinding({ severity, check, message, range }: Finding, lines: LineTable): ReportFinding {
  const start = lines.placeAt(range.start);
  const end = lines.placeAt(range.end);
  const text = lines.lineText(start.line);
  const until = end.line === start.line ? end.character : text.length;
  return {
    severity,
    check,
    message,
    line: start.line + 1,
    source: {
      before: text.slice(0, start.character),
      marked: text.slice(start.character, until),
      after: text.slice(until),
    },
  };
}

/** The same entry has the same anchor in the next report, as long as it stands in the same line. */
function anchor(file: string, line: number): string {
  return `entry-${createHash('sha256').update(file).digest('hex').slice(0, 8)}-${line}`;
}

/** In the local calendar; SOURCE_DATE_EPOCH (reproducible-builds.org) takes its place where it is set. */
function today(): string {
  const stated = process.env['SOURCE_DATE_EPOCH'];
  const seconds = stated === undefined || stated === '' ? Number.NaN : Number(stated);
  if (Number.isFinite(seconds)) return new Date(seconds * 1000).toISOString().slice(0, 10);
  const now = new Date();
  const two = (number: number) => String(number).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}

/** A report takes the place of an older report, never that of a notebook page. */
function refuseToOverwrite(path: string, asWritten: string): void {
  if (/\.(?:md|markdown)$/i.test(path)) {
    throw new RunProblem(
      `${asWritten} has the name of a notebook page; give the report a name that ends in .html.`,
    );
  }
  try {
    if (statSync(path).isDirectory()) throw new RunProblem(`${asWritten} is a folder; name a file in it.`);
  } catch (error) {
    if (error instanceof RunProblem) throw error;
  }
}

/** Nobody ever sees half a report. */
function writeAtomically(path: string, text: string): void {
  const draft = `${path}.${process.pid}.tmp`;
  try {
    writeFileSync(draft, text);
    renameSync(draft, path);
  } catch (error) {
    rmSync(draft, { force: true });
    throw new RunProblem(`${shownPath(path)} ${reason(error)}.`);
  }
}

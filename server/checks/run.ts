/**
 * Runs the checks: entry by entry, and once over all entries of a notebook. Same entries, settings and facts,
 * same findings in the same order. A check that breaks is reported as such and takes no other with it.
 */
import type { Entry, NotebookDocument } from '../notebook/model.ts';
import { withoutAccepted } from './accept.ts';
import type { ToolkitFactsOf } from './facts.ts';
import type { Check, Finding, Report } from './finding.ts';
import { checks } from './index.ts';
import { modelOf, type EntryModel, type NotebookModel } from './model.ts';
import type { Settings } from './settings.ts';

export interface Analysis {
  /** By range, then by id of the check. */
  readonly findings: readonly Finding[];
  /** Canonical SMILES whose facts were not there yet; run again when they are. */
  readonly wanted: readonly string[];
}

/** A whole document by itself, checks that look across entries included. */
export function analyse(document: NotebookDocument, settings: Settings, toolkit: ToolkitFactsOf): Analysis {
  const wanted = new Set<string>();
  const noting: ToolkitFactsOf = (smiles) => {
    const facts = toolkit(smiles);
    if (facts === 'pending') wanted.add(smiles);
    return facts;
  };
  const models = document.entries.map((entry) => modelOf(entry, settings));
  const across = analyseNotebook({ files: new Map([['', models]]), settings });
  const findings = [...models.flatMap((model) => analyseEntry(model, noting)), ...(across.get('') ?? [])];
  return { findings: findings.sort(byPlace), wanted: [...wanted] };
}

/** The findings of one block, in order; its ranges are those of the entry. Depends on nothing else. */
export function analyseEntry(model: EntryModel, toolkit: ToolkitFactsOf): Finding[] {
  const findings: Finding[] = [];
  const broken: Finding[] = [];
  const silent = new Set<string>();
  for (const check of checks) {
    if (check.run === undefined || model.settings.severity[check.id] === 'off') continue;
    const noting: ToolkitFactsOf = (smiles) => {
      const facts = toolkit(smiles);
      if (typeof facts === 'string') silent.add(check.id);
      return facts;
    };
    try {
      check.run(model, (found) => findings.push(findingOf(check, found, model.settings)), noting);
    } catch (error) {
      silent.add(check.id);
      broken.push(internalFinding(check, model.entry, error));
    }
  }
  const decides = (check: Check) => check.run !== undefined && !silent.has(check.id);
  const standing = withoutAccepted(model, findings, { checks, decides, reportsUnknownIds: true });
  return [...standing, ...broken].sort(byPlace);
}

/** The findings of the checks that look at all entries, by file. */
export function analyseNotebook(notebook: NotebookModel): ReadonlyMap<string, readonly Finding[]> {
  const found = new Map<string, Finding[]>();
  const broken = new Map<string, Finding[]>();
  const silent = new Set<string>();
  for (const check of checks) {
    if (check.runNotebook === undefined || notebook.settings.severity[check.id] === 'off') continue;
    try {
      check.runNotebook(notebook, (file, report) =>
        push(found, file, findingOf(check, report, notebook.settings)),
      );
    } catch (error) {
      silent.add(check.id);
      const [file, models] = [...notebook.files].find(([, each]) => each.length > 0) ?? [];
      if (file !== undefined) push(broken, file, internalFinding(check, models![0]!.entry, error));
    }
  }
  const decides = (check: Check) => check.runNotebook !== undefined && !silent.has(check.id);
  const result = new Map<string, readonly Finding[]>();
  for (const [file, models] of notebook.files) {
    const findings = [...(broken.get(file) ?? [])];
    for (const model of models) {
      const { range } = model.entry.block;
      const own = (found.get(file) ?? []).filter(
        (finding) => finding.range.start >= range.start && finding.range.end <= range.end,
      );
      findings.push(...withoutAccepted(model, own, { checks, decides, reportsUnknownIds: false }));
    }
    if (findings.length > 0) result.set(file, findings.sort(byPlace));
  }
  return result;
}

function findingOf(check: Check, found: Report, settings: Settings): Finding {
  const configured = settings.severity[check.id];
  return {
    check: check.id,
    severity:
      configured !== undefined && configured !== 'off' ? configured : (found.severity ?? check.severity),
    range: found.range,
    message: found.message,
    fixes: found.fixes ?? [],
    related: found.related ?? [],
  };
}

function internalFinding(check: Check, entry: Entry, error: unknown): Finding {
  const reason = error instanceof Error ? error.message : String(error);
  return {
    check: check.id,
    severity: 'warning',
    range: entry.block.kindRange,
    message:
      `The check ${check.id} broke down on this block (${reason}), so it has said nothing here. ` +
      `All other checks have run. This is a fault of the program: please report it with the block.`,
    fixes: [],
    related: [],
  };
}

function push(lists: Map<string, Finding[]>, file: string, finding: Finding): void {
  const list = lists.get(file);
  if (list === undefined) lists.set(file, [finding]);
  else list.push(finding);
}

/** Code-unit order of ids and messages, the same in every locale. */
export function byPlace(first: Finding, second: Finding): number {
  return (
    first.range.start - second.range.start ||
    first.range.end - second.range.end ||
    compare(first.check, second.check) ||
    compare(first.message, second.message)
  );
}

function compare(first: string, second: string): number {
  return first < second ? -1 : first > second ? 1 : 0;
}

/** `isonym check`. */
import { severities, type Severity } from '../checks/severity.ts';
import { LineTable } from '../workspace/lines.ts';
import { wantsColour } from './colour.ts';
import { collect, type CollectedFile } from './collect.ts';
import { exitCode } from './exit.ts';
import type { CheckResult, FoundIn } from './found.ts';
import { formatJson } from './print-json.ts';
import { formatText } from './print-text.ts';
import { printable } from './printable.ts';

export interface CheckArguments {
  readonly paths: readonly string[];
  readonly format: 'text' | 'json';
  readonly failOn: Severity;
  readonly config: string | undefined;
}

export async function check(request: CheckArguments): Promise<number> {
  const { files, problems, toolkit } = await collect(request.paths, request.config);
  for (const notebook of new Set(files.map((file) => file.notebook))) await notebook.settle();
  const result = resultOf(files);
  process.stdout.write(
    request.format === 'json'
      ? formatJson(result)
      : formatText(result, { colour: wantsColour(), width: process.stdout.columns ?? 100 }),
  );
  for (const problem of problems) console.error(`isonym: ${printable(problem)}`);
  if (toolkit.failure !== undefined) console.error(`isonym: ${toolkit.failure}`);
  await toolkit.dispose();
  if (problems.length > 0) return exitCode.couldNotRun;
  const failing = severities.slice(0, severities.indexOf(request.failOn) + 1);
  return result.findings.some((found) => failing.includes(found.severity))
    ? exitCode.found
    : exitCode.nothingFound;
}

/** In the order of the files, which is that of their paths. */
export function resultOf(files: readonly CollectedFile[]): CheckResult {
  const findings: FoundIn[] = [];
  let compounds = 0;
  let reactions = 0;
  for (const { shown, notebook, name } of files) {
    for (const model of notebook.models(name)) {
      if (model.kind === 'compound') compounds++;
      else reactions++;
    }
    const found = notebook.findings(name);
    if (found.length === 0) continue;
    const lines = new LineTable(notebook.page(name)?.text ?? '');
    for (const { check, severity, message, range } of found) {
      const start = lines.placeAt(range.start);
      const end = lines.placeAt(range.end);
      findings.push({
        file: shown,
        line: start.line + 1,
        column: start.character + 1,
        endLine: end.line + 1,
        endColumn: end.character + 1,
        check,
        severity,
        message,
        lineText: lines.lineText(start.line),
      });
    }
  }
  const count = (severity: Severity) => findings.filter((found) => found.severity === severity).length;
  return {
    findings,
    summary: {
      files: files.length,
      compounds,
      reactions,
      errors: count('error'),
      warnings: count('warning'),
      informations: count('information'),
    },
  };
}

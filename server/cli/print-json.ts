/** `isonym check --format json`. */
import type { CheckResult } from './found.ts';
import { printableJson } from './printable.ts';

export function formatJson(result: CheckResult): string {
  const findings = result.findings.map(
    ({ file, line, column, endLine, endColumn, check, severity, message }) => ({
      file,
      line,
      column,
      endLine,
      endColumn,
      check,
      severity,
      message,
    }),
  );
  return `${printableJson({ findings, summary: result.summary }, 2)}\n`;
}

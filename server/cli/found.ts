/** What `isonym check` has to print, whatever the format: findings placed by line and column. */
import type { Severity } from '../checks/severity.ts';

export interface FoundIn {
  /** As the user would write it: relative to the current folder, `/` between folders; `-` for standard input. */
  readonly file: string;
  /** All from 1; columns count UTF-16 code units, as editors do. */
  readonly line: number;
  readonly column: number;
  readonly endLine: number;
  readonly endColumn: number;
  readonly check: string;
  readonly severity: Severity;
  readonly message: string;
  /** The line in which it begins, for the excerpt. */
  readonly lineText: string;
}

export interface Summary {
  readonly files: number;
  readonly compounds: number;
  readonly reactions: number;
  readonly errors: number;
  readonly warnings: number;
  readonly informations: number;
}

export interface CheckResult {
  readonly findings: readonly FoundIn[];
  readonly summary: Summary;
}

/** What the reviewer's page shows, before it is HTML. All texts are plain; drawings are SVG of our own toolkit. */
import type { Severity } from '../checks/severity.ts';
import type { Summary } from './found.ts';

export interface Report {
  /** What was checked, as the user wrote it. */
  readonly title: string;
  /** Day of the report, `2026-03-02`. */
  readonly date: string;
  readonly version: string;
  readonly summary: Summary;
  readonly files: readonly ReportFile[];
  /** What could not be checked, one sentence each. */
  readonly problems: readonly string[];
}

export interface ReportFile {
  readonly path: string;
  readonly entries: readonly ReportEntry[];
  /** Findings that belong to no entry. */
  readonly findings: readonly ReportFinding[];
}

export interface ReportFinding {
  readonly severity: Severity;
  readonly check: string;
  readonly message: string;
  /** From 1. */
  readonly line: number;
  /** The source line before, in and after the place. */
  readonly source: { readonly before: string; readonly marked: string; readonly after: string };
}

export interface ReportStructure {
  readonly caption: string;
  readonly svg: string | null;
}

export interface ReportEntry {
  readonly kind: 'compound' | 'reaction';
  /** Anchor on the page. */
  readonly id: string;
  readonly line: number;
  readonly label: string | undefined;
  /** The name, or the scheme of a reaction, as the notebook has it. */
  readonly heading: string;
  readonly formula: string | undefined;
  readonly structures: readonly ReportStructure[];
  /** Name and value. */
  readonly facts: readonly (readonly [string, string])[];
  /** How the name is to be understood, where it is not definite. */
  readonly remarks: readonly string[];
  /** Key and value as written, for what the page shows of the block itself. */
  readonly fields: readonly (readonly [string, readonly string[]])[];
  readonly findings: readonly ReportFinding[];
  readonly accepted: readonly { readonly check: string; readonly reason: string }[];
}

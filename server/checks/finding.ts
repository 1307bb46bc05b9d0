/** What a check reports, and what a check is. */
import type { Fix, TextRange } from '../chemistry/text.ts';
import type { ToolkitFactsOf } from './facts.ts';
import type { EntryModel, NotebookModel } from './model.ts';
import type { Severity } from './severity.ts';

export interface RelatedPlace {
  /** Path of the file relative to the notebook's root, or undefined for the same file. */
  readonly file?: string;
  readonly range: TextRange;
  readonly message: string;
}

export interface Finding {
  /** Id of the check. */
  readonly check: string;
  readonly severity: Severity;
  /** In the document, never outside of it. */
  readonly range: TextRange;
  /** What is wrong, why it matters, what to do. */
  readonly message: string;
  readonly fixes: readonly Fix[];
  readonly related: readonly RelatedPlace[];
}

/** What a check hands in; id and severity are filled in from its metadata and the settings. */
export interface Report {
  readonly range: TextRange;
  readonly message: string;
  /** Only where a check has two levels, such as `name-unknown`. */
  readonly severity?: Severity;
  readonly fixes?: readonly Fix[];
  readonly related?: readonly RelatedPlace[];
}

export type CheckGroup = 'block language' | 'identity' | 'data' | 'reaction' | 'safety';

export interface Check {
  /** Kebab-case words for the mistake; never renamed after release. */
  readonly id: string;
  readonly group: CheckGroup;
  readonly severity: Severity;
  /** One line: what it finds. */
  readonly summary: string;
  /** Why a chemist should care. */
  readonly why: string;
  /** What to do about a finding. */
  readonly action: string;
  /** Published source of the rule, or 'common practice, no source'. */
  readonly source: string;
  /** Whole blocks, fences included. Every bad one is reported, every good one is silent; tests hold it. */
  readonly examples: { readonly bad: readonly string[]; readonly good: readonly string[] };
  /** Needs facts from the toolkit; put off until they are there. */
  readonly needsToolkit?: boolean;
  /** For one entry. */
  readonly run?: (entry: EntryModel, report: (found: Report) => void, toolkit: ToolkitFactsOf) => void;
  /** For all entries under one notebook root. */
  readonly runNotebook?: (notebook: NotebookModel, report: (file: string, found: Report) => void) => void;
}

/** Corrections that the findings at a place offer, and accepting a finding with a reason. */
import {
  CodeActionKind,
  type CodeAction,
  type Diagnostic,
  type SnippetTextEdit,
  type TextEdit as ProtocolEdit,
} from 'vscode-languageserver';
import type { Fix, TextRange } from '../chemistry/text.ts';
import type { Finding } from '../checks/finding.ts';
import { insertionAfter } from '../notebook/insertion.ts';
import { blockAt, toText } from '../workspace/page.ts';
import { toDiagnostic, toProtocolEdit, toProtocolRange } from './convert.ts';
import type { OpenPage } from './documents.ts';
import { fixAllKind } from './names.ts';

export interface FixRequest {
  readonly page: OpenPage;
  readonly findings: readonly Finding[];
  readonly range: TextRange;
  /** Kinds that the client asked for, or undefined for all. */
  readonly only: readonly string[] | undefined;
  /** The client can place the cursor inside an edit. */
  readonly snippets: boolean;
}

export function codeActions(request: FixRequest): CodeAction[] {
  const actions: CodeAction[] = [];
  if (wants(request, CodeActionKind.QuickFix)) {
    const here = request.findings.filter((finding) => touches(finding.range, request.range));
    for (const finding of here) {
      for (const fix of finding.fixes) actions.push(quickFix(request.page, finding, fix));
    }
    for (const finding of here) {
      const action = acceptance(request, finding);
      if (action !== undefined) actions.push(action);
    }
  }
  if (request.only !== undefined && wants(request, fixAllKind)) {
    const edits = certainEdits(request.page, request.findings);
    if (edits.length > 0) {
      actions.push({
        title: 'Apply every correction that is certain',
        kind: fixAllKind,
        edit: { changes: { [request.page.document.uri]: edits } },
      });
    }
  }
  return actions;
}

/** A kind asked for covers the kinds below it: `source` covers `source.fixAll.isonym`. */
function wants({ only }: FixRequest, kind: string): boolean {
  return only === undefined || only.some((asked) => kind === asked || kind.startsWith(`${asked}.`));
}

function touches(first: TextRange, second: TextRange): boolean {
  return first.start <= second.end && second.start <= first.end;
}

function diagnosticOf(page: OpenPage, finding: Finding): Diagnostic {
  return toDiagnostic(page.document, finding, () => undefined);
}

function quickFix(page: OpenPage, finding: Finding, fix: Fix): CodeAction {
  return {
    title: fix.title,
    kind: CodeActionKind.QuickFix,
    diagnostics: [diagnosticOf(page, finding)],
    isPreferred: fix.safe,
    edit: {
      changes: { [page.document.uri]: fix.edits.map((edit) => toProtocolEdit(page.document, edit)) },
    },
  };
}

/** Writes `allow: check-id (reason)` below the last field of the block. */
function acceptance({ page, snippets }: FixRequest, finding: Finding): CodeAction | undefined {
  const found = blockAt(page.page, finding.range.start);
  if (found === undefined) return undefined;
  const { offset, prefix } = insertionAfter(found.block.read.model.entry);
  const at = toText(page.page, { start: offset, end: offset });
  if (at === undefined) return undefined;
  const { document } = page;
  const range = toProtocolRange(document, at);
  const before = `${prefix}allow: ${finding.check} (`;
  const action = {
    title: `Accept “${finding.check}” in this block, with a reason`,
    kind: CodeActionKind.QuickFix,
    diagnostics: [diagnosticOf(page, finding)],
  };
  if (!snippets) {
    return { ...action, edit: { changes: { [document.uri]: [{ range, newText: `${before})` }] } } };
  }
  const edit: SnippetTextEdit = {
    range,
    snippet: { kind: 'snippet', value: `${snippetText(before)}\${1:reason})` },
  };
  const textDocument = { uri: document.uri, version: document.version };
  return { ...action, edit: { documentChanges: [{ textDocument, edits: [edit] }] } };
}

function snippetText(text: string): string {
  return text.replace(/[\\$}]/g, '\\$&');
}

/** Edits that do not touch each other; where two would, the later one waits for the next time. */
function certainEdits(page: OpenPage, findings: readonly Finding[]): ProtocolEdit[] {
  const taken: TextRange[] = [];
  const edits: ProtocolEdit[] = [];
  for (const finding of findings) {
    const fix = finding.fixes.find(({ safe }) => safe);
    if (fix === undefined) continue;
    if (fix.edits.some((edit) => taken.some((other) => touches(edit.range, other)))) continue;
    for (const edit of fix.edits) {
      taken.push(edit.range);
      edits.push(toProtocolEdit(page.document, edit));
    }
  }
  return edits;
}

/** The one place where our offsets and findings become the protocol's lines, columns and shapes. */
import {
  DiagnosticSeverity,
  type Diagnostic,
  type DiagnosticRelatedInformation,
  type Position,
  type Range,
  type TextEdit as ProtocolEdit,
} from 'vscode-languageserver';
import type { TextEdit, TextRange } from '../chemistry/text.ts';
import type { Finding, RelatedPlace } from '../checks/finding.ts';
import type { Severity } from '../checks/severity.ts';
import { findingSource } from './names.ts';

/** A text document of the protocol's library, as far as positions go. */
export interface PositionSource {
  positionAt(offset: number): Position;
  offsetAt(position: Position): number;
}

const severityOf: Record<Severity, DiagnosticSeverity> = {
  error: DiagnosticSeverity.Error,
  warning: DiagnosticSeverity.Warning,
  information: DiagnosticSeverity.Information,
};

export function toProtocolRange(document: PositionSource, range: TextRange): Range {
  return { start: document.positionAt(range.start), end: document.positionAt(range.end) };
}

export function toTextRange(document: PositionSource, range: Range): TextRange {
  return { start: document.offsetAt(range.start), end: document.offsetAt(range.end) };
}

export function toProtocolEdit(document: PositionSource, edit: TextEdit): ProtocolEdit {
  return { range: toProtocolRange(document, edit.range), newText: edit.newText };
}

/** `placeOf` finds a related place, which may be in another file; undefined when that file is not open to us. */
export function toDiagnostic(
  document: PositionSource,
  finding: Finding,
  placeOf: (place: RelatedPlace) => DiagnosticRelatedInformation['location'] | undefined,
): Diagnostic {
  const related = finding.related.flatMap((place) => {
    const location = placeOf(place);
    return location === undefined ? [] : [{ location, message: place.message }];
  });
  return {
    range: toProtocolRange(document, finding.range),
    severity: severityOf[finding.severity],
    source: findingSource,
    code: finding.check,
    message: finding.message,
    ...(related.length > 0 ? { relatedInformation: related } : {}),
  };
}

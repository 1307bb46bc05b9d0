/** Findings of a page as the editor shows them. */
import type { Diagnostic } from 'vscode-languageserver';
import { LineTable } from '../workspace/lines.ts';
import { toDiagnostic } from './convert.ts';
import type { Documents, OpenPage } from './documents.ts';

export function diagnosticsOf(documents: Documents, page: OpenPage): Diagnostic[] {
  return documents.findings(page).map((finding) =>
    toDiagnostic(page.document, finding, (place) => {
      if (place.file === undefined || place.file === page.name) {
        const { document } = page;
        const { start, end } = place.range;
        return {
          uri: document.uri,
          range: { start: document.positionAt(start), end: document.positionAt(end) },
        };
      }
      const uri = documents.uriOf(page, place.file);
      const text = page.notebook.page(place.file)?.text;
      if (uri === undefined || text === undefined) return undefined;
      const lines = new LineTable(text);
      return { uri, range: { start: lines.placeAt(place.range.start), end: lines.placeAt(place.range.end) } };
    }),
  );
}

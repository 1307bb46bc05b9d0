/** A page as the features see it, without a server around it. */
import { TextDocument } from 'vscode-languageserver-textdocument';
import { defaultSettings } from '../../../server/checks/settings.ts';
import type { OpenPage } from '../../../server/language/documents.ts';
import { Notebook } from '../../../server/workspace/notebook.ts';

export const pageUri = 'file:///lab/page.md';

export function openPage(text: string): OpenPage {
  const notebook = new Notebook(defaultSettings, undefined);
  const page = notebook.setPage('page.md', text);
  return { document: TextDocument.create(pageUri, 'markdown', 1, text), notebook, name: 'page.md', page };
}

/** The text without its `‸`, and where that stood. */
export function atCaret(marked: string): { text: string; offset: number } {
  const offset = marked.indexOf('‸');
  return { text: marked.replace('‸', ''), offset };
}

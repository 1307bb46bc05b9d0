/**
 * The open documents and the notebooks that they belong to: keeps both in step with what the user types and
 * with what changes on disk, and says which documents have new findings.
 */
import { dirname, relative, sep } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { DiagnosticSeverity, type Diagnostic } from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { Finding } from '../checks/finding.ts';
import type { Toolkit } from '../toolkit/toolkit.ts';
import { discoverNotebooks, isNotebookFile } from '../workspace/discover.ts';
import { LineTable } from '../workspace/lines.ts';
import { Notebook } from '../workspace/notebook.ts';
import type { Page } from '../workspace/page.ts';
import { Roots, settingsFileName } from '../workspace/roots.ts';
import { defaultSettings, readSettings } from '../workspace/settings-file.ts';
import { readSourceFile } from '../workspace/source-file.ts';
import { findingSource } from './names.ts';

/** A document with the notebook it stands in. */
export interface OpenPage {
  readonly document: TextDocument;
  readonly notebook: Notebook;
  /** Its name within the notebook. */
  readonly name: string;
  readonly page: Page;
}

interface OpenNotebook {
  notebook: Notebook;
  /** Folder of the notebook; undefined for a document that lies nowhere on a disk. */
  readonly root: string | undefined;
  /** Whether the pages under the root have been read. */
  scanned: boolean;
  /** Set while findings across the pages wait for a pause in typing. */
  pause?: ReturnType<typeof setTimeout>;
}

export interface DocumentEvents {
  /** These documents may have other findings than before. */
  changed(documents: readonly OpenPage[]): void;
  /** What is wrong with a notebook's settings; empty when nothing is. */
  settings(uri: string, diagnostics: Diagnostic[]): void;
  failed(error: unknown): void;
}

/** Longest stretch of reading other pages while the user may be typing, in ms. */
const scanSliceMs = 8;

/** Up to so many blocks, looking across all pages costs no more than a keystroke may. */
const mostAtOnce = 500;

/** How long the user must have stopped typing before a larger notebook is looked across, in ms. */
const acrossPauseMs = 200;

export class Documents {
  private readonly toolkit: Toolkit;
  private readonly events: DocumentEvents;
  private readonly roots = new Roots();
  private readonly notebooks = new Map<string, OpenNotebook>();
  private readonly open = new Map<string, { document: TextDocument; home: OpenNotebook; name: string }>();
  private readonly workspaceFolders: readonly string[];

  /** `folders` are the addresses of the folders that the editor has open. */
  constructor(toolkit: Toolkit, folders: readonly string[], events: DocumentEvents) {
    this.toolkit = toolkit;
    this.workspaceFolders = folders.flatMap((uri) => filePath(uri) ?? []);
    this.events = events;
  }

  knows(uri: string): boolean {
    return this.open.has(uri);
  }

  get(uri: string): OpenPage | undefined {
    const found = this.open.get(uri);
    if (found === undefined) return undefined;
    const { document, home, name } = found;
    // The text of this moment: a request may overtake the analysis of the last keystroke.
    return { document, name, notebook: home.notebook, page: home.notebook.setPage(name, document.getText()) };
  }

  /** Takes in a document that was opened or edited. */
  update(document: TextDocument): void {
    const known = this.open.get(document.uri);
    const { home, name } = known ?? this.homeOf(document.uri);
    this.open.set(document.uri, { document, home, name });
    home.notebook.setPage(name, document.getText());
    this.announce(home, document.uri);
    if (!home.scanned) void this.scan(home);
  }

  close(uri: string): void {
    const closed = this.open.get(uri);
    if (closed === undefined) return;
    this.open.delete(uri);
    const { home, name } = closed;
    const path = filePath(uri);
    // What was typed and not saved is gone; the file as it lies on disk counts again.
    const source = path === undefined ? undefined : readSourceFile(path);
    if (source?.text !== undefined) home.notebook.setPage(name, source.text);
    else home.notebook.removePage(name);
    if ([...this.open.values()].some((other) => other.home === home)) {
      this.announce(home);
    } else {
      clearTimeout(home.pause);
      this.notebooks.delete(homeKey(home.root, uri));
    }
  }

  /** A file was made, changed or removed by something else than this editor. */
  fileChanged(uri: string): void {
    const path = filePath(uri);
    if (path === undefined) return;
    if (path.endsWith(`${sep}${settingsFileName}`)) {
      this.reload();
      return;
    }
    if (this.open.has(uri) || !isNotebookFile(path)) return;
    for (const home of this.notebooks.values()) {
      if (home.root === undefined || !path.startsWith(home.root + sep) || !home.scanned) continue;
      const source = readSourceFile(path);
      const name = nameWithin(home.root, path);
      if (source.text === undefined) home.notebook.removePage(name);
      else home.notebook.setPage(name, source.text);
      this.announce(home);
    }
  }

  findings(page: OpenPage): readonly Finding[] {
    const waits = this.open.get(page.document.uri)?.home.pause !== undefined;
    return page.notebook.findings(page.name, waits ? 'known' : 'fresh');
  }

  /** The document of a file of the same notebook, open or not. */
  uriOf(page: OpenPage, name: string): string | undefined {
    for (const [uri, other] of this.open) {
      if (other.home.notebook === page.notebook && other.name === name) return uri;
    }
    const root = this.open.get(page.document.uri)?.home.root;
    return root === undefined ? undefined : pathToFileURL(`${root}${sep}${name}`).href;
  }

  /** Settings changed: which notebook a file belongs to may have changed with them. */
  private reload(): void {
    this.roots.clear();
    for (const home of this.notebooks.values()) clearTimeout(home.pause);
    this.notebooks.clear();
    const documents = [...this.open.values()].map(({ document }) => document);
    this.open.clear();
    for (const document of documents) this.update(document);
  }

  private homeOf(uri: string): { home: OpenNotebook; name: string } {
    const path = filePath(uri);
    const root = path === undefined ? undefined : this.rootOf(path);
    const key = homeKey(root, uri);
    let home = this.notebooks.get(key);
    if (home === undefined) {
      home = {
        notebook: new Notebook(this.settingsOf(root), this.toolkit),
        root,
        scanned: root === undefined,
      };
      this.notebooks.set(key, home);
    }
    return { home, name: path === undefined || root === undefined ? uri : nameWithin(root, path) };
  }

  private rootOf(path: string): string | undefined {
    const folder = dirname(path);
    return (
      this.roots.rootOf(folder) ??
      this.workspaceFolders.find((each) => folder === each || folder.startsWith(each + sep))
    );
  }

  private settingsOf(root: string | undefined) {
    const folder = root === undefined ? undefined : this.roots.settingsFolder(root);
    if (folder === undefined) return defaultSettings;
    const file = `${folder}${sep}${settingsFileName}`;
    const source = readSourceFile(file);
    const text = source.text ?? '';
    const { settings, problems } =
      source.text === undefined
        ? {
            settings: defaultSettings,
            problems: [{ range: { start: 0, end: 0 }, message: `${settingsFileName} ${source.problem}.` }],
          }
        : readSettings(text);
    const lines = new LineTable(text);
    this.events.settings(
      pathToFileURL(file).href,
      problems.map(({ range, message }) => ({
        range: { start: lines.placeAt(range.start), end: lines.placeAt(range.end) },
        severity: DiagnosticSeverity.Error,
        source: findingSource,
        message,
      })),
    );
    return settings;
  }

  /** Reads the other pages of the notebook a few at a time, so that typing is never held up. */
  private async scan(home: OpenNotebook): Promise<void> {
    home.scanned = true;
    const { root } = home;
    if (root === undefined) return;
    try {
      await nextTurn();
      const { files } = discoverNotebooks(root);
      let sliceStart = performance.now();
      for (const file of files) {
        if (performance.now() - sliceStart > scanSliceMs) {
          await nextTurn();
          sliceStart = performance.now();
        }
        const name = nameWithin(root, file);
        if (home.notebook.page(name) !== undefined) continue;
        const source = readSourceFile(file);
        if (source.text !== undefined) home.notebook.setPage(name, source.text);
      }
      this.announce(home);
    } catch (error) {
      this.events.failed(error);
    }
  }

  /** Reports the open pages of a notebook, the edited one first. */
  private announce(home: OpenNotebook, edited?: string): void {
    clearTimeout(home.pause);
    delete home.pause;
    const uris = [...this.open].filter(([, other]) => other.home === home).map(([each]) => each);
    if (edited !== undefined && home.notebook.blockCount > mostAtOnce) {
      home.pause = setTimeout(() => this.announce(home), acrossPauseMs);
      const page = this.get(edited);
      if (page !== undefined) this.events.changed([page]);
    } else {
      // A label that one page gained or lost changes what others refer to.
      const order = edited === undefined ? uris : [edited, ...uris.filter((each) => each !== edited)];
      this.events.changed(order.flatMap((each) => this.get(each) ?? []));
    }
    if (home.notebook.isWaiting) void this.settle(home);
  }

  private async settle(home: OpenNotebook): Promise<void> {
    try {
      const files = new Set(await home.notebook.settle());
      const pages = [...this.open].filter(([, other]) => other.home === home && files.has(other.name));
      if (pages.length > 0) this.events.changed(pages.flatMap(([uri]) => this.get(uri) ?? []));
    } catch (error) {
      this.events.failed(error);
    }
  }
}

/** Path of a `file:` address; undefined for any other. */
export function filePath(uri: string): string | undefined {
  try {
    return uri.startsWith('file:') ? fileURLToPath(uri) : undefined;
  } catch {
    return undefined;
  }
}

/** Documents without a root do not share a notebook. */
function homeKey(root: string | undefined, uri: string): string {
  return root ?? uri;
}

function nameWithin(root: string, path: string): string {
  return relative(root, path).split(sep).join('/');
}

function nextTurn(): Promise<void> {
  return new Promise((resolve) => setImmediate(resolve));
}

/**
 * Everything that happens after the greeting: documents in, findings out, and an answer to each request. Loaded
 * when the editor has its answer to `initialize`, because chemistry takes a moment to load and editors wait.
 */
import {
  MessageType,
  ShowMessageNotification,
  type CodeAction,
  type CodeActionParams,
  type CompletionItem,
  type Connection,
  type DocumentSymbol,
  type FileEvent,
  type Hover,
  type Position,
} from 'vscode-languageserver';
import type { TextDocument } from 'vscode-languageserver-textdocument';
import type { Toolkit } from '../toolkit/toolkit.ts';
import { completions } from './completion.ts';
import { toTextRange } from './convert.ts';
import { diagnosticsOf } from './diagnostics.ts';
import { Documents, type OpenPage } from './documents.ts';
import { codeActions } from './fixes.ts';
import { hover } from './hover.ts';
import type { ClientTraits } from './server.ts';
import { documentSymbols } from './symbols.ts';

/** Keystrokes that follow each other this closely are looked at together, in ms. */
const pauseMs = 12;

/** The first findings go before the toolkit, which wants a processor for half a second. */
const loadDelayMs = 300;

export class Session {
  private readonly connection: Connection;
  private readonly traits: ClientTraits;
  private readonly toolkit: Toolkit;
  private readonly documents: Documents;
  private readonly edited = new Map<string, TextDocument>();
  private readonly published = new Map<string, string>();
  private pause: ReturnType<typeof setTimeout> | undefined;
  private loading: ReturnType<typeof setTimeout> | undefined;
  private failureTold = false;

  /** `traits` may change while the session lasts: the editor can take another theme. */
  constructor(connection: Connection, traits: ClientTraits, toolkit: Toolkit) {
    this.connection = connection;
    this.traits = traits;
    this.toolkit = toolkit;
    this.documents = new Documents(toolkit, traits.folders, {
      changed: (pages) => {
        for (const page of pages) this.publish(page);
        this.tellFailure();
      },
      settings: (uri, diagnostics) => {
        void connection.sendDiagnostics({ uri, diagnostics });
      },
      failed: (error) => {
        connection.console.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
      },
    });
  }

  /** A document was opened or edited. */
  changed(document: TextDocument): void {
    this.edited.set(document.uri, document);
    // A document that was just opened is waited for; keystrokes come in bursts.
    if (this.documents.knows(document.uri)) this.pause ??= setTimeout(() => this.lookAtEdits(), pauseMs);
    else this.lookAtEdits();
  }

  closed(uri: string): void {
    this.edited.delete(uri);
    this.published.delete(uri);
    this.documents.close(uri);
    void this.connection.sendDiagnostics({ uri, diagnostics: [] });
  }

  filesChanged(changes: readonly FileEvent[]): void {
    for (const { uri } of changes) this.documents.fileChanged(uri);
  }

  async hover(uri: string, position: Position): Promise<Hover | null> {
    const page = this.pageOf(uri);
    if (page === undefined) return null;
    const traits = { ...this.traits, toolkit: this.toolkit };
    const findings = this.documents.findings(page);
    const shown = await hover(page, page.document.offsetAt(position), findings, traits);
    this.tellFailure();
    return shown;
  }

  codeActions({ textDocument, range, context }: CodeActionParams): CodeAction[] {
    const page = this.pageOf(textDocument.uri);
    if (page === undefined) return [];
    return codeActions({
      page,
      findings: this.documents.findings(page),
      range: toTextRange(page.document, range),
      only: context.only,
      snippets: this.traits.snippets,
    });
  }

  symbols(uri: string): DocumentSymbol[] {
    const page = this.pageOf(uri);
    return page === undefined ? [] : documentSymbols(page);
  }

  completions(uri: string, position: Position): CompletionItem[] {
    const page = this.pageOf(uri);
    return page === undefined ? [] : completions(page, page.document.offsetAt(position));
  }

  async dispose(): Promise<void> {
    clearTimeout(this.pause);
    clearTimeout(this.loading);
    await this.toolkit.dispose();
  }

  private lookAtEdits(): void {
    clearTimeout(this.pause);
    this.pause = undefined;
    const waiting = [...this.edited.values()];
    this.edited.clear();
    for (const document of waiting) this.documents.update(document);
  }

  /** The page of a request, with every edit before the request taken in. */
  private pageOf(uri: string): OpenPage | undefined {
    this.lookAtEdits();
    return this.documents.get(uri);
  }

  private publish(page: OpenPage): void {
    this.expectHovers(page);
    const { uri, version } = page.document;
    const diagnostics = diagnosticsOf(this.documents, page);
    // The same findings at the same places need not travel again, but the version must keep up.
    const text = JSON.stringify([version, diagnostics]);
    if (this.published.get(uri) === text) return;
    this.published.set(uri, text);
    void this.connection.sendDiagnostics({ uri, version, diagnostics });
  }

  /** Whoever opens a page with compounds will rest the mouse on one: the toolkit loads ahead, in its own thread. */
  private expectHovers({ page }: OpenPage): void {
    if (this.loading !== undefined || this.toolkit.state !== 'not-loaded') return;
    if (!page.blocks.some((block) => block.read.model.kind === 'compound')) return;
    this.loading = setTimeout(() => {
      void this.toolkit.load().then(() => this.tellFailure());
    }, loadDelayMs);
  }

  private tellFailure(): void {
    if (this.failureTold || this.toolkit.state !== 'unavailable' || this.toolkit.failure === undefined)
      return;
    this.failureTold = true;
    void this.connection.sendNotification(ShowMessageNotification.type, {
      type: MessageType.Warning,
      message: this.toolkit.failure,
    });
  }
}

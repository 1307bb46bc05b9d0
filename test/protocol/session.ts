/** What every protocol test needs: an initialized client, documents, and the findings that arrive for them. */
import type { CodeAction, Diagnostic, Hover, InitializeResult, MarkupContent } from 'vscode-languageserver';
import { RawClient, type Message } from './client.ts';

export interface PublishedFindings {
  readonly uri: string;
  readonly version?: number;
  readonly diagnostics: readonly Diagnostic[];
}

export interface SessionOptions {
  readonly environment?: Record<string, string>;
  /** Content formats of hovers; both by default. */
  readonly hoverFormats?: readonly string[];
  readonly rootUri?: string | null;
  readonly snippets?: boolean;
}

export class Session {
  readonly client: RawClient;
  initialized: InitializeResult | undefined;
  private readonly options: SessionOptions;

  constructor(options: SessionOptions = {}) {
    this.options = options;
    this.client = new RawClient(options.environment);
  }

  async start(): Promise<this> {
    const answer = await this.client.request('initialize', {
      processId: process.pid,
      rootUri: this.options.rootUri ?? null,
      initializationOptions: { foreground: '#abcdef' },
      capabilities: {
        textDocument: {
          hover: { contentFormat: this.options.hoverFormats ?? ['markdown', 'plaintext'] },
          publishDiagnostics: { relatedInformation: true, versionSupport: true },
        },
        workspace: { workspaceEdit: { snippetEditSupport: this.options.snippets ?? false } },
      },
    });
    if (answer.error !== undefined) throw new Error(answer.error.message);
    this.initialized = answer.result as InitializeResult;
    this.client.notify('initialized', {});
    return this;
  }

  open(uri: string, text: string, version = 1): void {
    this.client.notify('textDocument/didOpen', {
      textDocument: { uri, languageId: 'markdown', version, text },
    });
  }

  /** One incremental edit. */
  edit(uri: string, version: number, start: [number, number], end: [number, number], text: string): void {
    const position = ([line, character]: [number, number]) => ({ line, character });
    this.client.notify('textDocument/didChange', {
      textDocument: { uri, version },
      contentChanges: [{ range: { start: position(start), end: position(end) }, text }],
    });
  }

  /** The newest findings of a document at this version, once `enough` holds of them. */
  findings(
    uri: string,
    version = 1,
    enough: (findings: readonly Diagnostic[]) => boolean = () => true,
  ): Promise<readonly Diagnostic[]> {
    return this.client.until(() => {
      const newest = this.published(uri).at(-1);
      return newest?.version === version && enough(newest.diagnostics) ? newest.diagnostics : undefined;
    }, `findings of ${uri} at version ${version}`);
  }

  published(uri: string): PublishedFindings[] {
    return this.client.notifications
      .filter((message) => message.method === 'textDocument/publishDiagnostics')
      .map((message) => message.params as PublishedFindings)
      .filter((params) => params.uri === uri);
  }

  async hover(uri: string, line: number, character: number): Promise<MarkupContent | undefined> {
    const answer = await this.client.request('textDocument/hover', {
      textDocument: { uri },
      position: { line, character },
    });
    return (answer.result as Hover | null)?.contents as MarkupContent | undefined;
  }

  /** Hovers until the toolkit has loaded, for which a single hover does not wait for ever. */
  async hoverWith(parts: readonly string[], uri: string, line: number, character: number): Promise<string> {
    for (let attempt = 0; attempt < 20; attempt++) {
      const value = (await this.hover(uri, line, character))?.value ?? '';
      if (parts.every((part) => value.includes(part))) return value;
    }
    throw new Error(`no hover had ${parts.join(' and ')}`);
  }

  async actions(uri: string, at: Diagnostic['range'], only?: readonly string[]): Promise<CodeAction[]> {
    const answer = await this.client.request('textDocument/codeAction', {
      textDocument: { uri },
      range: at,
      context: { diagnostics: [], ...(only === undefined ? {} : { only }) },
    });
    return answer.result as CodeAction[];
  }

  /** As a client ends a server; returns the exit code. */
  async stop(): Promise<number | null> {
    await this.client.request('shutdown');
    this.client.notify('exit');
    return this.client.until(() => this.client.exitCode, 'the end of the server', 5000);
  }
}

/** Place of the first occurrence of `what` in `text`, as line and UTF-16 column. */
export function placeOf(text: string, what: string): [line: number, character: number] {
  const offset = text.indexOf(what);
  if (offset === -1) throw new Error(`no “${what}” in the text`);
  const before = text.slice(0, offset).split('\n');
  return [before.length - 1, before.at(-1)!.length];
}

export type { Message };

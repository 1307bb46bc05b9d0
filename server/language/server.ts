/**
 * Greets the editor and hands everything else to the session. Kept light on purpose: what is imported here is
 * loaded before the editor has its first answer.
 */
import {
  CodeActionKind,
  DidChangeWatchedFilesNotification,
  ErrorCodes,
  MarkupKind,
  ResponseError,
  TextDocuments,
  TextDocumentSyncKind,
  type Connection,
  type InitializeParams,
  type InitializeResult,
} from 'vscode-languageserver';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { version } from '../../package.json';
import { findingSource, fixAllKind } from './names.ts';
import type { Session } from './session.ts';

/** What the client can do and wants, as far as the features differ by it. */
export interface ClientTraits {
  /** Shows Markdown, pictures included, in hovers. */
  markdown: boolean;
  /** Can place the cursor inside an edit. */
  snippets: boolean;
  watchesFiles: boolean;
  /** CSS colour of drawings. */
  foreground: string;
  /** Addresses of the open folders. */
  folders: readonly string[];
}

/** Grey that reads on light and on dark. */
const usualForeground = '#808080';

/** `open` loads the session; it is called once, when the greeting is over. */
export function startServer(connection: Connection, open: (traits: ClientTraits) => Promise<Session>): void {
  let traits: ClientTraits | undefined;
  let opened: Promise<Session> | undefined;

  /** All wait for the same promise, so that events and requests stay in their order. */
  function session(): Promise<Session> {
    if (traits === undefined) {
      throw new ResponseError(ErrorCodes.ServerNotInitialized, 'The session has not been initialized yet.');
    }
    return (opened ??= open(traits));
  }

  connection.onInitialize((params): InitializeResult => {
    traits = traitsOf(params);
    return {
      serverInfo: { name: findingSource, version },
      capabilities: {
        textDocumentSync: TextDocumentSyncKind.Incremental,
        hoverProvider: true,
        codeActionProvider: { codeActionKinds: [CodeActionKind.QuickFix, fixAllKind] },
        documentSymbolProvider: { label: 'Isonym' },
        completionProvider: {},
      },
    };
  });
  connection.onInitialized(async () => {
    await session();
    if (traits?.watchesFiles !== true) return;
    await connection.client.register(DidChangeWatchedFilesNotification.type, {
      watchers: [{ globPattern: '**/*.{md,markdown}' }, { globPattern: '**/isonym.json' }],
    });
  });
  connection.onNotification('isonym/theme', (params: unknown) => {
    if (traits !== undefined) traits.foreground = foregroundIn(params) ?? traits.foreground;
  });

  const texts = new TextDocuments(TextDocument);
  texts.onDidChangeContent(async ({ document }) => {
    (await session()).changed(document);
  });
  texts.onDidClose(async ({ document }) => {
    (await session()).closed(document.uri);
  });
  connection.onDidChangeWatchedFiles(async ({ changes }) => {
    (await session()).filesChanged(changes);
  });

  connection.onHover(async ({ textDocument, position }) => {
    return (await session()).hover(textDocument.uri, position);
  });
  connection.onCodeAction(async (params) => {
    return (await session()).codeActions(params);
  });
  connection.onDocumentSymbol(async ({ textDocument }) => {
    return (await session()).symbols(textDocument.uri);
  });
  connection.onCompletion(async ({ textDocument, position }) => {
    return (await session()).completions(textDocument.uri, position);
  });
  connection.onShutdown(async () => {
    if (opened !== undefined) await (await opened).dispose();
  });

  texts.listen(connection);
  connection.listen();
}

function traitsOf({ capabilities, ...params }: InitializeParams): ClientTraits {
  const rootUri = (params as { rootUri?: string | null }).rootUri ?? undefined;
  return {
    markdown: capabilities.textDocument?.hover?.contentFormat?.includes(MarkupKind.Markdown) ?? false,
    snippets: capabilities.workspace?.workspaceEdit?.snippetEditSupport ?? false,
    watchesFiles: capabilities.workspace?.didChangeWatchedFiles?.dynamicRegistration ?? false,
    foreground: foregroundIn(params.initializationOptions) ?? usualForeground,
    folders: params.workspaceFolders?.map((folder) => folder.uri) ?? (rootUri === undefined ? [] : [rootUri]),
  };
}

function foregroundIn(value: unknown): string | undefined {
  const foreground = (value as { foreground?: unknown } | null | undefined)?.foreground;
  return typeof foreground === 'string' ? foreground : undefined;
}

/**
 * The part of Isonym that runs inside the editor: starts the language server and tells it in which colour to draw.
 * Everything that knows chemistry is on the other side of the connection.
 */
import { window, type ExtensionContext } from 'vscode';
import {
  LanguageClient,
  RevealOutputChannelOn,
  TransportKind,
  type LanguageClientOptions,
  type ServerOptions,
} from 'vscode-languageclient/node';
import { themeForeground } from './theme.ts';

let client: LanguageClient | undefined;

export async function activate(context: ExtensionContext): Promise<void> {
  const server = { module: context.asAbsolutePath('dist/server.js'), transport: TransportKind.ipc };
  const serverOptions: ServerOptions = {
    run: server,
    debug: { ...server, options: { execArgv: ['--nolazy', '--inspect=6009'] } },
  };
  const clientOptions: LanguageClientOptions = {
    // Any scheme: the server reads the text that the editor sends, whether it lies on a disk or not.
    documentSelector: [{ language: 'markdown' }],
    // A function, because a server that is restarted after a crash has to learn today's colour.
    initializationOptions: () => ({ foreground: themeForeground() }),
    // What goes wrong is reported where it happens; the log never pushes itself to the front.
    revealOutputChannelOn: RevealOutputChannelOn.Never,
  };
  const started = new LanguageClient('isonym', 'Isonym', serverOptions, clientOptions);
  client = started;
  context.subscriptions.push(
    window.onDidChangeActiveColorTheme(() => {
      if (started.isRunning()) {
        void started.sendNotification('isonym/theme', { foreground: themeForeground() });
      }
    }),
  );
  await started.start();
}

export async function deactivate(): Promise<void> {
  await client?.stop();
}

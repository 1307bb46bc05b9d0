/** Starts the language server on Node, over whatever channel the editor named on the command line. */
import { createConnection, ProposedFeatures } from 'vscode-languageserver/node';
import { startServer } from './server.ts';

const connection = createConnection(ProposedFeatures.all);

// One request that fails must not take the editor's findings away with it.
process.on('uncaughtException', (error) => {
  connection.console.error(`Isonym: ${error.stack ?? error.message}`);
});
process.on('unhandledRejection', (why) => {
  connection.console.error(`Isonym: ${why instanceof Error ? (why.stack ?? why.message) : String(why)}`);
});

startServer(connection, async (traits) => {
  const [{ Session }, { createToolkit }, { nodeHost }] = await Promise.all([
    import('./session.ts'),
    import('../toolkit/create-toolkit.ts'),
    import('../toolkit/hosts.ts'),
  ]);
  return new Session(connection, traits, createToolkit(nodeHost()));
});

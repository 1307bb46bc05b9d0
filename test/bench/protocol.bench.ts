/** The built server as an editor meets it: start, first findings, a keystroke, hovers. */
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { Session } from '../protocol/session.ts';
import { generatedNotebook } from '../support/generated-notebook.ts';
import { figuresOf, show } from './figures.ts';

const text = generatedNotebook(300);
const lines = text.split('\n');
const uri = pathToFileURL(join(tmpdir(), 'isonym-bench', 'notebook.md')).href;

const starts: number[] = [];
for (let round = 0; round < 7; round++) {
  const session = new Session();
  await session.start();
  starts.push(performance.now() - session.client.startedAt);
  session.client.kill();
}
show('process start to the answer to initialize', figuresOf(starts), 'ms');

const session = await new Session().start();
const { client } = session;
/** Resolves when findings for this version of the document are published. */
const findingsOf = (version: number) =>
  client.until(
    () =>
      client.notifications.find(({ method, params }) => {
        const published = params as { uri?: string; version?: number };
        return (
          method === 'textDocument/publishDiagnostics' &&
          published.uri === uri &&
          published.version === version
        );
      }),
    `findings of version ${version}`,
  );

const opened = performance.now();
session.open(uri, text);
await findingsOf(1);
console.log(
  `first findings of ${lines.length} lines and 300 blocks: ${(performance.now() - opened).toFixed(0)} ms`,
);

// A digit of a formula in the middle of the notebook is typed over, again and again.
const line = lines.findIndex(
  (content, index) => index > lines.length / 2 && content.startsWith('formula: C'),
);
const keystrokes: number[] = [];
let version = 1;
for (let round = 0; round < 120; round++) {
  client.notifications.length = 0;
  const start = performance.now();
  session.edit(uri, ++version, [line, 10], [line, 11], String(1 + (round % 9)));
  await findingsOf(version);
  if (round >= 20) keystrokes.push(performance.now() - start);
}
show('keystroke to findings', figuresOf(keystrokes), 'ms');

const smilesLine = lines.findIndex(
  (content, index) => index > lines.length / 2 && content.startsWith('SMILES: '),
);
const hovers: number[] = [];
for (let round = 0; round < 60; round++) {
  const start = performance.now();
  await client.request('textDocument/hover', {
    textDocument: { uri },
    position: { line: smilesLine, character: 10 },
  });
  if (round >= 10) hovers.push(performance.now() - start);
}
show('hover, drawing remembered', figuresOf(hovers), 'ms');
const fresh: number[] = [];
lines.forEach((content, index) => {
  if (content.startsWith('SMILES: ') && fresh.length < 40) fresh.push(index);
});
const first: number[] = [];
for (const at of fresh) {
  const start = performance.now();
  await client.request('textDocument/hover', {
    textDocument: { uri },
    position: { line: at, character: 10 },
  });
  first.push(performance.now() - start);
}
show('hover over one structure after another', figuresOf(first), 'ms');
client.kill();

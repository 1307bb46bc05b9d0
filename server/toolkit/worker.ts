/** The worker thread in which RDKit runs, so that loading it and asking it never hold up the editor. */
import { parentPort } from 'node:worker_threads';
import { answer } from './answer.ts';
import type { ToolkitRequest } from './channel.ts';
import { loadRdkit } from './rdkit-module.ts';
import { RdkitService } from './service.ts';

const port = parentPort!;
const service = new RdkitService(() => loadRdkit(import.meta.url));
let last = Promise.resolve();

port.on('message', (request: ToolkitRequest) => {
  last = last.then(async () => port.postMessage(await answer(service, request)));
});

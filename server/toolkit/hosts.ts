/** The two places on Node where RDKit can run. */
import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { Worker } from 'node:worker_threads';
import { answer } from './answer.ts';
import type { ToolkitHost, ToolkitReply } from './channel.ts';
import { loadRdkit } from './rdkit-module.ts';
import { RdkitService } from './service.ts';

/** RDKit's parser and drawing code recurse along chains and branches; the usual 4 MB are tight. */
const stackSizeMb = 16;

/** A worker thread running the bundled `toolkit-worker.js`. */
export function threadHost(workerFile: string | URL): ToolkitHost {
  return {
    open(listener) {
      const worker = new Worker(workerFile, { resourceLimits: { stackSizeMb }, stdout: true, stderr: true });
      let closing = false;
      worker.on('message', (reply: ToolkitReply) => {
        listener.reply(reply);
      });
      worker.on('error', (error) => {
        listener.ended(error instanceof Error ? error.message : String(error));
      });
      worker.on('exit', (code) => {
        if (!closing) listener.ended(`its thread ended with code ${code}`);
      });
      return {
        send: (request) => {
          worker.postMessage(request);
        },
        close: async () => {
          closing = true;
          await worker.terminate();
        },
      };
    },
  };
}

/** The caller's own thread: for running from source. */
export function sameThreadHost(load = () => loadRdkit(import.meta.url)): ToolkitHost {
  return {
    open(listener) {
      const service = new RdkitService(load);
      let open = true;
      let last = Promise.resolve();
      return {
        send: (request) => {
          last = last.then(async () => {
            const reply = await answer(service, request);
            if (open) listener.reply(reply);
          });
        },
        close: () => {
          open = false;
          return Promise.resolve();
        },
      };
    },
  };
}

/** The worker thread where its bundle lies beside the code, else the same thread. */
export function nodeHost(moduleUrl: string = import.meta.url): ToolkitHost {
  for (const beside of ['./toolkit-worker.js', '../toolkit-worker.js']) {
    const file = new URL(beside, moduleUrl);
    if (existsSync(fileURLToPath(file))) return threadHost(file);
  }
  return sameThreadHost();
}

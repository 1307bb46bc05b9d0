/**
 * A language client of our own, down to the framing, so that the server is not only tested by the library it
 * is written with. One instance is one server process over standard input and output.
 */
import { execFileSync, spawn, type ChildProcessWithoutNullStreams } from 'node:child_process';
import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

export interface Message {
  readonly jsonrpc?: string;
  readonly id?: number | string | null;
  readonly method?: string;
  readonly params?: unknown;
  readonly result?: unknown;
  readonly error?: { readonly code: number; readonly message: string };
}

export const repository = fileURLToPath(new URL('../..', import.meta.url));
export const builtServer = `${repository}dist/server.js`;
export const builtCommand = `${repository}dist/isonym.js`;

/** Builds when somebody runs this suite alone in a fresh clone. */
export function ensureBuilt(): void {
  if (existsSync(builtServer) && existsSync(builtCommand)) return;
  execFileSync(process.execPath, ['esbuild.mjs'], { cwd: repository, stdio: 'inherit' });
}

/** The environment without what only slows Node's start and is no part of the product. */
export function childEnvironment(more: Record<string, string> = {}): NodeJS.ProcessEnv {
  const environment = { ...process.env, ...more };
  // Node reads these certificates at start, 0.1 s where the system's bundle is large.
  delete environment['NODE_EXTRA_CA_CERTS'];
  return environment;
}

export class RawClient {
  readonly notifications: Message[] = [];
  /** Requests of the server, which this client answers with null. */
  readonly serverRequests: Message[] = [];
  readonly startedAt = performance.now();
  exitCode: number | null | undefined;
  stderr = '';
  private readonly child: ChildProcessWithoutNullStreams;
  private received = Buffer.alloc(0);
  private nextId = 1;
  private readonly open = new Map<number | string, (answer: Message) => void>();
  private readonly watchers = new Set<() => void>();

  constructor(environment: Record<string, string> = {}) {
    this.child = spawn(process.execPath, [builtServer, '--stdio'], { env: childEnvironment(environment) });
    this.child.stdout.on('data', (chunk: Buffer) => {
      this.take(chunk);
    });
    this.child.stderr.on('data', (chunk: Buffer) => (this.stderr += chunk.toString()));
    this.child.on('exit', (code) => {
      this.exitCode = code;
      const error = { code: 0, message: `the server ended with code ${code}; stderr: ${this.stderr}` };
      for (const answer of this.open.values()) answer({ error });
      this.open.clear();
      this.wake();
    });
    this.child.stdin.on('error', () => undefined);
  }

  request(method: string, params?: unknown): Promise<Message> {
    const id = this.nextId++;
    this.send({ jsonrpc: '2.0', id, method, params });
    return new Promise((resolve) => this.open.set(id, resolve));
  }

  notify(method: string, params?: unknown): void {
    this.send({ jsonrpc: '2.0', method, params });
  }

  send(message: Message): void {
    const body = Buffer.from(JSON.stringify(message));
    this.write(Buffer.concat([Buffer.from(`Content-Length: ${body.length}\r\n\r\n`), body]));
  }

  /** Bytes as they are, for what no well-behaved client would send. */
  write(bytes: Uint8Array | string): void {
    this.child.stdin.write(bytes);
  }

  /** The first value that is not undefined, asked again whenever something arrives. */
  async until<T>(look: () => T | undefined, what: string, patienceMs = 20_000): Promise<T> {
    const deadline = performance.now() + patienceMs;
    for (;;) {
      const value = look();
      if (value !== undefined) return value;
      const left = deadline - performance.now();
      if (left <= 0) throw new Error(`waited in vain for ${what}; stderr: ${this.stderr}`);
      await new Promise<void>((resolve) => {
        const timer = setTimeout(resolve, left);
        this.watchers.add(() => {
          clearTimeout(timer);
          resolve();
        });
      });
    }
  }

  /** Ends the process whatever state it is in. */
  kill(): void {
    this.child.kill('SIGKILL');
  }

  private wake(): void {
    const woken = [...this.watchers];
    this.watchers.clear();
    for (const wake of woken) wake();
  }

  private take(chunk: Buffer): void {
    this.received = Buffer.concat([this.received, chunk]);
    for (;;) {
      const headerEnd = this.received.indexOf('\r\n\r\n');
      if (headerEnd === -1) return;
      const length = /content-length: *(\d+)/i.exec(this.received.toString('latin1', 0, headerEnd))?.[1];
      if (length === undefined) throw new Error('a message without a length');
      const bodyEnd = headerEnd + 4 + Number(length);
      if (this.received.length < bodyEnd) return;
      const message = JSON.parse(this.received.toString('utf8', headerEnd + 4, bodyEnd)) as Message;
      this.received = this.received.subarray(bodyEnd);
      this.dispatch(message);
    }
  }

  private dispatch(message: Message): void {
    if (message.method === undefined) {
      if (message.id !== undefined && message.id !== null) {
        this.open.get(message.id)?.(message);
        this.open.delete(message.id);
      }
    } else if (message.id === undefined) {
      this.notifications.push(message);
    } else {
      this.serverRequests.push(message);
      this.send({ jsonrpc: '2.0', id: message.id ?? null, result: null } as Message);
    }
    this.wake();
  }
}

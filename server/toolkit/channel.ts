/**
 * How the toolkit's front and the RDKit service talk, wherever the service runs: a worker thread, a web
 * worker, or the same thread.
 */
import type { DrawingRequest } from './service.ts';
import type { CrippenValues, ToolkitFacts } from './toolkit.ts';

export type ToolkitRequest =
  | { readonly kind: 'load' }
  | { readonly kind: 'facts'; readonly smiles: readonly string[] }
  | { readonly kind: 'crippen'; readonly smiles: readonly string[] }
  | { readonly kind: 'draw'; readonly smiles: string; readonly drawing: DrawingRequest };

/** One reply to each request, in the order of the requests; lists in the order of the SMILES asked. */
export type ToolkitReply =
  | { readonly kind: 'loaded' }
  | { readonly kind: 'facts'; readonly facts: readonly (ToolkitFacts | null)[] }
  | { readonly kind: 'crippen'; readonly values: readonly (CrippenValues | null)[] }
  | { readonly kind: 'drawing'; readonly svg: string | null }
  | { readonly kind: 'failed'; readonly failure: string };

export interface ToolkitChannel {
  send(request: ToolkitRequest): void;
  close(): Promise<void>;
}

export interface ChannelListener {
  reply(reply: ToolkitReply): void;
  /** The other side is gone and will answer nothing more. */
  ended(why: string): void;
}

/** Where the service runs. `open` may throw when it cannot be started. */
export interface ToolkitHost {
  open(listener: ChannelListener): ToolkitChannel;
}

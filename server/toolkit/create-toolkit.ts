/**
 * The toolkit as the rest of the server sees it: asks the service wherever it runs, remembers the answers, and
 * turns every way in which that can go wrong into `null` and one sentence.
 */
import { LRUCache } from 'lru-cache';
import type { ToolkitChannel, ToolkitHost, ToolkitReply, ToolkitRequest } from './channel.ts';
import { coloured } from './drawing.ts';
import type {
  AnswerTable,
  CrippenValues,
  DrawingOptions,
  Toolkit,
  ToolkitFacts,
  ToolkitState,
} from './toolkit.ts';

export interface ToolkitLimits {
  /** Structures whose facts are remembered. */
  readonly facts: number;
  /** Characters of drawings that are remembered. */
  readonly drawingCharacters: number;
  /** SMILES per request; a drawing never waits longer than for one request. */
  readonly batch: number;
  /** Longest silence after a request before the service is given up, in ms; loading it included. */
  readonly patienceMs: number;
}

const usualLimits: ToolkitLimits = {
  facts: 20_000,
  drawingCharacters: 8_000_000,
  batch: 32,
  patienceMs: 60_000,
};

interface Job {
  readonly request: ToolkitRequest;
  readonly done: (reply: ToolkitReply) => void;
}

export function createToolkit(host: ToolkitHost, limits: Partial<ToolkitLimits> = {}): Toolkit {
  return new ToolkitFront(host, { ...usualLimits, ...limits });
}

/** lru-cache holds no null: an answer is kept in a box. */
interface Box<T> {
  readonly answer: T | null;
}

class ToolkitFront implements Toolkit {
  state: ToolkitState = 'not-loaded';
  failure: string | undefined;

  private readonly host: ToolkitHost;
  private readonly limits: ToolkitLimits;
  private channel: ToolkitChannel | undefined;
  private readonly waiting: Job[] = [];
  private running: Job | undefined;
  private watchdog: ReturnType<typeof setTimeout> | undefined;
  private readonly factsCache: LRUCache<string, Box<ToolkitFacts>>;
  private readonly crippenCache: LRUCache<string, Box<CrippenValues>>;
  private readonly drawings: LRUCache<string, string>;
  /** Asked and not yet answered, so that the same string is not asked twice. */
  private readonly underway = new Map<string, Promise<unknown>>();

  constructor(host: ToolkitHost, limits: ToolkitLimits) {
    this.host = host;
    this.limits = limits;
    this.factsCache = new LRUCache({ max: limits.facts });
    this.crippenCache = new LRUCache({ max: limits.facts });
    this.drawings = new LRUCache({
      maxSize: limits.drawingCharacters,
      sizeCalculation: (svg, key) => svg.length + key.length,
    });
  }

  async load(): Promise<void> {
    if (this.state === 'not-loaded') await this.request({ kind: 'load' });
  }

  knownFacts(smiles: string): ToolkitFacts | null | undefined {
    const box = this.factsCache.get(smiles);
    if (box !== undefined) return box.answer;
    return this.state === 'unavailable' ? null : undefined;
  }

  facts(smiles: readonly string[]): Promise<AnswerTable<ToolkitFacts>> {
    return this.table(smiles, this.factsCache, 'facts', (reply) =>
      reply.kind === 'facts' ? reply.facts : [],
    );
  }

  crippen(smiles: readonly string[]): Promise<AnswerTable<CrippenValues>> {
    return this.table(smiles, this.crippenCache, 'crippen', (reply) =>
      reply.kind === 'crippen' ? reply.values : [],
    );
  }

  async draw(smiles: string, options: DrawingOptions): Promise<string | null> {
    const { widthPx, heightPx, highlight } = options;
    const key = `draw ${widthPx}x${heightPx} ${highlight?.join() ?? ''} ${smiles}`;
    let svg = this.drawings.get(key);
    if (svg === undefined) {
      await this.once(key, async () => {
        const drawing = highlight === undefined ? { widthPx, heightPx } : { widthPx, heightPx, highlight };
        const reply = await this.request({ kind: 'draw', smiles, drawing });
        // '' is a drawing that cannot be made; what the toolkit did not get to is not remembered.
        if (reply.kind === 'drawing') this.drawings.set(key, reply.svg ?? '');
      });
      svg = this.drawings.get(key);
    }
    return svg === undefined || svg === '' ? null : coloured(svg, options.colour);
  }

  async dispose(): Promise<void> {
    await this.giveUp(undefined);
  }

  private async table<T extends object>(
    smiles: readonly string[],
    cache: LRUCache<string, Box<T>>,
    kind: 'facts' | 'crippen',
    answersIn: (reply: ToolkitReply) => readonly (T | null)[],
  ): Promise<AnswerTable<T>> {
    const answers = new Map<string, T | null>();
    const pending: Promise<unknown>[] = [];
    const fresh: string[] = [];
    for (const one of new Set(smiles)) {
      const box = cache.get(one);
      const asked = this.underway.get(`${kind} ${one}`);
      if (box !== undefined) answers.set(one, box.answer);
      else if (asked !== undefined) pending.push(asked);
      else fresh.push(one);
    }
    for (let start = 0; start < fresh.length; start += this.limits.batch) {
      const batch = fresh.slice(start, start + this.limits.batch);
      const asking = this.request({ kind, smiles: batch }).then((reply) => {
        answersIn(reply).forEach((answer, index) => cache.set(batch[index]!, { answer }));
        for (const one of batch) this.underway.delete(`${kind} ${one}`);
        // Read from the reply and not from the cache, which may be smaller than the question.
        answersIn(reply).forEach((answer, index) => answers.set(batch[index]!, answer));
      });
      for (const one of batch) this.underway.set(`${kind} ${one}`, asking);
      pending.push(asking);
    }
    await Promise.all(pending);
    for (const one of smiles) if (!answers.has(one)) answers.set(one, cache.get(one)?.answer ?? null);
    return answers;
  }

  private once(key: string, ask: () => Promise<void>): Promise<unknown> {
    let asking = this.underway.get(key);
    if (asking === undefined) {
      asking = ask().finally(() => this.underway.delete(key));
      this.underway.set(key, asking);
    }
    return asking;
  }

  /** Drawings go first: somebody looks at the screen and waits for them. */
  private request(request: ToolkitRequest): Promise<ToolkitReply> {
    return new Promise((done) => {
      const job = { request, done };
      if (request.kind === 'draw') {
        const firstOther = this.waiting.findIndex((other) => other.request.kind !== 'draw');
        this.waiting.splice(firstOther === -1 ? this.waiting.length : firstOther, 0, job);
      } else {
        this.waiting.push(job);
      }
      this.next();
    });
  }

  private next(): void {
    if (this.running !== undefined) return;
    const job = this.waiting.shift();
    if (job === undefined) return;
    if (this.state === 'unavailable') {
      job.done({ kind: 'failed', failure: this.failure ?? '' });
      this.next();
      return;
    }
    this.running = job;
    try {
      if (this.channel === undefined) {
        this.state = 'loading';
        this.channel = this.host.open({
          reply: (reply) => {
            this.received(reply);
          },
          ended: (why) => {
            void this.giveUp(why);
          },
        });
      }
      this.channel.send(job.request);
      this.watchdog = setTimeout(() => {
        void this.giveUp(`it did not answer within ${this.limits.patienceMs / 1000} s`);
      }, this.limits.patienceMs);
    } catch (error) {
      void this.giveUp(error instanceof Error ? error.message : String(error));
    }
  }

  private received(reply: ToolkitReply): void {
    if (this.state === 'unavailable') return;
    if (reply.kind === 'failed') {
      void this.giveUp(reply.failure);
      return;
    }
    clearTimeout(this.watchdog);
    this.state = 'ready';
    const job = this.running;
    this.running = undefined;
    job?.done(reply);
    this.next();
  }

  /** Answers everything that waits with nothing. `why` is undefined when we were told to stop. */
  private async giveUp(why: string | undefined): Promise<void> {
    if (this.state === 'unavailable') return;
    clearTimeout(this.watchdog);
    this.state = 'unavailable';
    this.failure =
      why === undefined
        ? 'The chemistry toolkit was shut down.'
        : `The chemistry toolkit (RDKit) is not available: ${why}. ` +
          'InChI, InChIKey and drawings are left out; all other checks go on.';
    const jobs = [this.running, ...this.waiting.splice(0)];
    this.running = undefined;
    for (const job of jobs) job?.done({ kind: 'failed', failure: this.failure });
    await this.channel?.close().catch(() => undefined);
  }
}

/** A stand-in for the service, so that a test decides when and how it answers, falls silent or dies. */
import type {
  ChannelListener,
  ToolkitHost,
  ToolkitReply,
  ToolkitRequest,
} from '../../../server/toolkit/channel.ts';

export class FakeHost implements ToolkitHost {
  readonly requests: ToolkitRequest[] = [];
  opened = 0;
  closed = 0;
  listener: ChannelListener | undefined;
  private readonly respond: (request: ToolkitRequest) => ToolkitReply | 'die' | 'silence';

  constructor(respond: (request: ToolkitRequest) => ToolkitReply | 'die' | 'silence' = usualReply) {
    this.respond = respond;
  }

  open(listener: ChannelListener) {
    this.opened++;
    this.listener = listener;
    return {
      send: (request: ToolkitRequest) => {
        this.requests.push(request);
        const reply = this.respond(request);
        if (reply === 'silence') return;
        queueMicrotask(() => {
          if (reply === 'die') listener.ended('its thread ended with code 1');
          else listener.reply(reply);
        });
      },
      close: () => {
        this.closed++;
        return Promise.resolve();
      },
    };
  }
}

export function usualReply(request: ToolkitRequest): ToolkitReply {
  switch (request.kind) {
    case 'load':
      return { kind: 'loaded' };
    case 'facts':
      return {
        kind: 'facts',
        facts: request.smiles.map((smiles) =>
          smiles === 'unreadable'
            ? null
            : { smiles, inchi: `inchi of ${smiles}`, inchiKey: `key of ${smiles}` },
        ),
      };
    case 'crippen':
      return { kind: 'crippen', values: request.smiles.map(() => ({ logP: 1, molarRefraction: 2 })) };
    case 'draw':
      return { kind: 'drawing', svg: `<svg stroke="currentColor">${request.smiles}</svg>` };
  }
}

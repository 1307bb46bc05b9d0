/** The service's side of the channel: one request in, one reply out, never an exception. */
import type { ToolkitReply, ToolkitRequest } from './channel.ts';
import type { RdkitService } from './service.ts';

export async function answer(service: RdkitService, request: ToolkitRequest): Promise<ToolkitReply> {
  try {
    await service.start();
    switch (request.kind) {
      case 'load':
        return { kind: 'loaded' };
      case 'facts':
        return { kind: 'facts', facts: await oneByOne(request.smiles, (smiles) => service.facts(smiles)) };
      case 'crippen':
        return {
          kind: 'crippen',
          values: await oneByOne(request.smiles, (smiles) => service.crippen(smiles)),
        };
      case 'draw':
        return { kind: 'drawing', svg: await service.draw(request.smiles, request.drawing) };
    }
  } catch (error) {
    return { kind: 'failed', failure: error instanceof Error ? error.message : String(error) };
  }
}

async function oneByOne<T>(smiles: readonly string[], ask: (smiles: string) => Promise<T>): Promise<T[]> {
  const answers: T[] = [];
  for (const one of smiles) answers.push(await ask(one));
  return answers;
}

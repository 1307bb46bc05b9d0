import { describe, expect, it } from 'vitest';
import { createToolkit } from '../../../server/toolkit/create-toolkit.ts';
import { FakeHost, usualReply } from './fake-host.ts';

const box = { widthPx: 200, heightPx: 150, colour: '#123456' };

describe('the toolkit as the server sees it', () => {
  it('loads nothing before the first question', async () => {
    const host = new FakeHost();
    const toolkit = createToolkit(host);
    expect(toolkit.state).toBe('not-loaded');
    expect(host.opened).toBe(0);
    expect(toolkit.knownFacts('CCO')).toBeUndefined();
    const loading = toolkit.load();
    expect(toolkit.state).toBe('loading');
    await loading;
    expect(toolkit.state).toBe('ready');
    expect(host.opened).toBe(1);
  });

  it('answers every SMILES asked, also those that cannot be read', async () => {
    const toolkit = createToolkit(new FakeHost());
    const table = await toolkit.facts(['CCO', 'unreadable', 'CCO']);
    expect([...table.keys()]).toEqual(['CCO', 'unreadable']);
    expect(table.get('CCO')?.inchiKey).toBe('key of CCO');
    expect(table.get('unreadable')).toBeNull();
    expect(toolkit.knownFacts('unreadable')).toBeNull();
  });

  it('never asks twice for the same string, not even while the first answer is underway', async () => {
    const host = new FakeHost();
    const toolkit = createToolkit(host);
    await Promise.all([toolkit.facts(['C', 'CC']), toolkit.facts(['CC', 'CCC'])]);
    await toolkit.facts(['C', 'CC', 'CCC']);
    await Promise.all([toolkit.draw('C', box), toolkit.draw('C', box)]);
    await toolkit.draw('C', { ...box, colour: 'red' });
    const asked = host.requests.flatMap((request) =>
      request.kind === 'load' ? [] : typeof request.smiles === 'string' ? ['draw'] : request.smiles,
    );
    expect(asked.sort()).toEqual(['C', 'CC', 'CCC', 'draw']);
  });

  it('asks in batches and lets a drawing pass the batches that wait', async () => {
    const host = new FakeHost();
    const toolkit = createToolkit(host, { batch: 2 });
    const facts = toolkit.facts(['1', '2', '3', '4', '5']);
    const drawing = toolkit.draw('1', box);
    expect((await facts).size).toBe(5);
    await drawing;
    expect(host.requests.map((request) => request.kind)).toEqual(['facts', 'draw', 'facts', 'facts']);
  });

  it('answers a question that is larger than its memory', async () => {
    const toolkit = createToolkit(new FakeHost(), { facts: 3, batch: 2 });
    const table = await toolkit.facts(['1', '2', '3', '4', '5', '6']);
    expect([...table.values()].map((facts) => facts?.smiles)).toEqual(['1', '2', '3', '4', '5', '6']);
  });

  it('draws in the colour asked for and refuses what is no colour', async () => {
    const toolkit = createToolkit(new FakeHost());
    expect(await toolkit.draw('C', box)).toBe('<svg stroke="#123456">C</svg>');
    expect(await toolkit.draw('C', { ...box, colour: 'red"><script>' })).toBe(
      '<svg stroke="currentColor">C</svg>',
    );
  });

  it('survives the death of the service: all that waits is answered with nothing, the reason is kept', async () => {
    let calls = 0;
    const host = new FakeHost((request) => (++calls < 2 ? usualReply(request) : 'die'));
    const toolkit = createToolkit(host, { batch: 1 });
    const [table, drawing] = await Promise.all([toolkit.facts(['1', '2', '3']), toolkit.draw('C', box)]);
    expect([...table.values()].map((facts) => facts?.smiles)).toEqual(['1', undefined, undefined]);
    expect(drawing).toBeNull();
    expect(toolkit.state).toBe('unavailable');
    expect(toolkit.failure).toContain('its thread ended with code 1');
    expect(await toolkit.facts(['4'])).toEqual(new Map([['4', null]]));
    expect(await toolkit.draw('CC', box)).toBeNull();
    expect(await toolkit.crippen(['4'])).toEqual(new Map([['4', null]]));
    // What was learned before stays.
    expect(toolkit.knownFacts('1')?.smiles).toBe('1');
    expect(toolkit.knownFacts('never asked')).toBeNull();
    expect(host.opened).toBe(1);
  });

  it('gives up a service that does not answer', async () => {
    const host = new FakeHost(() => 'silence');
    const toolkit = createToolkit(host, { patienceMs: 20 });
    expect(await toolkit.facts(['1'])).toEqual(new Map([['1', null]]));
    expect(toolkit.failure).toContain('did not answer within 0.02 s');
    expect(host.closed).toBe(1);
  });

  it('survives a host that cannot be opened', async () => {
    const toolkit = createToolkit({
      open: () => {
        throw new Error('no threads here');
      },
    });
    await toolkit.load();
    expect(toolkit.state).toBe('unavailable');
    expect(toolkit.failure).toContain('no threads here');
  });

  it('ignores answers after it was disposed of', async () => {
    const host = new FakeHost(() => 'silence');
    const toolkit = createToolkit(host);
    const facts = toolkit.facts(['1']);
    await toolkit.dispose();
    expect((await facts).get('1')).toBeNull();
    host.listener?.reply({ kind: 'facts', facts: [] });
    expect(toolkit.state).toBe('unavailable');
  });
});

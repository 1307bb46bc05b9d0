/** The real RDKit, in this thread and in a worker of its own. */
import { build } from 'esbuild';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, afterEach, describe, expect, it, vi } from 'vitest';
import { createToolkit } from '../../../server/toolkit/create-toolkit.ts';
import { sameThreadHost, threadHost } from '../../../server/toolkit/hosts.ts';
import { folderVariable } from '../../../server/toolkit/rdkit-module.ts';
import type { Toolkit } from '../../../server/toolkit/toolkit.ts';

const box = { widthPx: 300, heightPx: 200, colour: '#c0ffee' };

const scratch = mkdtempSync(join(tmpdir(), 'isonym-toolkit-'));
const open: Toolkit[] = [];
afterAll(async () => {
  for (const toolkit of open) await toolkit.dispose();
  rmSync(scratch, { recursive: true, force: true });
});

function toolkitOn(host: Parameters<typeof createToolkit>[0]) {
  const toolkit = createToolkit(host);
  open.push(toolkit);
  return toolkit;
}

async function bundledWorker(): Promise<string> {
  const outfile = join(scratch, 'toolkit-worker.mjs');
  await build({
    entryPoints: [fileURLToPath(new URL('../../../server/toolkit/worker.ts', import.meta.url))],
    bundle: true,
    platform: 'node',
    format: 'esm',
    outfile,
  });
  return outfile;
}

describe('RDKit in this thread', () => {
  const toolkit = toolkitOn(sameThreadHost());

  it('gives InChI and InChIKey', async () => {
    // Ethanol and L-alanine, from memory.
    const table = await toolkit.facts(['OCC', 'C[C@H](N)C(=O)O', 'C1CC']);
    expect(table.get('OCC')).toEqual({
      smiles: 'CCO',
      inchi: 'InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3',
      inchiKey: 'LFQSCWFLJHTTHZ-UHFFFAOYSA-N',
    });
    expect(table.get('C[C@H](N)C(=O)O')?.inchiKey).toBe('QNAYBMKLOCPYGJ-REOHCLBHSA-N');
    expect(table.get('C1CC')).toBeNull();
  });

  it('gives log P and molar refraction after Wildman and Crippen', async () => {
    const values = (await toolkit.crippen(['CCO'])).get('CCO');
    // Types C1, C3, O2, five H1 and one H2; contributions of the paper's table 1, from memory.
    expect(values?.logP).toBeCloseTo(0.1441 - 0.2035 - 0.2893 + 5 * 0.123 - 0.2677, 3);
    expect(values?.molarRefraction).toBeGreaterThan(12);
  });

  it('draws in one colour, on nothing, with nothing but paths', async () => {
    const smiles = [
      'CC(C)(C)OC(=O)N[C@@H](C)c1ccc(OC)cc1',
      '[Na+].[Cl-]',
      'C/C=C/Cl',
      'Oc1c(Br)c(I)c(F)c(N)c1S',
    ];
    for (const one of smiles) {
      const svg = await toolkit.draw(one, { ...box, highlight: [0, 1] });
      expect(svg).toMatch(/^<svg xmlns="http:\/\/www.w3.org\/2000\/svg" width="\d+" height="\d+"/);
      expect(new Set(svg!.match(/#[0-9a-f]+/gi))).toEqual(new Set(['#c0ffee']));
      expect(new Set([...svg!.matchAll(/<(\w+)/g)].map((tag) => tag[1]))).toEqual(new Set(['svg', 'path']));
    }
  });

  it('keeps the drawing inside the box and small in bytes', async () => {
    const palytoxinLike = 'OC1CC(O)C(O)C(O1)'.repeat(1) + 'CC(O)C(C)C=CC(O)'.repeat(14);
    const svg = await toolkit.draw(palytoxinLike, box);
    const [, width, height] = /width="(\d+)" height="(\d+)"/.exec(svg!)!;
    expect(Number(width)).toBeLessThanOrEqual(box.widthPx);
    expect(Number(height)).toBeLessThanOrEqual(box.heightPx);
    expect(svg!.length).toBeLessThan(60_000);
    const ethanol = await toolkit.draw('CCO', box);
    expect(Number(/width="(\d+)"/.exec(ethanol!)![1])).toBeLessThan(box.widthPx / 2);
  });

  it('answers null for what cannot be drawn', async () => {
    expect(await toolkit.draw('C1CC', box)).toBeNull();
    expect(await toolkit.draw('C'.repeat(5000), box)).toBeNull();
  });
});

describe('RDKit in a worker thread', () => {
  afterEach(() => {
    vi.unstubAllEnvs();
  });

  it('gives the same answers as in this thread', async () => {
    const toolkit = toolkitOn(threadHost(await bundledWorker()));
    vi.stubEnv(folderVariable, fileURLToPath(new URL('.', import.meta.resolve('@rdkit/rdkit'))));
    const table = await toolkit.facts(['OCC']);
    expect(toolkit.failure).toBeUndefined();
    expect(table.get('OCC')?.inchiKey).toBe('LFQSCWFLJHTTHZ-UHFFFAOYSA-N');
    expect(await toolkit.draw('OCC', box)).toContain('<path');
  });

  it('says when its files are missing', async () => {
    const toolkit = toolkitOn(threadHost(await bundledWorker()));
    vi.stubEnv(folderVariable, join(scratch, 'nowhere'));
    expect((await toolkit.facts(['OCC'])).get('OCC')).toBeNull();
    expect(toolkit.state).toBe('unavailable');
    expect(toolkit.failure).toContain('RDKit_minimal.js is not there');
  });

  it('survives a thread that dies in the middle of a question, and one that never starts', async () => {
    const dying = join(scratch, 'dying.mjs');
    writeFileSync(
      dying,
      "import { parentPort } from 'node:worker_threads'; parentPort.on('message', () => process.exit(7));",
    );
    const first = toolkitOn(threadHost(dying));
    const [table, drawing] = await Promise.all([first.facts(['C', 'CC']), first.draw('C', box)]);
    expect([...table.values()]).toEqual([null, null]);
    expect(drawing).toBeNull();
    expect(first.failure).toContain('ended with code 7');

    const second = toolkitOn(threadHost(join(scratch, 'no-such-file.mjs')));
    expect((await second.facts(['C'])).get('C')).toBeNull();
    expect(second.state).toBe('unavailable');
  });
});

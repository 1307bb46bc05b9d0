import fc from 'fast-check';
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { defaultSettings } from '../../../server/checks/settings.ts';
import type { Toolkit, ToolkitFacts } from '../../../server/toolkit/toolkit.ts';
import { Notebook } from '../../../server/workspace/notebook.ts';

const compound = (label: string, more = '') =>
  `\`\`\`compound\nlabel: ${label}\nname: ethanol\nformula: C2H6O\nSMILES: CCO\n${more}\`\`\`\n`;
const keyOfMethanol = 'OKKJLVBELUTLKV-UHFFFAOYSA-N';
const ethanolFacts: ToolkitFacts = {
  smiles: 'CCO',
  inchi: 'InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3',
  inchiKey: 'LFQSCWFLJHTTHZ-UHFFFAOYSA-N',
};

/** A toolkit that knows what it is told once it has been asked, and remembers nothing by itself if `forgetful`. */
function slowToolkit(facts: ToolkitFacts | null, forgetful = false) {
  const known = new Map<string, ToolkitFacts | null>();
  const asked: string[][] = [];
  const toolkit: Toolkit = {
    state: 'ready',
    failure: undefined,
    knownFacts: (smiles) => (forgetful ? undefined : known.get(smiles)),
    facts: async (smiles) => {
      asked.push([...smiles]);
      await Promise.resolve();
      for (const one of smiles) known.set(one, facts);
      return new Map(smiles.map((one) => [one, facts]));
    },
    crippen: () => Promise.resolve(new Map()),
    draw: () => Promise.resolve(null),
    load: () => Promise.resolve(),
    dispose: () => Promise.resolve(),
  };
  return { toolkit, asked };
}

const checksIn = (notebook: Notebook, file: string) =>
  notebook.findings(file).map((finding) => finding.check);

describe('a notebook', () => {
  it('finds the same in a page whatever edits led to it', () => {
    const edited = new Notebook(defaultSettings, undefined);
    const versions = [
      compound('1'),
      `# Title\n\n${compound('1')}`,
      `# Title\n\n${compound('1', 'bogus: x\n')}\n${compound('2').replace('C2H6O', 'C2H6O2')}`,
      `# Title\n\n${compound('1', 'bogus: x\n')}\n${compound('1')}`,
      compound('2').replace('C2H6O', 'C2H6O2'),
    ];
    for (const version of versions) {
      edited.setPage('a.md', version);
      const fresh = new Notebook(defaultSettings, undefined);
      fresh.setPage('a.md', version);
      expect(edited.findings('a.md')).toEqual(fresh.findings('a.md'));
    }
  });

  it('points from one page to the other where they have a label in common', () => {
    const notebook = new Notebook(defaultSettings, undefined);
    notebook.setPage('a.md', compound('1'));
    notebook.setPage('b.md', `text before\n\n${compound('1')}`);
    const [finding] = notebook.findings('b.md');
    expect(finding?.check).toBe('label-repeated');
    expect(finding?.related).toMatchObject([{ file: 'a.md', range: { start: 19, end: 20 } }]);
    notebook.setPage('a.md', compound('2'));
    expect(checksIn(notebook, 'b.md')).toEqual([]);
    notebook.setPage('a.md', compound('1'));
    notebook.removePage('a.md');
    expect(checksIn(notebook, 'b.md')).toEqual([]);
  });

  it('keeps what it knows across pages when it is asked not to look again', () => {
    const notebook = new Notebook(defaultSettings, undefined);
    notebook.setPage('a.md', compound('1') + compound('1'));
    expect(checksIn(notebook, 'a.md').length).toBeGreaterThan(0);
    const before = notebook.findings('a.md').length;
    notebook.setPage('b.md', compound('1'));
    expect(notebook.findings('a.md', 'known')).toHaveLength(before);
    expect(notebook.findings('b.md', 'known')).toHaveLength(0);
    expect(notebook.findings('b.md')).toHaveLength(1);
    expect(notebook.blockCount).toBe(3);
  });

  it('puts off what needs the toolkit, and asks once for all of it', async () => {
    const { toolkit, asked } = slowToolkit(ethanolFacts);
    const notebook = new Notebook(defaultSettings, toolkit);
    const withKey = (label: string) => compound(label, `InChIKey: ${keyOfMethanol}\n`);
    notebook.setPage('a.md', withKey('1'));
    notebook.setPage('b.md', withKey('2'));
    expect(checksIn(notebook, 'a.md')).toEqual([]);
    expect(notebook.isWaiting).toBe(true);
    expect([...(await notebook.settle())].sort()).toEqual(['a.md', 'b.md']);
    expect(checksIn(notebook, 'a.md')).toEqual(['inchikey-mismatch']);
    expect(asked).toHaveLength(1);
    expect(notebook.isWaiting).toBe(false);
  });

  it('comes to an end with a toolkit that knows nothing, or forgets what it said', async () => {
    for (const { toolkit } of [slowToolkit(null), slowToolkit(ethanolFacts, true)]) {
      const notebook = new Notebook(defaultSettings, toolkit);
      notebook.setPage('a.md', compound('1', `InChIKey: ${keyOfMethanol}\n`));
      await notebook.settle();
      expect(notebook.isWaiting).toBe(false);
    }
  });

  it('follows its settings', () => {
    const page = compound('1').replace('C2H6O', 'C2H6O2');
    const strict = new Notebook(defaultSettings, undefined);
    strict.setPage('a.md', page);
    expect(checksIn(strict, 'a.md')).toEqual(['formula-mismatch']);
    const silent = new Notebook({ ...defaultSettings, severity: { 'formula-mismatch': 'off' } }, undefined);
    silent.setPage('a.md', page);
    expect(checksIn(silent, 'a.md')).toEqual([]);
  });

  it('survives any text and any edit of a real page, its ranges always inside the text', () => {
    const pages = ['02-floral-alcohols', '03-fruit-esters', '04-pentylbiphenyl'].map((name) =>
      readFileSync(new URL(`../../../examples/linden-row/2026/${name}.md`, import.meta.url), 'utf8'),
    );
    const cuts = fc.tuple(
      fc.constantFrom(...pages),
      fc.nat(),
      fc.nat(200),
      fc.string({ unit: 'binary', maxLength: 12 }),
    );
    const broken = cuts.map(([page, at, length, inserted]) => {
      const start = at % page.length;
      return page.slice(0, start) + inserted + page.slice(start + length);
    });
    const notebook = new Notebook(defaultSettings, undefined);
    fc.assert(
      fc.property(broken, (text) => {
        notebook.setPage('a.md', text);
        for (const { range, message, check, fixes } of notebook.findings('a.md')) {
          const ranges = [range, ...fixes.flatMap((fix) => fix.edits.map((edit) => edit.range))];
          for (const { start, end } of ranges) {
            expect(start).toBeGreaterThanOrEqual(0);
            expect(end).toBeGreaterThanOrEqual(start);
            expect(end).toBeLessThanOrEqual(text.length);
          }
          expect(`${check}: ${message}`).not.toMatch(/broke down/);
        }
      }),
      { seed: 1, numRuns: 150 },
    );
  });
});

import { describe, expect, it } from 'vitest';
import type { MarkupContent } from 'vscode-languageserver';
import { hover } from '../../../server/language/hover.ts';
import type { Toolkit, ToolkitFacts } from '../../../server/toolkit/toolkit.ts';
import { atCaret, openPage } from './open-page.ts';

const svg = '<svg width="90" height="60"></svg>';

/** Draws everything alike and notes what it was asked to draw. */
function drawingToolkit(facts: ToolkitFacts | null = null) {
  const drawn: { smiles: string; highlight: readonly number[] | undefined }[] = [];
  const toolkit: Toolkit = {
    state: 'ready',
    failure: undefined,
    knownFacts: () => undefined,
    facts: (smiles) => Promise.resolve(new Map(smiles.map((one) => [one, facts]))),
    crippen: () => Promise.resolve(new Map()),
    draw: (smiles, { highlight }) => {
      drawn.push({ smiles, highlight });
      return Promise.resolve(svg);
    },
    load: () => Promise.resolve(),
    dispose: () => Promise.resolve(),
  };
  return { toolkit, drawn };
}

async function hoverAt(marked: string, options: { markdown?: boolean; facts?: ToolkitFacts } = {}) {
  const { text, offset } = atCaret(marked);
  const { toolkit, drawn } = drawingToolkit(options.facts);
  const traits = { markdown: options.markdown ?? true, foreground: '#000', toolkit };
  const page = openPage(text);
  const shown = await hover(page, offset, page.notebook.findings(page.name), traits);
  return { value: (shown?.contents as MarkupContent | undefined)?.value, range: shown?.range, drawn };
}

describe('a hover', () => {
  it('on a structure emphasizes the atom under the cursor', async () => {
    const { value, drawn, range } = await hoverAt('```compound\nname: ethanol\nSMILES: C‸CO\n```');
    expect(value).toContain('**ethanol** · C₂H₆O');
    expect(value).toContain('| molar mass | 46.07 g/mol |');
    expect(drawn).toEqual([{ smiles: 'CCO', highlight: [1] }]);
    expect(range).toEqual({ start: { line: 2, character: 8 }, end: { line: 2, character: 11 } });
  });

  it('on a structure with written hydrogens emphasizes nothing, since they are not drawn', async () => {
    const { drawn } = await hoverAt('```compound\nSMILES: [H]C‸C\n```');
    expect(drawn[0]?.highlight).toBeUndefined();
  });

  it('on an ambiguous name shows what it can mean, side by side', async () => {
    const { value, drawn } = await hoverAt('```compound\nname: chloro‸toluene\n```');
    expect(value).toContain('**chlorotoluene** · 3 readings of C₇H₇Cl');
    expect(drawn).toHaveLength(3);
  });

  it('on a name that leaves stereo open lists the stereoisomers', async () => {
    const { value, drawn } = await hoverAt('```compound\nname: butan-2‸-ol\n```');
    expect(value).toMatch(/2 stereoisomers open: .*2R.*; .*2S/);
    expect(drawn).toHaveLength(2);
    expect(value).not.toContain('InChIKey');
  });

  it('on an identifier shows the compound, its InChIKey from the toolkit', async () => {
    const facts = {
      smiles: 'CCO',
      inchi: 'InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3',
      inchiKey: 'LFQSCWFLJHTTHZ-UHFFFAOYSA-N',
    };
    const { value } = await hoverAt('```compound\nSMILES: CCO\nInChIKey: LFQ‸SCWFLJHTTHZ-UHFFFAOYSA-N\n```', {
      facts,
    });
    expect(value).toContain('| InChIKey | LFQSCWFLJHTTHZ-UHFFFAOYSA-N |');
  });

  it('on the opening of a block shows the whole compound under its label', async () => {
    const { value } = await hoverAt('```comp‸ound\nlabel: 4\nname: ethanol\nSMILES: CCO\n```');
    expect(value).toContain('**4 · ethanol** · C₂H₆O');
  });

  it('on a formula, a key, an accepted check says what they are', async () => {
    const block = '```compound\nformula: C6H6\nallow: formula-only (bought)\n```';
    expect((await hoverAt(block.replace('C6H6', 'C6‸H6'))).value).toContain('| unsaturation | 4 |');
    expect((await hoverAt(block.replace('formula:', 'form‸ula:'))).value).toContain('Molecular formula');
    expect((await hoverAt(block.replace('-only', '-on‸ly'))).value).toContain('formula-only');
  });

  it('on a substance of a reaction shows the compound of that label, or what the name means', async () => {
    const compound = '```compound\nlabel: LR-1\nname: ethanol\nSMILES: CCO\n```\n\n';
    const reaction = '```reaction\ncharged:\n  - LR-1: 1.0 g\n  - methanol: 2 mL (solvent)\n```';
    const labelled = await hoverAt(compound + reaction.replace('LR-1', 'LR‸-1'));
    expect(labelled.value).toContain('**LR-1 · ethanol** · C₂H₆O');
    const named = await hoverAt(compound + reaction.replace('methanol', 'meth‸anol'));
    expect(named.value).toContain('**methanol** · CH₄O');
  });

  it('says why the check exists that found something under the cursor', async () => {
    const { value } = await hoverAt('```compound\nname: chloro‸toluene\n```');
    expect(value).toContain('name-ambiguous: ');
  });

  it('on a structure too large to be drawn still gives formula and masses', async () => {
    const { value, drawn } = await hoverAt(`\`\`\`compound\nSMILES: C‸${'C'.repeat(20_000)}\n\`\`\``);
    expect(value).toContain('**C₂₀₀₀₁H₄₀₀₀₄**');
    expect(drawn).toEqual([]);
  });

  it('lets nothing of the notebook act', async () => {
    const { value } = await hoverAt('```compound\nname: [x](command:y) <b>\nSMILES: C‸C\n```');
    expect(value).toContain('\\[x\\](command:y) &lt;b&gt;');
  });

  it('says nothing outside of blocks and where nothing can be said', async () => {
    expect((await hoverAt('te‸xt\n\n```compound\nSMILES: C\n```')).value).toBeUndefined();
    expect((await hoverAt('```compound\nSMILES: C(‸\n```')).value).toBeUndefined();
    expect((await hoverAt('```react‸ion\nlabel: R\n```')).value).toBeUndefined();
  });
});

import { describe, expect, it } from 'vitest';
import { renderMarkdown, renderPlain, type HoverCard } from '../../../server/language/hover-card.ts';

const card: HoverCard = {
  title: 'butan-2-ol',
  subtitle: 'C₄H₁₀O',
  drawings: [{ smiles: 'CCC(C)O', caption: 'butan-2-ol' }],
  rows: [['molar mass', '74.12 g/mol']],
  lines: ['2 stereoisomers open: R, S'],
};
const svg = '<svg width="80" height="40"></svg>';
const base64 = Buffer.from(svg).toString('base64');

describe('a hover card', () => {
  it('shows title, drawing, table and sentences in this order', () => {
    expect(renderMarkdown(card, [svg])).toBe(
      [
        '**butan-2-ol** · C₄H₁₀O',
        `![butan-2-ol](data:image/svg+xml;base64,${base64}|width=80)`,
        '| | |\n|:--|:--|\n| molar mass | 74.12 g/mol |',
        '2 stereoisomers open: R, S',
      ].join('\n\n'),
    );
  });

  it('does without a drawing that cannot be had', () => {
    expect(renderMarkdown(card, [null])).not.toContain('![');
    expect(renderMarkdown(card, [])).not.toContain('![');
  });

  it('puts several drawings side by side over their captions, the width escaped for the table', () => {
    const drawings = ['a', 'b'].map((caption) => ({ smiles: caption, caption }));
    const [, pictures] = renderMarkdown({ title: 't', drawings }, [svg, svg]).split('\n\n');
    const lines = pictures!.split('\n');
    expect(lines[0]).toContain('\\|width=80) | ![b]');
    expect(lines.slice(1)).toEqual(['|:-:|:-:|', '| a | b |']);
  });

  it('leaves out pictures that would make it too long', () => {
    const huge = `<svg width="80">${'x'.repeat(80_000)}</svg>`;
    expect(renderMarkdown(card, [huge])).not.toContain('![');
  });

  it('escapes what comes from the notebook', () => {
    const markdown = renderMarkdown({ title: '[a](command:b)', rows: [['x', '<img>|']], lines: ['`c`'] }, []);
    expect(markdown).toContain('**\\[a\\](command:b)**');
    expect(markdown).toContain('&lt;img&gt;\\|');
    expect(markdown).toContain('\\`c\\`');
  });

  it('has a plain form', () => {
    expect(renderPlain(card)).toBe(
      'butan-2-ol · C₄H₁₀O\nmolar mass: 74.12 g/mol\n2 stereoisomers open: R, S',
    );
  });
});

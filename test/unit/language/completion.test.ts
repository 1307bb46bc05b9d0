import { describe, expect, it } from 'vitest';
import { completions } from '../../../server/language/completion.ts';
import { atCaret, openPage } from './open-page.ts';

function labelsAt(marked: string): string[] {
  const { text, offset } = atCaret(marked);
  return completions(openPage(text), offset).map((item) => item.label);
}

describe('completion of keys', () => {
  it('offers what the block does not have yet, in customary order', () => {
    const labels = labelsAt('```compound\nlabel: 1\nm‸\nformula: CH4\n```');
    expect(labels).toContain('molar mass');
    expect(labels).not.toContain('label');
    expect(labels).not.toContain('formula');
    expect(labels.indexOf('name')).toBeLessThan(labels.indexOf('mp'));
    expect(labels).toContain('allow');
  });

  it('knows the kind of the block', () => {
    expect(labelsAt('```reaction\n‸\n```')).toContain('charged');
    expect(labelsAt('```reaction\n‸\n```')).not.toContain('SMILES');
  });

  it('offers nothing in values, in continuation lines, or outside of blocks', () => {
    expect(labelsAt('```compound\nname: eth‸\n```')).toEqual([]);
    expect(labelsAt('```compound\nnotes: a\n  b‸\n```')).toEqual([]);
    expect(labelsAt('‸text\n```compound\n```')).toEqual([]);
    expect(labelsAt('```comp‸ound\n```')).toEqual([]);
  });

  it('replaces the key that stands there, colon included', () => {
    const { text, offset } = atCaret('> ```compound\n> fo‸rm: CH4\n> ```');
    const item = completions(openPage(text), offset).find(({ label }) => label === 'formula');
    expect(item?.textEdit).toEqual({
      range: { start: { line: 1, character: 2 }, end: { line: 1, character: 7 } },
      newText: 'formula: ',
    });
  });
});

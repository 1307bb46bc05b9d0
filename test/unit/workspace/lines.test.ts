import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { LineTable } from '../../../server/workspace/lines.ts';

describe('offsets and lines', () => {
  it('counts UTF-16 code units and knows all three line breaks', () => {
    const table = new LineTable('a🧪b\r\nc\rd\n');
    expect(table.lineCount).toBe(4);
    expect(table.placeAt(3)).toEqual({ line: 0, character: 3 });
    expect(table.placeAt(6)).toEqual({ line: 1, character: 0 });
    expect(table.placeAt(8)).toEqual({ line: 2, character: 0 });
    expect(table.placeAt(99)).toEqual({ line: 3, character: 0 });
    expect(table.lineText(0)).toBe('a🧪b');
    expect(table.offsetAt({ line: 0, character: 99 })).toBe(4);
    expect(table.offsetAt({ line: 99, character: 0 })).toBe(10);
  });

  it('agrees with the text document that the language server uses', () => {
    const texts = fc.string({ unit: fc.constantFrom('a', '\n', '\r', '🧪', ' ', 'µ') });
    fc.assert(
      fc.property(texts, fc.nat(60), (text, offset) => {
        const table = new LineTable(text);
        const document = TextDocument.create('file:///a.md', 'markdown', 1, text);
        // Inside a line break the other implementation backs up; a range of ours never begins there.
        if (text[offset - 1] === '\r' && text[offset] === '\n') return;
        expect(table.placeAt(offset)).toEqual(document.positionAt(offset));
        expect(table.offsetAt(table.placeAt(offset))).toBe(Math.min(offset, text.length));
      }),
      { seed: 1 },
    );
  });
});

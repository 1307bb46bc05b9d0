import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { printable, printableJson, terminalWidth } from '../../../server/cli/printable.ts';

describe('notebook text on a terminal', () => {
  it('makes control characters visible and harmless', () => {
    expect(printable('a\u001b[31mb\u0007\tc\u009b2J\u202ed')).toBe('a␛[31mb␇␉c�2J�d');
    expect(printable('95 °C · 3′ µL 你好 🧪')).toBe('95 °C · 3′ µL 你好 🧪');
  });

  it('keeps every column', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (text) => printable(text).length === text.length),
      { seed: 1 },
    );
  });

  it('prints JSON that means the same and holds nothing a terminal acts on', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (text) => {
        const json = printableJson({ text });
        expect(JSON.parse(json)).toEqual({ text });
        expect(printable(json)).toBe(json);
      }),
      { seed: 1 },
    );
  });

  it('knows how wide characters are', () => {
    expect(terminalWidth('abc µ°')).toBe(6);
    expect(terminalWidth('化学')).toBe(4);
    expect(terminalWidth('🧪')).toBe(2);
    expect(terminalWidth('e\u0301')).toBe(1);
  });
});

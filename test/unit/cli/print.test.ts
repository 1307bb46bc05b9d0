import { describe, expect, it } from 'vitest';
import type { CheckResult, FoundIn } from '../../../server/cli/found.ts';
import { formatJson } from '../../../server/cli/print-json.ts';
import { formatText, summaryLine } from '../../../server/cli/print-text.ts';

const summary = { files: 1, compounds: 2, reactions: 0, errors: 1, warnings: 0, informations: 0 };

function resultOf(...findings: Partial<FoundIn>[]): CheckResult {
  return {
    findings: findings.map((more) => ({
      file: 'a.md',
      line: 3,
      column: 10,
      endLine: 3,
      endColumn: 12,
      check: 'valence',
      severity: 'error',
      message: 'Carbon has five bonds.',
      lineText: 'SMILES: CC(C)(C)(C)C',
      ...more,
    })),
    summary,
  };
}

const plain = { colour: false, width: 80 };

describe('the text format', () => {
  it('groups by file and marks the characters', () => {
    expect(formatText(resultOf({}, { file: 'b.md', message: 'Again.' }), plain)).toBe(
      [
        'a.md',
        '  3:10 error valence',
        '    Carbon has five bonds.',
        '    SMILES: CC(C)(C)(C)C',
        '             ^^',
        '',
        'b.md',
        '  3:10 error valence',
        '    Again.',
        '    SMILES: CC(C)(C)(C)C',
        '             ^^',
        '',
        '1 error, 0 warnings, 0 pieces of information in 1 file, 2 compounds, 0 reactions.',
        '',
      ].join('\n'),
    );
  });

  it('marks an empty range, the end of a line, and what goes on in the next line', () => {
    const marks = (more: Partial<FoundIn>) => formatText(resultOf(more), plain).split('\n')[4];
    expect(marks({ column: 21, endColumn: 21 })).toBe(`${' '.repeat(24)}^`);
    expect(marks({ column: 15, endLine: 4, endColumn: 2 })).toBe(`${' '.repeat(18)}^^^^^^`);
    expect(marks({ lineText: '🧪化学 CC', column: 6, endColumn: 8 })).toBe(`${' '.repeat(11)}^^`);
  });

  it('cuts a long line round the finding', () => {
    const lineText = `SMILES: ${'C'.repeat(500)}X${'C'.repeat(500)}`;
    const lines = formatText(resultOf({ lineText, column: 509, endColumn: 510 }), plain).split('\n');
    expect(lines[3]!.length).toBeLessThanOrEqual(80);
    expect(lines[3]![lines[4]!.indexOf('^')]).toBe('X');
  });

  it('wraps the message and keeps long words', () => {
    const text = formatText(resultOf({ message: `${'word '.repeat(30)}${'C'.repeat(100)}` }), plain);
    expect(text).toContain(`\n    ${'C'.repeat(100)}\n`);
  });

  it('colours only when told to, and lets no escape of the notebook through', () => {
    expect(formatText(resultOf({}), { ...plain, colour: true })).toContain('\u001b[31merror\u001b[39m');
    const hostile = '\u001b]0;title\u0007\u001b[2J';
    expect(formatText(resultOf({ lineText: hostile, message: hostile, file: hostile }), plain)).not.toContain(
      '\u001b',
    );
  });

  it('says that nothing was found', () => {
    expect(summaryLine({ ...summary, errors: 0 })).toBe('Nothing found in 1 file, 2 compounds, 0 reactions.');
  });
});

describe('the JSON format', () => {
  it('has the members that others rely on', () => {
    expect(JSON.parse(formatJson(resultOf({})))).toEqual({
      findings: [
        {
          file: 'a.md',
          line: 3,
          column: 10,
          endLine: 3,
          endColumn: 12,
          check: 'valence',
          severity: 'error',
          message: 'Carbon has five bonds.',
        },
      ],
      summary,
    });
  });
});

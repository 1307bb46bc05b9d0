import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import type { Report, ReportEntry } from '../../../server/cli/report-model.ts';
import { reportPage } from '../../../server/cli/report-page.ts';

const entry: ReportEntry = {
  kind: 'compound',
  id: 'entry-1',
  line: 3,
  label: '4',
  heading: 'butan-2-ol',
  formula: 'C₄H₁₀O',
  structures: [{ caption: 'butan-2-ol', svg: '<svg width="1"></svg>' }],
  facts: [['molar mass, computed', '74.12 g/mol']],
  remarks: ['The name leaves 2 stereoisomers open: R; S.'],
  fields: [['bp', ['99 °C']]],
  findings: [
    {
      severity: 'warning',
      check: 'stereo-unspecified',
      message: 'Which one?',
      line: 5,
      source: { before: 'name: ', marked: 'butan-2-ol', after: '' },
    },
  ],
  accepted: [{ check: 'formula-only', reason: 'bought so' }],
};

function page(more: Partial<ReportEntry> = {}, report: Partial<Report> = {}): string {
  return reportPage({
    title: 'lab',
    date: '2026-03-02',
    version: '1.0.0',
    summary: { files: 1, compounds: 1, reactions: 0, errors: 0, warnings: 1, informations: 0 },
    files: [{ path: 'a.md', entries: [{ ...entry, ...more }], findings: [] }],
    problems: [],
    ...report,
  });
}

describe('the page for the reviewer', () => {
  it('shows every part of an entry', () => {
    const html = page();
    for (const part of [
      'a.md',
      '>4<',
      'butan-2-ol',
      'C₄H₁₀O',
      '<svg',
      '74.12 g/mol',
      '99 °C',
      'Which one?',
      'bought so',
    ]) {
      expect(html).toContain(part);
    }
    expect(html).toContain('name: <mark>butan-2-ol</mark>');
  });

  it('allows its own style and nothing else', () => {
    const html = page();
    const style = /<style>([\s\S]*?)<\/style>/.exec(html)![1]!;
    const hash = createHash('sha256').update(style).digest('base64');
    expect(html).toContain(`content="default-src 'none'; style-src 'sha256-${hash}'"`);
    expect(html).not.toMatch(/<script|\sstyle=|\son\w+=|https?:\/\//);
  });

  it('escapes every text of the notebook', () => {
    const evil = '"><img src=x onerror=alert(1)><script>\'&';
    const html = page(
      {
        label: evil,
        heading: evil,
        formula: evil,
        structures: [{ caption: evil, svg: null }],
        facts: [[evil, evil]],
        remarks: [evil],
        fields: [[evil, [evil, evil]]],
        findings: [
          {
            ...entry.findings[0]!,
            check: evil,
            message: evil,
            source: { before: evil, marked: evil, after: evil },
          },
        ],
        accepted: [{ check: evil, reason: evil }],
      },
      { title: evil, problems: [evil] },
    );
    expect(html).not.toContain('<img');
    expect(html).not.toContain('<script');
    // No tag that the page would not have with harmless texts.
    const tags = (text: string) => [...text.matchAll(/<\/?([a-z0-9]+)/g)].map((tag) => tag[1]);
    const usual = new Set([...tags(page()), 'figcaption']);
    expect(tags(html).filter((tag) => !usual.has(tag))).toEqual([]);
  });

  it('says that nothing was found where that is so', () => {
    expect(page({ findings: [] })).toContain('Nothing found.');
  });
});

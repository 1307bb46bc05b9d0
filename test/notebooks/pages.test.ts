/**
 * Whole pages with the findings that they must give, and no others. After a block stands one comment for each finding:
 *
 *     <!-- expect formula-mismatch error: O3 -->
 *
 * check, severity, and the characters underlined; `@2` after the severity means their second occurrence in the block,
 * and `⏎` stands for a line break. Each page is read twice, with both kinds of line ends.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import type { Finding } from '../../server/checks/finding.ts';
import { findingsWithToolkit } from '../support/analyse-text.ts';
import { readDocument } from '../support/read-document.ts';

const marker =
  /<!-- expect (?<check>[a-z-]+) (?<severity>error|warning|information)(?: @(?<nth>\d+))?: (?<text>.*?) -->/g;

interface Expected {
  readonly check: string;
  readonly severity: string;
  readonly start: number;
  readonly end: number;
}

function expectedIn(page: string, lineEnd: string): Expected[] {
  const blocks = readDocument(page).entries.map((entry) => entry.block.range);
  return [...page.matchAll(marker)].map((match) => {
    const { check, severity, nth, text } = match.groups as Record<string, string>;
    const block = blocks.filter((each) => each.end <= match.index).at(-1);
    if (block === undefined) throw new Error(`no block before ${match[0]}`);
    const underlined = text!.replaceAll('⏎', lineEnd);
    let start = block.start - 1;
    for (let count = Number(nth ?? 1); count > 0; count--) start = page.indexOf(underlined, start + 1);
    if (start < block.start || start + underlined.length > block.end) {
      throw new Error(`${JSON.stringify(underlined)} does not stand in the block before ${match[0]}`);
    }
    return { check: check!, severity: severity!, start, end: start + underlined.length };
  });
}

function shown(page: string, { check, severity, start, end }: Expected): string {
  const line = page.slice(0, start).split('\n').length;
  return `${line}: ${check} ${severity} ${start}–${end} ${JSON.stringify(page.slice(start, end))}`;
}

const flat = ({ check, severity, range }: Finding): Expected => ({ check, severity, ...range });

const pages = readdirSync(import.meta.dirname).filter((name) => name.endsWith('.md'));

describe.each(pages)('%s', (name) => {
  test.each([
    ['line feed', '\n'],
    ['carriage return and line feed', '\r\n'],
  ])('line ends: %s', async (_kind, lineEnd) => {
    const page = readFileSync(join(import.meta.dirname, name), 'utf8').replaceAll('\n', lineEnd);
    const findings = await findingsWithToolkit(page);
    const found = findings.map((finding) => shown(page, flat(finding)));
    const expected = expectedIn(page, lineEnd).map((each) => shown(page, each));
    expect([...found].sort()).toEqual([...expected].sort());
    expect(findings.map((finding) => finding.range.start)).toEqual(
      findings.map((finding) => finding.range.start).sort((a, b) => a - b),
    );
    for (const finding of findings) {
      expect(finding.message).toMatch(/[.?!]$/);
      expect(finding.message).not.toMatch(/undefined|NaN|\[object|null/);
    }
  });
});

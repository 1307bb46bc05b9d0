/** What the documentation of each check promises: bad examples are reported by it, good ones are not. */
import { describe, expect, test } from 'vitest';
import { checks } from '../../../server/checks/index.ts';
import { findingsWithToolkit } from '../../support/analyse-text.ts';

describe.each(checks.map((check) => [check.id, check.examples] as const))('%s', (id, { bad, good }) => {
  test.each(bad)('reports %j', async (page) => {
    const findings = await findingsWithToolkit(page);
    expect(findings.map((finding) => finding.check)).toContain(id);
    for (const { range } of findings) {
      expect(range.start).toBeGreaterThanOrEqual(0);
      expect(range.end).toBeLessThanOrEqual(page.length);
    }
  });

  test.each(good)('does not report %j', async (page) => {
    const findings = await findingsWithToolkit(page);
    expect(findings.filter((finding) => finding.check === id)).toEqual([]);
  });
});

/** The list of checks is the folder, and every check says what a reader needs to know of it. */
import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it, test } from 'vitest';
import { explainCheck } from '../../../server/checks/explain.ts';
import type { Check } from '../../../server/checks/finding.ts';
import { checks } from '../../../server/checks/index.ts';
import { settingsSchema } from '../../../server/checks/settings-schema.ts';

const folder = join(import.meta.dirname, '..', '..', '..', 'server', 'checks');

test('the list is the folder: every module that exports a check is listed once, under its file name', async () => {
  const ids: string[] = [];
  for (const file of readdirSync(folder).filter((name) => name.endsWith('.ts'))) {
    const module = (await import(join(folder, file))) as { check?: Check };
    if (module.check === undefined) continue;
    expect(module.check.id).toBe(file.replace(/\.ts$/, ''));
    ids.push(module.check.id);
  }
  expect(checks.map((check) => check.id).sort()).toEqual(ids.sort());
});

describe.each(checks.map((check) => [check.id, check] as const))('%s', (id, check) => {
  it('is documented in whole sentences and has examples of both kinds', () => {
    expect(id).toMatch(/^[a-z]+(-[a-z]+)*$/);
    for (const text of [check.summary, check.why, check.action]) expect(text).toMatch(/^\S.{20,}[.]$/s);
    expect(check.source.length).toBeGreaterThan(10);
    expect(check.examples.bad.length).toBeGreaterThan(0);
    expect(check.examples.good.length).toBeGreaterThan(0);
  });

  it('is explained with its example, and can be set in isonym.json', () => {
    const text = explainCheck(id)!;
    for (const part of [check.summary, check.why, check.action, check.source, check.examples.bad[0]!]) {
      expect(text).toContain(part);
    }
    const levels = (settingsSchema.properties.severity.properties as Record<string, { enum: string[] }>)[id];
    expect(levels?.enum).toEqual(['error', 'warning', 'information', 'off']);
  });
});

test('there is no explanation of a check that does not exist', () => {
  expect(explainCheck('no-such-check')).toBeUndefined();
});

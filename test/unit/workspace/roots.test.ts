import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Roots } from '../../../server/workspace/roots.ts';

let base = '';
beforeAll(() => {
  base = mkdtempSync(join(tmpdir(), 'isonym-roots-'));
  mkdirSync(join(base, 'repo/.git'), { recursive: true });
  mkdirSync(join(base, 'repo/lab/2026/may'), { recursive: true });
  mkdirSync(join(base, 'repo/other'), { recursive: true });
  writeFileSync(join(base, 'repo/lab/isonym.json'), '{}');
});
afterAll(() => {
  rmSync(base, { recursive: true, force: true });
});

describe('the root of a notebook', () => {
  it('is where the settings are, else the repository, else unknown', () => {
    const roots = new Roots();
    expect(roots.rootOf(join(base, 'repo/lab/2026/may'))).toBe(join(base, 'repo/lab'));
    expect(roots.rootOf(join(base, 'repo/lab'))).toBe(join(base, 'repo/lab'));
    expect(roots.rootOf(join(base, 'repo/other'))).toBe(join(base, 'repo'));
    expect(roots.settingsFolder(join(base, 'repo/other'))).toBeUndefined();
    expect(roots.rootOf(base)).toBeUndefined();
  });

  it('sees settings that came later once it was told to look again', () => {
    const roots = new Roots();
    const folder = join(base, 'repo/other');
    expect(roots.settingsFolder(folder)).toBeUndefined();
    writeFileSync(join(folder, 'isonym.json'), '{}');
    expect(roots.settingsFolder(folder)).toBeUndefined();
    roots.clear();
    expect(roots.settingsFolder(folder)).toBe(folder);
  });
});

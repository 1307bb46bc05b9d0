/** The import rule of the house holds, and bites: each forbidden import below must be reported. */
import { ESLint } from 'eslint';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';

const root = join(import.meta.dirname, '..', '..');
const eslint = new ESLint({ cwd: root });

async function rulesBrokenBy(path: string, code: string): Promise<string[]> {
  const [result] = await eslint.lintText(code, { filePath: join(root, path) });
  return (result?.messages ?? []).map((message) => message.ruleId ?? message.message);
}

const roomRule = 'import-x/no-restricted-paths';

describe('a room may import only from the rooms below it', () => {
  test.each([
    ['server/chemistry/structure/molecule.ts', "export * from '../../notebook/model.ts';\n"],
    ['server/chemistry/composition/composition.ts', "export * from '../structure/molecule.ts';\n"],
    ['server/chemistry/structure/molecule.ts', "export * from '../nomenclature/reading.ts';\n"],
    ['server/notebook/model.ts', "export * from '../checks/finding.ts';\n"],
    ['server/checks/finding.ts', "export * from '../toolkit/toolkit.ts';\n"],
    ['server/toolkit/toolkit.ts', "export * from '../checks/finding.ts';\n"],
    ['client/extension.ts', "export * from '../server/checks/finding.ts';\n"],
    ['server/checks/finding.ts', "export * from '../../test/tidy/rooms.test.ts';\n"],
  ])('%s: %s', async (path, code) => {
    expect(await rulesBrokenBy(path, code)).toContain(roomRule);
  });

  test('an import from a room below is fine', async () => {
    expect(
      await rulesBrokenBy('server/notebook/model.ts', "export * from '../chemistry/text.ts';\n"),
    ).toEqual([]);
  });
});

describe('pure rooms have no I/O, protocol, clock or chance', () => {
  test.each([
    ['server/chemistry/text.ts', "export * from 'node:fs';\n", 'no-restricted-imports'],
    ['server/checks/finding.ts', "export * from 'vscode-languageserver';\n", 'no-restricted-imports'],
    ['server/notebook/model.ts', 'export const now = Date.now();\n', 'no-restricted-properties'],
    ['server/chemistry/text.ts', 'export const chance = Math.random();\n', 'no-restricted-properties'],
    ['server/chemistry/text.ts', "console.log('here');\n", 'no-console'],
  ])('%s: %s', async (path, code, rule) => {
    expect(await rulesBrokenBy(path, code)).toContain(rule);
  });
});

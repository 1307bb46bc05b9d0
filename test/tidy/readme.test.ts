/** The table of checks in the README is the list of the product; `UPDATE=1 npx vitest run test/tidy` rewrites it. */
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { checks } from '../../server/checks/index.ts';

const file = join(import.meta.dirname, '..', '..', 'README.md');
const opening = '<!-- checks -->';
const closing = '<!-- /checks -->';

function table(): string {
  const rows = checks.map(({ id, severity, summary }) => `| \`${id}\` | ${severity} | ${summary} |`);
  return ['| check | severity | finds |', '| --- | --- | --- |', ...rows].join('\n');
}

test('the README lists the checks as they are', () => {
  const text = readFileSync(file, 'utf8');
  const start = text.indexOf(opening) + opening.length;
  const end = text.indexOf(closing);
  const updated = `${text.slice(0, start)}\n\n${table()}\n\n${text.slice(end)}`;
  if (process.env['UPDATE'] === '1') writeFileSync(file, updated);
  else expect(text).toBe(updated);
});

/** The map in DEVELOPERS.md and the folders agree, and every file says at its head what it is for. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';

const root = join(import.meta.dirname, '..', '..');

function filesUnder(folder: string): string[] {
  return readdirSync(join(root, folder), { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && entry.name.endsWith('.ts'))
    .map((entry) => join(entry.parentPath, entry.name));
}

function foldersUnder(folder: string): string[] {
  return readdirSync(join(root, folder), { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map((entry) => `${folder}/${entry.name}`);
}

test('every room stands on the map, and the map names no room that is gone', () => {
  const map = readFileSync(join(root, 'DEVELOPERS.md'), 'utf8');
  const named = [...map.matchAll(/^\| `((?:server|client|syntaxes|test)[^`]*)`/gm)].map((match) =>
    match[1]!.replace(/\/$/, ''),
  );
  const rooms = [
    'client',
    'syntaxes',
    ...foldersUnder('server').filter((room) => room !== 'server/chemistry'),
    ...foldersUnder('server/chemistry'),
    ...foldersUnder('test'),
  ];
  expect([...named].sort()).toEqual([...rooms].sort());
});

test('every source file opens with what it is for', () => {
  const bare = [...filesUnder('server'), ...filesUnder('client')].filter((file) => {
    const text = readFileSync(file, 'utf8').replace(/^#!.*\n/, '');
    return !text.startsWith('/**') && !text.startsWith('// ');
  });
  expect(bare.map((file) => file.slice(root.length + 1))).toEqual([]);
});

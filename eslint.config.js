// What the compiler cannot see: which room may import which, and habits that have cost us bugs.
import js from '@eslint/js';
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript';
import importX from 'eslint-plugin-import-x';
import tseslint from 'typescript-eslint';

/** Each room may import from itself and from the rooms listed; everything else of ours is closed to it. */
export const rooms = {
  'server/chemistry': [],
  'server/notebook': ['server/chemistry'],
  'server/toolkit': ['server/chemistry'],
  'server/checks': ['server/chemistry', 'server/notebook'],
  'server/workspace': ['server/chemistry', 'server/notebook', 'server/checks', 'server/toolkit'],
  'server/language': [
    'server/chemistry',
    'server/notebook',
    'server/checks',
    'server/workspace',
    'server/toolkit',
  ],
  'server/cli': [
    'server/chemistry',
    'server/notebook',
    'server/checks',
    'server/workspace',
    'server/toolkit',
  ],
  client: [],
};

/** Inside chemistry the folders depend on each other in this order only. */
export const chemistryRooms = {
  composition: [],
  structure: ['composition'],
  nomenclature: ['composition', 'structure'],
};

/**
 * The plugin wants to be told what is forbidden: for every room, each room that it must not reach.
 */
function forbiddenZones(allowed, prefix) {
  const names = Object.keys(allowed);
  return names.flatMap((room) =>
    names
      .filter((other) => other !== room && !allowed[room].includes(other))
      .map((other) => ({
        target: `./${prefix}${room}`,
        from: `./${prefix}${other}`,
        message: `${prefix}${room} must not import from ${prefix}${other}; see the map in DEVELOPERS.md.`,
      })),
  );
}
const pureRooms = ['server/chemistry/**/*.ts', 'server/notebook/**/*.ts', 'server/checks/**/*.ts'];

export default tseslint.config(
  { ignores: ['dist', '.cache', 'node_modules'] },
  js.configs.recommended,
  ...tseslint.configs.strict,
  {
    files: ['**/*.ts'],
    plugins: { 'import-x': importX },
    settings: { 'import-x/resolver-next': [createTypeScriptImportResolver({ project: './tsconfig.json' })] },
    rules: {
      'import-x/no-restricted-paths': [
        'error',
        {
          zones: [
            ...forbiddenZones(rooms, ''),
            ...forbiddenZones(chemistryRooms, 'server/chemistry/'),
            { target: './server', from: './test', message: 'The product never imports its tests.' },
          ],
        },
      ],
      'import-x/no-cycle': ['error', { ignoreExternal: true }],
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/consistent-type-imports': 'error',
      'no-console': 'error',
      eqeqeq: 'error',
    },
  },
  {
    // Pure rooms: no protocol, editor, file system, clock or randomness.
    files: pureRooms,
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              group: ['node:*', 'fs', 'path', 'vscode', 'vscode-*', '@rdkit/*'],
              message: 'This room is pure: no I/O, no protocol.',
            },
          ],
        },
      ],
      'no-restricted-globals': ['error', 'process', 'setTimeout', 'setInterval', 'fetch', 'performance'],
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: 'Effort is bounded by counted steps, never by a clock.' },
        { object: 'Math', property: 'random', message: 'Same input, same findings.' },
      ],
    },
  },
  { files: ['test/**/*.ts', 'server/cli/**/*.ts'], rules: { 'no-console': 'off' } },
  {
    files: ['**/*.mjs', '*.js'],
    languageOptions: {
      globals: {
        console: 'readonly',
        process: 'readonly',
        URL: 'readonly',
        Buffer: 'readonly',
        setTimeout: 'readonly',
        clearTimeout: 'readonly',
        fetch: 'readonly',
      },
    },
  },
);

// The tests run inside the editor's extension host, which reads CommonJS: one file, made from all test files.
import { build } from 'esbuild';
import { readdirSync } from 'node:fs';
import { root, suiteFile } from './paths.mjs';
import { join } from 'node:path';

const suiteFolder = join(root, 'test', 'editor', 'suite');

export async function bundleSuite() {
  const files = readdirSync(suiteFolder)
    .filter((name) => name.endsWith('.test.ts'))
    .sort();
  const imports = files.map((name) => `() => import('./${name}')`);
  await build({
    absWorkingDir: root,
    stdin: {
      contents: `import { runMocha } from './run.ts';\nexport const run = () => runMocha([${imports.join(', ')}]);\n`,
      resolveDir: suiteFolder,
      loader: 'ts',
    },
    outfile: suiteFile,
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'cjs',
    // Mocha finds its own files relative to itself.
    external: ['vscode', 'mocha'],
    sourcemap: 'inline',
    logLevel: 'warning',
  });
  return suiteFile;
}

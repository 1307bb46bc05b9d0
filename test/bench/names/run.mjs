// `npm run bench:names -- FAILURES TABLE…`: reads tables of name and SMILES with a heading line and prints how many names
// were read rightly. FAILURES is a file for the rest, `-` for none.
import { build } from 'esbuild';
import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const here = fileURLToPath(new URL('.', import.meta.url));
const root = join(here, '..', '..', '..');
const outfile = join(root, '.cache', 'bench', 'names-table.mjs');
if (process.argv.length < 4) {
  console.error('Usage: npm run bench:names -- FAILURES TABLE…');
  process.exit(2);
}
await build({
  absWorkingDir: root,
  entryPoints: [join(here, 'table.ts')],
  outfile,
  bundle: true,
  platform: 'node',
  format: 'esm',
  packages: 'external',
  logLevel: 'warning',
});
process.exitCode =
  spawnSync(process.execPath, [outfile, ...process.argv.slice(2)], { stdio: 'inherit' }).status ?? 1;

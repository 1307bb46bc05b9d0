// `npm run bench [NAME…]`: bundles each bench and runs it in a process of its own. Prints medians and ratios within one
// run; nothing here is asserted, because machines differ.
import { build } from 'esbuild';
import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const here = fileURLToPath(new URL('.', import.meta.url));
const root = join(here, '..', '..');
const asked = process.argv.slice(2);
if (!existsSync(join(root, 'dist', 'server.js')))
  spawnSync(process.execPath, ['esbuild.mjs'], { cwd: root, stdio: 'inherit' });
console.log('All benches take about a minute.');
for (const file of readdirSync(here).filter((name) => name.endsWith('.bench.ts'))) {
  const name = file.replace('.bench.ts', '');
  if (asked.length > 0 && !asked.includes(name)) continue;
  const outfile = join(root, '.cache', 'bench', `${name}.mjs`);
  await build({
    absWorkingDir: root,
    entryPoints: [join(here, file)],
    outfile,
    bundle: true,
    platform: 'node',
    format: 'esm',
    packages: 'external',
    logLevel: 'warning',
  });
  console.log(`\n== ${name}`);
  spawnSync(process.execPath, [outfile], { cwd: root, stdio: 'inherit' });
}

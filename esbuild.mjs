// Bundles the parts that ship: the editor's client, the server, the command, and the toolkit's worker thread, and
// lays RDKit's WebAssembly build beside them. `--watch` rebuilds on every change.
import { build, context } from 'esbuild';
import { chmodSync, copyFileSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const here = dirname(fileURLToPath(import.meta.url));
const watch = process.argv.includes('--watch');
const out = join(here, 'dist');

const shared = {
  absWorkingDir: here,
  bundle: true,
  platform: 'node',
  target: 'node20',
  minify: !watch,
  sourcemap: watch ? 'inline' : false,
  legalComments: 'linked',
  logLevel: 'warning',
};

// CommonJS packages inside an ESM bundle still call `require` for Node's own modules.
const requireForBundledPackages = {
  js: "import { createRequire as isonymCreateRequire } from 'node:module'; const require = isonymCreateRequire(import.meta.url);",
};

const bundles = [
  // The editor loads its extensions as CommonJS.
  {
    ...shared,
    entryPoints: ['client/extension.ts'],
    outfile: 'dist/client.cjs',
    format: 'cjs',
    external: ['vscode'],
  },
  // One file, so that a server start reads one file.
  {
    ...shared,
    entryPoints: { server: 'server/language/main-node.ts' },
    outdir: 'dist',
    format: 'esm',
    banner: requireForBundledPackages,
  },
  {
    ...shared,
    entryPoints: { 'toolkit-worker': 'server/toolkit/worker.ts' },
    outdir: 'dist',
    format: 'esm',
    banner: requireForBundledPackages,
  },
  // Split, so that `isonym --version` does not read the chemistry.
  {
    ...shared,
    entryPoints: { isonym: 'server/cli/main.ts' },
    outdir: 'dist',
    format: 'esm',
    splitting: true,
    chunkNames: 'command/[name]-[hash]',
    banner: requireForBundledPackages,
  },
];

function layToolkit() {
  const packageFolder = dirname(createRequire(import.meta.url).resolve('@rdkit/rdkit'));
  mkdirSync(join(out, 'rdkit'), { recursive: true });
  for (const file of ['RDKit_minimal.js', 'RDKit_minimal.wasm']) {
    copyFileSync(join(packageFolder, file), join(out, 'rdkit', file));
  }
  // Our package is ESM, RDKit's loader is CommonJS; this says so to Node.
  writeFileSync(join(out, 'rdkit', 'package.json'), '{ "type": "commonjs" }\n');
}

rmSync(out, { recursive: true, force: true });
layToolkit();
if (watch) {
  for (const options of bundles) await (await context(options)).watch();
} else {
  await Promise.all(bundles.map((options) => build(options)));
  chmodSync(join(out, 'isonym.js'), 0o755);
}

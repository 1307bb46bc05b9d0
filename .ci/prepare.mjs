// Makes a fresh clone ready: installs what the lock file names and builds. Uses nothing that is not in Node itself,
// because it runs before anything is installed.
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('..', import.meta.url));

/** Runs a command with its output on ours and returns its exit code. */
export function run(command, args, options = {}) {
  const done = spawnSync(command, args, {
    cwd: root,
    stdio: 'inherit',
    shell: process.platform === 'win32',
    ...options,
  });
  return done.status ?? 1;
}

function install() {
  const lockFile = readFileSync(new URL('../package-lock.json', import.meta.url));
  const wanted = createHash('sha256').update(lockFile).digest('hex');
  const stamp = new URL('../node_modules/.isonym-lock', import.meta.url);
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return;
  console.log('Installing dependencies (about 20 seconds on a good line, 300 MB) …');
  // No package here needs its install script, and a script that nobody runs cannot surprise anybody.
  const code = run('npm', ['ci', '--ignore-scripts', '--no-audit', '--no-fund', '--loglevel=error']);
  if (code !== 0) {
    console.error('npm ci failed; nothing else can run without the dependencies.');
    process.exit(2);
  }
  writeFileSync(stamp, wanted);
}

function build() {
  console.log('Building (about 2 seconds) …');
  if (run(process.execPath, ['esbuild.mjs']) !== 0) {
    console.error('The build failed.');
    process.exit(2);
  }
}

/** Installs what is missing, then builds. Ends the process with 2 when either fails. */
export function prepare() {
  const [major] = process.versions.node.split('.').map(Number);
  if (major < 20) {
    console.error(`Isonym needs Node 20 or later; this is ${process.version}.`);
    process.exit(2);
  }
  install();
  build();
}

// `npm test`: prepares a fresh clone, runs every suite, and ends with one line that counts them all.
// `npm test -- unit` and the like run single suites; `npm test -- --fast` leaves the editor out.
import { spawn } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { prepare, root } from '../.ci/prepare.mjs';

const node = process.execPath;
const bin = (name) => join(root, 'node_modules', name);
const vitestReport = join(root, '.cache', 'vitest.json');

/** Runs a command, showing its output, and returns its exit code and what it printed. */
function run(command, args) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd: root, stdio: ['ignore', 'pipe', 'pipe'] });
    let printed = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream.on('data', (chunk) => {
        printed += chunk;
        process.stdout.write(chunk);
      });
    }
    child.on('error', (error) => resolve({ code: 1, printed: String(error) }));
    child.on('close', (code) => resolve({ code: code ?? 1, printed }));
  });
}

/** A tool that either finds nothing or fails counts as one test. */
const oneTest = (command, args) => async () => {
  const { code } = await run(command, args);
  return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
};

async function vitest() {
  mkdirSync(join(root, '.cache'), { recursive: true });
  rmSync(vitestReport, { force: true });
  const { code } = await run(node, [
    bin('vitest/vitest.mjs'),
    'run',
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${vitestReport}`,
  ]);
  try {
    const report = JSON.parse(readFileSync(vitestReport, 'utf8'));
    const failed = report.numFailedTests + (report.numFailedTests === 0 && code !== 0 ? 1 : 0);
    return { passed: report.numPassedTests, failed };
  } catch {
    return { passed: 0, failed: 1 };
  }
}

async function editor() {
  const { code, printed } = await run(node, ['test/editor/run.mjs']);
  const counts = [...printed.matchAll(/^(\d+) passed, (\d+) failed$/gm)].at(-1);
  if (!counts) return { passed: 0, failed: 1 };
  const failed = Number(counts[2]);
  return { passed: Number(counts[1]), failed: failed === 0 && code !== 0 ? 1 : failed };
}

const suites = {
  types: { title: 'Types', run: oneTest(node, [bin('typescript/bin/tsc'), '-p', '.']) },
  lint: {
    title: 'Import rules and habits',
    run: oneTest(node, [bin('eslint/bin/eslint.js'), '.', '--max-warnings=0']),
  },
  format: {
    title: 'Format',
    run: oneTest(node, [bin('prettier/bin/prettier.cjs'), '--check', '--log-level=warn', '.']),
  },
  unit: { title: 'Unit, conformance, notebook and protocol suites', run: vitest },
  editor: { title: 'Real editor', run: editor },
};

const asked = process.argv.slice(2).filter((word) => word in suites);
const fast = process.argv.includes('--fast');
const chosen = Object.keys(suites).filter((name) =>
  asked.length > 0 ? asked.includes(name) : !(fast && name === 'editor'),
);

console.log('All suites take about five minutes, the first time a minute more to fetch an editor.');
prepare();
const total = { passed: 0, failed: 0 };
for (const name of chosen) {
  console.log(`\n== ${suites[name].title}`);
  const result = await suites[name].run();
  total.passed += result.passed;
  total.failed += result.failed;
  if (result.failed > 0) console.log(`== ${suites[name].title}: ${result.failed} failed`);
}
console.log(`\n${total.passed} passed, ${total.failed} failed`);
process.exitCode = total.failed === 0 ? 0 : 1;

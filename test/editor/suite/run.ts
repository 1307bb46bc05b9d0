/**
 * Runs Mocha inside the extension host. Its lines go through the editor's own log, in the middle of everything else
 * that is logged there, so each of ours begins with a mark.
 */
import type {} from 'mocha';

/** Also known to the harness that reads the log. */
const mark = '§ ';

function say(line: string): void {
  console.log(mark + line);
}

/** Loads the test files and runs what they declare. Rejects when a test fails, which the editor reports as 1. */
export async function runMocha(files: readonly (() => Promise<unknown>)[]): Promise<void> {
  const { default: Mocha } = await import('mocha');
  /** The lines below are the report. */
  class Silent extends Mocha.reporters.Base {}
  const mocha = new Mocha({ ui: 'tdd', timeout: 60_000, reporter: Silent });
  mocha.suite.emit('pre-require', globalThis, '', mocha);
  for (const load of files) await load();

  const failures = await new Promise<number>((resolve) => {
    const runner = mocha.run(resolve);
    let passed = 0;
    runner.on('pass', (test) => {
      passed += 1;
      say(`✓ ${test.titlePath().join(': ')} (${test.duration ?? 0} ms)`);
    });
    runner.on('fail', (test, error: unknown) => {
      say(`✗ ${test.titlePath().join(': ')}`);
      const text = error instanceof Error ? (error.stack ?? error.message) : String(error);
      for (const line of text.split('\n')) say(`    ${line}`);
    });
    runner.on('end', () => {
      say(`COUNT ${passed} ${runner.failures}`);
    });
  });
  if (failures > 0) throw new Error(`${failures} failed`);
}

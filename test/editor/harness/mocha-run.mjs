// Runs the bundled suite inside the extension host of a workbench page and prints its lines.
import { suiteFile } from './paths.mjs';
import { within } from './processes.mjs';

/** What the suite puts before its own lines; see suite/run.ts. */
const mark = '§ ';
const limitMs = 240_000;

/** Counts the lines of a suite and prints them as they come. */
export class SuiteLog {
  passed = 0;
  failed = 0;
  ended = false;

  read(line) {
    if (!line.startsWith(mark)) return;
    const text = line.slice(mark.length);
    const count = /^COUNT (\d+) (\d+)$/.exec(text);
    if (count) {
      this.passed = Number(count[1]);
      this.failed = Number(count[2]);
      this.ended = true;
    } else {
      console.log(`  ${text}`);
    }
  }

  /** A suite that broke off before its end counts as a failure. */
  result() {
    return { passed: this.passed, failed: this.ended ? this.failed : this.failed + 1 };
  }
}

export async function runMochaInBrowser(browser, workbench, extension, folder) {
  const page = await browser.newPage({ viewport: { width: 1280, height: 900 } });
  const log = new SuiteLog();
  const everything = [];
  const exit = new Promise((resolve) => {
    page.on('crash', () => resolve('the page crashed'));
    void page.exposeFunction('codeAutomationLog', (_type, args) => {
      const text = args.map(String).join(' ');
      everything.push(text);
      for (const line of text.split('\n')) log.read(line);
    });
    void page.exposeFunction('codeAutomationExit', (code) => resolve(code));
  });
  try {
    await page.goto(
      workbench.urlOf(folder, {
        extensionDevelopmentPath: workbench.uriOf(extension),
        extensionTestsPath: workbench.uriOf(suiteFile),
        enableProposedApi: '',
      }),
    );
    const code = await within(limitMs, 'The suite in the editor', exit);
    if (!log.ended)
      console.log(`  The suite did not run to its end (${code}).\n${everything.slice(-20).join('\n')}`);
  } catch (error) {
    console.log(`  ${error.message}\n${everything.slice(-20).join('\n')}`);
  } finally {
    await page.close();
  }
  return log.result();
}

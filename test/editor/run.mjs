// `node test/editor/run.mjs`: the built extension in a real VS Code in a real browser. Builds nothing but its own
// tests: `dist/` must be there. Ends with `N passed, N failed`.
import { existsSync } from 'node:fs';
import { copyFile } from 'node:fs/promises';
import { join, relative } from 'node:path';
import { launchBrowser } from './harness/chromium.mjs';
import { installEditor } from './harness/install.mjs';
import { checkLooks } from './harness/looks.mjs';
import { runMochaInBrowser } from './harness/mocha-run.mjs';
import { checkPackage } from './harness/package-run.mjs';
import { root, screenshotFolder } from './harness/paths.mjs';
import { endAll, within } from './harness/processes.mjs';
import { bundleSuite } from './harness/suite-bundle.mjs';
import { Tally } from './harness/tally.mjs';
import { extensionFolder, Workbench, workspaceCopy } from './harness/workbench.mjs';

const limitMs = 600_000;
const notebook = join(root, 'examples', 'linden-row');
const page = 'look.md';

const tally = new Tally();

async function everything() {
  for (const file of ['client.cjs', 'server.js']) {
    if (!existsSync(join(root, 'dist', file))) throw new Error(`dist/${file} is missing: npm run build`);
  }
  const editor = installEditor();
  const [browser] = await Promise.all([launchBrowser(), bundleSuite()]);
  // A copy for each run: what one of them left unsaved would be on the screen of the next.
  const freshNotebook = async () => {
    const folder = workspaceCopy(notebook);
    await copyFile(join(root, 'test', 'editor', 'fixtures', page), join(folder, page));
    return folder;
  };

  console.log(`Starting VS Code 1.100.3 in ${browser.browserType().name()} ${browser.version()} …`);
  const workbench = await Workbench.start(editor);
  const extension = extensionFolder();
  const inside = await runMochaInBrowser(browser, workbench, extension, await freshNotebook());
  tally.passed += inside.passed;
  tally.failed += inside.failed;
  await checkLooks(tally, browser, workbench, extension, await freshNotebook(), page);
  await workbench.stop();
  await checkPackage(tally, browser, editor, await freshNotebook(), page);
  console.log(`Screenshots are in ${relative(process.cwd(), screenshotFolder)}.`);
}

const begun = Date.now();
try {
  await within(limitMs, 'The editor suite', everything());
} catch (error) {
  tally.failed += 1;
  // Our own words need no stack; a mistake in the harness does.
  console.log(`  ✗ ${error.constructor === Error ? error.message : error.stack}`);
}
await endAll();
console.log(`The editor suite took ${((Date.now() - begun) / 1000).toFixed(0)} s.`);
console.log(`${tally.passed} passed, ${tally.failed} failed`);
process.exit(tally.failed === 0 ? 0 : 1);

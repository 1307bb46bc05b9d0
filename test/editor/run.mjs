// `node test/editor/run.mjs`: the built extension in a real VS Code in a real browser. Expects `dist/`.
import { existsSync, mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { launchBrowser } from './harness/chromium.mjs';
import { installEditor } from './harness/install.mjs';
import { runMochaInBrowser } from './harness/mocha-run.mjs';
import { cache, root } from './harness/paths.mjs';
import { endAll } from './harness/processes.mjs';
import { bundleSuite } from './harness/suite-bundle.mjs';
import { Workbench, workspaceCopy } from './harness/workbench.mjs';

const total = { passed: 0, failed: 0 };
function add({ passed, failed }) {
  total.passed += passed;
  total.failed += failed;
}

async function everything() {
  if (!existsSync(join(root, 'dist', 'client.cjs')))
    throw new Error('dist/ is missing; run `npm run build`.');
  mkdirSync(cache, { recursive: true });
  const editor = installEditor();
  await bundleSuite();
  const browser = await launchBrowser();
  const workbench = await Workbench.start(editor);
  const t = Date.now();
  add(await runMochaInBrowser(browser, workbench, workspaceCopy(join(root, 'test/editor/fixtures'))));
  console.log(Date.now() - t);
}

try {
  await everything();
} catch (error) {
  console.log(`✗ ${error.message}`);
  total.failed += 1;
} finally {
  await endAll();
}
console.log(`${total.passed} passed, ${total.failed} failed`);
process.exit(total.failed === 0 ? 0 : 1);

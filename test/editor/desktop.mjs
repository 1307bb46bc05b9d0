// `npm run test:desktop`: the same tests as run.mjs runs inside the extension host, in a desktop VS Code that
// @vscode/test-electron downloads. Needs a display (on Linux: `xvfb-run -a npm run test:desktop`).
import { runTests } from '@vscode/test-electron';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './harness/paths.mjs';
import { bundleSuite } from './harness/suite-bundle.mjs';
import { scratchFolder, workspaceCopy } from './harness/workbench.mjs';

if (!existsSync(join(root, 'dist', 'client.cjs'))) {
  console.error('dist/ is missing: npm run build');
  process.exit(2);
}
const extensionTestsPath = await bundleSuite();
try {
  await runTests({
    version: process.env.VSCODE_VERSION ?? 'stable',
    extensionDevelopmentPath: root,
    extensionTestsPath,
    launchArgs: [
      workspaceCopy(join(root, 'examples', 'linden-row')),
      '--disable-extensions',
      '--disable-workspace-trust',
      `--user-data-dir=${scratchFolder('desktop')}`,
    ],
  });
} catch (error) {
  console.error(String(error));
  process.exitCode = 1;
}

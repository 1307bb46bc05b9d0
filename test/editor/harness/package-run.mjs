// What users get: the extension packed, installed into an editor that knows nothing of this repository, and used.
import { readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { openInWorkbench, restUntilDrawn, squiggleUnder } from './page.mjs';
import { cache, root } from './paths.mjs';
import { output } from './processes.mjs';
import { installExtension, scratchFolder, Workbench } from './workbench.mjs';

const limitBytes = 12_000_000;
const allowed =
  /^(?:dist\/|syntaxes\/|client\/icon\.png$|examples\/linden-row\/editor\.png$|README\.md$|readme\.md$|LICENSE\.txt$|package\.json$|\.vsixmanifest$)/;

function filesUnder(folder) {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name));
}

export async function checkPackage(tally, browser, editor, folder, file) {
  const vsix = join(cache, 'isonym.vsix');
  const extensionsFolder = scratchFolder('extensions');
  let installed;

  await tally.test('package: packs and installs', () => {
    output(
      process.execPath,
      [
        join(root, 'node_modules', '@vscode', 'vsce', 'vsce'),
        'package',
        '--no-dependencies',
        // Nothing in it is published anywhere that links could lead to.
        '--allow-missing-repository',
        '--no-rewrite-relative-links',
        '--out',
        vsix,
      ],
      { cwd: root },
    );
    installExtension(editor, vsix, extensionsFolder);
    installed = readdirSync(extensionsFolder).find((name) => name.startsWith('isonym.isonym-'));
    if (installed === undefined) throw new Error(`not among ${readdirSync(extensionsFolder).join(', ')}`);
  });
  if (installed === undefined) return;
  const home = join(extensionsFolder, installed);

  await tally.test('package: holds what runs and nothing else, under 12 MB', () => {
    const files = filesUnder(home);
    const strange = files.map((path) => path.slice(home.length + 1)).filter((path) => !allowed.test(path));
    if (strange.length > 0) throw new Error(`does not belong into the package: ${strange.join(', ')}`);
    const bytes = files.reduce((sum, path) => sum + statSync(path).size, 0);
    console.log(
      `    ${files.length} files, ${(bytes / 1e6).toFixed(1)} MB; packed ${(statSync(vsix).size / 1e6).toFixed(1)} MB`,
    );
    if (bytes > limitBytes) throw new Error(`${(bytes / 1e6).toFixed(1)} MB installed`);
  });

  await tally.test('package: finds the fifth bond of a carbon atom, and draws', async () => {
    const workbench = await Workbench.start(editor, { extensionsFolder });
    const page = await openInWorkbench(browser, workbench, folder, file);
    await squiggleUnder(page, 'CC(C)(C)(C)C', 1);
    await restUntilDrawn(page, 'COc1ccc(cc1)C(C)O');
    await page.close();
    await workbench.stop();
  });
}

// Fetches a real VS Code that runs without a display: the server build that one package of the npm registry
// carries. Nothing is compiled; two native modules that only write logs and watch a parent are stood in for.
import { createHash } from 'node:crypto';
import {
  copyFileSync,
  existsSync,
  mkdirSync,
  readFileSync,
  renameSync,
  rmSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { editorFolder } from './paths.mjs';
import { output } from './processes.mjs';

const editorPackage = {
  spec: 'code-server@4.100.3',
  sha512: 'q/Fh2DOxCRNhC/WiG/6sAhSKnj7ZACTVBaeeZ+rWjol//0FCbl/qg1ln5ecZ99jYcfqMxZZAyWcN+YBIo0DgpA==',
};

/** The editor's file search is a program of its own; without it every search in the workspace fails. */
const searchPackages = {
  'linux-x64': {
    spec: '@vscode/ripgrep-linux-x64@1.18.0',
    sha512: 'mQ3bVrUpnD2vs7QT0vX90Lt0cnUq467uFtEktIdsJJmW296RoSULRGqWgzG1AKxyBpNDD6l4ZO4qKf6SgyC23Q==',
  },
  'linux-arm64': {
    spec: '@vscode/ripgrep-linux-arm64@1.18.0',
    sha512: 'lQ/5zTG++U0E3IhVgS4EPTTn/U4okncaRMM5GOFfOYZywS4nuD31GhkHbNYlDk5CuDC68+hYJ0/eQeyCKJDA+g==',
  },
};

const here = dirname(fileURLToPath(import.meta.url));
const standIns = {
  'native-watchdog/index.js': 'native-watchdog.cjs',
  '@vscode/spdlog/index.js': 'spdlog.cjs',
};

/** Downloads a package through npm and unpacks part of it; refuses anything but the bytes that we know. */
function unpack({ spec, sha512 }, folder, part, strip) {
  const [{ filename }] = JSON.parse(output('npm', ['pack', '--json', spec], { cwd: folder }));
  const tarball = join(folder, filename);
  const found = createHash('sha512').update(readFileSync(tarball)).digest('base64');
  if (found !== sha512)
    throw new Error(`${spec} is not the package that was tested: its SHA-512 is ${found}`);
  output('tar', ['xzf', tarball, '-C', folder, `--strip-components=${strip}`, part]);
  rmSync(tarball);
}

/** Returns the folder of the editor's server. Does nothing when it is there already. */
export function installEditor() {
  const platform = `${process.platform}-${process.arch}`;
  const searchPackage = searchPackages[platform];
  if (searchPackage === undefined) {
    throw new Error(
      `The editor suite runs on ${Object.keys(searchPackages).join(' and ')}, and this is ${platform}. ` +
        '`npm run test:desktop` runs the same tests in a desktop editor.',
    );
  }
  const wanted = JSON.stringify([editorPackage.spec, searchPackage.spec, Object.keys(standIns)]);
  const stamp = join(editorFolder, 'isonym-stamp.json');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return editorFolder;

  console.log('Fetching VS Code (42 MB to download, 274 MB on disk, 10 to 30 seconds) …');
  const begun = Date.now();
  const fresh = `${editorFolder}.new`;
  rmSync(fresh, { recursive: true, force: true });
  mkdirSync(fresh, { recursive: true });
  unpack(editorPackage, fresh, 'package/lib/vscode', 3);
  // The package's own shrinkwrap says which versions; install scripts would want a compiler.
  output(
    'npm',
    ['install', '--omit=dev', '--ignore-scripts', '--no-audit', '--no-fund', '--loglevel=error'],
    {
      cwd: fresh,
    },
  );
  const modules = join(fresh, 'node_modules');
  symlinkSync('node_modules', join(fresh, 'node_modules.asar'));
  unpack(searchPackage, join(modules, '@vscode', 'ripgrep'), 'package/bin/rg', 1);
  for (const [module, standIn] of Object.entries(standIns)) {
    copyFileSync(join(here, 'stand-ins', standIn), join(modules, module));
  }
  writeFileSync(join(fresh, 'isonym-stamp.json'), wanted);
  rmSync(editorFolder, { recursive: true, force: true });
  renameSync(fresh, editorFolder);
  console.log(`VS Code is there, after ${((Date.now() - begun) / 1000).toFixed(0)} s.`);
  return editorFolder;
}

// The editor's server, and its workbench in a browser page.
import { cpSync, mkdirSync, mkdtempSync, openSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { root } from './paths.mjs';
import { end, output, start } from './processes.mjs';

const host = '127.0.0.1';
const startMs = 30_000;

/** What a run looks like has to depend on us alone: nothing pops up, nothing is fetched. */
const quietSettings = {
  'workbench.startupEditor': 'none',
  'workbench.tips.enabled': false,
  'workbench.enableExperiments': false,
  'workbench.secondarySideBar.defaultVisibility': 'hidden',
  'security.workspace.trust.enabled': false,
  'extensions.autoCheckUpdates': false,
  'extensions.ignoreRecommendations': true,
  'telemetry.telemetryLevel': 'off',
  'git.enabled': false,
  'editor.hover.delay': 50,
  'files.simpleDialog.enable': true,
  // The default saves after a second: pages would change on disk under the tests.
  'files.autoSave': 'off',
};

function freePort() {
  return new Promise((resolve, reject) => {
    const probe = createServer().once('error', reject);
    probe.listen(0, host, () => {
      const { port } = probe.address();
      probe.close(() => resolve(port));
    });
  });
}

const scratchFolders = new Set();
process.on('exit', () => {
  for (const folder of scratchFolders) rmSync(folder, { recursive: true, force: true, maxRetries: 3 });
});

/** A folder outside of the repository that is gone after the run. */
export function scratchFolder(name) {
  const folder = mkdtempSync(join(tmpdir(), `isonym-${name}-`));
  scratchFolders.add(folder);
  return folder;
}

/** Tests write into their notebook, so they get a copy. */
export function workspaceCopy(source) {
  const folder = join(scratchFolder('workspace'), 'notebook');
  cpSync(source, folder, { recursive: true });
  return folder;
}

/**
 * The extension as the editor is to load it. Not the repository itself: the editor lies in its cache folder, and an
 * editor that finds its own themes inside of the extension under development shows them whatever the settings say.
 */
export function extensionFolder() {
  const folder = scratchFolder('extension');
  for (const part of ['package.json', 'dist', 'syntaxes', 'client']) {
    symlinkSync(join(root, part), join(folder, part));
  }
  return folder;
}

export class Workbench {
  constructor(editor, dataFolder, port, child) {
    this.editor = editor;
    this.dataFolder = dataFolder;
    this.origin = `http://${host}:${port}`;
    this.authority = `${host}:${port}`;
    this.child = child;
  }

  /** @param extensionsFolder where packed extensions are installed; empty by default */
  static async start(editor, { extensionsFolder, settings = {} } = {}) {
    const dataFolder = scratchFolder('editor');
    const port = await freePort();
    const log = openSync(join(dataFolder, 'server.log'), 'a');
    const child = start(
      process.execPath,
      [
        join(editor, 'out', 'server-main.js'),
        '--host',
        host,
        '--port',
        String(port),
        '--without-connection-token',
        '--accept-server-license-terms',
        '--server-data-dir',
        dataFolder,
        '--extensions-dir',
        extensionsFolder ?? join(dataFolder, 'extensions'),
        '--disable-workspace-trust',
        '--disable-telemetry',
        '--disable-update-check',
        '--disable-getting-started-override',
        // Should we be killed without a chance to clean up, it goes by itself.
        '--enable-remote-auto-shutdown',
      ],
      { stdio: ['ignore', log, log], env: { ...process.env, EXTENSIONS_GALLERY: '{}' } },
    );
    const workbench = new Workbench(editor, dataFolder, port, child);
    workbench.writeSettings(settings);
    await workbench.answers();
    return workbench;
  }

  async answers() {
    const deadline = Date.now() + startMs;
    while (Date.now() < deadline && this.child.exitCode === null) {
      const response = await fetch(`${this.origin}/version`).catch(() => undefined);
      if (response?.ok) return;
      await wait(100);
    }
    throw new Error(`The editor's server did not start; see ${join(this.dataFolder, 'server.log')}`);
  }

  /** Read once, when a page is opened. */
  writeSettings(settings) {
    const user = join(this.dataFolder, 'data', 'User');
    mkdirSync(user, { recursive: true });
    writeFileSync(join(user, 'settings.json'), JSON.stringify({ ...quietSettings, ...settings }, null, 2));
  }

  uriOf(path) {
    return `vscode-remote://${this.authority}${path}`;
  }

  urlOf(folder, payload) {
    const pairs = Object.entries({ skipWelcome: 'true', skipReleaseNotes: 'true', ...payload });
    return `${this.origin}/?folder=${encodeURIComponent(folder)}&payload=${encodeURIComponent(JSON.stringify(pairs))}`;
  }

  async stop() {
    await end(this.child.pid);
  }
}

/** The settings of one folder; a page that shows it follows them. */
export function writeFolderSettings(folder, settings) {
  mkdirSync(join(folder, '.vscode'), { recursive: true });
  writeFileSync(join(folder, '.vscode', 'settings.json'), JSON.stringify(settings, null, 2));
}

/** Installs a packed extension the way a user does, into `extensionsFolder`. */
export function installExtension(editor, vsix, extensionsFolder) {
  return output(process.execPath, [
    join(editor, 'out', 'server-main.js'),
    '--install-extension',
    vsix,
    '--extensions-dir',
    extensionsFolder,
    '--server-data-dir',
    scratchFolder('install'),
    '--accept-server-license-terms',
  ]);
}

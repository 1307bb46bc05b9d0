// The browser that shows the editor: one that is installed, else Debian's.
import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { chromium } from 'playwright-core';
import { output, own } from './processes.mjs';

const names = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable', 'microsoft-edge'];

function installed() {
  const asked = process.env.CHROMIUM;
  if (asked) {
    if (existsSync(asked)) return asked;
    throw new Error(`CHROMIUM names ${asked}, and there is no such file.`);
  }
  const folders = (process.env.PATH ?? '').split(delimiter);
  return ['/usr/bin', ...folders]
    .flatMap((folder) => names.map((name) => join(folder, name)))
    .find((file) => existsSync(file));
}

function installFromDebian() {
  const missing =
    'No Chromium was found. Install one (Debian: `apt-get install chromium`), or name one in the environment ' +
    'variable CHROMIUM, and run this again.';
  if (process.getuid?.() !== 0 || !existsSync('/etc/debian_version')) throw new Error(missing);
  console.log('Installing Chromium from Debian (about 100 MB, half a minute) …');
  const begun = Date.now();
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  output('apt-get', ['update', '-qq'], { env });
  output('apt-get', ['install', '-y', '-qq', '--no-install-recommends', 'chromium'], { env });
  console.log(`Chromium is there, after ${((Date.now() - begun) / 1000).toFixed(0)} s.`);
  const found = installed();
  if (found === undefined) throw new Error(missing);
  return found;
}

/** Starts a browser without a window; it ends with the run at the latest. */
export async function launchBrowser() {
  const executablePath = installed() ?? installFromDebian();
  const server = await chromium.launchServer({
    executablePath,
    headless: true,
    handleSIGINT: false,
    handleSIGTERM: false,
    handleSIGHUP: false,
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
  own(server.process().pid);
  return chromium.connect(server.wsEndpoint());
}

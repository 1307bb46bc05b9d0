// Where the editor suite keeps what it fetches and what it makes; git ignores all of it.
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('../../..', import.meta.url)).replace(/[\\/]$/, '');
export const cache = join(root, '.cache');
export const editorFolder = join(cache, 'editor');
export const suiteFile = join(cache, 'editor-suite', 'suite.cjs');
export const screenshotFolder = join(cache, 'screenshots');

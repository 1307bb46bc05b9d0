/** Which notebook a file belongs to, and by which settings. */
import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';

export const settingsFileName = 'isonym.json';

/** Looks upwards from folders, remembering what it found. */
export class Roots {
  private readonly settings = new Map<string, string | undefined>();
  private readonly repositories = new Map<string, string | undefined>();

  /** The nearest folder from `folder` upwards that holds an `isonym.json`. */
  settingsFolder(folder: string): string | undefined {
    return nearestWith(settingsFileName, folder, this.settings);
  }

  /**
   * The notebook's root: where its settings are, else its repository, else undefined. Labels hold for all pages
   * under it.
   */
  rootOf(folder: string): string | undefined {
    return this.settingsFolder(folder) ?? nearestWith('.git', folder, this.repositories);
  }

  /** Forgets everything, after an `isonym.json` came or went. */
  clear(): void {
    this.settings.clear();
    this.repositories.clear();
  }
}

function nearestWith(
  name: string,
  folder: string,
  known: Map<string, string | undefined>,
): string | undefined {
  const passed: string[] = [];
  let found: string | undefined;
  for (let at = folder; ; at = dirname(at)) {
    if (known.has(at)) {
      found = known.get(at);
      break;
    }
    passed.push(at);
    if (existsSync(join(at, name))) {
      found = at;
      break;
    }
    if (dirname(at) === at) break;
  }
  for (const each of passed) known.set(each, found);
  return found;
}

/**
 * Finds the notebook pages under a folder: Markdown files that git would not ignore. A folder that is ignored
 * is not even entered, which a glob followed by a filter could not do.
 */
import ignore, { type Ignore } from 'ignore';
import { existsSync, readdirSync, readFileSync, realpathSync, statSync } from 'node:fs';
import { dirname, join, relative, sep } from 'node:path';

export interface Discovery {
  /** Absolute paths, in an order that does not depend on the machine. */
  readonly files: readonly string[];
  /** Folders that could not be listed. */
  readonly problems: readonly { readonly path: string; readonly error: unknown }[];
}

/** The ignore rules of one folder, which apply to everything below it. */
interface RuleSet {
  readonly folder: string;
  readonly rules: Ignore;
}

const neverEntered = new Set(['.git', 'node_modules']);

export function isNotebookFile(name: string): boolean {
  return /\.(?:md|markdown)$/i.test(name);
}

/** `folder` is absolute and exists. */
export function discoverNotebooks(folder: string): Discovery {
  const files: string[] = [];
  const problems: { path: string; error: unknown }[] = [];
  const outer = rulesAbove(folder);
  // A folder that was named is searched even when git ignores it.
  const start = isIgnored(folder, true, outer) ? [] : outer;
  const waiting: { folder: string; ruleSets: readonly RuleSet[] }[] = [{ folder, ruleSets: start }];
  for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
    let entries;
    try {
      entries = readdirSync(next.folder, { withFileTypes: true });
    } catch (error) {
      problems.push({ path: next.folder, error });
      continue;
    }
    const own = entries.some((entry) => entry.name === '.gitignore') ? rulesOf(next.folder) : undefined;
    const ruleSets = own === undefined ? next.ruleSets : [...next.ruleSets, own];
    for (const entry of entries) {
      const path = join(next.folder, entry.name);
      if (entry.isDirectory()) {
        if (!neverEntered.has(entry.name) && !isIgnored(path, true, ruleSets)) {
          waiting.push({ folder: path, ruleSets });
        }
      } else if (isNotebookFile(entry.name) && !isIgnored(path, false, ruleSets)) {
        if (entry.isFile() || (entry.isSymbolicLink() && leadsToFileOutside(path, folder))) files.push(path);
      }
    }
  }
  files.sort(byPath);
  return { files, problems };
}

/** Code-unit order of the path's parts, the same in every locale and on every system. */
export function byPath(first: string, second: string): number {
  const a = first.split(/[\\/]/);
  const b = second.split(/[\\/]/);
  for (let i = 0; i < Math.min(a.length, b.length); i++) {
    if (a[i] !== b[i]) return a[i]! < b[i]! ? -1 : 1;
  }
  return a.length - b.length;
}

/** The folder of the git repository that holds `path`, or undefined. */
export function repositoryOf(folder: string): string | undefined {
  for (let at = folder; ; at = dirname(at)) {
    if (existsSync(join(at, '.git'))) return at;
    if (dirname(at) === at) return undefined;
  }
}

/** Rules of the folders above, up to the repository's root, outermost first. */
function rulesAbove(folder: string): RuleSet[] {
  const root = repositoryOf(folder);
  if (root === undefined) return [];
  const found: RuleSet[] = [];
  const exclude = rulesIn(root, join(root, '.git', 'info', 'exclude'));
  if (exclude !== undefined) found.push(exclude);
  const parts = relative(root, folder)
    .split(sep)
    .filter((part) => part !== '');
  // The folder's own rules are read when it is entered.
  for (let i = 0; i < parts.length; i++) {
    const rules = rulesOf(join(root, ...parts.slice(0, i)));
    if (rules !== undefined) found.push(rules);
  }
  return found;
}

function rulesOf(folder: string): RuleSet | undefined {
  return rulesIn(folder, join(folder, '.gitignore'));
}

function rulesIn(folder: string, file: string): RuleSet | undefined {
  try {
    return { folder, rules: ignore({ ignorecase: false }).add(readFileSync(file, 'utf8')) };
  } catch {
    return undefined;
  }
}

/** The deepest rules that say anything decide, as in git. */
function isIgnored(path: string, isFolder: boolean, ruleSets: readonly RuleSet[]): boolean {
  for (let i = ruleSets.length - 1; i >= 0; i--) {
    const { folder, rules } = ruleSets[i]!;
    const within = relative(folder, path).split(sep).join('/');
    if (within === '') continue;
    const verdict = rules.test(isFolder ? `${within}/` : within);
    if (verdict.ignored) return true;
    if (verdict.unignored) return false;
  }
  return false;
}

/**
 * A link to a file counts as the file, unless the file is in the same folder tree: it would be there twice. Links to
 * folders are not followed, they may go in circles.
 */
function leadsToFileOutside(link: string, folder: string): boolean {
  try {
    const target = realpathSync(link);
    return statSync(target).isFile() && !target.startsWith(realpathSync(folder) + sep);
  } catch {
    return false;
  }
}

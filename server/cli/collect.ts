/** From the paths that the user gave to notebooks read and ready to be asked for findings. */
import { readFileSync, statSync } from 'node:fs';
import { dirname, isAbsolute, join, relative, resolve, sep } from 'node:path';
import type { Settings } from '../checks/settings.ts';
import { createToolkit } from '../toolkit/create-toolkit.ts';
import { nodeHost } from '../toolkit/hosts.ts';
import type { Toolkit } from '../toolkit/toolkit.ts';
import { discoverNotebooks } from '../workspace/discover.ts';
import { LineTable } from '../workspace/lines.ts';
import { Notebook } from '../workspace/notebook.ts';
import { Roots, settingsFileName } from '../workspace/roots.ts';
import { defaultSettings, readSettings } from '../workspace/settings-file.ts';
import { decodeSource, readSourceFile, reason } from '../workspace/source-file.ts';

/** A file that was asked for, in its notebook. */
export interface CollectedFile {
  /** As the user would write it. */
  readonly shown: string;
  readonly notebook: Notebook;
  /** Its name within the notebook. */
  readonly name: string;
}

export interface Collection {
  readonly files: readonly CollectedFile[];
  /** What could not be looked at, one sentence each. */
  readonly problems: readonly string[];
  readonly toolkit: Toolkit;
}

export const standardInput = '-';

/** `config` replaces the `isonym.json` above each file. Does not wait for the toolkit. */
export async function collect(paths: readonly string[], config: string | undefined): Promise<Collection> {
  return new Collector(config).run(paths);
}

class Collector {
  private readonly problems: string[] = [];
  private readonly files: CollectedFile[] = [];
  private readonly notebooks = new Map<string, Notebook>();
  private readonly taken = new Set<string>();
  private readonly roots = new Roots();
  private readonly toolkit = createToolkit(nodeHost());
  private readonly configured: Settings | undefined;

  constructor(config: string | undefined) {
    this.configured = config === undefined ? undefined : this.settingsFrom(resolve(config));
  }

  async run(paths: readonly string[]): Promise<Collection> {
    for (const path of paths) {
      if (path === standardInput) await this.takeStandardInput();
      else this.takePath(path);
    }
    this.takeNeighbours();
    return { files: this.files, problems: this.problems, toolkit: this.toolkit };
  }

  private takePath(path: string): void {
    const absolute = resolve(path);
    let isFolder: boolean;
    try {
      isFolder = statSync(absolute).isDirectory();
    } catch (error) {
      this.problems.push(`${path} ${reason(error)}.`);
      return;
    }
    if (!isFolder) {
      this.takeFile(absolute, dirname(absolute));
      return;
    }
    const { files, problems } = discoverNotebooks(absolute);
    for (const problem of problems)
      this.problems.push(`${shownPath(problem.path)} ${reason(problem.error)}.`);
    if (files.length === 0) {
      this.problems.push(`${path} holds no notebook pages: no file whose name ends in .md or .markdown.`);
    }
    for (const file of files) this.takeFile(file, absolute);
  }

  private takeFile(file: string, fallbackRoot: string): void {
    if (this.taken.has(file)) return;
    this.taken.add(file);
    const source = readSourceFile(file);
    if (source.problem !== undefined) {
      this.problems.push(`${shownPath(file)} ${source.problem}.`);
      return;
    }
    const root = this.roots.rootOf(dirname(file)) ?? fallbackRoot;
    const notebook = this.notebookAt(root);
    const name = nameWithin(root, file);
    notebook.setPage(name, source.text);
    this.files.push({ shown: shownPath(file), notebook, name });
  }

  private async takeStandardInput(): Promise<void> {
    if (this.taken.has(standardInput)) return;
    this.taken.add(standardInput);
    const chunks: Buffer[] = [];
    for await (const chunk of process.stdin) chunks.push(chunk as Buffer);
    const source = decodeSource(Buffer.concat(chunks));
    if (source.problem !== undefined) {
      this.problems.push(`Standard input ${source.problem}.`);
      return;
    }
    const folder = process.cwd();
    const notebook = this.notebookAt(this.roots.rootOf(folder) ?? folder);
    notebook.setPage(standardInput, source.text);
    this.files.push({ shown: standardInput, notebook, name: standardInput });
  }

  /** Labels hold for the whole notebook: pages that were not asked for may define what a page refers to. */
  private takeNeighbours(): void {
    for (const [root, notebook] of this.notebooks) {
      // A lone file in some folder says nothing of the other files there.
      if (this.roots.rootOf(root) !== root) continue;
      for (const file of discoverNotebooks(root).files) {
        if (this.taken.has(file)) continue;
        const source = readSourceFile(file);
        if (source.text !== undefined) notebook.setPage(nameWithin(root, file), source.text);
      }
    }
  }

  private notebookAt(root: string): Notebook {
    let notebook = this.notebooks.get(root);
    if (notebook === undefined) {
      const settingsFolder = this.roots.settingsFolder(root);
      const settings =
        this.configured ??
        (settingsFolder === undefined
          ? defaultSettings
          : this.settingsFrom(join(settingsFolder, settingsFileName)));
      notebook = new Notebook(settings, this.toolkit);
      this.notebooks.set(root, notebook);
    }
    return notebook;
  }

  private settingsFrom(file: string): Settings {
    let text: string;
    try {
      text = readFileSync(file, 'utf8');
    } catch (error) {
      this.problems.push(`${shownPath(file)} ${reason(error)}.`);
      return defaultSettings;
    }
    const { settings, problems } = readSettings(text);
    const lines = new LineTable(text);
    for (const { range, message } of problems) {
      const { line, character } = lines.placeAt(range.start);
      this.problems.push(`${shownPath(file)}:${line + 1}:${character + 1} ${message}`);
    }
    return settings;
  }
}

/** Relative to the current folder where it lies below it, with `/` on every system. */
export function shownPath(path: string): string {
  const below = relative(process.cwd(), path);
  const shown = below === '' ? '.' : below.startsWith('..') || isAbsolute(below) ? path : below;
  return shown.split(sep).join('/');
}

function nameWithin(root: string, file: string): string {
  return relative(root, file).split(sep).join('/');
}

/**
 * All pages under one notebook root, analysed: the shared ground of editor and command. Same pages, settings and
 * facts, same findings in the same order.
 */
import { LRUCache } from 'lru-cache';
import type { Finding } from '../checks/finding.ts';
import type { CompoundModel, EntryModel } from '../checks/model.ts';
import { byPlace } from '../checks/run.ts';
import type { Settings } from '../checks/settings.ts';
import type { MarkdownPage } from '../notebook/markdown.ts';
import type { Toolkit } from '../toolkit/toolkit.ts';
import { createAnalysis, type Analysis } from './analysis.ts';
import { FactDesk } from './fact-desk.ts';
import { Addresses, buildPage, findingInText, rebased, type Page, type ReadBlock } from './page.ts';

const mostUnderEdit = 8;

export class Notebook {
  readonly settings: Settings;
  private readonly analysis: Analysis;
  private readonly desk: FactDesk;
  private readonly addresses = new Addresses();
  private readonly pages = new Map<string, Page>();
  /** How the pages under edit were parsed; others are hardly ever read twice. */
  private readonly parsed = new LRUCache<string, MarkdownPage>({ max: mostUnderEdit });
  /** Findings that need all pages, by file. */
  private acrossPages: ReadonlyMap<string, readonly Finding[]> = new Map();
  /** Whether a page has changed since. */
  private acrossIsStale = true;
  private blocks = 0;

  constructor(settings: Settings, toolkit: Toolkit | undefined) {
    this.settings = settings;
    this.analysis = createAnalysis(settings);
    this.desk = new FactDesk(toolkit);
  }

  /** Takes the text of a file in; blocks that it had before are not read again. */
  setPage(file: string, text: string): Page {
    const previous = this.pages.get(file);
    if (previous?.text === text) return previous;
    const markdown = this.analysis.parse(text, this.parsed.get(file));
    this.parsed.set(file, markdown);
    const page = buildPage(text, markdown.blocks, previous, (block, source, lineOffsets) => {
      const address = this.addresses.take();
      const model = this.analysis.read(rebased(block, address));
      const read = { address, source, lineOffsets, model, findings: [], waits: false };
      this.check(read);
      return read;
    });
    this.pages.set(file, page);
    this.blocks += page.blocks.length - (previous?.blocks.length ?? 0);
    this.acrossIsStale = true;
    return page;
  }

  removePage(file: string): void {
    this.blocks -= this.pages.get(file)?.blocks.length ?? 0;
    if (this.pages.delete(file)) this.acrossIsStale = true;
  }

  page(file: string): Page | undefined {
    return this.pages.get(file);
  }

  get files(): readonly string[] {
    return [...this.pages.keys()];
  }

  /** Blocks of all pages, by which the price of looking across them grows. */
  get blockCount(): number {
    return this.blocks;
  }

  models(file: string): readonly EntryModel[] {
    return this.pages.get(file)?.blocks.map((block) => block.read.model) ?? [];
  }

  /** The compound that a label stands for; the first where several claim it. */
  compoundLabelled(label: string): CompoundModel | undefined {
    for (const { blocks } of this.pages.values()) {
      for (const { read } of blocks) {
        const { model } = read;
        if (model.kind === 'compound' && model.entry.label?.text.text === label) return model;
      }
    }
    return undefined;
  }

  /** Whether a fact of the toolkit would change anything. */
  get isWaiting(): boolean {
    return this.desk.isWaiting;
  }

  /** Asks the toolkit for everything that checks have looked up in vain. Returns the files that were rechecked. */
  async settle(): Promise<readonly string[]> {
    const changed = new Set<string>();
    while (this.desk.isWaiting) {
      await this.desk.fetch();
      for (const [file, page] of this.pages) {
        for (const { read } of page.blocks) {
          if (!read.waits) continue;
          this.check(read);
          changed.add(file);
        }
      }
    }
    return [...changed];
  }

  /**
   * In the order of the text; ranges in the text. `known` leaves findings across pages as they were when they
   * were last looked for: in a large notebook that takes longer than a keystroke may.
   */
  findings(file: string, across: 'fresh' | 'known' = 'fresh'): readonly Finding[] {
    const page = this.pages.get(file);
    if (page === undefined) return [];
    if (across === 'fresh' && this.acrossIsStale) {
      this.acrossPages = this.analysis.checkAcross(
        new Map([...this.pages].map(([name, each]) => [name, each.blocks.map((block) => block.read.model)])),
      );
      this.acrossIsStale = false;
    }
    const all = [
      ...page.blocks.flatMap((block) => block.read.findings),
      ...(this.acrossPages.get(file) ?? []),
    ];
    return all
      .flatMap((finding) => findingInText(page, finding, (other) => this.pages.get(other)) ?? [])
      .sort(byPlace);
  }

  private check(read: ReadBlock): void {
    read.waits = false;
    const lookUp = this.desk.lookUp(() => {
      read.waits = true;
    });
    read.findings = this.analysis.check(read.model, lookUp);
  }
}

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Finding } from '../../../server/checks/finding.ts';
import type { EntryModel } from '../../../server/checks/model.ts';
import type { Block } from '../../../server/notebook/model.ts';
import {
  Addresses,
  blockAt,
  buildPage,
  findingInText,
  rebased,
  toText,
  type Page,
  type ReadBlock,
} from '../../../server/workspace/page.ts';

/** Blocks of a toy language: `<…>`, whose content is one line. */
function toyBlocks(text: string): Block[] {
  return [...text.matchAll(/<([^<>]*)>/g)].map((match) => ({
    kind: 'compound',
    range: { start: match.index, end: match.index + match[0].length },
    kindRange: { start: match.index, end: match.index + 1 },
    lines: [{ text: match[1]!, offset: match.index + 1 }],
    text: match[1]!,
    closed: true,
  }));
}

/** A page builder that counts what it reads, and finds every `x`. */
function reader() {
  const addresses = new Addresses();
  const counted = { reads: 0 };
  const build = (text: string, previous?: Page) =>
    buildPage(text, toyBlocks(text), previous, (block, source, lineOffsets): ReadBlock => {
      counted.reads++;
      const address = addresses.take();
      const moved = rebased(block, address);
      const findings = [...block.text.matchAll(/x/g)].map((match): Finding => {
        const start = moved.lines[0]!.offset + match.index;
        const range = { start, end: start + 1 };
        const fix = { title: 'y', safe: true, edits: [{ range, newText: 'y' }] };
        return {
          check: 'x',
          severity: 'error',
          range,
          message: '',
          fixes: [fix],
          related: [{ range, message: '' }],
        };
      });
      const model = { kind: 'compound', entry: { block: moved } } as unknown as EntryModel;
      return { address, source, lineOffsets, model, findings, waits: false };
    });
  return { build, counted };
}

function findings(page: Page): Finding[] {
  return page.blocks
    .flatMap((block) => block.read.findings)
    .flatMap((finding) => findingInText(page, finding, () => undefined) ?? []);
}

describe('a page', () => {
  it('reads only the block that an edit changed, and moves the others', () => {
    const { build, counted } = reader();
    const first = build('<ax> <bx> <c>');
    expect(counted.reads).toBe(3);
    const second = build('longer <ax> <bbx> <c>', first);
    expect(counted.reads).toBe(4);
    expect(findings(second).map(({ range }) => range)).toEqual([
      { start: 9, end: 10 },
      { start: 15, end: 16 },
    ]);
    expect(second.blocks[0]!.read).toBe(first.blocks[0]!.read);
  });

  it('keeps equal blocks apart', () => {
    const { build } = reader();
    const page = build('<x><x>');
    expect(page.blocks[0]!.read.address).not.toBe(page.blocks[1]!.read.address);
    const later = build('<x><x><x>', page);
    expect(findings(later).map(({ range }) => range.start)).toEqual([1, 4, 7]);
  });

  it('reads a block again that moved into another container', () => {
    const { build, counted } = reader();
    const first = build('<x>');
    const quoted = toyBlocks('<x>').map((block) => ({ ...block, lines: [{ text: 'x', offset: 2 }] }));
    buildPage('<x>', quoted, first, () => {
      counted.reads++;
      return first.blocks[0]!.read;
    });
    expect(counted.reads).toBe(2);
  });

  it('knows nothing of addresses that are not its own', () => {
    const { build } = reader();
    const old = build('<x>');
    const now = build('<y>', old);
    expect(toText(now, old.blocks[0]!.read.findings[0]!.range)).toBeUndefined();
  });

  it('finds the block at an offset, its end included', () => {
    const { build } = reader();
    const page = build('a<x>b');
    expect(blockAt(page, 0)).toBeUndefined();
    expect(blockAt(page, 4)?.address).toBe(page.blocks[0]!.read.address + 3);
    expect(blockAt(page, 5)).toBeUndefined();
  });

  it('gives after any edits what a fresh reading gives', () => {
    const texts = fc.array(fc.string({ unit: fc.constantFrom('<', '>', 'x', 'a'), maxLength: 30 }), {
      maxLength: 8,
    });
    fc.assert(
      fc.property(texts, (versions) => {
        const { build } = reader();
        let page: Page | undefined;
        for (const version of versions) {
          page = build(version, page);
          expect(findings(page)).toEqual(findings(reader().build(version)));
        }
      }),
      { seed: 1 },
    );
  });
});

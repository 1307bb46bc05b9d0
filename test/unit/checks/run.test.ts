/** The run over the checks: order, acceptances, settings, and what happens when a check breaks. */
import { describe, expect, it } from 'vitest';
import type { ToolkitFactsOf } from '../../../server/checks/facts.ts';
import { modelOf, type CompoundModel } from '../../../server/checks/model.ts';
import { analyse, analyseEntry, analyseNotebook } from '../../../server/checks/run.ts';
import { defaultSettings, type Settings } from '../../../server/checks/settings.ts';
import { findingsWithoutToolkit, findingsWithToolkit } from '../../support/analyse-text.ts';
import { readDocument } from '../../support/read-document.ts';

const unavailable: ToolkitFactsOf = () => 'unavailable';
const pending: ToolkitFactsOf = () => 'pending';

const block = (...lines: string[]) => ['```compound', ...lines, '```'].join('\n');
const idsOf = (text: string, settings?: Settings) =>
  findingsWithoutToolkit(text, settings).map((finding) => finding.check);

const wrongTwice = block('label: 1', 'SMILES: CCOC(C)=O', 'formula: C4H8O3', 'molar mass: 99.11');

describe('severity', () => {
  it('comes from the check, and from the settings where they say so', () => {
    const severities = (settings: Settings) =>
      findingsWithoutToolkit(wrongTwice, settings).map(({ check, severity }) => `${check} ${severity}`);
    expect(severities(defaultSettings)).toEqual(['formula-mismatch error', 'molar-mass-mismatch error']);
    expect(
      severities({
        ...defaultSettings,
        severity: { 'formula-mismatch': 'off', 'molar-mass-mismatch': 'information' },
      }),
    ).toEqual(['molar-mass-mismatch information']);
  });
});

describe('allow', () => {
  it('takes the findings of that check away and no others', () => {
    const text = wrongTwice.replace('\n```', '\nallow: formula-mismatch (from the supplier)\n```');
    expect(text).not.toBe(wrongTwice);
    expect(idsOf(text)).toEqual(['molar-mass-mismatch']);
  });

  it('accepts nothing without a reason', () => {
    const text = wrongTwice.replace('\n```', '\nallow: formula-mismatch\n```');
    expect(idsOf(text)).toEqual(['formula-mismatch', 'molar-mass-mismatch', 'allow-without-reason']);
  });

  it('works for checks that look at all entries, and is called unused there too', () => {
    const two = (more: string, label: string) =>
      `${block('label: 1', 'SMILES: CCO')}\n\n${block(`label: ${label}`, 'SMILES: CCC', more)}`;
    const reason = 'allow: label-repeated (copied page)';
    expect(idsOf(two('', '1'))).toEqual(['label-repeated']);
    expect(idsOf(two(reason, '1'))).toEqual([]);
    expect(idsOf(two(reason, '2'))).toEqual(['allow-unused']);
  });

  it('is not called unused while the toolkit has not answered, nor when the check is off', () => {
    const text = block(
      'label: 1',
      'SMILES: CCO',
      'InChIKey: LFQSCWFLJHTTHZ-UHFFFAOYSA-N',
      'allow: inchikey-mismatch (to be looked at)',
    );
    const document = readDocument(text);
    expect(analyse(document, defaultSettings, pending).findings).toEqual([]);
    expect(analyse(document, defaultSettings, pending).wanted).toHaveLength(1);
    expect(idsOf(text)).toEqual([]);
    const off: Settings = { ...defaultSettings, severity: { 'inchikey-mismatch': 'off' } };
    expect(idsOf(text, off)).toEqual([]);
  });

  it('is called unused once the toolkit has answered', async () => {
    const text = block(
      'label: 1',
      'SMILES: CCO',
      'InChIKey: LFQSCWFLJHTTHZ-UHFFFAOYSA-N',
      'allow: inchikey-mismatch (to be looked at)',
    );
    expect((await findingsWithToolkit(text)).map((finding) => finding.check)).toEqual(['allow-unused']);
  });

  it('names the nearest check where there is none of that id', () => {
    const text = block('label: 1', 'SMILES: CCO', 'allow: formula-mismach (typo)');
    const [finding, ...others] = findingsWithoutToolkit(text);
    expect(others).toEqual([]);
    expect(finding).toMatchObject({ check: 'allow-unused', severity: 'warning' });
    expect(text.slice(finding!.range.start, finding!.range.end)).toBe('formula-mismach');
    expect(finding!.fixes[0]!.edits[0]!.newText).toBe('formula-mismatch');
  });
});

describe('a check that breaks', () => {
  const document = readDocument(wrongTwice);
  const model = modelOf(document.entries[0]!, defaultSettings) as CompoundModel;
  const broken = Object.create(model, {
    formula: {
      get() {
        throw new RangeError('out of luck');
      },
    },
  }) as CompoundModel;

  it('is reported as such, and takes no other check with it', () => {
    const findings = analyseEntry(broken, unavailable);
    const internal = findings.filter((finding) => finding.message.includes('out of luck'));
    expect(internal.map((finding) => finding.check)).toContain('formula-mismatch');
    for (const finding of internal) expect(finding.range).toEqual(model.entry.block.kindRange);
    const sound = analyseEntry(
      modelOf(readDocument(block('label: 1', 'SMILES: CC(C)(C)(C)C')).entries[0]!, defaultSettings),
      unavailable,
    );
    expect(sound.map((finding) => finding.check)).toEqual(['valence']);
  });
});

describe('labels', () => {
  const page = (label: string) => readDocument(block(`label: ${label}`, 'SMILES: CCO')).entries;
  const files = (settings: Settings, names: readonly string[]) => ({
    files: new Map(names.map((name) => [name, page('7').map((entry) => modelOf(entry, settings))])),
    settings,
  });

  it('are unique under the notebook root, whatever the order of reading', () => {
    for (const order of [
      ['a.md', 'b.md'],
      ['b.md', 'a.md'],
    ]) {
      const found = analyseNotebook(files(defaultSettings, order));
      expect([...found.keys()]).toEqual(['b.md']);
      expect(found.get('b.md')![0]!.related[0]!.file).toBe('a.md');
    }
  });

  it('or within a file, where the settings say so', () => {
    const perFile: Settings = { ...defaultSettings, labelScope: 'file' };
    expect([...analyseNotebook(files(perFile, ['a.md', 'b.md'])).keys()]).toEqual([]);
  });
});

describe("the lab's own words", () => {
  it('stand for their structures where the name is not known otherwise', () => {
    const settings: Settings = { ...defaultSettings, vocabulary: { 'LR-blend base': 'CCOC(C)=O' } };
    const text = block('label: 1', 'name: LR-blend base', 'formula: C4H8O3');
    expect(idsOf(text, settings)).toEqual(['formula-mismatch']);
    expect(idsOf(text)).toEqual(['name-unknown']);
  });
});

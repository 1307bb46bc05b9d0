/** Findings as the editor shows them: where they begin and end, and when they go. */
import assert from 'node:assert/strict';
import { DiagnosticSeverity, Range, type TextDocument } from 'vscode';
import {
  codeOf,
  eventually,
  finding,
  findingsIn,
  fiveBonds,
  noFinding,
  openPage,
  replace,
} from './support.ts';

/** Where `part` stands within the first `whole`, as the editor counts lines and columns. */
function placeOf(document: TextDocument, whole: string, part: string): Range {
  const start = document.getText().indexOf(whole) + whole.indexOf(part);
  return new Range(document.positionAt(start), document.positionAt(start + part.length));
}

/** The carbon atom of `fiveBonds` that has five bonds. */
function fiveBondedAtom(document: TextDocument): Range {
  const start = document.getText().indexOf('CC(C)(C)(C)C') + 1;
  return new Range(document.positionAt(start), document.positionAt(start + 1));
}

const block = (...lines: string[]) => ['```compound', ...lines, '```', ''];

suite('findings', () => {
  test('a fifth bond is an error on the very atom', async () => {
    const { document } = await openPage('valence.md', fiveBonds('F-1'));
    const found = await finding(document, 'valence');
    assert.deepEqual(found.range, fiveBondedAtom(document));
    assert.deepEqual(found.range, new Range(4, 9, 4, 10));
    assert.equal(found.severity, DiagnosticSeverity.Error);
    assert.match(found.message, /\b5\b|five/);
  });

  test('a formula that is not that of the structure is an error on the element that differs', async () => {
    const page = block('label: F-2', 'SMILES: CC(C)(C)C', 'formula: C5H10').join('\n');
    const { document } = await openPage('formula.md', page);
    const found = await finding(document, 'formula-mismatch');
    assert.deepEqual(found.range, placeOf(document, 'formula: C5H10', 'H10'));
    assert.equal(found.severity, DiagnosticSeverity.Error);
  });

  test('an edit that mends the fault takes the finding away, and one that brings it back brings it back', async () => {
    const { document } = await openPage('mended.md', fiveBonds('F-3'));
    await finding(document, 'valence');
    await replace(document, 'CC(C)(C)(C)C', 'CC(C)(C)C');
    await noFinding(document, 'valence');
    await replace(document, 'CC(C)(C)C', 'CC(C)(C)(C)C');
    assert.deepEqual((await finding(document, 'valence')).range, fiveBondedAtom(document));
  });

  test('with Windows line ends the place is the same', async () => {
    const { document } = await openPage('windows.md', fiveBonds('F-4', '\r\n'));
    assert.ok(document.getText().includes('\r\n'));
    assert.deepEqual((await finding(document, 'valence')).range, new Range(4, 9, 4, 10));
  });

  test('characters outside of the basic plane before a place do not move it', async () => {
    const emoji = '🧪🧑‍🔬';
    const page = [`${emoji} weighed`, '', `- ${emoji}`, '', ...block('label: F-5', 'SMILES: CC(C)(C)(C)C')];
    const { document } = await openPage('emoji.md', page.join('\n'));
    assert.deepEqual((await finding(document, 'valence')).range, fiveBondedAtom(document));
    await replace(document, '```compound', `\`\`\`compound ${emoji}`);
    await replace(document, 'weighed', `weighed ${emoji}\n`);
    await eventually('the place one line further down', () =>
      findingsIn(document).find(
        (one) => codeOf(one) === 'valence' && one.range.isEqual(fiveBondedAtom(document)),
      ),
    );
  });

  test('inside of a list and of a quotation', async () => {
    const page = [
      '1. step',
      '',
      ...block('label: F-6', 'SMILES: CC(C)(C)(C)C').map((line) => `   ${line}`),
      '> and',
      ...block('label: F-7', 'SMILES: OCC(C)(C)(C)C').map((line) => `> ${line}`),
    ];
    const { document } = await openPage('nested.md', page.join('\n'));
    const found = await eventually('two findings', () => {
      const all = findingsIn(document).filter((one) => codeOf(one) === 'valence');
      return all.length === 2 ? all : undefined;
    });
    const places = found.map((one) => one.range).sort((a, b) => a.start.compareTo(b.start));
    const last = document.positionAt(document.getText().indexOf('OCC(C)') + 'OC'.length);
    assert.deepEqual(places, [fiveBondedAtom(document), new Range(last, last.translate(0, 1))]);
  });

  test('an ordinary Markdown file is left alone', async () => {
    const page = ['# Notes', '', 'SMILES: CC(C)(C)(C)C', '', '```yaml', 'formula: C5H13', '```', ''].join(
      '\n',
    );
    const { document } = await openPage('ordinary.md', page);
    // Findings of a page that was opened later show that this one was looked at.
    const later = await openPage('after-ordinary.md', fiveBonds('F-8'));
    await finding(later.document, 'valence');
    assert.deepEqual(findingsIn(document), []);
  });

  test('a compound without a fault has no finding', async () => {
    const page = block(
      'label: F-9',
      'name: 2,2-dimethylpropane',
      'formula: C5H12',
      'SMILES: CC(C)(C)C',
      'molar mass: 72.15 g/mol',
    );
    const { document } = await openPage(
      'faultless.md',
      [...page, '', ...block('label: F-10', 'SMILES: CC(C)(C)(C)C')].join('\n'),
    );
    await finding(document, 'valence');
    const first = findingsIn(document).filter((one) => one.range.end.line < page.length - 1);
    assert.deepEqual(first, []);
  });
});

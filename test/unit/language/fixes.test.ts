import { describe, expect, it } from 'vitest';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { codeActions, type FixRequest } from '../../../server/language/fixes.ts';
import { fixAllKind } from '../../../server/language/names.ts';
import { atCaret, openPage, pageUri } from './open-page.ts';

function request(marked: string, more: Partial<FixRequest> = {}): FixRequest {
  const { text, offset } = atCaret(marked);
  const page = openPage(text);
  const findings = page.notebook.findings(page.name);
  return { page, findings, range: { start: offset, end: offset }, only: undefined, snippets: false, ...more };
}

const comma = '```compound\nname: ethanol\nmolar mass: 46,‸07 g/mol\n```\n';

describe('code actions', () => {
  it('offer the fixes of the finding under the cursor, the certain one preferred', () => {
    const actions = codeActions(request(comma));
    const [fix] = actions;
    expect(fix).toMatchObject({
      kind: 'quickfix',
      isPreferred: true,
      diagnostics: [{ code: 'decimal-comma' }],
    });
    const { text } = atCaret(comma);
    const document = TextDocument.create(pageUri, 'markdown', 1, text);
    expect(TextDocument.applyEdits(document, fix!.edit!.changes![pageUri]!)).toContain('46.07 g/mol');
  });

  it('offer nothing where nothing was found', () => {
    expect(codeActions(request(comma.replace('‸', '').replace('eth', 'et‸h')))).toEqual([]);
  });

  it('put the cursor on the reason when the client can', () => {
    const accept = codeActions(request(comma, { snippets: true })).find(({ title }) =>
      title.startsWith('Accept'),
    );
    expect(accept?.edit?.documentChanges).toMatchObject([
      { edits: [{ snippet: { kind: 'snippet', value: '\nallow: decimal-comma (${1:reason})' } }] },
    ]);
  });

  it('keep to the kinds that were asked for', () => {
    expect(codeActions(request(comma, { only: ['refactor'] }))).toEqual([]);
    expect(codeActions(request(comma, { only: ['quickfix'] })).length).toBeGreaterThan(0);
    for (const only of [['source'], [fixAllKind]]) {
      const [all, ...others] = codeActions(request(comma.replace('‸', '') + comma, { only }));
      expect(others).toEqual([]);
      expect(all?.kind).toBe(fixAllKind);
      expect(all?.edit?.changes?.[pageUri]).toHaveLength(2);
    }
  });
});

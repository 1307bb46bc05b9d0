/** The TextMate grammar, in the editor's own engine and on top of the editor's own Markdown grammar. */
import assert from 'node:assert/strict';
import { compoundKeyAliases, reactionKeyAliases } from '../../../server/notebook/key-aliases.ts';
import { compoundKeys, reactionKeys, type FieldKey } from '../../../server/notebook/keys.ts';
import { tokenize, type Token } from './tokenize.ts';

/** The innermost scope of the first piece of a line that begins with `text`. */
function scopeOf(line: readonly Token[], text: string): string | undefined {
  return line.find((token) => token.text.trim().startsWith(text) && token.text.trim() !== '')?.scopes.at(-1);
}

const embedded = 'meta.embedded.block.isonym';
const inBlock = (line: readonly Token[]) => line.some((token) => token.scopes.includes(embedded));

const block = (kind: string, ...lines: string[]) => [`\`\`\`${kind}`, ...lines, '```'];

async function scopesIn(
  lines: readonly string[],
  expected: readonly [line: number, text: string, scope: string][],
) {
  const tokens = await tokenize(lines);
  assert.deepEqual(
    expected.map(([line, text]) => [line, text, scopeOf(tokens[line]!, text)]),
    expected,
  );
}

const keyScope = 'entity.name.tag.key.isonym';
const number = 'constant.numeric.isonym';
const unit = 'keyword.other.unit.isonym';
const substance = 'entity.name.type.substance.isonym';
const term = 'support.constant.term.isonym';

/** How the value of a key is coloured, unless it is a quantity. */
const fieldScopes: Partial<Record<FieldKey, string>> = {
  label: 'label',
  name: 'name',
  synonyms: 'name',
  SMILES: 'smiles',
  formula: 'identifier',
  InChI: 'identifier',
  InChIKey: 'identifier',
  'CAS RN': 'identifier',
  isomers: 'isomers',
  allow: 'allow',
  charged: 'substances',
  obtained: 'substances',
  solvent: 'substances',
  scheme: 'scheme',
  appearance: 'text',
  source: 'text',
  notes: 'text',
  reference: 'text',
};

suite('grammar', () => {
  test('identity of a compound', () =>
    scopesIn(
      block(
        'compound',
        'label: 4',
        'name: 1-(4-methoxyphenyl)ethan-1-ol',
        'SMILES: COc1ccc(cc1)[C@H](C)/C=C/O',
        'formula: C11H14O2',
        'isomers: racemate',
        'cas rn: 64-17-5',
        'synonyms:',
        '  - p-anisyl methyl carbinol',
      ),
      [
        [0, 'compound', 'fenced_code.block.language.markdown'],
        [1, 'label', keyScope],
        [1, '4', 'variable.other.constant.label.isonym'],
        [2, '1-(4-methoxyphenyl)ethan-1-ol', substance],
        [3, 'COc', 'string.unquoted.smiles.isonym'],
        [3, '1', 'constant.numeric.ring-closure.smiles.isonym'],
        [3, 'C@H', 'constant.other.bracket-atom.smiles.isonym'],
        [3, '/', 'keyword.operator.bond.smiles.isonym'],
        [4, 'C11H14O2', 'string.unquoted.identifier.isonym'],
        [5, 'racemate', 'constant.language.isomers.isonym'],
        [6, 'cas rn', keyScope],
        [6, '64-17-5', 'string.unquoted.identifier.isonym'],
        [8, '-', 'punctuation.definition.list.begin.isonym'],
        [8, 'p-anisyl', substance],
      ],
    ));

  test('numbers with units, over continuation lines', () =>
    scopesIn(
      block(
        'compound',
        'bp: 95–97 °C (1 mmHg)',
        '1H NMR: (400 MHz, CDCl3) δ 7.30 (d, J = 8.7 Hz, 2H),',
        '',
        '  4.85 (q, J = 6.4 Hz, 1H)',
        'HRMS: (ESI) m/z calcd for C9H12O2Na [M + Na]+ 175.0730',
        '[α]D: −12.3 (c 1.0, CHCl3)',
      ),
      [
        [1, '95–97', number],
        [1, '°C', unit],
        [1, 'mmHg', unit],
        [2, '1H NMR', keyScope],
        [2, 'MHz', unit],
        [2, 'J', term],
        [4, '4.85', number],
        [4, '1', number],
        [4, 'H', unit],
        [5, 'm/z', term],
        [5, '[M + Na]+', 'constant.other.ion.isonym'],
        [5, '175.0730', number],
        [6, '[α]D', keyScope],
        [6, '−12.3', number],
      ],
    ));

  test('a formula in running data is no number', async () => {
    const tokens = await tokenize(block('compound', 'HRMS: calcd for C9H12O2Na'));
    assert.ok(!tokens[1]!.some((token) => token.scopes.at(-1) === number));
  });

  test('items of a reaction', () =>
    scopesIn(
      block(
        'reaction',
        'scheme: 3 + NaBH4 -> 4',
        'charged:',
        '  - 3: 1.50 g, 9.99 mmol, 1.0 equiv',
        '  - n-BuLi (2.5 M in hexanes): 20 mL (solvent)',
        '  - [1,1′-bi(cyclopentyl)]-2-ol: 5 mol%',
        'obtained:',
        '- 4: 1.42 g, 93 %',
      ),
      [
        [1, '+', 'keyword.operator.plus.isonym'],
        [1, '->', 'keyword.operator.arrow.isonym'],
        [3, '-', 'punctuation.definition.list.begin.isonym'],
        [3, '3', substance],
        [3, '1.50', number],
        [3, 'equiv', unit],
        [4, 'n-BuLi (2.5 M in hexanes)', substance],
        [4, 'solvent', 'storage.modifier.role.isonym'],
        [5, '[1,1′-bi(cyclopentyl)]-2-ol', substance],
        [5, 'mol%', unit],
        [6, 'obtained', keyScope],
        [7, '4', substance],
        [7, '%', unit],
      ],
    ));

  test('every spelling of a key is coloured as the key that it stands for', async () => {
    const spellings = [
      ...compoundKeys.map((key) => ({ kind: 'compound', key, aliases: compoundKeyAliases[key] })),
      ...reactionKeys.map((key) => ({ kind: 'reaction', key, aliases: reactionKeyAliases[key] })),
    ];
    const wrong: string[] = [];
    for (const { kind, key, aliases } of spellings) {
      for (const spelling of [key, key.toUpperCase(), ...(aliases ?? [])]) {
        const field = (await tokenize(block(kind, `${spelling}: x`)))[1]!;
        const wanted = `meta.field.${fieldScopes[key] ?? 'quantities'}.isonym`;
        const whole = field[0]?.text === spelling && field[0].scopes.at(-1) === keyScope;
        if (!whole || !field[0]!.scopes.includes(wanted)) wrong.push(`${spelling} (${key})`);
      }
    }
    assert.deepEqual(wrong, []);
  });

  test('a block that is indented as a whole', () =>
    scopesIn(
      block('compound', '  label: 4', '  M.W.: 152.19', '  1H NMR: 7.30 (d),', '    4.85 (q)', '  bp: 81 °C'),
      [
        [1, '4', 'variable.other.constant.label.isonym'],
        [2, 'M.W.', keyScope],
        [4, '4.85', number],
        [5, 'bp', keyScope],
      ],
    ));

  test('comments, and an accepted finding with its reason', () =>
    scopesIn(block('compound', '// a remark: 3 g', 'allow: stereo-unspecified (racemic on purpose)'), [
      [1, 'a remark: 3 g', 'comment.line.double-slash.isonym'],
      [2, 'stereo-unspecified', 'entity.name.function.check.isonym'],
      [2, '(racemic', 'string.quoted.other.reason.isonym'],
    ]));

  test('in a list, where Markdown takes the indentation away', () =>
    scopesIn(
      [
        '- step',
        '  ```compound',
        '  label: 9',
        '  1H NMR (CDCl3): 7.30 (d, J = 8.7 Hz, 2H),',
        '    4.85 (q, J = 6.4 Hz, 1H)',
        '  name: bicyclo[2.2.1]heptane',
        '  ```',
        '  9 mmol',
      ],
      [
        [2, '9', 'variable.other.constant.label.isonym'],
        [3, '1H NMR (CDCl3)', keyScope],
        [4, '4.85', number],
        [5, 'name', keyScope],
        [5, 'bicyclo', substance],
        [6, '```', 'punctuation.definition.markdown'],
        [7, '9 mmol', 'meta.paragraph.markdown'],
      ],
    ));

  test('in a quotation, fenced with tildes; a shorter fence does not close it', () =>
    scopesIn(
      [
        '> ~~~~ compound',
        '> label: 7',
        '> bp: 81 °C',
        '>   (760 mmHg)',
        '> ~~~',
        '> mp: 5 °C',
        '> ~~~~~',
        '> 5 °C',
      ],
      [
        [1, '7', 'variable.other.constant.label.isonym'],
        [3, '760', number],
        [5, 'mp', keyScope],
        [6, '~~~~~', 'punctuation.definition.markdown'],
        [7, '5 °C', 'meta.paragraph.markdown'],
      ],
    ));

  test('all else in the file is left alone', async () => {
    const lines = [
      '# compound',
      'label: 4, 3 mmol',
      '```compounds',
      'label: 4',
      '```',
      '    ```compound',
      '    label: 4',
      '    ```',
      '````markdown',
      '```compound',
      'label: 4',
      '```',
      '````',
      '<!--',
      '```compound',
      'label: 4',
      '```',
      '-->',
    ];
    const tokens = await tokenize(lines);
    assert.deepEqual(
      lines.filter((_, index) => inBlock(tokens[index]!)),
      [],
    );
  });

  test('a block that the quotation around it ends does not run on', async () => {
    const lines = ['> ```compound', '> label: 4', '', 'bp: 81 °C', '', '```compound', 'label: 5', '```'];
    const tokens = await tokenize(lines);
    assert.deepEqual(
      lines.filter((_, index) => inBlock(tokens[index]!)),
      ['> label: 4', 'label: 5'],
    );
  });
});

import { expect, it } from 'vitest';
import { insertionAfter, insertionFor } from '../../../server/notebook/insertion.ts';
import type { FieldKey } from '../../../server/notebook/keys.ts';
import { entriesOf } from './readers.ts';

/** The place of the new line is marked `+`. */
const cases: readonly [string, FieldKey][] = [
  ['```compound\nlabel: 4\nname: anisole  \n+formula: X\nmp: 3 °C\n```', 'formula'],
  ['> > ```compound\n> > name: an-\n> >   isole\n> > +formula: X\n> > ```', 'formula'],
  ['- ```compound\n  name: anisole\n  +formula: X\n  ```', 'formula'],
  ['```compound\n+label: X\nname: anisole\n```', 'label'],
  ['```compound\r\nname: anisole\r\n+formula: X\r\n```', 'formula'],
  ['```compound\n  name: anisole\n  +formula: X\n```', 'formula'],
  ['> ```compound\n> +label: X\n> ```', 'label'],
  ['~~~compound\n+label: X', 'label'],
];

it.each(cases)('%j', (expected, key) => {
  const text = expected.replace(/(?:\r\n|\n)[ >]*\+[^\r\n]*/, '');
  const [entry] = entriesOf(text);
  const { offset, prefix } = insertionFor(entry!, key);
  expect(`${text.slice(0, offset)}${prefix}${key}: X${text.slice(offset)}`).toBe(expected.replace('+', ''));
});

it('goes below the field named, or below the last', () => {
  const text = '```compound\nlabel: 4\nname: anisole\n```';
  const [entry] = entriesOf(text);
  expect(insertionAfter(entry!, 'label').offset).toBe(text.indexOf('\nname'));
  expect(insertionAfter(entry!).offset).toBe(text.lastIndexOf('\n'));
  expect(insertionAfter(entry!, 'mp').offset).toBe(text.lastIndexOf('\n'));
});

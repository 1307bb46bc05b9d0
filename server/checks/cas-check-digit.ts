/** A CAS Registry Number whose check digit is wrong. */
import type { Check } from './finding.ts';
import { casCheckDigit } from './shared/cas.ts';
import { inDocument } from './shared/values.ts';

export const check: Check = {
  id: 'cas-check-digit',
  group: 'identity',
  severity: 'error',
  summary: 'A CAS Registry Number whose check digit does not fit.',
  why: 'One mistyped digit orders, or registers, another substance.',
  action: 'Copy the number again from its source; which digit is wrong cannot be told from the number.',
  source: 'CAS: the last digit is the sum of the others, each times its place from the right, modulo 10.',
  examples: {
    bad: ['```compound\nlabel: 1\nname: caffeine\nCAS RN: 58-08-3\n```'],
    good: ['```compound\nlabel: 1\nname: caffeine\nCAS RN: 58-08-2\n```'],
  },
  run(model, report) {
    if (model.kind !== 'compound') return;
    const value = model.entry.cas;
    const number = value?.read.value;
    if (value === undefined || number === undefined) return;
    const expected = casCheckDigit(number);
    if (expected === undefined || number.endsWith(`-${expected}`)) return;
    const stated = number.at(-1)!;
    const at = value.text.text.lastIndexOf(stated);
    report({
      range: at === -1 ? value.text.range : inDocument(value, { start: at, end: at + 1 }),
      message:
        `The check digit of ${number} is ${stated}, but its other digits give ${expected}: at least one digit is ` +
        'mistyped, and the number stands for another substance or for none. Copy it again from its source.',
    });
  },
};

/** All checks, in the order in which they are listed to the user. One line a check. */
import { check as allowUnused } from './allow-unused.ts';
import { check as allowWithoutReason } from './allow-without-reason.ts';
import { check as badValue } from './bad-value.ts';
import { check as decimalComma } from './decimal-comma.ts';
import { check as emptyBlock } from './empty-block.ts';
import type { Check } from './finding.ts';
import { check as repeatedField } from './repeated-field.ts';
import { check as unknownField } from './unknown-field.ts';

export const checks: readonly Check[] = [
  unknownField,
  repeatedField,
  badValue,
  decimalComma,
  emptyBlock,
  allowWithoutReason,
  allowUnused,
];

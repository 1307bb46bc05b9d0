/** All checks, in the order in which they are listed to the user. */
import { check as allowUnused } from './allow-unused.ts';
import { check as allowWithoutReason } from './allow-without-reason.ts';
import { check as badValue } from './bad-value.ts';
import { check as casCheckDigit } from './cas-check-digit.ts';
import { check as decimalComma } from './decimal-comma.ts';
import { check as emptyBlock } from './empty-block.ts';
import { check as exactMassMismatch } from './exact-mass-mismatch.ts';
import type { Check } from './finding.ts';
import { check as formulaImpossible } from './formula-impossible.ts';
import { check as formulaMismatch } from './formula-mismatch.ts';
import { check as formulaOnly } from './formula-only.ts';
import { check as formulaSyntax } from './formula-syntax.ts';
import { check as inchiMismatch } from './inchi-mismatch.ts';
import { check as inchikeyMismatch } from './inchikey-mismatch.ts';
import { check as labelRepeated } from './label-repeated.ts';
import { check as molarMassMismatch } from './molar-mass-mismatch.ts';
import { check as nameAmbiguous } from './name-ambiguous.ts';
import { check as nameImproper } from './name-improper.ts';
import { check as nameStructureMismatch } from './name-structure-mismatch.ts';
import { check as nameUnknown } from './name-unknown.ts';
import { check as repeatedField } from './repeated-field.ts';
import { check as smilesSyntax } from './smiles-syntax.ts';
import { check as stereoMeaningless } from './stereo-meaningless.ts';
import { check as stereoMismatch } from './stereo-mismatch.ts';
import { check as stereoUnspecified } from './stereo-unspecified.ts';
import { check as unknownField } from './unknown-field.ts';
import { check as valence } from './valence.ts';

export const checks: readonly Check[] = [
  unknownField,
  repeatedField,
  badValue,
  decimalComma,
  emptyBlock,
  allowWithoutReason,
  allowUnused,
  smilesSyntax,
  valence,
  formulaSyntax,
  formulaImpossible,
  formulaMismatch,
  molarMassMismatch,
  exactMassMismatch,
  inchiMismatch,
  inchikeyMismatch,
  casCheckDigit,
  nameUnknown,
  nameAmbiguous,
  nameImproper,
  nameStructureMismatch,
  stereoUnspecified,
  stereoMismatch,
  stereoMeaningless,
  formulaOnly,
  labelRepeated,
];

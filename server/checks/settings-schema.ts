/** JSON Schema (draft 7) of `isonym.json`, for the editor's completion and for reading the file. */
import { checks } from './index.ts';
import { defaultSettings } from './settings.ts';
import { severities } from './severity.ts';

const severityOrOff = [...severities, 'off'];

export const settingsSchema = {
  $schema: 'http://json-schema.org/draft-07/schema#',
  title: 'Settings of a laboratory notebook',
  type: 'object',
  additionalProperties: false,
  properties: {
    $schema: { type: 'string' },
    severity: {
      description: 'How bad a finding of each check is; off silences the check.',
      type: 'object',
      additionalProperties: false,
      properties: Object.fromEntries(
        checks.map((check) => [
          check.id,
          { description: `${check.summary} (${check.severity})`, enum: severityOrOff },
        ]),
      ),
    },
    tolerance: {
      description: 'What two numbers may differ by, beyond the interval that the last digit of each implies.',
      type: 'object',
      additionalProperties: false,
      properties: {
        molarMass: {
          description: 'Molar mass, in g/mol.',
          type: 'number',
          minimum: 0,
          default: defaultSettings.tolerance.molarMass,
        },
        exactMass: {
          description: 'Exact (monoisotopic) mass, in u.',
          type: 'number',
          minimum: 0,
          default: defaultSettings.tolerance.exactMass,
        },
      },
    },
    vocabulary: {
      description: "The laboratory's own names and abbreviations, each with the SMILES that it stands for.",
      type: 'object',
      additionalProperties: { type: 'string', minLength: 1 },
    },
    labelScope: {
      description: 'Whether a label may stand only once in the whole notebook, or once in each file.',
      enum: ['notebook', 'file'],
      default: 'notebook',
    },
  },
} as const;

import { describe, expect, it } from 'vitest';
import type { Settings } from '../../../server/checks/settings.ts';
import { readSettingsText } from '../../../server/workspace/settings-text.ts';

const defaults = {
  severity: {},
  tolerance: { molarMass: 0, exactMass: 0.0005 },
  vocabulary: {},
} as unknown as Settings;

/** Of the shape that the real schema has; these tests are about positions and merging. */
const schema = {
  type: 'object',
  additionalProperties: false,
  properties: {
    severity: { type: 'object', additionalProperties: { enum: ['error', 'warning', 'information', 'off'] } },
    tolerance: {
      type: 'object',
      additionalProperties: false,
      properties: { molarMass: { type: 'number', minimum: 0 }, exactMass: { type: 'number', minimum: 0 } },
    },
    vocabulary: { type: 'object', additionalProperties: { type: 'string' } },
  },
};

function read(text: string) {
  const { settings, problems } = readSettingsText(text, schema, defaults);
  return {
    settings,
    problems: problems.map(({ range, message }) => [text.slice(range.start, range.end), message]),
  };
}

describe('isonym.json', () => {
  it('takes comments and trailing commas, and keeps the defaults of what is not said', () => {
    const { settings, problems } = read(`{
      // the lab's own words
      "vocabulary": { "LR-2": "CCO", },
      "tolerance": { "molarMass": 0.02 },
    }`);
    expect(problems).toEqual([]);
    expect(settings.vocabulary).toEqual({ 'LR-2': 'CCO' });
    expect(settings.tolerance).toEqual({ molarMass: 0.02, exactMass: 0.0005 });
  });

  it('points at the wrong value, names what is allowed, and keeps the rest', () => {
    const { settings, problems } = read(
      '{"severity": {"valence": "fatal", "name-ambiguous": "error"}, "tolerance": {"molarMass": "0.1", "mass": 1}}',
    );
    expect(problems).toEqual([
      ['"fatal"', '“severity → valence” must be one of "error", "warning", "information", "off".'],
      ['"0.1"', '“tolerance → molarMass” must be number.'],
      ['"mass"', '“tolerance” has no setting “mass”. It may hold: molarMass, exactMass.'],
    ]);
    expect(settings.severity).toEqual({ 'name-ambiguous': 'error' });
    expect(settings.tolerance).toEqual({ molarMass: 0, exactMass: 0.0005 });
  });

  it('says where the JSON breaks and still takes what stands before', () => {
    const { settings, problems } = read('{"vocabulary": {"X": "CCO"}, "tolerance": }');
    expect(problems).toEqual([['}', 'isonym.json cannot be read here: value expected.']]);
    expect(settings.vocabulary).toEqual({ X: 'CCO' });
  });

  it('survives anything', () => {
    for (const text of [
      '',
      'null',
      '[]',
      '3',
      '"x"',
      '{',
      '{"a"',
      '{"__proto__": {"x": 1}}',
      '\u0000',
      '['.repeat(500),
    ]) {
      const { settings, problems } = read(text);
      expect(settings.tolerance).toEqual(defaults.tolerance);
      expect(problems.length).toBeGreaterThan(0);
    }
    expect(({} as Record<string, unknown>)['x']).toBeUndefined();
  });
});

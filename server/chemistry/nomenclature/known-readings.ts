/** The readings of names that are known before the grammar of organic names is asked. */
import { arrangedReading } from './arrange.ts';
import type { CommonName, CommonNames } from './common-names.ts';
import { knownName } from './known-names.ts';
import { withoutGrade } from './mixtures/grades.ts';
import { mixtureWords } from './mixtures/solutions.ts';
import type { MixtureName, NameReading, Reading } from './reading.ts';
import type { NameLimits } from './read-name.ts';
import type { PreparedName } from './words/prepared.ts';

/** Reads another name with the same reader. */
export type ReadOther = (text: string) => NameReading;

/** Words of grade and mixtures within mixtures that are taken apart, at most. */
const deepest = 3;

/**
 * What a name known whole, a formula, an inorganic name, a solution or a name with a word of grade means; undefined when it is
 * none of these. `depth` counts how often the reader has been asked for a part of a part.
 */
export function knownReading(
  text: string,
  prepared: PreparedName,
  common: CommonNames,
  limits: NameLimits,
  readOther: ReadOther,
  depth: number,
): NameReading | undefined {
  const known = knownName(prepared, common);
  if (known) return readingOf(known, text, prepared, limits, readOther);
  if (depth >= deepest || !/[ /®™]/.test(prepared.text)) return undefined;
  return graded(text, prepared, readOther) ?? mixture(prepared.text, readOther);
}

function readingOf(
  known: CommonName,
  text: string,
  prepared: PreparedName,
  limits: NameLimits,
  readOther: ReadOther,
): NameReading {
  if (known.kind === 'mixture') {
    const components = known.components.flatMap((name) => readingsIn(readOther(name)) ?? []);
    return { kind: 'mixture', message: known.message, components };
  }
  const named = known.kind === 'compound' ? [{ name: text, molecule: known.molecule }] : known.readings;
  const readings = named.map(
    ({ name, molecule }) => arrangedReading(() => name, molecule, undefined, prepared, limits).reading,
  );
  return { kind: 'understood', readings, remarks: [] };
}

/** What a component can be; undefined where it is not understood. */
function readingsIn(reading: NameReading): readonly Reading[] | undefined {
  if (reading.kind === 'unknown') return undefined;
  return reading.kind === 'understood' ? reading.readings : reading.components;
}

/** `dry DMF` is DMF: read without the word, and shown as it was typed. */
function graded(text: string, prepared: PreparedName, readOther: ReadOther): NameReading | undefined {
  const rest = withoutGrade(prepared.text, prepared.lower);
  if (rest === undefined || rest === '') return undefined;
  const reading = readOther(rest);
  if (reading.kind !== 'understood') return reading.kind === 'mixture' ? reading : undefined;
  // Ranges of remarks are about the rest; only a name without any keeps its places.
  if (reading.remarks.length > 0) return undefined;
  const only = reading.readings.length === 1 && reading.readings[0]!.name === rest;
  return only ? { ...reading, readings: [{ ...reading.readings[0]!, name: text }] } : reading;
}

/** A mixture all of whose components are understood. */
function mixture(text: string, readOther: ReadOther): MixtureName | undefined {
  for (const { message, components } of mixtureWords(text)) {
    const read: Reading[] = [];
    const understood = components.every((component) => {
      const readings = readingsIn(readOther(component));
      read.push(...(readings ?? []));
      return readings !== undefined;
    });
    if (understood) return { kind: 'mixture', message, components: read };
  }
  return undefined;
}

/** A name that stands for several constitutions. */
import { countInWords } from '../chemistry/nomenclature/reading.ts';
import type { Check } from './finding.ts';
import { rankedReadings } from './shared/reading-fit.ts';
import { listed, quoted, replacement } from './shared/values.ts';

export const check: Check = {
  id: 'name-ambiguous',
  group: 'identity',
  severity: 'warning',
  summary:
    'A name that stands for several compounds; information only where the structure picks one of them.',
  why: 'Isomers boil, react and harm differently; a name without its locants lets the reader choose.',
  action: 'Complete the name with one of the fixes, or say `isomers: mixture` if it is one.',
  source: 'IUPAC recommendations 2013, P-14.3 (locants).',
  needsToolkit: true,
  examples: {
    bad: [
      '```compound\nlabel: 1\nname: chlorotoluene\n```',
      '```compound\nlabel: 2\nname: butanol\nbp: 117 °C\n```',
    ],
    good: [
      '```compound\nlabel: 1\nname: 2-chlorotoluene\n```',
      '```compound\nlabel: 2\nname: chlorobenzene\n```',
      '```compound\nlabel: 3\nname: chlorotoluene\nisomers: mixture\n```',
    ],
  },
  run(model, report, toolkit) {
    if (model.kind !== 'compound' || model.name === undefined) return;
    const { readings } = model.name;
    if (readings.length < 2 || model.isomers === 'mixture' || model.isomers === 'unknown') return;
    const value = model.entry.name!;
    const ranked = rankedReadings(model, toolkit);
    const [best, second] = ranked;
    // Statements that fit one reading alone pick it.
    const deciding = best!.support.filter((what) => second?.support.includes(what) !== true);
    const count = model.name.count ?? readings.length;
    const names = ranked.map(({ reading }) => reading.name);
    const shown = names.slice(0, 5);
    const more = count - shown.length;
    const all = more > 0 ? `${shown.join(', ')} and ${more} more` : listed(shown, 6, 'or');
    // The entry as a whole is definite when its structure picks a reading; yet the name is what goes on the flask
    // and into the paper, where nobody sees the structure. So it is told, but only as information.
    const picked = deciding.some((what) => what !== 'synonyms');
    // Nothing could be written that is not there already.
    if (picked && names[0] === value.text.text) return;
    report({
      range: value.text.range,
      ...(picked ? { severity: 'information' as const } : {}),
      message:
        `${quoted(value.text.text)} can be ${countInWords(model.name)} compounds: ${all}. ` +
        (deciding.length === 0
          ? 'They are different substances, and the entry does not say which: complete the name.'
          : `The ${listed(deciding)} ${deciding.length === 1 && deciding[0] !== 'synonyms' ? 'picks' : 'pick'} ${names[0]!}: ` +
            `${picked ? 'write that, because a label shows the name alone' : 'complete the name if that is meant'}.`),
      fixes: names.slice(0, 8).map((name) => replacement(value, name, `Write ${name}`)),
    });
  },
};

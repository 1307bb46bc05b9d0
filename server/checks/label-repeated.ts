/** The same label on two blocks. */
import type { TextRange } from '../chemistry/text.ts';
import type { Check } from './finding.ts';
import { quoted } from './shared/values.ts';

export const check: Check = {
  id: 'label-repeated',
  group: 'identity',
  severity: 'error',
  summary: 'The same label on two blocks.',
  why: 'A label refers to one entry; with two of them nobody can tell what went into the flask.',
  action: 'Give one of them another label. Set `labelScope` to `file` where each page counts anew.',
  source: 'Common practice, no source.',
  examples: {
    bad: ['```compound\nlabel: 4\nname: anisole\n```\n\n```compound\nlabel: 4\nname: phenol\n```'],
    good: ['```compound\nlabel: 4a\nname: anisole\n```\n\n```compound\nlabel: 4b\nname: phenol\n```'],
  },
  runNotebook(notebook, report) {
    let first = new Map<string, { file: string; range: TextRange }>();
    // Which entry counts as the first must not depend on the order in which files were read.
    const files = [...notebook.files.keys()].sort();
    for (const file of files) {
      if (notebook.settings.labelScope === 'file') first = new Map();
      for (const { entry } of notebook.files.get(file)!) {
        const label = entry.label?.read.value;
        if (label === undefined || label === '') continue;
        const { range } = entry.label!.text;
        const earlier = first.get(label);
        if (earlier === undefined) {
          first.set(label, { file, range });
          continue;
        }
        const elsewhere = earlier.file === file ? '' : ` in ${earlier.file}`;
        report(file, {
          range,
          message:
            `The label ${quoted(label)} stands on another block${elsewhere} already. Whatever refers to it could mean ` +
            'either: give one of the two another label.',
          related: [
            {
              ...(earlier.file === file ? {} : { file: earlier.file }),
              range: earlier.range,
              message: `${quoted(label)} stands here first.`,
            },
          ],
        });
      }
    }
  },
};

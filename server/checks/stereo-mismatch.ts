/** Name against SMILES: the arrangement in space. */
import type { Check } from './finding.ts';
import { sameConstitution } from './shared/constitution.ts';
import { areMirrored, disagreements, meet, possibleKeys, readingKeys } from './shared/stereo-agreement.ts';
import { kindOfPlace, rangeOfPlace } from './shared/stereo-places.ts';
import { inDocument, listed, quoted } from './shared/values.ts';

export const check: Check = {
  id: 'stereo-mismatch',
  group: 'identity',
  severity: 'error',
  summary: 'A name and a SMILES that state different stereoisomers.',
  why: 'They are two compounds, with other rotation, activity and often other melting point.',
  action: 'Find out which of the two was made, and correct the other.',
  source: 'IUPAC recommendations 2013, P-91 to P-93 (CIP rules).',
  examples: {
    bad: [
      '```compound\nlabel: 1\nname: (R)-butan-2-ol\nSMILES: C[C@H](O)CC\n```',
      '```compound\nlabel: 2\nname: (E)-but-2-ene\nSMILES: C/C=C\\C\n```',
    ],
    good: [
      '```compound\nlabel: 1\nname: (R)-butan-2-ol\nSMILES: C[C@@H](O)CC\n```',
      '```compound\nlabel: 2\nname: butan-2-ol\nisomers: racemate\nSMILES: C[C@@H](O)CC\n```',
    ],
  },
  run(model, report) {
    if (model.kind !== 'compound' || model.structure === undefined || model.name === undefined) return;
    if (model.isomers === 'mixture' || model.isomers === 'unknown') return;
    const { structure } = model;
    const readings = model.name.readings.filter((reading) => sameConstitution(structure, reading.molecule));
    const [reading] = readings;
    if (reading === undefined || structure.stereo.length === 0 || model.structureSmiles === undefined) return;
    const drawn = possibleKeys(structure);
    for (const each of readings) {
      const named = readingKeys(each);
      if (drawn === undefined || named === undefined || meet(drawn, named)) return;
    }
    const mirrored = areMirrored(structure, reading);
    // A racemate, or a compound whose absolute arrangement is not known, may be drawn as either mirror image.
    if (mirrored && model.isomers !== 'single') return;
    const smiles = model.entry.smiles!;
    const name = model.entry.name!;
    const parted = disagreements(structure, reading.molecule);
    const [first, ...others] = parted?.places ?? [];
    const details = (parted?.places ?? []).map(
      ({ element, inStructure, inName }) =>
        `this ${kindOfPlace(element)} is ${inStructure} in the SMILES and ${inName} by the name`,
    );
    report({
      range:
        first !== undefined && others.length === 0
          ? inDocument(smiles, rangeOfPlace(parted!.molecule, first.element))
          : smiles.text.range,
      message: [
        `The SMILES is ${mirrored ? 'the mirror image of' : 'another stereoisomer than'} ${quoted(name.text.text)}` +
          `${details.length === 0 || others.length > 0 ? '' : `: ${details[0]!}`}.`,
        others.length === 0
          ? ''
          : `They part at ${listed(parted!.places.map(({ inStructure, inName }) => `${inStructure} (name: ${inName})`))}, in the order of the SMILES.`,
        'These are two compounds: find out which one was made, and correct the other.',
      ]
        .filter((part) => part !== '')
        .join(' '),
      related: [
        { range: name.text.range, message: 'This name states another arrangement.' },
        ...(others.length === 0
          ? []
          : parted!.places.map(({ element }, index) => ({
              range: inDocument(smiles, rangeOfPlace(parted!.molecule, element)),
              message: `${details[index]![0]!.toUpperCase()}${details[index]!.slice(1)}.`,
            }))),
      ],
    });
  },
};

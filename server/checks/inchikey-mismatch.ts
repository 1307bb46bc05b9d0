/** Recorded InChIKey against the structure. */
import type { Check } from './finding.ts';
import { definiteStructure, leavesStereoOpenOnPurpose } from './shared/identity.ts';
import { mirrorImageSmiles } from './shared/mirror-image.ts';
import { inDocument, replacement } from './shared/values.ts';

/** Hash of the layers that are not there: neither stereo nor isotopes. */
const noStereo = 'UHFFFAOY';

export const check: Check = {
  id: 'inchikey-mismatch',
  group: 'identity',
  severity: 'error',
  summary: 'An InChIKey that is not that of the structure or name.',
  why: 'Data bases and colleagues look the compound up by its key and would find another one, or none.',
  action: 'Take the computed InChIKey, or correct the structure if that is wrong.',
  source:
    'IUPAC International Chemical Identifier, technical manual 1.06 (2020): 14 letters skeleton, 8 stereo and isotopes.',
  needsToolkit: true,
  examples: {
    bad: [
      '```compound\nlabel: 1\nSMILES: CCO\nInChIKey: BDERNNFJNOPAEC-UHFFFAOYSA-N\n```',
      '```compound\nlabel: 2\nSMILES: C[C@@H](O)CC\nInChIKey: BTANRVKWQNVYAZ-BYPYZUCNSA-N\n```',
    ],
    good: [
      '```compound\nlabel: 1\nSMILES: CCO\nInChIKey: LFQSCWFLJHTTHZ-UHFFFAOYSA-N\n```',
      '```compound\nlabel: 2\nSMILES: C[C@@H](O)CC\nisomers: racemate\nInChIKey: BTANRVKWQNVYAZ-UHFFFAOYSA-N\n```',
    ],
  },
  run(model, report, toolkit) {
    if (model.kind !== 'compound') return;
    const value = model.entry.inchiKey;
    const recorded = value?.read.value;
    const structure = definiteStructure(model);
    if (value === undefined || recorded === undefined || structure === undefined) return;
    const stated = partsOf(recorded);
    const facts = toolkit(structure.smiles);
    if (stated === undefined || typeof facts === 'string') return;
    const computed = partsOf(facts.inchiKey);
    if (computed === undefined || recorded === facts.inchiKey) return;
    const fixes = [replacement(value, facts.inchiKey, `Write ${facts.inchiKey}`)];
    const lookedUp = `Whoever looks the compound up by this key finds another one, or none: take ${facts.inchiKey}, or correct the structure.`;
    const part = (start: number, length: number) =>
      value.text.text === recorded ? inDocument(value, { start, end: start + length }) : value.text.range;
    if (stated.skeleton !== computed.skeleton) {
      report({
        range: part(0, 14),
        message: `The first 14 letters stand for the skeleton, and they are not those of the ${structure.from} (${computed.skeleton}). ${lookedUp}`,
        fixes,
      });
      return;
    }
    // Keys that are not of the standard kind hash other layers after the skeleton.
    if (!stated.standard) return;
    if (stated.stereo === computed.stereo) {
      report({
        range: part(recorded.length - 1, 1),
        message: `The last letter stands for the protonation: ${stated.protonation} here, ${computed.protonation} for the ${structure.from}. ${lookedUp}`,
        fixes,
      });
      return;
    }
    const mirror = toolkit(mirrorImageSmiles(structure.molecule));
    if (mirror === 'pending') return;
    const isMirror = mirror !== 'unavailable' && mirror.inchiKey === recorded;
    const open = stated.stereo === noStereo || computed.stereo === noStereo;
    if ((open || isMirror) && leavesStereoOpenOnPurpose(model)) return;
    report({
      range: part(15, 8),
      ...(open ? { severity: 'warning' as const } : {}),
      message: `The skeleton is right; ${stereoDifference(stated.stereo, computed.stereo, isMirror, structure.from)} ${lookedUp}`,
      fixes,
    });
  },
};

function partsOf(key: string) {
  const match = /^([A-Z]{14})-([A-Z]{8})([SN])[A-Z]-([A-Z])$/.exec(key);
  return match === null
    ? undefined
    : { skeleton: match[1]!, stereo: match[2]!, standard: match[3] === 'S', protonation: match[4]! };
}

function stereoDifference(stated: string, computed: string, isMirror: boolean, from: string): string {
  if (isMirror) return `this key is that of the mirror image of the ${from}.`;
  if (stated === noStereo) return `this key states no stereo, the ${from} does.`;
  if (computed === noStereo) return `this key states stereo or isotopes which the ${from} leaves open.`;
  return `stereo or isotopes are other than those of the ${from}.`;
}

/** Recorded InChIKey against the structure. */
import { canonicalSmiles } from '../chemistry/structure/canonical-smiles.ts';
import { mirrorImage } from '../chemistry/structure/stereo-mirror.ts';
import { enumerateStereoisomers } from '../chemistry/structure/stereoisomers.ts';
import type { ToolkitFactsOf } from './facts.ts';
import type { Check } from './finding.ts';
import {
  definiteStructure,
  factsAsDrawn,
  leavesStereoOpenOnPurpose,
  type DefiniteStructure,
} from './shared/identity.ts';
import { inDocument, replacement } from './shared/values.ts';

/** Stereoisomers whose keys are looked up. */
const mostAsked = 16;

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
    if (value === undefined || recorded === undefined) return;
    const structure = definiteStructure(model);
    if (structure === undefined) return;
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
    const asDrawn = factsAsDrawn(structure, toolkit);
    if (asDrawn === 'pending' || (asDrawn !== 'unavailable' && asDrawn.inchiKey === recorded)) return;
    const mirror = toolkit(canonicalSmiles(mirrorImage(structure.molecule)));
    if (mirror === 'pending') return;
    const isMirror = mirror !== 'unavailable' && mirror.inchiKey === recorded;
    const isPossible =
      computed.stereo === noStereo ? isOfOneStereoisomer(recorded, structure, toolkit) : false;
    if (isPossible === 'pending') return;
    const open = stated.stereo === noStereo || isPossible;
    if ((open || isMirror) && leavesStereoOpenOnPurpose(model)) return;
    report({
      range: part(15, 8),
      ...(open ? { severity: 'warning' as const } : {}),
      message: `The skeleton is right; ${stereoDifference(stated.stereo, isPossible, isMirror, structure.from)} ${lookedUp}`,
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

/** Whether the key is that of a stereoisomer which the structure leaves open; true when they are too many to ask. */
function isOfOneStereoisomer(
  key: string,
  { molecule }: DefiniteStructure,
  toolkit: ToolkitFactsOf,
): boolean | 'pending' {
  const { isomers, count } = enumerateStereoisomers(molecule, mostAsked);
  if (count === undefined || count > isomers.length) return true;
  const facts = isomers.map((isomer) => toolkit(canonicalSmiles(isomer)));
  if (facts.includes('pending')) return 'pending';
  return facts.some((each) => typeof each !== 'string' && each.inchiKey === key);
}

function stereoDifference(stated: string, isPossible: boolean, isMirror: boolean, from: string): string {
  if (isMirror) return `this key is that of the mirror image of the ${from}.`;
  if (stated === noStereo) return `this key states no stereo, the ${from} does.`;
  if (isPossible) return `this key is that of one stereoisomer, and the ${from} leaves open which.`;
  return `this key is of no stereoisomer or labelled form that the ${from} allows.`;
}

/** A statement about space where nothing can differ, in the SMILES or in the name. */
import { ringBonds } from '../chemistry/structure/rings.ts';
import type { Molecule, StereoElement } from '../chemistry/structure/molecule.ts';
import type { Check } from './finding.ts';
import { reportRemarks } from './shared/name-remarks.ts';
import { rangeOfPlace } from './shared/stereo-places.ts';
import { inDocument } from './shared/values.ts';

export const check: Check = {
  id: 'stereo-meaningless',
  group: 'identity',
  severity: 'warning',
  summary: 'A stereodescriptor or stereo mark where nothing can differ.',
  why: 'Whoever wrote it had another structure in mind: a substituent may be missing or misplaced.',
  action: 'Take the mark out, or correct the structure around it.',
  source: 'IUPAC recommendations 2013, P-91 and P-93; OpenSMILES specification 1.0, stereochemistry.',
  examples: {
    bad: [
      '```compound\nlabel: 1\nSMILES: C[C@H](O)C\n```',
      '```compound\nlabel: 2\nSMILES: C/C=C(\\C)C\n```',
    ],
    good: [
      '```compound\nlabel: 1\nSMILES: C[C@H](O)CC\n```',
      '```compound\nlabel: 2\nSMILES: O[C@H]1CC[C@@H](C)CC1\n```',
    ],
  },
  run(model, report, toolkit) {
    if (model.kind !== 'compound') return;
    reportRemarks('stereo-meaningless')(model, report, toolkit);
    const { smiles } = model.entry;
    if (smiles === undefined || model.structure === undefined) return;
    for (const { statement, range } of model.structure.stray ?? []) {
      report({
        range: inDocument(smiles, range),
        message: `“${statement}” states an arrangement, but this atom has none: it needs four different ligands. Take the mark out, or correct the structure.`,
      });
    }
    if (model.structure.stereo.length === 0 || model.stereo === undefined) return;
    const { molecule, meaningless } = model.stereo;
    for (const element of meaningless) {
      if (isTrueThoughIdle(molecule, element)) continue;
      report({
        range: inDocument(smiles, rangeOfPlace(molecule, element)),
        message:
          element.kind === 'double-bond'
            ? 'This double bond is marked cis or trans, but one of its ends has two equal ligands, so there is only one compound. ' +
              'Take the marks out, or correct the structure.'
            : `This atom is marked as a stereocentre, but two of its ligands are alike, so there is only one compound. ` +
              'Take the mark out, or correct the structure.',
      });
    }
  },
};

/**
 * Marks that say nothing but are no slip: cis in a small ring, a nitrogen held in a cage, and double bonds that mobile
 * hydrogens or resonance move about.
 */
function isTrueThoughIdle(molecule: Molecule, element: StereoElement): boolean {
  if (element.kind === 'tetrahedral') return molecule.atoms[element.centre]!.atomicNumber !== 6;
  if (element.kind !== 'double-bond') return true;
  if (element.ends.some((end) => molecule.atoms[end]!.atomicNumber !== 6)) return true;
  const inRing = ringBonds(molecule);
  return molecule.neighbours[element.ends[0]]!.some(
    ({ atom, bond }) => atom === element.ends[1] && inRing[bond]!,
  );
}

/** How well each reading of an ambiguous name fits what else the block records. */
import type { Reading } from '../../chemistry/nomenclature/reading.ts';
import type { ToolkitFactsOf } from '../facts.ts';
import type { CompoundModel } from '../model.ts';
import { sameConstitution } from './constitution.ts';
import { canonicalSmiles } from '../../chemistry/structure/canonical-smiles.ts';

export interface RankedReading {
  readonly reading: Reading;
  /** The statements that fit this reading and not all of them: `SMILES`, `InChIKey`, `synonyms`. */
  readonly support: readonly string[];
}

const weights: Readonly<Record<string, number>> = { SMILES: 4, InChIKey: 3, InChI: 2, synonyms: 1 };

/** Best first; readings that fit equally keep the order of the name engine. */
export function rankedReadings(model: CompoundModel, toolkit: ToolkitFactsOf): RankedReading[] {
  const readings = model.name?.readings ?? [];
  const inchi = model.entry.inchi?.read.value;
  const skeleton = model.entry.inchiKey?.read.value?.slice(0, 14);
  const ranked = readings.map((reading): RankedReading => {
    const support: string[] = [];
    if (model.structure !== undefined && sameConstitution(model.structure, reading.molecule))
      support.push('SMILES');
    if (inchi !== undefined || skeleton !== undefined) {
      const facts = toolkit(canonicalSmiles(reading.molecule));
      if (typeof facts !== 'string') {
        if (skeleton !== undefined && facts.inchiKey.slice(0, 14) === skeleton) support.push('InChIKey');
        if (inchi !== undefined && connections(inchi) === connections(facts.inchi)) support.push('InChI');
      }
    }
    if (synonymReadings(model).some((other) => sameConstitution(other.molecule, reading.molecule))) {
      support.push('synonyms');
    }
    return { reading, support };
  });
  const weightOf = ({ support }: RankedReading) => support.reduce((sum, what) => sum + weights[what]!, 0);
  return ranked.sort((first, second) => weightOf(second) - weightOf(first));
}

/** Synonyms that mean one constitution. */
function synonymReadings({ entry }: CompoundModel): Reading[] {
  return entry.synonyms.flatMap((synonym) => {
    const reading = synonym.read.value;
    return reading?.kind === 'understood' && reading.readings.length === 1 ? [reading.readings[0]!] : [];
  });
}

/** Formula and connection layers, which decide the constitution up to mobile hydrogens. */
function connections(inchi: string): string {
  return inchi
    .split('/')
    .slice(1, 4)
    .filter((layer, index) => index === 0 || layer.startsWith('c') || layer.startsWith('h'))
    .join('/');
}

/** Oxides of amines, phosphines, sulfides (P-62.5, P-63.6, P-68.3.2.3) and, in older usage, of alkenes. */
import type { Locant } from '../tree.ts';
import type { BuiltUnit } from './built-unit.ts';
import type { Draft } from './draft.ts';
import { alkenes, phosphines, tertiaryNitrogens } from './found-groups.ts';
import { addSmiles } from './words.ts';

/** `1,1-dioxide`, `N-oxide`: oxygen on the atoms of the locants. */
export interface LocatedOxide {
  readonly locants: readonly Locant[];
}

const [nitrogen, phosphorus, sulfur, selenium] = [7, 15, 16, 34];

/** Puts oxygen where the locants say; false where no atom there takes it. */
export function oxidise(parent: BuiltUnit, { locants }: LocatedOxide, draft: Draft): boolean {
  return locants.every((locant) => {
    const atom = meantAtom(locant, parent, draft);
    return atom !== undefined && oxidiseAtom(atom, draft);
  });
}

/** `N` and `S` alone mean the only nitrogen or sulfur that can bear the oxygen. */
function meantAtom(locant: Locant, parent: BuiltUnit, draft: Draft): number | undefined {
  const named = parent.places.at(locant);
  const able = (atom: number | undefined) =>
    atom !== undefined && [phosphorus, sulfur, selenium].includes(draft.atoms[atom]!.atomicNumber);
  const nitrogens = tertiaryNitrogens(draft);
  if (named !== undefined && (able(named) || nitrogens.includes(named))) return named;
  const found =
    locant === 'N'
      ? nitrogens
      : locant === 'S' || locant === 'P'
        ? draft.atoms.flatMap(({ atomicNumber }, index) =>
            atomicNumber === (locant === 'S' ? sulfur : phosphorus) ? [index] : [],
          )
        : [];
  return found.length === 1 ? found[0] : undefined;
}

function oxidiseAtom(atom: number, draft: Draft): boolean {
  const own = draft.atoms[atom]!;
  if (own.atomicNumber === nitrogen) {
    if (own.charge !== 0) return false;
    own.charge = 1;
    own.capacity++;
    const [oxygen] = addSmiles('[O-]', draft);
    draft.atoms[oxygen!]!.capacity = 1;
    draft.bond(atom, oxygen!, 1);
    return true;
  }
  return addDouble(atom, 'O', draft);
}

function addDouble(atom: number, group: string, draft: Draft): boolean {
  const most = draft.atoms[atom]!.atomicNumber === phosphorus ? 5 : 6;
  // A bonding number that the name gives (`5λ4-thia… 5-oxide`) has room for the oxygen already.
  const more = draft.bonded.has(atom) && draft.free(atom) >= 2 ? 0 : 2;
  if (draft.atoms[atom]!.capacity + more > most) return false;
  draft.atoms[atom]!.capacity += more;
  draft.bond(atom, addSmiles(group, draft)[0]!, 2);
  return true;
}

/** `styrene oxide`, `trimethylamine oxide`, `triphenylphosphine sulfide`: on the only place that can bear it. */
export function oxideOf(word: string, count: number, draft: Draft): boolean {
  const group = { oxide: 'O', sulfide: 'S', selenide: '[Se]' }[word];
  if (group === undefined) return false;
  const phosphorusAtoms = phosphines(draft);
  const nitrogens = word === 'oxide' ? tertiaryNitrogens(draft) : [];
  const doubles = word === 'selenide' ? [] : alkenes(draft);
  if (phosphorusAtoms.length + nitrogens.length + doubles.length !== count) return false;
  if (phosphorusAtoms.length === count) return phosphorusAtoms.every((atom) => addDouble(atom, group, draft));
  if (nitrogens.length === count) return nitrogens.every((atom) => oxidiseAtom(atom, draft));
  return doubles.length === count && doubles.every((bond) => addBridge(bond, group, draft));
}

function addBridge(bond: number, group: string, draft: Draft): boolean {
  const { from, to } = draft.bonds[bond]!;
  draft.bonds[bond]!.order = 1;
  const [bridge] = addSmiles(group, draft);
  draft.bond(from, bridge!, 1);
  draft.bond(to, bridge!, 1);
  return true;
}

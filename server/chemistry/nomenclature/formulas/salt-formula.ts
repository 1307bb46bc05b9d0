/**
 * Reads the formulas of salts, oxides, hydrides, acids and complexes: cations and metals, then hydrogens of acid salts, then
 * anions and ligands in any order. The longest known piece is taken at each place; where the rest then makes no compound
 * with balanced charges, a shorter one is tried.
 */
import { chargeIn, drawSalt, type Member } from '../inorganic/draw-salt.ts';
import { formulaAnions, formulaCations, formulaLigands, metalCharges } from '../vocabulary/formula-ions.ts';
import { bracketAt, countAt } from './formula-text.ts';
import { fragments, type Steps } from './line-formula.ts';
import { SymbolTable } from './symbols.ts';

const cations = new SymbolTable(formulaCations);
const anions = new SymbolTable(formulaAnions);
const ligands = new SymbolTable(formulaLigands);
/** The SMILES of a ligand by its symbol, as it stands after a dot: `SO3·pyridine`. */
export const ligandSmiles = (symbol: string): string | undefined => ligands.get(symbol);

const metals = new SymbolTable(Object.keys(metalCharges).map((symbol) => [symbol, symbol]));

/** Anions that a metal with a choice of charges would make ambiguous: `MnO2` is no peroxide, `FeI3` no triiodide. */
const besideFixedCharges: ReadonlySet<string> = new Set(['[O-][O-]', 'I[I-]I', 'Br[Br-]Br', '[C-]#[C-]']);

/** The SMILES of a salt or complex, or undefined. */
export function saltFormula(text: string, steps: Steps): string | undefined {
  for (const members of memberRows(text, 0, 'front', steps)) {
    if (!isSalt(members)) continue;
    const drawn = drawSalt(members);
    if (drawn !== undefined) return drawn;
  }
  return turnedSalt(text, steps);
}

function isSalt(members: readonly Member[]): boolean {
  const open = members.some((one) => one.kind === 'metal' && metalCharges[one.symbol]!.length > 1);
  const ions = members.flatMap((one) => (one.kind === 'ion' ? [one.smiles] : []));
  if (ions.length + members.filter((one) => one.kind === 'metal').length === 0) return false;
  if (new Set(ions).size < ions.length || !isPlain(ions.filter((smiles) => atomic.test(smiles))))
    return false;
  return !(open && ions.some((smiles) => besideFixedCharges.has(smiles)));
}

const atomic = /^\[[A-Z][a-z]?-\d?\]$/;

/** One kind of monatomic anion, or oxide before halide as in `ZrOCl2`. */
function isPlain(anions: readonly string[]): boolean {
  return (
    anions.length < 2 ||
    (anions.length === 2 && anions[0] === '[O-2]' && /^\[(?:F|Cl|Br|I)-\]$/.test(anions[1]!))
  );
}

/** Before the first cation or metal; among them; after them. */
type Stage = 'front' | 'cations' | 'rest';

function* memberRows(text: string, at: number, stage: Stage, steps: Steps): Generator<Member[]> {
  if (steps.left-- <= 0) return;
  if (at === text.length) {
    yield [];
    return;
  }
  const found = [...membersAt(text, at, stage, steps)].sort((first, second) => second.end - first.end);
  if (stage !== 'front') found.push(...groupAnion(text, at, stage, steps));
  for (const { member, end, next } of found) {
    for (const rest of memberRows(text, end, next, steps)) yield [...member, ...rest];
  }
}

interface Found {
  readonly member: readonly Member[];
  readonly end: number;
  readonly next: Stage;
}

function* membersAt(text: string, at: number, stage: Stage, steps: Steps): Generator<Found> {
  if (text[at] === '(' || text[at] === '[') {
    yield* bracketed(text, at, stage, steps);
    return;
  }
  const after = stage === 'front' ? 'front' : 'rest';
  if (stage !== 'rest') {
    yield* counted(text, at, cations, ionOf, 'cations');
    yield* counted(text, at, metals, (symbol, count) => ({ kind: 'metal', symbol, count }), 'cations');
    const hydrogens = text[at] === 'H' ? countAt(text, at + 1) : undefined;
    if (hydrogens)
      yield { member: [{ kind: 'hydrogen', count: hydrogens.count }], end: hydrogens.end, next: 'rest' };
  }
  if (stage !== 'front' || text.startsWith('Cp', at)) yield* counted(text, at, anions, ionOf, after);
  // After the metal ligands stand in brackets (`Wen` is no complex), before it short ones do (`PyW`).
  if (stage === 'front') {
    for (const found of counted(text, at, ligands, ligandOf, after)) if (found.end - at > 3) yield found;
  }
}

/** The rest of the text as the anion of an alcohol, acid or amide; tried when the tables of ions have nothing. */
function* groupAnion(text: string, at: number, stage: Stage, steps: Steps): Generator<Found> {
  if (stage === 'rest' && text[at] !== 'O') return;
  for (const { anion } of fragments(text.slice(at), steps))
    if (anion !== undefined) yield { member: [ionOf(anion, 1)], end: text.length, next: 'rest' };
}

const ionOf = (smiles: string, count: number): Member => ({ kind: 'ion', smiles, count });
const ligandOf = (smiles: string, count: number): Member => ({ kind: 'ligand', smiles, count });

/** What a table has at a place, with its number. */
function* counted(
  text: string,
  at: number,
  table: SymbolTable,
  make: (smiles: string, count: number) => Member,
  next: Stage,
): Generator<Found> {
  for (const { smiles, end } of table.at(text, at)) {
    const number = countAt(text, end);
    if (number) yield { member: [make(smiles, number.count)], end: number.end, next };
  }
}

/** What stands in brackets: an ion, a ligand, a group that is one as anion, or a complex of its own. */
function* bracketed(text: string, at: number, stage: Stage, steps: Steps): Generator<Found> {
  const bracket = bracketAt(text, at);
  if (!bracket) return;
  const { inner, count, end } = bracket;
  const next: Stage = stage === 'front' ? 'front' : 'rest';
  const cation = cations.get(inner);
  if (cation !== undefined && stage !== 'rest')
    yield { member: [{ kind: 'ion', smiles: cation, count }], end, next: 'cations' };
  const anion = anions.get(inner);
  if (anion !== undefined && stage !== 'front')
    yield { member: [{ kind: 'ion', smiles: anion, count }], end, next: 'rest' };
  const ligand = ligands.get(inner) ?? (inner === 'CO' ? '[C-]#[O+]' : undefined);
  if (ligand !== undefined) yield { member: [{ kind: 'ligand', smiles: ligand, count }], end, next };
  if (anion !== undefined || ligand !== undefined || cation !== undefined) return;
  if (stage !== 'front') {
    for (const one of fragments(inner, steps))
      if (one.anion !== undefined)
        yield { member: [{ kind: 'ion', smiles: one.anion, count }], end, next: 'rest' };
  }
  if (text[at] === '[') {
    for (const members of memberRows(inner, 0, 'front', steps)) {
      const member = members.map((one) => ({ ...one, count: one.count * count }));
      yield { member, end, next: member.some((one) => one.kind === 'metal') ? 'cations' : next };
    }
  }
}

const lastCation = /(NH4|Li|Na|K|Cs|Ag|Mg|Ca|Ba|Zn|Cu)$/;

/** Salts of organic acids, alcohols and amides with the cation last: `CH3CO2Na`, `tBuOK`, `(CF3CO2)2Zn`, `PhBF3K`. */
function turnedSalt(text: string, steps: Steps): string | undefined {
  const cation = lastCation.exec(text)?.[1];
  if (cation === undefined) return undefined;
  const front = text.slice(0, text.length - cation.length);
  const positive: Member =
    cation === 'NH4'
      ? { kind: 'ion', smiles: '[NH4+]', count: 1 }
      : { kind: 'metal', symbol: cation, count: 1 };
  const bracket = bracketAt(front, 0);
  const whole = bracket?.end === front.length ? bracket : { inner: front, count: 1 };
  const found = new Set(negatives(whole.inner, steps));
  const [negative] = found;
  if (found.size !== 1 || negative === undefined || chargeIn(negative) !== -1) return undefined;
  return drawSalt([positive, { kind: 'ion', smiles: negative, count: whole.count }]);
}

function negatives(front: string, steps: Steps): string[] {
  if (front.endsWith('BF3')) {
    return fragments(front.slice(0, -3), steps).map(({ smiles }) => `[B-](F)(F)(F)${smiles}`);
  }
  // The sulfonyl group as an anion is a sulfinate, charged on oxygen.
  const written = front.endsWith('SO2') ? `${front.slice(0, -3)}S(O)-O` : front;
  return fragments(written, steps).flatMap(({ anion }) => (anion === undefined ? [] : [anion]));
}

/**
 * How salts, oxides and complexes of metals are drawn, in one place for formulas and names:
 *
 * - as ions side by side, each as often as the charges ask for (Red Book 2005, IR-5.4); nothing is left over;
 * - but the halides, oxides, sulfides and oxide halides of one metal atom, and the oxides of two, with a charge of 4 and more
 *   are molecules (`TiCl4`, `MnO2`, `OsO4`, `V2O5`): oxygen doubly bound or between the two, halogen singly bound;
 * - and so is a single oxygen or sulfur with a single metal of charge 2 (`MgO`, `CuS`), as collections of structures have it;
 * - neutral ligands and a metal without charge stand beside the rest (`Pd(PPh3)4`);
 * - hydrogen of acid salts sits on an oxygen or sulfur of the anion (`NaHCO3`).
 *
 * Composition and charge are exact whatever the convention.
 */
import { metalCharges } from '../vocabulary/formula-ions.ts';

export type Member =
  | { readonly kind: 'metal'; readonly symbol: string; readonly charge?: number; readonly count: number }
  | { readonly kind: 'ion' | 'ligand'; readonly smiles: string; readonly count: number }
  | { readonly kind: 'hydrogen'; readonly count: number };

type Ion = Extract<Member, { kind: 'ion' | 'ligand' }>;
type Metal = Extract<Member, { kind: 'metal' }>;

/** Copies of one thing beyond which a formula is no compound that anybody has in a bottle. */
const mostCopies = 24;

/** Sum of the charges written in a SMILES. */
export function chargeIn(smiles: string): number {
  let sum = 0;
  for (const [, sign, size] of smiles.matchAll(/\[[^\]+-]*([+-])(\d*)\]/g))
    sum += (sign === '+' ? 1 : -1) * (size === '' ? 1 : Number(size));
  return sum;
}

/** The SMILES of a compound of these members, or undefined where charges do not balance or no metal has that one. */
export function drawSalt(members: readonly Member[]): string | undefined {
  if (members.some(({ count }) => count < 1 || count > mostCopies)) return undefined;
  const settled = withHydrogens(members);
  if (!settled) return undefined;
  const ions = settled.filter((one): one is Ion => one.kind === 'ion' || one.kind === 'ligand');
  const metals = settled.filter((one): one is Metal => one.kind === 'metal');
  if (
    ions.some(({ smiles }) => saltLikeOnly.has(smiles)) &&
    !metals.every(({ symbol }) => saltLike.has(symbol))
  )
    return undefined;
  const charges = metalChargesOf(metals, ions);
  if (!charges || metals.length + ions.length === 0) return undefined;
  const whole = charges.length === 1 ? molecule(metals[0]!, charges[0]!, ions) : undefined;
  if (whole !== undefined) return whole;
  const parts = metals.flatMap(({ symbol, count }, index) => repeated(ionOf(symbol, charges[index]!), count));
  parts.push(...ions.flatMap(({ smiles, count }) => repeated(smiles, count)));
  return parts.join('.');
}

const repeated = (smiles: string, count: number): string[] => Array.from({ length: count }, () => smiles);

function ionOf(symbol: string, charge: number): string {
  return `[${symbol}${charge === 0 ? '' : charge === 1 ? '+' : `+${String(charge)}`}]`;
}

/** The charge of each metal: as stated, as its only one, or as what is left for the one metal that has several. */
function metalChargesOf(metals: readonly Metal[], ions: readonly Ion[]): number[] | undefined {
  let left = -ions.reduce((sum, ion) => sum + chargeIn(ion.smiles) * ion.count, 0);
  const known = metals.map(({ symbol, charge }) => {
    const usual = metalCharges[symbol] ?? [];
    return charge ?? (usual.length === 1 ? usual[0] : undefined);
  });
  metals.forEach(({ count }, index) => (left -= (known[index] ?? 0) * count));
  const open = metals.filter((_, index) => known[index] === undefined);
  if (open.length > 1) return undefined;
  const [one] = open;
  if (!one) return left === 0 ? (known as number[]) : undefined;
  const charge = left / one.count;
  const usual = metalCharges[one.symbol] ?? [];
  if (!usual.includes(charge) || (charge === 0 && !ions.some(({ kind }) => kind === 'ligand')))
    return undefined;
  return known.map((value) => value ?? charge);
}

/** Nitrides, phosphides and carbides are salts of the metals of groups 1 and 2 only. */
const saltLikeOnly: ReadonlySet<string> = new Set(['[N-3]', '[P-3]', '[C-]#[C-]']);

const halides: ReadonlySet<string> = new Set(['[F-]', '[Cl-]', '[Br-]', '[I-]']);

/** The molecular halides and oxides of metals with a high charge; ligands stay beside them. */
function molecule(metal: Metal, charge: number, members: readonly Ion[]): string | undefined {
  const bound = members.filter(({ kind }) => kind === 'ion');
  const pair =
    charge === 2 && bound.length === 1 && bound[0]!.count === 1 && chalcogenides.has(bound[0]!.smiles);
  if (!pair && (charge < 4 || !bound.every(({ smiles }) => halides.has(smiles) || chalcogenides.has(smiles))))
    return undefined;
  const beside = members.filter(({ kind }) => kind === 'ligand');
  const core = metal.count === 1 ? oneCentre(metal.symbol, bound) : twoCentres(metal, bound);
  return core && [core, ...beside.flatMap(({ smiles, count }) => repeated(smiles, count))].join('.');
}

const oxide = '[O-2]';
const chalcogenides: ReadonlySet<string> = new Set([oxide, '[S-2]', '[Se-2]', '[Te-2]']);

function oneCentre(symbol: string, bound: readonly Ion[]): string {
  const arms = bound.flatMap(({ smiles, count }) => {
    const atom = /[A-Z][a-z]?/.exec(smiles)![0];
    return repeated(chalcogenides.has(smiles) ? `(=[${atom}])` : `(${atom})`, count);
  });
  return `[${symbol}]${arms.join('')}`;
}

/** `V2O5`, `Re2O7`: one oxygen between two metals, the others doubly bound. */
function twoCentres({ symbol, count }: Metal, bound: readonly Ion[]): string | undefined {
  const [only] = bound;
  if (count !== 2 || bound.length !== 1 || only?.smiles !== oxide || only.count % 2 === 0) return undefined;
  const half = `[${symbol}]${'(=O)'.repeat((only.count - 1) / 2)}`;
  return `${half}O${half}`;
}

/** Puts hydrogens on the anions; beside a metal of groups 1 and 2 alone they are hydride. */
function withHydrogens(members: readonly Member[]): Member[] | undefined {
  const hydrogens = members.reduce((sum, one) => sum + (one.kind === 'hydrogen' ? one.count : 0), 0);
  const others = members.filter((one) => one.kind !== 'hydrogen');
  if (hydrogens === 0) return others;
  const anions = others.filter((one): one is Ion => one.kind === 'ion' && chargeIn(one.smiles) < 0);
  if (anions.length === 0) {
    const plain = others.length === 1 && others[0]!.kind === 'metal' && saltLike.has(others[0]!.symbol);
    return plain ? [...others, { kind: 'ion', smiles: '[H-]', count: hydrogens }] : undefined;
  }
  const [anion] = anions;
  if (anions.length > 1 || !anion || hydrogens % anion.count !== 0) return undefined;
  let { smiles } = anion;
  for (let left = hydrogens / anion.count; left > 0; left--) {
    const taken = protonated(smiles);
    if (taken === undefined) return undefined;
    smiles = taken;
  }
  return others.map((one) => (one === anion ? { ...anion, smiles } : one));
}

const saltLike: ReadonlySet<string> = new Set(['Li', 'Na', 'K', 'Rb', 'Cs', 'Mg', 'Ca', 'Sr', 'Ba']);

/** A hydrogen on the first oxygen or sulfur that bears a charge. */
function protonated(smiles: string): string | undefined {
  for (const [ion, acid] of [
    ['[O-]', 'O'],
    ['[S-]', 'S'],
    ['[S-2]', '[SH-]'],
  ] as const) {
    if (smiles.includes(ion)) return smiles.replace(ion, acid);
  }
  return undefined;
}

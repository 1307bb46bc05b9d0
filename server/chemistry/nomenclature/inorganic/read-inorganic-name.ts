/**
 * Reads compositional names of inorganic compounds (Red Book 2005, IR-5): `copper(I) iodide`, `iron(III) chloride
 * hexahydrate`, `manganese dioxide`, `disodium hydrogen phosphate`, `phosphorus trichloride`, `ferric chloride`. A metal with
 * a choice of charges and no number in the name gives one reading for each.
 */
import { metalCharges } from '../vocabulary/formula-ions.ts';
import {
  boundAtoms,
  centralAtoms,
  notWithCopperOne,
  silentCharges,
  solvateWords,
} from '../vocabulary/inorganic-words.ts';
import {
  anionWord,
  cationWord,
  hydrogenWord,
  metalSymbols,
  unmultiplied,
  type AnionWord,
  type CationWord,
} from './compositional-words.ts';
import { chargeIn, drawSalt, type Member } from './draw-salt.ts';

/** One structure that an inorganic name can mean, with the charge that the name left out. */
export interface InorganicReading {
  readonly smiles: string;
  /** `(II)` is to be written after the metal. */
  readonly charge?: number;
}

const longestName = 90;
const withoutCopperOne = new Set(notWithCopperOne.map((word) => anionWord(word)?.smiles));
const solvates = solvateWords.flatMap(([words, smiles]) =>
  words.split('|').map((word) => [` ${word}`, smiles] as const),
);

/** What the name, in lower case, can mean; empty where it is no such name. */
export function readInorganicName(lower: string): readonly InorganicReading[] {
  if (lower.length > longestName) return [];
  const alone = metalSymbols.get(lower);
  if (alone !== undefined) return [{ smiles: `[${alone}]` }];
  const { name, beside } = withoutSolvate(lower.replace(/ \(/g, '('));
  const words = name.split(' ');
  if (words.length < 2 || words.length > 6) return [];
  const molecule = words.length === 2 ? molecular(words[0]!, words[1]!) : undefined;
  const found = molecule === undefined ? ionic(words) : [{ smiles: molecule }];
  return found.map((one) => ({ ...one, smiles: [one.smiles, ...beside].join('.') }));
}

/** The name without `hexahydrate` or `diethyl etherate`, and the molecules that these add. */
function withoutSolvate(lower: string): { name: string; beside: readonly string[] } {
  for (const [words, smiles] of solvates)
    if (lower.endsWith(words)) return { name: lower.slice(0, -words.length), beside: [smiles] };
  const at = lower.lastIndexOf(' ');
  const last = lower.slice(at + 1);
  if (at > 0 && last.endsWith('hydrate')) {
    for (const { rest, count } of unmultiplied(last)) {
      // Without a number nobody says how much water there is.
      if (rest === 'hydrate' && count !== undefined)
        return { name: lower.slice(0, at), beside: Array.from({ length: count }, () => 'O') };
    }
  }
  return { name: lower, beside: [] };
}

/** Halides, oxides and sulfides of one non-metal atom: `phosphorus trichloride`, `sulfur(VI) fluoride`. */
function molecular(centre: string, bound: string): string | undefined {
  const [, name, number] = /^([a-z]+)(?:\(([iv]+)\))?$/.exec(centre) ?? [];
  const atom = centralAtoms.find(([word]) => word === name);
  if (!atom) return undefined;
  const [, symbol, bonds] = atom;
  for (const { rest, count } of unmultiplied(bound)) {
    const arm = boundAtoms.find(([word]) => word === rest);
    if (!arm) continue;
    const [, written, order] = arm;
    const charge =
      number === undefined ? undefined : ['i', 'ii', 'iii', 'iv', 'v', 'vi', 'vii'].indexOf(number) + 1;
    const arms = count ?? (charge === undefined ? undefined : charge / order);
    if (arms === undefined || !Number.isInteger(arms) || !bonds.includes(arms * order)) continue;
    if (charge !== undefined && charge !== arms * order) continue;
    return `[${symbol}]${`(${written})`.repeat(arms)}`;
  }
  return undefined;
}

function ionic(words: readonly string[]): InorganicReading[] {
  for (const length of [1, 2]) {
    const anion = anionWord(words.slice(-length).join(' '));
    const before = words.slice(0, -length);
    if (!anion || before.length === 0) continue;
    const hydrogens = hydrogenWord(before[before.length - 1]!);
    const found = salts(hydrogens === undefined ? before : before.slice(0, -1), hydrogens, anion);
    if (found.length > 0) return found;
  }
  // `hydrogencarbonate`, `dihydrogenphosphate` in one word.
  const [, hydrogen, rest] = /^((?:di)?hydrogen)([a-z]+)$/.exec(words[words.length - 1]!) ?? [];
  const anion = rest === undefined ? undefined : anionWord(rest);
  return anion ? salts(words.slice(0, -1), hydrogenWord(hydrogen!), anion) : [];
}

function salts(
  before: readonly string[],
  hydrogens: number | undefined,
  anion: AnionWord,
): InorganicReading[] {
  const cations: CationWord[] = [];
  for (const word of before) {
    const cation = cationWord(word);
    if (!cation) return [];
    cations.push(cation);
  }
  if (cations.length === 0 || cations.length > 2) return [];
  return cations.length === 1
    ? simpleSalts(cations[0]!, hydrogens, anion)
    : doubleSalts(cations, hydrogens, anion);
}

/** Charges that a cation can have here: its own, the stated one, or each usual one where the name is silent. */
function chargesOf(cation: CationWord, anion: AnionWord): readonly number[] {
  if (cation.smiles !== undefined) return [chargeIn(cation.smiles)];
  if (cation.charge !== undefined) return [cation.charge];
  const usual = (metalCharges[cation.symbol!] ?? []).filter((charge) => charge > 0);
  const silent = silentCharges[cation.symbol!];
  // `manganese dioxide` states its charge by the numbers; `copper chloride` leaves it open.
  if (silent !== undefined && anion.count === undefined) return [silent];
  return cation.symbol === 'Cu' && withoutCopperOne.has(anion.smiles) ? [2] : usual;
}

function simpleSalts(
  cation: CationWord,
  hydrogens: number | undefined,
  anion: AnionWord,
): InorganicReading[] {
  const charges = chargesOf(cation, anion);
  const found: InorganicReading[] = [];
  for (const charge of charges) {
    const down = -chargeIn(anion.smiles) - (hydrogens ?? 0);
    const counts = down > 0 ? proportions(charge, cation.count, down, anion.count) : undefined;
    const smiles =
      counts && drawn([{ ...cation, count: counts[0] }], [charge], hydrogens, { ...anion, count: counts[1] });
    if (smiles !== undefined) found.push(charges.length === 1 ? { smiles } : { smiles, charge });
  }
  return found.length === 1 ? [{ smiles: found[0]!.smiles }] : found;
}

/** Numbers of cations and anions: those stated, else the smallest with balanced charges (IR-5.4.2). */
function proportions(
  up: number,
  cations: number | undefined,
  down: number,
  anions: number | undefined,
): [number, number] | undefined {
  // `iron trichloride` has one iron: a stated number of anions goes with a stated or single cation.
  const first = cations ?? (anions === undefined ? undefined : 1);
  if (first === undefined) {
    for (let count = 1; count <= down; count++)
      if ((count * up) % down === 0) return [count, (count * up) / down];
    return undefined;
  }
  const second = (first * up) / down;
  return Number.isInteger(second) && (anions === undefined || anions === second)
    ? [first, second]
    : undefined;
}

/** Two cations with one anion of charge 2 and more: one of each unless the name says otherwise. */
function doubleSalts(
  cations: readonly CationWord[],
  hydrogens: number | undefined,
  anion: AnionWord,
): InorganicReading[] {
  const charges = cations.map((cation) => chargesOf(cation, anion));
  const down = -chargeIn(anion.smiles) - (hydrogens ?? 0);
  if (charges.some(({ length }) => length !== 1) || down < 2) return [];
  const up = cations.reduce((sum, { count }, index) => sum + (count ?? 1) * charges[index]![0]!, 0);
  const count = up / down;
  if (!Number.isInteger(count) || (anion.count !== undefined && anion.count !== count)) return [];
  const smiles = drawn(cations, charges.flat(), hydrogens, { ...anion, count });
  return smiles === undefined ? [] : [{ smiles }];
}

function drawn(
  cations: readonly CationWord[],
  charges: readonly number[],
  hydrogens: number | undefined,
  anion: AnionWord,
): string | undefined {
  const members: Member[] = cations.map(({ symbol, smiles, count }, index) =>
    symbol === undefined
      ? { kind: 'ion', smiles: smiles!, count: count ?? 1 }
      : { kind: 'metal', symbol, charge: charges[index]!, count: count ?? 1 },
  );
  const known = cations.every(
    ({ symbol }, index) => symbol === undefined || metalCharges[symbol]?.includes(charges[index]!),
  );
  if (!known) return undefined;
  const copies = anion.count ?? 1;
  if (hydrogens !== undefined) members.push({ kind: 'hydrogen', count: hydrogens * copies });
  return drawSalt([...members, { kind: 'ion', smiles: anion.smiles, count: copies }]);
}

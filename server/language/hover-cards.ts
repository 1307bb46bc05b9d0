/** The cards that a hover can show. Everything in them is computed here and now, nothing is asked of the toolkit. */
import type { Composition } from '../chemistry/composition/composition.ts';
import { prettyFormula } from '../chemistry/composition/format-formula.ts';
import { averageMass, monoisotopicMass } from '../chemistry/composition/mass.ts';
import { degreeOfUnsaturation } from '../chemistry/composition/unsaturation.ts';
import {
  countInWords,
  type NameReading,
  type Reading,
  type UnderstoodName,
} from '../chemistry/nomenclature/reading.ts';
import { canonicalSmiles } from '../chemistry/structure/canonical-smiles.ts';
import { compositionOf } from '../chemistry/structure/composition-of.ts';
import type { Molecule } from '../chemistry/structure/molecule.ts';
import { valenceProblems } from '../chemistry/structure/valence.ts';
import type { CompoundModel } from '../checks/model.ts';
import { mostAtoms } from '../toolkit/toolkit.ts';
import { mostDrawings, type Drawing, type HoverCard } from './hover-card.ts';

type Row = readonly [string, string];

/** Names listed before the rest is only counted. */
const mostListed = 12;

/** Molar mass, monoisotopic mass and unsaturation, as far as they are defined. */
export function massRows(composition: Composition): Row[] {
  const rows: Row[] = [];
  const average = averageMass(composition);
  if (average !== undefined) rows.push(['molar mass', `${average.toFixed(2)} g/mol`]);
  const exact = monoisotopicMass(composition);
  if (exact !== undefined) rows.push(['monoisotopic mass', `${exact.toFixed(4)} u`]);
  const unsaturation = degreeOfUnsaturation(composition);
  if (unsaturation !== undefined) rows.push(['unsaturation', String(unsaturation)]);
  return rows;
}

export function formulaCard(composition: Composition): HoverCard {
  return { title: prettyFormula(composition), rows: massRows(composition) };
}

/**
 * One structure. `smiles` is drawn as written, so that an emphasized atom is the one under the cursor; without it
 * the canonical one.
 */
export function structureCard(
  molecule: Molecule,
  title: string | undefined,
  smiles?: string,
  highlight?: readonly number[],
): HoverCard {
  if (valenceProblems(molecule).length > 0) {
    // What cannot exist has no formula and no mass, least of all under the name of something that does.
    return {
      title: title ?? 'An impossible structure',
      lines: ['No formula and no mass: an atom has too many bonds.'],
    };
  }
  const composition = compositionOf(molecule);
  const formula = prettyFormula(composition);
  const card: HoverCard = {
    title: title ?? formula,
    ...(title === undefined ? {} : { subtitle: formula }),
    rows: massRows(composition),
  };
  // Nobody draws such a structure, and its canonical form would hold up the editor.
  if (molecule.atoms.length > mostAtoms) return card;
  const identity = canonicalSmiles(molecule);
  const drawing: Drawing = {
    smiles: smiles ?? identity,
    caption: title ?? formula,
    ...(highlight === undefined ? {} : { highlight }),
  };
  return { ...card, drawings: [drawing], identity };
}

/** Everything that a name can mean. */
export function nameCard(name: string, reading: NameReading): HoverCard {
  switch (reading.kind) {
    case 'unknown':
      return {
        title: name,
        lines: [
          reading.message,
          ...(reading.suggestions.length > 0
            ? [`Known words near it: ${reading.suggestions.join(', ')}.`]
            : []),
        ],
      };
    case 'mixture':
      return {
        title: name,
        subtitle: 'a mixture',
        drawings: reading.components.slice(0, mostDrawings).map(drawingOf),
        lines: [reading.message],
      };
    case 'understood':
      return reading.readings.length === 1
        ? definiteCard(reading.readings[0]!)
        : ambiguousCard(name, reading);
  }
}

function definiteCard(reading: Reading): HoverCard {
  const card = structureCard(reading.molecule, reading.name);
  const open = reading.stereoisomers;
  if (open.length === 0) return card;
  const count = reading.stereoisomerCount ?? open.length;
  return {
    // The key of the structure without stereo would be that of none of them.
    ...without(card, 'identity'),
    ...(open.length <= mostDrawings
      ? { drawings: open.map(({ name, molecule }) => ({ smiles: canonicalSmiles(molecule), caption: name })) }
      : {}),
    lines: [
      `${count} stereoisomers open: ${listed(
        open.map(({ name }) => name),
        count,
      )}.`,
    ],
  };
}

function without<T extends object, K extends keyof T>(value: T, key: K): Omit<T, K> {
  const rest = { ...value };
  Reflect.deleteProperty(rest, key);
  return rest;
}

function ambiguousCard(name: string, reading: UnderstoodName): HoverCard {
  const { readings } = reading;
  const count = reading.count ?? readings.length;
  const formulas = new Set(readings.map(({ molecule }) => prettyFormula(compositionOf(molecule))));
  const shared =
    formulas.size === 1 && count === readings.length ? compositionOf(readings[0]!.molecule) : undefined;
  return {
    title: name,
    subtitle: `${countInWords(reading)} readings${shared === undefined ? '' : ` of ${prettyFormula(shared)}`}`,
    drawings: readings.slice(0, mostDrawings).map(drawingOf),
    ...(shared === undefined ? {} : { rows: massRows(shared) }),
    ...(count > mostDrawings
      ? {
          lines: [
            `Readings: ${listed(
              readings.map((reading) => reading.name),
              count,
            )}.`,
          ],
        }
      : {}),
  };
}

function drawingOf({ name, molecule }: Reading): Drawing {
  return { smiles: canonicalSmiles(molecule), caption: name };
}

function listed(names: readonly string[], count: number): string {
  const shown = names.slice(0, mostListed).join('; ');
  return count > mostListed || count > names.length ? `${shown}; … (${count} in all)` : shown;
}

/** The whole block: its structure under its name, or else the best that is known. */
export function compoundCard(model: CompoundModel): HoverCard | undefined {
  const { entry, structure, nameReading, formula } = model;
  const name = entry.name?.text.text;
  const label = entry.label?.text.text;
  const titled = (card: HoverCard): HoverCard =>
    label === undefined ? card : { ...card, title: `${label} · ${card.title ?? ''}` };
  if (structure !== undefined) return titled(structureCard(structure, name));
  if (name !== undefined && nameReading !== undefined && nameReading.kind !== 'unknown') {
    return titled(nameCard(name, nameReading));
  }
  return formula === undefined ? undefined : titled(formulaCard(formula));
}

/**
 * Reads a quantity as an experimental section prints it: `1.50 g`, `ca. 20 mL`, `152.2 ± 0.3 g/mol`,
 * `164–166 °C`, `> 98 %`. The interval is that of the last digit; a statement that is called approximate stands
 * for a tenth of itself to either side (common practice, no source).
 */
import { problemAt, type Read } from '../text.ts';
import type { Quantity } from './quantity.ts';
import { readNumberAt, type LabNumber } from './read-number.ts';
import { unitOf, units, type UnitKind } from './units.ts';

export interface QuantityOptions {
  /** The kinds of unit that make sense here. */
  readonly kinds: readonly UnitKind[];
  /** What a bare number is in. Without it, a number without a unit is a problem. */
  readonly defaultUnit?: string;
}

const approximation = /^(?:ca\.?|circa|about|approx(?:imately)?\.?|~|≈|∼)(?=[\s\d.]|$)\s*/i;
const comparison = /^([<>≤≥])\s*/;
const plusMinus = /^\s*(?:±|\+\/-|\+-)\s*/;
const rangeMark = /^(?:\s*(?:–|—|‒|−|-|…|\.\.\.?)\s*|\s+to\s+)(?=[-+−]?[\d.])/;
const approximateShare = 0.1;

/** Reads the whole text, white space around it and a remark in parentheses after it aside. */
export function readQuantity(text: string, options: QuantityOptions): Read<Quantity> {
  const end = text.trimEnd().length;
  let at = text.length - text.trimStart().length;
  if (at >= end) return problemAt(0, text.length, `A number ${unitPhrase(options)} is expected here.`);
  const skip = (pattern: RegExp): RegExpExecArray | null => {
    const found = pattern.exec(text.slice(at, end));
    if (found !== null) at += found[0].length;
    return found;
  };
  const approximate = skip(approximation) !== null;
  const compared = skip(comparison)?.[1];
  const first = readNumberAt(text, at);
  if (first.problem !== undefined) {
    // A decimal comma is told exactly; otherwise the whole of it is no number.
    const { range, message } = first.problem;
    return range.end < end
      ? problemAt(range.start, range.end, message)
      : problemAt(at, end, `“${text.slice(at, end)}” is no number. Write a number ${unitPhrase(options)}.`);
  }
  const { value: number } = first;
  at = number.range.end;
  let { low, high } = intervalOf(number);
  let value = number.value;
  let numberEnd = at;
  if (skip(plusMinus) !== null) {
    const margin = readNumberAt(text, at);
    if (margin.problem !== undefined) return { problem: margin.problem };
    const half = Math.max(Math.abs(margin.value.value), number.halfUnit);
    low = value - half;
    high = value + half;
    at = margin.value.range.end;
    numberEnd = at;
  } else if (skip(rangeMark) !== null) {
    const second = readNumberAt(text, at);
    if (second.problem !== undefined) return { problem: second.problem };
    if (second.value.value < value) {
      return problemAt(
        number.range.start,
        second.value.range.end,
        `This range runs backwards: ${second.value.value} is less than ${value}. Write the lower number first.`,
      );
    }
    high = intervalOf(second.value).high;
    value = (value + second.value.value) / 2;
    at = second.value.range.end;
    numberEnd = at;
  }
  const unitStart = at + /^\s*/.exec(text.slice(at, end))![0].length;
  const unitEnd = endBeforeRemark(text, unitStart, end);
  const unitText = text.slice(unitStart, unitEnd);
  const unit = unitText === '' ? options.defaultUnit : unitOf(unitText, options.kinds)?.unit;
  if (unit === undefined) {
    return unitText === ''
      ? problemAt(
          number.range.start,
          numberEnd,
          `A unit is missing. Write the number ${unitPhrase(options)}.`,
        )
      : problemAt(
          unitStart,
          unitEnd,
          `“${unitText}” is no unit that belongs here. Write the number ${unitPhrase(options)}.`,
        );
  }
  if (approximate) {
    const widening = Math.abs(value) * approximateShare;
    low = Math.min(low, value - widening);
    high = Math.max(high, value + widening);
  }
  if (compared === '<' || compared === '≤') low = Number.NEGATIVE_INFINITY;
  if (compared === '>' || compared === '≥') high = Number.POSITIVE_INFINITY;
  return {
    value: {
      value,
      low,
      high,
      unit,
      decimals: number.decimals,
      approximate,
      numberRange: { start: number.range.start, end: numberEnd },
    },
  };
}

function intervalOf(number: LabNumber): { low: number; high: number } {
  return { low: number.value - number.halfUnit, high: number.value + number.halfUnit };
}

/** A remark in parentheses after the quantity, such as `(calcd)`, is left aside. */
function endBeforeRemark(text: string, start: number, end: number): number {
  if (text[end - 1] !== ')') return end;
  const open = text.lastIndexOf('(', end - 1);
  return open < start ? end : start + text.slice(start, open).trimEnd().length;
}

function unitPhrase({ kinds }: QuantityOptions): string {
  const names = kinds.flatMap((kind) => units[kind].slice(0, 3).map((unit) => unit.unit));
  return names.length === 0 ? 'without a unit' : `in ${names.join(', ')}`;
}

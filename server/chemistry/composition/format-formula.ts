/** Writes compositions as formulas. */
import type { Composition } from './composition.ts';
import { partsOfKind } from './mass.ts';

/**
 * In the order of Hill (J. Am. Chem. Soc. 1900, 22, 478): carbon, hydrogen, then the rest by the alphabet; without
 * carbon all by the alphabet. Labelled atoms follow their element in brackets; a charge stands at the end.
 */
export function hillFormula(composition: Composition): string {
  const entries = [...composition.counts].map(([kind, count]) => ({ ...partsOfKind(kind), count }));
  const hasCarbon = entries.some((entry) => entry.symbol === 'C');
  const rank = (symbol: string) =>
    hasCarbon && symbol === 'C' ? '0' : hasCarbon && symbol === 'H' ? '1' : `2${symbol}`;
  entries.sort((first, second) => {
    const [one, other] = [rank(first.symbol), rank(second.symbol)];
    return one < other ? -1 : one > other ? 1 : first.massNumber - second.massNumber;
  });
  const body = entries.map(({ symbol, massNumber, count }) => {
    const shown =
      massNumber === 0 ? symbol : symbol === 'H' && massNumber === 2 ? 'D' : `[${massNumber}${symbol}]`;
    return count === 1 ? shown : `${shown}${Number(count.toFixed(3))}`;
  });
  return body.join('') + chargeText(composition.charge);
}

function chargeText(charge: number): string {
  if (charge === 0) return '';
  const size = Math.abs(charge);
  return `${size === 1 ? '' : `^${size}`}${charge > 0 ? '+' : '-'}`;
}

/** The same with subscript and superscript characters, for people to read. */
export function prettyFormula(composition: Composition): string {
  const [body, charge] = [hillFormula({ ...composition, charge: 0 }), composition.charge];
  const lowered = body.replace(
    /\[(\d+)|(\d)/g,
    (_whole, massNumber: string | undefined, digit: string | undefined) =>
      massNumber === undefined ? '₀₁₂₃₄₅₆₇₈₉'[Number(digit)]! : `[${raised(massNumber)}`,
  );
  if (charge === 0) return lowered;
  const size = Math.abs(charge);
  return `${lowered}${size === 1 ? '' : raised(String(size))}${charge > 0 ? '⁺' : '⁻'}`;
}

function raised(digits: string): string {
  return [...digits].map((digit) => '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(digit)]!).join('');
}

/** CAS Registry Numbers. */

/** The check digit that the other digits give, or undefined when the text is not of the form `58-08-2`. */
export function casCheckDigit(number: string): number | undefined {
  if (!/^\d{2,7}-\d{2}-\d$/.test(number)) return undefined;
  const digits = [...number.slice(0, -2).replaceAll('-', '')].map(Number).reverse();
  return digits.reduce((sum, digit, place) => sum + digit * (place + 1), 0) % 10;
}

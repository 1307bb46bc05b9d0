/**
 * The bracketed numbers of von Baeyer names (P-23.2): the bicyclic core, and secondary bridges with the places that they
 * join: `5.3.1.0^{1,5}`, and the flat print `5.3.1.01,5`, in which size and first place run together.
 */
export interface Bridge {
  readonly size: number;
  readonly low: number;
  readonly high: number;
}

export interface Bridges {
  readonly main: readonly [number, number, number];
  readonly secondary: readonly Bridge[];
}

/** Ways of cutting the digits of flat prints tried for one name at most. */
const mostTrials = 2000;
const marked = /^(\d{1,2})[\^~(]+(\d{1,3}),(\d{1,3})[~)]*$/;
const flat = /^(\d{2,5}),(\d{1,3})$/;

/**
 * Reads the numbers for a system of `size` atoms. Undefined when they do not fit it, or when a flat print can be cut in
 * two ways that do.
 */
export function readBridges(text: string, size: number): Bridges | undefined {
  const parts = (/^\d+,\d+,\d+$/.test(text) ? text.replace(/,/g, '.') : text)
    .replace(/<\/?sup>|[\s]/g, (tag) => (tag === '<sup>' ? '^' : ''))
    .split('.');
  if (parts.length < 3 || parts.slice(0, 3).some((part) => !/^\d{1,3}$/.test(part))) return undefined;
  const [first, second, third] = parts.slice(0, 3).map(Number) as [number, number, number];
  if (first < second || second < third) return undefined;
  const options = parts.slice(3).map(bridgeOptions);
  const core = first + second + third + 2;
  const found: Bridge[][] = [];
  let trials = 0;
  choose([], size - core);
  return found.length === 1 ? { main: [first, second, third], secondary: found[0]! } : undefined;

  /** Sizes add up to the atoms that are left; places have been numbered before (P-23.2.5.1). */
  function choose(chosen: Bridge[], left: number): void {
    if (left < 0 || trials++ > mostTrials) return;
    const next = options[chosen.length];
    if (!next) {
      if (left === 0 && inOrder(chosen, core)) found.push(chosen);
      return;
    }
    for (const bridge of next) {
      if (bridge.low < bridge.high && bridge.high <= size) choose([...chosen, bridge], left - bridge.size);
    }
  }
}

function bridgeOptions(part: string): Bridge[] {
  const exact = marked.exec(part);
  if (exact) return [{ size: Number(exact[1]), low: Number(exact[2]), high: Number(exact[3]) }];
  const run = flat.exec(part);
  if (!run) return [];
  const digits = run[1]!;
  return [1, 2]
    .filter((cut) => cut < digits.length && digits[cut] !== '0' && (cut === 1 || !digits.startsWith('0')))
    .map((cut) => ({
      size: Number(digits.slice(0, cut)),
      low: Number(digits.slice(cut)),
      high: Number(run[2]),
    }));
}

/** P-23.2.5.1: independent bridges first, by decreasing size, then the dependent ones likewise. */
function inOrder(bridges: readonly Bridge[], core: number): boolean {
  const dependent = bridges.map((bridge) => bridge.high > core);
  return bridges.every(
    ({ size }, index) =>
      index === 0 ||
      (dependent[index] === dependent[index - 1]
        ? size <= bridges[index - 1]!.size
        : dependent[index] === true),
  );
}

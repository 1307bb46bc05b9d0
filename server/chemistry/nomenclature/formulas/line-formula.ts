/**
 * Reads condensed line formulas (`CH3(CH2)4CO2H`, `iPr2NEt`, `Ph3P=CHCO2Et`) as chemists write them: atoms in the order
 * of the chain, hydrogens and end groups after their atom, branches and repeated parts in brackets. A letter may go on in
 * several ways (`O` after carbon is an oxo group or a link of the chain); all are tried, and only those in which every
 * atom has its ordinary valence count. Common practice, no source.
 */
import { bracketAt, countAt } from './formula-text.ts';
import { fragmentOf, halogens, wholeSmiles, type Fragment } from './finished-sketch.ts';
import { emptySketch, withAtom, withEnd, withGroups, withHydrogens, type Sketch } from './sketch.ts';
import { firstGroups, groups, joints, lastGroups } from './symbols.ts';

/** Counted steps of one reading, shared by all that try formulas. */
export interface Steps {
  left: number;
}

interface Place {
  readonly text: string;
  readonly at: number;
  readonly sketch: Sketch;
  /** What stands just before: an atom of the chain takes hydrogens, an oxo group does not. */
  readonly after: 'start' | 'atom' | 'group' | 'bracket' | 'oxo' | 'bond';
  /** The order of the bond to the next atom. */
  readonly order: number;
  /** Which phenylene the `C6H4` of the text is; undefined where no locant says so. */
  readonly phenylene?: string;
}

/** `4-MeOC6H4…`, `p-O2NC6H4…`: the locant in front is that of the ring. */
const ringLocant = /^(?:(o|2)|(m|3)|(p|4))-(?=[A-Z(].*C6H4)/;

const longestExpansion = 400;

/** Structures that the whole text can be, each once as SMILES (spelt alike or not). */
export function wholeFormulas(text: string, steps: Steps): ReadonlySet<string> {
  const found = new Set<string>();
  for (const sketch of sketches(text, steps)) {
    const smiles = wholeSmiles(sketch);
    if (smiles !== undefined) found.add(smiles);
  }
  return found;
}

/** What the text can be as a group with one free bond, each once. */
export function fragments(text: string, steps: Steps): readonly Fragment[] {
  const found = new Map<string, Fragment>();
  for (const sketch of sketches(text, steps)) {
    const fragment = fragmentOf(sketch);
    if (fragment) found.set(fragment.smiles, fragment);
  }
  return [...found.values()];
}

/** Every way in which the text to its end is a line of atoms. */
function* sketches(text: string, steps: Steps): Generator<Sketch> {
  const ring = ringLocant.exec(text);
  const phenylene = ring && `${ring[1] ? 'o' : ring[2] ? 'm' : 'p'}C6H4`;
  const place: Place = {
    text: text.slice(ring?.[0].length ?? 0),
    at: 0,
    sketch: emptySketch,
    after: 'start',
    order: 1,
  };
  yield* from(phenylene ? { ...place, phenylene } : place, steps);
}

function* from(place: Place, steps: Steps): Generator<Sketch> {
  if (steps.left-- <= 0) return;
  if (place.at === place.text.length) {
    if (place.after !== 'bond') yield place.sketch;
    return;
  }
  for (const next of continuations(place, steps)) yield* from(next, steps);
}

function* continuations(place: Place, steps: Steps): Generator<Place> {
  const { text, at } = place;
  const character = text[at]!;
  if (character === '-' || character === '=' || character === '≡') {
    if (place.after === 'start' || place.after === 'bond') return;
    const order = character === '-' ? 1 : character === '=' ? 2 : 3;
    yield { ...place, at: at + 1, after: 'bond', order };
    return;
  }
  if (character === '(' || character === '[') {
    yield* brackets(place, steps);
    return;
  }
  if (character === 'H') yield* hydrogens(place);
  yield* symbolGroups(place);
  yield* chainAtoms(place);
  if (place.after !== 'start' && place.after !== 'bond') yield* ends(place);
}

function* hydrogens(place: Place): Generator<Place> {
  const number = countAt(place.text, place.at + 1);
  if (!number || place.after === 'oxo' || place.after === 'bond' || number.count > 4) return;
  const { sketch } = place;
  if (sketch.atoms.length === 0) {
    if (sketch.waiting.length > 0) return;
    const waiting = Array.from({ length: number.count }, () => 'H');
    yield { ...place, at: number.end, after: 'group', sketch: { ...sketch, waiting } };
    return;
  }
  if (place.after === 'group') return;
  const made = withHydrogens(sketch, sketch.current, number.count);
  if (made) yield { ...place, at: number.end, after: 'atom', sketch: made };
}

function* symbolGroups(place: Place): Generator<Place> {
  const { text, at } = place;
  const found = [...groups.at(text, at)];
  if (place.after === 'start') found.push(...firstGroups.at(text, at));
  if (place.after !== 'start')
    found.push(...lastGroups.at(text, at).filter(({ end }) => end === text.length));
  for (const { smiles, end } of found) {
    const number = countAt(text, end);
    if (number) yield* grouped(place, smiles, number.count, number.end);
  }
}

/** A group, so many times: before the first atom it waits, after it it is bound. */
function* grouped(place: Place, smiles: string, count: number, end: number): Generator<Place> {
  const { sketch } = place;
  if (place.order !== 1 || count > 6) return;
  if (sketch.atoms.length === 0) {
    const waiting = [...sketch.waiting, ...Array.from({ length: count }, () => smiles)];
    // `HIS` is no formula: hydrogen waits for a halogen only in `HCl` itself.
    const odd = sketch.waiting.includes('H') && (halogens.has(smiles) ? end < place.text.length : count > 1);
    if (waiting.length <= 6 && !odd)
      yield { ...place, at: end, after: 'group', sketch: { ...sketch, waiting } };
    return;
  }
  const made = withGroups(sketch, smiles, count);
  if (made) yield { ...place, at: end, after: 'group', sketch: made };
}

function* chainAtoms(place: Place): Generator<Place> {
  const { text, at, sketch } = place;
  if (place.phenylene !== undefined && text.startsWith('C6H4', at)) {
    const ring = withAtom(sketch, place.phenylene, place.order);
    if (ring) yield { text, at: at + 4, sketch: ring, after: 'group', order: 1 };
    return;
  }
  const two = text.slice(at, at + 2);
  const symbol = joints[two] !== undefined ? two : text[at]!;
  if (joints[symbol] === undefined) return;
  const end = at + symbol.length;
  if (symbol === 'O') yield* turnedEster(place);
  if (/\d/.test(text[end] ?? '')) return;
  const made = withAtom(sketch, symbol, place.order);
  if (made) yield { ...place, at: end, sketch: made, after: 'atom', order: 1 };
}

/** `EtO2CCH2…`, `HOOCCH2…`: an ester or acid written from its oxygen. */
function* turnedEster(place: Place): Generator<Place> {
  const written = ['O2C', 'OOC'].find((one) => place.text.startsWith(one, place.at));
  if (written === undefined || place.order !== 1) return;
  const oxygen = withAtom(place.sketch, 'O', 1);
  const carbon = oxygen && withAtom(oxygen, 'C', 1);
  const made = carbon && withEnd(carbon, 'O', 2);
  if (made) yield { ...place, at: place.at + 3, after: 'oxo', sketch: made };
}

/** Oxo, thioxo, nitrile and diazo ends, and `CO2`, `SO2`, `SO3` with what follows. */
function* ends(place: Place): Generator<Place> {
  const { text, at, sketch } = place;
  const atom = sketch.atoms[sketch.current]?.symbol;
  if (atom === undefined || place.after === 'oxo') return;
  const letter = text[at]!;
  const number = countAt(text, at + 1);
  if (!number || !'OSN'.includes(letter) || /[a-z]/.test(text[at + 1] ?? '')) return;
  const go = (made: Sketch | undefined, after: Place['after'] = 'oxo'): Place[] =>
    made ? [{ ...place, at: number.end, sketch: made, after, order: 1 }] : [];
  const { count } = number;
  if (letter === 'N') {
    if (atom === 'C' && count === 1) yield* go(withEnd(sketch, 'N', 3), 'group');
    if (atom === 'C' && count === 2) yield* go(withEnd(sketch, '[N+]=[N-]', 2), 'group');
    return;
  }
  if (!takesOxo(atom, letter)) return;
  if (count === 1) yield* go(withEnd(sketch, letter, 2));
  if (count === 2 && (atom === 'C' || atom === 'S' || atom === 'Se')) {
    if (number.end === text.length || atom !== 'C') yield* go(withEnd(sketch, letter, 2, 2));
    if (atom === 'C' || text[number.end] === 'H') yield* go(oxoAndLink(sketch, letter, 1), 'atom');
  }
  if (count === 3 && letter === 'O' && atom === 'S') yield* go(oxoAndLink(sketch, letter, 2), 'atom');
}

/** Oxygen on carbon, sulfur, selenium, phosphorus and arsenic; sulfur on carbon and phosphorus. */
function takesOxo(atom: string, letter: string): boolean {
  return letter === 'O' ? /^(?:C|S|Se|P|As)$/.test(atom) : atom === 'C' || atom === 'P';
}

function oxoAndLink(sketch: Sketch, letter: string, oxo: number): Sketch | undefined {
  const made = withEnd(sketch, letter, 2, oxo);
  return made && withAtom(made, letter, 1);
}

function* brackets(place: Place, steps: Steps): Generator<Place> {
  const { text, at, sketch } = place;
  const bracket = bracketAt(text, at);
  if (!bracket || bracket.inner === '' || place.order !== 1) return;
  const { inner, count, end } = bracket;
  if (sketch.atoms.length > 0 && place.after !== 'bond' && /^=?[OS]$/.test(inner)) {
    const atom = sketch.atoms[sketch.current]!.symbol;
    const letter = inner[inner.length - 1]!;
    const made = takesOxo(atom, letter) ? withEnd(sketch, letter, 2, count) : undefined;
    if (made) {
      yield { ...place, at: end, after: 'bracket', sketch: made };
      return;
    }
  }
  const branches = fragments(inner, steps);
  for (const { smiles } of branches) {
    for (const next of grouped(place, smiles, count, end)) yield { ...next, after: 'bracket' };
  }
  // `(CH2)4` is a piece of the chain, written out.
  const written = inner.repeat(count);
  const long = written.length + text.length - end > longestExpansion;
  if (branches.length === 0 && place.after !== 'start' && !long)
    yield { ...place, text: written + text.slice(end), at: 0 };
}

/**
 * Solutions, dispersions, supported reagents and mixed solvents as reaction tables write them: `1.6 M n-BuLi in hexanes`, `sat.
 * aq. NH4Cl`, `10% Pd/C`, `MeOH/H2O (9:1)`. Only the words are taken apart here; whether the parts are compounds is asked
 * of the name reader. Common practice, no source.
 */
import { aqueousSolutes, aqueousWords, solventWords, supports } from '../vocabulary/mixture-words.ts';

/** A way to understand the text as a mixture, if its components are understood. */
export interface MixtureWords {
  readonly message: string;
  readonly components: readonly string[];
}

const longestText = 160;
const number = String.raw`\d{1,3}(?:[.,]\d{1,4})?(?: ?- ?\d{1,3}(?:\.\d{1,4})?)?`;
const unit = String.raw`(?:M|N|mM|mol\/L|mol\/l|(?:wt\.? ?|w\/w ?|w\/v ?|v\/v ?|vol\.? ?)?%)(?: ?\((?:w\/w|w\/v|v\/v|wt|aq\.?)\)| w\/w| w\/v| v\/v)?`;
const strength = `${number} ?${unit}`;
const strengthFirst = new RegExp(`^(${strength})(?: solution of)? (.+)$`);
const strengthLast = new RegExp(
  String.raw`^(.+?),? \(?(?:(aq\.?|aqueous),? )?(${strength})(?:,? (aq\.?|aqueous))?(?: solution| dispersion| suspension)?(?: in (.+?))?\)?$`,
);
const ratioLast =
  /^(.+?),? \(?(\d{1,3}(?:\.\d{1,2})?(?: ?[:/] ?\d{1,3}(?:\.\d{1,2})?){1,3})(?: v\/v)?\)?(?: v\/v)?$/;
/** What a text must have in it to be worth a closer look. */
const hint =
  /[%/]|buffer| in | on | \(?(?:aq|sat|conc|\d)|^(?:aq|sat|conc|dil|half|fum|pH |meth|eth|alc|cold|\d)/i;

/** `petroleum ether (40–60)`, `pet. ether 60-80 °C`: the range says which fraction it is. */
const boilingRange =
  /^(pet[a-z.]* ether|petrol|ligroin|light petroleum) \(?(\d{2,3} ?- ?\d{2,3})(?: ?°C)?\)?$/i;

/** Solutions that are named by what they do. */
const buffer =
  /^(?:[a-z]+ )?(?:buffer|buffer solution)(?: \(?pH \d{1,2}(?:\.\d{1,2})?\)?)?$|^(?:aq\. )?pH \d{1,2}(?:\.\d{1,2})?(?: [a-z]+)? buffer$/i;

/** Every way to take the text apart, the likeliest first. */
export function* mixtureWords(text: string): Generator<MixtureWords> {
  if (text.length > longestText || !hint.test(text)) return;
  const fraction = boilingRange.exec(text);
  if (fraction)
    yield {
      message: `Petroleum ether is a mixture of alkanes; this fraction boils at ${fraction[2]!} °C.`,
      components: [fraction[1]!],
    };
  if (buffer.test(text)) yield { message: 'This is a buffer, a solution of salts in water.', components: [] };
  yield* supported(text);
  yield* mixedSolvents(text);
  yield* solutions(text);
  yield* aqueous(text);
}

const supportWords: ReadonlySet<string> = new Set(supports);

/** `Pd/C`, `10% palladium on carbon`, `Pd/C (10 wt%)`. */
function* supported(text: string): Generator<MixtureWords> {
  const before = new RegExp(`^(${strength}) (.+)$`).exec(text);
  const after = new RegExp(`^(.+?),? \\(?(${strength})\\)?$`).exec(text);
  const strengthOf = before?.[1] ?? after?.[2];
  const body = before?.[2] ?? after?.[1] ?? text;
  for (const joint of ['/', ' on ']) {
    const at = body.lastIndexOf(joint);
    const support = at <= 0 ? '' : body.slice(at + joint.length);
    if (support === '' || !supportWords.has(support.toLowerCase())) continue;
    // `Pd/c` is no catalyst, and nor is `C/c`.
    if (joint === '/' && support === 'c') continue;
    const reagent = body.slice(0, at).trim();
    const loaded = strengthOf === undefined ? '' : `, ${strengthOf}`;
    yield {
      message: `This is ${reagent} on a solid support (${support})${loaded}; it has no single molecular structure.`,
      components: [reagent],
    };
  }
}

/** `MeOH/H2O (9:1)`, `EtOAc/hexanes`, `CH2Cl2–MeOH 95:5`, `hexane:EtOAc 3:1`. */
function* mixedSolvents(text: string): Generator<MixtureWords> {
  const ratio = ratioLast.exec(text);
  const body = ratio?.[1] ?? text;
  const shares = ratio?.[2]?.split(/ ?[:/] ?/);
  const message = `This is a mixture of ${ratio ? `${body}, ${ratio[2]!}` : text.replace(/ ?\/ ?/g, ' and ')}.`;
  for (const joint of ratio ? [/ ?\/ ?/, / ?: ?/, / and /, / - /] : [/ ?\/ ?/]) {
    const components = body.split(joint);
    if (components.length < 2 || components.length > 4 || components.includes('')) continue;
    if (shares === undefined || shares.length === components.length) yield { message, components };
  }
  if (shares?.length !== 2) return;
  for (let at = body.indexOf('-'); at > 0; at = body.indexOf('-', at + 1))
    yield { message, components: [body.slice(0, at).trim(), body.slice(at + 1).trim()] };
}

/** With a strength before or after, or with the solvent named. */
function* solutions(text: string): Generator<MixtureWords> {
  const first = strengthFirst.exec(text);
  if (first) yield* dissolved(first[2]!, first[1]);
  const last = strengthLast.exec(text);
  if (last) {
    const [, solute, before, strengthOf, after, solvent] = last;
    const inWater = before !== undefined || after !== undefined;
    yield* dissolved(
      `${inWater ? 'aq. ' : ''}${solute!}${solvent === undefined ? '' : ` in ${solvent}`}`,
      strengthOf,
    );
  }
  if (!first && !last && / in /.test(text)) yield* dissolved(text.replace(/^solution of /i, ''), undefined);
}

function* dissolved(body: string, strengthOf: string | undefined): Generator<MixtureWords> {
  const said = strengthOf === undefined ? '' : `, ${strengthOf}`;
  const plain = body
    .replace(/ (?:solution|dispersion|suspension)(?= in |$)/, '')
    .replace(/^(?:solution of|a solution of) /i, '');
  const water = takenOff(plain, aqueousWords);
  const at = plain.lastIndexOf(' in ');
  if (at > 0) {
    const solvent = plain.slice(at + 4).replace(/^oil$/i, 'mineral oil');
    const solute = plain.slice(0, at);
    yield { message: `This is ${solute} in ${solvent}${said}.`, components: [solute, solvent] };
  } else if (water !== undefined) {
    yield { message: `This is a solution of ${water} in water${said}.`, components: [water, 'water'] };
  } else if (strengthOf === undefined) return;
  else if (aqueousSolutes.includes(plain.toLowerCase())) {
    yield {
      message: `This is ${plain}${said}; where no other solvent is named, in water.`,
      components: [plain, 'water'],
    };
  } else {
    yield {
      message: `This is ${plain}${said}; what it is dissolved in or mixed with is not said.`,
      components: [plain],
    };
  }
}

/** `sat. aq. NH4Cl`, `conc. H2SO4`, `NaHCO3 (aq)`, `methanolic HCl`. */
function* aqueous(text: string): Generator<MixtureWords> {
  const plain = text.replace(/ solution$/i, '');
  const solute = takenOff(plain, aqueousWords) ?? (plain === text ? undefined : onlyAqueous(plain));
  if (solute !== undefined && !/ in /.test(solute)) {
    const how = plain
      .toLowerCase()
      .replace(solute.toLowerCase(), '')
      .replace(/[(),]/g, '')
      .replace(/ {2,}/g, ' ')
      .trim();
    const shown = how === '' ? '' : ` (${how})`;
    yield { message: `This is a solution of ${solute} in water${shown}.`, components: [solute, 'water'] };
  }
  for (const [word, solvent] of solventWords) {
    if (!plain.toLowerCase().startsWith(`${word} `)) continue;
    const rest = plain.slice(word.length + 1);
    yield { message: `This is a solution of ${rest} in ${solvent}.`, components: [rest, solvent] };
  }
}

/** `NaOH solution` is one in water. */
function onlyAqueous(plain: string): string | undefined {
  return aqueousSolutes.includes(plain.toLowerCase()) ? plain : undefined;
}

const byLength = (words: readonly string[]) => [...words].sort((a, b) => b.length - a.length);

/** The text without the words before and (in brackets or not) behind it; undefined where there is none. */
function takenOff(text: string, words: readonly string[]): string | undefined {
  const once = withoutWord(text, words);
  return once === undefined ? undefined : (withoutWord(once, words) ?? once);
}

function withoutWord(text: string, words: readonly string[]): string | undefined {
  const lower = text.toLowerCase();
  for (const word of byLength(words)) {
    if (lower.startsWith(`${word} `)) return text.slice(word.length + 1).trim();
    for (const ending of [` (${word})`, ` ${word}`, `, ${word}`])
      if (lower.endsWith(ending)) return text.slice(0, -ending.length).replace(/,$/, '').trim();
    if (lower.endsWith(`(${word})`)) return text.slice(0, -word.length - 2).trim();
  }
  return undefined;
}

/**
 * How well names are read: takes tables of name and SMILES (tab-separated, first line a heading), reads every name and
 * holds the InChIKey of what was read against that of the SMILES: its first block for the constitution, all of it for the
 * arrangement in space. Prints the shares and, to a file, each failure with its cause.
 */
import { readFileSync, writeFileSync } from 'node:fs';
import initRDKitModule from '@rdkit/rdkit';
import { createNameReader } from '../../../server/chemistry/nomenclature/read-name.ts';
import { writeSmiles } from '../../../server/chemistry/structure/write-smiles.ts';
import type { Molecule } from '../../../server/chemistry/structure/molecule.ts';

const rdkit = await initRDKitModule();
const keys = new Map<string, string>();

/** The InChIKey of a SMILES, or `` where the toolkit makes none. */
function keyOf(smiles: string): string {
  const known = keys.get(smiles);
  if (known !== undefined) return known;
  let key = '';
  const molecule = rdkit.get_mol(smiles);
  if (molecule) {
    const inchi = molecule.get_inchi();
    key = inchi === '' ? '' : rdkit.get_inchikey_for_inchi(inchi);
    molecule.delete();
  }
  keys.set(smiles, key);
  return key;
}

const keyOfMolecule = (molecule: Molecule) => keyOf(writeSmiles(molecule));
const block = (key: string) => key.slice(0, 14);

type Outcome =
  'right' | 'right, stereo left open' | 'stereo differs' | 'among several' | 'wrong' | 'unknown' | 'mixture';
const order: readonly Outcome[] = [
  'right',
  'right, stereo left open',
  'among several',
  'stereo differs',
  'wrong',
  'mixture',
  'unknown',
];

interface Failure {
  readonly outcome: Outcome;
  readonly name: string;
  readonly smiles: string;
  /** What was read instead, or the word at which reading stopped. */
  readonly cause: string;
}

const reader = createNameReader();

function judge(name: string, smiles: string): Failure {
  const reading = reader.readName(name);
  if (reading.kind === 'unknown') {
    const cause = name.slice(reading.range.start, reading.range.end);
    return { outcome: 'unknown', name, smiles, cause: `${cause}\t${reading.message}` };
  }
  if (reading.kind === 'mixture') return { outcome: 'mixture', name, smiles, cause: reading.message };
  const wanted = keyOf(smiles);
  const found = reading.readings.map((one) => ({ one, key: keyOfMolecule(one.molecule) }));
  const cause = found.map(({ one }) => writeSmiles(one.molecule)).join(' | ');
  const same = found.find(({ key }) => block(key) === block(wanted));
  if (!same) return { outcome: 'wrong', name, smiles, cause };
  if (found.length > 1) return { outcome: 'among several', name, smiles, cause };
  if (same.key === wanted) return { outcome: 'right', name, smiles, cause };
  const open = same.one.stereoisomers;
  const among = open.length > 0 && open.some((isomer) => keyOfMolecule(isomer.molecule) === wanted);
  return {
    outcome: among || open.length > 0 ? 'right, stereo left open' : 'stereo differs',
    name,
    smiles,
    cause,
  };
}

const [target, ...files] = process.argv.slice(2);
const failures: Failure[] = [];
for (const file of files) {
  const [heading, ...lines] = readFileSync(file, 'utf8')
    .split(/\r?\n/)
    .filter((line) => line !== '');
  const columns = heading!.split('\t');
  const [nameAt, smilesAt] = [columns.indexOf('name'), columns.indexOf('smiles')];
  const tally = new Map<Outcome, number>();
  const causes = new Map<string, number>();
  let rows = 0;
  const start = performance.now();
  let time = 0;
  for (const line of lines) {
    const cells = line.split('\t');
    const [name, smiles] = [cells[nameAt]!, cells[smilesAt]!];
    if (keyOf(smiles) === '') continue;
    rows++;
    const from = performance.now();
    reader.readName(name);
    time += performance.now() - from;
    const judged = judge(name, smiles);
    tally.set(judged.outcome, (tally.get(judged.outcome) ?? 0) + 1);
    if (judged.outcome !== 'right') failures.push(judged);
    if (judged.outcome === 'unknown') {
      const word = judged.cause.split('\t')[0]!.toLowerCase();
      causes.set(word, (causes.get(word) ?? 0) + 1);
    }
  }
  console.log(
    `\n${file}: ${String(rows)} names, ${(time / rows).toFixed(3)} ms a name, ${((performance.now() - start) / 1000).toFixed(1)} s with the toolkit`,
  );
  for (const outcome of order) {
    const count = tally.get(outcome) ?? 0;
    console.log(
      `  ${outcome.padEnd(24)} ${String(count).padStart(6)}  ${((100 * count) / rows).toFixed(2)} %`,
    );
  }
  const constitution =
    (tally.get('right') ?? 0) +
    (tally.get('right, stereo left open') ?? 0) +
    (tally.get('stereo differs') ?? 0);
  console.log(`  right constitution       ${((100 * constitution) / rows).toFixed(2)} %`);
  const often = [...causes].sort((a, b) => b[1] - a[1]).slice(0, 12);
  console.log(
    `  stops most often at: ${often.map(([word, count]) => `${word} ${String(count)}`).join(', ')}`,
  );
}
if (target !== undefined && target !== '-') {
  const lines = failures.map(({ outcome, name, smiles, cause }) => [outcome, name, smiles, cause].join('\t'));
  writeFileSync(target, lines.join('\n') + '\n');
}

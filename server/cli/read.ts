/** `isonym read`: which structures a name can mean. */
import { styleText } from 'node:util';
import { prettyFormula } from '../chemistry/composition/format-formula.ts';
import { averageMass } from '../chemistry/composition/mass.ts';
import { compositionOf } from '../chemistry/structure/composition-of.ts';
import type { Molecule } from '../chemistry/structure/molecule.ts';
import { countInWords, type NameReading } from '../chemistry/nomenclature/reading.ts';

import { writeSmiles } from '../chemistry/structure/write-smiles.ts';
import { createToolkit } from '../toolkit/create-toolkit.ts';
import { nodeHost } from '../toolkit/hosts.ts';
import { readName } from '../workspace/name-reader.ts';
import { wantsColour } from './colour.ts';
import { exitCode } from './exit.ts';
import { printable, printableJson } from './printable.ts';
import { readingJson, smilesOf, structuresIn, type Identifiers } from './reading-json.ts';

/** Names longer than this are no names; what is left of the line is read past. */
const longestName = 10_000;

export async function read(names: readonly string[], json: boolean): Promise<number> {
  const reader = new NameReader(json);
  for (const name of names) {
    if (name === '-') await reader.readLines(process.stdin);
    else await reader.print([name]);
  }
  await reader.end();
  return exitCode.nothingFound;
}

class NameReader {
  private readonly json: boolean;
  private readonly toolkit = createToolkit(nodeHost());

  constructor(json: boolean) {
    this.json = json;
    // Text shows no InChIKey, so it does without the toolkit.
    if (json) void this.toolkit.load();
  }

  /** Answers whatever has arrived at once, so that another program can ask and wait for the answer. */
  async readLines(input: NodeJS.ReadableStream): Promise<void> {
    let rest = '';
    input.setEncoding('utf8');
    for await (const chunk of input) {
      const lines = (rest + String(chunk)).split(/\r\n|\n|\r(?!$)/);
      // A line without an end must not fill the memory.
      rest = (lines.pop() ?? '').slice(0, longestName);
      await this.print(lines);
    }
    if (rest !== '') await this.print([rest.replace(/\r$/, '')]);
  }

  async print(names: readonly string[]): Promise<void> {
    const read = names.map((name) => ({ name, reading: readName(name.slice(0, longestName).trim()) }));
    if (!this.json) {
      for (const { name, reading } of read) process.stdout.write(`${inWords(name, reading)}\n`);
      return;
    }
    const smiles = read.flatMap(({ reading }) => structuresIn(reading).map(smilesOf));
    const facts = await this.toolkit.facts(smiles);
    const identifiers = (molecule: Molecule): Identifiers => {
      const own = smilesOf(molecule);
      const known = facts.get(own);
      return {
        smiles: known?.smiles ?? own,
        inchikey: known === null || known === undefined || known.inchiKey === '' ? null : known.inchiKey,
      };
    };
    for (const { name, reading } of read) {
      process.stdout.write(`${printableJson(readingJson(name, reading, identifiers))}\n`);
    }
  }

  async end(): Promise<void> {
    if (this.toolkit.failure !== undefined) console.error(`isonym: ${this.toolkit.failure}`);
    await this.toolkit.dispose();
  }
}

function inWords(name: string, reading: NameReading): string {
  const head = styled(printable(name));
  switch (reading.kind) {
    case 'unknown': {
      const near = reading.suggestions.length === 0 ? '' : ` Near it: ${reading.suggestions.join(', ')}.`;
      return printable(`${head}: not understood. ${reading.message}${near}`);
    }
    case 'mixture':
      return `${head}: a mixture. ${printable(reading.message)}`;
    case 'understood': {
      const count = reading.count ?? reading.readings.length;
      const lines = [`${head}: ${count === 1 ? '1 structure' : `${countInWords(reading)} structures`}`];
      for (const { name: full, molecule, stereoisomers, stereoisomerCount } of reading.readings) {
        lines.push(`  ${structureLine(full, molecule)}`);
        const open = stereoisomerCount ?? stereoisomers.length;
        if (open > 0)
          lines.push(`    ${open} stereoisomers open: ${stereoisomers.map((each) => each.name).join('; ')}`);
      }
      if (count > reading.readings.length) lines.push(`  … and ${count - reading.readings.length} more`);
      for (const remark of reading.remarks) lines.push(`  ${printable(remark.message)}`);
      return lines.join('\n');
    }
  }
}

function structureLine(name: string, molecule: Molecule): string {
  const composition = compositionOf(molecule);
  const mass = averageMass(composition);
  const facts = [prettyFormula(composition), ...(mass === undefined ? [] : [`${mass.toFixed(2)} g/mol`])];
  return printable(`${name}  ${facts.join('  ')}  ${writeSmiles(molecule)}`);
}

function styled(text: string): string {
  return wantsColour() ? styleText('bold', text, { validateStream: false }) : text;
}

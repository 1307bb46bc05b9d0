/** `isonym checks`: the list, or one check explained. */
import { styleText } from 'node:util';
import type { Check } from '../checks/finding.ts';
import { checks as allChecks } from '../checks/index.ts';
import { wantsColour } from './colour.ts';
import { exitCode, RunProblem } from './exit.ts';

export function checks(id: string | undefined): number {
  if (id === undefined) {
    process.stdout.write(`${list(allChecks)}\n`);
    return exitCode.nothingFound;
  }
  const found = allChecks.find((check) => check.id === id);
  if (found === undefined) throw new RunProblem(`there is no check “${id}”; isonym checks lists them all.`);
  process.stdout.write(`${explanation(found)}\n`);
  return exitCode.nothingFound;
}

function list(all: readonly Check[]): string {
  const width = Math.max(...all.map((check) => check.id.length));
  const lines: string[] = [];
  let group: string | undefined;
  for (const check of all) {
    if (check.group !== group) {
      group = check.group;
      lines.push(...(lines.length > 0 ? [''] : []), bold(group));
    }
    lines.push(`  ${check.id.padEnd(width)}  ${check.severity.padEnd(11)}  ${check.summary}`);
  }
  return lines.join('\n');
}

function explanation(check: Check): string {
  const examples = (title: string, blocks: readonly string[]) =>
    blocks.length === 0 ? [] : ['', bold(title), ...blocks.flatMap((block) => ['', indented(block)])];
  return [
    `${bold(check.id)} (${check.group}, ${check.severity})`,
    check.summary,
    '',
    check.why,
    check.action,
    `Source: ${check.source}`,
    ...examples('Reported', check.examples.bad),
    ...examples('Not reported', check.examples.good),
  ].join('\n');
}

function indented(block: string): string {
  return block.trim().replace(/^/gm, '    ');
}

function bold(text: string): string {
  return wantsColour() ? styleText('bold', text, { validateStream: false }) : text;
}

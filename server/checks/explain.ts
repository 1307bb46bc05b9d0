/** A check in words, for the command's `checks` and for hovers. */
import type { Check } from './finding.ts';
import { checks } from './index.ts';

/** Undefined when there is no such check. */
export function checkWithId(id: string): Check | undefined {
  return checks.find((check) => check.id === id);
}

/** Markdown; undefined when there is no such check. */
export function explainCheck(id: string): string | undefined {
  const check = checkWithId(id);
  if (check === undefined) return undefined;
  const [bad] = check.examples.bad;
  const [good] = check.examples.good;
  return [
    `# ${check.id} (${check.severity})`,
    check.summary,
    `**Why it matters.** ${check.why}`,
    `**What to do.** ${check.action}`,
    ...(bad === undefined ? [] : [`**Reported:**`, fenced(bad)]),
    ...(good === undefined ? [] : [`**Fine:**`, fenced(good)]),
    `**Source.** ${check.source}`,
    `To accept one finding: \`allow: ${check.id} (reason)\` in the block. To silence the check: ` +
      `\`"severity": { "${check.id}": "off" }\` in isonym.json.`,
  ].join('\n\n');
}

/** The examples are fenced blocks themselves: a longer fence shows their fences. */
function fenced(block: string): string {
  return `\`\`\`\`markdown\n${block}\n\`\`\`\``;
}

/** From the text of a page to its findings, with or without the real toolkit, for every suite that tests checks. */
import { analyse } from '../../server/checks/run.ts';
import type { StructureFacts, ToolkitFactsOf } from '../../server/checks/facts.ts';
import type { Finding } from '../../server/checks/finding.ts';
import { defaultSettings, type Settings } from '../../server/checks/settings.ts';
import { readDocument } from './read-document.ts';
import { createToolkit } from '../../server/toolkit/create-toolkit.ts';
import { sameThreadHost } from '../../server/toolkit/hosts.ts';

const noFacts: ToolkitFactsOf = () => 'unavailable';

/** As in an editor whose toolkit cannot be loaded. */
export function findingsWithoutToolkit(
  text: string,
  settings: Settings = defaultSettings,
): readonly Finding[] {
  return analyse(readDocument(text), settings, noFacts).findings;
}

/** Asks the toolkit for what is wanted until nothing is. */
export async function findingsWithToolkit(
  text: string,
  settings: Settings = defaultSettings,
): Promise<readonly Finding[]> {
  const document = readDocument(text);
  const known = new Map<string, StructureFacts | 'unavailable'>();
  for (;;) {
    const { findings, wanted } = analyse(document, settings, (smiles) => known.get(smiles) ?? 'pending');
    if (wanted.length === 0) return findings;
    const table = await toolkit.facts(wanted);
    for (const smiles of wanted) {
      const facts = table.get(smiles);
      known.set(smiles, facts === undefined || facts === null || facts.inchi === '' ? 'unavailable' : facts);
    }
  }
}

const toolkit = createToolkit(sameThreadHost());

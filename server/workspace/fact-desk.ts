/**
 * Between the checks, which look facts up, and the toolkit, which answers when it can: notes what was looked
 * up in vain, so that it can be asked for in one go.
 */
import type { StructureFacts, ToolkitFactsOf } from '../checks/facts.ts';
import type { FactTable, Toolkit } from '../toolkit/toolkit.ts';

export class FactDesk {
  private readonly toolkit: Toolkit | undefined;
  private readonly wanted = new Set<string>();
  /** The latest answers, which the toolkit's own memory may be too small to hold all at once. */
  private answers: FactTable = new Map();

  /** Without a toolkit every fact is unavailable. */
  constructor(toolkit: Toolkit | undefined) {
    this.toolkit = toolkit;
  }

  /** A look-up for one run of checks; `missed` is called for every fact that is not there yet. */
  lookUp(missed: (canonicalSmiles: string) => void): ToolkitFactsOf {
    return (canonicalSmiles): StructureFacts | 'pending' | 'unavailable' => {
      const facts =
        this.toolkit === undefined
          ? null
          : this.answers.has(canonicalSmiles)
            ? this.answers.get(canonicalSmiles)
            : this.toolkit.knownFacts(canonicalSmiles);
      if (facts === undefined) {
        this.wanted.add(canonicalSmiles);
        missed(canonicalSmiles);
        return 'pending';
      }
      return facts === null || facts.inchi === '' ? 'unavailable' : facts;
    };
  }

  get isWaiting(): boolean {
    return this.wanted.size > 0;
  }

  /** Asks for everything noted since the last time. Never rejects; afterwards no look-up of it is pending. */
  async fetch(): Promise<void> {
    const smiles = [...this.wanted];
    this.wanted.clear();
    if (smiles.length > 0 && this.toolkit !== undefined) this.answers = await this.toolkit.facts(smiles);
  }
}

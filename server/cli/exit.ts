/** What the command tells the shell. */
export const exitCode = {
  /** Ran, and nothing at or above the level. */
  nothingFound: 0,
  found: 1,
  /** Something that was asked for could not be looked at. */
  couldNotRun: 2,
} as const;

/** Why a subcommand cannot go on; its message is all that the user sees. */
export class RunProblem extends Error {}

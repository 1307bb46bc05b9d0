/** How bad a finding is, worst first. */
export const severities = ['error', 'warning', 'information'] as const;

/**
 * error: a contradiction, or something impossible. warning: an entry that does not identify one compound, or a
 * number outside its limit. information: everything that only helps.
 */
export type Severity = (typeof severities)[number];

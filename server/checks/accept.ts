/** `allow`: takes away the findings that the block accepts, and says which acceptances accept nothing. */
import leven from 'leven';
import type { AllowStatement } from '../notebook/model.ts';
import { check as allowUnused } from './allow-unused.ts';
import type { Check, Finding } from './finding.ts';
import type { EntryModel } from './model.ts';

export interface AcceptanceRun {
  readonly checks: readonly Check[];
  /** Whether this run can say that the check finds nothing; else its acceptance is not called unused. */
  readonly decides: (check: Check) => boolean;
  /** Whether this run speaks of ids that no check has. */
  readonly reportsUnknownIds: boolean;
}

/** The findings that stand, with those on the acceptances themselves. One without a reason accepts nothing. */
export function withoutAccepted(
  model: EntryModel,
  findings: readonly Finding[],
  { checks, decides, reportsUnknownIds }: AcceptanceRun,
): Finding[] {
  const statements = model.entry.allow.filter((statement) => statement.reason !== undefined);
  if (statements.length === 0) return [...findings];
  const acceptedIds = new Set(statements.map((statement) => statement.checkId));
  const reported = new Set(findings.map((finding) => finding.check));
  const standing = findings.filter((finding) => !acceptedIds.has(finding.check));
  const severity = model.settings.severity[allowUnused.id] ?? allowUnused.severity;
  if (severity === 'off' || acceptedIds.has(allowUnused.id)) return standing;
  for (const statement of statements) {
    const check = checks.find((each) => each.id === statement.checkId);
    if (!(check === undefined ? reportsUnknownIds : decides(check))) continue;
    if (reported.has(statement.checkId) || model.settings.severity[statement.checkId] === 'off') continue;
    standing.push({
      check: allowUnused.id,
      severity,
      related: [],
      ...(check === undefined ? unknownId(statement, checks) : nothingToAccept(statement)),
    });
  }
  return standing;
}

function nothingToAccept(statement: AllowStatement) {
  return {
    range: statement.checkIdRange,
    message:
      `The check ${statement.checkId} finds nothing in this block, so there is nothing to accept. ` +
      `Left here, this line would hide a mistake made later. Take it out.`,
    fixes: [
      {
        title: 'Take this line out',
        edits: [{ range: statement.field.range, newText: '' }],
        safe: true,
      },
    ],
  };
}

function unknownId(statement: AllowStatement, checks: readonly Check[]) {
  const nearest = checks
    .map((check) => ({ id: check.id, distance: leven(check.id, statement.checkId.toLowerCase()) }))
    .sort((a, b) => a.distance - b.distance)[0];
  const near = nearest !== undefined && nearest.distance <= Math.max(2, nearest.id.length / 3);
  const hint = near ? `The nearest is ${nearest.id}.` : 'The command “isonym checks” lists them all.';
  return {
    range: statement.checkIdRange,
    message: `There is no check “${statement.checkId}”, so this line accepts nothing. ${hint}`,
    fixes: near
      ? [
          {
            title: `Change to ${nearest.id}`,
            edits: [{ range: statement.checkIdRange, newText: nearest.id }],
            safe: false,
          },
        ]
      : [],
  };
}

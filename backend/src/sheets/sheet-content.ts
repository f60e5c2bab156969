import { siteDay } from '../platform/site-day';
import type { StoredRevision } from '../specifications/specifications.service';
import type { Issue, SheetContent, Signature } from './document/content';

/**
 * What the sheet of a stored revision says. A draft is dated by its content, so that the same content has the same
 * bytes; with an issue, the revision is the one that is issued: with its number, its signatures and the day of issue.
 */
export function sheetContentOf(revision: StoredRevision, issued: Issue | null = null): SheetContent {
  const { basis, siteTimeZone } = revision;
  const signature = (by: string | null | undefined, at: Date | undefined): Signature | null =>
    by && at ? { name: by, on: siteDay(at, siteTimeZone) } : null;
  return {
    project: {
      code: revision.projectCode,
      title: revision.projectTitle,
      siteTimeZone,
      paper: revision.paper,
    },
    number: revision.number,
    title: revision.title,
    revision: revision.label,
    state: issued ? 'issued' : revision.state,
    drafted: signature(revision.draftedBy, revision.createdAt),
    checked: signature(revision.checked?.by, revision.checked?.at),
    approved: signature(revision.approved?.by, revision.approved?.at),
    input: revision.input,
    context: revision.context,
    evaluation: revision.evaluation,
    basis: basis && { number: basis.number, revision: basis.revision, system: basis.system, basis: basis.basis },
    overrides: revision.overrides,
    drawnOn: issued?.issuedOn ?? siteDay(revision.savedAt, siteTimeZone),
    issued,
  };
}

import { siteDay } from '../platform/site-day';
import type { StoredRevision } from '../specifications/specifications.service';
import type { SheetContent } from './document/content';

/** What the sheet of a stored revision says. Its date is that of the content, so that the same content has the same bytes. */
export function sheetContentOf(revision: StoredRevision): SheetContent {
  const { basis, siteTimeZone } = revision;
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
    state: revision.state,
    drafted: revision.draftedBy ? { name: revision.draftedBy, on: siteDay(revision.createdAt, siteTimeZone) } : null,
    checked: null,
    approved: null,
    input: revision.input,
    context: revision.context,
    evaluation: revision.evaluation,
    basis: basis && { number: basis.number, revision: basis.revision, system: basis.system, basis: basis.basis },
    overrides: revision.overrides,
    drawnOn: siteDay(revision.savedAt, siteTimeZone),
    verification: null,
  };
}

import type { Revision } from '@bellgap/common/api';
import { mayWriteDrafts, type SignedIn } from '../platform/person';
import { newerBasisRevision, type StoredRevision } from './revision-row';
import { OWN_COUNT_FIRST, editBarsSigning, figuresHidden, movesOf } from './rights';
import { siteDay } from '../platform/site-day';

/** A revision as a person sees it. */
export function revisionAnswer(stored: StoredRevision, person: Pick<SignedIn, 'id' | 'grants'>): Revision {
  const { siteTimeZone } = stored;
  const hidden = figuresHidden(person, stored);
  const lastSheet = hidden ? null : stored.lastSheet;
  return {
    id: stored.id,
    specificationId: stored.specificationId,
    projectCode: stored.projectCode,
    projectTitle: stored.projectTitle,
    number: stored.number,
    title: stored.title,
    label: stored.label,
    state: stored.state,
    input: stored.input,
    overrides: stored.overrides,
    basis: stored.basis,
    newerBasisRevision: newerBasisRevision(stored.basis?.revision ?? null, stored.newestBasisRevision),
    context: stored.context,
    evaluation: hidden ? null : stored.evaluation,
    figuresHidden: hidden,
    lockVersion: stored.lockVersion,
    savedAt: stored.savedAt.toISOString(),
    savedBy: stored.savedBy,
    drafted: stored.draftedBy ? { name: stored.draftedBy, on: siteDay(stored.createdAt, siteTimeZone) } : null,
    checked: stored.checked && { name: stored.checked.by, on: siteDay(stored.checked.at, siteTimeZone) },
    approved: stored.approved && { name: stored.approved.by, on: siteDay(stored.approved.at, siteTimeZone) },
    labels: stored.labels,
    derivedFrom: stored.derivedFrom?.label ?? null,
    submitted: stored.submitted && {
      name: stored.submitted.by,
      on: siteDay(stored.submitted.at, siteTimeZone),
      dueOn: stored.submitted.dueOn,
      checkCategory: stored.submitted.checkCategory,
      note: stored.submitted.note,
    },
    returned: stored.returned && {
      at: stored.returned.at.toISOString(),
      // What another checker wrote may name figures.
      note: hidden ? OWN_COUNT_FIRST : stored.returned.note,
    },
    contentCode: stored.contentCode,
    authors: stored.authors.map(({ name }) => name),
    openRemarks: stored.openRemarks,
    sheetId: stored.issuedSheetId,
    moves: movesOf(person, stored),
    editBarsSigning: editBarsSigning(person, stored),
    mayEdit: stored.state === 'draft' && mayWriteDrafts(person, stored.projectId),
    lastSheet: lastSheet && {
      id: lastSheet.id,
      drawnAt: lastSheet.drawnAt.toISOString(),
      drawnBy: lastSheet.drawnBy,
      pages: lastSheet.pages,
      sha256: lastSheet.sha256,
      current: lastSheet.drawnAt >= stored.savedAt,
    },
  };
}

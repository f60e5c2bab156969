import type { Revision } from '@bellgap/common/api';
import { mayWriteDrafts, type SignedIn } from '../platform/person';
import { newerBasisRevision, type StoredRevision } from './revision-row';
import { siteDay } from '../platform/site-day';

/** A revision as a person sees it. */
export function revisionAnswer(stored: StoredRevision, person: Pick<SignedIn, 'grants'>): Revision {
  const { lastSheet } = stored;
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
    evaluation: stored.evaluation,
    lockVersion: stored.lockVersion,
    savedAt: stored.savedAt.toISOString(),
    savedBy: stored.savedBy,
    drafted: stored.draftedBy ? { name: stored.draftedBy, on: siteDay(stored.createdAt, stored.siteTimeZone) } : null,
    checked: null,
    approved: null,
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

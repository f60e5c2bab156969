import { Injectable } from '@nestjs/common';
import { REVISION_STATE_WORDS, nextNumber, recheckCaution, type Approval } from '@bellgap/common/api';
import { Clock } from '../platform/clock';
import { notFound } from '../platform/domain-error';
import type { Database } from '../platform/knex';
import { mayReadDrafts, type SignedIn } from '../platform/person';
import { siteDay } from '../platform/site-day';
import { ProjectsService } from '../projects/projects.service';
import {
  SpecificationsService,
  figuresHidden,
  moveRefusal,
  type RevisionAddress,
  type StoredRevision,
} from '../specifications/specifications.service';
import { assumedOf, changesFrom, disputedOf, mattersOf } from './approval';
import { issueBars } from './issue-bars';
import { LaterChangesService } from './later-changes.service';

/** What an approver sees before anything else, from what was submitted. */
@Injectable()
export class ApprovalService {
  constructor(
    private readonly clock: Clock,
    private readonly projects: ProjectsService,
    private readonly specifications: SpecificationsService,
    private readonly laterChanges: LaterChangesService,
  ) {}

  async of(person: SignedIn, address: RevisionAddress): Promise<Approval> {
    const revision = await this.specifications.stored(person, address);
    if (!mayReadDrafts(person, revision.projectId)) throw notFound('specification');
    const [labels, inForce, laterChanges, onDraftBasis] = await Promise.all([
      this.specifications.labelsOf(revision.specificationId),
      this.inForce(person, revision),
      this.laterChanges.of(revision),
      this.basisNotIssued(revision),
    ]);
    const refusal = moveRefusal(person, 'issue', revision);
    const hidden = figuresHidden(person, revision);
    const barred = [...(refusal === null ? [] : [refusal]), ...(hidden ? [] : issueBars(revision))];
    return {
      mayIssue: barred.length === 0,
      barred,
      nextLabel: nextNumber(labels) ?? '',
      changes: inForce ? changesFrom(inForce, revision) : [],
      inForce: inForce && {
        label: inForce.label,
        units: inForce.evaluation.string?.units ?? null,
        contentCode: inForce.contentCode,
      },
      ...(hidden ? NO_FIGURES : this.figures(revision, onDraftBasis)),
      overrides: revision.overrides,
      laterChanges,
      openRemarks: revision.openRemarks,
    };
  }

  /** The revision that this one would supersede, or has superseded; null where it is the first. */
  async inForce(person: SignedIn, revision: StoredRevision, db?: Database): Promise<StoredRevision | null> {
    const label = await this.specifications.labelInForce(revision.specificationId, db);
    if (label === null || revision.labels.includes(label)) return null;
    const { projectCode, number } = revision;
    return this.specifications.stored(person, { projectCode, number, label }, db && { db, forUpdate: true });
  }

  /** The pinned revision of the design basis, where nobody has issued it. */
  private async basisNotIssued({ basis }: StoredRevision): Promise<Approval['assumed']> {
    const state = basis && (await this.projects.basisState(basis.id));
    if (!basis || !state || state === 'issued' || state === 'superseded') return [];
    const text = `Design basis ${basis.number} revision ${basis.revision} is ${REVISION_STATE_WORDS[state]}.`;
    return [{ path: null, text }];
  }

  private figures(revision: StoredRevision, onDraftBasis: Approval['assumed']) {
    const { evaluation, context, input, siteTimeZone } = revision;
    const recheck = recheckCaution(input, siteDay(this.clock.now(), siteTimeZone));
    return {
      acceptances: mattersOf(evaluation, 'acceptance'),
      fails: mattersOf(evaluation, 'fail'),
      cautions: [...(recheck ? [recheck] : []), ...mattersOf(evaluation, 'caution')],
      assumed: [...onDraftBasis, ...assumedOf(revision)],
      disputed: disputedOf(evaluation, context),
      notAssessed: evaluation.notAssessed,
    };
  }
}

/** To a checker who has not entered his own figures. */
const NO_FIGURES = { acceptances: [], fails: [], cautions: [], assumed: [], disputed: [], notAssessed: [] };

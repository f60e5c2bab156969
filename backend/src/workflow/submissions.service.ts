import { Inject, Injectable } from '@nestjs/common';
import { nextLetter, type BodyOf, type Revision, type contract } from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { Clock } from '../platform/clock';
import { contentCodeOf } from '../platform/content-code';
import { forbidden, invalid, invalidAt, wrongState } from '../platform/domain-error';
import { KNEX, type Database } from '../platform/knex';
import { mayWriteDrafts, type SignedIn } from '../platform/person';
import { siteDay } from '../platform/site-day';
import { SpecificationsService, type RevisionAddress } from '../specifications/specifications.service';
import { requireMove } from './moves';
import { differenceNow, submissionBars } from './submission-bars';
import { SubmissionsRepository } from './submissions.repository';
import { WorkflowLetters } from './workflow-letters';

type Given = BodyOf<typeof contract.submitRevision>;

/** The way into the check: the next revision is begun, and a draft is handed in as it is stored. */
@Injectable()
export class SubmissionsService {
  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly specifications: SpecificationsService,
    private readonly submissions: SubmissionsRepository,
    private readonly letters: WorkflowLetters,
  ) {}

  /** Begins the next revision from the one in force. */
  async startNext(person: SignedIn, projectCode: string, number: string): Promise<Revision> {
    const label = await this.knex.transaction(async (db) => {
      const { inForce, inWork } = await this.specifications.standing(person, projectCode, number, db);
      if (inWork) {
        throw wrongState(`Revision ${inWork.label} is in work already; the next one begins when it is issued.`);
      }
      if (inForce === null) throw wrongState('No revision is in force; the next one begins from an issued one.');
      const address = { projectCode, number, label: inForce };
      const from = await this.specifications.stored(person, address, { db, forUpdate: true });
      if (!mayWriteDrafts(person, from.projectId)) throw forbidden();
      const next = nextLetter(await this.specifications.labelsOf(from.specificationId, db));
      if (next === null) throw wrongState('All letters of this specification are used up.');
      const id = await this.specifications.deriveFrom(person, from, next, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'revision.started',
        entity: 'revision',
        entityId: id,
        projectId: from.projectId,
        changes: { label: { from: from.label, to: next } },
      });
      return next;
    });
    return this.specifications.get(person, { projectCode, number, label });
  }

  async submit(person: SignedIn, address: RevisionAddress, version: number, given: Given): Promise<Revision> {
    const { dueOn = null, checkCategory, note = '' } = given;
    const label = await this.knex.transaction(async (db) => {
      const revision = await this.specifications.stored(person, address, { db, forUpdate: true });
      requireMove(person, 'submit', revision);
      this.specifications.requireVersion(revision, version, person);
      const at = this.clock.now();
      if (dueOn !== null && dueOn < siteDay(at, revision.siteTimeZone)) {
        throw invalidAt('dueOn', 'Wanted by: lies in the past');
      }
      const bars = submissionBars(revision);
      if (bars.length > 0) throw invalid(bars);
      const now = await this.specifications.evaluatedNow(revision, db);
      const difference = differenceNow(revision.evaluation, now.evaluation);
      if (difference !== null) {
        throw wrongState(
          `What the figures rest on has changed since the last save (${difference}). Open the draft and save it again.`,
        );
      }
      const { input, context, evaluation } = revision;
      const contentCode = contentCodeOf({ input, context, evaluation, methodEdition: evaluation.methodEdition });
      const submission = { by: person.id, at, dueOn, checkCategory, note: note.trim(), contentCode };
      await this.submissions.insert(revision, submission, db);
      const { by } = submission;
      await this.specifications.moveTo(db, revision, { name: 'submit', by, at, dueOn, checkCategory, contentCode });
      await this.audit.record(db, {
        actorId: person.id,
        action: 'revision.submitted',
        entity: 'revision',
        entityId: revision.id,
        projectId: revision.projectId,
        changes: {
          state: { from: revision.state, to: 'in_check' },
          label: { to: revision.label },
          contentCode: { to: contentCode },
          checkCategory: { to: checkCategory },
          ...(dueOn === null ? {} : { dueOn: { to: dueOn } }),
        },
        reason: submission.note || null,
      });
      await this.letters.waitsForCheck(db, revision, { by: person, dueOn, note: submission.note, checkCategory });
      return revision.label;
    });
    return this.specifications.get(person, { ...address, label });
  }
}

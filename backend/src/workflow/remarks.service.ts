import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { STATES_IN_WORK, type AnswerOf, type BodyOf, type Remark, type contract } from '@bellgap/common/api';
import { fieldOf, filledPaths } from '@bellgap/common/schemas';
import { AuditService } from '../audit/audit.service';
import { Clock } from '../platform/clock';
import { forbidden, invalidAt, notFound, wrongState } from '../platform/domain-error';
import { KNEX, type Database } from '../platform/knex';
import { holdsRole, type SignedIn } from '../platform/person';
import {
  OWN_COUNT_FIRST,
  figuresHidden,
  isAuthor,
  isChecker,
  ownWork,
  SpecificationsService,
  type RevisionAddress,
  type StoredRevision,
} from '../specifications/specifications.service';
import { RemarksRepository, type StoredRemark } from './remarks.repository';

type Remarks = AnswerOf<typeof contract.remarks>;

const TRACE = 'trace:';

/** Remarks of check and approval: answered by the author, closed by who raised them. While one is open, nothing is issued. */
@Injectable()
export class RemarksService {
  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly specifications: SpecificationsService,
    private readonly stored: RemarksRepository,
  ) {}

  async list(person: SignedIn, address: RevisionAddress): Promise<Remarks> {
    const revision = await this.specifications.storedWithFigures(person, address);
    const items = await this.ofRevision(revision, person);
    return {
      items,
      open: items.filter(({ closedAt }) => closedAt === null).length,
      mayRaise: raiseRefusal(person, revision) === null,
    };
  }

  /** Every remark of a revision with its answers; without a person nobody may act on them. */
  async ofRevision(revision: StoredRevision, person: SignedIn | null = null, db?: Database): Promise<Remark[]> {
    const remarks = await this.stored.ofRevision(revision.id, db);
    return remarks.map((remark) => ({
      id: remark.id,
      label: remark.label,
      path: remark.path,
      text: remark.text,
      raisedBy: remark.raisedBy,
      raisedAt: remark.raisedAt.toISOString(),
      closedAt: remark.closedAt?.toISOString() ?? null,
      answers: remark.answers,
      mayClose: person !== null && closeRefusal(person, revision, remark) === null,
      mayAnswer: person !== null && answerRefusal(person, revision, remark) === null,
    }));
  }

  async raise(
    person: SignedIn,
    address: RevisionAddress,
    given: BodyOf<typeof contract.raiseRemark>,
  ): Promise<Remarks> {
    await this.knex.transaction(async (db) => {
      const revision = await this.specifications.stored(person, address, { db, forUpdate: true });
      if (revision.state !== 'in_check' && revision.state !== 'checked') {
        throw wrongState('Remarks are raised while a revision is in check or waits for approval.');
      }
      refuseFor(raiseRefusal(person, revision));
      const { path = null, text } = given;
      refuseUnknownPath(path, revision);
      const { id: revisionId, label } = revision;
      const id = await this.stored.insert({ revisionId, label, path, text, by: person.id, at: this.clock.now() }, db);
      await this.record(db, revision, person, {
        action: 'remark.raised',
        id,
        changes: { label: { to: label }, path: { to: path }, text: { to: text } },
      });
    });
    return this.list(person, address);
  }

  async answer(person: SignedIn, address: RevisionAddress, id: string, text: string): Promise<Remarks> {
    await this.knex.transaction(async (db) => {
      const { revision, remark } = await this.open(person, address, id, db);
      refuseFor(answerRefusal(person, revision, remark));
      await this.stored.answer({ remarkId: remark.id, text, by: person.id, at: this.clock.now() }, db);
      await this.record(db, revision, person, { action: 'remark.answered', id, changes: { answer: { to: text } } });
    });
    return this.list(person, address);
  }

  async close(person: SignedIn, address: RevisionAddress, id: string): Promise<Remarks> {
    await this.knex.transaction(async (db) => {
      const { revision, remark } = await this.open(person, address, id, db);
      refuseFor(closeRefusal(person, revision, remark));
      await this.stored.close(remark.id, this.clock.now(), db);
      await this.record(db, revision, person, { action: 'remark.closed', id, changes: { closed: { to: true } } });
    });
    return this.list(person, address);
  }

  private async open(
    person: SignedIn,
    address: RevisionAddress,
    id: string,
    db: Database,
  ): Promise<{ revision: StoredRevision; remark: StoredRemark }> {
    const revision = await this.specifications.stored(person, address, { db, forUpdate: true });
    refuseFor(figuresHidden(person, revision) ? OWN_COUNT_FIRST : null);
    const remark = await this.stored.find(revision.id, id, db);
    if (!remark) throw notFound('remark');
    if (remark.closedAt) throw wrongState('This remark is closed.');
    if (!STATES_IN_WORK.includes(revision.state)) throw wrongState('This revision is issued; its remarks stay.');
    return { revision, remark };
  }

  private record(
    db: Knex.Transaction,
    { projectId }: StoredRevision,
    person: SignedIn,
    event: { action: string; id: string; changes: Record<string, { to: unknown }> },
  ): Promise<void> {
    const { action, id: entityId, changes } = event;
    return this.audit.record(db, {
      actorId: person.id,
      action,
      entity: 'review-remark',
      entityId,
      projectId,
      changes,
    });
  }
}

function refuseFor(why: string | null): void {
  if (why !== null) throw forbidden(why);
}

function raiseRefusal(person: SignedIn, revision: StoredRevision): string | null {
  const { projectId, state } = revision;
  if (state !== 'in_check' && state !== 'checked') return 'Remarks are raised in check and before approval.';
  if (!isChecker(person, projectId, null) && !holdsRole(person, ['approver'], projectId)) {
    return 'Only checkers and approvers of this project raise remarks.';
  }
  return ownWork(person, revision) ?? (figuresHidden(person, revision) ? OWN_COUNT_FIRST : null);
}

function answerRefusal(person: SignedIn, revision: StoredRevision, remark: StoredRemark): string | null {
  if (remark.closedAt || !STATES_IN_WORK.includes(revision.state)) return 'This remark is closed.';
  const mayAnswer = isAuthor(person, revision) || remark.raisedById === person.id;
  return mayAnswer ? null : 'Only the authors and who raised it answer a remark.';
}

function closeRefusal(person: SignedIn, revision: StoredRevision, remark: StoredRemark): string | null {
  if (remark.closedAt || !STATES_IN_WORK.includes(revision.state)) return 'This remark is closed.';
  return remark.raisedById === person.id ? null : `Only ${remark.raisedBy}, who raised it, closes this remark.`;
}

function refuseUnknownPath(path: string | null, { input, evaluation }: StoredRevision): void {
  if (path === null) return;
  const isKnown = path.startsWith(TRACE)
    ? evaluation.trace.some(({ id }) => id === path.slice(TRACE.length))
    : fieldOf(path) !== undefined || filledPaths(input).includes(path);
  if (!isKnown) throw invalidAt('path', 'Field: names no input and no line of the calculation');
}

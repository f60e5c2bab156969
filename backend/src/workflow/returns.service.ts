import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { nextLetter, type Revision } from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { Clock } from '../platform/clock';
import { wrongState } from '../platform/domain-error';
import { KNEX, type Database } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import {
  SpecificationsService,
  type RevisionAddress,
  type StoredRevision,
} from '../specifications/specifications.service';
import { requireMove } from './moves';
import { WorkflowLetters } from './workflow-letters';

type Back = 'recall' | 'return' | 'refuse';

const ACTIONS = { recall: 'revision.recalled', return: 'revision.returned', refuse: 'revision.refused' } as const;

/** The ways back to the engineer. Each gives the draft its next letter at once; the old one still leads to it. */
@Injectable()
export class ReturnsService {
  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly specifications: SpecificationsService,
    private readonly letters: WorkflowLetters,
  ) {}

  /** By who submitted it, before it is checked. */
  recall(person: SignedIn, address: RevisionAddress, version: number, reason: string): Promise<Revision> {
    return this.goBack('recall', person, address, version, reason);
  }

  /** By an approver, instead of issuing it. */
  refuse(person: SignedIn, address: RevisionAddress, version: number, reason: string): Promise<Revision> {
    return this.goBack('refuse', person, address, version, reason);
  }

  /** In the transaction of who found the move to be allowed. */
  async sendBack(
    db: Knex.Transaction,
    revision: StoredRevision,
    back: { name: Back; by: SignedIn; note: string },
  ): Promise<void> {
    const { name, by, note } = back;
    const label = nextLetter(await this.specifications.labelsOf(revision.specificationId, db));
    if (label === null) throw wrongState('All letters of this specification are used up.');
    const at = this.clock.now();
    const told = name === 'recall' ? `Taken back by ${by.name}: ${note}` : note;
    await this.specifications.moveTo(db, revision, { name, by: by.id, at, label, note: told });
    await this.audit.record(db, {
      actorId: by.id,
      action: ACTIONS[name],
      entity: 'revision',
      entityId: revision.id,
      projectId: revision.projectId,
      changes: { state: { from: revision.state, to: 'draft' }, label: { from: revision.label, to: label } },
      reason: note,
    });
    if (name !== 'recall') await this.letters.returned(db, revision, by, note);
  }

  private async goBack(
    name: 'recall' | 'refuse',
    person: SignedIn,
    address: RevisionAddress,
    version: number,
    note: string,
  ): Promise<Revision> {
    await this.knex.transaction(async (db) => {
      const revision = await this.specifications.stored(person, address, { db, forUpdate: true });
      requireMove(person, name, revision);
      this.specifications.requireVersion(revision, version, person);
      await this.sendBack(db, revision, { name, by: person, note });
    });
    return this.specifications.get(person, address);
  }
}

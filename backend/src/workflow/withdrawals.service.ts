import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { BodyOf, IssuedSheet, contract } from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { SignaturesService } from '../auth/signatures.service';
import { Clock } from '../platform/clock';
import { KNEX } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { IssuedSheetsService } from '../register/issued-sheets.service';
import { RegisterService } from '../register/register.service';
import { SpecificationsService, type StoredRevision } from '../specifications/specifications.service';
import { IssueLetters } from './issue-letters';
import { requireMove } from './moves';

type Given = BodyOf<typeof contract.withdrawSheet>;

/** Takes a sheet out of force without one that follows it. It stays to be read, and its code says so. */
@Injectable()
export class WithdrawalsService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly signatures: SignaturesService,
    private readonly specifications: SpecificationsService,
    private readonly register: RegisterService,
    private readonly issuedSheets: IssuedSheetsService,
    private readonly letters: IssueLetters,
  ) {}

  async withdraw(
    person: SignedIn,
    sheetId: string,
    { reason, password }: Given,
    clientAddress: string,
  ): Promise<IssuedSheet> {
    requireMove(person, 'withdraw', await this.revisionOf(person, sheetId));
    await this.signatures.confirm(person, password, clientAddress);
    await this.knex.transaction(async (db) => {
      const revision = await this.revisionOf(person, sheetId, db);
      requireMove(person, 'withdraw', revision);
      const ending = { at: this.clock.now(), by: person.id, reason: reason.trim() };
      await this.issuedSheets.lock(sheetId, db);
      await this.specifications.moveTo(db, revision, { name: 'withdraw', ...ending });
      await this.issuedSheets.endStanding(sheetId, { standing: 'withdrawn', successorId: null, ...ending }, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'revision.withdrawn',
        entity: 'revision',
        entityId: revision.id,
        projectId: revision.projectId,
        changes: { state: { from: 'issued', to: 'withdrawn' } },
        reason: ending.reason,
      });
      const holders = await this.issuedSheets.holders(sheetId, db);
      await this.letters.withdrawn(db, revision, { by: person, sheetId, holders, reason: ending.reason });
    });
    return this.register.get(person, sheetId);
  }

  private async revisionOf(person: SignedIn, sheetId: string, db?: Knex.Transaction): Promise<StoredRevision> {
    const { project_code: projectCode, number, label } = await this.register.known(person, sheetId, db);
    return this.specifications.stored(person, { projectCode, number, label }, db && { db, forUpdate: true });
  }
}

import { randomUUID } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { nextNumber, type BodyOf, type IssuedSheet, type contract } from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { SignaturesService } from '../auth/signatures.service';
import { Clock } from '../platform/clock';
import { contentCodeOf } from '../platform/content-code';
import { sha256Of } from '../platform/canonical-json';
import { invalid, wrongState } from '../platform/domain-error';
import { KNEX } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { siteDay } from '../platform/site-day';
import { ConcessionsService, type NewConcession } from '../register/concessions.service';
import { IssuedSheetsService } from '../register/issued-sheets.service';
import { RegisterService } from '../register/register.service';
import { SheetsService } from '../sheets/sheets.service';
import {
  SpecificationsService,
  listColumnsOf,
  type RevisionAddress,
  type StoredRevision,
} from '../specifications/specifications.service';
import { ApprovalService } from './approval.service';
import { concessionsOf, issueBars, issueFaults } from './issue-bars';
import { IssueLetters } from './issue-letters';
import { IssueRecordService } from './issue-record.service';
import { LaterChangesService } from './later-changes.service';
import { requireMove } from './moves';

type Given = BodyOf<typeof contract.issueRevision>;

/** Approves and issues: what was submitted and checked becomes a sheet that stays, or nothing happens at all. */
@Injectable()
export class IssueService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly signatures: SignaturesService,
    private readonly specifications: SpecificationsService,
    private readonly approval: ApprovalService,
    private readonly laterChanges: LaterChangesService,
    private readonly concessions: ConcessionsService,
    private readonly records: IssueRecordService,
    private readonly sheets: SheetsService,
    private readonly issuedSheets: IssuedSheetsService,
    private readonly register: RegisterService,
    private readonly letters: IssueLetters,
  ) {}

  async issue(
    person: SignedIn,
    address: RevisionAddress,
    version: number,
    given: Given,
    clientAddress: string,
  ): Promise<IssuedSheet> {
    requireMove(person, 'issue', await this.specifications.stored(person, address));
    await this.signatures.confirm(person, given.password, clientAddress);
    return this.issueSigned(person, address, version, given);
  }

  /** What is signed already. */
  async issueSigned(
    person: SignedIn,
    address: RevisionAddress,
    version: number,
    given: Omit<Given, 'password'>,
  ): Promise<IssuedSheet> {
    const id = await this.knex.transaction(async (db) => {
      const revision = await this.specifications.stored(person, address, { db, forUpdate: true });
      requireMove(person, 'issue', revision);
      this.specifications.requireVersion(revision, version, person);
      const [bar] = issueBars(revision);
      if (bar !== undefined) throw wrongState(bar);
      const at = this.clock.now();
      const laterChanges = await this.laterChanges.of(revision, db);
      const today = siteDay(at, revision.siteTimeZone);
      const faults = issueFaults(given, revision, { laterChanges, today });
      if (faults.length > 0) throw invalid(faults);
      return this.write(db, revision, { person, at, taken: concessionsOf(given, laterChanges) });
    });
    return this.register.get(person, id);
  }

  private async write(
    db: Knex.Transaction,
    revision: StoredRevision,
    { person, at, taken }: { person: SignedIn; at: Date; taken: NewConcession[] },
  ): Promise<string> {
    const label = nextNumber(await this.specifications.labelsOf(revision.specificationId, db));
    if (label === null) throw wrongState('All numbers of this specification are used up.');
    const former = await this.approval.inForce(person, revision, db);
    const formerSheet = former && (await this.issuedSheets.lockCurrent(revision.specificationId, db));
    const sheetId = randomUUID();
    const ending = { at, by: person.id, reason: null };

    if (former)
      await this.specifications.moveTo(db, former, { name: 'supersede', successorId: revision.id, ...ending });
    if (formerSheet) {
      await this.issuedSheets.endStanding(
        formerSheet.id,
        { standing: 'superseded', successorId: sheetId, ...ending },
        db,
      );
    }
    await this.concessions.record(taken, { revisionId: revision.id, by: person.id, at }, db);
    await this.specifications.moveTo(db, revision, { name: 'issue', by: person.id, at, label });
    const sheet = await this.draw(db, revision, { id: sheetId, person, at, label, taken });
    await this.tellTrail(db, revision, { person, label, former, sheet });
    await this.letters.issued(db, { ...revision, label }, { by: person, sheetId });
    if (former && formerSheet) {
      const holders = await this.issuedSheets.holders(formerSheet.id, db);
      await this.letters.superseded(
        db,
        { ...revision, label },
        { by: person, sheetId, holders, formerLabel: former.label },
      );
    }
    return sheetId;
  }

  /** Draws the sheet once and for ever, and enters it in the register. */
  private async draw(
    db: Knex.Transaction,
    revision: StoredRevision,
    { id, person, at, label, taken }: { id: string; person: SignedIn; at: Date; label: string; taken: NewConcession[] },
  ) {
    const { input, context, evaluation } = revision;
    const contentCode = contentCodeOf({ input, context, evaluation, methodEdition: evaluation.methodEdition });
    const verification = await this.issuedSheets.newCode(db);
    const record = await this.records.of(db, revision, { person, at, label, taken });
    const signed = { ...revision, label, approved: { by: person.name, byId: person.id, at } };
    const { bytes, pages } = await this.sheets.render(signed, {
      ...record,
      contentCode,
      verificationCode: verification.code,
      verificationUrl: verification.url,
      issuedOn: siteDay(at, revision.siteTimeZone),
    });
    const sha256 = sha256Of(bytes);
    const count = (kind: NewConcession['kind']) => taken.filter((one) => one.kind === kind).length;
    await this.issuedSheets.insert(
      {
        id,
        revisionId: revision.id,
        specificationId: revision.specificationId,
        projectId: revision.projectId,
        number: revision.number,
        title: revision.title,
        label,
        kind: revision.kind,
        issuedAt: at,
        issuedBy: person.id,
        ...listColumnsOf(input, context, evaluation),
        input,
        context,
        evaluation,
        acceptances: count('acceptance'),
        concessions: count('concession'),
        contentCode,
        verificationCode: verification.code,
        lastSeal: record.lastSeal,
        sha256,
        pages,
        bytes,
      },
      db,
    );
    return { id, sha256, contentCode, taken };
  }

  private async tellTrail(
    db: Knex.Transaction,
    revision: StoredRevision,
    issue: {
      person: SignedIn;
      label: string;
      former: StoredRevision | null;
      sheet: { id: string; sha256: string; contentCode: string; taken: NewConcession[] };
    },
  ): Promise<void> {
    const { person, label, former, sheet } = issue;
    const entry = { actorId: person.id, entity: 'revision', projectId: revision.projectId };
    const taken = sheet.taken.map(({ kind, text, reason, validUntil }) => ({
      kind,
      text,
      reason,
      ...(validUntil === null ? {} : { validUntil }),
    }));
    await this.audit.record(db, {
      ...entry,
      action: 'revision.issued',
      entityId: revision.id,
      changes: {
        state: { from: 'checked', to: 'issued' },
        label: { from: revision.label, to: label },
        contentCode: { to: sheet.contentCode },
        sha256: { to: sheet.sha256 },
        ...(taken.length === 0 ? {} : { concessions: { to: taken } }),
      },
    });
    if (!former) return;
    await this.audit.record(db, {
      ...entry,
      action: 'revision.superseded',
      entityId: former.id,
      changes: { state: { from: 'issued', to: 'superseded' }, successor: { to: label } },
    });
  }
}

import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { BodyOf, Check, CheckRecord, contract } from '@bellgap/common/api';
import { isClearanceCard, isCountCard } from '@bellgap/common/schemas';
import { AuditService } from '../audit/audit.service';
import { changesBetween } from '../platform/values';
import { Clock } from '../platform/clock';
import { forbidden, invalid, newerVersion, wrongState } from '../platform/domain-error';
import { KNEX, type Database } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import {
  OWN_COUNT_FIRST,
  figuresHidden,
  moveRefusal,
  SpecificationsService,
  type RevisionAddress,
  type StoredRevision,
} from '../specifications/specifications.service';
import { ownFiguresFaults, passFaults, soFarFaults } from './check-faults';
import { checkRecordOf } from './check-record-answer';
import { CheckRecordsRepository, type CheckSoFar, type StoredCheck } from './check-records.repository';
import { requireMove } from './moves';
import { ReturnsService } from './returns.service';
import { WorkflowLetters } from './workflow-letters';

type OwnFigures = BodyOf<typeof contract.enterOwnFigures>;
type SoFar = BodyOf<typeof contract.saveCheck>;
export type Verdict = Omit<BodyOf<typeof contract.decideCheck>, 'password'>;

/** The check of a submission: own figures first, then what was seen, then the verdict. */
@Injectable()
export class ChecksService {
  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly specifications: SpecificationsService,
    private readonly records: CheckRecordsRepository,
    private readonly returns: ReturnsService,
    private readonly letters: WorkflowLetters,
  ) {}

  async get(person: SignedIn, address: RevisionAddress): Promise<Check> {
    return this.answer(person, await this.specifications.stored(person, address));
  }

  /** Decided checks of a revision, newest first, for what is printed and approved. */
  async decidedOf({ id, siteTimeZone }: Pick<StoredRevision, 'id' | 'siteTimeZone'>, db?: Database) {
    return (await this.records.decided(id, db)).map((record) => checkRecordOf(record, siteTimeZone));
  }

  /** Once for each submission and checker: from here on he sees the figures of the author. */
  async enterOwnFigures(person: SignedIn, address: RevisionAddress, figures: OwnFigures): Promise<Check> {
    await this.knex.transaction(async (db) => {
      const { revision, submissionId } = await this.toCheck(person, address, db);
      if (await this.records.mine(submissionId, person.id, db)) {
        throw wrongState('You have entered your own figures already.');
      }
      const faults = ownFiguresFaults(figures, revision);
      if (faults.length > 0) throw invalid(faults);
      const { methodEdition } = revision.evaluation;
      const at = this.clock.now();
      await this.records.begin({ submissionId, checkerId: person.id, at, ownFigures: figures, methodEdition }, db);
      await this.record(db, revision, person, 'check.begun', {
        ownUnits: { to: figures.units },
        ownUnitsCard: { to: figures.unitsCard },
        ownClearanceMm: { to: figures.clearanceMm },
        ownClearanceCard: { to: figures.clearanceCard },
        ownNote: { to: figures.note },
      });
    });
    return this.get(person, address);
  }

  async save(person: SignedIn, address: RevisionAddress, version: number, given: SoFar): Promise<Check> {
    await this.knex.transaction(async (db) => {
      const { revision, record } = await this.begun(person, address, version, db);
      const faults = soFarFaults(given, revision);
      if (faults.length > 0) throw invalid(faults);
      const soFar = { ...given, differenceReason: given.differenceReason ?? '' } as CheckSoFar;
      const changes = changesBetween(trailOf(record), trailOf(soFar));
      if (Object.keys(changes).length === 0) return;
      await this.records.save(record.id, soFar, db);
      await this.record(db, revision, person, 'check.saved', changes);
    });
    return this.get(person, address);
  }

  /** The verdict, signed before it comes here. A pass and the new state of the revision stand or fall together. */
  async decide(person: SignedIn, address: RevisionAddress, version: number, given: Verdict): Promise<Check> {
    const { verdict } = given;
    const note = given.note?.trim() ?? '';
    await this.knex.transaction(async (db) => {
      const { revision, record } = await this.begun(person, address, version, db);
      if (verdict !== 'return') {
        const faults = passFaults(record, revision);
        if (faults.length > 0) throw invalid(faults);
      }
      const at = this.clock.now();
      await this.records.decide(record.id, { verdict, note, at }, db);
      if (verdict === 'return') return this.returns.sendBack(db, revision, { name: 'return', by: person, note });
      await this.specifications.moveTo(db, revision, { name: 'pass', by: person.id, at });
      await this.record(db, revision, person, 'revision.checked', {
        state: { from: revision.state, to: 'checked' },
        contentCode: { to: revision.contentCode },
        verdict: { to: verdict },
        verdictNote: { to: note },
        differenceReason: { to: record.differenceReason },
      });
      await this.letters.waitsForApproval(db, revision, person, note);
    });
    return this.get(person, address);
  }

  private async toCheck(person: SignedIn, address: RevisionAddress, db: Database) {
    const revision = await this.specifications.stored(person, address, { db, forUpdate: true });
    requireMove(person, 'pass', revision);
    if (!revision.submitted) throw wrongState('This revision is not submitted.');
    return { revision, submissionId: revision.submitted.id };
  }

  private async begun(
    person: SignedIn,
    address: RevisionAddress,
    version: number,
    db: Database,
  ): Promise<{ revision: StoredRevision; record: StoredCheck }> {
    const { revision, submissionId } = await this.toCheck(person, address, db);
    const record = await this.records.mine(submissionId, person.id, db);
    if (!record) throw forbidden(OWN_COUNT_FIRST);
    if (record.decidedAt) throw wrongState('This check is decided.');
    if (record.lockVersion !== version) {
      throw newerVersion({
        current: checkRecordOf(record, revision.siteTimeZone),
        changedBy: record.checker,
        changedAt: record.startedAt.toISOString(),
      });
    }
    return { revision, record };
  }

  private async answer(person: SignedIn, revision: StoredRevision): Promise<Check> {
    const { submitted, siteTimeZone } = revision;
    const [mine, decided] = await Promise.all([
      submitted ? this.records.mine(submitted.id, person.id) : null,
      this.records.decided(revision.id),
    ]);
    const isHidden = figuresHidden(person, revision);
    const why = moveRefusal(person, 'pass', revision);
    const answerOf = (record: StoredCheck): CheckRecord => checkRecordOf(record, siteTimeZone);
    return {
      mayCheck: why === null,
      why,
      cards: revision.evaluation.ruleOfThumb.rows
        .filter((row) => isCountCard(row) || isClearanceCard(row))
        .map(({ id, rule, unit, inRange, why: reason, source }) => ({
          id,
          rule,
          unit,
          inRange,
          why: reason,
          source: source as object & typeof source,
        })),
      mine: mine && answerOf(mine),
      // Checks of others hold the author's figures against theirs.
      decided: decided.filter(({ checkerId }) => !isHidden || checkerId === person.id).map(answerOf),
    };
  }

  private record(
    db: Knex.Transaction,
    revision: StoredRevision,
    person: SignedIn,
    action: string,
    changes: Record<string, { from?: unknown; to?: unknown }>,
  ): Promise<void> {
    const { id: entityId, projectId } = revision;
    return this.audit.record(db, { actorId: person.id, action, entity: 'revision', entityId, projectId, changes });
  }
}

/** What the trail tells of a check as far as it has come: by input and by point. */
function trailOf({ ticks, checklist, differenceReason, independent }: CheckSoFar) {
  const entry = (word: string, note: string) => (note ? `${word}: ${note}` : word);
  return {
    ticks: Object.fromEntries(
      ticks.map(({ path, agreed, seenIn = '' }) => [path, entry(agreed ? 'agreed' : 'not agreed', seenIn)]),
    ),
    checklist: Object.fromEntries(checklist.map(({ item, answer, note }) => [item, entry(answer, note)])),
    differenceReason,
    independent,
  };
}

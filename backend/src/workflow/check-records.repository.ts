import { Inject, Injectable } from '@nestjs/common';
import type { CheckRecord, Evaluation } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';

type Card = Evaluation['ruleOfThumb']['rows'][number];

/** A check as it is stored, with what the submission said that it is held against. */
export interface StoredCheck {
  id: string;
  label: string;
  contentCode: string;
  checkCategory: number;
  checkerId: string;
  checker: string;
  startedAt: Date;
  lockVersion: number;
  ownFigures: CheckRecord['ownFigures'];
  ownFiguresAt: Date;
  ticks: CheckRecord['ticks'];
  checklist: CheckRecord['checklist'];
  differenceReason: string;
  independent: boolean;
  verdict: CheckRecord['verdict'];
  verdictNote: string;
  decidedAt: Date | null;
  methodEdition: string;
  authors: { units: number | null; clearanceMm: number | null; cards: Card[] };
}

interface CheckRow {
  id: string;
  label: string;
  content_code: string;
  check_category: number;
  checker_id: string;
  checker: string;
  started_at: Date;
  lock_version: number;
  own_figures: CheckRecord['ownFigures'];
  own_figures_at: Date;
  ticks: CheckRecord['ticks'];
  checklist: CheckRecord['checklist'];
  difference_reason: string;
  independent: boolean;
  verdict: CheckRecord['verdict'];
  verdict_note: string;
  decided_at: Date | null;
  method_edition: string;
  units: number | null;
  clearance_mm: number | null;
  cards: Card[];
}

export type CheckSoFar = Pick<StoredCheck, 'ticks' | 'checklist' | 'differenceReason' | 'independent'>;

@Injectable()
export class CheckRecordsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  async mine(submissionId: string, checkerId: string, db: Database = this.knex): Promise<StoredCheck | null> {
    const [row] = (await this.select(db).where({
      'k.submission_id': submissionId,
      'k.checker_id': checkerId,
    })) as CheckRow[];
    return row ? toCheck(row) : null;
  }

  /** Decided checks of all submissions of a revision, newest first. */
  async decided(revisionId: string, db: Database = this.knex): Promise<StoredCheck[]> {
    const rows = (await this.select(db)
      .where('m.revision_id', revisionId)
      .whereNotNull('k.decided_at')
      .orderBy([{ column: 'k.decided_at', order: 'desc' }, 'k.id'])) as CheckRow[];
    return rows.map(toCheck);
  }

  async begin(
    record: {
      submissionId: string;
      checkerId: string;
      at: Date;
      ownFigures: CheckRecord['ownFigures'];
      methodEdition: string;
    },
    db: Database,
  ): Promise<void> {
    await db('check_records').insert({
      submission_id: record.submissionId,
      checker_id: record.checkerId,
      started_at: record.at,
      own_figures: JSON.stringify(record.ownFigures),
      own_figures_at: record.at,
      method_edition: record.methodEdition,
    });
  }

  async save(id: string, soFar: CheckSoFar, db: Database): Promise<void> {
    await db('check_records')
      .where({ id })
      .update({
        ticks: JSON.stringify(soFar.ticks),
        checklist: JSON.stringify(soFar.checklist),
        difference_reason: soFar.differenceReason,
        independent: soFar.independent,
        lock_version: db.raw('lock_version + 1'),
      });
  }

  async decide(
    id: string,
    decision: { verdict: NonNullable<CheckRecord['verdict']>; note: string; at: Date },
    db: Database,
  ): Promise<void> {
    await db('check_records')
      .where({ id })
      .update({
        verdict: decision.verdict,
        verdict_note: decision.note,
        decided_at: decision.at,
        lock_version: db.raw('lock_version + 1'),
      });
  }

  private select(db: Database) {
    return db('check_records as k')
      .join('submissions as m', 'm.id', 'k.submission_id')
      .join('users as u', 'u.id', 'k.checker_id')
      .select(
        'k.id',
        'm.label',
        'm.content_code',
        'm.check_category',
        'k.checker_id',
        'u.name as checker',
        'k.started_at',
        'k.lock_version',
        'k.own_figures',
        'k.own_figures_at',
        'k.ticks',
        'k.checklist',
        'k.difference_reason',
        'k.independent',
        'k.verdict',
        'k.verdict_note',
        'k.decided_at',
        'k.method_edition',
        db.raw(`(m.evaluation #>> '{string,units}')::integer as units`),
        db.raw(`(m.evaluation #>> '{clearances,phaseToEarthMm}')::double precision as clearance_mm`),
        db.raw(`m.evaluation #> '{ruleOfThumb,rows}' as cards`),
      );
  }
}

function toCheck(row: CheckRow): StoredCheck {
  return {
    id: row.id,
    label: row.label,
    contentCode: row.content_code,
    checkCategory: row.check_category,
    checkerId: row.checker_id,
    checker: row.checker,
    startedAt: row.started_at,
    lockVersion: row.lock_version,
    ownFigures: row.own_figures,
    ownFiguresAt: row.own_figures_at,
    ticks: row.ticks,
    checklist: row.checklist,
    differenceReason: row.difference_reason,
    independent: row.independent,
    verdict: row.verdict,
    verdictNote: row.verdict_note,
    decidedAt: row.decided_at,
    methodEdition: row.method_edition,
    authors: { units: row.units, clearanceMm: row.clearance_mm, cards: row.cards },
  };
}

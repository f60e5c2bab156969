import { Inject, Injectable } from '@nestjs/common';
import type { Concession } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';
import { siteDay } from '../platform/site-day';

/** What an approver takes upon himself when he issues. */
export interface NewConcession {
  kind: Concession['kind'];
  code: string;
  field: string | null;
  text: string;
  reason: string;
  validUntil: string | null;
}

interface ConcessionRow extends Omit<Concession, 'projectCode' | 'daysLeft' | 'givenAt'> {
  project_code: string;
  site_time_zone: string;
  given_at: Date;
}

@Injectable()
export class ConcessionsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  async insert(
    concessions: readonly NewConcession[],
    { revisionId, by, at }: { revisionId: string; by: string; at: Date },
    db: Database,
  ): Promise<void> {
    if (concessions.length === 0) return;
    await db('concessions').insert(
      concessions.map(({ validUntil, ...concession }) => ({
        ...concession,
        revision_id: revisionId,
        valid_until: validUntil,
        given_by: by,
        given_at: at,
      })),
    );
  }

  async ofRevision(revisionId: string, now: Date): Promise<Concession[]> {
    const rows = (await this.rows()
      .where('c.revision_id', revisionId)
      .orderBy(['c.kind', 'c.valid_until', 'c.given_at', 'c.id'])) as ConcessionRow[];
    return rows.map((row) => toConcession(row, now));
  }

  /** Concessions of sheets in force that end, or have ended, within so many days; the first to end on top. */
  async ending(
    asked: { projects: 'all' | string[]; projectCode?: string; withinDays?: number },
    now: Date,
  ): Promise<Concession[]> {
    const query = this.rows()
      .where({ 'c.kind': 'concession', 'sheet.standing': 'current' })
      .orderBy(['c.valid_until', 's.number', 'c.id']);
    if (asked.projects !== 'all') void query.whereIn('s.project_id', asked.projects);
    if (asked.projectCode !== undefined) void query.where('p.code', asked.projectCode);
    if (asked.withinDays !== undefined) {
      void query.whereRaw('c.valid_until - (?::timestamptz at time zone p.site_time_zone)::date <= ?', [
        now,
        asked.withinDays,
      ]);
    }
    return ((await query) as ConcessionRow[]).map((row) => toConcession(row, now));
  }

  private rows() {
    return this.knex('concessions as c')
      .join('revisions as r', 'r.id', 'c.revision_id')
      .join('specifications as s', 's.id', 'r.specification_id')
      .join('projects as p', 'p.id', 's.project_id')
      .join('users as giver', 'giver.id', 'c.given_by')
      .leftJoin('sheets as sheet', (on) => void on.on('sheet.revision_id', 'r.id').onVal('sheet.kind', 'issued'))
      .select(
        'c.id',
        'c.kind',
        'p.code as project_code',
        'p.site_time_zone',
        's.number',
        'r.label',
        'sheet.id as sheetId',
        'sheet.standing',
        'c.code',
        'c.field',
        'c.text',
        'c.reason',
        'c.valid_until as validUntil',
        'giver.name as givenBy',
        'c.given_at',
      );
  }
}

function toConcession({ project_code, site_time_zone, given_at, ...row }: ConcessionRow, now: Date): Concession {
  const today = siteDay(now, site_time_zone);
  return {
    ...row,
    projectCode: project_code,
    daysLeft: row.validUntil === null ? null : daysBetween(today, row.validUntil),
    givenAt: given_at.toISOString(),
  };
}

const daysBetween = (from: string, to: string) => Math.round((Date.parse(to) - Date.parse(from)) / 86_400_000);

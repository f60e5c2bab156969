import { Inject, Injectable } from '@nestjs/common';
import { STATES_IN_WORK } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';

/** A revision that somebody has to sign, with what decides whether one may. */
export interface AwaitsSignature {
  specificationId: string;
  projectId: string;
  state: 'in_check' | 'checked';
  checkCategory: number;
  checkedBy: string | null;
  submittedAt: Date;
  checkedAt: Date | null;
  authors: string[];
  /** When the asker entered his own figures for it; null where he has not, or has decided already. */
  begunAt: Date | null;
  hasDecided: boolean;
  openRemarks: number;
}

/** An open remark that concerns the asker. */
export interface OpenRemark {
  specificationId: string;
  projectId: string;
  raisedBy: string;
  raisedAt: Date;
  answeredBy: string | null;
  answeredAt: Date | null;
}

export interface ReturnedDraft {
  specificationId: string;
  projectId: string;
  note: string;
}

/** What lies on somebody's desk, in few columns each. */
@Injectable()
export class WaitingRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  async signatures(personId: string, projects: 'all' | string[]): Promise<AwaitsSignature[]> {
    const query = this.revisions(projects)
      .joinRaw(
        `left join lateral (
          select k.started_at, k.decided_at from submissions as m join check_records as k on k.submission_id = m.id
          where m.revision_id = r.id and m.label = r.label and k.checker_id = ?
        ) as own on true`,
        [personId],
      )
      .whereIn('r.state', ['in_check', 'checked'])
      .select(
        'r.specification_id as specificationId',
        's.project_id as projectId',
        'r.state',
        'r.check_category as checkCategory',
        'r.checked_by as checkedBy',
        'r.submitted_at as submittedAt',
        'r.checked_at as checkedAt',
        'own.started_at as begunAt',
        this.knex.raw('own.decided_at is not null as "hasDecided"'),
        this.knex.raw(
          'array(select distinct c.changed_by from revision_changes as c where c.revision_id = r.id) as authors',
        ),
        this.knex.raw(
          `(select count(*)::integer from review_remarks as m where m.revision_id = r.id and m.closed_at is null)
            as "openRemarks"`,
        ),
      );
    return (await query) as AwaitsSignature[];
  }

  /** Open remarks that the person raised, or that stand on what he has written. */
  async remarks(personId: string, projects: 'all' | string[]): Promise<OpenRemark[]> {
    const query = this.revisions(projects)
      .join('review_remarks as m', 'm.revision_id', 'r.id')
      .joinRaw(
        `left join lateral (
          select a.written_by, a.written_at from review_answers as a where a.remark_id = m.id
          order by a.written_at desc, a.id desc limit 1
        ) as last on true`,
      )
      .whereIn('r.state', [...STATES_IN_WORK])
      .whereNull('m.closed_at')
      .whereRaw(
        `(m.raised_by = ? or exists (
          select from revision_changes as c where c.revision_id = r.id and c.changed_by = ?
        ))`,
        [personId, personId],
      )
      .select(
        'r.specification_id as specificationId',
        's.project_id as projectId',
        'm.raised_by as raisedBy',
        'm.raised_at as raisedAt',
        'last.written_by as answeredBy',
        'last.written_at as answeredAt',
      );
    return (await query) as OpenRemark[];
  }

  /** Drafts that came back, of those whom the person has written in; the last to come back on top. */
  async returned(personId: string, projects: 'all' | string[]): Promise<ReturnedDraft[]> {
    const query = this.revisions(projects)
      .where('r.state', 'draft')
      .whereNotNull('r.returned_at')
      .whereRaw('exists (select from revision_changes as c where c.revision_id = r.id and c.changed_by = ?)', [
        personId,
      ])
      .orderBy('r.returned_at', 'desc')
      .select('r.specification_id as specificationId', 's.project_id as projectId', 'r.return_note as note');
    return (await query) as ReturnedDraft[];
  }

  private revisions(projects: 'all' | string[]) {
    const query = this.knex('revisions as r').join('specifications as s', 's.id', 'r.specification_id');
    return projects === 'all' ? query : query.whereIn('s.project_id', projects);
  }
}

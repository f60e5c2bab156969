import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { RevisionState, SpecificationRow } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';
import { likePattern, listPage, type Page, type SortColumn } from '../platform/list';
import { worstCautionOf } from './list-columns';
import { newerBasisRevision, newestBasisRevision } from './revision-row';

const SORTS: Record<string, SortColumn> = {
  number: { column: 's.number', type: 'text' },
  title: { column: 'r.title', type: 'text' },
  savedAt: { column: 'r.saved_at', type: 'timestamptz' },
  units: { column: 'r.units', type: 'integer' },
  altitudeM: { column: 'r.altitude_m', type: 'double precision' },
  highestVoltageKv: { column: 'r.highest_voltage_kv', type: 'double precision' },
  worstMarginPercent: { column: 'r.worst_margin_percent', type: 'double precision' },
};

/** States that people without a role on drafts may know of. */
const SHOWN_TO_ALL: readonly RevisionState[] = ['issued', 'superseded', 'withdrawn'];

/** Most rows of a part of the desk; the rest is found in the lists of the projects. */
const DESK_LIMIT = 50;

interface ListRow {
  id: string;
  project_code: string;
  number: string;
  title: string;
  kind: string;
  label: string;
  state: RevisionState;
  units: number | null;
  insulator_code: string | null;
  governed_by: string | null;
  highest_voltage_kv: number | null;
  altitude_m: number | null;
  severity: string | null;
  worst_margin_percent: number | null;
  cautions_count: number;
  acceptances_count: number;
  fails_count: number;
  stops_count: number;
  basis_revision: number | null;
  newest_basis_revision: number | null;
  drafted_by_name: string | null;
  saved_by_name: string | null;
  saved_at: Date;
}

/** Lists of specifications, each in its newest revision that the asker may know of; plain columns only. */
@Injectable()
export class SpecificationsListQuery {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  ofProject(
    projectId: string,
    asked: { limit?: string; cursor?: string; sort?: string; search?: string; state?: string },
    { drafts }: { drafts: boolean },
  ): Promise<Page<SpecificationRow>> {
    const query = this.rows(drafts).where('s.project_id', projectId);
    if (asked.state) void query.where('r.state', asked.state);
    if (asked.search) {
      const pattern = likePattern(asked.search);
      void query.where((either) => void either.whereILike('s.number', pattern).orWhereILike('r.title', pattern));
    }
    return listPage<ListRow, SpecificationRow>({
      query,
      knex: this.knex,
      asked,
      sorts: SORTS,
      defaultSort: 'number',
      idColumn: 's.id',
      toItem,
    });
  }

  /** Drafts that a person began or saved last, newest save first. */
  async draftsOf(personId: string, projects: 'all' | string[]): Promise<SpecificationRow[]> {
    const query = this.drafts(projects).where(
      (either) => void either.where('r.drafted_by', personId).orWhere('r.saved_by', personId),
    );
    return ((await query) as ListRow[]).map(toItem);
  }

  /** Drafts that are pinned to a revision of the basis that is no longer the newest. */
  async outdatedDrafts(projects: 'all' | string[]): Promise<SpecificationRow[]> {
    const query = this.drafts(projects).whereRaw(
      'exists (select 1 from design_bases as n where n.project_id = s.project_id and n.revision > b.revision)',
    );
    return ((await query) as ListRow[]).map(toItem);
  }

  private drafts(projects: 'all' | string[]): Knex.QueryBuilder {
    const query = this.rows(true).where('r.state', 'draft').orderBy('r.saved_at', 'desc').limit(DESK_LIMIT);
    return projects === 'all' ? query : query.whereIn('s.project_id', projects);
  }

  private rows(drafts: boolean): Knex.QueryBuilder {
    return this.knex('specifications as s')
      .join('projects as p', 'p.id', 's.project_id')
      .joinRaw(
        `join lateral (
          select * from revisions as newest
          where newest.specification_id = s.id ${drafts ? '' : 'and newest.state = any(?)'}
          order by newest.created_at desc limit 1
        ) as r on true`,
        drafts ? [] : [[...SHOWN_TO_ALL]],
      )
      .leftJoin('design_bases as b', 'b.id', 'r.basis_revision_id')
      .leftJoin('users as saver', 'saver.id', 'r.saved_by')
      .leftJoin('users as drafter', 'drafter.id', 'r.drafted_by')
      .select(
        's.id',
        'p.code as project_code',
        's.number',
        'r.title',
        's.kind',
        'r.label',
        'r.state',
        'r.units',
        'r.insulator_code',
        'r.governed_by',
        'r.highest_voltage_kv',
        'r.altitude_m',
        'r.severity',
        'r.worst_margin_percent',
        'r.cautions_count',
        'r.acceptances_count',
        'r.fails_count',
        'r.stops_count',
        'b.revision as basis_revision',
        'drafter.name as drafted_by_name',
        'saver.name as saved_by_name',
        'r.saved_at',
        newestBasisRevision(this.knex),
      );
  }
}

function toItem(row: ListRow): SpecificationRow {
  return {
    id: row.id,
    projectCode: row.project_code,
    number: row.number,
    title: row.title,
    kind: row.kind,
    label: row.label,
    state: row.state,
    units: row.units,
    insulatorCode: row.insulator_code,
    governedBy: row.governed_by,
    highestVoltageKv: row.highest_voltage_kv,
    altitudeM: row.altitude_m,
    pollutionSeverity: row.severity,
    worstMarginPercent: row.worst_margin_percent,
    worstCaution: worstCautionOf({
      cautionsCount: row.cautions_count,
      acceptancesCount: row.acceptances_count,
      failsCount: row.fails_count,
      stopsCount: row.stops_count,
    }),
    newerBasisRevision: newerBasisRevision(row.basis_revision, row.newest_basis_revision),
    draftedBy: row.drafted_by_name,
    savedBy: row.saved_by_name,
    savedAt: row.saved_at.toISOString(),
  };
}

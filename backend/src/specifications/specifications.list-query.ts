import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { STATES_SHOWN, type RevisionState, type SpecificationRow } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';
import { likePattern, listPage, type Page, type SortColumn } from '../platform/list';
import { worstCautionOf } from './list-columns';
import { holdsAnywhere, type SignedIn } from '../platform/person';
import { newerBasisRevision, newestBasisRevision } from './revision-row';
import { figuresHidden, isChecker } from './rights';

const SORTS: Record<string, SortColumn> = {
  number: { column: 's.number', type: 'text' },
  title: { column: 'r.title', type: 'text' },
  savedAt: { column: 'r.saved_at', type: 'timestamptz' },
  units: { column: 'shown.units', type: 'integer' },
  altitudeM: { column: 'r.altitude_m', type: 'double precision' },
  highestVoltageKv: { column: 'r.highest_voltage_kv', type: 'double precision' },
  worstMarginPercent: { column: 'shown.worst_margin_percent', type: 'double precision' },
};

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
  due_on: string | null;
  returned_at: Date | null;
  project_id: string;
  authors: string[];
  own_figures_by: string[];
}

/** Lists of specifications, each in its newest revision that the asker may know of; plain columns only. */
@Injectable()
export class SpecificationsListQuery {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  ofProject(
    projectId: string,
    asked: { limit?: string; cursor?: string; sort?: string; search?: string; state?: string },
    person: SignedIn,
    { drafts }: { drafts: boolean },
  ): Promise<Page<SpecificationRow>> {
    const query = this.rows(drafts, isChecker(person, projectId, null) ? person.id : null).where(
      's.project_id',
      projectId,
    );
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
      toItem: (row) => toItem(row, person),
    });
  }

  /** Drafts that a person began or saved last, newest save first. */
  async draftsOf(person: SignedIn, projects: 'all' | string[]): Promise<SpecificationRow[]> {
    const query = this.drafts(projects).where(
      (either) => void either.where('r.drafted_by', person.id).orWhere('r.saved_by', person.id),
    );
    return ((await query) as ListRow[]).map((row) => toItem(row, person));
  }

  /** Drafts that are pinned to a revision of the basis older than the one in force. */
  async outdatedDrafts(person: SignedIn, projects: 'all' | string[]): Promise<SpecificationRow[]> {
    const query = this.drafts(projects).whereRaw('basis_in_force(s.project_id) > b.revision');
    return ((await query) as ListRow[]).map((row) => toItem(row, person));
  }

  async ofIds(person: SignedIn, ids: readonly string[]): Promise<Map<string, SpecificationRow>> {
    if (ids.length === 0) return new Map();
    const rows = (await this.rows(true).whereIn('s.id', [...ids])) as ListRow[];
    return new Map(rows.map((row) => [row.id, toItem(row, person)]));
  }

  private drafts(projects: 'all' | string[]): Knex.QueryBuilder {
    const query = this.rows(true).where('r.state', 'draft').orderBy('r.saved_at', 'desc').limit(DESK_LIMIT);
    return projects === 'all' ? query : query.whereIn('s.project_id', projects);
  }

  /** Those of the revisions whose figures a person may not see yet. */
  async hiddenAmong(person: SignedIn, revisionIds: readonly string[]): Promise<Set<string>> {
    if (!holdsAnywhere(person, ['checker']) || revisionIds.length === 0) return new Set();
    const rows = (await this.knex('revisions as r')
      .join('specifications as s', 's.id', 'r.specification_id')
      .whereIn('r.id', [...revisionIds])
      .select('r.id', 's.project_id', 'r.state', ...signersColumns(this.knex))) as Pick<
      ListRow,
      'id' | 'project_id' | 'state' | 'authors' | 'own_figures_by'
    >[];
    return new Set(rows.filter((row) => isHidden(row, person)).map(({ id }) => id));
  }

  /** The order by a figure says what it is: where a checker may not see it yet, it is empty to the order too. */
  private rows(drafts: boolean, checkerId: string | null = null): Knex.QueryBuilder {
    return this.knex('specifications as s')
      .join('projects as p', 'p.id', 's.project_id')
      .joinRaw(
        `join lateral (
          select * from revisions as newest
          where newest.specification_id = s.id ${drafts ? '' : 'and newest.state = any(?)'}
          order by newest.created_at desc limit 1
        ) as r on true`,
        drafts ? [] : [[...STATES_SHOWN]],
      )
      .joinRaw(
        `cross join lateral (
          select case when ${HIDDEN} then null else r.units end as units,
            case when ${HIDDEN} then null else r.worst_margin_percent end as worst_margin_percent
        ) as shown`,
        { checker: checkerId },
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
        'r.due_on',
        'r.returned_at',
        's.project_id',
        ...signersColumns(this.knex),
        newestBasisRevision(this.knex),
      );
  }
}

/** As `figuresHidden` says it, for the order of a list. */
const HIDDEN = `(
  :checker::uuid is not null and r.state in ('draft', 'in_check')
  and not exists (select from revision_changes as c where c.revision_id = r.id and c.changed_by = :checker::uuid)
  and not (r.state = 'in_check' and exists (
    select from check_records as k join submissions as m on m.id = k.submission_id
    where m.revision_id = r.id and m.label = r.label and k.checker_id = :checker::uuid
  ))
)`;

function isHidden(
  row: Pick<ListRow, 'project_id' | 'state' | 'authors' | 'own_figures_by'>,
  person: Pick<SignedIn, 'id' | 'grants'>,
): boolean {
  const { state, project_id: projectId, authors, own_figures_by: ownFiguresBy } = row;
  return figuresHidden(person, { state, projectId, authors: authors.map((id) => ({ id })), ownFiguresBy });
}

/** Who wrote in a revision, and who has entered his own figures for what is submitted: they see what others do not yet. */
function signersColumns(knex: Knex): Knex.Raw[] {
  return [
    knex.raw(
      `case when r.state in ('draft', 'in_check')
        then array(select distinct c.changed_by from revision_changes as c where c.revision_id = r.id) else '{}' end as authors`,
    ),
    knex.raw(
      `case when r.state = 'in_check'
        then array(select k.checker_id from check_records as k join submissions as m on m.id = k.submission_id
          where m.revision_id = r.id and m.label = r.label) else '{}' end as own_figures_by`,
    ),
  ];
}

function toItem(row: ListRow, person: SignedIn): SpecificationRow {
  const hidden = isHidden(row, person);
  const shown = <T>(value: T): T | null => (hidden ? null : value);
  return {
    id: row.id,
    projectCode: row.project_code,
    number: row.number,
    title: row.title,
    kind: row.kind,
    label: row.label,
    state: row.state,
    units: shown(row.units),
    insulatorCode: row.insulator_code,
    governedBy: shown(row.governed_by),
    highestVoltageKv: row.highest_voltage_kv,
    altitudeM: row.altitude_m,
    pollutionSeverity: row.severity,
    worstMarginPercent: shown(row.worst_margin_percent),
    worstCaution: hidden
      ? null
      : worstCautionOf({
          cautionsCount: row.cautions_count,
          acceptancesCount: row.acceptances_count,
          failsCount: row.fails_count,
          stopsCount: row.stops_count,
        }),
    newerBasisRevision: newerBasisRevision(row.basis_revision, row.newest_basis_revision),
    draftedBy: row.drafted_by_name,
    savedBy: row.saved_by_name,
    savedAt: row.saved_at.toISOString(),
    figuresHidden: hidden,
    dueOn: row.due_on,
    returnedAt: row.state === 'draft' ? (row.returned_at?.toISOString() ?? null) : null,
  };
}

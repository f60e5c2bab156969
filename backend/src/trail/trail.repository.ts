import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { PEOPLE_RECORDS } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';
import { likePattern } from '../platform/list';
import { pathsOf } from './field-match';

export interface TrailRow {
  id: number;
  at: Date;
  actor_id: string | null;
  actor_name: string | null;
  action: string;
  entity: string;
  entity_id: string;
  project_code: string | null;
  revision_id: string | null;
  specification_number: string | null;
  revision_label: string | null;
  person_name: string | null;
  changes: Record<string, { from?: unknown; to?: unknown }>;
  reason: string | null;
  seal: number | null;
}

/** Whose records may be seen: everything, or what belongs to projects. */
export type Sight = 'everything' | { projects: 'all' | string[] };

export interface TrailFilters {
  entity?: string | undefined;
  entityId?: string | undefined;
  /** Any of these records, whatever their kind. */
  recordIds?: string[] | undefined;
  projectCode?: string | undefined;
  person?: string | undefined;
  action?: string | undefined;
  path?: string | undefined;
  atOrAfter?: Date | undefined;
  before?: Date | undefined;
}

/** From where on, and which way. */
export interface TrailPlace {
  pastId: number | null;
  descending: boolean;
}

/** Records that belong to a revision, with the column that says so. */
const BELONGS_TO_REVISION = ['sheets', 'submissions', 'revision_notes', 'review_remarks', 'concessions'] as const;

const UUID = '^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$';

@Injectable()
export class TrailRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  /** Rows in the order in which they were written, past a place. */
  async rows(sight: Sight, filters: TrailFilters, place: TrailPlace, limit: number): Promise<TrailRow[]> {
    const direction = place.descending ? 'desc' : 'asc';
    const chosen = this.knex('audit_events as e').select('e.*').orderBy('e.id', direction).limit(limit);
    if (place.pastId !== null) void chosen.where('e.id', place.descending ? '<' : '>', place.pastId);
    if (sight !== 'everything') applySight(chosen, sight);
    applyFilters(chosen, filters, this.knex);
    return (await this.knex
      .select(
        'e.id',
        'e.at',
        'e.actor_id',
        'actor.name as actor_name',
        'e.action',
        'e.entity',
        'e.entity_id',
        'p.code as project_code',
        'r.id as revision_id',
        'sp.number as specification_number',
        'r.label as revision_label',
        'subject.name as person_name',
        'e.changes',
        'e.reason',
        's.number as seal',
      )
      .from(chosen.as('e'))
      .joinRaw(
        `left join lateral (select case when e.entity_id ~ '${UUID}' then e.entity_id::uuid end as id) as record on true`,
      )
      .leftJoin('users as actor', 'actor.id', 'e.actor_id')
      .leftJoin('projects as p', 'p.id', 'e.project_id')
      .joinRaw(`left join lateral (${REVISION_OF_RECORD}) as owner on e.project_id is not null`)
      .leftJoin('revisions as r', 'r.id', 'owner.id')
      .leftJoin('specifications as sp', 'sp.id', 'r.specification_id')
      .joinRaw(`left join users as subject on e.entity = 'user' and subject.id = record.id`)
      .leftJoin('audit_seals as s', 's.event_id', 'e.id')
      .orderBy('e.id', direction)) as TrailRow[];
  }

  /** A specification's revisions and all that belongs to them; null where there is no such specification. */
  async recordsOfSpecification(projectId: string, number: string): Promise<string[] | null> {
    const { rows } = await this.knex.raw<{ rows: { id: string; revision_ids: string[] }[] }>(
      `select s.id, array(select r.id from revisions as r where r.specification_id = s.id) as revision_ids
       from specifications as s where s.project_id = ? and s.number = ?`,
      [projectId, number],
    );
    const specification = rows[0];
    if (!specification) return null;
    const belongings = BELONGS_TO_REVISION.map(
      (table) => `select id from ${table} where revision_id = any(:revisions)`,
    );
    const found = await this.knex.raw<{ rows: { id: string }[] }>(belongings.join(' union all '), {
      revisions: specification.revision_ids,
    });
    return [specification.id, ...specification.revision_ids, ...found.rows.map(({ id }) => id)];
  }
}

const REVISION_OF_RECORD = [
  'select id from revisions where id = record.id',
  ...BELONGS_TO_REVISION.map((table) => `select revision_id as id from ${table} where id = record.id`),
].join(' union all ');

function applySight(query: Knex.QueryBuilder, { projects }: { projects: 'all' | string[] }): void {
  if (projects === 'all') void query.whereNotNull('e.project_id');
  else void query.whereIn('e.project_id', projects);
  void query.whereNotIn('e.entity', [...PEOPLE_RECORDS]);
}

function applyFilters(query: Knex.QueryBuilder, filters: TrailFilters, knex: Knex): void {
  const { entity, entityId, recordIds, projectCode, person, action, path, atOrAfter, before } = filters;
  if (entity) void query.where('e.entity', entity);
  if (entityId) void query.where('e.entity_id', entityId);
  if (recordIds) void query.whereRaw('e.entity_id = any(?::text[])', [recordIds]);
  if (projectCode) void query.where('e.project_id', knex('projects').where({ code: projectCode }).select('id'));
  if (person) {
    const pattern = likePattern(person);
    const people = knex('users').whereILike('name', pattern).orWhereILike('email', pattern).select('id');
    void query.whereIn('e.actor_id', people);
  }
  if (action) void query.where('e.action', action);
  if (path) {
    const fields = pathsOf(path);
    void query.whereRaw(
      `exists (
        select from jsonb_object_keys(e.changes) as k, unnest(?::text[]) as f where k = f or starts_with(k, f || '.')
      )`,
      [fields],
    );
  }
  if (atOrAfter) void query.where('e.at', '>=', atOrAfter);
  if (before) void query.where('e.at', '<', before);
}

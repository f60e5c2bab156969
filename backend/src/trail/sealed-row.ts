import type { Knex } from 'knex';
import { canonicalJson, sha256Of } from '../platform/canonical-json';

/** A row of the trail as it is sealed: whole, its instant to the microsecond. */
export interface SealedRow {
  event_id: number;
  /** RFC 3339 in UTC, to the microsecond. */
  sealed_text_at: string;
  actor_id: string | null;
  action: string;
  entity: string;
  entity_id: string;
  project_id: string | null;
  changes: unknown;
  reason: string | null;
}

/** What stands before the first seal. */
export const NO_SEAL_BEFORE = '0'.repeat(64);

/** The columns of a sealed row, read from `audit_events as e`. */
export function sealedColumns(db: Knex): (string | Knex.Raw)[] {
  return [
    'e.id as event_id',
    db.raw(`to_char(e.at at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.US"Z"') as sealed_text_at`),
    'e.actor_id',
    'e.action',
    'e.entity',
    'e.entity_id',
    'e.project_id',
    'e.changes',
    'e.reason',
  ];
}

/** SHA-256 over the hash before, a line feed, and the canonical JSON of the row. */
export function sealHash(hashBefore: string, row: SealedRow): string {
  const content = {
    id: row.event_id,
    at: row.sealed_text_at,
    actorId: row.actor_id,
    action: row.action,
    entity: row.entity,
    entityId: row.entity_id,
    projectId: row.project_id,
    changes: row.changes,
    reason: row.reason,
  };
  return sha256Of(`${hashBefore}\n${canonicalJson(content)}`);
}

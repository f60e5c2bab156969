import { Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { Clock } from '../platform/clock';

export interface AuditEvent {
  /** Null where the product itself acted. */
  actorId: string | null;
  /** What was done, such as "project.created". */
  action: string;
  entity: string;
  entityId: string;
  projectId?: string | null;
  /** By path: the value before and the value after. */
  changes?: Changes;
  reason?: string | null;
}

export type Changes = Record<string, { from?: unknown; to?: unknown }>;

/** Writes the trail, always in the transaction of its cause. */
@Injectable()
export class AuditService {
  constructor(private readonly clock: Clock) {}

  async record(db: Knex.Transaction, event: AuditEvent): Promise<void> {
    await db('audit_events').insert({
      at: this.clock.now(),
      actor_id: event.actorId,
      action: event.action,
      entity: event.entity,
      entity_id: event.entityId,
      project_id: event.projectId ?? null,
      changes: JSON.stringify(event.changes ?? {}),
      reason: event.reason ?? null,
    });
  }
}

/** What differs between two values of the same shape, down to the fields that differ. */
export function changesBetween(before: object, after: object): Changes {
  const changes: Changes = {};
  collect(before, after, '', changes);
  return changes;
}

function collect(before: unknown, after: unknown, path: string, changes: Changes): void {
  if (isRecord(before) && isRecord(after)) {
    for (const key of new Set([...Object.keys(before), ...Object.keys(after)])) {
      collect(before[key], after[key], path ? `${path}.${key}` : key, changes);
    }
  } else if (JSON.stringify(before ?? null) !== JSON.stringify(after ?? null)) {
    changes[path] = { from: before ?? null, to: after ?? null };
  }
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value) && !(value instanceof Date);
}

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
  changes?: Record<string, { from?: unknown; to?: unknown }>;
  reason?: string | null;
}

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

import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { KNEX, type Database } from '../platform/knex';
import { NO_SEAL_BEFORE, sealHash, sealedColumns, type SealedRow } from './sealed-row';

export interface Seal {
  number: number;
  event_id: number;
  hash: string;
  sealed_at: Date;
}

/** Held while a batch is sealed, so that of many processes one lengthens the chain. */
const SEALING_LOCK = 7_132_001;

@Injectable()
export class SealsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  async last(db: Knex = this.knex): Promise<Seal | null> {
    const seal = await db('audit_seals').orderBy('number', 'desc').first<Seal | undefined>();
    return seal ?? null;
  }

  async newestSealedEvent(): Promise<number> {
    const row = await this.knex('audit_seals').max<{ max: number | null }>('event_id').first();
    return row?.max ?? 0;
  }

  /** Seals the next rows past an id, in their order; null where another process is at it. */
  async sealNext(pastId: number, atMost: number, at: Date): Promise<{ count: number; lastId: number } | null> {
    return this.knex.transaction(async (db) => {
      const { rows } = await db.raw<{ rows: { got: boolean }[] }>('select pg_try_advisory_xact_lock(?) as got', [
        SEALING_LOCK,
      ]);
      if (!rows[0]?.got) return null;
      const events = await this.unsealed(db, pastId, atMost);
      if (events.length === 0) return { count: 0, lastId: pastId };
      const last = await this.last(db);
      let number = last?.number ?? 0;
      let hash = last?.hash ?? NO_SEAL_BEFORE;
      const seals = events.map((event) => {
        number += 1;
        hash = sealHash(hash, event);
        return { number, eventId: event.event_id, hash };
      });
      await db.raw(
        `insert into audit_seals (number, event_id, hash, sealed_at)
         select n, e, h, ? from unnest(?::bigint[], ?::bigint[], ?::text[]) as new (n, e, h)`,
        [at, seals.map((seal) => seal.number), seals.map((seal) => seal.eventId), seals.map((seal) => seal.hash)],
      );
      return { count: seals.length, lastId: events.at(-1)!.event_id };
    });
  }

  private async unsealed(db: Knex, pastId: number, atMost: number): Promise<SealedRow[]> {
    return (await db('audit_events as e')
      .where('e.id', '>', pastId)
      .whereNotExists((seal) =>
        seal
          .select(db.raw('1'))
          .from('audit_seals as s')
          .whereRaw('s.event_id = e.id')
          .where('s.event_id', '>', pastId),
      )
      .orderBy('e.id')
      .limit(atMost)
      .select(sealedColumns(db))) as SealedRow[];
  }
}

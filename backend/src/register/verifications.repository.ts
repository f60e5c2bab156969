import { Inject, Injectable } from '@nestjs/common';
import { KNEX, type Database } from '../platform/knex';

/** Look-ups of prints, counted by address in PostgreSQL, so that all processes count together. */
@Injectable()
export class VerificationsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  /**
   * Counts one look-up more, unless as many as are allowed were made since; then it answers the oldest of these. Look-ups
   * of one address at once wait for each other.
   */
  async count(address: string, { at, since, atMost }: { at: Date; since: Date; atMost: number }): Promise<Date | null> {
    return this.knex.transaction(async (db) => {
      await db.raw('select pg_advisory_xact_lock(hashtextextended(?, 0))', [`verification ${address}`]);
      const rows = (await db('verification_look_ups as l')
        .where('l.address', address)
        .where('l.at', '>', since)
        .orderBy('l.at', 'desc')
        .limit(atMost)
        .select('l.at')) as { at: Date }[];
      const oldest = rows[atMost - 1];
      if (oldest) return oldest.at;
      await db('verification_look_ups').insert({ address, at });
      return null;
    });
  }

  async forget(before: Date): Promise<void> {
    await this.knex('verification_look_ups').where('at', '<', before).delete();
  }
}

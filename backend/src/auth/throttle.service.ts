import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { Clock } from '../platform/clock';
import { tooManyRequests } from '../platform/domain-error';
import { KNEX } from '../platform/knex';
import { networkOf } from './client';

export { networkOf };

export const THROTTLE = { windowS: 15 * 60, perAccountAndAddress: 10, perAddress: 50 } as const;

/** What is counted for itself: asking for a new password, or signing a sheet, uses up no tries at signing in. */
export type ThrottledAct = 'sign-in' | 'password-reset' | 'signature';

export interface Attempt {
  id: number;
  account: string;
  address: string;
}

/**
 * Slows down guessing: failures are counted by account and address, and by address, in PostgreSQL, so that all
 * processes count together. Nobody can lock out an account from elsewhere, and every wait ends by itself.
 */
@Injectable()
export class ThrottleService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
  ) {}

  /** Counts an attempt as failed before it is decided, so that many at once do not slip through. A refused one does not count. */
  async begin(email: string, clientAddress: string, act: ThrottledAct = 'sign-in'): Promise<Attempt> {
    const account = email.trim().toLowerCase();
    const address = act === 'sign-in' ? networkOf(clientAddress) : `${act} ${networkOf(clientAddress)}`;
    return this.knex.transaction(async (db) => {
      await db.raw('select pg_advisory_xact_lock(hashtextextended(?, 0))', [`sign-in ${address}`]);
      const since = new Date(this.clock.now().getTime() - THROTTLE.windowS * 1000);
      const failures = (await db('sign_in_attempts as a')
        .where('a.address', address)
        .where('a.at', '>', since)
        .where('a.succeeded', false)
        .orderBy('a.at', 'desc')
        .limit(THROTTLE.perAddress)
        .select('a.account', 'a.at')) as { account: string; at: Date }[];
      this.refuseBeyond(failures, THROTTLE.perAddress);
      this.refuseBeyond(await this.ofAccount(db, account, address, since), THROTTLE.perAccountAndAddress);
      const [row] = (await db('sign_in_attempts').insert({ account, address, succeeded: false, at: this.clock.now() }, [
        'id',
      ])) as { id: number }[];
      return { id: row!.id, account, address };
    });
  }

  /** A success forgives the failures of this account at this address. */
  async succeed({ account, address }: Attempt, db: Knex.Transaction): Promise<void> {
    await db('sign_in_attempts').where({ account, address, succeeded: false }).delete();
    await db('sign_in_attempts').insert({ account, address, succeeded: true, at: this.clock.now() });
  }

  async forget(before: Date): Promise<void> {
    await this.knex('sign_in_attempts').where('at', '<', before).delete();
  }

  private async ofAccount(db: Knex, account: string, address: string, since: Date): Promise<{ at: Date }[]> {
    return (await db('sign_in_attempts as a')
      .where({ 'a.account': account, 'a.address': address, 'a.succeeded': false })
      .where('a.at', '>', since)
      .orderBy('a.at', 'desc')
      .limit(THROTTLE.perAccountAndAddress)
      .select('a.at')) as { at: Date }[];
  }

  private refuseBeyond(failures: { at: Date }[], atMost: number): void {
    const oldest = failures[atMost - 1];
    if (!oldest) return;
    throw tooManyRequests(THROTTLE.windowS - (this.clock.now().getTime() - oldest.at.getTime()) / 1000);
  }
}

import { createHash, createHmac, randomUUID } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { Clock } from '../platform/clock';
import { CONFIG, type Config } from '../platform/config';
import { KNEX } from '../platform/knex';

const HOUR_MS = 3600 * 1000;

/** What a link is for, how long it holds, and the page that it opens. */
export const LINK_PURPOSES = {
  invitation: { validMs: 7 * 24 * HOUR_MS, page: '/invitation' },
  reset: { validMs: HOUR_MS, page: '/reset' },
} as const;
export type LinkPurpose = keyof typeof LINK_PURPOSES;

export interface AccountLink {
  link: string;
  expiresAt: string;
}

/**
 * One-time links with which a person chooses a password. A token is derived from its id and the product's secret, and
 * only its hash is stored: a letter that waits in the queue names the id, so that no usable token stands in the database.
 */
@Injectable()
export class AccountLinksService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** A new link. Of invitations the newest is the only one that holds. */
  async issue(
    { userId, purpose, id = randomUUID() }: { userId: string; purpose: LinkPurpose; id?: string },
    db: Knex,
  ): Promise<AccountLink & { id: string }> {
    if (purpose === 'invitation') await this.withdraw(userId, db);
    const at = this.clock.now();
    const expiresAt = new Date(at.getTime() + LINK_PURPOSES[purpose].validMs);
    const token = this.tokenOf(id);
    await db('account_tokens').insert({
      id,
      user_id: userId,
      purpose,
      token_hash: hashOf(token),
      created_at: at,
      expires_at: expiresAt,
    });
    return { id, ...this.answer(purpose, token, expiresAt) };
  }

  /** A link that still holds, for a letter that is written now; null once it was used, withdrawn or is too old. */
  async find(id: string): Promise<AccountLink | null> {
    const row = (await this.open(this.knex).where({ id }).first('purpose', 'token_hash', 'expires_at')) as
      { purpose: LinkPurpose; token_hash: string; expires_at: Date } | undefined;
    const token = this.tokenOf(id);
    // Another hash than was stored means that the secret has changed since: the link would open nothing.
    return row?.token_hash === hashOf(token) ? this.answer(row.purpose, token, row.expires_at) : null;
  }

  async exists(id: string, db: Knex): Promise<boolean> {
    return (await db('account_tokens').where({ id }).first('id')) !== undefined;
  }

  /** How many links of a purpose a person was given since a moment, used or not. */
  async countSince(userId: string, purpose: LinkPurpose, since: Date, db: Knex): Promise<number> {
    const row = (await db('account_tokens')
      .where({ user_id: userId, purpose })
      .where('created_at', '>', since)
      .count({ links: '*' })
      .first()) as { links: number } | undefined;
    return Number(row?.links ?? 0);
  }

  /** Uses up a token; answers whose it was, or null where it is unknown, used or too old. */
  async redeem(token: string, purpose: LinkPurpose, db: Knex): Promise<string | null> {
    const [row] = (await this.open(db)
      .where({ token_hash: hashOf(token), purpose })
      .update({ used_at: this.clock.now() }, ['user_id'])) as { user_id: string }[];
    return row?.user_id ?? null;
  }

  /** Links of a person that were not used yet hold no more. */
  async withdraw(userId: string, db: Knex): Promise<void> {
    await db('account_tokens').where({ user_id: userId }).whereNull('used_at').delete();
  }

  async forget(before: Date): Promise<void> {
    await this.knex('account_tokens').where('expires_at', '<', before).delete();
  }

  private open(db: Knex): Knex.QueryBuilder {
    return db('account_tokens').whereNull('used_at').where('expires_at', '>', this.clock.now());
  }

  private tokenOf(id: string): string {
    return createHmac('sha256', this.config.sessionSecret).update(`account link ${id}`).digest('base64url');
  }

  private answer(purpose: LinkPurpose, token: string, expiresAt: Date): AccountLink {
    // After the hash sign: browsers send that part to no server, so it stands in no log.
    const link = new URL(`${LINK_PURPOSES[purpose].page}#${token}`, this.config.publicUrl).href;
    return { link, expiresAt: expiresAt.toISOString() };
  }
}

const hashOf = (token: string) => createHash('sha256').update(token).digest('hex');

import { createHash, randomBytes } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { Clock } from '../platform/clock';
import { CONFIG, type Config } from '../platform/config';
import { KNEX } from '../platform/knex';

const DAY_MS = 24 * 3600 * 1000;
export const INVITATION_MS = 7 * DAY_MS;

export interface Invitation {
  link: string;
  expiresAt: string;
}

/** One-time links with which a person chooses a password. Only their hash is stored. */
@Injectable()
export class InvitationsService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** The newest link of a person is the only one that holds. */
  async invite(userId: string, db: Knex): Promise<Invitation> {
    await this.withdraw(userId, db);
    const token = randomBytes(32).toString('base64url');
    const at = this.clock.now();
    const expiresAt = new Date(at.getTime() + INVITATION_MS);
    await db('account_tokens').insert({
      user_id: userId,
      purpose: 'invitation',
      token_hash: hashOf(token),
      created_at: at,
      expires_at: expiresAt,
    });
    // After the hash sign: browsers send that part to no server, so it stands in no log.
    return { link: new URL(`/invitation#${token}`, this.config.publicUrl).href, expiresAt: expiresAt.toISOString() };
  }

  async withdraw(userId: string, db: Knex): Promise<void> {
    await db('account_tokens').where({ user_id: userId }).whereNull('used_at').delete();
  }

  /** Uses up a token; answers whose it was, or null where it is unknown, used or too old. */
  async redeem(token: string, db: Knex): Promise<string | null> {
    const at = this.clock.now();
    const [row] = (await db('account_tokens')
      .where({ token_hash: hashOf(token), purpose: 'invitation' })
      .whereNull('used_at')
      .where('expires_at', '>', at)
      .update({ used_at: at }, ['user_id'])) as { user_id: string }[];
    return row?.user_id ?? null;
  }

  async forget(before: Date): Promise<void> {
    await this.knex('account_tokens').where('expires_at', '<', before).delete();
  }
}

const hashOf = (token: string) => createHash('sha256').update(token).digest('hex');

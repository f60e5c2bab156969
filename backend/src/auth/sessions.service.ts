import { Inject, Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import type { Knex } from 'knex';
import { Clock } from '../platform/clock';
import { CONFIG, type Config } from '../platform/config';
import { isUuid } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { SessionCache } from './session-cache';
import { SessionsRepository, type SessionRow, type StoredSession } from './sessions.repository';

const MINUTE_MS = 60_000;
export const SESSION = { idleMs: 60 * MINUTE_MS, absoluteMs: 12 * 60 * MINUTE_MS, touchMs: MINUTE_MS } as const;

const TOKENS_AT_MOST = 5000;

export interface Client {
  address: string | null;
  userAgent: string | null;
}

@Injectable()
export class SessionsService {
  private readonly cache = new SessionCache();
  /** Tokens whose signature was found good: it stays good until they expire. */
  private readonly tokens = new Map<string, { id: string; expiresAtS: number }>();

  constructor(
    private readonly sessions: SessionsRepository,
    private readonly jwt: JwtService,
    private readonly clock: Clock,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async begin(userId: string, client: Client, db: Knex): Promise<{ id: string; token: string; expiresAt: Date }> {
    const at = this.clock.now();
    const expiresAt = new Date(at.getTime() + SESSION.absoluteMs);
    const id = await this.sessions.insert({ userId, at, expiresAt, ...client }, db);
    const token = this.jwt.sign({ sid: id, iat: seconds(at), exp: seconds(expiresAt) });
    return { id, token, expiresAt };
  }

  /** Who the cookie belongs to, or null. Activity of a person keeps the session alive; that of a timer does not. */
  async read(token: string, { passive }: { passive: boolean }): Promise<SignedIn | null> {
    const now = this.clock.now();
    const id = this.idOf(token, now);
    if (id === null) return null;
    const session = await this.cache.get(id, () => this.sessions.read(id));
    if (!session || !this.holds(session, now)) return null;
    if (!passive && now.getTime() - session.lastActiveAt.getTime() >= SESSION.touchMs) {
      session.lastActiveAt = now;
      await this.sessions.touch(id, now);
    }
    return this.toPerson(session);
  }

  async open(userId: string): Promise<SessionRow[]> {
    const now = this.clock.now();
    return this.sessions.open(userId, { now, activeSince: new Date(now.getTime() - SESSION.idleMs) });
  }

  /** Ends one session of a person; false where there is none such. Forget the person once the transaction is through. */
  async end(userId: string, id: string, db: Knex): Promise<boolean> {
    return isUuid(id) && (await this.sessions.end({ userId, id }, this.clock.now(), db)) > 0;
  }

  async endAll(userId: string, db: Knex, { exceptId }: { exceptId?: string } = {}): Promise<number> {
    return this.sessions.end({ userId, exceptId }, this.clock.now(), db);
  }

  /** To be called after the commit of whatever changes a person, his grants or his sessions: the next request reads anew. */
  forgetPerson(userId: string): void {
    this.cache.forgetPerson(userId);
  }

  async forgetOld(before: Date): Promise<void> {
    await this.sessions.forget(before);
  }

  private idOf(token: string, now: Date): string | null {
    const known = this.tokens.get(token);
    if (known && known.expiresAtS > seconds(now)) return known.id;
    this.tokens.delete(token);
    try {
      const { sid, exp } = this.jwt.verify<{ sid?: unknown; exp?: unknown }>(token, {
        algorithms: ['HS256'],
        clockTimestamp: seconds(now),
      });
      if (typeof sid !== 'string' || !isUuid(sid) || typeof exp !== 'number') return null;
      if (this.tokens.size >= TOKENS_AT_MOST) this.tokens.clear();
      this.tokens.set(token, { id: sid, expiresAtS: exp });
      return sid;
    } catch {
      return null;
    }
  }

  private holds(session: StoredSession, now: Date): boolean {
    return (
      session.expiresAt > now &&
      now.getTime() - session.lastActiveAt.getTime() < SESSION.idleMs &&
      (!session.isDemo || this.config.demoAccounts)
    );
  }

  private toPerson({ id, userId, name, email, grants }: StoredSession): SignedIn {
    const today = this.clock.today();
    const held = grants.filter(
      ({ validFrom, validTo }) => validFrom <= today && (validTo === null || validTo >= today),
    );
    return {
      id: userId,
      name,
      email,
      sessionId: id,
      grants: held.map(({ role, projectId, checkCategory }) => ({ role, projectId, checkCategory })),
    };
  }
}

const seconds = (instant: Date) => Math.floor(instant.getTime() / 1000);

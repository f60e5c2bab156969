import type { StoredSession } from './sessions.repository';

const KEPT_MS = 3000;
const ENTRIES_AT_MOST = 5000;

interface Entry {
  session: StoredSession;
  until: number;
}

/**
 * Sessions just read, for a few seconds: typing asks for an answer many times a second. In this process a change holds
 * at once; another process sees it when its own entry lapses.
 */
export class SessionCache {
  private readonly entries = new Map<string, Entry>();
  private changes = 0;

  async get(id: string, read: () => Promise<StoredSession | null>): Promise<StoredSession | null> {
    const kept = this.entries.get(id);
    if (kept && kept.until > Date.now()) return kept.session;
    const changesBefore = this.changes;
    const session = await read();
    this.entries.delete(id);
    // What was read while something changed may be out of date already.
    if (session && changesBefore === this.changes) this.keep(id, session);
    return session;
  }

  forgetPerson(userId: string): void {
    this.changes += 1;
    for (const [id, { session }] of this.entries) if (session.userId === userId) this.entries.delete(id);
  }

  private keep(id: string, session: StoredSession): void {
    if (this.entries.size >= ENTRIES_AT_MOST) this.entries.clear();
    this.entries.set(id, { session, until: Date.now() + KEPT_MS });
  }
}

import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { passwordFault } from '@bellgap/common/schemas';
import { AccountLinksService, type LinkPurpose } from '../account-links/account-links.service';
import { AuditService } from '../audit/audit.service';
import { CONFIG, type Config } from '../platform/config';
import { DomainError, invalidAt, notFound } from '../platform/domain-error';
import { KNEX } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { AccountsRepository, maySignIn, type Account } from './accounts.repository';
import { Passwords } from './passwords';
import { SessionsService, type Client } from './sessions.service';
import { ThrottleService } from './throttle.service';

/** One answer, whatever of the two is wrong, whether the account exists or not. */
const refused = () =>
  new DomainError('not-signed-in', 'The e-mail address or the password is not right.', {
    errors: [{ path: 'password', message: 'The e-mail address or the password is not right' }],
  });

@Injectable()
export class AuthService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    @Inject(CONFIG) private readonly config: Config,
    private readonly accounts: AccountsRepository,
    private readonly passwords: Passwords,
    private readonly sessions: SessionsService,
    private readonly links: AccountLinksService,
    private readonly throttle: ThrottleService,
    private readonly audit: AuditService,
  ) {}

  async signIn(email: string, password: string, client: Client): Promise<{ token: string; expiresAt: Date }> {
    const attempt = await this.throttle.begin(email, client.address ?? '');
    const account = await this.accounts.findByEmail(email.trim());
    const matches = await this.passwords.matches(password, account?.passwordHash ?? null);
    if (!account || !matches || !maySignIn(account, this.config)) throw refused();
    return this.knex.transaction(async (db) => {
      await this.throttle.succeed(attempt, db);
      const session = await this.sessions.begin(account.id, client, db);
      await this.audit.record(db, {
        actorId: account.id,
        action: 'session.began',
        entity: 'session',
        entityId: session.id,
      });
      return session;
    });
  }

  async endSession(person: SignedIn, id: string): Promise<void> {
    await this.knex.transaction(async (db) => {
      if (!(await this.sessions.end(person.id, id, db))) throw notFound('session');
      await this.audit.record(db, { actorId: person.id, action: 'session.ended', entity: 'session', entityId: id });
    });
    this.sessions.forgetPerson(person.id);
  }

  async changePassword(
    person: SignedIn,
    given: { currentPassword: string; newPassword: string },
    client: Client,
  ): Promise<void> {
    const attempt = await this.throttle.begin(person.email, client.address ?? '');
    const account = await this.accounts.find(person.id);
    if (!account || !(await this.passwords.matches(given.currentPassword, account.passwordHash))) {
      throw invalidAt('currentPassword', 'Current password: is not right');
    }
    refuseWeak('newPassword', given.newPassword, account);
    if (given.newPassword === given.currentPassword) {
      throw invalidAt('newPassword', 'Password: choose one that differs from the current one');
    }
    await this.knex.transaction(async (db) => {
      await this.throttle.succeed(attempt, db);
      await this.storePassword(db, account, given.newPassword);
      await this.sessions.endAll(account.id, db, { exceptId: person.sessionId });
    });
    this.sessions.forgetPerson(account.id);
  }

  async acceptInvitation(token: string, password: string): Promise<void> {
    const gone = 'Invitation: does not hold any more; ask your administrator for a new link';
    await this.choosePassword({ token, purpose: 'invitation', password, gone });
  }

  async acceptPasswordReset(token: string, password: string): Promise<void> {
    const gone = 'Link: does not hold any more; ask for a new one';
    await this.choosePassword({ token, purpose: 'reset', password, gone });
  }

  /** Uses up the link, unless the password is refused, and ends every session. */
  private async choosePassword(asked: {
    token: string;
    purpose: LinkPurpose;
    password: string;
    gone: string;
  }): Promise<void> {
    const { token, purpose, password, gone } = asked;
    const userId = await this.knex.transaction(async (db) => {
      const id = await this.links.redeem(token, purpose, db);
      const account = id === null ? null : await this.accounts.find(id, db);
      if (!account?.active) throw invalidAt('token', gone);
      refuseWeak('password', password, account);
      await this.storePassword(db, account, password);
      await this.sessions.endAll(account.id, db);
      return account.id;
    });
    this.sessions.forgetPerson(userId);
  }

  private async storePassword(db: Knex.Transaction, account: Account, password: string): Promise<void> {
    await this.accounts.setPasswordHash(account.id, await this.passwords.hash(password), db);
    await this.links.withdraw(account.id, db);
    await this.audit.record(db, {
      actorId: account.id,
      action: 'user.password-changed',
      entity: 'user',
      entityId: account.id,
    });
  }
}

function refuseWeak(path: string, password: string, account: Account): void {
  const fault = passwordFault(password, account);
  if (fault !== null) throw invalidAt(path, fault);
}

import { randomUUID } from 'node:crypto';
import { Inject, Injectable, type OnModuleInit } from '@nestjs/common';
import type { Knex } from 'knex';
import { AccountLinksService } from '../account-links/account-links.service';
import { AuditService } from '../audit/audit.service';
import { MailService } from '../mail/mail.service';
import { Clock } from '../platform/clock';
import { CONFIG, type Config } from '../platform/config';
import { KNEX } from '../platform/knex';
import { QueueService } from '../queue/queue.service';
import { AccountsRepository, maySignIn } from './accounts.repository';
import type { Client } from './sessions.service';
import { ThrottleService } from './throttle.service';

const TASK = 'password-reset';
const HOUR_MS = 3600 * 1000;
/** Whoever asks, from wherever: nobody fills another one's letter box. */
export const RESET_LETTERS_AN_HOUR = 5;

interface ResetJob {
  email: string;
  linkId: string;
}

@Injectable()
export class PasswordResetsService implements OnModuleInit {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    @Inject(CONFIG) private readonly config: Config,
    private readonly clock: Clock,
    private readonly accounts: AccountsRepository,
    private readonly links: AccountLinksService,
    private readonly mail: MailService,
    private readonly queue: QueueService,
    private readonly throttle: ThrottleService,
    private readonly audit: AuditService,
  ) {}

  onModuleInit(): void {
    this.queue.register<ResetJob>(TASK, (job) => this.write(job));
  }

  /** Does the same for every address: whether there is such an account is found out by the job. */
  async request(email: string, client: Client): Promise<void> {
    await this.throttle.begin(email, client.address ?? '', 'password-reset');
    const job: ResetJob = { email: email.trim(), linkId: randomUUID() };
    await this.knex.transaction((db) => this.queue.add(db, TASK, job));
  }

  /** May run again: a link of this id that exists was mailed with it. */
  private async write({ email, linkId }: ResetJob): Promise<void> {
    await this.knex.transaction(async (db) => {
      const account = await this.accounts.findByEmail(email, db);
      if (!account || !maySignIn(account, this.config) || (await this.links.exists(linkId, db))) return;
      const since = new Date(this.clock.now().getTime() - HOUR_MS);
      if ((await this.links.countSince(account.id, 'reset', since, db)) >= RESET_LETTERS_AN_HOUR) return;
      await this.links.issue({ userId: account.id, purpose: 'reset', id: linkId }, db);
      await this.mail.send(db, account.id, { kind: 'password-reset', data: { linkId } });
      await this.audit.record(db, {
        actorId: null,
        action: 'user.password-reset-mailed',
        entity: 'user',
        entityId: account.id,
      });
    });
  }
}

import { Inject, Injectable, type OnModuleInit } from '@nestjs/common';
import { MailService } from '../mail/mail.service';
import { KNEX, type Database } from '../platform/knex';
import { QueueService } from '../queue/queue.service';
import { GrantsService } from '../users/grants.service';
import { LastSealService } from './last-seal.service';

export const LAST_SEAL_TASK = 'last-seal';
/** Minute, hour, day, month, weekday in UTC. */
const DAILY = '0 5 * * *';

/** Mails the end of the chain to the administrators each day: kept outside, it shows a tail that is cut off later. */
@Injectable()
export class LastSealLettersService implements OnModuleInit {
  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly queue: QueueService,
    private readonly mail: MailService,
    private readonly grants: GrantsService,
    private readonly seals: LastSealService,
  ) {}

  onModuleInit(): void {
    this.queue.register(LAST_SEAL_TASK, () => this.send(), { cron: DAILY });
  }

  async send(): Promise<void> {
    await this.knex.transaction(async (db) => {
      const last = await this.seals.lastSeal(db);
      if (!last) return;
      const administrators = await this.grants.holders(['administrator'], null, db);
      const { number, hash, at: sealedAt } = last;
      await this.mail.send(db, administrators, { kind: 'last-seal', data: { number, hash, sealedAt } });
    });
  }
}

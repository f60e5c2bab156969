import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { QueueService } from '../queue/queue.service';
import type { Letter } from './letters/kinds';

export type { Letter, LetterData, LetterKind, RevisionNews } from './letters/kinds';

/** A letter on its way to one person. Its id becomes the Message-ID, so that a repeat is recognised as one. */
export type LetterJob = Letter & { letterId: string; toUserId: string };

export const LETTER_TASK = 'letter';

/** Letters leave after the transaction that caused them, at least once; what cannot be delivered is tried again. */
@Injectable()
export class MailService {
  constructor(private readonly queue: QueueService) {}

  /** A letter to each of these people, in the transaction of its cause. */
  async send(db: Knex.Transaction, toUserIds: string | readonly string[], letter: Letter): Promise<void> {
    for (const toUserId of new Set([toUserIds].flat())) {
      const job: LetterJob = { ...letter, letterId: randomUUID(), toUserId };
      await this.queue.add(db, LETTER_TASK, job);
    }
  }
}

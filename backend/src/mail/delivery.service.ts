import { Inject, Injectable, Logger, type OnModuleInit } from '@nestjs/common';
import { AccountLinksService, type AccountLink } from '../account-links/account-links.service';
import { CONFIG, type Config } from '../platform/config';
import { isLoopback } from '../platform/config-values';
import { QueueService } from '../queue/queue.service';
import type { LetterContent } from './letters/content';
import { renderLetter } from './letters/render';
import { LETTER_TEXTS, type LetterSurroundings } from './letters/texts';
import { LETTER_TASK, type Letter, type LetterJob } from './mail.service';
import { RecipientsRepository, type Recipient } from './recipients.repository';
import type { Transporter } from 'nodemailer';

/** Shorter than what a stopping product waits for. */
const PATIENCE_MS = 10_000;

/** Takes letters from the queue to the mail server. An error here means: again, later. */
@Injectable()
export class DeliveryService implements OnModuleInit {
  private readonly logger = new Logger('Mail');
  private transport: Promise<Transporter> | null = null;

  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly queue: QueueService,
    private readonly links: AccountLinksService,
    private readonly recipients: RecipientsRepository,
  ) {}

  onModuleInit(): void {
    const { smtpUrl } = this.config;
    // Without a server nobody takes the letters: they wait in the queue for a process that has one.
    if (smtpUrl) this.queue.register<LetterJob>(LETTER_TASK, (job) => this.deliver(job, smtpUrl));
    else if (this.config.role !== 'web') this.logger.warn('SMTP_URL is not set: letters wait in the queue.');
  }

  private async deliver(job: LetterJob, smtpUrl: URL): Promise<void> {
    const recipient = await this.recipients.find(job.toUserId);
    if (!recipient || !mayReceive(recipient, smtpUrl)) return;
    const content = await this.compose(job);
    if (!content) return;
    const { mailFrom, publicUrl } = this.config;
    const transport = await (this.transport ??= open(smtpUrl));
    await transport.sendMail({
      ...renderLetter(content, { name: recipient.name, origin: publicUrl.origin }),
      from: mailFrom,
      to: { name: recipient.name, address: recipient.email },
      messageId: `<${job.letterId}@${mailFrom.address.split('@')[1]}>`,
      headers: { 'Auto-Submitted': 'auto-generated' },
    });
  }

  /** Null where the letter has lost its point: its link was used or withdrawn in the meantime. */
  private async compose(letter: Letter): Promise<LetterContent | null> {
    let link: AccountLink | null = null;
    if (letter.kind === 'invitation' || letter.kind === 'password-reset') {
      link = await this.links.find(letter.data.linkId);
      if (!link) return null;
    }
    const pageOf = (path: string) => new URL(path, this.config.publicUrl).href;
    return inWords(letter, { pageOf, link });
  }
}

function inWords(letter: Letter, around: LetterSurroundings): LetterContent {
  const text = LETTER_TEXTS[letter.kind] as (data: Letter['data'], around: LetterSurroundings) => LetterContent;
  return text(letter.data, around);
}

/** The people of the demonstration are invented: nothing is sent to them by a server that could reach a stranger. */
function mayReceive({ active, isDemo }: Recipient, smtpUrl: URL): boolean {
  return active && (!isDemo || isLoopback(smtpUrl.hostname));
}

/** Loaded with the first letter. */
async function open(smtpUrl: URL): Promise<Transporter> {
  const { createTransport } = await import('nodemailer');
  return createTransport({
    url: smtpUrl.href,
    connectionTimeout: PATIENCE_MS,
    greetingTimeout: PATIENCE_MS,
    socketTimeout: PATIENCE_MS,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
}

import type { AddressInfo } from 'node:net';
import { simpleParser, type ParsedMail } from 'mailparser';
import { SMTPServer } from 'smtp-server';

type Accept = (error?: Error) => void;

/** A mail server that keeps what it is given, and can be slow or stop at a point of the conversation. */
export class MailServer {
  readonly letters: ParsedMail[] = [];
  /** Called when a letter was kept, before its sender hears of it. */
  beforeAnswer: (accept: Accept) => void = (accept) => accept();
  /** Called when somebody names the sender of a letter, before he may go on. */
  beforeLetter: (accept: Accept) => void = (accept) => accept();

  private readonly server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    disableReverseLookup: true,
    onMailFrom: (_address, _session, callback) => this.beforeLetter((error) => callback(error)),
    onData: (stream, _session, callback) => {
      void simpleParser(stream).then((letter) => {
        this.letters.push(letter);
        this.beforeAnswer((error) => callback(error));
      });
    },
  });

  static async start(): Promise<MailServer> {
    const mail = new MailServer();
    mail.server.on('error', () => undefined);
    await new Promise<void>((resolve) => mail.server.listen(0, '127.0.0.1', resolve));
    return mail;
  }

  get url(): string {
    return `smtp://127.0.0.1:${(this.server.server.address() as AddressInfo).port}`;
  }

  /** Letters to an address, once there are as many as asked for. */
  async to(address: string, atLeast = 1): Promise<ParsedMail[]> {
    const found = () => this.letters.filter(({ to }) => JSON.stringify(to).includes(address));
    await until(() => found().length >= atLeast);
    return found();
  }

  async stop(): Promise<void> {
    await new Promise<void>((resolve) => this.server.close(() => resolve()));
  }
}

export async function until(holds: () => boolean | Promise<boolean>, withinMs = 20_000): Promise<void> {
  const end = Date.now() + withinMs;
  while (!(await holds())) {
    if (Date.now() > end) throw new Error('What was waited for did not happen.');
    await new Promise((resolve) => setTimeout(resolve, 25));
  }
}

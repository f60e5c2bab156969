import { randomBytes } from 'node:crypto';
import { mkdirSync, readdirSync } from 'node:fs';
import { readFile, rename, unlink, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { simpleParser, type ParsedMail } from 'mailparser';

export interface LetterHead {
  id: string;
  receivedAt: string;
  to: string;
  subject: string;
}

const LETTERS_AT_MOST = 2000;
const FILE = /^\d{13}-[0-9a-f]{12}\.eml$/;

/** Letters as files, one each, so that they outlive the program. */
export class LetterStore {
  private constructor(
    private readonly folder: string,
    /** Oldest first. */
    private readonly heads: LetterHead[],
  ) {}

  static async open(folder: string): Promise<LetterStore> {
    mkdirSync(folder, { recursive: true });
    const ids = readdirSync(folder)
      .filter((name) => FILE.test(name))
      .sort()
      .map((name) => name.replace('.eml', ''));
    const store = new LetterStore(folder, []);
    for (const id of ids) store.heads.push(headOf(id, await simpleParser(await readFile(store.fileOf(id)))));
    return store;
  }

  /** Answers once the letter is safe on the disk: before that its sender must not be told that it was taken. */
  async keep(source: Buffer): Promise<LetterHead> {
    const id = `${Date.now()}-${randomBytes(6).toString('hex')}`;
    const head = headOf(id, await simpleParser(source));
    await writeFile(`${this.fileOf(id)}.part`, source, { flush: true });
    await rename(`${this.fileOf(id)}.part`, this.fileOf(id));
    this.heads.push(head);
    for (const old of this.heads.splice(0, Math.max(0, this.heads.length - LETTERS_AT_MOST))) {
      await unlink(this.fileOf(old.id)).catch(() => undefined);
    }
    return head;
  }

  /** Newest first; with `to`, those whose receiver holds these words. */
  list(to = ''): LetterHead[] {
    const words = to.trim().toLowerCase();
    return this.heads.filter((head) => head.to.toLowerCase().includes(words)).reverse();
  }

  async read(id: string): Promise<{ head: LetterHead; letter: ParsedMail } | null> {
    const head = this.heads.find((known) => known.id === id);
    return head ? { head, letter: await simpleParser(await readFile(this.fileOf(id))) } : null;
  }

  private fileOf(id: string): string {
    return path.join(this.folder, `${id}.eml`);
  }
}

function headOf(id: string, { to, subject }: ParsedMail): LetterHead {
  const receivers = [to ?? []].flat().map(({ text }) => text.replaceAll('"', ''));
  return {
    id,
    receivedAt: new Date(Number(id.slice(0, 13))).toISOString(),
    to: receivers.join(', '),
    subject: subject ?? '(no subject)',
  };
}

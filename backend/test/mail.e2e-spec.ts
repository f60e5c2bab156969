import type { ParsedMail } from 'mailparser';
import { contract } from '@bellgap/common/api';
import type { LetterData, LetterKind } from '../src/mail/mail.service';
import { MailService } from '../src/mail/mail.service';
import { MailServer, until } from './support/mail-server';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { createUser, grantRole, updateUser } = contract;

const NEWS = {
  number: 'INS-221-003',
  title: 'Suspension strings <b>220 kV</b>',
  label: 'B',
  projectCode: 'KL221',
  byName: 'Tamsin Orvelle',
  dueOn: '2026-03-20',
  note: 'Two units more than the revision before;\nplease look at the altitude.',
  path: '/projects/KL221/specifications/INS-221-003',
};
const SAMPLES: Omit<LetterData, 'invitation' | 'password-reset'> = {
  'waits-for-check': NEWS,
  'waits-for-approval': { ...NEWS, dueOn: null, note: null },
  returned: NEWS,
  issued: { ...NEWS, label: '1' },
  'superseded-you-hold-a-copy': { ...NEWS, label: '1' },
  'withdrawn-you-hold-a-copy': { ...NEWS, label: '1', note: 'Wrong class' },
  'grant-of-checker-or-approver': {
    personName: 'Rurik Castellary',
    role: 'checker',
    projectCode: null,
    checkCategory: 2,
    validFrom: '2026-03-01',
    validTo: null,
    byName: 'Wen Tollarsson',
  },
  'last-seal': { number: 1204, hash: 'ab'.repeat(32), sealedAt: '2026-03-16T05:00:00Z' },
};

describe('letters', () => {
  let mail: MailServer;
  let test: TestApp;
  let administrator: TestClient;
  beforeAll(async () => {
    mail = await MailServer.start();
    test = await TestApp.start({
      ROLE: 'both',
      SMTP_URL: mail.url,
      PUBLIC_URL: 'http://127.0.0.1:3000',
      MAIL_FROM: 'Line sheets <sheets@company.example>',
    });
    ({ client: administrator } = await test.signedIn({ roles: ['administrator'], name: 'Wen Tollarsson' }));
  });
  afterAll(async () => {
    await test.stop();
    await mail.stop();
  });

  const send = (to: string, letter: Parameters<MailService['send']>[2]) =>
    test.database.knex.transaction((db) => test.app.get(MailService).send(db, to, letter));
  const partsOf = (letter: ParsedMail) => [letter.text ?? '', letter.html || ''];
  const queueIsEmpty = () =>
    until(async () => (await test.database.owner('graphile_worker.jobs').pluck('id')).length === 0);

  it.each(Object.entries(SAMPLES))('of the kind %s say the same in text and HTML', async (kind, data) => {
    const { id, email, name } = await test.people.add();
    await send(id, { kind: kind as LetterKind, data } as Parameters<MailService['send']>[2]);
    const [letter] = await mail.to(email);
    expect(letter!.from!.text).toBe('"Line sheets" <sheets@company.example>');
    expect(letter!.messageId).toMatch(/^<[0-9a-f-]{36}@company\.example>$/);
    expect(letter!.headers.get('auto-submitted')).toBe('auto-generated');
    expect(letter!.subject).not.toMatch(/undefined|null/);
    const values = Object.entries<unknown>({ ...data }).filter(([key]) => !['path', 'role', 'sealedAt'].includes(key));
    for (const part of partsOf(letter!)) {
      expect(part).toContain(name);
      expect(part).not.toMatch(/undefined|null/);
      const plain = part.replaceAll('&lt;', '<').replaceAll('&gt;', '>').replace(/\s+/g, ' ');
      for (const [, value] of values) {
        if (value !== null) expect(plain).toContain(String(value as string).replace(/\s+/g, ' '));
      }
    }
    if ('path' in data) expect(letter!.text).toContain(`\nhttp://127.0.0.1:3000${data.path}\n`);
    expect(letter!.html).not.toContain('<b>');
  });

  it('are not sent where their cause is taken back', async () => {
    const { id, email } = await test.people.add();
    const letter = { kind: 'issued', data: NEWS } as const;
    const failing = test.database.knex.transaction(async (db) => {
      await test.app.get(MailService).send(db, id, letter);
      throw new Error('taken back');
    });
    await expect(failing).rejects.toThrow('taken back');
    await send(id, { kind: 'returned', data: NEWS });
    await queueIsEmpty();
    expect((await mail.to(email)).map(({ subject }) => subject)).toEqual([
      'INS-221-003 revision B was returned to you',
    ]);
  });

  it('go once to each person named, and to nobody whose account is closed', async () => {
    const [first, second] = [await test.people.add(), await test.people.add()];
    const closed = await test.people.add({ active: false });
    const people = [first.id, second.id, first.id, closed.id];
    await test.database.knex.transaction((db) =>
      test.app.get(MailService).send(db, people, { kind: 'issued', data: NEWS }),
    );
    await queueIsEmpty();
    expect(await mail.to(first.email)).toHaveLength(1);
    expect(await mail.to(second.email)).toHaveLength(1);
    expect(mail.letters.some(({ to }) => JSON.stringify(to).includes(closed.email))).toBe(false);
  });

  it('bring an invitation whose token stands nowhere in the database', async () => {
    const body = { email: 'ottoline@company.example', name: 'Ottoline Grebe' };
    const { answer } = await administrator.call(createUser, { body });
    const [letter] = await mail.to(body.email);
    expect(letter!.subject).toBe('Your account for Bellgap');
    expect(letter!.text).toContain(`\n${answer.link}\n`);
    const { rows } = await test.database.owner.raw<{ rows: unknown[] }>(
      'select payload::text from graphile_worker._private_jobs',
    );
    const stored = JSON.stringify([rows, await test.database.owner('account_tokens').select()]);
    expect(stored).not.toContain(answer.link.split('#')[1]);
  });

  it('bring no invitation to an address that was corrected in the meantime', async () => {
    const body = { email: 'typo@company.example', name: 'Ottoline Grebe' };
    const { answer } = await administrator.call(createUser, { body });
    const params = { id: answer.user.id };
    await administrator.call(updateUser, { params, body: { ...body, email: 'right@company.example', active: true } });
    const token = answer.link.split('#')[1]!;
    const accepted = await test.stranger().call(contract.acceptInvitation, {
      body: { token, password: 'a fog over reeds' },
    });
    expect(accepted.status).toBe(422);
  });

  it('tell approvers of every new checker and approver, and of no other role', async () => {
    const { person: approver } = await test.signedIn({ roles: ['approver'] });
    const { person: former } = await test.signedIn({ roles: ['approver'], validTo: '2021-01-01' });
    const { person } = await test.signedIn({ name: 'Rurik Castellary' });
    const grant = (role: string, checkCategory: number | null = null) =>
      administrator.call(grantRole, {
        params: { id: person.id },
        body: { role, projectCode: null, checkCategory, validFrom: '2026-01-01', validTo: null },
      });
    for (const role of ['engineer', 'approver']) expect((await grant(role)).status).toBe(201);
    expect((await grant('checker', 2)).status).toBe(201);
    await queueIsEmpty();
    const told = await mail.to(approver.email, 2);
    expect(told.map(({ subject }) => subject).sort()).toEqual([
      'Rurik Castellary may now act as approver',
      'Rurik Castellary may now act as checker',
    ]);
    for (const { email } of [former, person]) {
      expect(mail.letters.some(({ to }) => JSON.stringify(to).includes(email))).toBe(false);
    }
  });

  it('wait and are tried again when the server refuses', async () => {
    const { id, email } = await test.people.add();
    let refusals = 0;
    mail.beforeLetter = (accept) => {
      refusals += 1;
      accept(refusals === 1 ? new Error('not now') : undefined);
    };
    try {
      await send(id, { kind: 'issued', data: NEWS });
      expect(await mail.to(email)).toHaveLength(1);
      expect(refusals).toBe(2);
    } finally {
      mail.beforeLetter = (accept) => accept();
    }
  });
});

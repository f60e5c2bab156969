import { API_PREFIX, contract } from '@bellgap/common/api';
import { MailServer, until } from './support/mail-server';
import { People } from './support/people';
import { startProduct, type ProductProcess } from './support/product-process';

// Needs the build: what is killed here is the product as it is shipped.
jest.setTimeout(180_000);

describe('letters of a product that is killed', () => {
  let mail: MailServer;
  let product: ProductProcess;
  beforeAll(async () => {
    mail = await MailServer.start();
    product = await startProduct({ demo: false, env: { SMTP_URL: mail.url, REQUEST_LOG: 'no' } });
  });
  beforeEach(() => mail.letters.splice(0));
  afterAll(async () => {
    await product?.stop();
    await mail?.stop();
  });

  const askForPassword = async (email: string) => {
    const { method, path } = contract.requestPasswordReset;
    const { status } = await fetch(`${product.url}${API_PREFIX}${path}`, {
      method,
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ email }),
    });
    expect(status).toBe(204);
  };
  let people: People;
  const newPerson = () => (people ??= new People(product.database.owner)).add();
  const queueIsEmpty = () =>
    until(async () => (await product.database.owner('graphile_worker.jobs').pluck('id')).length === 0, 60_000);

  it('before the mail server has taken the letter: exactly one arrives once it runs again', async () => {
    const { email } = await newPerson();
    const reached = new Promise<void>((resolve) => (mail.beforeLetter = () => resolve()));
    await askForPassword(email);
    await reached;
    await product.kill();
    mail.beforeLetter = (accept) => accept();
    expect(mail.letters).toHaveLength(0);

    await product.start();
    await queueIsEmpty();
    expect(await mail.to(email)).toHaveLength(1);
    expect(mail.letters).toHaveLength(1);
  });

  it('after the mail server has taken the letter: at most one repeat, with the same Message-ID and link', async () => {
    const { email } = await newPerson();
    const taken = new Promise<void>((resolve) => (mail.beforeAnswer = () => resolve()));
    await askForPassword(email);
    await taken;
    await product.kill();
    mail.beforeAnswer = (accept) => accept();
    expect(mail.letters).toHaveLength(1);

    await product.start();
    await queueIsEmpty();
    const letters = await mail.to(email);
    expect(letters.length).toBeLessThanOrEqual(2);
    expect(new Set(letters.map(({ messageId }) => messageId)).size).toBe(1);
    expect(new Set(letters.map(({ text }) => text)).size).toBe(1);
  });

  it('wait while it is down, and while it is stopped in the middle of one', async () => {
    const { email } = await newPerson();
    const reached = new Promise<void>((resolve) => (mail.beforeLetter = () => resolve()));
    await askForPassword(email);
    await reached;
    const begun = Date.now();
    await product.end();
    expect(Date.now() - begun).toBeLessThan(9_000);
    mail.beforeLetter = (accept) => accept();
    await product.start();
    await queueIsEmpty();
    expect(await mail.to(email)).toHaveLength(1);
  });
});

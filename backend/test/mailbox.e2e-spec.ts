import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { request } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { createTransport } from 'nodemailer';
import { until } from './support/mail-server';
import { freePort } from './support/product-process';

const PROGRAM = path.join(__dirname, '../dist/mailbox/main.js');

// Needs the build: the post box is a program of its own.
describe('the post box', () => {
  const folder = mkdtempSync(path.join(tmpdir(), 'bellgap-mailbox-'));
  let port: number;
  let smtpPort: number;
  let child: ChildProcess;

  const get = (address: string, headers: Record<string, string> = {}, method = 'GET') =>
    new Promise<{ status: number; body: string; policy: string }>((resolve, reject) => {
      const sent = request({ host: '127.0.0.1', port, path: address, headers, method, agent: false }, (response) => {
        const parts: Buffer[] = [];
        response.on('data', (part: Buffer) => parts.push(part));
        response.on('end', () => {
          const policy = String(response.headers['content-security-policy']);
          resolve({ status: response.statusCode ?? 0, body: Buffer.concat(parts).toString(), policy });
        });
      });
      sent.on('error', reject);
      sent.end();
    });
  const start = async () => {
    const ports = ['--smtp-port', String(smtpPort), '--port', String(port)];
    child = spawn(process.execPath, [PROGRAM, '--folder', folder, ...ports], { stdio: 'ignore' });
    await until(() =>
      get('/').then(
        ({ status }) => status === 200,
        () => false,
      ),
    );
  };
  const stop = async () => {
    const ended = new Promise((resolve) => child.once('exit', resolve));
    child.kill('SIGTERM');
    await ended;
  };
  const linksOf = (body: string) => [...body.matchAll(/href="(\/letters\/[^"]+)"/g)].map(([, link]) => link!);

  beforeAll(async () => {
    [port, smtpPort] = [await freePort(), await freePort()];
    await start();
    const transport = createTransport({ host: '127.0.0.1', port: smtpPort });
    const from = 'bellgap@localhost';
    await transport.sendMail({ from, to: 'Tamsin Orvelle <t.orvelle@kigc.example>', subject: 'First', text: 'one' });
    await transport.sendMail({
      from,
      to: 'o.grebe@kigc.example',
      subject: '<script>alert(1)</script>',
      text: 'See http://127.0.0.1:3000/reset#a-token & <img src=x>',
      html: '<html><head></head><body><script>alert(1)</script><a href="http://127.0.0.1:3000/">open</a></body></html>',
    });
  });
  afterAll(async () => {
    await stop();
    rmSync(folder, { recursive: true });
  });

  it('lists letters, the newest first, and those to one person', async () => {
    const { body } = await get('/');
    expect(linksOf(body)).toHaveLength(2);
    expect(body.indexOf('&lt;script&gt;')).toBeLessThan(body.indexOf('First'));
    const ofOne = (await get('/?to=Orvelle')).body;
    expect(linksOf(ofOne)).toHaveLength(1);
    expect(ofOne).toContain('Tamsin Orvelle &lt;t.orvelle@kigc.example&gt;');
  });

  it('shows a letter as text with its links, and runs nothing of it', async () => {
    const [newest] = linksOf((await get('/')).body);
    const { body, policy } = await get(newest!);
    expect(body).toContain('href="http://127.0.0.1:3000/reset#a-token"');
    expect(body).toContain('&amp; &lt;img src=x&gt;');
    expect(body).not.toContain('<script');
    expect(policy).toMatch(/^default-src 'none';/);
    const html = await get(`${newest}/html`);
    expect(html.body).toContain('<base target="_blank">');
    expect(html.policy).toMatch(/sandbox(?!.*allow-(scripts|same-origin))/);
    expect(html.policy).not.toContain('script-src');
  });

  it('keeps letters over a restart', async () => {
    await stop();
    await start();
    expect(linksOf((await get('/')).body)).toHaveLength(2);
  });

  it('answers to the loopback address only, and only readers', async () => {
    expect((await get('/', { Host: 'post.company.example' })).status).toBe(421);
    expect((await get('/', {}, 'POST')).status).toBe(405);
    expect((await get('/letters/../../etc/passwd')).status).toBe(404);
    expect((await get('/letters/1796140367656-b04b70f52847')).status).toBe(404);
  });
});

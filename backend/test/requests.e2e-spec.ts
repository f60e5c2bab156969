import { connect, type AddressInfo } from 'node:net';
import request from 'supertest';
import { contract, type Problem } from '@bellgap/common/api';
import { TestApp } from './support/test-app';
import { assertProblem, type TestClient } from './support/test-client';

const { createProject, createUser, endSession, saveDesignBasis, signIn, users } = contract;
const SESSIONS = '/api/v1/sessions';

describe('requests', () => {
  let test: TestApp;
  let engineer: TestClient;
  let administrator: TestClient;
  beforeAll(async () => {
    test = await TestApp.start();
    ({ client: engineer } = await test.signedIn({ roles: ['engineer'] }));
    ({ client: administrator } = await test.signedIn({ roles: ['administrator'] }));
  });
  afterAll(() => test.stop());

  const project = { code: 'T1', title: 'T', kind: 'line', siteTimeZone: 'Etc/GMT-4', paper: 'A4', description: '' };

  describe('from another site', () => {
    const credentials = JSON.stringify({ email: 'a@company.example', password: 'x' });
    const post = (headers: Record<string, string>, body: string = credentials) =>
      request(test.server)
        .post(SESSIONS)
        .set({ 'Content-Type': 'application/json', ...headers })
        .send(body);

    it.each(['http://evil.example', 'null', 'not an origin'])('are refused by their Origin: %s', async (Origin) => {
      const response = await post({ Origin });
      assertProblem(response);
      expect(response.status).toBe(403);
    });

    it('are told apart from those of the same host', async () => {
      const response = await post({ Origin: 'http://bellgap.company.example', Host: 'bellgap.company.example' });
      expect(response.status).toBe(401);
    });

    it.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data', 'application/jsonp'])(
      'are refused as %s, which a form can send',
      async (type) => {
        const response = await post({ 'Content-Type': type });
        assertProblem(response);
        expect(response.status).toBe(415);
      },
    );

    it('are refused without a body as well', async () => {
      const response = await request(test.server)
        .delete(`${SESSIONS}/current`)
        .set('Cookie', engineer.cookie!)
        .set('Origin', 'http://evil.example');
      expect(response.status).toBe(403);
    });
  });

  describe('that cannot be read', () => {
    it('are refused beyond 1 MB', async () => {
      const response = await request(test.server)
        .post(SESSIONS)
        .set('Content-Type', 'application/json')
        .send(`{"email":"${'x'.repeat(10 * 1024 * 1024)}"}`);
      assertProblem(response);
      expect(response.status).toBe(413);
    });

    it('are refused beyond 1 MB also when no length is announced', async () => {
      await test.app.listen(0, '127.0.0.1');
      const { port } = test.server.address() as AddressInfo;
      const answer = await new Promise<string>((resolve, reject) => {
        const socket = connect(port, '127.0.0.1');
        let text = '';
        socket.on('data', (bytes) => (text += bytes.toString('utf8')));
        socket.on('close', () => resolve(text));
        socket.on('error', (error) => (text ? resolve(text) : reject(error)));
        const chunk = 'x'.repeat(600_000);
        socket.write(
          `POST ${SESSIONS} HTTP/1.1\r\nHost: x\r\nConnection: close\r\nContent-Type: application/json\r\nTransfer-Encoding: chunked\r\n\r\n`,
        );
        for (let i = 0; i < 2; i += 1) socket.write(`${chunk.length.toString(16)}\r\n${chunk}\r\n`);
        socket.write('0\r\n\r\n');
      });
      expect(answer).toMatch(/^HTTP\/1\.1 413 /);
    });

    it.each(['{"email":', 'nonsense', '"text"', ''])('are refused in words: %s', async (body) => {
      const response = await request(test.server).post(SESSIONS).set('Content-Type', 'application/json').send(body);
      assertProblem(response);
      expect(response.status).toBe(422);
    });

    it.each(['[]', 'null', '3'])('are refused where the body is no object: %s', async (body) => {
      const response = await request(test.server).post(SESSIONS).set('Content-Type', 'application/json').send(body);
      assertProblem(response);
      expect(response.status).toBe(422);
    });

    it('are refused in an unknown character set or encoding', async () => {
      for (const headers of [{ 'Content-Type': 'application/json; charset=x-odd' }, { 'Content-Encoding': 'odd' }]) {
        const response = await request(test.server)
          .post(SESSIONS)
          .set({ 'Content-Type': 'application/json', ...headers })
          .send('{}');
        assertProblem(response);
        expect(response.status).toBe(415);
      }
    });
  });

  describe('with fields that are wrong', () => {
    const faults = (problem: Problem) => problem.errors.map(({ path }) => path).sort();

    it('get one entry for each, unknown ones by their full path', async () => {
      const system = {
        nominalVoltageKv: '220',
        highestVoltageKv: 245,
        colour: 1,
        insulationLevel: { odd: 1, lightningKv: 0 },
      };
      const body = { number: 'DB-1', basis: 'iec', system, rules: { unitsOutForLiveWork: 1.5 }, extra: true };
      const { status, problem } = await engineer.call(saveDesignBasis, { params: { code: 'T1' }, version: 0, body });
      expect(status).toBe(422);
      expect(faults(problem)).toEqual([
        'extra',
        'note',
        'rules.maximumStringKinds',
        'rules.unitsOutForLiveWork',
        'system.colour',
        'system.insulationLevel.lightningKv',
        'system.insulationLevel.odd',
        'system.nominalVoltageKv',
      ]);
    });

    it('are not converted: text is no number, a number is no text', async () => {
      const { status, problem } = await engineer.call(createProject, {
        body: { ...project, title: 5, description: null },
      });
      expect(status).toBe(422);
      expect(faults(problem)).toEqual(['description', 'title']);
    });

    it.each(['__proto__', 'constructor', 'toString'])('do not slip through by the name %s', async (name) => {
      const body = JSON.stringify({ email: 'a@b.example', name: 'A' }).replace('}', `,"${name}":1}`);
      const response = await request(test.server)
        .post('/api/v1/users')
        .set('Content-Type', 'application/json')
        .set('Cookie', administrator.cookie!)
        .send(body);
      expect(response.status).toBe(422);
      expect(faults(response.body as Problem)).toEqual([name]);
    });

    it('are refused in the query string as well', async () => {
      for (const [query, path] of [
        [{ odd: '1' }, 'odd'],
        [{ limit: '0' }, 'limit'],
        [{ limit: '201' }, 'limit'],
        [{ limit: 'ten' }, 'limit'],
        [{ sort: 'password' }, 'sort'],
        [{ cursor: 'nonsense' }, 'cursor'],
      ] as const) {
        const { status, problem } = await administrator.call(users, { query });
        expect({ status, faults: faults(problem) }).toEqual({ status: 422, faults: [path] });
      }
      const twice = await request(test.server)
        .get('/api/v1/users?limit=5&limit=6')
        .set('Cookie', administrator.cookie!);
      expect(twice.status).toBe(422);
    });

    it('are refused where an endpoint takes no body', async () => {
      const { status } = await engineer.call(endSession, { params: { id: 'x' }, body: { id: 'y' } });
      expect(status).toBe(422);
    });

    it('get a short answer to a long list of faults', async () => {
      const body = Object.fromEntries(Array.from({ length: 5000 }, (_, i) => [`field${i}`, i]));
      const { problem } = await administrator.call(createUser, { body });
      expect(problem.errors).toHaveLength(100);
    });
  });

  describe('for what does not exist', () => {
    it.each(['/api', '/api/', '/api/v1', '/api/v1/nothing', '/api/v2/users', '/api/v1/users/%', '/api/v1/%E0%A4%A'])(
      '%s is a problem, not a page',
      async (path) => {
        const response = await request(test.server).get(path).set('Accept', 'text/html');
        assertProblem(response);
        expect(response.status).toBe(404);
      },
    );

    it('a method that an address does not know is not found', async () => {
      const response = await request(test.server)
        .put('/api/v1/sessions/current')
        .set('Content-Type', 'application/json')
        .send('{}');
      assertProblem(response);
      expect(response.status).toBe(404);
    });
  });

  describe('for pages', () => {
    it.each(['/', '/projects/KL221', '/projects/KL221/specifications/SPEC-1/revisions/A', '/sign-in'])(
      '%s gets the page, which is asked for again each time',
      async (path) => {
        const response = await request(test.server).get(path).set('Accept', 'text/html,*/*');
        expect(response.status).toBe(200);
        expect(response.text).toContain('<title>Bellgap</title>');
        expect(response.headers['cache-control']).toBe('no-cache');
      },
    );

    it('hashed assets are kept, missing ones are not answered by a page', async () => {
      const asset = await request(test.server).get('/assets/index-3f9a.js');
      expect(asset.headers['cache-control']).toBe('public, max-age=31536000, immutable');
      expect(asset.headers['content-type']).toMatch(/javascript/);
      const missing = await request(test.server).get('/assets/gone.js').set('Accept', 'text/html,*/*');
      expect(missing.status).toBe(404);
    });

    it('nothing outside the folder is reached', async () => {
      for (const path of [
        '/..%2f..%2fpackage.json',
        '/assets/..%2f..%2f..%2fetc/passwd',
        '/%2e%2e/%2e%2e/etc/passwd',
      ]) {
        const response = await request(test.server).get(path);
        expect(response.text).not.toMatch(/root:|"name"/);
      }
    });

    it('carry the headers that keep foreign code out', async () => {
      const { headers } = await request(test.server).get('/').set('Accept', 'text/html');
      const policy = headers['content-security-policy']!;
      expect(policy).toContain("script-src 'self';");
      expect(policy).toContain("frame-ancestors 'none'");
      expect(policy).not.toContain('upgrade-insecure-requests');
      expect(headers).toMatchObject({ 'referrer-policy': 'no-referrer', 'x-content-type-options': 'nosniff' });
      expect(headers['strict-transport-security']).toBeUndefined();
      expect(headers['x-powered-by']).toBeUndefined();
    });
  });

  it('are compressed where the answer is long, and never kept by a cache', async () => {
    const response = await request(test.server).get('/api/openapi.json').set('Accept-Encoding', 'gzip');
    expect(response.headers['content-encoding']).toBe('gzip');
    const { headers } = await test.stranger().call(signIn, { body: { email: 'a', password: 'b' } });
    expect(headers['cache-control']).toBe('no-store');
  });
});

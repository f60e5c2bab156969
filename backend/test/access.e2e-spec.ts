import type { Express } from 'express';
import request from 'supertest';
import { API_PREFIX, ROLES, contract, type EndpointDefinition, type Role } from '@bellgap/common/api';
import { TestApp } from './support/test-app';
import { assertProblem, type TestClient } from './support/test-client';

const ENDPOINTS = Object.entries<EndpointDefinition>(contract);
const OPEN_OUTSIDE_THE_CONTRACT = ['GET /api/health', 'GET /api/openapi.json'];
/** What strangers may call: nothing may join this list unnoticed. */
const OPEN = [
  'acceptInvitation',
  'acceptPasswordReset',
  'currentSession',
  'requestPasswordReset',
  'signIn',
  'verification',
];

const NOWHERE = '7b0c9f1e-1111-4111-8111-111111111111';

describe('who may call what', () => {
  let test: TestApp;
  const clients = new Map<Role | 'nobody' | 'stranger', TestClient>();
  beforeAll(async () => {
    test = await TestApp.start();
    for (const role of ROLES) clients.set(role, (await test.signedIn({ roles: [role] })).client);
    clients.set('nobody', (await test.signedIn({ roles: [] })).client);
    clients.set('stranger', test.stranger());
  });
  afterAll(() => test.stop());

  /** A request that gets past access and then finds nothing to do: an empty body, places that do not exist. */
  async function statusFor(who: Role | 'nobody' | 'stranger', endpoint: EndpointDefinition): Promise<number> {
    const path = endpoint.path.replace(/:\w+/g, NOWHERE);
    const method = endpoint.method.toLowerCase() as 'get' | 'post' | 'put' | 'delete';
    const sent = request(test.server)[method](`${API_PREFIX}${path}`);
    const { cookie } = clients.get(who)!;
    if (cookie) sent.set('Cookie', cookie);
    if (endpoint.body) sent.set('Content-Type', 'application/json').send('{}');
    const response = await sent;
    if (response.status >= 400) assertProblem(response);
    return response.status;
  }

  const SIGNS_OUT = contract.signOut;
  const closed = ENDPOINTS.filter(([, endpoint]) => endpoint.access !== 'open');

  it('leaves open what the design leaves open, and no more', () => {
    const open = ENDPOINTS.filter(([, { access }]) => access === 'open').map(([name]) => name);
    expect(open.sort()).toEqual(OPEN);
  });

  it.each(closed)('%s is closed to strangers', async (_, endpoint) => {
    expect(await statusFor('stranger', endpoint)).toBe(401);
  });

  const matrix = closed.flatMap(([name, endpoint]) =>
    [...ROLES, 'nobody' as const].map((who) => [name, who, endpoint] as const),
  );
  it.each(matrix.filter(([, , endpoint]) => endpoint !== SIGNS_OUT))(
    '%s for %s is as the contract says',
    async (_, who, endpoint) => {
      const { access } = endpoint;
      const allowed = access === 'signed-in' || (who !== 'nobody' && (access as readonly Role[]).includes(who));
      const status = await statusFor(who, endpoint);
      expect(status).not.toBe(401);
      expect(status).toBeLessThan(500);
      // Past the gate a request may still be refused, but not for want of any role: nothing exists at the places asked.
      if (allowed) expect(status).not.toBe(403);
      else expect(status).toBe(403);
    },
  );

  it('has a route for each endpoint of the contract, and none beside them', () => {
    const { router } = test.app.getHttpAdapter().getInstance() as Express;
    const routes = router.stack
      .flatMap(({ route }) => (route ? [route as unknown as { path: string; methods: Record<string, boolean> }] : []))
      .flatMap(({ path, methods }) => Object.keys(methods).map((method) => `${method.toUpperCase()} ${path}`));
    const expected = ENDPOINTS.map(([, { method, path }]) => `${method} ${API_PREFIX}${path}`);
    expect(routes.sort()).toEqual([...expected, ...OPEN_OUTSIDE_THE_CONTRACT].sort());
  });

  it('takes grants by their dates', async () => {
    const day = (offset: number) => new Date(Date.now() + offset * 86_400_000).toISOString().slice(0, 10);
    const cases = [
      { validFrom: day(-5), validTo: day(-1), status: 403 },
      { validFrom: day(1), validTo: null, status: 403 },
      { validFrom: day(0), validTo: day(0), status: 200 },
    ];
    for (const { status, ...dates } of cases) {
      const { client } = await test.signedIn({ roles: ['administrator'], ...dates });
      expect((await client.call(contract.users)).status).toBe(status);
    }
  });
});

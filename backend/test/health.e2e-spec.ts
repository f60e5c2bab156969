import request from 'supertest';
import { API_PREFIX, contract, healthAnswer, type EndpointDefinition } from '@bellgap/common/api';
import { METHOD_EDITION } from '@bellgap/common/engine';
import { faultsOf } from '../src/platform/yup-validation';
import { TestApp } from './support/test-app';

type Operation = {
  operationId: string;
  responses: Record<string, unknown>;
  requestBody?: { content: Record<string, { schema: { type: string } }> };
};

describe('health and description', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await TestApp.start();
  });
  afterAll(() => test.stop());

  it('reports the database and the version', async () => {
    const response = await request(test.server).get('/api/health');
    expect(response.status).toBe(200);
    expect(faultsOf(healthAnswer, response.body)).toEqual([]);
    expect(response.body).toMatchObject({
      status: 'ok',
      database: 'ok',
      version: '0.1.0',
      methodEdition: METHOD_EDITION,
    });
  });

  it('says so when the database does not answer', async () => {
    const cut = await TestApp.start();
    const log = jest.spyOn(console, 'log').mockImplementation();
    try {
      await cut.database.close();
      const response = await request(cut.server).get('/api/health');
      expect(response.status).toBe(503);
      expect(faultsOf(healthAnswer, response.body)).toEqual([]);
      expect(response.body).toMatchObject({ status: 'unavailable', database: 'unreachable' });
      const other = await cut.stranger().call(contract.signIn, { body: { email: 'a@b.example', password: 'x' } });
      expect(other.status).toBe(503);
    } finally {
      await cut.stop();
      log.mockRestore();
    }
  });

  it('describes every endpoint of the contract as OpenAPI 3.1', async () => {
    const { body } = (await request(test.server).get('/api/openapi.json')) as unknown as {
      body: { openapi: string; paths: Record<string, Record<string, Operation>> };
    };
    expect(body.openapi).toBe('3.1.0');
    for (const [name, endpoint] of Object.entries<EndpointDefinition>(contract)) {
      const path = `${API_PREFIX}${endpoint.path}`.replace(/:(\w+)/g, '{$1}');
      const operation = body.paths[path]?.[endpoint.method.toLowerCase()];
      expect(operation?.operationId).toBe(name);
      expect(Object.keys(operation!.responses)).toContain(String(endpoint.success));
      expect(operation!.requestBody?.content['application/json']?.schema.type).toBe(
        endpoint.body ? 'object' : undefined,
      );
    }
    const operations = Object.values(body.paths).flatMap((path) => Object.values(path));
    expect(new Set(operations.map(({ operationId }) => operationId)).size).toBe(Object.keys(contract).length + 1);
  });
});

import type { Server } from 'node:http';
import request, { type Response } from 'supertest';
import type { AnySchema } from 'yup';
import {
  API_PREFIX,
  ERROR_CODES,
  STATUS_OF,
  type AnswerOf,
  type EndpointDefinition,
  type ErrorCode,
  type Problem,
} from '@bellgap/common/api';
import { SESSION_COOKIE } from '../../src/platform/session-cookie';
import { faultsOf } from '../../src/platform/yup-validation';

export interface CallOptions {
  params?: Record<string, string>;
  query?: Record<string, string>;
  body?: unknown;
  /** Version for If-Match. */
  version?: number;
  headers?: Record<string, string>;
}

export interface Called<E extends EndpointDefinition> {
  status: number;
  answer: AnswerOf<E>;
  problem: Problem & Record<string, unknown>;
  headers: Record<string, string>;
  response: Response;
}

/** Calls endpoints of the contract as a browser would, and holds every response against the contract. */
export class TestClient {
  cookie: string | null = null;

  constructor(private readonly server: Server) {}

  async call<E extends EndpointDefinition>(endpoint: E, options: CallOptions = {}): Promise<Called<E>> {
    const { params = {}, query, body, version, headers = {} } = options;
    const path = endpoint.path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(params[name] ?? name));
    const method = endpoint.method.toLowerCase() as 'get' | 'post' | 'put' | 'delete';
    const sent = request(this.server)[method](`${API_PREFIX}${path}`).set(headers);
    if (query) sent.query(query);
    if (version !== undefined) sent.set('If-Match', `"${version}"`);
    if (this.cookie) sent.set('Cookie', this.cookie);
    if (body !== undefined) sent.set('Content-Type', 'application/json').send(JSON.stringify(body));
    const response = await sent;
    this.keepCookie(response);
    assertAsInContract(endpoint, response);
    const { status } = response;
    return {
      status,
      answer: response.body as AnswerOf<E>,
      problem: response.body as Problem & Record<string, unknown>,
      headers: response.headers as Record<string, string>,
      response,
    };
  }

  private keepCookie(response: Response): void {
    const set = [response.headers['set-cookie'] ?? []].flat().find((line) => line.startsWith(`${SESSION_COOKIE}=`));
    if (!set) return;
    const value = set.split(';')[0]!;
    this.cookie = value === `${SESSION_COOKIE}=` ? null : value;
  }
}

/** Fails where an answer is not what the contract says, whatever the test itself looks at. */
export function assertAsInContract(endpoint: EndpointDefinition, response: Response): void {
  const { status } = response;
  if (status >= 400) return assertProblem(response);
  if (status !== endpoint.success) throw new Error(`${endpoint.path} answered ${status}, not ${endpoint.success}`);
  if (endpoint.answer) assertAnswer(endpoint.path, endpoint.answer, response.body);
  else if (endpoint.file) expect(response.headers['content-type']).toBe(endpoint.file);
  else expect(response.text).toBe('');
}

function assertAnswer(path: string, schema: AnySchema, body: unknown): void {
  const faults = faultsOf(schema, body);
  if (faults.length > 0) throw new Error(`the answer of ${path} is not as in the contract: ${JSON.stringify(faults)}`);
}

export function assertProblem(response: Response): void {
  const problem = response.body as Problem;
  expect(response.headers['content-type']).toMatch(/^application\/problem\+json/);
  expect(ERROR_CODES).toContain(problem.code);
  expect(problem).toMatchObject({
    type: 'about:blank',
    title: expect.any(String),
    detail: expect.any(String),
    instance: expect.stringMatching(/^urn:uuid:/),
    status: response.status,
    errors: expect.any(Array),
  });
  expect(STATUS_OF[problem.code as ErrorCode]).toBe(response.status);
}

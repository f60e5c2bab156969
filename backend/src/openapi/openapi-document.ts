import {
  API_PREFIX,
  STATUS_OF,
  contract,
  healthAnswer,
  type EndpointDefinition,
  type ErrorCode,
} from '@bellgap/common/api';
import { SESSION_COOKIE } from '../platform/session-cookie';
import { jsonSchemaOf, type JsonSchema } from './json-schema';

const PROBLEM = { $ref: '#/components/schemas/Problem' };

/** OpenAPI 3.1 of the whole contract, made when the product starts. */
export function openApiDocument(): object {
  const paths: Record<string, Record<string, object>> = {
    '/api/health': {
      get: {
        operationId: 'health',
        summary: 'Whether the product and its database answer',
        security: [],
        responses: {
          200: jsonAnswer('Well', jsonSchemaOf(healthAnswer)),
          503: jsonAnswer('Not well', jsonSchemaOf(healthAnswer)),
        },
      },
    },
  };
  for (const [name, endpoint] of Object.entries<EndpointDefinition>(contract)) {
    const path = `${API_PREFIX}${endpoint.path}`.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [endpoint.method.toLowerCase()]: operationOf(name, endpoint) };
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Bellgap', version: '1', summary: 'Specification sheets for insulator strings and air gaps' },
    paths,
    components: {
      schemas: { Problem: problemSchema() },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: SESSION_COOKIE } },
    },
    security: [{ session: [] }],
  };
}

function operationOf(name: string, endpoint: EndpointDefinition): object {
  const { access, body, summary } = endpoint;
  return {
    operationId: name,
    summary,
    description: `Who may call it: ${typeof access === 'string' ? access : access.join(', ')}.`,
    ...(access === 'open' && { security: [] }),
    parameters: parametersOf(endpoint),
    ...(body && { requestBody: { required: true, content: { 'application/json': { schema: jsonSchemaOf(body) } } } }),
    responses: responsesOf(endpoint),
  };
}

function parametersOf({ path, query, ifMatch }: EndpointDefinition): object[] {
  const inPath = [...path.matchAll(/:(\w+)/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: { type: 'string' },
  }));
  const properties = query ? ((jsonSchemaOf(query).properties ?? {}) as Record<string, JsonSchema>) : {};
  const inQuery = Object.entries(properties).map(([name, schema]) => ({ name, in: 'query', schema }));
  const inHeader = ifMatch
    ? [
        {
          name: 'If-Match',
          in: 'header',
          required: true,
          description: 'Version that the change was made from',
          schema: { type: 'string', pattern: '^"\\d+"$' },
        },
      ]
    : [];
  return [...inPath, ...inQuery, ...inHeader];
}

function responsesOf(endpoint: EndpointDefinition): Record<string, object> {
  const { success, answer, file } = endpoint;
  const responses: Record<string, object> = {};
  if (answer) responses[success] = jsonAnswer('Done', jsonSchemaOf(answer));
  else if (file) responses[success] = { description: 'The file', content: { [file]: {} } };
  else responses[success] = { description: 'Done' };
  for (const status of new Set(problemsOf(endpoint).map((code) => STATUS_OF[code]))) {
    responses[status] = { description: 'Problem', content: { 'application/problem+json': { schema: PROBLEM } } };
  }
  return responses;
}

function problemsOf({ access, method, path, body, query, ifMatch }: EndpointDefinition): ErrorCode[] {
  const codes: ErrorCode[] = ['unexpected', 'unavailable'];
  if (access !== 'open') codes.push('not-signed-in');
  if (method !== 'GET' || Array.isArray(access)) codes.push('forbidden');
  if (path.includes(':')) codes.push('not-found');
  if (method !== 'GET') codes.push('wrong-state', 'unsupported-media-type');
  if (body) codes.push('too-large');
  if (body || query) codes.push('validation');
  if (ifMatch) codes.push('version-required', 'newer-version');
  if (path === contract.signIn.path && access === 'open') codes.push('too-many-requests');
  return codes;
}

function jsonAnswer(description: string, schema: JsonSchema): object {
  return { description, content: { 'application/json': { schema } } };
}

function problemSchema(): JsonSchema {
  const text = { type: 'string' };
  return {
    type: 'object',
    description: 'RFC 9457 problem details',
    properties: {
      type: text,
      title: text,
      status: { type: 'integer' },
      detail: text,
      instance: text,
      code: { type: 'string', enum: Object.keys(STATUS_OF) },
      errors: {
        type: 'array',
        items: { type: 'object', properties: { path: text, message: text }, required: ['path', 'message'] },
      },
    },
    required: ['type', 'title', 'status', 'detail', 'instance', 'code', 'errors'],
  };
}

import { API_PREFIX, type EndpointDefinition, type ErrorCode, type FieldError, STATUS_OF } from '@bellgap/common/api';

/** A request as the server would see it. */
export interface Asked {
  params: Record<string, string>;
  query: URLSearchParams;
  body: unknown;
  headers: Record<string, string>;
}

type Handler = (asked: Asked) => unknown;

/** An answer that is a problem. */
export class Refusal {
  constructor(
    readonly code: ErrorCode,
    readonly detail: string,
    readonly errors: FieldError[] = [],
    readonly more: Record<string, unknown> = {},
  ) {}
}

function pathPattern(path: string): RegExp {
  return new RegExp(`^${path.replace(/:(\w+)/g, '(?<$1>[^/]+)')}$`);
}

/** Stands at HTTP in place of the server: answers by endpoint of the contract, keeps what was asked. */
export class FakeServer {
  private readonly handlers = new Map<EndpointDefinition, Handler>();
  readonly asked: { endpoint: EndpointDefinition; request: Asked }[] = [];

  install(): this {
    globalThis.fetch = ((address: string, init: RequestInit) => this.answer(address, init)) as unknown as typeof fetch;
    return this;
  }

  on(endpoint: EndpointDefinition, handler: Handler): this {
    this.handlers.set(endpoint, handler);
    return this;
  }

  requestsTo(endpoint: EndpointDefinition): Asked[] {
    return this.asked.filter((entry) => entry.endpoint === endpoint).map(({ request }) => request);
  }

  private async answer(address: string, init: RequestInit) {
    const url = new URL(address, 'http://bellgap.test');
    const path = url.pathname.slice(API_PREFIX.length);
    for (const [endpoint, handler] of this.handlers) {
      const match = endpoint.method === init.method ? pathPattern(endpoint.path).exec(path) : null;
      if (!match) continue;
      const request: Asked = {
        params: Object.fromEntries(
          Object.entries(match.groups ?? {}).map(([name, value]) => [name, decodeURIComponent(value)]),
        ),
        query: url.searchParams,
        body: typeof init.body === 'string' ? (JSON.parse(init.body) as unknown) : undefined,
        headers: init.headers as Record<string, string>,
      };
      this.asked.push({ endpoint, request });
      const given = await handler(request);
      return given instanceof Refusal ? problemAnswer(given, path) : plainAnswer(endpoint.success, given);
    }
    throw new Error(`The test's server has no answer for ${init.method} ${path}`);
  }
}

function plainAnswer(status: number, body: unknown) {
  const text = body === undefined ? '' : JSON.stringify(body);
  return { ok: status < 400, status, headers: { get: () => null }, text: () => Promise.resolve(text) };
}

function problemAnswer({ code, detail, errors, more }: Refusal, instance: string) {
  const status = STATUS_OF[code];
  return plainAnswer(status, { type: 'about:blank', title: code, status, detail, instance, code, errors, ...more });
}

import {
  API_PREFIX,
  PASSIVE_HEADER,
  type AnswerOf,
  type BodyOf,
  type EndpointDefinition,
  type QueryOf,
} from '@bellgap/common/api';
import { errorFromAnswer, unreachable } from './api-error';

type ParamNames<Path extends string> = Path extends `${string}:${infer Name}/${infer Rest}`
  ? Name | ParamNames<`/${Rest}`>
  : Path extends `${string}:${infer Name}`
    ? Name
    : never;

export type ParamsOf<E extends EndpointDefinition> = Record<ParamNames<E['path']>, string>;

export type Address<E extends EndpointDefinition> = ([ParamNames<E['path']>] extends [never]
  ? { params?: undefined }
  : { params: ParamsOf<E> }) &
  (E extends { query: object } ? { query?: QueryOf<E> } : { query?: undefined });

export type CallOptions<E extends EndpointDefinition> = Address<E> &
  (E extends { body: object } ? { body: BodyOf<E> } : { body?: undefined }) &
  (E extends { ifMatch: true } ? { ifMatch: number } : { ifMatch?: undefined }) & {
    /** A request that nobody asked for by hand (timed saving, polling) and that does not keep the session awake. */
    passive?: boolean;
    signal?: AbortSignal;
  };

export type OptionalWhereEmpty<Options> =
  Record<string, never> extends Options ? [options?: Options] : [options: Options];

interface LooseOptions {
  params?: Record<string, string>;
  query?: Record<string, unknown>;
  body?: unknown;
  ifMatch?: number;
  passive?: boolean;
  signal?: AbortSignal;
}

/** The address of an endpoint, with its parameters and query string filled in. */
export function addressOf<E extends EndpointDefinition>(
  endpoint: E,
  ...[options]: OptionalWhereEmpty<Address<E>>
): string {
  return looseAddress(endpoint, (options ?? {}) as LooseOptions);
}

function looseAddress(endpoint: EndpointDefinition, { params = {}, query = {} }: LooseOptions): string {
  const path = endpoint.path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(params[name] ?? ''));
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query)) {
    if (value !== undefined && value !== null && value !== '') search.set(name, String(value as string | number));
  }
  const text = search.toString();
  return `${API_PREFIX}${path}${text ? `?${text}` : ''}`;
}

let tellSessionLapsed: () => void = () => undefined;

/** Who wants to know that the server no longer knows the session. One listener; the frame of the page. */
export function onSessionLapsed(listener: () => void): () => void {
  tellSessionLapsed = listener;
  return () => {
    tellSessionLapsed = () => undefined;
  };
}

/** Asks the server and gives its answer, typed by the contract; every failure is an ApiError. */
export async function call<E extends EndpointDefinition>(
  endpoint: E,
  ...[given]: OptionalWhereEmpty<CallOptions<E>>
): Promise<AnswerOf<E>> {
  const options = (given ?? {}) as LooseOptions;
  const changing = endpoint.method !== 'GET';
  const headers: Record<string, string> = { Accept: 'application/json' };
  if (changing) headers['Content-Type'] = 'application/json';
  if (options.ifMatch !== undefined) headers['If-Match'] = `"${options.ifMatch}"`;
  if (options.passive) headers[PASSIVE_HEADER] = '1';

  let response: Pick<Response, 'ok' | 'status' | 'headers' | 'text'>;
  let text: string;
  try {
    response = await fetch(looseAddress(endpoint, options), {
      method: endpoint.method,
      headers,
      body: options.body === undefined ? undefined : JSON.stringify(options.body),
      credentials: 'same-origin',
      signal: options.signal,
    });
    text = await response.text();
  } catch (failure) {
    if (options.signal?.aborted) throw failure;
    throw unreachable();
  }
  const body = readJson(text);
  if (response.ok) return body as AnswerOf<E>;
  const error = errorFromAnswer(response.status, body, response.headers.get('Retry-After'));
  if (error.code === 'not-signed-in' && endpoint.access !== 'open') tellSessionLapsed();
  throw error;
}

function readJson(text: string): unknown {
  if (text === '') return undefined;
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return undefined;
  }
}

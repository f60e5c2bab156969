import type { AnySchema, InferType } from 'yup';
import type { Role } from './roles';

/** Who may call an endpoint: anybody, any signed-in person, or people who hold one of the roles. */
export type Access = 'open' | 'signed-in' | readonly Role[];

export interface EndpointDefinition {
  method: 'GET' | 'POST' | 'PUT' | 'DELETE';
  /** Path below /api/v1 with `:name` parameters. */
  path: string;
  summary: string;
  access: Access;
  query?: AnySchema;
  body?: AnySchema;
  /** Schema of the JSON answer; absent where there is none (204) or where it is a file. */
  answer?: AnySchema;
  /** Media type of an answer that is a file. */
  file?: string;
  success: 200 | 201 | 204;
  /** The request must carry If-Match with the version it was made from. */
  ifMatch?: boolean;
}

/** Keeps the literal types of one endpoint, so that body, query and answer are known on both sides. */
export function endpoint<const E extends EndpointDefinition>(definition: E): E {
  return definition;
}

export type BodyOf<E extends EndpointDefinition> = E['body'] extends AnySchema ? InferType<E['body']> : undefined;
export type QueryOf<E extends EndpointDefinition> = E['query'] extends AnySchema ? InferType<E['query']> : undefined;
export type AnswerOf<E extends EndpointDefinition> = E['answer'] extends AnySchema ? InferType<E['answer']> : undefined;

export const API_PREFIX = '/api/v1';

/** Header of requests that nobody asked for by hand (timed saving, polling): they do not keep a session awake. */
export const PASSIVE_HEADER = 'X-Bellgap-Passive';

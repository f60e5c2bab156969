import type { AnswerOf, EndpointDefinition } from '@bellgap/common/api';
import { QueryClient, queryOptions } from '@tanstack/react-query';
import { ApiError } from './api-error';
import { call, type Address, type CallOptions, type OptionalWhereEmpty } from './client';

export function makeQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 15_000,
        retry: (count, error) => count < 2 && error instanceof ApiError && (error.status === 0 || error.status === 503),
        retryDelay: (count) => 400 * 2 ** count,
      },
    },
  });
}

/** Key of an answer: first the endpoint, so that all its answers can be made stale together. */
export function keyOf<E extends EndpointDefinition>(endpoint: E, address?: Partial<Address<E>>) {
  const key: unknown[] = [endpoint.path];
  if (address?.params) key.push(address.params);
  if (address?.query) key.push(address.query);
  return key;
}

/** Key and function of a GET endpoint for useQuery. */
export function queryOf<E extends EndpointDefinition & { method: 'GET' }>(
  endpoint: E,
  ...[address]: OptionalWhereEmpty<Address<E>>
) {
  return queryOptions<AnswerOf<E>, ApiError>({
    queryKey: keyOf(endpoint, address),
    queryFn: ({ signal }) => call(endpoint, ...([{ ...address, signal }] as unknown as [CallOptions<E>])),
  });
}
